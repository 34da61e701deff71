"""Any request at all gets an answer: JSON without NaN, four parts where it is refused, and no other exception."""

import json
import math
from typing import Any

import pytest
from gaswright import find as finder
from gaswright.browser import answer
from gaswright.jobs.index import TITLE_OF
from gaswright.laws.index import FAMILY_OF
from gaswright.sheet import run_sheet
from gaswright.terms import as_shown
from hypothesis import HealthCheck, given, settings
from hypothesis import strategies as st

STATES = {"empty", "incomplete", "answer", "warning", "refused"}
HOSTILE = st.recursive(
    st.none() | st.booleans() | st.integers() | st.just(10**400) | st.floats() | st.text(max_size=12),
    lambda inner: st.lists(inner, max_size=3) | st.dictionaries(st.text(max_size=6), inner, max_size=3),
    max_leaves=6,
)
TYPED = st.sampled_from(
    [
        "",
        " ",
        "1",
        "0",
        "-1",
        "200 bar gauge",
        "5 bar absolute",
        "-3 bar gauge",
        "20 °C",
        "0 K",
        "1e39 bar",
        "1,5",
        "1,234",
        "50 L",
        "30 L/min",
        "30 Nm3/h",
        "30 scfm",
        "4",
        "1e-30",
        "nitrogen",
        "CO2",
        "12 h",
        "07:34",
        "\ud800",
        "±",
        "5 ± 9 bar",
        "1e-9 bar absolute",
        "99999 bar",
        "600 °C",
        "9999-12-31T23:59:00+00:00",
    ]
)
READING = (
    TYPED
    | st.fixed_dictionaries(
        {"text": TYPED},
        optional={
            "unit": st.sampled_from(["bar", "psi", "°C", "L", "L/min", "h", "furlong", ""]),
            "reference": st.sampled_from(["gauge", "absolute", "vacuum", "up", None]),
            "accuracy": st.sampled_from(["± 1 %", "class 1.6 of 250 bar", "exact", "?", None]),
            "instrument": st.sampled_from(["G-1", "G-2", None]),
            "from": st.sampled_from(["site", "read", "preset", "moon", None]),
        },
    )
    | st.floats(-1e9, 1e9)
)


def _no_constant(name: str) -> float:
    raise AssertionError(name)


def _look(request: object) -> dict[str, Any]:
    text = answer(json.dumps(request))
    response: dict[str, Any] = json.loads(text, parse_constant=_no_constant)
    text.encode()
    if "state" in response and isinstance(response.get("rows"), dict):
        assert response["state"] in STATES
        for name in ("value", "expanded"):
            assert response[name] is None or math.isfinite(response[name])
        assert (response["figure"] is not None) == (response["state"] in ("answer", "warning"))
    return response


@pytest.fixture
def examples(full_counts: bool) -> int:  # noqa: FBT001 - a fixture
    """How many requests to try."""
    return 5_000 if full_counts else 250


def _run(strategy: st.SearchStrategy[Any], examples: int) -> list[dict[str, Any]]:
    seen: list[dict[str, Any]] = []

    @settings(max_examples=examples, deadline=None, suppress_health_check=list(HealthCheck))
    @given(request=strategy)
    def look(request: Any) -> None:
        seen.append(_look(request))

    look()
    return seen


def _sheet(key: str) -> st.SearchStrategy[Any]:
    sheet = finder.sheet(key)
    rows = {name: st.just(text) | READING for name, text in sheet.example.items()}
    return st.fixed_dictionaries(
        {
            "do": st.just("sheet"),
            "key": st.just(key),
            "find": st.sampled_from([*sheet.finds, None, "x"]),
            "readings": st.fixed_dictionaries({}, optional=rows | {next(iter(sheet.finds)): READING}),
        },
        optional={
            "instruments": st.fixed_dictionaries(
                {"G-1": st.dictionaries(st.sampled_from(["accuracy", "span", "resolution", "due", "name"]), TYPED)}
            ),
            "site": st.dictionaries(st.sampled_from(["station_pressure", "air_temperature", "time"]), READING),
            "decimal": st.sampled_from([None, ".", ","]),
            "show": st.fixed_dictionaries({"unit": TYPED}),
        },
    )


