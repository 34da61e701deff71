"""Read a number as typed, in any of the ways crews write it, and never guess.

Takes text; gives a Number with the size of its last typed digit, or ReadingError. gaswright.reading comes next.
"""

import math
import re
from typing import NamedTuple

from gaswright.errors import ReadingError

SPACES = "\u0020\u00a0\u2009\u202f'’_"
PLAIN = re.compile(r"([+-]?)(\d*)(?:([.,])(\d*))?(?:[eE]([+-]?\d{1,4}))?")
TIMES_TEN = re.compile(r"\s*[×x*·]\s*10\s*\^?\s*([+-]?\d+)$")
SUPERSCRIPTS = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺", "0123456789-+")
LARGEST = 1e30


class Number(NamedTuple):
    """A value and the size of one unit in its last typed place."""

    value: float
    step: float


def parse(text: str, where: str, decimal: str | None = None) -> Number:
    """Give the number ``text`` says. ``decimal`` is the page's decimal mark, which settles "1,234".

    Raises ReadingError: empty, not a number, too large, or with more than one meaning (then it offers both).
    """
    cleaned = text.translate(SUPERSCRIPTS).replace("−", "-").strip()
    if not cleaned:
        raise ReadingError(where, "nothing", "a number", "Type the reading.")
    cleaned = TIMES_TEN.sub(r"e\1", cleaned)
    for mark in SPACES:
        cleaned = cleaned.replace(mark, "")
    cleaned = _without_groups(cleaned, where, decimal)
    match = PLAIN.fullmatch(cleaned)
    if not match or not (match[2] or match[4]):
        todo = "Type digits with a decimal comma or point, such as 12.5."
        raise ReadingError(where, repr(text[:40]), "a number", todo)
    value = float(cleaned.replace(",", "."))
    if not math.isfinite(value) or abs(value) > LARGEST:
        raise ReadingError(where, repr(text[:40]), f"a number below {LARGEST:g}", "Check the power of ten.")
    power = int(match[5] or 0) - len(match[4] or "")
    return Number(value, 10.0 ** max(power, -300))


def _without_groups(text: str, where: str, decimal: str | None) -> str:
    """Take out commas or points that group digits; ask where one mark may be either."""
    commas, points = text.count(","), text.count(".")
    if commas and points:
        grouping = "," if text.rfind(".") > text.rfind(",") else "."
        return _grouped(text, grouping, where)
    if commas > 1 or points > 1:
        return _grouped(text, "," if commas else ".", where)
    if commas == 1 and re.fullmatch(r"[+-]?[1-9]\d{0,2},\d{3}", text):
        if decimal == ",":
            return text
        raise ReadingError(
            where, repr(text), "one meaning", "Is the comma a decimal mark or does it group thousands?",
            offers=(text.replace(",", "."), text.replace(",", "")),
        )
    return text


def _grouped(text: str, mark: str, where: str) -> str:
    whole = text.replace(",", ".").split(".") if mark == "." and "," not in text else None
    head = text[: text.rfind("." if mark == "," else ",")] if ("." in text and "," in text) else text
    groups = (whole or head.split(mark))[1:]
    if any(len(group) != 3 for group in groups):  # noqa: PLR2004 - thousands come in threes
        raise ReadingError(where, repr(text[:40]), "digits grouped in threes", "Type the number without grouping.")
    return text.replace(mark, "")
