# Formulas over arrays, tables and time steps. Each section is a text of its own: the right form, then its usual slip.
# Sources: textbook formulas, from memory, common practice; the functions are those of the numpy and scipy documentation.

# ==== Work under a pressure curve ====
# Cengel and Boles, Thermodynamics, 8th ed., chapter 4: boundary work is the integral of p dV
import numpy as np

V0 = 0.2                            # [L]
p0 = 100.0                          # [kPa]
V = np.linspace(V0, 0.05, 50)       # [L]
p = p0 * (V0 / V)**1.3              # [kPa]

W = np.trapezoid(p, V)              # [J]
W_kJ = np.trapezoid(p, V) / 1000    # [kJ]
W_slip = np.trapezoid(p, V)         # [W]
#        ^^^^^^^^^^^^^^^^^^ unlike-result: W


# ==== Energy from a logged power ====
# from memory, common practice
import numpy as np


def energy(t, P):
    """Energy of a logged run.

    Parameters
    ----------
    t : ndarray
        Time [s]
    P : ndarray
        Power [kW]

    Returns
    -------
    E : float
        Energy [kWh]
    """
    return np.trapezoid(P, t) / 3600


def energy_slip(t, P):
    """Energy of a logged run, seconds for hours.

    Parameters
    ----------
    t : ndarray
        Time [s]
    P : ndarray
        Power [kW]

    Returns
    -------
    E : float
        Energy [kWh]
    """
    return np.trapezoid(P, t)
    #      ^^^^^^^^^^^^^^^^^^ scale-mismatch: kWh


# ==== Interpolation in a table ====
# numpy reference, interp(x, xp, fp): the first two arguments are of one kind
import numpy as np

T_tab = np.array([0.0, 20.0, 40.0, 60.0])           # [degC]
mu_tab = np.array([1.79, 1.00, 0.653, 0.466])       # [mPa s]
T = 31.0            # [degC]
h = 0.4             # [m]

mu = np.interp(T, T_tab, mu_tab)            # [mPa s]
mu_si = np.interp(T, T_tab, mu_tab) / 1000  # [Pa s]
mu_slip = np.interp(h, T_tab, mu_tab)
# <-- unlike-terms
mu_unit = np.interp(T, T_tab, mu_tab)       # [Pa s]
#         ^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Heating by steps ====
# explicit Euler steps of the heat balance; from memory, common practice
def heat_up(P, m, cp, UA, T_env, t_end):
    """Temperature of a stirred tank after a time.

    Parameters
    ----------
    P : float
        Heater power [W]
    m : float
        Mass of the contents [kg]
    cp : float
        Heat capacity [J/(kg K)]
    UA : float
        Loss coefficient [W/K]
    T_env : float
        Temperature of the room [degC]
    t_end : float
        Time [s]

    Returns
    -------
    T : float
        Temperature [degC]
    """
    T = T_env
    t = 0
    dt = 0.5  # [s]
    while t < t_end:
        dTdt = (P - UA * (T - T_env)) / (m * cp)
        T += dTdt * dt
        t += dt
    return T


def heat_up_slip(P, m, cp, UA, T_env, t_end):
    """The same with the loss per kelvin taken for a loss.

    Parameters
    ----------
    P : float
        Heater power [W]
    m : float
        Mass of the contents [kg]
    cp : float
        Heat capacity [J/(kg K)]
    UA : float
        Loss coefficient [W/K]
    T_env : float
        Temperature of the room [degC]
    t_end : float
        Time [s]

    Returns
    -------
    T : float
        Temperature [degC]
    """
    T = T_env
    t = 0
    dt = 0.5  # [s]
    while t < t_end:
        dTdt = (P - UA) / (m * cp)
        #       ^^^^^^ unlike-terms
        T += dTdt * dt
        t += dt
    return T


