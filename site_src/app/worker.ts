// Takes the messages of engine.ts; gives answers of the engine as JSON text. Runs as a classic Blob worker.

import type { PyodideAPI } from "pyodide";

import type { FromWorker, Lock, Pack, PayloadName, ToWorker } from "./protocol";
import { addressOf, requireWebAssembly, startPython } from "./runtime";

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

/** One promise per payload, so that each is unpacked as it arrives and waited for where it is needed. */
class Arrivals {
  readonly #waiting = new Map<PayloadName, PromiseWithResolvers<string>>();

  constructor(readonly pack: Pack) {
    for (const { name } of pack.payloads) this.#waiting.set(name, Promise.withResolvers<string>());
  }

  async receive(name: PayloadName, text: string): Promise<void> {
    const payload = this.pack.payloads.find((each) => each.name === name);
    if (!payload) return;
    this.#waiting.get(name)?.resolve(await addressOf(text, payload));
    post({ kind: "progress", stage: name });
  }

  async address(name: PayloadName): Promise<string> {
    const waiting = this.#waiting.get(name);
    if (!waiting) throw new Error(`payload ${name} is not in the pack`);
    return waiting.promise;
  }

  /** The lock file with the wheel's blob address; the runtime reads the file name behind the "#". */
  async lock(): Promise<Lock> {
    const wheel = await this.address("engine");
    const entries = Object.entries(this.pack.lock.packages);
    const packages = entries.map(([key, entry]) => [key, { ...entry, file_name: `${wheel}#/${entry.file_name}` }]);
    return { info: this.pack.lock.info, packages: Object.fromEntries(packages) as Lock["packages"] };
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
      return;
    case "ask":
      if (answer) reply(await answer, message.id, message.text);
      return;
  }
}

addEventListener("message", (event: MessageEvent<ToWorker>) => void handle(event.data).catch(fail));
post({ kind: "progress", stage: "hello" });
