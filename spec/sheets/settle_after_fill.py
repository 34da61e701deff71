"""Settled pressure after filling: what a vessel filled warm shows once it has cooled, and where to stop for it."""

from spec import kinds
from spec.cautions import DEFER, FILLING
from spec.model import Find, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.g_real import REAL_DENSITY
from spec.sheets.rows import GAS, STATION, worked_out

SETTLE_AFTER_FILL = Sheet(
    key="settle_after_fill",
    title="Settled pressure after filling",
    lead="What a vessel filled warm will show once it has cooled, and at which pressure to stop for that.",
    group="Before pressure",
    rows={
        "gas": GAS,
        "pg_now": Row(title="Pressure now", kind=kinds.GAUGE_PRESSURE, low=-2e6, high=1e8),
        "T_now": Row(
            title="Gas temperature now",
            kind=kinds.ABSOLUTE_TEMPERATURE,
            note="of the gas: the shell runs behind",
            low=150.0,
            high=500.0,
        ),
        "T_settled": Row(
            title="Settled temperature",
            kind=kinds.ABSOLUTE_TEMPERATURE,
            low=150.0,
            high=500.0,
            site="air_temperature",
        ),
        "p_atm": STATION,
        "pg_settled": Row(title="Settled pressure", kind=kinds.GAUGE_PRESSURE, low=-2e6, high=1e8),
        "pg_wanted": Row(
            title="Settled pressure wanted",
            kind=kinds.GAUGE_PRESSURE,
            optional=True,
            accuracy="exact",
            low=0.0,
            high=1e8,
        ),
        "p_1": worked_out("Pressure now, absolute", kinds.ABSOLUTE_PRESSURE),
        "p_2": worked_out("Settled pressure, absolute", kinds.ABSOLUTE_PRESSURE),
        "rho": worked_out("Density in the vessel", kinds.DENSITY),
    },
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p_1", p_gauge="pg_now", p_atm="p_atm"),
        Use(GAUGE_PRESSURE, p_abs="p_2", p_gauge="pg_settled", p_atm="p_atm"),
        Use(REAL_DENSITY, rho="rho", p="p_1", T="T_now", gas="gas"),
        Use(REAL_DENSITY, rho="rho", p="p_2", T="T_settled", gas="gas"),
    ),
    finds=(
        Find(
            row="pg_settled",
            ask="settled pressure",
            label="Settled pressure",
            safe="low",
            unit="bar",
            limit="pg_wanted",
            limit_text="settled pressure wanted",
        ),
        Find(row="pg_now", ask="pressure to stop at", label="Pressure to stop at", safe="low", unit="bar"),
        Find(row="T_now", ask="gas temperature now", label="Gas temperature now", safe="low", unit="°C"),
    ),
    cautions=(FILLING, DEFER),
    rule="Signed is the safe end: result less U. The rating of the vessel holds at every moment, warm or settled.",
    example={
        "gas": "nitrogen",
        "pg_now": "214 bar gauge",
        "T_now": "38 °C",
        "T_settled": "12.0 °C",
        "p_atm": "996.4 hPa",
        "pg_wanted": "190 bar gauge",
    },
    notes=("gauge_low_on_scale",),
    words=("hot fill", "cooling down", "topping off", "heat of compression"),
)
