"""What crews type is read as meant, and written back in full. Factors are those of tests/spec/test_units.py."""

import pytest
from gaswright import number, product, unit
from gaswright.counting import to_reference
from gaswright.errors import ReadingError
from gaswright.reading import read
from gaswright.tables import KINDS, UNITS

PRESSURES = [
    ("barg", "bar", "gauge"),
    ("bara", "bar", "absolute"),
    ("psig", "psi", "gauge"),
    ("psia", "psi", "absolute"),
    ("bar(g)", "bar", "gauge"),
    ("bar g", "bar", "gauge"),
    ("bar gauge", "bar", "gauge"),
    ("BARG", "bar", "gauge"),
    ("PSIG", "psi", "gauge"),
    ("psi gage", "psi", "gauge"),
    ("bar (abs)", "bar", "absolute"),
    ("bar abs.", "bar", "absolute"),
    ("mbarg", "mbar", "gauge"),
    ("kPag", "kPa", "gauge"),
    ("kPa(a)", "kPa", "absolute"),
    ("MPag", "MPa", "gauge"),
    ("inHg vacuum", "inHg", "vacuum"),
    ("in. Hg", "inHg", None),
    ('"Hg', "inHg", None),
    ("in Hg vac", "inHg", "vacuum"),
    ("mmHg", "mmHg", None),
    ("mm Hg", "mmHg", None),
    ("torr", "torr", None),
    ("Torr", "torr", None),
    ("ata", "at", "absolute"),
    ("atg", "at", "gauge"),
    ("at", "at", None),
    ("kg/cm2", "kgf/cm²", None),
    ("kgf/cm² g", "kgf/cm²", "gauge"),
    ("in WC", "inH2O", None),
    ("inH2O gauge", "inH2O", "gauge"),
    ("mm WG", "mmH2O", None),
    ("inHg (60 °F)", "inHg (60 °F)", None),
    ("inH2O (4 °C)", "inH2O (4 °C)", None),
    ("KPA", "kPa", None),
    ("lbf/in²", "psi", None),
    ("N/m²", "Pa", None),
    ("psid", "psi", "difference"),
    ("hPa", "hPa", None),
    ("mb", "mbar", None),
]
OTHERS = [
    ("deg C", "absolute_temperature", "°C"),
    ("degC", "absolute_temperature", "°C"),
    ("C", "absolute_temperature", "°C"),
    ("F", "absolute_temperature", "°F"),
    ("° C", "absolute_temperature", "°C"),
    ("ºC", "absolute_temperature", "°C"),
    ("kelvin", "absolute_temperature", "K"),
    ("R", "absolute_temperature", "°R"),
    ("ft3", "volume", "ft³"),
    ("cuft", "volume", "ft³"),
    ("cu ft", "volume", "ft³"),
    ("cu. ft.", "volume", "ft³"),
    ("cf", "volume", "ft³"),
    ("m3", "volume", "m³"),
    ("cbm", "volume", "m³"),
    ("m^3", "volume", "m³"),
    ("m**3", "volume", "m³"),
    ("M3", "volume", "m³"),
    ("cc", "volume", "cm³"),
    ("lit", "volume", "L"),
    ("ltr", "volume", "L"),
    ("l", "volume", "L"),
    ("dm³", "volume", "dm³"),
    ("in3", "volume", "in³"),
    ("gal (US)", "volume", "US gal"),
    ("lpm", "flow", "L/min"),
    ("l/min", "flow", "L/min"),
    ("L / min", "flow", "L/min"),
    ("cfm", "flow", "ft³/min"),
    ("m3/hr", "flow", "m³/h"),
    ("litres per minute", "flow", "L/min"),
    ("m³ h⁻¹", "flow", "m³/h"),
    ("kg m-3", "density", "kg/m³"),
    ("kg/m^3", "density", "kg/m³"),
    ("g/cc", "density", "g/cm³"),
    ("Pa·m⁶/mol²", "attraction", "Pa·m⁶/mol²"),
    ("Pa m^6 mol^-2", "attraction", "Pa·m⁶/mol²"),
    ("ft³/lbmol", "molar_volume", "ft³/lbmol"),
    ("cu ft/lb-mol", "molar_volume", "ft³/lbmol"),
    ("Pa.s", "viscosity", "Pa·s"),
    ("uPa·s", "viscosity", "µPa·s"),
    ("%", "ratio", "%"),
    ("mol/mol", "ratio", "mol/mol"),
    ("vol%", "ratio", "vol %"),
]
CUBES = [
    ("nm^3", 1e-27, None),
    ("nm³", 1e-27, None),
    ("Nm³", 1.0, (273.15, 101325.0)),
    ("Nm3", 1.0, (273.15, 101325.0)),
]
GAS_CONSTANT = (1.0, 2.0, -2.0, -1.0, -1.0)
LEAK = (1.0, 2.0, -3.0, 0.0, 0.0)


