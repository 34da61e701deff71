"""Write the units and kinds as the table that ships.

Takes the spec's units and kinds; gives the text of ``gaswright/tables.py``. Next: gaswright.unit and gaswright.reading.
"""

from collections.abc import Iterable, Mapping

from generator.errors import SpecError
from spec.dimensions import Dimension
from spec.model import Kind, Unit
from spec.unit_words import ASKED_PAIR, PRODUCTS, QUESTIONS, WITH_PAIR

LEFT_OUT = str.maketrans("", "", " .^")
PLAIN = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉⁻μ", "01234567890123456789-µ")


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
        *_table("PRODUCTS", {compact(word): repr(text) for word, text in PRODUCTS.items()}),
        *_table("WITH_PAIR", {compact(word): repr(pair) for word, pair in WITH_PAIR.items()}),
        *_table("ASKED_PAIR", {compact(word): repr(pairs) for word, pairs in ASKED_PAIR.items()}),
        *_table("QUESTIONS", {compact(word): repr(offers) for word, offers in QUESTIONS.items()}),
        *_table("KINDS", {kind.key: _kind(kind) for kind in kinds}),
        "",
    ]
    return "\n".join(lines)


def compact(word: str) -> str:
    """Give a spelling as the engine compares it: no blanks, full stops or ``^``, digits on the line."""
    return word.translate(PLAIN).translate(LEFT_OUT)


def spellings(units: Iterable[Unit]) -> dict[str, str]:
    """Give every compact spelling with its unit's key. Raises SpecError where two units claim one spelling."""
    found: dict[str, str] = {}
    for unit in units:
        for word in map(compact, (unit.key, *unit.spellings)):
            owner = found.setdefault(word, unit.key)
            if owner != unit.key:
                raise SpecError(
                    f"spec.units, {unit.key}", f"the spelling {word!r}, which {owner} has", "one unit for one spelling",
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
