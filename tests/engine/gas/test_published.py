"""Printed values of the papers of the equations, read out of open test suites that quote them with page and table."""

from __future__ import annotations

import pytest
from gaswright.gas import find
from gaswright.gas.ancillary import along_saturation
from gaswright.gas.equations import air

# key, T [K], p [MPa], printed density, unit factor to kg/m3 or mol/m3
SINGLE_PHASE = [
    # Span et al., J. Phys. Chem. Ref. Data 29 (2000) 1361, tables from p. 1410, mol/dm3
    ("nitrogen", 80.0, 0.1, "0.15633", "mol/L"),
    ("nitrogen", 1000.0, 2.0, "0.23889", "mol/L"),
    ("nitrogen", 350.0, 20.0, "6.3552", "mol/L"),
    ("nitrogen", 1000.0, 50.0, "5.1051", "mol/L"),
    ("nitrogen", 1000.0, 1000.0, "30.189", "mol/L"),
    # Span and Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509, table 35, kg/m3
    ("carbon_dioxide", 240.0, 0.05, "1.1084", "kg/m3"),
    ("carbon_dioxide", 1100.0, 0.1, "0.48109", "kg/m3"),
    ("carbon_dioxide", 280.0, 0.5, "9.7568", "kg/m3"),
    ("carbon_dioxide", 290.0, 5.0, "148.41", "kg/m3"),
    ("carbon_dioxide", 480.0, 10.0, "119.65", "kg/m3"),
    ("carbon_dioxide", 1100.0, 100.0, "371.36", "kg/m3"),
    # Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331, table A2, mol/dm3
    ("air", 100.0, 0.101325, "0.12449", "mol/L"),
    ("air", 500.0, 0.2, "0.048077", "mol/L"),
    # NIST Chemistry WebBook, isobar of oxygen at 0.02 MPa (Schmidt and Wagner), kg/m3
    ("oxygen", 79.361, 0.02, "0.97838", "kg/m3"),
    ("oxygen", 99.361, 0.02, "0.77832", "kg/m3"),
    ("oxygen", 129.36, 0.02, "0.59635", "kg/m3"),
]

# key, T [K], cv, cp [printed], speed of sound [m/s], p [MPa], unit
CALORIC = [
    ("nitrogen", 80.0, 0.1, "21.48", "31.15", "178.3", "J/(mol K)"),
    ("nitrogen", 350.0, 20.0, "21.64", "34.19", "449.7", "J/(mol K)"),
    ("nitrogen", 1000.0, 50.0, "24.79", "33.68", "748.9", "J/(mol K)"),
    ("carbon_dioxide", 240.0, 0.05, "0.59473", "0.78815", "243.88", "kJ/(kg K)"),
    ("carbon_dioxide", 290.0, 5.0, "0.94334", "2.5783", "207.56", "kJ/(kg K)"),
    ("carbon_dioxide", 1100.0, 100.0, "1.0931", "1.3544", "675.48", "kJ/(kg K)"),
    ("air", 500.0, 0.2, "21.51", "29.84", "446.6", "J/(mol K)"),
]

# key, T [K], p [MPa], liquid, vapour, unit: Span et al. (2000) p. 1403; Tegeler et al. (1999) table 33;
# Setzmann and Wagner (1991) table 39; Span and Wagner (1996) table 34
SATURATED = [
    ("nitrogen", 63.151, "0.01252", "30.957", "0.02407", "mol/L"),
    ("argon", 83.806, "0.06889", "1416.77", "4.055", "kg/m3"),
    ("methane", 90.6941, "0.0117", "451.48", "0.2507", "kg/m3"),
    ("carbon_dioxide", 216.592, "0.51796", "1178.46", "13.761", "kg/m3"),
]

# T [K], bubble, dew [MPa]: Lemmon et al. (2000), table A1
AIR_LINES = [
    (70.0, "0.03191", "0.01943"),
    (80.0, "0.11462", "0.08232"),
    (100.0, "0.66313", "0.56742"),
    (130.0, "3.42947", "3.30835"),
]


def _half(printed: str) -> float:
    """Return half a unit in the last printed place."""
    decimals = len(printed.partition(".")[2])
    return 0.5000001 * 10.0**-decimals


def _in_unit(rho: float, molar_mass: float, unit: str) -> float:
    return rho if unit == "kg/m3" else rho / molar_mass / 1000


@pytest.mark.parametrize(("key", "T", "p", "printed", "unit"), SINGLE_PHASE)
def test_density_as_printed(key: str, T: float, p: float, printed: str, unit: str) -> None:
    gas = find(key)
    found = _in_unit(gas.density(p * 1e6, T), gas.molar_mass, unit)
    assert abs(found - float(printed)) <= _half(printed)


@pytest.mark.parametrize(("key", "T", "p", "cv", "cp", "speed", "unit"), CALORIC)
def test_heat_capacities_and_speed_as_printed(  # noqa: PLR0917 - the columns of the table
    key: str, T: float, p: float, cv: str, cp: str, speed: str, unit: str
) -> None:
    gas = find(key)
    found = gas.properties(p * 1e6, T)
    scale = 1.0 if unit == "J/(mol K)" else gas.molar_mass * 1000
    assert abs(found.cv / scale - float(cv)) <= _half(cv)
    assert abs(found.cp / scale - float(cp)) <= _half(cp)
    assert abs(found.speed_of_sound - float(speed)) <= _half(speed)


@pytest.mark.parametrize(("key", "T", "p", "liquid", "vapour", "unit"), SATURATED)
def test_saturation_as_printed(key: str, T: float, p: str, liquid: str, vapour: str, unit: str) -> None:  # noqa: PLR0917
    gas = find(key)
    found = gas.saturation(T)
    assert found is not None
    assert abs(found.p / 1e6 - float(p)) <= _half(p)
    assert abs(_in_unit(found.liquid * gas.molar_mass, gas.molar_mass, unit) - float(liquid)) <= _half(liquid)
    assert abs(_in_unit(found.vapour * gas.molar_mass, gas.molar_mass, unit) - float(vapour)) <= _half(vapour)


@pytest.mark.parametrize(("T", "bubble", "dew"), AIR_LINES)
def test_dew_line_of_air_as_printed(T: float, bubble: str, dew: str) -> None:
    line = along_saturation(air.BUBBLE_P, T)
    assert line is not None
    assert abs(line / 1e6 - float(bubble)) <= _half(bubble)
    found = find("air").saturation_pressure(T)
    assert found is not None
    assert abs(found / 1e6 - float(dew)) <= _half(dew)
