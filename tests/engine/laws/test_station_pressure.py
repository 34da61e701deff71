"""The station pressure, one error that all readings counted from it share, against uncertainties 3.2.3."""

import math
from typing import Any

import pytest
from gaswright.errors import ReadingError
from gaswright.law import solve
from gaswright.sheet import run_sheet
from uncertainties import ufloat

STATION = {"text": "996.4 hPa", "accuracy": "± 20 hPa"}
# One limit of error in words, its half width in Pa, and what is exact.
TYPED: list[tuple[str, str, str, float, float]] = [
    ("gauge and gauge", "1.20 bar gauge ± 0.05 bar", "3.40 bar gauge ± 0.02 bar", 1, 1),
    ("gauge and absolute", "1.20 bar gauge ± 0.05 bar", "3.40 bar absolute ± 0.02 bar", 1, 0),
    ("vacuum and gauge", "0.40 bar vacuum ± 0.05 bar", "3.40 bar gauge ± 0.02 bar", -1, 1),
    ("absolute and absolute", "1.20 bar absolute ± 0.05 bar", "3.40 bar absolute ± 0.02 bar", 0, 0),
]


def _absolute(text: str, way: float, station: Any) -> Any:
    """Give the absolute pressure of the typed text as a quantity of the package."""
    number, _, limit = text.partition("±")
    reading = ufloat(float(number.split()[0]) * 1e5, float(limit.split()[0]) * 1e5 / math.sqrt(3))
    if way == 0:
        return reading
    return station + reading if way > 0 else station - reading


def test_a_station_pressure_counted_from_itself_is_refused() -> None:
    readings: dict[str, Any] = {"p_1": "1 bar gauge", "V_1": "1 L", "p_2": "2 bar gauge"}
    with pytest.raises(ReadingError) as caught:
        solve("boyle", "V_2", readings, station_pressure="30 kPa gauge")
    assert str(caught.value) == (
        "station pressure: found 30 kPa gauge; expected an absolute pressure. Read the barometer at the place."
    )
    with pytest.raises(ReadingError) as caught:
        solve("gauge_pressure", "p_abs", {"p_gauge": "1 bar gauge", "p_atm": "30 kPa gauge"})
    assert caught.value.expected == "an absolute pressure"


@pytest.mark.parametrize(
    ("first", "second", "way_1", "way_2"), [row[1:] for row in TYPED], ids=[row[0] for row in TYPED]
)
def test_a_law_shares_the_station_pressure(first: str, second: str, way_1: float, way_2: float) -> None:
    station = ufloat(99640.0, 2000.0 / math.sqrt(3))
    volume = ufloat(0.048, 0.0005 / math.sqrt(3))
    expected = _absolute(first, way_1, station) * volume / _absolute(second, way_2, station)
    readings: dict[str, Any] = {"p_1": first, "V_1": "48 L ± 0.5 L", "p_2": second}
    result = solve("boyle", "V_2", readings, station_pressure=STATION)
    assert result.value == pytest.approx(expected.nominal_value, rel=1e-12)
    assert result.u == pytest.approx(expected.std_dev, rel=1e-12)


def test_a_gauge_pressure_found_carries_the_station_pressure() -> None:
    # the difference of two independent pressures
    readings: dict[str, Any] = {"p_abs": "5.00 bar absolute ± 0.05 bar", "p_atm": STATION}
    result = solve("gauge_pressure", "p_gauge", readings)
    assert result.u == pytest.approx(math.hypot(5000, 2000) / math.sqrt(3), rel=1e-12)


BANK: dict[str, Any] = {
    "gas": "nitrogen",
    "count": "2",
    "V_each": {"text": "50 L", "accuracy": "exact"},
    "T_gas": 288.15,
    "T_ref": 288.15,
    "p_ref": 101325.0,
}


@pytest.mark.parametrize(("typed", "depends"), [("5 bar gauge", 1.0), ("5.9964 bar absolute", 0.0)])
def test_a_sheet_counts_it_only_where_it_was_added(typed: str, depends: float) -> None:
    def held(station: Any) -> Any:
        readings = BANK | {"pg": {"text": typed, "accuracy": "exact"}, "p_atm": station}
        return run_sheet("cylinder_receipt", {"find": "V_ref", "readings": readings})

    known, unsure = held(99640.0), held(STATION)
    slope = (held(99740.0).value - held(99540.0).value) / 200.0
    assert unsure.value == pytest.approx(known.value, rel=1e-12)
    added = math.sqrt(max(0.0, unsure.u**2 - known.u**2))
    assert added == pytest.approx(abs(slope) * 2000.0 / math.sqrt(3), rel=1e-4, abs=1e-9)
    assert (added > 0.001) == bool(depends)


def test_a_pressure_found_is_counted_back_from_the_same_station() -> None:
    # closing and hottest pressure are both gauge: at one temperature the station pressure cancels
    readings = {"gas": "helium", "pg_1": 5e5, "T_1": 288.15, "T_2": 288.15, "p_atm": STATION}
    assert run_sheet("locked_in", {"find": "pg_2", "readings": readings}).value == pytest.approx(5e5, rel=1e-9)
    warm = run_sheet("locked_in", {"find": "pg_2", "readings": {**readings, "T_2": 316.965}})
    exact = run_sheet("locked_in", {"find": "pg_2", "readings": {**readings, "T_2": 316.965, "p_atm": 99640.0}})
    # p_2 = 1.1 (p_1 + p_atm) - p_atm for an ideal gas: a tenth of the station's u, within what helium is not ideal
    added = math.sqrt(warm.u**2 - exact.u**2)
    assert added == pytest.approx(0.1 * 2000.0 / math.sqrt(3), rel=0.02)
