// Takes the element of one row; gives what stands in it as a reading, and draws what the engine says about it.
// calculator.ts and convert.ts come next.

import { all, fill, find, make, maybe, show, turnSign } from "./dom";
import { drawOffers } from "./offers";
import type { Figure, Offer, Reading, RowAnswer } from "./shapes";

export type From = "" | "read" | "site" | "preset";

/** What is kept of a row between two visits. */
export interface RowDraft {
  text: string;
  unit: string;
  reference: string;
  instrument: string;
  accuracy: string;
  from: From;
  confirmed: boolean;
}

type Field = HTMLInputElement | HTMLSelectElement;

const BY_HAND = "limit";
/** Letters of an origin that fit beside the fields. */
const SHORT = 12;

export class Row {
  readonly name: string;
  readonly title: string;
  readonly order: number;
  readonly site: string;
  readonly measures: string;
  readonly isGas: boolean;
  readonly element: HTMLElement;
  from: From = "";
  confirmed = false;
  /** What the engine said last, for paper. */
  said: RowAnswer = {};
  readonly #field: Field;
  readonly #unit: Field | undefined;
  readonly #reference: Field | undefined;
  readonly #instrument: HTMLSelectElement | undefined;
  readonly #accuracy: HTMLInputElement | undefined;
  readonly #found: HTMLOutputElement;
  readonly #by: HTMLElement;
  readonly #plainBy: string;
  #readUnit = "";

