"""Family G: real gas."""

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Branch, Family, GasName, Nature, Relation, Root, Validity, Variable
from spec.sources import DEFINITION, REFERENCE_EQUATION, VAN_DER_WAALS_1873
from spec.symbols import as_printed, gas, positive, rho_gas

p, a, V_m, b, R, T, rho, m, V = positive("p a V_m b R T rho m V")

with as_printed():
    VAN_DER_WAALS = Relation(
        key="van_der_waals",
        title="Van der Waals equation",
        left=(p + a / V_m**2) * (V_m - b),
        right=R * T,
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            a: Variable(kinds.ATTRACTION, "attraction constant of the gas"),
            V_m: Variable(kinds.MOLAR_VOLUME, "volume of one mole"),
            b: Variable(kinds.MOLAR_VOLUME, "volume taken by one mole of molecules"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("one attraction and one size of molecule over the whole range: a textbook form, not for signing",),
        valid=(
            Validity(
                holds=V_m > b,
                says="The molar volume must be larger than the volume of the molecules b.",
                refuse=True,
            ),
        ),
        branches=(
            Branch(unknown=V_m, root=Root.LARGEST, why="the gas is the largest of the roots, the liquid the smallest"),
        ),
        source=VAN_DER_WAALS_1873.at("chapter 8"),
        example={"p": "32.0 bar absolute", "a": "0.1370 Pa·m⁶/mol²", "b": "0.0387 L/mol", "T": "12.0 °C"},
        words=("cubic equation of state",),
    )
    REAL_DENSITY = Relation(
        key="real_density",
        title="Density by the reference equation of the gas",
        left=rho,
        right=rho_gas(p, T),
        where={
            rho: Variable(kinds.DENSITY, "density of the gas"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            gas: GasName("gas"),
        },
        assumes=("the state is a gas: a liquid is refused with its saturation pressure",),
        source=REFERENCE_EQUATION.at("residual Helmholtz energy"),
        example={"gas": "nitrogen", "p": "201.0 bar absolute", "T": "12.0 °C"},
        nature=Nature.PROPERTY,
        words=("real gas", "compressibility", "equation of state"),
    )
    GAS_CONTENT = Relation(
        key="gas_content",
        title="Mass of gas in a vessel",
        left=m,
        right=rho * V,
        where={
            m: Variable(kinds.MASS, "mass of gas"),
            rho: Variable(kinds.DENSITY, "density of the gas"),
            V: Variable(kinds.VOLUME, "volume of the vessel"),
        },
        assumes=("one density in the whole vessel",),
        source=DEFINITION.at("density is mass over volume (ISO 80000-4, item 4-2, from memory)"),
        example={"rho": "224.9 kg/m³", "V": "200 L"},
        words=("content",),
    )

FAMILY = Family(
    key="g_real",
    letter="G",
    title="Real gas",
    lead="What the ideal law leaves out: molecules attract one another and take up room.",
    relations=(VAN_DER_WAALS, REAL_DENSITY, GAS_CONTENT),
)
