"""The project's own environment, made where it is missing or out of date, and entered.

Takes a machine with any Python from 3.6 on; gives a command that runs in ``.venv``, on CPython 3.13 with what the lock
names. ``commands`` comes next. Standard library only: nothing else is there yet.
"""

import hashlib
import os
import subprocess
import sys
import time
from typing import Dict, List, Sequence

from generator.errors import SetUpError
from generator.interpreters import find_python

ROOT = os.path.dirname(os.path.dirname(os.path.abspath(__file__)))

_STAMP = "made-from"
_LOCK = os.path.join("generator", "environment", "requirements.lock")
_INSTALL = (
    "-m", "pip", "install", "-qq", "--no-input", "--disable-pip-version-check", "--no-compile",
    "--require-hashes", "--no-deps", "--only-binary", ":all:", "-r",
)  # fmt: skip
_INSTALL_NODE_PACKAGES = (
    "import pathlib, sys; from generator.pack_node import install_packages; install_packages(pathlib.Path(sys.argv[1]))"
)
_AGAIN = "Correct what it names (a connection to the package index is needed once), then run the same command again."


def main(arguments: Sequence[str]) -> int:
    """The exit status of the command, run in the project's environment, which is made first where needed."""
    try:
        if not is_ready(ROOT):
            make(ROOT)
        os.makedirs(_engine(ROOT), exist_ok=True)
        if not is_inside(ROOT):
            return enter(ROOT, arguments)
    except SetUpError as problem:
        print(problem, file=sys.stderr)
        return 1
    except KeyboardInterrupt:
        return 130
    # Python leaves out the entries of a path file that were not there when it started.
    if _engine(ROOT) not in sys.path:
        sys.path.append(_engine(ROOT))
    from generator.commands import run  # noqa: PLC0415 - needs the environment, which older Pythons have not entered yet

    return run(list(arguments))


def environment_python(root: str) -> str:
    """The path of the environment's interpreter."""
    parts = ("Scripts", "python.exe") if os.name == "nt" else ("bin", "python")
    return os.path.join(root, ".venv", *parts)


def is_ready(root: str) -> bool:
    """Whether the environment was made to its end, here, from the lock as it is now."""
    try:
        with open(_stamp(root), encoding="ascii") as file:
            return file.read() == _digest(root) and os.path.exists(environment_python(root))
    except FileNotFoundError:
        return False


def is_inside(root: str) -> bool:
    """Whether this process runs in the environment."""
    return os.path.realpath(sys.prefix) == os.path.realpath(os.path.join(root, ".venv"))


def make(root: str) -> None:
    """Make the environment anew; the stamp is the last thing written, so that half an environment never counts.

    Raises:
        SetUpError: there is no fit Python, or a step fails.
    """
    start = time.time()
    print("Setting up, once for this lock (some minutes) ...", flush=True)
    wanted = _digest(root)
    if os.path.exists(_stamp(root)):
        os.remove(_stamp(root))
    _step("a virtual environment", [find_python(), "-m", "venv", "--clear", os.path.join(root, ".venv")], root)
    python = environment_python(root)
    _step("Python packages", [python, *_INSTALL, os.path.join(root, _LOCK)], root)
    _write_path_file(root)
    if os.path.exists(os.path.join(root, "site_src", "package.json")):
        _step("Node packages", [python, "-c", _INSTALL_NODE_PACKAGES, os.path.join(root, "site_src")], root)
    with open(_stamp(root), "w", encoding="ascii") as file:
        file.write(wanted)
    print("Set up in {:.0f} s.".format(time.time() - start), flush=True)


def enter(root: str, arguments: Sequence[str]) -> int:
    """Run the same command in the environment; on POSIX this process becomes that one."""
    command = [environment_python(root), "-m", "generator", *arguments]
    sys.stdout.flush()
    if os.name != "nt":
        os.execve(command[0], command, _clean_environment())
    return subprocess.call(command, env=_clean_environment())


def _clean_environment() -> Dict[str, str]:
    """The environment variables less those that would lead the interpreter to another one's modules."""
    foreign = ("PYTHONHOME", "PYTHONPATH", "__PYVENV_LAUNCHER__")
    return {name: value for name, value in os.environ.items() if name not in foreign}


def _step(name: str, command: List[str], root: str) -> None:
    """Run one step of the set-up; its own errors go to the terminal as they come."""
    print("  {} ...".format(name), flush=True)
    status = subprocess.call(command, cwd=root, env=_clean_environment())
    if status != 0:
        found = "exit status {}, with the message above".format(status)
        raise SetUpError("set-up, {}".format(name), found, "a step without errors", _AGAIN)


def _write_path_file(root: str) -> None:
    """Let the environment's Python find the emitted engine and the project, by a path file."""
    ask = "import sysconfig; print(sysconfig.get_path('purelib'))"
    packages = subprocess.check_output([environment_python(root), "-c", ask], universal_newlines=True).strip()
    with open(os.path.join(packages, "gaswright-project.pth"), "w", encoding="utf-8") as file:
        file.write("{}\n{}\n".format(_engine(root), root))


def _engine(root: str) -> str:
    return os.path.join(root, "build", "engine")


def _stamp(root: str) -> str:
    return os.path.join(root, ".venv", _STAMP)


def _digest(root: str) -> str:
    """What the environment is made from: the lock and the folder, since an environment cannot be moved."""
    with open(os.path.join(root, _LOCK), "rb") as file:
        return hashlib.sha256(file.read() + os.fsencode(root)).hexdigest()
