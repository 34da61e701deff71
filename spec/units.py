"""Units of measurement with exact factors.

Takes dimensions and sources; gives one frozen Unit each. ``SI value = (reading + zero) * factor``.
Products such as kg/m³ or mbar·L/s are read from these by the engine, so only atoms and field words stand here.
"""

from fractions import Fraction

from spec import dimensions as dim
from spec.model import Citation, Unit
from spec.sources import FOOT_1959, SI_BROCHURE, SP811

SI = SI_BROCHURE.at("section 2.3 and tables 2 to 8")
B8 = SP811.at("appendix B.8")
YARD = FOOT_1959.at("yard and pound, exact")
G_N = Fraction("9.80665")
FOOT = Fraction("0.3048")
INCH = FOOT / 12
POUND = Fraction("0.45359237")
MERCURY = Fraction("13595.1") * G_N
MMHG = MERCURY / 1000
ATM = Fraction(101325)
PSI = POUND * G_N / INCH**2


def _unit(  # noqa: PLR0913 - one line for each unit of a long table
    key: str,
    dimension: dim.Dimension,
    factor: Fraction | str | int,
    ucum: str,
    source: Citation,
    *spellings: str,
    zero: Fraction | str | int = 0,
) -> Unit:
    return Unit(
        key=key,
        dimension=dimension,
        factor=Fraction(factor),
        ucum=ucum,
        source=source,
        zero=Fraction(zero),
        spellings=spellings,
    )


