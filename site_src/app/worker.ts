// Takes the messages of engine.ts; gives answers of the engine as JSON text. Runs as a classic Blob worker.

import type { PyodideAPI } from "pyodide";

import { Arrivals } from "./arrivals";
import type { FromWorker, ToWorker } from "./protocol";
import { requireWebAssembly, startPython } from "./runtime";

type Answer = (text: string) => string;

function post(message: FromWorker): void {
  postMessage(message);
}

function explain(cause: unknown): string {
  return cause instanceof Error ? cause.message : String(cause);
}

function fail(cause: unknown): void {
  post({ kind: "failed", reason: explain(cause) });
}

/** The engine promises never to raise; should it break that, only this one request is lost. */
function reply(answer: Answer, id: number, text: string): void {
  try {
    post({ kind: "answer", id, text: answer(text) });
  } catch (cause) {
    post({ kind: "broken", id, reason: explain(cause) });
  }
}

function importAnswer(python: PyodideAPI): Answer {
  const browser = python.pyimport("gaswright.browser") as { answer: Answer };
  return browser.answer;
}

async function start(arrivals: Arrivals): Promise<Answer> {
  requireWebAssembly();
  const python = await startPython((name) => arrivals.address(name), () => arrivals.lock());
  post({ kind: "progress", stage: "python" });
  const answer = importAnswer(python);
  post({ kind: "ready" });
  return answer;
}

let arrivals: Arrivals | undefined;
let answer: Promise<Answer> | undefined;

async function handle(message: ToWorker): Promise<void> {
  switch (message.kind) {
    case "begin":
      arrivals = new Arrivals(message.pack);
      answer = start(arrivals);
      await answer;
      return;
    case "payload":
      await arrivals?.receive(message.name, message.text);
      post({ kind: "progress", stage: message.name });
      return;
    case "ask":
      if (answer) reply(await answer, message.id, message.text);
      return;
  }
}

addEventListener("message", (event: MessageEvent<ToWorker>) => void handle(event.data).catch(fail));
post({ kind: "progress", stage: "hello" });
