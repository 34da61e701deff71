"""Read a time of day and give the time some seconds later.

Takes ``07:34`` or an RFC 3339 time; gives words. gaswright.sheet reads the row, gaswright.verdict shows the end.
"""

import re
from datetime import datetime, timedelta

from gaswright.errors import ReadingError

TIME = re.compile(r"([01]?\d|2[0-3])[:.h]([0-5]\d)")
MINUTES_A_DAY = 1440
LAST_YEAR = 9998
LONGEST_S = 366 * 86400.0


def check(text: str, where: str) -> str:
    """Give ``text`` back where it is a time of day or an RFC 3339 time; raise ReadingError where it is neither."""
    if TIME.fullmatch(text.strip()) or _moment(text):
        return text.strip()
    raise ReadingError(where, repr(text[:40]), "a time of day such as 07:34", "Type hours and minutes.")


def later(start: str, seconds: float) -> str:
    """Give the time ``seconds`` after ``start``, rounded down to a minute, with the days between in words."""
    if not 0 <= seconds <= LONGEST_S:
        return ""
    moment = _moment(start)
    if moment and moment.year < LAST_YEAR:
        return (moment + timedelta(seconds=seconds)).strftime("%H:%M on %Y-%m-%d")
    found = TIME.fullmatch(start)
    if not found:
        return ""
    days, minutes = divmod(int(found[1]) * 60 + int(found[2]) + int(seconds // 60), MINUTES_A_DAY)
    words = {0: "", 1: " the next day"}.get(days, f" {days} days later")
    return f"{minutes // 60:02d}:{minutes % 60:02d}{words}"


def _moment(text: str) -> datetime | None:
    try:
        return datetime.fromisoformat(text.strip()) if "-" in text.strip()[1:] else None
    except ValueError:
        return None
