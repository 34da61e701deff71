"""Fill the views of every page from the routed spec, the texts and the engine just staged.

Takes ``Routed``, the texts of the relations and the staged engine; gives ``SiteView``. Worked examples and checks are
computed here by the same engine that ships. Next: generator.emit_pages draws the views.
"""

from collections.abc import Mapping

from generator.check import constants_of
from generator.describe import RelationText
from generator.gas_views import gas_views
from generator.law_views import law_view
from generator.route import Routed
from generator.sheet_views import sheet_view
from generator.views import FamilyView, SiteView, TableView
from spec import scenario
from spec.model import Family, Sheet


def make_views(routed: Routed, texts: Mapping[str, RelationText], *, version: str, digest: str) -> SiteView:
    """Give everything the pages draw."""
    loaded = routed.checked.loaded
    used_by = _used_by(loaded.sheets)
    cases = {key: tuple(case for case in loaded.cases if case.relation == key) for key in texts}

    def family_view(family: Family) -> FamilyView:
        laws = tuple(
            law_view(relation, family, texts[relation.key], cases[relation.key], used_by.get(relation.key, ()))
            for relation in family.relations
        )
        return FamilyView(key=family.key, letter=family.letter, title=family.title, lead=family.lead, relations=laws)

    return SiteView(
        families=tuple(family_view(family) for family in loaded.families),
        sheets=tuple(sheet_view(sheet) for sheet in loaded.sheets),
        gases=gas_views(),
        tables=(_units_table(routed), _constants_table(routed)),
        scenario=scenario.SAYS,
        version=version,
        digest=digest,
    )


def _used_by(sheets: tuple[Sheet, ...]) -> dict[str, tuple[tuple[str, str], ...]]:
    found: dict[str, list[tuple[str, str]]] = {}
    for sheet in sheets:
        for key in dict.fromkeys(use.relation.key for use in sheet.uses):
            found.setdefault(key, []).append((sheet.key, sheet.title))
    return {key: tuple(uses) for key, uses in found.items()}


def _units_table(routed: Routed) -> TableView:
    rows = tuple(
        (
            unit.key,
            unit.ucum,
            f"{float(unit.factor):.10g}",
            f"{float(unit.zero):g}" if unit.zero else "",
            str(unit.dimension),
            str(unit.source),
        )
        for unit in routed.checked.loaded.units
    )
    return TableView(
        caption="Units",
        head=("Unit", "UCUM code", "Factor to SI", "Added first", "SI base units", "Source"),
        rows=rows,
        note="SI value = (reading + what is added first) × factor. Factors are kept exactly and shown to ten digits.",
    )


def _constants_table(routed: Routed) -> TableView:
    found = {
        constant.title: (
            constant.title,
            str(symbol),
            f"{float(constant.value):.15g}",
            constant.unit,
            str(constant.source),
        )
        for relation in routed.checked.loaded.relations()
        for symbol, constant in constants_of(relation).items()
    }
    return TableView(
        caption="Constants",
        head=("Constant", "Symbol", "Value", "Unit", "Source"),
        rows=tuple(found[title] for title in sorted(found)),
        note="Exact by definition.",
    )
