"""The gases of the product, one frozen value each; those that burn are in `spec/gases_fuel.py`.

Takes the shape of a gas; gives names, numbers, hazards, equations and their stated uncertainty.
The emitter of gas equations comes next.

UN numbers: United Nations Model Regulations, dangerous goods list; CAS numbers: CAS registry (both from memory).
Hazard words are a reminder only; the supplier's safety data sheet and local rules decide.
Where a paper states an uncertainty without a factor, it is taken as expanded (k = 2), as its authors use the word.
A band that says "allowance" is this product's own, wider than any figure of the paper, for states where it gives none.
"""

from spec.gas_model import Band, Gas
from spec.gas_words import BEYOND, INERT, LEMMON_SPAN, LEMMON_SPAN_DOI, MPA, OXIDISER, UNSEEN
from spec.gases_fuel import (
    AMMONIA,
    CARBON_MONOXIDE,
    ETHANE,
    ETHYLENE,
    HYDROGEN,
    HYDROGEN_SULFIDE,
    ISOBUTANE,
    METHANE,
    N_BUTANE,
    PROPANE,
)

NITROGEN = Gas(
    key="nitrogen",
    title="Nitrogen",
    formula="N2",
    spellings=("dinitrogen", "gan", "compressed nitrogen", "nitrogen compressed", "r-728"),
    fluid="Nitrogen",
    cas="7727-37-9",
    un=("1066", "1977"),
    hazards=INERT,
    citation="Span, Lemmon, Jacobsen, Wagner and Yokozeki, J. Phys. Chem. Ref. Data 29 (2000) 1361",
    doi="10.1063/1.1349047",
    bands=(
        Band(T_to=270.0, p_to=30 * MPA, relative=2e-4, says="0.02 % below 30 MPa (abstract)"),
        Band(T_to=350.0, p_to=12 * MPA, relative=1e-4, says="0.01 % from 270 to 350 K below 12 MPa (abstract)"),
        Band(T_to=1000.0, p_to=30 * MPA, relative=2e-4, says="0.02 % below 30 MPa (abstract)"),
        Band(relative=6e-3, says="up to 0.6 % at very high pressures (abstract); an allowance above 1000 K"),
    ),
)

OXYGEN = Gas(
    key="oxygen",
    title="Oxygen",
    formula="O2",
    spellings=("dioxygen", "gox", "compressed oxygen", "oxygen compressed", "medical oxygen"),
    fluid="Oxygen",
    cas="7782-44-7",
    un=("1072", "1073"),
    hazards=OXIDISER,
    citation=(
        "Schmidt and Wagner, Fluid Phase Equilib. 19 (1985) 175; "
        "Stewart, Jacobsen and Wagner, J. Phys. Chem. Ref. Data 20 (1991) 917"
    ),
    doi="10.1016/0378-3812(85)87016-3",
    bands=(
        Band(T_to=300.0, relative=1e-3, says="0.1 % outside the critical region (abstract of Stewart et al.)"),
        Band(relative=2e-3, says="allowance above 300 K, where the papers give no figure"),
    ),
)

ARGON = Gas(
    key="argon",
    title="Argon",
    formula="Ar",
    spellings=("compressed argon", "argon compressed", "r-740"),
    fluid="Argon",
    cas="7440-37-1",
    un=("1006", "1951"),
    hazards=INERT,
    citation="Tegeler, Span and Wagner, J. Phys. Chem. Ref. Data 28 (1999) 779",
    doi="10.1063/1.556037",
    bands=(
        Band(
            T_to=340.0,
            p_to=12 * MPA,
            relative=2e-4,
            says="0.02 % up to 12 MPa and 340 K outside the critical region (abstract)",
        ),
        Band(T_to=235.0, relative=2e-3, says="generally within 0.2 % (NIST Chemistry WebBook)"),
        Band(T_to=520.0, p_to=30 * MPA, relative=3e-4, says="0.03 % up to 30 MPa from 235 to 520 K (abstract)"),
        Band(relative=2e-3, says="generally within 0.2 % (NIST Chemistry WebBook); an allowance above 700 K"),
    ),
)

HELIUM = Gas(
    key="helium",
    title="Helium",
    formula="He",
    spellings=("helium-4", "compressed helium", "helium compressed", "balloon gas", "r-704"),
    fluid="Helium",
    cas="7440-59-7",
    un=("1046", "1963"),
    hazards=INERT,
    citation="Ortiz Vega, Hall, Holste, Harvey and Lemmon, NIST Interagency Report 8474 (2023)",
    doi="10.6028/NIST.IR.8474",
    bands=(
        Band(T_to=50.0, relative=1e-2, says="allowance: the report's figures were not at hand"),
        Band(
            p_to=100 * MPA,
            relative=1e-3,
            says="about 0.1 % from 50 K up to 100 MPa (from memory; the report's text was not at hand)",
        ),
        Band(relative=1e-2, says="allowance: the report's figures were not at hand"),
    ),
)

