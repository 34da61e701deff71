"""One page in one real browser: the interface every browser test is written against.

Takes an address to open and CSS selectors. Gives what a reader would see, and what the page asked for or complained of.
Next: chromium.py and firefox.py supply the few steps that differ; conftest.py supplies the `tab` fixture.

Waiting asks the page again and again from outside. A condition evaluated inside the page later on would need `eval`,
which the site's Content-Security-Policy forbids.
"""

import json
import re
import time
from abc import ABC, abstractmethod
from collections.abc import Callable
from pathlib import Path
from typing import cast
from urllib.parse import urljoin

from tests.browser.support.errors import BrowserError
from tests.browser.support.origins import origin_of, select_foreign

DEFAULT_TIMEOUT_S = 45.0
POLL_S = 0.05
# Long enough for an error or a request already on its way to be reported; what a page starts later is not seen.
SETTLE_S = 0.1

type TextTest = str | re.Pattern[str] | Callable[[str], bool]

COUNT = "selector => document.querySelectorAll(selector).length"
TEXT = "selector => { const node = document.querySelector(selector); return node.innerText ?? node.textContent; }"
VALUE = "selector => document.querySelector(selector).value"
ATTRIBUTE = "(selector, name) => document.querySelector(selector).getAttribute(name)"
FOCUS = """selector => {
  const node = document.querySelector(selector);
  node.scrollIntoView({block: "center", behavior: "instant"});
  node.focus();
  return document.activeElement === node && !node.disabled && !node.readOnly;
}"""
SELECT = """(selector, value) => {
  const node = document.querySelector(selector);
  if (![...node.options].some(option => option.value === value && !option.disabled)) return false;
  node.value = value;
  node.dispatchEvent(new Event("input", {bubbles: true}));
  node.dispatchEvent(new Event("change", {bubbles: true}));
  return true;
}"""


