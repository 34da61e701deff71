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
UNDER_PRESSURE = Caution(
    key="under_pressure",
    text="The section is under pressure for the whole test: keep people away and nothing loosened. Find leaks with "
    "soap or a detector before re-energising. The installation code sets limit and duration.",
)
FILLING = Caution(
    key="filling",
    text="Filling heats the gas, and oxygen with oil or dirt burns. The rating of the vessel holds at every moment. "
    "Licensed fillers only.",
)
PURGING = Caution(
    key="purging",
    text="Inert gas at the vent suffocates without warning. Catalytic LEL sensors are blind in inert gas, and on the "
    "way from product to air the mixture may cross the flammable range: purge with inert gas in between.",
)
DEFER = Caution(
    key="defer",
    text="The local code, the permit, the supplier’s data and the licensed person in charge decide. This figure "
    "supports them; it authorises nothing.",
)
