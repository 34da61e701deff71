"""The gases of the product, one frozen value each.

Takes the shape of a gas; gives names, numbers, hazards, equations and their stated uncertainty.
The emitter of gas equations comes next.

UN numbers: United Nations Model Regulations, dangerous goods list; CAS numbers: CAS registry (both from memory).
Hazard words are a reminder only; the supplier's safety data sheet and local rules decide.
Where a paper states an uncertainty without a factor, it is taken as expanded (k = 2), as its authors use the word.
A band that says "allowance" is this product's own, wider than any figure of the paper, for states where it gives none.
"""

from spec.gas_model import Band, Gas

MPA = 1e6

BEYOND = "allowance: the paper gives no figure here"
UNSEEN = "from memory: the paper's text was not at hand"
LEMMON_SPAN = "Lemmon and Span, J. Chem. Eng. Data 51 (2006) 785"
LEMMON_SPAN_DOI = "10.1021/je050186n"

INERT = ("suffocates without warning", "gas under pressure")
OXIDISER = ("feeds fire: keep oil and grease away", "gas under pressure")
TOXIC = "poisonous: the smallest leak counts"
FLAMMABLE = ("extremely flammable", "gas under pressure", "suffocates")

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

HYDROGEN = Gas(
    key="hydrogen",
    title="Hydrogen",
    formula="H2",
    spellings=("normal hydrogen", "dihydrogen", "compressed hydrogen", "hydrogen compressed", "r-702"),
    fluid="Hydrogen",
    cas="1333-74-0",
    un=("1049", "1966"),
    hazards=FLAMMABLE,
    citation="Leachman, Jacobsen, Penoncello and Lemmon, J. Phys. Chem. Ref. Data 38 (2009) 721",
    doi="10.1063/1.3160306",
    bands=(
        Band(
            T_to=250.0,
            p_to=40 * MPA,
            relative=1e-3,
            says="0.1 % up to 250 K and 40 MPa outside the critical region (NIST Chemistry WebBook)",
        ),
        Band(T_to=250.0, p_to=300 * MPA, relative=1e-2, says=BEYOND),
        Band(
            T_to=450.0, p_to=300 * MPA, relative=4e-4, says="0.04 % from 250 to 450 K up to 300 MPa, k = 2 (abstract)"
        ),
        Band(p_to=300 * MPA, relative=1e-2, says="1 % from 450 to 1000 K (NIST Chemistry WebBook)"),
        Band(relative=8e-2, says="8 % from 300 to 2000 MPa (NIST Chemistry WebBook)"),
    ),
)

