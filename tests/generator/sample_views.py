"""Views written by hand for the tests of the pages: every field used, awkward characters included.

Takes nothing; gives one ``SiteView``. The figures in it are invented and prove nothing about gases.
"""

from typing import Any

from generator.views import (
    CheckView,
    ConvertView,
    FamilyView,
    FindView,
    FormView,
    GasView,
    RelationView,
    RowView,
    SheetView,
    SiteView,
    TablePageView,
    TableView,
    UnitGroup,
)

MATH = '<math display="block"><msub><mi>p</mi><mn>1</mn></msub><mo>=</mo><mi>F</mi></math>'
SYMBOL = '<math display="inline"><msub><mi>p</mi><mn>1</mn></msub></math>'
PRESSURES = ("bar", "kPa", "psi", "Pa")
COUNTS = ("gauge", "absolute", "vacuum")


def make_answer(**changed: Any) -> dict[str, Any]:
    """An answer as the engine gives it, with every optional part."""
    answer: dict[str, Any] = {
        "id": 0,
        "state": "answer",
        "rows": {"t": {"state": "find", "says": ""}},
        "figure": {
            "label": "Time to changeover, safe end, rounded down",
            "text": "18 h 55 min",
            "unit": "",
            "row": "19.9",
        },
        "best": "Best estimate 19.9 h ± 1.0 h (k = 2).",
        "value": 71640.0,
        "unit": "s",
        "expanded": 3600.0,
        "verdict": {"word": "PASS", "says": "needed for 12 h 00 min; safe end is 18 h 55 min."},
        "versus": [["Real nitrogen", "19.9 h"], ["Ideal law", "21.0 h, 5.4 % too long"]],
        "shares": [{"label": "Demand, FM-2", "percent": 49}, {"label": "Changeover pressure, G-17", "percent": 51}],
        "working": [
            {
                "text": "p_1 = 200 bar gauge + 0.9964 bar = 200.9964 bar",
                "relation": "force_pressure",
                "title": "Force <&> area",
            },
            {
                "text": "m = 4 × 50 L × (221.78 − 12.78) kg/m³ = 41.8 kg",
                "relation": "gas_content",
                "title": "Content",
            },
        ],
        "cautions": ["Nitrogen suffocates without warning.", "Time is a plan; the gauge is the trigger."],
        "warnings": ["Changeover pressure is below a tenth of G-17’s span."],
        "refusal": None,
        "extra": [["Change over by", "02:25"]],
    }
    return answer | changed


def make_sheet() -> SheetView:
    """A sheet with every sort of row."""
    rows = (
        RowView(
            name="gas",
            title="Gas",
            note="from the label",
            is_gas=True,
            text="nitrogen",
            choices=(("nitrogen", "Nitrogen"), ("helium", "Helium <He>")),
        ),
        RowView(name="count", title="Cylinders", units=("1",), text="4", accuracy="exact"),
        RowView(
            name="V",
            title="Water capacity, each",
            units=("L", "m³"),
            text="50",
            unit="L",
            accuracy="stamped ± 1 %",
            measures="volume",
        ),
        RowView(
            name="pg_start",
            title="Pressure now",
            mathml=SYMBOL,
            units=PRESSURES,
            references=COUNTS,
            text="200",
            unit="bar",
            reference="gauge",
            measures="pressure",
        ),
        RowView(
            name="pg_end",
            title="Changeover pressure",
            mathml=SYMBOL,
            units=PRESSURES,
            references=COUNTS,
            text="10",
            unit="bar",
            reference="gauge",
            measures="pressure",
        ),
        RowView(
            name="T_gas",
            title="Gas temperature",
            symbol="T",
            units=("°C", "K"),
            text="17.5",
            unit="°C",
            site="air_temperature",
            measures="temperature",
            may_be_negative=True,
        ),
        RowView(
            name="p_atm",
            title="Station pressure",
            units=("hPa", "mbar"),
            text="996.4",
            unit="hPa",
            references=("absolute",),
            site="station_pressure",
            measures="pressure",
        ),
        RowView(
            name="q",
            title="Demand",
            units=("L/min", "m³/h"),
            text="30",
            unit="L/min",
            measures="flow",
            note="at 20 °C, 101.325 kPa",
        ),
        RowView(name="t", title="Time to changeover", units=("min", "h", "s"), unit="h", is_found=True),
    )
    finds = (
        FindView(row="t", ask="time to changeover", label="Time to changeover", unit="h", units=("min", "h", "s", "d")),
        FindView(row="count", ask="cylinders needed", label="Cylinders", unit="1", units=("1",)),
        FindView(row="pg_start", ask="pressure needed now", label="Pressure", unit="bar", units=PRESSURES),
    )
    return SheetView(
        key="bank_endurance",
        title="Time to changeover",
        lead="How long a bank lasts before it must be changed over.",
        group="Supply and flow",
        finds=finds,
        rows=rows,
        cautions=("Nitrogen suffocates without warning.",),
        rule="signed is the estimate minus its uncertainty, rounded down",
        answer=make_answer(),
        request={"find": "t", "readings": {row.name: {"text": row.text} for row in rows if row.text}},
        uses=(("force_pressure", "Force & area"), ("gas_content", "Content")),
        words=("bank", "autonomy"),
    )


