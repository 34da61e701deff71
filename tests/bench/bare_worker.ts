// Takes the payload scripts' texts; gives 1+1, worked out by the runtime alone.
// bare_page.ts comes next.

import { Arrivals } from "../../site_src/app/arrivals";
import type { ToWorker } from "../../site_src/app/protocol";
import { startPython } from "../../site_src/app/runtime";

let arrivals: Arrivals | undefined;

async function start(started: Arrivals): Promise<void> {
  const python = await startPython((name) => started.address(name), async () => started.pack.lock);
  postMessage(String(python.runPython("1+1")));
}

addEventListener("message", (event: MessageEvent<ToWorker>) => {
  const message = event.data;
  if (message.kind === "begin") void start((arrivals = new Arrivals(message.pack)));
  if (message.kind === "payload") void arrivals?.receive(message.name, message.text);
});
