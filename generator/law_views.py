"""Views of the laws: formula, solved forms, outside checks, worked example.

Takes a relation, its texts and its cases; gives its RelationView. Next: generator.make_views.
"""

import re
from dataclasses import replace

from gaswright import any_kind
from gaswright.answer_law import SIDE_ROW, answer_relation
from gaswright.evaluate import words
from gaswright.find import relation as find_law
from gaswright.gas import find as find_gas
from gaswright.gas import keys as gas_keys
from gaswright.law import solve
from gaswright.quantity import in_unit, with_unit
from gaswright.reading import read
from gaswright.show import significant
from gaswright.tables import KINDS

from generator.check import constants_of, variables_of
from generator.describe import FormText, RelationText
from generator.figures import figure_of
from generator.load import Case
from generator.printers import mathml, symbol_latex, symbol_text
from generator.row_views import ANY_UNITS, REFERENCES, Typed, may_be_negative, settled, split, units_of
from generator.terms import expand, lists_of
from generator.views import CheckView, FormView, RelationView, RowView
from spec import scenario
from spec.kinds import STATION_PRESSURE
from spec.model import Family, GasName, Kind, Relation, Sign, Variable

STATION = "p_station"
COUNTED = ("absolute_pressure", "gauge_pressure", "vacuum_pressure")
CHECK_DIGITS = 6


def law_view(
    relation: Relation,
    family: Family,
    text: RelationText,
    cases: tuple[Case, ...],
    used_by: tuple[tuple[str, str], ...],
) -> RelationView:
    """Give the view of one law; one over lists is shown with the terms of its example."""
    plain = shown(relation)
    rows = _rows(plain)
    find = _found(plain)
    request = {
        "do": "relation",
        "key": relation.key,
        "find": find,
        "rows": {
            row.name: {"text": row.text, "unit": row.unit, "reference": row.reference} for row in rows if row.text
        },
    }
    return RelationView(
        key=relation.key,
        title=relation.title,
        family_key=family.key,
        family=family.title,
        mathml=text.mathml,
        text=text.text,
        parts=text.parts,
        assumes=relation.assumes,
        validity=tuple(dict.fromkeys(item.says for item in relation.valid)),
        source=str(relation.source),
        rows=rows,
        constants=tuple(
            (constant.title, f"{float(constant.value):.15g} {constant.unit}", str(constant.source))
            for constant in constants_of(relation).values()
        ),
        find=find,
        finds=tuple(row.name for row in rows if may_be_found(relation, row.name)),
        is_over_lists=bool(lists_of(relation)),
        forms=tuple(_form(relation, form) for form in text.forms),
        checks=tuple(map(_check, cases)),
        answer=answer_relation(request),
        nature=relation.nature.value,
        used_by=used_by,
        words=relation.words,
        figure=figure_of(
            relation.key, find, {row.name: _whole(row) for row in rows if row.text and row.name != STATION}
        ),
    )


def _whole(row: RowView) -> str:
    """Give the reading that stands in a row at the start as one text."""
    return " ".join(part for part in (row.text, row.unit, row.reference) if part not in ("", "1"))


def shown(relation: Relation) -> Relation:
    """Give the relation with its lists written out for the terms of its example."""
    lists = lists_of(relation)
    if not lists:
        return relation
    entries = {name: typed for name, typed in relation.example.items() if not isinstance(typed, str)}
    count = max(map(len, entries.values()))
    example = {name: typed for name, typed in relation.example.items() if isinstance(typed, str)}
    for name, typed in entries.items():
        example |= {f"{name}_{place}": text for place, text in enumerate(typed, 1) if text}
    return replace(expand(relation, count, every=True), example=example)


def may_be_found(relation: Relation, name: str) -> bool:
    """Tell whether a row may be asked for."""
    names = {symbol.name for symbol in variables_of(relation) if symbol not in (*relation.turned, *relation.data)}
    return re.sub(r"(_i)_\d+$", r"\1", name) in names


def _found(relation: Relation) -> str:
    """Give the unknown of the example: the first variable that it leaves out and that has no default."""
    return next(
        str(symbol.name)
        for symbol, variable in variables_of(relation).items()
        if symbol.name not in relation.example and variable.default is None
    )


def _rows(relation: Relation) -> tuple[RowView, ...]:
    found = _found(relation)
    rows = [_row(symbol.name, variable, relation, found) for symbol, variable in variables_of(relation).items()]
    if any(isinstance(meaning, GasName) for meaning in relation.where.values()):
        choices = tuple((key, f"{find_gas(key).title}, {find_gas(key).formula}") for key in gas_keys())
        rows.insert(0, RowView(name="gas", title="Gas", is_gas=True, text=_typed(relation, "gas"), choices=choices))
    if any(split.below and split.above for split in relation.splits):
        rows.append(_side_row(relation))
    kinds = {variable.kind.key for variable in variables_of(relation).values()}
    if kinds & set(COUNTED) and "station_pressure" not in kinds:
        typed = split(scenario.STATION_PRESSURE, STATION_PRESSURE)
        rows.append(
            RowView(
                name=STATION,
                title="Station pressure",
                kind="station_pressure",
                units=STATION_PRESSURE.units,
                references=("absolute",),
                text=typed.text,
                unit=typed.unit,
                reference="absolute",
                is_optional=True,
                note="for readings in gauge or vacuum",
            )
        )
    return tuple(rows)