CARBON_DIOXIDE = Gas(
    key="carbon_dioxide",
    title="Carbon dioxide",
    formula="CO2",
    spellings=("carbonic acid gas", "r-744"),
    fluid="CarbonDioxide",
    cas="124-38-9",
    un=("1013", "2187"),
    hazards=("harms well before oxygen runs short", "suffocates", "gas under pressure", "collects low down"),
    citation="Span and Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509",
    doi="10.1063/1.555991",
    bands=(
        Band(T_to=523.0, p_to=30 * MPA, relative=5e-4, says="0.03 to 0.05 % up to 30 MPa and 523 K (abstract)"),
        Band(
            T_to=450.0,
            p_to=160 * MPA,
            relative=1.5e-3,
            says="within 0.1 % of later data (Mantilla et al., J. Chem. Eng. Data 55 (2010) 4611)",
        ),
        Band(relative=2e-2, says=BEYOND),
    ),
)

AIR = Gas(
    key="air",
    title="Air",
    formula="air",
    spellings=("dry air", "compressed air", "air compressed", "synthetic air", "breathing air"),
    fluid="Air",
    cas="132259-10-0",
    un=("1002", "1003"),
    hazards=("gas under pressure", "feeds fire when compressed"),
    citation="Lemmon, Jacobsen, Penoncello and Friend, J. Phys. Chem. Ref. Data 29 (2000) 331",
    doi="10.1063/1.1285884",
    bubble_note="dry air as one pseudo-pure fluid; it condenses between its stated dew and bubble lines",
    bands=(
        Band(T_to=873.0, p_to=70 * MPA, relative=1e-3, says="0.1 % up to 873 K and 70 MPa (abstract)"),
        Band(relative=1e-2, says="0.5 to 1 % beyond 873 K or 70 MPa (Panasiti et al., Int. J. Thermophys. 20 (1999))"),
    ),
)

NITROUS_OXIDE = Gas(
    key="nitrous_oxide",
    title="Nitrous oxide",
    formula="N2O",
    spellings=("laughing gas", "dinitrogen oxide", "r-744a"),
    fluid="NitrousOxide",
    cas="10024-97-2",
    un=("1070", "2201"),
    hazards=(
        "feeds fire: keep oil and grease away",
        "can decompose violently when hot",
        "makes drowsy",
        "gas under pressure",
    ),
    citation=LEMMON_SPAN,
    doi=LEMMON_SPAN_DOI,
    bands=(
        Band(p_to=50 * MPA, relative=2.5e-3, says=UNSEEN),
        Band(relative=1e-2, says=BEYOND),
    ),
)

NEON = Gas(
    key="neon",
    title="Neon",
    formula="Ne",
    spellings=("compressed neon", "neon compressed", "r-720"),
    fluid="Neon",
    cas="7440-01-9",
    un=("1065", "1913"),
    hazards=INERT,
    citation="Thol, Beckmüller, Weiss, Harvey, Lemmon, Jacobsen and Span, unpublished (authors from memory)",
    doi="",
    bands=(Band(relative=1e-2, says="allowance: the equation is unpublished"),),
)

KRYPTON = Gas(
    key="krypton",
    title="Krypton",
    formula="Kr",
    spellings=("compressed krypton", "krypton compressed"),
    fluid="Krypton",
    cas="7439-90-9",
    un=("1056", "1970"),
    hazards=INERT,
    citation=LEMMON_SPAN,
    doi=LEMMON_SPAN_DOI,
    bands=(Band(relative=2e-3, says=UNSEEN),),
)

XENON = Gas(
    key="xenon",
    title="Xenon",
    formula="Xe",
    spellings=("compressed xenon", "xenon compressed"),
    fluid="Xenon",
    cas="7440-63-3",
    un=("2036", "2591"),
    hazards=("makes drowsy", "suffocates without warning", "gas under pressure"),
    citation=LEMMON_SPAN,
    doi=LEMMON_SPAN_DOI,
    bands=(
        Band(p_to=100 * MPA, relative=2e-3, says=UNSEEN),
        Band(relative=1e-2, says=UNSEEN),
    ),
)

SULFUR_HEXAFLUORIDE = Gas(
    key="sulfur_hexafluoride",
    title="Sulfur hexafluoride",
    formula="SF6",
    spellings=("sulphur hexafluoride",),
    fluid="SulfurHexafluoride",
    cas="2551-62-4",
    un=("1080",),
    hazards=(
        "suffocates without warning",
        "collects low down",
        "strong greenhouse gas: recover it",
        "gas under pressure",
    ),
    citation="Guder and Wagner, J. Phys. Chem. Ref. Data 38 (2009) 33",
    doi="10.1063/1.3037344",
    bands=(
        Band(T_to=340.0, p_to=12 * MPA, relative=5e-4, says=UNSEEN),
        Band(relative=5e-3, says=UNSEEN),
    ),
)

ALL = (
    NITROGEN,
    OXYGEN,
    ARGON,
    HELIUM,
    HYDROGEN,
    METHANE,
    CARBON_DIOXIDE,
    AIR,
    NITROUS_OXIDE,
    CARBON_MONOXIDE,
    NEON,
    KRYPTON,
    XENON,
    SULFUR_HEXAFLUORIDE,
    ETHYLENE,
    ETHANE,
    PROPANE,
    N_BUTANE,
    ISOBUTANE,
    AMMONIA,
    HYDROGEN_SULFIDE,
)
