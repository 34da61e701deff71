"""Write an expression as Python, as a plain text line, or as MathML.

Takes unevaluated sympy expressions in textbook order; gives text. One walk over the expression serves Python and
plain text (``LineWriter`` and its two alphabets); MathML goes through LaTeX, which keeps textbook order.
Next: generator.emit_engine and generator.make_views.
"""

import re
from collections.abc import Mapping, Sequence
from decimal import Decimal

import sympy
from latex2mathml.converter import convert

from generator.arrange import flatten
from generator.errors import SpecError
from spec.model import Relation
from spec.symbols import GAS_FUNCTIONS, Others, Total, is_list

SUM, PRODUCT, SIGN, POWER, ATOM = range(5)
FUNCTIONS = {"log": "log", "exp": "exp", "sin": "sin", "cos": "cos", "asin": "asin", "erf": "erf", "Abs": "abs"}
GREEK = {
    "alpha": "α",
    "beta": "β",
    "gamma": "γ",
    "eta": "η",
    "theta": "θ",
    "kappa": "κ",
    "lam": "λ",
    "mu": "μ",
    "nu": "ν",
    "omega": "ω",
    "phi": "φ",
    "psi": "ψ",
    "rho": "ρ",
    "eps": "ε",
    "pi": "π",
}
TENS = 10**12
TERMS = {Total: "terms", Others: "others"}
LATEX = {"lam": r"\lambda", "eps": r"\varepsilon"}
TERM = re.compile(r"_i_(\d+)$")
LOW_DIGITS = str.maketrans("0123456789", "₀₁₂₃₄₅₆₇₈₉")
DIGITS = str.maketrans("0123456789+-/", "⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻ᐟ")


