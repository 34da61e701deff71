"""Work out the dimension of an expression.

Takes an expression and the meaning of its symbols; gives a Dimension or raises SpecError that names the place.
Next: generator.check compares both sides of every relation.
"""

from collections.abc import Mapping
from fractions import Fraction

import sympy

from generator.errors import SpecError
from generator.printers import TextWriter
from spec.dimensions import NUMBER, Dimension
from spec.symbols import GAS_FUNCTIONS, Others, Total

Meaning = Mapping[sympy.Symbol, Dimension]


def dimension_of(expression: sympy.Expr, meaning: Meaning, where: str) -> Dimension:
    """Give the dimension of ``expression``; sums must agree, exponents and functions take numbers."""
    if isinstance(expression, sympy.Symbol):
        return meaning[expression]
    if expression.is_number:
        return NUMBER
    if isinstance(expression, sympy.Add):
        return _of_sum(expression, meaning, where)
    if isinstance(expression, sympy.Mul):
        total = NUMBER
        for factor in expression.args:
            total *= dimension_of(factor, meaning, where)
        return total
    if isinstance(expression, sympy.Pow):
        return _of_power(expression, meaning, where)
    return _of_call(expression, meaning, where)


def _of_sum(expression: sympy.Add, meaning: Meaning, where: str) -> Dimension:
    first, *others = expression.args
    dimension = dimension_of(first, meaning, where)
    for other in others:
        found = dimension_of(other, meaning, where)
        if found != dimension:
            raise SpecError(
                where=f"{where}, the sum {TextWriter().write(expression)}",
                found=f"a term in {dimension} and a term in {found}",
                expected="terms of one dimension",
                todo="correct the equation or the kinds of its variables",
            )
    return dimension


def _of_power(expression: sympy.Pow, meaning: Meaning, where: str) -> Dimension:
    base = dimension_of(expression.base, meaning, where)
    _require_number(expression.exp, meaning, where, "an exponent")
    if base == NUMBER:
        return NUMBER
    if not expression.exp.is_Rational:
        raise SpecError(
            where=f"{where}, the power {TextWriter().write(expression)}",
            found=f"a base in {base} and an exponent that is not a fixed fraction",
            expected="a base that is a number",
            todo="divide the base by a reference of the same kind",
        )
    return base ** Fraction(int(expression.exp.p), int(expression.exp.q))


def _of_call(expression: sympy.Expr, meaning: Meaning, where: str) -> Dimension:
    if isinstance(expression, sympy.Piecewise):
        return _of_sum(sympy.Add(*(part for part, _ in expression.args), evaluate=False), meaning, where)
    if isinstance(expression, (Total, Others)):
        return dimension_of(expression.args[0], meaning, where)
    name = expression.func.__name__
    if name not in GAS_FUNCTIONS:
        for argument in expression.args:
            _require_number(argument, meaning, where, f"the argument of {name}")
        return NUMBER
    function = GAS_FUNCTIONS[name]
    for argument, kind in zip(expression.args, function.arguments, strict=True):
        found = dimension_of(argument, meaning, where)
        if found != kind.dimension:
            raise SpecError(
                where=f"{where}, the argument {argument} of {name}",
                found=f"the dimension {found}",
                expected=f"{kind.title} in {kind.dimension}",
                todo="give the arguments in the order of spec.symbols",
            )
    return function.result.dimension


def _require_number(expression: sympy.Expr, meaning: Meaning, where: str, what: str) -> None:
    found = dimension_of(expression, meaning, where)
    if found != NUMBER:
        raise SpecError(
            where=f"{where}, {what} {TextWriter().write(expression)}",
            found=f"the dimension {found}",
            expected="a number",
            todo="divide by a quantity of the same kind",
        )
