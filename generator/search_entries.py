"""What the search field looks through: one entry per page, sheet and gas.

Takes the ``SiteView``; gives the text of a classic script that hands the entries to the page.
``emit_pages`` writes it; app/search.ts builds the index from it when the field is first used.
"""

import json
from collections.abc import Iterator

from generator.views import SiteView

Entry = dict[str, str]


def write_entries(view: SiteView) -> str:
    """The script ``search/entries.js``."""
    entries = [{"id": str(number), **entry} for number, entry in enumerate(list_entries(view))]
    return f"globalThis.gaswrightEntries={json.dumps(entries, ensure_ascii=False, sort_keys=True)};\n"


def list_entries(view: SiteView) -> Iterator[Entry]:
    """One entry per place a reader may want to go to."""
    for sheet in view.sheets:
        words = " ".join((sheet.lead, *sheet.words, *(row.title for row in sheet.rows)))
        yield {"href": f"sheets.html#{sheet.key}", "title": sheet.title, "part": "sheet", "words": words}
    for family in view.families:
        for law in family.relations:
            words = " ".join((law.text, family.title, *law.words, *law.assumes, *(row.title for row in law.rows)))
            yield {"href": f"laws/{law.key}.html", "title": law.title, "part": "law", "words": words}
    for gas in view.gases:
        words = " ".join((gas.formula, *gas.words, *(value for _, value in gas.identity)))
        yield {"href": f"gases/{gas.key}.html", "title": gas.title, "part": "gas", "words": words}
    for page in view.tables:
        words = " ".join((page.lead, *page.words, *(table.caption for table in page.tables)))
        yield {"href": f"tables/{page.key}.html", "title": page.title, "part": "table", "words": words}
    yield {"href": "sheets.html#site", "title": "Site conditions", "part": "sheet", "words": "barometer weather"}
    yield {
        "href": "sheets.html#instruments",
        "title": "Instruments",
        "part": "sheet",
        "words": "gauge class due date",
    }