def _nearly(key: str) -> st.SearchStrategy[Any]:
    """Give the worked example with one row changed, and the first answer put in where another question is asked."""
    sheet = finder.sheet(key)
    first = next(iter(sheet.finds))
    rows = {**sheet.example, first: run_sheet(key, {"readings": sheet.example}).value}
    return st.builds(
        lambda find, row, raw: {"do": "sheet", "key": key, "find": find, "readings": {**rows, row: raw}},
        st.sampled_from(list(sheet.finds)),
        st.sampled_from(list(sheet.example)),
        READING,
    )


def _nearly_law(key: str) -> st.SearchStrategy[Any]:
    """Give a law's worked example with one row changed."""
    relation = as_shown(finder.relation(key))
    unknown = next(name for name in relation.forms if name not in relation.example)
    return st.builds(
        lambda row, raw: {
            "do": "relation",
            "key": key,
            "find": unknown,
            "rows": {**relation.example, row: raw},
            "site": {"station_pressure": "1 bar"},
        },
        st.sampled_from(list(relation.example)),
        READING,
    )


def _law(key: str) -> st.SearchStrategy[Any]:
    relation = as_shown(finder.relation(key))
    rows = {name: st.just(relation.example.get(name, "1")) | READING for name in [v.name for v in relation.variables]}
    return st.fixed_dictionaries(
        {
            "do": st.just("relation"),
            "key": st.just(key),
            "find": st.sampled_from(list(relation.forms)),
            "rows": st.fixed_dictionaries({}, optional=rows),
        },
        optional={
            "gas": st.sampled_from(["nitrogen", "x", None]),
            "decimal": st.sampled_from([None, ".", ","]),
            "site": st.dictionaries(st.just("station_pressure"), READING),
        },
    )


@pytest.mark.parametrize("key", TITLE_OF)
def test_any_readings_of_a_sheet(key: str, examples: int) -> None:
    seen = _run(_sheet(key), examples)
    assert "incomplete" in {response["state"] for response in seen}


@pytest.mark.parametrize("key", TITLE_OF)
def test_any_one_row_of_a_sheet(key: str, examples: int) -> None:
    seen = _run(_nearly(key), examples)
    assert {"answer", "incomplete"} <= {response["state"] for response in seen}


def test_any_readings_of_any_law(examples: int) -> None:
    seen = _run(st.sampled_from(sorted(FAMILY_OF)).flatmap(_law), examples)
    assert "incomplete" in {response["state"] for response in seen}


def test_any_one_row_of_any_law(examples: int) -> None:
    seen = _run(st.sampled_from(sorted(FAMILY_OF)).flatmap(_nearly_law), examples)
    assert {"answer", "incomplete"} <= {response["state"] for response in seen}


def test_any_json_at_all(examples: int) -> None:
    names = st.sampled_from(
        [
            "id",
            "do",
            "key",
            "find",
            "rows",
            "readings",
            "site",
            "instruments",
            "show",
            "decimal",
            "gas",
            "kind",
            "reading",
            "where",
            "branch",
        ]
    )
    values = HOSTILE | st.sampled_from(
        ["sheet", "relation", "reading", "convert", "units", "volume", "boyle", "locked_in", "V_2", "pg_2"]
    )
    seen = _run(HOSTILE | st.dictionaries(names, values, max_size=8), 2 * examples)
    assert all(response.get("refusal") or response.get("state") != "refused" for response in seen)


@given(text=st.text(max_size=60) | st.binary(max_size=60).map(lambda raw: raw.decode("latin-1")))
@settings(deadline=None, max_examples=200)
def test_any_text_at_all(text: str) -> None:
    assert json.loads(answer(text))["refusal"]
