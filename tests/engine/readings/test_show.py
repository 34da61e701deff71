"""Figures to sign: no finer than U/10, rounded to the safe side, written the way the trade reads them."""

import math
from collections.abc import Callable
from fractions import Fraction

import pytest
from gaswright import show
from gaswright.errors import OutsideRangeError
from hypothesis import given
from hypothesis import strategies as st

PLAIN = str.maketrans({"\u202f": "", "−": "-"})
RAISED = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹⁻", "0123456789-")
values = st.floats(1e-12, 1e12) | st.floats(-1e12, -1e-12)


def _exact(text: str) -> Fraction:
    """Read a figure back with exact arithmetic."""
    head, _, power = text.translate(PLAIN).partition(" × 10")
    return Fraction(head) * Fraction(10) ** int(power.translate(RAISED) or 0)


@given(value=values, share=st.floats(1e-6, 10))
def test_the_safe_end_is_never_on_the_wrong_side(value: float, share: float) -> None:
    expanded = abs(value) * share
    low, high = _exact(show.safe_low(value, expanded)), _exact(show.safe_high(value, expanded))
    below, above = value - expanded, value + expanded
    step = Fraction(show.step_for(expanded) or 0)
    slack = Fraction(1e-8) * (abs(Fraction(below)) + abs(Fraction(above)) + step)
    assert Fraction(below) - step - slack <= low <= Fraction(below) + slack
    assert Fraction(above) - slack <= high <= Fraction(above) + step + slack


@given(expanded=st.floats(1e-12, 1e12))
def test_a_step_is_one_two_or_five_and_no_finer_than_a_tenth(expanded: float) -> None:
    step = show.step_for(expanded)
    assert step is not None
    head = step / 10.0 ** math.floor(math.log10(step) + 1e-9)
    assert min(abs(head - each) for each in (1, 2, 5)) < 1e-6
    assert expanded / 10 * (1 - 1e-8) <= step <= expanded / 10 * 2.5 * (1 + 1e-8)


@pytest.mark.parametrize(
    ("value", "expanded", "best", "plus"),
    [
        (1183.6, 27.2, "1185", "30"),
        (10.5914, 0.117, "10.60", "0.12"),
        (0.000279, 0.0000123, "0.000280", "0.000014"),
        (71017.9, 1630.1, "71\u202f000", "1800"),
        (-3.27, 0.4, "−3.25", "0.40"),
        (2.791e-5, 1.23e-6, "2.80 × 10⁻⁵", "0.14 × 10⁻⁵"),
        (5.0, 0.0, "5", "0"),
    ],
)
def test_best_estimate_and_limit_share_their_last_digit(value: float, expanded: float, best: str, plus: str) -> None:
    # worked out by hand from the rule: the smallest step of 1, 2 or 5 that is no finer than U/10, U rounded up
    assert show.plus_minus(value, expanded) == (best, plus)


@pytest.mark.parametrize(
    ("value", "expanded", "low", "high"),
    [
        (0.3, 0.1, "0.20", "0.40"),
        (19.94, 1.0, "18.9", "21.0"),
        (0.7, 0.1, "0.60", "0.80"),
        (2.0, 0.0, "2", "2"),
    ],
)
def test_an_end_that_is_a_whole_step_stays(value: float, expanded: float, low: str, high: str) -> None:
    # 0.3 - 0.1 is 0.19999999999999998 in binary: that must not cost a step
    assert (show.safe_low(value, expanded), show.safe_high(value, expanded)) == (low, high)


@pytest.mark.parametrize(
    ("value", "decimals", "mark", "text"),
    [
        (1234.5, 1, ".", "1234.5"),
        (12345.6, 1, ".", "12\u202f345.6"),
        (1234567.0, 0, ".", "1\u202f234\u202f567"),
        (12345.6, 1, ",", "12\u202f345,6"),
        (-0.04, 1, ".", "0.0"),
        (-12.25, 1, ".", "−12.2"),
    ],
)
def test_digits_come_in_threes_from_five_on(value: float, decimals: int, mark: str, text: str) -> None:
    # SI Brochure, 9th edition, 5.4.4: groups of three by a thin space, not needed for four digits
    assert show.number(value, decimals, mark) == text


@pytest.mark.parametrize(
    ("value", "digits", "text"),
    [
        (2.79e-5, 3, "2.79 × 10⁻⁵"),
        (0.00279, 3, "0.00279"),
        (3.2e9, 2, "3.2 × 10⁹"),
        (-2.5e-7, 2, "−2.5 × 10⁻⁷"),
        (0.0, 3, "0"),
        (6.02214076e23, 9, "6.02214076 × 10²³"),
    ],
)
def test_powers_of_ten_only_where_needed(value: float, digits: int, text: str) -> None:
    assert show.significant(value, digits) == text


@pytest.mark.parametrize(
    ("seconds", "down", "text"),
    [
        (68100.0, True, "18 h 55 min"),
        (68159.9, True, "18 h 55 min"),
        (68100.1, False, "18 h 56 min"),
        (1140.0, True, "19 min"),
        (1145.9, True, "19 min 05 s"),
        (59.2, False, "1 min"),
        (58.2, False, "59 s"),
        (3600.0, True, "1 h 00 min"),
        (3599.9999999, False, "1 h 00 min"),
    ],
)
def test_times_are_hours_and_minutes(seconds: float, down: bool, text: str) -> None:  # noqa: FBT001 - a column
    assert show.duration(seconds, down=down) == text


DRAWERS: dict[str, Callable[[float], object]] = {
    "number": lambda value: show.number(value, 2),
    "significant": lambda value: show.significant(value, 3),
    "safe_low": lambda value: show.safe_low(value, 1.0),
    "safe_high": lambda value: show.safe_high(value, 0.0),
    "duration": lambda value: show.duration(value, down=True),
}


@pytest.mark.parametrize("value", [math.nan, math.inf, -math.inf])
@pytest.mark.parametrize("drawer", DRAWERS)
def test_what_is_no_number_is_never_shown(drawer: str, value: float) -> None:
    with pytest.raises(OutsideRangeError) as caught:
        DRAWERS[drawer](value)
    assert str(caught.value) == "The figure: found no finite number; expected a finite number. Check the readings."
