"""The works that the spec cites.

Takes spec.model; gives one frozen Source per work. A work is named once, here; a place in it is cited with ``.at``.
"""

from spec.model import Source

FROM_MEMORY = "from memory"

SI_BROCHURE = Source(key="si_brochure", work="BIPM, The International System of Units (SI Brochure), 9th edition 2019")
SP811 = Source(
    key="sp811",
    work="NIST Special Publication 811, Guide for the Use of the SI, 2008 edition",
    note=FROM_MEMORY,
)
CODATA = Source(key="codata", work="CODATA recommended values of the fundamental physical constants: 2022")
ISO_80000_4 = Source(key="iso80000_4", work="ISO 80000-4:2019, Quantities and units, Mechanics", note=FROM_MEMORY)
ISO_80000_5 = Source(key="iso80000_5", work="ISO 80000-5:2019, Quantities and units, Thermodynamics", note=FROM_MEMORY)
ISO_13443 = Source(key="iso13443", work="ISO 13443:1996, Natural gas, Standard reference conditions", note=FROM_MEMORY)
ISO_6976 = Source(key="iso6976", work="ISO 6976:2016, Natural gas, Calculation from composition", note=FROM_MEMORY)
DIN_1343 = Source(key="din1343", work="DIN 1343:1990, Reference state, normal state, normal volume", note=FROM_MEMORY)
EN_837_1 = Source(key="en837_1", work="EN 837-1:1996, Pressure gauges, Bourdon tube gauges", note=FROM_MEMORY)
JCGM_100 = Source(key="jcgm100", work="JCGM 100:2008, Guide to the expression of uncertainty in measurement")
OPENSTAX_CHEMISTRY = Source(key="openstax_chemistry", work="OpenStax, Chemistry 2e, 2019 (CC BY 4.0)")
OPENSTAX_PHYSICS_1 = Source(key="openstax_physics_1", work="OpenStax, University Physics volume 1, 2016 (CC BY 4.0)")
OPENSTAX_PHYSICS_2 = Source(key="openstax_physics_2", work="OpenStax, University Physics volume 2, 2016 (CC BY 4.0)")
ATKINS = Source(
    key="atkins", work="Atkins and de Paula, Physical Chemistry, 10th edition, Oxford 2014", note=FROM_MEMORY
)
BOYLE_1662 = Source(
    key="boyle", work="Boyle, A Defence of the Doctrine Touching the Spring and Weight of the Air, London 1662"
)
GAY_LUSSAC_1802 = Source(
    key="gay_lussac", work="Gay-Lussac, Recherches sur la dilatation des gaz et des vapeurs, Ann. Chim. 43 (1802) 137"
)
AVOGADRO_1811 = Source(
    key="avogadro", work="Avogadro, Essai d'une manière de déterminer les masses relatives, J. Phys. 73 (1811) 58"
)
GRAHAM_1848 = Source(
    key="graham",
    work="Graham, On the motion of gases, Phil. Trans. R. Soc. 136 (1846) 573 and 139 (1849) 349",
    note=FROM_MEMORY,
)
MAXWELL_1860 = Source(
    key="maxwell",
    work="Maxwell, Illustrations of the dynamical theory of gases, Phil. Mag. 19 (1860) 19",
    note=FROM_MEMORY,
)
VAN_DER_WAALS_1873 = Source(
    key="van_der_waals",
    work="van der Waals, Over de continuiteit van den gas- en vloeistoftoestand, Leiden 1873",
    note=FROM_MEMORY,
)
SUTHERLAND_1893 = Source(
    key="sutherland",
    work="Sutherland, The viscosity of gases and molecular force, Phil. Mag. 36 (1893) 507",
    note=FROM_MEMORY,
)
CFR_1065 = Source(key="cfr1065", work="Code of Federal Regulations, title 40, part 1065, Engine-testing procedures")
CFR_1066 = Source(key="cfr1066", work="Code of Federal Regulations, title 40, part 1066, Vehicle-testing procedures")
DEFINITION = Source(key="definition", work="Definition of the quantity")
CONSERVATION = Source(key="conservation", work="Conservation of amount of substance")
COMMON_PRACTICE = Source(key="common_practice", work="Common practice, no source")
REFERENCE_EQUATION = Source(
    key="reference_equation", work="Reference equation of state of the gas, cited on the page of the gas"
)
UCUM = Source(key="ucum", work="The Unified Code for Units of Measure, version 2.1")
FOOT_1959 = Source(
    key="foot1959", work="International yard and pound agreement, Federal Register 24 FR 5348 (1959)", note=FROM_MEMORY
)
