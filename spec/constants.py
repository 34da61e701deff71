"""Constants of nature and convention, exact where the SI fixes them.

Takes sources; gives one frozen Constant each. No source, no constant.
"""

from fractions import Fraction

from spec import dimensions as dim
from spec.model import Constant
from spec.sources import CODATA, FOOT_1959, ICAO_ATMOSPHERE, ISO_80000_4, SI_BROCHURE, WMO_8

BOLTZMANN_CONSTANT = Constant(
    title="Boltzmann constant",
    value=Fraction("1.380649e-23"),
    unit="J/K",
    dimension=dim.ENERGY / dim.TEMPERATURE,
    source=SI_BROCHURE.at("section 2.2, defining constants, exact"),
)
AVOGADRO_CONSTANT = Constant(
    title="Avogadro constant",
    value=Fraction("6.02214076e23"),
    unit="1/mol",
    dimension=dim.NUMBER / dim.AMOUNT,
    source=SI_BROCHURE.at("section 2.2, defining constants, exact"),
)
MOLAR_GAS_CONSTANT = Constant(
    title="molar gas constant",
    value=Fraction("8.31446261815324"),
    unit="J/(mol·K)",
    dimension=dim.MOLAR_HEAT,
    source=CODATA.at("molar gas constant, exact product of k and N_A"),
)
STANDARD_GRAVITY = Constant(
    title="standard acceleration of free fall",
    value=Fraction("9.80665"),
    unit="m/s²",
    dimension=dim.ACCELERATION,
    source=ISO_80000_4.at("standard acceleration of free fall, 3rd CGPM 1901, exact"),
)
ICE_POINT = Constant(
    title="zero of the Celsius scale",
    value=Fraction("273.15"),
    unit="K",
    dimension=dim.TEMPERATURE,
    source=SI_BROCHURE.at("section 2.3.1, definition of Celsius temperature, exact"),
)
FREE_AIR_GRADIENT = Constant(
    title="free-air gradient of free fall",
    value=Fraction("3.086e-6"),
    unit="1/s²",
    dimension=dim.ACCELERATION / dim.LENGTH,
    source=WMO_8.at("part I, chapter 3, local acceleration of gravity"),
)
STANDARD_SEA_PRESSURE = Constant(
    title="pressure of the standard atmosphere at sea level",
    value=Fraction(101325),
    unit="Pa",
    dimension=dim.PRESSURE,
    source=ICAO_ATMOSPHERE.at("primary constants, exact"),
)
STANDARD_SEA_TEMPERATURE = Constant(
    title="temperature of the standard atmosphere at sea level",
    value=Fraction("288.15"),
    unit="K",
    dimension=dim.TEMPERATURE,
    source=ICAO_ATMOSPHERE.at("primary constants, exact"),
)
STANDARD_LAPSE_RATE = Constant(
    title="fall of temperature with height in the standard atmosphere, to 11 km",
    value=Fraction("0.0065"),
    unit="K/m",
    dimension=dim.TEMPERATURE / dim.LENGTH,
    source=ICAO_ATMOSPHERE.at("primary constants, exact"),
)
STANDARD_AIR_CONSTANT = Constant(
    title="specific gas constant of the standard atmosphere",
    value=Fraction("287.05287"),
    unit="J/(kg·K)",
    dimension=dim.ENERGY / (dim.MASS * dim.TEMPERATURE),
    source=ICAO_ATMOSPHERE.at("primary constants"),
)
INCH_LENGTH = Constant(
    title="inch, the distance of flange tappings",
    value=Fraction("0.0254"),
    unit="m",
    dimension=dim.LENGTH,
    source=FOOT_1959.at("yard and pound, exact"),
)
