"""Straight-line code of a residual Helmholtz energy in reduced density.

Takes the density shapes of the terms of one equation; gives the text of two emitted functions, `gather` and `slopes`.
The emitter of gas equations comes next. Straight lines are three times as quick as a loop over the terms.
"""

from __future__ import annotations

from collections.abc import Sequence
from dataclasses import dataclass


@dataclass(frozen=True, slots=True, kw_only=True, order=True)
class Shape:
    """A factor E(delta): exp(-factor·delta^power), or exp(-width·(delta - centre)^2), or 1 where all are zero."""

    power: int = 0
    factor: float = 1.0
    width: float = 0.0
    centre: float = 0.0


type Group = tuple[Shape, list[int]]


def slopes_text(places: Sequence[tuple[Shape, int]]) -> list[str]:
    """Return the lines of `gather` and `slopes` for terms at `places` (shape and power of delta, one per term)."""
    groups = _groups(places)
    return [*_gather(places, groups), "", "", *_slopes(groups)]


def _groups(places: Sequence[tuple[Shape, int]]) -> list[Group]:
    shapes = sorted({shape for shape, _ in places})
    return [(shape, sorted({d for other, d in places if other == shape})) for shape in shapes]


def _name(group: int, d: int) -> str:
    return f"k{group}_{d}"


def _gather(places: Sequence[tuple[Shape, int]], groups: Sequence[Group]) -> list[str]:
    lines = [
        "def gather(v: list[float]) -> tuple[float, ...]:",
        '    """Sum the temperature parts `v` of the terms that share their shape in density."""',
        "    return (",
    ]
    for shape, powers in groups:
        for d in powers:
            same = [f"v[{place}]" for place, term in enumerate(places) if term == (shape, d)]
            lines.append(f"        {' + '.join(same)},")
    return [*lines, "    )"]


def _slopes(groups: Sequence[Group]) -> list[str]:
    names = ", ".join(_name(place, d) for place, (_, powers) in enumerate(groups) for d in powers)
    lines = [
        "def slopes(",
        "    x: float, k: tuple[float, ...], exp: Callable[[float], float] = exp",
        ") -> tuple[float, float, float]:",
        '    """Return the residual part, its slope times x and its second slope times x^2, in reduced density x."""',
        f"    ({names},) = k",
        *_powers(groups),
        "    a = b = c = 0.0",
    ]
    for place, (shape, powers) in enumerate(groups):
        lines += _group(place, shape, powers)
    return [*lines, "    return a, b, c"]


def _powers(groups: Sequence[Group]) -> list[str]:
    """Return lines for the powers of x that the polynomials step by, each built from smaller ones."""
    needed: set[int] = set()
    for shape, powers in groups:
        needed |= {shape.power, *_steps(powers)}
    lines = []
    for power in range(2, max(needed, default=1) + 1):
        if _is_used(power, needed):
            half = power // 2
            lines.append(f"    x{power} = {_x(half)} * {_x(power - half)}")
    return lines


def _is_used(power: int, needed: set[int]) -> bool:
    return any(power in _chain(one) for one in needed)


def _chain(power: int) -> set[int]:
    if power < 2:
        return set()
    return {power} | _chain(power // 2) | _chain(power - power // 2)


def _steps(powers: Sequence[int]) -> list[int]:
    return [high - low for low, high in zip([0, *powers], powers, strict=False)]


def _x(power: int) -> str:
    return "x" if power == 1 else f"x{power}"


def _horner(place: int, powers: Sequence[int], order: int) -> str:
    """Return the polynomial, weighted by d (order 1) or d·(d - 1) (order 2), as nested products."""
    text = ""
    for d, step in zip(reversed(powers), reversed(_steps(powers)), strict=True):
        own = _weighted(_name(place, d), _weight(d, order))
        joined = " + ".join(part for part in (own, text) if part)
        if joined:
            text = _times(step, joined)
    return text or "0.0"


def _times(step: int, joined: str) -> str:
    if step == 0:
        return joined
    return f"{_x(step)} * ({joined})" if " " in joined else f"{_x(step)} * {joined}"


def _weight(d: int, order: int) -> int:
    return (1, d, d * (d - 1))[order]


def _weighted(name: str, weight: int) -> str:
    if weight == 0:
        return ""
    return name if weight == 1 else f"{float(weight)!r} * {name}"


def _group(place: int, shape: Shape, powers: Sequence[int]) -> list[str]:
    if shape == Shape():
        lines = [(name, _horner(place, powers, order)) for order, name in enumerate("abc")]
        return [f"    {name} += {text}" for name, text in lines if text != "0.0"]
    return [*_envelope(shape), *(_single(place, powers[0]) if len(powers) == 1 else _several(place, powers))]


def _envelope(shape: Shape) -> list[str]:
    """Return lines for e = E, m = x·E'/E and w = x^2·E''/E."""
    if shape.power:
        weight = shape.power * shape.factor
        exponent = _x(shape.power) if shape.factor == 1 else f"{shape.factor!r} * {_x(shape.power)}"
        slope = _x(shape.power) if weight == 1 else f"{weight!r} * {_x(shape.power)}"
        return [
            f"    e = exp(-{exponent})" if shape.factor == 1 else f"    e = exp(-({exponent}))",
            f"    m = -({slope})" if weight != 1 else f"    m = -{slope}",
            f"    w = m * (m + {float(shape.power - 1)!r})" if shape.power > 1 else "    w = m * m",
        ]
    return [
        f"    y = x - {shape.centre!r}",
        f"    e = exp({-shape.width!r} * y * y)",
        f"    m = {-2 * shape.width!r} * x * y",
        f"    w = m * m + {-2 * shape.width!r} * x * x",
    ]


def _single(place: int, d: int) -> list[str]:
    power = f" * {_x(d)}" if d else ""
    lines = [f"    e *= {_name(place, d)}{power}", "    a += e"]
    if d == 0:
        return [*lines, "    b += e * m", "    c += e * w"]
    first = f"    b += e * (m + {float(d)!r})"
    if d == 1:
        return [*lines, first, "    c += e * (m + m + w)"]
    return [*lines, first, f"    c += e * ({float(d * (d - 1))!r} + {float(2 * d)!r} * m + w)"]


def _several(place: int, powers: Sequence[int]) -> list[str]:
    return [
        f"    s = {_horner(place, powers, 0)}",
        f"    f = {_horner(place, powers, 1)}",
        f"    g = {_horner(place, powers, 2)}",
        "    a += e * s",
        "    b += e * (f + m * s)",
        "    c += e * (g + (m + m) * f + w * s)",
    ]
