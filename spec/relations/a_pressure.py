"""Family A: pressure and columns."""

from sympy import sin, sqrt

from spec import kinds
from spec.constants import FREE_AIR_GRADIENT
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import EN_837_1, FLUID_MECHANICS, GRS80, ISO_80000_4, OPENSTAX_PHYSICS_1, WMO_8
from spec.symbols import as_printed, nonnegative, positive, real

p, F, A, dp, rho, g, h, p_atm = positive("p F A dp rho g h p_atm")
p_abs, p_vac = nonnegative("p_abs p_vac")
p_gauge, h_m, z, t = real("p_gauge h z t")
rho_m, L, theta, A_w, rho_0, B, a_scale, a_mercury = positive("rho_m L theta A_w rho_0 B a_scale a_mercury")
g_e, k_s, e2, g_0, free_air = positive("g_e k_s e2 g_0 c_g")
p_end, rho_g, a, lat = nonnegative("p_end rho_g a lat")

with as_printed():
    FORCE_PRESSURE = Relation(
        key="force_pressure",
        title="Pressure of a force on an area",
        left=p,
        right=F / A,
        where={
            p: Variable(kinds.PRESSURE_DIFFERENCE, "pressure on the area"),
            F: Variable(kinds.FORCE, "force square to the area"),
            A: Variable(kinds.AREA, "area the force acts on"),
        },
        assumes=("the pressure is the same over the whole area",),
        source=OPENSTAX_PHYSICS_1.at("section 14.1, equation 14.2"),
        example={"F": "12.4 kN", "A": "78.5 cm²"},
        words=("flange", "blank", "thrust", "plug"),
    )
    HYDROSTATIC_COLUMN = Relation(
        key="hydrostatic_column",
        title="Pressure of a column of liquid",
        left=dp,
        right=rho * g * h,
        where={
            dp: Variable(kinds.PRESSURE_DIFFERENCE, "pressure difference over the column"),
            rho: Variable(kinds.DENSITY, "density of the liquid"),
            g: Variable(kinds.ACCELERATION, "acceleration of free fall on the spot"),
            h: Variable(kinds.LENGTH, "height of the column"),
        },
        assumes=("the liquid is at rest", "its density is the same over the whole height"),
        source=OPENSTAX_PHYSICS_1.at("section 14.1, equation 14.4"),
        example={"rho": "998.2 kg/m³", "g": "9.81 m/s²", "h": "350 mm"},
        words=("water gauge", "U-tube", "head"),
    )
    GAUGE_PRESSURE = Relation(
        key="gauge_pressure",
        title="Gauge and absolute pressure",
        left=p_abs,
        right=p_gauge + p_atm,
        where={
            p_abs: Variable(kinds.ABSOLUTE_PRESSURE, "absolute pressure", Sign.NONNEGATIVE),
            p_gauge: Variable(kinds.GAUGE_PRESSURE, "gauge pressure", Sign.ANY),
            p_atm: Variable(kinds.STATION_PRESSURE, "station pressure"),
        },
        assumes=("the gauge counts from the air around it", "the station pressure is read there, never at sea level"),
        source=ISO_80000_4.at("item 4-14, pressure, and its remark on gauge pressure"),
        example={"p_gauge": "200 bar gauge", "p_atm": "1013 mbar"},
        words=("barg", "psig", "psia", "bar gauge"),
    )
    VACUUM_READING = Relation(
        key="vacuum_reading",
        title="Vacuum reading and absolute pressure",
        left=p_abs,
        right=p_atm - p_vac,
        where={
            p_abs: Variable(kinds.ABSOLUTE_PRESSURE, "absolute pressure", Sign.NONNEGATIVE),
            p_atm: Variable(kinds.STATION_PRESSURE, "station pressure"),
            p_vac: Variable(kinds.VACUUM_PRESSURE, "vacuum reading", Sign.NONNEGATIVE),
        },
        assumes=("the gauge counts down from the air around it",),
        source=EN_837_1.at("vacuum scales"),
        example={"p_atm": "1013 mbar", "p_vac": "24.0 inHg vacuum"},
        valid=(
            Validity(
                holds=p_vac <= p_atm,
                says="A vacuum reading cannot be more than the station pressure: read both again.",
                refuse=True,
            ),
        ),
        words=("inHg vacuum", "suction"),
    )

