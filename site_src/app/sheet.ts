// Takes one sheet of the document; keeps what is typed, fills in site conditions, signs and revises.
// sheets.ts comes next.

import { Calculator, type Surroundings } from "./calculator";
import { stamp } from "./clock";
import { all, fill, find, maybe, settle, show } from "./dom";
import type { Instruments } from "./instruments";
import { fillPaper } from "./paper";
import type { Answer, ShownState, SiteQuantity } from "./shapes";
import type { SiteForm } from "./site";
import type { Draft, Signature, Store } from "./store";

const SAVE_MS = 200;

export class Sheet {
  readonly calculator: Calculator;
  onChange: () => void = () => undefined;
  #isExample = true;
  #signature: Signature | null = null;
  #revision = 1;
  #reason = "";
  #asked = false;
  readonly #section: HTMLElement;
  readonly #store: Store;
  readonly #site: SiteForm;
  readonly #instruments: Instruments;
  readonly #save = settle(() => void this.save(), SAVE_MS);

  constructor(section: HTMLElement, around: Surroundings, store: Store, site: SiteForm, instruments: Instruments) {
    this.#section = section;
    this.#store = store;
    this.#site = site;
    this.#instruments = instruments;
    this.calculator = new Calculator(section, around);
    this.calculator.overlay = (state) => this.#overlay(state);
    this.calculator.takeDrawn();
    this.calculator.onChange = (row) => this.#changed(row !== undefined, row?.name);
    this.calculator.onAnswer = () => this.#answered();
    this.#listen();
    this.takeInstruments();
  }

  get key(): string {
    return this.calculator.key;
  }

  get title(): string {
    return this.#section.dataset["title"] ?? this.key;
  }

  get isExample(): boolean {
    return this.#isExample;
  }

  get signature(): Signature | null {
    return this.#signature;
  }

  get revision(): number {
    return this.#revision;
  }

  get figure(): string {
    return this.#isExample ? "" : (this.calculator.answer?.figure?.text ?? "");
  }

