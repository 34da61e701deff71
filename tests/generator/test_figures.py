"""Figures of laws read back from their SVG: marks, peaks and kinks stand where published numbers put them.

NACA Report 1135: critical ratio 0.5283 for a heat ratio of 1.4. Maxwell: most molecules move at √(2RT/M).
"""

import math
from xml.etree.ElementTree import Element, fromstring

import pytest
from gaswright.find import relation as find_law

from generator.figure_svg import BOTTOM, HEIGHT, LEFT, RIGHT, TOP, WIDTH, Figure, draw, scale_of
from generator.figures import FIGURES, figure_of

R = 8.31446261815324
FOUND = {
    "boyle": "V_2",
    "ideal_gas": "n",
    "choked_flow": "q_m",
    "subsonic_flow": "q_m",
    "most_probable_speed": "v",
    "mean_speed": "v",
    "rms_speed": "v",
}


def parsed(key: str) -> Element:
    """Give the figure of a law's own example."""
    example = {name: text for name, text in find_law(key).example.items() if isinstance(text, str)}
    return fromstring(figure_of(key, FOUND.get(key, "e"), example))  # noqa: S314 - our own output


def texts(svg: Element) -> list[str]:
    """Give all that is written in a figure."""
    return [str(text.text) for text in svg.findall("text")]


def curve(svg: Element) -> list[tuple[float, float]]:
    """Give the points of the curve on the page."""
    (path,) = [path for path in svg.findall("path") if path.get("class") == "curve"]
    pairs = [pair.split(" ") for pair in str(path.get("d")).removeprefix("M").split("L")]
    return [(float(x), float(y)) for x, y in pairs]


def line(svg: Element) -> float:
    """Give the place of the upright line."""
    (path,) = [path for path in svg.findall("path") if path.get("class") == "line"]
    return float(str(path.get("d")).removeprefix("M").split(" ")[0])


def across(svg: Element) -> tuple[float, float]:
    """Give the ends of the axis along as written."""
    ticks = [text for text in svg.findall("text") if text.get("text-anchor") == "middle"]
    low, high = (float(str(tick.text).replace("−", "-").replace("\u202f", "")) for tick in (ticks[0], ticks[-1]))
    return low, high


def value_at(svg: Element, x: float) -> float:
    """Give what the axis along says at a place."""
    low, high = across(svg)
    return low + (x - LEFT) / (RIGHT - LEFT) * (high - low)


@pytest.mark.parametrize("key", sorted(FIGURES))
def test_every_figure_is_named_whole_and_without_style(key: str) -> None:
    """Role, title and description; nothing outside the frame; the same bytes again."""
    svg = parsed(key)
    assert svg.get("role") == "img"
    ids = str(svg.get("aria-labelledby")).split(" ")
    named = [svg.find("title"), svg.find("desc")]
    assert [each is not None and bool(each.text) and each.get("id") for each in named] == ids
    assert not [each for each in svg.iter() if "style" in each.attrib]
    points = curve(svg)
    assert len(points) > 60
    assert all(LEFT <= x <= RIGHT and TOP <= y <= BOTTOM for x, y in points)
    assert all(0 <= float(str(text.get("x"))) <= WIDTH for text in svg.findall("text"))
    assert all(0 < float(str(text.get("y"))) < HEIGHT for text in svg.findall("text"))
    example = {name: text for name, text in find_law(key).example.items() if isinstance(text, str)}
    assert figure_of(key, FOUND.get(key, "e"), example) == figure_of(key, FOUND.get(key, "e"), example)


@pytest.mark.parametrize("key", [key for key in sorted(FIGURES) if not key.endswith("_speed") and key != "choked_flow"])
def test_the_example_lies_on_the_curve(key: str) -> None:
    """Within half the distance of two points of the curve."""
    svg = parsed(key)
    (mark,) = svg.findall("circle")
    x, y = float(str(mark.get("cx"))), float(str(mark.get("cy")))
    assert min(math.hypot(x - one, y - other) for one, other in curve(svg)) < 4
    assert "example" in texts(svg)


def test_boyle_halves_the_pressure_at_twice_the_volume() -> None:
    """Product of both is the same all along, to the tenth of a unit that is drawn."""
    svg = parsed("boyle")
    _, high = across(svg)
    products = [(x - LEFT) / (RIGHT - LEFT) * high * (BOTTOM - y) for x, y in curve(svg)]
    assert min(products) == pytest.approx(max(products), rel=0.02)


def test_flow_is_level_up_to_the_critical_ratio() -> None:
    """0.5283 for nitrogen's 1.4, and nothing flows between equal pressures."""
    svg = parsed("choked_flow")
    assert value_at(svg, line(svg)) == pytest.approx(0.5283, abs=0.0005)
    points = curve(svg)
    heights = [y for x, y in points if x <= line(svg) + 0.1]
    assert len(heights) == 2
    assert heights[0] == pytest.approx(heights[1], abs=0.11)
    assert points[-1] == pytest.approx((RIGHT, BOTTOM), abs=1)


def test_speeds_stand_where_theory_puts_them() -> None:
    """The peak is at the most probable speed; the others lie above by √(4/π) and √(3/2)."""
    most = math.sqrt(2 * R * 285.15 / 0.028013)
    for key, factor in (
        ("most_probable_speed", 1),
        ("mean_speed", math.sqrt(4 / math.pi)),
        ("rms_speed", math.sqrt(1.5)),
    ):
        svg = parsed(key)
        assert value_at(svg, line(svg)) == pytest.approx(most * factor, rel=0.003)
        top, _ = min(curve(svg), key=lambda point: point[1])
        assert value_at(svg, top) == pytest.approx(most, rel=0.04)


def test_a_law_without_a_figure_has_none() -> None:
    """Most laws say more as a formula."""
    assert not figure_of("charles", "V_2", {})


@pytest.mark.parametrize(
    ("values", "ticks"),
    [
        ((0, 10), (0, 2.5, 5, 7.5, 10)),
        ((3, 40), (0, 10, 20, 30, 40)),
        ((3, 41), (0, 20, 40, 60)),
        ((-40, 60), (-50, -25, 0, 25, 50, 75)),
        ((0.0, 0.002), (0, 0.0005, 0.001, 0.0015, 0.002)),
    ],
)
def test_scales_end_at_round_numbers(values: tuple[float, ...], ticks: tuple[float, ...]) -> None:
    """From zero or the round number below, to the one above, in no more than four steps."""
    assert scale_of(values, LEFT, RIGHT).ticks() == pytest.approx(ticks)


def test_words_are_escaped() -> None:
    """A title with a tag in it stays text."""
    figure = Figure(title="a <b>", says="c & d", along="x", upright="y", points=((0, 0), (1, 1)))
    svg = draw(figure, "key")
    assert "a &lt;b&gt;" in svg
    assert fromstring(svg).findtext("desc") == "c & d"  # noqa: S314 - our own output
