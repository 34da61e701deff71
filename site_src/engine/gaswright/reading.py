"""Take a reading as typed and say what it is in SI, how it is counted and how good it is.

Takes text, a number or a record; gives a Reading. Never guesses: what has two meanings is asked about.
gaswright.law and gaswright.sheet come next.
"""

import math
from collections.abc import Mapping
from typing import Any, NamedTuple

from gaswright import instrument as instruments_of
from gaswright import number, show, unit
from gaswright.errors import ReadingError
from gaswright.records import Kind
from gaswright.typed import Typed, take_apart, text_of

Raw = str | float | int | Mapping[str, object]
Instruments = Mapping[str, Mapping[str, object]]
ROOT_3, ROOT_12 = math.sqrt(3), math.sqrt(12)
ZERO_CELSIUS = 273.15
COUNTED = ("gauge", "absolute", "vacuum")


class Reading(NamedTuple):
    """A reading in SI with its standard uncertainty.

    ``value`` is counted as ``reference`` says (absolute, gauge, vacuum, difference or nothing); ``u`` combines
    ``u_systematic`` and ``u_random``; ``by`` says where the uncertainty comes from. ``span`` is the width of the
    instrument's scale and ``scale`` its ends, in SI as the instrument counts (0 where nothing is known of it).
    """

    name: str
    text: str
    number: float
    unit: str
    value: float
    reference: str
    u: float
    u_systematic: float
    u_random: float
    freedom: float
    by: str
    instrument: str
    span: float
    came_from: str
    conditions: tuple[float, float] | None
    warnings: tuple[str, ...]
    scale: tuple[float, float] = (0.0, 0.0)


def read(
    where: str, raw: Raw, kind: Kind, decimal: str | None = None, instruments: Instruments | None = None
) -> Reading:
    """Give the reading ``raw`` of a quantity of ``kind``. A float is an SI value, counted as the kind counts.

    Raises ReadingError in four parts for whatever cannot be taken as it stands.
    """
    if isinstance(raw, (int, float)) and not isinstance(raw, bool):
        return _of_number(where, raw, kind)
    if not isinstance(raw, (str, Mapping)):
        raise ReadingError(where, repr(raw)[:40], "a reading as text, such as 200 bar gauge", "Type the reading.")
    record: Mapping[str, object] = {"text": raw} if isinstance(raw, str) else raw
    text = text_of(record)
    if not text:
        raise ReadingError(where, "nothing", f"a reading of {kind.title}", "Type the reading, or ask for this row.")
    parts = take_apart(text, where)
    found = _unit(parts, str(record.get("unit") or "").strip(), where, kind)
    typed = _number(parts, where, decimal)
    reference = _reference(found, str(record.get("reference") or ""), kind, where, parts)
    value = _to_si(typed.value, found, kind)
    said = f"{parts.digits} {found.text}".removesuffix(" 1")
    _refuse_impossible(where, value, kind, reference, said, found)
    said_of = Said(record, parts.accuracy, instruments or {}, decimal or ".")
    good = _accuracy(where, said_of, typed, found, kind)
    conditions, pair = _conditions(parts, found, where, decimal)
    return Reading(
        name=where,
        text=said + (f" {reference}" if reference in COUNTED else "") + (f" ({pair})" if pair else ""),
        number=typed.value,
        unit=found.text,
        value=value,
        reference=reference,
        **good,
        came_from=str(record.get("from") or "read"),
        conditions=conditions,
        warnings=_bare_warning(where, found, record, kind, reference),
    )


def _number(parts: Typed, where: str, decimal: str | None) -> number.Number:
    """Read the digits; where they have two meanings, offer both with the unit typed behind them."""
    try:
        return number.parse(parts.digits, where, decimal)
    except ReadingError as error:
        error.offers = tuple(f"{offer} {parts.unit}".strip() for offer in error.offers)
        raise


def _of_number(where: str, raw: float, kind: Kind) -> Reading:
    if not abs(raw) <= number.LARGEST:  # an integer may be too large for a float
        raise ReadingError(where, f"{raw!r:.40}", "a finite value", "Give the SI value.")
    value = float(raw)
    own = unit.UnitReading(kind.si, 1.0, ZERO_CELSIUS if kind.si == "Cel" else 0.0, None, None, "")
    _refuse_impossible(where, value, kind, kind.reference, f"{value:g} {kind.si}", own)
    return Reading(
        where,
        f"{value:g} {kind.si}",
        value,
        kind.si,
        value,
        kind.reference,
        0.0,
        0.0,
        0.0,
        math.inf,
        "given as an exact SI value",
        "",
        0.0,
        "read",
        None,
        (),
    )


