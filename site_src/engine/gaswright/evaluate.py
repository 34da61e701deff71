"""Work out one unknown of one relation from SI values, and refuse what is not an answer.

Takes a relation, an unknown and SI values; gives a finite SI value of the right sign, or a named error.
gaswright.law and gaswright.network both go through here.
"""

import math
from collections.abc import Callable
from typing import TYPE_CHECKING, Any

from gaswright.errors import NoSolutionError, OutsideRangeError, ReadingError
from gaswright.model import Form, Relation

if TYPE_CHECKING:
    from gaswright.gas.real import Gas

ROUNDING = 4e-15
SIGN_WORDS = {"positive": "a value above zero", "nonnegative": "zero or a value above it", "any": "a finite value"}


def evaluate(  # noqa: PLR0913, PLR0917 - the state, and which of two answers
    relation: Relation, unknown: str, values: dict[str, float], gas: "Gas | None", where: str, side: str = ""
) -> float:
    """Give the SI value of ``unknown``.

    Raises NoSolutionError or OutsideRangeError; ReadingError where two values fit and ``side`` names neither.
    """
    form = relation.forms[unknown]
    arguments = [gas if name == "gas" else values[name] for name in form.arguments]
    if form.sides:
        return _on_side(relation, form, arguments, where, side)
    value = _called(form.function, arguments)
    sign = relation.variable(unknown).sign
    if sign == "nonnegative" and _is_rounding(relation, unknown, values, gas, value):
        return 0.0
    if isinstance(value, complex) or not math.isfinite(value) or not _has_sign(sign, value):
        raise _no_answer(relation, where, sign, value)
    return float(value)


def _on_side(relation: Relation, form: Form, arguments: list[Any], where: str, side: str) -> float:
    """Give the value on the side named, or the only one there is; ask where there are two."""
    found: dict[str, float] = {}
    missing: NoSolutionError | None = None
    for each in (side,) if side in form.sides else form.sides:
        try:
            value = _called(form.function, [*arguments, each])
        except NoSolutionError as error:
            missing = error
            continue
        if math.isfinite(value) and value > 0:
            found[each] = value
    if len(found) == 1:
        return next(iter(found.values()))
    if found:
        both = " or ".join(f"{value:.6g} ({words(each)})" for each, value in found.items())
        raise ReadingError(where, f"two values that fit (SI): {both}", "one of them", "Say which.", offers=form.sides)
    raise missing or _no_answer(relation, where, "positive", math.nan)


def words(side: str) -> str:
    """Give the name of a side in words: ``above_peak`` becomes ``above the peak``."""
    head, _, tail = side.partition("_")
    return f"{head} the {tail}"


def _called(function: Callable[..., Any], arguments: list[Any]) -> Any:
    """Give what an emitted function gives, NaN where arithmetic has no answer; named errors pass."""
    try:
        return function(*arguments)
    except (NoSolutionError, OutsideRangeError):
        raise
    except (ArithmeticError, ValueError):
        return math.nan


def residual(relation: Relation, arguments: list[Any], where: str) -> float:
    """Give left - right of the relation in SI. Raises NoSolutionError where that is no finite number."""
    value = _called(relation.residual, arguments)
    if isinstance(value, complex) or not math.isfinite(value):
        raise _no_answer(relation, where, "any", math.nan)
    return float(value)


def slopes(relation: Relation, arguments: list[Any], where: str) -> tuple[float, ...]:
    """Give how left - right moves with each variable, in their order. Raises NoSolutionError where one has no slope."""
    found = _called(relation.slopes, arguments)
    if not isinstance(found, tuple) or any(isinstance(slope, complex) or not math.isfinite(slope) for slope in found):
        raise no_slope(where)
    return found


def no_slope(where: str) -> NoSolutionError:
    """Give the error for an answer whose uncertainty has no finite size."""
    return NoSolutionError(
        where,
        "an answer that the least error of a reading moves without bound",
        "readings on which it depends smoothly",
        "Check the readings: they stand on the edge of what the law covers.",
    )


def _is_rounding(relation: Relation, unknown: str, values: dict[str, float], gas: "Gas | None", value: complex) -> bool:
    """Say whether ``value`` is below zero by no more than the rounding of the readings' own digits."""
    if isinstance(value, complex) or not value < 0:
        return False
    at_zero = {**values, unknown: 0.0}
    found = _called(relation.slopes, [gas if name == "gas" else at_zero[name] for name in relation.arguments])
    if not isinstance(found, tuple):
        return False
    parts = {each.name: slope for each, slope in zip(relation.variables, found, strict=True)}
    largest = max(abs(slope * at_zero[name]) for name, slope in parts.items())
    return abs(value * parts[unknown]) <= ROUNDING * largest


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
