"""Views of the job sheets, with their worked examples as the engine answers them.

Takes a sheet of the spec; gives its SheetView. Next: generator.make_views.
"""

from gaswright.answer_sheet import answer_sheet
from gaswright.gas import find as find_gas
from gaswright.gas import keys as gas_keys

from generator.row_views import REFERENCES, may_be_negative, measures, split, units_of
from generator.views import FindView, RowView, SheetView
from spec.model import Find, Row, Sheet


def sheet_view(sheet: Sheet) -> SheetView:
    """Give the view of one sheet."""
    rows = tuple(_row(name, row, sheet) for name, row in sheet.rows.items() if row.reading)
    request = {
        "do": "sheet",
        "key": sheet.key,
        "find": sheet.finds[0].row,
        "readings": {row.name: _typed(row) for row in rows if row.text},
        "show": {"unit": sheet.finds[0].unit},
    }
    return SheetView(
        key=sheet.key,
        title=sheet.title,
        lead=sheet.lead,
        group=sheet.group,
        finds=tuple(_find(find, sheet) for find in sheet.finds),
        rows=rows,
        cautions=tuple(caution.text for caution in sheet.cautions),
        rule=sheet.rule,
        answer=answer_sheet(request),
        request=request,
        uses=tuple((use.relation.key, use.relation.title) for use in sheet.uses),
        words=sheet.words,
    )


def _typed(row: RowView) -> dict[str, str]:
    typed = {"text": row.text, "unit": row.unit, "reference": row.reference}
    return {name: value for name, value in typed.items() if value}


def _find(find: Find, sheet: Sheet) -> FindView:
    units = units_of(sheet.rows[find.row].kind, find.unit)
    return FindView(row=find.row, ask=find.ask, label=find.label, unit=find.unit, units=units)


def _row(name: str, row: Row, sheet: Sheet) -> RowView:
    if row.is_gas:
        choices = tuple((key, f"{find_gas(key).title}, {find_gas(key).formula}") for key in gas_keys())
        return RowView(
            name=name, title=row.title, note=row.note, is_gas=True, text=sheet.example[name], choices=choices
        )
    if row.is_clock:
        return RowView(
            name=name,
            title=row.title,
            note=row.note,
            is_text=True,
            text=sheet.example.get(name, ""),
            is_optional=row.optional,
        )
    typed = split(sheet.example.get(name, ""), row.kind)
    return RowView(
        name=name,
        title=row.title,
        kind=row.kind.key,
        units=units_of(row.kind, typed.unit),
        references=REFERENCES.get(row.kind.key, ()),
        text=typed.text,
        unit=typed.unit,
        reference=typed.reference,
        note=row.note,
        site=row.site,
        accuracy=row.accuracy,
        measures="" if row.accuracy == "exact" else measures(row.kind),
        may_be_negative=may_be_negative(row.kind),
        is_found=name == sheet.finds[0].row,
        is_optional=row.optional,
    )
