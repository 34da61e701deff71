"""Reference conditions typed with a volume or flow fill the rows of a law, or are asked about; what no row can be."""

from typing import Any

import pytest
from gaswright.errors import NoSolutionError, ReadingError
from gaswright.law import solve

LINE: dict[str, Any] = {"V": "412 L", "p": "7.01 bar absolute", "T": "12.0 °C"}


def test_a_pair_typed_fills_the_rows_of_the_law() -> None:
    typed = solve("reference_volume", "p", {"V": "412 L", "T": "12.0 °C", "V_0": "3 Nm3"})
    own = solve(
        "reference_volume",
        "p",
        {"V": "412 L", "T": "12.0 °C", "V_0": "3 m³", "T_0": "0 °C", "p_0": "101.325 kPa absolute"},
    )
    assert typed.value == pytest.approx(own.value, rel=1e-12)


@pytest.mark.parametrize("decimal", [None, ".", ","])
def test_a_pair_of_the_table_is_read_with_any_decimal_mark(decimal: str | None) -> None:
    readings: dict[str, Any] = {"V": "412 L", "T": "12 °C", "V_0": "3 Nm3"}
    # V_0 p_0 / T_0 = V p / T
    expected = 3 / 0.412 * 101325 * 285.15 / 273.15
    assert solve("reference_volume", "p", readings, decimal=decimal).value == pytest.approx(expected, rel=1e-12)


def test_a_pair_that_differs_from_its_rows_is_asked_about() -> None:
    with pytest.raises(ReadingError) as caught:
        solve(
            "reference_volume",
            "p",
            {"V": "412 L", "T": "12 °C", "V_0": "3 Nm3", "T_0": "15 °C", "p_0": "101.325 kPa absolute"},
        )
    assert str(caught.value) == (
        "V₀, volume at reference conditions: found 3 m³ (0 °C, 101.325 kPa); expected the reference conditions that "
        "stand in their own rows, 15 °C, 101.325 kPa. Correct those rows, or choose their conditions here."
    )
    assert caught.value.offers == ("3 m³ (15 °C, 101.325 kPa)",)


def test_a_pair_is_refused_where_it_is_asked_for() -> None:
    with pytest.raises(ReadingError) as caught:
        solve("reference_volume", "T_0", {**LINE, "V_0": "3 Nm3"})
    assert caught.value.expected == "a reading without reference conditions, because they are asked for"


def test_a_pair_that_plays_no_part_is_said() -> None:
    readings: dict[str, Any] = {"rho_0": "1.165 kg/m³", "q": "30 L/min (20 °C, 1 atm)"}
    assert solve("mass_flow_of_reference", "q_m", readings).warnings == (
        (
            "q, flow at its reference conditions: 30 L/min (20 °C, 1 atm) was taken as it stands; "
            "its reference conditions play no part."
        ),
    )


@pytest.mark.parametrize(
    ("typed", "station", "message"),
    [
        (
            "-1 bar gauge",
            "1 bar",
            "found -1 bar gauge; expected more than zero absolute. Check the number and its sign.",
        ),
        (
            "1 bar vacuum",
            "1 bar",
            "found 1 bar vacuum; expected more than zero absolute. Check the number and its sign.",
        ),
        ("0 bar absolute", None, "found 0 bar absolute; expected more than zero. Check the number and its sign."),
    ],
)
def test_no_pressure_at_all_is_told_beside_its_row(typed: str, station: str | None, message: str) -> None:
    with pytest.raises(ReadingError) as caught:
        solve("boyle", "V_2", {"p_1": typed, "V_1": "1 L", "p_2": "1 bar absolute"}, station_pressure=station)
    assert str(caught.value) == f"p₁, first pressure: {message}"


@pytest.mark.parametrize("value", [float("nan"), float("inf"), 10**400, -(10**400)])
def test_a_number_that_is_none_is_refused(value: float) -> None:
    with pytest.raises(ReadingError) as caught:
        solve("boyle", "V_2", {"p_1": value, "V_1": 1.0, "p_2": 1e5})
    assert caught.value.expected == "a finite value"


def test_readings_that_do_not_fit_together_have_no_answer() -> None:
    # p (V_1 + V_2) = p_1 V_1 + p_2 V_2: 1 bar after joining with as much gas at 8 bar would take less than nothing
    with pytest.raises(NoSolutionError) as caught:
        solve("equalise", "p_2", {"p": 1e5, "p_1": 8e5, "V_1": 1.0, "V_2": 1.0})
    assert str(caught.value) == (
        "p₂, pressure of the second vessel, by Pressure after joining two vessels: found -600000 (SI); "
        "expected a value above zero. Check the readings: they do not fit together."
    )
