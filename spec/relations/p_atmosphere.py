"""Family P: atmosphere and buoyancy."""

from sympy import Ne, exp

from spec import kinds
from spec.constants import (
    MOLAR_GAS_CONSTANT,
    STANDARD_AIR_CONSTANT,
    STANDARD_GRAVITY,
    STANDARD_LAPSE_RATE,
    STANDARD_SEA_PRESSURE,
    STANDARD_SEA_TEMPERATURE,
)
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import ARCHIMEDES, ICAO_ATMOSPHERE, OIML_R_111, US_ATMOSPHERE_1976, WMO_8
from spec.symbols import as_printed, positive, real

p, p_b, T_b, g, M, R, T, p_msl, p_s, R_d, T_v, p_qnh = positive("p p_b T_b g M R T p_msl p_s R_d T_v p_qnh")
r_e, rho_a, rho_g, V, m, m_w, rho_w, rho = positive("r_e rho_a rho_g V m m_w rho_w rho")
p_sea, T_sea, lapse, R_air, g_n = positive("p_sea T_sea L_air R_air g_n")
L_b, H, H_b, z, F = real("L_b H H_b z F")
z_above = positive("z")[0]
H_above = positive("H")[0]

LAYER = {
    p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at H"),
    p_b: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the base of the layer"),
}
HEIGHTS = {
    H: Variable(kinds.ALTITUDE, "geopotential height", Sign.ANY),
    H_b: Variable(kinds.ALTITUDE, "height of the base of the layer", Sign.ANY),
}
GRAVITY = {g: Variable(kinds.ACCELERATION, "acceleration of free fall")}
AIR = {M: Variable(kinds.MOLAR_MASS, "molar mass of air")}

