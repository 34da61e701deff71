"""Work a job sheet: from readings as typed to the row asked for, its uncertainty and its safe end.

Takes a sheet's key and the input part of a record; gives a SheetResult. gaswright.answer_sheet draws it.
"""

import math
from typing import Any, NamedTuple

from gaswright import clock, conditions, quantity, working
from gaswright import find as finder
from gaswright import request as requests
from gaswright.counting import to_reference, turn
from gaswright.errors import NoSolutionError, OutsideRangeError, ReadingError
from gaswright.gas import Gas, IdealGas
from gaswright.model import Find, Sheet, Step
from gaswright.network import said_outside, slopes, travel
from gaswright.notes import NOTES
from gaswright.reading import Reading
from gaswright.tables import KINDS
from gaswright.take import Taken, question, refuse_outside_row, take
from gaswright.uncertainty import Combined, Share, combine

STATION_KIND = "station_pressure"
NEAR_CRITICAL = 1.2


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
    requests.check(record)
    sheet = finder.sheet(key)
    find = question(sheet, record.get("find"))
    taken = take(sheet, find, record.get("readings") or {}, record.get("decimal"), record.get("instruments"))
    for problem in taken.problems.values():
        raise problem
    for name in taken.empty:
        raise ReadingError(sheet.rows[name].title, "nothing", "a reading", "Type the reading, or ask for this row.")
    show = quantity.shown_unit(record.get("show"), KINDS[sheet.rows[find.row].kind])
    return work(sheet, find, taken, show, record.get("decimal") or ".")


def work(sheet: Sheet, find: Find, taken: Taken, show: str = "", mark: str = ".") -> SheetResult:
    """Give the answer of readings taken, its working in the unit ``show`` and with the decimal ``mark``.

    Raises ReadingError, NoSolutionError or OutsideRangeError where there is none.
    """
    gas = taken.gas()
    given, couplings = _counted(sheet, taken, gas)
    warnings = _warnings(sheet, taken, given)
    values = travel(sheet, find, given, gas)
    _refuse_outside(sheet, find, values)
    warnings += [*_near_critical(sheet, values, gas), *said_outside(sheet, values)]
    combined = _combined(sheet, find, values, taken, couplings)
    ideal, ideal_says = _ideal(sheet, find, given, gas)
    value, row = values[find.row], sheet.rows[find.row]
    safe, said = _safe_end(sheet, find, taken, value, combined.expanded)
    limit, verdict = _verdict(find, values, combined.expanded)
    units = {name: reading.unit for name, reading in taken.readings.items()} | ({find.row: show} if show else {})
    return SheetResult(
        key=sheet.key,
        find=find.row,
        value=value,
        unit=KINDS[row.kind].si,
        u=combined.u,
        expanded=combined.expanded,
        k=combined.k,
        freedom=combined.freedom,
        safe=safe,
        shares=combined.shares,
        shared=combined.shared,
        other_u=combined.other_u,
        ideal=ideal,
        ideal_says=ideal_says,
        gas=gas.title,
        values=values,
        readings=taken.readings,
        working=tuple(_working(sheet, find, values, units, mark)),
        warnings=tuple(dict.fromkeys([*warnings, *said])),
        verdict=verdict,
        limit=limit,
        low=row.low,
        high=row.high,
        ends=_ends(find, taken, safe),
    )


def _warnings(sheet: Sheet, taken: Taken, given: dict[str, float]) -> list[str]:
    kinds = {name: row.kind for name, row in sheet.rows.items() if row.reading}
    said = [text for name in sheet.notes for text in NOTES[name](given, taken.readings)]
    said += [text for reading in taken.readings.values() for text in reading.warnings]
    return [*said, *conditions.check(taken.readings, given, kinds)]


def _safe_end(sheet: Sheet, find: Find, taken: Taken, value: float, expanded: float) -> tuple[float, tuple[str, ...]]:
    """Give the safe end in SI, no lower than the quantity can be, and say so where nothing is left to promise."""
    if find.safe == "high":
        return value + expanded, ()
    kind = KINDS[sheet.rows[find.row].kind]
    station = _station(sheet, taken)
    least = -station.value if kind.reference == "gauge" and station else 0.0 if kind.low >= 0 else -math.inf
    if value - expanded > least:
        return value - expanded, ()
    return least, ("The uncertainty is as large as the figure: with these instruments nothing can be promised.",)


