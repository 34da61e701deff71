"""Family H: humidity."""

from fractions import Fraction

import sympy
from sympy import Rational, exp, log

from spec import dimensions as dim
from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Citation, Constant, Family, Relation, Sign, Validity, Variable
from spec.relations.h_enhancement import ENHANCEMENT_FACTOR
from spec.sources import (
    CFR_1065,
    CIPM_2007,
    GREENSPAN_1976,
    IAPWS_R14,
    IAPWS_SR1,
    WMO_8,
)
from spec.symbols import as_printed, nonnegative, positive, real

e, e_w, p, T, M_w, M_d, Z, R, w, rho, M_a = positive("e e_w p T M_w M_d Z R w rho M_a")
e_0, A_w, B_w, A_i, B_i, p_c, T_c, p_t, T_t = positive("e_0 A_w B_w A_i B_i p_c T_c p_t T_t")
f_e, e_s, f_1, e_1, p_1, f_2, e_2, p_2 = positive("f_e e_s f_1 e_1 p_1 f_2 e_2 p_2")
a_1, a_2, a_3, a_4, a_5, a_6 = real("a_1 a_2 a_3 a_4 a_5 a_6")
b_1, b_2, b_3 = positive("b_1 b_2 b_3")
g_1, g_2, g_3, g_4, g_5, g_6, g_7 = real("g_1 g_2 g_3 g_4 g_5 g_6 g_7")
U, x_w, d_w, e_any = nonnegative("U x_w d_w e")
(t,) = real("t")


def _number(title: str, value: str, source: Citation) -> Constant:
    return Constant(title=title, value=Fraction(value), unit="1", dimension=dim.NUMBER, source=source)


def _kelvin(title: str, value: str, source: Citation) -> Constant:
    return Constant(title=title, value=Fraction(value), unit="K", dimension=dim.TEMPERATURE, source=source)


def _pascal(title: str, value: str, source: Citation) -> Constant:
    return Constant(title=title, value=Fraction(value), unit="Pa", dimension=dim.PRESSURE, source=source)


MAGNUS = WMO_8.at("annex 4.B, equations 4.B.1 and 4.B.2")
SR1 = IAPWS_SR1.at("equation 1")
R14 = IAPWS_R14.at("equation 6")
GOFF = CFR_1065.at("1065.645(a)(1), from WMO 2000")
MAGNUS_ZERO = _pascal("saturation pressure at 0 °C", "611.2", MAGNUS)
TRIPLE_POINT = _kelvin("triple point of water", "273.16", R14)
VAPOUR = Variable(kinds.VAPOUR_PRESSURE, "saturation vapour pressure")
WATER_MASS = Variable(kinds.MOLAR_MASS, "molar mass of water")
COMPRESSIBILITY = Variable(kinds.COMPRESSIBILITY, "compressibility factor", default=Fraction(1))
PRESSURE = Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas with its vapour")
ACTUAL = Variable(kinds.VAPOUR_PRESSURE, "actual vapour pressure")
BELOW_TOTAL = Validity(
    holds=e < p, says="The vapour pressure must be below the pressure of the gas that holds it.", refuse=True
)


SUPERCOOLED = Validity(
    holds=sympy.Ge(t, -45, evaluate=False), says="Below −45 °C the Magnus form over water is not stated."
)
WARM = Validity(holds=sympy.Le(t, 60, evaluate=False), says="Above 60 °C the Magnus form drifts: use the IAPWS form.")

