"""Work a job sheet: from readings as typed to the row asked for, its uncertainty and its safe end.

Takes a sheet's key and the input part of a record; gives a SheetResult. gaswright.answer_sheet draws it.
"""

from typing import Any, NamedTuple

from gaswright import clock, quantity, working
from gaswright import find as finder
from gaswright.errors import GaswrightError, NoSolutionError, OutsideRangeError, ReadingError
from gaswright.gas import Gas, IdealGas
from gaswright.gas import find as find_gas
from gaswright.model import Find, Row, Sheet, Step
from gaswright.network import slopes, travel
from gaswright.notes import NOTES
from gaswright.reading import Instruments, Reading, read, to_reference, turn
from gaswright.tables import KINDS
from gaswright.uncertainty import Combined, Share, combine

STATION_KIND = "station_pressure"
EXACT = 0.0


class Taken(NamedTuple):
    """Readings of a sheet as taken: by row, the gas, what went wrong by row, and rows still empty."""

    readings: dict[str, Reading]
    gas: Gas | None
    problems: dict[str, ReadingError]
    empty: tuple[str, ...]
    clocks: dict[str, str]


class Line(NamedTuple):
    """A line of working and the law it comes from."""

    text: str
    relation: str
    title: str


class SheetResult(NamedTuple):
    """The answer: SI ``value`` of the row found, its uncertainty, the safe end (SI, unrounded), and how it came."""

    key: str
    find: str
    value: float
    unit: str
    u: float
    expanded: float
    k: float
    freedom: float
    safe: float
    shares: tuple[Share, ...]
    shared: tuple[str, ...]
    other_u: float
    ideal: float | None
    ideal_says: str
    gas: str
    values: dict[str, float]
    readings: dict[str, Reading]
    working: tuple[Line, ...]
    warnings: tuple[str, ...]
    verdict: str
    limit: float | None
    low: float
    high: float
    ends: str


def run_sheet(key: str, record: dict[str, Any]) -> SheetResult:
    """Work the sheet ``key``.

    ``record`` holds ``find`` (the row asked for; the sheet's first question by default), ``readings`` (row to text,
    SI float or record), and optionally ``instruments`` and ``decimal``. Raises ReadingError for the first reading
    that cannot be taken, NoSolutionError or OutsideRangeError where there is no figure.
    """
    sheet = finder.sheet(key)
    find = question(sheet, record.get("find"))
    taken = take(sheet, find, record.get("readings", {}), record.get("decimal"), record.get("instruments"))
    for problem in taken.problems.values():
        raise problem
    for name in taken.empty:
        raise ReadingError(sheet.rows[name].title, "nothing", "a reading", "Type the reading, or ask for this row.")
    return work(sheet, find, taken, str(record.get("show", {}).get("unit", "")))


def question(sheet: Sheet, row: str | None) -> Find:
    """Give the question asked; ReadingError names the rows that may be found."""
    if row is None:
        return next(iter(sheet.finds.values()))
    if row not in sheet.finds:
        raise ReadingError(
            sheet.title, f"the question {row!r}", f"one of {', '.join(sheet.finds)}", "Ask for one of these."
        )
    return sheet.finds[row]


def take(
    sheet: Sheet, find: Find, raw: dict[str, Any], decimal: str | None = None, instruments: Instruments | None = None
) -> Taken:
    """Read every row; gather what is wrong and what is missing instead of stopping."""
    readings: dict[str, Reading] = {}
    problems: dict[str, ReadingError] = {name: _unknown_row(sheet, name) for name in raw if name not in sheet.rows}
    empty: list[str] = []
    clocks: dict[str, str] = {}
    gas: Gas | None = None
    for name, row in sheet.rows.items():
        if not row.reading or name == find.row:
            continue
        try:
            if row.is_gas:
                gas = _gas(raw.get(name))
            elif _is_empty(raw.get(name)):
                if not row.optional:
                    empty.append(name)
            elif row.is_clock:
                clocks[name] = clock.check(_text(raw[name]), row.title)
            else:
                readings[name] = _read_row(row, raw[name], decimal, instruments)
        except ReadingError as problem:
            problems[name] = problem
    gas_row = next((name for name, row in sheet.rows.items() if row.is_gas), None)
    if gas is None and gas_row and gas_row not in problems:
        empty.append(gas_row)
    return Taken(readings, gas, problems, tuple(empty), clocks)


