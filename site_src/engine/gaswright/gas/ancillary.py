"""Simple curves that stand near saturation and at melting.

Takes emitted coefficients; gives start values for the saturation solver, the bubble and dew lines of air,
and the melting pressure. The saturation solver and the phase decision come next.
"""

from math import exp, fsum

from gaswright.gas.record import Ancillary, Equation


def along_saturation(curve: Ancillary, T: float) -> float | None:
    """Return the curve's pressure [Pa] or density [mol/m3] at T [K]; None at and above the temperature it ends at."""
    T_r, scale, is_steep, is_exponential, terms = curve
    theta = 1.0 - T / T_r
    if theta <= 0.0:
        return None
    total = sum(n * theta**t for n, t in terms)
    if is_steep:
        total *= T_r / T
    return scale * exp(total) if is_exponential else scale * (1.0 + total)


def melting_pressure(equation: Equation, T: float) -> float | None:
    """Return the melting pressure [Pa] at T [K]; None where the melting line of the gas is not known."""
    for T_from, T_to, p_0, T_0, shift, terms in equation.MELTING:
        if T_from <= T <= T_to:
            return p_0 + fsum(a * ((T / T_0 - shift) ** t - 1.0 + shift) for a, t in terms)
    return None
