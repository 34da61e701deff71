"""What a sheet says about a reading that cannot be, beside its row, in full; and what it refuses as a whole."""

from typing import Any

import pytest

from tests.engine.sheets.asking import ask, bank

CHECK = "Check the number and its unit."
DIGITS = "expected a number. Type digits with a decimal comma or point, such as 12.5."
# Row, what was typed, state, what is said, offers.
ROWS: list[tuple[str, Any, str, str, tuple[str, ...]]] = [
    ("pg_start", "abc", "error", f"Found 'abc'; {DIGITS}", ()),
    ("pg_start", "nan bar", "error", f"Found 'nan bar'; {DIGITS}", ()),
    ("pg_start", "inf bar", "error", f"Found 'inf bar'; {DIGITS}", ()),
    ("pg_start", "\u202e200 bar", "error", f"Found '\\u202e200 bar'; {DIGITS}", ()),
    (
        "pg_start",
        "9" * 10_000,
        "error",
        (
            "Found '99999999999999999999' and 9980 more signs; expected a number with its unit. "
            "Type digits with a decimal comma or point, such as 12.5."
        ),
        (),
    ),
    (
        "pg_start",
        "1e400 bar",
        "error",
        "Found '1e400'; expected a number between −1e+40 and 1e+40. Check the power of ten.",
        (),
    ),
    (
        "pg_start",
        "1,234 psi",
        "question",
        "Found '1,234'; expected one meaning. Is the comma a decimal mark or does it group thousands?",
        ("1.234 psi", "1234 psi"),
    ),
    (
        "pg_start",
        {"text": "220 bar", "unit": "psi", "reference": "gauge"},
        "question",
        "Found 220 bar in a field set to psi; expected one unit. Which unit was read?",
        ("220 bar", "220 psi"),
    ),
    (
        "pg_start",
        "-1.2 bar gauge",
        "error",
        (
            "Found -1.2 bar gauge; expected no lower than −1013 mbar gauge, which is no pressure at all. "
            "Read the gauge and the station pressure again."
        ),
        (),
    ),
    (
        "pg_start",
        "1200 bar gauge",
        "error",
        f"Found 1200 bar gauge; expected between −20 bar and 1000 bar gauge. {CHECK}",
        (),
    ),
    (
        "pg_start",
        "2000 bar absolute",
        "error",
        f"Found 2000 bar absolute; expected between −20 bar and 1000 bar gauge. {CHECK}",
        (),
    ),
    (
        "pg_start",
        "5 L",
        "error",
        (
            "Found L (volume); expected a unit of gauge pressure such as bar, kPa, MPa. "
            "Choose another unit, or check which row this is."
        ),
        (),
    ),
    (
        "pg_start",
        "200",
        "error",
        "Found 200 without a unit; expected gauge pressure with its unit. Add the unit, such as 200 bar.",
        (),
    ),
    (
        "T_gas",
        "-300 °C",
        "error",
        f"Found -300 °C; expected temperature between absolute zero, −273.15 °C, and 5726.85 °C. {CHECK}",
        (),
    ),
    ("T_gas", "-190 °C", "error", f"Found -190 °C; expected between −123.15 °C and 226.85 °C. {CHECK}", ()),
    ("V_each", "0 L", "error", f"Found 0 L; expected between 0.01 L and 10\u202f000\u202f000 L. {CHECK}", ()),
    ("count", "4.5", "error", "Found 4.5; expected a whole number. Count again.", ()),
    (
        "q",
        "30 scfm",
        "question",
        (
            "Found 'scfm'; expected a unit with its reference conditions. "
            "Which temperature and pressure does scfm count at?"
        ),
        (
            "30 ft³/min (60 °F, 14.696 psi)",
            "30 ft³/min (60 °F, 14.73 psi)",
            "30 ft³/min (70 °F, 14.696 psi)",
        ),
    ),
    (
        "q",
        "30 L/min (0 °C, 101.325 kPa)",
        "question",
        (
            "Found 30 L/min (0 °C, 101.325 kPa); expected the reference conditions that stand in their own rows, "
            "20 °C, 101.325 kPa. Correct those rows, or choose their conditions here."
        ),
        ("30 L/min (20 °C, 101.325 kPa)",),
    ),
    (
        "start",
        "25:99",
        "error",
        "Found '25:99'; expected a time of day such as 07:34. Type hours and minutes.",
        (),
    ),
    (
        "rho_start",
        "1 kg/m³",
        "error",
        (
            "Found the row 'rho_start'; expected one of gas, count, V_each, pg_start, pg_end, T_gas, p_atm, q, T_ref, "
            "p_ref, t, t_needed, start. Correct the name."
        ),
        (),
    ),
]


@pytest.mark.parametrize(
    ("row", "typed", "state", "says", "offers"), ROWS, ids=[f"{each[0]}-{str(each[1])[:24]!a}" for each in ROWS]
)
def test_a_bad_reading_is_told_beside_its_row(
    row: str, typed: Any, state: str, says: str, offers: tuple[str, ...]
) -> None:
    response = bank({row: typed})
    assert response["rows"][row]["says"] == says
    assert response["rows"][row]["state"] == state
    assert tuple(offer["text"] for offer in response["rows"][row]["offers"]) == offers
    assert (response["state"], response["figure"], response["value"]) == ("incomplete", None, None)
    assert all(entry["state"] in ("ok", "find", "empty") for name, entry in response["rows"].items() if name != row)


