"""Prove solved forms by putting them back.

Takes a relation, an unknown and its form; gives how it was proven or raises SpecError. States are drawn from the
field's range with a fixed seed, so two builds say the same. Next: generator.solve records the proof.
"""

import math
import random
from collections.abc import Callable, Iterator, Mapping
from fractions import Fraction
from typing import Any

import mpmath
import sympy

from generator.check import constants_of, variables_of
from generator.errors import SpecError
from spec.model import Relation, Sign, Split, Variable

State = Mapping[sympy.Symbol, Fraction]
STATES = 12
AGREED = 35
MORE_DIGITS = (50, 500, 10000)
GRID = 24
BESIDE = 1 - 1e-9
NOTHING = 1e-9
USUAL = {
    "absolute_pressure": (1e4, 3e7),
    "gauge_pressure": (-5e4, 3e7),
    "station_pressure": (6e4, 1.1e5),
    "vacuum_pressure": (1e2, 5e4),
    "absolute_temperature": (200.0, 400.0),
    "celsius_temperature": (-60.0, 120.0),
    "compressibility_factor": (0.5, 1.5),
    "molar_mass": (2e-3, 0.15),
    "temperature_constant": (50.0, 300.0),
    "water_temperature": (274.0, 640.0),
    "ice_temperature": (180.0, 273.0),
    "dew_temperature": (200.0, 330.0),
    "vapour_pressure": (1e1, 5e4),
    "vessel_pressure": (2e5, 3e7),
    "fraction": (1e-6, 0.9),
    "heat_ratio": (1.05, 1.67),
    "flow": (1e-4, 1e-2),
    "time": (10.0, 1e4),
    "volume": (1e-2, 1e2),
    "length": (1e-3, 1e2),
    "count": (1.0, 20.0),
    "critical_pressure_ratio": (0.3, 0.6),
    "reynolds_number": (3e3, 1e8),
    "relative_roughness": (1e-6, 0.05),
    "mixing": (0.1, 1.0),
    "pressure_change": (-1e4, 1e4),
    "altitude": (-400.0, 5000.0),
    "small_length": (1e-10, 1e-7),
    "molecule_mass": (3e-27, 3e-25),
    "molecule_energy": (1e-21, 1e-19),
    "specific_energy": (1e6, 1e7),
    "pressure_squared": (1e6, 1e14),
    "friction_factor": (8e-3, 0.1),
    "expansion": (1e-6, 1e-3),
    "second_virial": (-5e-4, 5e-5),
    "lapse_rate": (-1e-2, 1e-2),
    "gas_molar_volume": (1e-3, 1e-1),
    "critical_pressure": (1e6, 1e7),
    "critical_temperature": (50.0, 600.0),
    "acentric_factor": (-0.2, 0.6),
    "molecular_speed": (50.0, 2000.0),
    "subsonic_ratio": (0.3, 0.999),
    "isentropic_exponent": (1.05, 1.67),
    "choice": (0.0, 2.99),
    "plate_bore": (0.03, 0.06),
    "pipe_bore": (0.1, 0.3),
    "choked_factor": (0.6, 0.75),
    "latitude": (0.01, 1.5),
    "height": (1.0, 3e4),
    "lift": (-1e3, 1e3),
    "work": (-1e5, 1e5),
    "factor": (0.5, 4.0),
    "specific_gas_constant": (100.0, 5000.0),
    "knudsen_number": (1e-3, 1e3),
    "viscosity": (5e-6, 4e-5),
}


def usual_range(variable: Variable) -> tuple[float, float]:
    """Give the range a state is drawn from, inside the kind's range (SI)."""
    kind = variable.kind
    low, high = USUAL.get(kind.key, (max(kind.low, 1e-4), min(kind.high, 1e4)))
    return max(low, kind.low), min(high, kind.high)


