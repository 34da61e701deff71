"""The non-analytic terms that shape a few reference equations around the critical point.

Takes the rows of such terms; gives their sum and scaled derivatives.
The residual part adds them to its polynomials.

Form: n·D^b·x·psi with psi = exp(-C (x - 1)^2 - D (t - 1)^2), D = theta^2 + B·y^a, theta = (1 - t) + A·y^(1/(2 beta)),
y = (x - 1)^2 (R. Span and W. Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509, table 32). Powers of y are written
so that nothing divides by x - 1.
"""

from collections.abc import Callable
from math import exp
from typing import NamedTuple

from gaswright.gas.record import Row, Slopes

LEAST = 1e-200


class _Bend(NamedTuple):
    """Distance function of one term and its derivatives in density; theta, and its derivative over x - 1."""

    value: float
    x: float
    xx: float
    theta: float
    theta_x: float


def near_critical(rows: tuple[Row, ...], x: float, t: float, exp: Callable[[float], float] = exp) -> Slopes:
    """Return the sum of the terms, x times its slope and x^2 times its second slope; arrays with their own exp."""
    total = first = second = 0.0
    z = x - 1.0
    for n, a, b, beta, size, share, width, height in rows:
        psi = exp(-width * z * z - height * (t - 1.0) * (t - 1.0))
        bend = _distance(a, beta, size, share, z, t)
        power = bend.value**b
        e = n * power * x * psi
        slope = b * bend.x / bend.value
        curve = b * (bend.xx / bend.value + (b - 1.0) * (bend.x / bend.value) ** 2)
        lean = -2.0 * width * z
        total += e
        first += e * (1.0 + x * (slope + lean))
        second += e * x * (2.0 * (slope + lean) + x * (curve + 2.0 * slope * lean + lean * lean - 2.0 * width))
    return total, first, second


def near_critical_full(rows: tuple[Row, ...], x: float, t: float) -> tuple[float, float, float, float, float, float]:
    """Return the sum of the terms, x·d/dx, x^2·d2/dx2, t·d/dt, t^2·d2/dt2 and x·t·d2/dx/dt."""
    total, first, second = near_critical(rows, x, t)
    warm = warmer = mixed = 0.0
    z = x - 1.0
    for n, a, b, beta, size, share, width, height in rows:
        psi = exp(-width * z * z - height * (t - 1.0) * (t - 1.0))
        bend = _distance(a, beta, size, share, z, t)
        e = n * bend.value**b * x * psi
        ratio = -2.0 * bend.theta / bend.value
        slope_t = b * ratio
        curve_t = b * (2.0 / bend.value + (b - 1.0) * ratio * ratio)
        lean_t = -2.0 * height * (t - 1.0)
        sum_t = slope_t + lean_t
        warm += e * t * sum_t
        warmer += e * t * t * (curve_t + 2.0 * slope_t * lean_t + lean_t * lean_t - 2.0 * height)
        cross = b * (-2.0 * bend.theta_x / bend.value + (b - 1.0) * ratio * bend.x / bend.value)
        slope_x = b * bend.x / bend.value
        lean_x = -2.0 * width * z
        mixed += e * t * (sum_t + x * (cross + slope_x * lean_t + slope_t * lean_x + lean_x * lean_t))
    return total, first, second, warm, warmer, mixed


def _distance(  # noqa: PLR0913, PLR0917 - four figures of a term and the state
    a: float, beta: float, size: float, share: float, z: float, t: float
) -> _Bend:
    y = z * z
    half = 0.5 / beta
    root = size * y ** (half - 1.0)
    theta = (1.0 - t) + root * y
    hill = share * y ** (a - 1.0)
    value = theta * theta + hill * y + LEAST
    over = 2.0 * theta * (2.0 * half * root) + 2.0 * a * hill
    inner = 2.0 * (2.0 * half * root) ** 2 * y + 2.0 * theta * 4.0 * half * (half - 1.0) * root
    return _Bend(value, z * over, over + inner + 4.0 * a * (a - 1.0) * hill, theta, 2.0 * half * root * z)
