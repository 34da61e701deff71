"""Family K: leak and hold test."""

from fractions import Fraction

from sympy import sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Sign, Variable
from spec.sources import ANSI_N14_5, CFR_1065, COMMON_PRACTICE, EN_1779, ISO_11929
from spec.symbols import as_printed, positive, real

V, p_1, Z_1, T_1, p_2, Z_2, T_2, T_ref, t, R = positive("V p_1 Z_1 T_1 p_2 Z_2 T_2 T_ref t R")
Q_min, k_c, T, u_1, u_2, p, u_dT = positive("Q_min k_c T u_1 u_2 p u_dT")
Q_1, Q_2, M_1, M_2, dp_1, dp_2, mu_1, mu_2, dp2_1, dp2_2 = positive("Q_1 Q_2 M_1 M_2 dp_1 dp_2 mu_1 mu_2 dp2_1 dp2_2")
Q_t, Q_leak, x, q_ref, p_ref, ndot_leak = positive("Q_t Q x q_ref p_ref ndot")
Q, ndot, dp_leak = real("Q ndot dp_leak")

STATES = {
    p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the start"),
    Z_1: Variable(kinds.COMPRESSIBILITY, "compressibility factor at the start", default=Fraction(1)),
    T_1: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas at the start"),
    p_2: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the end"),
    Z_2: Variable(kinds.COMPRESSIBILITY, "compressibility factor at the end", default=Fraction(1)),
    T_2: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas at the end"),
}
HOLD = ("a rigid volume", "the temperature of the gas, not of the air", "without Z a cooling hold at 200 bar misleads")
HELD = Variable(kinds.VOLUME, "volume under test")
HOLD_TIME = Variable(kinds.TIME, "time of the hold")