def _unknown_row(sheet: Sheet, name: str) -> ReadingError:
    rows = ", ".join(row for row, meaning in sheet.rows.items() if meaning.reading)
    return ReadingError(sheet.title, f"the row {str(name)[:40]!r}", f"one of {rows}", "Correct the name.")


def _is_empty(raw: Any) -> bool:
    return raw is None or not _text(raw).strip()


def _text(raw: Any) -> str:
    return str(raw.get("text", "") if isinstance(raw, dict) else raw)


def _gas(raw: Any) -> Gas | None:
    return None if _is_empty(raw) else find_gas(str(raw["text"] if isinstance(raw, dict) else raw))


def _read_row(row: Row, raw: Any, decimal: str | None, instruments: Instruments | None) -> Reading:
    if row.accuracy and isinstance(raw, str):
        raw = {"text": raw, "accuracy": row.accuracy}
    elif row.accuracy and isinstance(raw, dict) and not raw.get("accuracy") and not raw.get("instrument"):
        raw = {**raw, "accuracy": row.accuracy}
    reading = read(row.title, raw, KINDS[row.kind], decimal, instruments)
    is_counted_otherwise = reading.reference != KINDS[row.kind].reference
    if not is_counted_otherwise and not row.low <= reading.value <= row.high:
        raise _out_of_row(row, reading)
    if row.whole and abs(reading.number - round(reading.number)) > 1e-9:
        raise ReadingError(row.title, reading.text, "a whole number", "Count again.")
    return reading


def _out_of_row(row: Row, reading: Reading) -> ReadingError:
    kind = KINDS[row.kind]
    low, high = (quantity.text_of(edge, kind, reading.unit) for edge in (row.low, row.high))
    return ReadingError(row.title, reading.text, f"between {low} and {high}", "Check the number and its unit.")


def work(sheet: Sheet, find: Find, taken: Taken, show: str = "") -> SheetResult:
    """Give the answer of readings taken. Raises NoSolutionError or OutsideRangeError where there is none."""
    if taken.gas is None:
        raise ReadingError("Gas", "nothing", "the gas by name or formula", "Choose the gas.")
    given, couplings = _counted(sheet, taken)
    warnings = [text for name in sheet.notes for text in NOTES[name](given, taken.readings)]
    warnings += [text for reading in taken.readings.values() for text in reading.warnings]
    values = travel(sheet, find, given, taken.gas)
    _refuse_outside(sheet, find, values)
    combined = _combined(sheet, find, values, taken, couplings)
    ideal, ideal_says = _ideal(sheet, find, given, taken.gas)
    value = values[find.row]
    row = sheet.rows[find.row]
    kind = KINDS[row.kind]
    safe = value - combined.expanded if find.safe == "low" else value + combined.expanded
    limit, verdict = _verdict(find, values, combined.expanded)
    units = {name: reading.unit for name, reading in taken.readings.items()} | ({find.row: show} if show else {})
    return SheetResult(
        sheet.key,
        find.row,
        value,
        kind.si,
        combined.u,
        combined.expanded,
        combined.k,
        combined.freedom,
        safe,
        combined.shares,
        combined.shared,
        combined.other_u,
        ideal,
        ideal_says,
        taken.gas.title,
        values,
        taken.readings,
        tuple(_working(sheet, find, values, units)),
        tuple(dict.fromkeys(warnings)),
        verdict,
        limit,
        row.low,
        row.high,
        _ends(find, taken, safe),
    )


def _ends(find: Find, taken: Taken, safe: float) -> str:
    """Give the time of day at the safe end, where the question has a start."""
    return clock.later(taken.clocks[find.clock], safe) if find.clock in taken.clocks else ""


def _counted(sheet: Sheet, taken: Taken) -> tuple[dict[str, float], dict[str, float]]:
    """Give every reading in SI as its row counts it, and its slope by the station pressure."""
    station = _station(sheet, taken)
    given: dict[str, float] = {}
    couplings: dict[str, float] = {}
    for name, reading in taken.readings.items():
        given[name], couplings[name] = to_reference(reading, KINDS[sheet.rows[name].kind].reference, station)
    for name, row in sheet.rows.items():
        if row.of_gas:
            given[name] = getattr(taken.gas, row.of_gas)
    return given, couplings


def _station(sheet: Sheet, taken: Taken) -> Reading | None:
    return next((reading for name, reading in taken.readings.items() if sheet.rows[name].kind == STATION_KIND), None)


