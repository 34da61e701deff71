"""What a sheet questions about its readings, in words. No formula of the catalogue stands here.

Takes the SI values of the rows and the readings; gives texts. A sheet names the notes it wants; gaswright.sheet calls
them after the readings are in.
"""

from collections.abc import Callable

from gaswright.counting import questioned
from gaswright.errors import NoSolutionError
from gaswright.reading import Reading

Values = dict[str, float]
Readings = dict[str, Reading]

LARGE_CYLINDER = 0.150
FRESH = 4 * 3600.0


def capacity_each(values: Values, readings: Readings) -> tuple[str, ...]:
    """Question a water capacity above 150 L each: it may be the total of the pack."""
    if "V_each" in readings and values.get("V_each", 0.0) > LARGE_CYLINDER:
        return (
            f"{readings['V_each'].text} is large for one cylinder. Is it the total of the pack? Then the count is 1.",
        )
    return ()


def changeover_kept_back(values: Values, readings: Readings) -> tuple[str, ...]:
    """Say so where nothing is kept back, and refuse a pressure now that is not above the changeover pressure."""
    start, end = values.get("pg_start"), values.get("pg_end")
    if end is None:
        return ()
    if start is not None and start <= end:
        raise NoSolutionError(
            "Pressure now",
            readings["pg_start"].text,
            f"more than the changeover pressure {readings['pg_end'].text}",
            "The bank is already at changeover: change over, or read both again.",
        )
    return ("No changeover pressure is kept back.",) if end <= 0 else ()


def fresh_filling(values: Values, readings: Readings) -> tuple[str, ...]:
    """Warn of a cylinder still hot from filling (common practice, no source: four hours)."""
    del readings
    if "t_since" in values and values["t_since"] < FRESH:
        return ("Filled less than 4 h ago: the gas may still be hot. Measure its temperature on the cylinder wall.",)
    return ()


def gauge_low_on_scale(values: Values, readings: Readings) -> tuple[str, ...]:
    """Question readings below a tenth of their instrument's span."""
    del values
    return tuple(text for reading in readings.values() for text in questioned(reading))


NOTES: dict[str, Callable[[Values, Readings], tuple[str, ...]]] = {
    "capacity_each": capacity_each,
    "changeover_kept_back": changeover_kept_back,
    "fresh_filling": fresh_filling,
    "gauge_low_on_scale": gauge_low_on_scale,
}
