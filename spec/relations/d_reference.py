"""Family D: reference conditions."""

from fractions import Fraction

from spec import kinds
from spec.model import Family, Relation, Variable
from spec.sources import CFR_1066, ISO_13443
from spec.symbols import as_printed, positive

V_0, V, q_0, q, p, p_0, T, T_0, Z, Z_0 = positive("V_0 V q_0 q p p_0 T T_0 Z Z_0")

STATE = {
    p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
    p_0: Variable(kinds.ABSOLUTE_PRESSURE, "reference pressure"),
    T_0: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature"),
    T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
    Z_0: Variable(kinds.COMPRESSIBILITY, "compressibility factor at reference conditions", default=Fraction(1)),
    Z: Variable(kinds.COMPRESSIBILITY, "compressibility factor of the gas", default=Fraction(1)),
}

with as_printed():
    REFERENCE_VOLUME = Relation(
        key="reference_volume",
        title="Volume at reference conditions",
        left=V_0,
        right=V * (p / p_0) * (T_0 / T) * (Z_0 / Z),
        where={
            V_0: Variable(kinds.REFERENCE_VOLUME, "volume at reference conditions"),
            V: Variable(kinds.VOLUME, "volume as it is"),
            **STATE,
        },
        assumes=("wet or dry on both sides alike",),
        source=ISO_13443.at("conversion between reference conditions"),
        example={"V": "412 L", "p": "7.01 bar absolute", "T": "12.0 °C", "p_0": "101.325 kPa absolute", "T_0": "20 °C"},
        words=("normal cubic metre", "standard cubic feet", "Nm3", "scf"),
    )
    REFERENCE_FLOW = Relation(
        key="reference_flow",
        title="Flow at reference conditions",
        left=q_0,
        right=q * (p / p_0) * (T_0 / T) * (Z_0 / Z),
        where={
            q_0: Variable(kinds.REFERENCE_FLOW, "flow at reference conditions"),
            q: Variable(kinds.FLOW, "flow as it is"),
            **STATE,
        },
        assumes=("steady flow", "wet or dry on both sides alike"),
        source=CFR_1066.at("1066.630, flow at standard conditions"),
        example={
            "q": "8.40 m³/h",
            "p": "3.01 bar absolute",
            "T": "12.0 °C",
            "p_0": "101.325 kPa absolute",
            "T_0": "20 °C",
        },
        words=("normal flow", "standard flow"),
    )

FAMILY = Family(
    key="d_reference",
    letter="D",
    title="Reference conditions",
    lead="A volume of gas means nothing without the temperature and pressure it is counted at.",
    relations=(REFERENCE_VOLUME, REFERENCE_FLOW),
)
