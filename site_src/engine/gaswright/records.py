"""The shapes of the unit and kind tables.

Emitted gaswright.tables builds these.
"""

from typing import NamedTuple


class Unit(NamedTuple):
    """A unit: ``SI value = (reading + zero) * factor``; exponents of kg, m, s, K, mol; its UCUM code.

    ``ratio`` is the factor as two whole numbers, numerator and denominator, so that products stay exact.
    """

    key: str
    factor: float
    zero: float
    exponents: tuple[float, ...]
    ucum: str
    ratio: tuple[int, int]


class Kind(NamedTuple):
    """A kind of quantity: SI unit, units offered, range in SI, how a pressure is counted, what a reading needs."""

    key: str
    title: str
    si: str
    units: tuple[str, ...]
    low: float
    high: float
    reference: str
    note: str
    exponents: tuple[float, ...]
