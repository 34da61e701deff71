// Takes requests from the page; gives one at a time to the engine, and each answer to whoever asked.
// engine.ts comes next.

import type { Request, Response } from "./protocol";

interface Waiter {
  resolve: (response: Response) => void;
  reject: (reason: Error) => void;
}

interface Entry {
  id: number;
  slot: string;
  text: string;
  waiters: Waiter[];
}

/** Requests with one slot are one calculator: while it waits, only its newest readings are worth an answer. */
function slotOf(request: Request): string {
  return `${request.do}:${request.key ?? ""}`;
}

/** Keeps the newest request per slot; whoever asked with older readings gets the answer to the newest. */
export class Queue {
  #send: ((id: number, text: string) => void) | undefined;
  #waiting: Entry[] = [];
  #running: Entry | undefined;
  #closed: Error | undefined;
  #last = 0;

  ask(request: Request): Promise<Response> {
    return new Promise((resolve, reject) => {
      if (this.#closed) {
        reject(this.#closed);
        return;
      }
      this.#add(request, { resolve, reject });
      this.#next();
    });
  }

  /** From now on requests are sent, one at a time. */
  open(send: (id: number, text: string) => void): void {
    this.#send = send;
    this.#next();
  }

  /** Gives up: every request, waiting or to come, is refused with the reason. */
  close(reason: string): void {
    this.#closed = new Error(reason);
    for (const entry of [this.#running, ...this.#waiting]) {
      for (const waiter of entry?.waiters ?? []) waiter.reject(this.#closed);
    }
    this.#running = undefined;
    this.#waiting = [];
  }

  answered(id: number, text: string): void {
    this.#finish(id, (waiter) => waiter.resolve(JSON.parse(text) as Response));
  }

  broken(id: number, reason: string): void {
    this.#finish(id, (waiter) => waiter.reject(new Error(reason)));
  }

  #add(request: Request, waiter: Waiter): void {
    const id = ++this.#last;
    const entry = { id, slot: slotOf(request), text: JSON.stringify({ ...request, id }), waiters: [waiter] };
    const older = this.#waiting.findIndex(({ slot }) => slot === entry.slot);
    if (older < 0) {
      this.#waiting.push(entry);
      return;
    }
    entry.waiters.unshift(...(this.#waiting[older]?.waiters ?? []));
    this.#waiting[older] = entry;
  }

  #next(): void {
    if (!this.#send || this.#running) return;
    this.#running = this.#waiting.shift();
    if (this.#running) this.#send(this.#running.id, this.#running.text);
  }

  #finish(id: number, settle: (waiter: Waiter) => void): void {
    const entry = this.#running;
    if (!entry || entry.id !== id) return;
    this.#running = undefined;
    entry.waiters.forEach(settle);
    this.#next();
  }
}
