"""Answer a page: every text ready to draw, nothing left to compute.

Takes requests as plain dictionaries; gives responses as plain dictionaries and never raises for bad input.
gaswright.browser speaks JSON with the page, generator.make_views draws the worked examples with it.
"""

from typing import Any, NamedTuple

from gaswright import find as finder
from gaswright import quantity, show
from gaswright.errors import GaswrightError, NoSolutionError, OutsideRangeError, ReadingError
from gaswright.gas import find as find_gas
from gaswright.law import Around, Result, finish, like_unit, read_variable
from gaswright.model import Find, Relation, Row, Sheet
from gaswright.reading import Reading, read
from gaswright.records import Kind
from gaswright.sheet import SheetResult, Taken, question, take, work
from gaswright.tables import KINDS
from gaswright.uncertainty import Share

Response = dict[str, Any]
FEWEST_PERCENT = 0.5
ROW_DIGITS = 7
COUNTED = ("absolute", "gauge", "vacuum")
STATION_ROW = "p_station"
NO_U = "No uncertainty: every reading is exact."


class Display(NamedTuple):
    """How a figure is shown: its kind, the unit, the decimal mark."""

    kind: Kind
    unit: str
    mark: str

    def counted(self) -> str:
        """Give the word that says how a pressure is counted."""
        return f" {self.kind.reference}" if self.kind.reference in COUNTED else ""


def answer_relation(request: dict[str, Any]) -> Response:
    """Answer a law's page: rows with their states, the figure, ±, shares, working, warnings."""
    relation = finder.relation(str(request["key"]))
    unknown = str(request["find"])
    raw: dict[str, Any] = request.get("rows") or {}
    mark = request.get("decimal") or "."
    taken, rows, warnings = _read_law(relation, unknown, raw, request.get("decimal"))
    response = _blank(rows, cautions=())
    try:
        station = _site_station(request)
        if STATION_ROW in raw and station is not None:
            rows[STATION_ROW] = _ok_row(station, KINDS["station_pressure"])
    except ReadingError as error:
        rows[STATION_ROW] = _problem_row(error)
        return _state(response, "incomplete")
    try:
        gas_text = request.get("gas") or _text_of(raw.get("gas"))
        gas = find_gas(gas_text) if relation.uses_gas and gas_text else None
    except ReadingError as error:
        rows["gas"] = _problem_row(error)
        return _state(response, "incomplete")
    if any(row["state"] in ("empty", "error", "question") for row in rows.values()) or (
        relation.uses_gas and gas is None
    ):
        return _state(response, "empty" if not taken else "incomplete")
    try:
        result = finish(relation, unknown, taken, Around(station, gas, tuple(warnings), _show_unit(request)))
    except ReadingError as error:
        return _place_error(response, error, taken)
    except (NoSolutionError, OutsideRangeError) as error:
        return _state({**response, "refusal": str(error)}, "refused")
    return _law_figure(response, relation, result, _show_unit(request), mark)


def _show_unit(request: dict[str, Any]) -> str:
    return str((request.get("show") or {}).get("unit") or "")


def _text_of(raw: Any) -> str:
    return str(raw.get("text", "") if isinstance(raw, dict) else raw or "").strip()


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
            if not _text_of(entry) and variable.default is not None:
                taken[variable.name] = read_variable(variable, variable.default, decimal, None)
                rows[variable.name] = {"state": "default", "says": f"taken as {variable.default:g}"}
                warnings.append(f"{variable.symbol} was taken as {variable.default:g}, because none was given.")
            elif not _text_of(entry):
                rows[variable.name] = {"state": "empty", "says": ""}
            else:
                taken[variable.name] = read_variable(variable, entry or "", decimal, None)
                rows[variable.name] = _ok_row(taken[variable.name], KINDS[variable.kind])
        except ReadingError as error:
            rows[variable.name] = _problem_row(error)
    return taken, rows, warnings


def _ok_row(reading: Reading, kind: Kind) -> Response:
    counted = f" {reading.reference}" if reading.reference in COUNTED else ""
    si = f"{show.tidy(reading.value, 7)} {'°C' if kind.si == 'Cel' else kind.si}".removesuffix(" 1") + counted
    return {"state": "ok", "says": "", "si": si, "by": reading.by, "typed": reading.text}


def _problem_row(error: ReadingError) -> Response:
    says = f"Found {error.found}; expected {error.expected}. {error.todo}"
    offers = [{"text": text} for text in error.offers]
    return {"state": "question" if error.question else "error", "says": says, "offers": offers}


