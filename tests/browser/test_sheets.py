"""Sheets as a crew uses them: typing, asking another question, site conditions, signing, paper; in both browsers.

The numbers of the answers are other tests' business; here it is what the screen does with them.
"""

import re
from datetime import UTC, datetime, timedelta
from pathlib import Path

import pytest
from playwright.sync_api import Playwright
from pypdf import PdfReader

from generator.browsers import find_chromium
from tests.browser.look import measure
from tests.browser.support.chromium import FLAGS
from tests.browser.support.tab import Tab

SHEET = "#sheet-bank_endurance"
KEY = "#bank_endurance"
ADDRESS = "sheets.html#bank_endurance"
START_S = 60.0
# Over http the same files are opened by the tests of the figures, of the start and of the search.
FROM_A_FOLDER = pytest.mark.parametrize("tab", ["chromium-file", "firefox-file"], indirect=True)
READINGS = {
    "count": "4",
    "V_each": "50",
    "pg_start": "200",
    "pg_end": "10",
    "T_gas": "20",
    "p_atm": "1013",
    "q": "30",
    "T_ref": "20",
    "p_ref": "101.325",
}
UNITS = {"p_atm": "mbar", "p_ref": "kPa", "q": "L/min", "T_gas": "°C", "T_ref": "°C"}
# The loader begins 300 ms after the page at the latest, and takes each script away once it has been read.
PAYLOADS_ARE_IN = """() => !document.querySelector("#law, #convert, #sheet-day")
  || performance.now() > 900 && !document.querySelector('head script[src*="/engine/"]')"""
PAGES = (
    "index.html",
    "sheets.html#day",
    "sheets.html#site",
    "sheets.html#instruments",
    "sheets.html#bank_endurance",
    "sheets.html#cylinder_receipt",
    "sheets.html#locked_in",
    "laws.html",
    "laws/boyle.html",
    "laws/choked_flow.html",
    "laws/van_der_waals.html",
    "gases.html",
    "gases/nitrogen.html",
    "tables.html",
    "tables/units.html",
    "tables/reference_conditions.html",
    "tables/saturation.html",
    "tables/molecules.html",
    "about.html",
    "hosting.html",
)


def open_view(tab: Tab, address: str) -> None:
    """Open a view of the sheets once what was kept has been read."""
    tab.open(address)
    tab.wait_one("html[data-ready]")


def fill_bank(tab: Tab, **changed: str) -> None:
    """Type every reading of the bank, gas first; the worked example goes with the first of them."""
    tab.select(KEY + "-gas", "nitrogen")
    for name, unit in UNITS.items():
        tab.select(f"{KEY}-{name}-unit", unit)
    for name, text in {**READINGS, **changed}.items():
        tab.type(f"{KEY}-{name}", text)


def wait_state(tab: Tab, state: str) -> None:
    """Wait until the sheet shows the state."""
    tab.wait_one(f'{SHEET}[data-state="{state}"]', timeout_s=START_S)


def set_site(tab: Tab, read: datetime) -> None:
    """Type the site conditions as read at that time."""
    open_view(tab, "sheets.html#site")
    tab.select("#site-station_pressure-unit", "mbar")
    tab.type("#site-station_pressure", "1013")
    tab.type("#site-air_temperature", "20")
    tab.type("#site-reference_temperature", "20")
    tab.type("#site-reference_pressure", "101.325")
    tab.type("#site-reader", "shift lead")
    tab.type("#site-time", f"{read:%Y-%m-%d %H:%M} +00:00")
    wait_saved(tab)


def wait_saved(tab: Tab) -> None:
    """Let what was typed reach the store: it is written 200 ms after the last key, and may take as long again."""
    tab._pause(0.6)


def wait_payloads(tab: Tab) -> None:
    """Let the engine's files arrive before leaving a page that calculates: one cut off is an error of its own."""
    tab.wait_until(lambda: tab.evaluate(PAYLOADS_ARE_IN), bool, step="files of the engine", timeout_s=START_S)


def order_of_rows(tab: Tab) -> list[str]:
    """Names of the rows in the order of the page."""
    names = tab.evaluate("sheet => [...document.querySelectorAll(`${sheet} .row`)].map(row => row.dataset.row)", SHEET)
    assert isinstance(names, list)
    return [str(name) for name in names]


