"""Family J, flow: holes and nozzles, choked and below choking."""

import sympy
from sympy import sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Relation, Split, Validity, Variable
from spec.sources import ISO_9300, NACA_1135
from spec.symbols import as_printed, positive

q_m, A, r, gamma, C_d, p_0, R, M, T_0 = positive("q_m A r gamma C_d p_0 R M T_0")
r_sub = r

MOLAR_MASS = Variable(kinds.MOLAR_MASS, "molar mass of the gas")
STAGNATION_PRESSURE = Variable(kinds.ABSOLUTE_PRESSURE, "pressure upstream, at rest")
STAGNATION_TEMPERATURE = Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature upstream, at rest")
HEAT_RATIO = Variable(kinds.HEAT_RATIO, "ratio of heat capacities")
ABOVE_ONE = Validity(holds=gamma > 1, says="The ratio of heat capacities is more than 1.", refuse=True)

with as_printed():
    CRITICAL_RATIO = Relation(
        key="critical_ratio",
        title="Critical pressure ratio",
        left=r,
        right=(2 / (gamma + 1)) ** (gamma / (gamma - 1)),
        where={r: Variable(kinds.CRITICAL, "outlet over inlet pressure at which flow chokes"), gamma: HEAT_RATIO},
        assumes=("ideal gas", "no heat and no friction up to the throat"),
        valid=(ABOVE_ONE,),
        source=NACA_1135.at("equation 45 at Mach 1"),
        example={"gamma": "1.40"},
        words=("choked", "sonic", "Mach 1"),
    )
    CHOKED_FLOW = Relation(
        key="choked_flow",
        title="Choked flow through a hole or nozzle",
        left=q_m,
        right=C_d * A * p_0 * sqrt(gamma * M / (R * T_0)) * (2 / (gamma + 1)) ** ((gamma + 1) / (2 * (gamma - 1))),
        where={
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            C_d: Variable(kinds.COEFFICIENT, "discharge coefficient"),
            A: Variable(kinds.AREA, "area of the hole"),
            p_0: STAGNATION_PRESSURE,
            gamma: HEAT_RATIO,
            M: MOLAR_MASS,
            R: MOLAR_GAS_CONSTANT,
            T_0: STAGNATION_TEMPERATURE,
        },
        assumes=(
            "the pressure behind the hole is below the critical ratio",
            "the bore before the hole is more than four times the area",
            "ideal gas: at 200 bar 6 % low for nitrogen, 26 % for methane",
        ),
        valid=(
            ABOVE_ONE,
            Validity(
                holds=sympy.Le(p_0, 2 * 10**6, evaluate=False),
                says="Above 20 bar the ideal form reads low: at 200 bar 6 % for nitrogen, 26 % for methane.",
            ),
        ),
        source=ISO_9300.at("ideal critical flow function; NACA Report 1135, equation 101"),
        example={
            "C_d": "0.80",
            "A": "0.79 mm²",
            "p_0": "7.01 bar absolute",
            "gamma": "1.40",
            "M": "28.013 g/mol",
            "T_0": "12.0 °C",
        },
        words=("release", "leak through a hole", "sonic nozzle", "relief"),
    )
    SUBSONIC_FLOW = Relation(
        key="subsonic_flow",
        title="Flow through a hole or nozzle below choking",
        left=q_m,
        right=C_d
        * A
        * p_0
        * sqrt(2 * gamma * M / ((gamma - 1) * R * T_0) * (r ** (2 / gamma) - r ** ((gamma + 1) / gamma))),
        where={
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            C_d: Variable(kinds.COEFFICIENT, "discharge coefficient"),
            A: Variable(kinds.AREA, "area of the hole"),
            p_0: STAGNATION_PRESSURE,
            gamma: HEAT_RATIO,
            M: MOLAR_MASS,
            R: MOLAR_GAS_CONSTANT,
            T_0: STAGNATION_TEMPERATURE,
            r: Variable(kinds.SUBSONIC_RATIO, "pressure behind the hole over that before it, both absolute"),
        },
        assumes=(
            "the pressure behind the hole is above the critical ratio",
            "the bore before the hole is more than four times the area",
            "ideal gas",
        ),
        valid=(
            ABOVE_ONE,
            Validity(
                holds=r >= (2 / (gamma + 1)) ** (gamma / (gamma - 1)),
                says="Below the critical ratio the flow is choked: take the law of choked flow.",
                refuse=True,
            ),
        ),
        splits=(Split(unknown=r, at=(2 / (gamma + 1)) ** (gamma / (gamma - 1)), above="above_critical"),),
        source=NACA_1135.at("isentropic flow, equations 44 to 48; 40 CFR 1065.640"),
        example={
            "C_d": "0.80",
            "A": "0.79 mm²",
            "p_0": "1.20 bar absolute",
            "gamma": "1.40",
            "M": "28.013 g/mol",
            "T_0": "12.0 °C",
            "r": "0.83",
        },
        words=("nozzle", "leak through a hole", "subsonic"),
    )
