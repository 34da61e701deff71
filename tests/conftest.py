"""What all tests share: the option ``--all``, and the summary of the whole check.

Takes the command line and what ``generator.selftest`` leaves in the environment.
Gives fixtures, and lines above pytest's last.
"""

import os
import time
from pathlib import Path

import pytest


def pytest_addoption(parser: pytest.Parser) -> None:
    """Add ``--all``."""
    parser.addoption("--all", action="store_true", help="run the full counts, and print their figures")


def pytest_terminal_summary(terminalreporter: pytest.TerminalReporter) -> None:
    """Show the other parts of the check and the time of all, so that pytest's closing line stays the last."""
    started = os.environ.get("GASWRIGHT_STARTED")
    if started is None:
        return
    terminalreporter.section("the whole check")
    terminalreporter.write_line(os.environ["GASWRIGHT_PARTS"])
    terminalreporter.write_line(f"all parts with these tests: {time.time() - float(started):.0f} s")


@pytest.fixture(scope="session")
def root() -> Path:
    """The project's folder."""
    return Path(__file__).resolve().parents[1]


@pytest.fixture(scope="session")
def full_counts(request: pytest.FixtureRequest) -> bool:
    """Whether the full counts were asked for (``--all``)."""
    return bool(request.config.getoption("--all"))
