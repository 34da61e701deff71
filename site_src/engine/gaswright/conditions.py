"""Keep the reference conditions typed with a volume or flow in step with the rows that hold them.

Takes what was typed, by row; gives it back with the pair of ``30 Nm³/h`` put in the rows it leaves open, and asks
where a pair and its rows differ. gaswright.law and gaswright.take come before any figure.
"""

from collections.abc import Mapping
from typing import Any

from gaswright.errors import ReadingError
from gaswright.reading import Reading, read
from gaswright.tables import KINDS
from gaswright.typed import text_of

COUNTED_AT = ("reference_volume", "reference_flow")
PAIRS = (("T_ref", "p_ref"), ("T_0", "p_0"))
CAME_FROM = "pair"
SAME = 1e-6


def pair_rows(names: Mapping[str, str]) -> tuple[str, str] | None:
    """Give the rows of reference temperature and pressure among ``names`` (row to kind), None where there are none."""
    return next(((hot, pressed) for hot, pressed in PAIRS if hot in names and pressed in names), None)


def filled(raw: Mapping[str, Any], kinds: Mapping[str, str], unknown: str, decimal: str | None) -> dict[str, Any]:
    """Give ``raw`` with the rows of the reference conditions taken from a pair typed with a volume or flow.

    A row that someone typed stays as it is; one that is empty or comes from site conditions gives way, because the
    pair is part of what was read. ``kinds`` maps every row read to its kind.
    """
    rows = pair_rows(kinds)
    given = dict(raw)
    for name, kind in kinds.items():
        if rows and kind in COUNTED_AT and name != unknown and text_of(raw.get(name)):
            for row, part in zip(rows, _parts(raw[name], kind, decimal), strict=False):
                if row != unknown and _gives_way(given.get(row)):
                    given[row] = {
                        "text": part,
                        "reference": "absolute" if row == rows[1] else None,
                        "accuracy": "exact",
                        "from": CAME_FROM,
                    }
    return given


def _gives_way(raw: Any) -> bool:
    return not text_of(raw) or (isinstance(raw, Mapping) and (raw.get("from") or "read") in ("site", "preset"))


def _parts(raw: Any, kind: str, decimal: str | None) -> tuple[str, ...]:
    """Give temperature and pressure of the pair typed, with the page's decimal mark; nothing where none was typed."""
    try:
        reading = read(
            "pair", raw if not isinstance(raw, Mapping) else {**raw, "instrument": None}, KINDS[kind], decimal
        )
    except ReadingError:
        return ()  # the row itself says what is wrong when it is read
    if not reading.conditions:
        return ()
    pair = reading.text.rpartition("(")[2].removesuffix(")")
    return tuple(part if "," in part else part.replace(".", decimal or ".") for part in pair.split(", "))


def check(readings: Mapping[str, Reading], values: Mapping[str, float], kinds: Mapping[str, str]) -> tuple[str, ...]:
    """Ask where a typed pair differs from its rows (``values``, SI); say so where no row takes it.

    Raises ReadingError: the pair differs, or one of its rows is what was asked for.
    """
    rows = pair_rows(kinds)
    said = []
    for name, reading in readings.items():
        if kinds.get(name) not in COUNTED_AT or not reading.conditions:
            continue
        if rows is None:
            said.append(
                f"{reading.name}: {reading.text} was taken as it stands; its reference conditions play no part."
            )
        elif any(row not in readings for row in rows):
            raise ReadingError(
                reading.name,
                reading.text,
                "a reading without reference conditions, because they are asked for",
                "Leave out the pair, or ask for another row.",
            )
        elif any(abs(values[row] - own) > SAME * own for row, own in zip(rows, reading.conditions, strict=True)):
            raise _differs(reading, *(readings[row] for row in rows))
    return tuple(said)


def _differs(reading: Reading, temperature: Reading, pressure: Reading) -> ReadingError:
    pair = f"{temperature.text}, {pressure.text.removesuffix(' absolute')}"
    bare = reading.text.rpartition(" (")[0]
    return ReadingError(
        reading.name,
        reading.text,
        f"the reference conditions that stand in their own rows, {pair}",
        "Correct those rows, or choose their conditions here.",
        offers=(f"{bare} ({pair})",),
    )