def states(relation: Relation, count: int) -> Iterator[State]:
    """Draw ``count`` states of all variables, with the constants."""
    source = random.Random(relation.key)  # noqa: S311 - sampling, not secrecy; seeded so that builds repeat
    fixed = {symbol: constant.value for symbol, constant in constants_of(relation).items()}
    for _ in range(count):
        yield {
            **fixed,
            **{symbol: Fraction(_draw(source, variable)) for symbol, variable in variables_of(relation).items()},
        }


def _draw(source: random.Random, variable: Variable) -> float:
    low, high = usual_range(variable)
    if low <= 0 or variable.sign is Sign.ANY:
        return source.uniform(low, high)
    return math.exp(source.uniform(math.log(low), math.log(high)))


def prove_closed(relation: Relation, unknown: sympy.Symbol, form: sympy.Expr, residual: sympy.Expr) -> str:
    """Put ``form`` back into ``residual``: identically zero, or zero to 35 digits over sampled states.

    A quotient of polynomials is cancelled, which decides it; roots and powers are left to the sampled states.
    """
    put_back = residual.subs(unknown, form.doit())
    if put_back == 0 or (put_back.is_rational_function() and sympy.cancel(put_back) == 0):
        return "put back: identically zero"
    symbols = tuple(relation.where)
    solved = _compiled(symbols, form)
    sides = _compiled(symbols, relation.left), _compiled(symbols, relation.right)
    refusals = [_compiled(symbols, validity.holds) for validity in relation.valid if validity.refuse]
    sampled = 0
    for state in states(relation, STATES * 3):
        apart = _miss(symbols, {**state}, unknown, (solved, *sides), refusals)
        if apart is None:
            continue
        if apart:
            raise SpecError(
                where=f"relation {relation.key}, unknown {unknown}",
                found=f"a form that misses by {mpmath.nstr(apart, 3)}",
                expected="a residual of zero when it is put back",
                todo="correct the branch or the equation",
            )
        sampled += 1
    if not sampled:
        raise SpecError(
            where=f"relation {relation.key}, unknown {unknown}",
            found="no sampled state that gives a real value",
            expected="at least one state of the field's range",
            todo="widen the ranges or name a branch",
        )
    return f"put back: zero to 35 digits at {sampled} states"


def _compiled(symbols: tuple[sympy.Symbol, ...], expression: sympy.Basic) -> Callable[..., Any]:
    compiled: Callable[..., Any] = sympy.lambdify(symbols, expression, "mpmath")
    return compiled


def _miss(
    symbols: tuple[sympy.Symbol, ...],
    state: State,
    unknown: sympy.Symbol,
    functions: tuple[Callable[..., Any], ...],
    refusals: list[Callable[..., Any]],
) -> mpmath.mpf | None:
    """Give how far the sides stay apart, zero where they agree to 35 digits, None outside the relation.

    Terms that nearly cancel use digits up, so a miss is looked at again with more of them.
    """
    apart: mpmath.mpf | None = None
    for digits in MORE_DIGITS:
        with mpmath.workdps(digits):
            try:
                apart = _apart(symbols, state, unknown, functions, refusals)
            except ZeroDivisionError:  # two values too close for so many digits
                continue
        if not apart:
            break
    return apart


def _apart(
    symbols: tuple[sympy.Symbol, ...],
    state: State,
    unknown: sympy.Symbol,
    functions: tuple[Callable[..., Any], ...],
    refusals: list[Callable[..., Any]],
) -> mpmath.mpf | None:
    """Give the same at the digits that mpmath works with now."""
    solved, left, right = functions
    exact = {symbol: mpmath.mpf(value.numerator) / value.denominator for symbol, value in state.items()}
    found = _real(solved(*(exact[symbol] for symbol in symbols)))
    if found is None or (unknown.is_positive and found <= 0) or (unknown.is_nonnegative and found < 0):
        return None
    exact[unknown] = found
    values = [exact[symbol] for symbol in symbols]
    if not all(holds(*values) for holds in refusals):
        return None
    one, other = left(*values), right(*values)
    return (
        mpmath.mpf(0) if abs(one - other) <= mpmath.mpf(10) ** -AGREED * max(abs(one), abs(other)) else abs(one - other)
    )