  get state(): ShownState {
    return (this.#section.dataset["state"] ?? "empty") as ShownState;
  }

  /** Called when the sheet comes into view: a kept sheet is calculated anew, then at every change. */
  open(): void {
    this.calculator.showState();
    if (!this.#asked) this.refresh();
    this.#asked = true;
  }

  /** Asks again, as when the decimal mark has changed; an example and a signed sheet stay as they are. */
  refresh(): void {
    if (!this.#isExample && !this.#signature) this.calculator.askSoon();
  }

  restore(draft: Draft): void {
    this.#isExample = draft.isExample;
    this.#signature = draft.signature;
    this.#revision = draft.revision;
    this.#reason = draft.reason;
    this.#job.value = draft.job;
    this.calculator.choose(draft.find, false);
    for (const row of this.calculator.rows) {
      const kept = draft.rows[row.name];
      if (kept) row.restore(kept);
    }
    this.calculator.foundRow?.chooseUnit(draft.unit);
    this.calculator.asked = draft.asked ?? undefined;
    this.calculator.draw(draft.answer);
  }

  /** Site conditions have changed: rows that take from them follow, and wait for confirmation again. */
  takeSite(): void {
    if (this.#isExample || this.#signature) return;
    this.#fillFromSite();
    this.#save();
    if (this.#asked) this.refresh();
  }

  takeInstruments(): void {
    for (const row of this.calculator.rows) row.offerInstruments(this.#instruments.namesFor(row.measures));
  }

  async save(): Promise<void> {
    if (this.#isExample) return;
    await this.#store.keepSheet(this.#draft());
  }

  print(): void {
    fillPaper(this.calculator, {
      job: this.#job.value, place: this.#site.place, site: this.#site.words(), revision: this.#revision,
      reason: this.#reason, signature: this.#signature,
    });
  }

  get #job(): HTMLInputElement {
    return this.#part<HTMLInputElement>("job");
  }

  #part<T extends HTMLElement>(name: string): T {
    return find<T>(this.#section, `#${CSS.escape(this.key)}-${name}`);
  }

  #listen(): void {
    const sure = maybe(this.#section, ".sure");
    this.#part("own").addEventListener("click", () => this.#startOwn());
    this.#part("clear").addEventListener("click", () => show(sure, true));
    maybe(this.#section, "[data-sure=yes]")?.addEventListener("click", () => this.#clear());
    maybe(this.#section, "[data-sure=no]")?.addEventListener("click", () => show(sure, false));
    this.#part("signer").addEventListener("input", () => this.#showSigning());
    this.#part("sign-now").addEventListener("click", () => void this.#sign());
    this.#part("revise").addEventListener("click", () => this.#revise());
    maybe(this.#section, "[data-print]")?.addEventListener("click", () => {
      this.print();
      globalThis.print();
    });
  }

  #overlay(state: Answer["state"]): ShownState {
    if (this.#isExample) return "example";
    if (this.#signature) return "signed";
    const hasFigure = state === "answer" || state === "warning";
    return hasFigure && this.#site.isStale() ? "stale" : state;
  }

  /** The first own reading clears the example; its other rows are emptied, and filled from the site conditions. */
  #changed(isReading: boolean, typed: string | undefined): void {
    if (this.#isExample && isReading) this.#leaveExample(typed);
    this.#save();
    this.#showSigning();
    this.onChange();
  }

  #leaveExample(typed?: string): void {
    this.#isExample = false;
    for (const row of this.calculator.rows) if (row.name !== typed) row.clear();
    this.#fillFromSite();
  }

  #startOwn(): void {
    this.#leaveExample();
    this.calculator.draw({ state: "empty", cautions: this.calculator.answer?.cautions ?? [] });
    void this.calculator.ask();
    this.#save();
    this.calculator.rows.find((row) => !row.isFound)?.element.querySelector<HTMLElement>("input, select")?.focus();
  }

  #clear(): void {
    show(maybe(this.#section, ".sure"), false);
    this.#revision = 1;
    this.#reason = "";
    this.#job.value = "";
    this.#startOwn();
    this.onChange();
  }

  #fillFromSite(): void {
    for (const row of this.calculator.rows) {
      if (!row.site || row.from === "read") continue;
      const reading = this.#site.reading(row.site as SiteQuantity);
      if (!reading || (row.text === reading.text && row.unit === reading.unit && row.from === "site")) continue;
      row.put(reading.text, reading.unit ?? "", reading.reference ?? "");
      row.from = "site";
      row.confirmed = false;
      row.showWhere();
    }
  }

  #answered(): void {
    this.#showSigning();
    this.#save();
    this.onChange();
  }

  #draft(): Draft {
    const { calculator } = this;
    return {
      key: this.key, find: calculator.find, unit: calculator.foundRow?.unit ?? "", job: this.#job.value,
      rows: Object.fromEntries(calculator.rows.map((row) => [row.name, row.keep()])), isExample: false,
      revision: this.#revision, reason: this.#reason, signature: this.#signature,
      answer: calculator.answer ?? { state: "empty" }, asked: calculator.asked ?? null,
    };
  }

  /** What still stands in the way of signing, in words; nothing when it may be signed. */
  #obstacle(): string {
    const state = this.calculator.answer?.state;
    if (this.#isExample) return "An example is not signed.";
    if (this.calculator.isWaiting) return "Still calculating.";
    if (!this.calculator.asked || (state !== "answer" && state !== "warning")) return "There is no figure to sign yet.";
    if (this.#site.isStale()) return "The site conditions are older than 12 h: read them again before signing.";
    const waiting = this.calculator.rows.filter((row) => row.waitsForConfirmation).map((row) => row.title);
    if (waiting.length > 0) return `Confirm before signing: ${waiting.join(", ")}.`;
    return this.#part<HTMLInputElement>("signer").value.trim() === "" ? "Type a name to sign." : "";
  }

  #showSigning(): void {
    const isSigned = this.#signature !== null;
    const obstacle = isSigned ? "" : this.#obstacle();
    const signature = this.#signature;
    fill(find(this.#section, "[data-wait]"), obstacle);
    fill(find(this.#section, "[data-signed]"), signature && `Signed by ${signature.name}, ${signature.time}, revision ${signature.revision}.`);
    this.#part<HTMLButtonElement>("sign-now").disabled = isSigned || obstacle !== "";
    show(this.#part("sign-now"), !isSigned);
    show(maybe(this.#section, ".signer"), !isSigned);
    show(maybe(this.#section, "[data-revision]"), isSigned);
    this.#lock(isSigned);
  }

  #lock(isLocked: boolean): void {
    for (const row of this.calculator.rows) row.lock(isLocked);
    for (const radio of all<HTMLInputElement>(this.#section, ".ask input")) radio.disabled = isLocked;
    this.#job.disabled = isLocked;
    this.#part<HTMLButtonElement>("clear").disabled = isLocked;
  }

  async #sign(): Promise<void> {
    const { answer, asked } = this.calculator;
    if (!answer || !asked || this.#obstacle() !== "") return;
    const name = this.#part<HTMLInputElement>("signer").value.trim();
    this.#signature = { name, time: stamp(new Date()), revision: this.#revision, reason: this.#reason };
    const { version = "", digest = "" } = document.documentElement.dataset;
    this.calculator.showState();
    this.#showSigning();
    this.onChange();
    await this.save();
    await this.#store.addRecord({ key: this.key, version, digest, signature: this.#signature, job: this.#job.value, asked, answer });
  }

  /** Opens a new revision, which needs a reason; the signed one stays in the records. */
  #revise(): void {
    const field = this.#part<HTMLInputElement>("reason");
    if (field.value.trim() === "") {
      field.focus();
      return;
    }
    this.#reason = field.value.trim();
    this.#revision += 1;
    this.#signature = null;
    field.value = "";
    this.calculator.showState();
    this.#showSigning();
    this.#save();
    this.onChange();
  }
}