# ==== Water balance of a reservoir ====
# from memory, common practice
inflow = [12.0, 14.5, 9.0, 11.0]        # [m^3/h]
outflow = [10.0, 10.0, 13.0, 12.0]      # [m^3/h]
dt = 0.25                               # [h]
volume = 80.0                           # [m^3]
levels = []
area = 24.0                             # [m^2]
for q_in, q_out in zip(inflow, outflow):
    volume += (q_in - q_out) * dt
    levels.append(volume / area)
for q_in, q_out in zip(inflow, outflow):
    volume += q_in - q_out
    # <-- unlike-terms


# ==== Sum of the losses of a line ====
# White, Fluid Mechanics, 8th ed., chapter 6
parts = [1.2, 0.8, 2.5]     # [m] lengths
f = 0.021                   # [-]
D = 0.0525                  # [m]
V = 1.4                     # [m/s]
g = 9.81                    # [m/s^2]
z = 3.0                     # [m]

h = 0.0
for L in parts:
    h += f * L / D * V**2 / (2 * g)
H = z + h                                   # [m]
H_all = z + sum(f * L / D * V**2 / (2 * g) for L in parts)  # [m]
H_slip = z + sum(f * L / D * V**2 / 2 for L in parts)       # [m]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Slope of a line through measured points ====
# numpy reference, gradient(f, x): differences over spacing
import numpy as np

t = np.arange(0, 10, 0.5)           # [s]
x = np.cumsum(np.ones(20)) * 0.2    # [m]
v = np.gradient(x, t)               # [m/s]
a = np.gradient(v, t)               # [m/s^2]
a_slip = np.gradient(x, t)          # [m/s^2]
#        ^^^^^^^^^^^^^^^^^ unlike-result


# ==== Profile of a laminar flow ====
# Hagen and Poiseuille; White, Fluid Mechanics, 8th ed., chapter 6
import numpy as np

R = 0.01                        # [m]
L = 1.0                         # [m]
mu = 0.38                       # [Pa s]
dp = 2.0e4                      # [Pa]
r = np.linspace(0, R, 21)       # [m]
u = dp / (4 * mu * L) * (R**2 - r**2)           # [m/s]
Q = np.trapezoid(2 * np.pi * r * u, r)          # [m^3/s]
Q_ref = np.pi * R**4 * dp / (8 * mu * L)        # [m^3/s]
error = (Q - Q_ref) / Q_ref                     # [-]
u_slip = dp / (4 * mu * L) * (R - r)            # [m/s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Root of a balance ====
# scipy reference, optimize.brentq(f, a, b): the root is of the kind of a and b
from scipy.optimize import brentq


def floating_depth(m, rho, D):
    """Draught of a floating cylinder.

    Parameters
    ----------
    m : float
        Mass [kg]
    rho : float
        Density of the liquid [kg/m^3]
    D : float
        Diameter [m]

    Returns
    -------
    d : float
        Draught [m]
    """
    A = 3.141592653589793 * D**2 / 4

    def residual(d):
        return rho * A * d - m

    return brentq(residual, 0, 10)


def floating_depth_slip(m, rho, D):
    """Draught of a floating cylinder, area for volume.

    Parameters
    ----------
    m : float
        Mass [kg]
    rho : float
        Density of the liquid [kg/m^3]
    D : float
        Diameter [m]

    Returns
    -------
    d : float
        Draught [m]
    """
    A = 3.141592653589793 * D**2 / 4
    return m / rho * A
    #      ^^^^^^^^^^^ unlike-result


# ==== Degree days ====
# from memory, common practice of energy accounting
import numpy as np

T_day = np.array([4.0, 7.5, -1.0, 12.0])    # [degC]
T_base = 15.0                               # [degC]
UA = 210.0                                  # [W/K]
dT = np.maximum(T_base - T_day, 0)          # [K]
HDD = np.sum(dT) * 1.0                      # [K]
E = UA * HDD * 24 / 1000                    # [kWh/day]
Q = UA * (T_base - np.mean(T_day))          # [W]
Q_slip = UA * np.mean(T_day)                # [W]
#        ^^^^^^^^^^^^^^^^^^^ offset-misuse
