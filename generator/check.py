"""Check the loaded spec and refuse it with every mistake at once.

Takes ``Loaded``; gives ``Checked``, which only this stage makes. Every mistake is a SpecError; all are raised
together as one ExceptionGroup. Next: generator.solve.
"""

import re
from collections import Counter
from collections.abc import Iterator, Mapping
from dataclasses import dataclass
from fractions import Fraction

import sympy

from generator.dimension_of import dimension_of
from generator.errors import SpecError
from generator.load import Case, Loaded
from generator.parts import written_out
from spec.dimensions import NUMBER, Dimension
from spec.model import Constant, GasName, Nature, Relation, Variable

WITHOUT_CASE = (Nature.BALANCE, Nature.DEFINITION, Nature.PROPERTY)
LIST_TERM = re.compile(r"(_i)_\d+$")
BASES = ("published", "published, digits from memory", "library", "common practice, no source")


@dataclass(frozen=True, slots=True, kw_only=True)
class Checked:
    """A spec whose equations agree in dimension, whose symbols are bound, and whose laws have outside cases."""

    loaded: Loaded


def check(loaded: Loaded) -> Checked:
    """Give the spec as checked, or raise an ExceptionGroup of SpecError with every mistake found."""
    mistakes = [*_names(loaded)]
    for relation in loaded.relations():
        mistakes.extend(_relation(relation, loaded.cases))
    mistakes.extend(_cases(loaded))
    if mistakes:
        raise ExceptionGroup("the spec cannot be built", mistakes)
    return Checked(loaded=loaded)


def _names(loaded: Loaded) -> Iterator[SpecError]:
    keys = [*(relation.key for relation in loaded.relations()), *(f"sheet {sheet.key}" for sheet in loaded.sheets)]
    for key, count in Counter(keys).items():
        if count > 1:
            yield SpecError(
                where=f"spec, {key}",
                found=f"the key {count} times",
                expected="every key once",
                todo="rename one of them",
            )


def _relation(relation: Relation, cases: tuple[Case, ...]) -> Iterator[SpecError]:
    where = f"relation {relation.key}"
    relation = written_out(relation)
    unbound = _symbols(relation) - set(relation.where)
    for symbol in sorted(unbound, key=str):
        yield SpecError(
            where=where,
            found=f"the symbol {symbol} in the equation and not in where",
            expected="a Variable or a Constant for every symbol",
            todo=f"add {symbol} to where",
        )
    for symbol in [name for name, meaning in relation.where.items() if not isinstance(meaning, GasName)]:
        if symbol not in _symbols(relation):
            yield SpecError(
                where=where,
                found=f"{symbol} in where and not in the equation",
                expected="only symbols of the equation",
                todo=f"remove {symbol} or use it",
            )
    if not unbound:
        yield from _dimensions(relation, where)
    yield from _source(relation, where)
    if relation.nature not in WITHOUT_CASE and not any(_is_outside(case, relation) for case in cases):
        yield SpecError(
            where=where,
            found="no case from outside",
            expected="at least one case in spec/cases that is published or computed by an independent library",
            todo="add a case with its source, or mark the relation as a balance or definition if it is one",
        )


def _is_outside(case: Case, relation: Relation) -> bool:
    return case.relation == relation.key and case.basis in BASES


def _symbols(relation: Relation) -> set[sympy.Symbol]:
    return set(relation.left.free_symbols | relation.right.free_symbols)


def _source(relation: Relation, where: str) -> Iterator[SpecError]:
    for what, citation in [
        ("the relation", relation.source),
        *((f"the constant {symbol}", constant.source) for symbol, constant in constants_of(relation).items()),
    ]:
        if citation is None or not (citation.source.work and citation.where):
            yield SpecError(
                where=where,
                found=f"no source for {what}",
                expected="a work of spec/sources.py and a place in it",
                todo='write source=WORK.at("equation or section")',
            )


def _dimensions(relation: Relation, where: str) -> Iterator[SpecError]:
    meaning = meanings_of(relation)
    try:
        if _has_open_power(relation):
            left, right = _joined(relation, meaning, where), NUMBER
        else:
            left, right = (dimension_of(side, meaning, where) for side in (relation.left, relation.right))
    except SpecError as mistake:
        yield mistake
        return
    if left != right:
        yield SpecError(
            where=where,
            found=f"a left side in {left} and a right side in {right}",
            expected="the same dimension on both sides",
            todo="correct the equation or the kinds of its variables",
        )


def _has_open_power(relation: Relation) -> bool:
    """Tell whether a variable stands alone under an exponent that is one, too, as in ``p V**gamma``."""
    powers = relation.left.atoms(sympy.Pow) | relation.right.atoms(sympy.Pow)
    return any(power.base in meanings_of(relation) and not power.exp.is_number for power in powers)


def _joined(relation: Relation, meaning: Mapping[sympy.Symbol, Dimension], where: str) -> Dimension:
    """Give the dimension of left over right, where each is a product of powers whose exponents may be variables."""
    totals: list[sympy.Expr] = [sympy.S.Zero] * len(NUMBER.exponents())
    for factor in sympy.Mul.make_args((relation.left / relation.right).doit()):
        base, exponent = factor.as_base_exp()
        parts = dimension_of(base, meaning, where).exponents()
        totals = [total + exponent * sympy.Rational(part) for total, part in zip(totals, parts, strict=True)]
    simple = [sympy.expand(total) for total in totals]
    if any(not total.is_Rational for total in simple):
        raise SpecError(
            where=where,
            found="powers whose dimensions do not cancel",
            expected="the same dimension on both sides, whatever the exponent",
            todo="correct the equation or the kinds of its variables",
        )
    return Dimension.of(Fraction(int(total.p), int(total.q)) for total in simple)


def meanings_of(relation: Relation) -> Mapping[sympy.Symbol, Dimension]:
    """Give the dimension of each numeric symbol of ``relation``."""
    return {
        symbol: meaning.kind.dimension if isinstance(meaning, Variable) else meaning.dimension
        for symbol, meaning in relation.where.items()
        if not isinstance(meaning, GasName)
    }


def constants_of(relation: Relation) -> Mapping[sympy.Symbol, Constant]:
    """Give the constants of ``relation``, in textbook order."""
    return {symbol: meaning for symbol, meaning in relation.where.items() if isinstance(meaning, Constant)}


def variables_of(relation: Relation) -> Mapping[sympy.Symbol, Variable]:
    """Give the variables of ``relation``, in textbook order."""
    return {symbol: meaning for symbol, meaning in relation.where.items() if isinstance(meaning, Variable)}


def _cases(loaded: Loaded) -> Iterator[SpecError]:
    relations = {relation.key: relation for relation in loaded.relations()}
    for case in loaded.cases:
        if case.relation not in relations:
            yield SpecError(
                where=case.name,
                found=f"the relation {case.relation}",
                expected="a key of the spec",
                todo="correct the key",
            )
            continue
        names = {
            symbol.name
            for symbol, meaning in relations[case.relation].where.items()
            if not isinstance(meaning, Constant)
        }
        asked = (LIST_TERM.sub(r"\1", name) for name in (*case.given, case.find))
        for name in [name for name in asked if name not in names]:
            yield SpecError(
                where=case.name,
                found=f"the variable {name}",
                expected=f"one of {', '.join(sorted(names))}",
                todo="correct the name",
            )
        if case.basis not in BASES:
            yield SpecError(
                where=case.name,
                found=f"the basis {case.basis!r}",
                expected=f"one of {'; '.join(BASES)}",
                todo="say how the number was come by",
            )