class Tab(ABC):
    """A page in a browser and profile of its own. Selectors are CSS and must match exactly one element."""

    browser: str

    def __init__(self, *, base: str) -> None:
        """Tab whose relative addresses start at `base`, the site's folder as an address ending in a slash."""
        self.base = base
        self._own_origins = {origin_of(base)}
        self._requested: list[str] = []
        self._errors: list[str] = []

    # The steps that differ between browsers.

    @abstractmethod
    def _navigate(self, address: str) -> None:
        """Go to an absolute address and wait for the load event."""

    @abstractmethod
    def _evaluate_text(self, function: str, argument: str) -> str:
        """Run an async JavaScript function of one string in the page; what it resolves to, a string."""

    @abstractmethod
    def _pause(self, seconds: float) -> None:
        """Wait, taking in what the browser reports meanwhile."""

    @abstractmethod
    def click(self, selector: str) -> None:
        """Click the middle of an element with a real pointer, once it is visible, enabled and not covered."""

    @abstractmethod
    def press(self, key: str) -> None:
        """Press and release a key or chord on the focused element: `Enter`, `Tab`, `ArrowDown`, `Control+a`."""

    @abstractmethod
    def _type_keys(self, text: str) -> None:
        """Send one real key press per character to the focused element."""

    @abstractmethod
    def choose_files(self, selector: str, *paths: Path) -> None:
        """Choose files in an `<input type=file>`."""

    @abstractmethod
    def download(self, selector: str, folder: Path) -> Path:
        """Click what offers a file and save it to the folder under the name offered; the file's path."""

    @abstractmethod
    def resize(self, width: int, height: int) -> None:
        """Set the page's viewport, in CSS pixels."""

    @abstractmethod
    def screenshot(self, path: Path) -> None:
        """Write what the viewport shows to a PNG file."""

    @abstractmethod
    def reload(self) -> None:
        """Load the same page again and wait for the load event."""

    @abstractmethod
    def restart(self) -> None:
        """Quit the browser and start it again on the same profile; a blank page is shown until the next `open`."""

    @abstractmethod
    def close(self) -> None:
        """Quit the browser. Safe to call twice."""

    # What is the same in both.

    def open(self, url: str) -> None:
        """Open a page of the site (`laws/boyle.html`, `sheets.html#bank_endurance`) or an absolute address.

        An absolute address's origin counts as the page's own from then on.
        """
        address = urljoin(self.base, url)
        self._own_origins.add(origin_of(address))
        self._navigate(address)

    def evaluate(self, function: str, *arguments: object) -> object:
        """Run a JavaScript function in the page with JSON arguments; its (awaited) result, `None` for undefined.

        For controls and measurements. A string passed to `eval` inside may run despite the page's policy.
        """
        wrapper = f"async text => JSON.stringify((await ({function})(...JSON.parse(text))) ?? null)"
        return cast("object", json.loads(self._evaluate_text(wrapper, json.dumps(arguments))))

    def count(self, selector: str) -> int:
        """How many elements match now."""
        return int(str(self.evaluate(COUNT, selector)))

    def exists(self, selector: str) -> bool:
        """Whether any element matches now."""
        return self.count(selector) > 0

    def text(self, selector: str, *, timeout_s: float = DEFAULT_TIMEOUT_S) -> str:
        """Text of the element as rendered; text content for elements that are not HTML, such as MathML."""
        self.wait_one(selector, timeout_s=timeout_s)
        return str(self.evaluate(TEXT, selector))

    def value(self, selector: str) -> str:
        """Read what stands in a field now."""
        self.wait_one(selector)
        return str(self.evaluate(VALUE, selector))

    def attribute(self, selector: str, name: str) -> str | None:
        """Read an attribute as written; `None` where it is absent."""
        self.wait_one(selector)
        found = self.evaluate(ATTRIBUTE, selector, name)
        return None if found is None else str(found)

    def type(self, selector: str, text: str) -> None:
        """Replace what stands in a field by real key presses: focus, select all, then one press per character."""
        self.wait_one(selector)
        if self.evaluate(FOCUS, selector) is not True:
            raise BrowserError(
                where=self._where(f"type into {selector}"),
                found="the field does not take the focus, or is disabled or read-only",
                expected="a field that can be typed into",
                todo="wait for the page to enable it, or correct the selector",
            )
        self.press("Control+a")
        self.press("Delete")
        self._type_keys(text)

    def select(self, selector: str, value: str) -> None:
        """Choose the option of that value in a `<select>`; the events are made by script, as drivers do it."""
        self.wait_one(selector)
        if self.evaluate(SELECT, selector, value) is not True:
            raise BrowserError(
                where=self._where(f"select in {selector}"),
                found=f"no enabled option of value {value!r}",
                expected="one of the options of the list",
                todo="give the option's value attribute, not its label",
            )

    def wait_until[T](
        self,
        look: Callable[[], T],
        done: Callable[[T], bool],
        *,
        step: str,
        expected: str = "the condition to come true",
        timeout_s: float = DEFAULT_TIMEOUT_S,
    ) -> T:
        """Look again and again until what is seen is `done`; it comes back. `step` and `expected` are for the error."""
        deadline = time.monotonic() + timeout_s
        while not done(found := look()):
            if time.monotonic() > deadline:
                raise BrowserError(
                    where=self._where(step),
                    found=f"{found!r} after {timeout_s} s; errors of the page: {self._errors}",
                    expected=expected,
                    todo="correct the selector or the page, or give a longer timeout if the work takes that long",
                )
            self._pause(POLL_S)
        return found

    def wait_one(self, selector: str, *, timeout_s: float = DEFAULT_TIMEOUT_S) -> None:
        """Wait until exactly one element matches."""
        self.wait_until(
            lambda: self.count(selector),
            lambda found: found == 1,
            step=f"element {selector}",
            expected="exactly one element",
            timeout_s=timeout_s,
        )

    def wait_text(self, selector: str, test: TextTest, timeout_s: float = DEFAULT_TIMEOUT_S) -> str:
        """Text of the element once it passes: a regular expression found in it, or a predicate of it."""
        found = self.wait_until(
            lambda: str(self.evaluate(TEXT, selector)) if self.count(selector) == 1 else None,
            lambda found: found is not None and passes(test, found),
            step=f"text of {selector}",
            expected=f"text that passes {test!r}, in exactly one element",
            timeout_s=timeout_s,
        )
        return str(found)

    def wait_error(self, pattern: str, timeout_s: float = DEFAULT_TIMEOUT_S) -> str:
        """First error of the page in which the regular expression is found, once there is one."""
        self.wait_until(
            lambda: self._errors,
            lambda errors: any(re.search(pattern, error) for error in errors),
            step="errors of the page",
            expected=f"an error that passes {pattern!r}",
            timeout_s=timeout_s,
        )
        return next(error for error in self._errors if re.search(pattern, error))

    def console_errors(self) -> list[str]:
        """Errors the page has reported so far: console, uncaught, refused by policy, not loaded."""
        self._pause(SETTLE_S)
        return list(self._errors)

    def foreign_requests(self) -> list[str]:
        """Addresses asked for so far that are not file:, blob:, data: or of the page's own origin, each once."""
        self._pause(SETTLE_S)
        return select_foreign(self._requested, self._own_origins)

    def _where(self, step: str) -> str:
        return f"{self.browser}, {step}"


def passes(test: TextTest, text: str) -> bool:
    """Whether a text passes: a regular expression found anywhere in it, or a predicate that is true of it."""
    if isinstance(test, str | re.Pattern):
        return re.search(test, text) is not None
    return test(text)
