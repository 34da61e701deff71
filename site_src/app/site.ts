// Takes what is typed into the form of site conditions; gives them to every sheet, and says when they have expired.
// sheets.ts comes next.

import { endOfShift, hours, isOld, stamp, toStandard } from "./clock";
import { all, fill, find, settle, turnSign } from "./dom";
import { ask } from "./engine";
import { drawOffers } from "./offers";
import { drawState } from "./result";
import type { Reading, RowAnswer, Site, SiteQuantity } from "./shapes";
import type { SiteFields, Store } from "./store";

const SAVE_MS = 200;
const KINDS: Record<SiteQuantity, string> = {
  station_pressure: "station_pressure",
  air_temperature: "absolute_temperature",
  reference_temperature: "absolute_temperature",
  reference_pressure: "absolute_pressure",
};
const QUANTITIES = Object.keys(KINDS) as SiteQuantity[];

type Field = HTMLInputElement | HTMLSelectElement;

export class SiteForm {
  onChange: () => void = () => undefined;
  decimal: () => string | null = () => null;
  readonly #section = find<HTMLElement>(document, "#sheet-site");
  readonly #store: Store;
  readonly #fields: Field[];
  readonly #save = settle(() => void this.#store.keepSiteFields(this.#values()), SAVE_MS);

  constructor(store: Store) {
    this.#store = store;
    this.#fields = all<Field>(this.#section, "input[id], select[id]");
    find<HTMLFormElement>(this.#section, "form").addEventListener("submit", (event) => event.preventDefault());
    this.#section.addEventListener("input", (event) => this.#typed(event.target));
    find(this.#section, "#site-now").addEventListener("click", () => this.#readNow());
    for (const button of all<HTMLButtonElement>(this.#section, ".sign")) {
      button.addEventListener("click", () => this.#turn(button.id.replace(/-sign$/, "")));
    }
  }

  async load(): Promise<void> {
    const kept = await this.#store.siteFields();
    if (kept) for (const field of this.#fields) field.value = kept[field.id] ?? field.value;
    this.#check(...QUANTITIES);
    this.showState();
  }

  /** One quantity as typed, or nothing when its field is empty. */
  reading(name: SiteQuantity): Reading | undefined {
    const text = this.#value(name);
    if (text === "") return undefined;
    const reading: Reading = { text, unit: this.#value(`${name}-unit`), from: "site" };
    if (name.endsWith("pressure")) reading.reference = "absolute";
    const accuracy = this.#value(`${name}-accuracy`);
    return accuracy ? { ...reading, accuracy } : reading;
  }

  get(): Site | null {
    const site: Site = {
      time: toStandard(this.#value("time")) ?? "", place: this.#value("place"), reader: this.#value("reader"),
    };
    for (const name of QUANTITIES) {
      const reading = this.reading(name);
      if (reading) site[name] = reading;
    }
    return this.isRead() ? site : null;
  }

  isRead(): boolean {
    return QUANTITIES.some((name) => this.#value(name) !== "");
  }

  /** Whether they were read more than one shift ago. */
  isStale(): boolean {
    return this.isRead() && isOld(this.#value("time"), new Date());
  }

  get place(): string {
    return this.#value("place");
  }

  /** All of it in one line. */
  words(): string {
    if (!this.isRead()) return "not read yet";
    const part = (name: SiteQuantity): string => [this.#value(name), this.#value(`${name}-unit`)].join(" ");
    const has = (name: SiteQuantity): boolean => this.#value(name) !== "";
    const pair = [has("reference_temperature") && part("reference_temperature"), has("reference_pressure") && part("reference_pressure")];
    const reference = pair.filter(Boolean).join(", ");
    const reader = this.#value("reader");
    const time = this.#value("time");
    return [
      has("station_pressure") && `station pressure ${part("station_pressure")}`,
      has("air_temperature") && `air ${part("air_temperature")}`,
      time && `read ${hours(time)}${reader ? ` by ${reader}` : ""}`,
      reference && `volumes at ${reference}`,
      this.isStale() ? "older than one shift" : `valid to ${hours(endOfShift(time))}`,
    ].filter(Boolean).join(" · ");
  }

  showState(): void {
    const state = !this.isRead() ? "empty" : this.isStale() ? "stale" : "answer";
    drawState(this.#section, state, state === "answer" ? `They hold until ${endOfShift(this.#value("time"))}.` : "");
    if (state === "answer") find(this.#section, "[data-state-word]").textContent = "Read";
    find(document, "[data-strip]").textContent = this.words();
  }

  #value(name: string): string {
    return find<Field>(this.#section, `#site-${name}`).value.trim();
  }

  #values(): SiteFields {
    return Object.fromEntries(this.#fields.map((field) => [field.id, field.value]));
  }

  #typed(target: EventTarget | null): void {
    const name = target instanceof Element ? (target.closest<HTMLElement>(".row")?.dataset["row"] ?? "") : "";
    if (this.#value("time") === "" && name !== "time") this.#stampTime();
    const isWrong = this.#value("time") !== "" && toStandard(this.#value("time")) === undefined;
    this.#sayTime(isWrong);
    if (name in KINDS) this.#check(name as SiteQuantity);
    this.#save();
    this.showState();
    this.onChange();
  }

  #sayTime(isWrong: boolean): void {
    const says = `Time of reading: found ${this.#value("time")}; expected a form like 2026-01-31 07:10 +01:00. Type it so, or press Read now.`;
    fill(find(this.#section, "#site-time-says"), isWrong ? says : "");
  }

  #readNow(): void {
    this.#stampTime();
    this.#typed(null);
  }

  #stampTime(): void {
    find<HTMLInputElement>(this.#section, "#site-time").value = stamp(new Date());
  }

  #turn(id: string): void {
    const field = find<HTMLInputElement>(this.#section, `#${id}`);
    field.value = turnSign(field.value);
    field.dispatchEvent(new Event("input", { bubbles: true }));
  }

  #check(...names: SiteQuantity[]): void {
    for (const name of names) void this.#checkOne(name);
  }

  async #checkOne(name: SiteQuantity): Promise<void> {
    const reading = this.reading(name);
    const row = find<HTMLElement>(this.#section, `[data-row="${name}"]`);
    const where = row.dataset["title"] ?? name;
    const answer: RowAnswer = reading
      ? ((await ask({ do: "reading", key: `site ${name}`, kind: KINDS[name], where, reading, decimal: this.decimal() }).catch(() => ({}))) as RowAnswer)
      : {};
    const isTrouble = answer.state === "error" || answer.state === "question";
    row.dataset["rowState"] = answer.state ?? "";
    fill(find(row, ".says"), isTrouble ? answer.says : "");
    drawOffers(find(row, ".offers"), isTrouble ? (answer.offers ?? []) : [], ({ text }) => this.#take(name, text));
  }

  #take(name: SiteQuantity, text: string): void {
    const field = find<HTMLInputElement>(this.#section, `#site-${name}`);
    field.value = text;
    field.focus();
    field.dispatchEvent(new Event("input", { bubbles: true }));
  }
}
