"""Count a pressure from another zero, and question what an instrument's scale says about a reading.

Takes readings; gives SI values with their slope by the station pressure, or ReadingError. gaswright.law and
gaswright.sheet come next.
"""

from gaswright.errors import ReadingError
from gaswright.reading import Raw, Reading, read
from gaswright.tables import KINDS


def to_reference(reading: Reading, wanted: str, station: Reading | None) -> tuple[float, float]:
    """Give the value counted as ``wanted`` and its slope by the station pressure (1, -1 or 0).

    Raises ReadingError: no station pressure where one is needed, or less than no pressure at all.
    """
    have = reading.reference
    if reading is station:
        _refuse_counted(reading)
    if have == wanted or wanted in ("", "difference"):
        value, slope = reading.value, 0.0
    else:
        if station is None:
            raise ReadingError(
                reading.name,
                reading.text,
                "the station pressure to count it from",
                "Give the station pressure, or the absolute pressure.",
            )
        to_absolute = {"absolute": (1.0, 0.0), "gauge": (1.0, 1.0), "vacuum": (-1.0, 1.0)}[have]
        from_absolute = {"absolute": (1.0, 0.0), "gauge": (1.0, -1.0), "vacuum": (-1.0, 1.0)}[wanted]
        absolute = to_absolute[0] * reading.value + to_absolute[1] * station.value
        value = from_absolute[0] * absolute + from_absolute[1] * station.value
        slope = from_absolute[0] * to_absolute[1] + from_absolute[1]
    _refuse_below_zero(reading, station)
    return value, slope


def turn(reading: Reading, wanted: str) -> float:
    """Give how the value counted as ``wanted`` moves with the value as read: 1, or -1 into or out of a vacuum scale."""
    return -1.0 if (reading.reference == "vacuum") != (wanted == "vacuum") and wanted not in ("", "difference") else 1.0


def _refuse_below_zero(reading: Reading, station: Reading | None) -> None:
    if station is None or reading.reference not in ("gauge", "vacuum"):
        return
    absolute = station.value + (reading.value if reading.reference == "gauge" else -reading.value)
    if absolute < 0:
        is_gauge = reading.reference == "gauge"
        most = station.text.removesuffix(" absolute")
        limit = f"no lower than −{most} gauge" if is_gauge else f"no more than {most} vacuum"
        raise ReadingError(
            reading.name,
            reading.text,
            f"{limit}, which is no pressure at all",
            "Read the gauge and the station pressure again.",
        )


def questioned(reading: Reading) -> tuple[str, ...]:
    """Say what is unlikely about a reading: below a tenth of its instrument's span, where its class may not hold.

    Raises ReadingError where it is off the scale. A scale that does not start at zero has no such tenth.
    """
    if not reading.span:
        return ()
    low, high = reading.scale
    shown = -reading.value if reading.reference == "vacuum" and low < 0 else reading.value
    slack = 1e-9 * reading.span
    if not low - slack <= shown <= high + slack:
        raise ReadingError(
            reading.name,
            reading.text,
            f"a reading on the scale of {reading.instrument or 'the instrument'}",
            "Choose the instrument that was read, or read again.",
        )
    if low == 0 and shown < reading.span / 10:
        todo = "A gauge of smaller span reads it better."
        return (f"{reading.name}: {reading.text} is below a tenth of the span. {todo}",)
    return ()


def read_station(where: str, raw: Raw, decimal: str | None) -> Reading:
    """Give the station pressure as read; ReadingError where it is counted from the air around, as gauges count."""
    reading = read(where, raw, KINDS["station_pressure"], decimal)
    _refuse_counted(reading)
    return reading


def _refuse_counted(station: Reading) -> None:
    if station.reference != "absolute":
        raise ReadingError(station.name, station.text, "an absolute pressure", "Read the barometer at the place.")
