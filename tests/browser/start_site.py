"""The small site on which the loader is tested: the real loader, worker and runtime, with a package of a few lines.

Takes a folder; gives pages whole, damaged and incomplete, under the site's own Content-Security-Policy.
test_start.py opens them.
"""

import shutil
from pathlib import Path

from generator.pack import make_packed
from generator.pack_app import Entries
from tests.browser.support.tiny_site import POLICY

ROOT = Path(__file__).parents[2]
PAGES = Path(__file__).with_name("start_pages")
PAGE = """<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Start</title>
<link rel="icon" href="data:,"><meta http-equiv="Content-Security-Policy" content="{policy}">
<script src="{script}" defer></script></head><body>
<p id="state"></p><p id="states"></p><p id="reason"></p><p id="early"></p>
<label>Reading <input id="typed"></label><p id="late"></p>
<button id="ask-burst">Burst</button><p id="burst"></p><button id="ask-broken">Broken</button><p id="broken"></p>
<button id="ask-about">About</button><p id="about"></p></body></html>
"""


def write_start_site(folder: Path, work: Path) -> None:
    """Write the site to ``folder``; ``work`` is a folder for the package and the cache."""
    site = folder / "whole"
    for name, content in make_site_files(work).items():
        (site / name).parent.mkdir(parents=True, exist_ok=True)
        (site / name).write_bytes(content)
    _write_page(site / "index.html", "app/page.js", POLICY)
    _write_page(site / "laws/deep/page.html", "../../app/page.js", POLICY)
    _write_page(site / "no_wasm.html", "app/page.js", POLICY.replace(" 'wasm-unsafe-eval'", ""))
    _write_page(site / "no_worker.html", "app/page.js", POLICY.replace("worker-src blob:", "worker-src 'none'"))
    _write_damaged(site, folder)


def make_site_files(work: Path) -> dict[str, bytes]:
    """The site's files by name, packed from the package of a few lines."""
    package = work / "engine/gaswright"
    package.mkdir(parents=True)
    (package / "__init__.py").write_text('"""A package of a few lines."""\n', encoding="utf-8")
    shutil.copy(PAGES / "browser.py", package)
    entries = Entries(page=PAGES / "page.ts", worker=ROOT / "site_src/app/worker.ts")
    return dict(make_packed(work / "engine", ROOT / "site_src", "1.2.3", entries).site)


def _write_page(file: Path, script: str, policy: str) -> None:
    file.parent.mkdir(parents=True, exist_ok=True)
    file.write_text(PAGE.format(policy=policy, script=script), encoding="utf-8")


def _write_damaged(whole: Path, folder: Path) -> None:
    """Copies with one byte changed in one payload, or with one payload script gone."""
    for name in ("machine", "engine"):
        copy = Path(shutil.copytree(whole, folder / f"damaged_{name}"))
        script = copy / f"engine/{name}.js"
        script.write_bytes(_change_one_byte(script.read_bytes()))
    missing = Path(shutil.copytree(whole, folder / "missing"))
    (missing / "engine/library.js").unlink()


def _change_one_byte(script: bytes) -> bytes:
    """The script with one letter of its base64 text changed to another."""
    at = len(script) // 2
    other = b"A" if script[at : at + 1] != b"A" else b"B"
    return script[:at] + other + script[at + 1 :]