  constructor(element: HTMLElement, key: string) {
    const data = element.dataset;
    this.element = element;
    this.name = data["row"] ?? "";
    this.title = data["title"] ?? this.name;
    this.order = Number(data["order"]);
    this.site = data["site"] ?? "";
    this.measures = data["measures"] ?? "";
    this.isGas = "gas" in data;
    const id = `#${CSS.escape(`${key}-${this.name}`)}`;
    this.#field = find<Field>(element, id);
    this.#unit = maybe<Field>(element, `${id}-unit`);
    this.#reference = maybe<Field>(element, `${id}-reference`);
    this.#instrument = maybe<HTMLSelectElement>(element, `${id}-instrument`);
    this.#accuracy = maybe<HTMLInputElement>(element, `${id}-accuracy`);
    this.#found = find<HTMLOutputElement>(element, `${id}-found`);
    this.#by = find<HTMLElement>(element, `${id}-by`);
    this.#plainBy = this.#by.textContent.trim();
    maybe<HTMLButtonElement>(element, `${id}-sign`)?.addEventListener("click", () => this.#turn());
    this.confirmButton.addEventListener("click", () => this.#confirm());
  }

  get confirmButton(): HTMLButtonElement {
    return find<HTMLButtonElement>(this.element, ".confirm");
  }

  get isFound(): boolean {
    return this.element.classList.contains("is-found");
  }

  get text(): string {
    return this.#field.value;
  }

  get unit(): string {
    return this.#unit?.value ?? "";
  }

  get reference(): string {
    return this.#reference?.value ?? "";
  }

  /** Whether a value stands here that nobody has read or confirmed. */
  get waitsForConfirmation(): boolean {
    return !this.isFound && this.text !== "" && (this.from === "site" || this.from === "preset") && !this.confirmed;
  }

  /** Whether `target` is the field itself, so that what it holds was typed or chosen just now. */
  owns(target: EventTarget | null): boolean {
    return target === this.#field;
  }

  /** What the engine is asked with; nothing when the row is to be found or empty. */
  read(): Reading | undefined {
    if (this.isFound || this.text.trim() === "") return undefined;
    const reading: Reading = { text: this.text, from: this.waitsForConfirmation ? (this.from as "site") : "read" };
    if (this.unit) reading.unit = this.unit;
    if (this.reference) reading.reference = this.reference;
    const instrument = this.#instrument?.value ?? "";
    if (instrument === BY_HAND) reading.accuracy = this.#accuracy?.value.trim() || "";
    else if (instrument) reading.instrument = instrument;
    if (!reading.accuracy) delete reading.accuracy;
    return reading;
  }

  /** The reading in words, as it was typed. */
  get typed(): string {
    if (this.#field instanceof HTMLSelectElement) return this.#field.value && (this.#field.selectedOptions[0]?.text ?? "");
    const unit = this.unit === "1" ? "" : this.unit;
    return [this.text, unit, this.reference === "difference" ? "" : this.reference].filter(Boolean).join(" ");
  }

  /** Where the value came from or how well it is known, in words. */
  get byWords(): string {
    return this.#by.textContent;
  }

  keep(): RowDraft {
    return {
      text: this.text, unit: this.isFound && this.#readUnit ? this.#readUnit : this.unit, reference: this.reference,
      instrument: this.#instrument?.value ?? "", accuracy: this.#accuracy?.value ?? "", from: this.from,
      confirmed: this.confirmed,
    };
  }

  restore(draft: RowDraft): void {
    this.put(draft.text, this.isFound ? "" : draft.unit, draft.reference);
    if (this.isFound) this.#readUnit = draft.unit;
    if (this.#instrument) choose(this.#instrument, draft.instrument);
    if (this.#accuracy) this.#accuracy.value = draft.accuracy;
    this.from = draft.from;
    this.confirmed = draft.confirmed;
    this.showWhere();
  }

  /** Sets value, unit and reference without saying who read it. */
  put(text: string, unit: string, reference: string): void {
    if (this.#field instanceof HTMLSelectElement) choose(this.#field, text);
    else this.#field.value = text;
    if (unit && this.#unit) choose(this.#unit, unit);
    if (reference && this.#reference) choose(this.#reference, reference);
  }

  chooseUnit(unit: string): void {
    if (unit && this.#unit) choose(this.#unit, unit);
  }

  /** Whether a value in that unit can stand here without another word about how it is counted. */
  offersUnit(unit: string): boolean {
    if (this.#reference instanceof HTMLSelectElement) return false;
    if (this.#unit instanceof HTMLSelectElement) return [...this.#unit.options].some((option) => option.value === unit);
    return (this.#unit?.value || "1") === (unit || "1");
  }

  takeTyped(): void {
    this.from = "read";
    this.confirmed = false;
    this.showWhere();
  }

  clear(): void {
    this.put("", "", "");
    if (this.#instrument) this.#instrument.value = "";
    if (this.#accuracy) this.#accuracy.value = "";
    this.from = "";
    this.confirmed = false;
    this.say({});
  }

  /** Instruments that measure this kind of thing, to choose from. */
  offerInstruments(names: readonly string[]): void {
    if (!this.#instrument) return;
    const chosen = this.#instrument.value;
    all(this.#instrument, "option[data-name]").forEach((option) => option.remove());
    const last = find(this.#instrument, `option[value="${BY_HAND}"]`);
    for (const name of names) last.before(make("option", name, { value: name, "data-name": "" }));
    choose(this.#instrument, chosen);
  }

  /** Makes this the row to find, or a reading again. */
  setFound(isFound: boolean): void {
    if (isFound === this.isFound) return;
    this.element.classList.toggle("is-found", isFound);
    show(find(this.element, ".value"), !isFound);
    for (const part of [".by", ".origin"]) show(find(this.element, part), !isFound);
    show(this.#found, isFound);
    this.#found.textContent = "to find";
    const wanted = this.element.dataset["findUnit"] ?? "";
    if (isFound) this.#readUnit = this.unit;
    const unit = isFound ? wanted : this.#readUnit;
    if (unit && this.#unit) choose(this.#unit, unit);
    this.say({});
  }

  showFigure(figure: Figure | null | undefined): void {
    const text = figure?.row || "to find";
    if (this.#found.textContent !== text) this.#found.textContent = text;
  }

  /** Draws what the engine says about this row. */
  say(answer: RowAnswer): void {
    this.said = answer;
    this.element.dataset["rowState"] = answer.state ?? "";
    this.#field.setAttribute("aria-invalid", String(answer.state === "error"));
    fill(find(this.element, ".says"), answer.says);
    drawOffers(find(this.element, ".offers"), answer.offers ?? [], (offer) => this.#take(offer));
    this.showWhere();
  }

  showWhere(): void {
    this.element.dataset["from"] = this.waitsForConfirmation ? this.from : "";
    show(this.confirmButton, this.waitsForConfirmation);
    show(this.#accuracy, this.#instrument?.value === BY_HAND);
    const words = this.#whereWords();
    this.#by.textContent = words;
    this.element.classList.toggle("has-short-origin", words.length <= SHORT);
  }

  lock(isLocked: boolean): void {
    for (const control of all<HTMLInputElement>(this.element, "input, select, button")) control.disabled = isLocked;
  }

  #whereWords(): string {
    if (this.isFound || this.text.trim() === "") return this.#plainBy;
    if (this.waitsForConfirmation && this.from === "site") return "from site conditions, not confirmed";
    if (this.waitsForConfirmation) return "worked out, not read";
    if (this.from === "site" && this.confirmed) return "site conditions, confirmed";
    return this.said.by || this.#plainBy;
  }

  #take({ text, unit = "", reference = "" }: Offer): void {
    this.put(text, unit, reference);
    this.#field.focus();
    this.#announce();
  }

  #turn(): void {
    this.#field.value = turnSign(this.#field.value);
    this.#announce();
  }

  #confirm(): void {
    this.confirmed = true;
    this.showWhere();
    this.#field.focus();
    this.element.dispatchEvent(new CustomEvent("confirmed", { bubbles: true }));
  }

  #announce(): void {
    this.#field.dispatchEvent(new Event("input", { bubbles: true }));
  }
}

function choose(field: Field, value: string): void {
  if (field instanceof HTMLSelectElement && ![...field.options].some((option) => option.value === value)) return;
  field.value = value;
}
