"""The control behind every test from `file://`: the browser keeps files apart, as a reader's browser does.

Takes a tab and a folder. Gives what a page there can read of the file next to it. Next: test_harness.py asserts on it.
Automation settings can switch that policy off: a site that fetches its parts would pass, and fail its readers.
"""

from pathlib import Path

from tests.browser.support.tab import Tab

PAGE = "origin_control.html"
SIBLING = "origin_control.txt"
SIBLING_TEXT = "the sibling file was read"

# No Content-Security-Policy here: it would block the request itself, and the control would prove nothing.
PAGE_TEXT = """<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Origin control</title>
<link rel="icon" href="data:,"></head><body><p id="ready">ready</p></body></html>
"""

READ_SIBLING = """name => new Promise(resolve => {
  const request = new XMLHttpRequest();
  request.onload = () => resolve(request.responseText);
  request.onerror = () => resolve("blocked");
  request.open("GET", name);
  try { request.send(); } catch (error) { resolve("blocked"); }
})"""


def write_origin_control(folder: Path) -> None:
    """Put the control page and the file beside it into the folder that the tab's base address shows."""
    (folder / PAGE).write_text(PAGE_TEXT, encoding="utf-8")
    (folder / SIBLING).write_text(SIBLING_TEXT, encoding="utf-8")


def read_sibling(tab: Tab) -> str:
    """Ask for the sibling file by XMLHttpRequest: its text, or `blocked`."""
    tab.open(PAGE)
    tab.wait_text("#ready", "ready")
    return str(tab.evaluate(READ_SIBLING, SIBLING))