@pytest.mark.parametrize(("text", "key", "reference"), PRESSURES, ids=[row[0] for row in PRESSURES])
def test_pressure_as_typed(text: str, key: str, reference: str | None) -> None:
    found = unit.parse(text, "row", KINDS["absolute_pressure"].exponents)
    factor = UNITS["at" if key == "kgf/cm²" else key].factor  # the technical atmosphere is one kgf/cm² (SP 811)
    assert (found.text, found.factor, found.reference) == (key, factor, reference)


@pytest.mark.parametrize(("text", "kind", "shown"), OTHERS, ids=[row[0] for row in OTHERS])
def test_unit_as_typed(text: str, kind: str, shown: str) -> None:
    found = unit.parse(text, "row", KINDS[kind].exponents)
    assert found.text == shown
    assert unit.parse(found.text, "row", KINDS[kind].exponents) == found


@pytest.mark.parametrize(("kind", "text"), [(kind.key, text) for kind in KINDS.values() for text in kind.units])
def test_every_unit_offered_reads_as_itself(kind: str, text: str) -> None:
    assert unit.parse(text, "row", KINDS[kind].exponents).text == text


@pytest.mark.parametrize("key", UNITS)
def test_every_unit_reads_as_itself(key: str) -> None:
    found = unit.parse(key, "row", UNITS[key].exponents)
    assert (found.text, found.factor, found.zero) == (key, UNITS[key].factor, UNITS[key].zero)


@pytest.mark.parametrize(
    ("text", "exponents", "factor", "code"),
    [
        ("J/(mol·K)", GAS_CONSTANT, 1.0, "J/mol/K"),
        ("J/mol/K", GAS_CONSTANT, 1.0, "J/mol/K"),
        ("J mol-1 K-1", GAS_CONSTANT, 1.0, "J/mol/K"),
        ("kJ/(kmol K)", GAS_CONSTANT, 1.0, "kJ/kmol/K"),
        ("mbar·L/s", LEAK, 0.1, "mbar.L/s"),
        ("mbar l/s", LEAK, 0.1, "mbar.L/s"),
        ("Pa m3/s", LEAK, 1.0, "Pa.m3/s"),
        ("atm·cc/s", LEAK, 0.101325, "atm.cm3/s"),
        ("cm³", (0.0, 3.0, 0.0, 0.0, 0.0), 1e-6, "cm3"),
    ],
)
def test_products(text: str, exponents: tuple[float, ...], factor: float, code: str) -> None:
    assert unit.parse(text, "row", exponents).factor == factor
    assert product.ucum(text) == code


@pytest.mark.parametrize(("text", "factor", "pair"), CUBES)
def test_normal_cubic_metre_and_cube_of_nanometres(text: str, factor: float, pair: tuple[float, float] | None) -> None:
    found = unit.parse(text, "row", KINDS["volume"].exponents)
    assert (found.factor, found.conditions) == (factor, pair)


@pytest.mark.parametrize("text", ["nm3", "NM3", "NM³"])
def test_normal_cubic_metre_in_doubtful_letters_is_asked_about(text: str) -> None:
    with pytest.raises(ReadingError) as caught:
        unit.parse(text, "row", KINDS["volume"].exponents)
    assert caught.value.offers == ("Nm³", "nm^3")


