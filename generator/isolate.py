"""Isolate an unknown in an equation by undoing one operation at a time.

Takes both sides and an unknown that stands in them once; gives the other side's expression, or None where it does
not stand once or an operation has no single inverse. Next: generator.solve.
"""

import sympy


def isolate(left: sympy.Expr, right: sympy.Expr, unknown: sympy.Symbol) -> sympy.Expr | None:
    """Give ``unknown`` in terms of the rest, or None where it does not stand exactly once in an undoable place."""
    if occurrences(left, unknown) + occurrences(right, unknown) != 1:
        return None
    inside, outside = peel(left, right, unknown)
    return outside if inside == unknown else None


def peel(left: sympy.Expr, right: sympy.Expr, unknown: sympy.Symbol) -> tuple[sympy.Expr, sympy.Expr]:
    """Undo what can be undone around every place of ``unknown``; give the rest and what it equals.

    Where both sides hold the unknown nothing is undone.
    """
    if left.has(unknown) and right.has(unknown):
        return left, right
    inside, outside = (left, right) if left.has(unknown) else (right, left)
    while inside != unknown:
        step = _undo(inside, outside, unknown)
        if step is None or step[0] == inside:
            break
        inside, outside = step
    return inside, outside


def occurrences(expression: sympy.Expr, unknown: sympy.Symbol) -> int:
    """Count how often ``unknown`` stands in ``expression``."""
    if expression == unknown:
        return 1
    return sum(occurrences(argument, unknown) for argument in expression.args)


def _undo(inside: sympy.Expr, outside: sympy.Expr, unknown: sympy.Symbol) -> tuple[sympy.Expr, sympy.Expr] | None:
    if isinstance(inside, (sympy.Add, sympy.Mul)):
        with_it, without = inside.as_independent(unknown, as_Add=isinstance(inside, sympy.Add))[::-1]
        return (with_it, outside - without) if isinstance(inside, sympy.Add) else (with_it, outside / without)
    if isinstance(inside, sympy.exp):
        return inside.args[0], sympy.log(outside)
    if isinstance(inside, sympy.log):
        return inside.args[0], sympy.exp(outside)
    if isinstance(inside, sympy.sin):  # an angle of the spec is acute, so it has one
        return inside.args[0], sympy.asin(outside)
    if isinstance(inside, sympy.Pow):
        return _undo_power(inside, outside, unknown)
    return None


def _undo_power(inside: sympy.Pow, outside: sympy.Expr, unknown: sympy.Symbol) -> tuple[sympy.Expr, sympy.Expr] | None:
    base, exponent = inside.base, inside.exp
    if not base.has(unknown):
        return exponent, sympy.log(outside) / sympy.log(base)
    if exponent.has(unknown):
        return None
    is_odd = bool(exponent.is_integer and exponent.is_odd)
    is_real_over_positive = not exponent.is_integer  # such a power is real only over a base that is not negative
    if base.is_nonnegative or is_odd or is_real_over_positive:
        return base, outside ** (1 / exponent)
    return None
