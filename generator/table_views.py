"""Pages of the reference tables, worked out by the engine that ships.

Takes the routed spec and the staged engine; gives a TablePageView each, in the order of the contents page.
Next: generator.make_views.
"""

from generator.check import constants_of
from generator.convert_views import convert_view
from generator.flow_tables import atmosphere_page, gauge_page, molecules_page
from generator.gas_tables import conditions_page, saturation_page
from generator.route import Routed
from generator.unit_views import asked_table, offered_table, paired_table, sources_table, unit_tables
from generator.views import TablePageView, TableView


def table_pages(routed: Routed) -> tuple[TablePageView, ...]:
    """Give every page of tables."""
    loaded = routed.checked.loaded
    return (
        TablePageView(
            key="units",
            title="Units",
            lead="A reading in every unit of its kind, and each unit with its exact factor to SI, "
            "the ways crews write it, its code in files and its source.",
            tables=(
                *unit_tables(loaded.units),
                offered_table(loaded.kinds),
                paired_table(),
                asked_table(),
                sources_table(loaded.units),
            ),
            words=("convert", "converter", "conversion", "UCUM", "spellings"),
            convert=convert_view(),
        ),
        conditions_page(),
        saturation_page(),
        atmosphere_page(),
        gauge_page(),
        molecules_page(),
        _constants_page(routed),
    )


def _constants_page(routed: Routed) -> TablePageView:
    found = {
        constant.title: (
            constant.title,
            str(symbol),
            f"{float(constant.value):.15g}",
            constant.unit,
            str(constant.source),
        )
        for relation in routed.checked.loaded.relations()
        for symbol, constant in constants_of(relation).items()
    }
    table = TableView(
        caption="Constants",
        head=("Constant", "Symbol", "Value", "Unit", "Source"),
        rows=tuple(found[title] for title in sorted(found)),
    )
    return TablePageView(
        key="constants",
        title="Constants",
        lead="Every constant that stands in a law of this copy, as its source states it.",
        tables=(table,),
        words=("gas constant", "Boltzmann", "coefficients"),
    )
