"""Refuse a question that structure allows and conditioning does not.

Takes ``Routed`` with the staged engine importable; raises an ExceptionGroup of SpecError. At the worked example, a
reading moved by its own uncertainty must not move the answer by more than the range of its row.
"""

from gaswright.errors import GaswrightError
from gaswright.sheet import worked_example

from generator.errors import SpecError
from generator.route import Routed


def check_conditioning(routed: Routed) -> None:
    """Work every question of every sheet at its example and refuse the ill-conditioned ones."""
    mistakes = [
        mistake
        for sheet in routed.checked.loaded.sheets
        for find in sheet.finds
        for mistake in _question(sheet.key, find.row)
    ]
    if mistakes:
        raise ExceptionGroup("a question cannot be answered", mistakes)


def _question(sheet: str, row: str) -> list[SpecError]:
    where = f"sheet {sheet}, row {row}"
    try:
        result = worked_example(sheet, row)
    except GaswrightError as error:
        todo = "correct the example, or take the row out of finds"
        return [SpecError(where, f"no answer at the worked example ({error})", "an answer", todo)]
    width = result.high - result.low
    return [
        SpecError(
            where,
            f"an answer that {share.label} alone, moved by its own uncertainty, moves by {share.moves:.3g} (SI)",
            f"less than the row's range of {width:.3g} (SI)",
            "take the row out of finds: the readings cannot determine it",
        )
        for share in result.shares
        if share.moves > width
    ]
