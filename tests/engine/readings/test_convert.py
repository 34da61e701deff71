"""The converter against printed factors and pint, pressures counted from the station, and its messages.

Printed factors are those of NIST SP 811 (2008), appendix B.8, seven digits, from memory; pint 0.26.2 holds its own.
"""

import json
from typing import Any

import pint
import pytest
from gaswright.answer_convert import NEEDS_STATION, SAME_PAIR, units_of
from gaswright.browser import answer
from gaswright.tables import KINDS

STATION = {"text": "1000", "unit": "hPa", "reference": "absolute"}
REGISTRY = pint.UnitRegistry()

# Kind, unit, SI unit of the line, factor as printed in SP 811.
PRINTED = (
    ("absolute_pressure", "psi", "Pa", "6.894757E+03"),
    ("absolute_pressure", "torr", "Pa", "1.333224E+02"),
    ("absolute_pressure", "inHg", "Pa", "3.386389E+03"),
    ("absolute_pressure", "inH2O", "Pa", "2.490889E+02"),
    ("absolute_pressure", "kgf/cm²", "Pa", "9.80665E+04"),
    ("absolute_pressure", "atm", "Pa", "1.01325E+05"),
    ("volume", "ft³", "m³", "2.831685E-02"),
    ("volume", "US gal", "m³", "3.785412E-03"),
    ("flow", "ft³/min", "m³/s", "4.719474E-04"),
    ("mass", "lb", "kg", "4.535924E-01"),
    ("mass", "oz", "kg", "2.834952E-02"),
    ("density", "lb/ft³", "kg/m³", "1.601846E+01"),
    ("length", "ft", "m", "3.048E-01"),
    ("force", "lbf", "N", "4.448222E+00"),
    ("energy", "BTU", "J", "1.055056E+03"),
    ("viscosity", "cP", "Pa·s", "1.0E-03"),
)

# Kind, reading in a unit, unit of the line, the same in pint's words.
BY_PINT = (
    ("absolute_temperature", "-40", "°F", "°C", "degF", "degC"),
    ("absolute_temperature", "72.5", "°F", "K", "degF", "kelvin"),
    ("absolute_temperature", "15", "°C", "°R", "degC", "degR"),
    ("temperature_difference", "10", "Δ°F", "K", "delta_degF", "kelvin"),
    ("volume", "50", "L", "in³", "liter", "inch ** 3"),
    ("mass_flow", "3.2", "lb/h", "g/min", "pound / hour", "gram / minute"),
    ("speed", "88", "km/h", "ft/s", "kilometer / hour", "foot / second"),
    ("leak_rate", "0.002", "mbar·L/s", "Pa·m³/s", "millibar * liter / second", "pascal * meter ** 3 / second"),
    ("absolute_pressure", "0.35", "torr", "mbar", "torr", "millibar"),
    ("fraction", "19.5", "%", "ppm", "percent", "ppm"),
    ("angle", "30", "°", "rad", "degree", "radian"),
)


def convert(kind: str, reading: object, **more: Any) -> dict[str, Any]:
    """Ask as the page asks."""
    rows = {"reading": reading, **more.pop("rows", {})}
    response = json.loads(answer(json.dumps({"id": 1, "do": "convert", "kind": kind, "rows": rows, **more})))
    assert response.pop("id") == 1
    return dict(response)


def number(text: str) -> float:
    """Give the number that a line shows."""
    head, times, power = text.replace("\u202f", "").replace("−", "-").replace(",", ".").partition(" × 10")
    return float(f"{head}e{power.translate(str.maketrans('⁰¹²³⁴⁵⁶⁷⁸⁹⁻', '0123456789-'))}" if times else head)


def line(response: dict[str, Any], unit: str) -> dict[str, str]:
    """Give the cells of one unit by the title of their column."""
    (cells,) = [cells for cells in response["lines"] if cells[0] == unit]
    return dict(zip(response["head"], cells, strict=True))


@pytest.mark.parametrize(("kind", "unit", "si", "printed"), PRINTED, ids=[f"{unit}" for _, unit, _, _ in PRINTED])
def test_one_of_each_is_the_printed_factor(kind: str, unit: str, si: str, printed: str) -> None:
    """Half a unit in the last printed place."""
    response = convert(kind, {"text": "1", "unit": unit})
    column = "absolute" if kind == "absolute_pressure" else "Reading"
    digits, power = printed.split("E")
    half = 0.5 * 10 ** (int(power) - len(digits.partition(".")[2]))
    found = convert(kind, {"text": "1", "unit": unit})["lines"]
    assert len(found) == len({cells[0] for cells in found}) == len(units_of(KINDS[kind]))
    assert number(line(response, si)[column]) == pytest.approx(float(printed), abs=half)


@pytest.mark.parametrize(
    ("kind", "text", "unit", "other", "given", "wanted"), BY_PINT, ids=[f"{a[2]}-{a[3]}" for a in BY_PINT]
)
def test_lines_agree_with_pint(kind: str, text: str, unit: str, other: str, given: str, wanted: str) -> None:  # noqa: PLR0917 - a row of the table
    """Seven digits are shown."""
    response = convert(kind, {"text": text, "unit": unit})
    expected = REGISTRY.Quantity(float(text), given).to(wanted).magnitude
    shown = line(response, other)
    assert number(shown.get("absolute") or shown["Reading"]) == pytest.approx(expected, rel=1e-6)
    assert response["state"] == "answer"


