"""Read products and quotients of units: kg/m³, mbar·L/s, Pa·m⁶/mol², J/(mol·K), L / min, kg m-3.

Takes text; gives a Product in SI, or ReadingError. Never guesses: a spelling with two meanings is asked about, and so
is a product behind a slash without brackets (ISO 80000-1:2009, 7.2.2, from memory). gaswright.unit comes next.
"""

import re
from typing import NamedTuple

from gaswright.errors import ReadingError
from gaswright.tables import ASKED_PAIR, PRODUCTS, QUESTIONS, SPELLINGS, UNITS, WITH_PAIR

RAISED = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺", "0123456789-+")
LOWERED = str.maketrans("0123456789-", "⁰¹²³⁴⁵⁶⁷⁸⁹⁻")
SAME = str.maketrans(
    {
        "μ": "µ",
        "º": "°",
        "˚": "°",
        "⋅": "·",
        "∙": "·",
        "•": "·",
        "*": "·",
        "×": "·",
        "−": "-",
        "–": "-",
        "″": '"',
        "”": '"',
        "“": '"',
        "\u00a0": " ",
        "\u2009": " ",
        "\u202f": " ",
        "₂": "2",
        "∕": "/",
        "÷": "/",
        "∆": "Δ",
    }
)
LEFT_OUT = str.maketrans("", "", " .")
RUN = re.compile(r"[⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺]+")
PARTS = re.compile(r"[()/·]|[^()/·]+")
POWER = re.compile(r"(.*[^\d^+\- ])\s*(?:\^\s*)?([+-]?\d{1,2})", re.DOTALL)
LONGEST, HIGHEST = 60, 12
WHAT_TO_DO = "Choose one from the list beside the field."

folded: dict[str, set[str]] = {}


class Product(NamedTuple):
    """A unit in SI: text in full spelling, factor, zero, exponents of kg, m, s, K, mol, reference pair as text."""

    text: str
    factor: float
    zero: float
    exponents: tuple[float, ...]
    pair: str


class Atoms(NamedTuple):
    """Unit keys with their powers, and the reference pair that a word such as Nm³ brought."""

    powers: tuple[tuple[str, int], ...]
    pair: str = ""


def normal(text: str) -> str:
    """Give the text with one sign for each meaning: raised digits as ``^3``, ``·`` for times, ``/`` for per."""
    body = RUN.sub(lambda run: f"^{run[0].translate(RAISED)}", text.translate(SAME)).replace("··", "^")
    return re.sub(r"\s+per\s+", "/", body).strip()


def knows(text: str) -> bool:
    """Say whether the whole text is one spelling of the table (or a word with two meanings)."""
    return bool(_spelt(text))


def read(text: str, where: str, expected: str) -> Product:
    """Give the product ``text`` says. Raises ReadingError: unknown or with more than one meaning."""
    if len(text) > LONGEST:
        raise ReadingError(where, f"{text[:20]!r} and {len(text) - 20} more signs", expected, WHAT_TO_DO)
    return _made(_atoms(text, where, expected))


def _atoms(text: str, where: str, expected: str) -> Atoms:
    atoms = _word(text, text, where)
    if atoms:
        return atoms
    parts = _parts(text)
    atoms, at = _product(parts, 0, 1, where, expected)
    if at < len(parts):
        raise _unknown(text, where, expected)
    return atoms


def _parts(text: str) -> list[str]:
    """Cut into units, operators and brackets; a bracket that belongs to a unit's name, as in inHg (60 °F), stays."""
    parts = [part.strip() for part in PARTS.findall(normal(text)) if part.strip()]
    at = 0
    while at + 3 < len(parts):
        name = "".join(parts[at : at + 4])
        if parts[at + 1] == "(" and parts[at + 3] == ")" and parts[at] not in "/·(" and _spelt(name):
            power = parts[at + 4] if parts[at + 4 : at + 5] and parts[at + 4].startswith("^") else ""
            parts[at : at + (5 if power else 4)] = [name + power]
        at += 1
    return parts


def _product(parts: list[str], at: int, sign: int, where: str, expected: str) -> tuple[Atoms, int]:
    """Read parts from ``at`` to the end or the closing bracket; give the units and where it stopped."""
    whole = "".join(parts)
    powers: list[tuple[str, int]] = []
    pair, is_divided, is_below, is_open = "", False, False, True
    while at < len(parts) and parts[at] != ")":
        part = parts[at]
        if part in "/·":
            if is_open or (part == "·" and is_divided):
                raise _unknown(whole, where, expected) if is_open else _bracketless(whole, where)
            is_open, is_below = True, part == "/"
            is_divided = is_divided or is_below
        else:
            if not is_open:
                raise _unknown(whole, where, expected)
            turn = -sign if is_below else sign
            if part == "(":
                inner, at = _product(parts, at + 1, turn, where, expected)
                if at == len(parts):
                    raise _unknown(whole, where, expected)
            else:
                inner = _factor(part, turn, where, expected, whole)
            powers.extend(inner.powers)
            pair, is_open = pair or inner.pair, False
        at += 1
    if is_open:
        raise _unknown(whole, where, expected)
    return Atoms(tuple(powers), pair), at


def _bracketless(whole: str, where: str) -> ReadingError:
    above, below = whole.split("/", 1)
    first, rest = below.split("·", 1)
    return ReadingError(
        where,
        repr(whole),
        "brackets that say what is divided by",
        "Which is meant?",
        offers=(f"{above}/({below})", f"{above}·{rest}/{first}"),
    )


