"""Contents of a cylinder or pack: what was delivered, by pressure and temperature, against what was ordered."""

from spec import kinds
from spec.cautions import DEFER, RECEIPT
from spec.model import Find, Row, Sheet, Use
from spec.relations.a_pressure import GAUGE_PRESSURE
from spec.relations.g_real import GAS_CONTENT, REAL_DENSITY
from spec.relations.r_balances import AMOUNT_IN_VESSEL, TOTAL_OF_EQUAL
from spec.sheets.rows import (
    CAPACITY,
    CAPACITY_EACH,
    COUNT,
    GAS,
    GAS_TEMPERATURE,
    MOLAR_MASS,
    REFERENCE_PRESSURE,
    REFERENCE_TEMPERATURE,
    STATION,
    worked_out,
)

CYLINDER_RECEIPT = Sheet(
    key="cylinder_receipt",
    title="Contents of a cylinder or pack",
    lead="What cylinders hold by their pressure and the temperature of the gas, against what was ordered.",
    group="Before pressure",
    rows={
        "gas": GAS,
        "count": COUNT,
        "V_each": CAPACITY_EACH,
        "pg": Row(title="Pressure", kind=kinds.GAUGE_PRESSURE, low=-2e6, high=1e8),
        "T_gas": GAS_TEMPERATURE,
        "t_since": Row(
            title="Hours since filling",
            kind=kinds.TIME,
            optional=True,
            accuracy="exact",
            low=0.0,
            high=1e9,
            note="a cylinder fresh from filling is hot and reads full",
        ),
        "p_atm": STATION,
        "T_ref": REFERENCE_TEMPERATURE,
        "p_ref": REFERENCE_PRESSURE,
        "V_ref": Row(
            title="Content at reference conditions", kind=kinds.REFERENCE_VOLUME, low=1e-9, high=1e9, accuracy="exact"
        ),
        "V_ordered": Row(
            title="Ordered, at the same reference conditions",
            kind=kinds.REFERENCE_VOLUME,
            optional=True,
            accuracy="exact",
        ),
        "V": CAPACITY,
        "M": MOLAR_MASS,
        "p": worked_out("Pressure, absolute", kinds.ABSOLUTE_PRESSURE),
        "rho": worked_out("Density", kinds.DENSITY),
        "rho_ref": worked_out("Density at reference conditions", kinds.DENSITY),
        "m": worked_out("Mass of gas", kinds.MASS),
        "n": worked_out("Amount of gas", kinds.AMOUNT),
    },
    uses=(
        Use(GAUGE_PRESSURE, p_abs="p", p_gauge="pg", p_atm="p_atm"),
        Use(TOTAL_OF_EQUAL, X="V", N="count", x="V_each"),
        Use(REAL_DENSITY, rho="rho", p="p", T="T_gas", gas="gas"),
        Use(REAL_DENSITY, rho="rho_ref", p="p_ref", T="T_ref", gas="gas"),
        Use(GAS_CONTENT, m="m", rho="rho", V="V"),
        Use(GAS_CONTENT, m="m", rho="rho_ref", V="V_ref"),
        Use(AMOUNT_IN_VESSEL, n="n", rho="rho", V="V", M="M"),
    ),
    finds=(
        Find(
            row="V_ref",
            ask="content",
            label="Content at reference conditions",
            safe="low",
            unit="m³",
            limit="V_ordered",
            limit_text="ordered",
        ),
        Find(row="pg", ask="pressure for a content", label="Pressure that holds the content", safe="high", unit="bar"),
        Find(row="V_each", ask="water capacity, each", label="Water capacity needed, each", safe="high", unit="L"),
        Find(row="count", ask="cylinders", label="Cylinders needed", safe="high", unit="1"),
    ),
    cautions=(RECEIPT, DEFER),
    rule="Signed is the safe end: result less U for a content, result plus U for what is needed to hold it.",
    example={
        "gas": "nitrogen",
        "count": "4",
        "V_each": "50 L",
        "pg": "198 bar gauge",
        "T_gas": "12.0 °C",
        "p_atm": "996.4 hPa",
        "T_ref": "15 °C",
        "p_ref": "101.325 kPa absolute",
        "V_ordered": "36.0 m³",
    },
    notes=("capacity_each", "fresh_filling", "gauge_low_on_scale"),
    words=("delivery", "receipt", "full cylinder", "pack", "how much gas"),
)
