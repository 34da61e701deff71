"""Answer the converter: a reading in every unit of its kind, a pressure counted in every way.

Takes a request as a plain dictionary; gives a response as one, every text ready to draw. gaswright.browser speaks JSON
with the page; the worked example of the page is drawn with it, too.
"""

from typing import Any

from gaswright import quantity, show
from gaswright.counting import read_station, to_reference
from gaswright.errors import ReadingError
from gaswright.reading import COUNTED, Reading, read
from gaswright.records import Kind
from gaswright.respond import ROW_DIGITS, Response, ok_row, problem_row
from gaswright.tables import KINDS, UNITS
from gaswright.typed import text_of

READING, STATION = "reading", "p_station"
PRESSURE, DIFFERENCE = "absolute_pressure", "pressure_change"
NEEDS_STATION = "Give the station pressure to see it counted the other ways."
SAME_PAIR = "Counted at the same reference conditions throughout; the law of reference volumes changes those."


def answer_convert(request: dict[str, Any]) -> Response:
    """Answer a reading of the kind named: its row's state, and the same quantity in each unit, one line each."""
    rows = request.get("rows") or {}
    mark = request.get("decimal") or "."
    kind = _kind(request, rows.get(READING))
    states: dict[str, Response] = {}
    reading = _read(states, READING, rows, kind, request.get("decimal"))
    station = None
    if kind.reference in COUNTED:
        station = _read(states, STATION, rows, KINDS["station_pressure"], request.get("decimal"))
    if reading is None or any(row["state"] in ("error", "question") for row in states.values()):
        is_empty = states[READING]["state"] == "empty"
        return _response(states, "empty" if is_empty else "incomplete")
    try:
        return _converted(states, reading, station, kind, mark)
    except ReadingError as error:
        states[READING] = problem_row(error)
        return _response(states, "incomplete")


def units_of(kind: Kind) -> tuple[str, ...]:
    """Give the units of a kind: those that rows offer first, then every other of the same dimension."""
    is_shared = "temperature" in kind.key or not any(kind.exponents)
    others = () if is_shared else (key for key, unit in UNITS.items() if unit.exponents == kind.exponents)
    return tuple(dict.fromkeys((*kind.units, *others)))


def _kind(request: dict[str, Any], raw: Any) -> Kind:
    """Give the kind named; a pressure counted as a difference is one of its own."""
    key = request.get("kind") or ""
    if key not in KINDS:
        raise ReadingError(
            "request, kind", repr(key[:40]), "a kind of quantity, such as volume", "Load the page again."
        )
    counted = raw.get("reference") if isinstance(raw, dict) else ""
    return KINDS[DIFFERENCE if key == PRESSURE and counted == "difference" else key]


def _read(
    states: dict[str, Response], name: str, rows: dict[str, Any], kind: Kind, decimal: str | None
) -> Reading | None:
    """Read one row and keep its state; nothing where it is empty or cannot be taken."""
    raw = rows.get(name, "")
    if not text_of(raw):
        states[name] = {"state": "empty", "says": "", "offers": []}
        return None
    try:
        reading = (
            read_station("Station pressure", raw, decimal) if name == STATION else read("Reading", raw, kind, decimal)
        )
    except ReadingError as error:
        states[name] = problem_row(error)
        return None
    states[name] = ok_row(reading, kind, decimal or ".")
    return reading


def _converted(
    states: dict[str, Response], reading: Reading, station: Reading | None, kind: Kind, mark: str
) -> Response:
    ways = _ways(reading, station) if kind.reference in COUNTED else {kind.reference: reading.value}
    lines = [[unit, *(_shown(value, kind, unit, mark) for value in ways.values())] for unit in units_of(kind)]
    response = _response(states, "answer")
    response["head"] = ["Unit", *(way or "Reading" for way in ways)]
    response["lines"] = lines
    response["label"] = f"{reading.text} is"
    response["says"] = _says(reading, station, kind)
    response["warnings"] = list(reading.warnings)
    return response


def _ways(reading: Reading, station: Reading | None) -> dict[str, float]:
    """Give the pressure counted in each way that can be told; a vacuum only where it lies below the station."""
    if station is None:
        return {reading.reference: reading.value}
    ways = {way: to_reference(reading, way, station)[0] for way in ("absolute", "gauge", "vacuum")}
    if ways["vacuum"] <= 0:
        del ways["vacuum"]
    return ways


def _shown(value: float, kind: Kind, unit: str, mark: str) -> str:
    return show.tidy(quantity.in_unit(value, kind, unit), ROW_DIGITS, mark)


def _says(reading: Reading, station: Reading | None, kind: Kind) -> str:
    if reading.conditions:
        return SAME_PAIR
    return NEEDS_STATION if kind.reference in COUNTED and station is None else ""


def _response(states: dict[str, Response], state: str) -> Response:
    return {"state": state, "rows": states, "label": "", "head": [], "lines": [], "says": "", "warnings": []}
