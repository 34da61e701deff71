"""Tests of the engine package."""
