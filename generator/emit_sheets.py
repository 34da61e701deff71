"""Write the routed sheets as the Python modules that ship.

Takes ``Routed``; gives {path below gaswright: text}. Next: generator.write puts them beside the hand-written part.
"""

from collections.abc import Mapping

from generator.route import Block, Route, Routed, Step
from spec.model import Find, Row, Sheet


def emit_sheets(routed: Routed) -> Mapping[str, str]:
    """Give the text of every sheet module and of their index, by path."""
    sheets = routed.checked.loaded.sheets
    modules = {f"gaswright/jobs/{sheet.key}.py": _module(sheet, routed.routes[sheet.key]) for sheet in sheets}
    titles = "\n".join(f"    {sheet.key!r}: {sheet.title!r}," for sheet in sheets)
    index = '"""The sheets and their titles, in the order of a day. Generated."""'
    return {
        **modules,
        "gaswright/jobs/__init__.py": '"""The job sheets, one module each. Generated."""\n',
        "gaswright/jobs/index.py": f"{index}\n\nTITLE_OF = {{\n{titles}\n}}\n",
    }


def _module(sheet: Sheet, routes: Mapping[str, Route]) -> str:
    rows = "\n".join(f"        {name!r}: {_row(name, row)}," for name, row in sheet.rows.items())
    uses = "\n".join(f"        Use({use.relation.key!r}, {dict(use.rows)!r})," for use in sheet.uses)
    finds = "\n".join(f"        {find.row!r}: {_find(find, routes[find.row])}," for find in sheet.finds)
    plot = (sheet.plot.function, sheet.plot.title) if sheet.plot else None
    names = "Block, Find, Row, Sheet, Step, Use" if "Block(" in finds else "Find, Row, Sheet, Step, Use"
    return "\n".join(
        [
            f'"""{sheet.title}: {sheet.lead} Generated from spec/sheets/{sheet.key}.py."""',
            "",
            f"from gaswright.model import {names}",
            "",
            "SHEET = Sheet(",
            f"    key={sheet.key!r},",
            f"    title={sheet.title!r},",
            f"    lead={sheet.lead!r},",
            f"    group={sheet.group!r},",
            f"    rows={{\n{rows}\n    }},",
            f"    uses=(\n{uses}\n    ),",
            f"    finds={{\n{finds}\n    }},",
            f"    cautions={tuple(caution.text for caution in sheet.cautions)!r},",
            f"    rule={sheet.rule!r},",
            f"    notes={sheet.notes!r},",
            f"    example={dict(sheet.example)!r},",
            f"    plot={plot!r},",
            ")",
            "",
        ]
    )


def _row(name: str, row: Row) -> str:
    low = row.kind.low if row.low is None else row.low
    high = row.kind.high if row.high is None else row.high
    values = (
        name,
        row.title,
        row.kind.key,
        row.note,
        row.reading,
        row.site,
        row.accuracy,
        low,
        high,
        row.unusual_above,
        row.whole,
        row.of_gas,
        row.is_gas,
        row.optional,
        row.is_clock,
    )
    return f"Row({', '.join(map(repr, values))})"


def _find(find: Find, route: Route) -> str:
    values = (find.row, find.ask, find.label, find.safe, find.unit, find.limit, find.limit_text, find.clock)
    return f"Find({', '.join(map(repr, values))}, ({' '.join(_part(part) + ',' for part in route)}))"


def _part(part: Step | Block) -> str:
    if isinstance(part, Step):
        return f"Step({part.use}, {part.unknown!r}, {part.row!r})"
    return f"Block({part.torn!r}, {part.use}, ({' '.join(_part(step) + ',' for step in part.steps)}))"
