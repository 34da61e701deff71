"""Set-up: which Python is taken, when the environment counts as made, and what is said where it cannot be."""

import ast
import hashlib
import os
import re
import stat
import sys
from collections.abc import Callable, Sequence
from pathlib import Path

import pytest
from packaging.requirements import Requirement

from generator import bootstrap, interpreters
from generator.errors import SetUpError

ROOT = Path(bootstrap.ROOT)
OLD_PYTHON_FILES = ("__main__.py", "bootstrap.py", "interpreters.py", "errors.py")

type Program = Callable[[str, str], Path]


@pytest.fixture
def program(tmp_path: Path) -> Program:
    """Write an executable script into a folder of its own."""

    def write(name: str, body: str) -> Path:
        path = tmp_path / "programs" / name
        path.parent.mkdir(exist_ok=True)
        path.write_text("#!/bin/sh\n" + body, encoding="utf-8")
        path.chmod(path.stat().st_mode | stat.S_IXUSR)
        return path

    return write


@pytest.fixture
def project(tmp_path: Path) -> Path:
    """A project with nothing but a lock, empty or not."""
    folder = tmp_path / "project"
    (folder / "generator" / "environment").mkdir(parents=True)
    (folder / "generator" / "environment" / "requirements.lock").write_text("", encoding="ascii")
    return folder


@pytest.mark.parametrize("name", OLD_PYTHON_FILES)
def test_python_3_6_can_read(name: str) -> None:
    source = (ROOT / "generator" / name).read_text(encoding="utf-8")
    ast.parse(source, feature_version=(3, 6))


@pytest.mark.parametrize("name", OLD_PYTHON_FILES)
def test_set_up_imports_only_the_standard_library(name: str) -> None:
    tree = ast.parse((ROOT / "generator" / name).read_text(encoding="utf-8"))
    modules = {node.module or "" for node in tree.body if isinstance(node, ast.ImportFrom)}
    modules |= {alias.name for node in tree.body if isinstance(node, ast.Import) for alias in node.names}
    own = {f"generator.{Path(each).stem}" for each in OLD_PYTHON_FILES}
    assert {module for module in modules - own if module.split(".")[0] not in sys.stdlib_module_names} == set()


def test_this_python_answers_with_the_one_outside_its_environment() -> None:
    base = sys._base_executable  # type: ignore[attr-defined]  # no public name says which Python made this environment
    assert interpreters.ask([sys.executable]) == base


@pytest.mark.parametrize(
    ("body", "why"),
    [
        ("echo 'pyenv: python3.13: command not found' >&2; exit 127", "a stand-in for a version that is not installed"),
        ("exit 0", "says nothing"),
        ("echo /no/such/python", "names an interpreter that is not there"),
        ("echo Python 3.13.0", "answers another question"),
    ],
)
def test_what_only_looks_like_python_is_passed_over(program: Program, body: str, why: str) -> None:
    assert interpreters.ask([str(program("python3.13", body))]) is None, why


def test_a_command_that_is_not_there_is_passed_over() -> None:
    assert interpreters.ask(["no-such-python-anywhere"]) is None


@pytest.mark.parametrize("claim", ["implementation.name = 'pypy'", "version_info = (3, 12, 1)"])
def test_another_python_is_passed_over(program: Program, claim: str) -> None:
    # The question reaches a real interpreter that is told to be another one.
    body = f'shift 2; exec "{sys.executable}" -I -c "import sys; sys.{claim}; exec(sys.argv[1])" "$1"'
    assert interpreters.ask([str(program("python3.13", body))]) is None


def test_the_same_script_without_a_claim_is_taken(program: Program) -> None:
    body = f'shift 2; exec "{sys.executable}" -I -c "import sys; exec(sys.argv[1])" "$1"'
    assert interpreters.ask([str(program("python3.13", body))]) is not None


def test_a_failing_stand_in_on_the_path_leads_on_to_the_version_manager(
    program: Program, tmp_path: Path, monkeypatch: pytest.MonkeyPatch
) -> None:
    shim = program("python3.13", "exit 127")
    versions = tmp_path / "pyenv [1]" / "versions" / "3.13.0" / "bin"
    versions.mkdir(parents=True)
    (versions / "python3.13").symlink_to(sys.executable)
    monkeypatch.setenv("PATH", str(shim.parent))
    monkeypatch.setenv("PYENV_ROOT", str(tmp_path / "pyenv [1]"))
    monkeypatch.setattr(sys, "executable", str(shim))
    asked: list[str] = []
    real_ask = interpreters.ask

    def ask(command: Sequence[str]) -> str | None:
        asked.append(command[0])
        return real_ask(command)

    monkeypatch.setattr(interpreters, "ask", ask)
    assert Path(interpreters.find_python()).exists()
    assert asked == [str(shim), "python3.13", "python3", "python", "py", str(versions / "python3.13")]


