"""Kinds of quantity: space, time, force and energy."""

from spec import dimensions as dim
from spec.model import Kind

VOLUME = Kind(
    key="volume",
    title="volume",
    dimension=dim.VOLUME,
    si="m³",
    units=("L", "m³", "mL", "cm³", "ft³", "in³"),
    low=1e-12,
    high=1e9,
)
REFERENCE_VOLUME = Kind(
    key="reference_volume",
    title="volume at reference conditions",
    dimension=dim.VOLUME,
    si="m³",
    units=("m³", "L", "mL", "ft³"),
    low=1e-12,
    high=1e12,
    note="Means nothing without its reference temperature and pressure.",
)
FORCE = Kind(
    key="force", title="force", dimension=dim.FORCE, si="N", units=("N", "kN", "lbf", "kgf"), low=1e-9, high=1e12
)
AREA = Kind(
    key="area", title="area", dimension=dim.AREA, si="m²", units=("cm²", "mm²", "m²", "in²", "ft²"), low=1e-15, high=1e9
)
LENGTH = Kind(
    key="length",
    title="length",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "mm", "cm", "km", "in", "ft"),
    low=1e-12,
    high=1e8,
)
ACCELERATION = Kind(
    key="acceleration",
    title="acceleration of free fall",
    dimension=dim.ACCELERATION,
    si="m/s²",
    units=("m/s²",),
    low=1.0,
    high=30.0,
)
SPEED = Kind(
    key="speed", title="speed", dimension=dim.SPEED, si="m/s", units=("m/s", "km/h", "ft/s"), low=1e-6, high=1e5
)
TIME = Kind(key="time", title="time", dimension=dim.TIME, si="s", units=("min", "h", "s", "d"), low=1e-9, high=1e12)
ALTITUDE = Kind(
    key="altitude",
    title="height above sea level",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "km", "ft"),
    low=-500.0,
    high=9e4,
)
COLUMN_HEIGHT = Kind(
    key="column_height",
    title="height of a column",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in", "ft"),
    low=-1e4,
    high=1e4,
)
SMALL_LENGTH = Kind(
    key="small_length",
    title="length of molecular size",
    dimension=dim.LENGTH,
    si="m",
    units=("nm", "µm", "mm", "m"),
    low=1e-11,
    high=1e6,
)
ENERGY = Kind(
    key="energy",
    title="energy",
    dimension=dim.ENERGY,
    si="J",
    units=("MJ", "kJ", "J", "kWh"),
    low=1e-6,
    high=1e15,
)
MOLECULE_ENERGY = Kind(
    key="molecule_energy",
    title="energy of one molecule",
    dimension=dim.ENERGY,
    si="J",
    units=("J",),
    low=1e-24,
    high=1e-15,
)
HEIGHT = Kind(
    key="height",
    title="height above sea level, not below it",
    dimension=dim.LENGTH,
    si="m",
    units=("m", "km", "ft"),
    low=1e-3,
    high=9e4,
)
LIFT = Kind(
    key="lift",
    title="lift",
    dimension=dim.FORCE,
    si="N",
    units=("N", "kN", "kgf", "lbf"),
    low=-1e9,
    high=1e9,
)
MOLECULAR_SPEED = Kind(
    key="molecular_speed",
    title="speed of a molecule",
    dimension=dim.SPEED,
    si="m/s",
    units=("m/s", "km/s"),
    low=0.0,
    high=1e6,
)
PLATE_BORE = Kind(
    key="plate_bore",
    title="bore of an orifice plate",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in"),
    low=1e-3,
    high=1.0,
)
PIPE_BORE = Kind(
    key="pipe_bore",
    title="bore of a metering pipe",
    dimension=dim.LENGTH,
    si="m",
    units=("mm", "cm", "m", "in"),
    low=1e-3,
    high=2.0,
)
WORK = Kind(
    key="work",
    title="work",
    dimension=dim.ENERGY,
    si="J",
    units=("kJ", "J", "MJ", "kWh"),
    low=-1e15,
    high=1e15,
    note="Below zero: work is done on the gas.",
)
