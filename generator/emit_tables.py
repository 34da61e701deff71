"""Write the units and kinds as the table that ships.

Takes the spec's units and kinds; gives the text of ``gaswright/tables.py``. Next: gaswright.unit and gaswright.reading.
"""

from collections.abc import Iterable
from fractions import Fraction

from spec.dimensions import Dimension
from spec.model import Kind, Unit


def emit_tables(units: Iterable[Unit], kinds: Iterable[Kind]) -> str:
    """Give the module text: units by key, spellings, kinds by key."""
    units = tuple(units)
    lines = [
        '"""Units of measurement and kinds of quantity. Generated from spec/units.py and spec/kinds.py."""',
        "",
        "from gaswright.records import Kind, Unit",
        "",
        "UNITS = {",
        *(f"    {unit.key!r}: {_unit(unit)}," for unit in units),
        "}",
        "SPELLINGS = {",
        *(f"    {spelling!r}: {unit.key!r}," for unit in units for spelling in (unit.key, *unit.spellings)),
        "}",
        "KINDS = {",
        *(f"    {kind.key!r}: {_kind(kind)}," for kind in kinds),
        "}",
        "",
    ]
    return "\n".join(lines)


def _unit(unit: Unit) -> str:
    zero = unit.zero or Fraction(0)
    values = (unit.key, float(unit.factor), float(zero), _exponents(unit.dimension), unit.ucum)
    return f"Unit({', '.join(map(repr, values))})"


def _kind(kind: Kind) -> str:
    values = (
        kind.key,
        kind.title,
        kind.si,
        kind.units,
        kind.low,
        kind.high,
        kind.reference,
        kind.note,
        _exponents(kind.dimension),
    )
    return f"Kind({', '.join(map(repr, values))})"


def _exponents(dimension: Dimension) -> tuple[float, ...]:
    return tuple(float(power) for power in dimension.exponents())
