"""What the page gets: exact values that go back in, site conditions, the page's decimal mark, fields by themselves."""

import json
import re
from typing import Any

import pytest
from gaswright import find as finder
from gaswright.browser import answer
from gaswright.jobs.index import TITLE_OF
from gaswright.laws.index import FAMILY_OF
from gaswright.terms import as_shown

from tests.engine.sheets.asking import ask, bank, send

OTHERS = [(key, row) for key in TITLE_OF for row in list(finder.sheet(key).finds)[1:]]


@pytest.mark.parametrize("decimal", [None, ".", ","])
@pytest.mark.parametrize(("key", "row"), OTHERS)
def test_the_exact_figure_goes_back_in(key: str, row: str, decimal: str | None) -> None:
    example = finder.sheet(key).example
    if decimal == ",":
        example = {name: text.replace(".", ",") for name, text in example.items()}
    first = next(iter(finder.sheet(key).finds))
    found = send({"do": "sheet", "key": key, "find": first, "readings": example, "decimal": decimal})
    kept = {name: text for name, text in example.items() if name != row} | {first: found["figure"]["exact"]}
    back = send({"do": "sheet", "key": key, "find": row, "readings": kept, "decimal": decimal})
    again = send(
        {
            "do": "sheet",
            "key": key,
            "find": first,
            "readings": {**kept, row: back["figure"]["exact"]},
            "decimal": decimal,
        }
    )
    assert again["value"] == pytest.approx(found["value"], rel=1e-9)


@pytest.mark.parametrize("key", FAMILY_OF)
def test_every_example_of_a_law_is_answered(key: str) -> None:
    relation = as_shown(finder.relation(key))
    open_rows = [each.name for each in relation.variables if each.name not in relation.example and each.default is None]
    unknown = next(name for name in relation.forms if name in open_rows)
    rows = {name: {"text": text} for name, text in relation.example.items()}
    response = send({"id": key, "do": "relation", "key": key, "find": unknown, "rows": rows, "gas": None})
    assert response["state"] in ("answer", "warning"), response
    assert response["id"] == key
    assert response["figure"]["text"]


def test_a_decimal_comma_stands_everywhere() -> None:
    example = {name: text.replace(".", ",") for name, text in finder.sheet("bank_endurance").example.items()}
    response = send({"do": "sheet", "key": "bank_endurance", "find": "t", "readings": example, "decimal": ","})
    assert response["state"] == "answer"
    lines = [line["text"] for line in response["working"]]
    lines += [response["best"], response["figure"]["row"], response["figure"]["exact"]["text"]]
    lines += [text for row in response["versus"] + response["extra"] for text in row]
    lines += [row[part] for row in response["rows"].values() for part in ("si", "by", "typed") if part in row]
    assert not [text for text in lines if re.search(r"\d\.\d", text)]
    assert sum("," in text for text in lines) > 10


SITE = {
    "station_pressure": {"text": "1013", "unit": "mbar", "reference": "absolute"},
    "air_temperature": "20 °C",
    "reference_temperature": {"text": "20", "unit": "°C"},
    "reference_pressure": {"text": "101.325", "unit": "kPa", "reference": "absolute"},
    "time": "2026-02-01T07:00:00+01:00",
    "place": "Hollin Tarn works",
}
FROM_SITE = ("p_atm", "T_gas", "T_ref", "p_ref")


def test_site_conditions_fill_what_is_empty_and_say_so() -> None:
    response = bank(dict.fromkeys(FROM_SITE), site=SITE)
    assert response["value"] == bank({})["value"]
    for name in FROM_SITE:
        assert response["rows"][name]["state"] == "default"
        assert response["rows"][name]["says"].endswith(", from the site conditions, not yet confirmed")


def test_a_reading_typed_stands_against_the_site_conditions() -> None:
    response = bank({"p_atm": "950 mbar"}, site=SITE)
    assert response["rows"]["p_atm"]["state"] == "ok"
    assert response["value"] == bank({"p_atm": "950 mbar"})["value"]


