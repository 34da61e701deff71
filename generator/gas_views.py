"""Views of the gases: identity, what hurts, the equation, tables worked out by the engine.

Takes the staged engine; gives a GasView for each gas. Next: generator.make_views.
"""

from gaswright.errors import OutsideRangeError
from gaswright.gas import Gas, IdealGas
from gaswright.gas import find as find_gas
from gaswright.gas import keys as gas_keys
from gaswright.show import significant

from generator.views import GasView, TableView

PRESSURES_BAR = (1.01325, 10, 50, 100, 150, 200, 300)
TEMPERATURES = (273.15, 288.15, 293.15, 313.15)
ZERO_CELSIUS = 273.15
REFUSED = "not a gas"
PA_PER_BAR = 1e5
CONTENT_AT = 288.15, 101325.0


def gas_views() -> tuple[GasView, ...]:
    """Give the view of every gas, in the order of the spec."""
    return tuple(_view(find_gas(key)) for key in gas_keys())


def _view(gas: Gas) -> GasView:
    identity = gas.identity
    return GasView(
        key=gas.key,
        title=gas.title,
        formula=gas.formula,
        identity=(
            ("Formula", gas.formula),
            ("Molar mass", f"{significant(gas.molar_mass * 1000, 6)} g/mol"),
            ("UN number", ", ".join(identity.un)),
            ("CAS number", identity.cas),
        ),
        hazards=(
            f"{'; '.join(identity.hazards).capitalize()}. The supplier’s safety data sheet and local rules decide.",
        ),
        equation=f"{identity.citation}. DOI {identity.doi}." if identity.doi else f"{identity.citation}.",
        uncertainty=tuple(dict.fromkeys(f"Density: {band.says}." for band in identity.uncertainties)),
        limits=(
            ("Temperatures of the equation", f"{gas.T_min:.6g} to {gas.T_max:.6g} K"),
            ("Highest pressure", f"{gas.p_max / 1e6:.6g} MPa"),
            ("Critical point", f"{gas.T_c - ZERO_CELSIUS:.2f} °C, {gas.p_c / PA_PER_BAR:.2f} bar absolute"),
        ),
        tables=(_density_table(gas), _factor_table(gas), _content_table(gas)),
        words=(*identity.spellings, *(f"UN {number}" for number in identity.un)),
    )


def _head() -> tuple[str, ...]:
    return ("bar absolute", *(f"{temperature - ZERO_CELSIUS:.0f} °C" for temperature in TEMPERATURES))


def _density_table(gas: Gas) -> TableView:
    rows = tuple(
        (f"{pressure:.6g}", *(_density(gas, pressure * PA_PER_BAR, temperature) for temperature in TEMPERATURES))
        for pressure in PRESSURES_BAR
    )
    return TableView(caption="Density in kg/m³", head=_head(), rows=rows, note="Real gas, by the reference equation.")


def _density(gas: Gas, pressure: float, temperature: float) -> str:
    try:
        return significant(gas.density(pressure, temperature), 5)
    except OutsideRangeError:
        return REFUSED


def _factor_table(gas: Gas) -> TableView:
    rows = tuple(
        (f"{pressure:.6g}", *(_factor(gas, pressure * PA_PER_BAR, temperature) for temperature in TEMPERATURES))
        for pressure in PRESSURES_BAR
    )
    return TableView(caption="Compressibility factor Z", head=_head(), rows=rows, note="1 is the ideal gas.")


def _factor(gas: Gas, pressure: float, temperature: float) -> str:
    try:
        return f"{gas.compressibility(pressure, temperature):.4f}"
    except OutsideRangeError:
        return REFUSED


def _content_table(gas: Gas) -> TableView:
    """Content of one litre of water capacity at 15 °C, in litres at 15 °C and 101.325 kPa, real and ideal."""
    rows = tuple(
        (f"{pressure:.6g}", *(_content(model, pressure * PA_PER_BAR) for model in (gas, IdealGas(gas))))
        for pressure in PRESSURES_BAR
    )
    return TableView(
        caption="Content of one litre of water capacity at 15 °C",
        head=("bar absolute", "real", "ideal law"),
        rows=rows,
        note="Litres at 15 °C and 101.325 kPa.",
    )


def _content(gas: Gas, pressure: float) -> str:
    temperature, reference = CONTENT_AT
    try:
        return significant(gas.density(pressure, temperature) / gas.density(reference, temperature), 5)
    except OutsideRangeError:
        return REFUSED
