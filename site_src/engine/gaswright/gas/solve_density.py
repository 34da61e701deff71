"""Density of the gas at a pressure: bracketed Newton from a cubic-equation start.

Takes an isotherm and a pressure; gives the reduced density of the gas root.
The gas, the saturation solver and the array form come next.
"""

from math import inf

from gaswright.gas.cubic import peng_robinson_density
from gaswright.gas.helmholtz import Isotherm

STEPS = 100
CLOSE = 1e-9


def gas_root(isotherm: Isotherm, p: float) -> float | None:
    """Return the density [mol/m3] of the gas at p [Pa]; None where the isotherm has no gas branch at p.

    Below the critical temperature the gas branch ends below the critical density.
    """
    equation, T = isotherm.equation, isotherm.T
    scale = equation.RHO_REDUCING
    start = peng_robinson_density(equation, p, T) / scale
    high = inf if T >= equation.T_CRITICAL else equation.RHO_CRITICAL / scale
    x = reduced_density(isotherm, p / (scale * equation.R * T), start, 0.0, high)
    return None if x is None else x * scale


def reduced_density(isotherm: Isotherm, target: float, start: float, low: float, high: float) -> float | None:
    """Return the root x in (low, high) of x·(1 + x·a_x) = target on the branch that rises from `low`; None if absent.

    `target` is p/(rho_r·R·T). Newton's last step is at most 1e-9 of x and its error the square of that.
    A point of falling pressure belongs above the gas branch.
    """
    slopes = isotherm.slopes
    x = start if low < start < high else 0.5 * (low + min(high, 4.0 * start))
    for _ in range(STEPS):
        _, b, c = slopes(x)
        miss = x * (1.0 + b) - target
        rise = 1.0 + b + b + c
        step = miss / rise if rise > 0.0 else high
        if -CLOSE * x < step < CLOSE * x:
            return x - step
        if miss > 0.0 or rise <= 0.0:
            high = x
        else:
            low = x
        x -= step
        if not low < x < high:
            x = 0.5 * (low + high)
            if high - low <= 1e-15 * high:
                return x if abs(miss) <= 1e-9 * target else None
    return None
