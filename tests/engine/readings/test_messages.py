"""Every bad reading gives its full message in four parts, and offers where it has more than one meaning."""

from typing import Any

import pytest
from gaswright import instrument
from gaswright.counting import questioned, to_reference
from gaswright.errors import ReadingError
from gaswright.reading import read
from gaswright.tables import KINDS

TOOLS: dict[str, dict[str, object]] = {
    "G-17": {"name": "G-17", "accuracy": "class 1.6", "span": "250 bar", "resolution": "5 bar"},
    "T-3": {"name": "T-3", "accuracy": "± 0.5 °C", "span": "−20 to 60 °C"},
    "X-1": {"name": "X-1", "accuracy": ""},
}
DIGITS = "expected a number. Type digits with a decimal comma or point, such as 12.5."
UNIT = "Choose one from the list beside the field."

# Reading, kind, message, offers.
BAD: list[tuple[Any, str, str, tuple[str, ...]]] = [
    ("", "volume", "found nothing; expected a reading of volume. Type the reading, or ask for this row.", ()),
    (
        {"text": None},
        "volume",
        "found nothing; expected a reading of volume. Type the reading, or ask for this row.",
        (),
    ),
    ("abc", "volume", f"found 'abc'; {DIGITS}", ()),
    ("nan", "volume", f"found 'nan'; {DIGITS}", ()),
    ("inf bar", "absolute_pressure", f"found 'inf bar'; {DIGITS}", ()),
    ("4 50 L", "volume", f"found '4 50'; {DIGITS}", ()),
    (
        "1.2.3 L",
        "volume",
        ("found '1.2.3'; expected digits grouped in threes and one decimal mark. Type the number without grouping."),
        (),
    ),
    (
        "1e400 bar",
        "absolute_pressure",
        "found '1e400'; expected a number between −1e+40 and 1e+40. Check the power of ten.",
        (),
    ),
    (
        "1e-290 bar",
        "absolute_pressure",
        (
            "found 1e-290 bar; expected absolute pressure between 1e-14 bar and 10000 bar. "
            "Check the number and its unit."
        ),
        (),
    ),
    (
        "1,234 bar",
        "absolute_pressure",
        ("found '1,234'; expected one meaning. Is the comma a decimal mark or does it group thousands?"),
        ("1.234 bar", "1234 bar"),
    ),
    ("12", "volume", "found 12 without a unit; expected volume with its unit. Add the unit, such as 12 L.", ()),
    (
        "5 bar",
        "volume",
        (
            "found bar (pressure); expected a unit of volume such as L, m³, mL. "
            "Choose another unit, or check which row this is."
        ),
        (),
    ),
    ("5 furlong", "length", f"found 'furlong'; expected a unit of length such as m, mm, cm. {UNIT}", ()),
    (
        "5 L gauge",
        "volume",
        (
            "found L with the word gauge; expected a unit of volume such as L, m³, mL. "
            "Leave out gauge: only a pressure is counted so."
        ),
        (),
    ),
    (
        "-300 °C",
        "absolute_temperature",
        (
            "found -300 °C; expected temperature between absolute zero, −273.15 °C, and "
            "5726.85 °C. Check the number and its unit."
        ),
        (),
    ),
    (
        "-5 bar absolute",
        "absolute_pressure",
        ("found -5 bar; expected absolute pressure between 1e-14 bar and 10000 bar. Check the number and its unit."),
        (),
    ),
    (
        "2 psid",
        "absolute_pressure",
        (
            "found 2 psi difference; expected absolute pressure, counted as gauge, absolute or "
            "vacuum. Check which pressure was read."
        ),
        (),
    ),
    ("50 gal", "volume", "found 'gal'; expected one meaning. Which unit is meant?", ("50 US gal", "50 imp gal")),
    ("2 mpa", "absolute_pressure", "found 'mpa'; expected one meaning. Which unit is meant?", ("2 MPa", "2 mPa")),
    (
        "100 scf/min",
        "reference_flow",
        (
            "found 'scf/min'; expected a unit with its reference conditions. "
            "Which temperature and pressure does scf count at?"
        ),
        ("100 ft³/min (60 °F, 14.696 psi)", "100 ft³/min (60 °F, 14.73 psi)", "100 ft³/min (70 °F, 14.696 psi)"),
    ),
    (
        "30 L/min (20 °C, 101,325 kPa)",
        "reference_flow",
        ("found '101,325'; expected one meaning. Is the comma a decimal mark or does it group thousands?"),
        ("30 L/min (20 °C, 101.325 kPa)", "30 L/min (20 °C, 101325 kPa)"),
    ),
    (
        "30 Nm³/h (20 °C, 1 atm)",
        "reference_flow",
        (
            "found Nm³/h with the pair (20 °C, 1 atm); expected one pair: "
            "Nm³/h means (0 °C, 101.325 kPa). Which reference conditions are meant?"
        ),
        ("30 m³/h (0 °C, 101.325 kPa)", "30 m³/h (20 °C, 1 atm)"),
    ),
    (
        {"text": "20 psi", "unit": "bar"},
        "gauge_pressure",
        ("found 20 psi in a field set to bar; expected one unit. Which unit was read?"),
        ("20 psi", "20 bar"),
    ),
    (
        {"text": "20 barg", "reference": "absolute"},
        "absolute_pressure",
        ("found 20 barg in a field set to absolute; expected one way of counting. Which was read?"),
        ("20 bar gauge", "20 bar absolute"),
    ),
    (
        {"text": "20", "unit": "bar", "reference": "sideways"},
        "gauge_pressure",
        ("found 'sideways'; expected gauge, absolute or vacuum. Choose how the pressure is counted."),
        (),
    ),
    (
        "200 ± x bar",
        "gauge_pressure",
        ("found '200 ± x bar'; expected a limit behind ±. Type it as 200 ± 2 bar, or leave it out."),
        (),
    ),
    (
        {"text": "20", "unit": "bar", "accuracy": "good"},
        "gauge_pressure",
        (
            "found 'good'; expected an accuracy such as "
            "class 1.6 of 250 bar, ± 1 %, ± 0.5 °C or exact. Type it as printed on the instrument."
        ),
        (),
    ),
    (
        {"text": "20", "unit": "bar", "accuracy": "class 1.6"},
        "gauge_pressure",
        ("found class 1.6 without its span; expected the span it is counted on. Add it, such as class 1.6 of 250 bar."),
        (),
    ),
    (
        {"text": "20", "unit": "bar", "instrument": "Z-9"},
        "gauge_pressure",
        ("found the instrument 'Z-9'; expected one of the list. Choose it again or add it to the list."),
        (),
    ),
    (float("nan"), "volume", "found nan; expected a finite value. Give the SI value.", ()),
    (True, "volume", "found True; expected a reading as text, such as 200 bar gauge. Type the reading.", ()),
    (["1 L"], "volume", "found ['1 L']; expected a reading as text, such as 200 bar gauge. Type the reading.", ()),
    (
        "1" * 200,
        "volume",
        (
            "found '11111111111111111111' and 180 more signs; expected a number with its unit. "
            "Type digits with a decimal comma or point, such as 12.5."
        ),
        (),
    ),
]


