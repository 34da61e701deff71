// Takes the request in the page; gives the time from navigation to the engine's first figure, as text in the page.
// start.py comes next.

import { ask, onState, startEngine } from "../../site_src/app/engine";
import { show } from "./show";

const request = JSON.parse(document.querySelector("#request")?.textContent ?? "");

onState((state, reason) => {
  if (state === "failed") show("failed", reason);
});
startEngine();
ask(request).then((answer) => show("done", JSON.stringify(answer)));