def _near_critical(sheet: Sheet, values: dict[str, float], gas: Gas) -> list[str]:
    """Say so where a gas stands above its critical point and near its critical temperature."""
    said = []
    for use in sheet.uses:
        p, T = (values.get(use.rows.get(name, ""), 0.0) for name in ("p", "T"))
        if p > gas.p_c and gas.T_c <= T < NEAR_CRITICAL * gas.T_c:
            at = f"{gas.T_c - quantity.ZERO_CELSIUS:.0f} °C and {gas.p_c / 1e5:.0f} bar"
            said.append(
                f"{gas.title} is above its critical point ({at}): a small change of temperature moves the pressure "
                "much. Weigh it to be sure."
            )
    return said


def _ends(find: Find, taken: Taken, safe: float) -> str:
    """Give the time of day at the safe end, where the question has a start."""
    return clock.later(taken.clocks[find.clock], safe) if find.clock in taken.clocks else ""


def _counted(sheet: Sheet, taken: Taken, gas: Gas) -> tuple[dict[str, float], dict[str, float]]:
    """Give every reading in SI as its row counts it, and its slope by the station pressure."""
    station = _station(sheet, taken)
    given: dict[str, float] = {}
    couplings: dict[str, float] = {}
    for name, reading in taken.readings.items():
        given[name], couplings[name] = to_reference(reading, KINDS[sheet.rows[name].kind].reference, station)
        refuse_outside_row(sheet.rows[name], reading, given[name])
    for name, row in sheet.rows.items():
        if row.of_gas:
            given[name] = getattr(gas, row.of_gas)
    return given, couplings


def _station(sheet: Sheet, taken: Taken) -> Reading | None:
    return next((reading for name, reading in taken.readings.items() if sheet.rows[name].kind == STATION_KIND), None)


def _refuse_outside(sheet: Sheet, find: Find, values: dict[str, float]) -> None:
    row = sheet.rows[find.row]
    value = values[find.row]
    least = 0.0 if row.whole else row.low  # half a cylinder is an answer: one is signed
    if not least <= value <= row.high:
        kind = KINDS[row.kind]
        low, high, found = (quantity.text_of(edge, kind, find.unit) for edge in (least, row.high, value))
        raise NoSolutionError(row.title, found, f"between {low} and {high}", "Check the readings and their units.")


def _combined(
    sheet: Sheet, find: Find, values: dict[str, float], taken: Taken, couplings: dict[str, float]
) -> Combined:
    """Combine the readings, and the gas equation's own uncertainty as one independent input for each state."""
    gas = taken.gas()
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
    return Reading(
        name=f"Equation of the gas, {title[:1].lower()}{title[1:]}",
        text="",
        number=0.0,
        unit="1",
        value=0.0,
        reference="",
        u=relative,
        u_systematic=relative,
        u_random=0.0,
        freedom=math.inf,
        by="stated by the equation’s authors",
        instrument="",
        span=0.0,
        came_from="preset",
        conditions=None,
        warnings=(),
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


def _working(sheet: Sheet, find: Find, values: dict[str, float], units: dict[str, str], mark: str) -> list[Line]:
    lines = []
    for part in find.route:
        steps = (part,) if isinstance(part, Step) else (*part.steps, Step(part.use, "", part.torn))
        lines += [_line(sheet, step, values, units, mark) for step in steps]
    return lines


def _line(sheet: Sheet, step: Step, values: dict[str, float], units: dict[str, str], mark: str) -> Line:
    use = sheet.uses[step.use]
    relation = finder.relation(use.relation)
    unknown = step.unknown or next(name for name, row in use.rows.items() if row in values)
    own = {name: values[row] for name, row in use.rows.items() if row in values}
    own_units = {name: units.get(row, "") for name, row in use.rows.items()}
    text = working.line(relation, unknown, own, own_units, mark)
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