def test_no_python_at_all_says_what_to_do(tmp_path: Path, monkeypatch: pytest.MonkeyPatch) -> None:
    monkeypatch.setenv("PATH", str(tmp_path))
    monkeypatch.setattr(interpreters, "candidates", lambda: iter([("python3.13",), ("py", "-3.13")]))
    with pytest.raises(SetUpError) as caught:
        interpreters.find_python()
    assert str(caught.value) == (
        "set-up, search for Python: found no CPython 3.13 among 2 interpreters that were run: python3.13, py -3.13; "
        "expected one that runs and has the modules venv, ensurepip and ssl. "
        "Install Python 3.13 from your system's packages or its maker's installer, or install uv or pyenv and run "
        "'uv python install 3.13' or 'pyenv install 3.13'; then run the same command again."
    )


def test_uv_fetches_one_where_there_is_none(program: Program, monkeypatch: pytest.MonkeyPatch) -> None:
    body = f'echo "$*" >> "$0.log"; [ "$2" != find ] || echo "{sys.executable}"'
    uv = program("uv", body)
    monkeypatch.setenv("PATH", str(uv.parent))
    monkeypatch.setattr(interpreters, "candidates", lambda: iter(()))
    assert Path(interpreters.find_python()).exists()
    log = uv.with_name("uv.log").read_text(encoding="utf-8")
    assert log == "--version\npython install 3.13\npython find 3.13\n"


def test_an_environment_is_made_stamped_and_then_ready(project: Path) -> None:
    assert not bootstrap.is_ready(str(project))
    bootstrap.make(str(project))
    assert bootstrap.is_ready(str(project))
    paths = next(project.glob(".venv/**/gaswright-project.pth")).read_text(encoding="utf-8")
    assert paths == f"{project / 'build' / 'engine'}\n{project}\n"


def test_a_changed_lock_or_a_moved_folder_is_not_ready(project: Path) -> None:
    lock = project / "generator" / "environment" / "requirements.lock"
    stamp = project / ".venv" / "made-from"
    python = Path(bootstrap.environment_python(str(project)))
    python.parent.mkdir(parents=True)
    python.touch()
    stamp.write_text(hashlib.sha256(os.fsencode(str(project))).hexdigest(), encoding="ascii")
    assert bootstrap.is_ready(str(project))
    moved = project.rename(project.with_name("moved"))
    assert not bootstrap.is_ready(str(moved))
    moved.rename(project)
    lock.write_text("sympy==1.14.0\n", encoding="ascii")
    assert not bootstrap.is_ready(str(project))


def test_a_failure_half_way_leaves_no_ready_environment(project: Path, capfd: pytest.CaptureFixture[str]) -> None:
    lock = project / "generator" / "environment" / "requirements.lock"
    lock.write_text("no requirement at all\n", encoding="ascii")
    stamp = project / ".venv" / "made-from"
    stamp.parent.mkdir()
    stamp.write_text(hashlib.sha256(lock.read_bytes() + os.fsencode(str(project))).hexdigest(), encoding="ascii")
    with pytest.raises(SetUpError) as caught:
        bootstrap.make(str(project))
    assert str(caught.value) == (
        "set-up, Python packages: found exit status 1, with the message above; expected a step without errors. "
        "Correct what it names (a connection to the package index is needed once), then run the same command again."
    )
    assert "Invalid requirement" in capfd.readouterr().err
    assert not stamp.exists()


def test_the_lock_pins_and_hashes_everything_and_names_no_address() -> None:
    folder = ROOT / "generator" / "environment"
    lock = (folder / "requirements.lock").read_text(encoding="ascii")
    entries = re.split(r"\n(?=[a-z0-9])", lock.strip())
    pinned = {}
    for entry in entries:
        requirement = Requirement(entry.split("\\\n")[0].strip())
        assert re.fullmatch(r"==[^*,]+", str(requirement.specifier)), entry
        assert re.search(r"--hash=sha256:[0-9a-f]{64}", entry), entry
        pinned[requirement.name] = str(requirement.specifier)
    assert "//" not in lock
    wanted = [
        line.split("#")[0].strip() for line in (folder / "requirements.in").read_text(encoding="utf-8").splitlines()
    ]
    for requirement in map(Requirement, filter(None, wanted)):
        assert pinned[requirement.name.lower()] == str(requirement.specifier)
