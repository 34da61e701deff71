"""Any text at all either reads, finite, or raises ReadingError in four parts; soon, and nothing else."""

import math
import time

import pytest
from gaswright import product
from gaswright.errors import ReadingError
from gaswright.reading import Reading, read
from gaswright.tables import ASKED_PAIR, KINDS, PRODUCTS, QUESTIONS, SPELLINGS, WITH_PAIR
from hypothesis import HealthCheck, given, settings
from hypothesis import strategies as st

LONGEST_SECONDS = 0.5
WORDS = sorted({*SPELLINGS, *PRODUCTS, *WITH_PAIR, *ASKED_PAIR, *QUESTIONS})
PIECES = st.sampled_from(
    [
        "1",
        "200",
        "1,234",
        "1.5",
        "e400",
        "0e400",
        " ",
        "\u202f",
        "±",
        "+/-",
        "%",
        "/",
        "·",
        "(",
        ")",
        "^",
        "³",
        "-",
        "−",
        ",",
        "gauge",
        "(g)",
        "abs",
        "vac",
        "g",
        "at",
        "class 1.6 of",
        "nan",
        "٣",
        "²²²",
        "20 °C, 1 atm",
        "×10⁻⁵",
        "'",
        '"',
        "\n",
        "\0",
    ]
)
TYPED = st.one_of(
    st.text(max_size=40),
    st.lists(PIECES | st.sampled_from(WORDS), max_size=8).map("".join),
    st.lists(PIECES | st.sampled_from(WORDS), max_size=8).map(" ".join),
    st.builds("{} {}".format, st.floats(-1e9, 1e9), st.sampled_from(WORDS)),
)
RECORDS = st.fixed_dictionaries(
    {
        "text": TYPED,
        "unit": st.sampled_from(["", "bar", "psi gauge", "°C", "%", "L", "L/min"]) | TYPED,
        "reference": st.sampled_from([None, "gauge", "absolute", "vacuum", "difference", "up"]),
        "accuracy": st.sampled_from([None, "class 1.6 of 250 bar", "± 1 %", "1 % FS", "exact"]) | TYPED,
        "instrument": st.sampled_from([None, "I-1", "I-2"]),
    }
)


def _taken(raw: object, kind: str, decimal: str | None, tool: str) -> Reading | None:
    tools: dict[str, dict[str, object]] = {"I-1": {"name": "I-1", "accuracy": tool, "span": tool, "resolution": tool}}
    started = time.process_time()
    try:
        return read("row", raw, KINDS[kind], decimal, tools)  # type: ignore[arg-type]  # wrong on purpose
    except ReadingError as error:
        assert all((error.where, error.found, error.expected, error.todo))  # noqa: PT017 - the error is the result
        return None
    finally:
        assert time.process_time() - started < LONGEST_SECONDS


TAILS = st.sampled_from(["", " ± 1 %", " ± 3", " gauge", " (20 °C, 1 atm)", " abs", "±", " vac", "^2"])


@st.composite
def _cases(draw: st.DrawFn) -> tuple[object, str]:
    """Draw a reading and a kind; half the readings are in a unit of the kind, many with something odd behind it."""
    kind = draw(st.sampled_from(sorted(KINDS)))
    numbers = st.integers(1, 90) | st.floats(-1e4, 1e4)
    fitting = st.builds("{:g} {}{}".format, numbers, st.sampled_from(KINDS[kind].units), st.just("") | TAILS)
    return draw(fitting if draw(st.booleans()) else TYPED | RECORDS), kind


def test_any_text(examples: int) -> None:
    taken: list[Reading] = []

    @settings(max_examples=examples, deadline=None, suppress_health_check=list(HealthCheck))
    @given(case=_cases(), decimal=st.sampled_from([None, ".", ","]), tool=TYPED)
    def look(case: tuple[object, str], decimal: str | None, tool: str) -> None:
        reading = _taken(*case, decimal, tool)
        if reading is not None:
            taken.append(reading)
            figures = (reading.value, reading.u, reading.u_systematic, reading.u_random, reading.span)
            assert all(map(math.isfinite, figures)), case
            assert reading.u >= 0
            assert reading.by

    look()
    assert taken, "nothing was read, so nothing was looked at"


def test_a_reading_written_back_reads_the_same(examples: int) -> None:
    @settings(max_examples=examples, deadline=None, suppress_health_check=list(HealthCheck))
    @given(value=st.integers(1, 10**6).map(lambda n: f"{n / 1000:.3f}"), data=st.data())
    def look(value: str, data: st.DataObject) -> None:
        kind = KINDS[data.draw(st.sampled_from(sorted(KINDS)))]
        text = data.draw(st.sampled_from(kind.units))
        first = _taken(f"{value} {text}", kind.key, None, "")
        if first is not None:
            again = read("row", first.text, kind)
            assert (again.value, again.reference, again.text) == (first.value, first.reference, first.text)

    look()


@pytest.mark.parametrize(
    "text", ["1" * 10**6, "1 " + "(" * 10**5, "1 " + "m·" * 10**5, "1" + " 1" * 10**5, "±" * 10**5]
)
def test_long_text_is_refused_at_once(text: str) -> None:
    assert _taken(text, "volume", None, "") is None


@given(text=st.sampled_from(WORDS), other=st.sampled_from(WORDS))
@settings(deadline=None, max_examples=200)
def test_products_of_any_two_words_are_finite_or_refused(text: str, other: str) -> None:
    for joined in (f"{text}/{other}", f"{text}·{other}", f"{text}^2 {other}^-3"):
        try:
            made = product.read(joined, "row", "a unit")
        except ReadingError:
            continue
        assert 0 < made.factor < math.inf
        assert product.read(made.text, "row", "a unit").factor == pytest.approx(made.factor, rel=1e-15)
