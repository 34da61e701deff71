"""Temperature of the gas at a pressure and a density.

Takes an equation, a pressure and a density; gives the temperature on the gas side, bracketed.
The gas comes next. Along a line of constant density the pressure rises with temperature throughout the gas.
"""

from collections.abc import Callable

from gaswright.gas.ancillary import along_saturation
from gaswright.gas.helmholtz import Isotherm
from gaswright.gas.record import Equation

STEPS = 100
CLOSE = 1e-9
BELOW_DEW = 0.02


def coldest_gas(equation: Equation, rho: float) -> float:
    """Return a temperature [K] at or a little below which the gas of molar density rho [mol/m3] condenses."""
    low, high = equation.T_MIN, equation.T_CRITICAL
    if rho >= equation.RHO_CRITICAL:
        return high
    for _ in range(60):
        half = 0.5 * (low + high)
        near = along_saturation(equation.VAPOUR_RHO, half)
        low, high = (half, high) if near is not None and near < rho else (low, half)
    return max(equation.T_MIN, low * (1.0 - BELOW_DEW))


def solve_temperature(isotherm_at: Callable[[float], Isotherm], p: float, rho: float, low: float, high: float) -> float:
    """Return T [K] in [low, high] with pressure p [Pa] at rho [mol/m3]; the end of the range where p lies beyond it."""
    equation = isotherm_at(high).equation
    x = rho / equation.RHO_REDUCING
    T = min(max(p / (rho * equation.R), low), high)
    for _ in range(STEPS):
        part = isotherm_at(T).full(x)
        miss = rho * equation.R * T * (1.0 + part.x) - p
        slope = rho * equation.R * (1.0 + part.x - part.xt)
        low, high = (low, T) if miss > 0.0 else (T, high)
        step = miss / slope if slope > 0.0 else 0.5 * T
        if abs(step) < CLOSE * T:
            return T - step
        T -= step
        if not low < T < high:
            T = 0.5 * (low + high)
            if high - low <= 1e-15 * high:
                return T
    return T
