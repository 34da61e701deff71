"""Text of the emitted gas modules.

Takes the frozen gases of the spec and the coefficients of the pinned property library; gives {path: text}.
The stage that writes the engine package comes next; nothing is written here.

Every term of the residual part is a temperature shape times a density shape. Terms with the same density shape
are summed once per temperature, so that the emitted `slopes` runs over a handful of short polynomials.
"""

from __future__ import annotations

import json
from collections.abc import Mapping, Sequence
from typing import TYPE_CHECKING

from CoolProp import CoolProp

from generator.errors import SpecError
from generator.gas_slopes import slopes_text
from generator.gas_terms import Row, columns, number, read_ideal, read_terms

if TYPE_CHECKING:
    from spec.gas_model import Gas

COOLPROP_VERSION = "8.0.0"
HEADER = "Generated at build time; do not edit. Coefficients: CoolProp 8.0.0 (MIT licence), fluid {fluid}."
TOP = "gaswright/gas"


def emit_gas_modules(gases: Sequence[Gas]) -> dict[str, str]:
    """Return {path inside the engine folder: text} of the equation modules and of the identity module.

    Raises:
        SpecError: the installed library is not the pinned one, or an equation has a term nobody can evaluate.
    """
    _demand_version()
    texts = {
        f"{TOP}/equations/__init__.py": '"""Generated: coefficients of the reference equations, one gas each."""\n'
    }
    for gas in sorted(gases, key=lambda one: one.key):
        texts[f"{TOP}/equations/{gas.key}.py"] = equation_text(gas)
    texts[f"{TOP}/identity.py"] = identity_text(gases)
    return texts


def _demand_version() -> None:
    found = CoolProp.get_global_param_string("version")
    if found != COOLPROP_VERSION:
        raise SpecError(
            where="generator/gas_equations.py",
            found=f"CoolProp {found}",
            expected=f"CoolProp {COOLPROP_VERSION}, the version the coefficients are pinned to",
            todo="Install the locked environment again, or pin the new version and check every gas.",
        )


def equation_text(gas: Gas) -> str:
    """Return the text of one equation module, in units mol, m3, K, Pa, J."""
    data = json.loads(CoolProp.get_fluid_param_string(gas.fluid, "JSON"))[0]
    equation = data["EOS"][0]
    terms, rows = read_terms(gas.key, equation["alphar"])
    powers, log_tau, planck = read_ideal(gas.key, equation["alpha0"])
    lines = [
        f'"""{gas.title}: {gas.citation}.',
        "",
        HEADER.format(fluid=gas.fluid),
        '"""',
        "",
        "from collections.abc import Callable",
        "from math import exp",
        "",
        *_facts(gas.fluid, equation),
        *_table("TERMS", [(term.n, term.t) for term in terms], "n, t of n·tau^t"),
        *_shaped("BELLS", [term.bell for term in terms], "term, beta, gamma of exp(-beta (tau - gamma)^2)"),
        *_shaped("PEAKS", [term.peak for term in terms], "term, beta, gamma, b of exp(1/(beta (tau - gamma)^2 + b))"),
        *_table("NON_ANALYTIC", rows, "n, a, b, beta, A, B, C, D"),
        *_table("IDEAL_POWERS", powers, "n, t of n·tau^t"),
        f"IDEAL_LOG_TAU = {log_tau!r}",
        *_table("IDEAL_PLANCK", planck, "n, theta, c, d of n·ln(c + d·exp(theta tau))"),
        *_saturation(data["ANCILLARIES"]),
        *_melting(data["ANCILLARIES"].get("melting_line")),
        "",
        "",
        *slopes_text([(term.shape, term.d) for term in terms]),
    ]
    return "\n".join(lines) + "\n"


def _facts(fluid: str, equation: Mapping[str, object]) -> list[str]:
    reducing = equation["STATES"]["reducing"]  # type: ignore[index]  # nested JSON
    return [
        f"R = {number(equation['gas_constant'])!r}",
        f"MOLAR_MASS = {number(equation['molar_mass'])!r}",
        f"T_REDUCING = {number(reducing['T'])!r}",
        f"RHO_REDUCING = {number(reducing['rhomolar'])!r}",
        f"T_CRITICAL = {CoolProp.PropsSI('Tcrit', fluid)!r}",
        f"P_CRITICAL = {CoolProp.PropsSI('pcrit', fluid)!r}",
        f"RHO_CRITICAL = {CoolProp.PropsSI('rhomolar_critical', fluid)!r}",
        f"ACENTRIC = {number(equation['acentric'])!r}",
        f"T_MIN = {CoolProp.PropsSI('Tmin', fluid)!r}",
        f"T_MAX = {number(equation['T_max'])!r}",
        f"P_MAX = {number(equation['p_max'])!r}",
        f"PSEUDO_PURE = {bool(equation['pseudo_pure'])!r}",
    ]


