"""Numbers from outside against the engine that ships, asked forwards and turned round.

The sources stand beside the numbers in ``spec/cases``.
"""

import gaswright
import pytest
from gaswright.errors import NoSolutionError

from generator.load import Case
from tests.support.cases import CASES, half_digit, name_of, reading_of, span

SLACK = 1 + 1e-9


@pytest.mark.parametrize("case", CASES, ids=name_of)
def test_the_published_figure_is_met(case: Case) -> None:
    """The answer lies in the interval the source's digits allow."""
    low, high = span(case)
    found = gaswright.solve(case.relation, case.find, dict(case.given)).value
    slack = 1e-12 * max(abs(low), abs(high))
    assert low - slack <= found <= high + slack


TURNED = [(case, name) for case in CASES for name in case.given if name != "gas"]


@pytest.mark.parametrize(("case", "name"), TURNED, ids=[f"{name_of(case)}-for-{name}" for case, name in TURNED])
def test_the_published_figure_turned_round_gives_each_reading_back(case: Case, name: str) -> None:
    """Asking for a reading, with the published figure given, gives an interval that meets the reading's own digits."""
    given = {key: reading_of(case, key) for key in case.given if key != name}
    wanted = reading_of(case, name).value
    half = half_digit(case, name) + 1e-9 * abs(wanted)
    ends = []
    for end in span(case):
        readings = {key: reading.value for key, reading in given.items()} | {case.find: end}
        try:
            ends.append(gaswright.solve(case.relation, name, readings).value)
        except NoSolutionError:
            continue
    middle = {key: reading.value for key, reading in given.items()} | {case.find: reading_of(case, case.find).value}
    ends.append(gaswright.solve(case.relation, name, middle).value)
    assert min(ends) - half <= wanted <= max(ends) + half


def test_every_law_has_a_case_or_is_a_balance() -> None:
    """At least sixty numbers from outside; none of them our own output."""
    assert len(CASES) >= 60
    assert {case.basis for case in CASES} <= {
        "published",
        "published, digits from memory",
        "library",
        "common practice, no source",
    }
