"""The kinds of quantity that variables have.

Takes dimensions; gives one frozen Kind each, with the units a page offers (the first is shown at the start) and the
range of the field in SI, inside which numeric solutions are sought and outside which a reading is refused.
"""

from fractions import Fraction

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

ANGLE = Kind(
    key="angle",
    title="angle",
    dimension=dim.NUMBER,
    si="rad",
    units=("°", "rad"),
    low=1e-6,
    high=1.5707963267948966,
    note="Between 0 and 90 degrees.",
)
FRACTION = Kind(
    key="fraction",
    title="share by amount",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "ppm", "ppb", "1"),
    low=1e-12,
    high=1.0,
    note="Moles of one gas in one mole of all; by volume it is the same for ideal gases.",
)
HUMIDITY = Kind(
    key="humidity",
    title="relative humidity",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "1"),
    low=1e-9,
    high=10.0,
)
ENHANCEMENT = Kind(
    key="enhancement",
    title="enhancement factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.9,
    high=100.0,
    note="1 leaves out what the gas does to the vapour; the result says so where 1 was taken.",
)
SMALL_FACTOR = Kind(
    key="small_factor",
    title="small number of a formula",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-9,
    high=0.5,
)
COEFFICIENT = Kind(
    key="coefficient",
    title="coefficient of a device",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=10.0,
    note="From the calibration or the data of the device.",
)
HEAT_RATIO = Kind(
    key="heat_ratio",
    title="ratio of heat capacities",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.001,
    high=5.0,
    note="1.40 for nitrogen and air, 1.67 for helium and argon, 1.31 for methane, near 15 °C and 1 bar.",
)
MIXING = Kind(
    key="mixing",
    title="mixing factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.1,
    high=1.0,
    note="1 is perfect mixing.",
)
CRITICAL = Kind(
    key="critical_pressure_ratio",
    title="critical pressure ratio",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.1,
    high=0.607,
)
REYNOLDS = Kind(
    key="reynolds_number",
    title="Reynolds number",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.0,
    high=1e10,
)
ROUGHNESS = Kind(
    key="relative_roughness",
    title="relative roughness",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.0,
    high=0.1,
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
EXPANSION = Kind(
    key="expansion",
    title="expansion per kelvin",
    dimension=dim.NUMBER / dim.TEMPERATURE,
    si="1/K",
    units=("1/K",),
    low=1e-7,
    high=1e-2,
)
ALTITUDE = Kind(
    key="altitude",
    title="height above sea level",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "km", "ft"),
    low=-500.0,
    high=9e4,
)
COLUMN_HEIGHT = Kind(
    key="column_height",
    title="height of a column",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in", "ft"),
    low=-1e4,
    high=1e4,
)
SMALL_LENGTH = Kind(
    key="small_length",
    title="length of molecular size",
    dimension=dim.LENGTH,
    si="m",
    units=("nm", "µm", "mm", "m"),
    low=1e-11,
    high=1e6,
)
MOLECULE_MASS = Kind(
    key="molecule_mass",
    title="mass of one molecule",
    dimension=dim.MASS,
    si="kg",
    units=("kg", "g"),
    low=1e-28,
    high=1e-22,
)
ENERGY = Kind(
    key="energy",
    title="energy",
    dimension=dim.ENERGY,
    si="J",
    units=("MJ", "kJ", "J", "kWh"),
    low=1e-6,
    high=1e15,
)
MOLECULE_ENERGY = Kind(
    key="molecule_energy",
    title="energy of one molecule",
    dimension=dim.ENERGY,
    si="J",
    units=("J",),
    low=1e-24,
    high=1e-15,
)
SPECIFIC_ENERGY = Kind(
    key="specific_energy",
    title="energy of one kilogram",
    dimension=dim.ENERGY / dim.MASS,
    si="J/kg",
    units=("MJ/kg", "kJ/kg", "J/kg"),
    low=1e3,
    high=1e9,
)
SPECIFIC_GAS_CONSTANT = Kind(
    key="specific_gas_constant",
    title="gas constant of one kilogram",
    dimension=dim.ENERGY / (dim.MASS * dim.TEMPERATURE),
    si="J/(kg·K)",
    units=("J/(kg·K)",),
    low=10.0,
    high=1e4,
)
TEMPERATURE_DIFFERENCE = Kind(
    key="temperature_difference",
    title="temperature difference",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("K", "Δ°C", "Δ°F"),
    low=0.0,
    high=6000.0,
    note="A difference: nothing is added to it.",
)
WATER_TEMPERATURE = Kind(
    key="water_temperature",
    title="temperature between the triple and the critical point of water",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("°C", "K", "°F", "°R"),
    low=273.15,
    high=647.09,
    note="Kelvin: add 273.15 to degrees Celsius.",
)
ICE_TEMPERATURE = Kind(
    key="ice_temperature",
    title="temperature of ice",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("°C", "K", "°F", "°R"),
    low=50.0,
    high=273.16,
    note="Kelvin: add 273.15 to degrees Celsius.",
)
DEW_TEMPERATURE = Kind(
    key="dew_temperature",
    title="temperature of saturation over water",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("°C", "K", "°F", "°R"),
    low=173.15,
    high=373.15,
    note="Kelvin: add 273.15 to degrees Celsius.",
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
MASS_CONCENTRATION = Kind(
    key="mass_concentration",
    title="mass in a volume of gas",
    dimension=dim.DENSITY,
    si="kg/m³",
    units=("mg/m³", "µg/m³", "g/m³", "kg/m³", "lb/ft³"),
    low=1e-15,
    high=1e3,
)
MASS_RATIO = Kind(
    key="mass_ratio",
    title="share by mass",
    dimension=dim.NUMBER,
    si="1",
    units=("g/kg", "kg/kg", "1"),
    low=1e-12,
    high=1e6,
)
METER_CONSTANT = Kind(
    key="meter_constant",
    title="reference temperature over reference pressure",
    dimension=dim.TEMPERATURE / dim.PRESSURE,
    si="K/Pa",
    units=("K/mmHg", "°R/inHg", "K/kPa", "K/Pa"),
    low=1e-6,
    high=1.0,
)
FREQUENCY = Kind(
    key="frequency",
    title="turns per time",
    dimension=dim.NUMBER / dim.TIME,
    si="1/s",
    units=("r/s", "r/min"),
    low=1e-6,
    high=1e6,
)
LEAK_RATE = Kind(
    key="leak_rate",
    title="leak rate",
    dimension=dim.PRESSURE * dim.FLOW,
    si="Pa·m³/s",
    units=("mbar·L/s", "Pa·m³/s", "torr·L/s", "atm·cm³/s"),
    low=1e-15,
    high=1e9,
    note="Pressure times volume per time: it belongs to the temperature it was counted at.",
)
LEAK_RATE_EITHER_WAY = Kind(
    key="leak_rate_either_way",
    title="leak rate, out or in",
    dimension=dim.PRESSURE * dim.FLOW,
    si="Pa·m³/s",
    units=("mbar·L/s", "Pa·m³/s", "torr·L/s", "atm·cm³/s"),
    low=-1e9,
    high=1e9,
    note="Pressure times volume per time: it belongs to the temperature it was counted at.",
)
MOLAR_FLOW_EITHER_WAY = Kind(
    key="molar_flow_either_way",
    title="amount per time, out or in",
    dimension=dim.MOLAR_FLOW,
    si="mol/s",
    units=("mol/s", "mol/h", "mmol/s"),
    low=-1e9,
    high=1e9,
)
PUMP_SPEED = Kind(
    key="pump_speed",
    title="pumping speed or conductance",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/s", "m³/h", "m³/s", "L/min", "ft³/min"),
    low=1e-12,
    high=1e6,
    note="Volume at the pressure there, not at reference conditions.",
)
FRICTION = Kind(
    key="friction_factor",
    title="friction factor (Darcy)",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-4,
    high=1.0,
    note="Darcy’s: four times Fanning’s.",
)
IMPINGEMENT = Kind(
    key="impingement",
    title="molecules per area and time",
    dimension=dim.NUMBER / (dim.AREA * dim.TIME),
    si="1/(m²·s)",
    units=("1/(m²·s)", "1/(cm²·s)"),
    low=1.0,
    high=1e40,
)
SECOND_VIRIAL = Kind(
    key="second_virial",
    title="second virial coefficient",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("cm³/mol", "L/mol", "m³/mol"),
    low=-1e-2,
    high=1e-3,
)
LAPSE_RATE = Kind(
    key="lapse_rate",
    title="temperature gradient",
    dimension=dim.TEMPERATURE / dim.LENGTH,
    si="K/m",
    units=("K/km", "K/m"),
    low=-2e-2,
    high=2e-2,
)
ACCURACY_CLASS = Kind(
    key="accuracy_class",
    title="accuracy class",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=20.0,
    note="The class printed on the dial: per cent of the span.",
)
CHOKED_FACTOR = Kind(
    key="choked_factor",
    title="choked-flow factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.5,
    high=1.0,
    note="0.6847 at a heat capacity ratio of 1.40, 0.7262 at 1.667.",
)
HEIGHT = Kind(
    key="height",
    title="height above sea level, not below it",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "km", "ft"),
    low=1e-3,
    high=9e4,
)
LIFT = Kind(
    key="lift",
    title="lift",
    dimension=dim.FORCE,
    si="N",
    units=("N", "kN", "kgf", "lbf"),
    low=-1e9,
    high=1e9,
)
ANY_QUANTITY = Kind(
    key="any_quantity",
    title="quantity, the same kind in every row",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-12,
    high=1e12,
    note="The same kind in every row; type the unit behind the number.",
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
CRITICAL_TEMPERATURE = Kind(
    key="critical_temperature",
    title="critical temperature",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("K", "°C", "°F"),
    low=1.0,
    high=2000.0,
)
MOLECULAR_SPEED = Kind(
    key="molecular_speed",
    title="speed of a molecule",
    dimension=dim.SPEED,
    si="m/s",
    units=("m/s", "km/s"),
    low=0.0,
    high=1e6,
)
SPEED_DENSITY = Kind(
    key="speed_density",
    title="share of the molecules for each metre per second",
    dimension=dim.NUMBER / dim.SPEED,
    si="s/m",
    units=("s/m", "s/km"),
    low=1e-300,
    high=1e3,
)
FREEDOM = Kind(
    key="freedom",
    title="degrees of freedom",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.5,
    high=1e9,
)
SUBSONIC_RATIO = Kind(
    key="subsonic_ratio",
    title="pressure ratio below choking",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.2,
    high=0.9999999999,
)
CHOICE = Kind(
    key="choice",
    title="choice",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.0,
    high=10.0,
)
PLATE_BORE = Kind(
    key="plate_bore",
    title="bore of an orifice plate",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in"),
    low=1e-3,
    high=1.0,
)
PIPE_BORE = Kind(
    key="pipe_bore",
    title="bore of a metering pipe",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in"),
    low=1e-3,
    high=2.0,
)
ISENTROPIC = Kind(
    key="isentropic_exponent",
    title="isentropic exponent",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.0,
    high=1e9,
)
SHARE_OF_LIMIT = Kind(
    key="share_of_limit",
    title="share of a limit",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "1"),
    low=1e-9,
    high=1e3,
)
FACTOR = Kind(
    key="factor",
    title="factor of a rule",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=1e3,
    note="From the rule that asks for it, its source named.",
)
WORK = Kind(
    key="work",
    title="work",
    dimension=dim.ENERGY,
    si="J",
    units=("kJ", "J", "MJ", "kWh"),
    low=-1e15,
    high=1e15,
    note="Below zero: work is done on the gas.",
)
SCALED_LENGTH = Kind(
    key="scaled_length",
    title="scaled distance",
    dimension=dim.LENGTH / dim.MASS ** Fraction(1, 3),
    si="m/∛kg",
    units=("m/∛kg",),
    low=1e-3,
    high=1e4,
    note="Metres for each cube root of a kilogram of TNT.",
)
LATITUDE = Kind(
    key="latitude",
    title="latitude",
    dimension=dim.NUMBER,
    si="rad",
    units=("°", "rad"),
    low=0.0,
    high=1.5707963267948966,
    note="North or south alike.",
)
VENTURI_CONSTANT = Kind(
    key="venturi_constant",
    title="calibration constant of a critical-flow venturi",
    dimension=dim.FLOW * dim.TEMPERATURE ** Fraction(1, 2) / dim.PRESSURE,
    si="m³·√K/(s·Pa)",
    units=("m³·√K/(s·Pa)", "m³·√K/(s·kPa)"),
    low=1e-12,
    high=1e3,
)
KNUDSEN = Kind(
    key="knudsen_number",
    title="Knudsen number",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-9,
    high=1e9,
    note="Below 0.01 viscous, above 0.5 molecular flow, between them neither.",
)
ACENTRIC = Kind(
    key="acentric_factor",
    title="acentric factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=-0.5,
    high=1.5,
)
GAS_MOLAR_VOLUME = Kind(
    key="gas_molar_volume",
    title="molar volume of a gas",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("L/mol", "m³/mol", "cm³/mol"),
    low=1e-5,
    high=1e6,
)

ALL = tuple(value for value in vars().values() if isinstance(value, Kind))
