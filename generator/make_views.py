"""Fill the views of every page from the routed spec, the texts and the engine just staged.

Takes ``Routed``, the texts of the relations and the staged engine; gives ``SiteView``. Worked examples and checks are
computed here by the same engine that ships. Next: generator.emit_pages draws the views.
"""

from collections.abc import Mapping

from generator.describe import RelationText
from generator.gas_views import gas_views
from generator.law_views import law_view
from generator.route import Routed
from generator.sheet_views import sheet_view
from generator.table_views import table_pages
from generator.views import FamilyView, SiteView
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
        tables=table_pages(routed),
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
