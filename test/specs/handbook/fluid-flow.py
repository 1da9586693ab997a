# Flow in pipes and channels. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory; the formulas are common to all textbooks of the field.

# ==== Darcy-Weisbach pressure drop ====
# White, Fluid Mechanics, 8th ed., chapter 6 (pipe flow)
def pressure_drop(f, L, D, rho, V):
    """Pressure drop of a straight pipe.

    Parameters
    ----------
    f : float
        Darcy friction factor, [-]
    L : float
        Length of the pipe, [m]
    D : float
        Inside diameter, [m]
    rho : float
        Density, [kg/m^3]
    V : float
        Mean velocity, [m/s]

    Returns
    -------
    dp : float
        Pressure drop, [Pa]
    """
    return f * L / D * rho * V**2 / 2


def pressure_drop_slip(f, L, D, rho, V):
    """Pressure drop with the square of the velocity forgotten.

    Parameters
    ----------
    f : float
        Darcy friction factor, [-]
    L : float
        Length of the pipe, [m]
    D : float
        Inside diameter, [m]
    rho : float
        Density, [kg/m^3]
    V : float
        Mean velocity, [m/s]

    Returns
    -------
    dp : float
        Pressure drop, [Pa]
    """
    return f * L / D * rho * V / 2
    #      ^^^^^^^^^^^^^^^^^^^^^^^ unlike-result: Pa


# ==== Reynolds number, dynamic or kinematic viscosity ====
# White, Fluid Mechanics, 8th ed., chapter 1; ISO 80000-11
rho = 998.2     # kg/m^3
V = 1.4         # m/s
D = 0.0525      # m
mu = 1.002e-3   # Pa*s
nu = 1.004e-6   # m^2/s

Re = rho * V * D / mu       # [-]
Re_k = V * D / nu           # [-]
Re_slip = rho * V * D / nu  # [-]
#         ^^^^^^^^^^^^^^^^ unlike-result


# ==== Total head after Bernoulli ====
# White, Fluid Mechanics, 8th ed., chapter 3
def total_head(p, rho, V, z):
    """Total head in metres.

    :param p: static pressure [Pa]
    :param rho: density [kg/m^3]
    :param V: velocity [m/s]
    :param z: elevation [m]
    :returns: total head [m]
    """
    g = 9.80665  # m/s^2
    return p / (rho * g) + V**2 / (2 * g) + z


def total_head_slip(p, rho, V, z):
    """Total head, pressure term per mass instead of per weight.

    :param p: static pressure [Pa]
    :param rho: density [kg/m^3]
    :param V: velocity [m/s]
    :param z: elevation [m]
    :returns: total head [m]
    """
    g = 9.80665  # m/s^2
    return p / rho + V**2 / (2 * g) + z
    #      ^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Continuity with a flow per hour ====
# from memory, common practice
import math

Q = 18.0    # (m^3/h)
D = 0.0525  # (m)
A = math.pi * D**2 / 4          # (m^2)
V = Q / 3600 / A                # (m/s)
V_slip = Q / A                  # (m/s)
#        ^^^^^ scale-mismatch


# ==== Orifice plate, mass flow ====
# ISO 5167-2, orifice plates, basic equation
from math import pi, sqrt


def orifice_flow(d, D, dp, rho, Cd, eps):
    """Mass flow through an orifice plate.

    Args:
        d (float): bore of the plate [m]
        D (float): inside diameter of the pipe [m]
        dp (float): differential pressure [Pa]
        rho (float): density upstream [kg/m^3]
        Cd (float): discharge coefficient [-]
        eps (float): expansibility factor [-]

    Returns:
        float: mass flow [kg/s]
    """
    beta = d / D
    return Cd / sqrt(1 - beta**4) * eps * pi / 4 * d**2 * sqrt(2 * dp * rho)


def orifice_flow_slip(d, D, dp, rho, Cd, eps):
    """The same with the density below the root, which gives the volume flow.

    Args:
        d (float): bore of the plate [m]
        D (float): inside diameter of the pipe [m]
        dp (float): differential pressure [Pa]
        rho (float): density upstream [kg/m^3]
        Cd (float): discharge coefficient [-]
        eps (float): expansibility factor [-]

    Returns:
        float: mass flow [kg/s]
    """
    beta = d / D
    return Cd / sqrt(1 - beta**4) * eps * pi / 4 * d**2 * sqrt(2 * dp / rho)
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result: kg/s


# ==== Hydrostatic pressure in kilopascals ====
# from memory, common practice
rho = 998.2         # [kg/m^3]
g = 9.81            # [m/s^2]
h = 6.0             # [m] depth below the surface
p_atm = 101.325     # [kPa]

p_abs = p_atm + rho * g * h / 1000      # [kPa]
p_si = p_atm * 1e3 + rho * g * h        # [Pa]
p_slip = p_atm + rho * g * h            # [kPa]
#        ^^^^^^^^^^^^^^^^^^^ scale-mismatch: kPa


