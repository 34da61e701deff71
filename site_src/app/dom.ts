// Takes elements and plain text; gives small steps of drawing. Text enters by textContent only, never as markup.
// Every file that draws comes next.

export function find<T extends Element>(root: ParentNode, selector: string): T {
  const element = root.querySelector<T>(selector);
  if (!element) throw new Error(`page: found no ${selector}; expected one in this copy. Copy the whole folder again.`);
  return element;
}

export function maybe<T extends Element>(root: ParentNode, selector: string): T | undefined {
  return root.querySelector<T>(selector) ?? undefined;
}

export function all<T extends Element>(root: ParentNode, selector: string): T[] {
  return [...root.querySelectorAll<T>(selector)];
}

/** A new element with text in it. */
export function make<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  text = "",
  attributes: Record<string, string> = {},
): HTMLElementTagNameMap[K] {
  const element = document.createElement(tag);
  if (text) element.textContent = text;
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, value);
  return element;
}

/** A new SVG element. */
export function draw(tag: string, attributes: Record<string, string | number>, text = ""): SVGElement {
  const element = document.createElementNS("http://www.w3.org/2000/svg", tag);
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, String(value));
  if (text) element.textContent = text;
  return element;
}

export function show(element: Element | undefined, visible: boolean): void {
  if (element instanceof HTMLElement || element instanceof SVGElement) element.toggleAttribute("hidden", !visible);
}

/** Puts text in a slot and hides the slot when there is none; an unchanged slot is left alone, so that it is not read out again. */
export function fill(element: Element, text: string | null | undefined): void {
  const value = text ?? "";
  if (element.textContent !== value) element.textContent = value;
  show(element, value !== "");
}

/** A function that runs `action` once, `wait` milliseconds after its last call. */
export function settle(action: () => void, wait: number): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  return () => {
    clearTimeout(timer);
    timer = setTimeout(action, wait);
  };
}

/** A sign put before a number, or taken away. */
export function turnSign(text: string): string {
  const trimmed = text.trim();
  return /^[-−]/.test(trimmed) ? trimmed.slice(1).trimStart() : `-${trimmed}`;
}
