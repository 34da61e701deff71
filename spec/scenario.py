"""The demo scenario, invented: Hollin Tarn works, its nitrogen bank and its test pit.

Gives the name and the words every page says about it. Every example in the spec plays there.
"""

NAME = "Hollin Tarn works"
SAYS = "Hollin Tarn works is invented: its nitrogen bank, its test pit and every reading in the examples."
STATION_PRESSURE = "996.4 hPa"
