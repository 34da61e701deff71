"""The generator's errors: four parts, kept and told; and how a command shows them."""

import pickle

import pytest

from generator import commands
from generator.errors import GeneratorError, SetUpError, SpecError


@pytest.mark.parametrize("kind", [SpecError, SetUpError])
def test_an_error_keeps_its_four_parts_and_tells_them(kind: type[GeneratorError]) -> None:
    error = kind(where="boyle, p_2", found="m³", expected="Pa", todo="Correct the kind.")
    assert (error.where, error.found, error.expected, error.todo) == ("boyle, p_2", "m³", "Pa", "Correct the kind.")
    assert str(error) == "boyle, p_2: found m³; expected Pa. Correct the kind."


def test_a_command_prints_each_error_of_a_group_and_fails(
    monkeypatch: pytest.MonkeyPatch, capsys: pytest.CaptureFixture[str]
) -> None:
    one, two = (SpecError(f"relation {name}", "no source", "one", "Add it.") for name in ("a", "b"))

    def fail(_: list[str]) -> int:
        raise ExceptionGroup("spec", [one, ExceptionGroup("inner", [two])])

    monkeypatch.setattr(commands, "_dispatch", fail)
    assert commands.run(["build"]) == 1
    assert capsys.readouterr().err == (
        "relation a: found no source; expected one. Add it.\n\nrelation b: found no source; expected one. Add it.\n"
    )


def test_a_fault_of_the_generator_itself_is_not_hidden(monkeypatch: pytest.MonkeyPatch) -> None:
    def fail(_: list[str]) -> int:
        raise KeyError("bug")

    monkeypatch.setattr(commands, "_dispatch", fail)
    with pytest.raises(KeyError):
        commands.run(["build"])


def test_a_word_too_many_is_refused_before_anything_runs(capsys: pytest.CaptureFixture[str]) -> None:
    assert commands.run(["build", "--fast"]) == 1
    assert capsys.readouterr().err == (
        "command build: found --fast; expected nothing more. Run it with --help for its options.\n"
    )


def test_a_mistake_travels_between_processes_whole() -> None:
    mistake = SpecError("relation boyle", "no source", "a work", "name it")
    back = pickle.loads(pickle.dumps(mistake))  # noqa: S301 - our own bytes
    assert (type(back), str(back)) == (SpecError, str(mistake))
