"""Read a unit as typed: how a pressure is counted, reference conditions, and the unit itself.

Takes text and the exponents wanted; gives factor and zero in SI, or ReadingError. Products are read by
gaswright.product. gaswright.reading comes next.
"""

import re
from typing import NamedTuple

from gaswright import product
from gaswright.errors import ReadingError
from gaswright.product import Product
from gaswright.tables import KINDS

WORDS = {
    "gauge": "gauge",
    "gage": "gauge",
    "relative": "gauge",
    "rel": "gauge",
    "ga": "gauge",
    "g": "gauge",
    "ü": "gauge",
    "absolute": "absolute",
    "abs": "absolute",
    "a": "absolute",
    "vacuum": "vacuum",
    "vac": "vacuum",
    "v": "vacuum",
    "difference": "difference",
    "differential": "difference",
    "diff": "difference",
    "d": "difference",
}
SUFFIX = re.compile(rf"(.*\S)\s*[(\[]?\b({'|'.join(WORDS)})\b\.?[)\]]?", re.IGNORECASE)
JOINED = re.compile(r"(.*[^\s(\[])(ga|vac|abs|[gavdü])", re.IGNORECASE)
PRESSURE = KINDS["absolute_pressure"].exponents
SIMPLE_NAMES = {PRESSURE: "pressure"}


class UnitReading(NamedTuple):
    """A unit as read: its spelling, factor and zero in SI, how a pressure is counted, reference conditions (K, Pa)."""

    text: str
    factor: float
    zero: float
    reference: str | None
    conditions: tuple[float, float] | None
    pair: str


def parse(
    text: str,
    where: str,
    exponents: tuple[float, ...],
    title: str = "the quantity asked for",
    offered: tuple[str, ...] = (),
) -> UnitReading:
    """Give the unit ``text`` says, for a quantity called ``title`` for which the units ``offered`` are usual.

    Raises ReadingError: unknown, of another kind, with two meanings, or without its reference conditions.
    """
    body = product.normal(text)
    expected = f"a unit of {title}{f' such as {", ".join(offered[:3])}' if offered else ''}"
    if not body:
        raise ReadingError(where, "no unit", expected, "Add the unit.")
    found, reference = counted(body, where, expected)
    if found.exponents != exponents:
        kind = name_of(found.exponents)
        said = f"{found.text} ({kind})" if kind else found.text
        raise ReadingError(where, said, expected, "Choose another unit, or check which row this is.")
    conditions = conditions_of(found.pair) if found.pair else None
    return UnitReading(found.text, found.factor, found.zero, reference, conditions, found.pair)


def is_pressure(text: str) -> bool:
    """Say whether a number with a unit, such as ``1 atm``, is a pressure by its unit."""
    body = product.normal(text.lstrip("+-−–0123456789., \u00a0\u2009\u202f"))
    try:
        found, _ = counted(body, "unit", "a unit")
    except ReadingError:
        return False
    return found.exponents == PRESSURE


def conditions_of(pair: str) -> tuple[float, float]:
    """Give temperature (K) and absolute pressure (Pa) of a pair from the table, such as ``0 °C, 101.325 kPa``."""
    values = []
    for part in pair.split(", "):
        number, _, text = part.partition(" ")
        found = product.read(text, pair, "a unit")
        values.append((float(number) + found.zero) * found.factor)
    return values[0], values[1]


def name_of(exponents: tuple[float, ...]) -> str:
    """Give the plain name of the quantity with these exponents, empty where no kind has them."""
    names = (kind.title.removeprefix("absolute ") for kind in KINDS.values() if kind.exponents == exponents)
    return SIMPLE_NAMES.get(exponents) or next(names, "")


def counted(body: str, where: str, expected: str) -> tuple[Product, str | None]:
    """Read ``bar gauge``, ``bar(g)``, ``barg``: the unit and how it is counted; other units have no such word."""
    if product.knows(body):
        return product.read(body, where, expected), None
    match = SUFFIX.fullmatch(body)
    if match:
        found = product.read(match[1].strip(" .,("), where, expected)
        if found.exponents != PRESSURE:
            said = f"{found.text} with the word {match[2]}"
            raise ReadingError(where, said, expected, f"Leave out {match[2]}: only a pressure is counted so.")
        return found, WORDS[match[2].lower()]
    match = JOINED.fullmatch(body)
    if match and product.knows(match[1]):
        found = product.read(match[1], where, expected)
        if found.exponents == PRESSURE:
            word = match[2].lower()
            return found, WORDS[word]
    return product.read(body, where, expected), None
