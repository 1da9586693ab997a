# Heat transfer. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory; the formulas are common to all textbooks of the field.

# ==== Conduction through a wall, thickness in millimetres ====
# Incropera et al., Fundamentals of Heat and Mass Transfer, 7th ed., chapter 3
k = 0.61        # W/(m K), gypsum
d = 12.5        # mm
T_i = 21.0      # degC
T_a = -4.0      # degC

q = k * (T_i - T_a) / (d / 1000)    # W/m^2
q_slip = k * (T_i - T_a) / d        # W/m^2
#        ^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Newton's law of cooling ====
# Incropera et al., 7th ed., chapter 1
def convection(h, A, T_s, T_inf):
    """Heat flow from a surface.

    Parameters
    ----------
    h : float
        Heat transfer coefficient [W/m^2/K]
    A : float
        Area [m^2]
    T_s : float
        Surface temperature [deg C]
    T_inf : float
        Temperature of the air [deg C]

    Returns
    -------
    Q : float
        Heat flow [W]
    """
    return h * A * (T_s - T_inf)


def convection_slip(h, T_s, T_inf):
    """Heat flow, the area forgotten.

    Parameters
    ----------
    h : float
        Heat transfer coefficient [W/m^2/K]
    T_s : float
        Surface temperature [deg C]
    T_inf : float
        Temperature of the air [deg C]

    Returns
    -------
    Q : float
        Heat flow [W]
    """
    return h * (T_s - T_inf)
    #      ^^^^^^^^^^^^^^^^^ unlike-result: W


# ==== Logarithmic mean temperature difference ====
# Incropera et al., 7th ed., chapter 11
import math


def lmtd(T_hi, T_ho, T_ci, T_co):
    """Counterflow LMTD.

    Args:
        T_hi (float): hot side inlet [°C]
        T_ho (float): hot side outlet [°C]
        T_ci (float): cold side inlet [°C]
        T_co (float): cold side outlet [°C]

    Returns:
        float: mean temperature difference [K]
    """
    dT1 = T_hi - T_co
    dT2 = T_ho - T_ci
    if abs(dT1 - dT2) < 1e-6:
        return dT1
    return (dT1 - dT2) / math.log(dT1 / dT2)


def lmtd_slip(T_hi, T_ho, T_ci, T_co):
    """Counterflow LMTD, minus instead of divided by.

    Args:
        T_hi (float): hot side inlet [°C]
        T_ho (float): hot side outlet [°C]
        T_ci (float): cold side inlet [°C]
        T_co (float): cold side outlet [°C]

    Returns:
        float: mean temperature difference [K]
    """
    dT1 = T_hi - T_co
    dT2 = T_ho - T_ci
    return (dT1 - dT2) / math.log(dT1 - dT2)
    #                             ^^^^^^^^^ dimensioned-argument


# ==== Radiation between two surfaces ====
# Incropera et al., 7th ed., chapter 13; sigma from CODATA 2022
sigma = 5.670374419e-8  # [W m^-2 K^-4]
eps = 0.93              # [-]
T1 = 358.15             # [K]
T2 = 294.15             # [K]
t1 = 85.0               # [degC]

q = eps * sigma * (T1**4 - T2**4)                   # [W/m^2]
q_c = eps * sigma * ((t1 + 273.15)**4 - T2**4)      # [W/m^2]
q_slip = eps * sigma * (t1**4 - T2**4)              # [W/m^2]
#                       ^^^^^ offset-misuse


# ==== Radiation, fourth power lost ====
# Incropera et al., 7th ed., chapter 13
sigma = 5.670374419e-8  # [W m^-2 K^-4]
T1 = 358.15             # [K]
T2 = 294.15             # [K]
q_slip = sigma * (T1 - T2)**3   # [W/m^2]
#        ^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Nusselt number of turbulent pipe flow ====
# Dittus and Boelter 1930, in the form of Incropera et al., 7th ed., chapter 8
def dittus_boelter(Re, Pr, k, D):
    """Heat transfer coefficient in a pipe.

    Parameters
    ----------
    Re : float
        Reynolds number [-]
    Pr : float
        Prandtl number [-]
    k : float
        Thermal conductivity [W/m/K]
    D : float
        Inside diameter [m]

    Returns
    -------
    h : float
        Heat transfer coefficient [W/m^2/K]
    """
    Nu = 0.023 * Re**0.8 * Pr**0.4
    return Nu * k / D


def film_slip(Nu, k, D):
    """Heat transfer coefficient, the ratio upside down.

    Parameters
    ----------
    Nu : float
        Nusselt number [-]
    k : float
        Thermal conductivity [W/m/K]
    D : float
        Inside diameter [m]

    Returns
    -------
    h : float
        Heat transfer coefficient [W/m^2/K]
    """
    return Nu * k * D
    #      ^^^^^^^^^^ unlike-result


# ==== Prandtl number with a heat capacity in kilojoules ====
# ISO 80000-11; from memory
mu = 8.9e-4     # [Pa s]
cp = 4.181      # [kJ/(kg K)]
k = 0.607       # [W/(m K)]
Pr = mu * cp * 1000 / k     # [-]
Pr_slip = mu * cp / k       # [-]
#         ^^^^^^^^^^^ scale-mismatch


# ==== Fin efficiency ====
# Incropera et al., 7th ed., chapter 3
from math import sqrt, tanh

