// Takes the section of a calculator and an answer; draws the result box, the working and the plot.
// calculator.ts and convert.ts come next.

import { all, draw, fill, find, make, maybe, show } from "./dom";
import { drawPlot } from "./plot";
import { symbolNodes } from "./symbols";
import type { Answer, RowAnswer, ShownState, WorkingLine } from "./shapes";

const WORDS: Record<ShownState, [string, string]> = {
  example: ["Worked example", "Invented readings of the demo works."],
  empty: ["Empty", "Nothing read yet."],
  incomplete: ["Incomplete", ""],
  answer: ["Answer", ""],
  warning: ["Warning", "Read this before the figure."],
  refused: ["Refused", "No figure can be given."],
  stale: ["Stale", "The site conditions are older than one shift (12 h). Signing waits until they are read again."],
  signed: ["Signed", "The readings are locked."],
};

/** Shows in which state the calculator is; `says` replaces the usual words. */
export function drawState(section: HTMLElement, state: ShownState, says = ""): void {
  section.dataset["state"] = state;
  const [word, usual] = WORDS[state];
  find(section, "[data-state-word]").textContent = word;
  find(section, "[data-state-says]").textContent = says || usual;
}

export function drawAnswer(section: HTMLElement, answer: Answer): void {
  const figure = answer.figure ?? {};
  const slot = (name: string): HTMLElement => find(section, `[data-${name}]`);
  fill(slot("refusal"), answer.refusal);
  fill(slot("label"), figure.label);
  fill(slot("figure"), figure.text);
  fill(slot("best"), answer.best);
  drawVerdict(slot("verdict"), answer.verdict);
  drawWarnings(slot("warnings"), answer.warnings ?? []);
  if (answer.cautions) drawCautions(slot("cautions"), answer.cautions);
  drawPairs(slot("extra"), answer.extra ?? []);
  drawPairs(slot("versus"), answer.versus ?? []);
  drawShares(slot("shares"), answer.shares ?? []);
  drawWorking(section, answer);
  drawFoot(section, answer);
}

function drawVerdict(place: HTMLElement, verdict: Answer["verdict"]): void {
  place.dataset["word"] = verdict?.word ?? "";
  find(place, "b").textContent = verdict?.word ?? "";
  find(place, "span").textContent = verdict?.says ?? "";
  show(place, Boolean(verdict));
}

export function drawWarnings(place: HTMLElement, texts: readonly string[]): void {
  place.replaceChildren(...texts.map((text) => make("li", text)));
  show(place, texts.length > 0);
}

/** The first sentence, which says what can hurt, in bold. */
function drawCautions(place: HTMLElement, texts: readonly string[]): void {
  place.replaceChildren(
    ...texts.map((text) => {
      const end = text.indexOf(". ") + 1 || text.length;
      const caution = make("p");
      caution.append(make("b", text.slice(0, end)), text.slice(end));
      return caution;
    }),
  );
  show(place, texts.length > 0);
}

function drawPairs(place: HTMLElement, pairs: readonly [string, string][]): void {
  place.replaceChildren(
    ...pairs.map(([term, value]) => {
      const pair = make("div");
      pair.append(make("dt", term), make("dd", value));
      return pair;
    }),
  );
  show(place, pairs.length > 0);
}

function drawShares(place: HTMLElement, shares: { label: string; percent: number }[]): void {
  find(place, "tbody").replaceChildren(
    ...shares.map(({ label, percent }) => {
      const row = make("tr");
      const bar = draw("svg", { viewBox: "0 0 100 10", preserveAspectRatio: "none", "aria-hidden": "true" });
      bar.append(draw("rect", { width: percent, height: 10 }));
      const cell = make("td", "", { class: "bar" });
      cell.append(bar);
      const name = make("th", "", { scope: "row" });
      name.append(...symbolNodes(label));
      row.append(name, cell, make("td", `${percent} %`));
      return row;
    }),
  );
  show(place, shares.length > 0);
}

function drawWorking(section: HTMLElement, answer: Answer): void {
  const lines = answer.working ?? [];
  find(section, "[data-working]").replaceChildren(...lines.map((line) => drawLine(line)));
  drawPlot(find(section, "[data-plot]"), answer.plot ?? undefined);
  show(find(section, "[data-work]"), lines.length > 0);
}

function drawLine(line: WorkingLine): HTMLLIElement {
  const item = make("li");
  const words = make("span");
  words.append(...symbolNodes(line.text));
  item.append(words);
  if (!line.title) return item;
  const known = all<HTMLElement>(document, "[data-laws]")[0]?.dataset["laws"]?.split(" ") ?? [];
  const root = document.documentElement.dataset["root"] ?? "";
  const isKnown = line.relation !== undefined && known.includes(line.relation);
  item.append(isKnown ? make("a", line.title, { href: `${root}laws/${line.relation}.html` }) : make("em", line.title));
  return item;
}

/** The readings in SI, folded away until someone wants them. */
export function drawSi(section: HTMLElement, rows: readonly { title: string; typed: string; said: RowAnswer }[]): void {
  const place = find(section, "[data-si]");
  const known = rows.filter(({ said }) => said.si);
  find(place, "tbody").replaceChildren(
    ...known.map(({ title, typed, said }) => {
      const row = make("tr");
      row.append(make("th", title, { scope: "row" }), make("td", typed), make("td", said.si));
      return row;
    }),
  );
  show(place, known.length > 0);
}

function drawFoot(section: HTMLElement, answer: Answer): void {
  const foot = maybe(section, "[data-foot]");
  if (!foot) return;
  const words = answer.state === "refused" ? "No figure: refused" : answer.figure?.text || "No figure yet";
  foot.textContent = [words, answer.verdict?.word, answer.warnings?.length ? "see warning" : ""].filter(Boolean).join(" · ");
}
