"""Figures of the reference tables beside published ones and an independent library, read from the rows as drawn.

CODATA 2022: molar volumes of the ideal gas. US Standard Atmosphere 1976, table I by geopotential height.
IAPWS SR1-86 and R14-08: verification values. CoolProp 8.0.0: viscosity of gases.
Digits of printed works are from memory.
"""

import math
from fractions import Fraction

import pytest
from CoolProp.CoolProp import PropsSI

from generator.flow_tables import atmosphere_page, gauge_page, molecules_page
from generator.gas_tables import conditions_page, saturation_page
from generator.unit_views import exact_text, unit_tables
from generator.views import TablePageView, TableView
from spec.units import ALL

R = 8.31446261815324
COOLPROP = {"Air": "Air", "Argon": "Argon", "Helium": "Helium", "Nitrogen": "Nitrogen", "Oxygen": "Oxygen"}


def cell(table: TableView, first: str, title: str) -> float:
    """Give one figure by the first cell of its row and the title of its column."""
    (row,) = [row for row in table.rows if row[0] == first]
    text = row[table.head.index(title)].replace("\u202f", "").removeprefix("± ")
    return float(text.split(" ", maxsplit=1)[0])


@pytest.mark.parametrize(
    ("pair", "litres"),
    [("0 °C 101.325 kPa", "22.41396954"), ("0 °C 100 kPa", "22.71095464"), ("25 °C 101.325 kPa", "24.465")],
)
def test_molar_volumes_are_the_published_ones(pair: str, litres: str) -> None:
    """Six digits of CODATA; the five of the workplace limits' conditions are common practice."""
    rows = {f"{row[0]} {row[1]}": row[2].removesuffix(" L") for row in conditions_page().tables[0].rows}
    digits = min(6, len(litres.replace(".", "")))
    assert float(f"{float(rows[pair]):.{digits}g}") == float(f"{float(litres):.{digits}g}")


@pytest.mark.parametrize(
    ("own", "other", "per_cent"),
    [("0", "15", 5.49), ("0", "20", 7.32), ("15", "20", 1.74)],
)
def test_ratios_between_pairs_are_those_of_the_trade(own: str, other: str, per_cent: float) -> None:
    """Common practice, no source: the rise of a volume between two reference temperatures."""
    pairs = [f"{each} °C, 101.325 kPa" for each in (own, other)]
    assert (cell(conditions_page().tables[1], *pairs) - 1) * 100 == pytest.approx(per_cent, abs=0.005 + 0.005)


def test_a_volume_and_back_is_one() -> None:
    """The table mirrored at its diagonal holds the inverse."""
    table = conditions_page().tables[1]
    names = [row[0] for row in table.rows]
    assert names == list(table.head[1:])
    for one in names:
        for other in names:
            assert cell(table, one, other) * cell(table, other, one) == pytest.approx(1, abs=1e-4)


@pytest.mark.parametrize(
    ("place", "celsius", "column", "hectopascal"),
    [
        (0, "25", "Reference form, hPa", 31.698),
        (0, "100", "Reference form, hPa", 1014.2),
        (0, "20", "Magnus form, hPa", 23.33),
        (1, "−20", "Reference form, hPa", 1.0324),
        (1, "0", "Magnus form, hPa", 6.112),
    ],
)
def test_saturation_is_the_published_one(place: int, celsius: str, column: str, hectopascal: float) -> None:
    """IAPWS steam tables at 25 and 100 °C (3.1698 and 101.42 kPa), WMO-No. 8 for the Magnus form."""
    assert cell(saturation_page().tables[place], celsius, column) == pytest.approx(hectopascal, rel=2e-4)


def test_saturation_says_nothing_outside_the_stated_range() -> None:
    """A dash where the source is silent, a figure where it speaks."""
    water, ice = saturation_page().tables
    dashes = {row[0] for row in water.rows if row[1] == "–"}
    assert dashes == {"−45", "−40", "−35", "−30", "−25", "−20", "−15", "−10", "−5"}
    assert [row[0] for row in water.rows if row[2] == "–"] == ["65", "70", "75", "80", "85", "90", "95", "100"]
    assert [row[0] for row in ice.rows if row[1] == "–"] == []
    assert [row[0] for row in ice.rows if row[2] == "–"] == ["−100", "−95", "−90", "−85", "−80", "−75", "−70"]


@pytest.mark.parametrize(
    ("height", "hectopascal"),
    [("0", 1013.25), ("1000", 898.746), ("2000", 794.952), ("5000", 540.199), ("11000", 226.32)],
)
def test_atmosphere_is_that_of_1976(height: str, hectopascal: float) -> None:
    """Four digits: the tables' own gas constant moves the fifth."""
    shown = cell(atmosphere_page().tables[0], height, "hPa")
    assert shown == float(f"{hectopascal:.4g}")


