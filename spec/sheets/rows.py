"""Rows that several sheets share: the gas, the vessels, the station pressure, the reference conditions."""

from spec import kinds
from spec.model import Kind, Row

GAS = Row(title="Gas", kind=kinds.NUMBER, note="from the label", is_gas=True)
COUNT = Row(title="Cylinders", kind=kinds.COUNT, note="counted", accuracy="exact", whole=True, low=1.0, high=1e5)
CAPACITY_EACH = Row(
    title="Water capacity, each",
    kind=kinds.VOLUME,
    note="stamped on the shoulder",
    accuracy="± 1 %",
    low=1e-5,
    high=1e4,
    unusual_above=0.150,
)
CAPACITY = Row(title="Water capacity, all together", kind=kinds.VOLUME, reading=False, low=1e-5, high=1e6)
STATION = Row(
    title="Station pressure",
    kind=kinds.STATION_PRESSURE,
    note="barometer here, not the sea-level report",
    site="station_pressure",
)
GAS_TEMPERATURE = Row(
    title="Gas temperature",
    kind=kinds.ABSOLUTE_TEMPERATURE,
    note="of the gas, not of the air",
    low=150.0,
    high=500.0,
    site="air_temperature",
)
REFERENCE_PRESSURE = Row(
    title="Reference pressure",
    kind=kinds.ABSOLUTE_PRESSURE,
    accuracy="exact",
    site="reference_pressure",
    low=5e4,
    high=2e5,
)
REFERENCE_TEMPERATURE = Row(
    title="Reference temperature",
    kind=kinds.ABSOLUTE_TEMPERATURE,
    accuracy="exact",
    site="reference_temperature",
    low=250.0,
    high=320.0,
)
MOLAR_MASS = Row(title="Molar mass", kind=kinds.MOLAR_MASS, reading=False, of_gas="molar_mass")


def worked_out(title: str, kind: Kind) -> Row:
    """Give a row that is worked out on the way and stands in the working only."""
    return Row(title=title, kind=kind, reading=False)
