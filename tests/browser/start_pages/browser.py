"""The module ``gaswright.browser`` of the test's own small package: it says what it was asked, and what runs it."""

import json
import sys

COUNTS: dict[str, list[int]] = {}


def answer(text: str) -> str:
    """JSON in, JSON out; a request named "raise" breaks, as the real engine never should."""
    request = json.loads(text)
    says = HANDLERS[request["do"]](request)
    return json.dumps({"id": request["id"], "says": says})


def echo(request: dict[str, str]) -> str:
    """What was asked."""
    return f"engine read {request['text']}"


def count(request: dict[str, int]) -> list[int]:
    """The numbers of the requests of this slot that came through, in order."""
    COUNTS.setdefault("burst", []).append(request["number"])
    return COUNTS["burst"]


def about(request: dict[str, str]) -> list[str]:
    """Python's version and platform, where this module and one of the standard library were read from."""
    version = ".".join(map(str, sys.version_info[:2]))
    return [version, sys.platform, __file__, str(json.__file__), str(request["id"])]


def fail(request: dict[str, str]) -> str:
    """Break."""
    message = f"broken on purpose by request {request['id']}"
    raise RuntimeError(message)


HANDLERS = {"echo": echo, "count": count, "about": about, "raise": fail}
