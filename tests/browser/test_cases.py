"""Every number from outside typed into its law's page, in a real browser opened from a folder.

One tab types them all, law by law; the row found is compared with the interval that the source's digits allow.
"""

import re
from collections.abc import Iterator
from pathlib import Path
from tempfile import TemporaryDirectory

import pytest
from gaswright.quantity import in_unit
from playwright.sync_api import Playwright

from generator.load import Case
from tests.browser.support.launch import start_tab
from tests.browser.support.memory import folder_in_memory
from tests.browser.support.tab import Tab
from tests.support.cases import CASES, kind_of, reading_of, span

START_S = 60.0
LAWS = tuple(dict.fromkeys(case.relation for case in CASES))
EVERY = 3
# What only some laws have: lists, two sides, words to choose from, rows of any kind.
SPECIAL = ("dalton_total", "mass_to_mole", "speed_fraction", "orifice_plate", "effective_freedom", "upper_guard")
FOUND = re.compile(r"^[−\d.]+( × 10[⁰¹²³⁴⁵⁶⁷⁸⁹⁻]+)?$")
RAISED = str.maketrans("⁰¹²³⁴⁵⁶⁷⁸⁹⁻", "0123456789-")


@pytest.fixture(scope="module")
def page(playwright: Playwright, file_site: Path) -> Iterator[Tab]:
    """One tab in Chromium on the copied folder, quiet at the end."""
    with TemporaryDirectory(dir=folder_in_memory(), ignore_cleanup_errors=True) as folder:
        started = start_tab(
            "chromium", playwright=playwright, profile=Path(folder) / "profile", base=f"{file_site.as_uri()}/"
        )
        try:
            yield started
            assert started.foreign_requests() == []
            assert started.console_errors() == []
        finally:
            started.close()


def offered(page: Tab, case: Case, name: str, unit: str) -> str:
    """Give the unit where the page offers it for the variable, else the first of the variable's kind."""
    units = kind_of(case, name).units
    is_there = page.exists(f'select#{case.relation}-{name}-unit option[value="{unit}"]')
    return unit if unit in units or is_there else units[0]


def type_reading(page: Tab, case: Case, name: str) -> None:
    """Choose unit and reference of a row and type the digits."""
    field = f"#{case.relation}-{name}"
    if page.exists(f"select{field}"):
        page.select(field, case.given[name])
        return
    reading = reading_of(case, name)
    unit = offered(page, case, name, reading.unit)
    digits = reading.text.split(" ", maxsplit=1)[0]
    if page.exists(f"select{field}-unit"):
        page.select(f"{field}-unit", unit)
    if page.exists(f"select{field}-reference"):
        page.select(f"{field}-reference", reading.reference)
    page.type(field, digits if unit == reading.unit else repr(in_unit(reading.value, kind_of(case, name), unit)))


def number(text: str) -> float:
    """Give the number a page shows."""
    plain = text.replace("\u202f", "").replace("−", "-")
    head, times, power = plain.partition(" × 10")
    return float(f"{head}e{power.translate(RAISED)}") if times else float(head)


def agrees(case: Case, shown: float, unit: str) -> bool:
    """Tell whether a shown number, with seven digits, lies in the interval of the source."""
    low, high = sorted(in_unit(end, kind_of(case, case.find), unit) for end in span(case))
    slack = 1e-6 * max(abs(low), abs(high))
    return low - slack <= shown <= high + slack


def wait_figure(page: Tab, case: Case, unit: str) -> None:
    """Wait until the row found shows a number that agrees with the source."""

    def look() -> str:
        return page.text(f"#{case.relation}-{case.find}-found").replace("\u202f", "")

    def done(text: str) -> bool:
        return bool(FOUND.match(text)) and agrees(case, number(text), unit)

    expected = f"{case.expect} ({case.source})"
    page.wait_until(look, done, step=f"row {case.find} of {case.relation}", expected=expected, timeout_s=START_S)


def set_terms(page: Tab, case: Case) -> None:
    """Add or take away terms until the page has as many as the case, where the law is over lists."""
    counts = [int(found[1]) for name in (*case.given, case.find) if (found := re.search(r"_i_(\d+)$", name))]
    if not counts:
        return
    while page.count(".row[data-term]") == 0 or not page.exists(f'.row[data-term="{max(counts)}"]'):
        page.click("[data-add-term]")
    while page.exists(f'.row[data-term="{max(counts) + 1}"]'):
        page.click("[data-drop-term]")


def pytest_generate_tests(metafunc: pytest.Metafunc) -> None:
    """Every third law and the special ones; with ``--all`` every law."""
    if "law" in metafunc.fixturenames:
        sample = [law for place, law in enumerate(LAWS) if place % EVERY == 0 or law in SPECIAL]
        metafunc.parametrize("law", LAWS if metafunc.config.getoption("--all") else sample)


def test_the_published_figures_are_met_on_the_page(law: str, page: Tab) -> None:
    """Type each case of the law and read the row found."""
    page.open(f"laws/{law}.html")
    for case in [case for case in CASES if case.relation == law]:
        set_terms(page, case)
        page.click(f"#{law}-find-{case.find}")
        unit = offered(page, case, case.find, reading_of(case, case.find).unit)
        if page.exists(f"select#{law}-{case.find}-unit"):
            page.select(f"#{law}-{case.find}-unit", unit)
        for name in case.given:
            type_reading(page, case, name)
        wait_figure(page, case, unit)
