"""The gases that burn, one frozen value each.

Takes the shape of a gas; gives names, numbers, hazards, equations and their stated uncertainty.
`spec/gases.py` puts them in order; what it says of sources holds here too.
"""

from spec.gas_model import Band, Gas
from spec.gas_words import BEYOND, FLAMMABLE, LEMMON_SPAN, LEMMON_SPAN_DOI, MPA, TOXIC, UNSEEN

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
