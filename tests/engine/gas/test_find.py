"""Gases found by what they are called, their identity and what is stated of their equation."""

from __future__ import annotations

import subprocess
import sys
from pathlib import Path

import gaswright.gas
import pytest
from gaswright.errors import ReadingError
from gaswright.gas import find, keys

from tests.engine.gas.support import KEYS


@pytest.mark.parametrize(
    ("name", "key"),
    [
        ("nitrogen", "nitrogen"),
        ("N2", "nitrogen"),
        ("n₂", "nitrogen"),
        ("Nitrogen, UN 1066", "nitrogen"),
        ("UN1066 NITROGEN, COMPRESSED", "nitrogen"),
        ("UN 1977", "nitrogen"),
        ("7727-37-9", "nitrogen"),
        ("CO2", "carbon_dioxide"),
        ("Carbon dioxide", "carbon_dioxide"),
        ("carbon-dioxide", "carbon_dioxide"),
        ("He", "helium"),
        ("compressed air", "air"),
        ("UN 1002", "air"),
        ("O2", "oxygen"),
        ("CO", "carbon_monoxide"),
        ("laughing gas", "nitrous_oxide"),
        ("iso-butane", "isobutane"),
        ("Sulphur hexafluoride", "sulfur_hexafluoride"),
    ],
)
def test_every_spelling_finds_its_gas(name: str, key: str) -> None:
    assert find(name).key == key


@pytest.mark.parametrize("name", ["", "   ", "UN 9999", "unobtainium", "Nitrogen, UN 1072"])
def test_an_unknown_name_is_told(name: str) -> None:
    with pytest.raises(ReadingError) as told:
        find(name)
    assert told.value.where == "gas"
    assert "Nitrogen, Oxygen, Argon" in told.value.expected


def test_the_nearest_spellings_are_offered() -> None:
    with pytest.raises(ReadingError) as told:
        find("nitrogn")
    assert told.value.offers[0] == "Nitrogen"
    assert told.value.question
    assert told.value.todo.startswith("Did you mean Nitrogen")


def test_no_spelling_or_number_has_two_owners() -> None:
    owners: dict[str, str] = {}
    for key in keys():
        who = find(key).identity
        for name in (who.key, who.title, who.formula, who.cas, *who.spellings, *(f"UN {number}" for number in who.un)):
            assert find(name).key == key, name
            assert owners.setdefault(name.lower(), key) == key


def test_keys_are_those_of_the_spec() -> None:
    assert keys() == KEYS


@pytest.mark.parametrize("key", KEYS)
def test_cas_numbers_have_their_check_digit(key: str) -> None:
    """The last digit is the weighted sum of the others modulo ten (CAS registry rule, from memory)."""
    digits, check = find(key).identity.cas.replace("-", "")[:-1], int(find(key).identity.cas[-1])
    assert sum(place * int(digit) for place, digit in enumerate(reversed(digits), 1)) % 10 == check


@pytest.mark.parametrize("key", KEYS)
def test_uncertainty_is_stated_everywhere_with_its_origin(key: str) -> None:
    gas = find(key)
    for p in (1e5, 15e6, 25e6, 90e6, 5e8):
        for T in (gas.T_min, 240.0, 288.15, 400.0, gas.T_max):
            stated = gas.uncertainty(p, T)
            assert 0.0 < stated.relative <= 0.08
            assert stated.says
            assert gas.density_uncertainty(p, T) == stated.relative


@pytest.mark.parametrize(
    ("key", "p", "T", "relative"),
    [
        # abstracts of the papers, in spec/gases.py
        ("nitrogen", 1e6, 300.0, 1e-4),
        ("nitrogen", 20e6, 300.0, 2e-4),
        ("argon", 20e6, 300.0, 3e-4),
        ("hydrogen", 35e6, 300.0, 4e-4),
        ("methane", 20e6, 300.0, 1.5e-3),
        ("carbon_dioxide", 5e6, 300.0, 5e-4),
        ("air", 30e6, 300.0, 1e-3),
    ],
)
def test_uncertainty_as_the_papers_state_it(key: str, p: float, T: float, relative: float) -> None:
    assert find(key).density_uncertainty(p, T) == relative


def test_start_imports_no_numpy_and_no_equation() -> None:
    folder = Path(gaswright.gas.__file__).parents[2]
    code = (
        f"import sys; sys.path.insert(0, {str(folder)!r}); import gaswright.gas; "
        "print([name for name in sys.modules if name == 'numpy' or name.startswith('gaswright.gas.equations')])"
    )
    done = subprocess.run([sys.executable, "-c", code], capture_output=True, text=True, check=True)
    assert done.stdout.strip() == "[]"
