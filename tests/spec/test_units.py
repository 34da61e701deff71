"""The table of units against independent ones: pint, scipy.constants, CoolProp's water, and printed factors.

pint 0.26.2 and scipy 1.18.1 hold their own tables. Printed factors are those of NIST SP 811 (2008), appendix B.8,
and of the works named beside each; digits of SP 811 are from memory.
"""

import math
from fractions import Fraction

import pint
import pytest
from CoolProp.CoolProp import PropsSI
from scipy import constants

from generator.emit_tables import compact, emit_tables, forms, spellings
from generator.errors import SpecError
from spec import kinds
from spec.model import Unit
from spec.unit_words import ASKED_PAIR, PRODUCTS, QUESTIONS, WITH_PAIR
from spec.units import ALL

UNITS = {unit.key: unit for unit in ALL}
REGISTRY = pint.UnitRegistry()

PINT = {
    "Pa": "pascal",
    "hPa": "hectopascal",
    "kPa": "kilopascal",
    "MPa": "megapascal",
    "mPa": "millipascal",
    "µPa": "micropascal",
    "bar": "bar",
    "mbar": "millibar",
    "µbar": "microbar",
    "atm": "standard_atmosphere",
    "at": "technical_atmosphere",
    "psi": "psi",
    "ksi": "ksi",
    "psf": "force_pound / foot ** 2",
    "torr": "torr",
    "mtorr": "millitorr",
    "µmHg": "micrometer_Hg",
    "mmHg": "millimeter_Hg",
    "cmHg": "centimeter_Hg",
    "inHg": "inch_Hg",
    "K": "kelvin",
    "√K": "kelvin ** 0.5",
    "∛kg": "kilogram ** (1 / 3)",
    "°C": "delta_degree_Celsius",
    "°F": "delta_degree_Fahrenheit",
    "°R": "degree_Rankine",
    "Δ°C": "delta_degree_Celsius",
    "Δ°F": "delta_degree_Fahrenheit",
    "m": "meter",
    "mm": "millimeter",
    "cm": "centimeter",
    "dm": "decimeter",
    "km": "kilometer",
    "µm": "micrometer",
    "nm": "nanometer",
    "in": "inch",
    "ft": "foot",
    "yd": "yard",
    "mi": "mile",
    "ha": "hectare",
    "L": "liter",
    "mL": "milliliter",
    "cL": "centiliter",
    "dL": "deciliter",
    "hL": "hectoliter",
    "µL": "microliter",
    "US gal": "gallon",
    "imp gal": "imperial_gallon",
    "kg": "kilogram",
    "g": "gram",
    "mg": "milligram",
    "µg": "microgram",
    "t": "metric_ton",
    "lb": "pound",
    "oz": "ounce",
    "short ton": "short_ton",
    "long ton": "long_ton",
    "mol": "mole",
    "mmol": "millimole",
    "µmol": "micromole",
    "kmol": "kilomole",
    "lbmol": "mole * pound / gram",
    "s": "second",
    "ms": "millisecond",
    "min": "minute",
    "h": "hour",
    "d": "day",
    "N": "newton",
    "kN": "kilonewton",
    "mN": "millinewton",
    "lbf": "force_pound",
    "kgf": "force_kilogram",
    "J": "joule",
    "kJ": "kilojoule",
    "MJ": "megajoule",
    "GJ": "gigajoule",
    "Wh": "watt_hour",
    "kWh": "kilowatt_hour",
    "MWh": "megawatt_hour",
    "cal": "calorie",
    "kcal": "kilocalorie",
    "cal (IT)": "international_calorie",
    "W": "watt",
    "kW": "kilowatt",
    "mW": "milliwatt",
    "MW": "megawatt",
    "hp": "horsepower",
    "P": "poise",
    "cP": "centipoise",
    "µP": "micropoise",
    "1": "dimensionless",
    "%": "percent",
    "‰": "permille",
    "ppm": "ppm",
    "ppb": "ppm / 1000",
    "mol %": "percent",
    "vol %": "percent",
    "wt %": "percent",
    "rad": "radian",
    "r": "count",
    "°": "degree",
}
# Units that pint has not, or has by another definition: they stand in PRINTED or SCIPY below.
NOT_IN_PINT = {
    "inHg (32 °F)",
    "inHg (60 °F)",
    "mmH2O",
    "cmH2O",
    "inH2O",
    "ftH2O",
    "mmH2O (4 °C)",
    "inH2O (4 °C)",
    "inH2O (60 °F)",
    "inH2O (20 °C)",
    "mmH2O (20 °C)",
    "BTU",
    "MMBTU",
}
SCIPY = {
    "atm": constants.atm,
    "bar": constants.bar,
    "torr": constants.torr,
    "psi": constants.psi,
    "mmHg": 133.322387415,
    "in": constants.inch,
    "ft": constants.foot,
    "yd": constants.yard,
    "mi": constants.mile,
    "US gal": constants.gallon,
    "imp gal": constants.gallon_imp,
    "lb": constants.lb,
    "oz": constants.oz,
    "long ton": constants.long_ton,
    "short ton": constants.short_ton,
    "lbf": constants.lbf,
    "kgf": constants.kgf,
    "cal": constants.calorie_th,
    "cal (IT)": constants.calorie_IT,
    "BTU": constants.Btu_IT,
    "MMBTU": 1e6 * constants.Btu_IT,
    "hp": constants.hp,
    "°": constants.degree,
    "ha": constants.hectare,
    "min": constants.minute,
    "h": constants.hour,
    "d": constants.day,
}
# Key, digits as printed, power of ten: NIST SP 811 (2008), B.8. The last digit printed is rounded.
PRINTED = [
    ("atm", "1.01325", 5),
    ("at", "9.80665", 4),
    ("cmHg", "1.333224", 3),
    ("mmHg", "1.333224", 2),
    ("torr", "1.333224", 2),
    ("inHg", "3.386389", 3),
    ("inHg (32 °F)", "3.38638", 3),
    ("inHg (60 °F)", "3.37685", 3),
    ("cmH2O", "9.80665", 1),
    ("mmH2O", "9.80665", 0),
    ("inH2O", "2.490889", 2),
    ("ftH2O", "2.989067", 3),
    ("inH2O (4 °C)", "2.49082", 2),
    ("inH2O (60 °F)", "2.4884", 2),
    ("mmH2O (4 °C)", "9.80638", 0),
    ("psi", "6.894757", 3),
    ("psf", "4.788026", 1),
    ("ksi", "6.894757", 6),
    ("lbf", "4.448222", 0),
    ("kgf", "9.80665", 0),
    ("lb", "4.535924", -1),
    ("oz", "2.834952", -2),
    ("short ton", "9.071847", 2),
    ("long ton", "1.016047", 3),
    ("US gal", "3.785412", -3),
    ("imp gal", "4.54609", -3),
    ("ft", "3.048", -1),
    ("in", "2.54", -2),
    ("mi", "1.609344", 3),
    ("BTU", "1.055056", 3),
    ("cal", "4.184", 0),
    ("cal (IT)", "4.1868", 0),
    ("hp", "7.456999", 2),
    ("cP", "1", -3),
    ("P", "1", -1),
    ("kWh", "3.6", 6),
    ("°", "1.745329", -2),
]


