"""What the reference tables are made of: pairs in use, gauge classes, the standard atmosphere, sizes of molecules.

Takes spec.model and spec.sources; gives plain frozen values with their sources, readings as typed.
Next: generator.table_views works the tables out with the engine; no figure of a table stands here.
"""

from dataclasses import dataclass

from spec.model import Citation, Source
from spec.sources import (
    CFR_60,
    COMMON_PRACTICE,
    DIN_1343,
    EN_837_1,
    FROM_MEMORY,
    ISO_13443,
    OSHA_1000,
    US_ATMOSPHERE_1976,
)

GOLD_BOOK = Source(
    key="gold_book", work="IUPAC, Compendium of Chemical Terminology (the Gold Book), 2nd edition", note=FROM_MEMORY
)
ISO_8778 = Source(
    key="iso8778", work="ISO 8778:2003, Pneumatic fluid power, Standard reference atmosphere", note=FROM_MEMORY
)
CRC_HANDBOOK = Source(
    key="crc_handbook", work="CRC Handbook of Chemistry and Physics, 95th edition, section 6", note=FROM_MEMORY
)


@dataclass(frozen=True, slots=True, kw_only=True)
class ReferenceConditions:
    """A pair in use: temperature and absolute pressure as typed, who counts at it, and the source."""

    temperature: str
    pressure: str
    used: str
    source: Citation

    @property
    def pair(self) -> str:
        """Give the pair as it stands behind a volume, such as ``0 °C, 101.325 kPa``."""
        return f"{self.temperature}, {self.pressure}"


PAIRS = (
    ReferenceConditions(
        temperature="0 °C",
        pressure="101.325 kPa",
        used="normal conditions of the metric trades, Nm³",
        source=DIN_1343.at("normal state"),
    ),
    ReferenceConditions(
        temperature="15 °C",
        pressure="101.325 kPa",
        used="standard reference conditions of natural gas, Sm³",
        source=ISO_13443.at("clause 3, standard reference conditions"),
    ),
    ReferenceConditions(
        temperature="20 °C",
        pressure="101.325 kPa",
        used="emission tests of the United States (68 °F)",
        source=CFR_60.at(f"section 60.2, standard conditions, {FROM_MEMORY}"),
    ),
    ReferenceConditions(
        temperature="25 °C",
        pressure="101.325 kPa",
        used="limits of air at the workplace (760 mmHg)",
        source=OSHA_1000.at(f"table Z-1, footnote on parts per million, {FROM_MEMORY}"),
    ),
    ReferenceConditions(
        temperature="60 °F",
        pressure="101.325 kPa",
        used="standard cubic feet of the American gas trade; some contracts count at 14.73 psi",
        source=COMMON_PRACTICE.at("pair differs between contracts"),
    ),
    ReferenceConditions(
        temperature="0 °C",
        pressure="100 kPa",
        used="standard temperature and pressure of chemistry since 1982",
        source=GOLD_BOOK.at("standard conditions for gases"),
    ),
    ReferenceConditions(
        temperature="15 °C",
        pressure="100 kPa",
        used="contents of gas cylinders as suppliers in Europe state them",
        source=COMMON_PRACTICE.at("differs between suppliers"),
    ),
    ReferenceConditions(
        temperature="20 °C",
        pressure="100 kPa",
        used="compressed air tools and valves, ANR (at 65 % relative humidity)",
        source=ISO_8778.at("standard reference atmosphere"),
    ),
)

GAUGE_CLASSES = ("0.1", "0.25", "0.6", "1", "1.6", "2.5", "4")
GAUGE_SPANS = ("0.6", "1", "1.6", "2.5", "4", "6", "10", "16", "25", "40", "60", "100", "160", "250", "400", "600")
GAUGE_SOURCE = EN_837_1.at("accuracy classes and scale ranges")

ATMOSPHERE = {
    "p_b": "1013.25 hPa absolute",
    "L_b": "-6.5 K/km",
    "H_b": "0 m",
    "T_b": "15 °C",
    "g": "9.80665 m/s²",
    "M": "28.9644 g/mol",
}
ATMOSPHERE_SOURCE = US_ATMOSPHERE_1976.at("table 4 and equation 33a, lowest layer")

DIAMETERS = {
    "air": "0.366 nm",
    "ammonia": "0.432 nm",
    "argon": "0.358 nm",
    "carbon_dioxide": "0.453 nm",
    "helium": "0.215 nm",
    "hydrogen": "0.271 nm",
    "krypton": "0.408 nm",
    "neon": "0.254 nm",
    "nitrogen": "0.370 nm",
    "oxygen": "0.355 nm",
    "xenon": "0.478 nm",
}
DIAMETER_SOURCE = CRC_HANDBOOK.at("mean free path and related properties of gases")
