"""Random states of the gases and the independent library that judges them.

CoolProp 8.0.0 carries the coefficients, so agreement with it proves copying and evaluation;
the published tables in test_published.py judge the coefficients themselves.
"""

from __future__ import annotations

from collections.abc import Iterator
from contextlib import suppress
from random import Random

from CoolProp import CoolProp
from gaswright.gas import Gas, find

from spec.gases import ALL as GASES

FLUIDS = {gas.key: gas.fluid for gas in GASES}
KEYS = tuple(FLUIDS)
PURE = tuple(key for key in KEYS if key != "air")
GAS_PHASES = {CoolProp.iphase_gas, CoolProp.iphase_supercritical, CoolProp.iphase_supercritical_gas}
TOP = 100e6


def judge(key: str) -> CoolProp.AbstractState:
    """Return a fresh state of the independent library."""
    return CoolProp.AbstractState("HEOS", FLUIDS[key])


def states(gas: Gas, count: int, seed: str) -> Iterator[tuple[float, float]]:
    """Yield `count` pairs p [Pa], T [K]: over the whole range up to 100 MPa, the cold part, near the critical point."""
    random = Random(f"{seed} {gas.key}")  # noqa: S311 - the same states each time, no secret
    top = min(gas.p_max, TOP)
    for place in range(count):
        kind = place % 3
        if kind == 0:
            yield 10 ** random.uniform(2, 8) * top / TOP, random.uniform(gas.T_min, gas.T_max)
        elif kind == 1:
            yield 10 ** random.uniform(2, 8) * top / TOP, random.uniform(gas.T_min, 1.3 * gas.T_c)
        else:
            yield gas.p_c * random.uniform(0.5, 1.5), gas.T_c * random.uniform(0.9, 1.1)


def _is_known(state: CoolProp.AbstractState, p: float, T: float) -> bool:
    with suppress(ValueError):
        state.update(CoolProp.PT_INPUTS, p, T)
        return True
    return False


def phase(state: CoolProp.AbstractState, p: float, T: float) -> str:
    """Return "gas" where the library calls the state a gas or supercritical above T_c, else why it is none.

    Below the pressure of its triple point the library calls air a gas even where its own dew line says otherwise.
    """
    if not _is_known(state, p, T):
        return "no state"
    is_low_air = state.name() == "Air" and p < state.trivial_keyed_output(CoolProp.iP_triple) and state.T_critical() > T
    if is_low_air and p > CoolProp.PropsSI("P", "T", T, "Q", 1, "Air"):
        return "two-phase"
    return "gas" if state.phase() in GAS_PHASES else str(state.phase())


def gas_states(key: str, count: int, seed: str) -> Iterator[tuple[Gas, CoolProp.AbstractState, float, float]]:
    """Yield `count` states that the library calls a gas: the gas, the library at that state, p [Pa], T [K]."""
    gas, state = find(key), judge(key)
    found = 0
    for p, T in states(gas, 4 * count, seed):
        if phase(state, p, T) == "gas":
            yield gas, state, p, T
            found += 1
        if found == count:
            return
    message = f"only {found} of {count} gas states of {key}"
    raise AssertionError(message)


def at_density(state: CoolProp.AbstractState, T: float, molar_density: float | None = None) -> None:
    """Set the library, as a gas, at T [K] and a density [mol/m3]; without one, at the density it has found."""
    state.specify_phase(CoolProp.iphase_gas)
    state.update(CoolProp.DmolarT_INPUTS, state.rhomolar() if molar_density is None else molar_density, T)
    state.unspecify_phase()


def is_near_critical(gas: Gas, p: float, T: float) -> bool:
    """Return whether a state is within 1 % of the critical point in both temperature and pressure."""
    return abs(T / gas.T_c - 1) < 0.01 and abs(p / gas.p_c - 1) < 0.01
