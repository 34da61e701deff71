"""Family N: energy."""

from sympy import Rational, log

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Sign, Split, Validity, Variable
from spec.sources import (
    ASME_PCC_2,
    BRODE_1959,
    OPENSTAX_PHYSICS_2,
    POISSON_1823,
    SP811,
)
from spec.symbols import as_printed, positive, real

p_1, p_2, V_1, V_2, T_1, T_2, gamma, n, R, T = positive("p_1 p_2 V_1 V_2 T_1 T_2 gamma n R T")
E, p, V, p_a, m, e, r, R_s, k_m = positive("E p V p_a m e r R_s k_m")
(W,) = real("W")

ADIABATIC = ("no heat passes the wall", "reversible", "the heat capacity ratio stays the same")
BEFORE_AFTER_T = {
    T_1: Variable(kinds.ABSOLUTE_TEMPERATURE, "first temperature"),
    T_2: Variable(kinds.ABSOLUTE_TEMPERATURE, "second temperature"),
}
BEFORE_AFTER_V = {
    V_1: Variable(kinds.VOLUME, "first volume"),
    V_2: Variable(kinds.VOLUME, "second volume"),
}
BEFORE_AFTER_P = {
    p_1: Variable(kinds.ABSOLUTE_PRESSURE, "first pressure"),
    p_2: Variable(kinds.ABSOLUTE_PRESSURE, "second pressure"),
}
GAMMA = {gamma: Variable(kinds.HEAT_RATIO, "heat capacity ratio of the gas")}
STORED = {
    E: Variable(kinds.ENERGY, "stored energy"),
    p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure in the system"),
    V: Variable(kinds.VOLUME, "all connected volumes"),
    p_a: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the air around"),
    **GAMMA,
}
STORED_EXAMPLE = {"p": "11.0 bar absolute", "V": "2.40 m³", "p_a": "996.4 hPa absolute", "gamma": "1.40"}
ABOVE_ONE = Validity(holds=gamma > 1, says="The ratio of heat capacities is more than 1.", refuse=True)
ABOVE_AIR = Validity(
    holds=p > p_a,
    says="Energy is stored only above the pressure of the air around. Was a gauge reading taken?",
    refuse=True,
)
NEAR_IDEAL = Validity(
    holds=p <= Rational(2 * 10**6),
    says=(
        "Above 20 bar the ideal form is off: at 100 bar and 15 °C a tenth high for nitrogen, 7 % low for argon. "
        "Leave room for it."
    ),
)

