"""Tests of the finished site in real browsers."""
