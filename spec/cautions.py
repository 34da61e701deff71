"""What can hurt someone, in two or three plain lines each. They defer to the code, the permit and licensed people."""

from spec.model import Caution

SUFFOCATION = Caution(
    key="suffocation",
    text="Nitrogen, argon, helium and carbon dioxide suffocate without warning. Set the low-pressure alarm above the "
    "changeover pressure. Time is a plan; the gauge is the trigger.",
)
RECEIPT = Caution(
    key="receipt",
    text="Secure every cylinder and identify it by its label, never by its colour. Acetylene and liquefied gas are "
    "received by mass only.",
)
TRAPPED_LIQUID = Caution(
    key="trapped_liquid",
    text="If any liquid can be trapped, this sheet does not apply: a full pipe bursts within a few degrees. A relief "
    "device protects people, not this figure.",
)
DEFER = Caution(
    key="defer",
    text="The local code, the permit, the supplier’s data and the licensed person in charge decide. This figure "
    "supports them; it authorises nothing.",
)
