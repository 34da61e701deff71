"""Kinds of quantity: pressure."""

from spec import dimensions as dim
from spec.model import Kind

ABSOLUTE_PRESSURE = Kind(
    key="absolute_pressure",
    title="absolute pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="absolute",
    units=("bar", "kPa", "MPa", "mbar", "hPa", "psi", "Pa", "atm", "torr", "mmHg", "inHg", "inH2O", "kgf/cm²"),
    low=1e-9,
    high=1e9,
    note="A gauge reading needs the station pressure added first.",
)
GAUGE_PRESSURE = Kind(
    key="gauge_pressure",
    title="gauge pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="gauge",
    units=("bar", "kPa", "MPa", "mbar", "psi", "Pa", "inHg", "inH2O", "mmHg", "kgf/cm²"),
    low=-2e5,
    high=1e9,
    note="Counted from the station pressure; never below minus the station pressure.",
)
VACUUM_PRESSURE = Kind(
    key="vacuum_pressure",
    title="vacuum below the station pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="vacuum",
    units=("mbar", "inHg", "kPa", "mmHg", "bar", "Pa"),
    low=0.0,
    high=2e5,
    note="Counted down from the station pressure; never more than the station pressure.",
)
STATION_PRESSURE = Kind(
    key="station_pressure",
    title="station pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="absolute",
    units=("hPa", "mbar", "kPa", "mmHg", "inHg", "bar", "atm", "Pa"),
    low=1e4,
    high=1.5e5,
    note="The barometer at the place itself, never the sea-level report.",
)
PRESSURE_DIFFERENCE = Kind(
    key="pressure_difference",
    title="pressure difference",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="difference",
    units=("mbar", "Pa", "kPa", "bar", "psi", "inH2O", "mmHg", "mmH2O"),
    low=0.0,
    high=1e9,
    note="A difference needs no station pressure.",
)
PRESSURE_CHANGE = Kind(
    key="pressure_change",
    title="pressure change",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="difference",
    units=("mbar", "Pa", "kPa", "bar", "psi", "inH2O", "mmHg"),
    low=-1e9,
    high=1e9,
    note="A difference needs no station pressure.",
)
VAPOUR_PRESSURE = Kind(
    key="vapour_pressure",
    title="vapour pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="absolute",
    units=("hPa", "mbar", "kPa", "Pa", "torr", "mmHg", "inHg", "psi", "bar"),
    low=1e-9,
    high=2.3e7,
    note="The share of the pressure that the vapour bears: always absolute.",
)
VESSEL_PRESSURE = Kind(
    key="vessel_pressure",
    title="absolute pressure of a vessel under test",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="absolute",
    units=("bar", "kPa", "MPa", "psi", "mbar", "Pa", "atm"),
    low=5e4,
    high=1e9,
    note="A gauge reading needs the station pressure added first.",
)
PRESSURE_SQUARED = Kind(
    key="pressure_squared",
    title="difference of squared pressures",
    dimension=dim.PRESSURE**2,
    si="Pa²",
    units=("bar²", "kPa²", "Pa²", "MPa²"),
    low=1e-6,
    high=1e18,
    note="From absolute pressures: the square upstream less the square downstream.",
)
CRITICAL_PRESSURE = Kind(
    key="critical_pressure",
    title="critical pressure",
    dimension=dim.PRESSURE,
    si="Pa",
    reference="absolute",
    units=("bar", "MPa", "kPa", "atm", "psi", "Pa"),
    low=1e5,
    high=1e9,
)