@FROM_A_FOLDER
def test_another_question_wipes_nothing_and_survives_a_reload(tab: Tab) -> None:
    """The row to find moves to the foot; the one found before stands as a reading that was worked out."""
    open_view(tab, ADDRESS)
    assert tab.attribute(SHEET, "data-state") == "example"
    fill_bank(tab)
    wait_state(tab, "answer")
    assert order_of_rows(tab)[-1] == "t"
    tab.click(f"label:has({KEY}-find-count)")
    tab.wait_text(f"{KEY}-count-found", r"^4", START_S)
    assert order_of_rows(tab)[-1] == "count"
    worked_out = tab.value(KEY + "-t")
    assert 1180 < float(worked_out) < 1187
    assert len(worked_out) > 10
    assert tab.text(KEY + "-t-by") == "worked out, not read"
    kept = {name: tab.value(f"{KEY}-{name}") for name in READINGS}
    assert kept == READINGS
    wait_saved(tab)
    tab.reload()
    tab.wait_one("html[data-ready]")
    assert {name: tab.value(f"{KEY}-{name}") for name in READINGS} == READINGS
    assert tab.value(KEY + "-t") == worked_out
    assert order_of_rows(tab)[-1] == "count"
    tab.type(KEY + "-t", "600")
    tab.wait_until(
        lambda: tab.text(KEY + "-t-by"), lambda words: words != "worked out, not read", step="origin of a typed value"
    )


@FROM_A_FOLDER
def test_first_own_reading_clears_the_example(tab: Tab) -> None:
    """No invented value is left among a crew's own; the units stay."""
    open_view(tab, ADDRESS)
    assert tab.value(KEY + "-pg_start") != ""
    tab.type(KEY + "-count", "3")
    tab.type(KEY + "-V_each", "50")
    assert tab.value(KEY + "-pg_start") == ""
    assert tab.value(KEY + "-pg_start-unit") == "bar"
    assert tab.value(KEY + "-gas") == ""
    wait_state(tab, "incomplete")
    assert "Pressure now" in tab.text(f"{SHEET} [data-state-says]")


@FROM_A_FOLDER
def test_ambiguous_number_is_asked_about_and_the_choice_fills_the_field(tab: Tab) -> None:
    """The message stands under the row and belongs to the field."""
    open_view(tab, ADDRESS)
    fill_bank(tab, pg_start="1,234")
    row = f"{SHEET} [data-row=pg_start]"
    tab.wait_one(f'{row}[data-row-state="question"]', timeout_s=START_S)
    assert tab.text(KEY + "-pg_start-says")
    assert f"{KEY[1:]}-pg_start-says" in str(tab.attribute(KEY + "-pg_start", "aria-describedby"))
    offered = tab.text(f"{row} .offers button:first-child")
    tab.click(f"{row} .offers button:first-child")
    assert tab.value(KEY + "-pg_start") == offered


@FROM_A_FOLDER
def test_wrong_reading_says_why_and_is_kept(tab: Tab) -> None:
    """Nothing typed is lost, and no figure is left standing beside it."""
    open_view(tab, ADDRESS)
    fill_bank(tab, T_gas="-300")
    tab.wait_one(f'{SHEET} [data-row=T_gas][data-row-state="error"]', timeout_s=START_S)
    assert tab.value(KEY + "-T_gas") == "-300"
    assert tab.attribute(KEY + "-T_gas", "aria-invalid") == "true"
    assert tab.evaluate("sheet => document.querySelector(`${sheet} [data-figure]`).checkVisibility()", SHEET) is False
    tab.click(KEY + "-T_gas-sign")
    assert tab.value(KEY + "-T_gas") == "300"


