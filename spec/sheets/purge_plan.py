"""Purging by pressure swings: cycles to reach a share, and the purge gas they take."""

from spec import kinds
from spec.cautions import DEFER, PURGING
from spec.model import Find, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.c_ideal import AMOUNT_OF_MASS
from spec.relations.g_real import GAS_CONTENT, REAL_DENSITY
from spec.relations.l_purging import SWING_GAS, SWING_PURGE
from spec.sheets.rows import MOLAR_MASS, REFERENCE_PRESSURE, REFERENCE_TEMPERATURE, STATION, worked_out

PURGE_PLAN = Sheet(
    key="purge_plan",
    title="Purging",
    lead="Cycles of pressing up and letting off that bring a share down, and the purge gas they take.",
    group="Before pressure",
    rows={
        "gas": Row(title="Purge gas", kind=kinds.NUMBER, note="from the label", is_gas=True),
        "V": Row(
            title="Volume purged", kind=kinds.VOLUME, note="dead legs count apart", accuracy="± 5 %", low=1e-5, high=1e6
        ),
        "pg_H": Row(title="Pressed up to", kind=kinds.GAUGE_PRESSURE, low=-1.1e5, high=1e8),
        "pg_L": Row(title="Let off to", kind=kinds.GAUGE_PRESSURE, low=-1.1e5, high=1e8),
        "p_atm": STATION,
        "T": Row(
            title="Gas temperature", kind=kinds.ABSOLUTE_TEMPERATURE, low=200.0, high=400.0, site="air_temperature"
        ),
        "y_0": Row(title="Share at the start", kind=kinds.FRACTION, low=0.0, high=1.0),
        "y_s": Row(
            title="Share in the purge gas",
            kind=kinds.FRACTION,
            note="the impurity on its label",
            accuracy="exact",
            low=0.0,
            high=1.0,
        ),
        "y": Row(title="Share reached", kind=kinds.FRACTION, accuracy="exact", low=0.0, high=1.0),
        "y_limit": Row(
            title="Share allowed",
            kind=kinds.FRACTION,
            note="its source on the permit",
            optional=True,
            accuracy="exact",
            low=0.0,
            high=1.0,
        ),
        "N": Row(title="Cycles", kind=kinds.COUNT, accuracy="exact", whole=True, low=1.0, high=1e4),
        "T_ref": REFERENCE_TEMPERATURE,
        "p_ref": REFERENCE_PRESSURE,
        "V_ref": Row(
            title="Purge gas at reference conditions", kind=kinds.REFERENCE_VOLUME, reading=False, low=1e-9, high=1e9
        ),
        "M": MOLAR_MASS,
        "p_H": worked_out("Pressed up to, absolute", kinds.ABSOLUTE_PRESSURE),
        "p_L": worked_out("Let off to, absolute", kinds.ABSOLUTE_PRESSURE),
        "n": worked_out("Amount of purge gas", kinds.AMOUNT),
        "m": worked_out("Mass of purge gas", kinds.MASS),
        "rho_ref": worked_out("Density at reference conditions", kinds.DENSITY),
    },
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p_H", p_gauge="pg_H", p_atm="p_atm"),
        Use(GAUGE_PRESSURE, p_abs="p_L", p_gauge="pg_L", p_atm="p_atm"),
        Use(SWING_PURGE, y_n="y", y_s="y_s", y_0="y_0", p_L="p_L", p_H="p_H", N="N"),
        Use(SWING_GAS, n="n", N="N", p_H="p_H", p_L="p_L", V="V", T="T"),
        Use(AMOUNT_OF_MASS, n="n", m="m", M="M"),
        Use(REAL_DENSITY, rho="rho_ref", p="p_ref", T="T_ref", gas="gas"),
        Use(GAS_CONTENT, m="m", rho="rho_ref", V="V_ref"),
    ),
    finds=(
        Find(
            row="y",
            ask="share reached",
            label="Share reached",
            safe="high",
            unit="%",
            limit="y_limit",
            limit_text="share allowed",
        ),
        Find(row="N", ask="cycles", label="Cycles", safe="high", unit="1"),
        Find(row="pg_H", ask="pressure to press up to", label="Pressure to press up to", safe="high", unit="bar"),
    ),
    cautions=(PURGING, DEFER),
    rule="Cycles are only the plan. What is signed is the analyser's reading at the vent.",
    example={
        "gas": "nitrogen",
        "V": "640 L",
        "pg_H": "4.0 bar gauge",
        "pg_L": "0.20 bar gauge",
        "p_atm": "996.4 hPa",
        "T": "12.0 °C",
        "y_0": "20.9 %",
        "y_s": "20 ppm",
        "N": "4",
        "y_limit": "0.50 %",
        "T_ref": "15 °C",
        "p_ref": "101.325 kPa absolute",
    },
    notes=("gauge_low_on_scale",),
    words=("inerting", "nitrogen purge", "air out", "product out", "cycles"),
)
