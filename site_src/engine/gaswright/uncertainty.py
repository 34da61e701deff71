"""Combine the uncertainties of readings into that of a figure.

Takes how the figure moves with each reading, and the readings; gives the standard and expanded uncertainty and who
contributes what (JCGM 100:2008, 5.1.2, 5.2.2, G.4). gaswright.law and gaswright.sheet come next.
"""

import math
from collections.abc import Sequence
from typing import NamedTuple

from gaswright import student
from gaswright.errors import NoSolutionError
from gaswright.reading import Reading

NEAR = 0.1


class Share(NamedTuple):
    """What one reading, or one shared instrument, contributes: its part of u², and how far its u moves the figure."""

    label: str
    fraction: float
    moves: float


class Combined(NamedTuple):
    """The standard uncertainty ``u``, freedom, factor k and U = k·u (SI), shares, and what sharing was assumed."""

    u: float
    freedom: float
    k: float
    expanded: float
    shares: tuple[Share, ...]
    shared: tuple[str, ...]
    other_u: float


def combine(gradient: Sequence[float], readings: Sequence[Reading]) -> Combined:
    """Combine; readings by one instrument within a tenth of its span share its systematic part fully.

    ``other_u`` is what the other assumption would give: none shared where some were, all shared where none were.
    """
    groups = _groups(readings)
    parts = [_part(group, gradient, readings) for group in groups]
    total = sum(parts)
    if not math.isfinite(total):
        raise NoSolutionError(
            "Uncertainty",
            "no finite size",
            "readings on which the figure depends smoothly",
            "Check the readings.",
        )
    u = math.sqrt(total)
    freedom = _freedom(u, gradient, readings)
    k = student.factor(freedom)
    shares = sorted(
        (
            Share(_label([readings[place] for place in group]), part / total if total else 0.0, math.sqrt(part))
            for group, part in zip(groups, parts, strict=True)
            if part > 0
        ),
        key=lambda share: -share.fraction,
    )
    shared = tuple(readings[group[0]].instrument for group in groups if len(group) > 1)
    return Combined(u, freedom, k, k * u, tuple(shares), shared, math.sqrt(_other(shared, gradient, readings)))


def _groups(readings: Sequence[Reading]) -> list[list[int]]:
    """Put together the readings that share their instrument's error: all within a tenth of the span of one another."""
    groups: list[list[int]] = []
    for place in sorted(range(len(readings)), key=lambda at: _on_scale(readings[at])):
        reading = readings[place]
        for group in groups:
            if _shares(readings[group[0]], reading):
                group.append(place)
                break
        else:
            groups.append([place])
    return [sorted(group) for group in sorted(groups, key=min)]


def _on_scale(reading: Reading) -> float:
    return -reading.value if reading.reference == "vacuum" else reading.value


def _shares(lowest: Reading, reading: Reading) -> bool:
    """Say whether two readings count as equally wrong; where the span is not known, only equal readings do."""
    if not lowest.instrument or lowest.instrument != reading.instrument:
        return False
    return _on_scale(reading) - _on_scale(lowest) <= NEAR * lowest.span * (1 + 1e-9)


def _part(group: Sequence[int], gradient: Sequence[float], readings: Sequence[Reading]) -> float:
    together = sum(gradient[place] * readings[place].u_systematic for place in group) ** 2
    alone = sum((gradient[place] * readings[place].u_random) ** 2 for place in group)
    return together + alone


def _other(shared: tuple[str, ...], gradient: Sequence[float], readings: Sequence[Reading]) -> float:
    if shared:
        return sum((slope * reading.u) ** 2 for slope, reading in zip(gradient, readings, strict=True))
    by_name: dict[str, list[int]] = {}
    for place, reading in enumerate(readings):
        by_name.setdefault(reading.instrument or f"#{place}", []).append(place)
    return sum(_part(group, gradient, readings) for group in by_name.values())


def _freedom(u: float, gradient: Sequence[float], readings: Sequence[Reading]) -> float:
    """Welch and Satterthwaite (JCGM 100:2008, G.2b)."""
    below = sum(
        (slope * reading.u) ** 4 / reading.freedom
        for slope, reading in zip(gradient, readings, strict=True)
        if math.isfinite(reading.freedom)
    )
    return u**4 / below if below else math.inf


def _label(group: Sequence[Reading]) -> str:
    names = " and ".join(reading.name for reading in group)
    return f"{names}, {group[0].instrument}" if group[0].instrument else names