def test_water_boils_as_the_library_says() -> None:
    """CoolProp's saturation temperature at the pressure of the row."""
    table = atmosphere_page().tables[0]
    for height in ("0", "1500", "5000"):
        pascal = cell(table, height, "hPa") * 100
        expected = PropsSI("T", "P", pascal, "Q", 0, "Water") - 273.15
        assert cell(table, height, "Water boils at, °C") == pytest.approx(expected, abs=0.06)


def test_gauges_are_those_of_the_trade() -> None:
    """EN 837-1: class in per cent of span; the uncertainties are common practice, no source."""
    limits, uncertainties = gauge_page().tables
    assert cell(limits, "250", "class 1.6") == 4
    assert cell(limits, "16", "class 1") == 0.16
    assert cell(limits, "0.6", "class 2.5") == 0.015
    assert cell(uncertainties, "16", "class 1") == pytest.approx(0.092, abs=0.0005)
    assert cell(uncertainties, "250", "class 1.6") == pytest.approx(2.3, abs=0.05)


@pytest.mark.parametrize("title", sorted(COOLPROP))
def test_speeds_and_paths_agree_with_the_library(title: str) -> None:
    """Molar mass from CoolProp; path from its viscosity, which hard spheres give 5π/16 of (kinetic theory)."""
    speeds, paths = molecules_page().tables
    fluid = COOLPROP[title]
    molar_mass = PropsSI("molar_mass", fluid)
    assert cell(speeds, title, "20 °C") == pytest.approx(math.sqrt(8 * R * 293.15 / (math.pi * molar_mass)), rel=3e-4)
    viscosity = PropsSI("viscosity", "T", 293.15, "P", 101325, fluid)
    nanometres = viscosity / 101325 * math.sqrt(math.pi * R * 293.15 / (2 * molar_mass)) * 1e9 * 16 / (5 * math.pi)
    assert cell(paths, title, "at 1013.25 mbar") == pytest.approx(nanometres, rel=0.025)


def test_path_is_as_one_over_pressure() -> None:
    """Columns in nm, µm, mm, m, m: only a slip of a unit or power would break the ratio."""
    for row in molecules_page().tables[1].rows:
        metres = [
            float(number) * {"nm": 1e-9, "µm": 1e-6, "mm": 1e-3, "m": 1}[unit]
            for number, unit in (text.replace("\u202f", "").split(" ") for text in row[2:])
        ]
        products = [path * p for path, p in zip(metres, (1013.25, 1, 1e-2, 1e-4, 1e-6), strict=True)]
        assert products == pytest.approx([products[0]] * 5, rel=0.01)


def test_every_unit_stands_once_with_its_exact_factor() -> None:
    """A decimal that ends, a fraction, or ten digits that say they are rounded."""
    rows = [row for table in unit_tables(ALL) for row in table.rows]
    assert sorted(row[0] for row in rows) == sorted(unit.key for unit in ALL)
    factors = {unit.key: unit.factor for unit in ALL}
    for key, shown, *_ in rows:
        if "(" not in shown:
            assert Fraction(shown) == factors[key], key
        elif "exactly" in shown:
            assert Fraction(shown.partition("(")[2].removesuffix(" exactly)")) == factors[key], key
        assert float(shown.split(" ", maxsplit=1)[0]) == pytest.approx(float(factors[key]), rel=1e-9)


@pytest.mark.parametrize(
    ("factor", "text"),
    [
        (Fraction(1), "1"),
        (Fraction(1, 8), "0.125"),
        (Fraction(20265, 152), "133.3223684 (20265/152 exactly)"),
        (Fraction(5, 9), "0.5555555556 (5/9 exactly)"),
        (Fraction(math.pi), "3.141592654 (rounded)"),
        (Fraction(10**6), "1000000"),
    ],
)
def test_exact_texts(factor: Fraction, text: str) -> None:
    """Input and output side by side."""
    assert exact_text(factor) == text


@pytest.mark.parametrize(
    "page",
    [conditions_page(), saturation_page(), atmosphere_page(), gauge_page(), molecules_page()],
    ids=lambda page: page.key,
)
def test_tables_are_whole(page: TablePageView) -> None:
    """Every row has a cell for each title, and no first cell stands twice in a table of figures."""
    for table in page.tables:
        assert {len(row) for row in table.rows} == {len(table.head)}
        if table.is_figures:
            assert len({row[0] for row in table.rows}) == len(table.rows)