@FROM_A_FOLDER
def test_site_conditions_reach_the_sheets_and_wait_to_be_confirmed(tab: Tab) -> None:
    """A default is not a reading: signing waits for each value that nobody confirmed on this sheet."""
    set_site(tab, datetime.now(UTC))
    open_view(tab, ADDRESS)
    tab.click(KEY + "-own")
    assert tab.value(KEY + "-p_atm") == "1013"
    assert tab.text(KEY + "-p_atm-by") == "from site conditions, not confirmed"
    tab.select(KEY + "-gas", "nitrogen")
    for name in ("count", "V_each", "pg_start", "pg_end", "q"):
        tab.type(f"{KEY}-{name}", READINGS[name])
    wait_state(tab, "answer")
    assert "Station pressure" in tab.text(f"{SHEET} [data-wait]")
    for name in ("T_gas", "p_atm", "T_ref", "p_ref"):
        tab.click(f"{KEY}-{name}-confirm")
    tab.wait_text(f"{SHEET} [data-wait]", "Type a name")
    assert tab.text(KEY + "-p_atm-by") == "site conditions, confirmed"
    open_view(tab, "sheets.html#locked_in")
    tab.click("#locked_in-own")
    assert tab.value("#locked_in-p_atm") == "1013"


@FROM_A_FOLDER
def test_old_site_conditions_hold_up_signing(tab: Tab) -> None:
    """After a shift of 12 h the sheet is stale until they are read again."""
    set_site(tab, datetime.now(UTC) - timedelta(hours=12, minutes=2))
    open_view(tab, ADDRESS)
    fill_bank(tab)
    wait_state(tab, "stale")
    tab.wait_text(f"{SHEET} [data-wait]", "older than 12 h")
    assert tab.attribute(KEY + "-sign-now", "disabled") is not None
    open_view(tab, "sheets.html#site")
    tab.click("#site-now")
    open_view(tab, ADDRESS)
    wait_state(tab, "answer")


@FROM_A_FOLDER
def test_signed_sheet_is_locked_until_a_new_revision_with_a_reason(tab: Tab) -> None:
    """The day page shows it, a reload keeps it, and a correction says why."""
    open_view(tab, ADDRESS)
    fill_bank(tab)
    wait_state(tab, "answer")
    tab.wait_text(f"{SHEET} [data-figure]", r"\d")
    tab.type(KEY + "-signer", "A. Crew")
    tab.click(KEY + "-sign-now")
    wait_state(tab, "signed")
    assert tab.attribute(KEY + "-count", "disabled") is not None
    figure = tab.text(f"{SHEET} [data-figure]")
    wait_saved(tab)
    tab.reload()
    wait_state(tab, "signed")
    assert tab.text(f"{SHEET} [data-figure]") == figure
    tab.click(KEY + "-revise")
    assert tab.attribute(SHEET, "data-state") == "signed"
    tab.type(KEY + "-reason", "gauge read from the wrong side")
    tab.click(KEY + "-revise")
    wait_state(tab, "answer")
    assert tab.attribute(KEY + "-count", "disabled") is None
    open_view(tab, "sheets.html#day")
    assert tab.text('[data-day-row="bank_endurance"] [data-mark]') == "readings in, revision 2"


@FROM_A_FOLDER
def test_whole_sheet_by_keyboard(tab: Tab) -> None:
    """Every field, list and button is reached by Tab, in the order of the rows."""
    open_view(tab, ADDRESS)
    fill_bank(tab)
    wait_state(tab, "answer")
    tab.evaluate("id => document.querySelector(id).focus()", KEY + "-gas")
    reached = ["bank_endurance-gas"]
    for _ in range(60):
        tab.press("Tab")
        reached.append(str(tab.evaluate("() => document.activeElement.id")))
        if reached[-1] == "bank_endurance-signer":
            break
    fields = [f"bank_endurance-{name}" for name in order_of_rows(tab)[:-1]]
    assert [each for each in reached if each in fields] == fields
    assert reached[-1] == "bank_endurance-signer"


@pytest.mark.parametrize("tab", ["chromium-file"], indirect=True)
@pytest.mark.parametrize("width", [1280, 400])
def test_every_page_can_be_read_in_the_sun_and_used_with_gloves(tab: Tab, width: int) -> None:
    """18 px, 7:1, 45 px, and nothing wider than the screen."""
    tab.resize(width, 900)
    troubles = {}
    for page in PAGES:
        tab.open(page)
        found = {what: names for what, names in measure(tab).items() if names}
        wait_payloads(tab)
        if found:
            troubles[page] = found
    assert not troubles


