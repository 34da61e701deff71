"""Ask the engine as the page does: JSON out, JSON in.

Takes a sheet, a question and changes to its worked example; gives the response.
"""

import json
from typing import Any

from gaswright import find as finder
from gaswright.browser import answer

NITROGEN: dict[str, Any] = {
    "gas": "nitrogen",
    "count": "4",
    "V_each": "50 L",
    "pg_start": "200 bar gauge",
    "pg_end": "10 bar gauge",
    "T_gas": "20 °C",
    "p_atm": "1013 mbar",
    "q": "30 L/min",
    "T_ref": "20 °C",
    "p_ref": "101.325 kPa absolute",
}


def send(request: object) -> dict[str, Any]:
    """Send one request and give the response."""
    response: dict[str, Any] = json.loads(answer(json.dumps(request)))
    return response


def ask(key: str, row: str | None, changes: dict[str, Any], **more: Any) -> dict[str, Any]:
    """Ask one question of the worked example with some rows changed; None empties a row."""
    readings = {**finder.sheet(key).example, **changes}
    given = {name: raw for name, raw in readings.items() if raw is not None}
    return send({"id": 1, "do": "sheet", "key": key, "find": row, "readings": given, **more})


def bank(changes: dict[str, Any], row: str = "t", **more: Any) -> dict[str, Any]:
    """Ask of four cylinders of nitrogen with some rows changed."""
    given = {name: raw for name, raw in (NITROGEN | changes).items() if raw is not None}
    return send({"id": 1, "do": "sheet", "key": "bank_endurance", "find": row, "readings": given, **more})