with as_printed():
    ADIABATIC_PRESSURE_VOLUME = Relation(
        key="adiabatic_pressure_volume",
        title="Adiabatic change: pressure and volume",
        left=p_1 * V_1**gamma,
        right=p_2 * V_2**gamma,
        where={**BEFORE_AFTER_P, **BEFORE_AFTER_V, **GAMMA},
        assumes=ADIABATIC,
        valid=(ABOVE_ONE,),
        source=POISSON_1823.at("adiabatic change"),
        example={"p_1": "1.00 bar absolute", "V_1": "6.00 L", "V_2": "1.00 L", "gamma": "1.40"},
        words=("compression", "Poisson"),
    )
    ADIABATIC_TEMPERATURE_VOLUME = Relation(
        key="adiabatic_temperature_volume",
        title="Adiabatic change: temperature and volume",
        left=T_1 * V_1 ** (gamma - 1),
        right=T_2 * V_2 ** (gamma - 1),
        where={**BEFORE_AFTER_T, **BEFORE_AFTER_V, **GAMMA},
        assumes=ADIABATIC,
        valid=(ABOVE_ONE,),
        source=POISSON_1823.at("adiabatic change"),
        example={"T_1": "12.0 °C", "V_1": "6.00 L", "V_2": "4.20 L", "gamma": "1.40"},
        words=("heat of compression",),
    )
    ADIABATIC_TEMPERATURE_PRESSURE = Relation(
        key="adiabatic_temperature_pressure",
        title="Adiabatic change: temperature and pressure",
        left=T_2 / T_1,
        right=(p_2 / p_1) ** ((gamma - 1) / gamma),
        where={**BEFORE_AFTER_T, **BEFORE_AFTER_P, **GAMMA},
        assumes=ADIABATIC,
        valid=(ABOVE_ONE,),
        source=POISSON_1823.at("adiabatic change"),
        example={"T_1": "12.0 °C", "p_1": "1.00 bar absolute", "p_2": "3.00 bar absolute", "gamma": "1.40"},
        words=("heat of compression", "cold gas"),
    )
    ISOTHERMAL_WORK = Relation(
        key="isothermal_work",
        title="Work of a gas at one temperature",
        left=W,
        right=n * R * T * log(V_2 / V_1),
        where={
            W: Variable(kinds.WORK, "work done by the gas", Sign.ANY),
            n: Variable(kinds.AMOUNT, "amount of gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            **BEFORE_AFTER_V,
        },
        assumes=("ideal gas", "the temperature stays the same", "slow enough to be reversible"),
        source=OPENSTAX_PHYSICS_2.at("section 3.2, isothermal work of an ideal gas"),
        example={"n": "2.00 mol", "T": "12.0 °C", "V_1": "10.0 L", "V_2": "25.0 L"},
        words=("isothermal expansion",),
    )
    STORED_ENERGY_ISENTROPIC = Relation(
        key="stored_energy_isentropic",
        title="Stored energy of a gas, isentropic",
        left=E,
        right=p * V / (gamma - 1) * (1 - (p_a / p) ** ((gamma - 1) / gamma)),
        where=STORED,
        assumes=("ideal gas", "p is absolute", "the gas expands to the air around without heat passing"),
        valid=(ABOVE_AIR, NEAR_IDEAL),
        splits=(Split(unknown=p, at=p_a, above="above_air"),),
        source=ASME_PCC_2.at("article on pressure and tightness testing, stored energy of a gas"),
        example=STORED_EXAMPLE,
        words=("pneumatic test", "burst", "energy"),
    )
    STORED_ENERGY_CONSTANT_VOLUME = Relation(
        key="stored_energy_constant_volume",
        title="Stored energy of a gas, constant volume",
        left=E,
        right=(p - p_a) * V / (gamma - 1),
        where=STORED,
        assumes=("ideal gas", "p is absolute", "higher than the isentropic form"),
        valid=(ABOVE_AIR,),
        source=BRODE_1959.at("energy of a sphere of gas"),
        example=STORED_EXAMPLE,
        words=("Brode", "burst", "energy"),
    )
    TNT_EQUIVALENT = Relation(
        key="tnt_equivalent",
        title="TNT equivalent of an energy",
        left=m,
        right=E / e,
        where={
            m: Variable(kinds.MASS, "mass of TNT that holds as much energy"),
            E: Variable(kinds.ENERGY, "energy"),
            e: Variable(kinds.SPECIFIC_ENERGY, "energy of one kilogram of TNT, its source named"),
        },
        assumes=(
            "e is a convention: 4.184 MJ/kg, 4.267 in the pressure-code form, others to 4.65",
            "the governing code decides which",
        ),
        source=SP811.at("appendix B.8, ton of TNT (energy equivalent)"),
        example={"E": "1.36 MJ", "e": "4.184 MJ/kg"},
        words=("TNT", "blast"),
    )
    SCALED_DISTANCE = Relation(
        key="scaled_distance",
        title="Distance by scaled cube root",
        left=r,
        right=R_s * (k_m * m) ** Rational(1, 3),
        where={
            r: Variable(kinds.LENGTH, "distance"),
            R_s: Variable(kinds.SCALED_LENGTH, "scaled distance of the code, its source named"),
            k_m: Variable(kinds.FACTOR, "factor of the code on the mass"),
            m: Variable(kinds.MASS, "TNT equivalent"),
        },
        assumes=(
            "a pressure code's form takes k_m = 2 and R_s of at least 20 m/∛kg (from memory)",
            "its least distances are 30 m or 60 m by energy (from memory)",
            "the governing code's own distance decides",
        ),
        source=ASME_PCC_2.at("mandatory appendix 501-III, distance by scaled consequence factor"),
        example={"R_s": "20 m/∛kg", "k_m": "2", "m": "0.325 kg"},
        words=("exclusion zone", "standoff", "safe distance"),
    )

FAMILY = Family(
    key="n_energy",
    letter="N",
    title="Energy",
    lead="What compressing a gas does to it, and what a charged system would let go of.",
    relations=(
        ADIABATIC_PRESSURE_VOLUME,
        ADIABATIC_TEMPERATURE_VOLUME,
        ADIABATIC_TEMPERATURE_PRESSURE,
        ISOTHERMAL_WORK,
        STORED_ENERGY_ISENTROPIC,
        STORED_ENERGY_CONSTANT_VOLUME,
        TNT_EQUIVALENT,
        SCALED_DISTANCE,
    ),
)