@pytest.mark.parametrize(
    "text", ["L/min/", "/min", "L//min", "(L/min", "L/min)", "L·/min", "L min min^0", "L^99", "()", "·"]
)
def test_broken_products(text: str) -> None:
    with pytest.raises(ReadingError):
        unit.parse(text, "row", KINDS["flow"].exponents)


def test_a_product_behind_a_slash_is_asked_about() -> None:
    # ISO 80000-1:2009, 7.2.2 (from memory): no product behind a solidus without brackets
    with pytest.raises(ReadingError) as caught:
        unit.parse("J/mol·K", "row", GAS_CONSTANT)
    assert caught.value.offers == ("J/(mol·K)", "J·K/mol")


@pytest.mark.parametrize(
    ("text", "pair", "shown"),
    [
        ("30 Nm3/h", (273.15, 101325.0), "30 m³/h (0 °C, 101.325 kPa)"),  # DIN 1343
        ("30 Nm³/h", (273.15, 101325.0), "30 m³/h (0 °C, 101.325 kPa)"),
        ("30 Sm3/h", (288.15, 101325.0), "30 m³/h (15 °C, 101.325 kPa)"),  # ISO 13443
        ("30 L/min (20 °C, 101.325 kPa)", (293.15, 101325.0), "30 L/min (20 °C, 101.325 kPa)"),
        ("30 L/min (101.325 kPa, 20 °C)", (293.15, 101325.0), "30 L/min (20 °C, 101.325 kPa)"),
        ("30 L/min at 20 °C and 1 atm", (293.15, 101325.0), "30 L/min (20 °C, 1 atm)"),
        ("30 slpm (20 °C, 1,01325 bar)", (293.15, 101325.0), "30 L/min (20 °C, 1,01325 bar)"),
        ("30 scfm (60 °F, 14.696 psia)", (288.7055555555556, 101325.35), "30 ft³/min (60 °F, 14.696 psi)"),
        ("30 L/min", None, "30 L/min"),
    ],
)
def test_reference_conditions(text: str, pair: tuple[float, float] | None, shown: str) -> None:
    reading = read("q", text, KINDS["reference_flow"])
    assert reading.text == shown
    assert reading.conditions == (pytest.approx(pair, rel=1e-7) if pair else None)


@pytest.mark.parametrize(
    ("text", "decimal", "value", "step"),
    [
        ("200", None, 200.0, 1.0),
        ("12.50", None, 12.5, 0.01),
        ("1,5", None, 1.5, 0.1),
        ("1.013", None, 1.013, 0.001),
        ("0,123", None, 0.123, 0.001),
        ("1234,567", None, 1234.567, 0.001),
        ("12 345", None, 12345.0, 1.0),
        ("12\u202f345,6", None, 12345.6, 0.1),
        ("1'234.5", None, 1234.5, 0.1),
        ("1,234.5", None, 1234.5, 0.1),
        ("1.234,5", None, 1234.5, 0.1),
        ("1,234,567", None, 1234567.0, 1.0),
        ("1,234", ",", 1.234, 0.001),
        ("1,234", ".", 1234.0, 1.0),
        ("2.79 × 10⁻⁵", None, 2.79e-5, 1e-7),
        ("3e5", None, 3e5, 1e5),
        ("−20", None, -20.0, 1.0),
        (".5", None, 0.5, 0.1),
        ("5.", None, 5.0, 1.0),
    ],
)
def test_numbers(text: str, decimal: str | None, value: float, step: float) -> None:
    found = number.parse(text, "row", decimal)
    assert found.value == value
    assert found.step == pytest.approx(step, rel=1e-15)


@pytest.mark.parametrize(
    ("text", "decimal", "offers"),
    [
        ("1,234", None, ("1.234", "1234")),
        ("1.234", ",", ("1,234", "1234")),
        ("1,5", ".", ("1.5",)),
        ("-1,234e3", None, ("-1.234e3", "-1234e3")),
    ],
)
def test_marks_with_two_meanings_are_asked_about(text: str, decimal: str | None, offers: tuple[str, ...]) -> None:
    with pytest.raises(ReadingError) as caught:
        number.parse(text, "row", decimal)
    assert caught.value.offers == offers
    assert len({number.parse(offer, "row", decimal).value for offer in offers}) == len(offers)


