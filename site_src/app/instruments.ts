// Takes what is typed into the form of instruments; gives the list that every sheet offers under "read with".
// sheets.ts comes next.

import { all, fill, find, make, show } from "./dom";
import type { Instrument } from "./shapes";
import type { Store } from "./store";

const FIELDS = ["name", "measures", "accuracy", "span", "resolution", "serial", "due"] as const;

export class Instruments {
  onChange: () => void = () => undefined;
  readonly #section = find<HTMLElement>(document, "#sheet-instruments");
  readonly #store: Store;
  #list: Instrument[] = [];

  constructor(store: Store) {
    this.#store = store;
    const form = find<HTMLFormElement>(this.#section, "form");
    form.addEventListener("submit", (event) => {
      event.preventDefault();
      void this.#keep();
    });
    find(form, "#instruments-keep").addEventListener("click", () => void this.#keep());
  }

  async load(): Promise<void> {
    this.#list = await this.#store.instruments();
    this.#draw();
  }

  get count(): number {
    return this.#list.length;
  }

  /** By name, as the engine takes them. */
  get(): Record<string, Instrument> {
    return Object.fromEntries(this.#list.map((instrument) => [instrument.name, instrument]));
  }

  namesFor(measures: string): string[] {
    return this.#list.filter((instrument) => instrument.measures === measures).map(({ name }) => name);
  }

  /** Names of those whose due date has passed. */
  overdue(today: string): string[] {
    return this.#list.filter(({ due }) => due !== "" && due < today).map(({ name }) => name);
  }

  async #keep(): Promise<void> {
    const typed = Object.fromEntries(FIELDS.map((name) => [name, this.#field(name).value.trim()]));
    const instrument = typed as unknown as Instrument;
    if (!this.#isSound(instrument)) return;
    this.#list = [...this.#list.filter(({ name }) => name !== instrument.name), instrument];
    this.#list.sort((one, two) => (one.name < two.name ? -1 : 1));
    for (const name of FIELDS) if (name !== "measures") this.#field(name).value = "";
    this.#draw();
    this.onChange();
    this.#field("name").focus();
    await this.#store.keepInstrument(instrument);
  }

  #isSound(instrument: Instrument): boolean {
    const dueIsDate = instrument.due === "" || /^\d{4}-\d{2}-\d{2}$/.test(instrument.due);
    const says: Record<string, string> = {
      name: instrument.name ? "" : "Name or tag: found nothing; expected the tag on the instrument. Type it, then keep it again.",
      due: dueIsDate ? "" : `Calibration due: found ${instrument.due}; expected a date like 2027-03-01. Type it so, or leave it empty.`,
    };
    for (const [name, text] of Object.entries(says)) fill(find(this.#section, `#instruments-${name}-says`), text);
    const wrong = Object.keys(says).find((name) => says[name]);
    if (wrong) this.#field(wrong).focus();
    return !wrong;
  }

  #field(name: string): HTMLInputElement | HTMLSelectElement {
    return find(this.#section, `#instruments-${name}`);
  }

  #draw(): void {
    const place = find(this.#section, "[data-instruments]");
    place.replaceChildren(...this.#list.map((instrument) => this.#drawOne(instrument)));
    show(place, this.#list.length > 0);
    all(this.#section, "[data-none]").forEach((none) => show(none, this.#list.length === 0));
  }

  #drawOne(instrument: Instrument): HTMLLIElement {
    const item = make("li");
    const { name, measures, accuracy, span, resolution, serial, due } = instrument;
    const facts = [measures, accuracy, span && `span ${span}`, resolution && `step ${resolution}`, serial && `serial ${serial}`];
    const remove = make("button", "Remove", { type: "button", "aria-label": `Remove ${name}` });
    remove.addEventListener("click", () => void this.#remove(name));
    const words = [...facts, due && `due ${due}`].filter(Boolean).join(" · ");
    item.append(make("b", name), make("span", words), remove);
    return item;
  }

  async #remove(name: string): Promise<void> {
    this.#list = this.#list.filter((instrument) => instrument.name !== name);
    this.#draw();
    this.onChange();
    await this.#store.forgetInstrument(name);
  }
}
