"""The gas model: reference equations of state for pure gases and air.

Takes a name; gives a gas with density, pressure, temperature and properties, real or ideal.
Relations, sheets and pages come next.
"""

from gaswright.gas.ideal import IdealGas
from gaswright.gas.real import Gas
from gaswright.gas.register import find, keys
from gaswright.gas.state import GasState, gas_state

__all__ = ["Gas", "GasState", "IdealGas", "find", "gas_state", "keys"]