with as_printed():
    PRESSURE_CHANGE_LEAK = Relation(
        key="pressure_change_leak",
        title="Leak rate by a hold test",
        left=Q,
        right=V * (p_1 / (Z_1 * T_1) - p_2 / (Z_2 * T_2)) * T_ref / t,
        where={
            Q: Variable(
                kinds.LEAK_RATE_EITHER_WAY, "leak rate at the reference temperature, positive for a loss", Sign.ANY
            ),
            V: HELD,
            **STATES,
            T_ref: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature of the leak rate"),
            t: HOLD_TIME,
        },
        assumes=HOLD,
        source=CFR_1065.at("1065.644, with the sign turned"),
        example={
            "V": "412 L",
            "p_1": "7.412 bar absolute",
            "T_1": "12.4 °C",
            "p_2": "7.398 bar absolute",
            "T_2": "12.1 °C",
            "T_ref": "20 °C",
            "t": "60 min",
        },
        words=("pressure decay", "hold test", "tightness"),
    )
    MOLAR_LEAK = Relation(
        key="molar_leak",
        title="Amount lost in a hold test",
        left=ndot,
        right=V / (R * t) * (p_1 / (Z_1 * T_1) - p_2 / (Z_2 * T_2)),
        where={
            ndot: Variable(kinds.MOLAR_FLOW_EITHER_WAY, "amount per time, positive for a loss", Sign.ANY),
            V: HELD,
            R: MOLAR_GAS_CONSTANT,
            t: HOLD_TIME,
            **STATES,
        },
        assumes=HOLD,
        source=CFR_1065.at("1065.644, with the sign turned"),
        example={
            "V": "412 L",
            "t": "60 min",
            "p_1": "7.412 bar absolute",
            "T_1": "12.4 °C",
            "p_2": "7.398 bar absolute",
            "T_2": "12.1 °C",
        },
        words=("pressure decay", "vacuum decay", "hold test"),
    )
    COMPENSATED_DROP = Relation(
        key="compensated_drop",
        title="Pressure drop that is not the temperature",
        left=dp_leak,
        right=p_1 * Z_2 * T_2 / (Z_1 * T_1) - p_2,
        where={
            dp_leak: Variable(kinds.PRESSURE_CHANGE, "drop that the temperature does not explain", Sign.ANY),
            **STATES,
        },
        assumes=HOLD,
        source=COMMON_PRACTICE.at("hold tests: Amontons’s law taken off the reading"),
        example={
            "p_1": "7.412 bar absolute",
            "T_1": "12.4 °C",
            "p_2": "7.398 bar absolute",
            "T_2": "12.1 °C",
        },
        words=("temperature correction", "hold test", "pressure decay"),
    )
    SMALLEST_LEAK = Relation(
        key="smallest_leak",
        title="Smallest leak a hold test can tell",
        left=Q_min,
        right=k_c * (V / t) * (T_ref / T) * sqrt(u_1**2 + u_2**2 + (p * u_dT / T) ** 2),
        where={
            Q_min: Variable(kinds.LEAK_RATE, "smallest leak rate"),
            k_c: Variable(kinds.COEFFICIENT, "1.645 to decide, 3.29 to be seen with 5 % error either way"),
            V: HELD,
            t: HOLD_TIME,
            T_ref: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature of the leak rate"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            u_1: Variable(kinds.PRESSURE_DIFFERENCE, "standard uncertainty of the first pressure"),
            u_2: Variable(kinds.PRESSURE_DIFFERENCE, "standard uncertainty of the second pressure"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the test"),
            u_dT: Variable(kinds.TEMPERATURE_DIFFERENCE, "standard uncertainty of the temperature change"),
        },
        assumes=("independent readings", "the temperature change is small"),
        source=ISO_11929.at("decision threshold and detection limit, used on a hold test"),
        example={
            "k_c": "3.29",
            "V": "412 L",
            "t": "60 min",
            "T_ref": "20 °C",
            "T": "12.0 °C",
            "u_1": "0.6 mbar",
            "u_2": "0.6 mbar",
            "p": "7.41 bar absolute",
            "u_dT": "0.1 K",
        },
        words=("detection limit", "decision threshold", "sensitivity"),
    )
    LEAK_MOLECULAR = Relation(
        key="leak_molecular",
        title="Molecular leak on another gas",
        left=Q_2 / Q_1,
        right=sqrt(M_1 / M_2) * (dp_2 / dp_1),
        where={
            Q_2: Variable(kinds.LEAK_RATE, "leak rate of the second gas"),
            Q_1: Variable(kinds.LEAK_RATE, "leak rate of the first gas"),
            M_1: Variable(kinds.MOLAR_MASS, "molar mass of the first gas"),
            M_2: Variable(kinds.MOLAR_MASS, "molar mass of the second gas"),
            dp_2: Variable(kinds.PRESSURE_DIFFERENCE, "pressure difference with the second gas"),
            dp_1: Variable(kinds.PRESSURE_DIFFERENCE, "pressure difference with the first gas"),
        },
        assumes=("molecular flow: leaks below about 1e-7 mbar·L/s", "one temperature"),
        source=EN_1779.at("conversion between gases, molecular flow"),
        example={
            "Q_1": "3.2e-8 mbar·L/s",
            "M_1": "4.0026 g/mol",
            "M_2": "28.013 g/mol",
            "dp_2": "7.00 bar",
            "dp_1": "1.00 bar",
        },
        words=("helium leak", "tracer gas", "conversion"),
    )
    LEAK_VISCOUS = Relation(
        key="leak_viscous",
        title="Laminar leak on another gas",
        left=Q_2 / Q_1,
        right=(mu_1 / mu_2) * (dp2_2 / dp2_1),
        where={
            Q_2: Variable(kinds.LEAK_RATE, "leak rate of the second gas"),
            Q_1: Variable(kinds.LEAK_RATE, "leak rate of the first gas"),
            mu_1: Variable(kinds.VISCOSITY, "viscosity of the first gas"),
            mu_2: Variable(kinds.VISCOSITY, "viscosity of the second gas"),
            dp2_2: Variable(kinds.PRESSURE_SQUARED, "difference of squared pressures with the second gas"),
            dp2_1: Variable(kinds.PRESSURE_SQUARED, "difference of squared pressures with the first gas"),
        },
        assumes=("laminar flow: leaks above about 1e-5 mbar·L/s", "one temperature"),
        source=EN_1779.at("conversion between gases, laminar viscous flow"),
        example={
            "Q_1": "4.1e-3 mbar·L/s",
            "mu_1": "19.6 µPa·s",
            "mu_2": "17.5 µPa·s",
            "dp2_2": "63 bar²",
            "dp2_1": "3.0 bar²",
        },
        words=("helium leak", "tracer gas", "conversion"),
    )
    TRACER_SHARE = Relation(
        key="tracer_share",
        title="Leak of a tracer mixed in",
        left=Q_t,
        right=x * Q_leak,
        where={
            Q_t: Variable(kinds.LEAK_RATE, "leak rate of the tracer"),
            x: Variable(kinds.FRACTION, "share of the tracer"),
            Q_leak: Variable(kinds.LEAK_RATE, "leak rate of the whole gas"),
        },
        assumes=("the tracer is evenly mixed in", "viscous flow, which takes all gases alike"),
        source=EN_1779.at("tracer gas mixtures"),
        example={"x": "5 %", "Q": "2.2e-4 mbar·L/s"},
        words=("forming gas", "helium mix", "tracer gas"),
    )
    LEAK_REFERENCE_FLOW = Relation(
        key="leak_reference_flow",
        title="Leak rate as a volume flow",
        left=q_ref,
        right=Q_leak / p_ref,
        where={
            q_ref: Variable(kinds.REFERENCE_FLOW, "volume flow at the reference pressure"),
            Q_leak: Variable(kinds.LEAK_RATE, "leak rate"),
            p_ref: Variable(kinds.ABSOLUTE_PRESSURE, "reference pressure"),
        },
        assumes=("at the temperature the leak rate was counted at",),
        source=ANSI_N14_5.at("reference air leakage rate"),
        example={"Q": "2.2e-4 mbar·L/s", "p_ref": "101.325 kPa absolute"},
        words=("standard cubic centimetre", "cm3/s", "leak unit"),
    )
    LEAK_MOLAR_FLOW = Relation(
        key="leak_molar_flow",
        title="Leak rate as an amount",
        left=ndot_leak,
        right=Q_leak / (R * T),
        where={
            ndot_leak: Variable(kinds.MOLAR_FLOW, "amount per time"),
            Q_leak: Variable(kinds.LEAK_RATE, "leak rate"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature the leak rate was counted at"),
        },
        assumes=("ideal gas",),
        source=ANSI_N14_5.at("reference cubic centimetre in moles"),
        example={"Q": "2.2e-4 mbar·L/s", "T": "20 °C"},
        words=("mol/s", "leak unit"),
    )

FAMILY = Family(
    key="k_leak",
    letter="K",
    title="Leak and hold test",
    lead="What a falling gauge says once the temperature is taken off, and how leaks of one gas speak for another.",
    relations=(
        PRESSURE_CHANGE_LEAK,
        MOLAR_LEAK,
        COMPENSATED_DROP,
        SMALLEST_LEAK,
        LEAK_MOLECULAR,
        LEAK_VISCOUS,
        TRACER_SHARE,
        LEAK_REFERENCE_FLOW,
        LEAK_MOLAR_FLOW,
    ),
)
