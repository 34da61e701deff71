"""Find a relation or a sheet by its key, importing its family only then.

Takes keys; gives emitted values, or ReadingError with the nearest keys.
"""

from importlib import import_module

from gaswright.errors import ReadingError
from gaswright.jobs.index import TITLE_OF as SHEET_TITLES
from gaswright.laws.index import FAMILY_OF
from gaswright.model import Relation, Sheet

_relations: dict[str, Relation] = {}


def relation(key: str) -> Relation:
    """Give the relation with this key; ReadingError names the nearest keys where there is none."""
    if key not in _relations:
        if key not in FAMILY_OF:
            raise _unknown("law", key, tuple(FAMILY_OF))
        _relations.update(import_module(f"gaswright.laws.{FAMILY_OF[key]}").RELATIONS)
    return _relations[key]


def sheet(key: str) -> Sheet:
    """Give the sheet with this key; ReadingError names the nearest keys where there is none."""
    if key not in SHEET_TITLES:
        raise _unknown("sheet", key, tuple(SHEET_TITLES))
    found: Sheet = import_module(f"gaswright.jobs.{key}").SHEET
    return found


def _unknown(what: str, key: str, keys: tuple[str, ...]) -> ReadingError:
    from difflib import get_close_matches  # noqa: PLC0415 - only where a key is wrong

    near = get_close_matches(key, keys, n=3, cutoff=0.4) or sorted(keys)[:3]
    return ReadingError(what, repr(key[:80]), f"a key such as {', '.join(near)}", "Correct the key.")
