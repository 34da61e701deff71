// Takes nothing; gives the shapes that cross between page, worker and engine, and how an error is told.
// engine.ts (page side) and worker.ts (worker side) come next.

/** One payload script: its file below the site's folder, and the SHA-256 (hex) of the gzip bytes it carries. */
export interface Payload {
  name: PayloadName;
  file: string;
  sha256: string;
}

export type PayloadName = "starter" | "runtime" | "machine" | "library" | "engine";

/** What the packer knows about the payloads of this very copy of the site. */
export interface Pack {
  version: string;
  payloads: Payload[];
  /** The runtime's lock file; the wheel's address is filled in by the worker. */
  lock: Lock;
}

export interface Lock {
  info: Record<string, string>;
  packages: Record<string, Record<string, unknown> & { file_name: string }>;
}

export type ToWorker =
  | { kind: "begin"; pack: Pack }
  | { kind: "payload"; name: PayloadName; text: string }
  | { kind: "ask"; id: number; text: string };

export type FromWorker =
  | { kind: "progress"; stage: string }
  | { kind: "ready" }
  | { kind: "answer"; id: number; text: string }
  | { kind: "broken"; id: number; reason: string }
  | { kind: "failed"; reason: string };

/** What the page asks of the engine; `do` names the task, the rest is the task's own. */
export interface Request {
  do: string;
  key?: string;
  [field: string]: unknown;
}

/** What the engine says; display-ready, so that the page computes nothing. */
export interface Response {
  id: number;
  [field: string]: unknown;
}

/** A message in the four parts that every error of this project has. */
export function tell(where: string, found: string, expected: string, todo: string): string {
  return `${where}: found ${found}; expected ${expected}. ${todo}`;
}
