"""Solve every relation for every unknown and prove each form.

Takes a checked relation; gives ``SolvedRelation``: per unknown a closed form, a polynomial with a named root, an
inverse of the gas model, or a bracketed numeric form; and the slopes of left - right by every variable, from which
the sensitivity of any unknown to any reading is -F_x/F_y. Next: generator.describe turns them into text.
"""

from collections.abc import Mapping
from dataclasses import dataclass
from enum import Enum

import sympy

from generator.arrange import arrange, flatten
from generator.check import variables_of
from generator.errors import SpecError
from generator.isolate import isolate, peel
from generator.parts import Parts, depends, put_in, slope, written_out
from generator.prove import is_monotonic, is_monotonic_beside, prove_closed
from generator.terms import (
    PROVEN_TERMS,
    expand,
    is_per_term,
    lists_of,
    name_own,
    single_out,
    slope_by_term,
    term,
    write_out,
)
from spec.model import Nature, Relation, Root, Split
from spec.symbols import GAS_FUNCTIONS, is_list


class Way(Enum):
    """How an unknown is found."""

    CLOSED = "closed form"
    POLYNOMIAL = "root of a polynomial"
    GAS = "by the gas model"
    NUMERIC = "found numerically"


@dataclass(frozen=True, slots=True, kw_only=True)
class Form:
    """A relation solved for one unknown.

    ``expression`` is the closed form or the inverse call; ``coefficients`` are those of the polynomial, highest power
    first; ``proof`` says how the form was shown to satisfy the relation.
    """

    unknown: sympy.Symbol
    way: Way
    arguments: tuple[sympy.Symbol, ...]
    expression: sympy.Expr | None = None
    coefficients: tuple[sympy.Expr, ...] = ()
    root: Root | None = None
    method: str = ""
    method_arguments: tuple[sympy.Expr, ...] = ()
    proof: str = ""
    split: Split | None = None


@dataclass(frozen=True, slots=True, kw_only=True)
class SolvedRelation:
    """A relation with a form for every unknown and the slopes of its residual ``left - right``.

    The slope by a list is that by one term through the sums; ``own_slopes`` add what the term in question does outside
    them, where the relation speaks of one.
    """

    relation: Relation
    forms: Mapping[str, Form]
    slopes: Mapping[str, sympy.Expr]
    own_slopes: Mapping[str, sympy.Expr]
    uses_gas: bool


def solve_relation(relation: Relation) -> SolvedRelation:
    """Solve one relation for each of its variables."""
    variables = variables_of(relation)
    left, right = evaluated(relation.left), evaluated(relation.right)
    solved = [symbol for symbol in variables if symbol not in relation.turned and symbol not in relation.data]
    unknowns = solved if relation.nature not in (Nature.DECISION, Nature.FIT) else [relation.left]
    forms = {symbol.name: _form(relation, symbol, left, right) for symbol in unknowns}
    order = order_of(relation)
    parts = relation.parts
    slopes = {symbol.name: arrange(_slope(left - right, symbol, parts), order) for symbol in variables}
    own = {symbol.name: arrange(name_own(slope(left - right, symbol, parts)), order) for symbol in lists_of(relation)}
    return SolvedRelation(
        relation=relation,
        forms=forms,
        slopes=slopes,
        own_slopes=own if is_per_term(relation) else {},
        uses_gas=_uses_gas(put_in(left - right, parts)),
    )


def solve_for(relation: Relation, unknown: sympy.Symbol) -> Form:
    """Solve one relation for one of its variables."""
    return _form(relation, unknown, evaluated(relation.left), evaluated(relation.right))


def evaluated(expression: sympy.Expr) -> sympy.Expr:
    """Give an unevaluated expression as sympy would have built it, for algebra."""
    if not expression.args or isinstance(expression, sympy.Piecewise):
        return expression
    return expression.func(*(evaluated(argument) for argument in expression.args))


def _slope(residual: sympy.Expr, symbol: sympy.Symbol, parts: Parts) -> sympy.Expr:
    """Differentiate by a variable; by a list, differentiate by one term of it."""
    return slope_by_term(residual, symbol) if is_list(symbol) else slope(residual, symbol, parts)


