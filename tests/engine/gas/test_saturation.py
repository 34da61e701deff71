"""Saturation of the pure gases against CoolProp 8.0.0.

The library's own saturation pressure comes from fitted expansions, true to about 1e-9 at the lowest pressures,
so pressure is judged there by the pressure of its saturated vapour density.
"""

from __future__ import annotations

from random import Random

import pytest
from CoolProp import CoolProp
from gaswright.gas import find

from tests.engine.gas.support import PURE, judge


@pytest.mark.parametrize("key", PURE)
@pytest.mark.parametrize(("low", "high", "exact"), [(0.0, 0.99, 1e-11), (0.99, 0.9999, 1e-9), (0.9999, 1.0, 1e-4)])
def test_saturation_equals_the_library(key: str, low: float, high: float, exact: float, full: bool) -> None:  # noqa: FBT001
    gas, state, vapour = find(key), judge(key), judge(key)
    vapour.specify_phase(CoolProp.iphase_gas)
    random = Random(f"saturation {key}")  # noqa: S311 - the same states each time, no secret
    for _ in range(300 if full else 30):
        T = gas.T_min + (gas.T_c - gas.T_min) * random.uniform(low, high)
        found = gas.saturation(T)
        assert found is not None
        state.update(CoolProp.QT_INPUTS, 1, T)
        assert found.vapour == pytest.approx(state.rhomolar(), rel=exact)
        vapour.update(CoolProp.DmolarT_INPUTS, state.rhomolar(), T)
        assert found.p == pytest.approx(vapour.p(), rel=1e-11)
        state.update(CoolProp.QT_INPUTS, 0, T)
        assert found.liquid == pytest.approx(state.rhomolar(), rel=exact)


@pytest.mark.parametrize("key", PURE)
def test_no_saturation_above_the_critical_temperature(key: str) -> None:
    gas = find(key)
    assert gas.saturation_pressure(gas.T_c) is None
    assert gas.saturation(gas.T_c * 1.01) is None
    assert gas.saturation_pressure(gas.T_c * (1 - 1e-9)) == pytest.approx(gas.p_c, rel=1e-7)
