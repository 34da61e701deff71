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

INERT = ("suffocates without warning", "gas under pressure")
OXIDISER = ("feeds fire: keep oil and grease away", "gas under pressure")
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
    citation="Schmidt and Wagner, Fluid Phase Equilib. 19 (1985) 175; "
    "Stewart, Jacobsen and Wagner, J. Phys. Chem. Ref. Data 20 (1991) 917",
    doi="10.1016/0378-3812(85)87016-3",
    bands=(
        Band(T_to=300.0, relative=1e-3, says="0.1 % in density but near the critical point (from memory)"),
        Band(relative=2e-3, says="allowance above 300 K"),
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
        Band(T_to=340.0, p_to=12 * MPA, relative=2e-4, says="0.02 % below 12 MPa and 340 K (from memory)"),
        Band(T_to=520.0, p_to=30 * MPA, relative=3e-4, says="0.03 % below 30 MPa and 520 K (from memory)"),
        Band(T_to=700.0, p_to=100 * MPA, relative=2e-3, says="0.2 % up to 100 MPa (from memory)"),
        Band(relative=1e-2, says="allowance beyond 700 K or 100 MPa"),
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
    bands=(Band(relative=1e-2, says="allowance"),),
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
        Band(T_to=250.0, p_to=40 * MPA, relative=1e-3, says="0.1 % (from memory)"),
        Band(T_to=450.0, p_to=300 * MPA, relative=4e-4, says="0.04 % from 250 to 450 K up to 300 MPa (from memory)"),
        Band(relative=1e-2, says="allowance"),
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
        Band(T_to=350.0, p_to=12 * MPA, relative=3e-4, says="0.03 % below 12 MPa and 350 K (from memory)"),
        Band(p_to=50 * MPA, relative=7e-4, says="0.07 % below 50 MPa (from memory)"),
        Band(relative=1.5e-3, says="0.1 to 0.15 % at higher pressures (from memory)"),
    ),
)

CARBON_DIOXIDE = Gas(
    key="carbon_dioxide",
    title="Carbon dioxide",
    formula="CO2",
    spellings=("carbon dioxide", "carbonic acid gas", "r-744"),
    fluid="CarbonDioxide",
    cas="124-38-9",
    un=("1013", "2187"),
    hazards=("harms well before oxygen runs short", "suffocates", "gas under pressure", "collects low down"),
    citation="Span and Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509",
    doi="10.1063/1.555991",
    bands=(
        Band(T_to=523.0, p_to=30 * MPA, relative=5e-4, says="0.03 to 0.05 % up to 30 MPa and 523 K (abstract)"),
        Band(relative=2e-2, says="allowance beyond 30 MPa or 523 K"),
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
        Band(T_to=873.0, p_to=70 * MPA, relative=1e-3, says="0.1 % up to 873 K and 70 MPa (from memory)"),
        Band(relative=1e-2, says="allowance beyond 873 K or 70 MPa"),
    ),
)

GASES = (NITROGEN, OXYGEN, ARGON, HELIUM, HYDROGEN, METHANE, CARBON_DIOXIDE, AIR)
