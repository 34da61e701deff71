"""Say which parameters an emitted function takes.

Takes a relation and the expressions of a function; gives names with annotations, in textbook order. A list stands as
``x_terms`` (every term), ``x_others`` (all but the one in question) and ``x_i`` (that one).
Next: generator.emit_engine.
"""

from collections.abc import Iterable
from typing import NamedTuple

import sympy

from generator.check import variables_of
from spec.model import Relation
from spec.symbols import Others, Total, is_list

OWN = "own"


class Parameter(NamedTuple):
    """A parameter of an emitted function, the variable it holds and which of its terms."""

    name: str
    annotation: str
    symbol: sympy.Symbol
    terms: str


def form_parameters(
    relation: Relation, unknown: sympy.Symbol, expressions: tuple[sympy.Expr, ...]
) -> tuple[Parameter, ...]:
    """Give the parameters of a solved form: the other variables, and of each list the parts that the form uses."""
    found: list[Parameter] = []
    for symbol in variables_of(relation):
        if not is_list(symbol):
            found += [Parameter(symbol.name, "float", symbol, "")] if symbol != unknown else []
            continue
        if symbol != unknown and any(symbol in _outside(each) for each in expressions):
            found.append(Parameter(symbol.name, "float", symbol, ""))
        for sort, ending in ((Total, "terms"), (Others, "others")):
            if any(each.has(symbol) for expression in expressions for each in expression.atoms(sort)):
                found.append(_sequence(symbol, ending))
    return tuple(found)


def whole_parameters(symbols: Iterable[sympy.Symbol], *, is_per_term: bool) -> tuple[Parameter, ...]:
    """Give the parameters of a function of all variables: lists whole, and the place of the term in question."""
    found = [
        _sequence(symbol, "terms") if is_list(symbol) else Parameter(symbol.name, "float", symbol, "")
        for symbol in symbols
    ]
    return (*found, Parameter(OWN, "int", sympy.Symbol(OWN), "")) if is_per_term else tuple(found)


def terms_name(symbol: sympy.Symbol, ending: str = "terms") -> str:
    """Give the name of a list's parameter: ``x_i`` becomes ``x_terms``."""
    return f"{symbol.name.removesuffix('_i')}_{ending}"


def _sequence(symbol: sympy.Symbol, ending: str) -> Parameter:
    return Parameter(terms_name(symbol, ending), "Sequence[float]", symbol, ending)


def _outside(expression: sympy.Expr) -> set[sympy.Symbol]:
    """Give the symbols that stand outside sums."""
    hidden = {each: sympy.Dummy() for each in expression.atoms(Total, Others)}
    return set(expression.xreplace(hidden).free_symbols)
