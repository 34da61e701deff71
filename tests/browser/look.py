"""What a page shows, measured in the browser: size and contrast of text, size of targets, width of the page.

Takes a tab with a page open. Gives lists of what is too small, too faint or too wide; empty lists are good.
Contrast is that of WCAG 2.2 between the text's colour and the nearest ground behind it that is not transparent.
"""

from pathlib import Path
from typing import cast

from tests.browser.support.tab import Tab

LEAST_TEXT_PX = 18
LEAST_CONTRAST = 7
LEAST_TARGET_PX = 45

MEASURE = Path(__file__).with_name("look.js").read_text(encoding="utf-8").partition("\n")[2]


def measure(tab: Tab) -> dict[str, list[str]]:
    """Lists ``small``, ``faint``, ``tight`` and ``wide`` of the page as it stands; nothing measured is an error."""
    found = cast("dict[str, object]", tab.evaluate(MEASURE, LEAST_TEXT_PX, LEAST_CONTRAST, LEAST_TARGET_PX))
    assert int(str(found.pop("counted"))) > 0
    return cast("dict[str, list[str]]", found)
