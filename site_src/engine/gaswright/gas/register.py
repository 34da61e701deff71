"""Finding a gas by what it is called.

Takes a key, a formula, a common name or a transport label; gives the gas.
Readings, sheets and the command line come next. An equation is imported when its gas is first asked for.
"""

import re
from functools import cache
from importlib import import_module
from typing import cast

from gaswright.errors import ReadingError
from gaswright.gas.identity import IDENTITIES
from gaswright.gas.real import Gas
from gaswright.gas.record import Equation, Identity

SUBSCRIPTS = str.maketrans("₀₁₂₃₄₅₆₇₈₉", "0123456789")
UN_NUMBER = re.compile(r"\bun\s*(?:no\.?|number)?\s*[:\-]?\s*(\d{4})\b")


def keys() -> tuple[str, ...]:
    """Return the keys of all gases, in the order of the spec."""
    return tuple(one.key for one in IDENTITIES)


def find(name: str) -> Gas:
    """Return the gas called `name`: key, formula, common name, UN number, or a label such as "Nitrogen, UN 1066".

    Raises:
        ReadingError: nothing is called so, or a name and a UN number disagree; the nearest spellings are offered.
    """
    numbers = set(UN_NUMBER.findall(name.lower()))
    rest = _plain(UN_NUMBER.sub(" ", name.lower()))
    by_number = {who.key for who in IDENTITIES if numbers & set(who.un)}
    by_name = _named(rest)
    agreed = by_name & by_number if numbers and rest else by_name | by_number
    if len(agreed) != 1:
        raise _unknown(name, rest)
    return load(agreed.pop())


def _plain(name: str) -> str:
    return " ".join(re.sub(r"[^0-9a-z]+", " ", name.translate(SUBSCRIPTS)).split())


def _spellings(who: Identity) -> set[str]:
    return {_plain(text.lower()) for text in (who.key, who.title, who.formula, who.cas, *who.spellings)}


def _named(rest: str) -> set[str]:
    return {who.key for who in IDENTITIES if rest and rest in _spellings(who)}


def _unknown(name: str, rest: str) -> ReadingError:
    from difflib import get_close_matches  # noqa: PLC0415 - only where a name is wrong

    owners = {spelling: who.title for who in IDENTITIES for spelling in sorted(_spellings(who))}
    near = get_close_matches(rest, owners, n=6, cutoff=0.5)
    offers = tuple(dict.fromkeys(owners[spelling] for spelling in near))[:3]
    known = ", ".join(who.title for who in IDENTITIES)
    return ReadingError(
        "gas",
        repr(name),
        f"one of {known}",
        f"Did you mean {' or '.join(offers)}?" if offers else "Choose a gas of the list.",
        offers=offers,
    )


@cache
def load(key: str) -> Gas:
    """Return the gas of a key that is known."""
    who = next(one for one in IDENTITIES if one.key == key)
    return Gas(who, cast("Equation", import_module(f"gaswright.gas.equations.{key}")))
