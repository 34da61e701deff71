"""Kinds of quantity: temperature."""

from spec import dimensions as dim
from spec.model import Kind

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
CRITICAL_TEMPERATURE = Kind(
    key="critical_temperature",
    title="critical temperature",
    dimension=dim.TEMPERATURE,
    si="K",
    units=("K", "°C", "°F"),
    low=1.0,
    high=2000.0,
)
