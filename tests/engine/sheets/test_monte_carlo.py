"""The uncertainty of every sheet against trials: readings thrown from their distributions, the balance written anew.

Takes nothing from the network but the readings; JCGM 101:2008 is the method. The standard deviation of N trials is
itself uncertain by 1/√(2N), so the width is 2 % and four times that.
"""

from collections.abc import Callable

import numpy as np
import pytest
from gaswright import find as finder
from gaswright.gas import Gas, find
from gaswright.reading import Reading
from gaswright.sheet import SheetResult, run_sheet

Trial = dict[str, float]


def _receipt(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    full = gas.density(row["pg"] + row["p_atm"], row["T_gas"]) * off()
    return row["count"] * row["V_each"] * full / (gas.density(row["p_ref"], row["T_ref"]) * off())


def _bank(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    start = gas.density(row["pg_start"] + row["p_atm"], row["T_gas"]) * off()
    end = gas.density(row["pg_end"] + row["p_atm"], row["T_gas"]) * off()
    out = row["count"] * row["V_each"] * (start - end)
    return out / (gas.density(row["p_ref"], row["T_ref"]) * off() * row["q"])


def _locked(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    rho = gas.density(row["pg_1"] + row["p_atm"], row["T_1"]) * off()
    return gas.pressure(rho / off(), row["T_2"]) - row["p_atm"]


def _settled(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    rho = gas.density(row["pg_now"] + row["p_atm"], row["T_now"]) * off()
    return gas.pressure(rho / off(), row["T_settled"]) - row["p_atm"]


def _held(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    start = gas.density(row["pg_1"] + row["p_atm"], row["T_1"]) * off()
    end = gas.density(row["pg_2"] + row["p_atm_2"], row["T_2"]) * off()
    return row["V"] * (start - end) / gas.molar_mass * 8.31446261815324 * row["T_ref"] / row["t"]


def _purged(gas: Gas, row: Trial, off: Callable[[], float]) -> float:
    del gas, off
    ratio = (row["pg_L"] + row["p_atm"]) / (row["pg_H"] + row["p_atm"])
    return row["y_s"] + (row["y_0"] - row["y_s"]) * float(ratio ** row["N"])


BALANCES = {
    "cylinder_receipt": _receipt,
    "settle_after_fill": _settled,
    "purge_plan": _purged,
    "locked_in": _locked,
    "pressure_hold": _held,
    "bank_endurance": _bank,
}
GAUGE = {"G-17": {"name": "G-17", "accuracy": "class 1.0", "span": "315 bar", "resolution": "2 bar"}}


def _thrown(random: np.random.Generator, reading: Reading, count: int) -> np.ndarray:
    """Throw a reading: limits and rounding are rectangular (JCGM 100:2008, 4.3.7 and F.2.2.1)."""
    root = 3**0.5
    parts = (root * part * random.uniform(-1, 1, count) for part in (reading.u_systematic, reading.u_random))
    return reading.value + sum(parts, np.zeros(count))


def _work(key: str, gas: str) -> SheetResult:
    example = {**finder.sheet(key).example, "gas": gas}
    for name in ("pg", "pg_1", "pg_start", "pg_now"):
        if name in example and key != "pressure_hold":
            example[name] = {"text": example[name], "instrument": "G-17"}
    return run_sheet(key, {"readings": example, "instruments": GAUGE})


@pytest.mark.parametrize("gas", ["nitrogen", "methane"])
@pytest.mark.parametrize("key", BALANCES)
def test_trials_give_the_same_uncertainty(key: str, gas: str, full_counts: bool) -> None:  # noqa: FBT001 - a fixture
    count = 200_000 if full_counts else 5_000
    result, random = _work(key, gas), np.random.default_rng(20_250_211)
    thrown = {name: _thrown(random, reading, count) for name, reading in result.readings.items()}
    model = find(gas)
    by_equation = [share.moves / result.value for share in result.shares if share.label.startswith("Equation")]
    assert by_equation or key == "purge_plan"  # shares by the ideal law ask no equation
    state = next(use.rows for use in finder.sheet(key).uses if use.relation == "real_density")
    p, T = result.values[state["p"]], result.values[state["T"]]
    u = model.density_uncertainty(p, T) / 2  # one figure over these states, as the shares say

    def off() -> float:
        return 1 + u * float(random.standard_normal())

    answers = [BALANCES[key](model, {name: float(row[at]) for name, row in thrown.items()}, off) for at in range(count)]
    width = 0.02 + 4 / (2 * count) ** 0.5
    assert np.std(answers) == pytest.approx(result.u, rel=width)
    assert np.mean(answers) == pytest.approx(result.value, abs=5 * result.u / count**0.5 + 0.05 * result.u)
