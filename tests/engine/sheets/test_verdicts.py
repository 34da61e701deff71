"""PASS, FAIL or CANNOT DECIDE on both sides of a limit (JCGM 106:2012, guarded acceptance and rejection)."""

import re

import pytest

from tests.engine.sheets.asking import ask

LOWER = [(-3.0, "PASS"), (-1.01, "PASS"), (-0.99, "CANNOT DECIDE"), (0.99, "CANNOT DECIDE"), (1.01, "FAIL")]


@pytest.mark.parametrize(("widths", "word"), LOWER)
def test_a_content_against_what_was_ordered(widths: float, word: str) -> None:
    free = ask("cylinder_receipt", "V_ref", {"V_ordered": None})
    limit = free["value"] + widths * free["expanded"]
    held = ask("cylinder_receipt", "V_ref", {"V_ordered": limit})
    assert free["verdict"] is None
    assert held["verdict"]["word"] == word
    assert held["value"] == free["value"]


@pytest.mark.parametrize(("widths", "word"), [(-side, word) for side, word in LOWER])
def test_a_pressure_against_the_weakest_rating(widths: float, word: str) -> None:
    free = ask("locked_in", "pg_2", {"pg_rating": None})
    held = ask("locked_in", "pg_2", {"pg_rating": free["value"] + widths * free["expanded"]})
    assert held["verdict"]["word"] == word


@pytest.mark.parametrize(
    ("rating", "says"),
    [
        ("210 bar gauge", "weakest rating 210 bar gauge; the safe end is {figure}."),
        ("190 bar gauge", "weakest rating 190 bar gauge; exceeded even at the favourable end of the uncertainty."),
    ],
)
def test_the_verdict_in_words(rating: str, says: str) -> None:
    response = ask("locked_in", "pg_2", {"pg_rating": rating})
    figure = response["figure"]["text"].removesuffix(" gauge")
    assert response["verdict"]["says"] == says.format(figure=figure)


def test_what_would_decide_is_worked_out() -> None:
    free = ask("bank_endurance", "t", {"t_needed": None})
    asked = ask("bank_endurance", "t", {"t_needed": free["value"] - free["expanded"] / 4})
    assert asked["verdict"]["word"] == "CANNOT DECIDE"
    times = re.search(r"An uncertainty ([\d.]+) times smaller would decide; (.+) contributes", asked["verdict"]["says"])
    assert times
    assert float(times[1]) == pytest.approx(4, rel=0.05)
    assert times[2] == asked["shares"][0]["label"]


def test_on_the_limit_itself_nothing_decides() -> None:
    free = ask("bank_endurance", "t", {"t_needed": None})
    asked = ask("bank_endurance", "t", {"t_needed": free["value"]})
    assert asked["verdict"]["word"] == "CANNOT DECIDE"
    assert asked["verdict"]["says"].endswith("The best estimate stands on the limit itself: no instrument decides it.")
