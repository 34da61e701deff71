// Takes payload texts in the order in which they happen to arrive; gives the blob address of each to whoever waits.
// worker.ts comes next.

import type { Lock, Pack, PayloadName } from "./protocol";
import { addressOf } from "./runtime";

/** One promise per payload, so that each is unpacked as it arrives and waited for where it is needed. */
export class Arrivals {
  readonly #waiting = new Map<PayloadName, PromiseWithResolvers<string>>();

  constructor(readonly pack: Pack) {
    for (const { name } of pack.payloads) this.#waiting.set(name, Promise.withResolvers<string>());
  }

  async receive(name: PayloadName, text: string): Promise<void> {
    const payload = this.pack.payloads.find((each) => each.name === name);
    if (!payload) return;
    this.#waiting.get(name)?.resolve(await addressOf(text, payload));
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