class LineWriter:
    """Write an expression on one line. Subclasses choose the words; this class chooses brackets and fractions."""

    times = "*"

    def write(self, expression: sympy.Expr) -> str:
        """Give the expression as one line."""
        return self._walk(flatten(expression))[0]

    def symbol(self, name: str) -> str:
        """Give a symbol's spelling."""
        return name

    def number(self, value: sympy.Rational) -> str:
        """Give a number's spelling."""
        return str(value)

    def power(self, base: str, exponent: sympy.Expr) -> str:
        """Give ``base`` raised to ``exponent``."""
        return f"{base}**{self._bracketed(exponent, POWER)}"

    def root(self, inside: str) -> str:
        """Give the square root of ``inside``."""
        return f"sqrt({inside})"

    def call(self, name: str, arguments: list[str]) -> str:
        """Give a function call."""
        return f"{name}({', '.join(arguments)})"

    def constant(self, name: str) -> str:
        """Give the spelling of pi."""
        return name

    def _bracketed(self, expression: sympy.Expr, least: int) -> str:
        text, level = self._walk(expression)
        return text if level >= least else f"({text})"

    def _walk(self, expression: sympy.Expr) -> tuple[str, int]:
        """Give the text of an expression and how tightly it binds."""
        if expression is sympy.pi:
            return self.constant("pi"), ATOM
        match expression:
            case sympy.Symbol():
                found = self.symbol(expression.name), ATOM
            case sympy.Rational():
                level = ATOM if expression.is_integer and expression >= 0 else SIGN if expression < 0 else PRODUCT
                found = self.number(expression), level
            case sympy.Add():
                found = self._sum(expression), SUM
            case sympy.Mul():
                found = self._product(expression)
            case sympy.Pow():
                found = self._power(expression)
            case sympy.Piecewise():
                found = self._choice(expression), ATOM
            case _:
                found = self._call(expression), ATOM
        return found

    def _choice(self, expression: sympy.Piecewise) -> str:
        """Give an expression with cases, the last of which holds where no other does."""
        *cases, (other, _) = expression.args
        text = self._walk(other)[0]
        for value, condition in reversed(cases):
            text = self.choice(self._walk(value)[0], self._condition(condition), text)
        return text

    def _condition(self, condition: sympy.Basic) -> str:
        """Give a comparison, or several joined by and / or."""
        if isinstance(condition, (sympy.Or, sympy.And)):
            word = " or " if isinstance(condition, sympy.Or) else " and "
            return word.join(self._condition(part) for part in sorted(condition.args, key=str))
        left, right = (self._walk(side)[0] for side in (condition.lhs, condition.rhs))
        return f"{left} {condition.rel_op} {right}"

    def choice(self, first: str, condition: str, other: str) -> str:
        """Give ``first`` where the condition holds, ``other`` elsewhere."""
        return f"({first} if {condition} else {other})"

    def _sum(self, expression: sympy.Add) -> str:
        text = ""
        for term in expression.args:
            is_negative = term.could_extract_minus_sign()
            body = self._bracketed(flatten(_negated(term)) if is_negative else term, PRODUCT)
            if text:
                text += f" - {body}" if is_negative else f" + {body}"
            else:
                text = f"-{body}" if is_negative else body
        return text

    def _product(self, expression: sympy.Mul) -> tuple[str, int]:
        above: list[sympy.Expr] = []
        below: list[sympy.Expr] = []
        is_negative = False
        for factor in expression.args:
            if factor == -1:
                is_negative = not is_negative
            elif isinstance(factor, sympy.Pow) and factor.exp.could_extract_minus_sign():
                below.append(_inverse(factor))
            elif isinstance(factor, sympy.Rational) and not factor.is_integer:
                is_negative ^= bool(factor < 0)
                above.extend([sympy.Integer(abs(factor.p))] if abs(factor.p) != 1 else [])
                below.append(sympy.Integer(factor.q))
            else:
                above.append(factor)
        text = self.times.join(self._bracketed(factor, SIGN) for factor in above) or "1"
        if below:
            under = self.times.join(self._bracketed(factor, SIGN) for factor in below)
            text = f"{text}/({under})" if len(below) > 1 else f"{text}/{self._bracketed(below[0], POWER)}"
        return (f"-{text}", SIGN) if is_negative else (text, PRODUCT if below or len(above) > 1 else SIGN)

    def _power(self, expression: sympy.Pow) -> tuple[str, int]:
        base, exponent = expression.base, expression.exp
        if exponent.could_extract_minus_sign():
            return f"1/{self._bracketed(_inverse(expression), POWER)}", PRODUCT
        if exponent == sympy.Rational(1, 2):
            return self.root(self._walk(base)[0]), ATOM
        if base is sympy.E:
            return self.call("exp", [self._walk(exponent)[0]]), ATOM
        return self.power(self._bracketed(base, ATOM), exponent), POWER

    def _call(self, expression: sympy.Expr) -> str:
        name = expression.func.__name__
        arguments = [self._walk(argument)[0] for argument in expression.args]
        return self.call(name, arguments)


def _negated(term: sympy.Expr) -> sympy.Expr:
    if isinstance(term, sympy.Mul):
        for place, factor in enumerate(term.args):
            if factor.is_number and factor.could_extract_minus_sign():
                rest = [*term.args[:place], *([] if factor == -1 else [-factor]), *term.args[place + 1 :]]
                return rest[0] if len(rest) == 1 else sympy.Mul(*rest, evaluate=False)
    return -term


def _inverse(factor: sympy.Pow) -> sympy.Expr:
    exponent = -factor.exp
    return factor.base if exponent == 1 else sympy.Pow(factor.base, exponent, evaluate=False)


