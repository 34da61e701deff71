"""Turn every relation into the texts that ship: Python, plain lines, MathML.

Takes ``Checked`` and the cache folder; gives a ``RelationText`` per relation. Solving is the slow part of a build,
so the texts are kept in the cache, keyed by the relation, sympy's version and the code of the stages that made them.
Next: generator.emit_engine and generator.make_views.
"""

import hashlib
import json
from collections.abc import Mapping
from concurrent.futures import ProcessPoolExecutor
from dataclasses import asdict, dataclass
from pathlib import Path

import sympy

from generator.arrange import arrange
from generator.check import Checked, variables_of
from generator.emit_engine import form_text, relation_python
from generator.errors import SpecError
from generator.parts import slope, used_parts
from generator.printers import TextWriter, equation_mathml, latex, mathml, name_choices, symbol_latex, symbol_text
from generator.solve import Form, SolvedRelation, Way, order_of, solve_relation
from generator.terms import slope_by_term
from spec.model import Relation
from spec.symbols import is_list

STAGES = (
    "arrange",
    "check",
    "describe",
    "emit_engine",
    "isolate",
    "parameters",
    "parts",
    "printers",
    "prove",
    "solve",
    "terms",
)
HERE = Path(__file__).parent


@dataclass(frozen=True, slots=True, kw_only=True)
class FormText:
    """A solved form as a page and a working line show it."""

    unknown: str
    symbol: str
    way: str
    text: str
    mathml: str
    proof: str
    sensitivities: tuple[tuple[str, str], ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class RelationText:
    """A relation as text: the Python that ships, the equation, and a form for each unknown."""

    key: str
    python: str
    text: str
    mathml: str
    forms: tuple[FormText, ...]
    parts: tuple[tuple[str, str], ...] = ()


def describe(checked: Checked, cache: Path) -> Mapping[str, RelationText]:
    """Give the texts of every relation by key; solve those that are not in the cache, on all cores."""
    families = {relation.key: family.key for family in checked.loaded.families for relation in family.relations}
    relations = {relation.key: relation for relation in checked.loaded.relations()}
    code = stage_digest()
    texts = {key: _from_cache(cache / f"{_digest(relation, code)}.json") for key, relation in relations.items()}
    missing = [key for key, text in texts.items() if text is None]
    mistakes: list[SpecError] = []
    with ProcessPoolExecutor() as workers:
        jobs = {key: workers.submit(solve_by_key, families[key], key) for key in missing}
        for key, job in jobs.items():
            problem = job.exception()
            if isinstance(problem, SpecError):
                mistakes.append(problem)
            else:
                texts[key] = job.result()
    if mistakes:
        raise ExceptionGroup("the spec cannot be solved", mistakes)
    for key in missing:
        _to_cache(cache / f"{_digest(relations[key], code)}.json", texts[key])
    return {key: text for key, text in texts.items() if text is not None}


def solve_by_key(family: str, key: str) -> RelationText:
    """Solve one relation in a worker process, which imports the spec itself: opaque functions do not travel."""
    from spec.relations import FAMILIES  # noqa: PLC0415 - in the worker

    relation = next(item for item in next(part for part in FAMILIES if part.key == family).relations if item.key == key)
    return describe_relation(relation, family)


def describe_relation(relation: Relation, family: str) -> RelationText:
    """Solve one relation and write its texts."""
    solved = solve_relation(relation)
    text = TextWriter().write
    return RelationText(
        key=relation.key,
        python=relation_python(solved, family),
        text=_equation(relation),
        mathml=equation_mathml(relation.left, relation.right),
        forms=tuple(_form(solved, form) for form in solved.forms.values()),
        parts=tuple(
            (
                name_choices(relation, f"{text(symbol)} = {text(value)}"),
                mathml(name_choices(relation, f"{latex(symbol)} = {latex(value)}")),
            )
            for symbol, value in relation.parts.items()
        ),
    )


def _equation(relation: Relation) -> str:
    text = TextWriter().write
    return f"{text(relation.left)} = {text(relation.right)}"


def _form(solved: SolvedRelation, form: Form) -> FormText:
    relation = solved.relation
    name = form.unknown.name
    is_closed = form.way is Way.CLOSED and form.expression is not None
    return FormText(
        unknown=name,
        symbol=symbol_text(name),
        way=form.way.value,
        text=f"{symbol_text(name)} = {form_text(relation, form)}" if is_closed else f"from {_equation(relation)}",
        mathml=mathml(f"{symbol_latex(name)} = {latex(form.expression)}") if is_closed else "",
        proof=form.proof,
        sensitivities=_sensitivities(relation, form) if is_closed else (),
    )


def _sensitivities(relation: Relation, form: Form) -> tuple[tuple[str, str], ...]:
    expression = sympy.sympify(form.expression)
    found = []
    inside = [expression, *used_parts(relation.parts, [expression]).values()]
    for symbol in [symbol for symbol in variables_of(relation) if any(part.has(symbol) for part in inside)]:
        plain = expression.doit()
        moved = slope(plain, symbol, relation.parts) + (slope_by_term(plain, symbol) if is_list(symbol) else 0)
        if moved == 0:  # a list that stands only in the sum over the other terms
            continue
        by_symbol = arrange(sympy.factor_terms(moved), order_of(relation))
        label = f"∂{symbol_text(form.unknown.name)}/∂{symbol_text(symbol.name)}"
        found.append((label, TextWriter().write(by_symbol)))
    return tuple(found)


def stage_digest() -> str:
    """Give the digest of sympy's version and of the code that turns a relation into text."""
    parts = [sympy.__version__.encode(), *((HERE / f"{stage}.py").read_bytes() for stage in STAGES)]
    return hashlib.sha256(b"\0".join(parts)).hexdigest()


def _digest(relation: Relation, code: str) -> str:
    facts = [sympy.srepr(relation.left), sympy.srepr(relation.right), repr(relation), code]
    facts += [sympy.srepr(item.holds) for item in relation.valid]
    facts += [sympy.srepr(item.at) for item in relation.splits]
    facts += [sympy.srepr(part) for part in relation.parts.values()]
    return hashlib.sha256("\0".join(facts).encode()).hexdigest()


def _from_cache(path: Path) -> RelationText | None:
    if not path.exists():
        return None
    facts = json.loads(path.read_text(encoding="utf-8"))
    forms = tuple(
        FormText(**{**form, "sensitivities": tuple(tuple(pair) for pair in form["sensitivities"])})
        for form in facts.pop("forms")
    )
    parts = tuple((text, element) for text, element in facts.pop("parts"))
    return RelationText(**facts, forms=forms, parts=parts)


def _to_cache(path: Path, text: RelationText | None) -> None:
    if text is not None:
        path.parent.mkdir(parents=True, exist_ok=True)
        path.write_text(json.dumps(asdict(text)), encoding="utf-8")
