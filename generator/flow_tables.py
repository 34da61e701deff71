"""Tables of the standard atmosphere, of gauge classes and of molecules in a thin gas.

Takes spec.reference_tables and the staged engine; gives pages. generator.table_views puts them in order.
"""

from gaswright.gas import find as find_gas
from gaswright.instrument import parse as parse_accuracy
from gaswright.quantity import interval_in_unit
from gaswright.show import tidy
from gaswright.tables import KINDS

from generator.table_figures import shown, value
from generator.views import TablePageView, TableView
from spec.reference_tables import (
    ATMOSPHERE,
    ATMOSPHERE_SOURCE,
    DIAMETER_SOURCE,
    DIAMETERS,
    GAUGE_CLASSES,
    GAUGE_SOURCE,
    GAUGE_SPANS,
)

HEIGHTS = (*range(-400, 3000, 100), *range(3000, 11001, 500))
SPEED_TEMPERATURES = ("0 °C", "20 °C", "100 °C")
PATH_UNITS = {"1013.25 mbar": "nm", "1 mbar": "µm", "10⁻² mbar": "mm", "10⁻⁴ mbar": "m", "10⁻⁶ mbar": "m"}
RAISED = str.maketrans("⁻²⁴⁶", "-246")
AT = "20 °C"


def atmosphere_page() -> TablePageView:
    """Give the page of the standard atmosphere by height."""
    table = TableView(
        caption="Pressure by height",
        head=("Height, m", "hPa", "inHg", "psi", "Water boils at, °C"),
        rows=tuple(map(_height_row, HEIGHTS)),
        note=f"Geopotential height. Source: {ATMOSPHERE_SOURCE}. "
        "Water boils where its saturation pressure, reference form, is that of the air.",
        is_figures=True,
    )
    return TablePageView(
        key="atmosphere",
        title="Standard atmosphere",
        lead="Pressure of the standard atmosphere by height above sea level. "
        "The weather moves it by 30 hPa and more: it replaces no barometer.",
        tables=(table,),
        words=("altitude", "elevation", "station pressure", "barometer", "boiling point"),
        laws=("atmosphere_gradient", "saturation_water_iapws"),
    )


def _height_row(height: int) -> tuple[str, ...]:
    pressure = value("atmosphere_gradient", "p", H=f"{height} m", **ATMOSPHERE)
    boiling = value("saturation_water_iapws", "T", e=pressure)
    return (
        f"{height}".replace("-", "−"),
        *(shown("atmosphere_gradient", "p", pressure, unit, 4) for unit in ("hPa", "inHg", "psi")),
        shown("saturation_water_iapws", "T", boiling, "°C", 3),
    )


def gauge_page() -> TablePageView:
    """Give the page of the largest errors of gauges by class and span."""
    return TablePageView(
        key="gauge_classes",
        title="Gauge classes",
        lead="The class on a dial is the largest error in per cent of the span, at each point of the scale: "
        "a reading low on the scale is good to a far larger share of itself.",
        tables=(_limit_table(), _uncertainty_table()),
        words=("accuracy", "dial gauge", "EN 837", "class 1.6", "error limit"),
        laws=("gauge_class",),
    )


def _limit_table() -> TableView:
    return TableView(
        caption="Largest error in bar",
        head=_class_head(),
        rows=tuple((span, *(f"± {_limit(span, each)}" for each in GAUGE_CLASSES)) for span in GAUGE_SPANS),
        note=f"Within the working range at 20 °C, as the standard states it. Source: {GAUGE_SOURCE}.",
        is_figures=True,
    )


def _limit(span: str, accuracy_class: str) -> str:
    kind = KINDS["pressure_difference"]
    limit = parse_accuracy(f"class {accuracy_class} of {span} bar", 0.0, kind.exponents, "class").limit
    return tidy(interval_in_unit(limit, kind, "bar"), 4)


def _uncertainty_table() -> TableView:
    return TableView(
        caption="Standard uncertainty in bar",
        head=_class_head(),
        rows=tuple((span, *(_uncertainty(span, each) for each in GAUGE_CLASSES)) for span in GAUGE_SPANS),
        note="Any error within the limit taken as equally likely (JCGM 100, 4.3.7).",
        is_figures=True,
    )


def _uncertainty(span: str, accuracy_class: str) -> str:
    return shown("gauge_class", "u", value("gauge_class", "u", c=accuracy_class, span=f"{span} bar"), "bar", 3)


def _class_head() -> tuple[str, ...]:
    return ("Span, bar", *(f"class {each}" for each in GAUGE_CLASSES))


def molecules_page() -> TablePageView:
    """Give the page of mean speeds and mean free paths by gas."""
    return TablePageView(
        key="molecules",
        title="Molecular flow",
        lead="How fast molecules move and how far they go between two hits. "
        "Where the path is longer than the bore they hit the wall and not each other, and the flow is molecular.",
        tables=(_speed_table(), _path_table()),
        words=("mean free path", "mean speed", "vacuum", "Knudsen", "kinetic theory"),
        laws=("mean_speed", "mean_free_path", "knudsen_number"),
    )


def _speed_table() -> TableView:
    return TableView(
        caption="Mean speed in m/s",
        head=("Gas", "Molar mass, g/mol", *SPEED_TEMPERATURES),
        rows=tuple(_speed_row(key) for key in DIAMETERS),
        note="The speed of one molecule, not of the stream. It does not depend on the pressure.",
        is_figures=True,
    )


def _speed_row(key: str) -> tuple[str, ...]:
    gas = find_gas(key)
    speeds = (value("mean_speed", "v", T=temperature, M=gas.molar_mass) for temperature in SPEED_TEMPERATURES)
    molar_mass = shown("mean_speed", "M", gas.molar_mass, "g/mol", 5)
    return (gas.title, molar_mass, *(shown("mean_speed", "v", speed, "m/s", 4) for speed in speeds))


def _path_table() -> TableView:
    return TableView(
        caption=f"Mean free path at {AT}",
        head=("Gas", "Diameter, nm", *(f"at {pressure}" for pressure in PATH_UNITS)),
        rows=tuple(_path_row(key) for key in DIAMETERS),
        note=f"Hard spheres of the diameter that the viscosity at 25 °C gives. Source: {DIAMETER_SOURCE}.",
        is_figures=True,
    )


def _path_row(key: str) -> tuple[str, ...]:
    paths = {
        pressure: value("mean_free_path", "lam", T=AT, d=DIAMETERS[key], p=f"{_typed(pressure)} absolute")
        for pressure in PATH_UNITS
    }
    texts = (
        f"{shown('mean_free_path', 'lam', path, PATH_UNITS[pressure], 3)} {PATH_UNITS[pressure]}"
        for pressure, path in paths.items()
    )
    return (find_gas(key).title, DIAMETERS[key].removesuffix(" nm"), *texts)


def _typed(pressure: str) -> str:
    """Give a pressure of the head, such as ``10⁻² mbar``, as it is typed: ``1e-2 mbar``."""
    return pressure.replace("10⁻", "1e⁻").translate(RAISED)
