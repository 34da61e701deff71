"""The README's commands and examples, as they stand there."""

import doctest
import re
import textwrap
from pathlib import Path

import pytest

from generator import commands


@pytest.fixture(scope="module")
def readme(root: Path) -> str:
    """The README's text."""
    return (root / "README.md").read_text(encoding="utf-8")


def test_its_commands_are_commands_of_the_repository(readme: str, monkeypatch: pytest.MonkeyPatch) -> None:
    monkeypatch.setattr(commands, "serve", lambda *_, **__: 11)
    monkeypatch.setattr(commands, "run_tests", lambda *_, **__: 12)
    lines = re.findall(r"^python3 -m generator (.+)$", readme, flags=re.MULTILINE)
    assert [commands.run(line.split()) for line in lines] == [11, 12]


def test_its_relation_stands_so_in_the_spec(readme: str, root: Path) -> None:
    (relation,) = re.findall(r"```python\n(.+?)```", readme, flags=re.DOTALL)
    spec = (root / "spec" / "relations" / "b_simple.py").read_text(encoding="utf-8")
    assert textwrap.indent(relation, "    ") in spec


def test_its_python_example_answers_as_printed(readme: str) -> None:
    # 6.5 × 30 / 11 = 17.727..., by hand.
    (example,) = re.findall(r"```pycon\n(.+?)```", readme, flags=re.DOTALL)
    test = doctest.DocTestParser().get_doctest(example, {}, "README", "README.md", 0)
    assert doctest.DocTestRunner().run(test) == doctest.TestResults(failed=0, attempted=3)
