"""Write a law over lists out for the number of terms that were given.

Takes a relation with ``lists`` and readings by name; gives a plain relation, whose variables ``p_i_1``, ``p_i_2`` are
the terms, so that everything after works as for any other. gaswright.law and gaswright.answer_law come next.
"""

import re
from collections.abc import Callable, Iterable, Mapping, Sequence
from typing import Any, NamedTuple

from gaswright import find
from gaswright.errors import ReadingError
from gaswright.model import Form, Relation, Validity, Variable

LOW = str.maketrans("0123456789", "₀₁₂₃₄₅₆₇₈₉")
TERM = re.compile(r"(.+_i)_(\d+)")
MOST_TERMS = 200
SUM = re.compile(r"Σ(′?)\(")


class Asked(NamedTuple):
    """A law without lists, the unknown and the readings of its variables."""

    relation: Relation
    unknown: str
    readings: dict[str, Any]


def spread(relation: Relation, unknown: str, readings: Mapping[str, Any]) -> Asked:
    """Write a law out for the terms given as lists, of which the one to find is None, or by name (``p_i_2``).

    Raises ReadingError: lists of different lengths, no term or several to find, more than 200 terms.
    """
    if unknown in relation.turned:
        relation = find.relation(relation.turned[unknown])
    if not relation.lists:
        return Asked(relation, unknown, dict(readings))
    flat: dict[str, Any] = {}
    counts = {name: len(value) for name, value in readings.items() if name in relation.lists and _is_many(value)}
    for name, value in readings.items():
        if name in relation.lists:
            flat |= _numbered(relation, name, value)
        else:
            flat[name] = value
    count = max([*counts.values(), *_places(relation, (*flat, unknown))], default=0)
    unknown = _unknown(relation, unknown, flat, count)
    _check(relation, counts, count)
    given = {name: value for name, value in flat.items() if value is not None}
    return Asked(expanded(relation, count, place_of(unknown)), unknown, given)


def _is_many(value: Any) -> bool:
    return isinstance(value, Sequence) and not isinstance(value, str)


def _numbered(relation: Relation, name: str, value: Any) -> dict[str, Any]:
    if not _is_many(value):
        raise ReadingError(
            f"{relation.title}, {name}", repr(value)[:40], "a list with one entry for each term", "Write it as a list."
        )
    return {f"{name}_{place}": entry for place, entry in enumerate(value, 1)}


def _places(relation: Relation, names: Iterable[str]) -> list[int]:
    """Give the places of the terms among ``names``."""
    found = [TERM.fullmatch(name) for name in names]
    return [int(match[2]) for match in found if match and match[1] in relation.lists]


def _unknown(relation: Relation, unknown: str, flat: dict[str, Any], count: int) -> str:
    """Give the unknown as a term: the one that is None, or the only one of its list that is missing."""
    if unknown not in relation.lists:
        return unknown
    open_terms = [name for name in (f"{unknown}_{place}" for place in range(1, count + 1)) if flat.get(name) is None]
    if relation.is_per_term and len(open_terms) == count:  # each has its own answer; that of the first is given first
        return open_terms[0]
    if len(open_terms) != 1:
        raise ReadingError(
            f"{relation.title}, {unknown}",
            f"{len(open_terms)} terms to find",
            "one term to find, and a reading for each other",
            "Put None in the place of the term to find.",
        )
    return open_terms[0]


def _check(relation: Relation, counts: dict[str, int], count: int) -> None:
    uneven = {name: length for name, length in counts.items() if length != count and not relation.is_per_term}
    if uneven:
        lengths = ", ".join(f"{length} of {name}" for name, length in counts.items())
        raise ReadingError(relation.title, lengths, "as many entries in each list", "Add what is missing.")
    if not 1 <= count <= MOST_TERMS:
        raise ReadingError(
            relation.title, f"{count} terms", f"1 to {MOST_TERMS} terms", f"Give {', '.join(relation.lists)} as lists."
        )


def list_of(name: str) -> str:
    """Give the list that a term belongs to, or the name itself."""
    return TERM.sub(r"\1", name)


def place_of(name: str) -> int:
    """Give the place of a term by its name, 1 for what is no term."""
    found = TERM.fullmatch(name)
    return int(found[2]) if found else 1


def as_shown(relation: Relation) -> Relation:
    """Give a law over lists with as many terms as its worked example has; any other law as it is."""
    counts = [len(value) for name, value in relation.example.items() if name in relation.lists]
    return expanded(relation, max(counts)) if counts else relation


def expanded(relation: Relation, count: int, own: int = 1) -> Relation:
    """Give the relation for ``count`` terms as one without lists; where it speaks of one term, of place ``own``."""
    if not relation.lists:
        return relation
    variables = tuple(_variables(relation, count, own))
    names = tuple(variable.name for variable in variables)
    keys = [key for key in relation.forms if key not in relation.lists]
    keys += [
        f"{key}_{place}"
        for key in relation.forms
        if key in relation.lists
        for place in ((own,) if relation.is_per_term else range(1, count + 1))
    ]
    whole = _Whole(relation, names, count, own)
    return relation._replace(
        variables=variables,
        forms={key: _form(relation, key, names, count) for key in keys},
        slopes=whole.slopes,
        residual=whole.residual,
        arguments=names,
        validity=tuple(_validity(relation, validity, names, count) for validity in relation.validity),
        example=_flat_example(relation),
        lists=(),
        spare=tuple(_spare(relation, count, own)),
    )


