"""Speed of the density of each gas, side by side with CoolProp in one run, as ratios.

Run: python tests/bench/gas_density.py. Higher is quicker; a ratio of 1 is the speed of the library's call.
"""

from __future__ import annotations

from collections.abc import Callable
from random import Random
from statistics import median
from time import perf_counter

import numpy as np
from CoolProp import CoolProp
from gaswright.gas import Gas, find
from gaswright.gas.arrays import density_array

from spec.gases import ALL as GASES

COUNT, ROUNDS = 1500, 5

type States = list[tuple[float, float]]


def states_of(gas: Gas) -> States:
    """Return cold, unrelated gas states from 1 to 300 bar, p [Pa] and T [K]."""
    random = Random(gas.key)  # noqa: S311 - the same states each time, no secret
    found: States = []
    while len(found) < COUNT:
        T = random.uniform(max(250.0, gas.T_min), min(400.0, gas.T_max))
        dew = gas.saturation_pressure(T)
        found.append((10 ** random.uniform(5, 7.48) if dew is None else dew * random.uniform(0.05, 0.95), T))
    return [(min(p, gas.p_max), T) for p, T in found]


def seconds(call: Callable[[float, float], float], states: States) -> float:
    """Return the seconds that one pass over the states takes."""
    start = perf_counter()
    for p, T in states:
        call(p, T)
    return perf_counter() - start


def low_level(fluid: str) -> Callable[[float, float], float]:
    """Return the library's quickest way, with the gas phase imposed."""
    state = CoolProp.AbstractState("HEOS", fluid)
    state.specify_phase(CoolProp.iphase_gas)

    def density(p: float, T: float) -> float:
        state.update(CoolProp.PT_INPUTS, p, T)
        return float(state.rhomass())

    return density


def over_array(gas: Gas, states: States) -> float:
    """Return the seconds of one array call."""
    p, T = (np.array(column) for column in zip(*states, strict=True))
    start = perf_counter()
    density_array(gas, p, T)
    return perf_counter() - start


def row(key: str, fluid: str) -> str:
    """Return one line: rate, and ratios to the library's two ways."""
    gas = find(key)
    states = states_of(gas)
    high, low = (lambda p, T: CoolProp.PropsSI("D", "P", p, "T", T, fluid)), low_level(fluid)
    rounds = [
        (seconds(gas.density, states), seconds(high, states), seconds(low, states), over_array(gas, states))
        for _ in range(ROUNDS)
    ]
    own, props, state, array = (median(column) for column in zip(*rounds, strict=True))
    return (
        f"{key:20}{COUNT / own:12,.0f}{props / own:12.2f}{state / own:16.2f}{COUNT / array:14,.0f}{state / array:18.2f}"
    )


def main() -> None:
    """Print the table."""
    heads = ("gas", "per s", "x PropsSI", "x AbstractState", "array per s", "x AbstractState")
    print("{:20}{:>12}{:>12}{:>16}{:>14}{:>18}".format(*heads))
    for gas in GASES:
        print(row(gas.key, gas.fluid))


if __name__ == "__main__":
    main()
