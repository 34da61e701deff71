"""A first guess of the density of a gas from a cubic equation of state.

Takes pressure, temperature and the critical point; gives a density that a few Newton steps make exact.
The density solver comes next.
"""

from math import acos, copysign, cos, sqrt

from gaswright.gas.record import Equation


def peng_robinson_density(equation: Equation, p: float, T: float) -> float:
    """Return the gas density [mol/m3] of the Peng–Robinson equation at p [Pa] > 0, T [K] > 0.

    Source: D.-Y. Peng and D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59.
    """
    reduced = T / equation.T_CRITICAL
    omega = equation.ACENTRIC
    lean = 0.37464 + omega * (1.54226 - 0.26992 * omega)
    alpha = (1.0 + lean * (1.0 - sqrt(reduced))) ** 2
    pressure = p / equation.P_CRITICAL / reduced
    a = 0.45724 * alpha * pressure / reduced
    b = 0.07780 * pressure
    z = _largest_root(b - 1.0, a - b * (3.0 * b + 2.0), b * (b * (b + 1.0) - a))
    return p / (z * equation.R * T)


def _largest_root(c2: float, c1: float, c0: float) -> float:
    """Return the largest real root of z^3 + c2·z^2 + c1·z + c0."""
    q = (c2 * c2 - 3.0 * c1) / 9.0
    r = (c2 * (2.0 * c2 * c2 - 9.0 * c1) + 27.0 * c0) / 54.0
    if r * r < q * q * q:
        return 2.0 * sqrt(q) * cos(acos(max(-1.0, min(1.0, -r / (q * sqrt(q))))) / 3.0) - c2 / 3.0
    s = -copysign((abs(r) + sqrt(r * r - q * q * q)) ** (1.0 / 3.0), r)
    return s + (q / s if s else 0.0) - c2 / 3.0
