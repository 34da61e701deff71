"""Take a reading as typed and say what it is in SI, how it is counted and how good it is.

Takes text, a number or a record; gives a Reading. Never guesses: what has two meanings is asked about.
gaswright.law and gaswright.sheet come next.
"""

import math
import re
from typing import NamedTuple

from gaswright import instrument as instruments_of
from gaswright import number, unit
from gaswright.errors import ReadingError
from gaswright.records import Kind

Raw = str | float | int | dict[str, object]
Instruments = dict[str, dict[str, object]]
ROOT_3, ROOT_12 = math.sqrt(3), math.sqrt(12)
ZERO_CELSIUS = 273.15
REFERENCE_WORDS = {"gauge": " gauge", "absolute": " absolute", "vacuum": " vacuum"}
PAIR = re.compile(r"\s*(?:at\s*)?\(([^()]*)[,;]([^()]*)\)\s*$")
TEXT = re.compile(r"\s*([+\-−]?[\d.,\u00a0\u2009\u202f’' _]*\d[.,]?(?:\s*[eE][+-]?\d{1,4}(?!\w)|\s*[×x*·]\s*10\s*\^?[⁻+\-⁰¹²³⁴⁵⁶⁷⁸⁹\d]+)?)\s*(.*)", re.DOTALL)


