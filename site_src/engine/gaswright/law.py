"""Solve a law for one unknown from readings as typed.

Takes a key, an unknown and readings; gives a Result with the SI value, its uncertainty, working and warnings.
gaswright.answer_law draws it for a page, gaswright.__main__ prints it.
"""

from collections.abc import Mapping, Sequence
from typing import NamedTuple

from gaswright import any_kind, conditions, find, quantity, terms, working
from gaswright.counting import questioned, read_station, to_reference, turn
from gaswright.errors import ReadingError
from gaswright.evaluate import check_validity, evaluate, no_slope
from gaswright.evaluate import slopes as slopes_of
from gaswright.gas import Gas
from gaswright.gas import find as find_gas
from gaswright.model import Relation, Variable
from gaswright.reading import Instruments, Raw, Reading, read
from gaswright.tables import KINDS
from gaswright.typed import text_of
from gaswright.uncertainty import Combined, Share, combine

NO_STATION = "station pressure"


class Result(NamedTuple):
    """The answer: ``value`` in the SI ``unit``, standard uncertainty ``u``, ``expanded`` = k·u, and how it came."""

    key: str
    unknown: str
    value: float
    unit: str
    u: float
    expanded: float
    k: float
    freedom: float
    shares: tuple[Share, ...]
    working: tuple[str, ...]
    warnings: tuple[str, ...]
    values: dict[str, float]
    readings: dict[str, Reading]
    sensitivities: dict[str, float]


def solve(  # noqa: PLR0913 - what a caller may say, all by name but three
    key: str,
    unknown: str,
    readings: Mapping[str, Raw | Sequence[Raw | None]],
    *,
    station_pressure: Raw | None = None,
    gas: str | None = None,
    decimal: str | None = None,
    instruments: Instruments | None = None,
    show: str = "",
    branch: str = "",
) -> Result:
    """Solve the law ``key`` for ``unknown``.

    ``readings`` maps variable names to typed text ("6.5 psia", "30 ± 0.2 mL"), SI floats or records; a variable with
    a default may be left out. A variable that is a list takes a list of these, with None for the term to find.
    ``station_pressure`` is needed where a gauge reading meets an absolute variable.
    Where two values may satisfy the law, ``branch`` says which (such as "above_peak"); without it, two are asked about.
    Raises ReadingError, NoSolutionError or OutsideRangeError, each in four parts.
    """
    relation, unknown, given = terms.spread(find.relation(key), unknown, readings)
    relation = any_kind.settled(relation, given)
    _check_names(relation, unknown, given)
    station = None if station_pressure is None else read_station(NO_STATION, station_pressure, decimal)
    gas_name = gas or text_of(given.get("gas"))
    model = find_gas(gas_name) if relation.uses_gas and gas_name else None
    taken, warnings = _read_all(relation, unknown, given, decimal, instruments)
    shown = quantity.shown_unit({"unit": show}, KINDS[relation.variable(unknown).kind])
    return finish(relation, unknown, taken, Around(station, model, tuple(warnings), shown, decimal or ".", branch))


def _check_names(relation: Relation, unknown: str, readings: Mapping[str, Raw]) -> None:
    names = [variable.name for variable in relation.variables]
    allowed = [*names, "gas"] if relation.uses_gas else names
    for name in [unknown, *readings]:
        if name not in (names if name == unknown else allowed):
            raise ReadingError(relation.title, repr(str(name)[:40]), f"one of {', '.join(names)}", "Correct the name.")


def _read_all(
    relation: Relation, unknown: str, given: Mapping[str, Raw], decimal: str | None, instruments: Instruments | None
) -> tuple[dict[str, Reading], list[str]]:
    taken: dict[str, Reading] = {}
    warnings: list[str] = []
    readings = conditions.filled(given, kinds_of(relation), unknown, decimal)
    for variable in relation.variables:
        raw = readings.get(variable.name)
        if variable.name == unknown:
            continue
        if raw is None and variable.default is not None:
            warnings.append(f"{variable.symbol} was taken as {variable.default:g}, because none was given.")
            raw = variable.default
        taken[variable.name] = read_variable(variable, "" if raw is None else raw, decimal, instruments)
    return taken, warnings


def kinds_of(relation: Relation) -> dict[str, str]:
    """Give the kind of each variable by name."""
    return {variable.name: variable.kind for variable in relation.variables}


def read_variable(variable: Variable, raw: Raw, decimal: str | None, instruments: Instruments | None) -> Reading:
    """Read one variable of a law and refuse a value of the wrong sign."""
    where = f"{variable.symbol}, {variable.text}"
    if variable.choices and not isinstance(raw, (int, float)):
        return _chosen(variable, raw, where)
    reading = read(where, raw, KINDS[variable.kind], decimal, instruments)
    if reading.reference == KINDS[variable.kind].reference:
        _refuse_sign(variable, reading, reading.value)
    return reading


def _chosen(variable: Variable, raw: Raw, where: str) -> Reading:
    """Give the place of a word among the choices of a variable, as an exact reading."""
    typed = text_of(raw)
    words = [word for word in variable.choices if word.casefold() == typed.casefold()]
    if not words:
        expected = f"one of {', '.join(variable.choices)}"
        raise ReadingError(where, repr(typed[:40]), expected, "Choose one.", offers=variable.choices)
    reading = read(where, float(variable.choices.index(words[0])), KINDS[variable.kind])
    return reading._replace(text=words[0])


