"""A real pure gas, or air, by its reference equation of state.

Takes an identity and an emitted equation; gives density, pressure, temperature, saturation and properties with
exact derivatives, in SI, and refuses states where it is no gas.
Relations, sheets and pages come next.
"""

from math import isfinite

from gaswright.errors import OutsideRangeError
from gaswright.gas.caloric import Caloric, caloric
from gaswright.gas.helmholtz import Isotherm
from gaswright.gas.ideal_part import ideal_part
from gaswright.gas.limits import (
    bar,
    celsius,
    demand_gas,
    demand_gas_density,
    demand_number,
    demand_pressure_limit,
    demand_temperature,
    dew_pressure,
)
from gaswright.gas.record import Equation, Identity, Uncertainty
from gaswright.gas.saturation import Saturation, saturation
from gaswright.gas.solve_density import gas_root
from gaswright.gas.temperature import coldest_gas, solve_temperature

FLAT = 1e-12


class Gas:
    """A real gas: densities in kg/m3, pressures in Pa absolute, temperatures in K; molar mass in kg/mol.

    Every method raises ReadingError for a number that is none, and OutsideRangeError where the state is liquid,
    compressed liquid, partly liquid, solid, or outside the limits of the equation.
    """

    is_ideal = False

    def __init__(self, identity: Identity, equation: Equation) -> None:
        """Join who the gas is and its equation."""
        self.identity = identity
        self.coefficients = equation
        self._isotherm: Isotherm | None = None
        self.key, self.title, self.formula = identity.key, identity.title, identity.formula
        self.equation = identity.citation
        self.molar_mass, self.R = equation.MOLAR_MASS, equation.R
        self.T_min, self.T_max, self.p_max = equation.T_MIN, equation.T_MAX, equation.P_MAX
        self.T_c, self.p_c = equation.T_CRITICAL, equation.P_CRITICAL
        self.rho_c = equation.RHO_CRITICAL * equation.MOLAR_MASS

    def __repr__(self) -> str:
        """Return the key, as code would find the gas."""
        return f"{type(self).__name__}({self.key!r})"

    def density(self, p: float, T: float) -> float:
        """Return the density [kg/m3] of the gas at p [Pa] and T [K]."""
        return self.molar_density(p, T) * self.molar_mass

    def molar_density(self, p: float, T: float, *, check_phase: bool = True) -> float:
        """Return the density [mol/m3] at p [Pa] and T [K]; unchecked, the gas branch also beyond its dew line."""
        isotherm = self._at(T)
        demand_pressure_limit(self.identity, self.coefficients, p)
        if check_phase:
            demand_gas(self.identity, isotherm, p)
        rho = gas_root(isotherm, p)
        if rho is None:
            raise self._no_root(p, T)
        return rho

    def density_dp(self, p: float, T: float) -> float:
        """Return the slope of density with pressure at constant temperature [kg/(m3 Pa)]."""
        return 1.0 / self._stiffness(self.density(p, T), T)

    def density_dT(self, p: float, T: float) -> float:
        """Return the slope of density with temperature at constant pressure [kg/(m3 K)]."""
        rho = self.density(p, T)
        return -self.pressure_dT(rho, T) / self._stiffness(rho, T)

    def pressure(self, rho: float, T: float) -> float:
        """Return the pressure [Pa] of the gas at density rho [kg/m3] and T [K]."""
        return self.pressure_at(rho / self.molar_mass, T)

    def pressure_at(self, molar_density: float, T: float, *, check_phase: bool = True) -> float:
        """Return the pressure [Pa] at a molar density [mol/m3] and T [K]; unchecked, whatever the equation says."""
        isotherm = self._at(T)
        demand_number(self.title, "density", molar_density, "mol/m³")
        if check_phase:
            demand_gas_density(self.identity, isotherm, molar_density)
        x = molar_density / self.coefficients.RHO_REDUCING
        p = molar_density * self.R * T * (1.0 + isotherm.slopes(x)[1])
        if not isfinite(p):
            raise self._no_pressure(molar_density, T)
        if check_phase:
            demand_pressure_limit(self.identity, self.coefficients, p)
            demand_gas(self.identity, isotherm, p) if self.T_c <= T else None
        return p

    def pressure_drho(self, rho: float, T: float) -> float:
        """Return the slope of pressure with density at constant temperature [Pa m3/kg]."""
        self.pressure(rho, T)
        _, b, c = self._at(T).slopes(self._reduced(rho))
        return self.R * T * (1.0 + b + b + c) / self.molar_mass

    def pressure_dT(self, rho: float, T: float) -> float:
        """Return the slope of pressure with temperature at constant density [Pa/K]."""
        self.pressure(rho, T)
        part = self._at(T).full(self._reduced(rho))
        return rho / self.molar_mass * self.R * (1.0 + part.x - part.xt)

    def temperature(self, p: float, rho: float) -> float:
        """Return the temperature [K] at which the gas of density rho [kg/m3] has the pressure p [Pa]."""
        demand_pressure_limit(self.identity, self.coefficients, p)
        demand_number(self.title, "density", rho, "kg/m³")
        molar = rho / self.molar_mass
        low = coldest_gas(self.coefficients, molar)
        T = solve_temperature(self._at, p, molar, low, self.T_max)
        if abs(self.pressure(rho, T) / p - 1.0) > 1e-9:
            raise self._no_temperature(p, rho, low)
        return T

    def compressibility(self, p: float, T: float) -> float:
        """Return Z = p·M/(rho·R·T) at p [Pa] and T [K]."""
        return p / (self.molar_density(p, T) * self.R * T)

    def saturation_pressure(self, T: float) -> float | None:
        """Return the pressure [Pa] above which the gas condenses at T [K]; None from the critical temperature up."""
        isotherm = self._at(T)
        return None if self.T_c <= T else dew_pressure(isotherm)

    def saturation(self, T: float) -> Saturation | None:
        """Return saturation pressure [Pa] and densities [mol/m3] at T [K]; None where there is none, and for air."""
        isotherm = self._at(T)
        return None if self.T_c <= T or self.coefficients.PSEUDO_PURE else saturation(isotherm)

    def properties(self, p: float, T: float) -> Caloric:
        """Return heat capacities, speed of sound and their kin at p [Pa] and T [K]."""
        rho = self.molar_density(p, T)
        self._stiffness(rho * self.molar_mass, T)
        isotherm = self._at(T)
        x = rho / self.coefficients.RHO_REDUCING
        ideal = ideal_part(self.coefficients, x, isotherm.tau)
        return caloric(self.R, self.molar_mass, T, rho, isotherm.full(x), ideal)

    def uncertainty(self, p: float, T: float) -> Uncertainty:
        """Return what is stated on the uncertainty of density at p [Pa] and T [K], with its origin."""
        for band in self.identity.uncertainties:
            if band.T_to >= T and band.p_to >= p:
                return band
        return self.identity.uncertainties[-1]

    def density_uncertainty(self, p: float, T: float) -> float:
        """Return the relative expanded uncertainty (k = 2) of density that the equation's paper states."""
        return self.uncertainty(p, T).relative

    def _at(self, T: float) -> Isotherm:
        """Return the isotherm at T [K], kept from the last call where T is the same."""
        kept = self._isotherm
        if kept is not None and kept.T == T:
            return kept
        demand_temperature(self.identity, self.coefficients, T)
        self._isotherm = kept = Isotherm(self.coefficients, T)
        return kept

    def _stiffness(self, rho: float, T: float) -> float:
        """Return the slope of pressure with density [Pa m3/kg], refused where it is lost in rounding."""
        slope = self.pressure_drho(rho, T)
        if slope * self.molar_mass < FLAT * self.R * T:
            raise OutsideRangeError(
                self.title,
                f"{celsius(T)} and {rho:,.6g} kg/m³, the critical point",
                "a state away from the critical point, where a small change of pressure has a bounded effect",
                "Enter a pressure or temperature a little different.",
            )
        return slope

    def _reduced(self, rho: float) -> float:
        return rho / self.molar_mass / self.coefficients.RHO_REDUCING

    def _no_root(self, p: float, T: float) -> OutsideRangeError:
        return OutsideRangeError(
            self.title,
            f"{bar(p)} at {celsius(T)}, where the equation has no gas state",
            "a pressure at which a gas exists",
            "Enter a lower pressure or a higher temperature.",
        )

    def _no_pressure(self, molar_density: float, T: float) -> OutsideRangeError:
        return OutsideRangeError(
            self.title,
            f"{molar_density * self.molar_mass:,.6g} kg/m³ at {celsius(T)}, far denser than any fluid",
            "a density that the equation of state reaches",
            "Check the density and its unit.",
        )

    def _no_temperature(self, p: float, rho: float, low: float) -> OutsideRangeError:
        return OutsideRangeError(
            self.title,
            f"{bar(p)} with a density of {rho:,.6g} kg/m³",
            f"a pressure that this density has as a gas between {celsius(low)} and {celsius(self.T_max)}",
            "Check the pressure and the density.",
        )
