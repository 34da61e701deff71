"""What a page shows, measured in the browser: size and contrast of text, size of targets, width of the page.

Takes a tab with a page open. Gives lists of what is too small, too faint or too wide; empty lists are good.
Contrast is that of WCAG 2.2 between the text's colour and the nearest ground behind it that is not transparent.
"""

from typing import cast

from tests.browser.support.tab import Tab

LEAST_TEXT_PX = 18
LEAST_CONTRAST = 7
LEAST_TARGET_PX = 45

MEASURE = """(leastText, leastContrast, leastTarget) => {
  const channel = value => { const part = value / 255; return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4; };
  const numbers = colour => (colour.match(/[\\d.]+/g) ?? []).map(Number);
  const luminance = colour => { const [r, g, b] = numbers(colour); return 0.2126 * channel(r) + 0.7152 * channel(g) + 0.0722 * channel(b); };
  const ground = element => {
    for (let each = element; each; each = each.parentElement) {
      const colour = getComputedStyle(each).backgroundColor;
      const parts = numbers(colour);
      if (parts.length === 3 || parts[3] > 0) return colour;
    }
    return "rgb(255, 255, 255)";
  };
  const contrast = (one, other) => {
    const [dark, light] = [luminance(one), luminance(other)].sort((a, b) => a - b);
    return (light + 0.05) / (dark + 0.05);
  };
  const seen = element => element.checkVisibility({visibilityProperty: true});
  const name = element => `${element.tagName.toLowerCase()}${element.id ? "#" + element.id : ""} “${(element.textContent || element.value || "").trim().slice(0, 30)}”`;
  const found = {small: [], faint: [], tight: [], wide: [], counted: 0};
  const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
  const holders = new Set([...document.querySelectorAll("input:not([type=radio], [type=hidden]), select, textarea")]);
  while (walker.nextNode()) if (walker.currentNode.data.trim()) holders.add(walker.currentNode.parentElement);
  for (const element of holders) {
    if (!seen(element) || element.closest("select") && element.tagName !== "SELECT") continue;
    found.counted += 1;
    const style = getComputedStyle(element);
    const size = parseFloat(style.fontSize);
    const ratio = contrast(element.closest("svg") ? style.fill : style.color, ground(element));
    if (size < leastText - 0.01) found.small.push(`${name(element)} ${size}px`);
    if (ratio < leastContrast) found.faint.push(`${name(element)} ${ratio.toFixed(2)}:1`);
  }
  for (const element of document.querySelectorAll("a[href], button, input:not([type=hidden]), select")) {
    if (!seen(element)) continue;
    const target = element.type === "radio" ? element.closest("label") : element;
    const {width, height} = target.getBoundingClientRect();
    if (height < leastTarget || width < Math.min(leastTarget, 24)) found.tight.push(`${name(element)} ${width.toFixed(0)}×${height.toFixed(0)}`);
  }
  const most = document.documentElement.clientWidth;
  if (document.documentElement.scrollWidth > most) found.wide.push(`the page: ${document.documentElement.scrollWidth} in ${most}`);
  return found;
}"""


def measure(tab: Tab) -> dict[str, list[str]]:
    """Lists ``small``, ``faint``, ``tight`` and ``wide`` of the page as it stands; nothing measured is an error."""
    found = cast("dict[str, object]", tab.evaluate(MEASURE, LEAST_TEXT_PX, LEAST_CONTRAST, LEAST_TARGET_PX))
    assert int(str(found.pop("counted"))) > 0
    return cast("dict[str, list[str]]", found)
