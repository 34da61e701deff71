"""The job sheets, in the order of a day."""

from spec.sheets.bank_endurance import BANK_ENDURANCE
from spec.sheets.cylinder_receipt import CYLINDER_RECEIPT
from spec.sheets.locked_in import LOCKED_IN

SHEETS = (CYLINDER_RECEIPT, LOCKED_IN, BANK_ENDURANCE)
