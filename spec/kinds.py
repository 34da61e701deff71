"""The kinds of quantity that variables have.

Takes dimensions; gives one frozen Kind each, with the units a page offers (the first is shown at the start) and the
range of the field in SI, inside which numeric solutions are sought and outside which a reading is refused.
"""

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
ABSOLUTE_TEMPERATURE = Kind(
    key="absolute_temperature",
    title="temperature",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("°C", "K", "°F", "°R"),
    low=1.0,
    high=6000.0,
    note="Kelvin: add 273.15 to degrees Celsius.",
)
CELSIUS_TEMPERATURE = Kind(
    key="celsius_temperature",
    title="Celsius temperature",
    dimension=dim.TEMPERATURE,
    si="Cel",
    units=("°C", "°F", "K"),
    low=-273.15,
    high=5726.85,
    note="Degrees Celsius: the difference from 273.15 K.",
)
TEMPERATURE_CONSTANT = Kind(
    key="temperature_constant",
    title="constant with the unit of temperature",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("K",),
    low=0.0,
    high=6000.0,
    note="Kelvin.",
)
VOLUME = Kind(
    key="volume",
    title="volume",
    dimension=dim.VOLUME,
    si="m³",
    units=("L", "m³", "mL", "cm³", "ft³", "in³"),
    low=1e-12,
    high=1e9,
)
REFERENCE_VOLUME = Kind(
    key="reference_volume",
    title="volume at reference conditions",
    dimension=dim.VOLUME,
    si="m³",
    units=("m³", "L", "mL", "ft³"),
    low=1e-12,
    high=1e12,
    note="Means nothing without its reference temperature and pressure.",
)
AMOUNT = Kind(
    key="amount",
    title="amount of substance",
    dimension=dim.AMOUNT,
    si="mol",
    units=("mol", "mmol", "kmol", "lbmol"),
    low=1e-15,
    high=1e12,
)
MASS = Kind(
    key="mass",
    title="mass",
    dimension=dim.MASS,
    si="kg",
    units=("kg", "g", "mg", "t", "lb", "oz"),
    low=1e-15,
    high=1e12,
)
MOLAR_MASS = Kind(
    key="molar_mass",
    title="molar mass",
    dimension=dim.MOLAR_MASS,
    si="kg/mol",
    units=("g/mol", "kg/mol", "kg/kmol"),
    low=1e-4,
    high=10.0,
)
MOLAR_VOLUME = Kind(
    key="molar_volume",
    title="molar volume",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("L/mol", "m³/mol", "m³/kmol", "cm³/mol", "ft³/lbmol"),
    low=1e-6,
    high=1e12,
)
DENSITY = Kind(
    key="density",
    title="mass density",
    dimension=dim.DENSITY,
    si="kg/m³",
    units=("kg/m³", "g/L", "g/cm³", "lb/ft³"),
    low=1e-15,
    high=3e4,
)
NUMBER = Kind(key="number", title="number", dimension=dim.NUMBER, si="1", units=("1",), low=1e-12, high=1e12)
RATIO = Kind(key="ratio", title="ratio", dimension=dim.NUMBER, si="1", units=("1", "%"), low=1e-9, high=1e9)
COMPRESSIBILITY = Kind(
    key="compressibility_factor",
    title="compressibility factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.02,
    high=20.0,
    note="1 is the ideal gas; the result says so where 1 was taken.",
)
COUNT = Kind(
    key="count",
    title="count",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-6,
    high=1e9,
    note="A whole number; one that is found is rounded the safe way and the fraction is shown.",
)
MOLECULES = Kind(
    key="molecules", title="number of molecules", dimension=dim.NUMBER, si="1", units=("1",), low=1.0, high=1e40
)
FORCE = Kind(
    key="force", title="force", dimension=dim.FORCE, si="N", units=("N", "kN", "lbf", "kgf"), low=1e-9, high=1e12
)
AREA = Kind(
    key="area", title="area", dimension=dim.AREA, si="m²", units=("cm²", "mm²", "m²", "in²", "ft²"), low=1e-15, high=1e9
)
LENGTH = Kind(
    key="length",
    title="length",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "mm", "cm", "km", "in", "ft"),
    low=1e-12,
    high=1e8,
)
ACCELERATION = Kind(
    key="acceleration",
    title="acceleration of free fall",
    dimension=dim.ACCELERATION,
    si="m/s²",
    units=("m/s²",),
    low=1.0,
    high=30.0,
)
SPEED = Kind(
    key="speed", title="speed", dimension=dim.SPEED, si="m/s", units=("m/s", "km/h", "ft/s"), low=1e-6, high=1e5
)
TIME = Kind(key="time", title="time", dimension=dim.TIME, si="s", units=("min", "h", "s", "d"), low=1e-9, high=1e12)
FLOW = Kind(
    key="flow",
    title="volume flow",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/min", "m³/h", "L/s", "m³/s", "mL/min", "cm³/min", "ft³/min", "ft³/h"),
    low=1e-15,
    high=1e6,
)
REFERENCE_FLOW = Kind(
    key="reference_flow",
    title="volume flow at reference conditions",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/min", "m³/h", "L/s", "m³/s", "mL/min", "cm³/min", "ft³/min", "ft³/h"),
    low=1e-15,
    high=1e6,
    note="Means nothing without its reference temperature and pressure.",
)
MOLAR_FLOW = Kind(
    key="molar_flow",
    title="amount per time",
    dimension=dim.MOLAR_FLOW,
    si="mol/s",
    units=("mol/s", "mol/h", "mmol/s"),
    low=1e-20,
    high=1e9,
)
MASS_FLOW = Kind(
    key="mass_flow",
    title="mass flow",
    dimension=dim.MASS_FLOW,
    si="kg/s",
    units=("kg/h", "kg/s", "g/s", "g/min", "lb/h"),
    low=1e-20,
    high=1e9,
)
VISCOSITY = Kind(
    key="viscosity",
    title="dynamic viscosity",
    dimension=dim.VISCOSITY,
    si="Pa·s",
    units=("µPa·s", "Pa·s", "mPa·s", "cP"),
    low=1e-8,
    high=1.0,
)
ATTRACTION = Kind(
    key="attraction",
    title="van der Waals attraction constant",
    dimension=dim.PRESSURE * dim.MOLAR_VOLUME**2,
    si="Pa·m⁶/mol²",
    units=("Pa·m⁶/mol²", "bar·L²/mol²", "atm·L²/mol²"),
    low=1e-6,
    high=100.0,
)

ALL = tuple(value for value in vars().values() if isinstance(value, Kind))
