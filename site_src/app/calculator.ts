// Takes the section of a law or sheet; asks the engine with what stands in its rows and draws the answer.
// law.ts and sheet.ts come next.

import { all, find, maybe, settle } from "./dom";
import { ask } from "./engine";
import { drawAnswer, drawSi, drawState } from "./result";
import { Row } from "./row";
import type { Answer, Instrument, Reading, ShownState, Site } from "./shapes";

const ASK_MS = 120;
const PATIENCE_MS = 400;

/** What a calculator takes from its surroundings. */
export interface Surroundings {
  site(): Site | null;
  instruments(): Record<string, Instrument>;
  /** The decimal mark of the page; nothing while none was chosen, and an ambiguous number is asked about. */
  decimal(): string | null;
}

export class Calculator {
  readonly key: string;
  readonly rows: Row[];
  answer: Answer | undefined;
  /** What the last answer was asked with, for records and paper. */
  asked: Record<string, unknown> | undefined;
  onChange: (row: Row | undefined) => void = () => undefined;
  onAnswer: () => void = () => undefined;
  /** The state to show, given the engine's. */
  overlay: (state: Answer["state"]) => ShownState = (state) => state;
  readonly section: HTMLElement;
  readonly #around: Surroundings;
  readonly #askSoon = settle(() => void this.ask(), ASK_MS);
  #turn = 0;
  #isWaiting = false;
  #patience: ReturnType<typeof setTimeout> | undefined;

