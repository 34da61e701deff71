"""A tab in Firefox, driven over WebDriver BiDi.

Takes the browser's path and a profile folder. Gives a `Tab`. Next: launch.py chooses it.
Source of commands and key codes: W3C WebDriver BiDi section 7; W3C WebDriver section 17.4.2 (keyboard actions).
"""

import base64
import time
from contextlib import ExitStack
from pathlib import Path

from tests.browser.support.bidi import BidiConnection, Json
from tests.browser.support.errors import BrowserError
from tests.browser.support.firefox_process import FirefoxProcess
from tests.browser.support.tab import Tab

EVENTS = ("log.entryAdded", "network.beforeRequestSent", "browsingContext.downloadEnd")

# A quit takes up to 5 s now and then. What is to be read again waits for it; what is thrown away does not.
RESTART_PATIENCE_S = 30.0
CLOSE_PATIENCE_S = 1.0

# Chromium reports these on the console by itself; Firefox tells only its own console, so the page is made to tell us.
# Not reported by either way: a worker whose script does not compile. Its page hears of it and must say so.
REPORTER = """() => {
  addEventListener("securitypolicyviolation", event => console.error(
    `refused by policy ${event.effectiveDirective}: ${event.blockedURI}`), true);
  addEventListener("error", event => {
    if (event.target instanceof Element) {
      console.error(`not loaded: ${event.target.src ?? event.target.href ?? event.target.data}`);
    }
  }, true);
}"""

# Visible, enabled and on top at its middle, which is where the pointer goes.
CAN_CLICK = """selector => {
  const node = document.querySelector(selector);
  node.scrollIntoView({block: "center", inline: "center", behavior: "instant"});
  const box = node.getBoundingClientRect();
  const top = document.elementFromPoint(box.x + box.width / 2, box.y + box.height / 2);
  if (box.width === 0 || box.height === 0) return "not visible";
  if (node.disabled) return "disabled";
  if (top === null || !(node.contains(top) || top.closest("label")?.control === node)) return "covered";
  return "ready";
}"""

# Text that comes in between moves what is clicked; the page says whether the click arrived where it was meant.
WATCH_CLICK = """selector => {
  const node = document.querySelector(selector);
  window.clickArrived = false;
  addEventListener("click", event => {
    const isMeant = node.contains(event.target) || event.target.closest("label")?.control === node;
    window.clickArrived = event.isTrusted && isMeant;
  }, {capture: true, once: true});
}"""
CLICK_ARRIVED = "() => window.clickArrived !== false"
CLICKS = 4
CLICK_PATIENCE_S = 2.0

KEYS = {
    "Backspace": "\ue003",
    "Tab": "\ue004",
    "Enter": "\ue007",
    "Shift": "\ue008",
    "Control": "\ue009",
    "Alt": "\ue00a",
    "Escape": "\ue00c",
    "Space": " ",
    "PageUp": "\ue00e",
    "PageDown": "\ue00f",
    "End": "\ue010",
    "Home": "\ue011",
    "ArrowLeft": "\ue012",
    "ArrowUp": "\ue013",
    "ArrowRight": "\ue014",
    "ArrowDown": "\ue015",
    "Insert": "\ue016",
    "Delete": "\ue017",
}