def _conditions(
    parts: Typed, found: unit.UnitReading, where: str, decimal: str | None
) -> tuple[tuple[float, float] | None, str]:
    """Give temperature (K) and absolute pressure (Pa) of the reference conditions, and the pair as text."""
    if not parts.pair:
        return found.conditions, found.pair
    from gaswright.tables import KINDS  # noqa: PLC0415 - a pair is rare

    temperature_text, pressure_text = sorted(parts.pair, key=unit.is_pressure)
    try:
        temperature = read(f"{where}, reference temperature", temperature_text, KINDS["absolute_temperature"], decimal)
        pressure = read(f"{where}, reference pressure", pressure_text, KINDS["absolute_pressure"], decimal)
    except ReadingError as error:
        is_hot = error.where.endswith("temperature")
        error.offers = tuple(
            f"{parts.digits} {parts.unit} ({offer}, {pressure_text})"
            if is_hot
            else f"{parts.digits} {parts.unit} ({temperature_text}, {offer})"
            for offer in error.offers
        )
        raise
    if pressure.reference != "absolute":
        raise ReadingError(
            pressure.name,
            pressure.text,
            "an absolute pressure",
            "Give the pressure of the pair as absolute.",
        )
    pair = f"{temperature.text}, {pressure.text.removesuffix(' absolute')}"
    given = (temperature.value, pressure.value)
    if found.conditions and any(abs(a - b) > 1e-6 * b for a, b in zip(given, found.conditions, strict=True)):
        raise ReadingError(
            where,
            f"{parts.unit} with the pair ({pair})",
            f"one pair: {parts.unit} means ({found.pair})",
            "Which reference conditions are meant?",
            offers=tuple(f"{parts.digits} {found.text} ({each})" for each in (found.pair, pair)),
        )
    return given, pair


def _unit(parts: Typed, chosen: str, where: str, kind: Kind) -> unit.UnitReading:
    """Read the unit typed or chosen beside the field; two that differ are asked about."""
    if not parts.unit and not chosen and kind.si != "1":
        todo = f"Add the unit, such as {parts.digits} {kind.units[0]}."
        raise ReadingError(where, f"{parts.digits} without a unit", f"{kind.title} with its unit", todo)
    own = _one_unit(parts, parts.unit or chosen or "1", where, kind)
    if not parts.unit or not chosen:
        return own
    field = _one_unit(parts, chosen, where, kind)
    if (own.factor, own.zero) != (field.factor, field.zero):
        raise ReadingError(
            where,
            f"{parts.digits} {parts.unit} in a field set to {chosen}",
            "one unit",
            "Which unit was read?",
            offers=(f"{parts.digits} {parts.unit}", f"{parts.digits} {chosen}"),
        )
    return own._replace(reference=own.reference or field.reference)


def _one_unit(parts: Typed, text: str, where: str, kind: Kind) -> unit.UnitReading:
    """Read one unit; a word that lacks its reference conditions is taken where the pair was typed behind it."""
    try:
        return unit.parse(text, where, kind.exponents, kind.title, kind.units)
    except ReadingError as error:
        bases = {offer.partition(" (")[0] for offer in error.offers if offer.endswith(")")}
        if parts.pair and len(bases) == 1:
            return unit.parse(bases.pop(), where, kind.exponents, kind.title, kind.units)
        error.offers = tuple(f"{parts.digits} {offer}" for offer in error.offers)
        raise


def _reference(found: unit.UnitReading, chosen: str, kind: Kind, where: str, parts: Typed) -> str:
    """Give how the pressure is counted: as typed, else as chosen, else as the row counts."""
    if not kind.reference:
        return ""
    if chosen and chosen not in (*COUNTED, "difference"):
        raise ReadingError(where, repr(chosen[:40]), "gauge, absolute or vacuum", "Choose how the pressure is counted.")
    said = found.reference
    if said and chosen and said != chosen:
        raise ReadingError(
            where,
            f"{parts.digits} {parts.unit} in a field set to {chosen}",
            "one way of counting",
            "Which was read?",
            offers=tuple(f"{parts.digits} {found.text} {each}" for each in (said, chosen)),
        )
    counted = said or chosen or kind.reference
    if (counted == "difference") != (kind.reference == "difference"):
        how = "a difference" if kind.reference == "difference" else "gauge, absolute or vacuum"
        expected = f"{kind.title}, counted as {how}"
        raise ReadingError(where, f"{parts.digits} {found.text} {counted}", expected, "Check which pressure was read.")
    return counted


