"""Family C: ideal gas, density, amount."""

from fractions import Fraction

from spec import kinds
from spec.constants import BOLTZMANN_CONSTANT, MOLAR_GAS_CONSTANT
from spec.model import Family, Relation, Variable
from spec.sources import ATKINS, ISO_6976, OPENSTAX_CHEMISTRY, OPENSTAX_PHYSICS_2
from spec.symbols import as_printed, positive
from spec.validity import ideal_at

p, V, n, R, T, N, k, m, M, rho, Z, V_m, d, rho_air = positive("p V n R T N k m M rho Z V_m d rho_air")

PRESSURE = Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas")
GAS_VOLUME = Variable(kinds.VOLUME, "volume the gas fills")
AMOUNT = Variable(kinds.AMOUNT, "amount of gas")
TEMPERATURE = Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas")
MASS = Variable(kinds.MASS, "mass of gas")
MOLAR_MASS = Variable(kinds.MOLAR_MASS, "molar mass of the gas")
COMPRESSIBILITY = Variable(kinds.COMPRESSIBILITY, "compressibility factor", default=Fraction(1))

with as_printed():
    IDEAL_GAS = Relation(
        key="ideal_gas",
        title="Ideal gas law",
        left=p * V,
        right=n * R * T,
        where={p: PRESSURE, V: GAS_VOLUME, n: AMOUNT, R: MOLAR_GAS_CONSTANT, T: TEMPERATURE},
        assumes=("molecules exert no forces on one another", "molecules take up no volume"),
        valid=(ideal_at(p),),
        source=OPENSTAX_CHEMISTRY.at("section 9.2, the ideal gas law"),
        example={"p": "6.50 bar absolute", "V": "412 L", "T": "12.0 °C"},
        words=("pV = nRT", "equation of state"),
    )
    IDEAL_GAS_MOLECULES = Relation(
        key="ideal_gas_molecules",
        title="Ideal gas law, counted in molecules",
        left=p * V,
        right=N * k * T,
        where={
            p: PRESSURE,
            V: GAS_VOLUME,
            N: Variable(kinds.MOLECULES, "number of molecules"),
            k: BOLTZMANN_CONSTANT,
            T: TEMPERATURE,
        },
        assumes=("molecules exert no forces on one another", "molecules take up no volume"),
        valid=(ideal_at(p),),
        source=OPENSTAX_PHYSICS_2.at("section 2.1, equation 2.1"),
        example={"p": "1.00 mbar absolute", "V": "25.0 L", "T": "20.0 °C"},
    )
    AMOUNT_OF_MASS = Relation(
        key="amount_of_mass",
        title="Amount of a mass",
        left=n,
        right=m / M,
        where={n: AMOUNT, m: MASS, M: MOLAR_MASS},
        assumes=("a pure gas, or a mixture with its mean molar mass",),
        source=ATKINS.at("fundamentals A.2, amount and molar mass"),
        example={"m": "11.1 kg", "M": "28.013 g/mol"},
        words=("moles",),
    )
    GAS_DENSITY = Relation(
        key="gas_density",
        title="Density of a gas",
        left=rho,
        right=p * M / (Z * R * T),
        where={
            rho: Variable(kinds.DENSITY, "density of the gas"),
            p: PRESSURE,
            M: MOLAR_MASS,
            Z: COMPRESSIBILITY,
            R: MOLAR_GAS_CONSTANT,
            T: TEMPERATURE,
        },
        assumes=("Z is that of the gas at p and T; 1 is the ideal gas",),
        source=ISO_6976.at("density from the compression factor"),
        example={"p": "7.01 bar absolute", "M": "28.013 g/mol", "Z": "0.9985", "T": "12.0 °C"},
    )
    MOLAR_MASS_WEIGHING = Relation(
        key="molar_mass_weighing",
        title="Molar mass by weighing",
        left=M,
        right=m * R * T / (p * V),
        where={M: MOLAR_MASS, m: MASS, R: MOLAR_GAS_CONSTANT, T: TEMPERATURE, p: PRESSURE, V: GAS_VOLUME},
        assumes=("ideal gas", "the mass is corrected for buoyancy"),
        valid=(ideal_at(p),),
        source=OPENSTAX_CHEMISTRY.at("section 9.3, molar mass of a gas (Dumas)"),
        example={"m": "1.182 g", "T": "20.0 °C", "p": "1.013 bar absolute", "V": "1.002 L"},
        words=("Dumas",),
    )
    MOLAR_VOLUME = Relation(
        key="molar_volume",
        title="Molar volume",
        left=V_m,
        right=Z * R * T / p,
        where={
            V_m: Variable(kinds.MOLAR_VOLUME, "volume of one mole"),
            Z: COMPRESSIBILITY,
            R: MOLAR_GAS_CONSTANT,
            T: TEMPERATURE,
            p: PRESSURE,
        },
        assumes=("Z is that of the gas at p and T; 1 is the ideal gas",),
        source=ATKINS.at("section 1C, real gases, molar volume and compression factor"),
        example={"Z": "1", "T": "20.0 °C", "p": "101.325 kPa absolute"},
    )
    RELATIVE_DENSITY = Relation(
        key="relative_density",
        title="Relative density of a gas",
        left=d,
        right=rho / rho_air,
        where={
            d: Variable(kinds.RATIO, "relative density"),
            rho: Variable(kinds.DENSITY, "density of the gas"),
            rho_air: Variable(kinds.DENSITY, "density of dry air at the same pressure and temperature"),
        },
        assumes=("both densities at the same pressure and temperature",),
        source=ISO_6976.at("relative density"),
        example={"rho": "1.898 kg/m³", "rho_air": "1.225 kg/m³"},
        words=("heavier than air", "specific gravity"),
    )

FAMILY = Family(
    key="c_ideal",
    letter="C",
    title="Ideal gas, density, amount",
    lead="One state of one gas: what a volume holds, weighs and counts.",
    relations=(
        IDEAL_GAS,
        IDEAL_GAS_MOLECULES,
        AMOUNT_OF_MASS,
        GAS_DENSITY,
        MOLAR_MASS_WEIGHING,
        MOLAR_VOLUME,
        RELATIVE_DENSITY,
    ),
)
