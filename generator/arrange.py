"""Put a sympy expression into textbook order without evaluating it.

Takes an expression and the order of a relation's symbols; gives an unevaluated expression whose products run
numbers first, then symbols in that order. Next: generator.printers writes it.
"""

from collections.abc import Mapping

import sympy


def flatten(expression: sympy.Expr) -> sympy.Expr:
    """Join products of products and sums of sums, which ``evaluate(False)`` leaves nested, keeping their order."""
    if not expression.args or isinstance(expression, sympy.Piecewise):
        return expression
    arguments = [flatten(argument) for argument in expression.args]
    if isinstance(expression, (sympy.Mul, sympy.Add)):
        head = type(expression)
        joined: list[sympy.Expr] = []
        for argument in arguments:
            joined.extend(argument.args if isinstance(argument, head) else (argument,))
        return head(*joined, evaluate=False)
    if isinstance(expression, sympy.Pow):
        return sympy.Pow(*arguments, evaluate=False)
    return expression.func(*arguments)


def arrange(expression: sympy.Expr, order: Mapping[sympy.Symbol, int]) -> sympy.Expr:
    """Sort the factors of every product into ``order`` (unevaluated); sums put their positive terms first."""
    if not expression.args or isinstance(expression, sympy.Piecewise):
        return expression
    arguments = [arrange(argument, order) for argument in expression.args]
    if isinstance(expression, sympy.Mul):
        arguments = _turned(arguments, order)
        return (
            arguments[0]
            if len(arguments) == 1
            else sympy.Mul(*sorted(arguments, key=lambda part: _factor_rank(part, order)), evaluate=False)
        )
    if isinstance(expression, sympy.Add):
        return sympy.Add(*sorted(arguments, key=lambda part: _term_rank(part, order)), evaluate=False)
    if isinstance(expression, sympy.Pow):
        return sympy.Pow(*arguments, evaluate=False)
    return expression.func(*arguments)


def _turned(factors: list[sympy.Expr], order: Mapping[sympy.Symbol, int]) -> list[sympy.Expr]:
    """Turn -(a - b) into (b - a)."""
    if sympy.S.NegativeOne not in factors:
        return factors
    for place, factor in enumerate(factors):
        if isinstance(factor, sympy.Add) and any(term.could_extract_minus_sign() for term in factor.args):
            turned = sympy.Add(
                *sorted((-term.doit() for term in factor.args), key=lambda part: _term_rank(part, order)),
                evaluate=False,
            )
            rest = [*factors[:place], turned, *factors[place + 1 :]]
            rest.remove(sympy.S.NegativeOne)
            return rest
    return factors


def _factor_rank(part: sympy.Expr, order: Mapping[sympy.Symbol, int]) -> tuple[int, int, str]:
    if part.is_number:
        return (0, 0, str(part))
    return (2 if isinstance(part, sympy.Add) else 1, _first(part, order), str(part))


def _term_rank(part: sympy.Expr, order: Mapping[sympy.Symbol, int]) -> tuple[int, int, str]:
    return (1 if part.could_extract_minus_sign() else 0, _first(part, order), str(part))


def _first(part: sympy.Expr, order: Mapping[sympy.Symbol, int]) -> int:
    return min((order.get(symbol, len(order)) for symbol in part.free_symbols), default=-1)
