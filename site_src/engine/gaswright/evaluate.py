"""Work out one unknown of one relation from SI values, and refuse what is not an answer.

Takes a relation, an unknown and SI values; gives a finite SI value of the right sign, or a named error.
gaswright.law and gaswright.network both go through here.
"""

import math
from typing import TYPE_CHECKING

from gaswright.errors import NoSolutionError, OutsideRangeError
from gaswright.model import Relation

if TYPE_CHECKING:
    from gaswright.gas.real import Gas

SIGN_WORDS = {"positive": "a value above zero", "nonnegative": "zero or a value above it", "any": "a finite value"}


def evaluate(relation: Relation, unknown: str, values: dict[str, float], gas: "Gas | None", where: str) -> float:
    """Give the SI value of ``unknown``. Raises NoSolutionError or OutsideRangeError, never another exception."""
    form = relation.forms[unknown]
    arguments = [gas if name == "gas" else values[name] for name in form.arguments]
    try:
        value = form.function(*arguments)
    except (ZeroDivisionError, OverflowError):
        value = math.nan
    except ValueError as error:
        if isinstance(error, (NoSolutionError, OutsideRangeError)):
            raise
        value = math.nan
    sign = relation.variable(unknown).sign
    if isinstance(value, complex) or not math.isfinite(value) or not _has_sign(sign, value):
        raise _no_answer(relation, where, sign, value)
    return value


def _has_sign(sign: str, value: float) -> bool:
    return sign == "any" or value > 0 or (sign == "nonnegative" and value == 0)


def _no_answer(relation: Relation, where: str, sign: str, value: complex) -> NoSolutionError:
    is_number = not isinstance(value, complex) and math.isfinite(value)
    found = f"{value:.6g} (SI)" if is_number else "no finite number"
    return NoSolutionError(
        f"{where}, by {relation.title}",
        found,
        SIGN_WORDS[sign],
        "Check the readings: they do not fit together.",
    )


def check_validity(relation: Relation, values: dict[str, float], where: str) -> tuple[str, ...]:
    """Give what is said outside the relation's validity; raise OutsideRangeError where it refuses there."""
    said = []
    for validity in relation.validity:
        if all(name in values for name in validity.arguments):
            if validity.holds(*(values[name] for name in validity.arguments)):
                continue
            if validity.refuse:
                raise OutsideRangeError(where, "readings outside the law", "readings inside it", validity.says)
            said.append(validity.says)
    return tuple(said)
