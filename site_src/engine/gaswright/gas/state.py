"""The state of a gas in one call.

Takes a gas, a temperature and a pressure or molar density; gives Z, pressure, densities, method and uncertainty.
It is the door for other people's programs; the command line comes next.
"""

from collections.abc import Mapping
from typing import NamedTuple

from gaswright.errors import ReadingError
from gaswright.gas.real import Gas
from gaswright.gas.register import find


class GasState(NamedTuple):
    """A state: Z [1], p [Pa], T [K], molar density [mol/m3], mass density [kg/m3], the equation, U(rho)/rho (k = 2)."""

    Z: float
    p: float
    T: float
    molar_density: float
    mass_density: float
    method: str
    uncertainty: float


def gas_state(
    gas: str | Mapping[str, float],
    *,
    T: float,
    p: float | None = None,
    molar_density: float | None = None,
    check_phase: bool = True,
) -> GasState:
    """Return the state of `gas` (a name) at T [K] and either p [Pa] or molar_density [mol/m3].

    Raises:
        ReadingError: the gas is unknown, or both or neither of p and molar_density are given.
        OutsideRangeError: the state is no gas (unless check_phase is False), or outside the equation's limits.
    """
    real = _pure(gas)
    if molar_density is None and p is not None:
        rho = real.molar_density(p, T, check_phase=check_phase)
        return _state(real, p, T, rho)
    if p is None and molar_density is not None:
        pressure = real.pressure_at(molar_density, T, check_phase=check_phase)
        return _state(real, pressure, T, molar_density)
    raise ReadingError(
        f"state of {real.title}",
        "both a pressure and a density" if p is not None else "neither a pressure nor a density",
        "exactly one of p and molar_density",
        "Give one of them.",
    )


def _pure(gas: str | Mapping[str, float]) -> Gas:
    if isinstance(gas, str):
        return find(gas)
    names = [name for name, share in gas.items() if share != 0.0]
    if len(names) == 1 and gas[names[0]] == 1.0:
        return find(names[0])
    raise ReadingError(
        "gas",
        f"a mixture of {', '.join(names)}",
        "one pure gas, or air",
        "This version has no mixtures: give one gas by its name.",
    )


def _state(real: Gas, p: float, T: float, rho: float) -> GasState:
    return GasState(
        Z=p / (rho * real.R * T),
        p=p,
        T=T,
        molar_density=rho,
        mass_density=rho * real.molar_mass,
        method=f"reference equation of state: {real.equation}",
        uncertainty=real.density_uncertainty(p, T),
    )