# ==== Manning's formula ====
# Chow, Open-Channel Hydraulics, chapter 5; n with its dimension as in ISO 80000 usage
def manning(n, R, S):
    # n [s/m^(1/3)], R [m] hydraulic radius, S [-] slope
    v = R**(2 / 3) * S**0.5 / n     # [m/s]
    return v


def manning_slip(n, R, S):
    # n [s/m^(1/3)], R [m] hydraulic radius, S [-] slope
    v = R**(1 / 2) * S**0.5 / n     # [m/s]
    #   ^^^^^^^^^^^^^^^^^^^^^^^ unlike-result: m/s
    return v


# ==== Manning's formula in feet, with its published coefficient ====
# Chow, Open-Channel Hydraulics, chapter 5 (1.486 is the cube root of 3.2808)
def manning_ft(n, R, S):
    """Velocity in a channel.

    Parameters
    ----------
    n : float
        Roughness coefficient [-]
    R : float
        Hydraulic radius [ft]
    S : float
        Slope [-]

    Returns
    -------
    V : float
        Velocity [ft/s]
    """
    return 1.486 / n * R**(2 / 3) * S**0.5
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: 1.486


def manning_ft_declared(n, R, S):
    """Velocity in a channel.

    Parameters
    ----------
    n : float
        Roughness coefficient [-]
    R : float
        Hydraulic radius [ft]
    S : float
        Slope [-]

    Returns
    -------
    V : float
        Velocity [ft/s]
    """
    # empirical: R [ft], n [-], S [-], V [ft/s]
    V = 1.486 / n * R**(2 / 3) * S**0.5
    return V


# ==== Hazen-Williams head loss ====
# metric form with 10.67, common practice in water supply; from memory
def hazen_williams(L, Q, C, D):
    """Head loss of a main.

    Parameters
    ----------
    L : float
        Length [m]
    Q : float
        Flow [m^3/s]
    C : float
        Coefficient [-]
    D : float
        Diameter [m]
    """
    # empirical: h [m], L [m], Q [m^3/s], C [-], D [m]
    h = 10.67 * L * Q**1.852 / (C**1.852 * D**4.8704)
    return h


def main_loss_slip(flow):
    """Passes litres per second where the relation wants cubic metres.

    Parameters
    ----------
    flow : float
        Flow [L/s]
    """
    return hazen_williams(1200.0, flow, 130, 0.3)
    #                             ^^^^ scale-mismatch: L/s


# ==== Hazen-Williams with a symbol in other units inside ====
# from memory, common practice
def friction_slope(Q, D):
    # Q [L/s], D [mm]
    C = 130
    # empirical: S [-], Q [m^3/s], D [m]
    S = 10.67 * Q**1.852 / (C**1.852 * D**4.8704)
    # <-- scale-mismatch: L/s
    # <-- scale-mismatch: mm
    return S


# ==== Colebrook-White by iteration ====
# White, Fluid Mechanics, 8th ed., chapter 6
from math import log10, sqrt


def colebrook(Re, eps, D):
    """Darcy friction factor of a rough pipe.

    Parameters
    ----------
    Re : float
        Reynolds number [-]
    eps : float
        Wall roughness [m]
    D : float
        Inside diameter [m]

    Returns
    -------
    f : float
        Darcy friction factor [-]
    """
    f = 0.02
    for _ in range(50):
        f_new = (-2 * log10(eps / (3.7 * D) + 2.51 / (Re * sqrt(f))))**-2
        if abs(f_new - f) < 1e-9:
            break
        f = f_new
    return f


def colebrook_slip(Re, eps, D):
    """Roughness in millimetres beside a diameter in metres.

    Parameters
    ----------
    Re : float
        Reynolds number [-]
    eps : float
        Wall roughness [mm]
    D : float
        Inside diameter [m]

    Returns
    -------
    f : float
        Darcy friction factor [-]
    """
    f = 0.02    # [-]
    for _ in range(50):
        f = (-2 * log10(eps / (3.7 * D) + 2.51 / (Re * sqrt(f))))**-2
        #               ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch
    return f


# ==== Swamee-Jain friction factor ====
# Swamee and Jain 1976, explicit approximation; from memory
import numpy as np

eps = 4.5e-5                        # [m]
D = np.array([0.05, 0.08, 0.1])     # [m]
Re = np.logspace(4, 7, 3)           # [-]

f = 0.25 / np.log10(eps / (3.7 * D) + 5.74 / Re**0.9)**2    # [-]
f_slip = 0.25 / np.log10(eps * D + 5.74 / Re**0.9)**2       # [-]
#                        ^^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: 5.74


# ==== Settling velocity after Stokes ====
# White, Fluid Mechanics, 8th ed., chapter 7 (creeping flow)
d = 45.0        # [um] grain diameter
rho_s = 2650.0  # [kg/m^3]
rho_f = 998.2   # [kg/m^3]
mu = 1.0e-3     # [Pa s]
g = 9.81        # [m/s^2]

