# Formulas that call formulas, classes and tables. Each section is a text of its own: the right form, then its usual slip.
# Sources: textbook formulas as in the other files, from memory, common practice.

# ==== Friction loss through three functions ====
# White, Fluid Mechanics, 8th ed., chapter 6
from math import log10, pi


def velocity(Q, D):
    """Mean velocity.

    Parameters
    ----------
    Q : float
        Flow [m^3/s]
    D : float
        Diameter [m]

    Returns
    -------
    V : float
        Velocity [m/s]
    """
    return 4 * Q / (pi * D**2)


def reynolds(V, D, nu=1.0e-6):
    """Reynolds number.

    Parameters
    ----------
    V : float
        Velocity [m/s]
    D : float
        Diameter [m]
    nu : float
        Kinematic viscosity [m^2/s]

    Returns
    -------
    Re : float
        Reynolds number [-]
    """
    return V * D / nu


def smooth_friction(Re):
    """Friction factor of a smooth pipe, explicit form of Filonenko."""
    return (1.82 * log10(Re) - 1.64)**-2


def head_loss(L, D, Q):
    """Head loss of a smooth pipe.

    Parameters
    ----------
    L : float
        Length [m]
    D : float
        Diameter [m]
    Q : float
        Flow [m^3/s]

    Returns
    -------
    h : float
        Head loss [m]
    """
    g = 9.81  # [m/s^2]
    V = velocity(Q, D)
    f = smooth_friction(reynolds(V, D))
    return f * L / D * V**2 / (2 * g)


Q_lps = 3.2     # [L/s]
h = head_loss(120.0, 0.0525, Q_lps / 1000)      # [m]
h_slip = head_loss(120.0, 0.0525, Q_lps)
#                                 ^^^^^ scale-mismatch: L/s
Re_slip = reynolds(Q_lps, 0.0525)
#                  ^^^^^ unlike-result


# ==== A helper that knows no units ====
# from memory, common practice
def weighted(a, b, w):
    return w * a + (1 - w) * b


T = weighted(62.0, 41.0, 0.3)   # [degC]
p1 = 1.2e5      # [Pa]
p2 = 1.8e5      # [Pa]
L1 = 0.4        # [m]
p = weighted(p1, p2, 0.5)       # [Pa]
L = weighted(L1, 0.6, 0.5)      # [m]
x = weighted(p1, L1, 0.5)
# <-- unlike-terms


# ==== Fields of a dataclass ====
# White, Fluid Mechanics, 8th ed., chapter 6
from dataclasses import dataclass


@dataclass
class Pipe:
    L: float        # [m] length
    D: float        # [mm] inside diameter
    k: float = 0.05     # [mm] roughness

    def area(self):
        return 3.14159 * (self.D / 1000)**2 / 4     # m^2

    def relative_roughness(self):
        return self.k / self.D


suction = Pipe(4.2, 52.5)
Q = 0.0032      # [m^3/s]
slender = suction.L * 1000 / suction.D          # [-]
V = Q / (3.14159 * (suction.D / 1000)**2 / 4)   # [m/s]
V_slip = Q / (3.14159 * suction.D**2 / 4)       # [m/s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch
total = suction.L + suction.D
#       ^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Attributes of a class ====
# Den Hartog, Mechanical Vibrations, chapter 2
import math


class Oscillator:
    """A mass on a spring with a damper.

    Parameters
    ----------
    m : float
        Mass [kg]
    k : float
        Stiffness [N/m]
    c : float
        Damping [N s/m]
    """

    def __init__(self, m, k, c):
        self.m = m
        self.k = k
        self.c = c
        self.omega = math.sqrt(k / m)   # [rad/s]

    def ratio(self):
        return self.c / (2 * math.sqrt(self.k * self.m))    # [-]

    def damped(self):
        zeta = self.ratio()
        return self.omega * math.sqrt(1 - zeta**2)

    def force(self, x, v):
        """Force at a position and a velocity.

        :param x: position [m]
        :param v: velocity [m/s]
        :return: force [N]
        """
        return -self.k * x - self.c * v

    def force_slip(self, x, v):
        """Force, damper and spring exchanged.

        :param x: position [m]
        :param v: velocity [m/s]
        :return: force [N]
        """
        return -self.c * x - self.k * v
        #      ^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Table with units in its entries ====
