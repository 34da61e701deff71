// Takes nothing; gives the time from navigation to 1+1, worked out by the runtime alone from the same payload scripts.
// start.py comes next.

import pack from "gaswright-pack";
import workerSource from "gaswright-worker";

import { readPayloads } from "../../site_src/app/payloads";
import { show } from "./show";

const payloads = pack.payloads.filter(({ name }) => name !== "engine");
const bare = { ...pack, payloads, lock: { ...pack.lock, packages: {} } };
const worker = new Worker(URL.createObjectURL(new Blob([workerSource], { type: "text/javascript" })));
worker.onmessage = (event: MessageEvent<string>) => show("done", event.data);
worker.postMessage({ kind: "begin", pack: bare });
readPayloads(
  payloads,
  (name, text) => worker.postMessage({ kind: "payload", name, text }),
  (reason) => show("failed", reason),
);