@pytest.mark.parametrize("came_from", ["site", "preset"])
def test_a_pair_typed_with_the_demand_wins_over_site_conditions(came_from: str) -> None:
    site_rows: dict[str, Any] = {
        "T_ref": {"text": "20 °C", "from": came_from},
        "p_ref": {"text": "1 bar", "reference": "absolute", "from": came_from},
    }
    typed = bank({"q": "30 L/min (0 °C, 101.325 kPa)", **site_rows})
    own = bank({"q": "30 L/min", "T_ref": "0 °C", "p_ref": "101.325 kPa absolute"})
    assert typed["value"] == own["value"]
    assert typed["rows"]["T_ref"]["says"] == "0 °C, as typed with a volume or flow"
    assert ["Reference conditions", "0 °C, 101.325 kPa absolute"] in typed["extra"]


@pytest.mark.parametrize(
    ("q", "pair"),
    [
        ("1.8 Nm3/h", {"T_ref": "0 °C", "p_ref": "101.325 kPa absolute"}),  # DIN 1343
        ("1.8 Sm3/h", {"T_ref": "15 °C", "p_ref": "101.325 kPa absolute"}),  # ISO 13443
        ("1.8 m³/h (60 °F, 14.696 psia)", {"T_ref": "60 °F", "p_ref": "14.696 psi absolute"}),
        ("1.8 m³/h (15 °C, 1 bar)", {"T_ref": "15 °C", "p_ref": "1 bar absolute"}),
    ],
)
def test_a_unit_with_its_pair_fills_the_rows_left_empty(q: str, pair: dict[str, str]) -> None:
    typed = bank({"q": q, "T_ref": None, "p_ref": None})
    assert typed["state"] == "answer"
    assert typed["value"] == pytest.approx(bank({"q": "1.8 m³/h", **pair})["value"], rel=1e-12)


def test_an_order_counted_at_another_pair_is_asked_about() -> None:
    response = ask("cylinder_receipt", "V_ref", {"V_ordered": "36 Nm3"})
    assert response["rows"]["V_ordered"] == {
        "state": "question",
        "says": "Found 36 m³ (0 °C, 101.325 kPa); expected the reference conditions that stand in their own rows, "
        "15 °C, 101.325 kPa. Correct those rows, or choose their conditions here.",
        "offers": [{"text": "36 m³ (15 °C, 101.325 kPa)"}],
    }
    taken = ask("cylinder_receipt", "V_ref", {"V_ordered": "36 m³ (15 °C, 101.325 kPa)"})
    assert taken["state"] == "answer"


@pytest.mark.parametrize(
    ("reading", "kind", "state", "says", "offers"),
    [
        ({"text": "1013", "unit": "mbar"}, "station_pressure", "ok", "", []),
        ({"text": ""}, "station_pressure", "empty", "", []),
        (None, "station_pressure", "empty", "", []),
        (
            {"text": "10.13", "unit": "mbar"},
            "station_pressure",
            "error",
            (
                "Found 10.13 mbar; expected station pressure between 100 mbar and 1500 mbar. "
                "Check the number and its unit."
            ),
            [],
        ),
        (
            {"text": "1,013", "unit": "bar"},
            "station_pressure",
            "question",
            "Found '1,013'; expected one meaning. Is the comma a decimal mark or does it group thousands?",
            [{"text": "1.013"}, {"text": "1013"}],
        ),
    ],
)
def test_a_field_by_itself(reading: Any, kind: str, state: str, says: str, offers: list[dict[str, str]]) -> None:
    response = send({"do": "reading", "key": "site", "kind": kind, "where": "Station pressure", "reading": reading})
    assert (response["state"], response["says"], response["offers"]) == (state, says, offers)


