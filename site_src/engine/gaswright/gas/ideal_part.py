"""Ideal-gas part of the Helmholtz energy.

Takes an emitted equation module; gives the temperature-dependent ideal part with its scaled derivatives.
The caloric properties come next.
"""

from math import exp, log

from gaswright.gas.record import Equation


def ideal_part(equation: Equation, x: float, tau: float) -> tuple[float, float, float]:
    """Return the ideal part at reduced density x and tau = T_r/T, tau times its slope and tau^2 times its bend."""
    value = log(x) + equation.IDEAL_LOG_TAU * log(tau)
    first, second = equation.IDEAL_LOG_TAU, -equation.IDEAL_LOG_TAU
    for n, t in equation.IDEAL_POWERS:
        part = n * tau**t
        value += part
        first += t * part
        second += t * (t - 1.0) * part
    for n, theta, c, d in equation.IDEAL_PLANCK:
        e = d * exp(theta * tau)
        share = theta * tau * e / (c + e)
        value += n * log(c + e)
        first += n * share
        second += n * share * theta * tau * c / (c + e)
    return value, first, second
