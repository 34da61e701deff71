"""Emitting equation modules: what cannot be evaluated stops the build with a full message; same input, same bytes."""

from __future__ import annotations

import pytest

from generator.errors import SpecError
from generator.gas_equations import emit_gas_modules
from generator.gas_slopes import Shape, slopes_text
from generator.gas_terms import read_ideal, read_terms
from spec.gases import ALL as GASES


def test_unknown_residual_term_stops_the_build() -> None:
    with pytest.raises(SpecError) as told:
        read_terms("argon", [{"type": "ResidualHelmholtzAssociating", "n": [1.0]}])
    assert str(told.value) == (
        "gas argon: found residual term type ResidualHelmholtzAssociating; expected one of "
        "ResidualHelmholtzExponential, ResidualHelmholtzGaoB, ResidualHelmholtzGaussian, ResidualHelmholtzNonAnalytic, "
        "ResidualHelmholtzPower. "
        "Add a reader for it in generator/gas_terms.py and its case, or choose another equation."
    )


def test_unknown_ideal_term_stops_the_build() -> None:
    with pytest.raises(SpecError, match="ideal-gas term type IdealGasHelmholtzCP0Constant"):
        read_ideal("argon", [{"type": "IdealGasHelmholtzCP0Constant"}])


def test_broken_exponent_of_density_stops_the_build() -> None:
    block = {"type": "ResidualHelmholtzPower", "n": [1.0], "t": [1.0], "d": [1.5], "l": [0.0]}
    with pytest.raises(SpecError, match=r"exponent d = 1\.5 of the density"):
        read_terms("argon", [block])


def test_same_input_same_bytes() -> None:
    texts = emit_gas_modules(GASES)
    assert texts == emit_gas_modules(tuple(reversed(GASES))) | {
        "gaswright/gas/identity.py": texts["gaswright/gas/identity.py"]
    }
    assert len(texts) == len(GASES) + 2
    assert all(text.endswith("\n") for text in texts.values())


@pytest.mark.parametrize(
    "shape",
    [
        Shape(),
        Shape(power=1),
        Shape(power=3),
        Shape(power=2, factor=0.7),
        Shape(width=20.0, centre=1.0),
        Shape(width=-2.8, centre=0.4),
    ],
)
@pytest.mark.parametrize("powers", [(0,), (1,), (4,), (1, 2, 7), (0, 3)])
def test_straight_lines_equal_differences(shape: Shape, powers: tuple[int, ...]) -> None:
    """The emitted slopes against central differences of the emitted value."""
    scope: dict[str, object] = {}
    lines = ["from collections.abc import Callable", "from math import exp", *slopes_text([(shape, d) for d in powers])]
    exec("\n".join(lines), scope)  # noqa: S102 - the code under test
    gather, slopes = scope["gather"], scope["slopes"]
    k = gather([0.3 + 0.2 * place for place in range(len(powers))])  # type: ignore[operator]  # from exec
    x, h = 0.8, 1e-4
    low, (value, first, second), high = (slopes(y, k) for y in (x - h, x, x + h))  # type: ignore[operator]  # from exec
    assert first == pytest.approx(x * (high[0] - low[0]) / (2 * h), rel=1e-4, abs=1e-6)
    assert second == pytest.approx(x * x * (high[0] - 2 * value + low[0]) / h**2, rel=1e-3, abs=1e-4)
