"""One deliberate mistake of each kind: every message in full, and the last good build left as it is.

Nothing here is a number of the trade; the expected texts are the contract with whoever writes the spec.
"""

import hashlib
import os
import shutil
import subprocess
import sys
from dataclasses import replace
from pathlib import Path

import pytest
import sympy

from generator.check import check
from generator.errors import SpecError
from generator.load import Case, Loaded
from generator.route import route_sheet
from generator.solve import solve_relation
from spec import kinds
from spec.model import Relation, Sheet, Use, Variable
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.b_simple import BOYLE, V_1, p_1
from spec.relations.g_real import VAN_DER_WAALS
from spec.sheets.locked_in import LOCKED_IN

ROOT = Path(__file__).resolve().parents[2]
CASE = Case(
    name="spec/cases/b_simple.toml, case 1",
    relation="boyle",
    find="V_2",
    given={"p_1": "1 bar", "V_1": "1 L", "p_2": "2 bar"},
    expect="0.5 L",
    source="a test",
    basis="common practice, no source",
)


def loaded(relation: Relation, *cases: Case) -> Loaded:
    """Give a spec of one family with one relation."""
    from spec.relations.b_simple import FAMILY  # noqa: PLC0415 - a family to hold it

    family = replace(FAMILY, relations=(relation,))
    return Loaded(families=(family,), sheets=(), kinds=(), units=(), gases=(), cases=cases)


def messages(spec: Loaded) -> list[str]:
    """Give the message of every mistake that check finds."""
    with pytest.raises(ExceptionGroup) as raised:
        check(spec)
    assert all(isinstance(mistake, SpecError) for mistake in raised.value.exceptions)
    return [str(mistake) for mistake in raised.value.exceptions]


def test_wrong_dimensions() -> None:
    """A side of another dimension names both dimensions."""
    assert messages(loaded(replace(BOYLE, left=p_1), CASE))[-1] == (
        "relation boyle: found a left side in kg m^-1 s^-2 and a right side in kg m^2 s^-2; expected the same "
        "dimension "
        "on both sides. correct the equation or the kinds of its variables"
    )


def test_a_sum_of_unlike_terms() -> None:
    """A sum of a pressure and a volume names the sum and both terms."""
    assert messages(loaded(replace(BOYLE, left=p_1 + V_1), CASE)) == [
        (
            "relation boyle, the sum V₁ + p₁: found a term in m^3 and a term in kg m^-1 s^-2; expected terms of one "
            "dimension. correct the equation or the kinds of its variables"
        )
    ]


def test_an_unbound_symbol() -> None:
    """A symbol that where does not explain is named."""
    stranger = sympy.Symbol("w", positive=True)
    assert messages(loaded(replace(BOYLE, left=BOYLE.left * stranger), CASE)) == [
        (
            "relation boyle: found the symbol w in the equation and not in where; expected a Variable or a "
            "Constant for "
            "every symbol. add w to where"
        )
    ]


def test_a_symbol_that_is_not_used() -> None:
    """A symbol in where that the equation lacks is named."""
    stranger = sympy.Symbol("w", positive=True)
    where = {**BOYLE.where, stranger: Variable(kinds.VOLUME, "a stranger")}
    assert messages(loaded(replace(BOYLE, where=where), CASE)) == [
        (
            "relation boyle: found w in where and not in the equation; expected only symbols of the equation. "
            "remove w or "
            "use it"
        )
    ]


def test_a_missing_source() -> None:
    """A relation without a source is refused."""
    assert messages(loaded(replace(BOYLE, source=None), CASE)) == [
        (
            "relation boyle: found no source for the relation; expected a work of spec/sources.py and a place "
            "in it. write "
            'source=WORK.at("equation or section")'
        )
    ]


def test_a_missing_case() -> None:
    """A law without a number from outside is refused."""
    assert messages(loaded(BOYLE)) == [
        (
            "relation boyle: found no case from outside; expected at least one case in spec/cases that is published or "
            "computed by an independent library. add a case with its source, or mark the relation as a balance or "
            "definition if it is one"
        )
    ]


def test_a_case_of_a_law_that_is_not_there() -> None:
    """A case that names another law says so."""
    stray = replace(CASE, relation="boile")
    assert messages(loaded(BOYLE, CASE, stray)) == [
        "spec/cases/b_simple.toml, case 1: found the relation boile; expected a key of the spec. correct the key"
    ]


def test_several_mistakes_come_together() -> None:
    """Every mistake is told at once."""
    assert len(messages(loaded(replace(BOYLE, source=None, left=p_1)))) == 4


def test_an_ambiguous_root() -> None:
    """A cubic without a named root is refused."""
    with pytest.raises(SpecError) as raised:
        solve_relation(replace(VAN_DER_WAALS, branches=()))
    assert str(raised.value) == (
        "relation van_der_waals, unknown V_m: found a polynomial of degree 3, which may have 3 roots; expected the "
        "physical root named. add Branch(unknown=V_m, root=..., why=...) to branches"
    )


