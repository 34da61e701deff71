"""Partial derivatives and caloric properties against CoolProp 8.0.0.

After an update at p and T the library answers derivatives from the last but one step of its density solver
(1e-9 off), so it is set again at density and temperature before it is asked.
"""

from __future__ import annotations

import pytest
from CoolProp import CoolProp

from tests.engine.gas.support import KEYS, at_density, gas_states, is_near_critical

EXACT = 1e-11


@pytest.mark.parametrize("key", KEYS)
def test_partial_derivatives_equal_the_library(key: str, full: bool) -> None:  # noqa: FBT001 - a fixture
    for gas, state, p, T in gas_states(key, 1000 if full else 100, "slopes"):
        at_density(state, T)
        rho = state.rhomass()
        by_density = state.first_partial_deriv(CoolProp.iP, CoolProp.iDmass, CoolProp.iT)
        by_temperature = state.first_partial_deriv(CoolProp.iP, CoolProp.iT, CoolProp.iDmass)
        scale = max(by_density, p / rho)
        assert abs(gas.pressure_drho(rho, T) - by_density) <= EXACT * scale
        assert gas.pressure_dT(rho, T) == pytest.approx(by_temperature, rel=EXACT)
        if is_near_critical(gas, p, T):
            continue
        by_p = state.first_partial_deriv(CoolProp.iDmass, CoolProp.iP, CoolProp.iT)
        by_T = state.first_partial_deriv(CoolProp.iDmass, CoolProp.iT, CoolProp.iP)
        assert gas.density_dp(p, T) == pytest.approx(by_p, rel=EXACT)
        assert gas.density_dT(p, T) == pytest.approx(by_T, rel=EXACT)


@pytest.mark.parametrize("key", KEYS)
def test_properties_equal_the_library(key: str, full: bool) -> None:  # noqa: FBT001 - a fixture
    for gas, state, p, T in gas_states(key, 1000 if full else 100, "properties"):
        if is_near_critical(gas, p, T):
            continue
        at_density(state, T)
        found = gas.properties(p, T)
        flow = state.first_partial_deriv(CoolProp.iT, CoolProp.iP, CoolProp.iHmolar)
        assert found.cv == pytest.approx(state.cvmolar(), rel=EXACT)
        assert found.cp == pytest.approx(state.cpmolar(), rel=EXACT)
        assert found.speed_of_sound == pytest.approx(state.speed_sound(), rel=EXACT)
        assert found.isentropic_exponent == pytest.approx(state.rhomass() * state.speed_sound() ** 2 / p, rel=EXACT)
        assert abs(found.joule_thomson - flow) <= EXACT * T / p
        assert abs(found.enthalpy - state.hmolar()) <= EXACT * max(abs(state.hmolar()), gas.R * T)
        assert abs(found.entropy - state.smolar()) <= EXACT * max(abs(state.smolar()), 10 * gas.R)
