"""Write a solved relation as Python, and a family of them as a module that ships.

Takes a SolvedRelation, or families with the text of their relations; gives text. One module per family, imported
only when one of its relations is asked for, and an index of all. Next: generator.pipeline stages them beside the
hand-written part.
"""

from collections.abc import Iterator, Mapping
from textwrap import wrap

import sympy

from generator.check import constants_of, variables_of
from generator.parameters import OWN, Parameter, form_parameters, terms_name, whole_parameters
from generator.parts import put_in, used_parts
from generator.printers import PythonWriter, TextWriter, name_choices, symbol_text
from generator.solve import Form, SolvedRelation, Way, evaluated
from generator.terms import is_per_term, lists_of, own_symbol
from spec.model import Constant, Family, Relation, Sign, Validity, Variable
from spec.symbols import is_list

MATH_NAMES = ("pow", "sqrt", "log", "exp", "sin", "cos", "asin", "erf", "pi")
SIGNS = {Sign.POSITIVE: "positive", Sign.NONNEGATIVE: "nonnegative", Sign.ANY: "any"}
WIDTH = 110
SIDE = "side"


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
    if "Sequence[" in body:
        head += ["from collections.abc import Sequence", ""]
    uses_gas = '"Gas"' in body
    if uses_gas:
        head += ["from typing import TYPE_CHECKING", ""]
    head += ["from gaswright.model import Constant, Form, Relation, Validity, Variable"]
    roots = [name for name in ("find_root", "find_root_beside", "polynomial_root") if _is_used(name, body)]
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


def _signature(parameters: tuple[Parameter, ...], *, is_gas: bool) -> str:
    names = [f"{parameter.name}: {parameter.annotation}" for parameter in parameters]
    return ", ".join([*names, 'gas: "Gas"'] if is_gas else names)


def _needs_gas(form: Form) -> bool:
    if form.way is Way.GAS:
        return True
    return form.expression is not None and bool(form.expression.atoms(sympy.core.function.AppliedUndef))


def _form(solved: SolvedRelation, form: Form) -> str:
    relation = solved.relation
    variable = variables_of(relation)[form.unknown]
    name = f"{relation.key}_{form.unknown.name}"
    parameters = form_parameters(relation, form.unknown, _expressions(relation, form))
    if _is_asked(form):
        parameters = (*parameters, Parameter(SIDE, "str", sympy.Symbol(SIDE), ""))
    lines = [
        f"def {name}({_signature(parameters, is_gas=_needs_gas(form))}) -> float:",
        *_docstring(relation, form, variable, parameters),
        *_constants(relation, _expressions(relation, form)),
        *_body(relation, form),
    ]
    return "\n".join(lines)


def _expressions(relation: Relation, form: Form) -> tuple[sympy.Expr, ...]:
    if form.way is Way.NUMERIC:
        return (relation.left, relation.right, *([form.split.at] if form.split else []))
    if form.way is Way.GAS:
        return form.method_arguments
    return form.coefficients or (form.expression,)


WHICH = {"": "", "terms": " of every term", "others": " of each other term"}


def _docstring(relation: Relation, form: Form, variable: Variable, parameters: tuple[Parameter, ...]) -> Iterator[str]:
    yield f'    """Give the {variable.text} [{variable.kind.si}]: {form.way.value}.'
    yield ""
    for parameter in parameters:
        if parameter.name == SIDE:
            yield (
                f"    {SIDE}: {form.split.below} or {form.split.above}, the side of the turning point."
                if form.split
                else ""
            )
            continue
        other = variables_of(relation)[parameter.symbol]
        which = WHICH[parameter.terms]
        yield f"    {parameter.name}: {other.text}{which} [{other.kind.si}], {other.sign.value}."
    for line in wrap(f"Assumes {'; '.join(relation.assumes)}. Source: {relation.source}.", WIDTH - 4):
        yield f"    {line}"
    yield '    """'


def _constants(relation: Relation, expressions: tuple[sympy.Basic, ...]) -> Iterator[str]:
    """Set the constants that the expressions and their parts need."""
    needed = (*expressions, *used_parts(relation.parts, expressions).values())
    for symbol, constant in constants_of(relation).items():
        if any(expression.has(symbol) for expression in needed):
            yield f"    {symbol.name} = {float(constant.value)!r}"


