"""The shapes of everything the spec says: kinds, units, variables, relations, sheets.

Takes sympy expressions and plain text; gives frozen values without logic.
Next: the family files build these, generator.load collects them.
"""

from collections.abc import Mapping
from dataclasses import dataclass
from enum import Enum
from fractions import Fraction
from types import MappingProxyType

import sympy

from spec.dimensions import Dimension

EMPTY: Mapping[str, str] = MappingProxyType({})


class Sign(Enum):
    """Which values a variable may take."""

    POSITIVE = "positive"
    NONNEGATIVE = "zero or positive"
    ANY = "any sign"


class Nature(Enum):
    """What a relation is, which decides what is asked of it."""

    LAW = "law"
    BALANCE = "balance"
    DEFINITION = "definition"
    PROPERTY = "property of the gas"
    DECISION = "decision"
    FIT = "fit"


class Root(Enum):
    """Which of several real roots of a polynomial is the physical one."""

    LARGEST = "largest"
    SMALLEST = "smallest"


@dataclass(frozen=True, slots=True, kw_only=True)
class Source:
    """A work that can be looked up: ``work`` with edition, ``where`` (section, equation, table), how it was seen."""

    key: str
    work: str
    note: str = ""

    def at(self, where: str) -> "Citation":
        """Cite a place in the work."""
        return Citation(source=self, where=where)


@dataclass(frozen=True, slots=True, kw_only=True)
class Citation:
    """A place in a work, such as an equation, a table or a section."""

    source: Source
    where: str

    def __str__(self) -> str:
        """Give the citation as one line for a page."""
        note = f" ({self.source.note})" if self.source.note else ""
        return f"{self.source.work}, {self.where}{note}"


@dataclass(frozen=True, slots=True, kw_only=True)
class Unit:
    """A unit of measurement: ``value in SI = (reading + zero) * factor``, both exact.

    ``spellings`` are what crews type besides ``key``; ``ucum`` is the code used in files (UCUM 2.1).
    """

    key: str
    dimension: Dimension
    factor: Fraction
    ucum: str
    source: Citation
    zero: Fraction = Fraction(0)
    spellings: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True, kw_only=True)
class Kind:
    """A kind of quantity (ISO 80000): its SI unit, the units offered on a page, and the field's range in SI.

    ``low`` and ``high`` bound numeric solutions and refuse impossible readings; ``note`` says what a field
    reading needs before it may enter a formula. ``reference`` names how a pressure is counted.
    """

    key: str
    title: str
    dimension: Dimension
    si: str
    units: tuple[str, ...]
    low: float
    high: float
    note: str = ""
    reference: str = ""


@dataclass(frozen=True, slots=True, kw_only=True)
class Constant:
    """A constant of nature or convention: exact value in SI, its dimension, and where it is fixed."""

    title: str
    value: Fraction
    unit: str
    dimension: Dimension
    source: Citation | None = None


@dataclass(frozen=True, slots=True)
class Variable:
    """A variable of a relation: its kind, what it means there, its sign and a value taken when none is given.

    With ``choices`` it is one of these words, and stands in the equation as its place among them, from 0.
    """

    kind: Kind
    text: str
    sign: Sign = Sign.POSITIVE
    default: Fraction | None = None
    choices: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True)
class GasName:
    """The gas whose properties an opaque function of the relation takes."""

    text: str = "gas"


@dataclass(frozen=True, slots=True, kw_only=True)
class Validity:
    """A condition under which the relation holds, and what is said outside it. ``refuse`` gives no figure there."""

    holds: sympy.Basic
    says: str
    refuse: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class Branch:
    """Which root is taken for an unknown with several, and why."""

    unknown: sympy.Symbol
    root: Root
    why: str


@dataclass(frozen=True, slots=True, kw_only=True)
class Split:
    """Two values of an unknown may satisfy the relation, one on each side of ``at``, where it turns.

    ``below`` and ``above`` name the sides, which the user is asked to choose from; a side without a name is not
    physical, and the other one is taken.
    """

    unknown: sympy.Symbol
    at: sympy.Expr
    below: str = ""
    above: str = ""


