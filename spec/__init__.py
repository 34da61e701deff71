"""What is true: kinds, units, relations, sheets, gases, and numbers from outside. Imports sympy and itself only."""
