"""Saturation from the equation itself: equal pressure and equal Gibbs energy of liquid and vapour.

Takes an equation and a temperature; gives saturation pressure and both densities.
The phase decision and the pages come next.

Newton on reduced pressure J = x·(1 + x·a_x) and Gibbs energy K = x·a_x + a + ln x (R. Akasaka, J. Therm. Sci. Technol.
3 (2008) 442), started from the simple curves; near the critical point a bracket between the two spinodals starts it.
"""

from math import isfinite, log
from typing import NamedTuple

from gaswright.gas.ancillary import along_saturation
from gaswright.gas.helmholtz import Isotherm
from gaswright.gas.solve_density import reduced_density

STEPS = 40
CLOSE = 1e-10
FLAT = 1e-12


class Saturation(NamedTuple):
    """Saturation at one temperature: pressure [Pa], densities of liquid and vapour [mol/m3]."""

    p: float
    liquid: float
    vapour: float


def saturation(isotherm: Isotherm) -> Saturation:
    """Return the saturation of a pure gas between its lowest and its critical temperature."""
    found = _from_curves(isotherm) or _from_spinodals(isotherm)
    return found or _critical(isotherm)


def _from_curves(isotherm: Isotherm) -> Saturation | None:
    equation = isotherm.equation
    liquid = along_saturation(equation.LIQUID_RHO, isotherm.T)
    vapour = along_saturation(equation.VAPOUR_RHO, isotherm.T)
    if liquid is None or vapour is None or not vapour < liquid:
        return None
    return _polish(isotherm, liquid / equation.RHO_REDUCING, vapour / equation.RHO_REDUCING)


def _polish(isotherm: Isotherm, x: float, y: float) -> Saturation | None:
    """Return the saturation found by Newton from reduced densities x of liquid and y of vapour; None if it strays."""
    for _ in range(STEPS):
        a, b, c = isotherm.slopes(x)
        d, e, f = isotherm.slopes(y)
        rise_x, rise_y = 1.0 + b + b + c, 1.0 + e + e + f
        pressure = x * (1.0 + b) - y * (1.0 + e)
        gibbs = b + a - e - d + log(x / y)
        spread = rise_x * rise_y * (1.0 / y - 1.0 / x)
        if rise_x <= 0.0 or rise_y <= 0.0 or spread <= 0.0:
            return None
        step_x = (gibbs * rise_y - pressure * rise_y / y) / spread
        step_y = (gibbs * rise_x - pressure * rise_x / x) / spread
        x, y = x + step_x, y + step_y
        if not (isfinite(x) and 0.0 < y < x):
            return None
        if abs(step_x) < CLOSE * x and abs(step_y) < CLOSE * y:
            return _state(isotherm, x, y)
    return None


def _state(isotherm: Isotherm, x: float, y: float) -> Saturation:
    equation = isotherm.equation
    _, e, _ = isotherm.slopes(y)
    scale = equation.RHO_REDUCING
    return Saturation(y * (1.0 + e) * scale * equation.R * isotherm.T, x * scale, y * scale)


def _from_spinodals(isotherm: Isotherm) -> Saturation | None:
    """Return the saturation bracketed between the pressures of the spinodals; None where the isotherm is flat."""
    middle = isotherm.equation.RHO_CRITICAL / isotherm.equation.RHO_REDUCING
    if _rise(isotherm, middle) >= 0.0:
        return None
    vapour = _edge(isotherm, middle, -1.0)
    liquid = _edge(isotherm, middle, 1.0)
    top, foot = _pressure(isotherm, vapour), max(_pressure(isotherm, liquid), 0.0)
    for _ in range(200):
        target = 0.5 * (foot + top)
        pair = _roots(isotherm, target, vapour, liquid)
        if pair is None or top - foot <= FLAT * top:
            break
        foot, top = (foot, target) if _gibbs(isotherm, *pair) > 0.0 else (target, top)
    if pair is None:
        return None
    return _polish(isotherm, *pair) or _state(isotherm, *pair)


def _edge(isotherm: Isotherm, middle: float, side: float) -> float:
    """Return the spinodal below (side -1) or above (side +1) the reduced density `middle` of falling pressure."""
    inner, outer = middle, middle
    reach = 1e-6
    while _rise(isotherm, outer) <= 0.0:
        inner, outer = outer, middle * (1.0 + side * reach)
        reach *= 2.0
    while abs(outer - inner) > 1e-15 * middle:
        half = 0.5 * (inner + outer)
        if half in {inner, outer}:
            break
        inner, outer = (inner, half) if _rise(isotherm, half) > 0.0 else (half, outer)
    return outer


def _roots(isotherm: Isotherm, target: float, vapour: float, liquid: float) -> tuple[float, float] | None:
    gas = reduced_density(isotherm, target, 0.999 * vapour, 0.0, vapour)
    dense = reduced_density(isotherm, target, 1.001 * liquid, liquid, 3.0 * liquid)
    return None if gas is None or dense is None else (dense, gas)


def _rise(isotherm: Isotherm, x: float) -> float:
    _, b, c = isotherm.slopes(x)
    return 1.0 + b + b + c


def _pressure(isotherm: Isotherm, x: float) -> float:
    return x * (1.0 + isotherm.slopes(x)[1])


def _gibbs(isotherm: Isotherm, x: float, y: float) -> float:
    """Return the Gibbs energy of vapour y less that of liquid x, over R·T."""
    a, b, _ = isotherm.slopes(x)
    d, e, _ = isotherm.slopes(y)
    return d + e - a - b + log(y / x)


def _critical(isotherm: Isotherm) -> Saturation:
    """Return the state at the critical density: within rounding of the critical point both phases are one."""
    equation = isotherm.equation
    x = equation.RHO_CRITICAL / equation.RHO_REDUCING
    return _state(isotherm, x, x)
