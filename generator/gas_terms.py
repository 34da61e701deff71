"""Terms of a Helmholtz equation of state, out of the blocks in which the property library stores them.

Takes blocks of columns; gives separable terms, non-analytic rows and the rows of the ideal part.
The emitter of gas equations comes next. A type or exponent nobody can evaluate stops the build.
"""

from __future__ import annotations

from collections.abc import Mapping, Sequence
from dataclasses import dataclass
from typing import cast

from generator.errors import SpecError
from generator.gas_slopes import Shape

type Row = tuple[float, ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class Term:
    """One separable term: n·tau^t times a temperature shape, delta^d times a density shape."""

    n: float
    t: float
    d: int
    shape: Shape
    bell: tuple[float, float] | None = None
    peak: tuple[float, float, float] | None = None


def read_terms(key: str, blocks: Sequence[Mapping[str, object]]) -> tuple[list[Term], list[Row]]:
    """Return the separable terms and the non-analytic rows (n, a, b, beta, A, B, C, D).

    Raises:
        SpecError: a block has a type or an exponent nobody can evaluate.
    """
    terms: list[Term] = []
    rows: list[Row] = []
    for block in blocks:
        kind = str(block["type"])
        if kind == "ResidualHelmholtzNonAnalytic":
            rows += columns(block, "n a b beta A B C D")
        elif kind in READERS:
            terms += READERS[kind](key, block)
        else:
            raise SpecError(
                where=f"gas {key}",
                found=f"residual term type {kind}",
                expected="one of " + ", ".join(sorted([*READERS, "ResidualHelmholtzNonAnalytic"])),
                todo="Add a reader for it in generator/gas_terms.py and its case, or choose another equation.",
            )
    return terms, rows


def columns(block: Mapping[str, object], names: str) -> list[Row]:
    """Return the rows of the named columns of a block."""
    found = [cast("Sequence[float]", block[name]) for name in names.split()]
    return [tuple(float(value) for value in row) for row in zip(*found, strict=True)]


def _whole(key: str, name: str, value: float) -> int:
    if value != int(value) or value < 0:
        raise SpecError(
            where=f"gas {key}",
            found=f"exponent {name} = {value!r} of the density",
            expected="a whole number, zero or more",
            todo="Extend generator/gas_slopes.py to broken powers, or choose another equation.",
        )
    return int(value)


def _power(key: str, block: Mapping[str, object]) -> list[Term]:
    return [
        Term(n=n, t=t, d=_whole(key, "d", d), shape=Shape(power=_whole(key, "l", power)))
        for n, t, d, power in columns(block, "n t d l")
    ]


def _exponential(key: str, block: Mapping[str, object]) -> list[Term]:
    return [
        Term(n=n, t=t, d=_whole(key, "d", d), shape=Shape(power=_whole(key, "l", power), factor=factor))
        for n, t, d, factor, power in columns(block, "n t d g l")
    ]


def _gaussian(key: str, block: Mapping[str, object]) -> list[Term]:
    return [
        Term(n=n, t=t, d=_whole(key, "d", d), shape=Shape(width=eta, centre=epsilon), bell=(beta, gamma))
        for n, t, d, eta, epsilon, beta, gamma in columns(block, "n t d eta epsilon beta gamma")
    ]


def _gao(key: str, block: Mapping[str, object]) -> list[Term]:
    return [
        Term(n=n, t=t, d=_whole(key, "d", d), shape=Shape(width=-eta, centre=epsilon), peak=(beta, gamma, b))
        for n, t, d, eta, epsilon, beta, gamma, b in columns(block, "n t d eta epsilon beta gamma b")
    ]


READERS = {
    "ResidualHelmholtzPower": _power,
    "ResidualHelmholtzExponential": _exponential,
    "ResidualHelmholtzGaussian": _gaussian,
    "ResidualHelmholtzGaoB": _gao,
}


def read_ideal(key: str, blocks: Sequence[Mapping[str, object]]) -> tuple[list[Row], float, list[Row]]:
    """Return powers (n, t), the factor of ln(tau), and rows (n, theta, c, d) of n·ln(c + d·e^(theta tau)).

    Raises:
        SpecError: a block has a type nobody can evaluate.
    """
    powers: list[Row] = []
    planck: list[Row] = []
    log_tau = 0.0
    for block in blocks:
        match str(block["type"]):
            case "IdealGasHelmholtzLead" | "IdealGasHelmholtzEnthalpyEntropyOffset":
                powers += [(number(block["a1"]), 0.0), (number(block["a2"]), 1.0)]
            case "IdealGasHelmholtzLogTau":
                log_tau += number(block["a"])
            case "IdealGasHelmholtzPower":
                powers += columns(block, "n t")
            case "IdealGasHelmholtzPlanckEinstein":
                planck += [(n, -t, 1.0, -1.0) for n, t in columns(block, "n t")]
            case "IdealGasHelmholtzPlanckEinsteinFunctionT":
                scale = number(block["Tcrit"])
                planck += [(n, -v / scale, 1.0, -1.0) for n, v in columns(block, "n v")]
            case "IdealGasHelmholtzPlanckEinsteinGeneralized":
                planck += columns(block, "n t c d")
            case kind:
                raise SpecError(
                    where=f"gas {key}",
                    found=f"ideal-gas term type {kind}",
                    expected="lead, log tau, power, Planck–Einstein or enthalpy–entropy offset terms",
                    todo="Add it to read_ideal in generator/gas_terms.py, or choose another equation.",
                )
    return powers, log_tau, planck


def number(value: object) -> float:
    """Return a number of a block."""
    return float(value)  # type: ignore[arg-type]  # a number of a JSON block