def make_law(key: str, title: str) -> RelationView:
    """A law page with every part."""
    rows = (
        RowView(
            name="p",
            title="Pressure",
            mathml=SYMBOL,
            units=PRESSURES,
            references=COUNTS,
            unit="bar",
            reference="absolute",
            is_found=True,
            measures="pressure",
        ),
        RowView(name="F", title="Force", symbol="F", units=("N", "kN"), text="250", unit="N", may_be_negative=True),
    )
    forms = tuple(
        FormView(
            unknown=name,
            symbol=name,
            mathml=MATH,
            text=f"{name} = …",
            way="closed form",
            unit_note="Pa.",
            argument_notes=("F in newton",),
        )
        for name in ("p", "F")
    )
    check = CheckView(
        given="F = 250 N <tag>", published="2.5 bar", here="2.500 bar", source="A work, table 1", basis="published"
    )
    return RelationView(
        key=key,
        title=title,
        family_key="pressure",
        family="Pressure & columns",
        mathml=MATH,
        text="p = F/A",
        assumes=("uniform pressure on the area",),
        validity=("Area at right angles to the force.",),
        source="Mechanics, any edition",
        rows=rows,
        constants=(("R", "8.314 J/(mol K)", "SI Brochure"),),
        find="p",
        finds=("p", "F"),
        forms=forms,
        checks=(check,),
        answer=make_answer(),
        nature="law",
        used_by=(("bank_endurance", "Time to changeover"),),
        words=("area",),
        cautions=("Stand clear.",),
    )


def make_gas() -> GasView:
    """A gas page with one table."""
    table = TableView(
        caption="Density of nitrogen", head=("p", "15 °C"), rows=(("1 bar", "1.17 kg/m³"),), note="Real gas."
    )
    return GasView(
        key="nitrogen",
        title="Nitrogen",
        formula="N₂",
        identity=(("UN number", "1066"),),
        hazards=("Suffocates without warning.",),
        equation="Span et al. 2000",
        uncertainty=("Density 0.02 %.",),
        limits=(("Highest pressure", "2200 MPa"),),
        tables=(table,),
        words=("N2",),
    )


def make_table_page() -> TablePageView:
    """A page of tables with a converter."""
    reading = RowView(
        name="reading",
        title="Reading",
        text="12.4",
        unit="bar",
        reference="gauge",
        references=COUNTS,
        groups=(UnitGroup(kind="absolute_pressure", title="Pressure", units=PRESSURES, is_counted=True),),
    )
    station = RowView(name="p_station", title="Station pressure", units=("hPa",), text="996.4", is_optional=True)
    answer = {
        "label": "12.4 bar gauge is",
        "head": ["Unit", "gauge"],
        "lines": [["bar", "12.4"]],
        "says": "",
        "warnings": ["A <warning>."],
    }
    return TablePageView(
        key="units",
        title="Units & factors",
        lead="Every unit <once>.",
        tables=make_gas().tables * 3,
        words=("convert",),
        laws=("boyle", "not_in_this_copy"),
        convert=ConvertView(reading=reading, station=station, answer=answer),
    )


def make_site() -> SiteView:
    """A whole small site."""
    laws = (make_law("force_pressure", "Pressure: force & area"), make_law("boyle", "Boyle’s law"))
    family = FamilyView(key="pressure", letter="A", title="Pressure & columns", lead="Forces on areas.", relations=laws)
    return SiteView(
        families=(family,),
        sheets=(make_sheet(),),
        gases=(make_gas(),),
        tables=(make_table_page(),),
        scenario="Hollin Tarn works is invented.",
        version="0.1.0",
        digest="0123456789abcdef0123456789abcdef",
    )
