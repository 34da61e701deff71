"""Lay out the engine package: the hand-written part and the emitted modules, side by side.

Takes the emitted texts and site_src; writes the package into a fresh folder. Next: generator.make_views imports it,
generator.pack packs it.
"""

import hashlib
import shutil
import sys
from collections.abc import Mapping
from pathlib import Path


def stage_engine(folder: Path, site_src: Path, texts: Mapping[str, str]) -> None:
    """Make ``folder`` hold exactly the package ``gaswright``: hand-written modules and ``texts`` by path."""
    if folder.exists():
        shutil.rmtree(folder)
    shutil.copytree(site_src / "engine", folder, ignore=shutil.ignore_patterns("__pycache__"))
    for name, text in texts.items():
        path = folder / name
        path.parent.mkdir(parents=True, exist_ok=True)
        path.write_text(text, encoding="utf-8")


def spec_digest(texts: Mapping[str, str]) -> str:
    """Give the SHA-256 of everything emitted from the spec, which names the spec a figure came from."""
    digest = hashlib.sha256()
    for name in sorted(texts):
        digest.update(f"{name}\0{texts[name]}\0".encode())
    return digest.hexdigest()


def version_text(version: str, digest: str) -> str:
    """Give the module that tells which version and which spec the engine is."""
    head = '"""The version of the engine and the digest of its spec. Generated."""'
    return f"{head}\n\nVERSION = {version!r}\nDIGEST = {digest!r}\n"


def use_engine(folder: Path) -> None:
    """Make ``import gaswright`` mean the package in ``folder``, whatever was imported before."""
    for name in [name for name in sys.modules if name.split(".")[0] == "gaswright"]:
        del sys.modules[name]
    sys.path[:] = [str(folder), *(path for path in sys.path if path != str(folder))]
