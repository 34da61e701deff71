"""Answer a law's page: every text ready to draw, nothing left to compute.

Takes a request as a plain dictionary; gives a response as one, and raises only for a key that is none.
gaswright.browser speaks JSON with the page; the worked examples of the pages are drawn with it, too.
"""

from typing import Any

from gaswright import find as finder
from gaswright import quantity, show
from gaswright.errors import NoSolutionError, OutsideRangeError, ReadingError
from gaswright.gas import find as find_gas
from gaswright.law import Around, Result, finish, like_unit, read_variable
from gaswright.model import Relation
from gaswright.reading import Reading, read
from gaswright.respond import (
    NO_U,
    ROW_DIGITS,
    Display,
    Response,
    blank,
    exact,
    factor,
    figure_texts,
    ok_row,
    place_error,
    problem_row,
    share_list,
    show_unit,
    text_of,
    with_state,
)
from gaswright.tables import KINDS

STATION_ROW = "p_station"


def answer_relation(request: dict[str, Any]) -> Response:
    """Answer a law's page: rows with their states, the figure, ±, shares, working, warnings."""
    relation = finder.relation(str(request["key"]))
    unknown = str(request["find"])
    raw: dict[str, Any] = request.get("rows") or {}
    mark = request.get("decimal") or "."
    taken, rows, warnings = _read_law(relation, unknown, raw, request.get("decimal"))
    response = blank(rows, cautions=())
    try:
        station = _site_station(request)
        if STATION_ROW in raw and station is not None:
            rows[STATION_ROW] = ok_row(station, KINDS["station_pressure"])
    except ReadingError as error:
        rows[STATION_ROW] = problem_row(error)
        return with_state(response, "incomplete")
    try:
        gas_text = request.get("gas") or text_of(raw.get("gas"))
        gas = find_gas(gas_text) if relation.uses_gas and gas_text else None
    except ReadingError as error:
        rows["gas"] = problem_row(error)
        return with_state(response, "incomplete")
    if any(row["state"] in ("empty", "error", "question") for row in rows.values()) or (
        relation.uses_gas and gas is None
    ):
        return with_state(response, "empty" if not taken else "incomplete")
    try:
        result = finish(relation, unknown, taken, Around(station, gas, tuple(warnings), show_unit(request)))
    except ReadingError as error:
        return place_error(response, error, taken)
    except (NoSolutionError, OutsideRangeError) as error:
        return with_state({**response, "refusal": str(error)}, "refused")
    return _law_figure(response, relation, result, show_unit(request), mark)


def _read_law(
    relation: Relation, unknown: str, raw: dict[str, Any], decimal: str | None
) -> tuple[dict[str, Reading], dict[str, Response], list[str]]:
    taken: dict[str, Reading] = {}
    rows: dict[str, Response] = {}
    warnings: list[str] = []
    for variable in relation.variables:
        if variable.name == unknown:
            rows[variable.name] = {"state": "find", "says": ""}
            continue
        entry = raw.get(variable.name)
        try:
            if not text_of(entry) and variable.default is not None:
                taken[variable.name] = read_variable(variable, variable.default, decimal, None)
                rows[variable.name] = {"state": "default", "says": f"taken as {variable.default:g}"}
                warnings.append(f"{variable.symbol} was taken as {variable.default:g}, because none was given.")
            elif not text_of(entry):
                rows[variable.name] = {"state": "empty", "says": ""}
            else:
                taken[variable.name] = read_variable(variable, entry or "", decimal, None)
                rows[variable.name] = ok_row(taken[variable.name], KINDS[variable.kind])
        except ReadingError as error:
            rows[variable.name] = problem_row(error)
    return taken, rows, warnings


def _site_station(request: dict[str, Any]) -> Reading | None:
    """Give the station pressure a law's page carries in a row of its own, or that of the site conditions."""
    raw = (request.get("rows") or {}).get(STATION_ROW) or (request.get("site") or {}).get("station_pressure")
    if not text_of(raw):
        return None
    return read("Station pressure", raw or "", KINDS["station_pressure"], request.get("decimal"))


def _law_figure(response: Response, relation: Relation, result: Result, unit: str, mark: str) -> Response:
    variable = relation.variable(result.unknown)
    kind = KINDS[variable.kind]
    unit = unit or like_unit(relation, result.unknown, result.readings)
    display = Display(kind, unit, mark)
    shown, width, best = figure_texts(result.value, result.expanded, display)
    counted = display.counted()
    figure = show.tidy(shown, 7, mark) if not width else show.plus_minus(shown, width, mark)[0]
    response |= {
        "figure": {
            "label": f"{variable.text[:1].upper()}{variable.text[1:]}",
            "text": quantity.with_unit(figure, unit) + counted,
            "unit": "",
            "row": show.tidy(shown, ROW_DIGITS, mark),
            "exact": exact(shown, unit, kind),
        },
        "best": f"{best} ({factor(result.k)})." if width else NO_U,
        "value": result.value,
        "unit": result.unit,
        "expanded": result.expanded,
        "shares": share_list(result.shares),
        "working": [
            {
                "text": text.replace(".", mark) if mark == "," else text,
                "relation": relation.key,
                "title": relation.title,
            }
            for text in result.working
        ],
        "warnings": list(result.warnings),
        "sensitivities": result.sensitivities,
    }
    return with_state(response, "warning" if result.warnings else "answer")
