"""What a page is given to draw: plain text and ready MathML, no spec values.

Takes nothing; gives frozen values. ``generator.make_views`` fills them from the solved spec and the emitted engine,
``generator.emit_pages`` and the templates draw them. Every text is plain (escaped by the template), except the
fields called ``mathml`` and ``figure``, which hold a whole ``<math>`` or ``<svg>`` element.
"""

from collections.abc import Mapping
from dataclasses import dataclass, field
from typing import Any


@dataclass(frozen=True, slots=True, kw_only=True)
class RowView:
    """A row of a calculator or sheet: what is read, in which units, what stands in it at the start."""

    name: str
    title: str
    symbol: str = ""
    mathml: str = ""
    kind: str = ""
    units: tuple[str, ...] = ()
    references: tuple[str, ...] = ()
    text: str = ""
    unit: str = ""
    reference: str = ""
    note: str = ""
    by: str = ""
    site: str = ""
    accuracy: str = ""
    measures: str = ""
    may_be_negative: bool = False
    is_gas: bool = False
    is_found: bool = False
    is_text: bool = False
    is_optional: bool = False
    choices: tuple[tuple[str, str], ...] = ()
    term: int = 0
    groups: tuple["UnitGroup", ...] = ()


@dataclass(frozen=True, slots=True, kw_only=True)
class UnitGroup:
    """Units of one kind of quantity among those a row offers; ``is_counted`` where gauge and absolute differ."""

    kind: str
    title: str
    units: tuple[str, ...]
    is_counted: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class FormView:
    """A relation solved for one unknown."""

    unknown: str
    symbol: str
    mathml: str
    text: str
    way: str
    unit_note: str
    argument_notes: tuple[str, ...] = ()
    sensitivities: tuple[tuple[str, str], ...] = ()


@dataclass(frozen=True, slots=True, kw_only=True)
class CheckView:
    """A number from outside beside what this engine gives."""

    given: str
    published: str
    here: str
    source: str
    basis: str


@dataclass(frozen=True, slots=True, kw_only=True)
class RelationView:
    """A page of a law."""

    key: str
    title: str
    family_key: str
    family: str
    mathml: str
    text: str
    assumes: tuple[str, ...]
    parts: tuple[tuple[str, str], ...] = ()
    validity: tuple[str, ...]
    source: str
    rows: tuple[RowView, ...]
    constants: tuple[tuple[str, str, str], ...]
    find: str
    finds: tuple[str, ...] = ()
    is_over_lists: bool = False
    forms: tuple[FormView, ...]
    checks: tuple[CheckView, ...]
    answer: Mapping[str, Any]
    nature: str
    used_by: tuple[tuple[str, str], ...] = ()
    words: tuple[str, ...] = ()
    cautions: tuple[str, ...] = ()
    figure: str = ""


@dataclass(frozen=True, slots=True, kw_only=True)
class FamilyView:
    """A family of laws on the index page."""

    key: str
    letter: str
    title: str
    lead: str
    relations: tuple[RelationView, ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class FindView:
    """A question at the top of a sheet."""

    row: str
    ask: str
    label: str
    unit: str
    units: tuple[str, ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class SheetView:
    """A sheet of the one sheets document, with its worked example as answered by the engine."""

    key: str
    title: str
    lead: str
    group: str
    finds: tuple[FindView, ...]
    rows: tuple[RowView, ...]
    cautions: tuple[str, ...]
    rule: str
    answer: Mapping[str, Any]
    request: Mapping[str, Any]
    uses: tuple[tuple[str, str], ...]
    words: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True, kw_only=True)
class GasView:
    """A page of a gas: identity, hazards, tables worked out by the engine."""

    key: str
    title: str
    formula: str
    identity: tuple[tuple[str, str], ...]
    hazards: tuple[str, ...]
    equation: str
    uncertainty: tuple[str, ...]
    limits: tuple[tuple[str, str], ...]
    tables: tuple["TableView", ...] = ()
    words: tuple[str, ...] = ()


@dataclass(frozen=True, slots=True, kw_only=True)
class TableView:
    """A ruled table with a caption; ``is_figures`` where all but the first column are figures."""

    caption: str
    head: tuple[str, ...]
    rows: tuple[tuple[str, ...], ...]
    note: str = ""
    is_figures: bool = False


@dataclass(frozen=True, slots=True, kw_only=True)
class ConvertView:
    """The converter: its two rows, and its worked example as answered by the engine."""

    reading: RowView
    station: RowView
    answer: Mapping[str, Any]


@dataclass(frozen=True, slots=True, kw_only=True)
class TablePageView:
    """A page of reference tables; ``laws`` are the keys of those its figures come from."""

    key: str
    title: str
    lead: str
    tables: tuple[TableView, ...]
    words: tuple[str, ...] = ()
    laws: tuple[str, ...] = ()
    convert: ConvertView | None = None


@dataclass(frozen=True, slots=True, kw_only=True)
class SiteView:
    """Everything the pages draw."""

    families: tuple[FamilyView, ...]
    sheets: tuple[SheetView, ...]
    gases: tuple[GasView, ...]
    tables: tuple[TablePageView, ...]
    scenario: str
    version: str
    digest: str
    notices: str = ""
    extra: Mapping[str, Any] = field(default_factory=dict)