@dataclass(frozen=True, slots=True, kw_only=True)
class Relation:
    """One equation ``left = right``, written once.

    ``source`` may only be missing until generator.check has asked for it. ``where`` maps each symbol to its meaning
    in textbook order, which labels, signatures and printing follow. ``example`` holds typed readings of the invented
    demo scenario; the unknown that is left out is the one found. A symbol whose name ends in ``_i`` is a list of any
    length; ``turned`` names the relation that gives such a list back whole. ``data`` are constants of the substance,
    which are looked up and never asked for. ``parts`` name what the equation is built of, each from those before it.
    """

    key: str
    title: str
    left: sympy.Expr
    right: sympy.Expr
    where: Mapping[sympy.Symbol, Variable | Constant | GasName]
    assumes: tuple[str, ...]
    example: Mapping[str, str | tuple[str, ...]]
    source: Citation | None = None
    valid: tuple[Validity, ...] = ()
    branches: tuple[Branch, ...] = ()
    splits: tuple[Split, ...] = ()
    data: tuple[sympy.Symbol, ...] = ()
    parts: Mapping[sympy.Symbol, sympy.Expr] = MappingProxyType({})
    nature: Nature = Nature.LAW
    words: tuple[str, ...] = ()
    turned: Mapping[sympy.Symbol, str] = MappingProxyType({})


@dataclass(frozen=True, slots=True, kw_only=True)
class Family:
    """Relations of one field of the trade, in the order of the catalogue."""

    key: str
    letter: str
    title: str
    lead: str
    relations: tuple[Relation, ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class Caution:
    """What can hurt someone, in two or three plain lines."""

    key: str
    text: str


class Use:
    """One use of a relation in a sheet: the relation's variables bound to the sheet's own rows."""

    __slots__ = ("relation", "rows")

    def __init__(self, relation: Relation, **rows: str) -> None:
        """Bind each variable of ``relation``, by name, to a row of the sheet."""
        self.relation = relation
        self.rows: Mapping[str, str] = MappingProxyType(rows)


@dataclass(frozen=True, slots=True, kw_only=True)
class Row:
    """A row of a sheet that is read, found, or worked out on the way.

    ``reading`` rows stand in the table; the others appear in the working only. ``site`` names the site condition
    that fills the row until someone reads it. ``low`` and ``high`` narrow the kind's range for this row (SI).
    ``accuracy`` is the limit taken when no instrument is chosen, such as ``"± 1 %"`` or ``"exact"``; ``of_gas`` names
    the property of the gas that fills the row; ``is_gas`` marks the row that names the gas,
    ``is_clock`` one that holds a time of day.
    """

    title: str
    kind: Kind
    note: str = ""
    reading: bool = True
    site: str = ""
    accuracy: str = ""
    low: float | None = None
    high: float | None = None
    unusual_above: float | None = None
    whole: bool = False
    optional: bool = False
    of_gas: str = ""
    is_gas: bool = False
    is_clock: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class Find:
    """A row that may be asked for, as a question, with the figure to sign.

    ``safe`` is "low" where the signed figure is result - U rounded down and "high" where it is result + U rounded
    up; ``label`` names that figure; ``unit`` is the unit it is shown in first. ``limit`` names the row the figure is
    held against (from below where safe is low, from above where it is high) and ``limit_text`` says it in words;
    ``clock`` names the row of the start, where the figure is also a time of day.
    """

    row: str
    ask: str
    label: str
    safe: str
    unit: str
    limit: str = ""
    limit_text: str = ""
    clock: str = ""


@dataclass(frozen=True, slots=True, kw_only=True)
class Plot:
    """A curve that decides something: the row on the upright axis against the row along, by an engine function."""

    function: str
    title: str
    along: str
    upright: str


@dataclass(frozen=True, slots=True, kw_only=True)
class Sheet:
    """A job of the day as a network of relations.

    ``rows`` are in the order they are read; ``uses`` bind relations to rows; ``finds`` are the questions, the first
    being the usual one; ``example`` holds typed readings of the invented demo scenario for the first question.
    ``notes`` names engine functions that question or warn about readings (they hold no formula of the catalogue).
    """

    key: str
    title: str
    lead: str
    group: str
    rows: Mapping[str, Row]
    uses: tuple[Use, ...]
    finds: tuple[Find, ...]
    cautions: tuple[Caution, ...]
    rule: str
    example: Mapping[str, str]
    plot: Plot | None = None
    notes: tuple[str, ...] = ()
    words: tuple[str, ...] = ()
