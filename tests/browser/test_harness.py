"""The harness itself, on a tiny page under the site's own Content-Security-Policy.

Every browser test rests on these: that typing is real, that storage lasts, that the file origin policy is on, and
that an error or a foreign request does not go unseen.
"""

import re
from collections.abc import Iterator
from pathlib import Path

import pytest

from tests.browser.support.errors import BrowserError
from tests.browser.support.origin_control import SIBLING_TEXT, read_sibling, write_origin_control
from tests.browser.support.origins import select_foreign
from tests.browser.support.quiet import list_noise
from tests.browser.support.static_server import serve_folder
from tests.browser.support.tab import Tab
from tests.browser.support.tiny_site import ASK_NEIGHBOUR, NEIGHBOUR_FILES, write_tiny_site


@pytest.fixture(scope="module")
def site(tmp_path_factory: pytest.TempPathFactory) -> Path:
    """Write a site of a few pages, instead of the built one."""
    folder = tmp_path_factory.mktemp("harness")
    write_tiny_site(folder)
    write_origin_control(folder)
    return folder


@pytest.fixture
def neighbour(tmp_path: Path) -> Iterator[str]:
    """Serve some files at another address: foreign to every page, though on this machine."""
    folder = tmp_path / "neighbour"
    folder.mkdir()
    for name in NEIGHBOUR_FILES:
        (folder / name).write_text("", encoding="utf-8")
    with serve_folder(folder) as url:
        yield url


def test_address_is_the_awkward_folder_or_the_sub_path(tab: Tab) -> None:
    """The reader's folder name and the corner of a server are part of every test."""
    tab.open("index.html")
    address = str(tab.evaluate("() => location.href"))
    assert re.search(r"^file:///.*/Gasmessung%20%C3%9Cbung%201/|^http://127\.0\.0\.1:\d+/field/gas%20laws/", address)


def test_typing_sends_trusted_key_events_and_replaces(tab: Tab) -> None:
    """A field hears one key press per character, letters outside ASCII too, and holds exactly what was typed last."""
    tab.open("index.html")
    tab.type("#pressure", "999")
    tab.type("#pressure", "1,5±2 °CX")
    tab.press("Backspace")
    assert tab.value("#pressure") == "1,5±2 °C"
    assert tab.text("#keys").endswith("Delete|1|,|5|±|2| |°|C|X|Backspace")
    assert tab.wait_text("#echo", r"C$") == "read 1,5±2 °C"


def test_waiting_takes_a_predicate_and_ends_with_what_was_seen(tab: Tab) -> None:
    """Text that comes later is waited for; text that never comes is an error with the last text in it."""
    tab.open("index.html")
    tab.type("#pressure", "7")
    assert tab.wait_text("#echo", lambda text: text != "") == "read 7"
    with pytest.raises(BrowserError, match=r"text of #echo\n  found: 'read 7' after 0\.3 s"):
        tab.wait_text("#echo", "read 8", timeout_s=0.3)


def test_selector_must_match_one_element(tab: Tab) -> None:
    """Two matches or none are an error, never the first one by chance."""
    tab.open("index.html")
    assert (tab.count(".twice"), tab.exists(".twice"), tab.exists("#nowhere")) == (2, True, False)
    with pytest.raises(BrowserError, match=r"found: 2 after"):
        tab.wait_one(".twice", timeout_s=0.2)
    with pytest.raises(BrowserError, match=r"found: 0 after"):
        tab.text("#nowhere", timeout_s=0.2)


def test_select_and_file_choice(tab: Tab, tmp_path: Path) -> None:
    """A list and a file field hear of the choice."""
    tab.open("index.html")
    tab.select("#unit", "psi")
    assert tab.wait_text("#chosen", "psi") == "psi"
    with pytest.raises(BrowserError, match="no enabled option of value 'kPa'"):
        tab.select("#unit", "kPa")
    (tmp_path / "day.json").write_text("{}", encoding="utf-8")
    tab.choose_files("#file", tmp_path / "day.json")
    assert tab.wait_text("#name", "json") == "day.json"


def test_download_is_saved(tab: Tab, tmp_path: Path) -> None:
    """A file made by the page arrives under its name and with its content."""
    tab.open("index.html")
    tab.type("#pressure", "200 barg")
    saved = tab.download("#save", tmp_path)
    assert (saved.name, saved.read_text(encoding="utf-8")) == ("day 1.json", '{"pressure":"200 barg"}')


