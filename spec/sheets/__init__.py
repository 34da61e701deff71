"""The job sheets, in the order of a day."""

from spec.sheets.bank_endurance import BANK_ENDURANCE
from spec.sheets.cylinder_receipt import CYLINDER_RECEIPT
from spec.sheets.locked_in import LOCKED_IN
from spec.sheets.pressure_hold import PRESSURE_HOLD
from spec.sheets.purge_plan import PURGE_PLAN
from spec.sheets.settle_after_fill import SETTLE_AFTER_FILL

SHEETS = (CYLINDER_RECEIPT, SETTLE_AFTER_FILL, PURGE_PLAN, LOCKED_IN, PRESSURE_HOLD, BANK_ENDURANCE)
