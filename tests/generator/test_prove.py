"""Proofs by putting back: a form must hold wherever it is used, and only there."""

from dataclasses import replace

import pytest
import sympy

from generator.errors import SpecError
from generator.solve import solve_for
from spec.relations.m_vessels import BLOWDOWN, T


def test_a_form_need_not_hold_where_the_relation_gives_no_figure() -> None:
    """The square in T loses the sign of log(p/p_0); where p is above p_0 the relation refuses."""
    assert solve_for(BLOWDOWN, T).proof.startswith("put back: zero to 35 digits")


def test_the_same_form_is_refused_where_nothing_keeps_it_from_that_side() -> None:
    """Without the refusal the wrong side of the square is found."""
    open_to_both = replace(BLOWDOWN, valid=tuple(each for each in BLOWDOWN.valid if not each.refuse))
    with pytest.raises(SpecError) as caught:
        solve_for(open_to_both, T)
    assert caught.value.where == "relation blowdown, unknown T"
    assert sympy.Float(caught.value.found.removeprefix("a form that misses by ")) > 0
    assert caught.value.todo == "correct the branch or the equation"
