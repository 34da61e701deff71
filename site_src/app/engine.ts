// Takes requests from the page; gives the engine's answers, and tells how far its start has come.
// page.ts comes next. The engine is Python in a worker; everything it needs lies beside the page.

import pack from "gaswright-pack";
import workerSource from "gaswright-worker";

import { readPayloads } from "./payloads";
import { type FromWorker, type Request, type Response, tell, type ToWorker } from "./protocol";
import { Queue } from "./queue";

export type { Request, Response } from "./protocol";

export type State = "waiting" | "starting" | "ready" | "failed";
export type StateListener = (state: State, reason: string) => void;

/** Longest silence of a starting engine that is still believed; a slow laptop needs some ten seconds in all. */
const PATIENCE_MS = 60_000;
/** Latest start after the page has loaded, even when it is never idle. */
const IDLE_LIMIT_MS = 300;

const queue = new Queue();
const listeners = new Set<StateListener>();
let state: State = "waiting";
let reason = "";
let watchdog: ReturnType<typeof setTimeout> | undefined;
let worker: Worker | undefined;
let scheduled = false;
let begun = false;

/** Calls `listener` now and at every change; gives a function that ends this. */
export function onState(listener: StateListener): () => void {
  listeners.add(listener);
  listener(state, reason);
  return () => listeners.delete(listener);
}

/** Starts the engine as soon as the page has nothing else to do. */
export function startEngine(): void {
  if (scheduled) return;
  scheduled = true;
  if (document.readyState === "complete") beginWhenIdle();
  else addEventListener("load", beginWhenIdle, { once: true });
}

/** The engine's answer; asked before the engine is ready, the request waits. A failed engine refuses it. */
export function ask(request: Request): Promise<Response> {
  begin();
  return queue.ask(request);
}

function beginWhenIdle(): void {
  if (typeof requestIdleCallback === "function") requestIdleCallback(begin, { timeout: IDLE_LIMIT_MS });
  else setTimeout(begin, 0);
}

function begin(): void {
  if (begun) return;
  begun = true;
  change("starting");
  watch();
  try {
    worker = makeWorker();
    run(worker);
  } catch (cause) {
    giveUp(noWorker(String(cause)));
  }
}

function makeWorker(): Worker {
  const address = URL.createObjectURL(new Blob([workerSource], { type: "text/javascript" }));
  return new Worker(address, { name: "gaswright" });
}

function run(engine: Worker): void {
  const post = (message: ToWorker): void => engine.postMessage(message);
  engine.onerror = (event) => giveUp(noWorker(event.message || "an error without a message"));
  engine.onmessage = (event: MessageEvent<FromWorker>) => receive(event.data, post);
  post({ kind: "begin", pack });
  readPayloads(pack.payloads, (name, text) => post({ kind: "payload", name, text }), giveUp);
}

function receive(message: FromWorker, post: (message: ToWorker) => void): void {
  switch (message.kind) {
    case "progress":
      if (state === "starting") watch();
      return;
    case "ready":
      clearTimeout(watchdog);
      change("ready");
      queue.open((id, text) => post({ kind: "ask", id, text }));
      return;
    case "answer":
      queue.answered(message.id, message.text);
      return;
    case "broken":
      queue.broken(message.id, message.reason);
      return;
    case "failed":
      giveUp(message.reason);
      return;
  }
}

/** Says so when the start has gone silent; a start that comes through after all is welcome. */
function watch(): void {
  clearTimeout(watchdog);
  watchdog = setTimeout(() => change("failed", silence()), PATIENCE_MS);
}

function giveUp(why: string): void {
  clearTimeout(watchdog);
  worker?.terminate();
  queue.close(why);
  change("failed", why);
}

function change(next: State, why = ""): void {
  state = next;
  reason = why;
  for (const listener of listeners) listener(state, reason);
}

function silence(): string {
  return tell(
    "Calculator engine",
    `no sign of life for ${PATIENCE_MS / 1000} s`,
    "it to start within seconds",
    "Close other programs, then open the page anew.",
  );
}

function noWorker(cause: string): string {
  return tell(
    "Calculator engine",
    `no background task (${cause})`,
    "a browser that runs one for this page",
    "Use current Chromium, Edge or Firefox, and open the page by double click or from a web server.",
  );
}