with as_printed():
    SATURATION_WATER_MAGNUS = Relation(
        key="saturation_water_magnus",
        title="Saturation over water, Magnus form",
        left=e,
        right=e_0 * exp(A_w * t / (B_w + t)),
        where={
            e: VAPOUR,
            e_0: MAGNUS_ZERO,
            A_w: _number("Magnus exponent over water", "17.62", MAGNUS),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature, or dew point", Sign.ANY),
            B_w: _kelvin("Magnus temperature over water", "243.12", MAGNUS),
        },
        assumes=("pure water vapour over a flat surface of liquid water, also below 0 °C",),
        valid=(SUPERCOOLED, WARM),
        source=MAGNUS,
        example={"t": "12.0 °C"},
        words=("dew point", "Magnus", "saturation"),
    )
    SATURATION_ICE_MAGNUS = Relation(
        key="saturation_ice_magnus",
        title="Saturation over ice, Magnus form",
        left=e,
        right=e_0 * exp(A_i * t / (B_i + t)),
        where={
            e: VAPOUR,
            e_0: MAGNUS_ZERO,
            A_i: _number("Magnus exponent over ice", "22.46", MAGNUS),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature, or frost point", Sign.ANY),
            B_i: _kelvin("Magnus temperature over ice", "272.62", MAGNUS),
        },
        assumes=("pure water vapour over a flat surface of ice",),
        valid=(
            Validity(holds=sympy.Ge(t, -65, evaluate=False), says="Below −65 °C the Magnus form is not stated."),
            Validity(holds=sympy.Le(t, 0, evaluate=False), says="There is no ice above 0 °C: use the form over water."),
        ),
        source=MAGNUS,
        example={"t": "-18.0 °C"},
        words=("frost point", "Magnus", "saturation"),
    )
    SATURATION_WATER_IAPWS = Relation(
        key="saturation_water_iapws",
        title="Saturation over water, reference form",
        left=e,
        right=p_c
        * exp(
            (T_c / T)
            * (
                a_1 * (1 - T / T_c)
                + a_2 * (1 - T / T_c) ** Rational(3, 2)
                + a_3 * (1 - T / T_c) ** 3
                + a_4 * (1 - T / T_c) ** Rational(7, 2)
                + a_5 * (1 - T / T_c) ** 4
                + a_6 * (1 - T / T_c) ** Rational(15, 2)
            )
        ),
        where={
            e: VAPOUR,
            p_c: _pascal("critical pressure of water", "22064000", SR1),
            T_c: _kelvin("critical temperature of water", "647.096", SR1),
            T: Variable(kinds.WATER_TEMPERATURE, "temperature, or dew point"),
            a_1: _number("coefficient 1", "-7.85951783", SR1),
            a_2: _number("coefficient 2", "1.84408259", SR1),
            a_3: _number("coefficient 3", "-11.7866497", SR1),
            a_4: _number("coefficient 4", "22.6807411", SR1),
            a_5: _number("coefficient 5", "-15.9618719", SR1),
            a_6: _number("coefficient 6", "1.80122502", SR1),
        },
        assumes=("pure water vapour over a flat surface of liquid water",),
        valid=(
            Validity(
                holds=sympy.Le(T, Rational("647.096"), evaluate=False),
                says="Water has no saturation pressure above its critical temperature of 647.096 K.",
                refuse=True,
            ),
            Validity(
                holds=sympy.Ge(T, Rational("273.15"), evaluate=False),
                says="Below 273.16 K use the form over ice; over supercooled water this form is an extrapolation.",
            ),
        ),
        source=SR1,
        example={"T": "12.0 °C"},
        words=("dew point", "vapour pressure", "steam"),
    )
    SUBLIMATION_ICE_IAPWS = Relation(
        key="sublimation_ice_iapws",
        title="Saturation over ice, reference form",
        left=e,
        right=p_t * exp((T_t / T) * (a_1 * (T / T_t) ** b_1 + a_2 * (T / T_t) ** b_2 + a_3 * (T / T_t) ** b_3)),
        where={
            e: Variable(kinds.VAPOUR_PRESSURE, "sublimation pressure"),
            p_t: _pascal("triple-point pressure of water", "611.657", R14),
            T_t: TRIPLE_POINT,
            T: Variable(kinds.ICE_TEMPERATURE, "temperature, or frost point"),
            a_1: _number("coefficient 1", "-21.2144006", R14),
            b_1: _number("exponent 1", "0.00333333333", R14),
            a_2: _number("coefficient 2", "27.3203819", R14),
            b_2: _number("exponent 2", "1.20666667", R14),
            a_3: _number("coefficient 3", "-6.10598130", R14),
            b_3: _number("exponent 3", "1.70333333", R14),
        },
        assumes=("pure water vapour over a flat surface of ice",),
        valid=(
            Validity(
                holds=sympy.Le(T, Rational("273.16"), evaluate=False),
                says="There is no ice above 273.16 K: use the form over water.",
                refuse=True,
            ),
            Validity(holds=sympy.Ge(T, 50, evaluate=False), says="The form begins at 50 K.", refuse=True),
        ),
        source=R14,
        example={"T": "-18.0 °C"},
        words=("frost point", "sublimation", "dry air"),
    )
    SATURATION_GOFF_GRATCH = Relation(
        key="saturation_goff_gratch",
        title="Saturation over water, form of the emissions rules",
        left=e,
        right=e_0
        * 10
        ** (
            g_1 * (1 - T_t / T)
            - g_2 * (log(T / T_t) / log(10))
            + g_3 * (1 - 10 ** (-g_4 * (T / T_t - 1)))
            + g_5 * (10 ** (g_6 * (1 - T_t / T)) - 1)
            - g_7
        ),
        where={
            e: VAPOUR,
            e_0: _pascal("unit of the rule, 1 kPa", "1000", GOFF),
            g_1: _number("coefficient 1", "10.79574", GOFF),
            T_t: TRIPLE_POINT,
            T: Variable(kinds.DEW_TEMPERATURE, "temperature, or dew point"),
            g_2: _number("coefficient 2", "5.02800", GOFF),
            g_3: _number("coefficient 3", "0.000150475", GOFF),
            g_4: _number("coefficient 4", "8.2969", GOFF),
            g_5: _number("coefficient 5", "0.00042873", GOFF),
            g_6: _number("coefficient 6", "4.76955", GOFF),
            g_7: _number("coefficient 7", "0.2138602", GOFF),
        },
        assumes=("pure water vapour over a flat surface of liquid water",),
        valid=(
            Validity(
                holds=sympy.Le(T, Rational("373.15"), evaluate=False),
                says="The rule gives this form from −100 to 100 °C: use the IAPWS form above.",
            ),
        ),
        source=GOFF,
        example={"T": "12.0 °C"},
        words=("Goff", "Gratch", "engine test", "1065"),
    )
    RELATIVE_HUMIDITY = Relation(
        key="relative_humidity",
        title="Relative humidity",
        left=U,
        right=e_any / e_w,
        where={
            U: Variable(kinds.HUMIDITY, "relative humidity over water", Sign.NONNEGATIVE),
            e_any: Variable(kinds.VAPOUR_PRESSURE, "actual vapour pressure", Sign.NONNEGATIVE),
            e_w: Variable(kinds.VAPOUR_PRESSURE, "saturation vapour pressure over water at the same temperature"),
        },
        assumes=("over water, also below 0 °C",),
        source=WMO_8.at("annex 4.A, relative humidity"),
        example={"e": "7.20 hPa", "e_w": "14.0 hPa"},
        words=("RH", "hygrometer"),
    )
    MOISTURE_FRACTION = Relation(
        key="moisture_fraction",
        title="Share of water vapour",
        left=x_w,
        right=e_any / p,
        where={
            x_w: Variable(kinds.FRACTION, "share of water vapour", Sign.NONNEGATIVE),
            e_any: Variable(kinds.VAPOUR_PRESSURE, "actual vapour pressure", Sign.NONNEGATIVE),
            p: PRESSURE,
        },
        assumes=("ideal gas", "the actual vapour pressure, not that of saturation"),
        valid=(Validity(holds=e_any <= p, says="The vapour pressure cannot be more than the pressure.", refuse=True),),
        source=CFR_1065.at("1065.645(c)"),
        example={"e": "7.20 hPa", "p": "996.4 hPa absolute"},
        words=("water content", "ppm water", "moisture"),
    )
    SATURATED_FRACTION = Relation(
        key="saturated_fraction",
        title="Share of water vapour at saturation",
        left=x_w,
        right=f_e * e_s / p,
        where={
            x_w: Variable(kinds.FRACTION, "share of water vapour at saturation", Sign.NONNEGATIVE),
            f_e: Variable(kinds.ENHANCEMENT, "enhancement factor of the gas at p and temperature", default=Fraction(1)),
            e_s: Variable(kinds.VAPOUR_PRESSURE, "saturation vapour pressure of pure water"),
            p: PRESSURE,
        },
        assumes=("the gas is saturated", "f_e of air; 1 leaves out 0.4 % at 1 bar, 2.5 % at 8 bar"),
        valid=(Validity(holds=e_s < p, says="At this pressure water boils: nothing is saturated.", refuse=True),),
        source=CIPM_2007.at("appendix A1.2, mole fraction of water vapour"),
        example={"f_e": "1.025", "e_s": "14.0 hPa", "p": "8.01 bar absolute"},
        words=("saturated gas", "compressed air", "condensate"),
    )
    WATER_MASS_PER_VOLUME = Relation(
        key="water_mass_per_volume",
        title="Water in a volume of gas",
        left=d_w,
        right=e * M_w / (Z * R * T),
        where={
            d_w: Variable(kinds.MASS_CONCENTRATION, "mass of water vapour in a volume", Sign.NONNEGATIVE),
            e: ACTUAL,
            M_w: WATER_MASS,
            Z: COMPRESSIBILITY,
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("Z is that of the moist gas; 1 is the ideal gas",),
        source=CIPM_2007.at("equation 1, the water part"),
        example={"e": "7.20 hPa", "M_w": "18.015 g/mol", "T": "20.0 °C"},
        words=("absolute humidity", "g/m3 of water"),
    )
    MIXING_RATIO = Relation(
        key="mixing_ratio",
        title="Mixing ratio",
        left=w,
        right=(M_w / M_d) * e / (p - e),
        where={
            w: Variable(kinds.MASS_RATIO, "mass of water to mass of dry gas"),
            M_w: WATER_MASS,
            M_d: Variable(kinds.MOLAR_MASS, "molar mass of the dry gas"),
            e: ACTUAL,
            p: PRESSURE,
        },
        assumes=("ideal gases",),
        valid=(BELOW_TOTAL,),
        source=WMO_8.at("annex 4.A, mixing ratio"),
        example={"M_w": "18.015 g/mol", "M_d": "28.965 g/mol", "e": "7.20 hPa", "p": "996.4 hPa absolute"},
        words=("humidity ratio", "g/kg of water"),
    )
    DEW_POINT_AT_PRESSURE = Relation(
        key="dew_point_at_pressure",
        title="Saturation pressures at two pressures",
        left=f_1 * e_1 / p_1,
        right=f_2 * e_2 / p_2,
        where={
            f_1: Variable(kinds.ENHANCEMENT, "enhancement factor at the first pressure", default=Fraction(1)),
            e_1: Variable(kinds.VAPOUR_PRESSURE, "saturation pressure at the first dew or frost point"),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "first pressure"),
            f_2: Variable(kinds.ENHANCEMENT, "enhancement factor at the second pressure", default=Fraction(1)),
            e_2: Variable(kinds.VAPOUR_PRESSURE, "saturation pressure at the second dew or frost point"),
            p_2: Variable(kinds.ABSOLUTE_PRESSURE, "second pressure"),
        },
        assumes=("no condensation on the way", "without the factors 2 to 4 % off at 8 bar and threefold at 200 bar"),
        source=GREENSPAN_1976.at("effective saturation pressure; with Dalton’s law between two pressures"),
        example={
            "f_1": "1.025",
            "e_1": "8.13 hPa",
            "p_1": "8.01 bar absolute",
            "f_2": "1.004",
            "p_2": "996.4 hPa absolute",
        },
        words=("pressure dew point", "dew point", "compressed air"),
    )
    MOIST_AIR_DENSITY = Relation(
        key="moist_air_density",
        title="Density of moist air",
        left=rho,
        right=p * M_a / (Z * R * T) * (1 - x_w * (1 - M_w / M_a)),
        where={
            rho: Variable(kinds.DENSITY, "density of the moist air"),
            p: PRESSURE,
            M_a: Variable(kinds.MOLAR_MASS, "molar mass of dry air"),
            Z: COMPRESSIBILITY,
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the air"),
            x_w: Variable(kinds.FRACTION, "share of water vapour", Sign.NONNEGATIVE),
            M_w: WATER_MASS,
        },
        assumes=("Z is that of the moist air; 1 is the ideal gas, 0.04 % off in a room",),
        source=CIPM_2007.at("equation 1"),
        example={
            "p": "996.4 hPa absolute",
            "M_a": "28.965 g/mol",
            "T": "20.0 °C",
            "x_w": "0.72 %",
            "M_w": "18.015 g/mol",
        },
        words=("air density", "buoyancy"),
    )

FAMILY = Family(
    key="h_humidity",
    letter="H",
    title="Humidity",
    lead="Water vapour in a gas: how much it can hold, how much it holds, and where it comes out.",
    relations=(
        SATURATION_WATER_MAGNUS,
        SATURATION_ICE_MAGNUS,
        SATURATION_WATER_IAPWS,
        SUBLIMATION_ICE_IAPWS,
        SATURATION_GOFF_GRATCH,
        RELATIVE_HUMIDITY,
        MOISTURE_FRACTION,
        ENHANCEMENT_FACTOR,
        SATURATED_FRACTION,
        WATER_MASS_PER_VOLUME,
        MIXING_RATIO,
        DEW_POINT_AT_PRESSURE,
        MOIST_AIR_DENSITY,
    ),
)
