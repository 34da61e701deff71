"""The converter as a crew uses it: the worked example, a unit of another kind, decimal comma, bad readings; Chromium.

The figures themselves are compared in tests/engine/readings; a few printed ones are met here on the page.
"""

import pytest

from tests.browser.look import measure
from tests.browser.support.tab import Tab

ADDRESS = "tables/units.html"
CONVERT = "#convert"
READING = "#convert-reading"
STATION = "#convert-p_station"
START_S = 60.0
FROM_A_FOLDER = pytest.mark.parametrize("tab", ["chromium-file"], indirect=True)
CELL = """(unit, place) => [...document.querySelectorAll("#convert [data-lines] tbody tr")]
  .filter(row => row.cells[0].textContent === unit).map(row => row.cells[place]?.textContent ?? "").join("|")"""


def cell(tab: Tab, unit: str, place: int = 1) -> str:
    """Text of one cell of the line of a unit; empty where there is no such line."""
    return str(tab.evaluate(CELL, unit, place)).replace("\u202f", "")


def wait_cell(tab: Tab, unit: str, text: str, place: int = 1) -> None:
    """Wait until the line of a unit shows the text."""
    tab.wait_until(
        lambda: cell(tab, unit, place),
        lambda found: found == text,
        step=f"line {unit}",
        expected=text,
        timeout_s=START_S,
    )


@FROM_A_FOLDER
def test_the_example_stands_until_something_is_typed(tab: Tab) -> None:
    """12.4 bar gauge over 996.4 hPa is 13.3964 bar; then 1 psi is 6894.757 Pa (NIST SP 811)."""
    tab.open(ADDRESS)
    assert tab.attribute(CONVERT, "data-state") == "example"
    assert (cell(tab, "bar"), cell(tab, "bar", 2)) == ("13.3964", "12.4")
    tab.select(READING + "-unit", "psi")
    tab.select(READING + "-reference", "absolute")
    tab.type(READING, "1")
    wait_cell(tab, "Pa", "6894.757")
    assert tab.attribute(CONVERT, "data-state") == "answer"
    tab.type(STATION, "")
    tab.wait_text(f"{CONVERT} [data-says]", "^Give the station pressure", START_S)


@FROM_A_FOLDER
def test_another_kind_hides_what_belongs_to_pressures(tab: Tab) -> None:
    """1 ft³ is 0.02831685 m³ (NIST SP 811); minus 40 is one temperature on both scales."""
    tab.open(ADDRESS)
    tab.select(READING + "-unit", "ft³")
    tab.type(READING, "1")
    wait_cell(tab, "m³", "0.02831685")
    hidden = "id => document.querySelector(id).closest('[hidden]') !== null"
    assert tab.evaluate(hidden, STATION)
    assert tab.evaluate(hidden, READING + "-reference")
    tab.select(READING + "-unit", "°F")
    tab.type(READING, "40")
    tab.click(READING + "-sign")
    wait_cell(tab, "°C", "−40")
    tab.select(READING + "-unit", "bar")
    wait_cell(tab, "bar", "")
    assert not tab.evaluate(hidden, STATION)


@FROM_A_FOLDER
def test_decimal_comma_and_bad_readings(tab: Tab) -> None:
    """A comma is read and shown; what cannot be read is told beside the field, and no line is left standing."""
    tab.open(ADDRESS)
    tab.select("#decimal", ",")
    tab.select(READING + "-unit", "L")
    tab.type(READING, "1,5")
    wait_cell(tab, "m³", "0,0015")
    tab.type(READING, "1,5 bar")
    tab.wait_text(
        READING + "-says", r"^Found bar \(pressure\); expected a unit of volume such as L, .* Choose", START_S
    )
    assert tab.attribute(CONVERT, "data-state") == "incomplete"
    assert cell(tab, "m³") == ""
    tab.select("#decimal", "")
    tab.type(READING, "1,234")
    tab.wait_text(READING + "-says", "^Found '1,234'; expected one meaning", START_S)
    tab.click(f"{CONVERT} .offers:not([hidden]) button:last-child")
    wait_cell(tab, "mL", "1234000")


@FROM_A_FOLDER
def test_it_is_large_and_dark_enough_with_an_error_shown(tab: Tab) -> None:
    """Size of text and targets and contrast, on a phone and on a desk."""
    tab.open(ADDRESS)
    tab.type(READING, "twelve")
    tab.wait_text(READING + "-says", "^Found 'twelve'; expected a number", START_S)
    for width in (1280, 400):
        tab.resize(width, 900)
        assert not {name: found for name, found in measure(tab).items() if found}, width
