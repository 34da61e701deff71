"""What stands round a sheet's figure: the verdict, real beside ideal, what was assumed, what else is read off.

Takes a SheetResult; gives texts. gaswright.answer_sheet comes next.
"""

from gaswright import quantity, show
from gaswright.model import Find, Sheet
from gaswright.respond import Display, Response
from gaswright.sheet import SheetResult
from gaswright.tables import KINDS


def stepped(seconds: float, expanded: float, unit: str, *, down: bool) -> float:
    """Round a time to the step its uncertainty allows, in whole minutes at the finest for an hour and more."""
    scale = {"min": 60.0, "h": 3600.0}[unit]
    step = show.step_for(expanded / scale)
    return seconds if step is None else show.rounded_to(seconds / scale, step, down=down) * scale


def verdict_words(sheet: Sheet, find: Find, result: SheetResult, text: str, mark: str) -> Response | None:
    """Give the outcome in words, word first, or nothing where no limit is given."""
    if result.limit is None:
        return None
    row = sheet.rows[find.limit]
    unit = result.readings[find.limit].unit
    limit = quantity.text_of(result.limit, KINDS[row.kind], unit, mark) + Display(KINDS[row.kind], unit, mark).counted()
    missed = "not reached" if find.safe == "low" else "exceeded"
    says = {
        "PASS": f"{find.limit_text} {limit}; the safe end is {text}.",
        "FAIL": f"{find.limit_text} {limit}; {missed} even at the favourable end of the uncertainty.",
        "CANNOT DECIDE": f"{find.limit_text} {limit}, which lies inside the uncertainty of these instruments. "
        + _would_decide(result, mark),
    }[result.verdict]
    return {"word": result.verdict, "says": says}


def _would_decide(result: SheetResult, mark: str) -> str:
    """Say what would decide: how small U must be, and which reading to better first."""
    margin = abs(result.value - (result.limit or 0.0))
    if not result.shares or margin == 0:
        return "The best estimate stands on the limit itself: no instrument decides it."
    worst = result.shares[0]
    times = show.number(show.rounded_to(result.expanded / margin, 0.1, down=False), 1, mark)
    return (
        f"An uncertainty {times} times smaller would decide; "
        f"{worst.label} contributes {worst.fraction * 100:.0f} % of it, so better that first."
    )


def versus(result: SheetResult, display: Display) -> list[list[str]]:
    """Give real and ideal side by side, with the difference in per cent."""
    kind, unit, mark = display

    def shown(value: float) -> str:
        return quantity.with_unit(show.tidy(quantity.in_unit(value, kind, unit), 5, mark), unit) + display.counted()

    rows = [[f"Real {result.gas.lower()}", shown(result.value)]]
    if result.ideal is None:
        return [*rows, ["Ideal law", "no answer"]]
    if kind.si in ("K", "Cel") or result.value <= 0:  # a share of a temperature or of a vacuum says nothing
        return [*rows, ["Ideal law", shown(result.ideal)]]
    off = (result.ideal / result.value - 1) * 100
    difference = f"{show.significant(abs(off), 2, mark)} % {'more' if off > 0 else 'less'}"
    return [*rows, ["Ideal law", f"{shown(result.ideal)}, {difference}"]]


def assumption(result: SheetResult, display: Display) -> list[str]:
    """Say which assumption on shared instrument error was used, and what the other would give."""
    kind, unit, mark = display
    if not any(reading.instrument for reading in result.readings.values()) or result.other_u == result.u:
        return []
    other = quantity.with_unit(
        show.significant(quantity.interval_in_unit(result.k * result.other_u, kind, unit), 2, mark), unit
    )
    used = "shared fully, because the readings are close together" if result.shared else "independent between readings"
    return [
        f"The error of an instrument used more than once is taken as {used}; the other assumption gives U = {other}."
    ]


def extra(sheet: Sheet, find: Find, result: SheetResult, mark: str) -> list[list[str]]:
    """Give what else is read off the answer: clock time of a changeover, mass and amount of a content."""
    lines: list[list[str]] = []
    if result.ends:
        lines.append(["Change over by", result.ends])
    for name in ("m", "n"):
        if find.row == "V_ref" and name in sheet.rows:
            kind = KINDS[sheet.rows[name].kind]
            per = quantity.in_unit(result.values[name], kind, kind.units[0]) / result.value
            text = show.safe_end(per * result.safe, per * result.expanded, mark, down=True)
            lines.append([f"{sheet.rows[name].title}, safe end", quantity.with_unit(text, kind.units[0])])
    pair = [result.readings[name] for name in ("T_ref", "p_ref") if name in result.readings]
    if len(pair) == 2:
        lines.append(["Reference conditions", ", ".join(reading.text for reading in pair)])
    return lines