@FROM_A_FOLDER
def test_narrow_order_and_foot_bar(tab: Tab) -> None:
    """Readings, result, working; the bar at the foot shows the figure and leads to its box."""
    tab.resize(400, 800)
    open_view(tab, ADDRESS)
    tops = tab.evaluate(
        "(...parts) => parts.map(part => document.querySelector(part).getBoundingClientRect().top)",
        *(f"{SHEET} {part}" for part in (".rows", ".result", ".work")),
    )
    assert isinstance(tops, list)
    assert tops == sorted(tops)
    assert tab.text(f"{SHEET} [data-foot]").startswith(tab.text(f"{SHEET} [data-figure]"))
    tab.click(f"{SHEET} [data-foot]")
    assert tab.evaluate("() => document.activeElement.id") == "bank_endurance-result"


def test_search_leads_to_a_sheet_from_a_page_below(tab: Tab) -> None:
    """The index is a script beside the pages; a slip of the finger is forgiven."""
    tab.open("laws/boyle.html")
    tab.type("#search", "changover")
    tab.wait_text("#search-hits ol", "Time to changeover")
    wait_payloads(tab)
    tab.click("#search-hits li:first-child a")
    tab.wait_text("#bank_endurance h1", "Time to changeover")
    wait_payloads(tab)


def test_refused_store_is_said_and_calculating_goes_on(site: Path, playwright: Playwright) -> None:
    """Where the browser keeps nothing, the page says so instead of losing readings in silence."""
    browser = playwright.chromium.launch(executable_path=str(find_chromium()), args=list(FLAGS))
    page = browser.new_page()
    page.add_init_script("IDBFactory.prototype.open = () => { throw new DOMException('switched off') }")
    page.goto(f"{(site / 'sheets.html').as_uri()}#bank_endurance")
    page.locator("#store-trouble:visible").wait_for()
    said = page.locator("#store-trouble").inner_text()
    page.locator(KEY + "-count").fill("3")
    page.locator(f'{SHEET}[data-state="empty"], {SHEET}[data-state="incomplete"]').wait_for(timeout=START_S * 1000)
    browser.close()
    assert "keeps nothing" in said
    assert "switched off" in said


def test_without_scripts_the_page_says_so_and_shows_its_example(site: Path, playwright: Playwright) -> None:
    """In a zip preview nothing runs; the sheet that the address names is shown all the same."""
    browser = playwright.chromium.launch(executable_path=str(find_chromium()), args=list(FLAGS))
    page = browser.new_page(java_script_enabled=False)
    page.goto(f"{(site / 'sheets.html').as_uri()}#bank_endurance")
    assert page.locator("noscript p").is_visible()
    assert page.locator(f"{SHEET} [data-figure]").is_visible()
    assert not page.locator("#sheet-locked_in").is_visible()
    browser.close()


@pytest.mark.parametrize("key", ["bank_endurance", "cylinder_receipt", "locked_in"])
def test_sheet_prints_on_one_page(site: Path, playwright: Playwright, tmp_path: Path, key: str) -> None:
    """Readings as typed and in SI, figure, rule, version, time with offset and two lines to sign, on one A4 page."""
    browser = playwright.chromium.launch(executable_path=str(find_chromium()), args=list(FLAGS))
    page = browser.new_page()
    page.goto(f"{(site / 'sheets.html').as_uri()}#{key}")
    page.locator("html[data-ready]").wait_for(state="attached")
    page.pdf(path=tmp_path / "sheet.pdf", format="A4", prefer_css_page_size=True)
    figure = page.locator(f"#sheet-{key} [data-figure]").inner_text()
    browser.close()
    printed = PdfReader(tmp_path / "sheet.pdf").pages
    assert len(printed) == 1
    text = re.sub(r"\s+", " ", printed[0].extract_text())
    for expected in (
        re.sub(r"\s+", " ", figure),
        "As typed",
        "In SI",
        "Rule:",
        "Formulas:",
        "Gaswright ",
        "Read and signed",
        "Checked:",
    ):
        assert expected in text
    assert re.search(r"Printed \d{4}-\d\d-\d\d \d\d:\d\d [+-]\d\d:\d\d", text)
