"""Validity conditions that several families share.

Takes symbols; gives frozen Validity values with what is said to the user outside them.
"""

import sympy

from spec.model import Validity
from spec.symbols import Total

IDEAL_LIMIT = sympy.Integer(10**6)
"""10 bar: at 15 °C the ideal law misses by less than 0.5 % up to 13 bar for air and 21 bar for nitrogen, but
already at 6.8 bar for oxygen and argon and 2.6 bar for methane (worked out with the reference equations)."""


def ideal_at(pressure: sympy.Symbol) -> Validity:
    """Warn that the ideal law is trusted only to about 10 bar."""
    return Validity(
        holds=sympy.Le(pressure, IDEAL_LIMIT, evaluate=False),
        says=(
            "Above 10 bar absolute the ideal law is more than half a per cent off for many gases, 5 to 30 % at "
            "200 bar. Use the real-gas form or a job sheet there."
        ),
    )


def shares_sum_to_one(share: sympy.Symbol) -> tuple[Validity, ...]:
    """Refuse a list of shares whose sum is 2 % off 1, warn where it is 0.1 % off."""
    refused = "The shares do not sum to 1: a component is missing or counted twice."
    warned = "The shares sum to 1 only within 2 %: the figure is no better than that."
    bounds = (
        (sympy.Ge, sympy.Rational(98, 100), refused, True),
        (sympy.Le, sympy.Rational(102, 100), refused, True),
        (sympy.Ge, sympy.Rational(999, 1000), warned, False),
        (sympy.Le, sympy.Rational(1001, 1000), warned, False),
    )
    return tuple(
        Validity(holds=compare(Total(share), bound, evaluate=False), says=says, refuse=refuse)
        for compare, bound, says, refuse in bounds
    )
