"""Random states of every law: its worked example with each reading moved by up to a factor of two, temperatures less.

Takes a law and a seed; gives SI values that satisfy it, with the gas where it uses one.
"""

import math
from collections.abc import Iterator
from random import Random
from typing import Any, NamedTuple

from gaswright import any_kind, terms
from gaswright import find as finder
from gaswright.errors import NoSolutionError, OutsideRangeError
from gaswright.evaluate import check_validity, evaluate, slopes
from gaswright.gas import Gas, find
from gaswright.law import read_variable
from gaswright.laws.index import FAMILY_OF
from gaswright.model import Relation
from gaswright.tables import KINDS

LAWS = {
    key: any_kind.settled(law, law.example)
    for key, law in ((key, terms.as_shown(finder.relation(key))) for key in FAMILY_OF)
}
PAIRS = [(key, unknown) for key, law in LAWS.items() for unknown in law.forms]
GASES = ("nitrogen", "oxygen", "argon", "helium", "methane")
TRIES = 40
WARMER = 1.2
NEAR_ZERO = 1e-3


class State(NamedTuple):
    """SI values of every variable of a law, and the gas."""

    values: dict[str, float]
    gas: Gas | None


def first_unknown(relation: Relation) -> str:
    """Give the variable that the worked example asks for."""
    given = {*relation.example, *(each.name for each in relation.variables if each.default is not None)}
    return next(name for name in relation.forms if name not in given)


def example(relation: Relation) -> dict[str, float]:
    """Give the worked example in SI, without the variable asked for."""
    unknown = first_unknown(relation)
    return {
        each.name: read_variable(each, relation.example.get(each.name, each.default or 0.0), None, None).value
        for each in relation.variables
        if each.name != unknown
    }


def _moved(random: Random, value: float, spread: float) -> float:
    """Give ``value`` times at most exp(spread) either way; a value that is nothing becomes a little."""
    return value * math.exp(random.uniform(-spread, spread)) if value else spread * random.uniform(0, NEAR_ZERO)


def _shared_out(relation: Relation, values: dict[str, float], base: dict[str, float]) -> dict[str, float]:
    """Scale each list of shares whose example sums to 1 so that the moved one does, too."""
    for name in {terms.list_of(each.name) for each in relation.variables if each.kind == "fraction"}:
        shares = [key for key in base if key.startswith(f"{name}_") and name != key]
        if shares and abs(sum(base[key] for key in shares) - 1) <= NEAR_ZERO:
            whole = sum(values[key] for key in shares)
            values |= {key: values[key] / whole for key in shares}
    return values


def _is_readable(relation: Relation, values: dict[str, float]) -> bool:
    """Say whether every value is one that could be typed: inside the range of its kind."""
    kinds = ((KINDS[each.kind], values[each.name]) for each in relation.variables)
    return all(kind.low <= value <= kind.high or value == 0 for kind, value in kinds)


def states(relation: Relation, count: int, seed: str) -> Iterator[State]:
    """Yield up to ``count`` states inside the law's validity; the example itself comes first."""
    random = Random(f"{seed} {relation.key}")  # noqa: S311 - the same states each time, no secret
    unknown, base = first_unknown(relation), example(relation)
    spans = {each.name: WARMER if KINDS[each.kind].si == "K" else 2.0 for each in relation.variables}
    found = 0
    for turn in range(count * TRIES):
        spread = 0.0 if turn == 0 else 1.0
        values = {name: _moved(random, value, spread * math.log(spans[name])) for name, value in base.items()}
        values = _shared_out(relation, values, base)
        values |= {each.name: base[each.name] for each in relation.variables if each.choices}
        gas = find(random.choice(GASES)) if relation.uses_gas else None
        try:
            values[unknown] = evaluate(relation, unknown, values, gas, "state")
            warned = check_validity(relation, values, "state")
        except (NoSolutionError, OutsideRangeError):
            continue
        if warned or not _is_readable(relation, values):
            continue
        yield State(values, gas)
        found += 1
        if found == count:
            return


def arguments(relation: Relation, state: State) -> list[Any]:
    """Give the arguments of the law's residual and slopes."""
    return [state.gas if name == "gas" else state.values[name] for name in relation.arguments]


def weights(relation: Relation, state: State, sizes: dict[str, float] | None = None) -> dict[str, float]:
    """Give how much of left - right each variable carries: its slope times its value, or its size where given."""
    found = slopes(relation, arguments(relation, state), "state")
    sizes = sizes or state.values
    return {each.name: abs(slope * sizes[each.name]) for each, slope in zip(relation.variables, found, strict=True)}


def nearest(relation: Relation, unknown: str, state: State, wanted: float) -> float:
    """Solve for an unknown; where two values fit, each side is asked for and the nearer one given."""
    found = []
    for side in relation.forms[unknown].sides or ("",):
        try:
            found.append(evaluate(relation, unknown, state.values, state.gas, relation.key, side))
        except NoSolutionError:
            if not side:
                raise
    return min(found, key=lambda value: abs(value - wanted))
