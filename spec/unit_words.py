"""Words of the field that are no units by themselves: products, reference conditions, words with two meanings.

Takes the keys of spec.units; gives plain tables. Next: generator.emit_tables writes them for gaswright.unit.
Spellings are compared without blanks and full stops, and without case where that leaves one meaning.
Reference conditions: DIN 1343 (normal), ISO 13443 (standard); what the others count at is common practice without a
source and differs between suppliers, so it is asked.
"""

NORMAL = "0 °C, 101.325 kPa"
STANDARD = "15 °C, 101.325 kPa"
AMERICAN = ("60 °F, 14.696 psi", "60 °F, 14.73 psi", "70 °F, 14.696 psi")
METRIC = (NORMAL, "20 °C, 101.325 kPa", STANDARD)

PRODUCTS = {
    "lpm": "L/min",
    "lps": "L/s",
    "lph": "L/h",
    "mlpm": "mL/min",
    "lmin": "L/min",
    "cc": "cm³",
    "ccm": "cm³/min",
    "cbm": "m³",
    "cum": "m³",
    "M3": "m³",
    "cubic metre": "m³",
    "cubic metres": "m³",
    "cubic meter": "m³",
    "cubic meters": "m³",
    "cf": "ft³",
    "cuft": "ft³",
    "cubic foot": "ft³",
    "cubic feet": "ft³",
    "cu in": "in³",
    "cubic inch": "in³",
    "cubic inches": "in³",
    "sq in": "in²",
    "sqft": "ft²",
    "sq m": "m²",
    "cfm": "ft³/min",
    "cfh": "ft³/h",
    "cfs": "ft³/s",
    "kg/cm2": "kgf/cm²",
    "kp/cm2": "kgf/cm²",
    "ksc": "kgf/cm²",
    "mph": "mi/h",
    "kph": "km/h",
    "kmh": "km/h",
    "fps": "ft/s",
}
WITH_PAIR = {
    "Nm3": ("m³", NORMAL),
    "Ncm3": ("cm³", NORMAL),
    "Ndm3": ("dm³", NORMAL),
    "NL": ("L", NORMAL),
    "Nl": ("L", NORMAL),
    "NmL": ("mL", NORMAL),
    "Nlpm": ("L/min", NORMAL),
    "NLPM": ("L/min", NORMAL),
    "Sm3": ("m³", STANDARD),
}
ASKED_PAIR = {
    "scf": ("ft³", AMERICAN),
    "scft": ("ft³", AMERICAN),
    "scfm": ("ft³/min", AMERICAN),
    "scfh": ("ft³/h", AMERICAN),
    "std cu ft": ("ft³", AMERICAN),
    "ncf": ("ft³", AMERICAN),
    "scc": ("cm³", METRIC),
    "std cc": ("cm³", METRIC),
    "sccm": ("cm³/min", METRIC),
    "slm": ("L/min", METRIC),
    "slpm": ("L/min", METRIC),
    "sL": ("L", METRIC),
    "sl": ("L", METRIC),
    "stdL": ("L", METRIC),
    "scm": ("m³", METRIC),
    "scmh": ("m³/h", METRIC),
}
QUESTIONS = {
    "gal": ("US gal", "imp gal"),
    "gals": ("US gal", "imp gal"),
    "gallon": ("US gal", "imp gal"),
    "gallons": ("US gal", "imp gal"),
    "gpm": ("US gal/min", "imp gal/min"),
    "ton": ("t", "short ton", "long ton"),
    "tons": ("t", "short ton", "long ton"),
    "nm3": ("Nm³", "nm^3"),
    "NM3": ("Nm³", "nm^3"),
    "NM^3": ("Nm³", "nm^3"),
    "mpa": ("MPa", "mPa"),
    "Mbar": ("mbar", "bar"),
    "MBAR": ("mbar", "bar"),
    "Mm": ("mm", "m"),
    "mw": ("mW", "MW"),
    "M": ("m", "mol", "min"),
}
