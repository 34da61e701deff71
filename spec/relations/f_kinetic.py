"""Family F: kinetic theory."""

from collections.abc import Mapping

from sympy import Rational, Symbol, pi, sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Constant, Family, Relation, Variable
from spec.sources import CFR_1065, GRAHAM_1848, OPENSTAX_PHYSICS_2
from spec.symbols import as_printed, positive

v, R, T, M, r_1, r_2, M_1, M_2 = positive("v R T M r_1 r_2 M_1 M_2")
mu, mu_0, T_0, S = positive("mu mu_0 T_0 S")

SPEED_WHERE: Mapping[Symbol, Variable | Constant] = {
    R: MOLAR_GAS_CONSTANT,
    T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
    M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
}
SPEED_ASSUMES = ("speeds follow the Maxwell distribution", "the gas is at rest as a whole")
SPEED_EXAMPLE = {"T": "12.0 °C", "M": "28.013 g/mol"}

with as_printed():
    MOST_PROBABLE_SPEED = Relation(
        key="most_probable_speed",
        title="Most probable speed of molecules",
        left=v,
        right=sqrt(2 * R * T / M),
        where={v: Variable(kinds.SPEED, "most probable speed"), **SPEED_WHERE},
        assumes=SPEED_ASSUMES,
        source=OPENSTAX_PHYSICS_2.at("section 2.4, equation 2.17"),
        example=SPEED_EXAMPLE,
    )
    MEAN_SPEED = Relation(
        key="mean_speed",
        title="Mean speed of molecules",
        left=v,
        right=sqrt(8 * R * T / (pi * M)),
        where={v: Variable(kinds.SPEED, "mean speed"), **SPEED_WHERE},
        assumes=SPEED_ASSUMES,
        source=OPENSTAX_PHYSICS_2.at("section 2.4, equation 2.16"),
        example=SPEED_EXAMPLE,
    )
    RMS_SPEED = Relation(
        key="rms_speed",
        title="Root-mean-square speed of molecules",
        left=v,
        right=sqrt(3 * R * T / M),
        where={v: Variable(kinds.SPEED, "root-mean-square speed"), **SPEED_WHERE},
        assumes=SPEED_ASSUMES,
        source=OPENSTAX_PHYSICS_2.at("section 2.2, equation 2.8"),
        example=SPEED_EXAMPLE,
    )
    GRAHAM = Relation(
        key="graham",
        title="Graham’s law of effusion",
        left=r_1 / r_2,
        right=sqrt(M_2 / M_1),
        where={
            r_1: Variable(kinds.MOLAR_FLOW, "rate of the first gas"),
            r_2: Variable(kinds.MOLAR_FLOW, "rate of the second gas"),
            M_2: Variable(kinds.MOLAR_MASS, "molar mass of the second gas"),
            M_1: Variable(kinds.MOLAR_MASS, "molar mass of the first gas"),
        },
        assumes=("the hole is smaller than the mean free path", "both gases at one temperature and one pressure"),
        source=GRAHAM_1848.at("effusion of gases"),
        example={"r_2": "2.10 mmol/s", "M_2": "28.013 g/mol", "M_1": "4.0026 g/mol"},
        words=("effusion", "helium leak"),
    )
    SUTHERLAND_VISCOSITY = Relation(
        key="sutherland_viscosity",
        title="Viscosity by Sutherland’s formula",
        left=mu,
        right=mu_0 * (T / T_0) ** Rational(3, 2) * (T_0 + S) / (T + S),
        where={
            mu: Variable(kinds.VISCOSITY, "viscosity at T"),
            mu_0: Variable(kinds.VISCOSITY, "viscosity at the tabulated temperature"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            T_0: Variable(kinds.ABSOLUTE_TEMPERATURE, "tabulated temperature"),
            S: Variable(kinds.TEMPERATURE_CONSTANT, "Sutherland constant of the gas"),
        },
        assumes=("low pressure", "a gas far above its boiling point"),
        source=CFR_1065.at("1065.640, equation for the viscosity of air, after Sutherland 1893"),
        example={"mu_0": "17.16 µPa·s", "T": "35.0 °C", "T_0": "273.15 K", "S": "110.56 K"},
    )

FAMILY = Family(
    key="f_kinetic",
    letter="F",
    title="Kinetic theory",
    lead="How fast molecules move, how they pass a fine hole, how they carry momentum.",
    relations=(MOST_PROBABLE_SPEED, MEAN_SPEED, RMS_SPEED, GRAHAM, SUTHERLAND_VISCOSITY),
)
