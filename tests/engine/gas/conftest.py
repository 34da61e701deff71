"""What the tests of the gas model share: the engine package on the path, and how many states to try.

Where the built engine is installed it is used; otherwise the hand-written and the emitted gas modules are staged
in a temporary folder, so that these tests need no build.
"""

from __future__ import annotations

import shutil
import sys
import tempfile
from importlib.util import find_spec
from pathlib import Path

import pytest

ROOT = Path(__file__).parents[3]


def _stage() -> None:
    if find_spec("gaswright") is not None and find_spec("gaswright.gas") is not None:
        return
    from generator.gas_equations import emit_gas_modules  # noqa: PLC0415 - only where nothing is built
    from spec.gases import ALL as GASES  # noqa: PLC0415 - only where nothing is built

    folder = Path(tempfile.mkdtemp(prefix="gaswright-gas-"))
    package = folder / "gaswright"
    shutil.copytree(ROOT / "site_src/engine/gaswright/gas", package / "gas")
    shutil.copy(ROOT / "site_src/engine/gaswright/errors.py", package)
    for name, text in emit_gas_modules(GASES).items():
        path = folder / name
        path.parent.mkdir(parents=True, exist_ok=True)
        path.write_text(text, encoding="utf-8")
    sys.path.insert(0, str(folder))


sys.path.insert(0, str(ROOT))
_stage()


@pytest.fixture
def full(request: pytest.FixtureRequest) -> bool:
    """Return whether the full counts are asked for."""
    return bool(request.config.getoption("--all"))
