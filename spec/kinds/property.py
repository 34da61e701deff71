"""Kinds of quantity: properties of gases and devices."""

from fractions import Fraction

from spec import dimensions as dim
from spec.model import Kind

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
EXPANSION = Kind(
    key="expansion",
    title="expansion per kelvin",
    dimension=dim.NUMBER / dim.TEMPERATURE,
    si="1/K",
    units=("1/K",),
    low=1e-7,
    high=1e-2,
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
IMPINGEMENT = Kind(
    key="impingement",
    title="molecules per area and time",
    dimension=dim.NUMBER / (dim.AREA * dim.TIME),
    si="1/(m²·s)",
    units=("1/(m²·s)", "1/(cm²·s)"),
    low=1.0,
    high=1e40,
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
SPEED_DENSITY = Kind(
    key="speed_density",
    title="share of the molecules for each metre per second",
    dimension=dim.NUMBER / dim.SPEED,
    si="s/m",
    units=("s/m", "s/km"),
    low=1e-300,
    high=1e3,
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
VENTURI_CONSTANT = Kind(
    key="venturi_constant",
    title="calibration constant of a critical-flow venturi",
    dimension=dim.FLOW * dim.TEMPERATURE ** Fraction(1, 2) / dim.PRESSURE,
    si="m³·√K/(s·Pa)",
    units=("m³·√K/(s·Pa)", "m³·√K/(s·kPa)"),
    low=1e-12,
    high=1e3,
)
