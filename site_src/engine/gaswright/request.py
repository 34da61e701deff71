"""Read a request of the page: every part of the right shape, or ReadingError.

Takes JSON text; gives a plain dictionary that gaswright.answer_law and gaswright.answer_sheet can trust.
"""

import json
from collections.abc import Callable
from typing import Any, NoReturn

from gaswright.errors import ReadingError

LONGEST, LARGEST = 200_000, 1e300
RELOAD = "Load the page again."
MARKS = (None, "", ".", ",")


def parse(text: str) -> dict[str, Any]:
    """Give the request as an object. Raises ReadingError: too long, not JSON (RFC 8259), not an object."""
    if len(text) > LONGEST:
        raise ReadingError("request", f"{len(text)} characters", f"at most {LONGEST}", "Send less at once.")
    try:
        request = json.loads(text, parse_constant=_no_constant)
    except (ValueError, RecursionError):
        raise ReadingError("request", "text that is not JSON", "a JSON object", RELOAD) from None
    if not isinstance(request, dict):
        raise ReadingError("request", "JSON that is not an object", "a JSON object", RELOAD)
    return request


def _no_constant(name: str) -> NoReturn:
    raise ValueError(name)


def id_of(request: dict[str, Any]) -> int | float | str | None:
    """Give the request's id, which goes back with the answer; nothing where it is no short text or number."""
    found = request.get("id")
    return found if _is_plain(found) and len(str(found)) <= 100 else None


def check(request: dict[str, Any]) -> dict[str, Any]:
    """Give the request back where each part has its shape. Raises ReadingError for the first that has not."""
    for name, (is_right, expected) in SHAPES.items():
        if not is_right(request.get(name)):
            raise ReadingError(f"request, {name}", f"{request[name]!r:.60}", expected, RELOAD)
    if request.get("decimal") not in MARKS:
        raise ReadingError("request, decimal", f"{request['decimal']!r:.60}", "a comma or a point", RELOAD)
    return request


def _is_plain(value: Any) -> bool:
    """Say whether ``value`` is nothing, text, or a finite number."""
    if isinstance(value, bool):
        return False
    return value is None or isinstance(value, str) or (isinstance(value, (int, float)) and abs(value) <= LARGEST)


def _is_text(value: Any) -> bool:
    return value is None or isinstance(value, str)


def _is_record(value: Any) -> bool:
    return value is None or (isinstance(value, dict) and all(map(_is_plain, value.values())))


def _is_reading(value: Any) -> bool:
    return _is_plain(value) or _is_record(value)


def _is_readings(value: Any) -> bool:
    return value is None or (isinstance(value, dict) and all(map(_is_reading, value.values())))


def _is_instruments(value: Any) -> bool:
    if value is None:
        return True
    return isinstance(value, dict) and all(isinstance(each, dict) and _is_record(each) for each in value.values())


SHAPES: dict[str, tuple[Callable[[Any], bool], str]] = {
    "do": (_is_text, "text"),
    "key": (_is_text, "text"),
    "find": (_is_text, "text"),
    "gas": (_is_text, "text"),
    "kind": (_is_text, "text"),
    "where": (_is_text, "text"),
    "decimal": (_is_text, "a comma or a point"),
    "show": (_is_record, "a unit and how a pressure is counted"),
    "rows": (_is_readings, "readings by row"),
    "readings": (_is_readings, "readings by row"),
    "site": (_is_readings, "site conditions by name"),
    "reading": (_is_reading, "a reading"),
    "instruments": (_is_instruments, "records of instruments by name"),
}
