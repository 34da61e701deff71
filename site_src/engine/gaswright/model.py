"""The shapes of what the spec became: variables, forms, relations, sheets.

Emitted modules build these; gaswright.law and gaswright.network work with them. NamedTuples, because they are made
at start-up in the browser, where each class costs time.
"""

from collections.abc import Callable
from typing import Any, NamedTuple

Number = Callable[..., float]


class Variable(NamedTuple):
    """A variable of a relation: SI value of the kind named, with its sign (positive, nonnegative or any).

    With ``choices`` it is one of these words, and its value is the word's place among them.
    """

    name: str
    symbol: str
    kind: str
    text: str
    sign: str
    default: float | None
    choices: tuple[str, ...] = ()


class Constant(NamedTuple):
    """A constant as it stands in a relation, for the working."""

    name: str
    symbol: str
    title: str
    value: float
    unit: str


class Form(NamedTuple):
    """A relation solved for one unknown: ``function(*arguments)`` gives its SI value.

    Where two values may satisfy the relation, ``sides`` names the two sides of its turning point, one of which is the
    function's last argument.
    """

    unknown: str
    function: Number
    arguments: tuple[str, ...]
    text: str
    way: str
    sides: tuple[str, ...] = ()


class Validity(NamedTuple):
    """A condition on named SI values, what is said where it fails, and whether the figure is then refused."""

    holds: Callable[..., bool]
    arguments: tuple[str, ...]
    says: str
    refuse: bool


class Relation(NamedTuple):
    """One equation with a form per unknown and the slopes of left - right.

    ``slopes(*arguments)`` gives the partial derivative of the residual by each variable, in the order of
    ``variables``; ``residual(*arguments)`` gives left - right in SI. ``lists`` names the variables that are lists of
    any length (gaswright.terms writes them out); with ``is_per_term`` the relation speaks of one of their terms, and
    ``turned`` names the relation that gives a list back whole; ``spare`` are terms that play no part in the question.
    """

    key: str
    title: str
    family: str
    text: str
    variables: tuple[Variable, ...]
    constants: tuple[Constant, ...]
    forms: dict[str, Form]
    slopes: Callable[..., tuple[Any, ...]]
    residual: Number
    arguments: tuple[str, ...]
    validity: tuple[Validity, ...]
    assumes: tuple[str, ...]
    source: str
    example: dict[str, Any]
    uses_gas: bool
    lists: tuple[str, ...] = ()
    is_per_term: bool = False
    turned: dict[str, str] = {}  # noqa: RUF012 - never changed
    spare: tuple[str, ...] = ()

    def variable(self, name: str) -> Variable:
        """Give the variable called ``name``, for a term of a list that list; KeyError where there is none."""
        head, _, place = name.rpartition("_")
        wanted = head if place.isdigit() and head in self.lists else name
        for variable in self.variables:
            if variable.name == wanted:
                return variable
        raise KeyError(name)


class Row(NamedTuple):
    """A row of a sheet: SI value of the kind named; what fills it and what bounds it."""

    name: str
    title: str
    kind: str
    note: str
    reading: bool
    site: str
    accuracy: str
    low: float
    high: float
    unusual_above: float | None
    whole: bool
    of_gas: str
    is_gas: bool
    optional: bool
    is_clock: bool


class Use(NamedTuple):
    """One relation at work in a sheet: relation variable name to row name."""

    relation: str
    rows: dict[str, str]


class Step(NamedTuple):
    """One step of a route: the use that gives ``row`` by its relation's form for ``unknown``."""

    use: int
    unknown: str
    row: str


class Block(NamedTuple):
    """Rows that depend on one another: guess ``torn``, take ``steps``, until the residual of ``use`` is zero."""

    torn: str
    use: int
    steps: tuple[Step, ...]


class Find(NamedTuple):
    """A question a sheet answers, with the figure that is signed and the route that finds it."""

    row: str
    ask: str
    label: str
    safe: str
    unit: str
    limit: str
    limit_text: str
    clock: str
    route: tuple[Step | Block, ...]


class Sheet(NamedTuple):
    """A job of the day as a network of relations."""

    key: str
    title: str
    lead: str
    group: str
    rows: dict[str, Row]
    uses: tuple[Use, ...]
    finds: dict[str, Find]
    cautions: tuple[str, ...]
    rule: str
    notes: tuple[str, ...]
    example: dict[str, Any]
    plot: tuple[str, str] | None
