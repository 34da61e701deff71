"""Kinds of quantity: numbers: shares, ratios, factors, counts."""

from spec import dimensions as dim
from spec.model import Kind

NUMBER = Kind(key="number", title="number", dimension=dim.NUMBER, si="1", units=("1",), low=1e-12, high=1e12)
RATIO = Kind(key="ratio", title="ratio", dimension=dim.NUMBER, si="1", units=("1", "%"), low=1e-9, high=1e9)
COMPRESSIBILITY = Kind(
    key="compressibility_factor",
    title="compressibility factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.02,
    high=20.0,
    note="1 is the ideal gas; the result says so where 1 was taken.",
)
COUNT = Kind(
    key="count",
    title="count",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-6,
    high=1e9,
    note="A whole number; one that is found is rounded the safe way and the fraction is shown.",
)
MOLECULES = Kind(
    key="molecules", title="number of molecules", dimension=dim.NUMBER, si="1", units=("1",), low=1.0, high=1e40
)
ANGLE = Kind(
    key="angle",
    title="angle",
    dimension=dim.NUMBER,
    si="rad",
    units=("°", "rad"),
    low=1e-6,
    high=1.5707963267948966,
    note="Between 0 and 90 degrees.",
)
FRACTION = Kind(
    key="fraction",
    title="share by amount",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "ppm", "ppb", "1"),
    low=1e-12,
    high=1.0,
    note="Moles of one gas in one mole of all; by volume it is the same for ideal gases.",
)
HUMIDITY = Kind(
    key="humidity",
    title="relative humidity",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "1"),
    low=1e-9,
    high=10.0,
)
ENHANCEMENT = Kind(
    key="enhancement",
    title="enhancement factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.9,
    high=100.0,
    note="1 leaves out what the gas does to the vapour; the result says so where 1 was taken.",
)
SMALL_FACTOR = Kind(
    key="small_factor",
    title="small number of a formula",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-9,
    high=0.5,
)
COEFFICIENT = Kind(
    key="coefficient",
    title="coefficient of a device",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=10.0,
    note="From the calibration or the data of the device.",
)
HEAT_RATIO = Kind(
    key="heat_ratio",
    title="ratio of heat capacities",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.001,
    high=5.0,
    note="1.40 for nitrogen and air, 1.67 for helium and argon, 1.31 for methane, near 15 °C and 1 bar.",
)
MIXING = Kind(
    key="mixing",
    title="mixing factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.1,
    high=1.0,
    note="1 is perfect mixing.",
)
CRITICAL = Kind(
    key="critical_pressure_ratio",
    title="critical pressure ratio",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.1,
    high=0.607,
)
REYNOLDS = Kind(
    key="reynolds_number",
    title="Reynolds number",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.0,
    high=1e10,
)
ROUGHNESS = Kind(
    key="relative_roughness",
    title="relative roughness",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.0,
    high=0.1,
)
MASS_RATIO = Kind(
    key="mass_ratio",
    title="share by mass",
    dimension=dim.NUMBER,
    si="1",
    units=("g/kg", "kg/kg", "1"),
    low=1e-12,
    high=1e6,
)
FRICTION = Kind(
    key="friction_factor",
    title="friction factor (Darcy)",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-4,
    high=1.0,
    note="Darcy’s: four times Fanning’s.",
)
ACCURACY_CLASS = Kind(
    key="accuracy_class",
    title="accuracy class",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=20.0,
    note="The class printed on the dial: per cent of the span.",
)
CHOKED_FACTOR = Kind(
    key="choked_factor",
    title="choked-flow factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.5,
    high=1.0,
    note="0.6847 at a heat capacity ratio of 1.40, 0.7262 at 1.667.",
)
ANY_QUANTITY = Kind(
    key="any_quantity",
    title="quantity, the same kind in every row",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-12,
    high=1e12,
    note="The same kind in every row; type the unit behind the number.",
)
FREEDOM = Kind(
    key="freedom",
    title="degrees of freedom",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.5,
    high=1e9,
)
SUBSONIC_RATIO = Kind(
    key="subsonic_ratio",
    title="pressure ratio below choking",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.2,
    high=0.9999999999,
)
CHOICE = Kind(
    key="choice",
    title="choice",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=0.0,
    high=10.0,
)
ISENTROPIC = Kind(
    key="isentropic_exponent",
    title="isentropic exponent",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1.0,
    high=1e9,
)
SHARE_OF_LIMIT = Kind(
    key="share_of_limit",
    title="share of a limit",
    dimension=dim.NUMBER,
    si="1",
    units=("%", "1"),
    low=1e-9,
    high=1e3,
)
FACTOR = Kind(
    key="factor",
    title="factor of a rule",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-3,
    high=1e3,
    note="From the rule that asks for it, its source named.",
)
LATITUDE = Kind(
    key="latitude",
    title="latitude",
    dimension=dim.NUMBER,
    si="rad",
    units=("°", "rad"),
    low=0.0,
    high=1.5707963267948966,
    note="North or south alike.",
)
KNUDSEN = Kind(
    key="knudsen_number",
    title="Knudsen number",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=1e-9,
    high=1e9,
    note="Below 0.01 viscous, above 0.5 molecular flow, between them neither.",
)
ACENTRIC = Kind(
    key="acentric_factor",
    title="acentric factor",
    dimension=dim.NUMBER,
    si="1",
    units=("1",),
    low=-0.5,
    high=1.5,
)
