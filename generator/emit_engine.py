"""Write a solved relation as Python, and a family of them as a module that ships.

Takes a SolvedRelation, or families with the text of their relations; gives text. One module per family, imported
only when one of its relations is asked for, and an index of all. Next: generator.pipeline stages them beside the
hand-written part.
"""

from collections.abc import Iterator, Mapping
from textwrap import wrap

import sympy

from generator.check import constants_of, variables_of
from generator.printers import PythonWriter, TextWriter, symbol_text
from generator.solve import Form, SolvedRelation, Way, evaluated
from spec.model import Constant, Family, Relation, Sign, Validity, Variable

MATH_NAMES = ("pow", "sqrt", "log", "exp", "sin", "cos", "asin", "erf", "pi")
SIGNS = {Sign.POSITIVE: "positive", Sign.NONNEGATIVE: "nonnegative", Sign.ANY: "any"}
WIDTH = 110


def emit_relations(families: tuple[Family, ...], python: Mapping[str, str]) -> Mapping[str, str]:
    """Give the text of every relations module by path, from the Python text of each relation by key."""
    modules = {f"gaswright/laws/{family.key}.py": _family(family, python) for family in families}
    return {
        **modules,
        "gaswright/laws/__init__.py": '"""The relations of the trade, one module per family. Generated."""\n',
        "gaswright/laws/index.py": _index(families),
    }


def _index(families: tuple[Family, ...]) -> str:
    lines = ['"""Which family holds a relation, and its title. Generated from the spec."""', "", "FAMILIES = {"]
    lines += [f"    {family.key!r}: {family.title!r}," for family in families]
    lines += ["}", "FAMILY_OF = {"]
    lines += [f"    {relation.key!r}: {family.key!r}," for family in families for relation in family.relations]
    lines += ["}", "TITLE_OF = {"]
    lines += [f"    {relation.key!r}: {relation.title!r}," for family in families for relation in family.relations]
    return "\n".join([*lines, "}", ""])


def _family(family: Family, python: Mapping[str, str]) -> str:
    body = "\n\n\n".join(python[relation.key] for relation in family.relations)
    head = [f'"""{family.title}: {family.lead} Generated from spec/relations/{family.key}.py."""', ""]
    names = [name for name in MATH_NAMES if _is_used(name, body)]
    if names:
        head += [f"from math import {', '.join(names)}", ""]
    uses_gas = '"Gas"' in body
    if uses_gas:
        head += ["from typing import TYPE_CHECKING", ""]
    head += ["from gaswright.model import Constant, Form, Relation, Validity, Variable"]
    roots = [name for name in ("find_root", "polynomial_root") if _is_used(name, body)]
    if roots:
        head += [f"from gaswright.roots import {', '.join(roots)}"]
    if uses_gas:
        head += ["", "if TYPE_CHECKING:", "    from gaswright.gas.real import Gas"]
    keys = ",\n".join(f"    {relation.key!r}: {relation.key.upper()}" for relation in family.relations)
    return "\n".join(head) + f"\n\n\n{body}\n\n\nRELATIONS = {{\n{keys},\n}}\n"


def _is_used(name: str, body: str) -> bool:
    return any(mark in body for mark in (f"{name}(", f"{name}*", f"{name})", f"*{name}", f" {name}"))


def relation_python(solved: SolvedRelation, family_key: str) -> str:
    """Give the functions and the value of one relation as Python text."""
    functions = [_form(solved, form) for form in solved.forms.values()]
    functions.append(_residual(solved))
    functions.append(_slopes(solved))
    functions.extend(
        _validity_function(solved.relation, place, validity) for place, validity in enumerate(solved.relation.valid)
    )
    return "\n\n\n".join([*functions, _value(solved, family_key)])


def _parameters(arguments: tuple[sympy.Symbol, ...], *, is_gas: bool) -> str:
    names = [f"{symbol.name}: float" for symbol in arguments]
    return ", ".join([*names, 'gas: "Gas"'] if is_gas else names)