@pytest.mark.parametrize("typed", ["1,234 psi", "30 scfm"])
def test_every_offer_gives_an_answer_when_taken(typed: str) -> None:
    row = "q" if "scfm" in typed else "pg_start"
    asked = bank({row: typed, "T_ref": None, "p_ref": None, "pg_end": "0.1 psi gauge", "q": "3 Nm3/h"} | {row: typed})
    offers = [offer["text"] for offer in asked["rows"][row]["offers"]]
    assert len(offers) >= 2
    for offer in offers:
        taken = bank({"T_ref": None, "p_ref": None, "pg_end": "0.1 psi gauge", "q": "3 Nm3/h"} | {row: offer})
        assert taken["state"] in ("answer", "warning"), taken["rows"]


REFUSED: list[tuple[dict[str, Any], str]] = [
    (
        {"gas": "carbon dioxide", "pg_start": "60 bar gauge", "pg_end": "5 bar gauge"},
        (
            "Carbon dioxide: found 61.013 bar absolute at 20.00 °C, where it is a liquid; expected a gas: below "
            "57.2905 bar absolute, its saturation pressure at 20.00 °C. "
            "Weigh it instead, or enter a lower pressure or a higher temperature."
        ),
    ),
    (
        {"gas": "oxygen", "pg_start": "950 bar gauge"},
        (
            "pressure of Oxygen: found 951.013 bar absolute; expected at most 800 bar absolute, the range of its "
            "equation of state. Check the pressure and its unit."
        ),
    ),
    (
        {"pg_end": "210 bar gauge"},
        (
            "Pressure now: found 200 bar gauge; expected more than the changeover pressure 210 bar gauge. "
            "The bank is already at changeover: change over, or read both again."
        ),
    ),
    (
        {"q": "1e-9 L/min"},
        (
            "Time to changeover: found 3.5509 × 10¹³ min; expected between 0.0166667 min and 16\u202f666\u202f700 min. "
            "Check the readings and their units."
        ),
    ),
]


@pytest.mark.parametrize(
    ("changes", "refusal"), REFUSED, ids=["liquid", "above-the-equation", "already-at-changeover", "too-long"]
)
def test_what_has_no_figure_is_refused(changes: dict[str, Any], refusal: str) -> None:
    # 57.2905 bar: saturation pressure of carbon dioxide at 20 °C, CoolProp 8.0.0 PropsSI("P", "T", 293.15, "Q", 1, ...)
    response = bank(changes)
    assert (response["state"], response["refusal"]) == ("refused", refusal)
    assert (response["figure"], response["value"], response["verdict"]) == (None, None, None)


@pytest.mark.parametrize(
    ("key", "changes", "said"),
    [
        ("bank_endurance", {"pg_end": "0 bar gauge"}, "No changeover pressure is kept back."),
        (
            "bank_endurance",
            {"V_each": "600 L"},
            "600 L is large for one cylinder. Is it the total of the pack? Then the count is 1.",
        ),
        (
            "cylinder_receipt",
            {"t_since": "2 h"},
            "Filled less than 4 h ago: the gas may still be hot. Measure its temperature on the cylinder wall.",
        ),
        (
            "cylinder_receipt",
            {"gas": "CO2", "pg": "100 bar gauge", "T_gas": "40 °C"},
            (
                "Carbon dioxide is above its critical point (31 °C and 74 bar): a small change of temperature moves "
                "the pressure much. Weigh it to be sure."
            ),
        ),
        (
            "locked_in",
            {"pg_1": "3 ± 5 bar gauge", "T_2": "13 °C"},
            "",
        ),
        (
            "bank_endurance",
            {"pg_start": "12 ± 5 bar gauge", "pg_end": "10 ± 5 bar gauge"},
            "The uncertainty is as large as the figure: with these instruments nothing can be promised.",
        ),
    ],
    ids=["nothing-kept-back", "total-for-each", "fresh", "near-critical", "upper-end-is-no-promise", "lost-in-u"],
)
def test_what_is_questioned_is_said(key: str, changes: dict[str, Any], said: str) -> None:
    response = ask(key, None, changes)
    assert response["figure"]
    assert response["warnings"] == ([said] if said else [])


def test_a_safe_end_is_never_below_nothing() -> None:
    response = ask("bank_endurance", "t", {"pg_start": "12 ± 5 bar gauge", "pg_end": "10 ± 5 bar gauge"})
    assert response["value"] < response["expanded"]
    assert response["safe"] == 0
    assert response["figure"]["text"] == "0 s"


def test_a_gauge_off_its_scale_or_low_on_it() -> None:
    tools = {"G-1": {"name": "G-1", "accuracy": "class 1.6", "span": "250 bar", "due": "2026-01-01"}}
    site = {"time": "2026-02-01T07:00:00+01:00"}
    high = bank({"pg_start": {"text": "260 bar gauge", "instrument": "G-1"}}, instruments=tools)
    assert high["rows"]["pg_start"]["says"] == (
        "Found 260 bar gauge; expected a reading on the scale of G-1. "
        "Choose the instrument that was read, or read again."
    )
    low = bank({"pg_start": {"text": "20 bar gauge", "instrument": "G-1"}}, instruments=tools, site=site)
    assert low["warnings"] == [
        "Pressure now: 20 bar gauge is below a tenth of the span. A gauge of smaller span reads it better.",
        "G-1 was due on 2026-01-01. Use one that is in date, or have it checked.",
    ]


def test_an_empty_sheet_says_nothing_is_wrong() -> None:
    response = bank(
        dict.fromkeys(("gas", "count", "V_each", "pg_start", "pg_end", "T_gas", "p_atm", "q", "T_ref", "p_ref"))
    )
    assert response["state"] == "empty"
    assert {entry["state"] for entry in response["rows"].values()} == {"empty", "find"}
