"""What a network does where rows depend on one another: guess, sign changes, edges; and the small solvers below it.

The sheets of this test are made here of laws of the catalogue, because the sheets of the job need no guess so far.
"""

import math
from collections.abc import Callable

import numpy as np
import pytest
from CoolProp.CoolProp import PropsSI
from gaswright.errors import NoSolutionError
from gaswright.evaluate import slopes
from gaswright.find import relation
from gaswright.gas import find
from gaswright.linear import solve_linear
from gaswright.model import Block, Find, Row, Sheet, Step, Use
from gaswright.network import slopes as slopes_of
from gaswright.network import travel
from gaswright.roots import brent, find_root, polynomial_root, polynomial_roots

NITROGEN = find("nitrogen")


def _row(name: str, kind: str, low: float, high: float) -> Row:
    return Row(
        name=name,
        title=name,
        kind=kind,
        note="",
        reading=True,
        site="",
        accuracy="",
        low=low,
        high=high,
        unusual_above=None,
        whole=False,
        of_gas="",
        is_gas=False,
        optional=False,
        is_clock=False,
    )


def _sheet(rows: tuple[Row, ...], uses: tuple[Use, ...], find: Find) -> Sheet:
    named = {row.name: row for row in rows}
    return Sheet("made", "Made here", "", "", named, uses, {find.row: find}, (), "", (), {}, None)


def _guessed(row: str, use: int, steps: tuple[Step, ...] = ()) -> Find:
    return Find(row, "", "", "low", "bar", "", "", "", (Block(row, use, steps),))


STATE = _sheet(
    (
        _row("p", "absolute_pressure", 1e4, 5e7),
        _row("T", "absolute_temperature", 100.0, 500.0),
        _row("rho", "density", 1e-3, 600.0),
    ),
    (Use("real_density", {"rho": "rho", "p": "p", "T": "T"}),),
    _guessed("p", 0),
)


@pytest.mark.parametrize(("density", "temperature"), [(1.2, 293.15), (50.0, 150.0), (220.0, 293.15), (300.0, 400.0)])
def test_a_guessed_pressure_is_that_of_coolprop(density: float, temperature: float) -> None:
    values = travel(STATE, STATE.finds["p"], {"rho": density, "T": temperature}, NITROGEN)
    assert values["p"] == pytest.approx(PropsSI("P", "D", density, "T", temperature, "Nitrogen"), rel=1e-9)


def test_slopes_of_a_guess_are_those_of_coolprop() -> None:
    given = {"rho": 220.0, "T": 293.15}
    values = travel(STATE, STATE.finds["p"], given, NITROGEN)
    found = slopes_of(STATE, STATE.finds["p"], values, NITROGEN)
    assert found.by_row["rho"] == pytest.approx(PropsSI("d(P)/d(D)|T", "D", 220.0, "T", 293.15, "Nitrogen"), rel=1e-9)
    assert found.by_row["T"] == pytest.approx(PropsSI("d(P)/d(T)|D", "D", 220.0, "T", 293.15, "Nitrogen"), rel=1e-9)


def test_a_guess_stops_at_the_edge_of_the_gas() -> None:
    # at 110 K nitrogen condenses at 14.66 bar (CoolProp 8.0.0): a density of the liquid has no gas pressure
    with pytest.raises(NoSolutionError) as caught:
        travel(STATE, STATE.finds["p"], {"rho": 600.0, "T": 110.0}, NITROGEN)
    assert str(caught.value) == (
        "p: found no value between 10000 and 5e+07 (SI) in agreement with the readings; expected readings that exactly "
        "one value explains. Check the readings, or ask for another row."
    )


def test_the_last_gas_before_the_edge_is_found() -> None:
    dew = PropsSI("D", "T", 110.0, "Q", 1, "Nitrogen")
    values = travel(STATE, STATE.finds["p"], {"rho": dew * (1 - 1e-6), "T": 110.0}, NITROGEN)
    assert values["p"] == pytest.approx(PropsSI("P", "T", 110.0, "Q", 1, "Nitrogen"), rel=1e-4)


VAN_DER_WAALS = _sheet(
    (
        _row("p", "absolute_pressure", 1.0, 1e8),
        _row("V_m", "molar_volume", 6e-5, 1e-2),
        _row("T", "absolute_temperature", 50.0, 500.0),
        _row("a", "number", 0.0, 10.0),
        _row("b", "number", 0.0, 1.0),
    ),
    (Use("van_der_waals", {"p": "p", "V_m": "V_m", "T": "T", "a": "a", "b": "b"}),),
    _guessed("V_m", 0),
)


def test_more_than_one_answer_is_refused() -> None:
    # reduced temperature 0.85 and pressure 0.5 of van der Waals: inside the loop, three volumes
    a, b = 0.137, 3.87e-5
    critical_T, critical_p = 8 * a / (27 * 8.31446261815324 * b), a / (27 * b * b)
    roots = np.roots([0.5, -(8 * 0.85 / 3 + 0.5 / 3), 3, -1])  # π φ³ − (8τ/3 + π/3) φ² + 3φ − 1
    assert np.isreal(roots).sum() == 3
    given = {"p": 0.5 * critical_p, "T": 0.85 * critical_T, "a": a, "b": b}
    with pytest.raises(NoSolutionError) as caught:
        travel(VAN_DER_WAALS, VAN_DER_WAALS.finds["V_m"], given, NITROGEN)
    assert caught.value.found == "3 values between 6e-05 and 0.01 (SI) in agreement with the readings"


