"""Symbols in running text, as HTML: ``p_abs`` with its index set low, ``CO2`` with its digits set low.

Takes plain text; gives escaped markup. The templates use both; app/symbols.ts does the same for what the engine says.
"""

import re

from markupsafe import Markup, escape

INDEXED = re.compile(r"(?<![\w.])([^\W\d_]{1,3})_(\w+)")
DIGITS = str.maketrans("0123456789", "₀₁₂₃₄₅₆₇₈₉")


def write_symbols(text: str) -> Markup:
    """The text with every symbol of the form ``p_abs`` as a variable with an index."""
    return Markup(INDEXED.sub(r"<var>\1<sub>\2</sub></var>", str(escape(text))))  # noqa: S704 - escaped just before


def write_chemical(formula: str) -> str:
    """The formula with its numbers of atoms set low."""
    return re.sub(r"(?<=[A-Za-z)])\d+", lambda number: number.group().translate(DIGITS), formula)
