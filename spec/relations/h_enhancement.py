"""Family H, humidity: the enhancement factor of moist air, with its fitted coefficients."""

from fractions import Fraction

import sympy
from sympy import exp

from spec import dimensions as dim
from spec import kinds
from spec.model import Constant, Nature, Relation, Sign, Validity, Variable
from spec.sources import GREENSPAN_1976
from spec.symbols import as_printed, positive, real

f_e, e_s, p = positive("f_e e_s p")
t, alpha, beta = real("t alpha beta")
WATER_FACTORS = real("a_w1 a_w2 a_w3 a_w4 b_w1 b_w2 b_w3 b_w4")
ICE_FACTORS = real("a_f1 a_f2 a_f3 a_f4 b_f1 b_f2 b_f3 b_f4")
HARDY = GREENSPAN_1976.at("table 2, refitted to ITS-90 by Hardy 1998, from memory")
HARDY_VALUES = (
    ("3.53624e-4", "2.9328363e-5", "2.6168979e-7", "8.5813609e-9"),
    ("-10.7588", "6.3268134e-2", "-2.5368934e-4", "6.3405286e-7"),
    ("3.64449e-4", "2.9367585e-5", "4.8874766e-7", "4.3669918e-9"),
    ("-10.7271", "7.6215115e-2", "-1.7490155e-4", "2.4668279e-6"),
)
HARDY_CONSTANTS = tuple(
    Constant(
        title="coefficient of the enhancement factor",
        value=Fraction(value),
        unit=f"1/K^{power}" if power else "1",
        dimension=dim.NUMBER / dim.TEMPERATURE**power,
        source=HARDY,
    )
    for row in HARDY_VALUES
    for power, value in enumerate(row)
)


def _cubic(factors: tuple[sympy.Symbol, ...]) -> sympy.Expr:
    """Give a polynomial of the third degree in the temperature."""
    first, second, third, fourth = factors
    return first + second * t + third * t**2 + fourth * t**3


with as_printed():
    HARDY_PARTS = {
        alpha: sympy.Piecewise((_cubic(WATER_FACTORS[:4]), t >= 0), (_cubic(ICE_FACTORS[:4]), True)),
        beta: exp(sympy.Piecewise((_cubic(WATER_FACTORS[4:]), t >= 0), (_cubic(ICE_FACTORS[4:]), True))),
    }
    ENHANCEMENT_FACTOR = Relation(
        key="enhancement_factor",
        title="Enhancement factor of moist air",
        left=f_e,
        right=exp(alpha * (1 - e_s / p) + beta * (p / e_s - 1)),
        parts=HARDY_PARTS,
        where={
            f_e: Variable(kinds.ENHANCEMENT, "enhancement factor"),
            e_s: Variable(kinds.VAPOUR_PRESSURE, "saturation vapour pressure of pure water at t"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the air"),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature", Sign.ANY),
            **dict(zip(WATER_FACTORS + ICE_FACTORS, HARDY_CONSTANTS, strict=True)),
        },
        assumes=("air", "over water from 0 °C up, over ice below", "to 2 MPa"),
        valid=(
            Validity(holds=p <= 2 * 10**6, says="The factor is stated to 2 MPa only.", refuse=True),
            Validity(holds=t <= 100, says="The factor is stated from −100 °C to 100 °C.", refuse=True),
            Validity(holds=t >= -100, says="The factor is stated from −100 °C to 100 °C.", refuse=True),
            Validity(holds=e_s < p, says="At this pressure water boils: nothing is saturated.", refuse=True),
        ),
        nature=Nature.FIT,
        source=GREENSPAN_1976.at("functional equation, with the coefficients of Hardy 1998 for ITS-90, from memory"),
        example={"e_s": "14.0 hPa", "p": "8.01 bar absolute", "t": "12.0 °C"},
        words=("dew point", "compressed air", "real gas effect"),
    )
