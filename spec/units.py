"""Units of measurement with exact factors.

Takes dimensions and sources; gives one frozen Unit each. ``SI value = (reading + zero) * factor``.
Products such as kg/m³ or mbar·L/s are read from these by the engine, so only atoms stand here; the words of the field
that are products (lpm), that carry reference conditions (Nm³) or that have two meanings (gal) are in spec.unit_words.
Spellings are compared without blanks and full stops, and without case where that leaves one meaning.
Next: generator.emit_tables writes them for gaswright.unit.
"""

import math
from fractions import Fraction

from spec import dimensions as dim
from spec.model import Citation, Source, Unit
from spec.sources import COMMON_PRACTICE, FOOT_1959, FROM_MEMORY, SI_BROCHURE, SP811, UCUM

TANAKA_2001 = Source(
    key="tanaka",
    work="Tanaka et al., Recommended table for the density of water, Metrologia 38 (2001) 301",
    note=FROM_MEMORY,
)
SI = SI_BROCHURE.at("section 2.3 and tables 2 to 8")
B8 = SP811.at("appendix B.8")
YARD = FOOT_1959.at("yard and pound, exact")
G_N = Fraction("9.80665")
FOOT = Fraction("0.3048")
INCH = FOOT / 12
POUND = Fraction("0.45359237")
MERCURY = Fraction("13595.1") * G_N
ATM = Fraction(101325)
PSI = POUND * G_N / INCH**2
WATER = 1000 * G_N
CALORIE_IT = Fraction("4.1868")
WATER_20 = Fraction("998.2067")
WATER_AT_20 = TANAKA_2001.at("density of air-free water at 20 °C, 101.325 kPa: 998.2067 kg/m³")
UCUM_PERCENT = UCUM.at("percent; the UCUM code does not say what is counted")
DEGREE = Fraction(math.pi) / 180  # π to the nearest double; every other factor is exact or as printed
POWER = dim.ENERGY / dim.TIME
PRINTED = SP811.at("appendix B.8, as printed there")
ROOT = SI_BROCHURE.at("section 2.3; UCUM has no roots, so its code is an annotation")
PRACTICE = COMMON_PRACTICE.at("named so in the trade")


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
    _unit("Pa", dim.PRESSURE, 1, "Pa", SI, "pascal", "pascals", "N/m2"),
    _unit("hPa", dim.PRESSURE, 100, "hPa", SI, "hectopascal"),
    _unit("kPa", dim.PRESSURE, 1000, "kPa", SI, "Kpa", "KPa", "kilopascal"),
    _unit("MPa", dim.PRESSURE, 10**6, "MPa", SI, "Mpa", "megapascal"),
    _unit("mPa", dim.PRESSURE, "1/1000", "mPa", SI, "millipascal"),
    _unit("µPa", dim.PRESSURE, "1/1000000", "uPa", SI, "uPa"),
    _unit("bar", dim.PRESSURE, 10**5, "bar", B8, "bars"),
    _unit("mbar", dim.PRESSURE, 100, "mbar", B8, "mb", "mbars", "millibar", "millibars"),
    _unit("µbar", dim.PRESSURE, "1/10", "ubar", B8, "ubar", "microbar"),
    _unit("atm", dim.PRESSURE, ATM, "atm", B8, "atmosphere", "atmospheres", "std atm"),
    _unit("at", dim.PRESSURE, G_N * 10**4, "att", B8, "technical atmosphere"),
    _unit("psi", dim.PRESSURE, PSI, "[psi]", B8, "lbf/in2", "lb/in2", "lbs/in2", "lbf/sq in", "lb/sq in"),
    _unit("ksi", dim.PRESSURE, PSI * 1000, "10*3.[psi]", B8),
    _unit("psf", dim.PRESSURE, PSI / 144, "[lbf_av]/[ft_i]2", B8, "lbf/ft2", "lb/ft2"),
    _unit("torr", dim.PRESSURE, ATM / 760, "atm/760", B8, "torrs"),
    _unit("mtorr", dim.PRESSURE, ATM / 760000, "atm/760000", B8, "mTorr", "millitorr"),
    _unit("µmHg", dim.PRESSURE, MERCURY / 10**6, "um[Hg]", B8, "umHg", "micron", "microns", "micron Hg"),
    _unit("mmHg", dim.PRESSURE, MERCURY / 1000, "mm[Hg]", B8, "mm of mercury", "mm mercury"),
    _unit("cmHg", dim.PRESSURE, MERCURY / 100, "cm[Hg]", B8, "cm of mercury"),
    _unit(
        "inHg",
        dim.PRESSURE,
        MERCURY * INCH,
        "[in_i'Hg]",
        B8,
        '"Hg',
        "inch Hg",
        "inches Hg",
        "inches of mercury",
        "inch of mercury",
        "in of mercury",
        "in mercury",
    ),
    _unit("inHg (32 °F)", dim.PRESSURE, "3386.38", "338638.10*-2.Pa", PRINTED, "inHg (0 °C)", "inHg (32F)"),
    _unit("inHg (60 °F)", dim.PRESSURE, "3376.85", "337685.10*-2.Pa", PRINTED, "inHg (60F)"),
    _unit("mmH2O", dim.PRESSURE, WATER / 1000, "mm[H2O]", B8, "mmWC", "mm WG", "mmAq", "mm of water", "mmWS"),
    _unit("cmH2O", dim.PRESSURE, WATER / 100, "cm[H2O]", B8, "cmWC", "cm WG", "cm of water"),
    _unit(
        "inH2O",
        dim.PRESSURE,
        WATER * INCH,
        "[in_i'H2O]",
        B8,
        "inWC",
        '"WC',
        "in WG",
        '"WG',
        '"H2O',
        "iwc",
        "iwg",
        "inches of water",
        "inch of water",
        "inches WC",
        "inches water column",
        "in water",
    ),
    _unit("ftH2O", dim.PRESSURE, WATER * FOOT, "[ft_i].m[H2O]/m", B8, "ftWC", "feet of water"),
    _unit("mmH2O (4 °C)", dim.PRESSURE, "9.80638", "980638.10*-5.Pa", PRINTED, "mmH2O (4C)"),
    _unit(
        "inH2O (4 °C)",
        dim.PRESSURE,
        "249.082",
        "249082.10*-3.Pa",
        PRINTED,
        "inH2O (39.2 °F)",
        "inH2O (4C)",
        "inH2O (39.2F)",
    ),
    _unit("inH2O (60 °F)", dim.PRESSURE, "248.84", "24884.10*-2.Pa", PRINTED, "inH2O (60F)"),
    _unit(
        "inH2O (20 °C)",
        dim.PRESSURE,
        WATER_20 * G_N * INCH,
        "2486406.10*-4.Pa",
        WATER_AT_20,
        "inH2O (68 °F)",
        "inH2O (20C)",
        "inH2O (68F)",
    ),
    _unit("mmH2O (20 °C)", dim.PRESSURE, WATER_20 * G_N / 1000, "978906.10*-5.Pa", WATER_AT_20, "mmH2O (20C)"),
)
TEMPERATURE = (
    _unit("K", dim.TEMPERATURE, 1, "K", SI, "k", "kelvin", "kelvins", "deg K", "°K"),
    _unit(
        "°C", dim.TEMPERATURE, 1, "Cel", SI, "C", "c", "°c", "deg C", "℃", "celsius", "degrees C", "Cel", zero="273.15"
    ),
    _unit(
        "°F",
        dim.TEMPERATURE,
        "5/9",
        "[degF]",
        B8,
        "F",
        "f",
        "°f",
        "deg F",
        "℉",
        "fahrenheit",
        "degrees F",
        zero="459.67",
    ),
    _unit("√K", dim.TEMPERATURE ** Fraction(1, 2), 1, "{sqrt(K)}", ROOT, "sqrt K", "sqrt(K)"),
    _unit("°R", dim.TEMPERATURE, "5/9", "[degR]", B8, "R", "deg R", "°Ra", "rankine"),
    _unit("Δ°C", dim.TEMPERATURE, 1, "K", SI, "ΔK", "delta K", "delta C", "delta °C", "K difference", "°C difference"),
    _unit("Δ°F", dim.TEMPERATURE, "5/9", "[degR]", B8, "delta F", "delta °F", "°F difference"),
)
SPACE = (
    _unit("m", dim.LENGTH, 1, "m", SI, "metre", "metres", "meter", "meters", "mtr"),
    _unit("mm", dim.LENGTH, "1/1000", "mm", SI, "millimetre", "millimeter"),
    _unit("cm", dim.LENGTH, "1/100", "cm", SI, "centimetre", "centimeter"),
    _unit("dm", dim.LENGTH, "1/10", "dm", SI, "decimetre", "decimeter"),
    _unit("km", dim.LENGTH, 1000, "km", SI, "kilometre", "kilometer"),
    _unit("µm", dim.LENGTH, "1/1000000", "um", SI, "um"),
    _unit("nm", dim.LENGTH, "1/1000000000", "nm", SI),
    _unit("in", dim.LENGTH, INCH, "[in_i]", YARD, "inch", "inches", '"'),
    _unit("ft", dim.LENGTH, FOOT, "[ft_i]", YARD, "foot", "feet"),
    _unit("yd", dim.LENGTH, FOOT * 3, "[yd_i]", YARD, "yard", "yards"),
    _unit("mi", dim.LENGTH, FOOT * 5280, "[mi_i]", YARD, "mile", "miles"),
    _unit("ha", dim.AREA, 10000, "har", SI, "hectare"),
    _unit("L", dim.VOLUME, "1/1000", "L", SI, "l", "ℓ", "ltr", "ltrs", "lit", "litre", "litres", "liter", "liters"),
    _unit("mL", dim.VOLUME, "1/1000000", "mL", SI, "ml", "millilitre", "milliliter", "millilitres", "milliliters"),
    _unit("cL", dim.VOLUME, "1/100000", "cL", SI),
    _unit("dL", dim.VOLUME, "1/10000", "dL", SI),
    _unit("hL", dim.VOLUME, "1/10", "hL", SI),
    _unit("µL", dim.VOLUME, "1/1000000000", "uL", SI, "uL"),
    _unit("US gal", dim.VOLUME, 231 * INCH**3, "[gal_us]", B8, "gal (US)", "gallon (US)", "US gallon", "US gallons"),
    _unit("imp gal", dim.VOLUME, "0.00454609", "[gal_br]", B8, "gal (UK)", "UK gal", "gal (imp)", "imperial gallon"),
)
MATTER = (
    _unit("kg", dim.MASS, 1, "kg", SI, "kgs", "kilo", "kilos", "kilogram", "kilograms"),
    _unit("∛kg", dim.MASS ** Fraction(1, 3), 1, "{cbrt(kg)}", ROOT, "cbrt kg", "cbrt(kg)"),
    _unit("g", dim.MASS, "1/1000", "g", SI, "gram", "grams", "gramme"),
    _unit("mg", dim.MASS, "1/1000000", "mg", SI, "milligram"),
    _unit("µg", dim.MASS, "1/1000000000", "ug", SI, "ug", "microgram"),
    _unit("t", dim.MASS, 1000, "t", SI, "tonne", "tonnes", "metric ton"),
    _unit("lb", dim.MASS, POUND, "[lb_av]", YARD, "lbs", "lbm", "pound", "pounds"),
    _unit("oz", dim.MASS, POUND / 16, "[oz_av]", YARD, "ounce", "ounces"),
    _unit("short ton", dim.MASS, POUND * 2000, "[ston_av]", B8, "ton (US)", "US ton"),
    _unit("long ton", dim.MASS, POUND * 2240, "[lton_av]", B8, "ton (UK)", "UK ton"),
    _unit("mol", dim.AMOUNT, 1, "mol", SI, "mole", "moles"),
    _unit("mmol", dim.AMOUNT, "1/1000", "mmol", SI),
    _unit("µmol", dim.AMOUNT, "1/1000000", "umol", SI, "umol"),
    _unit("kmol", dim.AMOUNT, 1000, "kmol", SI, "kgmol", "kg-mol", "kgmole"),
    _unit("lbmol", dim.AMOUNT, POUND * 1000, "[lb_av].kmol/kg", YARD, "lb-mol", "lb mole", "lbmole"),
)
TIME = (
    _unit("s", dim.TIME, 1, "s", SI, "sec", "secs", "second", "seconds"),
    _unit("ms", dim.TIME, "1/1000", "ms", SI),
    _unit("min", dim.TIME, 60, "min", SI, "Min", "mins", "minute", "minutes"),
    _unit("h", dim.TIME, 3600, "h", SI, "hr", "hrs", "hour", "hours"),
    _unit("d", dim.TIME, 86400, "d", SI, "day", "days"),
)
MECHANICS = (
    _unit("N", dim.FORCE, 1, "N", SI, "newton", "newtons"),
    _unit("kN", dim.FORCE, 1000, "kN", SI),
    _unit("mN", dim.FORCE, "1/1000", "mN", SI),
    _unit("lbf", dim.FORCE, POUND * G_N, "[lbf_av]", B8, "pound force"),
    _unit("kgf", dim.FORCE, G_N, "kgf", B8, "kp"),
    _unit("J", dim.ENERGY, 1, "J", SI, "joule", "joules"),
    _unit("kJ", dim.ENERGY, 1000, "kJ", SI, "KJ"),
    _unit("MJ", dim.ENERGY, 10**6, "MJ", SI),
    _unit("GJ", dim.ENERGY, 10**9, "GJ", SI),
    _unit("Wh", dim.ENERGY, 3600, "W.h", SI),
    _unit("kWh", dim.ENERGY, 3600000, "kW.h", SI, "KWH"),
    _unit("MWh", dim.ENERGY, 3600000000, "MW.h", SI),
    _unit("cal", dim.ENERGY, "4.184", "cal_th", B8, "calth", "calorie"),
    _unit("kcal", dim.ENERGY, 4184, "kcal_th", B8),
    _unit("cal (IT)", dim.ENERGY, CALORIE_IT, "cal_IT", B8, "calIT"),
    _unit("BTU", dim.ENERGY, CALORIE_IT * POUND * 1000 * 5 / 9, "[Btu_IT]", B8, "Btu", "btu", "BTU (IT)"),
    _unit("MMBTU", dim.ENERGY, CALORIE_IT * POUND * 10**9 * 5 / 9, "10*6.[Btu_IT]", PRACTICE, "MMBtu"),
    _unit("W", POWER, 1, "W", SI, "watt", "watts"),
    _unit("kW", POWER, 1000, "kW", SI, "KW"),
    _unit("mW", POWER, "1/1000", "mW", SI),
    _unit("MW", POWER, 10**6, "MW", SI),
    _unit("hp", POWER, 550 * FOOT * POUND * G_N, "[HP]", B8, "horsepower"),
    _unit("P", dim.VISCOSITY, "1/10", "P", B8, "poise"),
    _unit("cP", dim.VISCOSITY, "1/1000", "cP", B8, "cps", "centipoise"),
    _unit("µP", dim.VISCOSITY, "1/10000000", "uP", B8, "uP", "micropoise"),
)
NUMBERS = (
    _unit("1", dim.NUMBER, 1, "1", SI),
    _unit("%", dim.NUMBER, "1/100", "%", SI, "percent", "per cent", "pct"),
    _unit("‰", dim.NUMBER, "1/1000", "[ppth]", SI, "permille", "per mille"),
    _unit("ppm", dim.NUMBER, "1/1000000", "[ppm]", SI, "ppmv", "ppm vol", "vpm"),
    _unit("ppb", dim.NUMBER, "1/1000000000", "[ppb]", SI, "ppbv", "ppb vol"),
    _unit("mol %", dim.NUMBER, "1/100", "%", UCUM_PERCENT, "mole %", "% mol", "mole percent"),
    _unit("vol %", dim.NUMBER, "1/100", "%", UCUM_PERCENT, "% vol", "% v/v", "volume %", "% by volume"),
    _unit("wt %", dim.NUMBER, "1/100", "%", UCUM_PERCENT, "% wt", "% w/w", "mass %"),
    _unit("rad", dim.NUMBER, 1, "rad", SI, "radian", "radians"),
    _unit("r", dim.NUMBER, 1, "{rev}", SI, "rev", "turn", "turns"),
    _unit("°", dim.NUMBER, DEGREE, "deg", SI, "deg", "degree", "degrees"),
)

ALL = (*PRESSURE, *TEMPERATURE, *SPACE, *MATTER, *TIME, *MECHANICS, *NUMBERS)