class PythonWriter(LineWriter):
    """Write Python that uses ``math`` names and a ``gas`` object."""

    def number(self, value: sympy.Rational) -> str:
        """Give an integer as it is, a fraction as a float or a quotient."""
        return str(value) if value.is_integer else repr(float(value))

    def power(self, base: str, exponent: sympy.Expr) -> str:
        """Give whole powers with ``**`` and others with ``pow`` of math, which refuses what is not real."""
        if isinstance(exponent, sympy.Integer):
            return f"{base}**{exponent}"
        return f"pow({base}, {self._walk(exponent)[0]})"

    def call(self, name: str, arguments: list[str]) -> str:
        """Give a call of a math function or of the gas model."""
        if name in GAS_FUNCTIONS:
            return f"gas.{GAS_FUNCTIONS[name].method}({', '.join(arguments)})"
        if name not in FUNCTIONS:
            raise SpecError(
                where="generator.printers",
                found=f"the function {name}",
                expected=f"one of {', '.join(FUNCTIONS)} or a gas function of spec.symbols",
                todo="add it to FUNCTIONS together with the engine's import",
            )
        return super().call(FUNCTIONS[name], arguments)

    def each(self, expression: sympy.Expr, lists: Sequence[sympy.Symbol], ending: str = "terms") -> str:
        """Give a list: the expression at every term of ``lists``."""
        return f"[{self._over(expression, lists, ending)}]"

    def _over(self, expression: sympy.Expr, lists: Sequence[sympy.Symbol], ending: str) -> str:
        names = [symbol.name for symbol in lists]
        whole = [f"{name.removesuffix('_i')}_{ending}" for name in names]
        source = whole[0] if len(whole) == 1 else f"zip({', '.join(whole)}, strict=True)"
        return f"{self.write(expression)} for {', '.join(names)} in {source}"

    def _call(self, expression: sympy.Expr) -> str:
        if isinstance(expression, sympy.Derivative):
            return self._slope(expression)
        if isinstance(expression, (Total, Others)):
            lists = sorted((symbol for symbol in expression.free_symbols if is_list(symbol)), key=str)
            return f"sum({self._over(expression.args[0], lists, TERMS[type(expression)])})"
        return super()._call(expression)

    def _slope(self, expression: sympy.Derivative) -> str:
        inner = expression.expr
        function = GAS_FUNCTIONS[inner.func.__name__]
        method = function.slopes[inner.args.index(expression.variables[0])]
        return f"gas.{method}({', '.join(self._walk(argument)[0] for argument in inner.args)})"


class TextWriter(LineWriter):
    """Write a line for people, with superscripts and thin products."""

    times = "·"

    def symbol(self, name: str) -> str:
        """Give the symbol as printed, such as ``ρ_0``."""
        return symbol_text(name)

    def number(self, value: sympy.Rational) -> str:
        """Give a number as printed."""
        return str(value).replace("-", "−")

    def power(self, base: str, exponent: sympy.Expr) -> str:
        """Give integer powers as superscripts and others with a caret."""
        if isinstance(exponent, sympy.Integer):
            return base + str(exponent).translate(DIGITS)
        return f"{base}^{self._bracketed(exponent, ATOM)}"

    def root(self, inside: str) -> str:
        """Give a root sign with brackets."""
        return f"√({inside})"

    def constant(self, name: str) -> str:
        """Give π."""
        return GREEK[name]

    def choice(self, first: str, condition: str, other: str) -> str:
        """Give the case and its condition in words."""
        return f"[{first} where {condition.replace('>=', '≥').replace('<=', '≤')}, else {other}]"

    def _call(self, expression: sympy.Expr) -> str:
        if isinstance(expression, sympy.Derivative):
            return f"∂{self._walk(expression.expr)[0]}/∂{self._walk(expression.variables[0])[0]}"
        return super()._call(expression)

    def call(self, name: str, arguments: list[str]) -> str:
        """Give a call, with ln for the natural logarithm and the gas model's functions by their symbols."""
        word = {"log": "ln", "rho_gas": "ρ", "Total": "Σ", "Others": "Σ′"}.get(name, name)
        return f"{word}({', '.join(arguments)})"

    def write(self, expression: sympy.Expr) -> str:
        """Give the expression as one line with a true minus sign."""
        return super().write(with_decimals(expression)).replace(" - ", " − ").replace("-", "−")


