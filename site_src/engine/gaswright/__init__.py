"""Gaswright: gas laws and job sheets for field crews, from readings to a figure to sign.

``solve`` a law, ask ``gas_state`` of a gas, work a sheet with ``run_sheet``; ``relations``, ``sheets`` and ``gases``
tell what there is. Errors are ReadingError, NoSolutionError and OutsideRangeError, all ValueError, in four parts.
"""

from importlib import import_module
from typing import Any

from gaswright.errors import GaswrightError, NoSolutionError, OutsideRangeError, ReadingError

__all__ = [
    "GaswrightError",
    "NoSolutionError",
    "OutsideRangeError",
    "ReadingError",
    "gas_state",
    "gases",
    "relations",
    "run_sheet",
    "sheets",
    "solve",
]

_HOME = {
    "solve": "gaswright.law",
    "run_sheet": "gaswright.sheet",
    "gas_state": "gaswright.gas",
    "relations": "gaswright.contents",
    "sheets": "gaswright.contents",
    "gases": "gaswright.contents",
}


def __getattr__(name: str) -> Any:
    if name in _HOME:
        return getattr(import_module(_HOME[name]), name)
    raise AttributeError(f"module 'gaswright' has no attribute {name!r}")
