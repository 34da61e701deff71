"""Cases from outside, as SI values with the width their source allows.

Takes ``spec/cases``; gives the cases and, for each, the interval in which an answer agrees with the source.
"""

from pathlib import Path

from gaswright import any_kind, number, unit
from gaswright.find import relation
from gaswright.law import read_variable
from gaswright.reading import Reading, read
from gaswright.records import Kind
from gaswright.tables import KINDS

from generator.load import Case, read_cases

ROOT = Path(__file__).resolve().parents[2]
CASES = read_cases(ROOT / "spec" / "cases")
CLOSE = 1e-9


def name_of(case: Case) -> str:
    """Give a readable test id."""
    file, place = case.name.removeprefix("spec/cases/").removesuffix(")").split(".toml, case ")
    return f"{case.relation}-{case.find}-{file[0]}{place}"


def kind_of(case: Case, name: str) -> Kind:
    """Give the kind of one variable of the case's relation."""
    return KINDS[any_kind.settled(relation(case.relation), case.given | {case.find: case.expect}).variable(name).kind]


def reading_of(case: Case, name: str) -> Reading:
    """Read one variable of the case as it is typed there."""
    text = case.expect if name == case.find else case.given[name]
    variable = relation(case.relation).variable(name)
    return read_variable(variable, text, None, None) if variable.choices else read(name, text, kind_of(case, name))


def half_digit(case: Case, name: str) -> float:
    """Give half a unit in the last place typed, in SI."""
    if relation(case.relation).variable(name).choices:
        return 0.0
    reading = reading_of(case, name)
    digits = reading.text.split(" ", maxsplit=1)[0]
    factor = unit.parse(reading.unit, name, kind_of(case, name).exponents).factor
    return number.parse(digits, name).step / 2 * factor


def span(case: Case) -> tuple[float, float]:
    """Give the interval in which an answer agrees with the published figure (SI)."""
    value = reading_of(case, case.find).value
    half = half_digit(case, case.find)
    if case.rounding == "truncated":
        return (value, value + 2 * half)
    if case.rounding == "exact":
        half = CLOSE * abs(value)
    if case.rounding == "publisher":
        digits, _, unit_text = case.within.partition(" ")
        half = (
            number.parse(digits, case.name).value
            * unit.parse(unit_text or "1", case.name, kind_of(case, case.find).exponents).factor
        )
    return (value - half, value + half)
