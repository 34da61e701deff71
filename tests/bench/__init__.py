"""Measurements side by side in one run, printed as ratios."""