def _real(value: Any) -> mpmath.mpf | None:
    """Give a value of mpmath as a real number, None where it is not one."""
    if isinstance(value, mpmath.mpc):
        return None if value.imag else value.real
    return mpmath.mpf(value) if mpmath.isfinite(value) else None


def is_monotonic(relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr) -> bool:
    """Tell whether ``residual`` only rises or only falls with ``unknown`` over the kind's range, at sampled states."""
    places = _places(*range_of(relation, unknown))
    slope = _slope_along(relation, unknown, residual)
    return all(_has_one_sign(slope, rest, places) for rest in _states_inside(relation, unknown))


def is_monotonic_beside(relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr, split: Split) -> bool:
    """Tell the same of each named side of a turning point."""
    slope = _slope_along(relation, unknown, residual)
    turn_at = _along(relation, unknown, split.at)
    low, high = range_of(relation, unknown)
    for rest in _states_inside(relation, unknown):
        try:
            turn = min(max(float(turn_at(1.0, *rest)), low), high)
        except (ArithmeticError, ValueError):
            turn = low
        sides = [(low, turn * BESIDE)] if split.below and turn > low else []
        sides += [(turn / BESIDE, high)] if split.above and turn < high else []
        if not all(_has_one_sign(slope, rest, _places(*side)) for side in sides):
            return False
    return True


def _along(relation: Relation, unknown: sympy.Symbol, expression: sympy.Expr) -> Callable[..., Any]:
    """Give a plain function of the unknown first and the other symbols after it."""
    others = [symbol for symbol in relation.where if symbol != unknown]
    along: Callable[..., Any] = sympy.lambdify([unknown, *others], expression, ["math", {"Abs": abs}])
    return along


def _slope_along(relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr) -> Callable[..., Any]:
    return _along(relation, unknown, sympy.diff(residual, unknown).doit())


def _states_inside(relation: Relation, unknown: sympy.Symbol) -> Iterator[tuple[float, ...]]:
    """Give the other symbols of sampled states that the relation does not refuse whatever the unknown is."""
    others = [symbol for symbol in relation.where if symbol != unknown]
    refusals = [
        sympy.lambdify(others, validity.holds, ["math", {"Abs": abs}])
        for validity in relation.valid
        if validity.refuse and not validity.holds.has(unknown)
    ]
    for state in states(relation, STATES * 2):
        rest = tuple(float(state[symbol]) for symbol in others)
        if all(holds(*rest) for holds in refusals):
            yield rest


def range_of(relation: Relation, unknown: sympy.Symbol) -> tuple[float, float]:
    """Give the range in which an unknown is sought (SI)."""
    kind = variables_of(relation)[unknown].kind
    return (kind.low if kind.low < 0 else max(kind.low, 1e-12)), kind.high


def _places(low: float, high: float) -> list[float]:
    """Give places over a range, evenly by ratio, or by difference where it reaches below zero; none of them zero."""
    if low < 0:
        places = [low + (high - low) * step / GRID for step in range(GRID + 1)]
        return [place for place in places if abs(place) > (high - low) * NOTHING]
    return [low * (high / low) ** (step / GRID) for step in range(GRID + 1)]


def _has_one_sign(slope: Callable[..., Any], rest: tuple[float, ...], places: list[float]) -> bool:
    signs = set()
    for place in places:
        try:
            value = slope(place, *rest)
        except (ArithmeticError, ValueError):  # outside what the relation covers
            continue
        if isinstance(value, complex) or not math.isfinite(value):
            continue
        if value:
            signs.add(math.copysign(1.0, value))
    return len(signs) <= 1
