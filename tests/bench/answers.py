"""A keystroke, answered: every law and every question of every sheet, natively.

Takes the built package in ``build/engine``; prints median and worst time from request text to response text, with
uncertainty and the real gas included. The browser runtime is 3 to 6 times slower than this.
"""

import json
import statistics
import sys
import time
from collections.abc import Callable, Iterator

from gaswright.browser import answer
from gaswright.find import relation, sheet
from gaswright.jobs.index import TITLE_OF as SHEETS
from gaswright.laws.index import TITLE_OF as LAWS
from gaswright.terms import as_shown

RUNS = 15
BUDGET_MS = {"laws": 5.0, "sheets": 15.0}


def law_requests() -> Iterator[tuple[str, str]]:
    """Give the worked example of every law as the page asks it."""
    for key in LAWS:
        law = as_shown(relation(key))
        find = next(item.name for item in law.variables if item.name not in law.example and item.default is None)
        rows = {name: {"text": text} for name, text in law.example.items()}
        yield key, json.dumps({"id": 1, "do": "relation", "key": key, "find": find, "rows": rows})


def sheet_requests() -> Iterator[tuple[str, str]]:
    """Give the worked example of every sheet as the page asks it."""
    for key in SHEETS:
        readings = {name: {"text": text} for name, text in sheet(key).example.items()}
        yield key, json.dumps({"id": 1, "do": "sheet", "key": key, "readings": readings})


def milliseconds(request: str) -> float:
    """Give the median time of one request, after a first one that imports what it needs."""
    answer(request)
    times = []
    for _ in range(RUNS):
        start = time.perf_counter()
        answer(request)
        times.append((time.perf_counter() - start) * 1000)
    return statistics.median(times)


def main() -> int:
    """Print both tables' medians and worst, and give 1 where the worst is over its budget."""
    status = 0
    sources: dict[str, Callable[[], Iterator[tuple[str, str]]]] = {"laws": law_requests, "sheets": sheet_requests}
    for name, requests in sources.items():
        times = {key: milliseconds(request) for key, request in requests()}
        worst = max(times, key=lambda key: times[key])
        median = statistics.median(times.values())
        print(f"{name}: median {median:.2f} ms, worst {times[worst]:.2f} ms ({worst}), budget {BUDGET_MS[name]} ms")
        status |= times[worst] > BUDGET_MS[name]
    return status


if __name__ == "__main__":
    sys.exit(main())
