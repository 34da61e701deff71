"""What an instrument or an accuracy in words says about a reading.

Takes the accuracy as typed ("class 1.6 of 250 bar", "± 1 %", "± 0.5 °C", "exact"); gives the limit of error in SI.
A limit is rectangular (JCGM 100:2008, 4.3.7). gaswright.reading comes next.
"""

import re
from collections.abc import Mapping
from typing import NamedTuple

from gaswright import number, unit
from gaswright.errors import ReadingError

Record = Mapping[str, object]
# These are compiled where first needed: most readings name no instrument, and start-up counts in the browser.
FIGURE = r"([+\-−]?[0-9.,]+(?:[eE][+-]?[0-9]+)?)"
CLASS = rf"(?:class|cl\.?|kl\.?|klasse)\s*{FIGURE}\s*(?:of|at|on|,)?\s*(.*)"
PERCENT = rf"±?\s*{FIGURE}\s*%\s*(?:of\s+)?(?:the\s+)?(.*)"
LIMIT = rf"±\s*{FIGURE}\s*(\S.*)"
SPAN = rf"(?:{FIGURE}\s*([^\s0-9.,…\-–−]*)\s*(?:to|\.\.\.?|…|-|–|−)\s*)?{FIGURE}\s*(\S.*)"
OF_READING = ("", "reading", "rdg", "rd", "value", "measured value", "of reading")
OF_SPAN = r"(?:span|full scale|f\.?\s?s\.?|fsd)\b\.?\s*(?:of|,)?\s*(.*)"
LONGEST = 80
OWN = "the kind that was read"


class Accuracy(NamedTuple):
    """A limit of error, the width of the span and the ends of the scale (SI, 0 where there is none), in words."""

    limit: float
    span: float
    says: str
    scale: tuple[float, float]


class Span(NamedTuple):
    """A scale: its width and its ends in SI."""

    width: float
    low: float
    high: float


def parse(words: str, size: float, exponents: tuple[float, ...], where: str) -> Accuracy:
    """Give the limit of error of a reading of ``size`` (what stands on the scale, without sign, in SI intervals).

    Raises ReadingError where the words are not an accuracy.
    """
    text = words.replace("+/-", "±").replace("+-", "±").strip()
    if len(text) > LONGEST:
        raise _unreadable(text, where)
    if text.lower() == "exact":
        return Accuracy(0.0, 0.0, "exact", (0.0, 0.0))
    match = re.fullmatch(CLASS, text, re.IGNORECASE)
    if match:
        return _of_span(match[1], match[2], exponents, where, f"class {match[1]}")
    match = re.fullmatch(PERCENT, text)
    if match:
        return _percent(match[1], match[2].strip(), size, exponents, where)
    match = re.fullmatch(LIMIT, text)
    if match:
        found = unit.parse(match[2], where, exponents, OWN)
        return Accuracy(_limit(match[1], where) * found.factor, 0.0, f"± {match[1]} {found.text}", (0.0, 0.0))
    raise _unreadable(text, where)


def _percent(share: str, of: str, size: float, exponents: tuple[float, ...], where: str) -> Accuracy:
    if of.lower() in OF_READING:
        return Accuracy(_limit(share, where) / 100 * size, 0.0, f"± {share} % of the reading", (0.0, 0.0))
    span = re.fullmatch(OF_SPAN, of, re.IGNORECASE)
    return _of_span(share, span[1] if span else of, exponents, where, f"± {share} % of span")


def _unreadable(text: str, where: str) -> ReadingError:
    return ReadingError(
        where,
        repr(text[:40]),
        "an accuracy such as class 1.6 of 250 bar, ± 1 %, ± 0.5 °C or exact",
        "Type it as printed on the instrument.",
    )


def _limit(text: str, where: str) -> float:
    value = number.parse(text, where).value
    if value < 0:
        raise ReadingError(where, f"the limit of error {text}", "zero or more", "Type the limit without a sign.")
    return value


def _of_span(share: str, text: str, exponents: tuple[float, ...], where: str, says: str) -> Accuracy:
    if not text.strip():
        raise ReadingError(
            where,
            f"{says} without its span",
            "the span it is counted on",
            f"Add it, such as {says} of 250 bar.",
        )
    span = span_of(text, exponents, where)
    limit = _limit(share, where) / 100 * span.width
    return Accuracy(limit, span.width, f"{says} of {text.strip()}", (span.low, span.high))


def span_of(text: str, exponents: tuple[float, ...], where: str) -> Span:
    """Give a span such as ``250 bar``, ``0 to 250 bar`` or ``−1 ... 15 bar`` in SI."""
    match = re.fullmatch(SPAN, text.strip()) if len(text) <= LONGEST else None
    if not match:
        raise ReadingError(where, repr(text[:40]), "a span such as 250 bar", "Give the full scale with its unit.")
    found = unit.parse(match[4], where, exponents, OWN)
    if match[2] and unit.parse(match[2], where, exponents).factor != found.factor:
        raise ReadingError(where, repr(text[:40]), "one unit for both ends of the span", "Give both in the same unit.")
    low = number.parse(match[1], where).value if match[1] else 0.0
    high = number.parse(match[3], where).value
    if high <= low:
        raise ReadingError(where, repr(text[:40]), "a span that ends above its start", "Give the full scale.")
    low_si = (low + found.zero) * found.factor if match[1] or not found.zero else 0.0
    return Span((high - low) * found.factor, low_si, (high + found.zero) * found.factor)


def of_record(record: Record, size: float, exponents: tuple[float, ...], where: str) -> Accuracy:
    """Give the accuracy of an instrument's record with its keys accuracy and span, counted as ``parse`` counts."""
    words, span = str(record.get("accuracy") or "").strip(), str(record.get("span") or "").strip()
    if not words:
        raise ReadingError(
            where,
            f"{record.get('name', 'the instrument')} without an accuracy",
            "its class or limit",
            "Add it to the instrument, such as class 1.6.",
        )
    lacks_span = re.search(
        r"(?:class|cl\.?|kl\.?|klasse)\s*[0-9.,]+\s*(?:of)?$|(?:span|full scale|f\.?s\.?|fsd)\.?$", words, re.IGNORECASE
    )
    accuracy = parse(f"{words} of {span}" if span and lacks_span else words, size, exponents, where)
    if accuracy.span or not span:
        return accuracy
    scale = span_of(span, exponents, where)
    return accuracy._replace(span=scale.width, scale=(scale.low, scale.high))


def resolution_of(record: Record, exponents: tuple[float, ...], where: str) -> float:
    """Give the resolution of an instrument in SI; 0 where the record states none."""
    text = str(record.get("resolution") or "").strip()
    return span_of(text, exponents, where).width if text else 0.0


def overdue(record: Record, today: str) -> tuple[str, ...]:
    """Say so where the instrument's due date lies before ``today`` (both as 2027-03-01, RFC 3339 full-date)."""
    due = str(record.get("due") or "").strip()
    if not due or today <= due:
        return ()
    return (f"{record.get('name', 'The instrument')} was due on {due}. Use one that is in date, or have it checked.",)
