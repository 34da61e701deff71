// Takes a sheet and its last answer; fills the one page that is printed and signed by hand.
// sheet.ts comes next.

import { stamp } from "./clock";
import { find, make } from "./dom";
import { drawCurve } from "./plot";
import type { Calculator } from "./calculator";
import type { Signature } from "./store";

/** What is free on a sheet of A4 or Letter inside our margins, in CSS pixels at 96 to the inch. */
const PAGE_HEIGHT = (250 / 25.4) * 96;
const SIZES_PT = [9.5, 9, 8.5, 8, 7.5, 7];

export interface PaperFacts {
  job: string;
  place: string;
  site: string;
  revision: number;
  reason: string;
  signature: Signature | null;
}

export function fillPaper(calculator: Calculator, facts: PaperFacts): void {
  const paper = find(document, "#paper");
  paper.replaceChildren(
    drawHead(calculator, facts), drawFacts(calculator, facts), drawReadings(calculator), drawBox(calculator),
    ...drawWorking(calculator), drawLines(facts),
  );
  paper.classList.add("is-filled");
  fit(find<HTMLElement>(document, "#paper"));
}

/** The largest type with which all of it stands on one page; the plot is left out before the type gets small. */
function fit(paper: HTMLElement): void {
  paper.classList.add("is-measured");
  const isTooLong = (size: number): boolean => {
    paper.style.fontSize = `${size}pt`;
    return paper.scrollHeight > PAGE_HEIGHT;
  };
  const plot = paper.querySelector(".plot");
  const fits = SIZES_PT.filter((size) => size >= 8.5).some((size) => !isTooLong(size));
  if (!fits && plot) plot.remove();
  if (!fits) SIZES_PT.some((size) => !isTooLong(size));
  paper.classList.remove("is-measured");
}

/** Leaves printing to the page as it stands, as for the day page. */
export function emptyPaper(): void {
  const paper = find(document, "#paper");
  paper.replaceChildren();
  paper.classList.remove("is-filled");
}

function drawHead(calculator: Calculator, facts: PaperFacts): HTMLElement {
  const head = make("div", "", { class: "over" });
  const number = facts.signature ? "signed on screen" : "not signed on screen";
  head.append(make("h1", calculator.section.dataset["title"] ?? ""), make("b", number));
  return head;
}

function drawFacts(calculator: Calculator, facts: PaperFacts): HTMLElement {
  const list = make("dl", "", { class: "facts" });
  const { version, digest } = document.documentElement.dataset;
  const isExample = calculator.section.dataset["state"] === "example";
  const pairs: [string, string][] = [
    ["Job or item", isExample ? "worked example, invented" : facts.job || "……………………"],
    ["Site", facts.place || "……………………"],
    ["Printed", stamp(new Date())],
    ["Question", calculator.foundRow?.title ?? ""],
    ["Calculated by", `Gaswright ${version ?? ""}, spec ${(digest ?? "").slice(0, 12)}`],
    ["Revision", [String(facts.revision), facts.reason].filter(Boolean).join(", because: ")],
    ["Site conditions", facts.site],
  ];
  for (const [term, value] of pairs) {
    const pair = make("div");
    pair.append(make("dt", term), make("dd", value));
    list.append(pair);
  }
  return list;
}

function drawReadings(calculator: Calculator): HTMLElement {
  const table = make("table");
  const head = make("thead");
  head.append(drawRow("th", ["", "Reading", "As typed", "In SI", "Read with, known to"]));
  const body = make("tbody");
  const rows = calculator.rows.filter((row) => !row.isFound).sort((one, two) => one.order - two.order);
  rows.forEach((row, index) =>
    body.append(drawRow("td", [String(index + 1), row.title, row.typed || "not read", row.said.si ?? "", row.byWords])),
  );
  table.append(head, body);
  return table;
}

function drawRow(tag: "th" | "td", texts: readonly string[]): HTMLTableRowElement {
  const row = make("tr");
  row.append(...texts.map((text) => make(tag, text)));
  return row;
}

function drawBox(calculator: Calculator): HTMLElement {
  const answer = calculator.answer;
  const box = make("div", "", { class: "box" });
  const add = (tag: "p" | "b", text: string | null | undefined, name = ""): void => {
    if (text) box.append(make(tag, text, name ? { class: name } : {}));
  };
  const figure = answer?.figure;
  add("p", (answer?.cautions ?? []).join(" "), "cautions");
  add("p", answer?.refusal, "refusal");
  add("p", figure?.label);
  add("p", figure?.text, "figure");
  add("p", answer?.best);
  add("p", answer?.verdict && `${answer.verdict.word}: ${answer.verdict.says}`);
  for (const text of answer?.warnings ?? []) add("p", `Warning: ${text}`);
  for (const pairs of [answer?.extra ?? [], answer?.versus ?? []]) add("p", pairs.map((pair) => pair.join(": ")).join(" · "));
  const shares = (answer?.shares ?? []).map(({ label, percent }) => `${label} ${percent} %`).join(" · ");
  add("p", shares && `Share of the uncertainty: ${shares}`);
  return box;
}

function drawWorking(calculator: Calculator): HTMLElement[] {
  const lines = calculator.answer?.working ?? [];
  const steps = make("ol", "", { class: "steps" });
  steps.append(...lines.map((line) => make("li", line.text)));
  const rule = make("p", `Rule: ${calculator.section.dataset["rule"] ?? ""}`);
  const plot = calculator.answer?.plot;
  const figure = make("figure", "", { class: "plot" });
  if (plot) figure.append(drawCurve(plot, 0));
  const formulas = make("p", `Formulas: ${calculator.section.dataset["formulas"] ?? ""}.`);
  return lines.length > 0 ? [make("h2", "Working"), steps, formulas, rule, ...(plot ? [figure] : [])] : [formulas, rule];
}

function drawLines(facts: PaperFacts): HTMLElement {
  const lines = make("div", "", { class: "lines" });
  const { signature } = facts;
  const first = signature ? `Read and signed: ${signature.name}, ${signature.time}` : "Read and signed: name, time with UTC offset";
  lines.append(make("p", first), make("p", "Checked: name, time with UTC offset"));
  return lines;
}
