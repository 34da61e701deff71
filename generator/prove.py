"""Prove solved forms by putting them back.

Takes a relation, an unknown and its form; gives how it was proven or raises SpecError. States are drawn from the
field's range with a fixed seed, so two builds say the same. Next: generator.solve records the proof.
"""

import math
import random
from collections.abc import Iterator

import sympy

from generator.check import constants_of, variables_of
from generator.errors import SpecError
from spec.model import Relation, Sign, Variable

STATES = 12
DIGITS = 50
MORE_DIGITS = (50, 500, 10000)
GRID = 24
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
    "viscosity": (5e-6, 4e-5),
}


def usual_range(variable: Variable) -> tuple[float, float]:
    """Give the range a state is drawn from, inside the kind's range (SI)."""
    kind = variable.kind
    low, high = USUAL.get(kind.key, (max(kind.low, 1e-4), min(kind.high, 1e4)))
    return max(low, kind.low), min(high, kind.high)


def states(relation: Relation, count: int) -> Iterator[dict[sympy.Symbol, sympy.Float]]:
    """Draw ``count`` states of all variables, with the constants, at 50 digits."""
    source = random.Random(relation.key)  # noqa: S311 - sampling, not secrecy; seeded so that builds repeat
    fixed = {
        symbol: sympy.Rational(constant.value.numerator, constant.value.denominator)
        for symbol, constant in constants_of(relation).items()
    }
    for _ in range(count):
        state = {
            symbol: sympy.Float(_draw(source, variable), DIGITS) for symbol, variable in variables_of(relation).items()
        }
        yield {**fixed, **state}


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
    is_identity = bool(put_back.is_rational_function()) and sympy.cancel(put_back) == 0
    sampled = 0
    for state in states(relation, STATES * 3):
        found = sympy.N(form.subs(state).doit(), DIGITS)
        if not found.is_real or (unknown.is_positive and found <= 0) or (unknown.is_nonnegative and found < 0):
            continue
        miss = _miss(relation, unknown, form, state)
        if miss:
            raise SpecError(
                where=f"relation {relation.key}, unknown {unknown}",
                found=f"a form that misses by {miss}",
                expected="a residual of zero when it is put back",
                todo="correct the branch or the equation",
            )
        sampled += 1
    if not sampled and not is_identity:
        raise SpecError(
            where=f"relation {relation.key}, unknown {unknown}",
            found="no sampled state that gives a real value",
            expected="at least one state of the field's range",
            todo="widen the ranges or name a branch",
        )
    return "put back: identically zero" if is_identity else f"put back: zero to 35 digits at {sampled} states"


def _miss(
    relation: Relation, unknown: sympy.Symbol, form: sympy.Expr, state: dict[sympy.Symbol, sympy.Expr]
) -> sympy.Expr:
    """Give how far the sides stay apart, or zero where they agree to 35 digits.

    Terms that nearly cancel use digits up, so a miss is looked at again with more of them.
    """
    apart = sympy.S.Zero
    for digits in MORE_DIGITS:
        exact = {
            symbol: sympy.Float(float(value), digits) if value.is_Float else value for symbol, value in state.items()
        }
        exact[unknown] = sympy.N(form.subs(exact).doit(), digits)
        left, right = (sympy.N(side.subs(exact).doit(), digits) for side in (relation.left, relation.right))
        apart = abs(left - right)
        if apart <= sympy.Float("1e-35", DIGITS) * max(abs(left), abs(right)):
            return sympy.S.Zero
    return apart


def is_monotonic(relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr) -> bool:
    """Tell whether ``residual`` only rises or only falls with ``unknown`` over the kind's range, at sampled states."""
    slope = sympy.diff(residual, unknown)
    kind = variables_of(relation)[unknown].kind
    low, high = max(kind.low, 1e-12), kind.high
    places = [low * (high / low) ** (step / GRID) for step in range(GRID + 1)]
    for state in states(relation, STATES):
        rest = {symbol: float(value) for symbol, value in state.items() if symbol != unknown}
        along = sympy.lambdify(unknown, slope.subs(rest), "math")
        signs = {math.copysign(1.0, value) for value in map(along, places) if value}
        if len(signs) > 1:
            return False
    return True