def _parts(relation: Relation, expressions: tuple[sympy.Basic, ...], indent: str = "    ") -> Iterator[str]:
    """Work out the parts that the expressions need."""
    for symbol, value in used_parts(relation.parts, expressions).items():
        yield f"{indent}{symbol.name} = {PythonWriter().write(value)}"


def _body(relation: Relation, form: Form) -> Iterator[str]:
    write = PythonWriter().write
    kind = variables_of(relation)[form.unknown].kind
    low, high = (kind.low if kind.low < 0 else max(kind.low, 1e-300)), kind.high
    where = f"{relation.title}, {form.unknown.name}"
    if form.way is not Way.NUMERIC:
        yield from _parts(relation, _expressions(relation, form))
    if form.way is Way.CLOSED and form.expression is not None:
        yield f"    return {write(form.expression)}"
    elif form.way is Way.GAS:
        yield f"    return gas.{form.method}({', '.join(write(part) for part in form.method_arguments)})"
    elif form.way is Way.POLYNOMIAL and form.root is not None:
        coefficients = ", ".join(write(part) for part in form.coefficients)
        yield f"    return polynomial_root(({coefficients}), {low!r}, {high!r}, {form.root.value!r}, {where!r})"
    else:
        yield f"    def residual({form.unknown.name}: float) -> float:"
        yield from _parts(relation, (relation.left, relation.right), "        ")
        yield f"        return {write(relation.left)} - ({write(relation.right)})"
        yield ""
        yield from _search(form, low, high, where)


def _whole(solved: SolvedRelation) -> tuple[Parameter, ...]:
    relation = solved.relation
    return whole_parameters(variables_of(relation), is_per_term=is_per_term(relation))


def _own_terms(relation: Relation, *, is_named_own: bool = False) -> Iterator[str]:
    """Take the term in question out of each list, where the relation speaks of one."""
    if is_per_term(relation):
        for symbol in lists_of(relation):
            name = own_symbol(symbol).name if is_named_own else symbol.name
            yield f"    {name} = {terms_name(symbol)}[{OWN}]"


def _search(form: Form, low: float, high: float, where: str) -> Iterator[str]:
    """Seek the root over the whole range, or on one side of the turning point."""
    if form.split is None:
        yield f"    return find_root(residual, {low!r}, {high!r}, {where!r})"
        return
    yield "    def turn() -> float:"
    yield f"        return {PythonWriter().write(form.split.at)}"
    yield ""
    is_above = f"{SIDE} == {form.split.above!r}" if _is_asked(form) else repr(bool(form.split.above))
    yield f"    return find_root_beside(residual, turn, {low!r}, {high!r}, {where!r}, is_above={is_above})"


def _is_asked(form: Form) -> bool:
    """Tell whether both sides of the turning point are physical, so that one must be chosen."""
    return form.split is not None and bool(form.split.below and form.split.above)


def _residual(solved: SolvedRelation) -> str:
    relation = solved.relation
    write = PythonWriter().write
    return "\n".join(
        [
            f"def {relation.key}_residual({_signature(_whole(solved), is_gas=solved.uses_gas)}) -> float:",
            '    """Give left - right of the relation, in SI."""',
            *_constants(relation, (relation.left, relation.right)),
            *_own_terms(relation),
            *_parts(relation, (relation.left, relation.right)),
            f"    return {write(relation.left)} - ({write(relation.right)})",
        ]
    )


def _slopes(solved: SolvedRelation) -> str:
    relation = solved.relation
    variables = tuple(variables_of(relation))
    names = ", ".join(symbol.name for symbol in variables)
    types = ["list[float]" if is_list(symbol) else "float" for symbol in variables]
    signature = _signature(_whole(solved), is_gas=solved.uses_gas)
    return "\n".join(
        [
            f"def {relation.key}_slopes({signature}) -> tuple[{', '.join(types)}]:",
            f'    """Give the partial derivatives of left - right by {names}."""',
            *_constants(relation, (*solved.slopes.values(), *solved.own_slopes.values())),
            *_own_terms(relation, is_named_own=True),
            *_own_slopes(solved),
            *_parts(relation, tuple(solved.slopes.values())),
            "    return (",
            *(f"        {_slope(solved, symbol)}," for symbol in variables),
            "    )",
        ]
    )


