"""The commands of the wheel, as someone types them: answers, JSON, and errors in four parts with status 1."""

import json
import subprocess
import sys
from pathlib import Path

import pytest
from gaswright.__main__ import main
from gaswright.sheet import run_sheet

from tests.engine.sheets.asking import NITROGEN


def test_the_package_runs_as_a_program() -> None:
    words = ["solve", "boyle", "V_2", "p_1=1.2 bar absolute", "V_1=48 L", "p_2=2 bar absolute", "--json"]
    done = subprocess.run([sys.executable, "-m", "gaswright", *words], capture_output=True, text=True, check=True)
    assert json.loads(done.stdout)["value"] == pytest.approx(0.0288, rel=1e-12)  # 1.2 · 48 / 2 L
    assert done.stderr == ""


def test_solve_counts_a_gauge_reading_from_the_station_pressure(capsys: pytest.CaptureFixture[str]) -> None:
    words = ["solve", "boyle", "V_2", "p_1=1.2 bar gauge", "V_1=48 L", "p_2=2 bar absolute", "--json"]
    assert main([*words, "--station-pressure", "1000 mbar"]) == 0
    assert json.loads(capsys.readouterr().out)["value"] == pytest.approx(2.2 * 0.048 / 2, rel=1e-12)


def test_solve_with_a_gas_and_a_decimal_comma(capsys: pytest.CaptureFixture[str]) -> None:
    words = [
        "solve",
        "real_density",
        "rho",
        "p=200,5 bar absolute",
        "T=15 °C",
        "--gas",
        "N2",
        "--decimal",
        ",",
        "--json",
    ]
    assert main(words) == 0
    assert json.loads(capsys.readouterr().out)["value"] == pytest.approx(223.66, abs=0.01)  # CoolProp 8.0.0


def test_plain_output_ends_with_the_working(capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["solve", "boyle", "V_2", "p_1=1.2 bar absolute", "V_1=48 L", "p_2=2 bar absolute"]) == 0
    assert "V₂ = p₁·V₁/p₂ = 1.2 bar·48 L/2 bar = 28.8 L" in capsys.readouterr().out


def test_state_of_a_gas(capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["gas", "nitrogen", "15 °C", "200 bar absolute", "--json"]) == 0
    # CoolProp 8.0.0 PropsSI("D", "T", 288.15, "P", 200e5, "Nitrogen"): 223.187
    assert json.loads(capsys.readouterr().out)["mass_density"] == pytest.approx(223.187, abs=0.0005)


def test_a_sheet_from_a_file(tmp_path: Path, capsys: pytest.CaptureFixture[str]) -> None:
    record = {"find": "t", "readings": NITROGEN}
    file = tmp_path / "bank.json"
    file.write_text(json.dumps(record), encoding="utf-8")
    assert main(["sheet", "bank_endurance", str(file), "--json"]) == 0
    facts = json.loads(capsys.readouterr().out)
    result = run_sheet("bank_endurance", record)
    assert (facts["value"], facts["safe"], facts["ideal"]) == (result.value, result.safe, result.ideal)
    assert len(facts["working"]) == len(result.working) > 5


ERRORS = [
    (
        ["solve", "boile", "V_2"],
        "law: found 'boile'; expected a key such as boyle",
    ),
    (
        ["solve", "boyle", "V_3"],
        "Boyle’s law: found 'V_3'; expected one of p_1, V_1, p_2, V_2. Correct the name.",
    ),
    (
        ["solve", "boyle", "V_2", "p_1"],
        "command line: found 'p_1'; expected name=value, such as p_1='6.5 psia'. Write each reading so.",
    ),
    (
        ["solve", "boyle", "V_2", "p_1=1 bar absolute"],
        "V₁, first volume: found nothing; expected a reading of volume. Type the reading, or ask for this row.",
    ),
    (
        ["gas", "nitrogen", "15 °C", "200 bar gauge"],
        "p: found 200 bar gauge; expected an absolute pressure. Add the station pressure to a gauge reading.",
    ),
    (["gas", "carbon dioxide", "15 °C", "200 bar absolute"], "Carbon dioxide: found 200 bar absolute at 15.00 °C"),
    (["sheet", "locked_in", "no such file"], "no such file: found "),
]


@pytest.mark.parametrize(("words", "message"), ERRORS, ids=[" ".join(words[:3]) for words, _ in ERRORS])
def test_errors_are_told_in_four_parts(words: list[str], message: str, capsys: pytest.CaptureFixture[str]) -> None:
    assert main(words) == 1
    said = capsys.readouterr()
    assert said.out == ""
    assert said.err.startswith(message)
    assert main([*words, "--json"]) == 1
    error = json.loads(capsys.readouterr().out)["error"]
    joined = f"{error['where']}: found {error['found']}; expected {error['expected']}. {error['todo']}"
    assert joined == said.err.rstrip("\n")


@pytest.mark.parametrize(
    ("text", "message"),
    [
        ("[]", "JSON that is not an object; expected find and readings. Correct the file."),
        ("{", "expected a JSON file with find and readings. Give another file."),
        ('{"readings": [1]}', "request, readings: found [1]; expected readings by row. Load the page again."),
        ("{}", "Gas: found nothing; expected a reading. Type the reading, or ask for this row."),
    ],
)
def test_a_file_that_is_no_record(text: str, message: str, tmp_path: Path, capsys: pytest.CaptureFixture[str]) -> None:
    file = tmp_path / "record.json"
    file.write_text(text, encoding="utf-8")
    assert main(["sheet", "locked_in", str(file)]) == 1
    assert message in capsys.readouterr().err


def test_a_question_is_offered_in_json(capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["solve", "boyle", "V_2", "p_1=1,234 bar absolute", "--json"]) == 1
    assert json.loads(capsys.readouterr().out)["error"]["offers"] == ["1.234 bar absolute", "1234 bar absolute"]
