"""Family D: reference conditions."""

from fractions import Fraction

from spec import kinds
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import CFR_1066, EPA_METHOD_4, EPA_METHOD_5, EPA_METHOD_19, ISO_13443
from spec.symbols import as_printed, nonnegative, positive

V_0, V, q_0, q, p, p_0, T, T_0, Z, Z_0 = positive("V_0 V q_0 q p p_0 T T_0 Z Z_0")
V_dry, V_wet, c_ref, c, x_air, V_std, K, Y, p_b, dp_m = positive("V_dry V_wet c_ref c x_air V_std K Y p_b dp_m")
x_w, x_ref, x_meas = nonnegative("x_w x_ref x_meas")

OXYGEN = {
    x_air: Variable(kinds.FRACTION, "oxygen share of air that the rule names, 20.9 or 21 %"),
    x_ref: Variable(kinds.FRACTION, "oxygen share the rule refers to", Sign.NONNEGATIVE),
    x_meas: Variable(kinds.FRACTION, "oxygen share measured, dry", Sign.NONNEGATIVE),
}
LESS_THAN_AIR = Validity(
    holds=x_meas < x_air,
    says="The oxygen measured must be below that of air: at or above it nothing of the flue gas is left to correct.",
    refuse=True,
)
OXYGEN_ASSUMES = ("dry gas on both sides", "only air dilutes the flue gas")

STATE = {
    p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
    p_0: Variable(kinds.ABSOLUTE_PRESSURE, "reference pressure"),
    T_0: Variable(kinds.ABSOLUTE_TEMPERATURE, "reference temperature"),
    T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
    Z_0: Variable(kinds.COMPRESSIBILITY, "compressibility factor at reference conditions", default=Fraction(1)),
    Z: Variable(kinds.COMPRESSIBILITY, "compressibility factor of the gas", default=Fraction(1)),
}

with as_printed():
    REFERENCE_VOLUME = Relation(
        key="reference_volume",
        title="Volume at reference conditions",
        left=V_0,
        right=V * (p / p_0) * (T_0 / T) * (Z_0 / Z),
        where={
            V_0: Variable(kinds.REFERENCE_VOLUME, "volume at reference conditions"),
            V: Variable(kinds.VOLUME, "volume as it is"),
            **STATE,
        },
        assumes=("wet or dry on both sides alike",),
        source=ISO_13443.at("conversion between reference conditions"),
        example={"V": "412 L", "p": "7.01 bar absolute", "T": "12.0 °C", "p_0": "101.325 kPa absolute", "T_0": "20 °C"},
        words=("normal cubic metre", "standard cubic feet", "Nm3", "scf"),
    )
    REFERENCE_FLOW = Relation(
        key="reference_flow",
        title="Flow at reference conditions",
        left=q_0,
        right=q * (p / p_0) * (T_0 / T) * (Z_0 / Z),
        where={
            q_0: Variable(kinds.REFERENCE_FLOW, "flow at reference conditions"),
            q: Variable(kinds.FLOW, "flow as it is"),
            **STATE,
        },
        assumes=("steady flow", "wet or dry on both sides alike"),
        source=CFR_1066.at("1066.630, flow at standard conditions"),
        example={
            "q": "8.40 m³/h",
            "p": "3.01 bar absolute",
            "T": "12.0 °C",
            "p_0": "101.325 kPa absolute",
            "T_0": "20 °C",
        },
        words=("normal flow", "standard flow"),
    )

with as_printed():
    WET_TO_DRY = Relation(
        key="wet_to_dry",
        title="Dry volume of a wet gas",
        left=V_dry,
        right=V_wet * (1 - x_w),
        where={
            V_dry: Variable(kinds.VOLUME, "volume without the water vapour"),
            V_wet: Variable(kinds.VOLUME, "volume with the water vapour"),
            x_w: Variable(kinds.FRACTION, "share of water vapour", Sign.NONNEGATIVE),
        },
        assumes=("both volumes at the pressure and temperature of the meter", "ideal gas"),
        valid=(Validity(holds=x_w < 1, says="The share of water vapour must be below 1.", refuse=True),),
        source=EPA_METHOD_4.at("section 12, moisture content and dry gas volume"),
        example={"V_wet": "4.12 m³", "x_w": "2.3 %"},
        words=("moisture", "dry basis", "wet basis"),
    )
    OXYGEN_REFERENCE = Relation(
        key="oxygen_reference",
        title="Mass concentration at reference oxygen",
        left=c_ref,
        right=c * (x_air - x_ref) / (x_air - x_meas),
        where={
            c_ref: Variable(kinds.MASS_CONCENTRATION, "concentration at the reference oxygen"),
            c: Variable(kinds.MASS_CONCENTRATION, "concentration measured, dry"),
            **OXYGEN,
        },
        assumes=OXYGEN_ASSUMES,
        valid=(LESS_THAN_AIR,),
        source=EPA_METHOD_19.at("section 12, correction to reference oxygen, general form"),
        example={"c": "84 mg/m³", "x_air": "20.9 %", "x_ref": "3.0 %", "x_meas": "6.4 %"},
        words=("flue gas", "stack", "emission limit"),
    )
    OXYGEN_REFERENCE_FRACTION = Relation(
        key="oxygen_reference_fraction",
        title="Share at reference oxygen",
        left=c_ref,
        right=c * (x_air - x_ref) / (x_air - x_meas),
        where={
            c_ref: Variable(kinds.FRACTION, "share at the reference oxygen"),
            c: Variable(kinds.FRACTION, "share measured, dry"),
            **OXYGEN,
        },
        assumes=OXYGEN_ASSUMES,
        valid=(LESS_THAN_AIR,),
        source=EPA_METHOD_19.at("section 12, correction to reference oxygen, general form"),
        example={"c": "41 ppm", "x_air": "20.9 %", "x_ref": "15 %", "x_meas": "16.2 %"},
        words=("flue gas", "turbine", "ppm at 15 % oxygen"),
    )
    GAS_METER_VOLUME = Relation(
        key="gas_meter_volume",
        title="Dry gas meter at reference conditions",
        left=V_std,
        right=K * V * Y * (p_b + dp_m) / T,
        where={
            V_std: Variable(kinds.REFERENCE_VOLUME, "volume at reference conditions"),
            K: Variable(kinds.METER_CONSTANT, "reference temperature over reference pressure"),
            V: Variable(kinds.VOLUME, "volume the meter shows"),
            Y: Variable(kinds.COEFFICIENT, "calibration factor of the meter"),
            p_b: Variable(kinds.STATION_PRESSURE, "station pressure"),
            dp_m: Variable(kinds.PRESSURE_DIFFERENCE, "mean excess pressure at the meter"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "mean temperature of the meter"),
        },
        assumes=("dry gas", "ideal gas", "no leak in the train"),
        source=EPA_METHOD_5.at("section 12.3, equation 5-1"),
        example={
            "K": "0.3855 K/mmHg",
            "V": "1.214 m³",
            "Y": "0.998",
            "p_b": "996.4 hPa",
            "dp_m": "3.8 mbar",
            "T": "24.5 °C",
        },
        words=("dry gas meter", "isokinetic", "sampling train"),
    )

FAMILY = Family(
    key="d_reference",
    letter="D",
    title="Reference conditions",
    lead="A volume of gas means nothing without the temperature and pressure it is counted at.",
    relations=(
        REFERENCE_VOLUME,
        REFERENCE_FLOW,
        WET_TO_DRY,
        OXYGEN_REFERENCE,
        OXYGEN_REFERENCE_FRACTION,
        GAS_METER_VOLUME,
    ),
)
