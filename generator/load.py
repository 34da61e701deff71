"""Collect the spec, the cases and their places into one value.

Takes the project's root; gives ``Loaded``. The only stage that reads the spec. Next: generator.check.
"""

import importlib
import tomllib
from dataclasses import dataclass
from pathlib import Path
from typing import Any

from generator.errors import SpecError
from spec.model import Family, Kind, Relation, Sheet, Unit


@dataclass(frozen=True, slots=True, kw_only=True)
class Case:
    """A number from outside: readings as typed, the published figure as printed, its source and how far it is trusted.

    ``rounding`` is ``printed`` (half a unit in the last place), ``truncated``, ``exact`` or ``publisher`` (the source
    rounded on the way; ``within`` then states the width).
    """

    name: str
    relation: str
    find: str
    given: dict[str, str]
    expect: str
    source: str
    basis: str
    rounding: str = "printed"
    within: str = ""
    note: str = ""
    branch: str = ""


@dataclass(frozen=True, slots=True, kw_only=True)
class Loaded:
    """Everything the spec says, unchecked."""

    families: tuple[Family, ...]
    sheets: tuple[Sheet, ...]
    kinds: tuple[Kind, ...]
    units: tuple[Unit, ...]
    gases: tuple[Any, ...]
    cases: tuple[Case, ...]

    def relations(self) -> tuple[Relation, ...]:
        """Give every relation, in the order of the catalogue."""
        return tuple(relation for family in self.families for relation in family.relations)


def load(root: Path) -> Loaded:
    """Import the spec and read the case files under ``root``."""
    return Loaded(
        families=importlib.import_module("spec.relations").FAMILIES,
        sheets=importlib.import_module("spec.sheets").SHEETS,
        kinds=importlib.import_module("spec.kinds").ALL,
        units=importlib.import_module("spec.units").ALL,
        gases=importlib.import_module("spec.gases").ALL,
        cases=read_cases(root / "spec" / "cases"),
    )


def read_cases(folder: Path) -> tuple[Case, ...]:
    """Read every case file of ``folder`` in the order of names."""
    cases: list[Case] = []
    for path in sorted(folder.glob("*.toml")):
        entries = tomllib.loads(path.read_text(encoding="utf-8")).get("case", [])
        cases.extend(_case(entry, f"spec/cases/{path.name}, case {place}") for place, entry in enumerate(entries, 1))
    return tuple(cases)


REQUIRED = ("relation", "find", "given", "expect", "source", "basis")
OPTIONAL = ("rounding", "within", "note", "branch")


def _case(entry: dict[str, Any], place: str) -> Case:
    missing = [key for key in REQUIRED if key not in entry]
    unknown = [key for key in entry if key not in (*REQUIRED, *OPTIONAL)]
    if missing or unknown:
        raise SpecError(
            where=place,
            found=f"missing {', '.join(missing) or 'nothing'}, unknown {', '.join(unknown) or 'nothing'}",
            expected=f"the keys {', '.join(REQUIRED)} and perhaps {', '.join(OPTIONAL)}",
            todo="correct the entry",
        )
    return Case(name=place, **_written_out(entry, place))


def _written_out(entry: dict[str, Any], place: str) -> dict[str, Any]:
    """Write lists of readings out as one for each term; an empty text marks the terms that are not given."""
    given: dict[str, str] = {}
    find = entry["find"]
    for name, typed in entry["given"].items():
        entries = {f"{name}_{place}": text for place, text in enumerate(typed, 1)} if isinstance(typed, list) else {}
        if name == find and "" not in typed:
            raise SpecError(
                where=place,
                found=f"the list {find} to find, with every term given",
                expected="one term left empty",
                todo='put "" in the place of the term to find',
            )
        find = next((key for key, text in entries.items() if name == entry["find"] and not text), find)
        given |= {key: text for key, text in entries.items() if text} if entries else {name: typed}
    return entry | {"given": given, "find": find}
