"""Take the readings of a sheet: every row read, what is wrong and what is missing gathered by row.

Takes a sheet, a question and readings as typed; gives what was taken. gaswright.sheet works with it.
"""

from collections.abc import Mapping
from typing import Any, NamedTuple

from gaswright import clock, conditions, quantity
from gaswright.errors import ReadingError
from gaswright.gas import Gas
from gaswright.gas import find as find_gas
from gaswright.model import Find, Row, Sheet
from gaswright.reading import COUNTED, Instruments, Reading, read
from gaswright.tables import KINDS
from gaswright.typed import text_of


class Taken(NamedTuple):
    """Readings of a sheet as taken, by row; gases; what went wrong by row; rows still empty; times of day."""

    readings: dict[str, Reading]
    gases: dict[str, Gas]
    problems: dict[str, ReadingError]
    empty: list[str]
    clocks: dict[str, str]

    def gas(self) -> Gas:
        """Give the gas; ReadingError where none was chosen."""
        for gas in self.gases.values():
            return gas
        raise ReadingError("Gas", "nothing", "the gas by name or formula", "Choose the gas.")


def question(sheet: Sheet, row: str | None) -> Find:
    """Give the question asked; ReadingError names the rows that may be found."""
    if row is None:
        return next(iter(sheet.finds.values()))
    if row not in sheet.finds:
        raise ReadingError(
            sheet.title, f"the question {row!r}", f"one of {', '.join(sheet.finds)}", "Ask for one of these."
        )
    return sheet.finds[row]


def take(
    sheet: Sheet, find: Find, raw: dict[str, Any], decimal: str | None = None, instruments: Instruments | None = None
) -> Taken:
    """Read every row; gather what is wrong and what is missing instead of stopping."""
    rows = {name: row for name, row in sheet.rows.items() if row.reading}
    taken = Taken({}, {}, {name: _unknown_row(sheet, name) for name in raw if name not in rows}, [], {})
    raw = conditions.filled(raw, {name: row.kind for name, row in rows.items()}, find.row, decimal)
    for name, row in rows.items():
        if name == find.row:
            continue
        if not text_of(raw.get(name)):
            if not row.optional:
                taken.empty.append(name)
            continue
        try:
            _take_row(taken, name, row, raw[name], decimal, instruments)
        except ReadingError as problem:
            taken.problems[name] = problem
    return taken


def _take_row(  # noqa: PLR0913, PLR0917 - a row, what was typed in it, and how to read it
    taken: Taken, name: str, row: Row, raw: Any, decimal: str | None, instruments: Instruments | None
) -> None:
    if row.is_gas:
        taken.gases[name] = find_gas(text_of(raw))
    elif row.is_clock:
        taken.clocks[name] = clock.check(text_of(raw), row.title)
    else:
        taken.readings[name] = _read_row(row, raw, decimal, instruments)


def _unknown_row(sheet: Sheet, name: str) -> ReadingError:
    rows = ", ".join(row for row, meaning in sheet.rows.items() if meaning.reading)
    return ReadingError(sheet.title, f"the row {str(name)[:40]!r}", f"one of {rows}", "Correct the name.")


def _read_row(row: Row, raw: Any, decimal: str | None, instruments: Instruments | None) -> Reading:
    if row.accuracy and isinstance(raw, str):
        raw = {"text": raw, "accuracy": row.accuracy}
    elif row.accuracy and isinstance(raw, Mapping) and not raw.get("accuracy") and not raw.get("instrument"):
        raw = {**raw, "accuracy": row.accuracy}
    reading = read(row.title, raw, KINDS[row.kind], decimal, instruments)
    if reading.reference == KINDS[row.kind].reference:
        refuse_outside_row(row, reading, reading.value)
    if row.whole and abs(reading.number - round(reading.number)) > 1e-9:
        raise ReadingError(row.title, reading.text, "a whole number", "Count again.")
    return reading


def refuse_outside_row(row: Row, reading: Reading, value: float) -> None:
    """Raise ReadingError where ``value``, the reading in SI as the row counts, is outside the row's range."""
    if row.low <= value <= row.high:
        return
    kind = KINDS[row.kind]
    low, high = (quantity.text_of(edge, kind, reading.unit) for edge in (row.low, row.high))
    counted = f" {kind.reference}" if kind.reference in COUNTED else ""
    expected = f"between {low} and {high}{counted}"
    raise ReadingError(row.title, reading.text, expected, "Check the number and its unit.")
