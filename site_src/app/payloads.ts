// Takes the list of payload scripts; gives the text that each carries, as it arrives.
// engine.ts comes next. A script element is the one way to read a file beside the page that every address allows.

import { type Payload, type PayloadName, tell } from "./protocol";

declare global {
  /** Called by each payload script with its name and its gzip bytes in base64. */
  var gaswrightPayload: ((name: PayloadName, text: string) => void) | undefined;
}

/** The folder of this site, whatever page runs and however it was opened: the bundle lies in app/ below it. */
const OWN_SCRIPT = document.currentScript;
const SITE_ROOT = new URL("../", OWN_SCRIPT instanceof HTMLScriptElement ? OWN_SCRIPT.src : document.baseURI);

function unreadable(file: string): string {
  return tell(
    file,
    "no readable file",
    "it beside this page",
    "Copy the whole folder of this site again (unpack it first if it is a zip file), then open the page anew.",
  );
}

function addScript(payload: Payload, onMissing: (reason: string) => void): void {
  const script = document.createElement("script");
  script.src = new URL(payload.file, SITE_ROOT).href;
  script.async = true;
  script.onload = () => script.remove();
  script.onerror = () => onMissing(unreadable(payload.file));
  document.head.append(script);
}

/** Reads every payload of the list; `onText` is called once for each. */
export function readPayloads(
  payloads: readonly Payload[],
  onText: (name: PayloadName, text: string) => void,
  onMissing: (reason: string) => void,
): void {
  globalThis.gaswrightPayload = onText;
  for (const payload of payloads) addScript(payload, onMissing);
}