METHANE = Gas(
    key="methane",
    title="Methane",
    formula="CH4",
    spellings=("compressed methane", "methane compressed", "r-50"),
    fluid="Methane",
    cas="74-82-8",
    un=("1971", "1972"),
    hazards=FLAMMABLE,
    citation="Setzmann and Wagner, J. Phys. Chem. Ref. Data 20 (1991) 1061",
    doi="10.1063/1.555898",
    bands=(
        Band(T_to=350.0, p_to=12 * MPA, relative=3e-4, says="0.03 % below 12 MPa and 350 K (abstract)"),
        Band(relative=1.5e-3, says="0.03 to 0.15 % at higher pressures and temperatures (abstract)"),
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

CARBON_MONOXIDE = Gas(
    key="carbon_monoxide",
    title="Carbon monoxide",
    formula="CO",
    spellings=("carbonic oxide",),
    fluid="CarbonMonoxide",
    cas="630-08-0",
    un=("1016",),
    hazards=(TOXIC, "extremely flammable", "no smell", "gas under pressure"),
    citation=LEMMON_SPAN,
    doi=LEMMON_SPAN_DOI,
    bands=(Band(relative=3e-3, says=UNSEEN),),
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
    citation="Thol, Beckmüller, Weiss, Harvey, Lemmon, Jacobsen and Span, equation for neon, unpublished (authors from memory)",
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

ETHYLENE = Gas(
    key="ethylene",
    title="Ethylene",
    formula="C2H4",
    spellings=("ethene", "r-1150"),
    fluid="Ethylene",
    cas="74-85-1",
    un=("1962", "1038"),
    hazards=FLAMMABLE,
    citation="Smukala, Span and Wagner, J. Phys. Chem. Ref. Data 29 (2000) 1053",
    doi="10.1063/1.1329318",
    bands=(
        Band(p_to=30 * MPA, relative=5e-4, says=UNSEEN),
        Band(relative=5e-3, says=UNSEEN),
    ),
)

ETHANE = Gas(
    key="ethane",
    title="Ethane",
    formula="C2H6",
    spellings=("r-170",),
    fluid="Ethane",
    cas="74-84-0",
    un=("1035", "1961"),
    hazards=FLAMMABLE,
    citation="Bücker and Wagner, J. Phys. Chem. Ref. Data 35 (2006) 205",
    doi="10.1063/1.1859286",
    bands=(
        Band(p_to=30 * MPA, relative=5e-4, says=UNSEEN),
        Band(relative=5e-3, says=UNSEEN),
    ),
)

PROPANE = Gas(
    key="propane",
    title="Propane",
    formula="C3H8",
    spellings=("r-290",),
    fluid="Propane",
    cas="74-98-6",
    un=("1978",),
    hazards=(*FLAMMABLE, "collects low down"),
    citation="Lemmon, McLinden and Wagner, J. Chem. Eng. Data 54 (2009) 3141",
    doi="10.1021/je900217v",
    bands=(
        Band(T_to=350.0, relative=3e-4, says="0.01 to 0.03 % below 350 K (abstract)"),
        Band(relative=5e-3, says="allowance above 350 K"),
    ),
)

N_BUTANE = Gas(
    key="n_butane",
    title="n-Butane",
    formula="C4H10",
    spellings=("butane", "normal butane", "nc4", "r-600"),
    fluid="n-Butane",
    cas="106-97-8",
    un=("1011",),
    hazards=(*FLAMMABLE, "collects low down"),
    citation="Bücker and Wagner, J. Phys. Chem. Ref. Data 35 (2006) 929",
    doi="10.1063/1.1901687",
    bands=(
        Band(T_to=340.0, p_to=12 * MPA, relative=5e-4, says=UNSEEN),
        Band(relative=5e-3, says=UNSEEN),
    ),
)

ISOBUTANE = Gas(
    key="isobutane",
    title="Isobutane",
    formula="i-C4H10",
    spellings=("2-methylpropane", "methylpropane", "ic4", "r-600a", "iso-butane"),
    fluid="IsoButane",
    cas="75-28-5",
    un=("1969",),
    hazards=(*FLAMMABLE, "collects low down"),
    citation="Bücker and Wagner, J. Phys. Chem. Ref. Data 35 (2006) 929",
    doi="10.1063/1.1901687",
    bands=(
        Band(T_to=340.0, p_to=12 * MPA, relative=5e-4, says=UNSEEN),
        Band(relative=5e-3, says=UNSEEN),
    ),
)

AMMONIA = Gas(
    key="ammonia",
    title="Ammonia",
    formula="NH3",
    spellings=("anhydrous ammonia", "ammonia anhydrous", "r-717"),
    fluid="Ammonia",
    cas="7664-41-7",
    un=("1005",),
    hazards=(TOXIC, "burns eyes, lungs and skin", "flammable", "gas under pressure"),
    citation="Gao, Wu, Bell, Harvey and Lemmon, J. Phys. Chem. Ref. Data 52 (2023) 013102",
    doi="10.1063/5.0128269",
    bands=(Band(relative=5e-3, says="allowance: the paper's figures were not at hand"),),
)

HYDROGEN_SULFIDE = Gas(
    key="hydrogen_sulfide",
    title="Hydrogen sulfide",
    formula="H2S",
    spellings=("hydrogen sulphide", "sour gas", "sulfane"),
    fluid="HydrogenSulfide",
    cas="7783-06-4",
    un=("1053",),
    hazards=(TOXIC, "numbs the sense of smell", "extremely flammable", "collects low down", "gas under pressure"),
    citation=LEMMON_SPAN,
    doi=LEMMON_SPAN_DOI,
    bands=(
        Band(T_to=373.1, relative=4e-3, says=UNSEEN),
        Band(T_to=500.0, relative=1e-2, says=UNSEEN),
        Band(relative=2.5e-2, says=UNSEEN),
    ),
)

GASES = (
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
