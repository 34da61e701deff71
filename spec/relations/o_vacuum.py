"""Family O: vacuum."""

from sympy import Rational, log, pi, sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import ISO_3529, KNUDSEN_1909, POISEUILLE_1840, VACUUM_HANDBOOK
from spec.symbols import as_printed, nonnegative, positive, real

Q, S, p, t, V, p_0, S_eff, C, A, v = positive("Q S p t V p_0 S_eff C A v")
d, L, mu, C_v, C_m, M, R, T, Kn, lam = positive("d L mu C_v C_m M R T Kn lam")
(p_u,) = nonnegative("p_u")
Q_rise, dp = real("Q dp")

SPEED = Variable(kinds.PUMP_SPEED, "pumping speed")
CONDUCTANCE = Variable(kinds.PUMP_SPEED, "conductance")
BORE = Variable(kinds.LENGTH, "bore of the tube")
LENGTH = Variable(kinds.LENGTH, "length of the tube")
MEAN_SPEED = Variable(kinds.SPEED, "mean speed of the molecules")
ENTRY = Rational(124, 100)

with as_printed():
    THROUGHPUT = Relation(
        key="throughput",
        title="Throughput of a pump",
        left=Q,
        right=S * p,
        where={
            Q: Variable(kinds.LEAK_RATE, "throughput"),
            S: SPEED,
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the inlet"),
        },
        assumes=("one temperature",),
        source=VACUUM_HANDBOOK.at("definition of throughput"),
        example={"S": "4.2 m³/h", "p": "0.050 mbar absolute"},
        words=("gas load", "pV flow"),
    )
    PUMP_DOWN = Relation(
        key="pump_down",
        title="Pump-down time",
        left=t,
        right=V / S * log((p_0 - p_u) / (p - p_u)),
        where={
            t: Variable(kinds.TIME, "time"),
            V: Variable(kinds.VOLUME, "volume pumped"),
            S: SPEED,
            p_0: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the start"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the end"),
            p_u: Variable(kinds.ABSOLUTE_PRESSURE, "ultimate pressure", Sign.NONNEGATIVE),
        },
        assumes=(
            "the speed stays the same, so not while a hose is in viscous flow",
            "no gas comes off the walls but what the ultimate pressure holds",
        ),
        valid=(
            Validity(
                holds=p > p_u,
                says="The pump never gets below its ultimate pressure, so the end must be above it.",
                refuse=True,
            ),
            Validity(holds=p <= p_0, says="Pumping down ends below the pressure at the start.", refuse=True),
        ),
        source=VACUUM_HANDBOOK.at("pump-down at constant speed"),
        example={
            "V": "86 L",
            "S": "4.2 m³/h",
            "p_0": "996.4 mbar absolute",
            "p": "1.0 mbar absolute",
            "p_u": "0.02 mbar absolute",
        },
        words=("evacuation",),
    )
    SERIES_CONDUCTANCE = Relation(
        key="series_conductance",
        title="Pump behind a hose",
        left=1 / S_eff,
        right=1 / S + 1 / C,
        where={
            S_eff: Variable(kinds.PUMP_SPEED, "speed at the vessel"),
            S: Variable(kinds.PUMP_SPEED, "speed of the pump"),
            C: Variable(kinds.PUMP_SPEED, "conductance of the hose"),
        },
        assumes=("one temperature", "the flow does not change its regime on the way"),
        source=VACUUM_HANDBOOK.at("conductances in series"),
        example={"S": "10.0 L/s", "C": "15.0 L/s"},
        words=("effective speed", "hose"),
    )
    APERTURE_CONDUCTANCE = Relation(
        key="aperture_conductance",
        title="Conductance of an opening, molecular",
        left=C,
        right=A * v / 4,
        where={C: CONDUCTANCE, A: Variable(kinds.AREA, "area of the opening"), v: MEAN_SPEED},
        assumes=("molecular flow", "a thin wall"),
        source=KNUDSEN_1909.at("flow through an opening"),
        example={"A": "1.00 cm²", "v": "463 m/s"},
        words=("orifice", "pinhole"),
    )
    TUBE_MOLECULAR = Relation(
        key="tube_molecular",
        title="Conductance of a long tube, molecular",
        left=C,
        right=pi * d**3 * v / (12 * L),
        where={C: CONDUCTANCE, d: BORE, v: MEAN_SPEED, L: LENGTH},
        assumes=("molecular flow", "the tube is many bores long"),
        source=KNUDSEN_1909.at("flow through a long tube"),
        example={"d": "25 mm", "v": "463 m/s", "L": "1.20 m"},
        words=("hose", "pumping line"),
    )
    TUBE_VISCOUS = Relation(
        key="tube_viscous",
        title="Conductance of a long tube, viscous",
        left=C,
        right=pi * d**4 * p / (128 * mu * L),
        where={
            C: CONDUCTANCE,
            d: BORE,
            p: Variable(kinds.ABSOLUTE_PRESSURE, "mean pressure in the tube"),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
            L: LENGTH,
        },
        assumes=("laminar flow", "the tube is many bores long"),
        source=POISEUILLE_1840.at("laminar flow through a round tube"),
        example={"d": "25 mm", "p": "1.0 mbar absolute", "mu": "18.2 µPa·s", "L": "1.20 m"},
        words=("hose", "pumping line", "Poiseuille"),
    )
    TUBE_TRANSITION = Relation(
        key="tube_transition",
        title="Conductance of a long tube between the regimes",
        left=C,
        right=C_v + (1 + sqrt(M / (R * T)) * d * p / mu) / (1 + ENTRY * sqrt(M / (R * T)) * d * p / mu) * C_m,
        where={
            C: CONDUCTANCE,
            C_v: Variable(kinds.PUMP_SPEED, "viscous conductance of the tube"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            d: BORE,
            p: Variable(kinds.ABSOLUTE_PRESSURE, "mean pressure in the tube"),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
            C_m: Variable(kinds.PUMP_SPEED, "molecular conductance of the tube"),
        },
        assumes=("between molecular and viscous flow", "the tube is many bores long"),
        source=KNUDSEN_1909.at("semi-empirical equation between the regimes"),
        example={
            "C_v": "0.42 L/s",
            "M": "28.96 g/mol",
            "T": "12.0 °C",
            "d": "10 mm",
            "p": "0.020 mbar absolute",
            "mu": "17.8 µPa·s",
            "C_m": "0.10 L/s",
        },
        words=("Knudsen", "transition"),
    )
    KNUDSEN_NUMBER = Relation(
        key="knudsen_number",
        title="Knudsen number",
        left=Kn,
        right=lam / d,
        where={
            Kn: Variable(kinds.KNUDSEN, "Knudsen number"),
            lam: Variable(kinds.SMALL_LENGTH, "mean free path"),
            d: Variable(kinds.LENGTH, "bore"),
        },
        assumes=("the narrowest dimension is the one that counts",),
        source=ISO_3529.at("Knudsen number"),
        example={"lam": "68 µm", "d": "10 mm"},
        words=("flow regime",),
    )
    RATE_OF_RISE = Relation(
        key="rate_of_rise",
        title="Gas load by rate of rise",
        left=Q_rise,
        right=V * dp / t,
        where={
            Q_rise: Variable(kinds.LEAK_RATE_EITHER_WAY, "gas load", Sign.ANY),
            V: Variable(kinds.VOLUME, "volume isolated"),
            dp: Variable(kinds.PRESSURE_CHANGE, "rise of pressure", Sign.ANY),
            t: Variable(kinds.TIME, "time isolated"),
        },
        assumes=("one temperature", "a straight rise is a leak; one that flattens is gas coming off the walls"),
        source=VACUUM_HANDBOOK.at("pressure-rise method"),
        example={"V": "86 L", "dp": "0.12 mbar", "t": "15 min"},
        words=("isolation test", "pressure rise", "outgassing"),
    )

FAMILY = Family(
    key="o_vacuum",
    letter="O",
    title="Vacuum",
    lead="How fast a volume is emptied, what a hose costs, and what comes back in.",
    relations=(
        THROUGHPUT,
        PUMP_DOWN,
        SERIES_CONDUCTANCE,
        APERTURE_CONDUCTANCE,
        TUBE_MOLECULAR,
        TUBE_VISCOUS,
        TUBE_TRANSITION,
        KNUDSEN_NUMBER,
        RATE_OF_RISE,
    ),
)
