"""The licences of all that ships and was written by others.

Takes the texts in ``site_src/licences`` and those in the npm packages; gives one text.
``pack`` puts it into the site.
"""

import json
from pathlib import Path

#: npm packages with code in the bundles, and the file of each that holds its licence.
_BUNDLED = {"@noble/hashes": "LICENSE", "idb": "LICENSE", "minisearch": "LICENSE.txt", "uplot": "LICENSE"}
_RULE = "=" * 80


def notices(site_src: Path) -> str:
    """Title and full licence text of each part, the runtime first, then the libraries of the page."""
    modules = site_src / "node_modules"
    kept = [_split(file) for file in sorted((site_src / "licences").glob("*.txt"))]
    bundled = [(_title(modules / name), _read(modules / name / file)) for name, file in sorted(_BUNDLED.items())]
    head = _HEAD.format(runtime=_title(modules / "pyodide"))
    parts = [f"{_RULE}\n{title}\n{_RULE}\n\n{text}\n" for title, text in [*kept, *bundled]]
    return "\n".join([head, *parts])


def _split(file: Path) -> tuple[str, str]:
    """Title and text of a kept licence: its first line, and the rest."""
    title, _, text = _read(file).partition("\n")
    return title, text.strip()


def _title(package: Path) -> str:
    facts = json.loads(_read(package / "package.json"))
    return f"{facts['name']} {facts['version']} ({facts['license']})"


def _read(file: Path) -> str:
    return file.read_text(encoding="utf-8").strip()


_HEAD = """\
This site carries work of others, each under its own licence, given in full below.
Its runtime is {runtime}, unchanged except that the standard library is compiled and parts of it are left out;
the source form is published by the project Pyodide under the same version.
"""
