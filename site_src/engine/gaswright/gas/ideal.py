"""The same gas by the ideal gas law, behind the same interface.

Takes a real gas; gives what the ideal law says of it, so that a whole sheet can be computed both ways.
Sheets and pages come next. It refuses nothing but numbers that are none: the ideal law knows no liquid.
"""

from gaswright.gas.caloric import NO_RESIDUAL, Caloric, caloric
from gaswright.gas.ideal_part import ideal_part
from gaswright.gas.limits import demand_number
from gaswright.gas.real import Gas
from gaswright.gas.record import Uncertainty

MOLAR_GAS_CONSTANT = 8.31446261815324  # J/(mol K), exact: 2019 SI, k·N_A, CODATA 2018


class IdealGas(Gas):
    """The ideal gas law rho = p·M/(R·T), with the molar mass of the real gas and the exact SI value of R."""

    is_ideal = True

    def __init__(self, gas: Gas) -> None:
        """Take the identity and molar mass of `gas`."""
        super().__init__(gas.identity, gas.coefficients)
        self.R = MOLAR_GAS_CONSTANT
        self.equation = "ideal gas law"

    def molar_density(self, p: float, T: float, *, check_phase: bool = True) -> float:  # noqa: ARG002 - one phase only
        """Return p/(R·T) [mol/m3]."""
        demand_number(self.title, "pressure", p, "Pa")
        demand_number(self.title, "temperature", T, "K")
        return p / (self.R * T)

    def pressure_at(self, molar_density: float, T: float, *, check_phase: bool = True) -> float:  # noqa: ARG002 - one phase only
        """Return the pressure [Pa] at a molar density [mol/m3] and T [K]."""
        demand_number(self.title, "density", molar_density, "mol/m³")
        demand_number(self.title, "temperature", T, "K")
        return molar_density * self.R * T

    def pressure_drho(self, rho: float, T: float) -> float:
        """Return the slope of pressure with density at constant temperature [Pa m3/kg]."""
        self.pressure(rho, T)
        return self.R * T / self.molar_mass

    def pressure_dT(self, rho: float, T: float) -> float:
        """Return the slope of pressure with temperature at constant density [Pa/K]."""
        return self.pressure(rho, T) / T

    def temperature(self, p: float, rho: float) -> float:
        """Return p·M/(rho·R) [K]."""
        demand_number(self.title, "pressure", p, "Pa")
        demand_number(self.title, "density", rho, "kg/m³")
        return p * self.molar_mass / (rho * self.R)

    def properties(self, p: float, T: float) -> Caloric:
        """Return heat capacities, speed of sound and their kin of the ideal gas at p [Pa] and T [K]."""
        rho = self.molar_density(p, T)
        equation = self.coefficients
        ideal = ideal_part(equation, rho / equation.RHO_REDUCING, equation.T_REDUCING / T)
        return caloric(self.R, self.molar_mass, T, rho, NO_RESIDUAL, ideal)

    def uncertainty(self, p: float, T: float) -> Uncertainty:  # noqa: ARG002 - the same everywhere
        """Return zero: the law's own value; how far it is from the real gas is told by the real gas."""
        return Uncertainty(
            float("inf"), float("inf"), 0.0, "the ideal gas law as it stands, without its departure from the real gas"
        )
