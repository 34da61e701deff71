// Takes the payload texts as they arrive in the worker; gives a running Python with the wheels of the lock loaded.
// worker.ts comes next. Only documented options of the runtime are used, and nothing is ever asked of a network.

import { sha256 } from "@noble/hashes/sha2.js";
import type { loadPyodide as LoadPyodide, PyodideAPI } from "pyodide";

import { type Lock, type Payload, type PayloadName, tell } from "./protocol";

declare const loadPyodide: typeof LoadPyodide;

/** Smallest valid WebAssembly module: its magic number and version. */
const EMPTY_MODULE = new Uint8Array([0, 97, 115, 109, 1, 0, 0, 0]);
const COPY_AGAIN = "Copy the whole folder of this site again, then open the page anew.";

const MEDIA_TYPES: Record<PayloadName, string> = {
  starter: "text/javascript",
  runtime: "text/javascript",
  machine: "application/wasm",
  library: "application/zip",
  engine: "application/zip",
};

/** Throws at once where the browser or the page's policy forbids WebAssembly; the runtime itself would wait for ever. */
export function requireWebAssembly(): void {
  try {
    new WebAssembly.Module(EMPTY_MODULE);
  } catch (cause) {
    throw new Error(
      tell(
        "Calculator engine",
        `WebAssembly switched off (${String(cause)})`,
        "a browser that runs WebAssembly on this page",
        "Allow it in the browser's security settings, or use current Chromium, Edge or Firefox.",
      ),
      { cause },
    );
  }
}

/** The bytes that base64 stands for. */
function decode(text: string): Uint8Array<ArrayBuffer> {
  if (typeof Uint8Array.fromBase64 === "function") return Uint8Array.fromBase64(text);
  return Uint8Array.from(atob(text), (character) => character.charCodeAt(0));
}

/** SHA-256 in hex; the browser's own where the page's address lets it, which plain http to another machine does not. */
async function digest(bytes: Uint8Array<ArrayBuffer>): Promise<string> {
  const native = globalThis.crypto?.subtle as SubtleCrypto | undefined;
  const sum = native ? new Uint8Array(await native.digest("SHA-256", bytes)) : sha256(bytes);
  return Array.from(sum, (byte) => byte.toString(16).padStart(2, "0")).join("");
}

/** Throws unless the bytes are those that were packed with this page. */
async function requireIntact(bytes: Uint8Array<ArrayBuffer>, payload: Payload): Promise<void> {
  const found = await digest(bytes);
  if (found === payload.sha256) return;
  throw new Error(
    tell(payload.file, `SHA-256 ${found}`, `${payload.sha256}, the file packed with this page`, COPY_AGAIN),
  );
}

/** A blob address, made in this worker so that it may be read here, of one payload's unpacked and checked content. */
export async function addressOf(text: string, payload: Payload): Promise<string> {
  const packed = decode(text);
  // Checked before it is unpacked: of damaged bytes Firefox complains in the console, whatever the page makes of it.
  await requireIntact(packed, payload);
  const stream = new Blob([packed]).stream().pipeThrough(new DecompressionStream("gzip"));
  const content = await new Response(stream, { headers: { "content-type": MEDIA_TYPES[payload.name] } }).blob();
  return URL.createObjectURL(content);
}

/** Python, started from blob addresses; `lock` names the wheels to load, by blob address too. */
export async function startPython(
  address: (name: PayloadName) => Promise<string>,
  lock: () => Promise<Lock>,
): Promise<PyodideAPI> {
  importScripts(await address("starter"));
  importScripts(await address("runtime"));
  const [machine, library, contents] = await Promise.all([address("machine"), address("library"), lock()]);
  const packages = Object.keys(contents.packages);
  const python = await loadPyodide({
    // The runtime appends its own file name: behind the "#" it changes nothing.
    indexURL: `${machine}#/`,
    stdLibURL: library,
    lockFileContents: JSON.stringify(contents),
    // Unset, this is a public host.
    packageBaseUrl: "blob:none/",
    packages,
  });
  requireLoaded(python, packages);
  return python;
}

/** Throws when a wheel did not load: the runtime only logs a wheel that fails its checksum. */
function requireLoaded(python: PyodideAPI, packages: string[]): void {
  const missing = packages.filter((name) => !(name in python.loadedPackages));
  if (missing.length === 0) return;
  throw new Error(tell("Calculator engine", `no package ${missing.join(", ")}`, "it to load with its checksum", COPY_AGAIN));
}
