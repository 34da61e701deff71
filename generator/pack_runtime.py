"""The Python runtime for the browser, as payload scripts.

Takes the npm package of the runtime; gives its programs and its compiled standard library as payloads.
They change only with the runtime, so they are kept in the cache; ``pack`` puts them beside the engine's own payload.
"""

import hashlib
import json
import sys
from collections.abc import Mapping
from pathlib import Path

from generator.errors import SpecError
from generator.pack_bytecode import compile_sources, magic_number
from generator.pack_node import run_node
from generator.pack_payload import Payload, make_payload
from generator.pack_zip import read_zip, write_zip

#: Name of each payload, and its file in the runtime's package.
RUNTIME_FILES: Mapping[str, str] = {
    "starter": "pyodide.js",
    "runtime": "pyodide.asm.js",
    "machine": "pyodide.asm.wasm",
    "library": "python_stdlib.zip",
}

#: Parts of the standard library that cannot work in a browser's worker (processes, sockets, terminals, windows),
#: serve only development, or stand in for parts in C that this runtime has.
LEFT_OUT = frozenset(
    """__hello__ __phello__ _android_support _apple_support _ios_support _pydatetime _pyio _pyrepl antigravity bdb
    cProfile cmd compileall ctypes doctest filecmp fileinput ftplib getpass imaplib mailbox mimetypes modulefinder
    multiprocessing netrc nturl2path optparse pdb pickletools plistlib poplib profile pstats pty py_compile pyclbr
    pydoc rlcompleter sched shelve smtplib socketserver sre_compile sre_constants sre_parse symtable tabnanny this
    timeit trace tracemalloc tty turtle unittest wave webbrowser wsgiref xml xmlrpc zipapp""".split()  # noqa: SIM905 - sixty names read better as words than one a line
)

_ASK_MAGIC = """
const { loadPyodide } = await import(process.argv[1]);
const python = await loadPyodide();
console.log(python.runPython("import importlib.util; importlib.util.MAGIC_NUMBER.hex()"));
"""


def runtime_payloads(package: Path, cache: Path) -> tuple[Payload, ...]:
    """The payloads of the runtime in ``package``, from the folder ``cache`` where they have been made before.

    Raises:
        SpecError: the runtime's Python does not read the files that this Python compiles.
    """
    kept = cache / f"runtime-{_cache_key(package)}.json"
    if kept.is_file():
        return tuple(_restore(entry) for entry in json.loads(kept.read_text(encoding="ascii")))
    _require_equal_magic(package)
    payloads = tuple(make_payload(name, _content(package, file)) for name, file in RUNTIME_FILES.items())
    _keep(kept, payloads)
    return payloads


def lock_facts(package: Path) -> dict[str, str]:
    """What the runtime's own lock file says of it: its interface, its platform, its Python."""
    lock = json.loads((package / "pyodide-lock.json").read_text(encoding="utf-8"))
    return {key: str(value) for key, value in sorted(lock["info"].items())}


def trimmed_library(archive: bytes) -> dict[str, bytes]:
    """The sources of the standard library that ship, sorted by name."""
    files = read_zip(archive)
    return {name: files[name] for name in sorted(files) if name.partition("/")[0].removesuffix(".py") not in LEFT_OUT}


def _content(package: Path, file: str) -> bytes:
    content = (package / file).read_bytes()
    if file != RUNTIME_FILES["library"]:
        return content
    # Stored, not compressed: the payload is compressed as a whole, and importing then needs no unpacking.
    compiled = compile_sources(trimmed_library(content), f"/lib/python{sys.version_info[0]}{sys.version_info[1]}.zip/")
    return write_zip(compiled, compressed=False)


def _require_equal_magic(package: Path) -> None:
    script = ["--input-type=module", "--eval", _ASK_MAGIC, (package / "pyodide.mjs").as_uri()]
    found, expected = magic_number(), run_node(script, package).strip()
    if found == expected:
        return
    where, todo = "compiled Python files", "Build with the Python version that .python-version names."
    raise SpecError(where, f"magic number {found}", f"the runtime's {expected}", todo)


def _cache_key(package: Path) -> str:
    """Digest of all that the payloads follow from: the runtime's files, this Python, and the code that packs."""
    digest = hashlib.sha256(sys.version.encode())
    code = sorted(Path(__file__).parent.glob("pack*.py"))
    for file in [*(package / name for name in RUNTIME_FILES.values()), *code]:
        digest.update(hashlib.sha256(file.read_bytes()).digest())
    return digest.hexdigest()[:32]


def _keep(kept: Path, payloads: tuple[Payload, ...]) -> None:
    entries = [{"name": each.name, "script": each.script.decode("ascii"), "sha256": each.sha256} for each in payloads]
    kept.parent.mkdir(parents=True, exist_ok=True)
    unfinished = kept.with_suffix(".part")
    unfinished.write_text(json.dumps(entries), encoding="ascii")
    unfinished.replace(kept)


def _restore(entry: dict[str, str]) -> Payload:
    return Payload(name=entry["name"], script=entry["script"].encode("ascii"), sha256=entry["sha256"])
