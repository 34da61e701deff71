"""Answer a sheet: every text ready to draw, nothing left to compute.

Takes a request as a plain dictionary; gives a response as one, and raises only for a key or question that is none.
gaswright.browser speaks JSON with the page; the worked examples of the pages are drawn with it, too.
"""

from typing import Any

from gaswright import find as finder
from gaswright import quantity, show
from gaswright.conditions import CAME_FROM
from gaswright.errors import NoSolutionError, OutsideRangeError, ReadingError
from gaswright.instrument import overdue
from gaswright.model import Find, Row, Sheet
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
from gaswright.sheet import SheetResult, work
from gaswright.tables import KINDS
from gaswright.take import Taken, question, take
from gaswright.typed import text_of
from gaswright.verdict import assumption, extra, stepped, verdict_words, versus


def answer_sheet(request: dict[str, Any]) -> Response:
    """Answer a sheet: rows with their states, the figure to sign, best estimate, verdict, shares, working, warnings."""
    sheet = finder.sheet(str(request["key"]))
    find = question(sheet, request.get("find"))
    raw = _with_site(sheet, request)
    mark = request.get("decimal") or "."
    kind = KINDS[sheet.rows[find.row].kind]
    unit = quantity.shown_unit(request.get("show"), kind) or find.unit
    taken = take(sheet, find, raw, request.get("decimal"), request.get("instruments"))
    rows = _sheet_rows(sheet, find, taken, mark)
    response = blank(rows, sheet.cautions)
    _question_unlikely(sheet, taken, rows, mark)
    if taken.problems or taken.empty:
        nothing = not (taken.readings or taken.gases or taken.problems)
        return with_state(response, "empty" if nothing else "incomplete")
    try:
        result = work(sheet, find, taken, unit, mark)
    except ReadingError as error:
        return place_error(response, error, taken.readings)
    except (NoSolutionError, OutsideRangeError) as error:
        return with_state({**response, "refusal": str(error)}, "refused")
    result = result._replace(warnings=(*result.warnings, *_overdue(taken, request)))
    return _sheet_figure(response, sheet, find, result, Display(kind, unit, mark))


def _overdue(taken: Taken, request: dict[str, Any]) -> tuple[str, ...]:
    """Say which instruments of the readings were past their due date when the site conditions were read."""
    today = text_of((request.get("site") or {}).get("time"))[:10]
    names = dict.fromkeys(reading.instrument for reading in taken.readings.values() if reading.instrument)
    records = request.get("instruments") or {}
    return tuple(text for name in names if today for text in overdue(records[name], today))


def _with_site(sheet: Sheet, request: dict[str, Any]) -> dict[str, Any]:
    """Fill rows that are still empty from the site conditions, marked as coming from there."""
    raw: dict[str, Any] = dict(request.get("readings") or {})
    site = request.get("site") or {}
    for name, row in sheet.rows.items():
        entry = site.get(row.site) if row.site else None
        if not text_of(raw.get(name)) and text_of(entry):
            raw[name] = {**(entry if isinstance(entry, dict) else {"text": entry}), "from": "site"}
    return raw


def _sheet_rows(sheet: Sheet, find: Find, taken: Taken, mark: str) -> dict[str, Response]:
    rows: dict[str, Response] = {}
    for name, row in sheet.rows.items():
        if not row.reading:
            continue
        if name == find.row:
            rows[name] = {"state": "find", "says": ""}
        elif name in taken.problems:
            rows[name] = problem_row(taken.problems[name])
        elif name in taken.gases:
            gas = taken.gases[name]
            rows[name] = {"state": "ok", "says": "", "si": gas.formula, "typed": gas.title}
        elif name in taken.clocks:
            rows[name] = {"state": "ok", "says": "", "typed": taken.clocks[name]}
        elif name in taken.readings:
            rows[name] = ok_row(taken.readings[name], KINDS[row.kind], mark)
            if taken.readings[name].came_from not in ("read", CAME_FROM):
                rows[name] |= {"state": "default", "says": _default_words(taken.readings[name])}
        else:
            rows[name] = {"state": "empty", "says": ""}
    strangers = {name: problem_row(problem) for name, problem in taken.problems.items() if name not in rows}
    return rows | strangers


def _default_words(reading: Reading) -> str:
    where = {"site": "from the site conditions", "found": "worked out here before"}.get(reading.came_from, "a preset")
    return f"{reading.text}, {where}, not yet confirmed"


def _question_unlikely(sheet: Sheet, taken: Taken, rows: dict[str, Response], mark: str) -> None:
    """Question what is possible and unlikely, without stopping."""
    for name, reading in taken.readings.items():
        above = sheet.rows[name].unusual_above
        if above is not None and reading.value > above and rows[name]["state"] == "ok":
            limit = quantity.text_of(above, KINDS[sheet.rows[name].kind], reading.unit, mark)
            rows[name]["says"] = f"{reading.text} is unusual (above {limit}): check the number and its unit."


def _sheet_figure(response: Response, sheet: Sheet, find: Find, result: SheetResult, display: Display) -> Response:
    row = sheet.rows[find.row]
    mark = display.mark
    shown, width, best = figure_texts(result.value, result.expanded, display)
    text = _signed(find, row, result, display)
    counted = display.counted()
    way = "rounded down" if find.safe == "low" else "rounded up"
    best_line = (
        f"Best estimate {best}{counted} ({factor(result.k, mark)})."
        if width
        else f"Best estimate {best}{counted}. {NO_U}"
    )
    response |= {
        "figure": {
            "label": f"{find.label}, safe end, {way}",
            "text": text + counted,
            "unit": "",
            "row": show.tidy(shown, ROW_DIGITS, mark),
            "exact": exact(shown, display),
        },
        "best": best_line + (f" Unrounded {show.tidy(shown, 10, mark)}." if row.whole else ""),
        "value": result.value,
        "unit": result.unit,
        "expanded": result.expanded,
        "safe": result.safe,
        "verdict": verdict_words(sheet, find, result, text, mark),
        "versus": versus(result, display),
        "shares": share_list(result.shares),
        "working": [{"text": line.text, "relation": line.relation, "title": line.title} for line in result.working],
        "warnings": [*result.warnings, *assumption(result, display)],
        "extra": extra(sheet, find, result, mark),
        "rule": sheet.rule,
    }
    return with_state(response, "warning" if result.warnings else "answer")


def _signed(find: Find, row: Row, result: SheetResult, display: Display) -> str:
    """Give the figure to sign: the safe end, rounded to the safe side."""
    kind, unit, mark = display
    safe, width = quantity.in_unit(result.safe, kind, unit), quantity.interval_in_unit(result.expanded, kind, unit)
    down = find.safe == "low"
    if row.whole:
        return show.number(show.rounded_to(safe, 1.0, down=down), 0, mark)
    if unit in ("min", "h"):
        return show.duration(stepped(result.safe, result.expanded, unit, down=down), down=down)
    return quantity.with_unit(show.safe_end(safe, width, mark, down=down), unit)
