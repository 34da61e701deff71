"""Family L: purging."""

from sympy import exp, log

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import CONSERVATION, CROWL_LOUVAR
from spec.symbols import as_printed, nonnegative, positive

p_L, p_H, N, n, V, R, T, q, t, K_m, y_start, y_now, V_g = positive("p_L p_H N n V R T q t K_m y_0 y V_g")
y_n, c_positive, x, x_air = positive("y_n c x x_air")
y_s, y_0, c, c_0, G, q_air, x_g = nonnegative("y_s y_0 c c_0 G q x_g")

LOW = Variable(kinds.ABSOLUTE_PRESSURE, "low pressure of a cycle")
HIGH = Variable(kinds.ABSOLUTE_PRESSURE, "high pressure of a cycle")
CYCLES = Variable(kinds.COUNT, "number of cycles")
ROOM = Variable(kinds.VOLUME, "volume of the room")
SHARE = Variable(kinds.FRACTION, "share of the gas in the air of the room")
RELEASED = Variable(kinds.VOLUME, "volume released, at the pressure and temperature of the room")
TRUE_SWING = Validity(holds=p_L < p_H, says="The high pressure must be above the low one, both absolute.", refuse=True)

with as_printed():
    SWING_PURGE = Relation(
        key="swing_purge",
        title="Purging by pressure swings",
        left=y_n,
        right=y_s + (y_0 - y_s) * (p_L / p_H) ** N,
        where={
            y_n: Variable(kinds.FRACTION, "share after the cycles"),
            y_s: Variable(kinds.FRACTION, "share in the purge gas", Sign.NONNEGATIVE),
            y_0: Variable(kinds.FRACTION, "share at the start", Sign.NONNEGATIVE),
            p_L: LOW,
            p_H: HIGH,
            N: CYCLES,
        },
        assumes=("fully mixed before every letting off", "absolute pressures", "ideal gas", "a count is rounded up"),
        valid=(TRUE_SWING,),
        source=CROWL_LOUVAR.at("section 7-1, vacuum and pressure purging, equation 7-6"),
        example={"y_s": "20 ppm", "y_0": "20.9 %", "p_L": "1.01 bar absolute", "p_H": "5.01 bar absolute", "N": "3"},
        words=("inerting", "pressure purge", "vacuum purge", "cycles"),
    )
    SWING_GAS = Relation(
        key="swing_gas",
        title="Purge gas for pressure swings",
        left=n,
        right=N * (p_H - p_L) * V / (R * T),
        where={
            n: Variable(kinds.AMOUNT, "amount of purge gas"),
            N: CYCLES,
            p_H: HIGH,
            p_L: LOW,
            V: Variable(kinds.VOLUME, "volume purged"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("ideal gas", "one temperature"),
        valid=(TRUE_SWING,),
        source=CROWL_LOUVAR.at("section 7-1, total moles of inert gas, equation 7-7"),
        example={"N": "3", "p_H": "5.01 bar absolute", "p_L": "1.01 bar absolute", "V": "412 L", "T": "12.0 °C"},
        words=("inerting", "nitrogen needed"),
    )
    SWEEP_PURGE = Relation(
        key="sweep_purge",
        title="Purging by sweeping through",
        left=q * t,
        right=(V / K_m) * log((y_start - y_s) / (y_now - y_s)),
        where={
            q: Variable(kinds.FLOW, "flow of purge gas, at the pressure and temperature of the volume"),
            t: Variable(kinds.TIME, "time of sweeping"),
            V: Variable(kinds.VOLUME, "volume purged"),
            K_m: Variable(kinds.MIXING, "mixing factor, 0.1 poor to 1 perfect"),
            y_start: Variable(kinds.FRACTION, "share at the start"),
            y_s: Variable(kinds.FRACTION, "share in the purge gas", Sign.NONNEGATIVE),
            y_now: Variable(kinds.FRACTION, "share at the end"),
        },
        assumes=("mixed as K_m says", "one pressure and one temperature"),
        valid=(
            Validity(holds=K_m <= 1, says="The mixing factor is at most 1.", refuse=True),
            Validity(
                holds=10 * K_m >= 1,
                says="Below 0.1 the volume is hardly mixed: the time is not to be trusted.",
                refuse=True,
            ),
        ),
        source=CROWL_LOUVAR.at("section 7-1, sweep-through purging, equation 7-15, with a mixing factor"),
        example={"q": "60 L/min", "V": "412 L", "K_m": "0.5", "y_0": "20.9 %", "y_s": "20 ppm", "y": "1.0 %"},
        words=("inerting", "sweep-through", "dilution purge"),
    )
    ROOM_DILUTION = Relation(
        key="room_dilution",
        title="Gas in a ventilated room",
        left=c,
        right=G / (q_air + G) + (c_0 - G / (q_air + G)) * exp(-(q_air + G) * t / V),
        where={
            c: Variable(kinds.FRACTION, "share of the gas after the time", Sign.NONNEGATIVE),
            G: Variable(kinds.FLOW, "gas released", Sign.NONNEGATIVE),
            q_air: Variable(kinds.FLOW, "fresh air in", Sign.NONNEGATIVE),
            c_0: Variable(kinds.FRACTION, "share at the start", Sign.NONNEGATIVE),
            t: Variable(kinds.TIME, "time"),
            V: ROOM,
        },
        assumes=("well mixed: beside the source there is more", "as much leaves as comes in", "one temperature"),
        source=CROWL_LOUVAR.at("section 3-4, well-mixed room, written for gas that adds its own volume"),
        example={"G": "30 L/min", "q": "45 m³/h", "c_0": "0 %", "t": "2 h", "V": "38 m³"},
        words=("ventilation", "oxygen deficiency", "accumulation", "air changes"),
    )
    ROOM_MIXED = Relation(
        key="room_mixed",
        title="Gas released at once, mixing",
        left=c_positive,
        right=1 - exp(-V_g / V),
        where={c_positive: SHARE, V_g: RELEASED, V: ROOM},
        assumes=("well mixed while air leaves", "no fresh air"),
        source=CROWL_LOUVAR.at("section 3-4, well-mixed room without fresh air"),
        example={"V_g": "9.4 m³", "V": "38 m³"},
        words=("cylinder burst", "oxygen deficiency", "release"),
    )
    ROOM_DISPLACED = Relation(
        key="room_displaced",
        title="Gas released at once, pushing air out",
        left=c_positive,
        right=V_g / V,
        where={c_positive: SHARE, V_g: RELEASED, V: ROOM},
        assumes=("only air leaves, unmixed: the worst of the simple cases",),
        valid=(Validity(holds=V_g <= V, says="More gas than room: the air is gone altogether.", refuse=True),),
        source=CONSERVATION.at("as much air leaves as gas comes in"),
        example={"V_g": "9.4 m³", "V": "38 m³"},
        words=("cylinder burst", "oxygen deficiency", "release"),
    )
    ROOM_SEALED = Relation(
        key="room_sealed",
        title="Gas released at once, nothing leaves",
        left=c_positive,
        right=V_g / (V + V_g),
        where={c_positive: SHARE, V_g: RELEASED, V: ROOM},
        assumes=("nothing leaves, the pressure rises",),
        source=CONSERVATION.at("amounts of gas and of air add"),
        example={"V_g": "0.60 m³", "V": "38 m³"},
        words=("cylinder burst", "oxygen deficiency", "release"),
    )
    OXYGEN_AFTER_RELEASE = Relation(
        key="oxygen_after_release",
        title="Oxygen after a release",
        left=x,
        right=x_air * (1 - c) + x_g * c,
        where={
            x: Variable(kinds.FRACTION, "share of oxygen in the room"),
            x_air: Variable(kinds.FRACTION, "share of oxygen in the air before"),
            c: Variable(kinds.FRACTION, "share of the gas released", Sign.NONNEGATIVE),
            x_g: Variable(kinds.FRACTION, "share of oxygen in the gas released", Sign.NONNEGATIVE),
        },
        assumes=("well mixed",),
        valid=(Validity(holds=c <= 1, says="A share is at most 1.", refuse=True),),
        source=CONSERVATION.at("amount of oxygen"),
        example={"x_air": "20.9 %", "c": "12.0 %", "x_g": "0 %"},
        words=("oxygen deficiency", "oxygen enrichment", "asphyxiation"),
    )

FAMILY = Family(
    key="l_purging",
    letter="L",
    title="Purging",
    lead="Changing the gas in a vessel, and what a release does to the air of a room.",
    relations=(
        SWING_PURGE,
        SWING_GAS,
        SWEEP_PURGE,
        ROOM_DILUTION,
        ROOM_MIXED,
        ROOM_DISPLACED,
        ROOM_SEALED,
        OXYGEN_AFTER_RELEASE,
    ),
)
