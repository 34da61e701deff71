// Takes the converter on the page of units; asks the engine with what is typed and draws the same quantity in every unit.
// page.ts comes next. Which rows are seen follows the kind of the unit chosen; no number is worked out here.

import { all, fill, find, make, settle, show } from "./dom";
import { ask } from "./engine";
import { drawState, drawWarnings } from "./result";
import { Row } from "./row";
import type { Reading, RowAnswer } from "./shapes";

const ASK_MS = 120;
const PATIENCE_MS = 400;
const KEY = "convert";

interface Converted {
  state: "empty" | "incomplete" | "answer" | "refused";
  rows?: Record<string, RowAnswer>;
  label?: string;
  says?: string;
  head?: string[];
  lines?: string[][];
  warnings?: string[];
  refusal?: string | null;
}

/** The page stays as drawn, with its worked example, until something is typed or chosen. */
export function startConvert(section: HTMLElement): void {
  const rows = all<HTMLElement>(section, ".row").map((element) => new Row(element, KEY));
  const decimal = find<HTMLSelectElement>(section, "#decimal");
  const unit = find<HTMLSelectElement>(section, `#${KEY}-reading-unit`);
  let turn = 0;
  let patience: ReturnType<typeof setTimeout> | undefined;

  const request = async (): Promise<void> => {
    const mine = ++turn;
    const kind = chosenGroup(unit)?.dataset["kind"];
    const answer = await ask({ do: KEY, kind, rows: readings(rows), decimal: decimal.value || null }).catch(refusal);
    if (mine !== turn) return;
    clearTimeout(patience);
    section.removeAttribute("data-waiting");
    draw(section, rows, answer as unknown as Converted);
  };
  const askSoon = settle(() => void request(), ASK_MS);

  find<HTMLFormElement>(section, "form").addEventListener("submit", (event) => event.preventDefault());
  section.addEventListener("input", (event) => {
    rows.find((row) => row.owns(event.target))?.takeTyped();
    showCounting(section, rows, chosenGroup(unit)?.hasAttribute("data-counted") ?? false);
    clearTimeout(patience);
    patience = setTimeout(() => wait(section), PATIENCE_MS);
    askSoon();
  });
}

/** Old figures are not left standing beside a new reading. */
function wait(section: HTMLElement): void {
  section.setAttribute("data-waiting", "");
  find(section, "[data-state-word]").textContent = "Calculating";
  find(section, "[data-state-says]").textContent = "The figures follow; the reading is kept.";
}

function chosenGroup(unit: HTMLSelectElement): HTMLElement | undefined {
  return unit.selectedOptions[0]?.closest<HTMLElement>("optgroup") ?? undefined;
}

/** Gauge, absolute and the station pressure belong to pressures alone. */
function showCounting(section: HTMLElement, rows: readonly Row[], isCounted: boolean): void {
  const reference = find<HTMLSelectElement>(section, `#${KEY}-reading-reference`);
  show(reference, isCounted);
  for (const row of rows.slice(1)) show(row.element, isCounted && reference.value !== "difference");
}

/** What stands in the rows that are seen; how it is counted goes along only where that is seen, too. */
function readings(rows: readonly Row[]): Record<string, Reading> {
  const found: Record<string, Reading> = {};
  for (const row of rows) {
    const reading = row.element.hidden ? undefined : row.read();
    if (!reading) continue;
    if (row.element.querySelector("select.reference[hidden]")) delete reading.reference;
    found[row.name] = reading;
  }
  return found;
}

function refusal(cause: unknown): Converted {
  return { state: "refused", refusal: cause instanceof Error ? cause.message : String(cause) };
}

function draw(section: HTMLElement, rows: readonly Row[], answer: Converted): void {
  for (const row of rows) row.say(answer.rows?.[row.name] ?? {});
  fill(find(section, "[data-refusal]"), answer.refusal);
  fill(find(section, "[data-label]"), answer.label);
  fill(find(section, "[data-says]"), answer.says);
  drawWarnings(find(section, "[data-warnings]"), answer.warnings ?? []);
  drawLines(find(section, "[data-lines]"), answer.head ?? [], answer.lines ?? []);
  drawState(section, answer.state, answer.state === "incomplete" ? "See what is said under the reading." : "");
}

function drawLines(place: HTMLElement, head: readonly string[], lines: readonly string[][]): void {
  find(place, "thead tr").replaceChildren(...head.map((title) => make("th", title, { scope: "col" })));
  find(place, "tbody").replaceChildren(
    ...lines.map((cells) => {
      const line = make("tr");
      line.append(...cells.map((cell, at) => (at === 0 ? make("th", cell, { scope: "row" }) : make("td", cell))));
      return line;
    }),
  );
  show(place, lines.length > 0);
}
