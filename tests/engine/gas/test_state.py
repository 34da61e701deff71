"""The state of a gas in one call, and the ideal law behind the same interface."""

from __future__ import annotations

import pytest
from CoolProp import CoolProp
from gaswright.errors import OutsideRangeError, ReadingError
from gaswright.gas import IdealGas, find, gas_state

from tests.engine.gas.support import FLUIDS

R = 8.31446261815324  # J/(mol K), SI Brochure, 9th edition: k·N_A


def test_state_from_pressure() -> None:
    state = gas_state("nitrogen", T=288.15, p=20e6)
    assert state.mass_density == pytest.approx(CoolProp.PropsSI("D", "P", 20e6, "T", 288.15, "Nitrogen"), rel=1e-13)
    assert state.molar_density == pytest.approx(
        CoolProp.PropsSI("Dmolar", "P", 20e6, "T", 288.15, "Nitrogen"), rel=1e-13
    )
    assert (
        pytest.approx(20e6 / (state.molar_density * 8.31451 * 288.15), rel=1e-14) == state.Z
    )  # R of Span et al. (2000)
    assert (state.p, state.T, state.uncertainty) == (20e6, 288.15, 2e-4)
    assert "Span" in state.method


def test_state_from_molar_density_is_the_way_back() -> None:
    there = gas_state("O2", T=300.0, p=15e6)
    back = gas_state({"oxygen": 1.0}, T=300.0, molar_density=there.molar_density)
    assert back.p == pytest.approx(15e6, rel=1e-13)


@pytest.mark.parametrize("key", ["propane", "carbon_dioxide", "nitrogen"])
def test_unchecked_density_of_a_liquid_gives_the_pressure_of_the_equation(key: str) -> None:
    gas = find(key)
    T = 0.8 * gas.T_c
    liquid = CoolProp.PropsSI("Dmolar", "T", T, "Q", 0, FLUIDS[key]) * 1.05
    with pytest.raises(OutsideRangeError, match="liquid"):
        gas_state(key, T=T, molar_density=liquid)
    expected = CoolProp.PropsSI("P", "T", T, "Dmolar", liquid, FLUIDS[key])
    assert gas_state(key, T=T, molar_density=liquid, check_phase=False).p == pytest.approx(expected, rel=1e-9)


def test_unchecked_pressure_just_beyond_the_dew_line_stays_on_the_gas_branch() -> None:
    dew = find("propane").saturation_pressure(293.15)
    assert dew is not None
    beyond = gas_state("propane", T=293.15, p=1.01 * dew, check_phase=False)
    assert beyond.Z > gas_state("propane", T=293.15, p=dew).Z - 0.01
    with pytest.raises(OutsideRangeError, match="no gas state"):
        gas_state("propane", T=293.15, p=30 * dew, check_phase=False)


def test_exactly_one_of_pressure_and_density() -> None:
    with pytest.raises(ReadingError, match="exactly one"):
        gas_state("nitrogen", T=300.0)
    with pytest.raises(ReadingError, match="exactly one"):
        gas_state("nitrogen", T=300.0, p=1e5, molar_density=40.0)


def test_a_mixture_is_named_and_refused() -> None:
    with pytest.raises(ReadingError, match="mixture of methane, nitrogen"):
        gas_state({"methane": 0.9, "nitrogen": 0.1}, T=300.0, p=5e6)


@pytest.mark.parametrize("key", ["nitrogen", "carbon_dioxide", "helium"])
def test_ideal_law_behind_the_same_interface(key: str) -> None:
    real = find(key)
    ideal = IdealGas(real)
    p, T = 20e6, 288.15
    rho = p * real.molar_mass / (R * T)
    assert ideal.R == R
    assert ideal.density(p, T) == pytest.approx(rho, rel=1e-15)
    assert ideal.pressure(rho, T) == pytest.approx(p, rel=1e-15)
    assert ideal.temperature(p, rho) == pytest.approx(T, rel=1e-15)
    assert ideal.density_dp(p, T) == pytest.approx(rho / p, rel=1e-14)
    assert ideal.density_dT(p, T) == pytest.approx(-rho / T, rel=1e-14)
    assert ideal.compressibility(p, T) == pytest.approx(1.0, rel=1e-15)
    assert ideal.density_uncertainty(p, T) == 0.0
    assert ideal.properties(p, T).cp - ideal.properties(p, T).cv == pytest.approx(R, rel=1e-12)
    assert ideal.properties(p, T).joule_thomson == 0.0


@pytest.mark.parametrize(
    ("key", "limit"),
    [("nitrogen", 21), ("air", 13), ("helium", 10), ("hydrogen", 8.4), ("oxygen", 6.8), ("methane", 2.6)],
)
def test_where_the_ideal_law_keeps_half_a_per_cent(key: str, limit: float) -> None:
    """At 15 °C, bar (common practice, no source)."""
    real = find(key)
    off = IdealGas(real).density(limit * 1e5, 288.15) / real.density(limit * 1e5, 288.15) - 1
    assert abs(off) == pytest.approx(0.005, rel=0.06)