def _needs_gas(form: Form) -> bool:
    if form.way is Way.GAS:
        return True
    return form.expression is not None and bool(form.expression.atoms(sympy.core.function.AppliedUndef))


def _form(solved: SolvedRelation, form: Form) -> str:
    relation = solved.relation
    variable = variables_of(relation)[form.unknown]
    name = f"{relation.key}_{form.unknown.name}"
    lines = [
        f"def {name}({_parameters(form.arguments, is_gas=_needs_gas(form))}) -> float:",
        *_docstring(relation, form, variable),
        *_constants(relation, _expressions(relation, form)),
        *_body(relation, form),
    ]
    return "\n".join(lines)


def _expressions(relation: Relation, form: Form) -> tuple[sympy.Expr, ...]:
    if form.way is Way.NUMERIC:
        return (relation.left, relation.right)
    if form.way is Way.GAS:
        return form.method_arguments
    return form.coefficients or (form.expression,)


def _docstring(relation: Relation, form: Form, variable: Variable) -> Iterator[str]:
    yield f'    """Give the {variable.text} [{variable.kind.si}]: {form.way.value}.'
    yield ""
    for symbol in form.arguments:
        other = variables_of(relation)[symbol]
        yield f"    {symbol.name}: {other.text} [{other.kind.si}], {other.sign.value}."
    for line in wrap(f"Assumes {'; '.join(relation.assumes)}. Source: {relation.source}.", WIDTH - 4):
        yield f"    {line}"
    yield '    """'


def _constants(relation: Relation, expressions: tuple[sympy.Expr, ...]) -> Iterator[str]:
    for symbol, constant in constants_of(relation).items():
        if any(expression.has(symbol) for expression in expressions):
            yield f"    {symbol.name} = {float(constant.value)!r}"


def _body(relation: Relation, form: Form) -> Iterator[str]:
    write = PythonWriter().write
    kind = variables_of(relation)[form.unknown].kind
    low, high = max(kind.low, 1e-300), kind.high
    where = f"{relation.title}, {form.unknown.name}"
    if form.way is Way.CLOSED and form.expression is not None:
        yield f"    return {write(form.expression)}"
    elif form.way is Way.GAS:
        yield f"    return gas.{form.method}({', '.join(write(part) for part in form.method_arguments)})"
    elif form.way is Way.POLYNOMIAL and form.root is not None:
        coefficients = ", ".join(write(part) for part in form.coefficients)
        yield f"    return polynomial_root(({coefficients}), {low!r}, {high!r}, {form.root.value!r}, {where!r})"
    else:
        yield f"    def residual({form.unknown.name}: float) -> float:"
        yield f"        return {write(relation.left)} - ({write(relation.right)})"
        yield ""
        yield f"    return find_root(residual, {low!r}, {high!r}, {where!r})"


def _residual(solved: SolvedRelation) -> str:
    relation = solved.relation
    variables = tuple(variables_of(relation))
    write = PythonWriter().write
    return "\n".join(
        [
            f"def {relation.key}_residual({_parameters(variables, is_gas=solved.uses_gas)}) -> float:",
            '    """Give left - right of the relation, in SI."""',
            *_constants(relation, (relation.left, relation.right)),
            f"    return {write(relation.left)} - ({write(relation.right)})",
        ]
    )


def _slopes(solved: SolvedRelation) -> str:
    relation = solved.relation
    variables = tuple(variables_of(relation))
    write = PythonWriter().write
    slopes = [solved.slopes[symbol.name] for symbol in variables]
    lines = [f"        {write(slope)}," for slope in slopes]
    names = ", ".join(symbol.name for symbol in variables)
    annotation = f"tuple[{', '.join(['float'] * len(variables))}]"
    return "\n".join(
        [
            f"def {relation.key}_slopes({_parameters(variables, is_gas=solved.uses_gas)}) -> {annotation}:",
            f'    """Give the partial derivatives of left - right by {names}."""',
            *_constants(relation, tuple(slopes)),
            "    return (",
            *lines,
            "    )",
        ]
    )