def _pint(key: str) -> float:
    return float((1.0 * REGISTRY.parse_expression(PINT[key])).to_base_units().magnitude)


def test_every_unit_has_a_reference() -> None:
    assert set(PINT) | NOT_IN_PINT == set(UNITS)
    assert set(PINT).isdisjoint(NOT_IN_PINT)
    assert {key for key, *_ in PRINTED} | set(SCIPY) | {"inH2O (20 °C)", "mmH2O (20 °C)"} >= NOT_IN_PINT


@pytest.mark.parametrize("key", PINT)
def test_factor_is_that_of_pint(key: str) -> None:
    # pint defines inch_Hg and centimeter_Hg from 13.5951 g/cm³ and the standard acceleration, as SP 811 does.
    assert float(UNITS[key].factor) == pytest.approx(_pint(key), rel=2e-15)


@pytest.mark.parametrize("key", PINT)
def test_dimension_is_that_of_pint(key: str) -> None:
    dimensionality = (1.0 * REGISTRY.parse_expression(PINT[key])).dimensionality
    names = ("[mass]", "[length]", "[time]", "[temperature]", "[substance]")
    exponents = [Fraction(float(str(dimensionality.get(name, 0)))).limit_denominator(6) for name in names]
    assert UNITS[key].dimension.exponents() == tuple(exponents)