  constructor(section: HTMLElement, around: Surroundings) {
    this.section = section;
    this.#around = around;
    this.key = section.dataset["key"] ?? "";
    this.rows = all<HTMLElement>(section, ".row").map((element) => new Row(element, this.key));
    find<HTMLFormElement>(section, "form").addEventListener("submit", (event) => event.preventDefault());
    section.addEventListener("input", (event) => this.#changed(event.target));
    section.addEventListener("confirmed", () => this.#changed(null));
    maybe(section, "[data-foot]")?.addEventListener("click", () => this.#jump());
    new IntersectionObserver((seen) => this.#watchBox(seen)).observe(find(section, ".stamp"));
  }

  get find(): string {
    return find<HTMLInputElement>(this.section, ".ask input:checked").value;
  }

  get foundRow(): Row | undefined {
    return this.rows.find((row) => row.isFound);
  }

  /** Takes the answer that the page was drawn with, and adds what only a script can draw. */
  takeDrawn(): void {
    const drawn = this.section.dataset["answer"];
    if (drawn) this.draw(JSON.parse(drawn) as Answer);
  }

  row(name: string): Row | undefined {
    return this.rows.find((row) => row.name === name);
  }

  /** Asks for another row; the one found until now keeps its value as a reading that was worked out. */
  choose(name: string, carry = true): void {
    const radio = maybe<HTMLInputElement>(this.section, `.ask input[value="${CSS.escape(name)}"]`);
    if (!radio) return;
    radio.checked = true;
    const before = this.foundRow;
    if (before?.name === name) return;
    before?.setFound(false);
    if (before && carry) this.#carry(before);
    this.row(name)?.setFound(true);
    this.#sort();
  }

  /** Whether the figure shown is not that of the readings shown, because the engine still works. */
  get isWaiting(): boolean {
    return this.#isWaiting;
  }

  askSoon(): void {
    this.#wait();
    this.#askSoon();
  }

  async ask(): Promise<void> {
    this.#wait();
    const turn = ++this.#turn;
    const asked = this.#request();
    try {
      const answer = (await ask(asked as { do: string })) as unknown as Answer;
      if (turn !== this.#turn) return;
      this.asked = asked;
      this.draw(answer);
    } catch (cause) {
      if (turn === this.#turn) this.draw({ state: "refused", refusal: cause instanceof Error ? cause.message : String(cause) });
    }
  }

  draw(answer: Answer): void {
    this.answer = answer;
    this.#isWaiting = false;
    clearTimeout(this.#patience);
    this.section.removeAttribute("data-waiting");
    drawAnswer(this.section, answer);
    for (const row of this.rows) row.say(answer.rows?.[row.name] ?? {});
    this.foundRow?.showFigure(answer.figure);
    drawSi(this.section, this.rows);
    this.showState();
    this.onAnswer();
  }

  /** Draws the state again, as after signing or when time has passed. */
  showState(): void {
    if (!this.answer) return;
    const state = this.overlay(this.answer.state);
    drawState(this.section, state, state === "incomplete" ? this.#missing() : "");
  }

  /** An old figure is not left standing beside new readings; a quick answer does not make it blink. */
  #wait(): void {
    this.#isWaiting = true;
    clearTimeout(this.#patience);
    this.#patience = setTimeout(() => {
      this.section.setAttribute("data-waiting", "");
      find(this.section, "[data-state-word]").textContent = "Calculating";
      find(this.section, "[data-state-says]").textContent = "The figure follows; readings are kept.";
    }, PATIENCE_MS);
  }

  #missing(): string {
    const names = this.rows.filter((row) => !row.isFound && row.said.state === "empty").map((row) => row.title);
    const troubled = this.rows.filter((row) => row.said.state === "error" || row.said.state === "question");
    if (names.length > 0) return `Still to read: ${names.join(", ")}.`;
    return troubled.length > 0 ? `See ${troubled.map((row) => row.title).join(", ")}.` : "";
  }

  #request(): Record<string, unknown> {
    const readings: Record<string, Reading> = {};
    for (const row of this.rows) {
      const reading = row.read();
      if (reading) readings[row.name] = reading;
    }
    const found = this.foundRow;
    const show = { unit: found?.unit || null, reference: found?.reference || null };
    const around = this.#around;
    const common = { key: this.key, find: this.find, show, site: around.site(), decimal: around.decimal() };
    if (this.section.dataset["do"] === "sheet") return { do: "sheet", ...common, readings, instruments: around.instruments() };
    const gas = this.rows.find((row) => row.isGas);
    if (gas) delete readings[gas.name];
    return { do: "relation", ...common, branch: null, gas: gas?.text || null, rows: readings };
  }

  #changed(target: EventTarget | null): void {
    if (target instanceof HTMLInputElement && target.type === "radio") this.choose(target.value);
    const row = this.rows.find((each) => each.owns(target));
    row?.takeTyped();
    this.rows.forEach((each) => each.showWhere());
    this.askSoon();
    this.onChange(row);
  }

  /** The row that was found becomes a reading that holds the figure at full precision, unless something stands there. */
  #carry(row: Row): void {
    const answer = this.answer;
    const isKept = row.text !== "" && (row.from !== "preset" || row.confirmed);
    if (!answer?.figure || isKept) return;
    const exact = answer.figure?.exact;
    const mark = this.#around.decimal() ?? ".";
    const unit = answer.unit ?? "";
    if (exact) row.put(exact.text.replace(".", mark), exact.unit, exact.reference ?? "");
    else if (typeof answer.value === "number" && row.offersUnit(unit)) row.put(String(answer.value).replace(".", mark), unit, "");
    else return;
    row.from = "preset";
    row.confirmed = false;
    row.showWhere();
  }

  /** Rows have come or gone: asks again. */
  refresh(): void {
    this.#sort();
    this.askSoon();
    this.onChange(undefined);
  }

  /** Readings in the order of the sheet, the row to find at the foot. */
  #sort(): void {
    const sorted = [...this.rows].sort((one, two) => Number(one.isFound) - Number(two.isFound) || one.order - two.order);
    const place = find(this.section, ".rows");
    place.append(...sorted.map((row) => row.element));
  }

  /** The bar at the foot stands in for the box while that is out of sight. */
  #watchBox(seen: IntersectionObserverEntry[]): void {
    this.section.toggleAttribute("data-away", !seen.at(-1)?.isIntersecting);
  }

  #jump(): void {
    const box = find<HTMLElement>(this.section, ".result");
    box.scrollIntoView({ block: "start" });
    box.focus({ preventScroll: true });
  }
}
