"""Undoing operations around an unknown, each against the algebra of a textbook."""

import sympy

from generator.isolate import isolate, peel

x, y, a = sympy.symbols("x y a", positive=True)
t = sympy.Symbol("t", real=True)


def test_an_acute_angle_comes_out_of_a_sine() -> None:
    assert isolate(y, sympy.sin(x), x) == sympy.asin(y)


def test_a_real_power_comes_off_a_sum_of_unknown_sign() -> None:
    found = isolate(y, (1 - t) ** a, t)
    assert found is not None
    assert sympy.simplify(found - (1 - y ** (1 / a))) == 0


def test_an_even_power_of_unknown_sign_stays() -> None:
    assert isolate(y, t**2, t) is None


def test_an_exponential_is_peeled_from_an_unknown_that_stands_twice() -> None:
    inside, outside = peel(y, sympy.exp(a * t / (2 + t)), t)
    assert sympy.simplify(outside / inside - sympy.log(y) * (2 + t) / (a * t)) == 0
    assert not outside.has(t)


def test_nothing_is_peeled_where_both_sides_hold_the_unknown() -> None:
    assert peel(x * y, x + a, x) == (x * y, x + a)
