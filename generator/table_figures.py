"""Figures of the reference tables: one law solved at one point.

Takes a law's key and readings as typed; gives an SI value, or text in a unit, by the engine just staged.
generator.gas_tables, generator.flow_tables and generator.figures use it.
"""

from gaswright.errors import OutsideRangeError, ReadingError
from gaswright.find import relation as find_law
from gaswright.law import solve
from gaswright.quantity import in_unit
from gaswright.reading import Raw, read
from gaswright.show import significant
from gaswright.tables import KINDS

NONE = "–"


def value(key: str, unknown: str, **readings: Raw) -> float:
    """Give the SI value of ``unknown`` by the law ``key``."""
    return solve(key, unknown, readings).value


def stated(key: str, unknown: str, name: str, text: str) -> float | None:
    """Give the SI value of ``unknown``, or nothing where ``name`` is outside the range that the law's source states."""
    try:
        known = read(name, text, KINDS[find_law(key).variable(name).kind]).value
        result = solve(key, unknown, {name: known})
    except (OutsideRangeError, ReadingError):
        return None
    return None if result.warnings else result.value


def shown(key: str, unknown: str, si: float | None, unit: str, digits: int) -> str:
    """Give the SI value of a law's variable in ``unit``, or a dash where there is none."""
    if si is None:
        return NONE
    kind = KINDS[find_law(key).variable(unknown).kind]
    return significant(in_unit(si, kind, unit), digits)