# ISO 80000-5 symbols; values from memory
water = {
    "rho": 998.2,   # [kg/m^3]
    "mu": 1.0e-3,   # [Pa s]
    "cp": 4.186,    # [kJ/(kg K)]
}
V = 1.4             # [m/s]
D = 0.0525          # [m]
k = 0.6             # [W/(m K)]
Re = water["rho"] * V * D / water["mu"]         # [-]
Pr = water["mu"] * water["cp"] * 1000 / k       # [-]
Pe = Re * Pr                                    # [-]
Pr_slip = water["mu"] * water["cp"] / k         # [-]
#         ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Several results ====
# Cengel and Boles, Thermodynamics, 8th ed., chapter 7
def compress(T1, p1, ratio, cp, k):
    """Outlet temperature and specific work of a compressor.

    Parameters
    ----------
    T1 : float
        Inlet temperature [K]
    p1 : float
        Inlet pressure [bar]
    ratio : float
        Pressure ratio [-]
    cp : float
        Heat capacity [J/(kg K)]
    k : float
        Ratio of the heat capacities [-]

    Returns
    -------
    T2 : float
        Outlet temperature [K]
    w : float
        Specific work [J/kg]
    """
    T2 = T1 * ratio**((k - 1) / k)
    w = cp * (T2 - T1)
    return T2, w


T2, w = compress(293.15, 1.0, 2.8, 1005.0, 1.4)
m_dot = 0.42        # [kg/s]
P = m_dot * w       # [W]
dT = T2 - 293.15
P_slip = m_dot * T2     # [W]
#        ^^^^^^^^^^ unlike-result


# ==== Results exchanged ====
# Cengel and Boles, 8th ed., chapter 7
def state(T, cp, R, k):
    """Speed of sound and enthalpy of an ideal gas.

    Parameters
    ----------
    T : float
        Temperature [K]
    cp : float
        Heat capacity [J/(kg K)]
    R : float
        Gas constant [J/(kg K)]
    k : float
        Ratio of the heat capacities [-]

    Returns
    -------
    c : float
        Speed of sound [m/s]
    h : float
        Enthalpy [J/kg]
    """
    c = (k * R * T)**0.5
    h = cp * T
    return h, c
    #      ^ unlike-result
    #         ^ unlike-result


# ==== Properties as functions with units of their own ====
# density and viscosity of water, straight lines through table values; from memory
def rho_water(T):
    """Density of water.

    Args:
        T (float): temperature [degC]

    Returns:
        float: density [kg/m^3]
    """
    # empirical: T [degC], rho [kg/m^3]
    rho = 1000.6 - 0.07 * T - 0.0036 * T**2
    return rho


def buoyancy(V, T):
    """Buoyancy force.

    Args:
        V (float): volume [L]
        T (float): temperature of the water [degC]

    Returns:
        float: force [N]
    """
    g = 9.81  # [m/s^2]
    return rho_water(T) * g * V / 1000


def buoyancy_slip(V, T):
    """Buoyancy force, temperature in kelvins.

    Args:
        V (float): volume [L]
        T (float): temperature of the water [K]

    Returns:
        float: force [N]
    """
    g = 9.81  # [m/s^2]
    return rho_water(T) * g * V / 1000
    #                ^ scale-mismatch


# ==== Settings carried in an object ====
# Karassik et al., Pump Handbook, 4th ed., chapter 2
class Pump:
    def __init__(self):
        self.Q = 42.0       # [m^3/h] flow
        self.H = 18.0       # [m] head
        self.eta = 0.71     # [-]
        self.rho = 998.2    # [kg/m^3]

    def power(self):
        g = 9.81            # [m/s^2]
        return self.rho * g * self.Q / 3600 * self.H / self.eta     # W

    def annual_energy(self, hours):
        P = self.power()    # [W]
        return P * hours / 1000


pump = Pump()
margin = pump.H - 2.5
too_much = pump.Q + pump.H
#          ^^^^^^^^^^^^^^^ unlike-terms

# ==== Units through annotated objects ====
# common practice
from dataclasses import dataclass


@dataclass
class Motor:
    power: float        # [kW]
    speed: float        # [rpm]


@dataclass
class Hoist:
    motor: Motor
    radius: float       # [m]
    other: "Hoist"

    def rope_speed(self) -> float:
        """Speed of the rope at the drum [m/s]."""
        return self.motor.speed/60*self.radius
        #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: 2*pi


def heat(hoist: Hoist, eta) -> float:
    """
    :param eta: efficiency [-]
    :return: heat flow [W]
    """
    return (1 - eta)*hoist.motor.power
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: 1000


def torque(motor: Motor) -> float:
    """
    :return: torque [N m]
    """
    return motor.power*motor.speed
    #      ^^^^^^^^^^^^^^^^^^^^^^^ unlike-result

# ==== A record made by a call ====
# common practice
par = dict(
    rho=998.2,      # [kg/m^3]
    d=40.0,         # [mm]
)
A = 3.14159/4*par["d"]**2       # [m^2]
#   ^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: 0.000001
