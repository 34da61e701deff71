"""Family G: real gas."""

from sympy import Abs, Rational, sqrt

from spec import kinds
from spec.constants import MOLAR_GAS_CONSTANT
from spec.model import Branch, Family, GasName, Nature, Relation, Root, Sign, Validity, Variable
from spec.sources import (
    ADR_P200,
    CONSERVATION,
    DEFINITION,
    DYMOND_SMITH,
    PENG_ROBINSON_1976,
    REFERENCE_EQUATION,
    VAN_DER_WAALS_1873,
)
from spec.symbols import as_printed, gas, nonnegative, positive, real, rho_gas

p, a, V_m, b, R, T, rho, m, V = positive("p a V_m b R T rho m V")
Z, T_c, p_c, f, rho_w, rho_l, rho_v, V_0, V_l, rho_0 = positive("Z T_c p_c f rho_w rho_l rho_v V_0 V_l rho_0")
(m_l,) = nonnegative("m_l")
B, omega, kappa = real("B omega kappa")
(alpha,) = positive("alpha")

with as_printed():
    PENG_ROBINSON_PARTS = {
        a: Rational(45724, 100000) * (R * T_c) ** 2 / p_c,
        b: Rational(7780, 100000) * R * T_c / p_c,
        kappa: Rational(37464, 100000) + Rational(154226, 100000) * omega - Rational(26992, 100000) * omega**2,
        alpha: (1 + kappa * (1 - sqrt(T / T_c))) ** 2,
    }

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

