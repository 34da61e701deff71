"""Tests of readings, units, instruments, uncertainty and how numbers are shown."""