REQUESTS = [
    ("", "request: found text that is not JSON; expected a JSON object. Load the page again."),
    ("[]", "request: found JSON that is not an object; expected a JSON object. Load the page again."),
    ('{"id": NaN}', "request: found text that is not JSON; expected a JSON object. Load the page again."),
    ("[" * 100_000, "request: found text that is not JSON; expected a JSON object. Load the page again."),
    (" " * 200_001, "request: found 200001 characters; expected at most 200000. Send less at once."),
    ("{}", "request: found None; expected relation, sheet, reading, convert, units or about. Load the page again."),
    ('{"do": "sheet"}', "request: found no key; expected the key of a law or sheet. Load the page again."),
    (
        '{"do": "sheet", "key": "bank"}',
        "sheet: found 'bank'; expected a key such as bank_endurance. Correct the key.",
    ),
    (
        '{"do": "sheet", "key": "locked_in", "find": "p_1"}',
        "Locked-in pressure: found the question 'p_1'; expected one of pg_2, pg_1, T_2. Ask for one of these.",
    ),
    (
        '{"do": "relation", "key": "boyle"}',
        "Boyle’s law: found no question; expected one of p_1, V_1, p_2, V_2. Ask for one of these.",
    ),
    (
        '{"do": "sheet", "key": "locked_in", "find": ["pg_2"]}',
        "request, find: found ['pg_2']; expected text. Load the page again.",
    ),
    (
        '{"do": "relation", "key": "boyle", "find": "V_2", "rows": {"p_1": [1]}}',
        "request, rows: found {'p_1': [1]}; expected readings by row. Load the page again.",
    ),
    (
        '{"do": "relation", "key": "boyle", "find": "V_2", "decimal": ";"}',
        "request, decimal: found ';'; expected a comma or a point. Load the page again.",
    ),
    (
        '{"do": "relation", "key": "boyle", "find": "V_2", "show": {"unit": "bar"}}',
        (
            "Unit shown: found bar (pressure); expected a unit of volume such as L, m³, mL. "
            "Choose another unit, or check which row this is."
        ),
    ),
    (
        '{"do": "units", "kind": "colour"}',
        "request, kind: found 'colour'; expected a kind of quantity, such as volume. Load the page again.",
    ),
]


@pytest.mark.parametrize(("text", "refusal"), REQUESTS, ids=[text[:40] for text, _ in REQUESTS])
def test_a_request_that_cannot_be_read(text: str, refusal: str) -> None:
    response = json.loads(answer(text))
    assert (response["state"], response["refusal"], response["id"]) == ("refused", refusal, None)


def test_units_are_those_of_the_kind() -> None:
    assert send({"do": "units", "kind": "absolute_pressure"})["units"][:2] == ["bar", "kPa"]


def test_a_row_that_is_none_of_the_law_is_told() -> None:
    rows = {"p_1": "1 bar absolute", "V_1": "1 L", "p_2": "2 bar absolute", "q": "3"}
    response = send({"do": "relation", "key": "boyle", "find": "V_2", "rows": rows})
    assert response["state"] == "incomplete"
    assert response["rows"]["q"]["says"] == "Found 'q'; expected one of p_1, V_1, p_2, V_2. Correct the name."


def test_a_gauge_reading_in_a_law_needs_the_station_pressure() -> None:
    rows = {"p_1": "1 bar gauge", "V_1": "1 L", "p_2": "2 bar absolute"}
    asked = send({"do": "relation", "key": "boyle", "find": "V_2", "rows": rows})
    assert asked["rows"]["p_1"]["says"] == (
        "Found 1 bar gauge; expected the station pressure to count it from. "
        "Give the station pressure, or the absolute pressure."
    )
    told = send({"do": "relation", "key": "boyle", "find": "V_2", "rows": rows, "site": SITE})
    assert told["value"] == pytest.approx(2.013e-3 / 2, rel=1e-12)  # p_1 V_1 = p_2 V_2
