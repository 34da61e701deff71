"""Firefox as a process: profile, start, end.

Takes the browser's path and a profile folder. Gives the running process and its BiDi address. Next: firefox.py.
"""

import re
import subprocess
import threading
from pathlib import Path
from queue import Empty, Queue
from typing import IO

from tests.browser.support.errors import BrowserError

START_TIMEOUT_S = 60.0
READER_TIMEOUT_S = 10.0
ADDRESS = re.compile(r"WebDriver BiDi listening on (ws://\S+)")

# Every other preference keeps the reader's default: `remote.prefs.recommended` would relax the file origin policy.
PREFERENCES: dict[str, bool | int | str] = {
    "remote.prefs.recommended": False,
    "security.fileuri.strict_origin_policy": True,
    # Lets `input.setFiles` hand a file to a page over http; a reader's file dialog does that by another way.
    "dom.file.createInChild": True,
    # No first run and no question on leaving.
    "browser.aboutwelcome.enabled": False,
    "browser.newtabpage.enabled": False,
    "browser.shell.checkDefaultBrowser": False,
    "browser.startup.homepage": "about:blank",
    "browser.startup.homepage_override.mstone": "ignore",
    "browser.startup.page": 0,
    "browser.sessionstore.resume_from_crash": False,
    "browser.tabs.warnOnClose": False,
    "toolkit.startup.max_resumed_crashes": -1,
    "trailhead.firstrun.didSeeAboutWelcome": True,
    # No updates.
    "app.normandy.enabled": False,
    "app.update.auto": False,
    "app.update.disabledForTesting": True,
    "browser.search.update": False,
    "extensions.getAddons.cache.enabled": False,
    "extensions.systemAddon.update.enabled": False,
    "extensions.update.enabled": False,
    "media.gmp-manager.updateEnabled": False,
    "services.settings.server": "data:,#remote-settings-dummy/v1",
    # No telemetry and no other call home.
    "browser.region.network.url": "",
    "browser.safebrowsing.malware.enabled": False,
    "browser.safebrowsing.phishing.enabled": False,
    "browser.safebrowsing.update.enabled": False,
    "datareporting.healthreport.uploadEnabled": False,
    "datareporting.policy.dataSubmissionEnabled": False,
    "network.captive-portal-service.enabled": False,
    "network.connectivity-service.enabled": False,
    "toolkit.telemetry.enabled": False,
    "toolkit.telemetry.server": "data:,",
    "toolkit.telemetry.unified": False,
}


class FirefoxProcess:
    """A running Firefox without a window; `address` is where BiDi listens."""

    def __init__(self, *, executable: Path, profile: Path) -> None:
        """Write the preferences and start the browser on the profile."""
        profile.mkdir(parents=True, exist_ok=True)
        (profile / "user.js").write_text(write_preferences(), encoding="utf-8")
        command: list[str | Path] = [
            executable,
            "--headless",
            "--no-remote",
            "--remote-debugging-port",
            "0",
            "--profile",
        ]
        self._process = subprocess.Popen(
            [*command, profile],
            stdout=subprocess.DEVNULL,
            stderr=subprocess.PIPE,
            encoding="utf-8",
            errors="replace",
        )
        self._lines: Queue[str] = Queue()
        self._reader = threading.Thread(target=self._read_lines, daemon=True)
        self._reader.start()
        self.address = self._wait_for_address()

    def stop(self, *, patience_s: float) -> None:
        """Wait that long for the process to quit by itself, as it may have been asked to; then end it."""
        try:
            self._process.wait(patience_s)
        except subprocess.TimeoutExpired:
            self._process.kill()
            self._process.wait()
        self._reader.join(READER_TIMEOUT_S)
        self._error_stream().close()

    def _error_stream(self) -> IO[str]:
        if self._process.stderr is None:
            message = "stderr is a pipe by construction"
            raise RuntimeError(message)
        return self._process.stderr

    def _read_lines(self) -> None:
        # To the very end: a full pipe would stop the browser.
        for line in self._error_stream():
            self._lines.put(line)

    def _wait_for_address(self) -> str:
        seen: list[str] = []
        while True:
            try:
                seen.append(self._lines.get(timeout=START_TIMEOUT_S))
            except Empty:
                self.stop(patience_s=0.0)
                raise BrowserError(
                    where="firefox, start",
                    found=f"no BiDi address on stderr, only: {''.join(seen)!r}",
                    expected="a line 'WebDriver BiDi listening on ws://…'",
                    todo="start it by hand with --headless --remote-debugging-port 0 and read what it says",
                ) from None
            if match := ADDRESS.search(seen[-1]):
                return match[1]


def write_preferences() -> str:
    """Text of the profile's `user.js`."""
    return "".join(f"user_pref({quote(name)}, {quote(value)});\n" for name, value in PREFERENCES.items())


def quote(value: bool | int | str) -> str:  # noqa: FBT001 - a preference's value may be a truth value
    """Write a preference's name or value as JavaScript."""
    if isinstance(value, bool):
        return "true" if value else "false"
    return str(value) if isinstance(value, int) else f'"{value}"'