def test_storage_survives_reload_and_restart(tab: Tab) -> None:
    """IndexedDB starts empty in a fresh profile, and keeps a reading over a reload and over quitting the browser."""
    tab.open("index.html")
    assert tab.wait_text("#stored", "stored") == "stored: nothing"
    tab.type("#pressure", "200 barg")
    tab.click("#store")
    tab.wait_text("#stored", "stored: 200 barg")
    tab.reload()
    assert tab.wait_text("#stored", "stored") == "stored: 200 barg"
    tab.restart()
    tab.open("index.html")
    assert tab.wait_text("#stored", "stored") == "stored: 200 barg"


def test_file_origin_policy_is_on(request: pytest.FixtureRequest, tab: Tab) -> None:
    """From file:// a page cannot read the file beside it; over http the same page can, so the page itself works."""
    if tab.base.startswith("file:"):
        request.applymarker(pytest.mark.provokes_console_errors(reason="browsers report the blocked request"))
        assert read_sibling(tab) == "blocked"
    else:
        assert read_sibling(tab) == SIBLING_TEXT


@pytest.mark.provokes_console_errors(reason="breaks the page in each way there is, to see that it is noticed")
def test_console_errors_are_noticed(tab: Tab) -> None:
    """What goes wrong in the page or in a worker, is refused by the policy or is not there, is reported."""
    tab.open("index.html")
    tab.click("#break")
    tab.wait_error("broken on purpose")
    tab.click("#worker")
    for said in ("console in a worker", "uncaught in a worker", "rejected in a worker"):
        tab.wait_error(said)
    tab.evaluate("() => { console.error('console in the page'); Promise.reject(new Error('rejected in the page')); }")
    tab.wait_error("console in the page")
    tab.wait_error("rejected in the page")
    tab.open("inline.html")
    tab.wait_error(r"(?i)script-src|inline script")
    tab.open("missing.html")
    tab.wait_error(r"no_such_file\.js")


@pytest.mark.provokes_foreign_requests(reason="asks another server in each way there is, to see that it is noticed")
@pytest.mark.provokes_console_errors(reason="the other server knows no web sockets")
def test_foreign_requests_are_noticed(tab: Tab, neighbour: str) -> None:
    """Requests from the page, a frame, a Blob worker (where the engine runs) and a worker's worker are reported."""
    tab.open("open.html")
    tab.evaluate(ASK_NEIGHBOUR, neighbour)
    asked = {f"{neighbour}{name}" for name in (*NEIGHBOUR_FILES, "socket", "worker-socket")}
    tab.wait_until(tab.foreign_requests, lambda found: set(found) >= asked, step="foreign requests")
    assert set(tab.foreign_requests()) == asked


def test_screenshot_has_the_size_asked_for(tab: Tab, tmp_path: Path) -> None:
    """A PNG of the viewport; width and height stand at bytes 16 to 24 (PNG, W3C Recommendation, section 11.2.2)."""
    tab.open("index.html")
    tab.resize(390, 844)
    tab.screenshot(tmp_path / "shot.png")
    data = (tmp_path / "shot.png").read_bytes()
    assert data.startswith(b"\x89PNG\r\n\x1a\n")
    assert (int.from_bytes(data[16:20]), int.from_bytes(data[20:24])) == (390, 844)


def test_foreign_is_every_other_origin() -> None:
    """Scheme, host and port all count; what is local is not foreign."""
    requested = [
        "file:///a/b.js",
        "blob:null/1",
        "data:,",
        "http://127.0.0.1:8000/a",
        "http://127.0.0.1:8001/a",
        "https://127.0.0.1:8000/a",
        "http://127.0.0.1:8001/a",
    ]
    assert select_foreign(requested, ["http://127.0.0.1:8000"]) == [
        "http://127.0.0.1:8001/a",
        "https://127.0.0.1:8000/a",
    ]


class Heard:
    """What a tab would report."""

    def __init__(self, errors: list[str], foreign: list[str]) -> None:
        """Keep both lists."""
        self._errors = errors
        self._foreign = foreign

    def console_errors(self) -> list[str]:
        """Report the errors given."""
        return self._errors

    def foreign_requests(self) -> list[str]:
        """Report the addresses given."""
        return self._foreign


def test_closing_check_wants_silence_or_a_marker_that_is_true() -> None:
    """Noise without a marker fails, and so does a marker without its noise."""
    both = frozenset({"provokes_console_errors", "provokes_foreign_requests"})
    loud = Heard(["boom"], ["http://other/"])
    assert list_noise(Heard([], []), frozenset()) == []
    assert list_noise(loud, both) == []
    assert list_noise(loud, frozenset()) == [
        "console errors, none expected: ['boom']",
        "foreign requests, none expected: ['http://other/']",
    ]
    assert list_noise(Heard([], []), both) == [
        "marked provokes_console_errors, but there was none: remove the marker",
        "marked provokes_foreign_requests, but there was none: remove the marker",
    ]
