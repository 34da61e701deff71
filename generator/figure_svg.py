"""Draw a curve with its axes and marks as SVG: black on white, text of the size of the page, no style of its own.

Takes numbers in the units shown; gives SVG text for a page. Looks come from the style sheet by class, as the page's
Content-Security-Policy asks; the same numbers give the same bytes. Next: generator.figures, then the law's page.
"""

import math
from collections.abc import Sequence
from dataclasses import dataclass
from xml.etree.ElementTree import Element, SubElement, tostring

from gaswright.show import tidy

WIDTH, HEIGHT = 360, 300
LEFT, RIGHT, TOP, BOTTOM = 68, 334, 40, 232
MIDDLE = (LEFT + RIGHT) / 2
WORD = 90  # the width of a word at the size of the page
STEPS = 4
FULL = 0.85  # of the height: a curve above this leaves no room for words at the top
Point = tuple[float, float]


@dataclass(frozen=True, slots=True, kw_only=True)
class Figure:
    """A curve: its points, its axes in words with their units, points and upright lines that are marked by name."""

    title: str
    says: str
    along: str
    upright: str
    points: tuple[Point, ...]
    marks: tuple[tuple[Point, str], ...] = ()
    lines: tuple[tuple[float, str], ...] = ()


@dataclass(frozen=True, slots=True)
class Scale:
    """An axis: its ends in the unit shown and on the page, and the step of its ticks."""

    low: float
    high: float
    start: float
    end: float
    step: float

    def at(self, value: float) -> float:
        """Give the place of a value on the page."""
        return self.start + (value - self.low) / (self.high - self.low) * (self.end - self.start)

    def ticks(self) -> tuple[float, ...]:
        """Give the values that are written on the axis."""
        count = round((self.high - self.low) / self.step)
        return tuple(self.low + number * self.step for number in range(count + 1))


def scale_of(values: Sequence[float], start: float, end: float) -> Scale:
    """Give the scale that holds all values between round numbers; it starts at zero where nothing is below."""
    low, high = min(0.0, *values), max(values)
    rough = (high - low) / STEPS
    power = 10.0 ** math.floor(math.log10(rough))
    step = next(step * power for step in (1, 2, 2.5, 5, 10) if step * power >= rough * (1 - 1e-9))
    return Scale(step * math.floor(low / step + 1e-9), step * math.ceil(high / step - 1e-9), start, end, step)


def draw(figure: Figure, key: str) -> str:
    """Give the figure as an ``<svg>`` element; ``key`` keeps its ids apart from others."""
    xs = scale_of([x for x, _ in figure.points], LEFT, RIGHT)
    ys = scale_of([y for _, y in figure.points], BOTTOM, TOP)
    box = {"viewBox": f"0 0 {WIDTH} {HEIGHT}", "role": "img", "aria-labelledby": f"{key}-title {key}-says"}
    svg = Element("svg", box)
    SubElement(svg, "title", {"id": f"{key}-title"}).text = figure.title
    SubElement(svg, "desc", {"id": f"{key}-says"}).text = figure.says
    _axes(svg, figure, xs, ys)
    SubElement(svg, "path", {"class": "curve", "d": _path(figure.points, xs, ys)})
    _lines(svg, figure, xs, ys)
    _marks(svg, figure, xs, ys)
    return tostring(svg, encoding="unicode")


def _lines(svg: Element, figure: Figure, xs: Scale, ys: Scale) -> None:
    """Draw the upright lines, their words at the top, or at the foot where the curve fills the top."""
    is_full = max(y for _, y in figure.points) > FULL * ys.high
    for at, words in figure.lines:
        place = _number(xs.at(at))
        SubElement(svg, "path", {"class": "line", "d": f"M{place} {BOTTOM}V{TOP}"})
        _beside(svg, (xs.at(at), BOTTOM - 12 if is_full else TOP + 18), words, is_right=xs.at(at) < MIDDLE)


def _marks(svg: Element, figure: Figure, xs: Scale, ys: Scale) -> None:
    """Draw the points marked, their words where the curve does not go."""
    for (x, y), words in figure.marks:
        SubElement(svg, "circle", {"class": "mark", "cx": _number(xs.at(x)), "cy": _number(ys.at(y)), "r": "6"})
        falls, is_near_axis = _falls(figure.points, x), xs.at(x) < LEFT + WORD
        is_right = is_near_axis or (falls and xs.at(x) < MIDDLE)
        rise = 24 if falls and not is_right else -20 if is_near_axis and not falls else -8
        _beside(svg, (xs.at(x), ys.at(y) + rise), words, is_right=is_right)


def _axes(svg: Element, figure: Figure, xs: Scale, ys: Scale) -> None:
    grid = "".join(f"M{LEFT} {_number(ys.at(tick))}H{RIGHT}" for tick in ys.ticks())
    grid += "".join(f"M{_number(xs.at(tick))} {TOP}V{BOTTOM}" for tick in xs.ticks())
    SubElement(svg, "path", {"class": "grid", "d": grid})
    SubElement(svg, "path", {"class": "axis", "d": f"M{LEFT} {TOP}V{BOTTOM}H{RIGHT}"})
    for tick in ys.ticks():
        _text(svg, LEFT - 8, ys.at(tick) + 6, tidy(tick, 4), "end")
    for tick in xs.ticks():
        _text(svg, xs.at(tick), BOTTOM + 24, tidy(tick, 4), "middle")
    _text(svg, 2, 20, figure.upright, "start")
    _text(svg, RIGHT, HEIGHT - 14, figure.along, "end")


def _falls(points: Sequence[Point], at: float) -> bool:
    """Tell whether the curve falls at ``at``."""
    (_, one), (_, other) = sorted(sorted(points, key=lambda point: abs(point[0] - at))[:2])
    return other < one


def _beside(svg: Element, place: Point, words: str, *, is_right: bool) -> None:
    """Write words beside a mark."""
    _text(svg, place[0] + (10 if is_right else -10), place[1], words, "start" if is_right else "end")


def _text(svg: Element, x: float, y: float, words: str, anchor: str) -> None:
    SubElement(svg, "text", {"x": _number(x), "y": _number(y), "text-anchor": anchor}).text = words


def _path(points: Sequence[Point], xs: Scale, ys: Scale) -> str:
    return "M" + "L".join(f"{_number(xs.at(x))} {_number(ys.at(y))}" for x, y in points)


def _number(value: float) -> str:
    """Give a place on the page to a tenth of a unit."""
    return f"{round(value, 1) + 0.0:.1f}".removesuffix(".0")
