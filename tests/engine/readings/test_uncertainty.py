"""Uncertainty against uncertainties 3.2.3, GTC 1.5.1 and metrolopy 1.1.1; Student's factor against scipy 1.18.1.

The formula is that of a hold test, Q = V (p1/T1 - p2/T2) Tref / t, with both pressures read on one gauge. Each package
is given the gauge's own error as one quantity that both readings share, and builds its own derivatives.
"""

import math
from collections.abc import Callable, Sequence
from typing import Any

import GTC
import metrolopy
import pytest
from gaswright import student
from gaswright.errors import NoSolutionError
from gaswright.reading import Reading, read
from gaswright.tables import KINDS
from gaswright.uncertainty import combine
from scipy import stats
from uncertainties import ufloat

GAUGE = {"G-2": {"name": "G-2", "accuracy": "class 1.0", "span": "16 bar", "resolution": "0.1 bar"}}
REFERENCE = 293.15
Maker = Callable[[float, float], Any]


def _readings(end: str) -> list[Reading]:
    """Volume, first and second pressure, first and second temperature, time."""
    typed: list[tuple[str, str | dict[str, object], str]] = [
        ("Volume", "412 L ± 1 %", "volume"),
        (
            "First pressure",
            {"text": "7.9", "unit": "bar", "reference": "absolute", "instrument": "G-2"},
            "absolute_pressure",
        ),
        (
            "Second pressure",
            {"text": end, "unit": "bar", "reference": "absolute", "instrument": "G-2"},
            "absolute_pressure",
        ),
        ("First temperature", "17.5 °C ± 0.5 °C", "absolute_temperature"),
        ("Second temperature", "18.1 °C ± 0.4 °C", "absolute_temperature"),
        ("Time", "60.0 min", "time"),
    ]
    return [read(name, raw, KINDS[kind], instruments=GAUGE) for name, raw, kind in typed]


def _leak(quantities: Sequence[Any]) -> Any:
    volume, p_1, p_2, T_1, T_2, time = quantities
    return volume * (p_1 / T_1 - p_2 / T_2) * REFERENCE / time


def _gradient(readings: Sequence[Reading]) -> list[float]:
    V, p_1, p_2, T_1, T_2, t = (reading.value for reading in readings)
    per = REFERENCE / t
    return [
        (p_1 / T_1 - p_2 / T_2) * per,
        V / T_1 * per,
        -V / T_2 * per,
        -V * p_1 / T_1**2 * per,
        V * p_2 / T_2**2 * per,
        -V * (p_1 / T_1 - p_2 / T_2) * per / t,
    ]


def _independent(make: Maker, reading: Reading) -> Any:
    return make(reading.value, reading.u)


def _by_package(make: Maker, readings: Sequence[Reading], *, is_shared: bool) -> Any:
    """Let a package work out the leak; ``make`` gives its quantity of a value and a standard uncertainty."""
    quantities = [_independent(make, reading) for reading in readings]
    if is_shared:
        error = make(0.0, readings[1].u_systematic)
        for place in (1, 2):
            quantities[place] = make(readings[place].value, readings[place].u_random) + error
    return _leak(quantities)


def _metrolopy(value: float, u: float) -> Any:
    return metrolopy.gummy(value, u)


PACKAGES: dict[str, tuple[Maker, Callable[[Any], float]]] = {
    "uncertainties": (ufloat, lambda result: float(result.std_dev)),
    "GTC": (GTC.ureal, lambda result: float(result.u)),
    "metrolopy": (_metrolopy, lambda result: float(result.u)),
}


@pytest.mark.parametrize("package", PACKAGES)
@pytest.mark.parametrize(("end", "is_shared"), [("7.7", True), ("6.2", False)])
def test_hold_test_equals_package(package: str, end: str, is_shared: bool) -> None:  # noqa: FBT001 - a column of the table
    readings = _readings(end)
    make, u_of = PACKAGES[package]
    combined = combine(_gradient(readings), readings)
    assert combined.u == pytest.approx(u_of(_by_package(make, readings, is_shared=is_shared)), rel=1e-12)
    assert combined.other_u == pytest.approx(u_of(_by_package(make, readings, is_shared=not is_shared)), rel=1e-12)
    assert combined.shared == (("G-2",) if is_shared else ())
    assert combined.expanded == 2 * combined.u


def test_sharing_narrows_a_difference_and_widens_a_sum() -> None:
    readings = _readings("7.7")[1:3]
    difference, total = combine([1.0, -1.0], readings), combine([1.0, 1.0], readings)
    assert difference.u < difference.other_u
    assert total.u > total.other_u


@pytest.mark.parametrize("end", ["7.7", "6.2"])
def test_shares_are_the_parts_of_u_squared(end: str) -> None:
    readings = _readings(end)
    gradient = _gradient(readings)
    combined = combine(gradient, readings)
    assert math.fsum(share.fraction for share in combined.shares) == pytest.approx(1, abs=1e-14)
    alone = {reading.name: (slope * reading.u) ** 2 for slope, reading in zip(gradient, readings, strict=True)}
    for share in combined.shares:
        assert share.moves**2 == pytest.approx(share.fraction * combined.u**2, rel=1e-12)
        if share.label in alone:
            assert share.fraction * combined.u**2 == pytest.approx(alone[share.label], rel=1e-12)
    labels = [share.label for share in combined.shares]
    assert ("First pressure and Second pressure, G-2" in labels) == (end == "7.7")


