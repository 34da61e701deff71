"""Units of measurement with exact factors.

Takes dimensions and sources; gives one frozen Unit each. ``SI value = (reading + zero) * factor``.
Products such as kg/m³ or mbar·L/s are read from these by the engine, so only atoms and field words stand here.
"""

from fractions import Fraction

from spec import dimensions as dim
from spec.model import Citation, Unit
from spec.sources import FOOT_1959, SI_BROCHURE, SP811
