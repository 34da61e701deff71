"""Density of a gas over arrays of pressure and temperature.

Takes a gas and two arrays; gives an array of densities, the same as one call for each state.
Long files and plots come next. numpy is imported on the first call, so that the engine starts without it.

States well inside the gas run through the emitted `slopes` all at once; states at the dew line, near freezing,
and the few that Newton has not settled go one by one.
"""

from typing import TYPE_CHECKING, Any, cast

from gaswright.gas.ancillary import along_saturation, melting_pressure
from gaswright.gas.cubic import peng_robinson_density
from gaswright.gas.limits import FAR_PRESSURE
from gaswright.gas.near_critical import near_critical
from gaswright.gas.real import Gas
from gaswright.gas.record import Equation, Row

if TYPE_CHECKING:
    from numpy import float64
    from numpy.typing import ArrayLike, NDArray

    type Numbers = NDArray[float64]

CHUNK = 4096
STEPS = 8
CLOSE = 1e-9


def density_array(gas: Gas, p: "ArrayLike", T: "ArrayLike") -> "Numbers":
    """Return the densities [kg/m3] at pressures p [Pa] and temperatures T [K], broadcast to one shape.

    Raises:
        ReadingError, OutsideRangeError: some state is no gas; the message tells the first such state.
    """
    import numpy as np  # noqa: PLC0415 - the engine starts without it

    pressures, temperatures = np.broadcast_arrays(np.asarray(p, dtype=float), np.asarray(T, dtype=float))
    flat_p, flat_T = pressures.ravel(), temperatures.ravel()
    found = np.empty(flat_p.shape)
    for start in range(0, flat_p.size, CHUNK):
        part = slice(start, start + CHUNK)
        found[part] = _chunk(gas, flat_p[part], flat_T[part])
    return cast("Numbers", found.reshape(pressures.shape))


def _chunk(gas: Gas, p: "Numbers", T: "Numbers") -> "Numbers":
    import numpy as np  # noqa: PLC0415 - the engine starts without it

    found = np.full(p.shape, np.nan)
    if not gas.is_ideal:
        plain = np.fromiter(
            (_is_plain(gas, *state) for state in zip(p.tolist(), T.tolist(), strict=True)), bool, p.size
        )
        found[plain] = _newton(gas, p[plain], T[plain]) * gas.molar_mass
    for place in np.flatnonzero(np.isnan(found)).tolist():
        found[place] = gas.density(float(p[place]), float(T[place]))
    return found


def _is_plain(gas: Gas, p: float, T: float) -> bool:
    """Return whether a state is a gas beyond doubt, by the limits and the simple curves alone."""
    equation = gas.coefficients
    if not (0.0 < p <= gas.p_max and gas.T_min <= T <= gas.T_max):
        return False
    if gas.T_c <= T:
        freezing = melting_pressure(equation, gas.T_c)
        return freezing is None or p < freezing
    near = along_saturation(equation.DEW_P, T)
    return near is not None and p < min(FAR_PRESSURE * near, gas.p_c)


def _newton(gas: Gas, p: "Numbers", T: "Numbers") -> "Numbers":
    """Return molar densities [mol/m3], not-a-number where Newton has not settled on the gas branch."""
    import numpy as np  # noqa: PLC0415 - the engine starts without it

    equation = gas.coefficients
    scale = equation.RHO_REDUCING
    tau = equation.T_REDUCING / T
    k = equation.gather(cast("list[float]", _temperature_parts(equation, tau)))
    target = p / (scale * equation.R * T)
    starts = (peng_robinson_density(equation, *state) for state in zip(p.tolist(), T.tolist(), strict=True))
    x = np.fromiter(starts, float, p.size) / scale
    is_sound, settled = np.ones(p.shape, bool), np.zeros(p.shape, bool)
    for _ in range(STEPS):
        step, rise = _step(equation, x, tau, k, target)
        is_sound &= rise > 0.0
        settled = np.abs(step) < CLOSE * x
        x = np.where(is_sound, x - step, x)
        if settled[is_sound].all():
            break
    is_sound &= settled & ((gas.T_c <= T) | (x * scale < equation.RHO_CRITICAL))
    return cast("Numbers", np.where(is_sound, x * scale, np.nan))


def _step(equation: Equation, x: "Numbers", tau: "Numbers", k: Row, target: "Numbers") -> "tuple[Numbers, Numbers]":
    """Return Newton's step of the reduced density and the slope of the reduced pressure."""
    import numpy as np  # noqa: PLC0415 - the engine starts without it

    slopes, near = cast("Any", equation.slopes), cast("Any", near_critical)
    with np.errstate(all="ignore"):
        _, b, c = slopes(x, k, np.exp)
        if equation.NON_ANALYTIC:
            _, first, second = near(equation.NON_ANALYTIC, x, tau, np.exp)
            b, c = b + first, c + second
        rise = 1.0 + b + b + c
        return (x * (1.0 + b) - target) / rise, rise


def _temperature_parts(equation: Equation, tau: "Numbers") -> "list[Numbers]":
    """Return the temperature part of each term, over an array."""
    import numpy as np  # noqa: PLC0415 - the engine starts without it

    parts = [n * tau**t for n, t in equation.TERMS]
    for place, beta, gamma in equation.BELLS:
        parts[place] = parts[place] * np.exp(-beta * (tau - gamma) ** 2)
    for place, beta, gamma, b in equation.PEAKS:
        parts[place] = parts[place] * np.exp(1.0 / (beta * (tau - gamma) ** 2 + b))
    return parts
