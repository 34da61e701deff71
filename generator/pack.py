"""The last stage but writing: the engine as a wheel, and as scripts that run it in a browser.

Takes the folder with the package ``gaswright``, the folder ``site_src`` and a version; gives the wheel and the site's
folders ``engine`` and ``app``, and the licences of all that ships.
The pipeline calls ``pack``; a page includes ``app/page.js``.
"""

from collections.abc import Mapping
from dataclasses import dataclass
from pathlib import Path

from generator.errors import SpecError
from generator.pack_app import Entries, bundle_app, pack_table
from generator.pack_bytecode import compile_sources
from generator.pack_node import install_packages
from generator.pack_notices import notices
from generator.pack_payload import Payload, make_payload
from generator.pack_runtime import lock_facts, runtime_payloads
from generator.pack_wheel import Wheel, WheelFacts, build_wheel

_NATIVE_TAG = "py3-none-any"
_BROWSER_TAG = "cp313-none-any"
#: Where the runtime unpacks wheels, so that tracebacks name the place.
_SITE_PACKAGES = "/lib/python3.13/site-packages/"


@dataclass(frozen=True, slots=True, kw_only=True)
class Packed:
    """All that packing makes: the native wheel, and the site's files by name below the site's folder."""

    wheel: Wheel
    site: Mapping[str, bytes]


def pack(engine: Path, site_src: Path, out: Path, version: str) -> Packed:
    """Pack the package in the folder ``engine``; write ``wheel/`` and ``site/`` below the folder ``out``.

    Nothing else is written but ``cache/`` beside ``engine``, and ``node_modules`` where it is not as locked.

    Raises:
        SpecError: a source is missing, or a tool says that something is wrong with it.
    """
    entries = Entries(page=site_src / "app/page.ts", worker=site_src / "app/worker.ts")
    packed = make_packed(engine, site_src, version, entries)
    _write(out / "wheel" / packed.wheel.name, packed.wheel.content)
    for name, content in packed.site.items():
        _write(out / "site" / name, content)
    return packed


def make_packed(engine: Path, site_src: Path, version: str, entries: Entries) -> Packed:
    """What ``pack`` writes; another page's ``entries`` may be given."""
    engine, site_src = engine.resolve(), site_src.resolve()
    modules = install_packages(site_src)
    package = _package_files(engine)
    licence = _read(site_src / "LICENSE.txt")
    native = build_wheel(package, WheelFacts(version=version, tag=_NATIVE_TAG, licence=licence), compressed=True)
    compiled = build_wheel(
        compile_sources(package, _SITE_PACKAGES),
        WheelFacts(version=version, tag=_BROWSER_TAG, licence=licence),
        compressed=False,
    )
    payloads = (
        *runtime_payloads(modules / "pyodide", engine.parent / "cache"),
        make_payload("engine", compiled.content),
    )
    app = bundle_app(site_src, entries, pack_table(version, payloads, _lock(modules, compiled, version)))
    return Packed(wheel=native, site=_site_files(payloads, app) | {"notices.txt": notices(site_src).encode()})


def _lock(modules: Path, wheel: Wheel, version: str) -> dict[str, object]:
    """The lock file of the runtime, with our wheel as its one package."""
    entry = {
        "name": "gaswright",
        "version": version,
        "file_name": wheel.name,
        "install_dir": "site",
        "sha256": wheel.sha256,
        "package_type": "package",
        "imports": ["gaswright"],
        "depends": [],
    }
    return {"info": lock_facts(modules / "pyodide"), "packages": {"gaswright": entry}}


def _site_files(payloads: tuple[Payload, ...], app: Mapping[str, bytes]) -> dict[str, bytes]:
    return {each.file: each.script for each in payloads} | {f"app/{name}": content for name, content in app.items()}


def _package_files(engine: Path) -> dict[str, bytes]:
    """The files of the package, by name relative to ``engine``."""
    files = sorted(file for file in (engine / "gaswright").rglob("*") if file.is_file() and file.suffix != ".pyc")
    if not files:
        raise SpecError(str(engine.name), "no package gaswright", "the emitted package", "Run the stages before.")
    return {file.relative_to(engine).as_posix(): file.read_bytes() for file in files}


def _read(file: Path) -> bytes:
    if not file.is_file():
        raise SpecError(file.name, "no such file", f"it in {file.parent.name}", "Put it back from version control.")
    return file.read_bytes()


def _write(file: Path, content: bytes) -> None:
    file.parent.mkdir(parents=True, exist_ok=True)
    file.write_bytes(content)
