// Takes the calculator of a law over lists; adds a term to it or takes the last one away.
// law.ts comes next.

import type { Calculator } from "./calculator";
import { all, find, maybe } from "./dom";
import { Row } from "./row";

/** Starts the two buttons, where the law has them. */
export function startTerms(section: HTMLElement, calculator: Calculator): void {
  const add = maybe<HTMLButtonElement>(section, "[data-add-term]");
  const drop = maybe<HTMLButtonElement>(section, "[data-drop-term]");
  if (!add || !drop) return;
  const update = (): void => {
    drop.disabled = lastTerm(section) < 2 || termOf(calculator.find) === lastTerm(section);
  };
  add.addEventListener("click", () => {
    addTerm(section, calculator);
    update();
  });
  drop.addEventListener("click", () => {
    dropTerm(section, calculator);
    update();
  });
  section.addEventListener("change", update);
  update();
}

function lastTerm(section: HTMLElement): number {
  return Math.max(...all<HTMLElement>(section, ".row[data-term]").map((row) => Number(row.dataset["term"])));
}

function termOf(name: string): number {
  return Number(/_i_(\d+)$/.exec(name)?.[1] ?? 0);
}

function addTerm(section: HTMLElement, calculator: Calculator): void {
  const last = lastTerm(section);
  for (const radio of all<HTMLElement>(section, `.ask label[data-term="${last}"]`)) {
    find(section, ".ask").append(copy(radio, last));
  }
  const made = all<HTMLElement>(section, `.row[data-term="${last}"]`).map((element) => copy(element, last));
  find(section, ".rows").append(...made);
  for (const element of made) {
    const row = new Row(element, calculator.key);
    row.setFound(false);
    row.clear();
    calculator.rows.push(row);
  }
  calculator.refresh();
  maybe<HTMLInputElement>(section, `.row[data-term="${last + 1}"] .reading`)?.focus();
}

function dropTerm(section: HTMLElement, calculator: Calculator): void {
  const last = lastTerm(section);
  for (const row of calculator.rows.filter((each) => each.element.dataset["term"] === String(last))) row.element.remove();
  calculator.rows.splice(0, calculator.rows.length, ...calculator.rows.filter((row) => row.element.isConnected));
  all(section, `.ask label[data-term="${last}"]`).forEach((label) => label.remove());
  calculator.refresh();
}

/** A copy of an element of one term for the next: its names, its words and the number in its symbol. */
function copy(element: HTMLElement, term: number): HTMLElement {
  const made = element.cloneNode(true) as HTMLElement;
  const next = String(term + 1);
  for (const part of [made, ...all<HTMLElement>(made, "*")]) {
    for (const { name, value } of [...part.attributes]) {
      const renamed = value.replaceAll(`_i_${term}`, `_i_${next}`).replaceAll(`, term ${term}`, `, term ${next}`);
      if (renamed !== value) part.setAttribute(name, renamed);
    }
    if (part.localName === "mn" && part.textContent === String(term)) part.textContent = next;
  }
  made.dataset["term"] = next;
  all<HTMLInputElement>(made, "input[type=radio]").forEach((radio) => (radio.checked = false));
  for (const text of words(made)) text.data = text.data.replaceAll(`, term ${term}`, `, term ${next}`);
  return made;
}

function words(root: Node): Text[] {
  const walker = document.createTreeWalker(root, NodeFilter.SHOW_TEXT);
  const found: Text[] = [];
  while (walker.nextNode()) found.push(walker.currentNode as Text);
  return found;
}
