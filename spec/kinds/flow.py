"""Kinds of quantity: flow and leak rate."""

from spec import dimensions as dim
from spec.model import Kind

FLOW = Kind(
    key="flow",
    title="volume flow",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/min", "m³/h", "L/s", "m³/s", "mL/min", "cm³/min", "ft³/min", "ft³/h"),
    low=1e-15,
    high=1e6,
)
REFERENCE_FLOW = Kind(
    key="reference_flow",
    title="volume flow at reference conditions",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/min", "m³/h", "L/s", "m³/s", "mL/min", "cm³/min", "ft³/min", "ft³/h"),
    low=1e-15,
    high=1e6,
    note="Means nothing without its reference temperature and pressure.",
)
MOLAR_FLOW = Kind(
    key="molar_flow",
    title="amount per time",
    dimension=dim.MOLAR_FLOW,
    si="mol/s",
    units=("mol/s", "mol/h", "mmol/s"),
    low=1e-20,
    high=1e9,
)
MASS_FLOW = Kind(
    key="mass_flow",
    title="mass flow",
    dimension=dim.MASS_FLOW,
    si="kg/s",
    units=("kg/h", "kg/s", "g/s", "g/min", "lb/h"),
    low=1e-20,
    high=1e9,
)
LEAK_RATE = Kind(
    key="leak_rate",
    title="leak rate",
    dimension=dim.PRESSURE * dim.FLOW,
    si="Pa·m³/s",
    units=("mbar·L/s", "Pa·m³/s", "torr·L/s", "atm·cm³/s"),
    low=1e-15,
    high=1e9,
    note="Pressure times volume per time: it belongs to the temperature it was counted at.",
)
LEAK_RATE_EITHER_WAY = Kind(
    key="leak_rate_either_way",
    title="leak rate, out or in",
    dimension=dim.PRESSURE * dim.FLOW,
    si="Pa·m³/s",
    units=("mbar·L/s", "Pa·m³/s", "torr·L/s", "atm·cm³/s"),
    low=-1e9,
    high=1e9,
    note="Pressure times volume per time: it belongs to the temperature it was counted at.",
)
MOLAR_FLOW_EITHER_WAY = Kind(
    key="molar_flow_either_way",
    title="amount per time, out or in",
    dimension=dim.MOLAR_FLOW,
    si="mol/s",
    units=("mol/s", "mol/h", "mmol/s"),
    low=-1e9,
    high=1e9,
)
PUMP_SPEED = Kind(
    key="pump_speed",
    title="pumping speed or conductance",
    dimension=dim.FLOW,
    si="m³/s",
    units=("L/s", "m³/h", "m³/s", "L/min", "ft³/min"),
    low=1e-12,
    high=1e6,
    note="Volume at the pressure there, not at reference conditions.",
)