@pytest.mark.parametrize(
    ("key", "kelvin_at_zero"),
    [
        ("°C", REGISTRY.Quantity(0.0, "degree_Celsius").to("kelvin").magnitude),
        ("°F", REGISTRY.Quantity(0.0, "degree_Fahrenheit").to("kelvin").magnitude),
        ("°R", REGISTRY.Quantity(0.0, "degree_Rankine").to("kelvin").magnitude),
        ("K", 0.0),
    ],
)
def test_zero_point_is_that_of_pint(key: str, kelvin_at_zero: float) -> None:
    unit = UNITS[key]
    assert float(unit.zero * unit.factor) == pytest.approx(kelvin_at_zero, rel=1e-15, abs=0)


def test_only_temperatures_have_a_zero_point() -> None:
    assert {key for key, unit in UNITS.items() if unit.zero} == {"°C", "°F"}


@pytest.mark.parametrize("key", SCIPY)
def test_factor_is_that_of_scipy(key: str) -> None:
    assert float(UNITS[key].factor) == pytest.approx(SCIPY[key], rel=2e-15)


@pytest.mark.parametrize(("key", "digits", "power"), PRINTED)
def test_factor_rounds_to_the_printed_one(key: str, digits: str, power: int) -> None:
    places = len(digits.partition(".")[2])
    scaled = UNITS[key].factor / Fraction(10) ** power
    assert abs(scaled - Fraction(digits)) <= Fraction(1, 2 * 10**places)


def test_torr_and_conventional_millimetre_of_mercury_are_kept_apart() -> None:
    # 101325/760 Pa against 13595.1 kg/m³ · 9.80665 m/s² · 1 mm (ISO 80000-4; SP 811 B.8)
    assert float(UNITS["mmHg"].factor / UNITS["torr"].factor - 1) == pytest.approx(1.4e-7, abs=0.05e-7)


@pytest.mark.parametrize(("key", "height"), [("inH2O (20 °C)", 0.0254), ("mmH2O (20 °C)", 1e-3)])
def test_column_of_water_at_20_celsius_is_that_of_coolprop(key: str, height: float) -> None:
    # CoolProp 8.0.0 PropsSI("D", "T", 293.15, "P", 101325, "Water"): IAPWS-95, 998.207 kg/m³
    density = PropsSI("D", "T", 293.15, "P", 101325, "Water")
    assert float(UNITS[key].factor) == pytest.approx(density * constants.g * height, rel=2e-6)