def test_a_residual_that_rises_and_falls() -> None:
    """An unknown with two roots in the field's range, and no closed form, is refused."""
    x, y = sympy.symbols("x y", positive=True)
    peaked = replace(
        BOYLE,
        key="peaked",
        left=y,
        right=x * sympy.exp(-x),
        where={y: Variable(kinds.NUMBER, "height"), x: Variable(kinds.NUMBER, "place")},
        valid=(),
    )
    with pytest.raises(SpecError) as raised:
        solve_relation(peaked)
    assert str(raised.value) == (
        "relation peaked, unknown x: found a residual that rises and falls over the field's range, so two values may "
        "satisfy it; expected one root, or the physical root named. add Branch(unknown=x, root=..., why=...) to "
        "branches, or narrow the kind's range"
    )


def changed(sheet: Sheet, uses: tuple[Use, ...]) -> Sheet:
    """Give the sheet with other uses."""
    return replace(sheet, uses=uses)


def test_a_row_that_structure_cannot_find() -> None:
    """A question with one use too few names the row and the counts."""
    with pytest.raises(SpecError) as raised:
        route_sheet(changed(LOCKED_IN, LOCKED_IN.uses[:-1]), "pg_2")
    assert str(raised.value) == (
        "sheet locked_in, row pg_2: found 3 uses for 4 rows to work out, which do not determine one another; expected "
        "one use for each row that is worked out and for the row to find. add the relation that is missing, or take "
        "pg_2 out of finds"
    )


def test_a_row_that_stands_twice_in_a_use() -> None:
    """Uses that determine one another's rows twice over are refused, too."""
    twice = (*LOCKED_IN.uses[:-1], Use(GAUGE_PRESSURE, p_abs="p_1", p_gauge="pg_1", p_atm="p_atm"))
    with pytest.raises(SpecError, match="sheet locked_in, row pg_2: found 4 uses for 4 rows to work out"):
        route_sheet(changed(LOCKED_IN, twice), "pg_2")


def digest(folder: Path) -> str:
    """Give one digest of every file below a folder."""
    total = hashlib.sha256()
    for path in sorted(folder.rglob("*")):
        if path.is_file() and "__pycache__" not in path.parts:
            total.update(f"{path.relative_to(folder)}\0".encode() + path.read_bytes())
    return total.hexdigest()


@pytest.fixture(scope="module")
def copied(tmp_path_factory: pytest.TempPathFactory) -> Path:
    """Copy the tree with its last good build and its cache."""
    room = tmp_path_factory.mktemp("copy") / "project"
    room.mkdir()
    for name in ("spec", "generator", "site_src", "pyproject.toml"):
        source = ROOT / name
        if source.is_dir():
            ignored = shutil.ignore_patterns("__pycache__", "node_modules")
            shutil.copytree(source, room / name, ignore=ignored)
        else:
            shutil.copy(source, room / name)
    shutil.copytree(ROOT / "build", room / "build", ignore=shutil.ignore_patterns("next", "last", "__pycache__"))
    return room


def rebuild(root: Path) -> subprocess.CompletedProcess[str]:
    """Build the copied tree with this environment."""
    script = "import sys; from pathlib import Path; from generator.pipeline import build; build(Path(sys.argv[1]))"
    environment = {**os.environ, "PYTHONPATH": str(root), "PYTHONDONTWRITEBYTECODE": "1"}
    command = [sys.executable, "-P", "-c", script, str(root)]
    return subprocess.run(command, capture_output=True, text=True, env=environment, cwd=root, check=False)


BROKEN = {
    "dimensions": (
        "spec/relations/b_simple.py",
        "left=V_1 / T_1,",
        "left=V_1 * T_1,",
        (
            "relation charles: found a left side in m^3 K and a right side in m^3 K^-1; expected the same "
            "dimension on both "
            "sides. correct the equation or the kinds of its variables"
        ),
    ),
    "conditioning": (
        "spec/sheets/bank_endurance.py",
        '        Find(row="count",',
        (
            '        Find(row="p_atm", ask="station pressure", label="Station pressure", safe="low", unit="hPa"),\n'
            '        Find(row="count",'
        ),
        "sheet bank_endurance, row p_atm: found an answer that Demand alone",
    ),
}


@pytest.mark.parametrize(("name", "old", "new", "says"), BROKEN.values(), ids=BROKEN)
def test_a_broken_spec_leaves_the_last_good_build(copied: Path, name: str, old: str, new: str, says: str) -> None:
    """The build fails with the message, and engine, wheel and site stay byte for byte."""
    path = copied / name
    good = path.read_text(encoding="utf-8")
    assert old in good
    before = {part: digest(copied / "build" / part) for part in ("engine", "wheel", "site")}
    path.write_text(good.replace(old, new, 1), encoding="utf-8")
    try:
        result = rebuild(copied)
    finally:
        path.write_text(good, encoding="utf-8")
    assert result.returncode != 0
    assert says in result.stderr, result.stderr
    assert {part: digest(copied / "build" / part) for part in ("engine", "wheel", "site")} == before
