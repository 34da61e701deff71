"""Family E: mixtures and blending."""

from sympy import Integer

from spec import kinds
from spec.model import Family, Nature, Relation, Sign, Validity, Variable
from spec.sources import (
    AMAGAT_1880,
    CONSERVATION,
    DALTON_1801,
    EPA_METHOD_3,
    ISO_6142_1,
    ISO_6145,
    ISO_14912,
)
from spec.symbols import Total, as_printed, nonnegative, positive
from spec.validity import ideal_at, shares_sum_to_one

p, c, p_1, x_blend = positive("p c p_1 x")
n, V, M = positive("n V M")
p_i, n_i, V_i, m_i = nonnegative("p_i n_i V_i m_i")
w_i, share_i = nonnegative("w_i x_i")
(M_i,) = positive("M_i")
MIXING_LIMIT = Integer(5 * 10**6)
p_part, x, c_1, c_2, q_1, q_2, x_1, x_2 = nonnegative("p_part x c_1 c_2 q_1 q_2 x_1 x_2")

with as_printed():
    DALTON_PARTIAL = Relation(
        key="dalton_partial",
        title="Partial pressure",
        left=p_part,
        right=x * p,
        where={
            p_part: Variable(kinds.ABSOLUTE_PRESSURE, "partial pressure of one gas", Sign.NONNEGATIVE),
            x: Variable(kinds.FRACTION, "share of that gas", Sign.NONNEGATIVE),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the mixture"),
        },
        assumes=("ideal gases", "all gases at one temperature in one volume"),
        valid=(ideal_at(p),),
        source=DALTON_1801.at("law of partial pressures"),
        example={"x": "20.9 %", "p": "996.4 hPa absolute"},
        words=("Dalton", "oxygen partial pressure"),
    )
    DYNAMIC_DILUTION = Relation(
        key="dynamic_dilution",
        title="Blend of two flows",
        left=c,
        right=(q_1 * c_1 + q_2 * c_2) / (q_1 + q_2),
        where={
            c: Variable(kinds.FRACTION, "share in the blend"),
            q_1: Variable(kinds.REFERENCE_FLOW, "first flow", Sign.NONNEGATIVE),
            c_1: Variable(kinds.FRACTION, "share in the first flow", Sign.NONNEGATIVE),
            q_2: Variable(kinds.REFERENCE_FLOW, "second flow", Sign.NONNEGATIVE),
            c_2: Variable(kinds.FRACTION, "share in the second flow", Sign.NONNEGATIVE),
        },
        assumes=("both flows on one reference basis", "fully mixed"),
        source=ISO_6145.at("dilution of a flow with a flow"),
        example={"q_1": "50 mL/min", "c_1": "1.02 %", "q_2": "2.00 L/min", "c_2": "0 %"},
        words=("dilution", "calibration gas", "span gas"),
    )
    TOP_UP = Relation(
        key="top_up",
        title="Share after topping up a vessel",
        left=x_blend,
        right=(x_1 * p_1 + x_2 * (p - p_1)) / p,
        where={
            x_blend: Variable(kinds.FRACTION, "share after topping up"),
            x_1: Variable(kinds.FRACTION, "share in the gas already there", Sign.NONNEGATIVE),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure before"),
            x_2: Variable(kinds.FRACTION, "share in the gas added", Sign.NONNEGATIVE),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure after"),
        },
        assumes=("ideal gases", "one temperature before and after", "fully mixed"),
        valid=(Validity(holds=p_1 <= p, says="Topping up cannot lower the pressure.", refuse=True), ideal_at(p)),
        source=DALTON_1801.at("law of partial pressures, before and after"),
        example={"x_1": "0 %", "p_1": "6.21 bar absolute", "x_2": "20.9 %", "p": "8.40 bar absolute"},
        words=("blending", "partial pressure filling", "nitrox"),
    )

