"""The check after every browser test: the page complained of nothing and asked nobody else for anything.

Takes a tab and the test's markers. Gives what is wrong, as text. Next: the `tab` fixture in conftest.py asserts on it.
"""

from typing import Protocol

MARKERS = {
    "provokes_console_errors": "the test makes the page report an error on purpose",
    "provokes_foreign_requests": "the test makes the page ask a foreign address on purpose",
}


class Observed(Protocol):
    """What the check looks at: a `Tab`, or anything that reports the same two lists."""

    def console_errors(self) -> list[str]:
        """Errors the page has reported."""

    def foreign_requests(self) -> list[str]:
        """Addresses asked for outside the reader's own copy."""


def list_noise(observed: Observed, allowed: frozenset[str]) -> list[str]:
    """One line for each kind of noise that is there without its marker, or marked and not there.

    `allowed` holds marker names. A marker that no longer matches is reported too, so that none outlives its reason.
    """
    heard = {
        "provokes_console_errors": observed.console_errors(),
        "provokes_foreign_requests": observed.foreign_requests(),
    }
    unexpected = [
        f"{name.removeprefix('provokes_').replace('_', ' ')}, none expected: {found}"
        for name, found in heard.items()
        if found and name not in allowed
    ]
    missing = [f"marked {name}, but there was none: remove the marker" for name in sorted(allowed) if not heard[name]]
    return unexpected + missing