def _unknown(text: str, where: str, expected: str) -> ReadingError:
    return ReadingError(where, repr(text[:40]), expected, WHAT_TO_DO)


def _factor(part: str, sign: int, where: str, expected: str, whole: str) -> Atoms:
    """Read one factor: a spelling, a spelling with its power, or several side by side."""
    word = _word(part, whole, where)
    if word:
        return Atoms(tuple((key, sign * power) for key, power in word.powers), word.pair)
    match = POWER.fullmatch(part)
    if match and 0 < abs(int(match[2])) <= HIGHEST:
        base = _word(match[1].strip(), whole, where)
        if base and not base.pair:
            return Atoms(tuple((key, sign * power * int(match[2])) for key, power in base.powers))
    pieces = [piece for piece in re.split(r"[ .]+|-(?=[^\d\s])", part) if piece]
    if len(pieces) < 2:
        raise _unknown(part, where, expected)
    found = [_factor(piece, sign, where, expected, whole) for piece in pieces]
    pairs = [each.pair for each in found if each.pair]
    return Atoms(tuple(power for each in found for power in each.powers), pairs[0] if pairs else "")


def _word(part: str, whole: str, where: str) -> Atoms | None:
    """Give what a word of the table says, None where it is none. Asks where it has more than one meaning."""
    spelt = _spelt(part)
    if not spelt:
        return None
    word = min(spelt)
    if len(spelt) > 1 or word in QUESTIONS:
        offers = QUESTIONS.get(word) or tuple(sorted(SPELLINGS.get(each, each) for each in spelt))
        offers = tuple(_in_place(whole, part, offer) for offer in offers)
        raise ReadingError(where, repr(whole), "one meaning", "Which unit is meant?", offers=offers)
    if word in ASKED_PAIR:
        base, pairs = ASKED_PAIR[word]
        offers = tuple(f"{_in_place(whole, part, base)} ({pair})" for pair in pairs)
        todo = f"Which temperature and pressure does {part} count at?"
        raise ReadingError(where, repr(whole), "a unit with its reference conditions", todo, offers=offers)
    if word in SPELLINGS:
        return Atoms(((SPELLINGS[word], 1),))
    base, pair = WITH_PAIR.get(word) or (PRODUCTS[word], "")
    return Atoms(_product(_parts(base), 0, 1, where, "a unit")[0].powers, pair)


def _in_place(whole: str, part: str, meant: str) -> str:
    """Give the whole unit with the doubtful word replaced, so that an offer can stand as it is."""
    return whole.replace(part, meant, 1) if part in whole else meant


def _spelt(part: str) -> set[str]:
    """Give the words of the table that ``part`` spells: as typed, or in other case where it is all in one case."""
    plain = normal(part).translate(LEFT_OUT)
    for table in (QUESTIONS, SPELLINGS, PRODUCTS, WITH_PAIR, ASKED_PAIR):
        if plain in table:
            return {plain}
    letters = sum(map(str.isalpha, plain))
    if letters < 2 or not (plain.isupper() or plain.islower() or plain.istitle()):
        return set()
    power = POWER.fullmatch(plain)
    if power and power[1].rstrip("^") in SPELLINGS:  # nm^3 is a cube of nm, not Nm³ in other letters
        return set()
    if not folded:
        for table in (SPELLINGS, PRODUCTS, WITH_PAIR, ASKED_PAIR):
            for word in table:
                folded.setdefault(word.lower(), set()).add(word)
    return _one_each(folded.get(plain.lower(), set()))


def _one_each(words: set[str]) -> set[str]:
    """Give one word for each meaning."""
    meanings = {
        repr(SPELLINGS.get(word) or PRODUCTS.get(word) or WITH_PAIR.get(word) or ASKED_PAIR.get(word)): word
        for word in sorted(words)
    }
    return set(meanings.values())


def _made(atoms: Atoms) -> Product:
    """Multiply the exact ratios and divide once, so that cm³ is 1e-6 to the last bit."""
    above, below, exponents = 1, 1, [0.0] * 5
    for key, power in atoms.powers:
        unit = UNITS[key]
        over, under = unit.ratio if power > 0 else unit.ratio[::-1]
        above, below = above * over ** abs(power), below * under ** abs(power)
        exponents = [a + power * b for a, b in zip(exponents, unit.exponents, strict=True)]
    is_single = len(atoms.powers) == 1 and atoms.powers[0][1] == 1
    zero = UNITS[atoms.powers[0][0]].zero if is_single else 0.0
    return Product(_shown(atoms.powers), above / below, zero, tuple(exponents), atoms.pair)


def _shown(powers: tuple[tuple[str, int], ...]) -> str:
    sides: tuple[dict[str, int], dict[str, int]] = ({}, {})
    for key, power in powers:
        side = sides[power < 0]
        if key != "1":
            side[key] = side.get(key, 0) + abs(power)
    above, below = (
        "·".join(key + (str(n).translate(LOWERED) if n > 1 else "") for key, n in side.items()) for side in sides
    )
    if not below:
        return above or "1"
    return f"{above or '1'}/{below if len(sides[1]) == 1 else f'({below})'}"


def ucum(text: str) -> str:
    """Give the UCUM code of a unit. Raises ReadingError where the text is no unit."""
    powers = _atoms(text, "unit", "a unit").powers
    codes = (("." if power > 0 else "/") + _coded(UNITS[key].ucum, abs(power)) for key, power in powers)
    return "".join(codes).removeprefix(".")


def _coded(code: str, power: int) -> str:
    bracketed = f"({code})" if "." in code or "/" in code else code
    return f"{bracketed}{power}" if power > 1 else bracketed
