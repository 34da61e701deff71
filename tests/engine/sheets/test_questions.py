"""Every question of every sheet: the answer put back gives each reading again, and slopes are those of differences."""

import pytest
from gaswright import find as finder
from gaswright.sheet import run_sheet

from tests.engine.sheets.states import GASES, QUESTIONS, condition, levels, readings, sensitivities, turned

STATES = [(gas, place) for gas in GASES for place in range(3)]
CLOSE = 1e-9
OTHERS = [(key, row) for key, row in QUESTIONS if row != next(iter(finder.sheet(key).finds))]
STEP = 1e-5


@pytest.mark.parametrize(("gas", "place"), STATES)
@pytest.mark.parametrize(("key", "row"), QUESTIONS)
def test_the_answer_put_back_gives_the_reading_again(key: str, row: str, gas: str, place: int) -> None:
    given = readings(key, gas, levels(gas)[place])
    _, back = turned(key, row, given)
    expected = given.get(row, back.value)
    assert back.value == pytest.approx(expected, rel=CLOSE * condition(finder.sheet(key), back, gas))


@pytest.mark.parametrize("gas", GASES)
@pytest.mark.parametrize(("key", "row"), OTHERS)
def test_the_first_question_is_met_by_every_other_answer(key: str, row: str, gas: str) -> None:
    given = readings(key, gas, levels(gas)[0])
    first = next(iter(finder.sheet(key).finds))
    swapped, back = turned(key, row, given)
    again = run_sheet(key, {"find": first, "readings": {**swapped, row: back.value}})
    assert again.value == pytest.approx(swapped[first], rel=CLOSE * condition(finder.sheet(key), again, gas))


@pytest.mark.parametrize("gas", GASES)
@pytest.mark.parametrize(("key", "row"), QUESTIONS)
def test_slopes_are_those_of_central_differences(key: str, row: str, gas: str) -> None:
    given, result = turned(key, row, readings(key, gas, levels(gas)[1]))
    slopes = sensitivities(finder.sheet(key), result, gas)
    counted = 0
    for name, value in given.items():
        if isinstance(value, str) or name not in slopes or finder.sheet(key).rows[name].whole:
            continue
        width = STEP * abs(value)
        ends = [
            run_sheet(key, {"find": row, "readings": {**given, name: end}}).value
            for end in (value - width, value + width)
        ]
        assert slopes[name] == pytest.approx((ends[1] - ends[0]) / (2 * width), rel=2e-6, abs=1e-9)
        counted += 1
    assert counted >= 3