def order_of(relation: Relation) -> Mapping[sympy.Symbol, int]:
    """Give each symbol's place in textbook order."""
    return {symbol: place for place, symbol in enumerate(relation.where)}


def _uses_gas(expression: sympy.Expr) -> bool:
    return any(name.func.__name__ in GAS_FUNCTIONS for name in expression.atoms(sympy.Function))


def _form(relation: Relation, unknown: sympy.Symbol, left: sympy.Expr, right: sympy.Expr) -> Form:
    arguments = tuple(symbol for symbol in variables_of(relation) if symbol != unknown)
    inverse = _gas_form(left, right, unknown, arguments)
    if inverse is not None:
        return inverse
    is_inside = depends(left - right, unknown, relation.parts)  # then no one operation undoes it
    closed = None if is_inside else _textbook(relation, unknown) or _isolated(relation, left, right, unknown)
    if closed is not None:
        proof = _proof(relation, unknown, closed, left - right)
        return Form(unknown=unknown, way=Way.CLOSED, arguments=arguments, expression=closed, proof=proof)
    if lists_of(relation):
        raise _no_closed_form(relation, unknown)
    relation = written_out(relation)
    residual = evaluated(relation.left) - evaluated(relation.right)
    return (
        _split(relation, unknown, residual, arguments)
        or (None if is_inside else _polynomial(relation, unknown, residual, arguments))
        or _numeric(relation, unknown, residual, arguments)
    )


def _proof(relation: Relation, unknown: sympy.Symbol, form: sympy.Expr, residual: sympy.Expr) -> str:
    """Prove a closed form; one over lists is proven written out for a few terms."""
    lists = lists_of(relation)
    if not lists:
        whole = put_in(form.doit(), relation.parts)
        return prove_closed(written_out(relation), unknown, whole, put_in(residual, relation.parts))
    plain = expand(relation, PROVEN_TERMS)
    own = term(unknown, 1) if is_list(unknown) else unknown
    residual = evaluated(plain.left) - evaluated(plain.right)
    said = prove_closed(plain, own, write_out(form.doit(), lists, PROVEN_TERMS), residual)
    return f"{said} (written out for {PROVEN_TERMS} terms)"


def _no_closed_form(relation: Relation, unknown: sympy.Symbol) -> SpecError:
    return SpecError(
        where=f"relation {relation.key}, unknown {unknown}",
        found="no closed form",
        expected="a closed form, because the relation is over lists",
        todo="write the equation so that the term stands once, or leave the sum out of it",
    )


def _textbook(relation: Relation, unknown: sympy.Symbol) -> sympy.Expr | None:
    """Give the printed side itself where the other side is the unknown alone."""
    for here, there in ((relation.left, relation.right), (relation.right, relation.left)):
        if here == unknown and not there.has(unknown):
            return flatten(there)
    return None


def _isolated(relation: Relation, left: sympy.Expr, right: sympy.Expr, unknown: sympy.Symbol) -> sympy.Expr | None:
    parted = single_out(left, right, unknown)
    left, right = parted.left, parted.right
    found = isolate(left, right, unknown)
    if found is None:
        inside, outside = peel(left, right, unknown)
        found = _linear(left - right, unknown) or _linear(inside - outside, unknown) or _exponent(left / right, unknown)
    return None if found is None else arrange(found.xreplace(parted.rests), order_of(relation))


def _linear(residual: sympy.Expr, unknown: sympy.Symbol) -> sympy.Expr | None:
    slope = sympy.diff(residual, unknown)
    has_open_power = any(not power.exp.is_number for power in residual.atoms(sympy.Pow))
    if has_open_power and not slope.has(unknown):  # a common denominator would split (p/q)**N and overflow
        return sympy.factor_terms(-residual.subs(unknown, 0) / slope)
    polynomial = _as_polynomial(residual, unknown)
    if polynomial is None or polynomial.degree() != 1:
        return None
    slope, rest = polynomial.all_coeffs()
    return sympy.factor_terms(sympy.cancel(-rest / slope))