def test_a_guess_with_steps_on_the_way() -> None:
    # p from the density left in a vessel, by way of the amount: n M / V
    sheet = _sheet(
        (
            _row("p", "absolute_pressure", 1e4, 5e7),
            _row("rho", "density", 1e-3, 600.0),
            _row("n", "amount", 1e-3, 1e6),
            _row("V", "volume", 1e-3, 10.0),
            _row("T", "absolute_temperature", 100.0, 500.0),
            _row("M", "molar_mass", 1e-3, 1.0),
        ),
        (
            Use("real_density", {"rho": "rho", "p": "p", "T": "T"}),
            Use("amount_in_vessel", {"n": "n", "rho": "rho", "V": "V", "M": "M"}),
        ),
        _guessed("p", 1, (Step(0, "rho", "rho"),)),
    )
    given = {"n": 400.0, "V": 0.05, "T": 293.15, "M": NITROGEN.molar_mass}
    values = travel(sheet, sheet.finds["p"], given, NITROGEN)
    density = 400.0 * NITROGEN.molar_mass / 0.05
    assert values["p"] == pytest.approx(PropsSI("P", "D", density, "T", 293.15, "Nitrogen"), rel=1e-9)
    found = slopes_of(sheet, sheet.finds["p"], values, NITROGEN).by_row
    per_density = PropsSI("d(P)/d(D)|T", "D", density, "T", 293.15, "Nitrogen")
    assert found["n"] == pytest.approx(per_density * NITROGEN.molar_mass / 0.05, rel=1e-9)
    assert found["V"] == pytest.approx(-per_density * density / 0.05, rel=1e-9)


def test_a_slope_that_is_no_number_is_refused() -> None:
    with pytest.raises(NoSolutionError) as caught:
        slopes(relation("van_der_waals"), [0.0, 0.0, 0.0, 0.0, 0.0], "Volume of one mole")
    assert str(caught.value) == (
        "Volume of one mole: found an answer that the least error of a reading moves without bound; expected readings "
        "on which it depends smoothly. Check the readings: they stand on the edge of what the law covers."
    )


@pytest.mark.parametrize("size", [1, 2, 5, 12])
def test_linear_systems_are_those_of_numpy(size: int) -> None:
    random = np.random.default_rng(size)
    for _ in range(20):
        scales = 10.0 ** random.uniform(-9, 9, size)
        matrix = random.normal(size=(size, size)) * scales[:, None] * 10.0 ** random.uniform(-9, 9, size)
        wanted = random.normal(size=size)
        right = matrix @ wanted
        found = solve_linear(matrix.tolist(), right.tolist(), "row")
        assert matrix @ np.array(found) == pytest.approx(right, rel=1e-6, abs=1e-9 * np.abs(right).max())


def test_a_singular_system_is_refused() -> None:
    with pytest.raises(NoSolutionError) as caught:
        solve_linear([[1.0, 2.0], [2.0, 4.0]], [1.0, 2.0], "Pressure now")
    assert str(caught.value) == (
        "Pressure now: found readings that do not fix it; expected readings on which the answer depends in one way "
        "only. Check the readings, or ask for another row."
    )


@pytest.mark.parametrize(
    ("function", "low", "high", "root"),
    [
        (lambda x: x * x - 2, 0.0, 2.0, math.sqrt(2)),
        (lambda x: math.cos(x) - x, 0.0, 1.0, 0.7390851332151607),  # Dottie number, OEIS A003957
        (lambda x: x**9, -1.0, 1.5, 0.0),
        (lambda x: math.exp(x) - 1e-12, -60.0, 0.0, math.log(1e-12)),
        (lambda x: (x - 1) ** 3, 0.0, 3.0, 1.0),
    ],
)
def test_brent_finds_the_root(function: Callable[[float], float], low: float, high: float, root: float) -> None:
    found = brent(function, low, high, function(low), function(high))
    assert function(found) == 0 or found == pytest.approx(root, rel=1e-12, abs=1e-12)


@pytest.mark.parametrize("root", [1e-12, 1e-3, 1.0, 7.0, 1e12])
def test_a_root_over_many_powers_of_ten(root: float) -> None:
    assert find_root(lambda x: x / root - 1, 1e-15, 1e15, "x") == pytest.approx(root, rel=4e-15)


def test_a_root_of_nothing_is_nothing() -> None:
    # a release of nothing into a mixed room: c = c_0 exp(-q t / V), so G = 0
    assert find_root(lambda G: 0.01 - G / (1 + G) - math.exp(math.log(0.01)), 1e-15, 1e6, "G") == 0.0


def test_no_root_above_zero_is_refused() -> None:
    with pytest.raises(NoSolutionError) as caught:
        find_root(lambda x: 1 / x + 1, 1e-15, 1e6, "Time")
    assert str(caught.value) == (
        "Time: found no value between 1e-15 and 1e+06 (SI) that agrees with the readings; expected readings that one "
        "value in that range can explain. Check the readings and their units."
    )


@pytest.mark.parametrize("seed", range(20))
def test_polynomial_roots_are_those_of_numpy(seed: int) -> None:
    random = np.random.default_rng(seed)
    wanted = np.sort(random.uniform(-5, 5, 4))
    coefficients = np.poly(wanted)
    found = polynomial_roots(coefficients.tolist(), -10.0, 10.0)
    assert found == pytest.approx(wanted, abs=1e-6)
    assert polynomial_root(coefficients.tolist(), -10.0, 10.0, "largest", "x") == found[-1]
    assert polynomial_root(coefficients.tolist(), -10.0, 10.0, "smallest", "x") == found[0]


def test_a_polynomial_without_a_root_is_refused() -> None:
    with pytest.raises(NoSolutionError) as caught:
        polynomial_root([1.0, 0.0, 1.0], -10.0, 10.0, "largest", "Volume of one mole")
    assert str(caught.value) == (
        "Volume of one mole: found no real root between -10 and 10 (SI); expected readings that a state of the gas can "
        "have. Check the readings and their units."
    )
