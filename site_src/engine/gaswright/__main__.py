"""The commands of the wheel: solve, gas, sheet.

Takes words; prints the answer, as JSON with --json, also where it is an error in four parts, which ends with status 1.
"""

import argparse
import json
import sys
from collections.abc import Sequence
from pathlib import Path
from typing import Any

from gaswright import gas_state, run_sheet, solve
from gaswright.errors import GaswrightError, ReadingError
from gaswright.reading import read
from gaswright.tables import KINDS


def main(arguments: Sequence[str] | None = None) -> int:
    """Run one command and give its exit status: 0 for an answer, 1 for an error told in four parts."""
    options = _parser().parse_args(arguments)
    try:
        facts = {"solve": _solve, "gas": _gas, "sheet": _sheet}[options.command](options)
    except GaswrightError as error:
        if options.json:
            print(json.dumps({"error": _parts(error)}, ensure_ascii=False, indent=2))
        else:
            print(str(error), file=sys.stderr)
        return 1
    print(json.dumps(facts, ensure_ascii=False, indent=2) if options.json else _plain(facts))
    return 0


def _parts(error: GaswrightError) -> dict[str, Any]:
    offers = list(error.offers) if isinstance(error, ReadingError) else []
    return {
        "kind": type(error).__name__,
        "where": error.where,
        "found": error.found,
        "expected": error.expected,
        "todo": error.todo,
        "offers": offers,
    }


def _parser() -> argparse.ArgumentParser:
    parser = argparse.ArgumentParser(
        prog="gaswright", description="Gas laws and job sheets, from readings to a figure."
    )
    commands = parser.add_subparsers(dest="command", required=True)
    solve_law = commands.add_parser(
        "solve", help="solve a law: solve boyle V_2 p_1='6.5 psia' V_1='30 mL' p_2='11 psia'"
    )
    solve_law.add_argument("key")
    solve_law.add_argument("unknown")
    solve_law.add_argument("readings", nargs="*", metavar="name=value")
    solve_law.add_argument("--station-pressure", help="needed for gauge readings, such as '1013 mbar'")
    solve_law.add_argument("--gas", help="needed where the law uses a gas, such as nitrogen")
    solve_law.add_argument("--decimal", choices=(".", ","), help="settles what 1,234 means")
    state = commands.add_parser("gas", help="state of a gas: gas nitrogen '15 °C' '200 bar absolute'")
    state.add_argument("name")
    state.add_argument("T")
    state.add_argument("p")
    sheet = commands.add_parser("sheet", help="work a sheet from the input part of a record in a JSON file")
    sheet.add_argument("key")
    sheet.add_argument("file", type=Path)
    for command in (solve_law, state, sheet):
        command.add_argument("--json", action="store_true", help="print JSON")
    return parser


def _solve(options: argparse.Namespace) -> dict[str, Any]:
    readings: dict[str, Any] = dict(_pair(text) for text in options.readings)
    result = solve(
        options.key,
        options.unknown,
        readings,
        station_pressure=options.station_pressure,
        gas=options.gas,
        decimal=options.decimal,
    )
    return {
        "value": result.value,
        "unit": result.unit,
        "u": result.u,
        "expanded": result.expanded,
        "k": result.k,
        "working": list(result.working),
        "warnings": list(result.warnings),
    }


def _pair(text: str) -> tuple[str, str]:
    name, mark, value = text.partition("=")
    if not mark:
        raise ReadingError("command line", repr(text), "name=value, such as p_1='6.5 psia'", "Write each reading so.")
    return name.strip(), value.strip()


def _gas(options: argparse.Namespace) -> dict[str, Any]:
    temperature = read("T", options.T, KINDS["absolute_temperature"]).value
    pressure = read("p", options.p, KINDS["absolute_pressure"])
    if pressure.reference != "absolute":
        raise ReadingError("p", pressure.text, "an absolute pressure", "Add the station pressure to a gauge reading.")
    state = gas_state(options.name, T=temperature, p=pressure.value)
    return {
        "Z": state.Z,
        "p": state.p,
        "T": state.T,
        "molar_density": state.molar_density,
        "mass_density": state.mass_density,
        "method": state.method,
        "uncertainty": state.uncertainty,
        "warnings": list(pressure.warnings),
    }


def _sheet(options: argparse.Namespace) -> dict[str, Any]:
    try:
        record = json.loads(options.file.read_text(encoding="utf-8"))
    except (OSError, ValueError) as problem:
        raise ReadingError(
            str(options.file), str(problem)[:80], "a JSON file with find and readings", "Give another file."
        ) from None
    if not isinstance(record, dict):
        raise ReadingError(str(options.file), "JSON that is not an object", "find and readings", "Correct the file.")
    result = run_sheet(options.key, record)
    return {
        "find": result.find,
        "value": result.value,
        "unit": result.unit,
        "u": result.u,
        "expanded": result.expanded,
        "k": result.k,
        "safe": result.safe,
        "ideal": result.ideal,
        "verdict": result.verdict,
        "working": [line.text for line in result.working],
        "warnings": list(result.warnings),
    }


def _plain(facts: dict[str, Any]) -> str:
    lines = []
    for name, value in facts.items():
        lines += [f"{name}:"] + [f"  {part}" for part in value] if isinstance(value, list) else [f"{name}: {value}"]
    return "\n".join(lines)


if __name__ == "__main__":
    sys.exit(main())
