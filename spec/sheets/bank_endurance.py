"""Time to changeover: how long a bank carries a demand before its pressure falls to the changeover pressure."""

from spec import kinds
from spec.cautions import DEFER, SUFFOCATION
from spec.model import Find, Plot, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.g_real import REAL_DENSITY
from spec.relations.r_balances import AMOUNT_DELIVERED, AMOUNT_DIFFERENCE, AMOUNT_IN_VESSEL, TOTAL_OF_EQUAL
from spec.sheets.rows import (
    CAPACITY,
    CAPACITY_EACH,
    COUNT,
    GAS,
    GAS_TEMPERATURE,
    MOLAR_MASS,
    STATION,
    worked_out,
)

ROWS = {
    "gas": GAS,
    "count": COUNT,
    "V_each": CAPACITY_EACH,
    "pg_start": Row(title="Pressure now", kind=kinds.GAUGE_PRESSURE, low=-2e6, high=1e8),
    "pg_end": Row(
        title="Changeover pressure",
        kind=kinds.GAUGE_PRESSURE,
        low=-2e6,
        high=1e8,
        note="not below the regulator’s least inlet pressure",
    ),
    "T_gas": GAS_TEMPERATURE,
    "p_atm": STATION,
    "q": Row(title="Demand", kind=kinds.REFERENCE_FLOW, note="at the flow meter’s own reference conditions"),
    "T_ref": Row(
        title="Flow meter’s reference temperature",
        kind=kinds.ABSOLUTE_TEMPERATURE,
        accuracy="exact",
        site="reference_temperature",
        low=250.0,
        high=320.0,
    ),
    "p_ref": Row(
        title="Flow meter’s reference pressure",
        kind=kinds.ABSOLUTE_PRESSURE,
        accuracy="exact",
        site="reference_pressure",
        low=5e4,
        high=2e5,
    ),
    "t": Row(title="Time to changeover", kind=kinds.TIME, low=1.0, high=1e9, accuracy="exact"),
    "t_needed": Row(title="Needed for", kind=kinds.TIME, optional=True, accuracy="exact", low=0.0, high=1e9),
    "start": Row(
        title="Start",
        kind=kinds.TIME,
        optional=True,
        is_clock=True,
        note="time of day, such as 07:34",
    ),
    "V": CAPACITY,
    "M": MOLAR_MASS,
    "p_start": worked_out("Pressure now, absolute", kinds.ABSOLUTE_PRESSURE),
    "p_end": worked_out("Changeover pressure, absolute", kinds.ABSOLUTE_PRESSURE),
    "rho_start": worked_out("Density now", kinds.DENSITY),
    "rho_end": worked_out("Density at changeover", kinds.DENSITY),
    "rho_ref": worked_out("Density at reference conditions", kinds.DENSITY),
    "n_start": worked_out("Amount now", kinds.AMOUNT),
    "n_end": worked_out("Amount kept back", kinds.AMOUNT),
    "n": worked_out("Amount to use", kinds.AMOUNT),
}

BANK_ENDURANCE = Sheet(
    key="bank_endurance",
    title="Time to changeover",
    lead="How long a bank of cylinders carries a demand before its pressure falls to the changeover pressure.",
    group="Supply and flow",
    rows=ROWS,
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p_start", p_gauge="pg_start", p_atm="p_atm"),
        Use(GAUGE_PRESSURE, p_abs="p_end", p_gauge="pg_end", p_atm="p_atm"),
        Use(TOTAL_OF_EQUAL, X="V", N="count", x="V_each"),
        Use(REAL_DENSITY, rho="rho_start", p="p_start", T="T_gas", gas="gas"),
        Use(REAL_DENSITY, rho="rho_end", p="p_end", T="T_gas", gas="gas"),
        Use(REAL_DENSITY, rho="rho_ref", p="p_ref", T="T_ref", gas="gas"),
        Use(AMOUNT_IN_VESSEL, n="n_start", rho="rho_start", V="V", M="M"),
        Use(AMOUNT_IN_VESSEL, n="n_end", rho="rho_end", V="V", M="M"),
        Use(AMOUNT_DIFFERENCE, n="n", n_1="n_start", n_2="n_end"),
        Use(AMOUNT_DELIVERED, n="n", rho_0="rho_ref", q="q", t="t", M="M"),
    ),
    finds=(
        Find(
            row="t",
            ask="time to changeover",
            label="Time to changeover",
            safe="low",
            unit="min",
            limit="t_needed",
            limit_text="needed for",
            clock="start",
        ),
        Find(row="count", ask="cylinders needed", label="Cylinders needed", safe="high", unit="1"),
        Find(row="pg_start", ask="pressure needed now", label="Pressure needed now", safe="high", unit="bar"),
        Find(row="pg_end", ask="changeover pressure", label="Pressure left at changeover", safe="low", unit="bar"),
        Find(row="q", ask="demand it can carry", label="Demand it can carry", safe="low", unit="L/min"),
    ),
    cautions=(SUFFOCATION, DEFER),
    rule="Signed is the safe end: result less U for a time, a demand or a pressure left; result plus U for what is "
    "needed. The amount kept back at the changeover pressure is not counted.",
    example={
        "gas": "nitrogen",
        "count": "4",
        "V_each": "50 L",
        "pg_start": "200 bar gauge",
        "pg_end": "10 bar gauge",
        "T_gas": "20 °C",
        "p_atm": "1013 mbar",
        "q": "30 L/min",
        "T_ref": "20 °C",
        "p_ref": "101.325 kPa absolute",
        "t_needed": "12 h",
        "start": "07:34",
    },
    plot=Plot(function="bank_pressure", title="Bank pressure against time", along="t", upright="pg_start"),
    notes=("capacity_each", "changeover_kept_back", "gauge_low_on_scale"),
    words=("bank", "duration", "how long", "changeover", "cylinder pack", "endurance"),
)
