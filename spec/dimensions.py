"""Dimensions of quantities, as exponents of five SI base quantities.

Takes nothing; gives the frozen value Dimension and the names that kinds and units use.
Next: spec.kinds and spec.units are written with these, generator.check walks both sides of a relation with them.
"""

from collections.abc import Iterable
from dataclasses import dataclass
from fractions import Fraction


@dataclass(frozen=True, slots=True, kw_only=True)
class Dimension:
    """Exponents of mass, length, time, thermodynamic temperature and amount of substance (SI Brochure, 2.3.3)."""

    mass: Fraction = Fraction(0)
    length: Fraction = Fraction(0)
    time: Fraction = Fraction(0)
    temperature: Fraction = Fraction(0)
    amount: Fraction = Fraction(0)

    @staticmethod
    def of(exponents: Iterable[Fraction]) -> "Dimension":
        """Give the dimension with these exponents, in the order mass, length, time, temperature, amount."""
        mass, length, time, temperature, amount = exponents
        return Dimension(mass=mass, length=length, time=time, temperature=temperature, amount=amount)

    def exponents(self) -> tuple[Fraction, ...]:
        """Give the exponents in the order mass, length, time, temperature, amount."""
        return (self.mass, self.length, self.time, self.temperature, self.amount)

    def __mul__(self, other: "Dimension") -> "Dimension":
        """Add the exponents."""
        return Dimension.of(a + b for a, b in zip(self.exponents(), other.exponents(), strict=True))

    def __truediv__(self, other: "Dimension") -> "Dimension":
        """Subtract the exponents."""
        return Dimension.of(a - b for a, b in zip(self.exponents(), other.exponents(), strict=True))

    def __pow__(self, power: Fraction | int) -> "Dimension":
        """Multiply the exponents."""
        return Dimension.of(a * power for a in self.exponents())

    def __str__(self) -> str:
        """Give the dimension in SI base units, such as ``kg m^-1 s^-2``; ``1`` for a number."""
        units = zip(("kg", "m", "s", "K", "mol"), self.exponents(), strict=True)
        parts = [unit if power == 1 else f"{unit}^{power}" for unit, power in units if power]
        return " ".join(parts) or "1"


NUMBER = Dimension()
MASS = Dimension(mass=Fraction(1))
LENGTH = Dimension(length=Fraction(1))
TIME = Dimension(time=Fraction(1))
TEMPERATURE = Dimension(temperature=Fraction(1))
AMOUNT = Dimension(amount=Fraction(1))
AREA = LENGTH**2
VOLUME = LENGTH**3
SPEED = LENGTH / TIME
ACCELERATION = SPEED / TIME
FORCE = MASS * ACCELERATION
PRESSURE = FORCE / AREA
ENERGY = FORCE * LENGTH
DENSITY = MASS / VOLUME
MOLAR_MASS = MASS / AMOUNT
MOLAR_VOLUME = VOLUME / AMOUNT
FLOW = VOLUME / TIME
MASS_FLOW = MASS / TIME
MOLAR_FLOW = AMOUNT / TIME
VISCOSITY = PRESSURE * TIME
MOLAR_HEAT = ENERGY / (AMOUNT * TEMPERATURE)