with as_printed():
    ATMOSPHERE_GRADIENT = Relation(
        key="atmosphere_gradient",
        title="Pressure by height, layer with a gradient",
        left=p,
        right=p_b * (1 + L_b * (H - H_b) / T_b) ** (-g * M / (R * L_b)),
        where={
            **LAYER,
            L_b: Variable(kinds.LAPSE_RATE, "temperature gradient of the layer, not 0", Sign.ANY),
            **HEIGHTS,
            T_b: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature at the base of the layer"),
            **GRAVITY,
            **AIR,
            R: MOLAR_GAS_CONSTANT,
        },
        assumes=("still, dry air of one composition", "one layer", "the 1976 tables take R = 8.31432 J/(mol K)"),
        valid=(
            Validity(
                holds=Ne(L_b, 0, evaluate=False),
                says="A layer without a gradient has its own law: pressure by height, one temperature.",
                refuse=True,
            ),
        ),
        source=US_ATMOSPHERE_1976.at("equation 33a"),
        example={
            "p_b": "996.4 hPa absolute",
            "L_b": "-6.5 K/km",
            "H": "812 m",
            "H_b": "312 m",
            "T_b": "12.0 °C",
            "g": "9.80665 m/s²",
            "M": "28.964 g/mol",
        },
        words=("barometric formula", "standard atmosphere", "altitude"),
    )
    ATMOSPHERE_ISOTHERMAL = Relation(
        key="atmosphere_isothermal",
        title="Pressure by height, one temperature",
        left=p,
        right=p_b * exp(-g * M * (H - H_b) / (R * T)),
        where={
            **LAYER,
            **GRAVITY,
            **AIR,
            **HEIGHTS,
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "mean virtual temperature of the layer"),
        },
        assumes=("still air of one composition", "T is the mean over the layer, raised for its moisture"),
        source=US_ATMOSPHERE_1976.at("equation 33b"),
        example={
            "p_b": "996.4 hPa absolute",
            "g": "9.81 m/s²",
            "M": "28.964 g/mol",
            "H": "340 m",
            "H_b": "312 m",
            "T": "12.0 °C",
        },
        words=("barometric formula", "hypsometric", "barometer above the job"),
    )
    SEA_LEVEL_REDUCTION = Relation(
        key="sea_level_reduction",
        title="Weather-map pressure and station pressure",
        left=p_msl,
        right=p_s * exp(g * z / (R_d * T_v)),
        where={
            p_msl: Variable(kinds.STATION_PRESSURE, "sea-level pressure of the weather map"),
            p_s: Variable(kinds.STATION_PRESSURE, "station pressure"),
            **GRAVITY,
            z: Variable(kinds.ALTITUDE, "height of the station", Sign.ANY),
            R_d: Variable(kinds.SPECIFIC_GAS_CONSTANT, "gas constant of dry air, 287.05 J/(kg·K)"),
            T_v: Variable(kinds.ABSOLUTE_TEMPERATURE, "mean virtual temperature between the station and sea level"),
        },
        assumes=(
            "T_v is the air temperature plus 0.00325 K for each metre of height, and a little for moisture",
            "not for an aviation altimeter setting, which is another number",
        ),
        source=WMO_8.at("part I, chapter 3, reduction of pressure to sea level"),
        example={
            "p_msl": "1013.2 hPa",
            "g": "9.81 m/s²",
            "z": "312 m",
            "R_d": "287.05 J/(kg·K)",
            "T_v": "13.0 °C",
        },
        words=("QFF", "mean sea level pressure", "forecast"),
    )
    ALTIMETER_SETTING = Relation(
        key="altimeter_setting",
        title="Altimeter setting and station pressure",
        left=p_s,
        right=p_sea * ((p_qnh / p_sea) ** (R_air * lapse / g_n) - lapse * z / T_sea) ** (g_n / (R_air * lapse)),
        where={
            p_s: Variable(kinds.STATION_PRESSURE, "station pressure"),
            p_sea: STANDARD_SEA_PRESSURE,
            p_qnh: Variable(kinds.STATION_PRESSURE, "altimeter setting (QNH)"),
            R_air: STANDARD_AIR_CONSTANT,
            lapse: STANDARD_LAPSE_RATE,
            g_n: STANDARD_GRAVITY,
            z: Variable(kinds.ALTITUDE, "height of the station", Sign.ANY),
            T_sea: STANDARD_SEA_TEMPERATURE,
        },
        assumes=(
            "the standard atmosphere between sea level and the station",
            "not for a weather map's sea-level pressure, which is another number",
        ),
        source=ICAO_ATMOSPHERE.at("pressure by height below 11 km, both ends taken in the standard atmosphere"),
        example={"p_qnh": "1021 hPa", "z": "312 m"},
        words=("QNH", "aviation", "aerodrome report"),
    )
    GEOPOTENTIAL_HEIGHT = Relation(
        key="geopotential_height",
        title="Geopotential height",
        left=H_above,
        right=r_e * z_above / (r_e + z_above),
        where={
            H_above: Variable(kinds.HEIGHT, "geopotential height"),
            r_e: Variable(kinds.LENGTH, "radius of the earth, 6 356 766 m in the standard"),
            z_above: Variable(kinds.HEIGHT, "geometric height"),
        },
        assumes=("gravity falls with the square of the distance",),
        source=US_ATMOSPHERE_1976.at("equation 18"),
        example={"r_e": "6356.766 km", "z": "812 m"},
        words=("altitude",),
    )
    BUOYANT_LIFT = Relation(
        key="buoyant_lift",
        title="Lift of a gas in air",
        left=F,
        right=(rho_a - rho_g) * V * g,
        where={
            F: Variable(kinds.LIFT, "lift, less the weight of the envelope", Sign.ANY),
            rho_a: Variable(kinds.DENSITY, "density of the air"),
            rho_g: Variable(kinds.DENSITY, "density of the gas"),
            V: Variable(kinds.VOLUME, "volume"),
            **GRAVITY,
        },
        assumes=("the weight of the envelope is not in it",),
        source=ARCHIMEDES.at("buoyancy of a body in a fluid"),
        example={"rho_a": "1.225 kg/m³", "rho_g": "0.169 kg/m³", "V": "4.20 m³", "g": "9.81 m/s²"},
        words=("balloon", "buoyancy"),
    )
    WEIGHING_BUOYANCY = Relation(
        key="weighing_buoyancy",
        title="Mass from a weighing in air",
        left=m,
        right=m_w * (1 - rho_a / rho_w) / (1 - rho_a / rho),
        where={
            m: Variable(kinds.MASS, "mass of the body"),
            m_w: Variable(kinds.MASS, "reading of the balance"),
            rho_a: Variable(kinds.DENSITY, "density of the air"),
            rho_w: Variable(kinds.DENSITY, "density of the weights, 8000 kg/m³ by convention"),
            rho: Variable(kinds.DENSITY, "density of the body"),
        },
        assumes=("the balance was adjusted with such weights in such air",),
        valid=(
            Validity(
                holds=rho > rho_a,
                says="A body lighter than the air around floats: it cannot be weighed so.",
                refuse=True,
            ),
        ),
        source=OIML_R_111.at("annex B, air buoyancy correction"),
        example={"m_w": "12.406 kg", "rho_a": "1.19 kg/m³", "rho_w": "8000 kg/m³", "rho": "2700 kg/m³"},
        words=("weighing a cylinder", "gravimetric"),
    )

FAMILY = Family(
    key="p_atmosphere",
    letter="P",
    title="Atmosphere and buoyancy",
    lead="What the air weighs at a height, what a weather report means at the job, and what air does to a balance.",
    relations=(
        ATMOSPHERE_GRADIENT,
        ATMOSPHERE_ISOTHERMAL,
        SEA_LEVEL_REDUCTION,
        ALTIMETER_SETTING,
        GEOPOTENTIAL_HEIGHT,
        BUOYANT_LIFT,
        WEIGHING_BUOYANCY,
    ),
)
