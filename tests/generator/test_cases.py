"""Numbers from outside against the solved sympy forms, before any code is emitted."""

import re

import pytest
import sympy

from generator.check import constants_of, variables_of
from generator.load import Case
from generator.parts import put_in, written_out
from generator.solve import Way, solve_for
from generator.terms import expand
from spec.model import Relation
from spec.relations import FAMILIES
from tests.support.cases import CASES, name_of, reading_of, span

RELATIONS: dict[str, Relation] = {relation.key: relation for family in FAMILIES for relation in family.relations}
DIGITS = 30


@pytest.mark.parametrize("case", CASES, ids=name_of)
def test_the_published_figure_is_met_by_the_symbolic_form(case: Case) -> None:
    """The closed form at 30 digits, or the residual's sign change over the interval, agrees with the source."""
    count = max(
        (int(term[1]) for name in (*case.given, case.find) if (term := re.search(r"_i_(\d+)$", name))), default=0
    )
    relation = expand(RELATIONS[case.relation], count) if count else RELATIONS[case.relation]
    form = solve_for(relation, next(symbol for symbol in relation.where if symbol.name == case.find))
    state: dict[sympy.Symbol, sympy.Expr] = {
        symbol: sympy.Rational(constant.value.numerator, constant.value.denominator)
        for symbol, constant in constants_of(relation).items()
    }
    for symbol, variable in variables_of(relation).items():
        if symbol.name in case.given:
            state[symbol] = sympy.Float(reading_of(case, symbol.name).value, DIGITS)
        elif symbol.name != case.find:
            state[symbol] = sympy.Rational(variable.default)
    low, high = span(case)
    slack = 1e-12 * max(abs(low), abs(high))
    if form.way is Way.CLOSED and form.expression is not None:
        found = float(sympy.N(put_in(form.expression, relation.parts).doit().subs(state), DIGITS))
        assert low - slack <= found <= high + slack
    else:
        whole = written_out(relation)
        residual = (whole.left - whole.right).doit().subs(state)
        ends = [sympy.N(residual.subs(form.unknown, end), DIGITS) for end in (low, high)]
        assert ends[0] * ends[1] <= 0
