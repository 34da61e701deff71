"""Family M: vessels."""

from fractions import Fraction

from sympy import exp, pi, sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import CONSERVATION, GAS_DYNAMICS, GEOMETRY
from spec.symbols import as_printed, nonnegative, positive
from spec.validity import ideal_at

p, p_1, p_2, V_1, V_2, t, V, p_ref, q_ref, T, T_ref = positive("p p_1 p_2 V_1 V_2 t V p_ref q_ref T T_ref")
T_1, T_2, Z_1, Z_2 = positive("T_1 T_2 Z_1 Z_2")
p_min, p_x = nonnegative("p_min p_x")
p_0, C_d, A, psi, R, M, V_x, V_r, d, L = positive("p_0 C_d A psi R M V_x V_r d L")

with as_printed():
    EQUALISE = Relation(
        key="equalise",
        title="Pressure after joining two vessels",
        left=p,
        right=(p_1 * V_1 + p_2 * V_2) / (V_1 + V_2),
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure after joining"),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the first vessel"),
            V_1: Variable(kinds.VOLUME, "volume of the first vessel"),
            p_2: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the second vessel"),
            V_2: Variable(kinds.VOLUME, "volume of the second vessel"),
        },
        assumes=("ideal gas", "both vessels settle at one temperature"),
        valid=(ideal_at(p_1), ideal_at(p_2)),
        source=CONSERVATION.at("ideal amounts before and after are equal"),
        example={"p_1": "8.00 bar absolute", "V_1": "50.0 L", "p_2": "1.01 bar absolute", "V_2": "412 L"},
        words=("decanting", "cascade", "equalising"),
    )
    ENDURANCE = Relation(
        key="endurance",
        title="How long a vessel lasts, ideal",
        left=t,
        right=V * (p - p_min) * T_ref / (p_ref * q_ref * T),
        where={
            t: Variable(kinds.TIME, "time until the least pressure"),
            V: Variable(kinds.VOLUME, "volume of the vessel"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure now"),
            p_min: Variable(kinds.ABSOLUTE_PRESSURE, "least pressure kept back", Sign.NONNEGATIVE),
            T_ref: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature of the flow"),
            p_ref: Variable(kinds.ABSOLUTE_PRESSURE, "reference pressure of the flow"),
            q_ref: Variable(kinds.REFERENCE_FLOW, "flow at its reference conditions"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("ideal gas", "steady flow", "the gas stays at one temperature"),
        valid=(
            Validity(holds=p > p_min, says="The vessel is already at its least pressure.", refuse=True),
            ideal_at(p),
        ),
        source=CONSERVATION.at("ideal amount in the vessel over amount per time"),
        example={
            "V": "50.0 L",
            "p": "9.00 bar absolute",
            "p_min": "3.00 bar absolute",
            "T_ref": "20 °C",
            "p_ref": "101.325 kPa absolute",
            "q_ref": "2.50 L/min",
            "T": "12.0 °C",
        },
        words=("duration", "changeover"),
    )
    LOCKED_IN = Relation(
        key="locked_in",
        title="Pressure locked in a rigid volume",
        left=p_1 / (Z_1 * T_1),
        right=p_2 / (Z_2 * T_2),
        where={
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at closing"),
            Z_1: Variable(kinds.COMPRESSIBILITY, "compressibility factor at closing", default=Fraction(1)),
            T_1: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature at closing"),
            p_2: Variable(kinds.ABSOLUTE_PRESSURE, "pressure later"),
            Z_2: Variable(kinds.COMPRESSIBILITY, "compressibility factor later", default=Fraction(1)),
            T_2: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature later"),
        },
        assumes=("rigid and tight volume", "gas only, no trapped liquid"),
        source=CONSERVATION.at("amount and volume stay the same"),
        example={"p_1": "8.01 bar absolute", "T_1": "12.0 °C", "T_2": "45.0 °C"},
        words=("trapped gas", "sun on a pipe"),
    )

with as_printed():
    BLOWDOWN = Relation(
        key="blowdown",
        title="Pressure while a vessel blows down",
        left=p,
        right=p_0 * exp(-C_d * A * psi * sqrt(R * T / M) * t / V),
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure after the time"),
            p_0: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the start"),
            C_d: Variable(kinds.COEFFICIENT, "discharge coefficient of the opening"),
            A: Variable(kinds.AREA, "area of the opening"),
            psi: Variable(kinds.CHOKED_FACTOR, "choked-flow factor √γ·(2/(γ + 1))^((γ + 1)/(2·(γ − 1)))"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
            t: Variable(kinds.TIME, "time"),
            V: Variable(kinds.VOLUME, "volume of the vessel"),
        },
        assumes=(
            "the flow stays choked: twice the pressure outside, at least",
            "the walls hold the temperature",
            "ideal gas",
        ),
        valid=(Validity(holds=p <= p_0, says="A vessel that blows down cannot gain pressure.", refuse=True),),
        source=GAS_DYNAMICS.at("isothermal blowdown of a vessel through a choked opening"),
        example={
            "p_0": "8.01 bar absolute",
            "C_d": "0.80",
            "A": "12.6 mm²",
            "psi": "0.6847",
            "T": "12.0 °C",
            "M": "28.013 g/mol",
            "t": "5.0 min",
            "V": "640 L",
        },
        words=("vent", "depressurise"),
    )
    VOLUME_BY_EXPANSION = Relation(
        key="volume_by_expansion",
        title="Volume by expansion from a known one",
        left=V_x,
        right=V_r * (p_1 - p_2) / (p_2 - p_x),
        where={
            V_x: Variable(kinds.VOLUME, "volume to be known"),
            V_r: Variable(kinds.VOLUME, "known volume"),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure in the known volume before"),
            p_2: Variable(kinds.ABSOLUTE_PRESSURE, "pressure in both after"),
            p_x: Variable(kinds.ABSOLUTE_PRESSURE, "pressure in the other volume before", Sign.NONNEGATIVE),
        },
        assumes=("ideal gas", "one temperature before and after, waited for"),
        source=CONSERVATION.at("amount before and after opening the valve"),
        example={
            "V_r": "2.000 L",
            "p_1": "5.012 bar absolute",
            "p_2": "1.873 bar absolute",
            "p_x": "996.4 hPa absolute",
        },
        words=("expansion method", "dead volume", "section volume"),
    )
    PIPE_VOLUME = Relation(
        key="pipe_volume",
        title="Volume of a pipe",
        left=V,
        right=pi / 4 * d**2 * L,
        where={
            V: Variable(kinds.VOLUME, "volume inside"),
            d: Variable(kinds.LENGTH, "inside bore, not the nominal size"),
            L: Variable(kinds.LENGTH, "length"),
        },
        assumes=("round and of one bore",),
        source=GEOMETRY.at("volume of a cylinder"),
        example={"d": "54.5 mm", "L": "120 m"},
        words=("bore", "line volume"),
    )

FAMILY = Family(
    key="m_vessels",
    letter="M",
    title="Vessels",
    lead="Cylinders, banks and sections: what joins, empties, warms up.",
    relations=(EQUALISE, ENDURANCE, LOCKED_IN, BLOWDOWN, VOLUME_BY_EXPANSION, PIPE_VOLUME),
)
