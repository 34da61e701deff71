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
JCGM_106 = Source(
    key="jcgm106", work="JCGM 106:2012, The role of measurement uncertainty in conformity assessment", note=FROM_MEMORY
)
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
PENG_ROBINSON_1976 = Source(
    key="peng_robinson", work="Peng, Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59", note=FROM_MEMORY
)
DYMOND_SMITH = Source(
    key="dymond", work="Dymond, Smith, The virial coefficients of pure gases and mixtures, 1980", note=FROM_MEMORY
)
SUTHERLAND_1893 = Source(
    key="sutherland",
    work="Sutherland, The viscosity of gases and molecular force, Phil. Mag. 36 (1893) 507",
    note=FROM_MEMORY,
)
CFR_1065 = Source(key="cfr1065", work="Code of Federal Regulations, title 40, part 1065, Engine-testing procedures")
CFR_1066 = Source(key="cfr1066", work="Code of Federal Regulations, title 40, part 1066, Vehicle-testing procedures")
CFR_60 = Source(
    key="cfr60", work="Code of Federal Regulations, title 40, part 60, Standards of performance, appendix A methods"
)
EPA_METHOD_4 = Source(key="epa4", work="40 CFR 60 appendix A-3, Method 4, Moisture content in stack gases")
EPA_METHOD_5 = Source(key="epa5", work="40 CFR 60 appendix A-3, Method 5, Particulate matter from stationary sources")
EPA_METHOD_2 = Source(key="epa2", work="40 CFR 60 appendix A-1, Method 2, Stack gas velocity and volumetric flow rate")
EPA_METHOD_19 = Source(key="epa19", work="40 CFR 60 appendix A-7, Method 19", note=FROM_MEMORY)
EPA_METHOD_3 = Source(
    key="epa3", work="40 CFR 60 appendix A-2, Method 3, Gas analysis for dry molecular weight", note=FROM_MEMORY
)
AMAGAT_1880 = Source(key="amagat", work="Amagat, Ann. Chim. Phys. 19 (1880) 384", note=FROM_MEMORY)
ISO_14912 = Source(
    key="iso14912", work="ISO 14912:2003, Gas analysis, Conversion of gas mixture composition data", note=FROM_MEMORY
)
ISO_6142_1 = Source(
    key="iso6142",
    work="ISO 6142-1:2015, Gas analysis, Preparation of calibration gas mixtures, gravimetric method",
    note=FROM_MEMORY,
)
DALTON_1801 = Source(
    key="dalton",
    work="Dalton, Experimental essays on the constitution of mixed gases, Mem. Manchester Lit. Phil. Soc. 5 (1802) 535",
    note=FROM_MEMORY,
)
ISO_6145 = Source(
    key="iso6145", work="ISO 6145-1:2019, Calibration gas mixtures, Dynamic methods, General", note=FROM_MEMORY
)
WMO_8 = Source(key="wmo8", work="WMO-No. 8, Guide to Instruments and Methods of Observation, 2018 edition, volume I")
IAPWS_SR1 = Source(
    key="iapws_sr1",
    work="IAPWS SR1-86(1992), Saturation properties of ordinary water substance",
    note="coefficients from memory, shown by the published values in the cases",
)
IAPWS_R14 = Source(
    key="iapws_r14",
    work="IAPWS R14-08(2011), Melting pressure and sublimation pressure of ordinary water substance",
    note="coefficients from memory, shown by the published values in the cases",
)
CIPM_2007 = Source(
    key="cipm2007",
    work="Picard et al., Revised formula for the density of moist air (CIPM-2007), Metrologia 45 (2008) 149",
    note=FROM_MEMORY,
)
GREENSPAN_1976 = Source(
    key="greenspan",
    work="Greenspan, Functional equations for the enhancement factors for CO2-free moist air, "
    "J. Res. NBS 80A (1976) 41",
    note=FROM_MEMORY,
)
NACA_1135 = Source(
    key="naca1135", work="NACA Report 1135, Equations, tables and charts for compressible flow, 1953", note=FROM_MEMORY
)
ISO_5167_2 = Source(
    key="iso5167",
    work="ISO 5167-2:2003, Measurement of fluid flow by pressure differential devices, orifice plates",
    note=FROM_MEMORY,
)
ISO_9300 = Source(key="iso9300", work="ISO 9300:2005, Gas flow by critical flow Venturi nozzles", note=FROM_MEMORY)
COLEBROOK_1939 = Source(
    key="colebrook",
    work="Colebrook, Turbulent flow in pipes, J. Inst. Civ. Eng. 11 (1939) 133",
    note=FROM_MEMORY,
)
LEAK_HANDBOOK = Source(
    key="leak_handbook",
    work="ASNT, Nondestructive Testing Handbook volume 2, Leak Testing, 4th edition",
    note=FROM_MEMORY,
)
VACUUM_HANDBOOK = Source(
    key="vacuum_handbook",
    work="O’Hanlon, A User’s Guide to Vacuum Technology, 3rd edition, Wiley 2003",
    note=FROM_MEMORY,
)
KNUDSEN_1909 = Source(
    key="knudsen",
    work="Knudsen, Die Gesetze der Molekularströmung und der inneren Reibungsströmung der Gase durch Röhren, "
    "Ann. Phys. 28 (1909) 75",
    note=FROM_MEMORY,
)
EN_1779 = Source(
    key="en1779", work="EN 1779:1999, Leak testing, Criteria for method and technique selection", note=FROM_MEMORY
)
ANSI_N14_5 = Source(key="ansi_n14_5", work="ANSI N14.5-2014, Leakage tests on packages for shipment", note=FROM_MEMORY)
ISO_11929 = Source(
    key="iso11929",
    work="ISO 11929-1:2019, Characteristic limits: decision threshold, detection limit",
    note=FROM_MEMORY,
)
CROWL_LOUVAR = Source(
    key="crowl_louvar",
    work="Crowl and Louvar, Chemical Process Safety, 3rd edition, Prentice Hall 2011",
    note=FROM_MEMORY,
)
POISSON_1823 = Source(
    key="poisson", work="Poisson, Sur la vitesse du son, Ann. Chim. Phys. 23 (1823) 5", note=FROM_MEMORY
)
ASME_PCC_2 = Source(
    key="asme_pcc2",
    work="ASME PCC-2, Repair of pressure equipment and piping, article on pressure and tightness testing",
    note=FROM_MEMORY,
)
BRODE_1959 = Source(
    key="brode", work="Brode, Blast wave from a spherical charge, Phys. Fluids 2 (1959) 217", note=FROM_MEMORY
)
US_ATMOSPHERE_1976 = Source(
    key="us_atmosphere",
    work="US Standard Atmosphere 1976, NOAA-S/T 76-1562",
    note="tables read in a handbook, equations from memory",
)
ICAO_ATMOSPHERE = Source(
    key="icao_atmosphere", work="ICAO Doc 7488, Manual of the ICAO Standard Atmosphere, 3rd edition", note=FROM_MEMORY
)
OIML_R_111 = Source(key="oiml_r111", work="OIML R 111-1:2004, Weights of classes E1 to M3", note=FROM_MEMORY)
GRS80 = Source(key="grs80", work="Moritz, Geodetic Reference System 1980, J. Geod. 74 (2000) 128", note=FROM_MEMORY)
JENNINGS_1988 = Source(
    key="jennings", work="Jennings, The mean free path in air, J. Aerosol Sci. 19 (1988) 159", note=FROM_MEMORY
)
ISO_15900 = Source(
    key="iso15900",
    work="ISO 15900:2020, Differential electrical mobility analysis for aerosol particles",
    note=FROM_MEMORY,
)
ADR_P200 = Source(
    key="adr", work="ADR, packing instruction P200, filling ratio; the local code decides", note=FROM_MEMORY
)
NIOSH_NMAM = Source(key="nmam", work="NIOSH Manual of Analytical Methods, 4th edition")
OSHA_1000 = Source(key="osha1000", work="Code of Federal Regulations, title 29, section 1910.1000, Air contaminants")
IEC_80079 = Source(
    key="iec80079",
    work="ISO/IEC 80079-20-1:2017, Material characteristics for gas and vapour classification",
    note=FROM_MEMORY,
)
ARCHIMEDES = Source(key="archimedes", work="Archimedes, On floating bodies", note=FROM_MEMORY)
ISO_3529 = Source(key="iso3529", work="ISO 3529-1:2019, Vacuum technology, Vocabulary, part 1", note=FROM_MEMORY)
POISEUILLE_1840 = Source(key="poiseuille", work="Poiseuille, C. R. Acad. Sci. 11 (1840) 961", note=FROM_MEMORY)
FLUID_MECHANICS = Source(key="fluid_mechanics", work="Fluid mechanics textbooks", note=FROM_MEMORY)
GAS_DYNAMICS = Source(key="gas_dynamics", work="Gas dynamics textbooks", note=FROM_MEMORY)
GEOMETRY = Source(key="geometry", work="Geometry")
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
