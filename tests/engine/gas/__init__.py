"""Tests of the gas model."""
