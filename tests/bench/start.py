"""Cold start: navigation to the engine's first figure, against the bare runtime evaluating 1+1.

Takes the built package in ``build/engine``; gives both medians and their ratio, and fails above the budget.
Both pages stand in one folder opened from ``file://``, read the same payload scripts through the same loader, and are
opened in turn, each time in a browser and profile of its own.
"""

import argparse
import json
import statistics
import sys
import tempfile
from collections.abc import Mapping
from dataclasses import dataclass
from pathlib import Path

from playwright.sync_api import Playwright, sync_playwright

from generator.browsers import find_chromium
from generator.pack import make_packed
from generator.pack_app import Entries

HERE = Path(__file__).resolve().parent
ROOT = HERE.parents[1]
BUDGET = 1.4
RUNS = 7
SWITCHES = (
    "--no-sandbox",
    "--disable-gpu",
    "--disable-quic",
    "--no-first-run",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
)
PAGE = """<!doctype html><html lang="en"><head><meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; base-uri 'none'; form-action 'none';
 style-src 'self'; img-src 'self' data: blob:; script-src 'self' 'wasm-unsafe-eval' blob:; worker-src blob:;
 connect-src blob:"><link rel="icon" href="data:,"><title>Bench</title>
<script id="request" type="application/json">{request}</script><script src="app/{script}" defer></script>
</head><body></body></html>"""
REQUEST = {
    "do": "sheet",
    "key": "bank_endurance",
    "find": "t",
    "readings": {
        "gas": {"text": "nitrogen"},
        "count": {"text": "4"},
        "V_w": {"text": "50", "unit": "L"},
    },
}


@dataclass(frozen=True, slots=True, kw_only=True)
class Times:
    """Seconds from navigation, one per run: the engine's first figure, and the bare runtime's."""

    figure: tuple[float, ...]
    bare: tuple[float, ...]

    @property
    def ratio(self) -> float:
        """Median against median."""
        return statistics.median(self.figure) / statistics.median(self.bare)


def write_pages(folder: Path, engine: Path, request: Mapping[str, object]) -> None:
    """Write a folder with both pages, their scripts and the payload scripts that they share."""
    for name in ("figure", "bare"):
        worker = HERE / "bare_worker.ts" if name == "bare" else ROOT / "site_src/app/worker.ts"
        entries = Entries(page=HERE / f"{name}_page.ts", worker=worker)
        packed = make_packed(engine, ROOT / "site_src", "0.0.0", entries)
        for file, content in packed.site.items():
            (folder / file).parent.mkdir(parents=True, exist_ok=True)
            (folder / file).write_bytes(content)
        page = PAGE.format(request=json.dumps(request), script=f"{name}_page.js")
        (folder / f"{name}.html").write_text(page, encoding="utf-8")


def measure_start(playwright: Playwright, page_address: str) -> tuple[float, str]:
    """Seconds from navigation to the result, and the result's text, in a browser started for it.

    Raises:
        RuntimeError: the page says that the start failed.
    """
    browser = playwright.chromium.launch(executable_path=find_chromium(), args=SWITCHES)
    page = browser.new_page()
    page.goto(page_address)
    result = json.loads(page.locator("#result").text_content(timeout=60_000) or "")
    browser.close()
    if result["state"] != "done":
        raise RuntimeError(result["text"])
    return result["elapsed"] / 1000, result["text"]


def measure(folder: Path, runs: int) -> Times:
    """Open both pages in turn, ``runs`` times each."""
    pages = [(folder / f"{name}.html").as_uri() for name in ("figure", "bare")]
    with sync_playwright() as playwright:
        times = [[measure_start(playwright, page)[0] for page in pages] for _ in range(runs)]
    return Times(figure=tuple(pair[0] for pair in times), bare=tuple(pair[1] for pair in times))


def main() -> int:
    """Print the medians and the ratio; exit code 1 when it is over the budget."""
    parser = argparse.ArgumentParser(description="Cold start of the engine against the bare runtime")
    parser.add_argument("--engine", type=Path, default=ROOT / "build/engine", help="folder that holds the package")
    parser.add_argument("--runs", type=int, default=RUNS)
    options = parser.parse_args()
    with tempfile.TemporaryDirectory() as folder:
        write_pages(Path(folder), options.engine, REQUEST)
        times = measure(Path(folder), options.runs)
    figure, bare = statistics.median(times.figure), statistics.median(times.bare)
    print(f"first figure {figure:.3f} s, bare runtime {bare:.3f} s, ratio {times.ratio:.2f} (budget {BUDGET})")
    return 0 if times.ratio <= BUDGET else 1


if __name__ == "__main__":
    sys.exit(main())
