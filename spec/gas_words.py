"""Words and figures that several gases share.

Takes nothing; gives hazard words, a shared citation and what is said where a paper's figure was not at hand.
The gases come next.
"""

MPA = 1e6

BEYOND = "allowance: the paper gives no figure here"
UNSEEN = "from memory: the paper's text was not at hand"
LEMMON_SPAN = "Lemmon and Span, J. Chem. Eng. Data 51 (2006) 785"
LEMMON_SPAN_DOI = "10.1021/je050186n"

INERT = ("suffocates without warning", "gas under pressure")
OXIDISER = ("feeds fire: keep oil and grease away", "gas under pressure")
TOXIC = "poisonous: the smallest leak counts"
FLAMMABLE = ("extremely flammable", "gas under pressure", "suffocates")
