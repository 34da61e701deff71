"""Figures of laws where a picture says more than the formula; every point is solved by the engine.

Takes a law's key and its example; gives SVG text, empty where a law has no figure. Next: generator.law_views.
"""

from collections.abc import Callable, Mapping

from gaswright.find import relation as find_law
from gaswright.law import Result, solve
from gaswright.quantity import in_unit
from gaswright.tables import KINDS

from generator.figure_svg import Figure, Point, draw
from generator.table_figures import value

POINTS = 80
EXAMPLE = "example"
SPEEDS = {"most_probable_speed": "most probable", "mean_speed": "mean", "rms_speed": "root mean square"}


def figure_of(key: str, unknown: str, example: Mapping[str, str]) -> str:
    """Give the figure of a law with the point of its example, or nothing."""
    if key not in FIGURES:
        return ""
    return draw(FIGURES[key](key, solve(key, unknown, example)), f"{key}-figure")


def shown(key: str, name: str, si: float, unit: str) -> float:
    """Give an SI value of a law's variable in ``unit``."""
    return in_unit(si, KINDS[find_law(key).variable(name).kind], unit)


def spread(low: float, high: float) -> tuple[float, ...]:
    """Give values from low to high, evenly spaced."""
    return tuple(low + (high - low) * number / POINTS for number in range(POINTS + 1))


def saturation(name: str, low: float, high: float) -> Callable[[str, Result], Figure]:
    """Give the drawer of a saturation curve by temperature ``name``, from low to high in the law's SI unit."""

    def make(key: str, result: Result) -> Figure:
        def point(at: float) -> Point:
            pressure = result.values["e"] if at == result.values[name] else value(key, "e", **{name: at})
            return shown(key, name, at, "°C"), shown(key, "e", pressure, "hPa")

        return Figure(
            title=find_law(key).title,
            says="Saturation pressure by temperature: it rises ever more steeply. The point is the example.",
            along="temperature, °C",
            upright="saturation pressure, hPa",
            points=tuple(map(point, spread(low, high))),
            marks=((point(result.values[name]), EXAMPLE),),
        )

    return make


def isotherm(volume: str, pressure: str, held: tuple[str, ...]) -> Callable[[str, Result], Figure]:
    """Give the drawer of pressure by volume at one temperature, with what is ``held`` as in the example."""

    def make(key: str, result: Result) -> Figure:
        known = {name: result.values[name] for name in held}
        middle = result.values[volume]

        def point(at: float) -> Point:
            found = value(key, pressure, **known, **{volume: at})
            return shown(key, volume, at, "L"), shown(key, pressure, found, "bar")

        return Figure(
            title=find_law(key).title,
            says="Pressure by volume at one temperature: half the volume, twice the pressure. "
            "The point is the example.",
            along="volume, L",
            upright="absolute pressure, bar",
            points=tuple(map(point, spread(middle / 3, middle * 3))),
            marks=((point(middle), EXAMPLE),),
        )

    return make


def flow(_key: str, result: Result) -> Figure:
    """Give the mass flow by the ratio of the pressures: it stays the same below the critical one."""
    held = {name: result.values[name] for name in ("C_d", "A", "p_0", "gamma", "M", "T_0")}
    critical = value("critical_ratio", "r", gamma=held["gamma"])
    choked = shown("choked_flow", "q_m", value("choked_flow", "q_m", **held), "g/s")

    def point(ratio: float) -> Point:
        subsonic = value("subsonic_flow", "q_m", **held, r=ratio)
        return ratio, shown("subsonic_flow", "q_m", subsonic, "g/s")

    own = result.values.get("r")
    return Figure(
        title="Flow by the ratio of the pressures",
        says="Mass flow by the pressure behind the hole over that before it: "
        "level up to the critical ratio, then falling to nothing where the pressures are equal.",
        along="pressure behind over before",
        upright="mass flow, g/s",
        points=((0.0, choked), *map(point, spread(critical * (1 + 1e-9), 1 - 1e-6))),
        lines=((critical, "critical"),),
        marks=() if own is None else ((point(own), EXAMPLE),),
    )


def speeds(key: str, result: Result) -> Figure:
    """Give the distribution of molecular speeds of the example, with the speed of the law marked."""
    held = {name: result.values[name] for name in ("T", "M")}
    own = result.values["v"]

    def point(speed: float) -> Point:
        share = value("speed_distribution", "f", **held, v=speed)
        return speed, shown("speed_distribution", "f", share, "s/km")

    return Figure(
        title="Molecules by speed",
        says="Share of the molecules for each kilometre per second of speed, by speed; "
        f"the upright line is the {SPEEDS[key]} speed of the example.",
        along="speed, m/s",
        upright="share, s/km",
        points=((0.0, 0.0), *map(point, spread(own / 100, own * 3))),
        lines=((own, SPEEDS[key]),),
    )


FIGURES: Mapping[str, Callable[[str, Result], Figure]] = {
    "boyle": isotherm("V_2", "p_2", ("p_1", "V_1")),
    "ideal_gas": isotherm("V", "p", ("n", "T")),
    "saturation_water_magnus": saturation("t", -40.0, 60.0),
    "saturation_ice_magnus": saturation("t", -65.0, 0.0),
    "saturation_water_iapws": saturation("T", 273.16, 373.15),
    "sublimation_ice_iapws": saturation("T", 213.15, 273.15),
    "choked_flow": flow,
    "subsonic_flow": flow,
    **dict.fromkeys(SPEEDS, speeds),
}
