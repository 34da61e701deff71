"""Write a relation over lists of any length out for a number of terms, and single one term out.

Takes a Relation whose ``Total`` sums over lists; gives plain relations, expressions with the term in question apart
from the others, and derivatives by a term. Next: generator.solve solves and proves with them.
"""

from collections.abc import Mapping
from dataclasses import dataclass, replace

import sympy

from generator.check import variables_of
from spec.model import Relation
from spec.symbols import Others, Total, is_list

PROVEN_TERMS = 3


@dataclass(frozen=True, slots=True, kw_only=True)
class Singled:
    """Both sides with one term singled out; ``rests`` are the sums over the others, by the symbol in their place."""

    left: sympy.Expr
    right: sympy.Expr
    rests: Mapping[sympy.Symbol, sympy.Expr]


def lists_of(relation: Relation) -> tuple[sympy.Symbol, ...]:
    """Give the lists of a relation, in textbook order."""
    return tuple(symbol for symbol in variables_of(relation) if is_list(symbol))


def is_per_term(relation: Relation) -> bool:
    """Tell whether a relation speaks of one term beside the sums, as the share of one component does."""
    sides = (relation.left, relation.right)
    hidden = {total: sympy.Dummy() for side in sides for total in side.atoms(Total)}
    outside = {symbol for side in sides for symbol in side.xreplace(hidden).free_symbols}
    return any(symbol in outside for symbol in lists_of(relation))


def single_out(left: sympy.Expr, right: sympy.Expr, unknown: sympy.Symbol) -> Singled:
    """Part each sum over ``unknown`` into its own term and a symbol for the sum over the others."""
    totals = sorted(
        (total for total in left.atoms(Total) | right.atoms(Total) if is_list(unknown) and total.has(unknown)), key=str
    )
    rests = {total: sympy.Symbol(f"others_{place}", nonnegative=True) for place, total in enumerate(totals)}
    parted = {total: total.args[0] + rest for total, rest in rests.items()}
    return Singled(
        left=left.xreplace(parted),
        right=right.xreplace(parted),
        rests={rest: Others(total.args[0]) for total, rest in rests.items()},
    )


def slope_by_term(expression: sympy.Expr, unknown: sympy.Symbol) -> sympy.Expr:
    """Differentiate by any term through the sums it stands in: the chain rule.

    What stands outside the sums is of the term in question, and is written with the symbols of ``own_symbol``.
    """
    parts = [
        (name_own(_by_total(expression, total)), sympy.diff(total.args[0], unknown))
        for total in _totals(expression, unknown)
    ]
    return sum((outer * inner for outer, inner in parts), sympy.S.Zero)


def own_symbol(symbol: sympy.Symbol) -> sympy.Symbol:
    """Give the symbol of the term in question beside those of any term: ``w_i`` becomes ``w_own``."""
    return sympy.Symbol(f"{symbol.name.removesuffix('_i')}_own", **symbol.assumptions0)


def name_own(expression: sympy.Expr) -> sympy.Expr:
    """Write the lists outside the sums with their ``own_symbol``."""
    held = {total: sympy.Dummy(positive=True) for total in expression.atoms(Total, Others)}
    back = {dummy: total for total, dummy in held.items()}
    outside = expression.xreplace(held)
    return outside.xreplace({each: own_symbol(each) for each in outside.free_symbols if is_list(each)}).xreplace(back)


def _totals(expression: sympy.Expr, unknown: sympy.Symbol) -> list[sympy.Expr]:
    return sorted((total for total in expression.atoms(Total) if total.has(unknown)), key=str)


def _by_total(expression: sympy.Expr, total: sympy.Expr) -> sympy.Expr:
    held = {each: sympy.Dummy(positive=True) for each in expression.atoms(Total)}
    back = {dummy: each for each, dummy in held.items()}
    return sympy.diff(expression.xreplace(held), held[total]).xreplace(back)


def term(symbol: sympy.Symbol, place: int) -> sympy.Symbol:
    """Give the symbol of one term of a list, counted from 1."""
    return sympy.Symbol(f"{symbol.name}_{place}", **symbol.assumptions0)


def write_out(expression: sympy.Expr, lists: tuple[sympy.Symbol, ...], count: int, own: int = 1) -> sympy.Expr:
    """Write sums out over ``count`` terms; a term outside them is that of place ``own``."""

    def at(part: sympy.Expr, place: int) -> sympy.Expr:
        return part.xreplace({symbol: term(symbol, place) for symbol in lists})

    places = range(1, count + 1)
    sums: dict[sympy.Expr, sympy.Expr] = {}
    for each in expression.atoms(Total):
        sums[each] = sympy.Add(*(at(each.args[0], place) for place in places))
    for each in expression.atoms(Others):
        sums[each] = sympy.Add(*(at(each.args[0], place) for place in places if place != own))
    held = {each: sympy.Dummy() for each in sums}
    outside = at(expression.xreplace(held), own)
    return outside.xreplace({dummy: sums[each] for each, dummy in held.items()})


def expand(relation: Relation, count: int = PROVEN_TERMS, *, every: bool = False) -> Relation:
    """Give the relation for ``count`` terms, as one without lists; a term outside the sums is the first.

    With ``every``, the terms that play no part beside that one are kept in ``where``, as a page shows them.
    """
    lists = lists_of(relation)
    left, right = (write_out(side, lists, count) for side in (relation.left, relation.right))
    used = left.free_symbols | right.free_symbols
    where = {symbol: meaning for symbol, meaning in relation.where.items() if symbol not in lists}
    for place in range(1, count + 1):
        for symbol in lists:
            variable = variables_of(relation)[symbol]
            if every or term(symbol, place) in used:
                where[term(symbol, place)] = replace(variable, text=f"{variable.text}, term {place}")
    return replace(relation, left=left, right=right, where=where, valid=(), turned={})