CHEMISTRY = "OpenStax Chemistry 2e, section 9.1"
# Statement, value here, value there, half the last digit printed or the publisher's own rounding, source.
STATEMENTS = [
    ("1 torr in Pa", UNITS["torr"].factor, "133.322368", "5e-7", "ISO 80000-4, definition 101325/760"),
    ("1 mmHg in Pa", UNITS["mmHg"].factor, "133.322387415", "1e-9", "SP 811 B.8, 13595.1 kg/m³ · g_n · 1 mm"),
    ("1 inHg in Pa", UNITS["inHg"].factor, "3386.389", "0.0005", "SP 811 B.8"),
    ("1 inHg (60 °F) in Pa", UNITS["inHg (60 °F)"].factor, "3376.85", "0.005", "SP 811 B.8"),
    ("1 inH2O in Pa", UNITS["inH2O"].factor, "249.0889", "5e-5", "SP 811 B.8"),
    ("1 inH2O (39.2 °F) in Pa", UNITS["inH2O (4 °C)"].factor, "249.082", "0.0005", "SP 811 B.8"),
    (
        "1 atm in inH2O (20 °C)",
        UNITS["atm"].factor / UNITS["inH2O (20 °C)"].factor,
        "407.51",
        "0.03",
        "NIOSH NMAM, Appendix A, unit equivalents, pressure",
    ),
    ("1 technical atmosphere in Pa", UNITS["at"].factor, "98066.5", "0", "SP 811 B.8"),
    ("1 atm in lbf/ft²", UNITS["atm"].factor / UNITS["psf"].factor, "2116.2", "0.05", "US Standard Atmosphere 1976"),
    ("1 psi in mmHg", UNITS["psi"].factor / UNITS["mmHg"].factor, "51.715", "0.0005", "NIOSH NMAM, Appendix A"),
    ("740 torr in kPa", 740 * UNITS["torr"].factor / UNITS["kPa"].factor, "98.7", "0.05", CHEMISTRY),
    ("740 torr in bar", 740 * UNITS["torr"].factor / UNITS["bar"].factor, "0.987", "0.0005", CHEMISTRY),
    ("615 mmHg in atm", 615 * UNITS["mmHg"].factor / UNITS["atm"].factor, "0.809", "0.0005", CHEMISTRY),
    (
        "88.8 atm in psi",
        Fraction("88.8") * UNITS["atm"].factor / UNITS["psi"].factor,
        "1300",
        "6",
        "OpenStax Chemistry 2e, 9.1, rounded there",
    ),
    (
        "1 inHg in psi",
        UNITS["inHg"].factor / UNITS["psi"].factor,
        "0.4911",
        "6e-5",
        "40 CFR 98 Table A-2 as in WAC 173-441-080; the regulation rounds",
    ),
    (
        "1 Pa in inHg",
        1 / UNITS["inHg"].factor,
        "0.000295334",
        "4e-8",
        "40 CFR 98 Table A-2 as in WAC 173-441-080; 0.0115 % above SP 811, which the width covers",
    ),
]


@pytest.mark.parametrize(
    ("here", "printed", "width"), [row[1:4] for row in STATEMENTS], ids=[row[0] for row in STATEMENTS]
)
def test_published_equivalence(here: Fraction, printed: str, width: str) -> None:
    assert abs(here - Fraction(printed)) <= Fraction(width)


def test_every_unit_has_source_and_code() -> None:
    for unit in ALL:
        assert unit.source.where, unit.key
        assert unit.ucum, unit.key
        assert unit.ucum.isascii(), unit.key
        assert unit.factor > 0


def test_field_words_do_not_hide_units() -> None:
    words = [form for table in (PRODUCTS, WITH_PAIR, ASKED_PAIR) for word in table for form in forms(word)]
    words += map(compact, QUESTIONS)
    assert len(words) == len(set(words))
    assert set(words).isdisjoint(spellings(ALL))


def test_a_spelling_claimed_twice_fails_the_build() -> None:
    twin = Unit(
        key="twin",
        dimension=UNITS["bar"].dimension,
        factor=Fraction(2),
        ucum="bar",
        source=UNITS["bar"].source,
        spellings=("bars",),
    )
    with pytest.raises(SpecError) as caught:
        emit_tables((*ALL, twin), kinds.ALL)
    assert str(caught.value) == (
        "spec.units, twin: found the spelling 'bars', which bar has; expected one unit for one spelling. "
        "Take it from one of them, or ask about it in spec.unit_words."
    )


def test_degree_is_the_only_rounded_factor() -> None:
    assert float(UNITS["°"].factor) == math.pi / 180
