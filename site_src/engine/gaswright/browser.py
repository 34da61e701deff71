"""Speak JSON with the page.

Takes a request as JSON text; gives a response as JSON text, and never raises for what a person can type. The worker
that hosts the engine calls ``answer``.
"""

import json
from typing import Any

from gaswright import request as requests
from gaswright.answer_convert import answer_convert
from gaswright.answer_law import answer_relation
from gaswright.answer_sheet import answer_sheet
from gaswright.errors import GaswrightError, ReadingError
from gaswright.reading import read
from gaswright.records import Kind
from gaswright.respond import Response, ok_row, problem_row, refused
from gaswright.tables import KINDS
from gaswright.typed import text_of
from gaswright.version import DIGEST, VERSION

RELOAD = "Load the page again."


def answer(text: str) -> str:
    """Answer one request. Its ``id`` comes back; ``do`` says what is asked."""
    request: dict[str, Any] = {}
    try:
        request = requests.parse(text)
        response = _answer(requests.check(request))
    except GaswrightError as error:
        response = refused(error)
    said = json.dumps({"id": requests.id_of(request), **response}, allow_nan=False, ensure_ascii=False)
    return said.encode(
        "utf-8", "replace"
    ).decode()  # half a surrogate pair that was typed comes back as a question mark


def _answer(request: dict[str, Any]) -> Response:
    do = request.get("do")
    if do in ("relation", "sheet"):
        if request.get("key") is None:
            raise ReadingError("request", "no key", "the key of a law or sheet", RELOAD)
        return answer_relation(request) if do == "relation" else answer_sheet(request)
    if do == "reading":
        return _answer_reading(request)
    if do == "convert":
        return answer_convert(request)
    if do == "about":
        return {"version": VERSION, "digest": DIGEST}
    if do == "units":
        return {"units": list(_kind(request).units)}
    raise ReadingError("request", repr(do)[:60], "relation, sheet, reading, convert, units or about", RELOAD)


def _answer_reading(request: dict[str, Any]) -> Response:
    """Answer a field that stands by itself, such as one of the site conditions."""
    kind, raw = _kind(request), request.get("reading")
    if raw is None or not text_of(raw):
        return {"state": "empty", "says": "", "offers": []}
    try:
        reading = read(
            request.get("where") or kind.title, raw, kind, request.get("decimal"), request.get("instruments")
        )
    except ReadingError as error:
        return problem_row(error)
    return {**ok_row(reading, kind, request.get("decimal") or "."), "offers": []}


def _kind(request: dict[str, Any]) -> Kind:
    key = request.get("kind") or ""
    if key not in KINDS:
        raise ReadingError("request, kind", repr(key[:40]), "a kind of quantity, such as volume", RELOAD)
    return KINDS[key]