def _refuse_sign(variable: Variable, reading: Reading, value: float) -> None:
    if (variable.sign == "positive" and value <= 0) or (variable.sign == "nonnegative" and value < 0):
        expected = "more than zero" if variable.sign == "positive" else "zero or more"
        counted = KINDS[variable.kind].reference
        counted = f" {counted}" if counted != reading.reference else ""
        raise ReadingError(reading.name, reading.text, f"{expected}{counted}", "Check the number and its sign.")


class Around(NamedTuple):
    """What stands around the readings of a law.

    Station pressure, gas, warnings so far, unit and decimal mark shown; the side asked for, where two answers fit.
    """

    station: Reading | None
    gas: Gas | None
    warnings: tuple[str, ...]
    show: str
    mark: str
    side: str = ""


def finish(relation: Relation, unknown: str, taken: dict[str, Reading], around: Around) -> Result:
    """Give the Result of readings already taken."""
    station, gas, said_before, show, mark, side = around
    if relation.uses_gas and gas is None:
        raise ReadingError("gas", "nothing", "the gas by name or formula", "Choose the gas.")
    station = next(
        (
            taken[variable.name]
            for variable in relation.variables
            if variable.kind == "station_pressure" and variable.name in taken
        ),
        station,
    )
    values, couplings = _counted(relation, taken, station)
    where = f"{relation.variable(unknown).symbol}, {relation.variable(unknown).text}"
    check_validity(relation, values, relation.title)
    values[unknown] = evaluate(relation, unknown, values, gas, where, side)
    said = (*conditions.check(taken, values, kinds_of(relation)), *check_validity(relation, values, relation.title))
    slopes = sensitivities(relation, unknown, values, gas)
    combined = _combined(relation, taken, station, slopes, couplings)
    warnings = [
        *said_before,
        *(text for reading in taken.values() for text in (*reading.warnings, *questioned(reading))),
        *said,
    ]
    units = {name: reading.unit for name, reading in taken.items()}
    units[unknown] = show or like_unit(relation, unknown, taken)
    conversions = _conversions(relation, taken, station, values, mark)
    return Result(
        key=relation.key,
        unknown=unknown,
        value=values[unknown],
        unit=KINDS[relation.variable(unknown).kind].si,
        u=combined.u,
        expanded=combined.expanded,
        k=combined.k,
        freedom=combined.freedom,
        shares=combined.shares,
        working=(*conversions, working.line(relation, unknown, values, units, mark)),
        warnings=tuple(dict.fromkeys(warnings)),
        values=values,
        readings=taken,
        sensitivities=slopes,
    )


def like_unit(relation: Relation, unknown: str, taken: dict[str, Reading]) -> str:
    """Give the unit to show the unknown in: that of a reading of the same kind, or the first its kind offers."""
    kind = relation.variable(unknown).kind
    same = (
        taken[variable.name].unit for variable in relation.variables if variable.kind == kind and variable.name in taken
    )
    return next(same, KINDS[kind].units[0])


def _counted(
    relation: Relation, taken: dict[str, Reading], station: Reading | None
) -> tuple[dict[str, float], dict[str, float]]:
    """Give each variable counted as its kind counts, and how it moves with the station pressure."""
    values: dict[str, float] = {}
    couplings: dict[str, float] = {}
    for variable in relation.variables:
        if variable.name in taken:
            wanted = KINDS[variable.kind].reference
            values[variable.name], couplings[variable.name] = to_reference(taken[variable.name], wanted, station)
            _refuse_sign(variable, taken[variable.name], values[variable.name])
    return values, couplings


def sensitivities(relation: Relation, unknown: str, values: dict[str, float], gas: Gas | None) -> dict[str, float]:
    """Give how the unknown moves with each other variable: -F_x/F_y, exact also where it was found numerically."""
    where = f"{relation.variable(unknown).symbol}, by {relation.title}"
    slopes = slopes_of(relation, [gas if name == "gas" else values[name] for name in relation.arguments], where)
    by_name = {variable.name: slope for variable, slope in zip(relation.variables, slopes, strict=True)}
    own = by_name.pop(unknown)
    if own == 0 and any(by_name.values()):
        raise no_slope(where)
    if own == 0:
        return dict.fromkeys(by_name, 0.0)
    return {name: -slope / own for name, slope in by_name.items()}


def _combined(
    relation: Relation,
    taken: dict[str, Reading],
    station: Reading | None,
    slopes: dict[str, float],
    couplings: dict[str, float],
) -> Combined:
    wanted = {variable.name: KINDS[variable.kind].reference for variable in relation.variables}
    gradient = {name: slopes[name] * turn(reading, wanted[name]) for name, reading in taken.items()}
    by_station = sum(slopes[name] * couplings[name] for name in taken)
    if station is not None:
        own = next((name for name, reading in taken.items() if reading is station), None)
        if own is None:
            return combine([*gradient.values(), by_station], [*taken.values(), station])
        gradient[own] += by_station
    return combine(list(gradient.values()), list(taken.values()))


def _conversions(
    relation: Relation, taken: dict[str, Reading], station: Reading | None, values: dict[str, float], mark: str
) -> tuple[str, ...]:
    """Write how a reading counted one way became the value counted another."""
    lines = []
    for variable in relation.variables:
        reading = taken.get(variable.name)
        wanted = KINDS[variable.kind].reference
        if reading and station and reading.reference != wanted and wanted in ("absolute", "gauge", "vacuum"):
            value = quantity.text_of(values[variable.name], KINDS[variable.kind], reading.unit, mark)
            lines.append(
                f"{variable.symbol} = {reading.text}, with the station pressure {station.text}: {value} {wanted}"
            )
    return tuple(lines)
