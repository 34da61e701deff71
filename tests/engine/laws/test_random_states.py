"""Random states of every law: each unknown solved for comes back, and slopes are those of differences."""

import pytest
from gaswright.errors import NoSolutionError, OutsideRangeError
from gaswright.evaluate import evaluate
from gaswright.law import sensitivities

from tests.engine.laws.states import LAWS, PAIRS, State, first_unknown, nearest, states, weights

CLOSE = 1e-9
FEWEST = 10
STEP = 1e-4
FLOOR = 1e-9


@pytest.mark.parametrize(("key", "unknown"), PAIRS)
def test_the_value_comes_back(key: str, unknown: str, full_counts: bool) -> None:  # noqa: FBT001 - a fixture
    relation = LAWS[key]
    looked = 0
    for state in states(relation, 1_000 if full_counts else 200, "back"):
        parts = weights(relation, state)
        if not parts[unknown]:
            continue
        condition = max(1.0, max(parts.values()) / parts[unknown])
        wanted = state.values[unknown]
        found = nearest(relation, unknown, state, wanted)
        assert found == pytest.approx(wanted, rel=CLOSE * condition), state
        looked += 1
    assert looked >= FEWEST


def _difference(key: str, state: State, name: str, slope: float) -> float | None:
    """Give the fourth-order central difference of the answer by one reading; None where an end leaves the law.

    The step moves reading and answer by a share of themselves at most, so that a steep place is looked at closely.
    """
    relation = LAWS[key]
    unknown = first_unknown(relation)
    steepness = abs(slope * state.values[name] / state.values[unknown]) if state.values[unknown] else 1.0
    width = STEP * state.values[name] / max(1.0, steepness)
    ends = []
    for steps in (-2, -1, 1, 2):
        values = {**state.values, name: state.values[name] + steps * width}
        try:
            ends.append(evaluate(relation, unknown, values, state.gas, key))
        except (NoSolutionError, OutsideRangeError):
            return None
    far_below, below, above, far_above = ends
    return (8 * (above - below) - (far_above - far_below)) / (12 * width)


@pytest.mark.parametrize("key", dict(PAIRS))
def test_sensitivities_are_those_of_differences(key: str, full_counts: bool) -> None:  # noqa: FBT001 - a fixture
    relation = LAWS[key]
    unknown = first_unknown(relation)
    looked = 0
    for state in states(relation, 100 if full_counts else 20, "slope"):
        answer = abs(state.values[unknown])
        for name, slope in sensitivities(relation, unknown, state.values, state.gas).items():
            value = state.values[name]
            expected = _difference(key, state, name, slope) if value else None
            if expected is None:
                continue
            least = FLOOR * answer / abs(value)  # what rounding leaves of a slope that is nothing
            assert slope == pytest.approx(expected, rel=1e-6, abs=least), (name, state)
            looked += 1
    assert looked >= FEWEST
