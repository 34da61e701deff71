"""Settle which kind of quantity a law is asked about that takes any.

Takes a relation and what was typed; gives the relation with the kind of the readings in place of any kind.
gaswright.law and gaswright.answer_law come next.
"""

from collections.abc import Mapping
from typing import Any

from gaswright import product, unit
from gaswright.errors import ReadingError
from gaswright.model import Relation
from gaswright.tables import KINDS
from gaswright.terms import list_of
from gaswright.typed import take_apart, text_of

ANY = "any_quantity"
PREFERRED = ("pressure_change", "temperature_difference")


def settled(relation: Relation, readings: Mapping[str, Any]) -> Relation:
    """Give the relation with one kind for all its variables of any kind: that of the first unit typed, or a number."""
    names = [variable.name for variable in relation.variables if variable.kind == ANY]
    if not names:
        return relation
    units = [_unit_of(raw) for name, raw in readings.items() if list_of(name) in names or name in names]
    kind = kind_of(next((text for text in units if text), "1"), relation.title)
    variables = (variable._replace(kind=kind) if variable.kind == ANY else variable for variable in relation.variables)
    return relation._replace(variables=tuple(variables))


def _unit_of(raw: Any) -> str:
    """Give the unit typed or chosen, empty where there is none or where the reading is not readable."""
    typed = text_of(raw) if not isinstance(raw, (int, float)) else ""
    try:
        own = take_apart(typed, "unit").unit if typed else ""
    except ReadingError:
        own = ""
    return own or (str(raw.get("unit") or "") if isinstance(raw, Mapping) else "")


def kind_of(text: str, where: str) -> str:
    """Give the key of the kind that a unit belongs to, a difference where there is one; ReadingError for none."""
    found, _ = unit.counted(product.normal(text), where, "a unit")
    fitting = [key for key, kind in KINDS.items() if kind.exponents == found.exponents and key != ANY]
    preferred = [key for key in PREFERRED if key in fitting]
    if not fitting:
        raise ReadingError(where, repr(text[:40]), "a unit of a quantity of the trade", "Choose another unit.")
    return (preferred or fitting)[0]
