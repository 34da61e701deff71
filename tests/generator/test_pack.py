"""Packing: the same bytes whatever builds them, a wheel that installs, payloads that hold what they say."""

import base64
import gzip
import hashlib
import importlib.util
import io
import json
import marshal
import os
import re
import subprocess
import sys
import zipfile
from pathlib import Path
from types import CodeType

import pytest

from generator.errors import SpecError
from generator.pack import Packed, make_packed
from generator.pack_app import Entries, check_types
from generator.pack_bytecode import compile_sources
from generator.pack_wheel import Wheel, WheelFacts, build_wheel

MODULE = (
    '"""A module."""\n\nLIMITS = frozenset({"bar", "psi", "kPa"})\n\n\n'
    'def main() -> int:\n    """0."""\n    print("it runs")\n    return 0\n'
)
FACTS = WheelFacts(version="1.2.3", tag="py3-none-any", licence=b"MIT License\n")
#: Packs the same package in another folder, and prints the digests of all that comes out.
PACK_ELSEWHERE = """
import hashlib, json, sys
from pathlib import Path
from generator.pack import make_packed
from generator.pack_app import Entries
engine, site_src, page = map(Path, sys.argv[1:])
packed = make_packed(engine, site_src, "1.2.3", Entries(page=page, worker=site_src / "app/worker.ts"))
files = {packed.wheel.name: packed.wheel.content, **packed.site}
print(json.dumps({name: hashlib.sha256(content).hexdigest() for name, content in files.items()}))
"""


def write_package(folder: Path) -> Path:
    """Write a package with a command; the folder for ``make_packed`` comes back."""
    package = folder / "engine/gaswright"
    package.mkdir(parents=True)
    for name in ("__init__.py", "__main__.py", "browser.py"):
        (package / name).write_text(MODULE, encoding="utf-8")
    (package / "py.typed").touch()
    return folder / "engine"


def entries(root: Path) -> Entries:
    """The programs of the loader's own test page."""
    return Entries(page=root / "tests/browser/start_pages/page.ts", worker=root / "site_src/app/worker.ts")


@pytest.fixture(scope="module")
def packed(root: Path, tmp_path_factory: pytest.TempPathFactory) -> Packed:
    """Pack the package once for the module."""
    engine = write_package(tmp_path_factory.mktemp("packed"))
    return make_packed(engine, root / "site_src", "1.2.3", entries(root))


@pytest.fixture
def wheel() -> Wheel:
    """Build a wheel of the package's files."""
    names = ("gaswright/__main__.py", "gaswright/__init__.py")
    return build_wheel({name: MODULE.encode() for name in names}, FACTS, compressed=True)


def payload_content(packed: Packed, name: str) -> bytes:
    """What one payload script carries, unpacked."""
    script = packed.site[f"engine/{name}.js"].decode("ascii")
    match = re.fullmatch(rf'gaswrightPayload\("{name}","([A-Za-z0-9+/=]+)"\);\n', script)
    assert match is not None
    return gzip.decompress(base64.b64decode(match[1], validate=True))


def test_same_bytes_in_another_folder_locale_and_hash_seed(packed: Packed, root: Path, tmp_path: Path) -> None:
    """Everything packed again from nothing, by another process that shares none of the settings: the same bytes."""
    engine = write_package(tmp_path / "Gäste 2")
    environment = {**os.environ, "PYTHONHASHSEED": "77", "LC_ALL": "C", "TZ": "Asia/Tokyo", "PYTHONPATH": str(root)}
    arguments = [str(engine), str(root / "site_src"), str(entries(root).page)]
    command = [sys.executable, "-c", PACK_ELSEWHERE, *arguments]
    done = subprocess.run(command, cwd=tmp_path, env=environment, stdout=subprocess.PIPE, text=True, check=True)
    here = {packed.wheel.name: packed.wheel.content, **packed.site}
    assert json.loads(done.stdout) == {name: hashlib.sha256(content).hexdigest() for name, content in here.items()}


def test_wheel_records_every_file(wheel: Wheel) -> None:
    """RECORD lists each file with its SHA-256 and size, itself without, as the binary distribution format says."""
    with zipfile.ZipFile(io.BytesIO(wheel.content)) as archive:
        files = {name: archive.read(name) for name in archive.namelist()}
    rows = [line.split(",") for line in files["gaswright-1.2.3.dist-info/RECORD"].decode().splitlines()]
    assert [row[0] for row in rows] == list(files)
    assert rows[-1] == ["gaswright-1.2.3.dist-info/RECORD", "", ""]
    for name, digest, size in rows[:-1]:
        assert digest == "sha256=" + base64.urlsafe_b64encode(hashlib.sha256(files[name]).digest()).decode().rstrip("=")
        assert int(size) == len(files[name])


def test_wheel_installs_with_pip_and_its_command_runs(wheel: Wheel, tmp_path: Path) -> None:
    """Pip takes the wheel without a network, and the console script runs ``gaswright.__main__:main``."""
    file = tmp_path / wheel.name
    file.write_bytes(wheel.content)
    pip = [sys.executable, "-m", "pip", "install", "--quiet", "--no-index", "--no-deps", "--disable-pip-version-check"]
    subprocess.run([*pip, "--target", str(tmp_path / "installed"), str(file)], check=True)
    command = [str(tmp_path / "installed/bin/gaswright")]
    environment = {**os.environ, "PYTHONPATH": str(tmp_path / "installed")}
    done = subprocess.run(command, env=environment, stdout=subprocess.PIPE, text=True, check=True)
    assert done.stdout == "it runs\n"


