"""Take apart what was typed into a field: digits, unit, accuracy, reference conditions.

Takes text such as ``30 ± 0.5 L/min (20 °C, 101.325 kPa)``; gives its parts as text, or ReadingError.
gaswright.reading reads each part.
"""

import re
from collections.abc import Mapping
from typing import NamedTuple

from gaswright.errors import ReadingError

LONGEST = 160
DIGITS = r"[+\-−–]?\s?[0-9.,](?:[0-9.,\u00a0\u2009\u202f’' ]*[0-9.,])?"
POWER = r"(?:\s*[eE][+\-−]?[0-9]{1,5}(?!\w)|\s*[×x*·]\s*10\s*\^?[⁻+\-−⁰¹²³⁴⁵⁶⁷⁸⁹0-9]+)?"
NUMBER = re.compile(rf"\s*({DIGITS}{POWER})\s*(.*)", re.DOTALL)
BRACKETED = re.compile(r"\s*\(([^()]*±[^()]*)\)(.*)", re.DOTALL)
PAIR = re.compile(r"\s*(?:\bat\b|@)?\s*\(([^()]*[0-9][^()]*)\)\s*$")
AT_PAIR = re.compile(r"\s+(?:at|@)\s+([0-9+\-−][^()]*)$")
BETWEEN = re.compile(r"(?<=[^0-9\s])\s*[,;&/]\s*|\s*;\s*|,\s+|\s+(?:and|at)\s+")
WHAT_TO_DO = "Type digits with a decimal comma or point, such as 12.5."


class Typed(NamedTuple):
    """The parts as typed: digits, unit, accuracy (empty where none) and the two parts of a reference pair."""

    digits: str
    unit: str
    accuracy: str
    pair: tuple[str, str] | None


def text_of(raw: object) -> str:
    """Give the typed text of a row, bare or under ``text`` of a record; empty where there is none."""
    text = raw.get("text") if isinstance(raw, Mapping) else raw
    return "" if text is None else str(text).strip()


def take_apart(text: str, where: str) -> Typed:
    """Give the parts of ``text``. Raises ReadingError where it does not start with a number."""
    if len(text) > LONGEST:
        found = f"{text[:20]!r} and {len(text) - 20} more signs"
        raise ReadingError(where, found, "a number with its unit", WHAT_TO_DO)
    body, pair = _without_pair(text.replace("+/-", "±").replace("+-", "±"))
    bracketed = BRACKETED.fullmatch(body)
    if bracketed:
        inner = _without_accuracy(bracketed[1], where)
        if inner[1]:
            raise ReadingError(where, repr(text[:40]), "the unit behind the bracket", "Type it as (200 ± 2) bar.")
        return Typed(inner[0], bracketed[2].strip(), f"{inner[2]} {bracketed[2].strip()}", pair)
    return Typed(*_without_accuracy(body, where), pair)


def _without_accuracy(body: str, where: str) -> tuple[str, str, str]:
    """Split ``200 ± 2 bar`` or ``200 bar ± 1 %`` into digits, unit and accuracy."""
    head, mark, tail = body.partition("±")
    match = NUMBER.fullmatch(head)
    if not match:
        raise ReadingError(where, repr(body[:40]), "a number", WHAT_TO_DO)
    digits, unit = match[1].strip(), match[2].strip()
    if not mark:
        return digits, unit, ""
    limit = NUMBER.fullmatch(tail)
    if not limit:
        raise ReadingError(where, repr(body[:40]), "a limit behind ±", "Type it as 200 ± 2 bar, or leave it out.")
    own = limit[2].strip()
    if not unit and not own.startswith("%"):
        unit = own
    return digits, unit, f"± {limit[1].strip()} {own or unit}".strip()


def _without_pair(text: str) -> tuple[str, tuple[str, str] | None]:
    """Take a reference pair such as ``(20 °C, 101.325 kPa)`` or ``at 20 °C and 1 atm`` off the end."""
    for pattern in (PAIR, AT_PAIR):
        match = pattern.search(text)
        parts = BETWEEN.split(match[1].strip()) if match else []
        if match and len(parts) == 2:
            return text[: match.start()], (parts[0].strip(), parts[1].strip())
    return text, None
