"""Put a finished build in place, all or nothing.

Takes the folder a build was made in; replaces the last good engine, site and wheel by it.
"""

import shutil
from pathlib import Path

PARTS = ("engine", "wheel", "site")


def swap(made: Path, folder: Path) -> None:
    """Replace each part of ``folder`` by that of ``made``; the old parts go only when the new ones stand."""
    old = folder / "last"
    if old.exists():
        shutil.rmtree(old)
    old.mkdir(parents=True)
    for part in PARTS:
        if (folder / part).exists():
            (folder / part).rename(old / part)
        (made / part).rename(folder / part)
    shutil.rmtree(old)
    shutil.rmtree(made)
