"""Family B: simple gas laws."""

from spec import kinds
from spec.model import Family, Relation, Sign, Variable
from spec.sources import AVOGADRO_1811, BOYLE_1662, GAY_LUSSAC_1802, OPENSTAX_CHEMISTRY, OPENSTAX_PHYSICS_2
from spec.symbols import as_printed, positive, real
from spec.validity import ideal_at

p_1, p_2, V_1, V_2, n_1, n_2, T_1, T_2 = positive("p_1 p_2 V_1 V_2 n_1 n_2 T_1 T_2")
p, p_ice, V, V_ice = positive("p p_ice V V_ice")
t, t_0 = real("t t_0")

FIRST_PRESSURE = Variable(kinds.ABSOLUTE_PRESSURE, "first pressure")
SECOND_PRESSURE = Variable(kinds.ABSOLUTE_PRESSURE, "second pressure")
FIRST_VOLUME = Variable(kinds.VOLUME, "first volume")
SECOND_VOLUME = Variable(kinds.VOLUME, "second volume")
FIRST_TEMPERATURE = Variable(kinds.ABSOLUTE_TEMPERATURE, "first temperature of the gas")
SECOND_TEMPERATURE = Variable(kinds.ABSOLUTE_TEMPERATURE, "second temperature of the gas")
FIRST_AMOUNT = Variable(kinds.AMOUNT, "first amount of gas")
SECOND_AMOUNT = Variable(kinds.AMOUNT, "second amount of gas")

with as_printed():
    BOYLE = Relation(
        key="boyle",
        title="Boyle’s law",
        left=p_1 * V_1,
        right=p_2 * V_2,
        where={p_1: FIRST_PRESSURE, V_1: FIRST_VOLUME, p_2: SECOND_PRESSURE, V_2: SECOND_VOLUME},
        assumes=("one amount of gas", "one temperature", "ideal gas"),
        valid=(ideal_at(p_1), ideal_at(p_2)),
        source=BOYLE_1662.at("chapter 5, table of the condensation of the air"),
        example={"p_1": "1.20 bar absolute", "V_1": "48.0 L", "p_2": "3.01 bar absolute"},
        words=("Mariotte", "isothermal", "compress"),
    )
    CHARLES = Relation(
        key="charles",
        title="Charles’s law",
        left=V_1 / T_1,
        right=V_2 / T_2,
        where={V_1: FIRST_VOLUME, T_1: FIRST_TEMPERATURE, V_2: SECOND_VOLUME, T_2: SECOND_TEMPERATURE},
        assumes=("one amount of gas", "one pressure", "ideal gas"),
        source=GAY_LUSSAC_1802.at("page 137"),
        example={"V_1": "25.0 L", "T_1": "12.0 °C", "T_2": "31.0 °C"},
        words=("isobaric", "Gay-Lussac", "expansion"),
    )
    AMONTONS = Relation(
        key="amontons",
        title="Amontons’s law",
        left=p_1 / T_1,
        right=p_2 / T_2,
        where={p_1: FIRST_PRESSURE, T_1: FIRST_TEMPERATURE, p_2: SECOND_PRESSURE, T_2: SECOND_TEMPERATURE},
        assumes=("one amount of gas", "one volume", "ideal gas"),
        valid=(ideal_at(p_1), ideal_at(p_2)),
        source=GAY_LUSSAC_1802.at("page 137, constant-volume form; Amontons 1702 from memory"),
        example={"p_1": "8.01 bar absolute", "T_1": "12.0 °C", "T_2": "31.0 °C"},
        words=("isochoric", "Gay-Lussac", "pressure and temperature", "sun on the pipe"),
    )
    AVOGADRO = Relation(
        key="avogadro",
        title="Avogadro’s law",
        left=V_1 / n_1,
        right=V_2 / n_2,
        where={V_1: FIRST_VOLUME, n_1: FIRST_AMOUNT, V_2: SECOND_VOLUME, n_2: SECOND_AMOUNT},
        assumes=("one pressure", "one temperature", "ideal gas"),
        source=AVOGADRO_1811.at("page 58"),
        example={"V_1": "24.5 L", "n_1": "1.02 mol", "n_2": "3.10 mol"},
    )
    COMBINED_GAS = Relation(
        key="combined_gas",
        title="Combined gas law",
        left=p_1 * V_1 / (n_1 * T_1),
        right=p_2 * V_2 / (n_2 * T_2),
        where={
            p_1: FIRST_PRESSURE,
            V_1: FIRST_VOLUME,
            n_1: FIRST_AMOUNT,
            T_1: FIRST_TEMPERATURE,
            p_2: SECOND_PRESSURE,
            V_2: SECOND_VOLUME,
            n_2: SECOND_AMOUNT,
            T_2: SECOND_TEMPERATURE,
        },
        assumes=("ideal gas", "both states settled"),
        valid=(ideal_at(p_1), ideal_at(p_2)),
        source=OPENSTAX_CHEMISTRY.at("section 9.2, the combined gas law"),
        example={
            "p_1": "7.21 bar absolute",
            "V_1": "412 L",
            "n_1": "125 mol",
            "T_1": "12.0 °C",
            "p_2": "3.40 bar absolute",
            "n_2": "118 mol",
            "T_2": "17.5 °C",
        },
    )
    ABSOLUTE_ZERO_PRESSURE = Relation(
        key="absolute_zero_pressure",
        title="Absolute zero from pressures",
        left=p,
        right=p_ice * (1 - t / t_0),
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at the temperature t"),
            p_ice: Variable(kinds.ABSOLUTE_PRESSURE, "pressure at 0 °C"),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature of the gas", Sign.ANY),
            t_0: Variable(kinds.CELSIUS_TEMPERATURE, "temperature at which the line reaches zero", Sign.ANY),
        },
        assumes=("one amount of gas", "one volume", "pressure falls on a straight line with temperature"),
        source=OPENSTAX_PHYSICS_2.at("section 1.2, the constant-volume gas thermometer"),
        example={"p": "1.084 bar absolute", "p_ice": "1.010 bar absolute", "t": "20.0 °C"},
        words=("gas thermometer",),
    )
    ABSOLUTE_ZERO_VOLUME = Relation(
        key="absolute_zero_volume",
        title="Absolute zero from volumes",
        left=V,
        right=V_ice * (1 - t / t_0),
        where={
            V: Variable(kinds.VOLUME, "volume at the temperature t"),
            V_ice: Variable(kinds.VOLUME, "volume at 0 °C"),
            t: Variable(kinds.CELSIUS_TEMPERATURE, "temperature of the gas", Sign.ANY),
            t_0: Variable(kinds.CELSIUS_TEMPERATURE, "temperature at which the line reaches zero", Sign.ANY),
        },
        assumes=("one amount of gas", "one pressure", "volume falls on a straight line with temperature"),
        source=GAY_LUSSAC_1802.at("page 137, one part in 266.66 per degree, in today's value 1/273.15"),
        example={"V": "53.66 mL", "V_ice": "50.00 mL", "t": "20.0 °C"},
        words=("gas thermometer",),
    )

FAMILY = Family(
    key="b_simple",
    letter="B",
    title="Simple gas laws",
    lead="Two states of one gas, with something held: temperature, pressure, volume or amount.",
    relations=(BOYLE, CHARLES, AMONTONS, AVOGADRO, COMBINED_GAS, ABSOLUTE_ZERO_PRESSURE, ABSOLUTE_ZERO_VOLUME),
)
