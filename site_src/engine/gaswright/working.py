"""Write one line of working: the formula, the values put in, the value found.

Takes a relation, an unknown and SI values; gives plain text. gaswright.law and gaswright.sheet use it.
"""

import re

from gaswright import quantity
from gaswright.model import Relation
from gaswright.tables import KINDS

TOKEN = re.compile(r"[A-Za-zα-ωΑ-Ω]+[₀-₉]*(?:_[A-Za-z0-9]+)*(?![A-Za-z0-9₀-₉_(])")


def line(relation: Relation, unknown: str, values: dict[str, float], units: dict[str, str], mark: str = ".") -> str:
    """Give ``V_2 = p_1·V_1/p_2 = 1.2 bar·48 L/2 bar = 28.8 L``; ``units`` names the unit of each variable by name."""
    form = relation.forms[unknown]
    shown = {variable.symbol: _shown(relation, variable.name, values, units, mark) for variable in relation.variables}
    constants = {
        constant.symbol: quantity.with_unit(f"{constant.value:.7g}".replace(".", mark), constant.unit)
        for constant in relation.constants
    }
    symbol = relation.variable(unknown).symbol
    put_in = TOKEN.sub(lambda found: {**shown, **constants}.get(found[0], found[0]), form.text)
    if form.way != "closed form":
        return f"{symbol} {form.text}, {form.way}: {put_in.removeprefix('from ')}"
    return f"{symbol} = {form.text} = {put_in} = {shown[symbol]}"


def _shown(relation: Relation, name: str, values: dict[str, float], units: dict[str, str], mark: str) -> str:
    kind = KINDS[relation.variable(name).kind]
    unit = quantity.working_unit(kind, units.get(name, ""))
    return quantity.text_of(values[name], kind, unit, mark)
