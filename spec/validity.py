"""Validity conditions that several families share.

Takes symbols; gives frozen Validity values with what is said to the user outside them.
"""

import sympy

from spec.model import Validity

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
