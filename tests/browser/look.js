// Run in the page by look.py: what is too small, too faint, too tight for a finger, or too wide.
(leastText, leastContrast, leastTarget) => {
  const channel = value => {
    const part = value / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  };
  const numbers = colour => (colour.match(/[\d.]+/g) ?? []).map(Number);
  const luminance = colour => {
    const [red, green, blue] = numbers(colour);
    return 0.2126 * channel(red) + 0.7152 * channel(green) + 0.0722 * channel(blue);
  };
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
  const name = element => {
    const words = (element.textContent || element.value || "").trim().slice(0, 30);
    return `${element.tagName.toLowerCase()}${element.id ? "#" + element.id : ""} “${words}”`;
  };
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
  for (const element of document.querySelectorAll("a[href], button, summary, input:not([type=hidden]), select")) {
    if (!seen(element)) continue;
    const target = element.type === "radio" ? element.closest("label") : element;
    const {width, height} = target.getBoundingClientRect();
    // A link of one short word may be narrower; a finger still has its height.
    if (height < leastTarget || width < (element.tagName === "A" ? 10 : leastTarget)) {
      found.tight.push(`${name(element)} ${width.toFixed(0)}×${height.toFixed(0)}`);
    }
  }
  const most = document.documentElement.clientWidth;
  const width = document.documentElement.scrollWidth;
  if (width > most) found.wide.push(`the page: ${width} in ${most}`);
  return found;
}
