"""Tests of the laws as they ship."""