def test_three_readings_share_only_where_all_are_near_one_another() -> None:
    # 16 bar of span: 5.0 and 6.0 bar are near, 6.0 and 7.0 bar too, but 5.0 and 7.0 bar are not.
    typed = [
        {"text": text, "unit": "bar", "reference": "absolute", "instrument": "G-2"} for text in ("6.0", "5.0", "7.0")
    ]
    readings = [
        read(f"p{place}", raw, KINDS["absolute_pressure"], instruments=GAUGE) for place, raw in enumerate(typed)
    ]
    for order in ((0, 1, 2), (2, 1, 0), (1, 2, 0)):
        combined = combine([1.0, 1.0, 1.0], [readings[place] for place in order])
        systematic, random = readings[0].u_systematic, readings[0].u_random
        assert combined.u == pytest.approx(math.sqrt((2 * systematic) ** 2 + systematic**2 + 3 * random**2), rel=1e-12)


def test_without_a_span_only_equal_readings_share() -> None:
    tool = {"T-1": {"name": "T-1", "accuracy": "± 0.5 °C"}}
    typed = [{"text": text, "unit": "°C", "instrument": "T-1"} for text in ("17.5", "18.1", "17.5")]
    readings = [read(text["text"], text, KINDS["absolute_temperature"], instruments=tool) for text in typed]
    assert combine([1.0, -1.0], readings[:2]).shared == ()
    assert combine([1.0, -1.0], readings[::2]).shared == ("T-1",)


def test_exact_readings_leave_nothing() -> None:
    readings = [read("n", {"text": "4", "accuracy": "exact"}, KINDS["count"])]
    combined = combine([3.0], readings)
    assert (combined.u, combined.expanded, combined.shares) == (0.0, 0.0, ())


def test_class_is_a_rectangular_limit() -> None:
    # 250 bar class 1.6: u = 2.3 bar; 16 bar class 1.0: u = 0.092 bar (common practice; JCGM 100:2008, 4.3.7)
    kind = KINDS["gauge_pressure"]
    wide = read("p", {"text": "200", "unit": "bar", "accuracy": "class 1.6 of 250 bar"}, kind)
    narrow = read("p", {"text": "7", "unit": "bar", "accuracy": "class 1.0 of 16 bar"}, kind)
    assert wide.u / 1e5 == pytest.approx(2.3, abs=0.05)
    assert narrow.u / 1e5 == pytest.approx(0.092, abs=0.0005)


@pytest.mark.parametrize("freedom", [1, 2, 3, 4.5, 5, 10, 20, 49.5, 50, 1000])
def test_factor_is_the_quantile_of_scipy(freedom: float) -> None:
    share = math.erf(math.sqrt(2))  # coverage of two standard deviations, 95.45 %
    assert student.factor(freedom) == pytest.approx(stats.t.ppf((1 + share) / 2, freedom), rel=1e-7)


@pytest.mark.parametrize(
    ("freedom", "printed"),
    [
        (1, "13.97"),
        (2, "4.53"),
        (3, "3.31"),
        (4, "2.87"),
        (5, "2.65"),
        (10, "2.28"),
        (20, "2.13"),
        (50, "2.05"),
    ],
)
def test_factor_rounds_to_table_g2(freedom: int, printed: str) -> None:
    # JCGM 100:2008, table G.2, column 95.45 %
    assert f"{student.factor(freedom):.2f}" == printed


def test_factor_of_many_degrees_is_two() -> None:
    assert student.factor(math.inf) == 2.0


def test_effective_freedom_is_that_of_gtc() -> None:
    # GTC 1.5.1 by Welch and Satterthwaite (JCGM 100:2008, G.4.1), on a sum of independent quantities
    readings = [
        read("a", "10.0 mbar ± 0.3 mbar", KINDS["pressure_difference"])._replace(freedom=4.0),
        read("b", "20.0 mbar ± 0.2 mbar", KINDS["pressure_difference"])._replace(freedom=9.0),
        read("c", "30.0 mbar ± 0.4 mbar", KINDS["pressure_difference"]),
    ]
    combined = combine([1.0, 2.0, -1.0], readings)
    a, b, c = (GTC.ureal(reading.value, reading.u, reading.freedom) for reading in readings)
    assert combined.freedom == pytest.approx(GTC.dof(a + 2 * b - c), rel=1e-12)
    assert combined.k == student.factor(combined.freedom) > 2


def test_effective_freedom_of_the_guides_own_example() -> None:
    # JCGM 100:2008, G.4.1, example: three inputs of 10, 5 and 15 observations with relative u of 0.25, 0.57 and
    # 0.82 %, multiplied; effective degrees of freedom 19.0 (digits from memory)
    plain = read("x", {"text": "1", "accuracy": "exact"}, KINDS["number"])
    inputs = [(0.25, 9.0), (0.57, 4.0), (0.82, 14.0)]
    readings = [plain._replace(u=u, u_random=u, freedom=freedom) for u, freedom in inputs]
    assert round(combine([1.0, 1.0, 1.0], readings).freedom, 1) == 19.0


def test_a_figure_without_bounds_has_no_uncertainty() -> None:
    reading = read("x", "1.0", KINDS["number"])
    with pytest.raises(NoSolutionError) as caught:
        combine([math.inf], [reading])
    assert str(caught.value) == (
        "Uncertainty: found no finite size; expected readings on which the figure depends smoothly. Check the readings."
    )
