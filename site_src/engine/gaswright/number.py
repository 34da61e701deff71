"""Read a number as typed, in any of the ways crews write it, and never guess.

Takes text; gives a Number with the size of its last typed digit, or ReadingError. gaswright.reading comes next.
"""

import re
from typing import NamedTuple

from gaswright.errors import ReadingError

SAME = str.maketrans({"−": "-", "–": "-", "\u00a0": " ", "\u2009": " ", "\u202f": " ", "’": "'", "‘": "'"})
SUPERSCRIPTS = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺", "0123456789-+")
PLAIN = re.compile(r"([+-]?)([0-9]*)(?:\.([0-9]*))?(?:[eE]([+-]?[0-9]{1,5}))?")
TIMES_TEN = re.compile(r"\s*[×x*·]\s*10\s*\^?\s*([+-]?[0-9]+)$")
SPACED = re.compile(r"([+-]?[0-9]{1,3})((?:[ '][0-9]{3})+)(?=[.,eE]|$)")
THOUSANDS = re.compile(r"[+-]?[1-9][0-9]{0,2}(?:([.,])[0-9]{3})(?:\1[0-9]{3})*")
LARGEST, LONGEST = 1e40, 60
WHAT_TO_DO = "Type digits with a decimal comma or point, such as 12.5."


class Number(NamedTuple):
    """A value and the size of one unit in its last typed place."""

    value: float
    step: float


def parse(text: str, where: str, decimal: str | None = None) -> Number:
    """Give the number ``text`` says. ``decimal`` is the page's decimal mark, which settles "1,234".

    Raises ReadingError: empty, not a number, too large, or with more than one meaning (then it offers them).
    """
    cleaned = text.translate(SAME).strip()
    if not cleaned:
        raise ReadingError(where, "nothing", "a number", "Type the reading.")
    if len(cleaned) > LONGEST:
        raise ReadingError(where, f"{cleaned[:20]!r} and {len(cleaned) - 20} more signs", "a number", WHAT_TO_DO)
    cleaned = TIMES_TEN.sub(r"e\1", cleaned.translate(SUPERSCRIPTS))
    cleaned = SPACED.sub(lambda found: found[1] + re.sub("[ ']", "", found[2]), cleaned, count=1)
    return _of_plain(_with_point(cleaned, where, decimal), text, where)


def _of_plain(cleaned: str, text: str, where: str) -> Number:
    match = PLAIN.fullmatch(cleaned)
    if not match or not (match[2] or match[3]):
        raise ReadingError(where, repr(text[:40]), "a number", WHAT_TO_DO)
    value, power = float(cleaned), int(match[4] or 0) - len(match[3] or "")
    has_digits = bool((match[2] + (match[3] or "")).strip("0"))
    if abs(value) > LARGEST or abs(power) > 300:
        expected = f"a number between −{LARGEST:g} and {LARGEST:g}"
        raise ReadingError(where, repr(text[:40]), expected, "Check the power of ten.")
    if has_digits and value == 0:
        raise ReadingError(where, repr(text[:40]), "zero, or a number that is not so small", "Check the power of ten.")
    return Number(value, 10.0**power)


def _with_point(text: str, where: str, decimal: str | None) -> str:
    """Give the text with a point as decimal mark and no grouping; ask where one mark may be either."""
    digits, exponent, power = text.partition("e") if "e" in text else text.partition("E")
    commas, points = digits.count(","), digits.count(".")
    if commas and points:
        mark = "," if digits.rfind(",") > digits.rfind(".") else "."
        return _grouped(digits, mark, where, decimal) + exponent + power
    mark = "," if commas else "."
    grouping = THOUSANDS.fullmatch(digits)
    if commas + points > 1:
        return _grouped(digits, "." if commas else ",", where, decimal) + exponent + power
    if grouping and mark == "," and decimal == ".":
        return digits.replace(",", "") + exponent + power
    if (grouping and decimal != mark and (mark == "," or decimal)) or (mark == "," and commas and decimal == "."):
        raise _asked(digits, mark, exponent + power, where, decimal)
    return digits.replace(",", ".") + exponent + power


def _asked(digits: str, mark: str, power: str, where: str, decimal: str | None) -> ReadingError:
    words = {",": "comma", ".": "point"}[mark]
    as_decimal, as_group = digits.replace(mark, decimal or "."), digits.replace(mark, "")
    is_grouped = THOUSANDS.fullmatch(digits) is not None
    return ReadingError(
        where,
        repr(digits + power),
        "one meaning",
        f"Is the {words} a decimal mark or does it group thousands?",
        offers=(as_decimal + power, as_group + power) if is_grouped else (as_decimal + power,),
    )


def _grouped(digits: str, mark: str, where: str, decimal: str | None) -> str:
    """Take out the marks that group the whole part in threes before the decimal ``mark``."""
    whole, _, part = digits.partition(mark)
    grouping = THOUSANDS.fullmatch(whole)
    if not grouping or grouping[1] == mark or re.search("[.,]", part) or (decimal and _is_other(digits, mark, decimal)):
        raise ReadingError(
            where,
            repr(digits[:40]),
            "digits grouped in threes and one decimal mark",
            "Type the number without grouping.",
        )
    return whole.replace(grouping[1], "") + ("." + part if part else "")


def _is_other(digits: str, mark: str, decimal: str) -> bool:
    """Say whether both marks stand in the number the other way round than the page's decimal mark has them."""
    return mark in digits and mark != decimal