def _site_station(request: dict[str, Any]) -> Reading | None:
    """Give the station pressure a law's page carries in a row of its own, or that of the site conditions."""
    raw = (request.get("rows") or {}).get(STATION_ROW) or (request.get("site") or {}).get("station_pressure")
    if not _text_of(raw):
        return None
    return read("Station pressure", raw or "", KINDS["station_pressure"], request.get("decimal"))


def _blank(rows: dict[str, Response], cautions: tuple[str, ...]) -> Response:
    return {
        "state": "empty",
        "rows": rows,
        "figure": None,
        "best": "",
        "value": None,
        "unit": "",
        "expanded": None,
        "verdict": None,
        "versus": [],
        "shares": [],
        "working": [],
        "cautions": list(cautions),
        "warnings": [],
        "refusal": None,
        "extra": [],
        "plot": None,
    }


def _state(response: Response, state: str) -> Response:
    response["state"] = state
    return response


def _place_error(response: Response, error: ReadingError, taken: dict[str, Reading]) -> Response:
    """Put an error that came up while counting beside the row it belongs to."""
    for name, reading in taken.items():
        if error.where.startswith(reading.name):
            response["rows"][name] = _problem_row(error)
            return _state(response, "incomplete")
    return _state({**response, "refusal": str(error)}, "refused")


def _figure_texts(value: float, expanded: float, display: Display) -> tuple[float, float, str]:
    """Give the value and U in the unit shown, and the best estimate ± U as text."""
    kind, unit, mark = display
    shown, width = quantity.in_unit(value, kind, unit), quantity.interval_in_unit(expanded, kind, unit)
    best, plus = show.plus_minus(shown, width, mark)
    text = quantity.with_unit(best, unit)
    return shown, width, f"{text} ± {quantity.with_unit(plus, unit)}" if width else text