with as_printed():
    DALTON_TOTAL = Relation(
        key="dalton_total",
        title="Pressure of a mixture from its partial pressures",
        left=p,
        right=Total(p_i),
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the mixture"),
            p_i: Variable(kinds.ABSOLUTE_PRESSURE, "partial pressure", Sign.NONNEGATIVE),
        },
        assumes=("ideal gases", "all gases at one temperature in one volume"),
        valid=(
            Validity(
                holds=p <= MIXING_LIMIT,
                says="Above about 50 bar real gases miss the sum of partial pressures by some per cent: add amounts.",
            ),
        ),
        source=DALTON_1801.at("law of partial pressures"),
        example={"p_i": ("0.781 bar absolute", "0.209 bar absolute", "9.3 mbar absolute")},
        words=("Dalton", "sum of pressures"),
    )
    AMOUNT_TOTAL = Relation(
        key="amount_total",
        title="Amount of gas from several sources",
        left=n,
        right=Total(n_i),
        where={
            n: Variable(kinds.AMOUNT, "amount altogether"),
            n_i: Variable(kinds.AMOUNT, "amount", Sign.NONNEGATIVE),
        },
        assumes=("nothing is lost and nothing reacts",),
        nature=Nature.BALANCE,
        source=CONSERVATION.at("conservation of amount"),
        example={"n_i": ("412 mol", "388 mol", "96.5 mol")},
        words=("decanting", "cascade", "sum of amounts"),
    )
    AMAGAT_TOTAL = Relation(
        key="amagat_total",
        title="Volume of a mixture from the volumes of its gases",
        left=V,
        right=Total(V_i),
        where={
            V: Variable(kinds.VOLUME, "volume of the mixture"),
            V_i: Variable(kinds.VOLUME, "volume of one gas alone", Sign.NONNEGATIVE),
        },
        assumes=("each volume counted at the pressure and temperature of the mixture", "ideal gases"),
        source=AMAGAT_1880.at("law of partial volumes"),
        example={"V_i": ("2.40 m³", "0.65 m³", "0.08 m³")},
        words=("Amagat", "partial volume"),
    )
    MIXTURE_MOLAR_MASS = Relation(
        key="mixture_molar_mass",
        title="Molar mass of a mixture",
        left=M,
        right=Total(share_i * M_i),
        where={
            M: Variable(kinds.MOLAR_MASS, "molar mass of the mixture"),
            share_i: Variable(kinds.FRACTION, "mole share", Sign.NONNEGATIVE),
            M_i: Variable(kinds.MOLAR_MASS, "molar mass"),
        },
        assumes=("every component is listed",),
        valid=shares_sum_to_one(share_i),
        source=EPA_METHOD_3.at("section 12, dry molecular weight"),
        example={
            "x_i": ("78.08 %", "20.95 %", "0.93 %", "0.04 %"),
            "M_i": ("28.014 g/mol", "31.998 g/mol", "39.95 g/mol", "44.009 g/mol"),
        },
        words=("mean molar mass", "dry molecular weight"),
    )
    MASS_TO_MOLE = Relation(
        key="mass_to_mole",
        title="Mole share from mass shares",
        left=share_i,
        right=w_i / M_i / Total(w_i / M_i),
        where={
            share_i: Variable(kinds.FRACTION, "mole share", Sign.NONNEGATIVE),
            w_i: Variable(kinds.FRACTION, "mass share", Sign.NONNEGATIVE),
            M_i: Variable(kinds.MOLAR_MASS, "molar mass"),
        },
        turned={w_i: "mole_to_mass"},
        assumes=("every component is listed",),
        valid=shares_sum_to_one(w_i),
        source=ISO_14912.at("conversion of mass fractions to mole fractions"),
        example={"w_i": ("28.0 %", "72.0 %"), "M_i": ("31.998 g/mol", "28.014 g/mol")},
        words=("mass fraction", "mole fraction", "composition"),
    )
    MOLE_TO_MASS = Relation(
        key="mole_to_mass",
        title="Mass share from mole shares",
        left=w_i,
        right=share_i * M_i / Total(share_i * M_i),
        where={
            w_i: Variable(kinds.FRACTION, "mass share", Sign.NONNEGATIVE),
            share_i: Variable(kinds.FRACTION, "mole share", Sign.NONNEGATIVE),
            M_i: Variable(kinds.MOLAR_MASS, "molar mass"),
        },
        turned={share_i: "mass_to_mole"},
        assumes=("every component is listed",),
        valid=shares_sum_to_one(share_i),
        source=ISO_14912.at("conversion of mole fractions to mass fractions"),
        example={"x_i": ("25.0 %", "75.0 %"), "M_i": ("31.998 g/mol", "28.014 g/mol")},
        words=("mass fraction", "mole fraction", "composition"),
    )
    GRAVIMETRIC_BLEND = Relation(
        key="gravimetric_blend",
        title="Share of a component in a weighed blend",
        left=x_blend,
        right=Total(share_i * m_i / M_i) / Total(m_i / M_i),
        where={
            x_blend: Variable(kinds.FRACTION, "share of the component in the blend"),
            share_i: Variable(kinds.FRACTION, "share of the component in one parent gas", Sign.NONNEGATIVE),
            m_i: Variable(kinds.MASS, "mass of one parent gas", Sign.NONNEGATIVE),
            M_i: Variable(kinds.MOLAR_MASS, "molar mass of one parent gas"),
        },
        assumes=("masses corrected for buoyancy", "fully mixed"),
        source=ISO_6142_1.at("calculation of the composition"),
        example={
            "x_i": ("99.995 %", "0.0004 %"),
            "m_i": ("412.6 g", "1 893.2 g"),
            "M_i": ("31.998 g/mol", "28.014 g/mol"),
        },
        words=("weighing", "gravimetric preparation", "calibration gas"),
    )

FAMILY = Family(
    key="e_mixtures",
    letter="E",
    title="Mixtures and blending",
    lead="What each gas of a mixture bears, and what comes out when gases are put together.",
    relations=(
        DALTON_PARTIAL,
        DALTON_TOTAL,
        AMOUNT_TOTAL,
        AMAGAT_TOTAL,
        MIXTURE_MOLAR_MASS,
        MASS_TO_MOLE,
        MOLE_TO_MASS,
        GRAVIMETRIC_BLEND,
        DYNAMIC_DILUTION,
        TOP_UP,
    ),
)
