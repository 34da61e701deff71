"""The view of the converter on the page of units, with its worked example.

Takes spec.kinds and the staged engine; gives a ConvertView. generator.table_views puts it on its page.
"""

from gaswright.answer_convert import READING, STATION, answer_convert, units_of
from gaswright.tables import KINDS as SHIPPED

from generator.views import ConvertView, RowView, UnitGroup
from spec import kinds, scenario

CONVERTED = (
    kinds.ABSOLUTE_PRESSURE,
    kinds.ABSOLUTE_TEMPERATURE,
    kinds.TEMPERATURE_DIFFERENCE,
    kinds.LENGTH,
    kinds.AREA,
    kinds.VOLUME,
    kinds.FLOW,
    kinds.MASS,
    kinds.MASS_FLOW,
    kinds.AMOUNT,
    kinds.MOLAR_FLOW,
    kinds.DENSITY,
    kinds.FRACTION,
    kinds.LEAK_RATE,
    kinds.SPEED,
    kinds.TIME,
    kinds.FORCE,
    kinds.ENERGY,
    kinds.VISCOSITY,
    kinds.ANGLE,
)
SIGNS = ("absolute", "gauge", "vacuum", "difference")
EXAMPLE = {"text": "12.4", "unit": "bar", "reference": "gauge"}


def convert_view() -> ConvertView:
    """Give the converter's rows, and what the engine answers to the readings of its example."""
    station = scenario.STATION_PRESSURE.split(" ")
    rows = {READING: EXAMPLE, STATION: {"text": station[0], "unit": station[1], "reference": "absolute"}}
    request = {"do": "convert", "kind": kinds.ABSOLUTE_PRESSURE.key, "rows": rows}
    return ConvertView(
        reading=RowView(
            name=READING,
            title="Reading",
            text=EXAMPLE["text"],
            unit=EXAMPLE["unit"],
            reference=EXAMPLE["reference"],
            references=SIGNS,
            groups=_groups(),
            may_be_negative=True,
        ),
        station=RowView(
            name=STATION,
            title="Station pressure",
            text=station[0],
            unit=station[1],
            units=kinds.STATION_PRESSURE.units,
            references=("absolute",),
            is_optional=True,
            note="for readings in gauge or vacuum",
        ),
        answer=answer_convert(request),
    )


def _groups() -> tuple[UnitGroup, ...]:
    """Give the units to choose from by kind; a unit that two kinds share stands once, with the first."""
    taken: set[str] = set()
    groups = []
    for kind in CONVERTED:
        units = tuple(unit for unit in units_of(SHIPPED[kind.key]) if unit not in taken)
        taken.update(units)
        title = "Pressure" if kind == kinds.ABSOLUTE_PRESSURE else f"{kind.title[:1].upper()}{kind.title[1:]}"
        groups.append(UnitGroup(kind=kind.key, title=title, units=units, is_counted=bool(kind.reference)))
    return tuple(groups)
