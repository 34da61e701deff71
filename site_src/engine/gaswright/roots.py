"""Find roots of one function inside a bracket, and real roots of a polynomial.

Takes plain functions of one float; gives floats or NoSolutionError. Emitted numeric forms and gaswright.network use it.
"""

import math
from collections.abc import Callable, Sequence
from typing import NamedTuple

from gaswright.errors import NoSolutionError

Function = Callable[[float], float]

STEPS = 200
TIGHT = 4e-16
TINY = 1e-12


class Guess(NamedTuple):
    """A place and the value of the function there."""

    x: float
    y: float


def brent(function: Function, low: float, high: float, at_low: float, at_high: float) -> float:
    """Give the root between ``low`` and ``high``, where the function has opposite signs.

    Brent, Algorithms for Minimization without Derivatives, 1973, chapter 4; the tolerance is the spacing of floats.
    """
    a, b = Guess(low, at_low), Guess(high, at_high)
    c = a
    step = before = b.x - a.x
    for _ in range(STEPS):
        if b.y * c.y > 0:
            c, step, before = a, b.x - a.x, b.x - a.x
        if abs(c.y) < abs(b.y):
            a, b, c = b, c, b
        tolerance = TIGHT * abs(b.x)
        half = (c.x - b.x) / 2
        if abs(half) <= tolerance or b.y == 0:
            return b.x
        step, before = _next_step((a, b, c), half, step, before, tolerance=tolerance)
        a = b
        x = b.x + (step if abs(step) > tolerance else math.copysign(tolerance, half))
        b = Guess(x, function(x))
    return b.x


def _next_step(
    guesses: tuple[Guess, Guess, Guess], half: float, step: float, before: float, *, tolerance: float
) -> tuple[float, float]:
    """Interpolate where that is safe, else halve; give the step and the one before it."""
    a, b, c = guesses
    if abs(before) < tolerance or abs(a.y) <= abs(b.y):
        return half, half
    above, below = _interpolated(a, b, c, half)
    if above > 0:
        below = -below
    above = abs(above)
    if 2 * above < min(3 * half * below - abs(tolerance * below), abs(before * below)):
        return above / below, step
    return half, half


def _interpolated(a: Guess, b: Guess, c: Guess, half: float) -> tuple[float, float]:
    """Give the step as a quotient: by the secant through two points or the inverse parabola through three."""
    ratio = b.y / a.y
    if a.x == c.x:
        return 2 * half * ratio, 1 - ratio
    q, r = a.y / c.y, b.y / c.y
    return ratio * (2 * half * q * (q - r) - (b.x - a.x) * (r - 1)), (q - 1) * (r - 1) * (ratio - 1)


def find_root(function: Function, low: float, high: float, where: str) -> float:
    """Give the one root of a function that only rises or only falls between ``low`` and ``high``, or 0.

    Where ``low`` is above zero it is sought by ratio, else by difference. Raises NoSolutionError where the function
    has one sign over the whole range.
    """
    if low < 0:
        return _find_by_difference(function, low, high, where)

    def along(logarithm: float) -> float:
        return function(math.exp(logarithm))

    start, end = math.log(low), math.log(high)
    at_start, at_end = along(start), along(end)
    if at_start == 0:
        return low
    if at_end == 0:
        return high
    if (at_start > 0) == (at_end > 0):
        if _heads_for_zero(function, at_start):
            return 0.0
        raise _none_between(low, high, where)
    return _polished(function, math.exp(brent(along, start, end, at_start, at_end)), low, high)


def _none_between(low: float, high: float, where: str) -> NoSolutionError:
    return NoSolutionError(
        where,
        f"no value between {low:g} and {high:g} (SI) that agrees with the readings",
        "readings that one value in that range can explain",
        "Check the readings and their units.",
    )


def _find_by_difference(function: Function, low: float, high: float, where: str) -> float:
    """Give the root over a range that reaches below zero.

    At zero itself the function may be undefined, and from some place outwards, too: the range is cut there.
    """
    least = (high - low) * TINY

    def away(x: float) -> float:
        return function(x if abs(x) >= least else math.copysign(least, x))

    start, end = _edge(away, low, -least), _edge(away, high, least)
    at_start, at_end = away(start), away(end)
    if (at_start > 0) == (at_end > 0) and at_start and at_end:
        raise _none_between(low, high, where)
    return brent(away, start, end, at_start, at_end)


