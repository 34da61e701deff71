"""Numbers from outside against the engine that ships, asked forwards and turned round.

The sources stand beside the numbers in ``spec/cases``.
"""

import gaswright
import pytest
from gaswright import terms
from gaswright.errors import NoSolutionError, OutsideRangeError
from gaswright.find import relation
from gaswright.gas import find

from generator.load import Case
from tests.engine.laws.states import State, weights
from tests.support.cases import CASES, half_digit, name_of, reading_of, span

TRACE = 1e-9


@pytest.mark.parametrize("case", CASES, ids=name_of)
def test_the_published_figure_is_met(case: Case) -> None:
    """The answer lies in the interval the source's digits allow."""
    low, high = span(case)
    found = gaswright.solve(case.relation, case.find, dict(case.given)).value
    slack = 1e-12 * max(abs(low), abs(high))
    assert low - slack <= found <= high + slack


def leaves_a_trace(case: Case, name: str) -> bool:
    """Say whether the figure depends on this reading at all: a room long since mixed has forgotten how it began."""
    law = terms.spread(relation(case.relation), case.find, case.given).relation
    result = gaswright.solve(case.relation, case.find, dict(case.given))
    sizes = {key: max(abs(value), half_digit(case, key)) for key, value in result.values.items()}
    parts = weights(law, State(result.values, find(case.given["gas"]) if law.uses_gas else None), sizes)
    return parts[name] > TRACE * max(parts.values())


def side_of(case: Case, name: str, given: dict[str, float | str], wanted: float) -> str:
    """Say on which side of the turning point the reading lies, where two values fit the figure."""
    sides = terms.spread(relation(case.relation), name, given).relation.forms[name].sides
    found = {}
    for side in sides:
        try:
            found[side] = gaswright.solve(case.relation, name, given, branch=side).value
        except NoSolutionError:
            continue
    return min(found, key=lambda side: abs(found[side] - wanted)) if found else ""


def is_asked(case: Case, name: str) -> bool:
    """Say whether this reading is one of the law's own unknowns."""
    return name in terms.spread(relation(case.relation), case.find, case.given).relation.forms


TURNED = [(case, name) for case in CASES for name in case.given if is_asked(case, name) and leaves_a_trace(case, name)]


@pytest.mark.parametrize(("case", "name"), TURNED, ids=[f"{name_of(case)}-for-{name}" for case, name in TURNED])
def test_the_published_figure_turned_round_gives_each_reading_back(case: Case, name: str) -> None:
    """Asking for a reading, with the published figure given, gives an interval that meets the reading's own digits.

    Where the digits of the figure leave the law (a share rounded to nothing), the unrounded answer closes the interval.
    """
    given: dict[str, float | str] = {key: reading_of(case, key).value for key in case.given if key not in (name, "gas")}
    if "gas" in case.given:
        given["gas"] = case.given["gas"]
    wanted = reading_of(case, name).value
    half = half_digit(case, name) + 1e-9 * abs(wanted)
    unrounded = gaswright.solve(case.relation, case.find, dict(case.given)).value
    side = side_of(case, name, given | {case.find: unrounded}, wanted)
    found = [gaswright.solve(case.relation, name, given | {case.find: unrounded}, branch=side).value]
    for figure in (*span(case), reading_of(case, case.find).value):
        try:
            found.append(gaswright.solve(case.relation, name, given | {case.find: figure}, branch=side).value)
        except (NoSolutionError, OutsideRangeError):
            continue
    assert min(found) - half <= wanted <= max(found) + half


def test_every_law_has_a_case_or_is_a_balance() -> None:
    """At least sixty numbers from outside; none of them our own output."""
    assert len(CASES) >= 60
    assert {case.basis for case in CASES} <= {
        "published",
        "published, digits from memory",
        "library",
        "common practice, no source",
    }