with as_printed():
    MANOMETER = Relation(
        key="manometer",
        title="Pressure by a liquid manometer",
        left=p,
        right=p_end + (rho_m - rho_g) * g * h_m,
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            p_end: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the other end", Sign.NONNEGATIVE),
            rho_m: Variable(kinds.DENSITY, "density of the liquid"),
            rho_g: Variable(kinds.DENSITY, "density of the gas above it", Sign.NONNEGATIVE),
            g: Variable(kinds.ACCELERATION, "acceleration of free fall on the spot"),
            h_m: Variable(kinds.COLUMN_HEIGHT, "height of the column, below zero where it is pushed back", Sign.ANY),
        },
        assumes=(
            "an open arm or an open mercury J-tube ends at the station pressure",
            "a closed arm without air ends at nothing",
            "the liquid is at rest and has one temperature",
        ),
        source=OPENSTAX_PHYSICS_1.at("section 14.1 and 14.2, pressure in a fluid and manometers"),
        example={
            "p_end": "996.4 hPa absolute",
            "rho_m": "13.56 g/cm³",
            "rho_g": "1.2 kg/m³",
            "g": "9.81 m/s²",
            "h": "212 mm",
        },
        words=("U-tube", "J-tube", "mercury", "water column"),
    )
    INCLINED_MANOMETER = Relation(
        key="inclined_manometer",
        title="Pressure difference by an inclined manometer",
        left=dp,
        right=rho * g * L * (sin(theta) + a / A_w),
        where={
            dp: Variable(kinds.PRESSURE_DIFFERENCE, "pressure difference"),
            rho: Variable(kinds.DENSITY, "density of the liquid"),
            g: Variable(kinds.ACCELERATION, "acceleration of free fall on the spot"),
            L: Variable(kinds.LENGTH, "length read along the tube"),
            theta: Variable(kinds.ANGLE, "slope of the tube, acute"),
            a: Variable(kinds.AREA, "cross-section of the tube", Sign.NONNEGATIVE),
            A_w: Variable(kinds.AREA, "cross-section of the well"),
        },
        assumes=("the liquid is at rest", "the gas above it weighs nothing"),
        source=FLUID_MECHANICS.at("inclined-tube manometer with a well"),
        example={
            "rho": "830 kg/m³",
            "g": "9.81 m/s²",
            "L": "148 mm",
            "theta": "10 °",
            "a": "12.6 mm²",
            "A_w": "31.0 cm²",
        },
        words=("draught gauge", "slope gauge"),
    )
    MERCURY_BAROMETER = Relation(
        key="mercury_barometer",
        title="Station pressure by a mercury barometer",
        left=p,
        right=rho_0 * g * B * (1 + a_scale * t) / (1 + a_mercury * t),
        where={
            p: Variable(kinds.STATION_PRESSURE, "station pressure"),
            rho_0: Variable(kinds.DENSITY, "density of mercury at 0 °C"),
            g: Variable(kinds.ACCELERATION, "acceleration of free fall on the spot"),
            B: Variable(kinds.LENGTH, "height read on the scale"),
            a_scale: Variable(kinds.EXPANSION, "linear expansion of the scale, brass 1.84e-5 per kelvin"),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature of the barometer", Sign.ANY),
            a_mercury: Variable(kinds.EXPANSION, "volume expansion of mercury, 1.818e-4 per kelvin"),
        },
        assumes=(
            "the scale is true at 0 °C",
            "no air above the mercury",
            "index error and capillarity already taken off",
        ),
        source=WMO_8.at("part I, chapter 3, correction of mercury barometers for temperature"),
        example={
            "rho_0": "13.5951 g/cm³",
            "g": "9.8126 m/s²",
            "B": "748.6 mm",
            "a_scale": "1.84e-5 1/K",
            "t": "12.0 °C",
            "a_mercury": "1.818e-4 1/K",
        },
        words=("Fortin", "mmHg"),
    )
    GRAVITY_LATITUDE = Relation(
        key="gravity_latitude",
        title="Free fall by latitude",
        left=g,
        right=g_e * (1 + k_s * sin(lat) ** 2) / sqrt(1 - e2 * sin(lat) ** 2),
        where={
            g: Variable(kinds.ACCELERATION, "acceleration of free fall at sea level"),
            g_e: Variable(kinds.ACCELERATION, "that at the equator, 9.7803267715 m/s²"),
            k_s: Variable(kinds.SMALL_FACTOR, "Somigliana constant, 0.001931851353"),
            lat: Variable(kinds.LATITUDE, "latitude", Sign.NONNEGATIVE),
            e2: Variable(kinds.SMALL_FACTOR, "first eccentricity squared, 0.00669438002290"),
        },
        assumes=("the earth is the ellipsoid GRS80", "at sea level"),
        source=GRS80.at("normal gravity by Somigliana's closed formula"),
        example={"g_e": "9.7803267715 m/s²", "k_s": "0.001931851353", "lat": "54.6 °", "e2": "0.00669438002290"},
        words=("gravity", "barometer correction"),
    )
    GRAVITY_HEIGHT = Relation(
        key="gravity_height",
        title="Free fall by height",
        left=g,
        right=g_0 - free_air * z,
        where={
            g: Variable(kinds.ACCELERATION, "acceleration of free fall at height"),
            g_0: Variable(kinds.ACCELERATION, "that at sea level of the same latitude"),
            free_air: FREE_AIR_GRADIENT,
            z: Variable(kinds.ALTITUDE, "height above sea level", Sign.ANY),
        },
        assumes=("in free air, no rock beneath counted", "to 10 km"),
        valid=(Validity(holds=z <= 10000, says="The straight line is for heights to 10 km."),),
        source=WMO_8.at("part I, chapter 3, local acceleration of gravity"),
        example={"g_0": "9.8149 m/s²", "z": "312 m"},
        words=("gravity", "barometer correction"),
    )

FAMILY = Family(
    key="a_pressure",
    letter="A",
    title="Pressure and columns",
    lead="What a gauge, a column and a barometer say, and what they count from.",
    relations=(
        FORCE_PRESSURE,
        HYDROSTATIC_COLUMN,
        MANOMETER,
        INCLINED_MANOMETER,
        GAUGE_PRESSURE,
        VACUUM_READING,
        MERCURY_BAROMETER,
        GRAVITY_LATITUDE,
        GRAVITY_HEIGHT,
    ),
)
