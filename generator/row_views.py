"""Views of rows: what is typed in them at the start, in which unit, counted how.

Takes a typed reading and a kind; gives the fields of a RowView. generator.law_views and generator.sheet_views use it.
"""

from typing import NamedTuple

from gaswright.any_kind import ANY, kind_of
from gaswright.reading import read
from gaswright.tables import KINDS
from gaswright.typed import take_apart

from spec import kinds
from spec.model import Kind

REFERENCES = {
    "absolute_pressure": ("absolute", "gauge", "vacuum"),
    "gauge_pressure": ("gauge", "absolute", "vacuum"),
    "vacuum_pressure": ("vacuum",),
    "station_pressure": ("absolute",),
}
MEASURES = (
    ("pressure", "pressure"),
    ("temperature_constant", ""),
    ("temperature", "temperature"),
    ("flow", "flow"),
    ("volume", "volume"),
    ("mass", "mass"),
    ("time", "time"),
)
ANY_UNITS = (
    "1",
    "%",
    "ppm",
    "bar",
    "mbar",
    "Pa",
    "K",
    "L",
    "m³",
    "L/min",
    "kg",
    "g",
    "mol",
    "min",
    "h",
    "mm",
    "nm",
    "MJ",
)
UNMEASURED = ("molar_mass", "molar_volume", "molar_flow")


class Typed(NamedTuple):
    """A reading split as the page keeps it: digits, unit, how a pressure is counted."""

    text: str
    unit: str
    reference: str


def settled(text: str, kind: Kind) -> Kind:
    """Give the kind of a typed reading where ``kind`` is any, ``kind`` itself otherwise."""
    if kind.key != ANY or not text:
        return kind
    key = kind_of(take_apart(text, kind.title).unit or "1", kind.title)
    return next(each for each in kinds.ALL if each.key == key)


def split(text: str, kind: Kind) -> Typed:
    """Split a typed reading such as ``200 bar gauge`` into digits, unit and reference."""
    kind = settled(text, kind)
    if not text:
        return Typed("", kind.units[0], REFERENCES.get(kind.key, ("",))[0])
    reading = read(kind.title, text, KINDS[kind.key])
    digits = reading.text.split(" ", maxsplit=1)[0]
    return Typed(digits, reading.unit, reading.reference if kind.key in REFERENCES else "")


def units_of(kind: Kind, chosen: str) -> tuple[str, ...]:
    """Give the units offered, with the chosen one among them."""
    return kind.units if not chosen or chosen in kind.units else (*kind.units, chosen)


def measures(kind: Kind) -> str:
    """Give the sort of instrument that reads a kind, or nothing where none does."""
    if kind.key in UNMEASURED:
        return ""
    return next((sort for word, sort in MEASURES if word in kind.key), "")


def may_be_negative(kind: Kind) -> bool:
    """Tell whether a reading of the kind may carry a minus sign."""
    return kind.low < 0 or kind.key == "absolute_temperature"