def _side_row(relation: Relation) -> RowView:
    """Give the row that says which of two values is meant."""
    sides = dict.fromkeys(name for split in relation.splits for name in (split.below, split.above) if name)
    return RowView(
        name=SIDE_ROW,
        title="Which of two answers",
        note="asked where two values fit",
        is_optional=True,
        choices=tuple((name, words(name)) for name in sides),
    )


def _row(name: str, variable: Variable, relation: Relation, found: str) -> RowView:
    default = "" if variable.default is None else f"{float(variable.default):g}"
    is_any = variable.kind.key == any_kind.ANY
    variable = replace(variable, kind=_kind_shown(relation, variable))
    typed = (
        Typed(_typed(relation, name), "", "")
        if variable.choices
        else split(_typed(relation, name, default), variable.kind)
    )
    unit = typed.unit if name in relation.example else _like(relation, variable) or typed.unit
    return RowView(
        name=name,
        title=f"{variable.text[:1].upper()}{variable.text[1:]}",
        symbol=symbol_text(name),
        mathml=mathml(symbol_latex(name), display="inline"),
        kind=variable.kind.key,
        units=_units(variable, unit, is_any=is_any),
        references=REFERENCES.get(variable.kind.key, ()),
        text=typed.text,
        unit=unit,
        reference=typed.reference,
        is_found=name == found,
        may_be_negative=variable.sign is Sign.ANY or may_be_negative(variable.kind),
        is_optional=variable.default is not None,
        choices=tuple((word, word) for word in variable.choices),
        term=int(place) if (place := name.rpartition("_i_")[2]).isdigit() and "_i_" in name else 0,
    )


def _units(variable: Variable, unit: str, *, is_any: bool) -> tuple[str, ...]:
    """Give the units a row offers; one of any kind offers those of several."""
    if variable.choices:
        return ()
    if is_any:
        return tuple(dict.fromkeys((*units_of(variable.kind, unit), *ANY_UNITS)))
    return units_of(variable.kind, unit)


def _kind_shown(relation: Relation, variable: Variable) -> Kind:
    """Give the kind of a row; where it may be any, that of the example."""
    alike = [symbol.name for symbol, each in variables_of(relation).items() if each.kind == variable.kind]
    return settled(next((typed for name in alike if (typed := _typed(relation, name))), ""), variable.kind)


def _typed(relation: Relation, name: str, default: str = "") -> str:
    """Give the example's reading of one row."""
    typed = relation.example.get(name, default)
    return typed if isinstance(typed, str) else default


def _like(relation: Relation, variable: Variable) -> str:
    """Give the unit of an example reading of the same kind."""
    same = (
        symbol.name
        for symbol, other in variables_of(relation).items()
        if other.kind == variable.kind and symbol.name in relation.example
    )
    name = next(same, "")
    return split(_typed(relation, name), variable.kind).unit if name else ""


def _form(relation: Relation, form: FormText) -> FormView:
    variables = {symbol.name: variable for symbol, variable in variables_of(relation).items()}
    own = variables[form.unknown].kind
    notes: dict[str, list[str]] = {}
    for name, variable in variables.items():
        if name != form.unknown and variable.kind.si != "1":
            notes.setdefault(f"in {variable.kind.si}. {variable.kind.note}".strip(), []).append(symbol_text(name))
    return FormView(
        unknown=form.unknown,
        symbol=form.symbol,
        mathml=form.mathml,
        text=form.text,
        way=f"{form.way}; {form.proof}",
        unit_note=f"{form.symbol} in {own.si}." if own.si != "1" else "A number.",
        argument_notes=tuple(f"{', '.join(names)} {note}" for note, names in notes.items()),
        sensitivities=form.sensitivities,
    )


def _check(case: Case) -> CheckView:
    """Show a published number beside what this engine gives from the same readings."""
    result = solve(case.relation, case.find, dict(case.given), station_pressure=None)
    kind = KINDS[_kind_of(case)]
    published = read(case.find, case.expect, kind)
    here = significant(in_unit(result.value, kind, published.unit), CHECK_DIGITS)
    given = ", ".join(f"{symbol_text(name)} = {text}" for name, text in case.given.items())
    return CheckView(
        given=given, published=case.expect, here=with_unit(here, published.unit), source=case.source, basis=case.basis
    )


def _kind_of(case: Case) -> str:
    law = any_kind.settled(find_law(case.relation), case.given)
    return law.variable(case.find).kind
