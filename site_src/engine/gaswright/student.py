"""Student's factor for a coverage of 95.45 %.

Takes degrees of freedom; gives the coverage factor (JCGM 100:2008, G.3 and table G.2). gaswright.uncertainty uses it.
"""

import math

COVERAGE = 0.9544997361036416
MANY = 1e6


def factor(freedom: float) -> float:
    """Give the factor for ``freedom`` degrees (at least 1): 2 where they are many."""
    if freedom >= MANY:
        return 2.0
    low, high = 1.0, 20.0
    for _ in range(60):
        middle = (low + high) / 2
        if _share(middle, max(freedom, 1.0)) < COVERAGE:
            low = middle
        else:
            high = middle
    return (low + high) / 2


def _share(t: float, freedom: float) -> float:
    """Give the probability of Student's t staying within ± ``t``, by Simpson's rule over the angle atan(t/√ν)."""
    top = math.atan(t / math.sqrt(freedom))
    steps = 400
    width = top / steps
    total = math.fsum(
        (1 if place in (0, steps) else 4 if place % 2 else 2) * math.cos(place * width) ** (freedom - 1)
        for place in range(steps + 1)
    )
    log_scale = math.lgamma((freedom + 1) / 2) - math.lgamma(freedom / 2)
    return 2 * total * width / 3 * math.exp(log_scale) / math.sqrt(math.pi)
