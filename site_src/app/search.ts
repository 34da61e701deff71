// Takes what is typed into the search field; gives links to sheets, laws, gases and tables.
// page.ts comes next. The entries are read when the field is first used.

import MiniSearch from "minisearch";

import { find, make, show } from "./dom";

interface Entry {
  id: string;
  href: string;
  title: string;
  part: string;
  words: string;
}

declare global {
  /** Set by the script of search entries. */
  var gaswrightEntries: Entry[] | undefined;
}

const MOST = 12;
const root = document.documentElement.dataset["root"] ?? "";

export function startSearch(): void {
  const field = find<HTMLInputElement>(document, "#search");
  const hits = find<HTMLElement>(document, "#search-hits");
  field.addEventListener("focus", loadEntries);
  field.addEventListener("input", () => {
    loadEntries();
    draw(field.value, hits);
  });
  for (const element of [field, hits]) {
    element.addEventListener("keydown", (event) => {
      if (event.key === "Escape") close(field, hits);
    });
  }
  document.addEventListener("click", (event) => {
    const isInside = event.target instanceof Node && (hits.contains(event.target) || field === event.target);
    if (!isInside || event.target instanceof HTMLAnchorElement) show(hits, false);
  });
}

let isLoading = false;
let index: MiniSearch<Entry> | undefined;
let redraw: () => void = () => undefined;

/** Once; a field may be typed into without ever being told that it has the focus. */
function loadEntries(): void {
  if (isLoading) return;
  isLoading = true;
  const script = make("script", "", { src: `${root}search/entries.js` });
  script.addEventListener("load", () => {
    index = new MiniSearch<Entry>({
      fields: ["title", "words"], storeFields: ["href", "title", "part"],
      searchOptions: { boost: { title: 4 }, prefix: true, fuzzy: 0.2, combineWith: "AND" },
    });
    index.addAll(globalThis.gaswrightEntries ?? []);
    redraw();
  });
  document.head.append(script);
}

function draw(text: string, hits: HTMLElement): void {
  redraw = () => draw(text, hits);
  const found = text.trim() && index ? index.search(text).slice(0, MOST) : [];
  find(hits, "ol").replaceChildren(...found.map((hit) => drawHit(hit as unknown as Entry)));
  find(hits, "p").textContent = found.length > 0 ? `${found.length} found` : "Nothing found; try another word.";
  show(hits, text.trim() !== "" && index !== undefined);
}

function drawHit(entry: Entry): HTMLLIElement {
  const item = make("li");
  const link = make("a", "", { href: `${root}${entry.href}` });
  link.append(make("b", entry.title), make("span", entry.part));
  item.append(link);
  return item;
}

function close(field: HTMLInputElement, hits: HTMLElement): void {
  show(hits, false);
  field.focus();
}
