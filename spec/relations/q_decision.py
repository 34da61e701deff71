"""Family Q: uncertainty and decision."""

from sympy import sqrt

from spec import kinds
from spec.model import Family, Nature, Relation, Sign, Variable
from spec.sources import EN_837_1, JCGM_100, JCGM_106
from spec.symbols import Total, as_printed, nonnegative, positive

u, c, span, nu, u_c, u_i, nu_i = positive("u c span nu u_c u_i nu_i")
a, L, U = nonnegative("a L U")

GUARD = {
    a: Variable(kinds.ANY_QUANTITY, "acceptance limit", Sign.NONNEGATIVE),
    L: Variable(kinds.ANY_QUANTITY, "limit", Sign.NONNEGATIVE),
    U: Variable(kinds.ANY_QUANTITY, "expanded uncertainty", Sign.NONNEGATIVE),
}

with as_printed():
    GAUGE_CLASS = Relation(
        key="gauge_class",
        title="Uncertainty of a gauge by its class",
        left=u,
        right=c / 100 * span / sqrt(3),
        where={
            u: Variable(kinds.PRESSURE_DIFFERENCE, "standard uncertainty of a reading"),
            c: Variable(kinds.ACCURACY_CLASS, "class on the dial"),
            span: Variable(kinds.PRESSURE_DIFFERENCE, "span of the scale"),
        },
        assumes=("the class is a limit of error at each point of the scale", "any error within it is as likely"),
        source=EN_837_1.at("accuracy classes, with JCGM 100, 4.3.7 for the rectangular distribution"),
        example={"c": "1.6", "span": "250 bar"},
        words=("accuracy", "dial gauge"),
    )
    EFFECTIVE_FREEDOM = Relation(
        key="effective_freedom",
        title="Effective degrees of freedom",
        left=nu,
        right=u_c**4 / Total(u_i**4 / nu_i),
        where={
            nu: Variable(kinds.FREEDOM, "effective degrees of freedom"),
            u_c: Variable(kinds.ANY_QUANTITY, "combined standard uncertainty"),
            u_i: Variable(kinds.ANY_QUANTITY, "contribution to it"),
            nu_i: Variable(kinds.FREEDOM, "its degrees of freedom"),
        },
        assumes=("the contributions are independent", "the coverage factor is then Student's t for that many"),
        source=JCGM_100.at("equation G.2b"),
        example={"u_c": "0.112 bar", "u_i": ("0.092 bar", "0.064 bar"), "nu_i": ("50", "4")},
        words=("Welch-Satterthwaite", "coverage factor"),
    )
    UPPER_GUARD = Relation(
        key="upper_guard",
        title="Acceptance limit under an upper limit",
        left=a,
        right=L - U,
        where=GUARD,
        assumes=("accept what is measured at a or below it", "for limits from above: leak rate, energy, pressure"),
        nature=Nature.DECISION,
        source=JCGM_106.at("section 8.3, guarded acceptance"),
        example={"L": "0.50 mbar", "U": "0.12 mbar"},
        words=("guard band", "pass", "fail"),
    )
    LOWER_GUARD = Relation(
        key="lower_guard",
        title="Acceptance limit over a lower limit",
        left=a,
        right=L + U,
        where=GUARD,
        assumes=("accept what is measured at a or above it", "for limits from below: oxygen share, endurance, content"),
        nature=Nature.DECISION,
        source=JCGM_106.at("section 8.3, guarded acceptance"),
        example={"L": "19.5 %", "U": "0.4 %"},
        words=("guard band", "pass", "fail"),
    )

FAMILY = Family(
    key="q_decision",
    letter="Q",
    title="Uncertainty and decision",
    lead="How good a reading is, and where a limit must be met so that the doubt is on the safe side.",
    relations=(GAUGE_CLASS, EFFECTIVE_FREEDOM, UPPER_GUARD, LOWER_GUARD),
)
