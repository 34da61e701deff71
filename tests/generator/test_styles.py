"""Styles: sizes and contrasts computed from the style sheets as they ship.

Contrast is that of WCAG 2.2 (relative luminance, section "contrast ratio"); 7:1 is its level AAA for text of any size.
What a page really shows is measured in the browsers; here no rule may even ask for less.
"""

import re
from itertools import product
from pathlib import Path

import pytest

STYLES = Path(__file__).parents[2] / "site_src/theme/css"
SCREEN = ("tokens.css", "page.css", "sheet.css", "tables.css")
LEAST_TEXT_PX = 18
LEAST_TARGET_PX = 45
ROOT_PX = 16
# Text colours with the grounds they may stand on; a rule that pairs others fails below.
GROUNDS = {
    "ink": {"paper", "card", "find"},
    "soft": {"paper", "card"},
    "link": {"paper", "card"},
    "warn": {"warn-ground", "card"},
    "stop": {"stop-ground", "card"},
    "reverse": {"ink", "stop"},
}


def read(name: str) -> str:
    """A style sheet without its comments."""
    return re.sub(r"/\*.*?\*/", "", (STYLES / name).read_text(encoding="utf-8"), flags=re.DOTALL)


def list_rules() -> list[tuple[str, str]]:
    """Selector and declarations of every rule for the screen, rules inside @media included."""
    return [
        (selector.strip(), body)
        for name in SCREEN
        for selector, body in re.findall(r"([^{};]+)\{([^{}]*)\}", read(name))
    ]


TOKENS = dict(re.findall(r"--([a-z-]+):\s*(#[0-9a-f]{6})", read("tokens.css")))


def luminance(colour: str) -> float:
    """Relative luminance of "#rrggbb", 0 to 1."""
    channels = [int(colour[start : start + 2], 16) / 255 for start in (1, 3, 5)]
    linear = [channel / 12.92 if channel <= 0.04045 else ((channel + 0.055) / 1.055) ** 2.4 for channel in channels]
    return 0.2126 * linear[0] + 0.7152 * linear[1] + 0.0722 * linear[2]


def contrast(one: str, other: str) -> float:
    """Contrast ratio of two colours, 1 to 21."""
    dark, light = sorted((luminance(one), luminance(other)))
    return (light + 0.05) / (dark + 0.05)


def test_contrast_is_that_of_the_standard() -> None:
    """Black on white is 21:1, and #767676 on white 4.54:1 (the standard's own and its best known border case)."""
    assert contrast("#000000", "#ffffff") == pytest.approx(21)
    assert contrast("#767676", "#ffffff") == pytest.approx(4.54, abs=0.005)


@pytest.mark.parametrize(
    ("text", "ground"), [pair for text, grounds in GROUNDS.items() for pair in product([text], sorted(grounds))]
)
def test_text_keeps_seven_to_one(text: str, ground: str) -> None:
    """Readable in the sun."""
    assert contrast(TOKENS[text], TOKENS[ground]) >= 7


def test_rules_pair_only_what_was_measured() -> None:
    """A rule that sets both colours sets a pair of the table above."""
    for selector, body in list_rules():
        text = re.search(r"(?<![-a-z])color:\s*var\(--([a-z-]+)\)", body)
        ground = re.search(r"background(?:-color)?:\s*var\(--([a-z-]+)\)", body)
        if text and ground:
            assert ground[1] in GROUNDS[text[1]], selector
        elif text:
            assert text[1] in GROUNDS, selector


def test_colours_come_from_the_tokens_alone() -> None:
    """A colour written elsewhere would escape the measurement."""
    for name in SCREEN[1:]:
        outside_pictures = re.sub(r'url\("data:[^"]*"\)', "", read(name))
        assert not re.findall(r"#[0-9a-f]{3,8}\b|\brgba?\(|\bhsla?\(|\bopacity:\s*0?\.", outside_pictures), name


def list_sizes() -> list[tuple[str, float, str]]:
    """Selector, number and unit of every size of text that a rule sets."""
    sizes = []
    for selector, body in list_rules():
        for value in re.findall(r"font(?:-size)?:\s*([^;]+)", body):
            sizes += [
                (selector, float(number), unit) for number, unit in re.findall(r"([\d.]+)(px|rem|em|%|pt)", value)[:1]
            ]
    return sizes


def test_no_rule_asks_for_small_text() -> None:
    """18 px and up; relative sizes never shrink what they stand in."""
    assert len(list_sizes()) > 15
    least = {"px": LEAST_TEXT_PX, "rem": LEAST_TEXT_PX / ROOT_PX, "em": 1, "%": 100}
    small = [(selector, f"{number}{unit}") for selector, number, unit in list_sizes() if number < least[unit]]
    assert not small


def test_targets_are_for_gloves() -> None:
    """Fields, lists of choices, buttons and links are at least 12 mm (45 px) high."""
    target = re.search(r"--target:\s*([\d.]+)rem", read("tokens.css"))
    assert target
    assert float(target[1]) * ROOT_PX >= LEAST_TARGET_PX
    tall = [selector for selector, body in list_rules() if "min-height: var(--target)" in body]
    assert {"input, select, button, .go", "main a, .end a"} <= set(tall)
