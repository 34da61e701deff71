"""The browser code, bundled into classic scripts.

Takes ``site_src/app/*.ts`` and what the packer knows of the payloads; gives the files of the site's folder ``app``.
``pack`` writes them; a page includes ``app/page.js`` and nothing else.
"""

import json
import tempfile
from collections.abc import Mapping, Sequence
from dataclasses import dataclass
from pathlib import Path

from generator.pack_node import run_node
from generator.pack_payload import Payload

#: Browsers that have all that the loader needs; both of the tested ones are far newer.
_TARGET = "chrome119,firefox121,safari17.4"
_BUNDLE = ("--bundle", "--minify", "--format=iife", "--charset=utf8", "--legal-comments=none", f"--target={_TARGET}")


def pack_table(version: str, payloads: Sequence[Payload], lock: Mapping[str, object]) -> str:
    """JSON of the type ``Pack`` of app/protocol.ts: the payload scripts with their digests, and the lock."""
    table = [{"name": each.name, "file": each.file, "sha256": each.sha256} for each in payloads]
    return json.dumps({"version": version, "payloads": table, "lock": lock}, indent=1, sort_keys=True)


@dataclass(frozen=True, slots=True, kw_only=True)
class Entries:
    """The two programs that a page is made of: its own script, and that of its worker."""

    page: Path
    worker: Path


def bundle_app(site_src: Path, entries: Entries, table: str) -> dict[str, bytes]:
    """The bundle of the page's script, by file name, with the worker's program in it as text."""
    with tempfile.TemporaryDirectory() as folder:
        work = Path(folder)
        (work / "pack.json").write_text(table, encoding="utf-8")
        _bundle(site_src, entries.worker, work / "worker", ())
        (work / "worker" / f"{entries.worker.stem}.js").rename(work / "worker.txt")
        found = (f"--alias:gaswright-pack={work / 'pack.json'}", f"--alias:gaswright-worker={work / 'worker.txt'}")
        _bundle(site_src, entries.page, work / "app", found)
        return {file.name: file.read_bytes() for file in sorted((work / "app").iterdir())}


def check_types(site_src: Path) -> None:
    """Check the types of page and worker, strictly.

    Raises:
        SpecError: the compiler's list of errors.
    """
    for project in ("tsconfig.json", "tsconfig.worker.json"):
        run_node([site_src / "node_modules/typescript/bin/tsc", "--project", project, "--pretty", "false"], site_src)


def _bundle(site_src: Path, entry: Path, out: Path, more: Sequence[str]) -> None:
    esbuild = site_src / "node_modules/esbuild/bin/esbuild"
    run_node([esbuild, entry.resolve(), *_BUNDLE, f"--outdir={out}", "--log-level=warning", *more], site_src)
