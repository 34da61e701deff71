"""The module ``gaswright.browser`` of the test's own small package: it says what it was asked, and what runs it."""

import json
import sys
from collections.abc import Callable
from typing import Any

type Handler = Callable[[Request], object]
type Request = dict[str, Any]

COUNTS: dict[str, list[int]] = {}


def answer(text: str) -> str:
    """JSON in, JSON out; a request named "raise" breaks, as the real engine never should."""
    request = json.loads(text)
    says = HANDLERS[request["do"]](request)
    return json.dumps({"id": request["id"], "says": says})


def echo(request: Request) -> str:
    """What was asked."""
    return f"engine read {request['text']}"


def count(request: Request) -> list[int]:
    """The numbers of the requests of this slot that came through, in order."""
    COUNTS.setdefault("burst", []).append(request["number"])
    return COUNTS["burst"]


def about(request: Request) -> list[str]:
    """Python's version and platform, where this module and one of the standard library were read from."""
    version = ".".join(map(str, sys.version_info[:2]))
    return [version, sys.platform, __file__, str(json.__file__), str(request["id"])]


def fail(request: Request) -> str:
    """Break."""
    message = f"broken on purpose by request {request['id']}"
    raise RuntimeError(message)


HANDLERS: dict[str, Handler] = {"echo": echo, "count": count, "about": about, "raise": fail}
