"""Take the route through a sheet and find how the answer moves with each reading.

Takes a Sheet, SI values of its readings and a gas; gives every row's SI value and exact sensitivities. The sheet's
relations are used as they stand; nothing is restated. Next: gaswright.sheet makes a figure of it.
"""

import math
from collections.abc import Callable
from typing import TYPE_CHECKING, NamedTuple

from gaswright.errors import NoSolutionError, OutsideRangeError
from gaswright.evaluate import check_validity, evaluate, residual
from gaswright.evaluate import slopes as slopes_of
from gaswright.find import relation as find_relation
from gaswright.linear import solve_linear
from gaswright.model import Block, Find, Relation, Sheet, Step
from gaswright.roots import brent, sign_changes

if TYPE_CHECKING:
    from gaswright.gas.real import Gas

PLACES = 64
EDGE_STEPS = 40


class Slopes(NamedTuple):
    """How the row found moves: by each reading, and by a relative error of the gas equation in each use."""

    by_row: dict[str, float]
    by_equation: dict[int, float]


def travel(sheet: Sheet, find: Find, given: dict[str, float], gas: "Gas") -> dict[str, float]:
    """Give the SI value of every row. Raises NoSolutionError or OutsideRangeError where no single answer exists."""
    values = dict(given)
    for part in find.route:
        if isinstance(part, Step):
            _take(sheet, part, values, gas)
        else:
            _untie(sheet, part, values, gas)
    return values


def _take(sheet: Sheet, step: Step, values: dict[str, float], gas: "Gas") -> None:
    use = sheet.uses[step.use]
    relation = find_relation(use.relation)
    inputs = {name: values[row] for name, row in use.rows.items() if name != step.unknown and row in values}
    title = sheet.rows[step.row].title
    check_validity(relation, inputs, title)
    values[step.row] = evaluate(relation, step.unknown, inputs, gas, title)
    check_validity(relation, {**inputs, step.unknown: values[step.row]}, title)


def said_outside(sheet: Sheet, values: dict[str, float]) -> tuple[str, ...]:
    """Give what the relations of a sheet say outside the bounds they are trusted in, each once."""
    said: dict[str, None] = {}
    for use in sheet.uses:
        own = {name: values[row] for name, row in use.rows.items() if row in values}
        relation = find_relation(use.relation)
        said |= dict.fromkeys(check_validity(relation, own, relation.title))
    return tuple(said)


def _residual(sheet: Sheet, block: Block, values: dict[str, float], gas: "Gas") -> float:
    use = sheet.uses[block.use]
    relation = find_relation(use.relation)
    return residual(relation, _arguments(relation, use.rows, values, gas), sheet.rows[block.torn].title)


def _arguments(relation: Relation, rows: dict[str, str], values: dict[str, float], gas: "Gas") -> "list[float | Gas]":
    return [gas if name == "gas" else values[rows[name]] for name in relation.arguments]


def _untie(sheet: Sheet, block: Block, values: dict[str, float], gas: "Gas") -> None:
    row = sheet.rows[block.torn]

    def off(guess: float) -> float:
        trial = {**values, block.torn: guess}
        for step in block.steps:
            _take(sheet, step, trial, gas)
        return _residual(sheet, block, trial, gas)

    found = _roots(off, row.low, row.high)
    if len(found) != 1:
        what = "no value" if not found else f"{len(found)} values"
        raise NoSolutionError(
            row.title,
            f"{what} between {row.low:g} and {row.high:g} (SI) in agreement with the readings",
            "readings that exactly one value explains",
            "Check the readings, or ask for another row.",
        )
    values[block.torn] = found[0]
    for step in block.steps:
        _take(sheet, step, values, gas)


def _roots(function: Callable[[float], float], low: float, high: float) -> list[float]:
    """Give every root between ``low`` and ``high``, also beside a place where the function stops being defined."""

    def defined(x: float) -> float | None:
        try:
            return function(x)
        except (NoSolutionError, OutsideRangeError):
            return None

    places = _places(low, high)
    values = [defined(place) for place in places]
    for at in range(len(places) - 1):
        if (values[at] is None) != (values[at + 1] is None):
            places.append(_edge(defined, places[at], places[at + 1], starts=values[at] is not None))
    return [
        left if left == right else brent(function, left, right, at_left, at_right)
        for left, right, at_left, at_right in sign_changes(defined, sorted(places))
    ]


def _places(low: float, high: float) -> list[float]:
    if low > 0 and high / low > 100:
        ratio = math.log(high / low)
        return [low * math.exp(ratio * step / PLACES) for step in range(PLACES + 1)]
    return [low + (high - low) * step / PLACES for step in range(PLACES + 1)]


def _edge(defined: Callable[[float], float | None], left: float, right: float, *, starts: bool) -> float:
    """Give the last place on the defined side of the edge between ``left`` and ``right``."""
    inside, outside = (left, right) if starts else (right, left)
    for _ in range(EDGE_STEPS):
        middle = (inside + outside) / 2
        if defined(middle) is None:
            outside = middle
        else:
            inside = middle
    return inside


def slopes(sheet: Sheet, find: Find, values: dict[str, float], gas: "Gas") -> Slopes:
    """Give the exact derivative of the row found by every reading, by implicit differentiation of all uses at once.

    Each use says F = 0; with the rows worked out on one side and the readings on the other, one linear system gives
    the weight of every use, and the weights give the derivatives whichever way the route went.
    """
    unknowns = [part.row if isinstance(part, Step) else part.torn for part in find.route]
    unknowns += [step.row for part in find.route if isinstance(part, Block) for step in part.steps]
    table = [_row_slopes(sheet, place, values, gas) for place in range(len(sheet.uses))]
    transposed = [[line.get(row, 0.0) for line in table] for row in unknowns]
    target = [1.0 if row == find.row else 0.0 for row in unknowns]
    weights = solve_linear(transposed, target, sheet.rows[find.row].title)
    by_row: dict[str, float] = {}
    by_equation: dict[int, float] = {}
    for place, (line, weight) in enumerate(zip(table, weights, strict=True)):
        for row, slope in line.items():
            if row not in unknowns:
                by_row[row] = by_row.get(row, 0.0) - weight * slope
        if find_relation(sheet.uses[place].relation).uses_gas:
            by_equation[place] = weight * values[sheet.uses[place].rows["rho"]]
    return Slopes(by_row, by_equation)


def _row_slopes(sheet: Sheet, place: int, values: dict[str, float], gas: "Gas") -> dict[str, float]:
    use = sheet.uses[place]
    relation = find_relation(use.relation)
    where = f"{sheet.rows[use.rows[relation.variables[0].name]].title}, by {relation.title}"
    found = slopes_of(relation, _arguments(relation, use.rows, values, gas), where)
    line: dict[str, float] = {}
    for variable, slope in zip(relation.variables, found, strict=True):
        row = use.rows[variable.name]
        line[row] = line.get(row, 0.0) + slope
    return line
