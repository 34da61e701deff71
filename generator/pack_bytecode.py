"""Python sources compiled once, here, so that the browser need not.

Takes source files by name; gives them with every ``.py`` replaced by its ``.pyc``.
The wheel for the browser and the standard library go through it: compiling beforehand halves the engine's start.
"""

import importlib.util
import subprocess
import sys
from collections.abc import Mapping
from pathlib import Path

from generator.pack_zip import read_zip, write_zip

_SCRIPT = Path(__file__).with_name("pack_bytecode_script.py")


def compile_sources(files: Mapping[str, bytes], folder: str) -> Mapping[str, bytes]:
    """The files, each Python source compiled; ``folder`` is where tracebacks say that the sources lie.

    Which strings ``marshal`` marks as shared depends on all that a process has loaded before, so a fresh and bare
    process compiles, with one hash seed: the same sources give the same bytes in every build.
    """
    command = [sys.executable, "-B", "-S", "-P", str(_SCRIPT), folder]
    sources = write_zip(files, compressed=False)
    done = subprocess.run(command, input=sources, stdout=subprocess.PIPE, check=True, env={"PYTHONHASHSEED": "0"})
    return read_zip(done.stdout)


def magic_number() -> str:
    """What marks this Python's compiled files, in hex."""
    return importlib.util.MAGIC_NUMBER.hex()
