"""Figures of the sheets against CoolProp 8.0.0, published rows and trade facts.

Trade facts are common practice without a source; each is bounded by its own arithmetic, and the digits printed are
what is checked. CoolProp works the balance with its own densities.
"""

import json
from typing import Any

import pytest
from CoolProp.CoolProp import PropsSI
from gaswright.browser import answer
from gaswright.sheet import SheetResult, run_sheet

BANK: dict[str, Any] = {
    "gas": "nitrogen",
    "count": "4",
    "V_each": "50 L",
    "pg_start": "200 bar gauge",
    "pg_end": "10 bar gauge",
    "T_gas": "20 °C",
    "p_atm": "1013 mbar",
    "q": "30 L/min (20 °C, 101.325 kPa)",
    "T_ref": "20 °C",
    "p_ref": "101.325 kPa absolute",
}
FLUID = {
    "nitrogen": "Nitrogen",
    "oxygen": "Oxygen",
    "argon": "Argon",
    "methane": "Methane",
    "hydrogen": "Hydrogen",
    "helium": "Helium",
}


def density(gas: str, p: float, T: float) -> float:
    """Density by CoolProp 8.0.0, kg/m³."""
    return float(PropsSI("D", "P", p, "T", T, FLUID[gas]))


def closed(gas: str, bar: float, at: str, hot: str) -> SheetResult:
    """Work locked_in for a gas closed at so many bar absolute, at one temperature, and taken to another."""
    readings = {"gas": gas, "pg_1": f"{bar} bar absolute", "T_1": at, "T_2": hot, "p_atm": "1 bar"}
    return run_sheet("locked_in", {"find": "pg_2", "readings": readings})


def held(gas: str, p_ref: str = "101.325 kPa absolute") -> SheetResult:
    """Work cylinder_receipt for 50 L at 200 bar absolute and 15 °C."""
    readings = {
        "gas": gas,
        "count": "1",
        "V_each": "50 L",
        "pg": "200 bar absolute",
        "T_gas": "15 °C",
        "p_atm": "1013.25 hPa",
        "T_ref": "15 °C",
        "p_ref": p_ref,
    }
    return run_sheet("cylinder_receipt", {"find": "V_ref", "readings": readings})


def test_time_to_changeover_is_the_balance_of_coolprop() -> None:
    result = run_sheet("bank_endurance", {"find": "t", "readings": BANK})
    start, end = density("nitrogen", 201.013e5, 293.15), density("nitrogen", 11.013e5, 293.15)
    minutes = 200 * (start - end) / density("nitrogen", 101325, 293.15) / 30
    assert result.value / 60 == pytest.approx(minutes, rel=1e-9)
    assert 1180 < result.value / 60 < 1187  # the figure the job is accepted by


def test_the_ideal_law_would_promise_1250_minutes() -> None:
    result = run_sheet("bank_endurance", {"find": "t", "readings": BANK})
    # 200 L · 190 bar / (1.01325 bar · 30 L/min), gas and meter both at 20 °C
    assert (result.ideal or 0) / 60 == pytest.approx(200 * 190e5 / (101325 * 30), rel=1e-12)


def test_the_signed_time_is_the_safe_end_rounded_down() -> None:
    response = json.loads(answer(json.dumps({"do": "sheet", "key": "bank_endurance", "find": "t", "readings": BANK})))
    hours, _, minutes = response["figure"]["text"].removesuffix(" min").partition(" h ")
    signed = 60 * int(hours) + int(minutes)
    end = (response["value"] - response["expanded"]) / 60
    assert end - response["expanded"] / 60 / 4 < signed <= end  # a step is at most a quarter of U (1, 2, 5 · U/10)
    assert response["safe"] / 60 == pytest.approx(end, rel=1e-12)


def test_the_time_filled_in_asks_for_four_cylinders_again() -> None:
    time = run_sheet("bank_endurance", {"find": "t", "readings": BANK})
    readings = {name: text for name, text in BANK.items() if name != "count"} | {"t": time.value}
    back = run_sheet("bank_endurance", {"find": "count", "readings": readings})
    assert back.value == pytest.approx(4, abs=1e-9)


