"""Tests of the stages and commands of the generator."""
