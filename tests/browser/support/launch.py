"""Starting a tab in the browser of a given name.

Takes the name, an empty profile folder and the base address. Gives a `Tab`. Next: conftest.py.
"""

from pathlib import Path

from playwright.sync_api import Playwright

from generator.browsers import find_chromium, find_firefox
from tests.browser.support.chromium import ChromiumTab
from tests.browser.support.firefox import FirefoxTab, warm_profile
from tests.browser.support.tab import Tab

BROWSERS = ("chromium", "firefox")


def start_tab(browser: str, *, playwright: Playwright, profile: Path, base: str) -> Tab:
    """Start a tab showing a blank page; `browser` is one of `BROWSERS`. Close it when done."""
    if browser == "firefox":
        return FirefoxTab(executable=find_firefox(), profile=profile, base=base)
    return ChromiumTab(playwright=playwright, executable=find_chromium(), profile=profile, base=base)


def make_firefox_profile(folder: Path) -> Path:
    """Make a profile to copy for each tab in Firefox, in an empty folder; the same folder comes back."""
    warm_profile(executable=find_firefox(), profile=folder)
    return folder