def test_oxygen_in_a_50_litre_cylinder() -> None:
    # 10.591 m³ at (15 °C, 101.325 kPa) within 0.006: CoolProp 8.0.0 density balance
    assert held("oxygen").value == pytest.approx(10.591, abs=0.006)


@pytest.mark.parametrize("gas", FLUID)
def test_content_is_the_balance_of_coolprop(gas: str) -> None:
    expected = 0.05 * density(gas, 200e5, 288.15) / density(gas, 101325, 288.15)
    assert held(gas).value == pytest.approx(expected, rel=1e-9)


@pytest.mark.parametrize(
    ("gas", "percent"),
    [("helium", -9), ("hydrogen", -11), ("nitrogen", -5), ("oxygen", 7), ("argon", 7), ("methane", 25)],
)
def test_content_against_litres_times_bar(gas: str, percent: int) -> None:
    # trade fact: 50 L · 200 bar is 10 m³ at 15 °C and 1 bar
    off = (held(gas, "1 bar absolute").value / 10 - 1) * 100
    assert off == pytest.approx(percent, abs=0.5)


@pytest.mark.parametrize(
    ("gas", "rise"),
    [("nitrogen", 0.99), ("oxygen", 1.09), ("argon", 1.07), ("methane", 1.58), ("hydrogen", 0.72), ("helium", 0.69)],
)
def test_rise_per_kelvin_of_a_closed_cylinder(gas: str, rise: float) -> None:
    # trade fact: 200 bar absolute and 15 °C, bar per kelvin at constant volume
    below, above = (closed(gas, 200, "15 °C", f"{hot} °C").value for hot in (14.5, 15.5))
    assert (above - below) / 1e5 == pytest.approx(rise, abs=0.005)


def test_the_ideal_law_says_a_smaller_rise() -> None:
    # 200 bar / 288.15 K = 0.694 bar/K
    below, above = (closed("nitrogen", 200, "15 °C", f"{hot} °C").ideal or 0.0 for hot in (14.5, 15.5))
    assert (above - below) / 1e5 == pytest.approx(0.694, abs=0.0005)


@pytest.mark.parametrize(("gas", "settled"), [("nitrogen", 171), ("oxygen", 169), ("methane", 160), ("helium", 179)])
def test_filled_hot_and_settled(gas: str, settled: float) -> None:
    # trade fact: 200 bar absolute at 50 °C, settled at 15 °C, station pressure 1 bar
    result = closed(gas, 200, "50 °C", "15 °C")
    assert result.value / 1e5 + 1 == pytest.approx(settled, abs=0.5)
    assert (result.ideal or 0) / 1e5 + 1 == pytest.approx(178, abs=0.5)


@pytest.mark.parametrize(("bar", "rise", "width"), [(8.013, 27.3, 0.05), (1.033, 3.5, 0.05)])
def test_drift_of_a_closed_section_per_kelvin(bar: float, rise: float, width: float) -> None:
    # trade fact: 1/T of the absolute pressure at 20 °C: 7 bar gauge and 20 mbar gauge over 1013 mbar
    below, above = (closed("air", bar, "20 °C", f"{hot} °C").ideal or 0.0 for hot in (19.5, 20.5))
    assert (above - below) / 100 == pytest.approx(rise, abs=width)


def test_locked_in_nitrogen_heated_by_50_kelvin() -> None:
    # CoolProp 8.0.0 PropsSI("P", "T", 338.15, "D", 223.187, "Nitrogen"): 249.3 bar, its density being rounded: 0.3 bar
    assert closed("nitrogen", 200, "15 °C", "65 °C").value / 1e5 + 1 == pytest.approx(249.3, abs=0.3)


def test_ideal_endurance_at_one_bar() -> None:
    # 4 · 50 L from 200 to 10 bar gauge at 30 L/min counted at (20 °C, 1 bar): 1266.7 min, amount balance
    readings = {**BANK, "q": "30 L/min", "p_ref": "1 bar absolute"}
    assert (run_sheet("bank_endurance", {"readings": readings}).ideal or 0) / 60 == pytest.approx(1266.7, abs=0.1)