class Reading(NamedTuple):
    """A reading in SI with its standard uncertainty.

    ``value`` is counted as ``reference`` says (absolute, gauge, vacuum, difference or nothing); ``u`` combines
    ``u_systematic`` and ``u_random``; ``by`` says where the uncertainty comes from.
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


def read(where: str, raw: Raw, kind: Kind, decimal: str | None = None, instruments: Instruments | None = None) -> Reading:
    """Give the reading ``raw`` of a quantity of ``kind``. A float is an SI value, counted as the kind counts.

    Raises ReadingError in four parts for whatever cannot be taken as it stands.
    """
    if isinstance(raw, (int, float)) and not isinstance(raw, bool):
        return _of_number(where, float(raw), kind)
    record = {"text": raw} if isinstance(raw, str) else dict(raw)
    text = str(record.get("text", "") or "").strip()
    if not text:
        raise ReadingError(where, "nothing", f"a reading of {kind.title}", "Type the reading, or ask for this row.")
    text, conditions = _conditions(text, where)
    text, accuracy = _split_accuracy(text)
    match = TEXT.fullmatch(text)
    if not match:
        raise ReadingError(where, repr(text[:40]), "a number", "Type digits with a decimal comma or point, such as 12.5.")
    typed = _number(match[1], match[2].strip(), where, decimal)
    found = _unit(match[2].strip(), str(record.get("unit") or ""), where, kind, match[1].strip())
    reference = _reference(found, record, kind)
    value = _to_si(typed.value, found, kind)
    if not math.isfinite(value):
        raise ReadingError(where, repr(text[:40]), "a finite value", "Check the number and its unit.")
    _refuse_impossible(where, value, kind, reference, f"{match[1].strip()} {found.text}", found)
    half = typed.step / 2 * found.factor
    good = _accuracy(where, record, accuracy, value, half, kind, instruments or {})
    return Reading(
        name=where, text=f"{match[1].strip()} {found.text}".removesuffix(" 1") + REFERENCE_WORDS.get(reference, ""),
        number=typed.value, unit=found.text, value=value, reference=reference, **good,
        came_from=str(record.get("from") or "read"), conditions=conditions or found.conditions,
        warnings=_bare_warning(where, found, record, kind, reference),
    )


def _number(digits: str, unit_text: str, where: str, decimal: str | None) -> number.Number:
    """Read the digits; where they have two meanings, offer both with the unit typed behind them."""
    try:
        return number.parse(digits, where, decimal)
    except ReadingError as error:
        error.offers = tuple(f"{offer} {unit_text}".strip() for offer in error.offers)
        raise


def _of_number(where: str, value: float, kind: Kind) -> Reading:
    if not math.isfinite(value):
        raise ReadingError(where, repr(value), "a finite value", "Give the SI value.")
    own = unit.UnitReading(kind.si, 1.0, 273.15 if kind.si == "Cel" else 0.0, None, None)
    _refuse_impossible(where, value, kind, kind.reference, f"{value:g} {kind.si}", own)
    return Reading(where, f"{value:g} {kind.si}", value, kind.si, value, kind.reference, 0.0, 0.0, 0.0, math.inf,
                   "given as an exact SI value", "", 0.0, "read", None, ())


def _conditions(text: str, where: str) -> tuple[str, tuple[float, float] | None]:
    """Take a reference pair such as ``(20 °C, 101.325 kPa)`` off the end."""
    from gaswright.tables import KINDS  # noqa: PLC0415 - the table is large and this is rare

    match = PAIR.search(text)
    if not match:
        return text, None
    temperature = read(f"{where}, reference temperature", match[1], KINDS["absolute_temperature"])
    pressure = read(f"{where}, reference pressure", match[2], KINDS["absolute_pressure"])
    return text[: match.start()], (temperature.value, pressure.value)


def _split_accuracy(text: str) -> tuple[str, str]:
    """Split ``200 ± 2 bar`` or ``200 bar ± 1 %`` into reading and accuracy."""
    head, mark, tail = text.replace("+/-", "±").partition("±")
    if not mark:
        return text, ""
    match = re.match(r"\s*[\d.,]+(?:[eE][+-]?\d+)?\s*(.*)", tail, re.DOTALL)
    own = match[1].strip() if match else ""
    if own and not re.search(r"[^\d.,\s+\-−]", head):
        return (f"{head} {own}", "±" + tail) if not own.startswith("%") else (head, "±" + tail)
    if not own:
        unit_text = (TEXT.fullmatch(head.strip()) or ["", "", ""])[2]
        return head, f"±{tail} {unit_text}"
    return head, "±" + tail


def _unit(typed: str, chosen: str, where: str, kind: Kind, digits: str) -> unit.UnitReading:
    if typed and chosen:
        own, field = (unit.parse(text, where, kind.exponents, kind.title) for text in (typed, chosen))
        if (own.factor, own.zero) != (field.factor, field.zero):
            raise ReadingError(
                where, f"{digits} {typed} in a field set to {chosen}", "one unit", "Which unit was read?",
                offers=(f"{digits} {typed}", f"{digits} {chosen}"),
            )
        return own if own.reference else field
    if not typed and not chosen and kind.si != "1":
        todo = f"Add the unit, such as {digits} {kind.units[0]}."
        raise ReadingError(where, f"{digits} without a unit", f"{kind.title} with its unit", todo)
    return unit.parse(typed or chosen or "1", where, kind.exponents, kind.title)


def _reference(found: unit.UnitReading, record: dict[str, object], kind: Kind) -> str:
    if not kind.reference or kind.reference == "difference":
        return kind.reference
    return found.reference or str(record.get("reference") or kind.reference)


def _bare_warning(
    where: str, found: unit.UnitReading, record: dict[str, object], kind: Kind, reference: str
) -> tuple[str, ...]:
    is_bare = kind.reference == "absolute" and not found.reference and not record.get("reference")
    if is_bare and kind.key != "station_pressure":
        return (f"{where}: {found.text} was taken as {reference}. Write gauge or absolute to be sure.",)
    return ()


def _to_si(typed: float, found: unit.UnitReading, kind: Kind) -> float:
    value = (typed + found.zero) * found.factor
    return value - ZERO_CELSIUS if kind.si == "Cel" else value


def _refuse_impossible(where: str, value: float, kind: Kind, reference: str, said: str, found: unit.UnitReading) -> None:
    """Refuse what no instrument of the field can read; a gauge reading is held against the station pressure later."""
    low, high = kind.low, kind.high
    if reference != kind.reference:
        low, high = 0.0, max(high, kind.high)
    if reference == "gauge":
        low = -math.inf
    if low <= value <= high or (value == 0 and low < 1e-6):  # noqa: PLR2004 - zero stands where the range starts at a trifle
        return
    is_cold = "temperature" in kind.key and value < low
    least = "absolute zero, −273.15 °C," if is_cold else f"{_in(found, low, kind)}"
    expected = f"{kind.title} between {least} and {_in(found, high, kind)}"
    raise ReadingError(where, said, expected, "Check the number and its unit.")


def _in(found: unit.UnitReading, value: float, kind: Kind) -> str:
    absolute = value + ZERO_CELSIUS if kind.si == "Cel" else value
    return f"{absolute / found.factor - found.zero:.6g} {found.text}".removesuffix(" 1")


def _accuracy(  # noqa: PLR0913 - all that says how good a reading is
    where: str, record: dict[str, object], typed: str, value: float, half: float, kind: Kind, instruments: Instruments
) -> dict[str, object]:
    name = str(record.get("instrument") or "")
    words = typed or str(record.get("accuracy") or "")
    if name and name not in instruments:
        raise ReadingError(where, f"the instrument {name!r}", "one of the list", "Choose it again or add it to the list.")
    u_random = half / ROOT_3
    if name:
        tool = instruments[name]
        accuracy = instruments_of.of_record(tool, value, kind.exponents, where)
        resolution = instruments_of.resolution_of(tool, kind.exponents, where)
        u_random = resolution / ROOT_12 if resolution else u_random
        by = f"{name}, {accuracy.says}"
    elif words:
        accuracy = instruments_of.parse(words, value, kind.exponents, where)
        u_random = 0.0
        by = accuracy.says
    else:
        accuracy = instruments_of.Accuracy(0.0, 0.0, "")
        by = "± half the last digit"
    u_systematic = accuracy.limit / ROOT_3
    return {
        "u": math.hypot(u_systematic, u_random), "u_systematic": u_systematic, "u_random": u_random,
        "freedom": math.inf, "by": by, "instrument": name, "span": accuracy.span,
    }


def to_reference(reading: Reading, wanted: str, station: "Reading | None") -> tuple[float, float]:
    """Give the value counted as ``wanted`` and its slope by the station pressure (1, -1 or 0).

    Raises ReadingError: no station pressure where one is needed, or less than no pressure at all.
    """
    have = reading.reference
    if have == wanted or wanted in ("", "difference"):
        value, slope = reading.value, 0.0
    else:
        if station is None:
            raise ReadingError(
                reading.name, reading.text, "the station pressure to count it from",
                "Give the station pressure, or the absolute pressure.",
            )
        to_absolute = {"absolute": (1.0, 0.0), "gauge": (1.0, 1.0), "vacuum": (-1.0, 1.0)}[have]
        from_absolute = {"absolute": (1.0, 0.0), "gauge": (1.0, -1.0), "vacuum": (-1.0, 1.0)}[wanted]
        absolute = to_absolute[0] * reading.value + to_absolute[1] * station.value
        value = from_absolute[0] * absolute + from_absolute[1] * station.value
        slope = from_absolute[0] * to_absolute[1] + from_absolute[1]
    _refuse_below_zero(reading, station)
    return value, slope


def turn(reading: Reading, wanted: str) -> float:
    """Give how the value counted as ``wanted`` moves with the value as read: 1, or -1 into or out of a vacuum scale."""
    return -1.0 if (reading.reference == "vacuum") != (wanted == "vacuum") and wanted not in ("", "difference") else 1.0


def _refuse_below_zero(reading: Reading, station: "Reading | None") -> None:
    if station is None or reading.reference not in ("gauge", "vacuum"):
        return
    absolute = station.value + (reading.value if reading.reference == "gauge" else -reading.value)
    if absolute < 0:
        limit = f"no lower than −{station.text} gauge" if reading.reference == "gauge" else f"no more than {station.text}"
        raise ReadingError(
            reading.name, reading.text, f"{limit}, which is no pressure at all",
            "Read the gauge and the station pressure again.",
        )


def questioned(reading: Reading) -> tuple[str, ...]:
    """Say what is unlikely about a reading: below a tenth of its instrument's span, or above all of it."""
    if not reading.span:
        return ()
    if abs(reading.value) > reading.span * (1 + 1e-9):
        raise ReadingError(
            reading.name, reading.text, f"a reading on the scale of {reading.instrument or 'the instrument'}",
            "Choose the instrument that was read, or read again.",
        )
    if abs(reading.value) < reading.span / 10:
        return (f"{reading.name}: {reading.text} is below a tenth of the span. A gauge of smaller span reads it better.",)
    return ()