@pytest.mark.parametrize(("raw", "kind", "message", "offers"), BAD, ids=[repr(row[0])[:30] for row in BAD])
def test_bad_reading(raw: Any, kind: str, message: str, offers: tuple[str, ...]) -> None:
    with pytest.raises(ReadingError) as caught:
        read("The row", raw, KINDS[kind], instruments=TOOLS)
    where = "The row, reference pressure" if "101,325" in str(raw) else "The row"
    assert str(caught.value) == f"{where}: {message}"
    assert caught.value.offers == offers
    assert caught.value.question == bool(offers)


@pytest.mark.parametrize(("raw", "kind", "offers"), [(row[0], row[1], row[3]) for row in BAD if row[3]])
def test_every_offer_reads(raw: Any, kind: str, offers: tuple[str, ...]) -> None:
    chosen = (
        {key: value for key, value in raw.items() if key not in ("unit", "reference")} if isinstance(raw, dict) else {}
    )
    values = [read("The row", {**chosen, "text": offer}, KINDS[kind]) for offer in offers]
    assert len({(value.value, value.reference, value.conditions) for value in values}) == len(offers)


def test_instrument_of_another_kind() -> None:
    raw = {"text": "20", "unit": "°C", "instrument": "G-17"}
    with pytest.raises(ReadingError) as caught:
        read("The row", raw, KINDS["absolute_temperature"], instruments=TOOLS)
    assert str(caught.value) == (
        "The row, G-17: found bar (pressure); expected a unit of the kind that was read. "
        "Choose another unit, or check which row this is."
    )