def _table(name: str, rows: Sequence[Row], what: str) -> list[str]:
    if not rows:
        return [f"{name}: tuple[tuple[float, ...], ...] = ()  # {what}"]
    return [f"{name} = (  # {what}", *(f"    {row!r}," for row in rows), ")"]


def _shaped(name: str, shapes: Sequence[Row | None], what: str) -> list[str]:
    rows = [(place, *shape) for place, shape in enumerate(shapes) if shape is not None]
    return _table(name, rows, what)


def _saturation(ancillaries: Mapping[str, Mapping[str, object]]) -> list[str]:
    bubble = ancillaries.get("pS") or ancillaries["pL"]
    dew = ancillaries.get("pS") or ancillaries["pV"]
    named = {"BUBBLE_P": bubble, "DEW_P": dew, "LIQUID_RHO": ancillaries["rhoL"], "VAPOUR_RHO": ancillaries["rhoV"]}
    what = "# start values along saturation: T_r, value, times T_r/T, exponential, (n, t) of n·(1 - T/T_r)^t"
    return [what, *(f"{name} = {_ancillary(one)!r}" for name, one in named.items())]


def _ancillary(block: Mapping[str, object]) -> tuple[float, float, bool, bool, tuple[Row, ...]]:
    return (
        number(block["T_r"]),
        number(block["reducing_value"]),
        bool(block["using_tau_r"]),
        block["type"] != "rhoLnoexp",
        tuple(columns(block, "n t")),
    )


def _melting(line: Mapping[str, object] | None) -> list[str]:
    what = "T from, T to, p_0, T_0, shift, (a, t): p_0 + sum a·((T/T_0 - shift)^t - 1 + shift)"
    if line is None:
        return _table("MELTING", [], what)
    parts = [_melting_part(str(line["type"]), part) for part in line["parts"]]  # type: ignore[attr-defined]  # nested JSON
    return [f"MELTING = (  # {what}", *(f"    {part!r}," for part in parts), ")"]


def _melting_part(kind: str, part: Mapping[str, object]) -> tuple[float, float, float, float, float, tuple[Row, ...]]:
    ends = (number(part["T_min"]), number(part["T_max"]), number(part["p_0"]), number(part["T_0"]))
    match kind:
        case "Simon":
            return (*ends, 0.0, ((number(part["a"]), number(part["c"])),))
        case "polynomial_in_Tr":
            return (*ends, 0.0, _scaled(part))
        case "polynomial_in_Theta":
            return (*ends, 1.0, _scaled(part))
    raise SpecError(
        where="melting line",
        found=f"type {kind}",
        expected="Simon, polynomial_in_Tr or polynomial_in_Theta",
        todo="Add it to _melting_part in generator/gas_equations.py.",
    )


def _scaled(part: Mapping[str, object]) -> tuple[Row, ...]:
    p_0 = number(part["p_0"])
    return tuple((a * p_0, t) for a, t in columns(part, "a t"))


def identity_text(gases: Sequence[Gas]) -> str:
    """Return the text of the identity module: who each gas is, in the order of the spec."""
    lines = [
        '"""Who each gas is: names, numbers, hazards, its equation and how good it is.',
        "",
        "Generated at build time from the spec; do not edit.",
        '"""',
        "",
        "from math import inf",
        "",
        "from gaswright.gas.record import Identity, Uncertainty",
        "",
        "IDENTITIES = (",
    ]
    for gas in gases:
        lines += _identity(gas)
    return "\n".join([*lines, ")"]) + "\n"


def _identity(gas: Gas) -> list[str]:
    plain = ("key", "title", "formula", "spellings", "cas", "un", "hazards", "citation", "doi", "bubble_note")
    return [
        "    Identity(",
        *(f"        {name}={getattr(gas, name)!r}," for name in plain),
        "        uncertainties=(",
        *(
            f"            Uncertainty({band.T_to!r}, {band.p_to!r}, {band.relative!r}, {band.says!r}),"
            for band in gas.bands
        ),
        "        ),",
        "    ),",
    ]
