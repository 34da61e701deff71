"""Put an SI value into a unit and back, and write it with its unit.

Takes SI values and unit texts; gives numbers and text. gaswright.working and gaswright.respond use it.
"""

from gaswright import show, unit
from gaswright.records import Kind

ZERO_CELSIUS = 273.15


def in_unit(value: float, kind: Kind, text: str) -> float:
    """Give the SI ``value`` in the unit ``text``."""
    found = unit.parse(text, kind.title, kind.exponents, kind.title)
    absolute = value + ZERO_CELSIUS if kind.si == "Cel" else value
    return absolute / found.factor - found.zero


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