def test_instrument_without_accuracy() -> None:
    with pytest.raises(ReadingError) as caught:
        read("The row", {"text": "20", "unit": "bar", "instrument": "X-1"}, KINDS["gauge_pressure"], instruments=TOOLS)
    assert str(caught.value) == (
        "The row, X-1: found X-1 without an accuracy; expected its class or limit. "
        "Add it to the instrument, such as class 1.6."
    )


def test_gauge_below_no_pressure() -> None:
    station = read("Station pressure", "1013 mbar", KINDS["station_pressure"])
    with pytest.raises(ReadingError) as caught:
        to_reference(read("Pressure now", "-1.2 bar gauge", KINDS["gauge_pressure"]), "absolute", station)
    assert str(caught.value) == (
        "Pressure now: found -1.2 bar gauge; expected no lower than −1013 mbar gauge, which is no pressure at all. "
        "Read the gauge and the station pressure again."
    )


def test_vacuum_beyond_no_pressure() -> None:
    station = read("Station pressure", "1013 mbar", KINDS["station_pressure"])
    with pytest.raises(ReadingError) as caught:
        to_reference(read("Vacuum", "31 inHg vacuum", KINDS["vacuum_pressure"]), "absolute", station)
    assert str(caught.value) == (
        "Vacuum: found 31 inHg vacuum; expected no more than 1013 mbar vacuum, which is no pressure at all. "
        "Read the gauge and the station pressure again."
    )


def test_gauge_without_station_pressure() -> None:
    with pytest.raises(ReadingError) as caught:
        to_reference(read("Pressure now", "200 barg", KINDS["gauge_pressure"]), "absolute", None)
    assert str(caught.value) == (
        "Pressure now: found 200 bar gauge; expected the station pressure to count it from. "
        "Give the station pressure, or the absolute pressure."
    )


def test_off_the_scale() -> None:
    raw = {"text": "260", "unit": "bar", "instrument": "G-17"}
    with pytest.raises(ReadingError) as caught:
        questioned(read("Pressure now", raw, KINDS["gauge_pressure"], instruments=TOOLS))
    assert str(caught.value) == (
        "Pressure now: found 260 bar gauge; expected a reading on the scale of G-17. "
        "Choose the instrument that was read, or read again."
    )


def test_below_a_tenth_of_the_span_is_questioned() -> None:
    low, high = (
        read("p", {"text": text, "unit": "bar", "instrument": "G-17"}, KINDS["gauge_pressure"], instruments=TOOLS)
        for text in ("24", "26")
    )
    assert questioned(low) == (
        "p: 24 bar gauge is below a tenth of the span. A gauge of smaller span reads it better.",
    )
    assert questioned(high) == ()


def test_a_thermometer_has_no_tenth_of_its_span() -> None:
    def take(text: str) -> tuple[str, ...]:
        raw = {"text": text, "unit": "°C", "instrument": "T-3"}
        return questioned(read("T", raw, KINDS["absolute_temperature"], instruments=TOOLS))

    assert take("0") == take("60") == take("-20") == ()
    with pytest.raises(ReadingError, match="a reading on the scale of T-3"):
        take("61")


def test_overdue_instrument() -> None:
    tool: dict[str, object] = {"name": "G-17", "due": "2027-03-01"}
    assert instrument.overdue(tool, "2027-03-01") == ()
    assert instrument.overdue(tool, "2027-03-02") == (
        "G-17 was due on 2027-03-01. Use one that is in date, or have it checked.",
    )


def test_bare_pressure_is_taken_as_absolute_and_says_so() -> None:
    assert read("Pressure", "5 bar", KINDS["absolute_pressure"]).warnings == (
        "Pressure: bar was taken as absolute. Write gauge or absolute to be sure.",
    )
    assert read("Pressure", "5 bara", KINDS["absolute_pressure"]).warnings == ()
