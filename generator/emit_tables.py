"""Write the units and kinds as the table that ships.

Takes the spec's units and kinds; gives the text of ``gaswright/tables.py``. Next: gaswright.unit and gaswright.reading.
"""

import re
from collections.abc import Iterable, Mapping

from generator.errors import SpecError
from spec.dimensions import Dimension
from spec.model import Kind, Unit
from spec.unit_words import ASKED_PAIR, PRODUCTS, QUESTIONS, WITH_PAIR

LEFT_OUT = str.maketrans("", "", " .")
PLAIN = str.maketrans({"²": "^2", "³": "^3", "₂": "2", "μ": "µ"})
POWER_AT_END = re.compile(r"([A-Za-z])\^?([23])$")


def emit_tables(units: Iterable[Unit], kinds: Iterable[Kind]) -> str:
    """Give the module text: units by key, spellings, field words, kinds by key. Raises SpecError: a spelling twice."""
    units = tuple(units)
    lines = [
        '"""Units of measurement and kinds of quantity. Generated from spec/units.py and spec/kinds.py."""',
        "",
        "from gaswright.records import Kind, Unit",
        "",
        *_table("UNITS", {unit.key: _unit(unit) for unit in units}),
        *_table("SPELLINGS", {word: repr(key) for word, key in spellings(units).items()}),
        *_table("PRODUCTS", _by_form(PRODUCTS)),
        *_table("WITH_PAIR", _by_form(WITH_PAIR)),
        *_table("ASKED_PAIR", _by_form(ASKED_PAIR)),
        *_table("QUESTIONS", {compact(word): repr(offers) for word, offers in QUESTIONS.items()}),
        *_table("KINDS", {kind.key: _kind(kind) for kind in kinds}),
        "",
    ]
    return "\n".join(lines)


def compact(word: str) -> str:
    """Give a spelling as the engine compares it: no blanks or full stops, raised digits behind ``^``."""
    return word.translate(PLAIN).translate(LEFT_OUT)


def forms(word: str) -> tuple[str, ...]:
    """Give the compact spelling, and where it ends in a power both ways of typing that: ``Nm3`` and ``Nm^3``."""
    one = compact(word)
    return tuple(dict.fromkeys((one, POWER_AT_END.sub(r"\1\2", one), POWER_AT_END.sub(r"\1^\2", one))))


def _by_form(words: Mapping[str, object]) -> dict[str, str]:
    return {form: repr(meaning) for word, meaning in words.items() for form in forms(word)}


def spellings(units: Iterable[Unit]) -> dict[str, str]:
    """Give every compact spelling with its unit's key. Raises SpecError where two units claim one spelling."""
    found: dict[str, str] = {}
    for unit in units:
        for word in (form for typed in (unit.key, *unit.spellings) for form in forms(typed)):
            owner = found.setdefault(word, unit.key)
            if owner != unit.key:
                raise SpecError(
                    f"spec.units, {unit.key}",
                    f"the spelling {word!r}, which {owner} has",
                    "one unit for one spelling",
                    "Take it from one of them, or ask about it in spec.unit_words.",
                )
    return found


def _table(name: str, values: Mapping[str, str]) -> list[str]:
    return [f"{name} = {{", *(f"    {key!r}: {value}," for key, value in values.items()), "}"]


def _unit(unit: Unit) -> str:
    ratio = unit.factor.as_integer_ratio()
    values = (unit.key, float(unit.factor), float(unit.zero), _exponents(unit.dimension), unit.ucum, ratio)
    return f"Unit({', '.join(map(repr, values))})"


def _kind(kind: Kind) -> str:
    values = (
        kind.key,
        kind.title,
        kind.si,
        kind.units,
        kind.low,
        kind.high,
        kind.reference,
        kind.note,
        _exponents(kind.dimension),
    )
    return f"Kind({', '.join(map(repr, values))})"


def _exponents(dimension: Dimension) -> tuple[float, ...]:
    return tuple(float(power) for power in dimension.exponents())
