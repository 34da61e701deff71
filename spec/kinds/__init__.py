"""The kinds of quantity that variables have, one module for each sort.

Takes dimensions; gives one frozen Kind each, with the units a page offers (the first is shown at the start) and the
range of the field in SI, inside which numeric solutions are sought and outside which a reading is refused.
"""

from spec.kinds.flow import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.matter import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.mechanics import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.number import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.pressure import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.property import *  # noqa: F403 - every kind is offered under one name
from spec.kinds.temperature import *  # noqa: F403 - every kind is offered under one name
from spec.model import Kind

ALL = tuple(value for value in vars().values() if isinstance(value, Kind))
