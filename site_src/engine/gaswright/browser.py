"""Speak JSON with the page.

Takes a request as JSON text; gives a response as JSON text, and never raises for what a person can type. The worker
that hosts the engine calls ``answer``.
"""

import json
from typing import Any

from gaswright.answer_law import answer_relation
from gaswright.answer_sheet import answer_sheet
from gaswright.errors import GaswrightError, ReadingError
from gaswright.respond import refused
from gaswright.tables import KINDS
from gaswright.version import DIGEST, VERSION

LONGEST = 200_000


def answer(text: str) -> str:
    """Answer one request. Its ``id`` comes back; ``do`` says what is asked."""
    try:
        request = _request(text)
        response = _answer(request)
    except GaswrightError as error:
        request, response = _request_or_empty(text), refused(error)
    return json.dumps({"id": request.get("id"), **response}, allow_nan=False, ensure_ascii=False)


def _request(text: str) -> dict[str, Any]:
    if len(text) > LONGEST:
        raise ReadingError("request", f"{len(text)} characters", f"at most {LONGEST}", "Send less at once.")
    try:
        request = json.loads(text)
    except (ValueError, RecursionError):
        raise ReadingError("request", "text that is not JSON", "a JSON object", "Load the page again.") from None
    if not isinstance(request, dict):
        raise ReadingError("request", "JSON that is not an object", "a JSON object", "Load the page again.")
    return request


def _request_or_empty(text: str) -> dict[str, Any]:
    try:
        return _request(text)
    except ReadingError:
        return {}


def _answer(request: dict[str, Any]) -> dict[str, Any]:
    do = request.get("do")
    if do in ("relation", "sheet"):
        if not isinstance(request.get("key"), str):
            raise ReadingError("request", "no key", "the key of a law or sheet", "Load the page again.")
        return answer_relation(request) if do == "relation" else answer_sheet(request)
    if do == "about":
        return {"version": VERSION, "digest": DIGEST}
    if do == "units":
        kind = KINDS.get(str(request.get("kind")))
        return {"units": list(kind.units) if kind else []}
    raise ReadingError("request", repr(do)[:60], "relation, sheet, units or about", "Load the page again.")