def _exponent(quotient: sympy.Expr, unknown: sympy.Symbol) -> sympy.Expr | None:
    """Solve a product of powers for an unknown that stands in exponents only: its logarithm is linear in it."""
    powers = [power for power in quotient.atoms(sympy.Pow) if power.exp.has(unknown)]
    if not powers or any(power.base.has(unknown) for power in powers):
        return None
    logarithm = sympy.expand_log(sympy.log(quotient), force=True)
    slope = sympy.expand(sympy.diff(logarithm, unknown))
    if slope.has(unknown):
        return None
    rest = sympy.expand(logarithm.subs(unknown, 0))
    return sympy.logcombine(-rest, force=True) / sympy.logcombine(slope, force=True)


def _as_polynomial(residual: sympy.Expr, unknown: sympy.Symbol) -> sympy.Poly | None:
    above, _ = sympy.fraction(sympy.together(residual))
    above = sympy.expand(above)
    return sympy.Poly(above, unknown) if above.is_polynomial(unknown) else None


def _gas_form(
    left: sympy.Expr, right: sympy.Expr, unknown: sympy.Symbol, arguments: tuple[sympy.Symbol, ...]
) -> Form | None:
    """Give the gas model's own inverse where the unknown is an argument of an opaque function that stands alone."""
    for value, call in ((left, right), (right, left)):
        name = call.func.__name__
        if name in GAS_FUNCTIONS and unknown in call.args and not value.has(unknown):
            place = call.args.index(unknown)
            inputs = tuple(value if argument == unknown else argument for argument in call.args)
            return Form(
                unknown=unknown,
                way=Way.GAS,
                arguments=arguments,
                method=GAS_FUNCTIONS[name].inverses[place],
                method_arguments=inputs,
                proof="inverse of the gas model, shown by its own tests",
            )
    return None


def _polynomial(
    relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr, arguments: tuple[sympy.Symbol, ...]
) -> Form | None:
    polynomial = _as_polynomial(residual, unknown)
    if polynomial is None:
        return None
    branch = next((branch for branch in relation.branches if branch.unknown == unknown), None)
    if branch is None:
        raise SpecError(
            where=f"relation {relation.key}, unknown {unknown}",
            found=f"a polynomial of degree {polynomial.degree()}, which may have {polynomial.degree()} roots",
            expected="the physical root named",
            todo=f"add Branch(unknown={unknown}, root=..., why=...) to branches",
        )
    coefficients = tuple(arrange(part, order_of(relation)) for part in polynomial.all_coeffs())
    return Form(
        unknown=unknown,
        way=Way.POLYNOMIAL,
        arguments=arguments,
        coefficients=coefficients,
        root=branch.root,
        proof=f"all real roots bracketed by those of the derivative; the {branch.root.value} taken: {branch.why}",
    )


def _split(
    relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr, arguments: tuple[sympy.Symbol, ...]
) -> Form | None:
    """Give the form of an unknown with one value on each side of a turning point, if the spec names one."""
    split = next((split for split in relation.splits if split.unknown == unknown), None)
    if split is None:
        return None
    if not is_monotonic_beside(relation, unknown, residual, split):
        raise SpecError(
            where=f"relation {relation.key}, unknown {unknown}",
            found="a residual that turns elsewhere than at the split",
            expected="one that only rises or only falls on each side that is named",
            todo=f"correct Split(unknown={unknown}, at=...)",
        )
    return Form(
        unknown=unknown,
        way=Way.NUMERIC,
        arguments=arguments,
        split=split,
        proof="residual monotonic over sampled states on each side of its turning point: one root at most on each",
    )


def _numeric(
    relation: Relation, unknown: sympy.Symbol, residual: sympy.Expr, arguments: tuple[sympy.Symbol, ...]
) -> Form:
    if not is_monotonic(relation, unknown, residual):
        raise SpecError(
            where=f"relation {relation.key}, unknown {unknown}",
            found="a residual that rises and falls over the field's range, so two values may satisfy it",
            expected="one root, or the physical root named",
            todo=f"add Branch(unknown={unknown}, root=..., why=...) to branches, or narrow the kind's range",
        )
    return Form(
        unknown=unknown,
        way=Way.NUMERIC,
        arguments=arguments,
        proof="residual monotonic over sampled states of the range: one root at most, bracketed",
    )
