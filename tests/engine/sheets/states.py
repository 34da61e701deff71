"""Realistic states of every sheet, invented, as exact SI values; and how hard an answer is to turn round.

Takes a sheet's key and a gas; gives readings by row. The tests beside ask every question of them.
"""

from gaswright import find as finder
from gaswright.gas import find as find_gas
from gaswright.model import Sheet
from gaswright.network import slopes
from gaswright.sheet import SheetResult, run_sheet

GASES = ("nitrogen", "oxygen", "helium", "hydrogen", "methane", "argon", "air", "carbon dioxide")
STATION = 99640.0
KEYS = ("cylinder_receipt", "settle_after_fill", "purge_plan", "locked_in", "pressure_hold", "bank_endurance")
QUESTIONS = [(key, row) for key in KEYS for row in finder.sheet(key).finds]
# Pressure in Pa gauge, temperature in K: full and warm, half and cold, low; carbon dioxide stays a gas up to 30 bar.
FULL = ((19.8e6, 298.0), (9.4e6, 268.0), (1.7e6, 285.0))
AS_GAS = ((3.0e6, 293.0), (2.1e6, 288.0), (0.9e6, 280.0))


def levels(gas: str) -> tuple[tuple[float, float], ...]:
    """Give the pressures (Pa gauge) and temperatures (K) at which this gas is looked at."""
    return AS_GAS if gas == "carbon dioxide" else FULL


def readings(key: str, gas: str, level: tuple[float, float]) -> dict[str, float | str]:
    """Give exact readings for the first question of the sheet ``key``, in SI."""
    pressure, temperature = level
    common: dict[str, float | str] = {"gas": gas, "p_atm": STATION}
    vessels = {"count": 3.0, "V_each": 0.0472, "T_gas": temperature, "T_ref": 288.15, "p_ref": 101325.0}
    if key == "cylinder_receipt":
        return common | vessels | {"pg": pressure}
    if key == "bank_endurance":
        return common | vessels | {"pg_start": pressure, "pg_end": 0.3 * pressure, "q": 4.1e-4}
    if key == "settle_after_fill":
        return common | {"pg_now": pressure, "T_now": temperature + 26.0, "T_settled": temperature}
    if key == "purge_plan":
        shares = {"y_0": 0.209, "y_s": 2e-5, "N": 3.0}
        cycle = {"V": 0.64, "pg_H": 2e5 + 0.01 * pressure, "pg_L": 2e4, "T": temperature}
        return common | cycle | shares | {"T_ref": 288.15, "p_ref": 101325.0}
    if key == "pressure_hold":
        ends = {"pg_1": pressure, "T_1": temperature, "pg_2": 0.95 * pressure, "T_2": temperature - 2.0}
        return common | ends | {"V": 0.64, "p_atm_2": STATION + 150.0, "t": 14400.0, "T_ref": 288.15}
    return common | {"pg_1": pressure, "T_1": temperature, "T_2": temperature + 31.0}


def turned(key: str, row: str, given: dict[str, float | str]) -> tuple[dict[str, float | str], SheetResult]:
    """Give the readings with the first question's unrounded answer in place of ``row``, and the answer for ``row``."""
    first = next(iter(finder.sheet(key).finds))
    if row == first:
        return given, run_sheet(key, {"find": row, "readings": given})
    answer = run_sheet(key, {"find": first, "readings": given})
    swapped = {name: value for name, value in given.items() if name != row} | {first: answer.value}
    return swapped, run_sheet(key, {"find": row, "readings": swapped})


def sensitivities(sheet: Sheet, result: SheetResult, gas: str) -> dict[str, float]:
    """Give the slope of the answer by every row it depends on."""
    return slopes(sheet, sheet.finds[result.find], result.values, find_gas(gas)).by_row


def condition(sheet: Sheet, result: SheetResult, gas: str) -> float:
    """Give how many times a relative error of the readings is magnified in the answer, at least 1."""
    found = sensitivities(sheet, result, gas)
    parts = [abs(slope * result.values[row] / result.value) for row, slope in found.items()]
    return max(1.0, *parts)
