"""Tables of the units: every unit by kind with its exact factor, and the words of the field that stand for units.

Takes the spec's units and kinds, and the staged engine; gives tables. generator.table_views puts them on a page.
"""

from collections.abc import Iterable
from fractions import Fraction

from gaswright.any_kind import ANY
from gaswright.show import tidy
from gaswright.unit import parse

from generator.views import TableView
from spec import dimensions as dim
from spec.dimensions import Dimension
from spec.model import Kind, Unit
from spec.unit_words import ASKED_PAIR, PRODUCTS, QUESTIONS, WITH_PAIR

TITLES = {
    dim.PRESSURE: "Pressure",
    dim.TEMPERATURE: "Temperature",
    dim.LENGTH: "Length",
    dim.AREA: "Area",
    dim.VOLUME: "Volume",
    dim.MASS: "Mass",
    dim.AMOUNT: "Amount of substance",
    dim.TIME: "Time",
    dim.FORCE: "Force",
    dim.ENERGY: "Energy",
    dim.ENERGY / dim.TIME: "Power",
    dim.VISCOSITY: "Viscosity",
    dim.NUMBER: "Numbers, shares and angles",
}
ROOTS = "Roots, for constants of meters and distances"
LONGEST = 18
DIGITS = 10
NUMBERED = "The numbers of the sources are told at the end of the page."


def unit_tables(units: Iterable[Unit]) -> tuple[TableView, ...]:
    """Give a table for each kind of quantity, in the order in which the spec has them."""
    units = tuple(units)
    marks = _marks(units)
    groups: dict[str, list[Unit]] = {}
    for unit in units:
        groups.setdefault(TITLES.get(unit.dimension, ROOTS), []).append(unit)
    titles = sorted(groups, key=lambda title: title == ROOTS)
    return tuple(_unit_table(title, groups[title], marks) for title in titles)


def sources_table(units: Iterable[Unit]) -> TableView:
    """Give the sources of the factors, by the numbers that stand behind them."""
    rows = tuple((mark, source) for source, mark in _marks(units).items())
    return TableView(caption="Sources of the factors", head=("Number", "Source"), rows=rows)


def _marks(units: Iterable[Unit]) -> dict[str, str]:
    """Give each source its number, in the order in which the units first cite them."""
    sources = dict.fromkeys(str(unit.source) for unit in units)
    return {source: str(number) for number, source in enumerate(sources, 1)}


def _unit_table(title: str, units: list[Unit], marks: dict[str, str]) -> TableView:
    has_zero = any(unit.zero for unit in units)
    own = units[0].dimension
    si = f", in {si_text(own)}" if title != ROOTS and own != dim.NUMBER else ""
    head = ("Unit", f"Factor to SI{si}", *(("Added first",) if has_zero else ()), "Also written", "UCUM code", "Source")
    rows = tuple(
        (
            unit.key,
            exact_text(unit.factor),
            *((exact_text(unit.zero) if unit.zero else "0",) if has_zero else ()),
            ", ".join(unit.spellings),
            unit.ucum,
            marks[str(unit.source)],
        )
        for unit in units
    )
    note = f"{'SI value = (reading + what is added first) × factor. ' if has_zero else ''}{NUMBERED}"
    return TableView(caption=title, head=head, rows=rows, note=note)


def si_text(dimension: Dimension) -> str:
    """Give the SI unit of a dimension: with its own name where it has one, in base units otherwise."""
    named = {dim.PRESSURE: "Pa", dim.FORCE: "N", dim.ENERGY: "J", dim.ENERGY / dim.TIME: "W", dim.VISCOSITY: "Pa·s"}
    return named.get(dimension) or str(dimension).replace("^3", "³").replace("^2", "²").replace(" ", "·")


def exact_text(factor: Fraction) -> str:
    """Give a factor exactly: as a decimal where it ends, else to ten digits with the fraction that it is."""
    decimal = _decimal(factor)
    if decimal and len(decimal) <= LONGEST:
        return decimal
    rounded = f"{float(factor):.{DIGITS}g}"
    fraction = f"{factor.numerator}/{factor.denominator}"
    if decimal:
        return f"{rounded} (rounded)"
    return f"{rounded} ({fraction} exactly)" if len(fraction) <= 2 * LONGEST else f"{rounded} (rounded)"


def _decimal(factor: Fraction) -> str:
    """Give a fraction as a decimal that ends, or nothing where none does."""
    rest, places = factor.denominator, 0
    for prime in (2, 5):
        count = 0
        while rest % prime == 0:
            rest //= prime
            count += 1
        places = max(places, count)
    if rest != 1:
        return ""
    digits = str(factor.numerator * 10**places // factor.denominator).rjust(places + 1, "0")
    return f"{digits[:-places]}.{digits[-places:]}" if places else digits


def offered_table(kinds: Iterable[Kind]) -> TableView:
    """Give the units of rows that are products of those above, each with its factor as the engine reads it."""
    rows = {
        unit: (unit, _title(kind), factor, si_text(kind.dimension))
        for kind in kinds
        if kind.key != ANY
        for unit in kind.units
        if (factor := _factor(unit, kind))
    }
    return TableView(
        caption="Products of units that rows offer",
        head=("Unit", "Quantity", "Factor to SI", "SI unit"),
        rows=tuple(rows.values()),
        note="Any other product can be typed: kg/m³, mbar·L/s, J/(kg·K). Factors are shown to ten digits.",
    )


def _factor(unit: str, kind: Kind) -> str:
    """Give the factor of a product, or nothing where the unit stands by itself or has the factor 1."""
    if not any(sign in unit for sign in "/·²³⁶"):
        return ""
    found = parse(unit, kind.title, tuple(float(power) for power in kind.dimension.exponents()), kind.title)
    return tidy(found.factor, DIGITS)


def _title(kind: Kind) -> str:
    return f"{kind.title[:1].upper()}{kind.title[1:]}"


def paired_table() -> TableView:
    """Give the words that stand for a unit, some with the reference conditions that they carry."""
    with_pair = tuple((word, unit, pair) for word, (unit, pair) in WITH_PAIR.items())
    plain = tuple((word, unit, "") for word, unit in PRODUCTS.items())
    return TableView(
        caption="Words of the field",
        head=("Written", "Read as", "At reference conditions"),
        rows=(*with_pair, *plain),
    )


def asked_table() -> TableView:
    """Give the words that are asked about, because they have more than one meaning."""
    pairs = tuple((word, f"{unit} at {', or at '.join(pairs)}") for word, (unit, pairs) in ASKED_PAIR.items())
    words = tuple((word, ", or ".join(offers)) for word, offers in QUESTIONS.items())
    return TableView(
        caption="Words that are asked about",
        head=("Written", "May mean"),
        rows=(*words, *pairs),
        note="What has more than one meaning is never guessed.",
    )