PRESSURE = (
    _unit("Pa", dim.PRESSURE, 1, "Pa", SI, "pascal"),
    _unit("hPa", dim.PRESSURE, 100, "hPa", SI),
    _unit("kPa", dim.PRESSURE, 1000, "kPa", SI, "kpa", "KPa"),
    _unit("MPa", dim.PRESSURE, 10**6, "MPa", SI, "Mpa"),
    _unit("bar", dim.PRESSURE, 10**5, "bar", SI, "Bar", "BAR", "bars"),
    _unit("mbar", dim.PRESSURE, 100, "mbar", SI, "mb", "millibar"),
    _unit("µbar", dim.PRESSURE, "0.1", "ubar", SI, "ubar", "μbar"),
    _unit("atm", dim.PRESSURE, ATM, "atm", B8, "atmosphere", "ata"),
    _unit("psi", dim.PRESSURE, PSI, "[psi]", B8, "PSI", "lbf/in2", "lb/in2", "lbs/in2"),
    _unit("torr", dim.PRESSURE, ATM / 760, "133.322368421 Pa", B8, "Torr", "TORR"),
    _unit("mtorr", dim.PRESSURE, ATM / 760000, "0.133322368421 Pa", B8, "mTorr", "micron"),
    _unit("mmHg", dim.PRESSURE, MMHG, "mm[Hg]", B8, "mm Hg", "mmhg"),
    _unit("cmHg", dim.PRESSURE, MMHG * 10, "cm[Hg]", B8, "cm Hg"),
    _unit("inHg", dim.PRESSURE, MERCURY * INCH, "[in_i'Hg]", B8, "in Hg", "in. Hg", "inhg", '"Hg', '" Hg', "in.Hg"),
    _unit(
        "inH2O", dim.PRESSURE, 1000 * G_N * INCH, "[in_i'H2O]", B8, "inH₂O", "in H2O", "inWC", "in WC", '"wc', "in wg"
    ),
    _unit("mmH2O", dim.PRESSURE, G_N, "mm[H2O]", B8, "mmH₂O", "mmWC", "mm WC", "mm wg"),
    _unit("inHg(60°F)", dim.PRESSURE, "3376.85", "3376.85 Pa", B8, "inHg(60F)"),
    _unit("inH2O(39.2°F)", dim.PRESSURE, "249.082", "249.082 Pa", B8, "inH2O(4°C)"),
    _unit("inH2O(60°F)", dim.PRESSURE, "248.84", "248.84 Pa", B8, "inH2O(60F)"),
    _unit("kgf/cm²", dim.PRESSURE, G_N * 10**4, "kgf/cm2", B8, "kgf/cm2", "kg/cm²", "kg/cm2", "at"),
)
TEMPERATURE = (
    _unit("K", dim.TEMPERATURE, 1, "K", SI, "kelvin"),
    _unit("°C", dim.TEMPERATURE, 1, "Cel", SI, "C", "degC", "deg C", "° C", "ºC", "℃", "Cel", zero="273.15"),
    _unit("°F", dim.TEMPERATURE, "5/9", "[degF]", B8, "F", "degF", "deg F", "° F", "ºF", "℉", zero="459.67"),
    _unit("°R", dim.TEMPERATURE, "5/9", "[degR]", B8, "degR", "deg R", "°Ra"),
)
SPACE = (
    _unit("m", dim.LENGTH, 1, "m", SI, "metre", "meter"),
    _unit("mm", dim.LENGTH, "1/1000", "mm", SI),
    _unit("cm", dim.LENGTH, "1/100", "cm", SI),
    _unit("dm", dim.LENGTH, "1/10", "dm", SI),
    _unit("km", dim.LENGTH, 1000, "km", SI),
    _unit("µm", dim.LENGTH, "1/1000000", "um", SI, "um", "μm"),
    _unit("nm", dim.LENGTH, "1/1000000000", "nm", SI),
    _unit("in", dim.LENGTH, INCH, "[in_i]", YARD, "inch"),
    _unit("ft", dim.LENGTH, FOOT, "[ft_i]", YARD, "foot", "feet"),
    _unit("L", dim.VOLUME, "1/1000", "L", SI, "l", "ℓ", "ltr", "lit", "litre", "liter", "litres", "liters"),
    _unit("mL", dim.VOLUME, "1/1000000", "mL", SI, "ml"),
    _unit("gal", dim.VOLUME, 231 * INCH**3, "[gal_us]", B8, "gal(US)", "USgal"),
)
MATTER = (
    _unit("kg", dim.MASS, 1, "kg", SI, "kilo", "kgs"),
    _unit("g", dim.MASS, "1/1000", "g", SI, "gram"),
    _unit("mg", dim.MASS, "1/1000000", "mg", SI),
    _unit("µg", dim.MASS, "1/1000000000", "ug", SI, "ug", "μg"),
    _unit("t", dim.MASS, 1000, "t", SI, "tonne"),
    _unit("lb", dim.MASS, POUND, "[lb_av]", YARD, "lbs", "lbm"),
    _unit("oz", dim.MASS, POUND / 16, "[oz_av]", YARD),
    _unit("mol", dim.AMOUNT, 1, "mol", SI, "mole", "moles"),
    _unit("mmol", dim.AMOUNT, "1/1000", "mmol", SI),
    _unit("µmol", dim.AMOUNT, "1/1000000", "umol", SI, "umol", "μmol"),
    _unit("kmol", dim.AMOUNT, 1000, "kmol", SI),
    _unit("lbmol", dim.AMOUNT, POUND * 1000, "453.59237 mol", B8, "lb-mol"),
)
TIME = (
    _unit("s", dim.TIME, 1, "s", SI, "sec", "second", "seconds"),
    _unit("ms", dim.TIME, "1/1000", "ms", SI),
    _unit("min", dim.TIME, 60, "min", SI, "mins", "minute", "minutes"),
    _unit("h", dim.TIME, 3600, "h", SI, "hr", "hrs", "hour", "hours"),
    _unit("d", dim.TIME, 86400, "d", SI, "day", "days"),
)
MECHANICS = (
    _unit("N", dim.FORCE, 1, "N", SI),
    _unit("kN", dim.FORCE, 1000, "kN", SI),
    _unit("lbf", dim.FORCE, POUND * G_N, "[lbf_av]", B8),
    _unit("kgf", dim.FORCE, G_N, "kgf", B8),
    _unit("J", dim.ENERGY, 1, "J", SI),
    _unit("kJ", dim.ENERGY, 1000, "kJ", SI),
    _unit("MJ", dim.ENERGY, 10**6, "MJ", SI),
    _unit("kWh", dim.ENERGY, 3600000, "kW.h", SI),
    _unit("mPa", dim.PRESSURE, "1/1000", "mPa", SI),
    _unit("µPa", dim.PRESSURE, "1/1000000", "uPa", SI, "uPa", "μPa"),
    _unit("cP", dim.VISCOSITY, "1/1000", "cP", B8),
    _unit("P", dim.VISCOSITY, "1/10", "P", B8),
)
NUMBERS = (
    _unit("1", dim.NUMBER, 1, "1", SI),
    _unit("%", dim.NUMBER, "1/100", "%", SI, "percent", "per cent"),
    _unit("‰", dim.NUMBER, "1/1000", "[ppth]", SI),
    _unit("ppm", dim.NUMBER, "1/1000000", "[ppm]", SI, "ppmv"),
    _unit("ppb", dim.NUMBER, "1/1000000000", "[ppb]", SI),
    _unit("rad", dim.NUMBER, 1, "rad", SI),
)

ALL = (*PRESSURE, *TEMPERATURE, *SPACE, *MATTER, *TIME, *MECHANICS, *NUMBERS)
