"""Tests of the spec."""
