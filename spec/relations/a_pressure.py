"""Family A: pressure and columns."""

from spec import kinds
from spec.model import Family, Relation, Sign, Validity, Variable
from spec.sources import EN_837_1, ISO_80000_4, OPENSTAX_PHYSICS_1
from spec.symbols import as_printed, nonnegative, positive, real

p, F, A, dp, rho, g, h, p_atm = positive("p F A dp rho g h p_atm")
p_abs, p_vac = nonnegative("p_abs p_vac")
(p_gauge,) = real("p_gauge")

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

FAMILY = Family(
    key="a_pressure",
    letter="A",
    title="Pressure and columns",
    lead="What a gauge, a column and a barometer say, and what they count from.",
    relations=(FORCE_PRESSURE, HYDROSTATIC_COLUMN, GAUGE_PRESSURE, VACUUM_READING),
)
