"""What an instrument or an accuracy in words says about a reading.

Takes the accuracy as typed ("class 1.6 of 250 bar", "± 1 %", "± 0.5 °C", "exact"); gives the limit of error in SI.
A limit is rectangular (JCGM 100:2008, 4.3.7). gaswright.reading comes next.
"""

import re
from typing import NamedTuple

from gaswright import number, unit
from gaswright.errors import ReadingError

Record = dict[str, object]


class Accuracy(NamedTuple):
    """A limit of error and the span it is counted on (SI, 0 where there is none), in words."""

    limit: float
    span: float
    says: str


def parse(words: str, value: float, exponents: tuple[float, ...], where: str) -> Accuracy:
    """Give the limit of error at ``value`` (SI, as counted on the instrument's own scale).

    Raises ReadingError where the words are not an accuracy.
    """
    text = words.strip()
    if text.lower() in ("exact", "0"):
        return Accuracy(0.0, 0.0, "exact")
    match = re.fullmatch(r"(?:class|cl\.?|kl\.?)\s*([\d.,]+)\s*(?:of|at|,)?\s*(.*)", text, re.IGNORECASE)
    if match:
        return _of_span(match[1], match[2], exponents, where, f"class {match[1]}")
    match = re.fullmatch(r"(?:±|\+/-)?\s*([\d.,]+)\s*%\s*(?:of)?\s*(?:the\s+)?(.*)", text)
    if match and match[2] in ("", "reading", "rdg", "value"):
        share = number.parse(match[1], where).value / 100
        return Accuracy(share * abs(value), 0.0, f"± {match[1]} % of the reading")
    if match:
        return _of_span(match[1], match[2].removeprefix("span").removeprefix(" of").strip(), exponents, where,
                        f"± {match[1]} % of span")
    match = re.fullmatch(r"(?:±|\+/-)\s*([\d.,]+(?:[eE][+-]?\d+)?)\s*(.*)", text)
    if match:
        found = unit.parse(match[2], where, exponents)
        return Accuracy(number.parse(match[1], where).value * found.factor, 0.0, f"± {match[1]} {found.text}")
    raise ReadingError(
        where, repr(text[:40]), "an accuracy such as class 1.6 of 250 bar, ± 1 %, ± 0.5 °C or exact",
        "Type it as printed on the instrument.",
    )


def _of_span(share: str, span: str, exponents: tuple[float, ...], where: str, says: str) -> Accuracy:
    full = span_of(span, exponents, where)
    return Accuracy(number.parse(share, where).value / 100 * full, full, f"{says} of {span.strip()}")


def span_of(text: str, exponents: tuple[float, ...], where: str) -> float:
    """Give a span such as ``250 bar`` or ``0 to 250 bar`` in SI."""
    match = re.fullmatch(r"(?:([+-]?[\d.,]+)\s*(?:to|\.\.|…|-)\s*)?([+-]?[\d.,]+)\s*(.+)", text.strip())
    if not match:
        raise ReadingError(where, repr(text[:40]), "a span such as 250 bar", "Give the full scale with its unit.")
    found = unit.parse(match[3], where, exponents)
    low = number.parse(match[1], where).value if match[1] else 0.0
    return (number.parse(match[2], where).value - low) * found.factor


def of_record(record: Record, value: float, exponents: tuple[float, ...], where: str) -> Accuracy:
    """Give the accuracy of an instrument's record with its keys accuracy and span."""
    words, span = str(record.get("accuracy", "")), str(record.get("span", ""))
    needs_span = span and not re.search(r"\d\s*\D+\d", words) and ("class" in words.lower() or "span" in words.lower())
    accuracy = parse(f"{words} of {span}" if needs_span else words, value, exponents, where)
    if not accuracy.span and span:
        return accuracy._replace(span=span_of(span, exponents, where))
    return accuracy


def resolution_of(record: Record, exponents: tuple[float, ...], where: str) -> float:
    """Give the resolution of an instrument in SI; 0 where the record states none."""
    text = str(record.get("resolution", "") or "").strip()
    return span_of(text, exponents, where) if text else 0.0
