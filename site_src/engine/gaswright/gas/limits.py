"""Where a real gas is a gas: the phase decision and its refusals.

Takes an isotherm with a pressure or a density; gives nothing, or raises with the saturation pressure in the message.
The gas comes next.
"""

from gaswright.errors import OutsideRangeError, ReadingError
from gaswright.gas.ancillary import along_saturation, melting_pressure
from gaswright.gas.helmholtz import Isotherm
from gaswright.gas.record import Equation, Identity
from gaswright.gas.saturation import saturation
from gaswright.gas.solve_density import gas_root

FAR_PRESSURE = 0.97
FAR_DENSITY = 0.93
ROUNDING = 1.0 + 1e-10
LEAST, MOST = 1e-100, 1e100


def celsius(T: float) -> str:
    """Return T [K] in words, in degrees Celsius."""
    return f"{T - 273.15:,.2f} °C".replace("-", "−")


def bar(p: float) -> str:
    """Return p [Pa] in words, in bar absolute."""
    value = p / 1e5
    return f"{value:,.6g} bar absolute".replace("-", "−")


def demand_number(name: str, quantity: str, value: float, unit: str) -> None:
    """Raise ReadingError unless `value` is a positive number, neither so small nor so large that floats give out."""
    if not LEAST < value < MOST:
        raise ReadingError(
            f"{quantity} of {name}",
            f"{value!r} {unit}",
            "a number greater than zero",
            f"Enter the absolute {quantity} above zero.",
        )


def demand_temperature(who: Identity, equation: Equation, T: float) -> None:
    """Raise unless T [K] is inside the equation's limits."""
    demand_number(who.title, "temperature", T, "K")
    if not equation.T_MIN <= T <= equation.T_MAX:
        raise OutsideRangeError(
            f"temperature of {who.title}",
            celsius(T),
            f"{celsius(equation.T_MIN)} to {celsius(equation.T_MAX)}, the range of its equation of state",
            "Check the temperature and its unit.",
        )


def demand_pressure_limit(who: Identity, equation: Equation, p: float) -> None:
    """Raise unless p [Pa] is inside the equation's limits."""
    demand_number(who.title, "pressure", p, "Pa")
    if p > equation.P_MAX:
        raise OutsideRangeError(
            f"pressure of {who.title}",
            bar(p),
            f"at most {bar(equation.P_MAX)}, the range of its equation of state",
            "Check the pressure and its unit.",
        )


def demand_gas(who: Identity, isotherm: Isotherm, p: float) -> None:
    """Raise unless the substance is a gas at p [Pa]: neither liquid, supercritical liquid, two-phase nor solid."""
    equation, T = isotherm.equation, isotherm.T
    if T >= equation.T_CRITICAL:
        _demand_unfrozen(who, equation, p, T)
    elif p > equation.P_CRITICAL:
        _refuse(who, p, T, "a compressed liquid", dew_pressure(isotherm))
    elif not _is_far_below_dew(equation, p, T):
        _demand_below_dew(who, isotherm, p)


def _is_far_below_dew(equation: Equation, p: float, T: float) -> bool:
    near = along_saturation(equation.DEW_P, T)
    return near is not None and p < FAR_PRESSURE * near


def _demand_below_dew(who: Identity, isotherm: Isotherm, p: float) -> None:
    dew = dew_pressure(isotherm)
    if p <= dew * ROUNDING:
        return
    bubble = along_saturation(isotherm.equation.BUBBLE_P, isotherm.T) if isotherm.equation.PSEUDO_PURE else None
    is_mixed = bubble is not None and p < bubble
    _refuse(who, p, isotherm.T, "partly liquid" if is_mixed else "a liquid", dew)


def dew_pressure(isotherm: Isotherm) -> float:
    """Return the pressure [Pa] above which the gas condenses, below its critical temperature.

    Of a pure gas, from equal Gibbs energy; of air, from its stated dew line, whose end is the critical pressure here.
    """
    equation = isotherm.equation
    if not equation.PSEUDO_PURE:
        return saturation(isotherm).p
    return along_saturation(equation.DEW_P, isotherm.T) or equation.P_CRITICAL


def _demand_unfrozen(who: Identity, equation: Equation, p: float, T: float) -> None:
    freezing = melting_pressure(equation, T)
    if freezing is not None and p > freezing:
        raise OutsideRangeError(
            who.title,
            f"{bar(p)} at {celsius(T)}, where it is solid",
            f"at most {bar(freezing)}, its melting pressure at that temperature",
            "Check the pressure, the temperature and their units.",
        )


def _refuse(who: Identity, p: float, T: float, what: str, dew: float) -> None:
    raise OutsideRangeError(
        who.title,
        f"{bar(p)} at {celsius(T)}, where it is {what}",
        f"a gas: below {bar(dew)}, its saturation pressure at {celsius(T)}",
        "Weigh it instead, or enter a lower pressure or a higher temperature.",
    )


def demand_gas_density(who: Identity, isotherm: Isotherm, rho: float) -> None:
    """Raise unless the substance is a gas at the molar density rho [mol/m3]."""
    equation, T = isotherm.equation, isotherm.T
    demand_number(who.title, "density", rho, "mol/m³")
    if T >= equation.T_CRITICAL:
        return
    near = along_saturation(equation.VAPOUR_RHO, T)
    if near is not None and rho < FAR_DENSITY * near:
        return
    limit = _vapour_density(isotherm)
    if rho > limit * ROUNDING:
        _refuse_density(who, isotherm, rho, limit)


def _vapour_density(isotherm: Isotherm) -> float:
    if not isotherm.equation.PSEUDO_PURE:
        return saturation(isotherm).vapour
    return gas_root(isotherm, dew_pressure(isotherm)) or isotherm.equation.RHO_CRITICAL


def _refuse_density(who: Identity, isotherm: Isotherm, rho: float, limit: float) -> None:
    mass = isotherm.equation.MOLAR_MASS
    raise OutsideRangeError(
        who.title,
        f"{rho * mass:,.6g} kg/m³ at {celsius(isotherm.T)}, where part or all of it is liquid",
        f"a gas: below {limit * mass:,.6g} kg/m³, "
        f"at its saturation pressure {bar(dew_pressure(isotherm))} at {celsius(isotherm.T)}",
        "Weigh it instead, or enter a lower density or a higher temperature.",
    )
