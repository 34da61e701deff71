"""What the tests of readings share: how many random texts to try."""

import pytest


@pytest.fixture
def examples(request: pytest.FixtureRequest) -> int:
    """How many random texts to try."""
    return 10_000 if request.config.getoption("--all") else 300