def _own_slopes(solved: SolvedRelation) -> Iterator[str]:
    """Add to each list's slopes what the term in question does outside the sums."""
    write = PythonWriter().write
    for name, slope in solved.own_slopes.items():
        symbol = sympy.Symbol(name)
        yield f"    {terms_name(symbol, 'slopes')}: list[float] = {_each_slope(solved, name)}"
        yield f"    {terms_name(symbol, 'slopes')}[{OWN}] += {write(slope)}"


def _slope(solved: SolvedRelation, symbol: sympy.Symbol) -> str:
    if symbol.name in solved.own_slopes:
        return terms_name(symbol, "slopes")
    return _each_slope(solved, symbol.name) if is_list(symbol) else PythonWriter().write(solved.slopes[symbol.name])


def _each_slope(solved: SolvedRelation, name: str) -> str:
    """Give the slopes by every term of a list: one expression, at each term's own values."""
    slope = solved.slopes[name]
    lists = [symbol for symbol in lists_of(solved.relation) if slope.has(symbol) or symbol.name == name]
    return PythonWriter().each(slope, lists)


def _validity_arguments(relation: Relation, validity: Validity) -> list[sympy.Symbol]:
    whole = put_in(validity.holds, relation.parts)
    return [symbol for symbol in variables_of(relation) if whole.has(symbol)]


def _validity_function(relation: Relation, place: int, validity: Validity) -> str:
    names = _signature(whole_parameters(_validity_arguments(relation, validity), is_per_term=False), is_gas=False)
    write = PythonWriter().write
    sides = f"{write(evaluated(validity.holds.lhs))} {validity.holds.rel_op} {write(evaluated(validity.holds.rhs))}"
    return "\n".join(
        [
            f"def {relation.key}_holds_{place}({names}) -> bool:",
            '    """Tell whether the relation holds there."""',
            *_constants(relation, (validity.holds,)),
            *_parts(relation, (validity.holds,)),
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
            *_list_fields(relation),
            ")",
        ]
    )


def _list_fields(relation: Relation) -> Iterator[str]:
    """Give the fields that only a relation over lists has."""
    if lists_of(relation):
        yield f"    lists={tuple(symbol.name for symbol in lists_of(relation))!r},"
        yield f"    is_per_term={is_per_term(relation)},"
    if relation.turned:
        yield f"    turned={ {symbol.name: key for symbol, key in relation.turned.items()}!r},"


def _variable(symbol: sympy.Symbol, meaning: Variable) -> str:
    default = None if meaning.default is None else float(meaning.default)
    facts = (symbol.name, symbol_text(symbol.name), meaning.kind.key, meaning.text, SIGNS[meaning.sign], default)
    values: tuple[object, ...] = (*facts, meaning.choices) if meaning.choices else facts
    return f"        Variable({', '.join(map(repr, values))}),"


def _constant(symbol: sympy.Symbol, meaning: Constant) -> str:
    values = (symbol.name, symbol_text(symbol.name), meaning.title, float(meaning.value), meaning.unit)
    return f"        Constant({', '.join(map(repr, values))}),"


def _form_value(relation: Relation, form: Form) -> str:
    parameters = form_parameters(relation, form.unknown, _expressions(relation, form))
    names = tuple(parameter.name for parameter in parameters) + (("gas",) if _needs_gas(form) else ())
    line = form_text(relation, form)
    name = form.unknown.name
    values = (repr(name), f"{relation.key}_{name}", repr(names), repr(line), repr(form.way.value))
    sides = f", {(form.split.below, form.split.above)!r}" if form.split and _is_asked(form) else ""
    return f"        {name!r}: Form({', '.join(values)}{sides}),"


def form_text(relation: Relation, form: Form) -> str:
    """Give the right side of a solved form as a plain line; the relation itself where it is found numerically."""
    text = TextWriter().write
    if form.way is Way.CLOSED and form.expression is not None:
        return text(put_in(form.expression, relation.parts))
    parts = ", ".join(f"{text(symbol)} = {text(value)}" for symbol, value in relation.parts.items())
    whole = f"from {text(relation.left)} = {text(relation.right)}{f', with {parts}' if parts else ''}"
    return name_choices(relation, whole)
