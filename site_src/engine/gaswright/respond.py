"""The parts of an answer that laws and sheets share: rows with their states, figures, shares, refusals.

Takes readings, errors and SI values; gives plain dictionaries and texts. gaswright.answer_law and
gaswright.answer_sheet come next.
"""

from typing import Any, NamedTuple

from gaswright import quantity, show
from gaswright.conditions import CAME_FROM
from gaswright.errors import GaswrightError, ReadingError
from gaswright.reading import COUNTED, Reading
from gaswright.records import Kind
from gaswright.uncertainty import Share

Response = dict[str, Any]
FEWEST_PERCENT = 0.5
ROW_DIGITS = 7
NO_U = "No uncertainty: every reading is exact."


class Display(NamedTuple):
    """How a figure is shown: its kind, the unit, the decimal mark."""

    kind: Kind
    unit: str
    mark: str

    def counted(self) -> str:
        """Give the word that says how a pressure is counted."""
        return f" {self.kind.reference}" if self.kind.reference in COUNTED else ""


def ok_row(reading: Reading, kind: Kind, mark: str) -> Response:
    """Give the state of a row that was read: its SI value and how good it is."""
    counted = f" {reading.reference}" if reading.reference in COUNTED else ""
    si = f"{show.tidy(reading.value, 7, mark)} {'°C' if kind.si == 'Cel' else kind.si}".removesuffix(" 1") + counted
    says = f"{reading.text}, as typed with a volume or flow" if reading.came_from == CAME_FROM else ""
    return {"state": "ok", "says": says, "si": si, "by": reading.by, "typed": reading.text}


def problem_row(error: ReadingError) -> Response:
    """Give the state of a row that cannot be taken, with what is offered instead."""
    says = f"Found {error.found}; expected {error.expected}. {error.todo}"
    offers = [{"text": text} for text in error.offers]
    return {"state": "question" if error.question else "error", "says": says, "offers": offers}


def blank(rows: dict[str, Response], cautions: tuple[str, ...]) -> Response:
    """Give an answer that says nothing yet but the states of the rows."""
    return {
        "state": "empty",
        "rows": rows,
        "figure": None,
        "best": "",
        "value": None,
        "unit": "",
        "expanded": None,
        "verdict": None,
        "versus": [],
        "shares": [],
        "working": [],
        "cautions": list(cautions),
        "warnings": [],
        "refusal": None,
        "extra": [],
        "plot": None,
    }


def with_state(response: Response, state: str) -> Response:
    """Give the answer with its state."""
    response["state"] = state
    return response


def place_error(response: Response, error: ReadingError, taken: dict[str, Reading]) -> Response:
    """Put an error that came up while counting beside the row it belongs to."""
    named = [name for name, reading in taken.items() if error.where.startswith(reading.name)]
    if not named:
        return with_state({**response, "refusal": str(error)}, "refused")
    name = max(named, key=lambda each: len(taken[each].name))  # "Pressure now" is not "Pressure"
    response["rows"][name] = problem_row(error)
    return with_state(response, "incomplete")


def figure_texts(value: float, expanded: float, display: Display) -> tuple[float, float, str]:
    """Give the value and U in the unit shown, and the best estimate ± U as text."""
    kind, unit, mark = display
    shown, width = quantity.in_unit(value, kind, unit), quantity.interval_in_unit(expanded, kind, unit)
    best, plus = show.plus_minus(shown, width, mark)
    text = quantity.with_unit(best, unit)
    return shown, width, f"{text} ± {quantity.with_unit(plus, unit)}" if width else text


def exact(shown: float, display: Display) -> Response:
    """Give the unrounded value in the unit shown, for the row that takes it over as a reading."""
    kind, unit, mark = display
    reference = kind.reference if kind.reference in COUNTED else ""
    return {"text": repr(shown).replace(".", mark), "unit": unit, "reference": reference}


def factor(k: float, mark: str) -> str:
    """Give the coverage factor in words."""
    return f"k = {show.tidy(k, 3, mark)}"


def share_list(shares: tuple[Share, ...]) -> list[Response]:
    """Give the shares that matter, in whole per cent."""
    return [
        {"label": share.label, "percent": round(share.fraction * 100)}
        for share in shares
        if share.fraction * 100 >= FEWEST_PERCENT
    ]


def refused(error: GaswrightError) -> Response:
    """Answer a request that cannot be read at all."""
    return {**blank({}, ()), "state": "refused", "refusal": str(error)}
