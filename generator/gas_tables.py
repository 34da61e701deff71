"""Tables of reference conditions and of water vapour at saturation.

Takes spec.reference_tables and the staged engine; gives pages. generator.table_views puts them in order.
"""

from gaswright.find import relation as find_law

from generator.table_figures import shown, stated, value
from generator.views import TablePageView, TableView
from spec.reference_tables import PAIRS, ReferenceConditions

WATER_TEMPERATURES = (*range(-45, 0, 5), *range(51), *range(55, 101, 5))
ICE_TEMPERATURES = (*range(-100, -20, 5), *range(-20, 1))
WATER_MOLAR_MASS = "18.015268 g/mol"


def conditions_page() -> TablePageView:
    """Give the page of the reference conditions in use."""
    return TablePageView(
        key="reference_conditions",
        title="Reference conditions",
        lead="A volume of gas means nothing without the temperature and the pressure it is counted at. "
        "These pairs are in use; the order, the permit or the contract says which is meant.",
        tables=(_pairs_table(), _ratios_table()),
        words=("normal cubic metre", "standard cubic feet", "Nm3", "Sm3", "scf", "STP", "NTP", "ANR", "molar volume"),
        laws=("molar_volume", "reference_volume"),
    )


def _pairs_table() -> TableView:
    return TableView(
        caption="Pairs in use",
        head=("Temperature", "Absolute pressure", "One mole of ideal gas", "Who counts at it", "Source"),
        rows=tuple(
            (pair.temperature, pair.pressure, f"{_molar_volume(pair)} L", pair.used, str(pair.source)) for pair in PAIRS
        ),
        note="The volume of one mole is that of the ideal gas; dry and wet gas are told apart elsewhere.",
    )


def _molar_volume(pair: ReferenceConditions) -> str:
    volume = value("molar_volume", "V_m", Z="1", T=pair.temperature, p=f"{pair.pressure} absolute")
    return shown("molar_volume", "V_m", volume, "L/mol", 6)


def _ratios_table() -> TableView:
    return TableView(
        caption="One cubic metre counted at another pair",
        head=("1 m³ at", *(pair.pair for pair in PAIRS)),
        rows=tuple((own.pair, *(_ratio(own, other) for other in PAIRS)) for own in PAIRS),
        note="m³ of ideal, dry gas at the pair above the column.",
        is_figures=True,
    )


def _ratio(own: ReferenceConditions, other: ReferenceConditions) -> str:
    volume = value(
        "reference_volume",
        "V_0",
        V="1 m³",
        p=f"{own.pressure} absolute",
        T=own.temperature,
        p_0=f"{other.pressure} absolute",
        T_0=other.temperature,
    )
    return shown("reference_volume", "V_0", volume, "m³", 5)


def saturation_page() -> TablePageView:
    """Give the page of the saturation pressure of water over water and over ice."""
    return TablePageView(
        key="saturation",
        title="Saturation pressure of water",
        lead="The most water vapour that a gas can hold at a temperature, over liquid water and over ice. "
        "The reference form is the more exact; the Magnus form is the one that hygrometers and weather services use.",
        tables=(_water_table(), _ice_table()),
        words=("dew point", "frost point", "vapour pressure", "humidity", "Magnus", "IAPWS"),
        laws=(
            "saturation_water_iapws",
            "saturation_water_magnus",
            "sublimation_ice_iapws",
            "saturation_ice_magnus",
            "water_mass_per_volume",
        ),
    )


def _water_table() -> TableView:
    return _saturation_table(
        "Over liquid water", WATER_TEMPERATURES, "saturation_water_iapws", "saturation_water_magnus"
    )


def _ice_table() -> TableView:
    return _saturation_table("Over ice", ICE_TEMPERATURES, "sublimation_ice_iapws", "saturation_ice_magnus")


def _saturation_table(caption: str, temperatures: tuple[int, ...], reference: str, magnus: str) -> TableView:
    sources = " ".join(f"{find_law(key).title}: {find_law(key).source}." for key in (reference, magnus))
    return TableView(
        caption=caption,
        head=("°C", "Reference form, hPa", "Magnus form, hPa", "Water in the gas, g/m³"),
        rows=tuple(_saturation_row(temperature, reference, magnus) for temperature in temperatures),
        note=f"A dash: outside the range that the source states. Water in the gas as an ideal gas. {sources}",
        is_figures=True,
    )


def _saturation_row(celsius: int, reference: str, magnus: str) -> tuple[str, ...]:
    best, other = stated(reference, "e", "T", f"{celsius} °C"), stated(magnus, "e", "t", f"{celsius} °C")
    pressure = other if best is None else best
    mass = None
    if pressure is not None:
        mass = value("water_mass_per_volume", "d_w", e=pressure, M_w=WATER_MOLAR_MASS, T=f"{celsius} °C")
    return (
        f"{celsius}".replace("-", "−"),
        shown(reference, "e", best, "hPa", 5),
        shown(magnus, "e", other, "hPa", 4),
        shown("water_mass_per_volume", "d_w", mass, "g/m³", 4),
    )
