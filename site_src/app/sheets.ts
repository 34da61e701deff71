// Takes the one document of all sheets; opens the sheet its address names and keeps the day page up to date.
// page.ts comes next.

import type { Surroundings } from "./calculator";
import { stamp } from "./clock";
import { all, fill, find, maybe } from "./dom";
import { Instruments } from "./instruments";
import { emptyPaper } from "./paper";
import { Sheet } from "./sheet";
import { SiteForm } from "./site";
import { Store } from "./store";

const MINUTE_MS = 60_000;

export async function startSheets(): Promise<void> {
  const store = new Store();
  store.onTrouble = (reason) => fill(find(document, "#store-trouble"), reason);
  const site = new SiteForm(store);
  const instruments = new Instruments(store);
  const decimal = find<HTMLSelectElement>(document, "#decimal");
  site.decimal = () => decimal.value || null;
  const around: Surroundings = { site: () => site.get(), instruments: () => instruments.get(), decimal: () => decimal.value || null };
  const sections = all<HTMLElement>(document, ".calculator");
  const sheets = sections.map((section) => new Sheet(section, around, store, site, instruments));
  const day = new Day(sheets, site, instruments);

  await store.open();
  decimal.value = (await store.decimal()) ?? decimal.value;
  await site.load();
  await instruments.load();
  for (const sheet of sheets) sheet.takeInstruments();
  for (const draft of await store.sheets()) sheets.find(({ key }) => key === draft.key)?.restore(draft);

  site.onChange = () => {
    for (const sheet of sheets) sheet.takeSite();
    day.draw();
  };
  instruments.onChange = () => {
    for (const sheet of sheets) sheet.takeInstruments();
    day.draw();
  };
  for (const sheet of sheets) sheet.onChange = () => day.draw();
  decimal.addEventListener("input", () => {
    void store.keepDecimal(decimal.value);
    day.current?.refresh();
  });
  addEventListener("hashchange", () => day.open(true));
  addEventListener("beforeprint", () => (day.current ? day.current.print() : emptyPaper()));
  for (const leaving of ["pagehide", "visibilitychange"]) addEventListener(leaving, () => sheets.forEach((sheet) => void sheet.save()), true);
  setInterval(() => day.tick(), MINUTE_MS);
  day.open(false);
  document.documentElement.dataset["ready"] = "";
}

class Day {
  readonly #sheets: Sheet[];
  readonly #site: SiteForm;
  readonly #instruments: Instruments;

  constructor(sheets: Sheet[], site: SiteForm, instruments: Instruments) {
    this.#sheets = sheets;
    this.#site = site;
    this.#instruments = instruments;
  }

  get current(): Sheet | undefined {
    return this.#sheets.find(({ key }) => key === decodeURIComponent(location.hash.slice(1)));
  }

  /** Shows the sheet that the address names; `takeFocus` moves the keyboard there too. */
  open(takeFocus: boolean): void {
    const view = maybe<HTMLElement>(document, ".view:target") ?? find<HTMLElement>(document, "#day");
    const heading = maybe<HTMLElement>(view, "h1");
    document.title = `${heading?.textContent ?? "Sheets"} · Gaswright`;
    if (takeFocus) heading?.focus({ preventScroll: true });
    this.current?.open();
    this.draw();
  }

  tick(): void {
    this.#site.showState();
    this.current?.calculator.showState();
    this.draw();
  }

  draw(): void {
    const { isStale, isRead } = { isStale: this.#site.isStale(), isRead: this.#site.isRead() };
    const siteWords = isStale ? "read again" : isRead ? "read" : "not read";
    this.#line("site", isRead ? this.#site.words() : "", isStale ? "stale" : isRead ? "signed" : "empty", siteWords);
    for (const sheet of this.#sheets) this.#line(sheet.key, sheet.figure, ...describe(sheet));
    const overdue = this.#instruments.overdue(stamp(new Date()).slice(0, 10));
    const kept = this.#instruments.count;
    const mark = overdue.length > 0 ? "stale" : kept > 0 ? "signed" : "empty";
    const words = overdue.length > 0 ? `${overdue.length} overdue` : kept > 0 ? `${kept} kept` : "none kept";
    this.#line("instruments", overdue.length > 0 ? `past due: ${overdue.join(", ")}` : "", mark, words);
  }

  #line(key: string, figure: string, mark: string, words: string): void {
    const line = find(document, `[data-day-row="${CSS.escape(key)}"]`);
    find(line, "[data-day-figure]").textContent = figure;
    const state = find<HTMLElement>(line, "[data-mark]");
    state.dataset["mark"] = mark;
    state.textContent = words;
  }
}

/** Mark and words of a sheet on the day page. */
function describe(sheet: Sheet): [string, string] {
  if (sheet.isExample) return ["empty", "not started"];
  const again = sheet.revision > 1 ? `, revision ${sheet.revision}` : "";
  if (sheet.signature) return ["signed", `signed ${sheet.signature.time.slice(11, 16)}${again}`];
  if (sheet.state === "refused") return ["refused", `refused${again}`];
  if (sheet.state === "stale") return ["stale", `stale${again}`];
  const hasReading = sheet.calculator.rows.some((row) => row.from === "read" && row.text !== "");
  return hasReading ? ["in", `readings in${again}`] : ["empty", "not started"];
}
