"""Family I: concentration."""

from sympy import Abs, Rational

from spec import kinds
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import IEC_80079, NIOSH_NMAM, OSHA_1000
from spec.symbols import Total, as_printed, nonnegative, positive

M, V_m, m, q, t, x_lel = positive("M V_m m q t x_lel")
c, x, L, c_i, t_i = nonnegative("c x L c_i t_i")
RULE_VOLUME, RULE_WIDTH = Rational(2445, 100000), Rational(1, 100000)

with as_printed():
    PPM_TO_MASS = Relation(
        key="ppm_to_mass",
        title="Mole share and mass concentration",
        left=c,
        right=x * M / V_m,
        where={
            c: Variable(kinds.MASS_CONCENTRATION, "mass per volume of air", Sign.NONNEGATIVE),
            x: Variable(kinds.FRACTION, "share in the air", Sign.NONNEGATIVE),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
            V_m: Variable(kinds.MOLAR_VOLUME, "volume that one mole of the air takes"),
        },
        assumes=(
            "ideal gas",
            "for the air on site V_m is that at its own pressure and temperature",
            "for a limit set at 25 °C and 760 mmHg V_m is 24.45 L/mol wherever the site is",
        ),
        valid=(
            Validity(
                holds=Abs(V_m - RULE_VOLUME) > RULE_WIDTH,
                says=(
                    "24.45 L/mol counts air at 25 °C and 760 mmHg, as limits set by rule do. The air on site takes "
                    "another volume: for what is there now, take V_m at its own pressure and temperature."
                ),
            ),
        ),
        source=NIOSH_NMAM.at("chapter on general considerations, conversion of ppm and mg/m³"),
        example={"x": "35 ppm", "M": "28.010 g/mol", "V_m": "24.02 L/mol"},
        words=("ppm", "mg/m3", "exposure limit"),
    )
    SAMPLER_CONCENTRATION = Relation(
        key="sampler_concentration",
        title="Concentration from a sampled mass",
        left=c,
        right=m / (q * t),
        where={
            c: Variable(kinds.MASS_CONCENTRATION, "mean concentration over the sampling time", Sign.NONNEGATIVE),
            m: Variable(kinds.MASS, "mass found on the sampler"),
            q: Variable(kinds.FLOW, "mean flow through the sampler"),
            t: Variable(kinds.TIME, "sampling time"),
        },
        assumes=("everything sampled is kept and found", "the flow stayed the same"),
        source=NIOSH_NMAM.at("calculation of concentration from sampled air volume"),
        example={"m": "0.412 mg", "q": "2.00 L/min", "t": "240 min"},
        words=("pump sample", "tube", "filter"),
    )
    TIME_WEIGHTED_AVERAGE = Relation(
        key="time_weighted_average",
        title="Time-weighted average",
        left=c,
        right=Total(c_i * t_i) / t,
        where={
            c: Variable(kinds.MASS_CONCENTRATION, "average over the rule's time", Sign.NONNEGATIVE),
            c_i: Variable(kinds.MASS_CONCENTRATION, "concentration in one period", Sign.NONNEGATIVE),
            t_i: Variable(kinds.TIME, "length of the period", Sign.NONNEGATIVE),
            t: Variable(kinds.TIME, "time the rule averages over"),
        },
        assumes=("8 h or 15 min, as the rule says", "the periods cover the whole exposure"),
        source=OSHA_1000.at("paragraph (d)(1)(i)"),
        example={
            "c_i": ("38 mg/m³", "12 mg/m³", "0 mg/m³"),
            "t_i": ("2.0 h", "4.5 h", "1.5 h"),
            "t": "8 h",
        },
        words=("TWA", "STEL", "exposure", "shift"),
    )
    PERCENT_LEL = Relation(
        key="percent_lel",
        title="Share of the lower explosive limit",
        left=L,
        right=x / x_lel,
        where={
            L: Variable(kinds.SHARE_OF_LIMIT, "share of the lower explosive limit", Sign.NONNEGATIVE),
            x: Variable(kinds.FRACTION, "share of the gas in the air", Sign.NONNEGATIVE),
            x_lel: Variable(kinds.FRACTION, "lower explosive limit of that gas"),
        },
        assumes=("the source of the limit is named: methane 4.4 % or 5.0 %", "the sensor was calibrated for that gas"),
        source=IEC_80079.at("table of limits; the local code decides"),
        example={"x": "0.42 %", "x_lel": "4.4 %"},
        words=("LEL", "LFL", "explosive limit"),
    )

FAMILY = Family(
    key="i_concentration",
    letter="I",
    title="Concentration",
    lead="How much of a gas is in the air, by share, by mass, over a shift and against a limit.",
    relations=(PPM_TO_MASS, SAMPLER_CONCENTRATION, TIME_WEIGHTED_AVERAGE, PERCENT_LEL),
)