d_m = d * 1e-6                                          # [m]
v = g * d_m**2 * (rho_s - rho_f) / (18 * mu)            # [m/s]
v_slip = g * d**2 * (rho_s - rho_f) / (18 * mu)         # [m/s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Drag at a speed in km/h ====
# White, Fluid Mechanics, 8th ed., chapter 7
rho = 1.2       # kg/m3
Cd = 0.32       # -
A = 2.1         # m2
v_kmh = 110.0   # km/h

v = v_kmh / 3.6                     # m/s
F = 0.5 * Cd * rho * A * v**2       # N
F_slip = 0.5 * Cd * rho * A * v_kmh**2  # N
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Minor losses ====
# Idelchik, Handbook of Hydraulic Resistance, chapter 1 (definitions)
K = 1.8     # [-] sum of the loss coefficients
V = 1.4     # [m/s]
g = 9.81    # [m/s^2]
h_loss = K * V**2 / (2 * g)     # [m]
h_slip = K * V / (2 * g)        # [m]
#        ^^^^^^^^^^^^^^^ unlike-result


# ==== Outflow after Torricelli ====
# White, Fluid Mechanics, 8th ed., chapter 3
import math


def drain_time(A_tank, A_hole, h, Cd=0.61):
    """Time to drain a tank through a hole in its bottom.

    Parameters
    ----------
    A_tank : float
        Area of the tank [m^2]
    A_hole : float
        Area of the hole [cm^2]
    h : float
        Level at the start [m]
    Cd : float
        Discharge coefficient [-]

    Returns
    -------
    t : float
        Time [s]
    """
    g = 9.81  # [m/s^2]
    a = A_hole / 1e4  # [m^2]
    return A_tank / (Cd * a) * math.sqrt(2 * h / g)


def outflow_slip(A_hole, h, Cd=0.61):
    """Flow through the hole, its area left in square centimetres.

    Parameters
    ----------
    A_hole : float
        Area of the hole [cm^2]
    h : float
        Level [m]
    Cd : float
        Discharge coefficient [-]

    Returns
    -------
    Q : float
        Flow [m^3/s]
    """
    g = 9.81  # [m/s^2]
    return Cd * A_hole * math.sqrt(2 * g * h)
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Rectangular weir, general form ====
# Chow, Open-Channel Hydraulics, chapter 14
b = 1.2     # [m]
H = 0.18    # [m]
g = 9.81    # [m/s^2]
Cd = 0.62   # [-]
Q = 2 / 3 * Cd * b * (2 * g)**0.5 * H**1.5          # [m^3/s]
Q_slip = 2 / 3 * Cd * b * (2 * g)**0.5 * H**(2 / 3) # [m^3/s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Weir after Francis ====
# metric coefficient 1.84, common practice; from memory
b = 1.2     # [m]
H = 0.18    # [m]
Q = 1.84 * b * H**1.5   # [m^3/s]
#   ^^^^^^^^^^^^^^^^^ hidden-unit: 1.84


# ==== Surge pressure after Joukowsky ====
# Wylie and Streeter, Fluid Transients, chapter 1
rho = 998.2     # [kg/m^3]
a = 1200.0      # [m/s] wave speed
dV = 1.4        # [m/s]
g = 9.81        # [m/s^2]
dp = rho * a * dV   # [Pa]
dH = a * dV / g     # [m]
dH_slip = a * dV    # [m]
#         ^^^^^^ unlike-result


# ==== Flow through a bed after Darcy ====
# Bear, Dynamics of Fluids in Porous Media, chapter 5
k = 2.0e-11     # [m^2] permeability
mu = 1.0e-3     # [Pa s]
A = 0.3         # [m^2]
L = 1.5         # [m]
dp = 2.4e4      # [Pa]
Q = k * A * dp / (mu * L)       # [m^3/s]
Q_slip = k * A * dp / mu        # [m^3/s]
#        ^^^^^^^^^^^^^^^ unlike-result


# ==== Ergun's equation ====
# Ergun 1952; Bird, Stewart, Lightfoot, Transport Phenomena, 2nd ed., chapter 6
def packed_bed(mu, rho, v, d, e):
    """Pressure gradient in a packed bed.

    Args:
        mu: dynamic viscosity [Pa s]
        rho: density [kg/m^3]
        v: superficial velocity [m/s]
        d: particle diameter [m]
        e: void fraction [-]

    Returns:
        pressure gradient [Pa/m]
    """
    return 150 * mu * v * (1 - e)**2 / (d**2 * e**3) + 1.75 * rho * v**2 * (1 - e) / (d * e**3)


def packed_bed_slip(mu, rho, v, d, e):
    """The viscous term with one diameter only.

    Args:
        mu: dynamic viscosity [Pa s]
        rho: density [kg/m^3]
        v: superficial velocity [m/s]
        d: particle diameter [m]
        e: void fraction [-]

    Returns:
        pressure gradient [Pa/m]
    """
    return 150 * mu * v * (1 - e)**2 / (d * e**3) + 1.75 * rho * v**2 * (1 - e) / (d * e**3)
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit
