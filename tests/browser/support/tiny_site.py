"""The tiny site on which the harness tests itself, under the finished site's own Content-Security-Policy.

Takes a folder. Gives pages with a field, a list, a store and ways to go wrong. Next: test_harness.py.
"""

from pathlib import Path

POLICY = (
    "default-src 'none'; base-uri 'none'; form-action 'none'; style-src 'self'; img-src 'self' data: blob:; "
    "script-src 'self' 'wasm-unsafe-eval' blob:; worker-src blob:; connect-src blob:"
)
HEAD = """<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Harness</title>
<link rel="icon" href="data:,">"""
BODY = """<body>
<label>Pressure <input id="pressure"></label> <output id="echo"></output> <output id="keys"></output>
<select id="unit"><option value="bar">bar</option><option value="psi">psi</option></select>
<output id="chosen"></output>
<button id="store">Store</button> <p id="stored"></p> <input id="file" type="file"> <p id="name"></p>
<button id="break">Break</button> <button id="worker">Worker</button> <button id="save">Save</button>
 <p class="twice">a</p> <p class="twice">b</p>
<script src="page.js"></script></body></html>
"""
SCRIPT = """"use strict";
const find = id => document.getElementById(id);
const keys = [];
find("pressure").addEventListener("keydown", event => {
  if (event.isTrusted) keys.push(event.key);
  find("keys").textContent = keys.join("|");
});
find("pressure").addEventListener("input", () => {
  setTimeout(() => { find("echo").textContent = `read ${find("pressure").value}`; }, 200);
});
find("unit").addEventListener("change", () => { find("chosen").textContent = find("unit").value; });
find("file").addEventListener("change", () => { find("name").textContent = find("file").files[0].name; });
find("save").addEventListener("click", () => {
  const link = document.createElement("a");
  link.download = "day 1.json";
  link.href = URL.createObjectURL(new Blob([JSON.stringify({pressure: find("pressure").value})]));
  link.click();
});
find("break").addEventListener("click", () => { throw new Error("broken on purpose"); });
find("worker").addEventListener("click", () => {
  const source = `console.error("console in a worker"); Promise.reject(new Error("rejected in a worker"));
    throw new Error("uncaught in a worker");`;
  new Worker(URL.createObjectURL(new Blob([source], {type: "text/javascript"})));
});

const opening = indexedDB.open("harness", 1);
opening.onupgradeneeded = () => opening.result.createObjectStore("readings");
opening.onsuccess = () => {
  const store = mode => opening.result.transaction("readings", mode, {durability: "strict"}).objectStore("readings");
  const show = () => {
    const reading = store("readonly").get("pressure");
    reading.onsuccess = () => { find("stored").textContent = `stored: ${reading.result ?? "nothing"}`; };
  };
  find("store").addEventListener("click", event => {
    if (!event.isTrusted) return;
    const readings = store("readwrite");
    readings.put(find("pressure").value, "pressure");
    readings.transaction.oncomplete = show;
  });
  show();
};
"""

NEIGHBOUR_FILES = (
    "picture.png",
    "fetched.txt",
    "style.css",
    "frame.html",
    "classic.js",
    "imported.js",
    "worker-fetched.txt",
    "nested-fetched.txt",
)
ASK_NEIGHBOUR = """base => {
  const add = (tag, properties) => document.body.append(Object.assign(document.createElement(tag), properties));
  const kept = window.kept = [];  // a worker that nothing holds may be collected before it has asked
  const run = source => kept.push(new Worker(URL.createObjectURL(new Blob([source], {type: "text/javascript"}))));
  const fetching = name => `fetch("${base}${name}", {mode: "no-cors"});`;
  add("img", {src: `${base}picture.png`});
  add("link", {rel: "stylesheet", href: `${base}style.css`});
  add("iframe", {src: `${base}frame.html`});
  add("script", {src: `${base}classic.js`});
  fetch(`${base}fetched.txt`, {mode: "no-cors"});
  run(`importScripts("${base}imported.js");`);
  run(fetching("worker-fetched.txt"));
  const nested = `new Blob(['${fetching("nested-fetched.txt")}'], {type: "text/javascript"})`;
  run(`self.kept = new Worker(URL.createObjectURL(${nested}));`);
  const socket = base.replace("http", "ws");
  new WebSocket(`${socket}socket`);
  run(`new WebSocket("${socket}worker-socket");`);
}"""


def write_tiny_site(folder: Path) -> None:
    """Write the pages: `index` under the policy, `open` without it, `inline` and `missing` each with one fault."""
    head = f'{HEAD}<meta http-equiv="Content-Security-Policy" content="{POLICY}"></head>'
    pages = {
        "index.html": head + BODY,
        "open.html": f"{HEAD}</head>{BODY}",
        "inline.html": f"{head}<body><script>1</script></body></html>",
        "missing.html": f'{head}<body><script src="no_such_file.js"></script></body></html>',
    }
    for name, text in pages.items():
        (folder / name).write_text(text, encoding="utf-8")
    (folder / "page.js").write_text(SCRIPT, encoding="utf-8")
