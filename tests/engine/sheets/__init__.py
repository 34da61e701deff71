"""Tests of the job sheets: figures, questions turned round, verdicts, answers for the page, commands."""
