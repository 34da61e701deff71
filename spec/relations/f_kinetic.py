"""Family F: kinetic theory."""

from collections.abc import Mapping

from sympy import Expr, Rational, Symbol, erf, exp, log, pi, sqrt

from spec import kinds
from spec.constants import BOLTZMANN_CONSTANT, MOLAR_GAS_CONSTANT
from spec.model import Branch, Constant, Family, Relation, Root, Sign, Split, Validity, Variable
from spec.sources import (
    CFR_1065,
    GRAHAM_1848,
    ISO_15900,
    JENNINGS_1988,
    KNUDSEN_1909,
    MAXWELL_1860,
    OPENSTAX_PHYSICS_2,
)
from spec.symbols import as_printed, nonnegative, positive

v, R, T, M, r_1, r_2, M_1, M_2 = positive("v R T M r_1 r_2 M_1 M_2")
mu, mu_0, T_0, S = positive("mu mu_0 T_0 S")
E, k, f, J, p, m, lam, d, lam_0, p_0, v_2 = positive("E k f J p m lam d lam_0 p_0 v_2")
F, v_1 = nonnegative("F v_1")
BELOW, ABOVE = "below_peak", "above_peak"

SPEED_WHERE: Mapping[Symbol, Variable | Constant] = {
    R: MOLAR_GAS_CONSTANT,
    T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
    M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
}
SPEED_ASSUMES = ("speeds follow the Maxwell distribution", "the gas is at rest as a whole")


def _share_below(speed: Symbol) -> Expr:
    """Give the share of molecules slower than ``speed``: the distribution integrated from rest."""
    ratio = speed * sqrt(M / (2 * R * T))
    return erf(ratio) - 2 / sqrt(pi) * ratio * exp(-(ratio**2))


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

