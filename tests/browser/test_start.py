"""The loader: the engine starts offline in both browsers, and says why where it cannot."""

import json
import re
from pathlib import Path

import pytest
from playwright.sync_api import Playwright

from generator.browsers import find_chromium
from tests.browser.start_site import write_start_site
from tests.browser.support.chromium import FLAGS
from tests.browser.support.static_server import serve_folder
from tests.browser.support.tab import Tab

START_S = 60.0


@pytest.fixture(scope="module")
def site(tmp_path_factory: pytest.TempPathFactory) -> Path:
    """Write the site of this module."""
    folder = tmp_path_factory.mktemp("start")
    write_start_site(folder, tmp_path_factory.mktemp("work"))
    return folder


def test_request_made_before_the_start_is_answered(tab: Tab) -> None:
    """What was asked first is kept until the engine is there; the states come in order, each once."""
    tab.open("whole/index.html")
    assert tab.wait_text("#early", r"\S", START_S) == "engine read asked early"
    assert tab.text("#states") == "waiting starting ready"


def test_typing_is_answered_from_a_page_in_a_folder_below(tab: Tab) -> None:
    """The payloads are found from a page two folders down; typing while the engine starts loses nothing."""
    tab.open("whole/laws/deep/page.html#quiet")
    tab.type("#typed", "1,5 bär")
    assert tab.wait_text("#late", "bär$", START_S) == "engine read 1,5 bär"


def test_burst_of_one_slot_is_answered_with_its_newest(tab: Tab) -> None:
    """Of fifty requests of one slot the engine works on the first and the last; all fifty are settled."""
    tab.open("whole/index.html")
    tab.wait_text("#state", "ready", START_S)
    tab.click("#ask-burst")
    says = json.loads(tab.wait_text("#burst", r"\]$"))
    assert says == [[1]] + [[1, 50]] * 49


def test_broken_request_is_refused_and_the_next_one_answered(tab: Tab) -> None:
    """An error in the engine costs one request, not the engine."""
    tab.open("whole/index.html")
    tab.wait_text("#state", "ready", START_S)
    tab.click("#ask-broken")
    assert "broken on purpose by request" in tab.wait_text("#broken", "refused")
    tab.type("#typed", "2 bar")
    assert tab.wait_text("#late", "2 bar") == "engine read 2 bar"


def test_engine_runs_compiled_on_the_pinned_python(tab: Tab) -> None:
    """The wheel and the standard library are read as compiled files by Python 3.13 in WebAssembly."""
    tab.open("whole/index.html#quiet")
    tab.wait_text("#state", "ready", START_S)
    tab.click("#ask-about")
    version, platform, own, library, number = json.loads(tab.wait_text("#about", r"\]$"))
    assert (version, platform, number) == ("3.13", "emscripten", "1")
    assert own == "/lib/python3.13/site-packages/gaswright/browser.pyc"
    assert library == "/lib/python313.zip/json/__init__.pyc"


@pytest.mark.parametrize("name", ["machine", "engine"])
def test_damaged_payload_stops_the_engine(tab: Tab, name: str) -> None:
    """One byte of one payload changed: the engine does not run, and the message names the file and what to do."""
    tab.open(f"damaged_{name}/index.html")
    reason = tab.wait_text("#reason", r"\S", START_S)
    assert re.fullmatch(
        rf"engine/{name}\.js: found SHA-256 [0-9a-f]{{64}}; expected [0-9a-f]{{64}}, the file packed with this page\. "
        r"Copy the whole folder of this site again, then open the page anew\.",
        reason,
    )
    assert tab.text("#state") == "failed"
    assert tab.wait_text("#early", "refused") == f"refused: {reason}"


@pytest.mark.provokes_console_errors(reason="the browser reports the script that is not there")
def test_missing_payload_stops_the_engine(tab: Tab) -> None:
    """A payload script that is not there is named."""
    tab.open("missing/index.html")
    assert tab.wait_text("#reason", r"\S", START_S) == (
        "engine/library.js: found no readable file; expected it beside this page. "
        "Copy the whole folder of this site again (unpack it first if it is a zip file), then open the page anew."
    )
    assert tab.text("#state") == "failed"


def test_forbidden_webassembly_is_told_at_once(tab: Tab, request: pytest.FixtureRequest) -> None:
    """Where the page's policy forbids WebAssembly the runtime would wait for ever; the page says so instead."""
    if tab.browser == "firefox":
        request.node.add_marker(pytest.mark.provokes_console_errors(reason="Chromium says nothing, Firefox reports it"))
    tab.open("whole/no_wasm.html")
    reason = tab.wait_text("#reason", r"\S", START_S)
    assert reason.startswith("Calculator engine: found WebAssembly switched off (")
    assert reason.endswith(
        "expected a browser that runs WebAssembly on this page. "
        "Allow it in the browser's security settings, or use current Chromium, Edge or Firefox."
    )


@pytest.mark.provokes_console_errors(reason="the browser reports what the policy forbids")
def test_forbidden_worker_is_told_at_once(tab: Tab) -> None:
    """Where no background task may run, the page says so."""
    tab.open("whole/no_worker.html")
    reason = tab.wait_text("#reason", r"\S", START_S)
    assert reason.startswith("Calculator engine: found no background task (")


def test_starts_over_plain_http_from_another_machine(site: Path, playwright: Playwright) -> None:
    """Plain http to another host name gives no SubtleCrypto; the check of the payloads is made without it."""
    switches = [*FLAGS, "--host-resolver-rules=MAP field.test 127.0.0.1"]
    browser = playwright.chromium.launch(executable_path=find_chromium(), args=switches)
    with serve_folder(site) as address:
        page = browser.new_page()
        page.goto(address.replace("127.0.0.1", "field.test") + "whole/index.html")
        assert page.evaluate("() => [isSecureContext, typeof crypto.subtle]") == [False, "undefined"]
        page.locator("#early", has_text="engine read asked early").wait_for(timeout=START_S * 1000)
        page.goto(address.replace("127.0.0.1", "field.test") + "damaged_engine/index.html")
        page.locator("#reason", has_text="engine/engine.js: found SHA-256").wait_for(timeout=START_S * 1000)
        page.close()
    browser.close()