def _law_figure(response: Response, relation: Relation, result: Result, unit: str, mark: str) -> Response:
    variable = relation.variable(result.unknown)
    kind = KINDS[variable.kind]
    unit = unit or like_unit(relation, result.unknown, result.readings)
    display = Display(kind, unit, mark)
    shown, width, best = _figure_texts(result.value, result.expanded, display)
    counted = display.counted()
    figure = show.tidy(shown, 7, mark) if not width else show.plus_minus(shown, width, mark)[0]
    response |= {
        "figure": {
            "label": f"{variable.text[:1].upper()}{variable.text[1:]}",
            "text": quantity.with_unit(figure, unit) + counted,
            "unit": "",
            "row": show.tidy(shown, ROW_DIGITS, mark),
            "exact": _exact(shown, unit, kind),
        },
        "best": f"{best} ({_factor(result.k)})." if width else NO_U,
        "value": result.value,
        "unit": result.unit,
        "expanded": result.expanded,
        "shares": _shares(result.shares),
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
    return _state(response, "warning" if result.warnings else "answer")


def _exact(shown: float, unit: str, kind: Kind) -> Response:
    """Give the unrounded value in the unit shown, for the row that takes it over as a reading."""
    reference = kind.reference if kind.reference in COUNTED else ""
    return {"text": repr(shown), "unit": unit, "reference": reference}


def _factor(k: float) -> str:
    return f"k = {k:.3g}"


def _shares(shares: tuple[Share, ...]) -> list[Response]:
    return [
        {"label": share.label, "percent": round(share.fraction * 100)}
        for share in shares
        if share.fraction * 100 >= FEWEST_PERCENT
    ]


def answer_sheet(request: dict[str, Any]) -> Response:
    """Answer a sheet: rows with their states, the figure to sign, best estimate, verdict, shares, working, warnings."""
    sheet = finder.sheet(str(request["key"]))
    find = question(sheet, request.get("find"))
    raw = _with_site(sheet, request)
    mark = request.get("decimal") or "."
    taken = take(sheet, find, raw, request.get("decimal"), request.get("instruments"))
    rows = _sheet_rows(sheet, find, taken)
    response = _blank(rows, sheet.cautions)
    _question_unlikely(sheet, taken, rows)
    if taken.problems or taken.empty:
        nothing = not taken.readings and taken.gas is None
        return _state(response, "empty" if nothing else "incomplete")
    unit = _show_unit(request) or find.unit
    try:
        result = work(sheet, find, taken, unit)
    except ReadingError as error:
        return _place_error(response, error, taken.readings)
    except (NoSolutionError, OutsideRangeError) as error:
        return _state({**response, "refusal": str(error)}, "refused")
    return _sheet_figure(response, sheet, find, result, Display(KINDS[sheet.rows[find.row].kind], unit, mark))


def _with_site(sheet: Sheet, request: dict[str, Any]) -> dict[str, Any]:
    """Fill rows that are still empty from the site conditions, marked as coming from there."""
    raw: dict[str, Any] = dict(request.get("readings") or {})
    site = request.get("site") or {}
    for name, row in sheet.rows.items():
        entry = site.get(row.site) if row.site else None
        if not _text_of(raw.get(name)) and _text_of(entry):
            raw[name] = {**(entry if isinstance(entry, dict) else {"text": entry}), "from": "site"}
    return raw


def _sheet_rows(sheet: Sheet, find: Find, taken: Taken) -> dict[str, Response]:
    rows: dict[str, Response] = {}
    for name, row in sheet.rows.items():
        if not row.reading:
            continue
        if name == find.row:
            rows[name] = {"state": "find", "says": ""}
        elif name in taken.problems:
            rows[name] = _problem_row(taken.problems[name])
        elif row.is_gas and taken.gas is not None:
            rows[name] = {"state": "ok", "says": "", "si": taken.gas.formula, "typed": taken.gas.title}
        elif name in taken.clocks:
            rows[name] = {"state": "ok", "says": "", "typed": taken.clocks[name]}
        elif name in taken.readings:
            rows[name] = _ok_row(taken.readings[name], KINDS[row.kind])
            if taken.readings[name].came_from != "read":
                rows[name] |= {"state": "default", "says": _default_words(taken.readings[name])}
        else:
            rows[name] = {"state": "empty", "says": ""}
    return rows


def _default_words(reading: Reading) -> str:
    where = {"site": "from the site conditions", "found": "worked out here before"}.get(reading.came_from, "a preset")
    return f"{reading.text}, {where}, not yet confirmed"


def _question_unlikely(sheet: Sheet, taken: Taken, rows: dict[str, Response]) -> None:
    """Question what is possible and unlikely, without stopping."""
    for name, reading in taken.readings.items():
        above = sheet.rows[name].unusual_above
        if above is not None and reading.value > above and rows[name]["state"] == "ok":
            limit = quantity.text_of(above, KINDS[sheet.rows[name].kind], reading.unit)
            rows[name]["says"] = f"{reading.text} is unusual (above {limit}): check the number and its unit."


def _sheet_figure(response: Response, sheet: Sheet, find: Find, result: SheetResult, display: Display) -> Response:
    row = sheet.rows[find.row]
    kind, unit, mark = display
    shown, width, best = _figure_texts(result.value, result.expanded, display)
    text = _signed(find, row, result, display)
    counted = display.counted()
    way = "rounded down" if find.safe == "low" else "rounded up"
    best_line = (
        f"Best estimate {best}{counted} ({_factor(result.k)})." if width else f"Best estimate {best}{counted}. {NO_U}"
    )
    response |= {
        "figure": {
            "label": f"{find.label}, safe end, {way}",
            "text": text + counted,
            "unit": "",
            "row": show.tidy(shown, ROW_DIGITS, mark),
            "exact": _exact(shown, unit, kind),
        },
        "best": best_line + (f" Unrounded {show.tidy(shown, 10, mark)}." if row.whole else ""),
        "value": result.value,
        "unit": result.unit,
        "expanded": result.expanded,
        "safe": result.safe,
        "verdict": _verdict_words(sheet, find, result, text, mark),
        "versus": _versus(result, display),
        "shares": _shares(result.shares),
        "working": [{"text": line.text, "relation": line.relation, "title": line.title} for line in result.working],
        "warnings": [*result.warnings, *_assumption(result, display)],
        "extra": _extra(sheet, find, result, mark),
        "rule": sheet.rule,
    }
    return _state(response, "warning" if result.warnings else "answer")


def _signed(find: Find, row: Row, result: SheetResult, display: Display) -> str:
    """Give the figure to sign: the safe end, rounded to the safe side."""
    kind, unit, mark = display
    shown, width = quantity.in_unit(result.value, kind, unit), quantity.interval_in_unit(result.expanded, kind, unit)
    down = find.safe == "low"
    if row.whole:
        return show.number(show.rounded_to(shown + (-width if down else width), 1.0, down=down), 0, mark)
    if unit in ("min", "h"):
        return show.duration(_stepped(result.safe, result.expanded, unit, down=down), down=down)
    return quantity.with_unit((show.safe_low if down else show.safe_high)(shown, width, mark), unit)


def _stepped(seconds: float, expanded: float, unit: str, *, down: bool) -> float:
    """Round a time to the step its uncertainty allows, in whole minutes at the finest for an hour and more."""
    scale = {"min": 60.0, "h": 3600.0}[unit]
    step = show.step_for(expanded / scale)
    return seconds if step is None else show.rounded_to(seconds / scale, step, down=down) * scale


def _verdict_words(sheet: Sheet, find: Find, result: SheetResult, text: str, mark: str) -> Response | None:
    if result.limit is None:
        return None
    row = sheet.rows[find.limit]
    unit = result.readings[find.limit].unit
    limit = quantity.text_of(result.limit, KINDS[row.kind], unit, mark)
    says = {
        "PASS": f"{find.limit_text} {limit}; the safe end is {text}.",
        "FAIL": f"{find.limit_text} {limit}; not reached even at the favourable end of the uncertainty.",
        "CANNOT DECIDE": f"{find.limit_text} {limit}, which lies inside the uncertainty of these instruments. "
        + _would_decide(result),
    }[result.verdict]
    return {"word": result.verdict, "says": says}


def _would_decide(result: SheetResult) -> str:
    """Say what would decide: how small U must be, and which reading to better first."""
    margin = abs(result.value - (result.limit or 0.0))
    if not result.shares or margin == 0:
        return "The best estimate stands on the limit itself: no instrument decides it."
    worst = result.shares[0]
    return (
        f"An uncertainty {result.expanded / margin:.2g} times smaller would decide; "
        f"{worst.label} contributes {worst.fraction * 100:.0f} % of it, so better that first."
    )


def _versus(result: SheetResult, display: Display) -> list[list[str]]:
    """Give real and ideal side by side, with the difference in per cent."""
    kind, unit, mark = display

    def shown(value: float) -> str:
        return quantity.with_unit(show.tidy(quantity.in_unit(value, kind, unit), 5, mark), unit) + display.counted()

    rows = [[f"Real {result.gas.lower()}", shown(result.value)]]
    if result.ideal is None:
        return [*rows, ["Ideal law", "no answer"]]
    off = (result.ideal / result.value - 1) * 100 if result.value else 0.0
    side = "more" if off > 0 else "less"
    difference = f", {abs(off):.2g} % {side}".replace(".", mark) if kind.si not in ("K", "Cel") else ""
    return [*rows, ["Ideal law", shown(result.ideal) + difference]]


def _assumption(result: SheetResult, display: Display) -> list[str]:
    """Say which assumption on shared instrument error was used, and what the other would give."""
    kind, unit, mark = display
    if not any(reading.instrument for reading in result.readings.values()) or result.other_u == result.u:
        return []
    other = quantity.with_unit(
        show.significant(quantity.interval_in_unit(result.k * result.other_u, kind, unit), 2, mark), unit
    )
    used = "shared fully, because the readings are close together" if result.shared else "independent between readings"
    return [
        f"The error of an instrument used more than once is taken as {used}; the other assumption gives U = {other}."
    ]


def _extra(sheet: Sheet, find: Find, result: SheetResult, mark: str) -> list[list[str]]:
    """Give what else is read off the answer: clock time of a changeover, mass and amount of a content."""
    lines: list[list[str]] = []
    if result.ends:
        lines.append(["Change over by", result.ends])
    for name in ("m", "n"):
        if find.row == "V_ref" and name in sheet.rows:
            kind = KINDS[sheet.rows[name].kind]
            value = result.values[name] * result.safe / result.value
            lines.append(
                [
                    f"{sheet.rows[name].title}, safe end",
                    quantity.with_unit(show.significant(value, 4, mark), kind.units[0]),
                ]
            )
    pair = [result.readings[name] for name in ("T_ref", "p_ref") if name in result.readings]
    if len(pair) == 2:
        lines.append(["Reference conditions", ", ".join(reading.text for reading in pair)])
    return lines


def refused(error: GaswrightError) -> Response:
    """Answer a request that cannot be read at all."""
    return {**_blank({}, ()), "state": "refused", "refusal": str(error)}