def name_choices(relation: Relation, text: str) -> str:
    """Write the words of a variable with choices in place of the bounds between their numbers."""
    for symbol, meaning in relation.where.items():
        for place, word in enumerate(getattr(meaning, "choices", ())):
            half = 2 * place + 1
            text = text.replace(f"{symbol_text(symbol.name)} < {half}/2", word)
            text = text.replace(rf"{symbol_latex(symbol.name)} < \frac{{{half}}}{{2}}", rf"\text{{{word}}}")
    return text


def with_decimals(expression: sympy.Expr) -> sympy.Expr:
    """Write fractions over tens, hundreds and so on as decimals, 0.5961 rather than 5961/10000; thirds stay."""
    if isinstance(expression, sympy.Rational) and expression.q % 5 == 0 and TENS % expression.q == 0:
        digits = sympy.Symbol(f"{Decimal(abs(expression.p)) / expression.q:f}", positive=True)
        return digits if expression > 0 else sympy.Mul(-1, digits, evaluate=False)
    if not expression.args or isinstance(expression, sympy.Derivative):
        return expression
    arguments = [with_decimals(argument) for argument in expression.args]
    if isinstance(expression, (sympy.Add, sympy.Mul, sympy.Pow)):
        return expression.func(*arguments, evaluate=False)
    return expression.func(*arguments)


def symbol_text(name: str) -> str:
    """Give a symbol's name with its Greek letter and digits set low: ``rho_0`` becomes ``ρ₀``."""
    head, _, tail = TERM.sub(r"_\1", name).partition("_")
    if head.startswith("d") and len(head) > 1 and head[1:] in ("p", "T", "p2"):
        head = "Δ" + head[1:]
    low = tail.translate(LOW_DIGITS) if tail.isdigit() else f"_{tail}"
    return GREEK.get(head, head) + (low if tail else "")


def symbol_latex(name: str) -> str:
    """Give a symbol in LaTeX: letters alone in italics, long subscripts upright."""
    head, _, tail = TERM.sub(r"_\1", name).partition("_")
    if head.startswith("d") and len(head) > 1:
        body = r"\Delta " + head[1:]
    elif head in GREEK:
        body = LATEX.get(head, "\\" + head)
    elif head == "ndot":
        body = r"\dot{n}"
    else:
        body = head if len(head) == 1 else rf"\mathrm{{{head}}}"
    if not tail:
        return body
    parts = [part if len(part) == 1 else rf"\mathrm{{{part}}}" for part in tail.split("_")]
    return f"{body}_{{{','.join(parts)}}}"


def latex(expression: sympy.Expr) -> str:
    """Give an unevaluated expression in LaTeX, in the order it was written."""
    names = {symbol: symbol_latex(symbol.name) for symbol in expression.free_symbols}
    text = sympy.latex(flatten(with_decimals(expression)), order="none", symbol_names=names)
    return (
        str(text)
        .replace(r"\operatorname{rho_{gas}}", r"\rho_{\mathrm{gas}}")
        .replace(r"\rho_{gas}", r"\rho_{\mathrm{gas}}")
    )


def mathml(text: str, *, display: str = "block") -> str:
    """Give a ``<math>`` element for LaTeX, with characters that Markdown would read written as references."""
    element = convert(text, display=display)
    return re.sub(r"(?<=>)[^<]+(?=<)", lambda found: found.group().translate(MARKDOWN), element)


MARKDOWN: Mapping[int, str] = {ord(mark): f"&#{ord(mark)};" for mark in "*_[]\\|~!`"}


def equation_mathml(left: sympy.Expr, right: sympy.Expr) -> str:
    """Give ``left = right`` as a ``<math>`` element."""
    return mathml(f"{latex(left)} = {latex(right)}")