def _refuse_outside(sheet: Sheet, find: Find, values: dict[str, float]) -> None:
    row = sheet.rows[find.row]
    value = values[find.row]
    if not (row.low <= value <= row.high or row.whole):
        kind = KINDS[row.kind]
        low, high, found = (quantity.text_of(edge, kind, find.unit) for edge in (row.low, row.high, value))
        raise NoSolutionError(row.title, found, f"between {low} and {high}", "Check the readings and their units.")


def _combined(
    sheet: Sheet, find: Find, values: dict[str, float], taken: Taken, couplings: dict[str, float]
) -> Combined:
    """Combine the readings, and the gas equation's own uncertainty as one independent input for each state."""
    gas = taken.gas
    if gas is None:
        raise ReadingError("Gas", "nothing", "the gas by name or formula", "Choose the gas.")
    found = slopes(sheet, find, values, gas)
    station = _station(sheet, taken)
    gradient: list[float] = []
    readings: list[Reading] = []
    for name, reading in taken.readings.items():
        slope = found.by_row.get(name, 0.0) * turn(reading, KINDS[sheet.rows[name].kind].reference)
        if reading is station:
            slope += sum(found.by_row.get(other, 0.0) * coupling for other, coupling in couplings.items())
        gradient.append(slope)
        readings.append(reading)
    for place, slope in found.by_equation.items():
        rows = sheet.uses[place].rows
        relative = gas.density_uncertainty(values[rows["p"]], values[rows["T"]]) / 2
        gradient.append(slope)
        readings.append(_equation_reading(sheet.rows[rows["rho"]].title, relative))
    return combine(gradient, readings)


def _equation_reading(title: str, relative: float) -> Reading:
    infinite = float("inf")
    return Reading(
        f"Equation of the gas, {title.lower()}",
        "",
        0.0,
        "1",
        0.0,
        "",
        relative,
        relative,
        0.0,
        infinite,
        "stated by the equation’s authors",
        "",
        0.0,
        "preset",
        None,
        (),
    )


def _ideal(sheet: Sheet, find: Find, given: dict[str, float], gas: Gas) -> tuple[float | None, str]:
    try:
        return travel(sheet, find, given, IdealGas(gas))[find.row], ""
    except (NoSolutionError, OutsideRangeError) as error:
        return None, str(error)


def _verdict(find: Find, values: dict[str, float], expanded: float) -> tuple[float | None, str]:
    """Hold the figure against its limit: PASS, FAIL or CANNOT DECIDE (JCGM 106:2012, guarded acceptance)."""
    if not find.limit or find.limit not in values:
        return None, ""
    limit, value = values[find.limit], values[find.row]
    margin = value - limit if find.safe == "low" else limit - value
    if margin >= expanded:
        return limit, "PASS"
    return limit, "FAIL" if margin <= -expanded and margin < 0 else "CANNOT DECIDE"


def _working(sheet: Sheet, find: Find, values: dict[str, float], units: dict[str, str]) -> list[Line]:
    lines = []
    for part in find.route:
        steps = (part,) if isinstance(part, Step) else (*part.steps, Step(part.use, "", part.torn))
        lines += [_line(sheet, step, values, units) for step in steps]
    return lines


def _line(sheet: Sheet, step: Step, values: dict[str, float], units: dict[str, str]) -> Line:
    use = sheet.uses[step.use]
    relation = finder.relation(use.relation)
    unknown = step.unknown or next(name for name, row in use.rows.items() if row in values)
    own = {name: values[row] for name, row in use.rows.items() if row in values}
    own_units = {name: units.get(row, "") for name, row in use.rows.items()}
    text = working.line(relation, unknown, own, own_units)
    return Line(f"{sheet.rows[step.row].title}: {text}", relation.key, relation.title)


def worked_example(key: str, row: str) -> SheetResult:
    """Work the sheet's example for any of its questions; the first answer stands in when another is asked."""
    sheet = finder.sheet(key)
    first = next(iter(sheet.finds))
    if row == first:
        return run_sheet(key, {"find": first, "readings": sheet.example})
    answer = run_sheet(key, {"find": first, "readings": sheet.example})
    readings = {name: text for name, text in sheet.example.items() if name != row}
    return run_sheet(key, {"find": row, "readings": {**readings, first: answer.value}})


def refusal(error: GaswrightError) -> str:
    """Give the four parts of an error as one text for a page."""
    return str(error)
