"""Residual Helmholtz energy of one gas, with exact derivatives.

Takes an emitted equation module; gives, at a temperature, functions of the reduced density.
The density solver, the saturation solver and the properties come next.

All derivatives are in reduced variables and scaled: x·d/dx and t·d/dt with x = rho/rho_r and t = T_r/T.
"""

from math import exp
from typing import NamedTuple

from gaswright.gas.near_critical import near_critical, near_critical_full
from gaswright.gas.record import Equation, Row, Slopes


class Residual(NamedTuple):
    """Residual part and its scaled derivatives: first letter density, second temperature."""

    value: float
    x: float
    xx: float
    t: float
    tt: float
    xt: float


class Isotherm:
    """The residual part of one equation at one temperature, collapsed to few polynomials in density."""

    __slots__ = ("T", "_k", "_rows", "_slopes", "equation", "tau")

    def __init__(self, equation: Equation, T: float) -> None:
        """Collapse the terms of `equation` at T [K]."""
        self.equation = equation
        self.T = T
        self.tau = equation.T_REDUCING / T
        self._k: Row = equation.gather(temperature_parts(equation, self.tau))
        self._slopes = equation.slopes
        self._rows = equation.NON_ANALYTIC

    def slopes(self, x: float) -> Slopes:
        """Return a, x·a_x and x^2·a_xx at reduced density x > 0."""
        if not self._rows:
            return self._slopes(x, self._k)
        a, b, c = self._slopes(x, self._k)
        value, first, second = near_critical(self._rows, x, self.tau)
        return a + value, b + first, c + second

    def full(self, x: float) -> Residual:
        """Return the residual part with all its first and second scaled derivatives at reduced density x."""
        equation, tau = self.equation, self.tau
        first, second = temperature_slopes(equation, tau)
        a, b, c = self._slopes(x, self._k)
        a_t, b_t, _ = self._slopes(x, equation.gather(first))
        a_tt, _, _ = self._slopes(x, equation.gather(second))
        if not self._rows:
            return Residual(a, b, c, a_t, a_tt, b_t)
        near = near_critical_full(self._rows, x, tau)
        return Residual(*(one + other for one, other in zip((a, b, c, a_t, a_tt, b_t), near, strict=True)))


def temperature_parts(equation: Equation, tau: float) -> list[float]:
    """Return the temperature part of each term at tau = T_r/T."""
    parts = [n * tau**t for n, t in equation.TERMS]
    for place, beta, gamma in equation.BELLS:
        parts[place] *= exp(-beta * (tau - gamma) * (tau - gamma))
    for place, beta, gamma, b in equation.PEAKS:
        parts[place] *= exp(1.0 / (beta * (tau - gamma) ** 2 + b))
    return parts


def temperature_slopes(equation: Equation, tau: float) -> tuple[list[float], list[float]]:
    """Return tau·A' and tau^2·A'' of the temperature part A of each term."""
    parts = temperature_parts(equation, tau)
    lean = [t for _, t in equation.TERMS]
    bend = [0.0] * len(lean)
    for place, beta, gamma in equation.BELLS:
        lean[place] -= 2.0 * beta * tau * (tau - gamma)
        bend[place] = -2.0 * beta * tau * (2.0 * tau - gamma)
    for place, beta, gamma, b in equation.PEAKS:
        u = beta * (tau - gamma) ** 2 + b
        lean[place] -= 2.0 * beta * tau * (tau - gamma) / u**2
        bend[place] = -2.0 * beta * tau * ((2.0 * tau - gamma) / u**2 - 4.0 * beta * tau * (tau - gamma) ** 2 / u**3)
    first = [part * slope for part, slope in zip(parts, lean, strict=True)]
    second = [part * (s * s + c - s) for part, s, c in zip(parts, lean, bend, strict=True)]
    return first, second
