"""What is known about a gas before anything is computed.

Takes nothing; gives the shapes of the emitted identity and equation modules.
The evaluator and the register of gases come next.
"""

from typing import NamedTuple, Protocol

type Row = tuple[float, ...]
type Ancillary = tuple[float, float, bool, bool, tuple[Row, ...]]
type MeltingPart = tuple[float, float, float, float, float, tuple[Row, ...]]
type Slopes = tuple[float, float, float]


class Uncertainty(NamedTuple):
    """Expanded relative uncertainty (k = 2) of density up to a temperature [K] and a pressure [Pa], with its origin."""

    T_to: float
    p_to: float
    relative: float
    says: str


class Identity(NamedTuple):
    """Names, numbers, hazards and equation of one gas; `uncertainties` are tried in order, the last covers all."""

    key: str
    title: str
    formula: str
    spellings: tuple[str, ...]
    cas: str
    un: tuple[str, ...]
    hazards: tuple[str, ...]
    citation: str
    doi: str
    bubble_note: str
    uncertainties: tuple[Uncertainty, ...]


class Equation(Protocol):
    """An emitted equation module: coefficients in mol, m3, K, Pa, J and its two functions of reduced density."""

    R: float
    MOLAR_MASS: float
    T_REDUCING: float
    RHO_REDUCING: float
    T_CRITICAL: float
    P_CRITICAL: float
    RHO_CRITICAL: float
    ACENTRIC: float
    T_MIN: float
    T_MAX: float
    P_MAX: float
    PSEUDO_PURE: bool
    TERMS: tuple[tuple[float, float], ...]
    BELLS: tuple[tuple[int, float, float], ...]
    PEAKS: tuple[tuple[int, float, float, float], ...]
    NON_ANALYTIC: tuple[Row, ...]
    IDEAL_POWERS: tuple[tuple[float, float], ...]
    IDEAL_LOG_TAU: float
    IDEAL_PLANCK: tuple[tuple[float, float, float, float], ...]
    BUBBLE_P: Ancillary
    DEW_P: Ancillary
    LIQUID_RHO: Ancillary
    VAPOUR_RHO: Ancillary
    MELTING: tuple[MeltingPart, ...]

    def gather(self, v: list[float]) -> Row:
        """Sum temperature parts of terms of one density shape."""

    def slopes(self, x: float, k: Row) -> Slopes:
        """Return the residual part, x times its slope, x^2 times its second slope."""
