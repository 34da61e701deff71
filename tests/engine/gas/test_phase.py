"""Where a gas is refused, against the phase that CoolProp 8.0.0 names, and what the refusal says."""

from __future__ import annotations

import math
from collections.abc import Callable
from contextlib import suppress
from random import Random

import pytest
from gaswright.errors import OutsideRangeError, ReadingError
from gaswright.gas import Gas, find

from tests.engine.gas.support import KEYS, PURE, judge, phase, states


def _given(call: Callable[[float, float], float], p: float, T: float) -> float | None:
    """Return what the call gives, or None where it refuses by a named error."""
    with suppress(OutsideRangeError, ReadingError):
        return call(p, T)
    return None


def _is_given(gas: Gas, p: float, T: float) -> bool:
    return _given(gas.density, p, T) is not None


@pytest.mark.parametrize("key", KEYS)
def test_refused_exactly_where_the_library_says(key: str, full: bool) -> None:  # noqa: FBT001 - a fixture
    gas, state = find(key), judge(key)
    given = refused = 0
    for p, T in states(gas, 5000 if full else 500, "phase"):
        is_given = _is_given(gas, p, T)
        assert is_given == (phase(state, p, T) == "gas"), (key, p, T)
        given, refused = given + is_given, refused + (not is_given)
    assert given > 100
    assert refused > 50


@pytest.mark.parametrize("key", PURE)
def test_saturation_line_parts_gas_from_liquid(key: str) -> None:
    gas = find(key)
    for share in (0.05, 0.3, 0.7, 0.95, 0.999):
        T = gas.T_min + share * (gas.T_c - gas.T_min)
        p = gas.saturation_pressure(T)
        assert p is not None
        assert _is_given(gas, p, T)
        assert _is_given(gas, p * (1 - 1e-7), T)
        assert not _is_given(gas, p * (1 + 1e-7), T)
        vapour = gas.density(p, T)
        assert gas.pressure(vapour * (1 - 1e-7), T) < p
        with pytest.raises(OutsideRangeError):
            gas.pressure(vapour * (1 + 1e-7), T)


def test_liquid_is_told_with_its_saturation_pressure() -> None:
    with pytest.raises(OutsideRangeError) as told:
        find("carbon_dioxide").density(60e5, 293.15)
    assert str(told.value) == (
        "Carbon dioxide: found 60 bar absolute at 20.00 °C, where it is a liquid; "
        "expected a gas: below 57.2905 bar absolute, its saturation pressure at 20.00 °C. "
        "Weigh it instead, or enter a lower pressure or a higher temperature."
    )


def test_air_between_its_lines_is_partly_liquid() -> None:
    with pytest.raises(OutsideRangeError, match="partly liquid"):
        find("air").density(6.3e5, 100.0)


def test_solid_helium_is_refused() -> None:
    with pytest.raises(OutsideRangeError, match="solid"):
        find("helium").density(100e6, 13.0)


@pytest.mark.parametrize(
    ("p", "T", "word"), [(1e5, 50.0, "temperature"), (1e5, 2500.0, "temperature"), (3e9, 300.0, "pressure")]
)
def test_outside_the_limits_of_the_equation(p: float, T: float, word: str) -> None:
    with pytest.raises(OutsideRangeError, match=f"{word} of Nitrogen") as told:
        find("nitrogen").density(p, T)
    assert told.value.todo.startswith("Check the")


@pytest.mark.parametrize(
    ("p", "T"),
    [(-1e5, 300.0), (0.0, 300.0), (float("nan"), 300.0), (1e5, float("nan")), (float("inf"), 300.0), (1e5, -5.0)],
)
def test_numbers_that_are_none_are_named(p: float, T: float) -> None:
    with pytest.raises(ReadingError, match="of Nitrogen"):
        find("nitrogen").density(p, T)


@pytest.mark.parametrize("key", KEYS)
def test_any_numbers_give_a_figure_or_a_named_error(key: str, full: bool) -> None:  # noqa: FBT001 - a fixture
    gas = find(key)
    random = Random(f"any {key}")  # noqa: S311 - the same numbers each time, no secret
    edges = [gas.T_min, gas.T_c, gas.T_max, -1.0, 0.0, 5e-324, 1e308, float("nan"), float("inf"), gas.p_c, gas.p_max]
    calls = [gas.density, gas.density_dT, gas.compressibility, gas.pressure, gas.pressure_dT, gas.temperature]
    calls += [lambda p, T: gas.properties(p, T).joule_thomson, lambda p, _: gas.saturation_pressure(p) or 0.0]
    for _ in range(10_000 if full else 1_000):
        near = gas.p_c * (1 + random.choice([-1, 1]) * 10 ** random.uniform(-14, -1))
        p = random.choice([random.choice(edges), near, 10 ** random.uniform(-3, 9.5)])
        near = gas.T_c * (1 + random.choice([-1, 1]) * 10 ** random.uniform(-14, -1))
        T = random.choice([random.choice(edges), near, random.uniform(0.9 * gas.T_min, 1.1 * gas.T_max)])
        found = _given(random.choice(calls), p, T)
        assert found is None or math.isfinite(found), (key, p, T)


def test_temperature_of_a_liquid_density_is_refused() -> None:
    """Liquid nitrogen at 1 bar: 806 kg/m3 (CoolProp 8.0.0 at 77.35 K); no gas has that density and pressure."""
    with pytest.raises(OutsideRangeError):
        find("nitrogen").temperature(1e5, 806.0)