h = 25.0        # (W/m2-K)
P = 0.12        # (m) perimeter
k = 180.0       # (W/m-K)
A = 4.0e-4      # (m2)
L = 0.05        # (m)
m = sqrt(h * P / (k * A))           # (1/m)
eta = tanh(m * L) / (m * L)         # (-)
eta_slip = tanh(m / L) / (m * L)    # (-)
#               ^^^^^ dimensioned-argument


# ==== Overall heat transfer coefficient ====
# Incropera et al., 7th ed., chapter 3
def overall(h_i, h_o, d, k):
    # h_i [W/(m^2 K)], h_o [W/(m^2 K)], d [m], k [W/(m K)]
    U = 1 / (1 / h_i + d / k + 1 / h_o)     # [W/(m^2 K)]
    return U


def overall_slip(h_i, h_o, d, k):
    # h_i [W/(m^2 K)], h_o [W/(m^2 K)], d [m], k [W/(m K)]
    U = 1 / (1 / h_i + k / d + 1 / h_o)
    #        ^^^^^^^^^^^^^^^ unlike-terms
    return U


# ==== Sensible heat in kilowatts ====
# from memory, common practice
m_dot = 1440.0  # [kg/h]
cp = 4.186      # [kJ/(kg K)]
T_in = 62.0     # [degC]
T_out = 41.0    # [degC]
Q = m_dot / 3600 * cp * (T_in - T_out)          # [kW]
Q_w = m_dot / 3.6 * cp * (T_in - T_out)         # [W]
Q_slip = m_dot * cp * (T_in - T_out)            # [kW]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Heat exchanger, number of transfer units ====
# Kays and London, Compact Heat Exchangers, 3rd ed., chapter 2
import numpy as np

U = 850.0       # [W/(m^2 K)]
A = 2.4         # [m^2]
C_min = 1670.0  # [W/K]
C_max = 2100.0  # [W/K]
Cr = C_min / C_max
NTU = U * A / C_min     # [-]
eff = (1 - np.exp(-NTU * (1 - Cr))) / (1 - Cr * np.exp(-NTU * (1 - Cr)))    # [-]
eff_slip = 1 - np.exp(-U / C_min)
#                     ^^^^^^^^^^ dimensioned-argument


# ==== Cooling of a lump ====
# Incropera et al., 7th ed., chapter 5
import math


def lump_temperature(t, rho, cp, V, h, A, T_0, T_env):
    """Temperature of a small body.

    Parameters
    ----------
    t : float
        Time [s]
    rho : float
        Density [kg/m^3]
    cp : float
        Heat capacity [J/kg/K]
    V : float
        Volume [m^3]
    h : float
        Heat transfer coefficient [W/m^2/K]
    A : float
        Area [m^2]
    T_0 : float
        Temperature at the start [degC]
    T_env : float
        Temperature of the surroundings [degC]

    Returns
    -------
    T : float
        Temperature [degC]
    """
    tau = rho * cp * V / (h * A)
    return T_env + (T_0 - T_env) * math.exp(-t / tau)


def lump_slip(t, tau, T_0, T_env):
    """The same with the time in minutes.

    Parameters
    ----------
    t : float
        Time [min]
    tau : float
        Time constant [s]
    T_0 : float
        Temperature at the start [degC]
    T_env : float
        Temperature of the surroundings [degC]

    Returns
    -------
    T : float
        Temperature [degC]
    """
    return T_env + (T_0 - T_env) * math.exp(-t / tau)
    #                                       ^^^^^^^^ scale-mismatch


# ==== Grashof and Rayleigh numbers ====
# ISO 80000-11; Incropera et al., 7th ed., chapter 9
g = 9.81            # [m/s^2]
T_s = 85.0          # [degC]
T_inf = 21.0        # [degC]
L = 0.3             # [m]
nu = 1.6e-5         # [m^2/s]
alpha = 2.3e-5      # [m^2/s]
T_f = (T_s + T_inf) / 2         # [degC] film temperature
beta = 1 / (T_f + 273.15)       # [1/K]
Gr = g * beta * (T_s - T_inf) * L**3 / nu**2            # [-]
Ra = g * beta * (T_s - T_inf) * L**3 / (nu * alpha)     # [-]
Gr_slip = g * beta * (T_s - T_inf) * L**3 / nu          # [-]
#         ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Film coefficient with one over a temperature in Celsius ====
# from memory: the expansion coefficient of an ideal gas is one over the absolute temperature
T_f = 53.0              # [degC]
beta = 1 / (T_f + 273.15)   # [1/K]
beta_slip = 1 / T_f         # [1/K]
#           ^^^^^^^ offset-misuse


# ==== Heat loss of an insulated pipe ====
# Incropera et al., 7th ed., chapter 3
from math import log, pi

k = 0.038       # W/m/K
L = 12.0        # m
r1 = 0.0301     # m
r2 = 0.0601     # m
T1 = 78.0       # degC
T2 = 21.0       # degC
Q = 2 * pi * k * L * (T1 - T2) / log(r2 / r1)       # W
Q_slip = 2 * pi * k * (T1 - T2) / log(r2 / r1)      # W
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Contact with degrees Fahrenheit ====
# NIST SP 811, Appendix B (conversion of temperatures and conductances)
U = 0.35        # [BTU/(h ft^2 degF)]
A = 120.0       # [ft^2]
T_in = 70.0     # [degF]
T_out = 14.0    # [degF]
Q = U * A * (T_in - T_out)          # [BTU/h]
Q_w = Q * 0.29307                   # [W]
Q_slip = U * A * (T_in - T_out)     # [W]
#        ^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch
