"""Show numbers as a figure to sign: no finer than the uncertainty, rounded to the safe side.

Takes values in the unit shown; gives text. gaswright.respond comes next.
"""

import math

from gaswright.errors import OutsideRangeError

THIN = "\u202f"
MINUS = "−"
SUPERSCRIPTS = str.maketrans("0123456789-", "⁰¹²³⁴⁵⁶⁷⁸⁹⁻")
GUARD = 1e-9
PLAIN_LOW, PLAIN_HIGH = 1e-4, 1e9
NOTHING = 1e-300


def number(value: float, decimals: int, mark: str = ".") -> str:
    """Give ``value`` with ``decimals`` places, digits before the mark in threes from 10 000 on."""
    _refuse_infinite(value)
    text = f"{abs(value):.{max(decimals, 0)}f}"
    whole, _, rest = text.partition(".")
    if len(whole) > 4:
        whole = f"{int(whole):,}".replace(",", THIN)
    sign = MINUS if value < 0 and float(text) else ""
    return sign + whole + (mark + rest if rest else "")


def significant(value: float, digits: int, mark: str = ".") -> str:
    """Give ``value`` with so many significant digits; in powers of ten where it is very small or large."""
    _refuse_infinite(value)
    if abs(value) < NOTHING:
        return "0"
    power = _power(value, digits)
    if not PLAIN_LOW <= abs(value) < PLAIN_HIGH:
        return f"{number(value / 10.0**power, digits - 1, mark)} × 10{str(power).translate(SUPERSCRIPTS)}"
    rounded = round(value, digits - 1 - power)
    return number(rounded, digits - 1 - power, mark)


def tidy(value: float, digits: int = 6, mark: str = ".") -> str:
    """Give ``value`` with at most so many significant digits and no idle zeros."""
    text = significant(value, digits, mark)
    head, times, tail = text.partition(" × ")
    if mark in head:
        head = head.rstrip("0").rstrip(mark)
    return head + times + tail


def _refuse_infinite(value: float) -> None:
    """Raise OutsideRangeError rather than show what is no number."""
    if not math.isfinite(value):
        raise OutsideRangeError("The figure", "no finite number", "a finite number", "Check the readings.")


def _power(value: float, digits: int) -> int:
    power = math.floor(math.log10(abs(value)))
    return power + 1 if round(abs(value) / 10.0**power, digits - 1) >= 10 else power


def step_for(expanded: float) -> float | None:
    """Give the step a figure is rounded to: the smallest 1, 2 or 5 times a power of ten that is no finer than U/10."""
    if expanded <= 0 or not math.isfinite(expanded):
        return None
    least = expanded / 10
    power = 10.0 ** math.floor(math.log10(least))
    return next(head * power for head in (1, 2, 5, 10) if head * power >= least * (1 - GUARD))


def places_of(step: float) -> int:
    """Give the places after the mark that a step needs."""
    return max(0, -math.floor(math.log10(step) + GUARD))


def safe_low(value: float, expanded: float, mark: str = ".") -> str:
    """Give ``value`` - ``expanded`` rounded down to the step."""
    return safe_end(value - expanded, expanded, mark, down=True)


def safe_high(value: float, expanded: float, mark: str = ".") -> str:
    """Give ``value`` + ``expanded`` rounded up to the step."""
    return safe_end(value + expanded, expanded, mark, down=False)


def safe_end(end: float, expanded: float, mark: str = ".", *, down: bool) -> str:
    """Give the safe ``end`` of a figure rounded down or up to the step its uncertainty allows."""
    _refuse_infinite(end)
    _refuse_infinite(expanded)
    step = step_for(expanded)
    if step is None:
        return tidy(end, 7, mark)
    return scaled(rounded_to(end, step, down=down), step, mark)


def rounded_to(end: float, step: float, *, down: bool) -> float:
    """Round ``end`` down or up to a multiple of ``step``; a whole multiple but for representation stays."""
    steps = end / step
    guard = GUARD * max(1.0, abs(steps))
    whole = math.floor(steps + guard) if down else math.ceil(steps - guard)
    return whole * step


def scaled(value: float, step: float, mark: str = ".") -> str:
    """Give a rounded value with the places of its step, in powers of ten where it is very small or large."""
    if value and not PLAIN_LOW <= abs(value) < PLAIN_HIGH:
        power = math.floor(math.log10(abs(value)))
        return significant(value, max(1, power - math.floor(math.log10(step) + GUARD) + 1), mark)
    return number(value, places_of(step), mark)


def plus_minus(value: float, expanded: float, mark: str = ".") -> tuple[str, str]:
    """Give the best estimate and its ± as text, both to the step and to the same power of ten; the ± rounded up."""
    _refuse_infinite(expanded)
    step = step_for(expanded)
    if step is None:
        return tidy(value, 7, mark), "0"
    best, plus = round(value / step) * step, rounded_to(expanded, step, down=False)
    if not best or PLAIN_LOW <= abs(best) < PLAIN_HIGH:
        return number(best, places_of(step), mark), number(plus, places_of(step), mark)
    power = math.floor(math.log10(abs(best)) + GUARD)
    places = max(0, power - math.floor(math.log10(step) + GUARD))
    tail = f" × 10{str(power).translate(SUPERSCRIPTS)}"
    return number(best / 10.0**power, places, mark) + tail, number(plus / 10.0**power, places, mark) + tail


def duration(seconds: float, *, down: bool) -> str:
    """Give a time as hours and minutes, rounded down or up to a minute (to a second below an hour)."""
    _refuse_infinite(seconds)
    if seconds < 0:
        return f"{MINUS}{duration(-seconds, down=not down)}" if rounded_to(seconds, 1.0, down=down) else "0 s"
    whole = int(rounded_to(seconds, 1.0, down=down))
    if abs(whole) < 3600:
        minutes, rest = divmod(whole, 60)
        parts = (f"{minutes} min" if minutes else "", f"{rest:02d} s" if minutes and rest else "")
        return " ".join(part for part in parts if part) or f"{rest} s"
    hours, rest = divmod(int(rounded_to(seconds / 60, 1.0, down=down)), 60)
    return f"{number(hours, 0)} h {rest:02d} min"