class FirefoxTab(Tab):
    """A tab in a Firefox with its own profile on disk, as a reader's would be."""

    browser = "firefox"

    def __init__(self, *, executable: Path, profile: Path, base: str) -> None:
        """Start the browser with a blank page."""
        super().__init__(base=base)
        self._executable = executable
        self._profile = profile
        self._downloads: list[Json] = []
        self._start()

    def _start(self) -> None:
        with ExitStack() as undo:
            process = FirefoxProcess(executable=self._executable, profile=self._profile)
            undo.callback(process.stop, patience_s=0.0)
            self._bidi = BidiConnection(f"{process.address}/session", self._keep_event)
            undo.callback(self._bidi.close)
            self._begin_session()
            undo.pop_all()
        self._process: FirefoxProcess | None = process

    def _begin_session(self) -> None:
        self._bidi.command("session.new", capabilities={})
        self._bidi.command("session.subscribe", events=EVENTS)
        self._bidi.command("script.addPreloadScript", functionDeclaration=REPORTER)
        self._context: str = self._bidi.command("browsingContext.getTree")["contexts"][0]["context"]

    def _keep_event(self, method: str, parameters: Json) -> None:
        if method == "network.beforeRequestSent":
            self._requested.append(parameters["request"]["url"])
        elif method == "log.entryAdded" and parameters["level"] == "error":
            self._errors.append(f"{parameters['text']} ({parameters['source'].get('realm', '')})")
        elif method == "browsingContext.downloadEnd":
            self._downloads.append(parameters)

    def _command(self, method: str, **parameters: object) -> Json:
        return self._bidi.command(method, context=self._context, **parameters)

    def _navigate(self, address: str) -> None:
        self._command("browsingContext.navigate", url=address, wait="complete")

    def _call(self, function: str, argument: str) -> Json:
        answer = self._bidi.command(
            "script.callFunction",
            functionDeclaration=function,
            arguments=[{"type": "string", "value": argument}],
            target={"context": self._context},
            awaitPromise=True,
        )
        if answer["type"] == "exception":
            raise BrowserError(
                where="firefox, function evaluated in the page",
                found=answer["exceptionDetails"]["text"],
                expected="a function that returns",
                todo="correct the function or its arguments",
            )
        result: Json = answer["result"]
        return result

    def _evaluate_text(self, function: str, argument: str) -> str:
        return str(self._call(function, argument)["value"])

    def _node(self, selector: str) -> Json:
        self.wait_one(selector)
        return {"sharedId": self._call("selector => document.querySelector(selector)", selector)["sharedId"]}

    def _pause(self, seconds: float) -> None:
        self._bidi.listen(seconds)

    def click(self, selector: str) -> None:
        """Click the middle of an element with a real pointer, once it is visible, enabled and not covered."""
        node = self._node(selector)
        self.wait_until(
            lambda: self.evaluate(CAN_CLICK, selector),
            lambda found: found == "ready",
            step=f"click {selector}",
            expected="an element that is visible, enabled and not covered",
        )
        steps = [
            {"type": "pointerMove", "x": 0, "y": 0, "origin": {"type": "element", "element": node}},
            {"type": "pointerDown", "button": 0},
            {"type": "pointerUp", "button": 0},
        ]
        for _ in range(CLICKS):
            self.evaluate(WATCH_CLICK, selector)
            self._act({"type": "pointer", "id": "mouse", "actions": steps})
            if self._has_arrived():
                return
        raise BrowserError(
            where=f"firefox, click {selector}",
            found=f"no click in the page after {CLICKS} tries",
            expected="a click that the page hears of",
            todo="see whether the browser still answers",
        )

    def _has_arrived(self) -> bool:
        """Say whether the page heard of a click; a page that has gone on since does not remember one."""
        deadline = time.monotonic() + CLICK_PATIENCE_S
        while not self.evaluate(CLICK_ARRIVED):
            if time.monotonic() > deadline:
                return False
            self._pause(0.05)
        return True

    def press(self, key: str) -> None:
        """Press and release a key or chord on the focused element."""
        codes = [KEYS.get(name, name) for name in key.split("+")] if len(key) > 1 else [key]
        down = [{"type": "keyDown", "value": code} for code in codes]
        up = [{"type": "keyUp", "value": code} for code in reversed(codes)]
        self._act({"type": "key", "id": "keyboard", "actions": down + up})

    def _type_keys(self, text: str) -> None:
        steps = [{"type": kind, "value": character} for character in text for kind in ("keyDown", "keyUp")]
        self._act({"type": "key", "id": "keyboard", "actions": steps})

    def _act(self, source: Json) -> None:
        self._command("input.performActions", actions=[source])

    def choose_files(self, selector: str, *paths: Path) -> None:
        """Choose files in an `<input type=file>`."""
        self._command("input.setFiles", element=self._node(selector), files=[str(path) for path in paths])

    def download(self, selector: str, folder: Path) -> Path:
        """Click what offers a file and save it to the folder under the name offered; the file's path."""
        behavior = {"type": "allowed", "destinationFolder": str(folder)}
        self._bidi.command("browser.setDownloadBehavior", downloadBehavior=behavior)
        before = len(self._downloads)
        self.click(selector)
        ended = self.wait_until(lambda: self._downloads[before:], bool, step=f"download by {selector}")
        return Path(ended[0]["filepath"])

    def resize(self, width: int, height: int) -> None:
        """Set the page's viewport, in CSS pixels."""
        self._command("browsingContext.setViewport", viewport={"width": width, "height": height})

    def screenshot(self, path: Path) -> None:
        """Write what the viewport shows to a PNG file."""
        path.write_bytes(base64.b64decode(self._command("browsingContext.captureScreenshot")["data"]))

    def reload(self) -> None:
        """Load the same page again and wait for the load event."""
        self._command("browsingContext.reload", wait="complete")

    def restart(self) -> None:
        """Quit the browser and start it again on the same profile."""
        self.quit(patience_s=RESTART_PATIENCE_S)
        self._start()

    def close(self) -> None:
        """Quit the browser."""
        self.quit(patience_s=CLOSE_PATIENCE_S)

    def quit(self, *, patience_s: float) -> None:
        """Ask the browser to quit, and end the process if that takes longer than `patience_s`."""
        if self._process is None:
            return
        with ExitStack() as steps:
            steps.callback(self._process.stop, patience_s=patience_s)
            steps.callback(self._bidi.close)
            self._process = None
            self._bidi.command("browser.close")


def warm_profile(*, executable: Path, profile: Path) -> None:
    """Make a profile by starting the browser once and quitting; on a copy of it the browser starts twice as fast."""
    FirefoxTab(executable=executable, profile=profile, base="about:blank").quit(patience_s=RESTART_PATIENCE_S)
    for name in ("lock", ".parentlock"):
        (profile / name).unlink(missing_ok=True)
