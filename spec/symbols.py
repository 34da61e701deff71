"""Symbols with the narrowest true assumption, and the gas model's opaque functions.

Takes names; gives sympy symbols and functions. Next: the family files write their relations with them.
"""

from contextlib import AbstractContextManager
from dataclasses import dataclass
from typing import Any

import sympy

from spec import kinds
from spec.model import Kind


def as_printed() -> AbstractContextManager[None]:
    """Keep what is written inside in the textbook's order: sympy evaluates nothing there."""
    kept: AbstractContextManager[None] = sympy.evaluate(False)  # noqa: FBT003 - sympy's own signature
    return kept


def positive(names: str) -> tuple[sympy.Symbol, ...]:
    """Give one positive symbol for each name."""
    return tuple(sympy.Symbol(name, positive=True) for name in names.split())


def nonnegative(names: str) -> tuple[sympy.Symbol, ...]:
    """Give one symbol for each name that may also be zero."""
    return tuple(sympy.Symbol(name, nonnegative=True) for name in names.split())


def real(names: str) -> tuple[sympy.Symbol, ...]:
    """Give one symbol of any sign for each name."""
    return tuple(sympy.Symbol(name, real=True) for name in names.split())


class Total(sympy.Function):  # type: ignore[misc]  # sympy leaves it untyped
    """The sum of an expression over all terms of the lists in it, whose names end in ``_i``."""

    nargs = 1
    is_real = True

    def _eval_is_positive(self) -> bool | None:
        positive: bool | None = self.args[0].is_positive
        return positive

    def _eval_is_nonnegative(self) -> bool | None:
        nonnegative: bool | None = self.args[0].is_nonnegative
        return nonnegative

    def _latex(self, printer: Any) -> str:
        return rf"\sum_{{i}} {_term_latex(self, printer)}"


class Others(sympy.Function):  # type: ignore[misc]  # sympy leaves it untyped
    """The sum over all terms but the one in question; solving for a term brings it in, the spec never writes it."""

    nargs = 1
    is_real = True

    def _eval_is_nonnegative(self) -> bool | None:
        nonnegative: bool | None = self.args[0].is_nonnegative
        return nonnegative

    def _latex(self, printer: Any) -> str:
        return rf"\sum_{{\mathrm{{others}}}} {_term_latex(self, printer)}"


def _term_latex(total: sympy.Expr, printer: Any) -> str:
    text = printer.doprint(total.args[0])
    return rf"\left({text}\right)" if isinstance(total.args[0], sympy.Add) else str(text)


def is_list(symbol: sympy.Symbol) -> bool:
    """Tell whether a symbol stands for a list of any length."""
    return bool(symbol.name.endswith("_i"))


@dataclass(frozen=True, slots=True, kw_only=True)
class GasFunction:
    """A property that the gas model works out; to sympy it is an opaque function.

    ``method`` is the engine's name for it, ``slopes`` the methods of its partial derivatives by each argument, and
    ``inverses`` the methods that give an argument back when the value stands in that argument's place.
    """

    name: str
    method: str
    arguments: tuple[Kind, ...]
    result: Kind
    slopes: tuple[str, ...]
    inverses: tuple[str, ...]


RHO_GAS = GasFunction(
    name="rho_gas",
    method="density",
    arguments=(kinds.ABSOLUTE_PRESSURE, kinds.ABSOLUTE_TEMPERATURE),
    result=kinds.DENSITY,
    slopes=("density_dp", "density_dT"),
    inverses=("pressure", "temperature"),
)
GAS_FUNCTIONS = {function.name: function for function in (RHO_GAS,)}

rho_gas = sympy.Function("rho_gas", positive=True)
gas = sympy.Symbol("gas")
