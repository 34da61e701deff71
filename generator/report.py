"""Say what the spec holds: relations, forms, proofs and outside cases, by family.

Takes ``Routed`` and the texts; gives the lines that ``check`` prints.
"""

from collections import Counter
from collections.abc import Mapping

from generator.describe import RelationText
from generator.route import Block, Routed


def report(routed: Routed, texts: Mapping[str, RelationText]) -> str:
    """Give the report of a spec that passed every check."""
    loaded = routed.checked.loaded
    lines = [f"{'family':34} {'relations':>9} {'forms':>6} {'cases':>6}"]
    for family in loaded.families:
        keys = {relation.key for relation in family.relations}
        forms = sum(len(texts[key].forms) for key in keys)
        cases = sum(case.relation in keys for case in loaded.cases)
        lines.append(f"{family.letter} {family.title:32} {len(keys):9} {forms:6} {cases:6}")
    ways = Counter(form.way for text in texts.values() for form in text.forms)
    bases = Counter(case.basis for case in loaded.cases)
    lines.append("forms: " + ", ".join(f"{count} {way}" for way, count in ways.most_common()))
    lines.append("cases: " + ", ".join(f"{count} {basis}" for basis, count in bases.most_common()))
    routes = [route for rows in routed.routes.values() for route in rows.values()]
    torn = sum(isinstance(part, Block) for route in routes for part in route)
    lines.append(f"sheets: {len(loaded.sheets)}, questions: {len(routes)}, blocks torn: {torn}")
    return "\n".join(lines)
