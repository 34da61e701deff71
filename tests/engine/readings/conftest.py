"""Puts the engine package on the path: the built one where it is installed, else what these tests need of it."""

import shutil
import sys
import tempfile
from importlib.util import find_spec
from pathlib import Path

import pytest

ROOT = Path(__file__).parents[3]


def _stage() -> None:
    if find_spec("gaswright") is not None and find_spec("gaswright.tables") is not None:
        return
    from generator.emit_tables import emit_tables  # noqa: PLC0415 - only where nothing is built
    from spec import kinds, units  # noqa: PLC0415 - only where nothing is built

    folder = Path(tempfile.mkdtemp(prefix="gaswright-readings-"))
    shutil.copytree(ROOT / "site_src/engine", folder, dirs_exist_ok=True)
    (folder / "gaswright/tables.py").write_text(emit_tables(units.ALL, kinds.ALL), encoding="utf-8")
    sys.path.insert(0, str(folder))


sys.path.insert(0, str(ROOT))
_stage()


@pytest.fixture
def examples(request: pytest.FixtureRequest) -> int:
    """How many random texts to try."""
    return 10_000 if request.config.getoption("--all") else 300
