"""Family J: flow."""

from fractions import Fraction

import sympy
from sympy import log, pi, sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.dimensions import NUMBER
from spec.model import Constant, Family, Relation, Sign, Validity, Variable
from spec.relations.j_nozzle import CHOKED_FLOW, CRITICAL_RATIO, SUBSONIC_FLOW
from spec.relations.j_orifice import ORIFICE_PLATE
from spec.sources import (
    CFR_1066,
    COLEBROOK_1939,
    COMMON_PRACTICE,
    CROWL_LOUVAR,
    EPA_METHOD_2,
    LEAK_HANDBOOK,
    OPENSTAX_PHYSICS_1,
    OPENSTAX_PHYSICS_2,
)
from spec.symbols import as_printed, nonnegative, positive

q_m, rho, v, A, C_p, dp, r, gamma, C_d, p_0, R, M, T_0 = positive("q_m rho v A C_p dp r gamma C_d p_0 R M T_0")
K_v, r_sub = positive("K_v r")
q_0, N, V_rev, p, T, q_read, rho_cal, q, K_gas, K_cal = positive("q_0 N V_rev p T q_read rho_cal q K_gas K_cal")
Q, d, p_1, mu, L, Re, D, f, Z, V, t, a, kappa = positive("Q d p_1 mu L Re D f Z V t a kappa")
p_2, eps_r = nonnegative("p_2 eps_r")
p_2_end = positive("p_2")[0]
C_rough, C_smooth = positive("C_rough C_smooth")

GAS_DENSITY = Variable(kinds.DENSITY, "density of the gas there")
COMPRESSIBILITY = Variable(kinds.COMPRESSIBILITY, "mean compressibility factor", default=Fraction(1))
MOLAR_MASS = Variable(kinds.MOLAR_MASS, "molar mass of the gas")
HEAT_RATIO = Variable(kinds.HEAT_RATIO, "ratio of heat capacities")
SLOW = Validity(
    holds=sympy.Le(v, 100, evaluate=False),
    says="Above about 100 m/s in air (Mach 0.3) the gas is compressed on the way: the form reads high.",
)
COLEBROOK = COLEBROOK_1939.at("transition between smooth and rough pipe laws")
REFERENCE = {
    p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
    p_0: Variable(kinds.ABSOLUTE_PRESSURE, "reference pressure"),
    T_0: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature"),
    T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
}

