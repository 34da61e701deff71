"""Find roots of one function inside a bracket, and real roots of a polynomial.

Takes plain functions of one float; gives floats or NoSolutionError. Emitted numeric forms and gaswright.network use it.
"""

import math
from collections.abc import Callable, Sequence

from gaswright.errors import NoSolutionError

Function = Callable[[float], float]

STEPS = 200
TIGHT = 4e-16


def brent(function: Function, low: float, high: float, at_low: float, at_high: float) -> float:
    """Give the root between ``low`` and ``high``, where the function has opposite signs.

    Brent, Algorithms for Minimization without Derivatives, 1973, chapter 4; the tolerance is the spacing of floats.
    """
    a, b, f_a, f_b = low, high, at_low, at_high
    c, f_c = a, f_a
    step = before = b - a
    for _ in range(STEPS):
        if f_b * f_c > 0:
            c, f_c, step, before = a, f_a, b - a, b - a
        if abs(f_c) < abs(f_b):
            a, b, c, f_a, f_b, f_c = b, c, b, f_b, f_c, f_b
        tolerance = TIGHT * abs(b)
        half = (c - b) / 2
        if abs(half) <= tolerance or f_b == 0:
            return b
        step, before = _next_step(a, b, c, f_a, f_b, f_c, half, step, before, tolerance)
        a, f_a = b, f_b
        b += step if abs(step) > tolerance else math.copysign(tolerance, half)
        f_b = function(b)
    return b


def _next_step(  # noqa: PLR0913 - the state of Brent's iteration
    a: float, b: float, c: float, f_a: float, f_b: float, f_c: float,
    half: float, step: float, before: float, tolerance: float,
) -> tuple[float, float]:
    if abs(before) < tolerance or abs(f_a) <= abs(f_b):
        return half, half
    ratio = f_b / f_a
    if a == c:
        above, below = 2 * half * ratio, 1 - ratio
    else:
        q, r = f_a / f_c, f_b / f_c
        above = ratio * (2 * half * q * (q - r) - (b - a) * (r - 1))
        below = (q - 1) * (r - 1) * (ratio - 1)
    if above > 0:
        below = -below
    above = abs(above)
    if 2 * above < min(3 * half * below - abs(tolerance * below), abs(before * below)):
        return above / below, step
    return half, half


def find_root(function: Function, low: float, high: float, where: str) -> float:
    """Give the one root of a function that only rises or only falls between ``low`` and ``high`` (both positive).

    Raises NoSolutionError where the function has one sign over the whole range.
    """
    def along(logarithm: float) -> float:
        return function(math.exp(logarithm))

    start, end = math.log(low), math.log(high)
    at_start, at_end = along(start), along(end)
    if at_start == 0:
        return low
    if at_end == 0:
        return high
    if (at_start > 0) == (at_end > 0):
        raise NoSolutionError(
            where, f"no value between {low:g} and {high:g} (SI) that agrees with the readings",
            "readings that one value in that range can explain", "Check the readings and their units.",
        )
    return _polished(function, math.exp(brent(along, start, end, at_start, at_end)), low, high)


def _polished(function: Function, near: float, low: float, high: float) -> float:
    """Refine a root found on a logarithmic scale to the spacing of floats."""
    width = near * 1e-12
    below, above = max(low, near - width), min(high, near + width)
    at_below, at_above = function(below), function(above)
    if at_below * at_above < 0:
        return brent(function, below, above, at_below, at_above)
    return near


def sign_changes(function: Callable[[float], float | None], places: Sequence[float]) -> list[tuple[float, float, float, float]]:
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
    return [left if left == right else brent(value, left, right, at_left, at_right)
            for left, right, at_left, at_right in brackets]


def polynomial_root(coefficients: Sequence[float], low: float, high: float, root: str, where: str) -> float:
    """Give the ``largest`` or ``smallest`` real root in the range, or raise NoSolutionError."""
    found = polynomial_roots(coefficients, low, high)
    if not found:
        raise NoSolutionError(
            where, f"no real root between {low:g} and {high:g} (SI)", "readings that a state of the gas can have",
            "Check the readings and their units.",
        )
    return found[-1] if root == "largest" else found[0]