with as_printed():
    COMPRESSIBILITY = Relation(
        key="compressibility",
        title="Compressibility factor",
        left=Z,
        right=p * V_m / (R * T),
        where={
            Z: Variable(kinds.COMPRESSIBILITY, "compressibility factor"),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            V_m: Variable(kinds.MOLAR_VOLUME, "volume of one mole"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("the definition: nothing is assumed",),
        source=DEFINITION.at("compressibility factor (ISO 80000-5, from memory)"),
        example={"p": "201.0 bar absolute", "V_m": "0.1237 L/mol", "T": "12.0 °C"},
        words=("Z", "real gas factor"),
    )
    VIRIAL_SECOND = Relation(
        key="virial_second",
        title="Compressibility factor by the second virial coefficient",
        left=Z,
        right=1 + B * p / (R * T),
        where={
            Z: Variable(kinds.COMPRESSIBILITY, "compressibility factor"),
            B: Variable(kinds.SECOND_VIRIAL, "second virial coefficient at T", Sign.ANY),
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            R: MOLAR_GAS_CONSTANT,
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
        },
        assumes=("low pressure: pairs of molecules meet, never three", "below saturation"),
        valid=(
            Validity(
                holds=Abs(B * p / (R * T)) <= Rational(5, 100),
                says="The second virial coefficient alone is for corrections to 5 %: lower the pressure.",
                refuse=True,
            ),
        ),
        source=DYMOND_SMITH.at("definition of the virial coefficients"),
        example={"B": "-5.8 cm³/mol", "p": "5.01 bar absolute", "T": "12.0 °C"},
        words=("virial", "acetylene"),
    )
    PENG_ROBINSON = Relation(
        key="peng_robinson",
        title="Peng–Robinson equation",
        left=p,
        right=R * T / (V_m - b) - a * alpha / (V_m**2 + 2 * b * V_m - b**2),
        parts=PENG_ROBINSON_PARTS,
        where={
            p: Variable(kinds.ABSOLUTE_PRESSURE, "pressure of the gas"),
            T: Variable(kinds.ABSOLUTE_TEMPERATURE, "temperature of the gas"),
            R: MOLAR_GAS_CONSTANT,
            V_m: Variable(kinds.GAS_MOLAR_VOLUME, "volume of one mole"),
            T_c: Variable(kinds.CRITICAL_TEMPERATURE, "critical temperature of the gas"),
            p_c: Variable(kinds.CRITICAL_PRESSURE, "critical pressure of the gas"),
            omega: Variable(kinds.ACENTRIC, "acentric factor of the gas", Sign.ANY),
        },
        data=(T_c, p_c, omega),
        assumes=("0.5 to 20 % off at 300 bar: a reference, not for signing",),
        valid=(
            Validity(
                holds=V_m > b,
                says="The molar volume must be larger than the volume of the molecules, 0.0778·R·T_c/p_c.",
                refuse=True,
            ),
        ),
        branches=(
            Branch(unknown=V_m, root=Root.LARGEST, why="the gas is the largest of the roots, the liquid the smallest"),
        ),
        source=PENG_ROBINSON_1976.at("equations 4 to 18"),
        example={"p": "32.0 bar absolute", "T": "12.0 °C", "T_c": "304.13 K", "p_c": "73.77 bar", "omega": "0.224"},
        words=("cubic equation of state",),
    )
    FILLING_RATIO = Relation(
        key="filling_ratio",
        title="Filling ratio of a liquefied gas",
        left=f,
        right=m / (rho_w * V),
        where={
            f: Variable(kinds.RATIO, "mass of gas over mass of water that fills the vessel"),
            m: Variable(kinds.MASS, "mass of gas"),
            rho_w: Variable(kinds.DENSITY, "density of water at 15 °C, 999.1 kg/m³"),
            V: Variable(kinds.VOLUME, "water capacity of the vessel"),
        },
        assumes=("the transport rules of the place set the limit",),
        source=ADR_P200.at("definition of the filling ratio"),
        example={"m": "30.2 kg", "rho_w": "999.1 kg/m³", "V": "50.0 L"},
        words=("degree of filling", "carbon dioxide", "propane"),
    )
    LIQUID_SHARE = Relation(
        key="liquid_share",
        title="Liquid in a vessel of liquefied gas",
        left=V,
        right=m_l / rho_l + (m - m_l) / rho_v,
        where={
            V: Variable(kinds.VOLUME, "volume of the vessel"),
            m_l: Variable(kinds.MASS, "mass of liquid", Sign.NONNEGATIVE),
            rho_l: Variable(kinds.DENSITY, "density of the liquid at saturation"),
            m: Variable(kinds.MASS, "mass of liquid and vapour"),
            rho_v: Variable(kinds.DENSITY, "density of the vapour at saturation"),
        },
        assumes=("liquid and vapour in balance at one temperature",),
        valid=(
            Validity(holds=m_l <= m, says="There cannot be more liquid than there is gas altogether.", refuse=True),
        ),
        source=CONSERVATION.at("mass and volume of both phases"),
        example={"V": "50.0 L", "rho_l": "846 kg/m³", "m": "30.2 kg", "rho_v": "142 kg/m³"},
        words=("liquefied", "carbon dioxide", "propane"),
    )
    LIQUID_TO_GAS = Relation(
        key="liquid_to_gas",
        title="Gas from a cold liquid",
        left=V_0,
        right=V_l * rho_l / rho_0,
        where={
            V_0: Variable(kinds.REFERENCE_VOLUME, "volume of gas at reference conditions"),
            V_l: Variable(kinds.VOLUME, "volume of liquid"),
            rho_l: Variable(kinds.DENSITY, "density of the liquid"),
            rho_0: Variable(kinds.DENSITY, "density of the gas at reference conditions"),
        },
        assumes=("all of it evaporates and nothing is lost",),
        source=CONSERVATION.at("mass stays the same"),
        example={"V_l": "160 L", "rho_l": "806 kg/m³", "rho_0": "1.185 kg/m³"},
        words=("cryogenic", "expansion ratio", "liquid nitrogen"),
    )

FAMILY = Family(
    key="g_real",
    letter="G",
    title="Real gas",
    lead="What the ideal law leaves out: molecules attract one another and take up room.",
    relations=(
        COMPRESSIBILITY,
        VIRIAL_SECOND,
        VAN_DER_WAALS,
        PENG_ROBINSON,
        REAL_DENSITY,
        GAS_CONTENT,
        FILLING_RATIO,
        LIQUID_SHARE,
        LIQUID_TO_GAS,
    ),
)