def _validity_arguments(relation: Relation, validity: Validity) -> list[sympy.Symbol]:
    return [symbol for symbol in variables_of(relation) if validity.holds.has(symbol)]


def _validity_function(relation: Relation, place: int, validity: Validity) -> str:
    names = ", ".join(f"{symbol.name}: float" for symbol in _validity_arguments(relation, validity))
    write = PythonWriter().write
    sides = f"{write(evaluated(validity.holds.lhs))} {validity.holds.rel_op} {write(evaluated(validity.holds.rhs))}"
    return "\n".join(
        [
            f"def {relation.key}_holds_{place}({names}) -> bool:",
            '    """Tell whether the relation holds there."""',
            f"    return {sides}",
        ]
    )


def _value(solved: SolvedRelation, family_key: str) -> str:
    relation = solved.relation
    text = TextWriter().write
    variables = [_variable(symbol, meaning) for symbol, meaning in variables_of(relation).items()]
    constants = [_constant(symbol, meaning) for symbol, meaning in constants_of(relation).items()]
    forms = [_form_value(relation, form) for form in solved.forms.values()]
    validity = [
        f"        Validity({relation.key}_holds_{place}, "
        f"{tuple(symbol.name for symbol in _validity_arguments(relation, item))!r}, {item.says!r}, {item.refuse}),"
        for place, item in enumerate(relation.valid)
    ]
    arguments = tuple(symbol.name for symbol in variables_of(relation)) + (("gas",) if solved.uses_gas else ())
    return "\n".join(
        [
            f"{relation.key.upper()} = Relation(",
            f"    key={relation.key!r},",
            f"    title={relation.title!r},",
            f"    family={family_key!r},",
            f"    text={f'{text(relation.left)} = {text(relation.right)}'!r},",
            "    variables=(",
            *variables,
            "    ),",
            "    constants=(",
            *constants,
            "    ),",
            "    forms={",
            *forms,
            "    },",
            f"    slopes={relation.key}_slopes,",
            f"    residual={relation.key}_residual,",
            f"    arguments={arguments!r},",
            "    validity=(",
            *validity,
            "    ),",
            f"    assumes={relation.assumes!r},",
            f"    source={str(relation.source)!r},",
            f"    example={dict(relation.example)!r},",
            f"    uses_gas={solved.uses_gas},",
            ")",
        ]
    )


def _variable(symbol: sympy.Symbol, meaning: Variable) -> str:
    default = None if meaning.default is None else float(meaning.default)
    values = (symbol.name, symbol_text(symbol.name), meaning.kind.key, meaning.text, SIGNS[meaning.sign], default)
    return f"        Variable({', '.join(map(repr, values))}),"


def _constant(symbol: sympy.Symbol, meaning: Constant) -> str:
    values = (symbol.name, symbol_text(symbol.name), meaning.title, float(meaning.value), meaning.unit)
    return f"        Constant({', '.join(map(repr, values))}),"


def _form_value(relation: Relation, form: Form) -> str:
    names = tuple(symbol.name for symbol in form.arguments) + (("gas",) if _needs_gas(form) else ())
    line = form_text(relation, form)
    name = form.unknown.name
    return f"        {name!r}: Form({name!r}, {relation.key}_{name}, {names!r}, {line!r}, {form.way.value!r}),"


def form_text(relation: Relation, form: Form) -> str:
    """Give the right side of a solved form as a plain line; the relation itself where it is found numerically."""
    text = TextWriter().write
    if form.way is Way.CLOSED and form.expression is not None:
        return text(form.expression)
    return f"from {text(relation.left)} = {text(relation.right)}"
