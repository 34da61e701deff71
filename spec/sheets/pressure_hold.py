"""Hold test: what a closed section loses, with the gas temperature and the barometer of both ends counted in."""

from spec import kinds
from spec.cautions import DEFER, UNDER_PRESSURE
from spec.model import Find, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.c_ideal import GAS_DENSITY
from spec.relations.g_real import REAL_DENSITY
from spec.relations.k_leak import PRESSURE_CHANGE_LEAK
from spec.sheets.rows import GAS, MOLAR_MASS, STATION, worked_out


def _pressure(title: str) -> Row:
    return Row(title=title, kind=kinds.GAUGE_PRESSURE, low=-1.1e5, high=1e8)


def _temperature(title: str) -> Row:
    return Row(
        title=title,
        kind=kinds.ABSOLUTE_TEMPERATURE,
        note="of the gas, by a probe on the shaded pipe at least",
        low=200.0,
        high=400.0,
    )


PRESSURE_HOLD = Sheet(
    key="pressure_hold",
    title="Hold test",
    lead="What a closed section loses over the test, with the gas temperature and the barometer counted in.",
    group="Under pressure",
    rows={
        "gas": GAS,
        "V": Row(
            title="Volume under test",
            kind=kinds.VOLUME,
            note="all that is open to it",
            accuracy="± 5 %",
            low=1e-5,
            high=1e6,
        ),
        "pg_1": _pressure("Pressure at the start"),
        "T_1": _temperature("Gas temperature at the start"),
        "p_atm": STATION,
        "pg_2": _pressure("Pressure at the end"),
        "T_2": _temperature("Gas temperature at the end"),
        "p_atm_2": Row(
            title="Station pressure at the end",
            kind=kinds.STATION_PRESSURE,
            note="read again: a falling barometer lifts the gauge",
            site="station_pressure",
        ),
        "t": Row(
            title="Length of the test", kind=kinds.TIME, note="after stabilising", accuracy="± 30 s", low=1.0, high=1e8
        ),
        "T_ref": Row(
            title="Temperature the leak rate is counted at",
            kind=kinds.ABSOLUTE_TEMPERATURE,
            accuracy="exact",
            site="reference_temperature",
            low=250.0,
            high=320.0,
        ),
        "Q": Row(title="Leak rate", kind=kinds.LEAK_RATE_EITHER_WAY, low=-1e7, high=1e7, accuracy="exact"),
        "Q_limit": Row(
            title="Limit of the leak rate",
            kind=kinds.LEAK_RATE_EITHER_WAY,
            optional=True,
            accuracy="exact",
            note="the installation code sets it",
            low=0.0,
            high=1e7,
        ),
        "M": MOLAR_MASS,
        "p_1": worked_out("Pressure at the start, absolute", kinds.ABSOLUTE_PRESSURE),
        "p_2": worked_out("Pressure at the end, absolute", kinds.ABSOLUTE_PRESSURE),
        "rho_1": worked_out("Density at the start", kinds.DENSITY),
        "rho_2": worked_out("Density at the end", kinds.DENSITY),
        "Z_1": worked_out("Compressibility factor at the start", kinds.COMPRESSIBILITY),
        "Z_2": worked_out("Compressibility factor at the end", kinds.COMPRESSIBILITY),
    },
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p_1", p_gauge="pg_1", p_atm="p_atm"),
        Use(GAUGE_PRESSURE, p_abs="p_2", p_gauge="pg_2", p_atm="p_atm_2"),
        Use(REAL_DENSITY, rho="rho_1", p="p_1", T="T_1", gas="gas"),
        Use(REAL_DENSITY, rho="rho_2", p="p_2", T="T_2", gas="gas"),
        Use(GAS_DENSITY, rho="rho_1", p="p_1", M="M", Z="Z_1", T="T_1"),
        Use(GAS_DENSITY, rho="rho_2", p="p_2", M="M", Z="Z_2", T="T_2"),
        Use(
            PRESSURE_CHANGE_LEAK,
            Q="Q",
            V="V",
            p_1="p_1",
            Z_1="Z_1",
            T_1="T_1",
            p_2="p_2",
            Z_2="Z_2",
            T_2="T_2",
            T_ref="T_ref",
            t="t",
        ),
    ),
    finds=(
        Find(
            row="Q",
            ask="leak rate",
            label="Leak rate",
            safe="high",
            unit="mbar·L/s",
            limit="Q_limit",
            limit_text="limit of the leak rate",
        ),
        Find(
            row="pg_2",
            ask="pressure to expect at the end",
            label="Pressure to expect at the end",
            safe="low",
            unit="bar",
        ),
    ),
    cautions=(UNDER_PRESSURE, DEFER),
    rule="Signed is the leak rate plus U, what it may be at most: a leak too small to see is less than that.",
    example={
        "gas": "nitrogen",
        "V": "640 L",
        "pg_1": "7.012 bar gauge ± 0.005 bar",
        "T_1": "14.2 °C ± 0.2 °C",
        "p_atm": "996.4 hPa ± 0.5 hPa",
        "pg_2": "6.921 bar gauge ± 0.005 bar",
        "T_2": "11.3 °C ± 0.2 °C",
        "p_atm_2": "998.1 hPa ± 0.5 hPa",
        "t": "4 h",
        "T_ref": "15 °C",
        "Q_limit": "1.0 mbar·L/s",
    },
    notes=("gauge_low_on_scale",),
    words=("pressure decay", "leak test", "tightness", "drop test"),
)
