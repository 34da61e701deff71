"""Locked-in pressure: what a closed section of gas reaches when it warms up."""

from spec import kinds
from spec.cautions import DEFER, TRAPPED_LIQUID
from spec.model import Find, Plot, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.g_real import REAL_DENSITY
from spec.sheets.rows import GAS, STATION, worked_out

LOCKED_IN = Sheet(
    key="locked_in",
    title="Locked-in pressure",
    lead="What a closed section of gas reaches when it warms up, and how far it may be filled.",
    group="Before pressure",
    rows={
        "gas": GAS,
        "pg_1": Row(title="Pressure at closing", kind=kinds.GAUGE_PRESSURE, low=-2e6, high=1e8),
        "T_1": Row(
            title="Gas temperature at closing",
            kind=kinds.ABSOLUTE_TEMPERATURE,
            low=100.0,
            high=600.0,
            site="air_temperature",
        ),
        "T_2": Row(
            title="Hottest temperature it will see",
            kind=kinds.ABSOLUTE_TEMPERATURE,
            low=100.0,
            high=600.0,
            note="asked, never assumed: sun on a dark pipe reaches 70 °C",
        ),
        "p_atm": STATION,
        "pg_2": Row(
            title="Pressure at the hottest",
            kind=kinds.GAUGE_PRESSURE,
            low=-2e6,
            high=1e8,
            note="give the weakest rating here to ask for a closing pressure or a temperature",
        ),
        "pg_rating": Row(
            title="Weakest rating", kind=kinds.GAUGE_PRESSURE, optional=True, accuracy="exact", low=0.0, high=1e8
        ),
        "p_1": worked_out("Pressure at closing, absolute", kinds.ABSOLUTE_PRESSURE),
        "p_2": worked_out("Pressure at the hottest, absolute", kinds.ABSOLUTE_PRESSURE),
        "rho": worked_out("Density locked in", kinds.DENSITY),
    },
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p_1", p_gauge="pg_1", p_atm="p_atm"),
        Use(GAUGE_PRESSURE, p_abs="p_2", p_gauge="pg_2", p_atm="p_atm"),
        Use(REAL_DENSITY, rho="rho", p="p_1", T="T_1", gas="gas"),
        Use(REAL_DENSITY, rho="rho", p="p_2", T="T_2", gas="gas"),
    ),
    finds=(
        Find(
            row="pg_2",
            ask="pressure at the hottest",
            label="Pressure at the hottest",
            safe="high",
            unit="bar",
            limit="pg_rating",
            limit_text="weakest rating",
        ),
        Find(
            row="pg_1",
            ask="highest safe closing pressure",
            label="Highest safe closing pressure",
            safe="low",
            unit="bar",
        ),
        Find(row="T_2", ask="temperature at the rating", label="Temperature at the rating", safe="low", unit="°C"),
    ),
    cautions=(TRAPPED_LIQUID, DEFER),
    rule="Signed is the safe end: result plus U for a pressure reached, result less U for what is allowed.",
    example={
        "gas": "nitrogen",
        "pg_1": "160 bar gauge",
        "T_1": "12.0 °C",
        "T_2": "60 °C",
        "p_atm": "996.4 hPa",
        "pg_rating": "210 bar gauge",
    },
    plot=Plot(function="locked_in_pressure", title="Pressure against temperature", along="T_2", upright="pg_2"),
    notes=("gauge_low_on_scale",),
    words=("trapped", "sun", "warming", "isolated section", "thermal"),
)
