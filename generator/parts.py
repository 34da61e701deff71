"""Put the named parts of an equation in, and differentiate through them.

Takes a Relation whose ``parts`` name what its equation is built of; gives the equation written out for algebra, and
slopes that keep the names. Next: generator.check, generator.solve and generator.emit_engine use it.
"""

from collections.abc import Iterable, Mapping
from dataclasses import replace

import sympy

from spec.model import Relation
from spec.symbols import Others, Total

Parts = Mapping[sympy.Symbol, sympy.Expr]


def put_in(expression: sympy.Basic, parts: Parts) -> sympy.Basic:
    """Give an expression with every part written out; a part may use those named before it."""
    for symbol, value in reversed(tuple(parts.items())):
        expression = expression.xreplace({symbol: value})
    return expression


def written_out(relation: Relation) -> Relation:
    """Give the relation without parts: its equation and its bounds written out."""
    if not relation.parts:
        return relation
    parts = relation.parts
    return replace(
        relation,
        left=put_in(relation.left, parts),
        right=put_in(relation.right, parts),
        valid=tuple(replace(validity, holds=put_in(validity.holds, parts)) for validity in relation.valid),
        splits=tuple(replace(split, at=put_in(split.at, parts)) for split in relation.splits),
        parts={},
    )


def used_parts(parts: Parts, expressions: Iterable[sympy.Basic]) -> Parts:
    """Give the parts that the expressions need, in the order in which they can be worked out."""
    needed = {symbol for expression in expressions for symbol in expression.free_symbols}
    found: dict[sympy.Symbol, sympy.Expr] = {}
    for symbol, value in reversed(tuple(parts.items())):
        if symbol in needed:
            found[symbol] = value
            needed |= value.free_symbols
    return dict(reversed(tuple(found.items())))


def depends(expression: sympy.Expr, symbol: sympy.Symbol, parts: Parts) -> bool:
    """Tell whether an expression holds a symbol in one of its parts."""
    return any(value.has(symbol) for value in used_parts(parts, [expression]).values())


def slope(expression: sympy.Expr, symbol: sympy.Symbol, parts: Parts) -> sympy.Expr:
    """Differentiate by the places of ``symbol`` outside sums over lists, through the parts, which keep their names."""
    held = {each: sympy.Dummy(positive=True) for each in expression.atoms(Total, Others)}
    back = {dummy: each for each, dummy in held.items()}
    total = sympy.diff(expression.xreplace(held), symbol).xreplace(back)
    for part in expression.free_symbols & parts.keys():
        inner = slope(parts[part], symbol, parts)
        if inner != 0:
            total += sympy.diff(expression.xreplace(held), part).xreplace(back) * inner
    return total
