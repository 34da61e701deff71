"""Kinds of quantity: amount, mass and what they fill."""

from spec import dimensions as dim
from spec.model import Kind

AMOUNT = Kind(
    key="amount",
    title="amount of substance",
    dimension=dim.AMOUNT,
    si="mol",
    units=("mol", "mmol", "kmol", "lbmol"),
    low=1e-15,
    high=1e12,
)
MASS = Kind(
    key="mass",
    title="mass",
    dimension=dim.MASS,
    si="kg",
    units=("kg", "g", "mg", "t", "lb", "oz"),
    low=1e-15,
    high=1e12,
)
MOLAR_MASS = Kind(
    key="molar_mass",
    title="molar mass",
    dimension=dim.MOLAR_MASS,
    si="kg/mol",
    units=("g/mol", "kg/mol", "kg/kmol"),
    low=1e-4,
    high=10.0,
)
MOLAR_VOLUME = Kind(
    key="molar_volume",
    title="molar volume",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("L/mol", "m³/mol", "m³/kmol", "cm³/mol", "ft³/lbmol"),
    low=1e-6,
    high=1e12,
)
DENSITY = Kind(
    key="density",
    title="mass density",
    dimension=dim.DENSITY,
    si="kg/m³",
    units=("kg/m³", "g/L", "g/cm³", "lb/ft³"),
    low=1e-15,
    high=3e4,
)
MOLECULE_MASS = Kind(
    key="molecule_mass",
    title="mass of one molecule",
    dimension=dim.MASS,
    si="kg",
    units=("kg", "g"),
    low=1e-28,
    high=1e-22,
)
MASS_CONCENTRATION = Kind(
    key="mass_concentration",
    title="mass in a volume of gas",
    dimension=dim.DENSITY,
    si="kg/m³",
    units=("mg/m³", "µg/m³", "g/m³", "kg/m³", "lb/ft³"),
    low=1e-15,
    high=1e3,
)
SECOND_VIRIAL = Kind(
    key="second_virial",
    title="second virial coefficient",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("cm³/mol", "L/mol", "m³/mol"),
    low=-1e-2,
    high=1e-3,
)
GAS_MOLAR_VOLUME = Kind(
    key="gas_molar_volume",
    title="molar volume of a gas",
    dimension=dim.MOLAR_VOLUME,
    si="m³/mol",
    units=("L/mol", "m³/mol", "cm³/mol"),
    low=1e-5,
    high=1e6,
)
