"""Read a unit as typed: atoms, products and quotients, pressure references, reference conditions.

Takes text and the exponents wanted; gives factor and zero in SI, or ReadingError. gaswright.reading comes next.
"""

import re
from typing import NamedTuple

from gaswright.errors import ReadingError
from gaswright.tables import KINDS, SPELLINGS, UNITS

SUPERSCRIPTS = {"²": "^2", "³": "^3", "⁴": "^4", "⁶": "^6", "⁻": "^-"}
REFERENCES = (
    (re.compile(r"\s*[\(\[]?\b(?:abs(?:olute)?|a)\b\.?[\)\]]?$", re.IGNORECASE), "absolute"),
    (re.compile(r"\s*[\(\[]?\b(?:gauge|gage|g)\b\.?[\)\]]?$", re.IGNORECASE), "gauge"),
    (re.compile(r"\s*[\(\[]?\b(?:vacuum|vac)\b\.?[\)\]]?$", re.IGNORECASE), "vacuum"),
)
JOINED = {"barg": ("bar", "gauge"), "bara": ("bar", "absolute"), "psig": ("psi", "gauge"), "psia": ("psi", "absolute"),
          "mbarg": ("mbar", "gauge"), "mbara": ("mbar", "absolute"), "kPag": ("kPa", "gauge"),
          "kPaa": ("kPa", "absolute"), "MPag": ("MPa", "gauge"), "MPaa": ("MPa", "absolute")}
NORMAL = ((273.15, 101325.0), "0 °C, 101.325 kPa")
STANDARD = ((288.15, 101325.0), "15 °C, 101.325 kPa")
WITH_PAIR = {"Nm3": ("m^3", NORMAL), "Sm3": ("m^3", STANDARD), "NL": ("L", NORMAL), "Nl": ("L", NORMAL)}
NEEDS_PAIR = {"scf": "ft^3", "scfm": "ft^3/min", "scfh": "ft^3/h", "sccm": "cm^3/min", "slpm": "L/min", "slm": "L/min"}
PAIRS = {"ft^3": ("60 °F, 14.696 psi", "60 °F, 14.73 psi", "70 °F, 14.696 psi")}
METRIC_PAIRS = ("0 °C, 101.325 kPa", "20 °C, 101.325 kPa")
FIELD_WORDS = {"lpm": "L/min", "LPM": "L/min", "cfm": "ft^3/min", "cfh": "ft^3/h", "cuft": "ft^3", "cf": "ft^3",
               "cu ft": "ft^3", "cc": "cm^3", "ccm": "cm^3/min", "cbm": "m^3", "m3": "m^3", "ft3": "ft^3"}
PRESSURE = KINDS["absolute_pressure"].exponents


class UnitReading(NamedTuple):
    """A unit as read: its spelling, factor and zero in SI, how a pressure is counted, and a pair of conditions (K, Pa)."""

    text: str
    factor: float
    zero: float
    reference: str | None
    conditions: tuple[float, float] | None


def parse(text: str, where: str, exponents: tuple[float, ...], title: str = "the quantity asked for") -> UnitReading:
    """Give the unit ``text`` says. Raises ReadingError: unknown, of another kind, or without its reference pair."""
    body = text.strip()
    conditions: tuple[float, float] | None = None
    said = ""
    for word, base in NEEDS_PAIR.items():
        if body == word:
            offers = tuple(f"{_shown(base)} ({pair})" for pair in PAIRS.get(base[:4], METRIC_PAIRS))
            raise ReadingError(where, repr(text), "a unit with its reference conditions",
                               f"Which temperature and pressure does {word} count at?", offers=offers)
    for word, (base, (pair, name)) in WITH_PAIR.items():
        if body.replace("³", "3") == word or body.replace("³", "3").startswith(word + "/"):
            body, conditions, said = base + body.replace("³", "3")[len(word):], pair, f" ({name})"
    body, reference = _reference(body, exponents)
    atoms = _atoms(FIELD_WORDS.get(body, body), where, text)
    factor, zero, found = _product(atoms)
    if found != exponents:
        expected = f"a unit of {title}"
        raise ReadingError(where, repr(text[:40]), expected, "Choose another unit, or check which row this is.")
    return UnitReading(_shown(FIELD_WORDS.get(body, body)) + said, factor, zero, reference, conditions)


def _reference(body: str, exponents: tuple[float, ...]) -> tuple[str, str | None]:
    if body in JOINED:
        return JOINED[body]
    if exponents != PRESSURE or body in SPELLINGS:
        return body, None
    for pattern, reference in REFERENCES:
        match = pattern.search(body)
        if match and match.start() > 0:
            return body[: match.start()].strip(), reference
    return body, None


def _atoms(body: str, where: str, text: str) -> list[tuple[str, int]]:
    """Split a product such as ``Pa·m⁶/mol²`` into units with exponents."""
    if body in SPELLINGS:
        return [(SPELLINGS[body], 1)]
    for mark, plain in SUPERSCRIPTS.items():
        body = body.replace(mark, plain)
    atoms: list[tuple[str, int]] = []
    sign = 1
    for token in re.split(r"\s*([·*/⋅.()])\s*", body):
        if token in ("/",):
            sign = -1
        elif token in ("", "·", "*", "⋅", ".", "(", ")"):
            continue
        else:
            atoms.append(_atom(token, sign, where, text))
    if not atoms:
        raise ReadingError(where, repr(text[:40]), "a unit", "Choose a unit.")
    return atoms


def _atom(token: str, sign: int, where: str, text: str) -> tuple[str, int]:
    match = re.fullmatch(r"(.+?)\s*\^?\s*(-?\d)?", token)
    name, power = (match[1].strip(), int(match[2] or 1)) if match else (token, 1)
    if token in SPELLINGS:
        name, power = token, 1
    if name not in SPELLINGS:
        raise ReadingError(where, repr(text[:40]), "a unit this tool knows", "Choose one from the list beside the field.")
    return SPELLINGS[name], sign * power


def _product(atoms: list[tuple[str, int]]) -> tuple[float, float, tuple[float, ...]]:
    factor, zero = 1.0, 0.0
    exponents = (0.0,) * len(PRESSURE)
    for key, power in atoms:
        unit = UNITS[key]
        factor = factor * unit.factor**power if power > 0 else factor / unit.factor**-power
        exponents = tuple(a + power * b for a, b in zip(exponents, unit.exponents, strict=True))
    if len(atoms) == 1 and atoms[0][1] == 1:
        zero = UNITS[atoms[0][0]].zero
    return factor, zero, exponents


def _shown(body: str) -> str:
    body = SPELLINGS.get(body, body)
    return body.replace("^-", "⁻").replace("^2", "²").replace("^3", "³").replace("^6", "⁶").replace("*", "·")
