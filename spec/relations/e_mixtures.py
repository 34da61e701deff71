"""Family E: mixtures and blending."""

from spec import kinds
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import DALTON_1801, ISO_6145
from spec.symbols import as_printed, nonnegative, positive
from spec.validity import ideal_at

p, c, p_1, x_blend = positive("p c p_1 x")
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

FAMILY = Family(
    key="e_mixtures",
    letter="E",
    title="Mixtures and blending",
    lead="What each gas of a mixture bears, and what comes out when gases are put together.",
    relations=(DALTON_PARTIAL, DYNAMIC_DILUTION, TOP_UP),
)
