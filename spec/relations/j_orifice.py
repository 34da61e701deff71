"""Family J, flow: the orifice plate, whose coefficient takes a page of its own."""

from sympy import Piecewise, Rational, exp, pi, sqrt

from spec import kinds
from spec.constants import INCH_LENGTH
from spec.model import Relation, Sign, Split, Validity, Variable
from spec.sources import ISO_5167_2
from spec.symbols import as_printed, nonnegative, positive

q_m, d, D, dp, p_1, rho, mu, kappa = positive("q_m d D dp p_1 rho mu kappa")
C, eps, beta, Re_D, A, inch = positive("C eps beta Re_D A l_in")
tappings, L_1, M_2 = nonnegative("tappings L_1 M_2")
CORNER, D_AND_HALF = Rational(1, 2), Rational(3, 2)
TAPPINGS = ("corner", "D and D/2", "flange")
number = Rational

with as_printed():
    UPSTREAM = Piecewise((0, tappings < CORNER), (1, tappings < D_AND_HALF), (inch / D, True))
    DOWNSTREAM = Piecewise((0, tappings < CORNER), (number("0.47"), tappings < D_AND_HALF), (inch / D, True))
    SMALL_PIPE = Piecewise(
        (number("0.011") * (number("0.75") - beta) * (number("2.8") - D / inch), number("2.8") * inch > D),
        (0, True),
    )
    LEAST_REYNOLDS = Piecewise((16000 * beta**2, tappings < D_AND_HALF), (4318 * beta**2 * D / inch, True))
    ORIFICE_PLATE = Relation(
        key="orifice_plate",
        title="Flow by an orifice plate",
        left=q_m,
        right=C * eps * pi / 4 * d**2 * sqrt(2 * rho * dp) / sqrt(1 - beta**4),
        parts={
            beta: d / D,
            Re_D: 4 * q_m / (pi * mu * D),
            A: (19000 * beta / Re_D) ** Rational(4, 5),
            L_1: UPSTREAM,
            M_2: 2 * DOWNSTREAM / (1 - beta),
            C: number("0.5961")
            + number("0.0261") * beta**2
            - number("0.216") * beta**8
            + number("0.000521") * (10**6 * beta / Re_D) ** Rational(7, 10)
            + (number("0.0188") + number("0.0063") * A) * beta ** Rational(7, 2) * (10**6 / Re_D) ** Rational(3, 10)
            + (number("0.043") + number("0.080") * exp(-10 * L_1) - number("0.123") * exp(-7 * L_1))
            * (1 - number("0.11") * A)
            * beta**4
            / (1 - beta**4)
            - number("0.031") * (M_2 - number("0.8") * M_2 ** Rational(11, 10)) * beta ** Rational(13, 10)
            + SMALL_PIPE,
            eps: 1
            - (number("0.351") + number("0.256") * beta**4 + number("0.93") * beta**8)
            * (1 - ((p_1 - dp) / p_1) ** (1 / kappa)),
        },
        where={
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            d: Variable(kinds.PLATE_BORE, "bore of the plate at line temperature"),
            rho: Variable(kinds.DENSITY, "density upstream"),
            dp: Variable(kinds.PRESSURE_DIFFERENCE, "pressure difference"),
            D: Variable(kinds.PIPE_BORE, "bore of the pipe at line temperature"),
            p_1: Variable(kinds.ABSOLUTE_PRESSURE, "pressure upstream"),
            mu: Variable(kinds.VISCOSITY, "viscosity of the gas"),
            kappa: Variable(kinds.ISENTROPIC, "isentropic exponent of the gas; a very large number for a liquid"),
            tappings: Variable(kinds.CHOICE, "tappings", Sign.NONNEGATIVE, choices=TAPPINGS),
            inch: INCH_LENGTH,
        },
        data=(tappings, D, mu),
        assumes=(
            "the plate, its edge, the pipe and the straight lengths are as the standard says",
            "one phase, steady, not swirling",
        ),
        valid=(
            Validity(holds=d >= number("0.0125"), says="The plate's bore must be at least 12.5 mm.", refuse=True),
            Validity(holds=number("0.05") <= D, says="The pipe's bore must be 50 mm to 1 m.", refuse=True),
            Validity(holds=D <= 1, says="The pipe's bore must be 50 mm to 1 m.", refuse=True),
            Validity(holds=d / D >= number("0.1"), says="The ratio of bores must be 0.1 to 0.75.", refuse=True),
            Validity(holds=d / D <= number("0.75"), says="The ratio of bores must be 0.1 to 0.75.", refuse=True),
            Validity(
                holds=dp <= p_1 / 4, says="The pressure behind must be at least 0.75 of that before.", refuse=True
            ),
            Validity(holds=Re_D >= 5000, says="The Reynolds number of the pipe is below 5000: too slow.", refuse=True),
            Validity(
                holds=Re_D >= LEAST_REYNOLDS,
                says="The Reynolds number of the pipe is too low for these bores and tappings.",
                refuse=True,
            ),
        ),
        splits=(
            Split(unknown=d, at=Rational(3, 4) * D, below="below_limit"),
            Split(unknown=dp, at=p_1 / 4, below="below_limit"),
            Split(unknown=p_1, at=4 * dp, above="above_limit"),
        ),
        source=ISO_5167_2.at("equations 1, 3 and 4, limits of use in 5.3.1"),
        example={
            "d": "50.0 mm",
            "rho": "5.95 kg/m³",
            "dp": "100 mbar",
            "D": "102.3 mm",
            "p_1": "5.01 bar absolute",
            "mu": "18.0 µPa·s",
            "kappa": "1.40",
            "tappings": "flange",
        },
        words=("differential pressure meter", "Reader-Harris", "metering"),
    )
