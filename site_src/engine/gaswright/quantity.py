"""Put an SI value into a unit and back, and write it with its unit.

Takes SI values and unit texts; gives numbers and text. gaswright.working and gaswright.respond use it.
"""

from typing import Any

from gaswright import show, unit
from gaswright.errors import ReadingError
from gaswright.records import Kind

ZERO_CELSIUS = 273.15


def in_unit(value: float, kind: Kind, text: str) -> float:
    """Give the SI ``value`` in the unit ``text``."""
    found = unit.parse(text, kind.title, kind.exponents, kind.title)
    absolute = value + ZERO_CELSIUS if kind.si == "Cel" else value
    return absolute / found.factor - found.zero


def shown_unit(asked: Any, kind: Kind) -> str:
    """Give the unit a figure is asked in (``{"unit": "L"}``) in full spelling, or nothing.

    Raises ReadingError where it is no unit of the kind, or carries what has a place of its own.
    """
    text = str((asked or {}).get("unit") or "")
    if not text:
        return ""
    found = unit.parse(text, "Unit shown", kind.exponents, kind.title, kind.units)
    if found.pair or found.reference not in (None, kind.reference):
        todo = "How it is counted, or at which reference conditions, stands in the rows."
        raise ReadingError("Unit shown", repr(text[:40]), f"{found.text} alone", todo)
    return found.text


def interval_in_unit(width: float, kind: Kind, text: str) -> float:
    """Give a difference or uncertainty in SI in the unit ``text``, where a zero point plays no part."""
    return width / unit.parse(text, kind.title, kind.exponents, kind.title).factor


def with_unit(number: str, text: str) -> str:
    """Give a number with its unit; a plain number has none."""
    return number if text == "1" else f"{number} {text}"


def text_of(value: float, kind: Kind, text: str, mark: str = ".", digits: int = 6) -> str:
    """Give an SI ``value`` with its unit, at most ``digits`` significant digits, and how a pressure is counted."""
    return with_unit(show.tidy(in_unit(value, kind, text), digits, mark), text)


def working_unit(kind: Kind, typed: str) -> str:
    """Give the unit a working line uses: the one typed, but kelvin for a thermodynamic temperature."""
    return "K" if kind.key == "absolute_temperature" else typed or kind.units[0]