def _bare_warning(
    where: str, found: unit.UnitReading, record: Mapping[str, object], kind: Kind, reference: str
) -> tuple[str, ...]:
    is_bare = kind.reference == "absolute" and not found.reference and not record.get("reference")
    if is_bare and kind.key != "station_pressure":
        return (f"{where}: {found.text} was taken as {reference}. Write gauge or absolute to be sure.",)
    return ()


def _to_si(typed: float, found: unit.UnitReading, kind: Kind) -> float:
    if kind.si == "Cel":
        return (typed + round(found.zero - ZERO_CELSIUS / found.factor, 9)) * found.factor
    return (typed + found.zero) * found.factor


def _refuse_impossible(  # noqa: PLR0913, PLR0917 - what the message needs
    where: str, value: float, kind: Kind, reference: str, said: str, found: unit.UnitReading
) -> None:
    """Refuse what no instrument of the field can read; a gauge reading is held against the station pressure later."""
    low, high = kind.low, kind.high
    if reference != kind.reference:
        low, high = 0.0, max(high, kind.high)
    if reference == "gauge":
        low = -math.inf
    if low <= value <= high or (value == 0 and low < 1e-6):
        return
    is_cold = "temperature" in kind.key and value < low
    least = "absolute zero, −273.15 °C," if is_cold else f"{_in(found, low, kind)}"
    expected = f"{kind.title} between {least} and {_in(found, high, kind)}"
    raise ReadingError(where, said, expected, "Check the number and its unit.")


def _in(found: unit.UnitReading, value: float, kind: Kind) -> str:
    absolute = value + ZERO_CELSIUS if kind.si == "Cel" else value
    return f"{absolute / found.factor - found.zero:.6g} {found.text}".removesuffix(" 1")


class Said(NamedTuple):
    """What says how good a reading is: its record, the accuracy typed behind it, the instruments, the decimal mark."""

    record: Mapping[str, object]
    typed: str
    instruments: Instruments
    mark: str


def _accuracy(where: str, said: Said, typed: number.Number, found: unit.UnitReading, kind: Kind) -> dict[str, Any]:
    """Give the fields of a Reading about its uncertainty. A limit is rectangular (JCGM 100:2008, 4.3.7)."""
    name = str(said.record.get("instrument") or "")
    words = said.typed or str(said.record.get("accuracy") or "")
    if name and name not in said.instruments:
        todo = "Choose it again or add it to the list."
        raise ReadingError(where, f"the instrument {name[:40]!r}", "one of the list", todo)
    size, half = abs(typed.value) * found.factor, typed.step / 2 * found.factor
    tool = said.instruments.get(name, {})
    if name and not said.typed:
        accuracy = instruments_of.of_record(tool, size, kind.exponents, f"{where}, {name}")
        u_random = (instruments_of.resolution_of(tool, kind.exponents, f"{where}, {name}") or 2 * half) / ROOT_12
        by = f"{name}, {_with_size(accuracy, found, said.mark)}"
    elif words:
        accuracy, u_random = instruments_of.parse(words, size, kind.exponents, where), 0.0
        by = _with_size(accuracy, found, said.mark)
    else:
        accuracy, u_random = instruments_of.Accuracy(0.0, 0.0, "", (0.0, 0.0)), 2 * half / ROOT_12
        size_shown = show.tidy(half / found.factor, 3, said.mark)
        by = f"half the last digit typed: ± {size_shown} {found.text}".removesuffix(" 1")
    u_systematic = accuracy.limit / ROOT_3
    return {
        "u": math.hypot(u_systematic, u_random),
        "u_systematic": u_systematic,
        "u_random": u_random,
        "freedom": math.inf,
        "by": by,
        "instrument": name,
        "span": accuracy.span,
        "scale": accuracy.scale,
    }


def _with_size(accuracy: instruments_of.Accuracy, found: unit.UnitReading, mark: str) -> str:
    """Give the accuracy in words with its size in the typed unit: ``class 1.6 of 250 bar: ± 4 bar``."""
    if accuracy.says == "exact" or not (accuracy.span or "%" in accuracy.says):
        return accuracy.says
    return f"{accuracy.says}: ± {show.tidy(accuracy.limit / found.factor, 3, mark)} {found.text}".removesuffix(" 1")