with as_printed():
    CONTINUITY = Relation(
        key="continuity",
        title="Mass flow through an area",
        left=q_m,
        right=rho * v * A,
        where={
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            rho: GAS_DENSITY,
            v: Variable(kinds.SPEED, "mean speed over the area"),
            A: Variable(kinds.AREA, "area square to the flow"),
        },
        assumes=("steady flow", "the mean speed over the whole area"),
        source=OPENSTAX_PHYSICS_1.at("section 14.5, equation 14.15"),
        example={"rho": "8.33 kg/m³", "v": "6.2 m/s", "A": "78.5 cm²"},
        words=("pipe", "duct", "velocity"),
    )
    PITOT = Relation(
        key="pitot",
        title="Speed by a Pitot tube",
        left=v,
        right=C_p * sqrt(2 * dp / rho),
        where={
            v: Variable(kinds.SPEED, "speed of the gas"),
            C_p: Variable(kinds.COEFFICIENT, "coefficient of the tube"),
            dp: Variable(kinds.PRESSURE_DIFFERENCE, "velocity pressure"),
            rho: GAS_DENSITY,
        },
        assumes=("Mach number below 0.3", "the tube faces the flow"),
        valid=(SLOW,),
        source=EPA_METHOD_2.at("section 12.6, equation 2-7"),
        example={"C_p": "0.84", "dp": "84 Pa", "rho": "1.184 kg/m³"},
        words=("stack", "duct", "S-type", "velocity pressure"),
    )
    CRITICAL_VENTURI = Relation(
        key="critical_venturi",
        title="Flow through a critical-flow venturi",
        left=q,
        right=K_v * p / sqrt(T),
        where={
            q: Variable(kinds.REFERENCE_FLOW, "flow at the conditions of the calibration"),
            K_v: Variable(kinds.VENTURI_CONSTANT, "calibration constant"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the inlet"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature at the inlet"),
        },
        assumes=("choked", "the gas it was calibrated with"),
        source=CFR_1066.at("1066.625 and 1066.630, critical-flow venturi"),
        example={"K_v": "3.70e-5 m³·√K/(s·Pa)", "p": "98.3 kPa absolute", "T": "24.0 °C"},
        words=("sonic nozzle", "CFV"),
    )
    POSITIVE_DISPLACEMENT = Relation(
        key="positive_displacement",
        title="Positive displacement meter or pump",
        left=q_0,
        right=N * V_rev * (p / p_0) * (T_0 / T),
        where={
            q_0: Variable(kinds.REFERENCE_FLOW, "flow at reference conditions"),
            N: Variable(kinds.FREQUENCY, "turns per time"),
            V_rev: Variable(kinds.VOLUME, "volume of one turn"),
            **REFERENCE,
        },
        assumes=("the volume of one turn includes the slip at this pressure rise", "ideal gas"),
        source=CFR_1066.at("1066.630(a)"),
        example={
            "N": "12.4 r/s",
            "V_rev": "1.52 L",
            "p": "1.034 bar absolute",
            "p_0": "101.325 kPa absolute",
            "T_0": "20 °C",
            "T": "24.0 °C",
        },
        words=("rotary meter", "roots", "lobe"),
    )
    ROTAMETER = Relation(
        key="rotameter",
        title="Variable-area meter at reference conditions",
        left=q_0,
        right=q_read * sqrt(rho_cal / rho) * (p / p_0) * (T_0 / T),
        where={
            q_0: Variable(kinds.REFERENCE_FLOW, "flow at reference conditions"),
            q_read: Variable(kinds.FLOW, "flow the scale shows"),
            rho_cal: Variable(kinds.DENSITY, "density the scale was made for"),
            rho: GAS_DENSITY,
            **REFERENCE,
        },
        assumes=("the scale is in actual volume at its calibration", "float much denser than the gas", "ideal gas"),
        source=COMMON_PRACTICE.at("variable-area meters: the drag of the float balances its weight"),
        example={
            "q_read": "18.0 L/min",
            "rho_cal": "1.204 kg/m³",
            "rho": "3.44 kg/m³",
            "p": "3.01 bar absolute",
            "p_0": "101.325 kPa absolute",
            "T_0": "20 °C",
            "T": "20.0 °C",
        },
        words=("rotameter", "float", "tube meter"),
    )
    THERMAL_METER = Relation(
        key="thermal_meter",
        title="Thermal mass flow meter on another gas",
        left=q,
        right=q_read * K_gas / K_cal,
        where={
            q: Variable(kinds.REFERENCE_FLOW, "flow of the gas"),
            q_read: Variable(kinds.REFERENCE_FLOW, "flow the meter shows"),
            K_gas: Variable(kinds.COEFFICIENT, "conversion factor of the gas"),
            K_cal: Variable(kinds.COEFFICIENT, "conversion factor of the gas it was calibrated with"),
        },
        assumes=("both factors from the maker’s table", "both flows at one reference"),
        source=COMMON_PRACTICE.at("thermal mass flow meters: the maker’s table of factors decides"),
        example={"q_read": "20.0 L/min", "K_gas": "1.39", "K_cal": "1.00"},
        words=("mass flow controller", "gas factor"),
    )
    LAMINAR_LEAK = Relation(
        key="laminar_leak",
        title="Laminar leak through a capillary",
        left=Q,
        right=pi * d**4 * (p_1**2 - p_2**2) / (256 * mu * L),
        where={
            Q: Variable(kinds.LEAK_RATE, "leak rate"),
            d: Variable(kinds.LENGTH, "inside diameter of the path"),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure before"),
            p_2: Variable(kinds.ABSOLUTE_PRESSURE, "pressure behind", Sign.NONNEGATIVE),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
            L: Variable(kinds.LENGTH, "length of the path"),
        },
        assumes=("laminar flow", "a path much longer than wide", "one temperature", "ideal gas"),
        valid=(Validity(holds=p_1 > p_2, says="The pressure before must be the higher one.", refuse=True),),
        source=LEAK_HANDBOOK.at("chapter 2, viscous flow through a cylindrical tube"),
        example={
            "d": "20 mm",
            "p_1": "1.30 bar absolute",
            "p_2": "1.01 bar absolute",
            "mu": "17.5 µPa·s",
            "L": "40 m",
        },
        words=("capillary", "seep", "Poiseuille"),
    )
    REYNOLDS = Relation(
        key="reynolds",
        title="Reynolds number",
        left=Re,
        right=rho * v * D / mu,
        where={
            Re: Variable(kinds.NUMBER, "Reynolds number"),
            rho: GAS_DENSITY,
            v: Variable(kinds.SPEED, "mean speed"),
            D: Variable(kinds.LENGTH, "inside diameter"),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
        },
        assumes=("laminar below about 2300 in a pipe, turbulent above about 4000",),
        source=OPENSTAX_PHYSICS_1.at("section 14.7, equation 14.20, with the diameter"),
        example={"rho": "8.33 kg/m³", "v": "6.2 m/s", "D": "52.5 mm", "mu": "17.5 µPa·s"},
        words=("laminar", "turbulent"),
    )
    FRICTION_FACTOR = Relation(
        key="friction_factor",
        title="Friction factor of a pipe",
        left=1 / sqrt(f),
        right=-2 * (log(eps_r / C_rough + C_smooth / (Re * sqrt(f))) / log(10)),
        where={
            f: Variable(kinds.FRICTION, "friction factor (Darcy)"),
            eps_r: Variable(kinds.ROUGHNESS, "roughness over inside diameter", Sign.NONNEGATIVE),
            C_rough: Constant(
                title="constant of the rough pipe", value=Fraction("3.7"), unit="1", dimension=NUMBER, source=COLEBROOK
            ),
            C_smooth: Constant(
                title="constant of the smooth pipe",
                value=Fraction("2.51"),
                unit="1",
                dimension=NUMBER,
                source=COLEBROOK,
            ),
            Re: Variable(kinds.REYNOLDS, "Reynolds number"),
        },
        assumes=("turbulent flow", "a round pipe running full"),
        valid=(
            Validity(
                holds=sympy.Ge(Re, 4000, evaluate=False),
                says="Below a Reynolds number of 4000 the flow may be laminar: the factor is then 64/Re.",
            ),
        ),
        source=COLEBROOK,
        example={"eps_r": "0.0009", "Re": "155000"},
        words=("Colebrook", "Moody", "Darcy"),
    )
    LINE_DROP = Relation(
        key="line_drop",
        title="Pressure drop of a long gas line",
        left=p_1**2 - p_2_end**2,
        right=16 * f * L * Z * R * T * q_m**2 / (pi**2 * M * D**5),
        where={
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the start"),
            p_2_end: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the end"),
            f: Variable(kinds.FRICTION, "friction factor (Darcy)"),
            L: Variable(kinds.LENGTH, "length of the line"),
            Z: COMPRESSIBILITY,
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            M: MOLAR_MASS,
            D: Variable(kinds.LENGTH, "inside diameter"),
        },
        assumes=("one temperature", "a long, level line", "far below choking: the speeding-up is left out"),
        valid=(Validity(holds=p_1 > p_2_end, says="The start has the higher pressure.", refuse=True),),
        source=CROWL_LOUVAR.at("section 4-6, isothermal pipe flow, without the kinetic term"),
        example={
            "p_1": "7.01 bar absolute",
            "f": "0.021",
            "L": "180 m",
            "Z": "0.998",
            "T": "12.0 °C",
            "q_m": "0.064 kg/s",
            "M": "28.013 g/mol",
            "D": "52.5 mm",
        },
        words=("pipeline", "hose", "pressure loss"),
    )
    DIAL_RATE = Relation(
        key="dial_rate",
        title="Flow by a test dial",
        left=q,
        right=V / t,
        where={
            q: Variable(kinds.FLOW, "flow through the meter"),
            V: Variable(kinds.VOLUME, "volume of the whole turns"),
            t: Variable(kinds.TIME, "time they took"),
        },
        assumes=("whole turns of the dial", "steady flow"),
        source=COMMON_PRACTICE.at("clocking a meter"),
        example={"V": "30.0 L", "t": "94.5 s"},
        words=("clock the meter", "test dial", "rate"),
    )
    SOUND_SPEED = Relation(
        key="sound_speed",
        title="Speed of sound",
        left=a,
        right=sqrt(kappa * Z * R * T / M),
        where={
            a: Variable(kinds.SPEED, "speed of sound"),
            kappa: Variable(kinds.HEAT_RATIO, "isentropic exponent of the real gas"),
            Z: Variable(kinds.COMPRESSIBILITY, "compressibility factor", default=Fraction(1)),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            M: MOLAR_MASS,
        },
        assumes=("above about 10 bar the isentropic exponent of the real gas, not the ratio of heat capacities",),
        source=OPENSTAX_PHYSICS_2.at("section 3.6 with University Physics volume 1, equation 17.7"),
        example={"kappa": "1.40", "T": "12.0 °C", "M": "28.013 g/mol"},
        words=("acoustic", "sonic"),
    )

FAMILY = Family(
    key="j_flow",
    letter="J",
    title="Flow",
    lead="How fast gas goes through meters, pipes, holes and leaks.",
    relations=(
        CONTINUITY,
        PITOT,
        CRITICAL_RATIO,
        CHOKED_FLOW,
        SUBSONIC_FLOW,
        ORIFICE_PLATE,
        CRITICAL_VENTURI,
        POSITIVE_DISPLACEMENT,
        ROTAMETER,
        THERMAL_METER,
        LAMINAR_LEAK,
        REYNOLDS,
        FRICTION_FACTOR,
        LINE_DROP,
        DIAL_RATE,
        SOUND_SPEED,
    ),
)
