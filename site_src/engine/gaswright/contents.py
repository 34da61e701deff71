"""Tell what there is: laws, sheets and gases, with their variables and what may be found.

Takes nothing; gives plain dictionaries, for callers and the command line.
"""

from typing import Any

from gaswright import find
from gaswright.gas import find as find_gas
from gaswright.gas import keys as gas_keys
from gaswright.jobs.index import TITLE_OF
from gaswright.laws.index import FAMILY_OF
from gaswright.tables import KINDS


def relations() -> dict[str, dict[str, Any]]:
    """Give every law by key: title, equation, variables with kind, SI unit and sign, and what may be found."""
    return {key: _relation(key) for key in FAMILY_OF}


def _relation(key: str) -> dict[str, Any]:
    relation = find.relation(key)
    variables = {
        variable.name: {
            "kind": variable.kind,
            "unit": KINDS[variable.kind].si,
            "sign": variable.sign,
            "text": variable.text,
            "default": variable.default,
            "is_list": variable.name in relation.lists,
        }
        for variable in relation.variables
    }
    return {
        "title": relation.title,
        "family": relation.family,
        "equation": relation.text,
        "variables": variables,
        "find": [*relation.forms, *relation.turned],
        "needs_gas": relation.uses_gas,
        "source": relation.source,
    }


def sheets() -> dict[str, dict[str, Any]]:
    """Give every sheet by key: title, rows read with kind and SI unit, and the rows that may be found."""
    return {key: _sheet(key) for key in TITLE_OF}


def _sheet(key: str) -> dict[str, Any]:
    sheet = find.sheet(key)
    rows = {
        name: {
            "title": row.title,
            "kind": "gas" if row.is_gas else row.kind,
            "unit": KINDS[row.kind].si,
            "optional": row.optional,
        }
        for name, row in sheet.rows.items()
        if row.reading
    }
    return {"title": sheet.title, "rows": rows, "find": list(sheet.finds), "example": dict(sheet.example)}


def gases() -> dict[str, dict[str, Any]]:
    """Give every gas by key: title, formula and molar mass in kg/mol."""
    found = {key: find_gas(key) for key in gas_keys()}
    return {
        key: {"title": gas.title, "formula": gas.formula, "molar_mass": gas.molar_mass} for key, gas in found.items()
    }
