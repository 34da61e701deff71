"""A CPython 3.13 on this machine, found by running what may be one.

Takes the machine's folders and environment; gives the path of an interpreter that answered.
``bootstrap`` makes the environment with it. Any Python from 3.6 on reads this module.

A name on the PATH proves nothing: a version manager leaves stand-ins for versions that are not there, some systems ship
an interpreter without ``venv``, and a free-threaded build takes none of the locked wheels. So each candidate is asked.
"""

import glob
import os
import subprocess
import sys
from typing import Iterator, Optional, Sequence, Tuple

from generator.errors import SetUpError

VERSION = "3.13"

# Prints the interpreter outside any virtual environment, and only where it can make one and reach a package index.
_QUESTION = (
    "import sys, sysconfig, venv, ensurepip, ssl\n"
    "assert sys.implementation.name == 'cpython' and sys.version_info[:2] == (3, 13)\n"
    "assert not sysconfig.get_config_var('Py_GIL_DISABLED')\n"
    "print(sys._base_executable)\n"
)
_ANSWER_SECONDS = 60
_FETCH_SECONDS = 600

_PLACES = (
    "{pyenv}/versions/3.13*/bin/python3.13",
    "{home}/.pyenv/versions/3.13*/bin/python3.13",
    "{home}/.pyenv/pyenv-win/versions/3.13*/python.exe",
    "{home}/.local/share/uv/python/cpython-3.13*/bin/python3.13",
    "{home}/.local/bin/python3.13",
    "/usr/local/bin/python3.13",
    "/usr/bin/python3.13",
    "/opt/homebrew/bin/python3.13",
    "/opt/local/bin/python3.13",
    "/Library/Frameworks/Python.framework/Versions/3.13/bin/python3.13",
    "{local}/Programs/Python/Python313*/python.exe",
    "{local}/Python/pythoncore-3.13*/python.exe",
    "{programs}/Python313*/python.exe",
)


def find_python() -> str:
    """The path of a CPython 3.13 that can make a virtual environment.

    Raises:
        SetUpError: none answers, and none could be fetched.
    """
    tried = []
    for command in candidates():
        tried.append(" ".join(command))
        found = ask(command)
        if found is not None:
            return found
    found = _fetch_with_uv()
    if found is not None:
        return found
    raise SetUpError(
        "set-up, search for Python",
        "no CPython 3.13 among {} interpreters that were run: {}".format(len(tried), ", ".join(tried)),
        "one that runs and has the modules venv, ensurepip and ssl",
        "Install Python 3.13 from your system's packages or its maker's installer, or install uv or pyenv and run "
        "'uv python install 3.13' or 'pyenv install 3.13'; then run the same command again.",
    )


def candidates() -> Iterator[Sequence[str]]:
    """Commands that may start a CPython 3.13, likely ones first, each once."""
    seen = set()
    for command in _all_candidates():
        if tuple(command) not in seen:
            seen.add(tuple(command))
            yield command


def _all_candidates() -> Iterator[Sequence[str]]:
    yield (sys.executable,)
    yield ("python3.13",)
    yield ("python3",)
    yield ("python",)
    yield ("py", "-3.13")
    home = os.path.expanduser("~")
    folders = {
        "home": home,
        "pyenv": os.environ.get("PYENV_ROOT", os.path.join(home, ".pyenv")),
        "local": os.environ.get("LOCALAPPDATA", home),
        "programs": os.environ.get("PROGRAMFILES", home),
    }
    for place in _PLACES:
        for path in sorted(glob.glob(place.format(**{name: glob.escape(folder) for name, folder in folders.items()}))):
            yield (path,)


def ask(command: Sequence[str]) -> Optional[str]:
    """The path that the command names as its interpreter; None where it does not run or is not a fit CPython 3.13."""
    status, answer = _run([*command, "-I", "-c", _QUESTION], _ANSWER_SECONDS)
    path = answer.strip()
    return path if status == 0 and os.path.isfile(path) else None


def _fetch_with_uv() -> Optional[str]:
    """A Python 3.13 that uv has or fetches; None where there is no uv or it cannot."""
    if _run(["uv", "--version"], _ANSWER_SECONDS)[0] != 0:
        return None
    print("Fetching Python {} with uv ...".format(VERSION), flush=True)
    _run(["uv", "python", "install", VERSION], _FETCH_SECONDS)
    status, path = _run(["uv", "python", "find", VERSION], _ANSWER_SECONDS)
    return ask([path.strip()]) if status == 0 else None


def _run(command: Sequence[str], seconds: int) -> Tuple[int, str]:
    """The exit status and output of a command; status 1 where it cannot be started or does not end in time."""
    try:
        done = subprocess.run(
            list(command),
            stdin=subprocess.DEVNULL,
            stdout=subprocess.PIPE,
            stderr=subprocess.DEVNULL,
            universal_newlines=True,
            timeout=seconds,
        )
    except (OSError, subprocess.TimeoutExpired, UnicodeDecodeError):
        return 1, ""
    return done.returncode, done.stdout
