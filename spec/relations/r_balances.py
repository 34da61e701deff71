"""Family R: balances and definitions that sheets are built from."""

from spec import kinds
from spec.constants import ICE_POINT
from spec.model import Family, Nature, Relation, Sign, Variable
from spec.sources import CONSERVATION, DEFINITION, SI_BROCHURE
from spec.symbols import as_printed, nonnegative, positive, real

X, N, x, rho, V, M, rho_0, q, q_m, T = positive("X N x rho V M rho_0 q q_m T")
t_duration = positive("t")[0]
n_vessel = positive("n")[0]
n_1, n_2 = nonnegative("n_1 n_2")
n_difference, t_celsius = real("n t")
T_0 = positive("T_0")[0]

with as_printed():
    TOTAL_OF_EQUAL = Relation(
        key="total_of_equal",
        title="Total of equal parts",
        left=X,
        right=N * x,
        where={
            X: Variable(kinds.VOLUME, "all together"),
            N: Variable(kinds.COUNT, "how many"),
            x: Variable(kinds.VOLUME, "each"),
        },
        assumes=("all parts are alike",),
        source=DEFINITION.at("count times each"),
        example={"N": "4", "x": "50.0 L"},
        nature=Nature.DEFINITION,
    )
    AMOUNT_IN_VESSEL = Relation(
        key="amount_in_vessel",
        title="Amount of gas in a vessel",
        left=n_vessel,
        right=rho * V / M,
        where={
            n_vessel: Variable(kinds.AMOUNT, "amount of gas"),
            rho: Variable(kinds.DENSITY, "density of the gas"),
            V: Variable(kinds.VOLUME, "volume of the vessel"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
        },
        assumes=("one density in the whole vessel",),
        source=DEFINITION.at("mass over molar mass"),
        example={"rho": "224.9 kg/m³", "V": "200 L", "M": "28.013 g/mol"},
        nature=Nature.DEFINITION,
    )
    AMOUNT_DIFFERENCE = Relation(
        key="amount_difference",
        title="Amount taken out",
        left=n_difference,
        right=n_1 - n_2,
        where={
            n_difference: Variable(kinds.AMOUNT, "amount taken out", Sign.ANY),
            n_1: Variable(kinds.AMOUNT, "amount before", Sign.NONNEGATIVE),
            n_2: Variable(kinds.AMOUNT, "amount after", Sign.NONNEGATIVE),
        },
        assumes=("nothing else comes in or goes out",),
        source=CONSERVATION.at("before less after"),
        example={"n_1": "1606 mol", "n_2": "91.4 mol"},
        nature=Nature.BALANCE,
    )
    AMOUNT_DELIVERED = Relation(
        key="amount_delivered",
        title="Amount a flow delivers",
        left=n_vessel,
        right=rho_0 * q * t_duration / M,
        where={
            n_vessel: Variable(kinds.AMOUNT, "amount delivered"),
            rho_0: Variable(kinds.DENSITY, "density at the reference conditions of the flow"),
            q: Variable(kinds.REFERENCE_FLOW, "flow at its reference conditions"),
            t_duration: Variable(kinds.TIME, "time"),
            M: Variable(kinds.MOLAR_MASS, "molar mass of the gas"),
        },
        assumes=("steady flow",),
        source=DEFINITION.at("density times volume over molar mass"),
        example={"rho_0": "1.165 kg/m³", "q": "30 L/min", "t": "20 h", "M": "28.013 g/mol"},
        nature=Nature.DEFINITION,
    )
    MASS_FLOW_OF_REFERENCE = Relation(
        key="mass_flow_of_reference",
        title="Mass flow of a reference flow",
        left=q_m,
        right=rho_0 * q,
        where={
            q_m: Variable(kinds.MASS_FLOW, "mass flow"),
            rho_0: Variable(kinds.DENSITY, "density at the reference conditions of the flow"),
            q: Variable(kinds.REFERENCE_FLOW, "flow at its reference conditions"),
        },
        assumes=("steady flow",),
        source=DEFINITION.at("density times volume flow"),
        example={"rho_0": "1.165 kg/m³", "q": "30 L/min"},
        nature=Nature.DEFINITION,
    )
    TEMPERATURE_CELSIUS = Relation(
        key="temperature_celsius",
        title="Kelvin and degrees Celsius",
        left=T,
        right=t_celsius + T_0,
        where={
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "thermodynamic temperature"),
            t_celsius: Variable(kinds.CELSIUS_TEMPERATURE, "Celsius temperature", Sign.ANY),
            T_0: ICE_POINT,
        },
        assumes=("none: this defines the Celsius scale",),
        source=SI_BROCHURE.at("section 2.3.1, definition of Celsius temperature"),
        example={"t": "12.0 °C"},
        nature=Nature.DEFINITION,
    )

FAMILY = Family(
    key="r_balances",
    letter="R",
    title="Balances and definitions",
    lead="The plain sums that job sheets are built from.",
    relations=(
        TOTAL_OF_EQUAL,
        AMOUNT_IN_VESSEL,
        AMOUNT_DIFFERENCE,
        AMOUNT_DELIVERED,
        MASS_FLOW_OF_REFERENCE,
        TEMPERATURE_CELSIUS,
    ),
)
