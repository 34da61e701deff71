"""Answer a law's page: every text ready to draw, nothing left to compute.

Takes a request as a plain dictionary; gives a response as one, and raises only for a key that is none.
gaswright.browser speaks JSON with the page; the worked examples of the pages are drawn with it, too.
"""

from typing import Any

from gaswright import any_kind, conditions, quantity, show, terms
from gaswright import find as finder
from gaswright.counting import read_station
from gaswright.errors import NoSolutionError, OutsideRangeError, ReadingError
from gaswright.gas import Gas
from gaswright.gas import find as find_gas
from gaswright.law import Around, Result, finish, kinds_of, like_unit, read_variable
from gaswright.model import Relation
from gaswright.reading import Reading
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
    with_state,
)
from gaswright.tables import KINDS
from gaswright.typed import text_of

STATION_ROW = "p_station"
SIDE_ROW = "branch"


def answer_relation(request: dict[str, Any]) -> Response:
    """Answer a law's page: rows with their states, the figure, ±, shares, working, warnings."""
    relation = finder.relation(str(request["key"]))
    asked = terms.spread(relation, _unknown(relation, request.get("find")), request.get("rows") or {})
    side = str(request.get("branch") or text_of(asked.readings.pop(SIDE_ROW, None)))
    relation, unknown = any_kind.settled(asked.relation, asked.readings), asked.unknown
    request = {**request, "rows": asked.readings}
    unit = _shown(asked.relation, relation, unknown, request)
    mark = request.get("decimal") or "."
    taken, rows, warnings = _read_law(relation, unknown, request)
    station, gas = _station_row(request, rows), _gas_row(relation, request, rows)
    response = blank(rows, cautions=())
    is_open = any(row["state"] in ("empty", "error", "question") for row in rows.values())
    if is_open or (relation.uses_gas and gas is None):
        return with_state(response, "empty" if not taken else "incomplete")
    try:
        result = finish(relation, unknown, taken, Around(station, gas, tuple(warnings), unit, mark, side))
    except ReadingError as error:
        if error.offers == relation.forms[unknown].sides:
            rows[SIDE_ROW] = problem_row(error)
        return place_error(response, error, taken)
    except (NoSolutionError, OutsideRangeError) as error:
        return with_state({**response, "refusal": str(error)}, "refused")
    return _law_figure(response, relation, result, unit, mark)


def _shown(asked: Relation, settled: Relation, unknown: str, request: dict[str, Any]) -> str:
    """Give the unit asked for; where the law takes any kind, one that does not fit the readings is passed over."""
    kind = KINDS[settled.variable(unknown).kind]
    try:
        return quantity.shown_unit(request.get("show"), kind)
    except ReadingError:
        if asked.variable(unknown).kind != any_kind.ANY:
            raise
        return ""


def _unknown(relation: Relation, asked: Any) -> str:
    if terms.list_of(str(asked)) in (*relation.forms, *relation.turned):
        return str(asked)
    found = "no question" if asked is None else f"the question {str(asked)[:40]!r}"
    names = ", ".join((*relation.forms, *relation.turned))
    raise ReadingError(relation.title, found, f"one of {names}", "Ask for one of these.")


def _station_row(request: dict[str, Any], rows: dict[str, Response]) -> Reading | None:
    """Give the station pressure and put the state of its row, where the page shows one."""
    try:
        station = _site_station(request)
    except ReadingError as error:
        rows[STATION_ROW] = problem_row(error)
        return None
    if STATION_ROW in (request.get("rows") or {}) and station is not None:
        rows[STATION_ROW] = ok_row(station, KINDS["station_pressure"], request.get("decimal") or ".")
    return station


def _gas_row(relation: Relation, request: dict[str, Any], rows: dict[str, Response]) -> Gas | None:
    text = request.get("gas") or text_of((request.get("rows") or {}).get("gas"))
    try:
        return find_gas(text) if relation.uses_gas and text else None
    except ReadingError as error:
        rows["gas"] = problem_row(error)
        return None


def _read_law(
    relation: Relation, unknown: str, request: dict[str, Any]
) -> tuple[dict[str, Reading], dict[str, Response], list[str]]:
    decimal = request.get("decimal")
    raw = conditions.filled(request.get("rows") or {}, kinds_of(relation), unknown, decimal)
    taken: dict[str, Reading] = {}
    rows: dict[str, Response] = _strangers(relation, raw)
    warnings: list[str] = []
    for variable in relation.variables:
        if variable.name == unknown:
            rows[variable.name] = {"state": "find", "says": ""}
            continue
        entry = raw.get(variable.name)
        try:
            if not text_of(entry) and variable.default is not None:
                taken[variable.name] = read_variable(variable, variable.default, decimal, None)
                shown = show.tidy(variable.default, 7, decimal or ".")
                rows[variable.name] = {"state": "default", "says": f"taken as {shown}"}
                warnings.append(f"{variable.symbol} was taken as {shown}, because none was given.")
            elif not text_of(entry):
                rows[variable.name] = {"state": "empty", "says": ""}
            else:
                taken[variable.name] = read_variable(
                    variable, "" if entry is None else entry, decimal, request.get("instruments")
                )
                rows[variable.name] = ok_row(taken[variable.name], KINDS[variable.kind], decimal or ".")
        except ReadingError as error:
            rows[variable.name] = problem_row(error)
    return taken, rows, warnings


def _strangers(relation: Relation, raw: dict[str, Any]) -> dict[str, Response]:
    """Give the rows that are none of the law's, each as an error."""
    names = [variable.name for variable in relation.variables]
    spare = {
        name: {"state": "spare", "says": "Plays no part in this question."} for name in raw if name in relation.spare
    }
    return spare | {
        name: problem_row(
            ReadingError(relation.title, repr(name[:40]), f"one of {', '.join(names)}", "Correct the name.")
        )
        for name in raw
        if name not in (*names, *relation.spare, STATION_ROW, "gas")
    }


def _site_station(request: dict[str, Any]) -> Reading | None:
    """Give the station pressure a law's page carries in a row of its own, or that of the site conditions."""
    raw = (request.get("rows") or {}).get(STATION_ROW) or (request.get("site") or {}).get("station_pressure")
    if not text_of(raw):
        return None
    return read_station("Station pressure", "" if raw is None else raw, request.get("decimal"))


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
            "exact": exact(shown, display),
        },
        "best": f"{best} ({factor(result.k, mark)})." if width else NO_U,
        "value": result.value,
        "unit": result.unit,
        "expanded": result.expanded,
        "shares": share_list(result.shares),
        "working": [{"text": text, "relation": relation.key, "title": relation.title} for text in result.working],
        "warnings": list(result.warnings),
        "sensitivities": result.sensitivities,
    }
    return with_state(response, "warning" if result.warnings else "answer")
