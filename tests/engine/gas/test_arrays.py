"""Array densities equal the single ones, and refuse the same states."""

from __future__ import annotations

import numpy as np
import pytest
from gaswright.errors import OutsideRangeError
from gaswright.gas import IdealGas, find
from gaswright.gas.arrays import density_array

from tests.engine.gas.support import KEYS, gas_states


@pytest.mark.parametrize("key", KEYS)
def test_each_density_equals_the_single_call(key: str, full: bool) -> None:  # noqa: FBT001 - a fixture
    rows = [(p, T) for _, _, p, T in gas_states(key, 2000 if full else 150, "arrays")]
    gas = find(key)
    found = density_array(gas, [p for p, _ in rows], [T for _, T in rows])
    single = np.array([gas.density(p, T) for p, T in rows])
    np.testing.assert_allclose(found, single, rtol=1e-12)


def test_shapes_are_broadcast() -> None:
    gas = find("nitrogen")
    found = density_array(gas, [[1e5], [2e7]], [280.0, 290.0, 300.0])
    assert found.shape == (2, 3)
    assert found[1, 0] == pytest.approx(gas.density(2e7, 280.0), rel=1e-14)
    assert density_array(IdealGas(gas), 1e5, 300.0) == pytest.approx(IdealGas(gas).density(1e5, 300.0), rel=1e-15)


@pytest.mark.parametrize(("p", "T"), [(60e5, 293.15), (float("nan"), 293.15), (-1.0, 293.15)])
def test_one_bad_state_is_told(p: float, T: float) -> None:
    with pytest.raises(ValueError, match="Propane"):
        density_array(find("propane"), [1e5, p], [293.15, T])


def test_a_liquid_among_gases_is_refused() -> None:
    with pytest.raises(OutsideRangeError, match="saturation pressure"):
        density_array(find("propane"), [1e5, 9e5], [293.15, 293.15])