def test_odd_version_is_refused() -> None:
    """A version that an installer would rewrite is refused in four parts."""
    facts = WheelFacts(version="1.0-beta", tag="py3-none-any", licence=b"")
    with pytest.raises(SpecError) as raised:
        build_wheel({}, facts, compressed=True)
    assert str(raised.value) == (
        "version of the engine: found '1.0-beta'; expected a version in the normal form of PEP 440, such as 0.1.0. "
        "Correct it in the house file."
    )


def test_compiled_file_is_marked_by_hash_and_runs() -> None:
    """PEP 552: magic number, flag 1 (by hash, unchecked), the source's hash, then the code, named by its folder."""
    compiled = compile_sources({"gaswright/limits.py": MODULE.encode(), "gaswright/py.typed": b""}, "/lib/")
    assert list(compiled) == ["gaswright/limits.pyc", "gaswright/py.typed"]
    content = compiled["gaswright/limits.pyc"]
    header = importlib.util.MAGIC_NUMBER + b"\1\0\0\0" + importlib.util.source_hash(MODULE.encode())
    assert content[:16] == header
    code = marshal.loads(content[16:])  # noqa: S302 - our own bytes of just now
    assert isinstance(code, CodeType)
    assert code.co_filename == "/lib/gaswright/limits.py"


def test_payloads_hold_the_runtime_unchanged(packed: Packed, root: Path) -> None:
    """The runtime's programs arrive byte by byte; the library is compiled, and the modules the runtime needs are in."""
    package = root / "site_src/node_modules/pyodide"
    for name, file in {"starter": "pyodide.js", "runtime": "pyodide.asm.js", "machine": "pyodide.asm.wasm"}.items():
        assert payload_content(packed, name) == (package / file).read_bytes()
    with zipfile.ZipFile(io.BytesIO(payload_content(packed, "library"))) as archive:
        names = set(archive.namelist())
    assert {"asyncio/__init__.pyc", "json/decoder.pyc", "decimal.pyc", "csv.pyc", "pyodide/code.pyc"} <= names
    assert not {name for name in names if name.endswith(".py")}


def test_table_in_the_page_states_every_digest(packed: Packed) -> None:
    """The page's script holds the SHA-256 of the bytes that each payload carries, and the lock that of the wheel."""
    page = packed.site["app/page.js"].decode("utf-8")
    for name in ("starter", "runtime", "machine", "library", "engine"):
        packed_bytes = base64.b64decode(packed.site[f"engine/{name}.js"].split(b'"')[3])
        assert hashlib.sha256(packed_bytes).hexdigest() in page
    assert hashlib.sha256(payload_content(packed, "engine")).hexdigest() in page


def test_payloads_leave_room_for_the_pages(packed: Packed) -> None:
    """The site's folder may hold 13 MB in all; what is packed here takes at most 9."""
    assert sum(map(len, packed.site.values())) < 9e6


def test_notices_name_all_that_ships(packed: Packed, root: Path) -> None:
    """Each npm package bundled or carried has its version and licence in the notices, the runtime's parts too."""
    text = packed.site["notices.txt"].decode("utf-8")
    wanted = json.loads((root / "site_src/package.json").read_text(encoding="utf-8"))["dependencies"]
    assert [name for name, version in wanted.items() if f"{name} {version}" not in text] == []
    parts = ("Mozilla Public License", "PYTHON SOFTWARE FOUNDATION LICENSE", "musl", "Emscripten", "libffi", "bzip2")
    assert [part for part in parts if part not in text] == []


def test_lock_has_no_address_of_a_registry(root: Path) -> None:
    """Every package is pinned by its digest, and nothing says where it was fetched."""
    packages = json.loads((root / "site_src/package-lock.json").read_text(encoding="utf-8"))["packages"]
    fetched = {name: facts for name, facts in packages.items() if name}
    assert [name for name, facts in fetched.items() if "resolved" in facts] == []
    assert [name for name, facts in fetched.items() if not facts["integrity"].startswith("sha512-")] == []


def test_browser_code_has_strict_types(root: Path) -> None:
    """The page and the worker pass the compiler's strict check."""
    check_types(root / "site_src")


def test_mistake_in_the_browser_code_is_told(root: Path, tmp_path: Path) -> None:
    """What the bundler says comes back in four parts."""
    page = tmp_path / "page.ts"
    page.write_text('import "./nowhere";\n', encoding="utf-8")
    engine = write_package(tmp_path)
    with pytest.raises(SpecError, match=r'esbuild: found .*Could not resolve "\./nowhere"'):
        make_packed(engine, root / "site_src", "1.2.3", Entries(page=page, worker=entries(root).worker))


def test_missing_package_is_told(root: Path, tmp_path: Path) -> None:
    """Without an emitted package there is nothing to pack."""
    with pytest.raises(SpecError, match="no package gaswright"):
        make_packed(tmp_path, root / "site_src", "1.2.3", entries(root))
