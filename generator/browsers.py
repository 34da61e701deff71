"""The browsers that the tests drive: found on this machine, or installed where the system's packages allow it.

Takes nothing; gives the path of a Chromium or a Firefox program, or says what to install.
``tests/browser`` starts them. Standard library only.
"""

import os
import shutil
import subprocess
from collections.abc import Callable, Mapping
from functools import cache
from pathlib import Path
from typing import NamedTuple

from generator.errors import SetUpError


class Browser(NamedTuple):
    """Where one browser may stand."""

    title: str
    commands: tuple[str, ...]
    """Its names on the PATH, the likeliest first."""
    paths: tuple[str, ...]
    """Where it usually is; ``{NAME}`` is a variable of the environment."""
    package: str
    """Debian's name for it."""


CHROMIUM = Browser(
    title="Chromium",
    commands=("chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "microsoft-edge", "msedge"),
    paths=(
        "/Applications/Chromium.app/Contents/MacOS/Chromium",
        "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
        "/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge",
        "{PROGRAMFILES}/Google/Chrome/Application/chrome.exe",
        "{LOCALAPPDATA}/Google/Chrome/Application/chrome.exe",
        "{PROGRAMFILES(X86)}/Microsoft/Edge/Application/msedge.exe",
    ),
    package="chromium",
)
FIREFOX = Browser(
    title="Firefox",
    commands=("firefox-esr", "firefox"),
    paths=(
        "/Applications/Firefox.app/Contents/MacOS/firefox",
        "{PROGRAMFILES}/Mozilla Firefox/firefox.exe",
        "{LOCALAPPDATA}/Mozilla Firefox/firefox.exe",
    ),
    package="firefox-esr",
)


@cache
def find_chromium() -> Path:
    """The path of a Chromium, Chrome or Edge.

    Raises:
        SetUpError: there is none, and none could be installed.
    """
    return get(CHROMIUM)


@cache
def find_firefox() -> Path:
    """The path of a Firefox.

    Raises:
        SetUpError: there is none, and none could be installed.
    """
    return get(FIREFOX)


def get(browser: Browser) -> Path:
    """The browser's path; it is installed first where it is missing and this is root on Debian.

    Raises:
        SetUpError: there is none, and none could be installed.
    """
    found = find(browser)
    if found is None and _can_install():
        _install(browser.package)
        found = find(browser)
    if found is None:
        raise SetUpError(
            f"browser tests, {browser.title}",
            "no such program on the PATH or in its usual place",
            f"one of {', '.join(browser.commands)}",
            f"Install {browser.title} (on Debian: apt-get install {browser.package}); then run the same command again.",
        )
    return found


def find(
    browser: Browser,
    *,
    which: Callable[[str], str | None] = shutil.which,
    variables: Mapping[str, str] = os.environ,
) -> Path | None:
    """The browser's path on this machine; None where it has none."""
    named = [path for path in map(which, browser.commands) if path is not None]
    usual = [path for path in (_fill(path, variables) for path in browser.paths) if path is not None and path.is_file()]
    return next(iter([*map(Path, named), *usual]), None)


def _fill(path: str, variables: Mapping[str, str]) -> Path | None:
    """The path with its variable filled in; None where this machine has no such variable."""
    if not path.startswith("{"):
        return Path(path)
    name, _, rest = path[1:].partition("}/")
    return Path(variables[name]) / rest if name in variables else None


def _can_install() -> bool:
    """Whether this is root on a system with Debian's packages."""
    return hasattr(os, "geteuid") and os.geteuid() == 0 and shutil.which("apt-get") is not None


def _install(package: str) -> None:
    """Install a package of the system; what fails is on the terminal, and the search that follows finds nothing."""
    print(f"Installing {package} ...", flush=True)
    environment = os.environ | {"DEBIAN_FRONTEND": "noninteractive"}
    for words in ("update -qq", f"install -y -qq --no-install-recommends {package}"):
        command = ["apt-get", *words.split()]
        subprocess.run(command, env=environment, stdout=subprocess.DEVNULL, check=False)
