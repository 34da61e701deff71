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
    """Name, version and full licence text of each part, runtime first."""
    modules = site_src / "node_modules"
    kept = [(file.stem, file) for file in sorted((site_src / "licences").glob("*.txt"))]
    bundled = [(_title(modules / name), modules / name / file) for name, file in sorted(_BUNDLED.items())]
    parts = [f"{_RULE}\n{title}\n{_RULE}\n\n{_text(file)}\n" for title, file in [*kept, *bundled]]
    return "\n".join([_HEAD, *parts])


def _title(package: Path) -> str:
    facts = json.loads((package / "package.json").read_text(encoding="utf-8"))
    return f"{facts['name']} {facts['version']}"


def _text(file: Path) -> str:
    return file.read_text(encoding="utf-8").strip()


_HEAD = """\
This site carries work of others, each under its own licence, given in full below.
The source form of the runtime is published by its own project, Pyodide, under the version named in its part.
"""
