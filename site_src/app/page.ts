// The entry of every page: search, the calculator where there is one, and the message when the engine cannot start.
// Nothing comes next.

import { startConvert } from "./convert";
import { fill, find, maybe } from "./dom";
import { onState, startEngine } from "./engine";
import { startLaw } from "./law";
import { startSearch } from "./search";
import { startSheets } from "./sheets";

const law = maybe<HTMLElement>(document, "#law");
const convert = maybe<HTMLElement>(document, "#convert");
const isSheets = document.body.classList.contains("sheets");

startSearch();
if (law) startLaw(law);
if (convert) startConvert(convert);
if (isSheets) void startSheets();
if (law || convert || isSheets) {
  onState((state, reason) => {
    const says = reason && `${reason}\nFormulas, tables and the worked examples can still be read; nothing calculates.`;
    fill(find(document, "#engine-trouble"), state === "failed" ? says : "");
  });
  startEngine();
}
