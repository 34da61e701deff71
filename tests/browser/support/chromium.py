"""A tab in Chromium, driven by Playwright.

Takes the started Playwright, the browser's path and an empty profile folder. Gives a `Tab`. Next: launch.py chooses it.
"""

from pathlib import Path

from playwright.sync_api import BrowserContext, ConsoleMessage, Page, Playwright

from tests.browser.support.tab import DEFAULT_TIMEOUT_S, Tab

FLAGS = (
    "--no-sandbox",
    "--disable-gpu",
    "--disable-quic",
    "--no-first-run",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
)


class ChromiumTab(Tab):
    """A tab in a Chromium with its own profile on disk, as a reader's would be."""

    browser = "chromium"

    def __init__(self, *, playwright: Playwright, executable: Path, profile: Path, base: str) -> None:
        """Start the browser with a blank page."""
        super().__init__(base=base)
        self._playwright = playwright
        self._executable = executable
        self._profile = profile
        self._start()

    def _start(self) -> None:
        self._context: BrowserContext | None = self._playwright.chromium.launch_persistent_context(
            self._profile, executable_path=self._executable, headless=True, args=list(FLAGS)
        )
        self._context.set_default_timeout(DEFAULT_TIMEOUT_S * 1000)
        self._context.on("request", lambda request: self._requested.append(request.url))
        self._context.on("console", self._keep_console)
        self._context.on("weberror", lambda error: self._errors.append(f"uncaught: {error.error}"))
        self._page: Page = self._context.pages[0]
        self._protocol = self._context.new_cdp_session(self._page)
        self._page.on("websocket", lambda socket: self._requested.append(as_http(socket.url)))

    def _keep_console(self, message: ConsoleMessage) -> None:
        if message.type in {"error", "assert"}:
            self._errors.append(f"{message.text} ({message.location.get('url', '')})")

    def _navigate(self, address: str) -> None:
        self._page.goto(address, wait_until="load")

    def _evaluate_text(self, function: str, argument: str) -> str:
        return str(self._page.evaluate(function, argument))

    def _pause(self, seconds: float) -> None:
        self._page.wait_for_timeout(seconds * 1000)

    def click(self, selector: str) -> None:
        """Click the middle of an element with a real pointer, once it is visible, enabled and not covered."""
        self.wait_one(selector)
        self._page.locator(f"css={selector}").click()

    def press(self, key: str) -> None:
        """Press and release a key or chord on the focused element."""
        self._page.keyboard.press(key)

    def _type_keys(self, text: str) -> None:
        for character in text:
            if character.isascii():
                self._page.keyboard.press("Space" if character == " " else character)
            else:
                self._press_other(character)

    def _press_other(self, character: str) -> None:
        # Playwright presses only what is on a US keyboard and inserts the rest without a key event.
        key = {"key": character, "text": character}
        self._protocol.send("Input.dispatchKeyEvent", {"type": "keyDown", **key})
        self._protocol.send("Input.dispatchKeyEvent", {"type": "keyUp", "key": character})

    def choose_files(self, selector: str, *paths: Path) -> None:
        """Choose files in an `<input type=file>`."""
        self._page.locator(f"css={selector}").set_input_files(list(paths))

    def download(self, selector: str, folder: Path) -> Path:
        """Click what offers a file and save it to the folder under the name offered; the file's path."""
        with self._page.expect_download() as started:
            self.click(selector)
        path = folder / started.value.suggested_filename
        started.value.save_as(path)
        return path

    def resize(self, width: int, height: int) -> None:
        """Set the page's viewport, in CSS pixels."""
        self._page.set_viewport_size({"width": width, "height": height})

    def screenshot(self, path: Path) -> None:
        """Write what the viewport shows to a PNG file."""
        self._page.screenshot(path=path)

    def reload(self) -> None:
        """Load the same page again and wait for the load event."""
        self._page.reload(wait_until="load")

    def restart(self) -> None:
        """Quit the browser and start it again on the same profile."""
        self.close()
        self._start()

    def close(self) -> None:
        """Quit the browser."""
        if self._context is not None:
            self._context.close()
            self._context = None


def as_http(address: str) -> str:
    """Name a web socket by the address of its opening request, as Firefox reports it: ws: as http:, wss: as https:."""
    return address.replace("ws", "http", 1)