def test_every_kind_shows_its_own_reading_again() -> None:
    """Every unit that is shown can be typed, and comes back as it was typed."""
    for key in ("absolute_temperature", "temperature_difference", "volume", "flow", "viscosity", "fraction"):
        for unit in units_of(KINDS[key]):
            cells = line(
                convert(key, {"text": "0.5" if key in ("fraction", "viscosity") else "25", "unit": unit}), unit
            )
            assert cells["Reading"] in ("25", "0.5")


def test_a_gauge_pressure_is_counted_from_the_station() -> None:
    """12.4 bar gauge over 1000 hPa is 13.4 bar; a gauge below zero is also a vacuum."""
    above = convert(
        "absolute_pressure", {"text": "12.4", "unit": "bar", "reference": "gauge"}, rows={"p_station": STATION}
    )
    assert line(above, "bar") == {"Unit": "bar", "absolute": "13.4", "gauge": "12.4"}
    assert line(above, "kPa") == {"Unit": "kPa", "absolute": "1340", "gauge": "1240"}
    below = convert(
        "absolute_pressure", {"text": "-250", "unit": "mbar", "reference": "gauge"}, rows={"p_station": STATION}
    )
    assert line(below, "mbar") == {"Unit": "mbar", "absolute": "750", "gauge": "−250", "vacuum": "250"}
    drawn = convert(
        "absolute_pressure", {"text": "250", "unit": "mbar", "reference": "vacuum"}, rows={"p_station": STATION}
    )
    assert drawn["lines"] == below["lines"]


def test_without_the_station_only_the_way_it_was_read() -> None:
    """Nothing is assumed about the barometer."""
    response = convert("absolute_pressure", {"text": "3", "unit": "bar", "reference": "gauge"})
    assert response["head"] == ["Unit", "gauge"]
    assert response["says"] == NEEDS_STATION
    assert line(response, "mbar")["gauge"] == "3000"


def test_a_difference_needs_no_station_and_may_be_negative() -> None:
    """The station is passed over where a difference was read."""
    response = convert("absolute_pressure", {"text": "-2,5", "unit": "mbar", "reference": "difference"}, decimal=",")
    assert line(response, "Pa") == {"Unit": "Pa", "difference": "−250"}
    assert line(response, "kPa")["difference"] == "−0,25"
    assert not response["says"]


def test_decimal_comma_is_read_and_shown() -> None:
    """The page's mark, once chosen, is that of the figures too."""
    response = convert("volume", {"text": "1,5", "unit": "L"}, decimal=",")
    assert line(response, "m³")["Reading"] == "0,0015"


def test_reference_conditions_stay_as_read() -> None:
    """A volume at a pair keeps it, and the page says so."""
    response = convert("volume", "2 Nm³")
    assert response["says"] == SAME_PAIR
    assert response["label"] == "2 m³ (0 °C, 101.325 kPa) is"
    assert line(response, "L")["Reading"] == "2000"


BAD = (
    (
        "volume",
        "abc L",
        "error",
        "Found 'abc L'; expected a number. Type digits with a decimal comma or point, such as 12.5.",
    ),
    (
        "volume",
        "12 bar",
        "error",
        (
            "Found bar (pressure); expected a unit of volume such as L, m³, mL. "
            "Choose another unit, or check which row this is."
        ),
    ),
    (
        "absolute_temperature",
        "-300 °C",
        "error",
        (
            "Found -300 °C; expected temperature between absolute zero, −273.15 °C, and 5726.85 °C. "
            "Check the number and its unit."
        ),
    ),
    (
        "volume",
        "1,234 L",
        "question",
        "Found '1,234'; expected one meaning. Is the comma a decimal mark or does it group thousands?",
    ),
    (
        "absolute_pressure",
        "-1.2 bar gauge",
        "error",
        (
            "Found -1.2 bar gauge; expected no lower than −1000 hPa gauge, which is no pressure at all. "
            "Read the gauge and the station pressure again."
        ),
    ),
)


@pytest.mark.parametrize(("kind", "typed", "state", "says"), BAD, ids=[typed for _, typed, _, _ in BAD])
def test_bad_readings_are_told_in_four_parts(kind: str, typed: str, state: str, says: str) -> None:
    """No line is shown beside a reading that cannot be taken."""
    response = convert(kind, typed, rows={"p_station": STATION})
    assert (response["state"], response["lines"]) == ("incomplete", [])
    assert (response["rows"]["reading"]["state"], response["rows"]["reading"]["says"]) == (state, says)


def test_a_bad_station_pressure_stands_at_its_own_row() -> None:
    """The reading itself is fine."""
    response = convert("absolute_pressure", "3 bar gauge", rows={"p_station": "30 kPa gauge"})
    assert response["state"] == "incomplete"
    assert response["rows"]["reading"]["state"] == "ok"
    assert response["rows"]["p_station"]["says"] == (
        "Found 30 kPa gauge; expected an absolute pressure. Read the barometer at the place."
    )


def test_nothing_typed_is_empty() -> None:
    """No error before anything was typed."""
    assert convert("volume", {"text": " "})["state"] == "empty"


@pytest.mark.parametrize("kind", ["", "volumes", "x" * 200])
def test_an_unknown_kind_is_refused(kind: str) -> None:
    """A page of another copy may ask so."""
    response = convert(kind, "1 L")
    assert response["state"] == "refused"
    assert response["refusal"] == (
        f"request, kind: found {kind[:40]!r}; expected a kind of quantity, such as volume. Load the page again."
    )