@pytest.mark.parametrize(
    ("kind", "text", "wanted", "value", "slope"),
    [
        ("gauge_pressure", "200 bar gauge", "absolute", 20101300.0, 1.0),
        ("vacuum_pressure", "24 inHg vacuum", "absolute", 101300.0 - 24 * 3386.388640341, 1.0),
        ("absolute_pressure", "3 bar absolute", "gauge", 198700.0, -1.0),
        ("absolute_pressure", "0.5 bar absolute", "vacuum", 51300.0, 1.0),
        ("gauge_pressure", "-0.4 bar gauge", "vacuum", 40000.0, 0.0),
        ("gauge_pressure", "5 barg", "gauge", 500000.0, 0.0),
    ],
)
def test_counting_from_the_station_pressure(kind: str, text: str, wanted: str, value: float, slope: float) -> None:
    # p_abs = p_atm + p_gauge = p_atm - p_vac, with p_atm = 1013 mbar
    station = read("Station pressure", "1013 mbar", KINDS["station_pressure"])
    assert to_reference(read("p", text, KINDS[kind]), wanted, station) == pytest.approx((value, slope), rel=1e-12)


@pytest.mark.parametrize(
    ("raw", "limit", "by"),
    [
        ("200 ± 2 bar", 2e5, "± 2 bar"),
        ("(200 ± 2) bar gauge", 2e5, "± 2 bar"),
        ("200 bar +/- 2 bar", 2e5, "± 2 bar"),
        ("200 bar ± 1 %", 2e5, "± 1 % of the reading: ± 2 bar"),
        ("200 bar", 5e4, "half the last digit typed: ± 0.5 bar"),
        ("200.0 bar", 5e3, "half the last digit typed: ± 0.05 bar"),
        ({"text": "200 bar", "accuracy": "class 1.6 of 250 bar"}, 4e5, "class 1.6 of 250 bar: ± 4 bar"),
        ({"text": "200 bar", "accuracy": "Kl. 1,6 of 0–250 bar"}, 4e5, "class 1,6 of 0–250 bar: ± 4 bar"),
        ({"text": "200 bar", "accuracy": "1 % FS of 250 bar"}, 2.5e5, "± 1 % of span of 250 bar: ± 2.5 bar"),
        ({"text": "200 bar", "accuracy": "± 1 % of 400 bar"}, 4e5, "± 1 % of span of 400 bar: ± 4 bar"),
        ({"text": "200 bar", "accuracy": "± 300 mbar"}, 3e4, "± 300 mbar"),
        ({"text": "200 bar", "accuracy": "exact"}, 0, "exact"),
    ],
)
def test_accuracy_in_words(raw: str | dict[str, object], limit: float, by: str) -> None:
    # a limit a is rectangular: u = a/√3 (JCGM 100:2008, 4.3.7)
    reading = read("p", raw, KINDS["gauge_pressure"])
    assert reading.u**2 == pytest.approx(limit**2 / 3, rel=1e-12)
    assert reading.by == by


def test_a_share_of_a_temperature_is_of_what_was_typed() -> None:
    assert read("T", "20 °C ± 1 %", KINDS["absolute_temperature"]).u ** 2 == pytest.approx(0.2**2 / 3, rel=1e-12)


def test_an_instrument_gives_a_systematic_and_a_random_part() -> None:
    # limit 4 bar, steps of 5 bar: 4/√3 and 5/√12 (JCGM 100:2008, 4.3.7 and F.2.2.1)
    tools: dict[str, dict[str, object]] = {
        "G-17": {"name": "G-17", "accuracy": "class 1.6", "span": "250 bar", "resolution": "5 bar"},
    }
    reading = read(
        "p", {"text": "200", "unit": "bar", "instrument": "G-17"}, KINDS["gauge_pressure"], instruments=tools
    )
    assert reading.u_systematic**2 == pytest.approx(4e5**2 / 3, rel=1e-12)
    assert reading.u_random**2 == pytest.approx(5e5**2 / 12, rel=1e-12)
    assert reading.u**2 == pytest.approx(4e5**2 / 3 + 5e5**2 / 12, rel=1e-12)
    assert (reading.span, reading.text) == (25e6, "200 bar gauge")