with as_printed():
    MEAN_KINETIC_ENERGY = Relation(
        key="mean_kinetic_energy",
        title="Mean kinetic energy of a molecule",
        left=E,
        right=Rational(3, 2) * k * T,
        where={
            E: Variable(kinds.MOLECULE_ENERGY, "mean energy of moving along"),
            k: BOLTZMANN_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("moving along only, no turning or vibrating",),
        source=OPENSTAX_PHYSICS_2.at("section 2.2, equation 2.7"),
        example={"T": "12.0 °C"},
    )
    SPEED_DISTRIBUTION = Relation(
        key="speed_distribution",
        title="Maxwell distribution of molecular speeds",
        left=f,
        right=4 * pi * (M / (2 * pi * R * T)) ** Rational(3, 2) * v**2 * exp(-M * v**2 / (2 * R * T)),
        where={
            f: Variable(kinds.SPEED_DENSITY, "share of molecules for each metre per second"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            v: Variable(kinds.MOLECULAR_SPEED, "speed of a molecule"),
        },
        assumes=SPEED_ASSUMES,
        splits=(
            Split(unknown=v, at=sqrt(2 * R * T / M), below=BELOW, above=ABOVE),
            Split(unknown=T, at=M * v**2 / (3 * R), below=BELOW, above=ABOVE),
            Split(unknown=M, at=3 * R * T / v**2, below=BELOW, above=ABOVE),
        ),
        source=MAXWELL_1860.at("distribution of velocities"),
        example={"M": "28.013 g/mol", "T": "12.0 °C", "v": "650 m/s"},
    )
    SPEED_FRACTION = Relation(
        key="speed_fraction",
        title="Share of molecules between two speeds",
        left=F,
        right=_share_below(v_2) - _share_below(v_1),
        where={
            F: Variable(kinds.FRACTION, "share of the molecules", Sign.NONNEGATIVE),
            v_1: Variable(kinds.MOLECULAR_SPEED, "slower speed", Sign.NONNEGATIVE),
            v_2: Variable(kinds.MOLECULAR_SPEED, "faster speed"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=SPEED_ASSUMES,
        valid=(Validity(holds=v_1 <= v_2, says="The slower speed comes first.", refuse=True),),
        splits=(
            Split(unknown=T, at=M * (v_2**2 - v_1**2) / (6 * R * (log(v_2) - log(v_1))), below=BELOW, above=ABOVE),
            Split(unknown=M, at=6 * R * T * (log(v_2) - log(v_1)) / (v_2**2 - v_1**2), below=BELOW, above=ABOVE),
        ),
        source=MAXWELL_1860.at("distribution of velocities, integrated between two speeds"),
        example={"v_1": "600 m/s", "v_2": "700 m/s", "M": "28.013 g/mol", "T": "12.0 °C"},
    )
    IMPINGEMENT_RATE = Relation(
        key="impingement_rate",
        title="Molecules that strike a wall",
        left=J,
        right=p / sqrt(2 * pi * m * k * T),
        where={
            J: Variable(kinds.IMPINGEMENT, "molecules for each area and time"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            m: Variable(kinds.MOLECULE_MASS, "mass of a molecule"),
            k: BOLTZMANN_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=SPEED_ASSUMES,
        source=KNUDSEN_1909.at("number of impacts on a wall"),
        example={"p": "0.010 Pa absolute", "m": "4.65e-26 kg", "T": "12.0 °C"},
        words=("vacuum", "monolayer"),
    )
    MEAN_FREE_PATH = Relation(
        key="mean_free_path",
        title="Mean free path, hard spheres",
        left=lam,
        right=k * T / (sqrt(2) * pi * d**2 * p),
        where={
            lam: Variable(kinds.SMALL_LENGTH, "mean free path"),
            k: BOLTZMANN_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            d: Variable(kinds.SMALL_LENGTH, "diameter of a molecule"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
        },
        assumes=("molecules are hard spheres of one size",),
        source=OPENSTAX_PHYSICS_2.at("section 2.2, equation 2.10"),
        example={"T": "12.0 °C", "d": "0.37 nm", "p": "0.010 mbar absolute"},
        words=("vacuum",),
    )
    MEAN_FREE_PATH_VISCOSITY = Relation(
        key="mean_free_path_viscosity",
        title="Mean free path from viscosity",
        left=lam,
        right=mu / p * sqrt(pi * R * T / (2 * M)),
        where={
            lam: Variable(kinds.SMALL_LENGTH, "mean free path"),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
        },
        assumes=("ideal gas", "a numerical factor of one half, where refined theory has 0.499"),
        source=JENNINGS_1988.at("equation for the mean free path"),
        example={"mu": "17.9 µPa·s", "p": "996.4 hPa absolute", "T": "12.0 °C", "M": "28.964 g/mol"},
        words=("vacuum", "Knudsen"),
    )
    MEAN_FREE_PATH_SCALED = Relation(
        key="mean_free_path_scaled",
        title="Mean free path from a tabulated one",
        left=lam,
        right=lam_0 * (T / T_0) ** 2 * (p_0 / p) * (T_0 + S) / (T + S),
        where={
            lam: Variable(kinds.SMALL_LENGTH, "mean free path"),
            lam_0: Variable(kinds.SMALL_LENGTH, "tabulated mean free path"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            T_0: Variable(kinds.ABSOLUTE_TEMPERATURE, "tabulated temperature"),
            p_0: Variable(kinds.ABSOLUTE_PRESSURE, "tabulated pressure"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            S: Variable(kinds.TEMPERATURE_CONSTANT, "Sutherland constant of the gas"),
        },
        assumes=("Sutherland's form holds for the gas",),
        branches=(
            Branch(unknown=T, root=Root.LARGEST, why="the other root lies below zero kelvin"),
            Branch(unknown=T_0, root=Root.LARGEST, why="the other root lies below zero kelvin"),
        ),
        source=ISO_15900.at("mean free path of air, scaled from reference conditions"),
        example={
            "lam_0": "67.3 nm",
            "T": "12.0 °C",
            "T_0": "296.15 K",
            "p_0": "101.3 kPa absolute",
            "p": "996.4 hPa absolute",
            "S": "110.4 K",
        },
        words=("aerosol",),
    )

FAMILY = Family(
    key="f_kinetic",
    letter="F",
    title="Kinetic theory",
    lead="How fast molecules move, how they pass a fine hole, how they carry momentum.",
    relations=(
        MEAN_KINETIC_ENERGY,
        MOST_PROBABLE_SPEED,
        MEAN_SPEED,
        RMS_SPEED,
        SPEED_DISTRIBUTION,
        SPEED_FRACTION,
        GRAHAM,
        IMPINGEMENT_RATE,
        MEAN_FREE_PATH,
        MEAN_FREE_PATH_VISCOSITY,
        MEAN_FREE_PATH_SCALED,
        SUTHERLAND_VISCOSITY,
    ),
)
