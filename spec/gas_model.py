"""The shape of a gas in the spec.

Takes nothing; gives the frozen values that `spec/gases.py` fills in.
The emitter of gas equations comes next.
"""

from dataclasses import dataclass
from math import inf


@dataclass(frozen=True, slots=True, kw_only=True)
class Band:
    """Relative expanded uncertainty (k = 2) of density up to T_to [K] and p_to [Pa], and where that is stated."""

    T_to: float = inf
    p_to: float = inf
    relative: float
    says: str


@dataclass(frozen=True, slots=True, kw_only=True)
class Gas:
    """A gas: who it is, what hurts, which equation describes it and how well.

    `fluid` is its name in the property library that carries the coefficients. `bands` are tried in order and the
    last one covers everything that is left. UN numbers are of the compressed, then of the other forms.
    """

    key: str
    title: str
    formula: str
    spellings: tuple[str, ...]
    fluid: str
    cas: str
    un: tuple[str, ...]
    hazards: tuple[str, ...]
    citation: str
    doi: str
    bands: tuple[Band, ...]
    bubble_note: str = ""

    def __post_init__(self) -> None:
        """Refuse a gas whose last band leaves a state uncovered."""
        last = self.bands[-1]
        if last.T_to != inf or last.p_to != inf:
            message = f"spec gas {self.key}: found a last uncertainty band with ends; expected one without. Add it."
            raise ValueError(message)
