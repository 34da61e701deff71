// Takes the loader; gives a page that a test can read: its state, early and late answers, a burst and a broken request.
// test_start.py bundles it with the real worker.

import { ask, onState, type Response, startEngine } from "../../../site_src/app/engine";

function element(id: string): HTMLElement {
  const found = document.getElementById(id);
  if (!found) throw new Error(`no element ${id}`);
  return found;
}

function write(id: string, value: unknown): void {
  element(id).textContent = typeof value === "string" ? value : JSON.stringify(value);
}

function askInto(id: string, request: { do: string; [field: string]: unknown }): Promise<void> {
  return ask(request).then(
    (answer: Response) => write(id, answer["says"]),
    (cause: Error) => write(id, `refused: ${cause.message}`),
  );
}

async function burst(): Promise<void> {
  const asked = Array.from({ length: 50 }, (_, index) => ask({ do: "count", key: "burst", number: index + 1 }));
  write("burst", (await Promise.all(asked)).map((answer) => answer["says"]));
}

const states: string[] = [];
onState((state, reason) => {
  states.push(state);
  write("state", state);
  write("states", states.join(" "));
  write("reason", reason);
});

// The very first thing on the page, before the engine is even wanted: it must wait and be answered.
if (!location.hash.includes("quiet")) void askInto("early", { do: "echo", key: "early", text: "asked early" });
startEngine();
startEngine();
element("typed").addEventListener("input", (event) => {
  void askInto("late", { do: "echo", key: "late", text: (event.target as HTMLInputElement).value });
});
element("ask-burst").addEventListener("click", () => void burst());
element("ask-broken").addEventListener("click", () => void askInto("broken", { do: "raise" }));
element("ask-about").addEventListener("click", () => void askInto("about", { do: "about" }));