def _edge(function: Function, outer: float, inner: float) -> float:
    """Give the place nearest to ``outer`` where the function is defined, seen from ``inner``."""
    if _is_defined(function, outer):
        return outer
    for _ in range(STEPS):
        middle = (outer + inner) / 2
        if middle in (outer, inner):
            break
        if _is_defined(function, middle):
            inner = middle
        else:
            outer = middle
    return inner


def _is_defined(function: Function, x: float) -> bool:
    try:
        value = function(x)
    except (ArithmeticError, ValueError):
        return False
    return not isinstance(value, complex) and math.isfinite(value)


def find_root_beside(  # noqa: PLR0913 - a function, where it turns, and a range
    function: Function, turn: Callable[[], float], low: float, high: float, where: str, *, is_above: bool
) -> float:
    """Give the root above or below the point where the function turns; ``turn`` gives that point.

    A point that cannot be worked out, or lies outside the range, leaves one side: the whole range.
    Raises NoSolutionError where that side has none.
    """
    try:
        at = min(max(turn(), low), high)
    except (ArithmeticError, ValueError):
        at = low
    start, end = (at, high) if is_above else (low, at)
    if not start < end:
        raise _none_between(start, end, where)
    return find_root(function, start, end, where)


def _heads_for_zero(function: Function, at_low: float) -> bool:
    """Say whether the function, followed down from its low end, comes to nothing at zero."""
    try:
        at_zero = function(0.0)
    except (ArithmeticError, ValueError):
        return False
    return abs(at_zero) <= abs(at_low) / 2


def _polished(function: Function, near: float, low: float, high: float) -> float:
    """Refine a root found on a logarithmic scale to the spacing of floats."""
    width = near * 1e-12
    below, above = max(low, near - width), min(high, near + width)
    at_below, at_above = function(below), function(above)
    if at_below * at_above < 0:
        return brent(function, below, above, at_below, at_above)
    return near


def sign_changes(
    function: Callable[[float], float | None], places: Sequence[float]
) -> list[tuple[float, float, float, float]]:
    """Give each pair of neighbouring ``places`` between which the function changes sign, with its values there.

    A place where the function is not defined (None) ends a stretch and starts another.
    """
    found: list[tuple[float, float, float, float]] = []
    last: tuple[float, float] | None = None
    for place in places:
        value = function(place)
        if value is None:
            last = None
            continue
        if value == 0:
            found.append((place, place, 0.0, 0.0))
            last = None
            continue
        if last is not None and (last[1] > 0) != (value > 0):
            found.append((last[0], place, last[1], value))
        last = (place, value)
    return found


def polynomial_roots(coefficients: Sequence[float], low: float, high: float) -> list[float]:
    """Give every real root of a polynomial (highest power first) between ``low`` and ``high``, in rising order.

    Between two neighbouring roots of the derivative the polynomial only rises or only falls, so each stretch holds
    one root at most; the roots of the derivative are found the same way.
    """
    while coefficients and coefficients[0] == 0:
        coefficients = coefficients[1:]
    degree = len(coefficients) - 1
    if degree < 1:
        return []
    slope = [part * (degree - place) for place, part in enumerate(coefficients[:-1])]
    edges = [low, *polynomial_roots(slope, low, high), high]

    def value(x: float) -> float:
        total = 0.0
        for part in coefficients:
            total = total * x + part
        return total

    brackets = sign_changes(value, edges)
    return [
        left if left == right else brent(value, left, right, at_left, at_right)
        for left, right, at_left, at_right in brackets
    ]


def polynomial_root(coefficients: Sequence[float], low: float, high: float, root: str, where: str) -> float:
    """Give the ``largest`` or ``smallest`` real root in the range, or raise NoSolutionError."""
    found = polynomial_roots(coefficients, low, high)
    if not found:
        raise NoSolutionError(
            where,
            f"no real root between {low:g} and {high:g} (SI)",
            "readings that a state of the gas can have",
            "Check the readings and their units.",
        )
    return found[-1] if root == "largest" else found[0]
