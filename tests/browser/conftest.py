"""Fixtures of the browser tests: the built site at a file and at an http address, and a tab in each browser.

Takes `build/site`. Gives `site`, `file_site`, `http_site`, `playwright` and `tab`.
A test module may override `site` with a folder of its own; everything else follows.
"""

import itertools
import shutil
from collections.abc import Iterator
from pathlib import Path
from tempfile import TemporaryDirectory
from typing import NamedTuple

import pytest
from playwright.sync_api import Playwright, sync_playwright

from tests.browser.support.launch import BROWSERS, make_firefox_profile, start_tab
from tests.browser.support.memory import folder_in_memory
from tests.browser.support.quiet import MARKERS, list_noise
from tests.browser.support.static_server import serve_folder
from tests.browser.support.tab import Tab

SITE = Path(__file__).parents[2] / "build" / "site"
# A space and letters outside ASCII: what a reader's own folder is called.
AWKWARD_FOLDER = "Gasmessung Übung 1"
SUB_PATH = "/field/gas%20laws/"


class HttpSite(NamedTuple):
    """Addresses of the site served over http, each ending in a slash."""

    url: str
    """At the root of its server."""
    sub_path_url: str
    """Below a path of another server, which answers 404 to everything outside that path."""


def pytest_configure(config: pytest.Config) -> None:
    """Make the opt-out markers known."""
    for name, meaning in MARKERS.items():
        config.addinivalue_line("markers", f"{name}(reason): {meaning}")


@pytest.fixture(scope="session")
def site() -> Path:
    """Folder of the built site."""
    if not (SITE / "index.html").is_file():
        pytest.fail(
            f"browser tests\n  found: no index.html in {SITE}\n  expected: the built site\n"
            "  what to do: build it first: python3 -m generator build",
            pytrace=False,
        )
    return SITE


@pytest.fixture(scope="module")
def file_site(site: Path) -> Iterator[Path]:
    """Copy the site to a folder whose name has a space and a letter outside ASCII."""
    with TemporaryDirectory(dir=folder_in_memory()) as folder:
        yield Path(shutil.copytree(site, Path(folder) / AWKWARD_FOLDER))


@pytest.fixture(scope="module")
def http_site(site: Path) -> Iterator[HttpSite]:
    """Serve the site on 127.0.0.1, at the root of one server and below a path of another."""
    with serve_folder(site) as url, serve_folder(site, prefix=SUB_PATH) as sub_path_url:
        yield HttpSite(url, sub_path_url)


@pytest.fixture(scope="session")
def playwright() -> Iterator[Playwright]:
    """Playwright, started once."""
    with sync_playwright() as started:
        yield started


@pytest.fixture(scope="session")
def firefox_profile() -> Iterator[Path]:
    """Make the profile that each tab in Firefox gets a copy of: no page has been opened in it."""
    with TemporaryDirectory(dir=folder_in_memory()) as folder:
        yield make_firefox_profile(Path(folder))


@pytest.fixture
def profile() -> Iterator[Path]:
    """Make a folder for a profile, and remove it at once: each is some 50 MB, too much for pytest's kept folders."""
    # The browser's helpers may still be writing when its main process has ended.
    with TemporaryDirectory(dir=folder_in_memory(), ignore_cleanup_errors=True) as folder:
        yield Path(folder) / "profile"


@pytest.fixture(params=[f"{browser}-{scheme}" for browser, scheme in itertools.product(BROWSERS, ("file", "http"))])
def tab(request: pytest.FixtureRequest, playwright: Playwright, profile: Path) -> Iterator[Tab]:
    """Start a tab with a fresh profile, in each browser from file:// and over http (below a path); quiet at the end."""
    browser, scheme = str(request.param).split("-")
    if browser == "firefox":
        shutil.copytree(request.getfixturevalue("firefox_profile"), profile)
    started = start_tab(browser, playwright=playwright, profile=profile, base=find_base(request, scheme))
    try:
        yield started
        noise = list_noise(started, read_markers(request))
    finally:
        started.close()
    assert not noise, "\n".join(noise)


def find_base(request: pytest.FixtureRequest, scheme: str) -> str:
    """Address of the site's folder, ending in a slash; only the fixture needed is made."""
    if scheme == "file":
        folder: Path = request.getfixturevalue("file_site")
        return f"{folder.as_uri()}/"
    served: HttpSite = request.getfixturevalue("http_site")
    return served.sub_path_url


def read_markers(request: pytest.FixtureRequest) -> frozenset[str]:
    """Names of the opt-out markers on the test; each must give its reason."""
    marks = [mark for name in MARKERS if (mark := request.node.get_closest_marker(name))]
    for mark in marks:
        if not str(mark.kwargs.get("reason", "")).strip():
            pytest.fail(f"{request.node.nodeid}: the marker {mark.name} needs reason='…'", pytrace=False)
    return frozenset(mark.name for mark in marks)