def _variables(relation: Relation, count: int, own: int) -> Iterable[Variable]:
    """Give scalars first, then term by term; a list that only the term in question has is that term alone."""
    yield from (variable for variable in relation.variables if variable.name not in relation.lists)
    for place in range(1, count + 1):
        for variable in relation.variables:
            if variable.name in relation.lists and (place == own or not is_single(relation, variable.name)):
                yield variable._replace(
                    name=f"{variable.name}_{place}",
                    symbol=low(variable.symbol, place),
                    text=f"{variable.text}, term {place}",
                )


def _spare(relation: Relation, count: int, own: int) -> Iterable[str]:
    """Give the terms of lists in no sum, but for the one in question."""
    for name in relation.lists:
        if is_single(relation, name):
            yield from (f"{name}_{place}" for place in range(1, count + 1) if place != own)


def is_single(relation: Relation, name: str) -> bool:
    """Tell whether a list takes part with the term in question only: it stands in no sum."""
    sums = {f"{name.removesuffix('_i')}_{ending}" for ending in ("terms", "others")}
    return relation.is_per_term and not any(sums & set(form.arguments) for form in relation.forms.values())


def low(symbol: str, place: int) -> str:
    """Give the symbol of a term: ``p_i`` becomes ``p₂``."""
    return symbol.removesuffix("_i") + str(place).translate(LOW)


def _flat_example(relation: Relation) -> dict[str, str]:
    flat: dict[str, str] = {}
    for name, value in relation.example.items():
        entries = {f"{name}_{place}": text for place, text in enumerate(value, 1)} if _is_many(value) else {name: value}
        flat |= {key: text for key, text in entries.items() if text}
    return flat


class _Whole(NamedTuple):
    """The functions of all variables, called with the terms one after another."""

    relation: Relation
    names: tuple[str, ...]
    length: int
    own: int

    def _arguments(self, flat: Sequence[Any]) -> list[Any]:
        values = dict(zip(self.names, flat, strict=True))
        found: list[Any] = []
        for name in (variable.name for variable in self.relation.variables):
            terms = [values.get(f"{name}_{place}", 0.0) for place in range(1, self.length + 1)]
            found.append(terms if name in self.relation.lists else values[name])
        return [*found, self.own - 1] if self.relation.is_per_term else found

    def residual(self, *flat: Any) -> float:
        """Give left - right of the relation, in SI."""
        return self.relation.residual(*self._arguments(flat))

    def slopes(self, *flat: Any) -> tuple[float, ...]:
        """Give the partial derivatives of left - right by every variable, in their order."""
        by_name: dict[str, float] = {}
        found: tuple[Any, ...] = self.relation.slopes(*self._arguments(flat))
        for variable, slope in zip(self.relation.variables, found, strict=True):
            if variable.name in self.relation.lists:
                by_name |= {f"{variable.name}_{place}": each for place, each in enumerate(slope, 1)}
            else:
                by_name[variable.name] = slope
        return tuple(by_name[name] for name in self.names)


def _packed(
    function: Callable[..., Any], arguments: tuple[str, ...], names: tuple[str, ...], place: int, count: int
) -> tuple[Callable[..., Any], tuple[str, ...]]:
    """Give a function of single values, one after another, and the names of those values."""
    wanted = [_names(argument, place, count) for argument in arguments]
    used = tuple(name for name in names if any(name in each for each in wanted))
    plan = [
        tuple(map(used.index, each)) if argument.endswith(("_terms", "_others")) else used.index(each[0])
        for argument, each in zip(arguments, wanted, strict=True)
    ]

    def packed(*flat: Any) -> Any:
        return function(*([flat[i] for i in part] if isinstance(part, tuple) else flat[part] for part in plan))

    return packed, used


def _names(argument: str, place: int, count: int) -> tuple[str, ...]:
    head, _, ending = argument.rpartition("_")
    if ending == "terms":
        return tuple(f"{head}_i_{each}" for each in range(1, count + 1))
    if ending == "others":
        return tuple(f"{head}_i_{each}" for each in range(1, count + 1) if each != place)
    return (f"{argument}_{place}",) if ending == "i" else (argument,)


def _form(relation: Relation, key: str, names: tuple[str, ...], count: int) -> Form:
    place = place_of(key)
    form = relation.forms[list_of(key)]
    function, used = _packed(form.function, form.arguments, names, place, count)
    return Form(key, function, used, write_out(relation, form.text, place, count), form.way)


def _validity(relation: Relation, validity: Validity, names: tuple[str, ...], count: int) -> Validity:
    arguments = tuple(
        f"{name.removesuffix('_i')}_terms" if name in relation.lists else name for name in validity.arguments
    )
    function, used = _packed(validity.holds, arguments, names, 1, count)
    return Validity(function, used, validity.says, validity.refuse)


def write_out(relation: Relation, text: str, place: int, count: int) -> str:
    """Write the sums of a form's text out: ``Σ(p_i)`` becomes ``(p₁ + p₂)``."""
    symbols = [relation.variable(name).symbol for name in relation.lists]
    while found := SUM.search(text):
        end = _closing(text, found.end())
        inside = text[found.end() : end]
        places = [each for each in range(1, count + 1) if not found[1] or each != place]
        terms = " + ".join(_at(inside, symbols, each) for each in places) or "0"
        text = f"{text[: found.start()]}({terms}){text[end + 1 :]}"
    return _at(text, symbols, place)


def _at(text: str, symbols: list[str], place: int) -> str:
    for symbol in symbols:
        text = re.sub(rf"{re.escape(symbol)}(?![A-Za-z0-9_])", low(symbol, place), text)
    return text


def _closing(text: str, start: int) -> int:
    depth = 1
    for place in range(start, len(text)):
        depth += {"(": 1, ")": -1}.get(text[place], 0)
        if depth == 0:
            return place
    return len(text)
