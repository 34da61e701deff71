"""Heat capacities, speed of sound and their kin, from a Helmholtz energy and its derivatives.

Takes the residual and ideal parts of one state; gives molar properties.
The gas, real or ideal, comes next.

Formulas: R. Span, Multiparameter Equations of State (Springer, 2000), table 3.10 (from memory).
"""

from math import sqrt
from typing import NamedTuple

from gaswright.gas.helmholtz import Residual

NO_RESIDUAL = Residual(0.0, 0.0, 0.0, 0.0, 0.0, 0.0)


class Caloric(NamedTuple):
    """Properties of one state, SI per mole.

    cv, cp [J/(mol K)]; speed of sound [m/s]; isentropic exponent [1]; Joule–Thomson coefficient [K/Pa];
    enthalpy [J/mol] and entropy [J/(mol K)], of use as differences only.
    """

    cv: float
    cp: float
    speed_of_sound: float
    isentropic_exponent: float
    joule_thomson: float
    enthalpy: float
    entropy: float


def caloric(  # noqa: PLR0913, PLR0917 - a state and its gas constant, molar mass and two parts
    R: float, molar_mass: float, T: float, rho: float, part: Residual, ideal: tuple[float, float, float]
) -> Caloric:
    """Return the properties at T [K] and rho [mol/m3]; `ideal` is the ideal part and its two scaled slopes."""
    value, first, second = ideal
    z = 1.0 + part.x
    rise = z + part.x + part.xx
    lean = z - part.xt
    cv = -(second + part.tt)
    cp = cv + lean * lean / rise
    square = R * T / molar_mass * rise * cp / cv
    return Caloric(
        cv=R * cv,
        cp=R * cp,
        speed_of_sound=sqrt(square),
        isentropic_exponent=rise * cp / (cv * z),
        joule_thomson=-(part.x + part.xx + part.xt) / (R * rho * cp * rise),
        enthalpy=R * T * (z + first + part.t),
        entropy=R * (first + part.t - value - part.value),
    )
