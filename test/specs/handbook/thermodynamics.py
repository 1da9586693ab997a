# Thermodynamics. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory; the formulas are common to all textbooks of the field.

# ==== Density of an ideal gas, kilopascals ====
# Cengel and Boles, Thermodynamics, 8th ed., chapter 3
p = 240.0       # [kPa] absolute
R = 287.05      # [J/(kg K)]
t = 41.0        # [degC]
T = t + 273.15  # [K]
rho = p * 1000 / (R * T)    # [kg/m^3]
rho_slip = p / (R * T)      # [kg/m^3]
#          ^^^^^^^^^^^ scale-mismatch


# ==== Ideal gas with a temperature in Celsius ====
# Cengel and Boles, 8th ed., chapter 3
def amount(p, V, T):
    """Amount of gas in a vessel.

    Parameters
    ----------
    p : float
        Absolute pressure [Pa]
    V : float
        Volume [m^3]
    T : float
        Temperature [degC]

    Returns
    -------
    n : float
        Amount [mol]
    """
    R = 8.314462618  # [J/(mol K)]
    return p * V / (R * (T + 273.15))


def amount_slip(p, V, T):
    """Amount of gas, °C taken for kelvins.

    Parameters
    ----------
    p : float
        Absolute pressure [Pa]
    V : float
        Volume [m^3]
    T : float
        Temperature [degC]

    Returns
    -------
    n : float
        Amount [mol]
    """
    R = 8.314462618  # [J/(mol K)]
    return p * V / (R * T)
    #               ^^^^^ offset-misuse


# ==== Gauge pressure in the gas law ====
# Cengel and Boles, 8th ed., chapter 1 (absolute and gauge pressures)
p_g = 6.0       # [barg]
p_atm = 1.013   # [bar]
R = 287.05      # [J/(kg K)]
T = 293.15      # [K]
rho = (p_g + p_atm) * 1e5 / (R * T)     # [kg/m^3]
rho_slip = p_g * 1e5 / (R * T)          # [kg/m^3]
#          ^^^^^^^^^^^^^^^^^^^ offset-misuse


# ==== Isentropic compression ====
# Cengel and Boles, 8th ed., chapter 7
def isentropic(T1, p1, p2, k):
    """Temperature after an isentropic change.

    Args:
        T1: inlet temperature [K]
        p1: inlet pressure [bar]
        p2: outlet pressure [bar]
        k: ratio of the heat capacities [-]

    Returns:
        outlet temperature [K]
    """
    return T1 * (p2 / p1)**((k - 1) / k)


def isentropic_slip(T1, p1, p2, R):
    """Temperature after an isentropic change, cp missing below R.

    Args:
        T1: inlet temperature [K]
        p1: inlet pressure [bar]
        p2: outlet pressure [bar]
        R: gas constant [J/(kg K)]

    Returns:
        outlet temperature [K]
    """
    return T1 * (p2 / p1)**R
    #                      ^ dimensioned-exponent


# ==== Speed of sound ====
# Cengel and Boles, 8th ed., chapter 17
from math import sqrt

k = 1.4         # [-]
R = 8.314       # [J/(mol K)]
M = 28.96       # [g/mol]
T = 293.15      # [K]
c = sqrt(k * R * T / (M / 1000))    # [m/s]
c_slip = sqrt(k * R * T / M)        # [m/s]
#        ^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Vapour pressure after Clausius and Clapeyron ====
# Atkins, Physical Chemistry, chapter on phase diagrams
import math


def vapour_pressure(p0, L, T0, T):
    """Vapour pressure near a known point.

    Parameters
    ----------
    p0 : float
        Known vapour pressure [Pa]
    L : float
        Molar heat of vaporisation [kJ/mol]
    T0 : float
        Known temperature [K]
    T : float
        Temperature [K]

    Returns
    -------
    p : float
        Vapour pressure [Pa]
    """
    R = 8.314  # [J/(mol K)]
    return p0 * math.exp(-L * 1000 / R * (1 / T - 1 / T0))


def vapour_pressure_slip(p0, L, T0, T):
    """The same with kilojoules over joules.

    Parameters
    ----------
    p0 : float
        Known vapour pressure [Pa]
    L : float
        Molar heat of vaporisation [kJ/mol]
    T0 : float
        Known temperature [K]
    T : float
        Temperature [K]

    Returns
    -------
    p : float
        Vapour pressure [Pa]
    """
    R = 8.314  # [J/(mol K)]
    return p0 * math.exp(-L / R * (1 / T - 1 / T0))
    #                    ^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Antoine equation ====
# coefficients of water for mmHg and °C, as in Dean, Lange's Handbook; from memory
import math


def antoine(T):
    """Vapour pressure of water.

    Parameters
    ----------
    T : float
        Temperature [degC]

    Returns
    -------
    P : float
        Vapour pressure [mmHg]
    """
    # empirical: P [mmHg], T [degC]
    P = 10**(8.07131 - 1730.63 / (233.426 + T))
    return P


T_flash = 335.0     # [K]
P_flash = antoine(T_flash - 273.15)     # [mmHg]
P_slip = antoine(T_flash)
#                ^^^^^^^ scale-mismatch
P_kPa = antoine(62.0) * 0.133322        # [kPa]
P_unit_slip = antoine(62.0)             # [kPa]
#             ^^^^^^^^^^^^^ scale-mismatch: kPa


# ==== Entropy change of an ideal gas ====
# Cengel and Boles, 8th ed., chapter 7
from math import log

cp = 1.005      # [kJ/(kg K)]
R = 287.05      # [J/(kg K)]
T1 = 293.15     # [K]
T2 = 423.15     # [K]
p1 = 1.0        # [bar]
p2 = 2.8        # [bar]
ds = cp * 1000 * log(T2 / T1) - R * log(p2 / p1)    # [J/(kg K)]
ds_slip = cp * log(T2 / T1) - R * log(p2 / p1)
#         ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Carnot efficiency ====
# Cengel and Boles, 8th ed., chapter 6
t_hot = 320.0   # [degC]
t_cold = 35.0   # [degC]
eta = 1 - (t_cold + 273.15) / (t_hot + 273.15)  # [-]
eta_slip = 1 - t_cold / t_hot                   # [-]
#              ^^^^^^^^^^^^^^ offset-misuse


# ==== Work of a polytropic compression ====
# Cengel and Boles, 8th ed., chapter 4
def polytropic_work(p1, V1, p2, V2, n):
    # p1 [kPa], V1 [m^3], p2 [kPa], V2 [m^3], n [-]
    W = (p2 * V2 - p1 * V1) / (1 - n)   # [kJ]
    return W


def polytropic_work_slip(p1, V1, p2, V2, n):
    # p1 [kPa], V1 [m^3], p2 [kPa], V2 [m^3], n [-]
    W = (p2 * V2 - p1) / (1 - n)
    #    ^^^^^^^^^^^^ unlike-terms
    return W


# ==== Humidity ratio ====
# ASHRAE Handbook, Fundamentals, chapter on psychrometrics
def humidity_ratio(p_v, p):
    """Humidity ratio of moist air.

    :param p_v: partial pressure of the vapour [Pa]
    :param p: barometric pressure [Pa]
    :return: humidity ratio [kg/kg]
    """
    return 0.62198 * p_v / (p - p_v)


def humidity_ratio_slip(p_v, p):
    """Humidity ratio, two units of pressure.

    :param p_v: partial pressure of the vapour [Pa]
    :param p: barometric pressure [kPa]
    :return: humidity ratio [kg/kg]
    """
    return 0.62198 * p_v / (p - p_v)
    #                       ^^^^^^^ scale-mismatch: kPa


# ==== Enthalpy of moist air ====
# ASHRAE Handbook, Fundamentals, chapter on psychrometrics; kJ per kg of dry air
def moist_air_enthalpy(t, W):
    # t [degC], W [kg/kg]
    cp_a = 1.006    # [kJ/(kg degC)]
    cp_v = 1.86     # [kJ/(kg degC)]
    h_fg = 2501.0   # [kJ/kg]
    h = cp_a * t + W * (h_fg + cp_v * t)    # [kJ/kg]
    return h


def moist_air_enthalpy_slip(t, W):
    # t [degC], W [kg/kg]
    cp_a = 1.006    # [kJ/(kg degC)]
    cp_v = 1860.0   # [J/(kg degC)]
    h_fg = 2501.0   # [kJ/kg]
    h = cp_a * t + W * (h_fg + cp_v * t)
    #                   ^^^^^^^^^^^^^^^ scale-mismatch
    return h


# ==== Arrhenius rate ====
# Atkins, Physical Chemistry, chapter on kinetics
import numpy as np


def rate_constant(A, Ea, T):
    """Rate constant of a first-order reaction.

    Parameters
    ----------
    A : float
        Frequency factor [1/s]
    Ea : float
        Activation energy [J/mol]
    T : array_like
        Temperature [K]

    Returns
    -------
    k : array_like
        Rate constant [1/s]
    """
    R = 8.314  # [J/(mol K)]
    return A * np.exp(-Ea / (R * T))


def rate_constant_slip(A, Ea, T):
    """Rate constant, temperature missing.

    Parameters
    ----------
    A : float
        Frequency factor [1/s]
    Ea : float
        Activation energy [J/mol]
    T : array_like
        Temperature [K]

    Returns
    -------
    k : array_like
        Rate constant [1/s]
    """
    R = 8.314  # [J/(mol K)]
    return A * np.exp(-Ea / R)
    #                 ^^^^^^^ dimensioned-argument


# ==== Wet steam ====
# Cengel and Boles, 8th ed., chapter 3
h_f = 640.1     # [kJ/kg]
h_fg = 2108.0   # [kJ/kg]
x = 0.92        # [-]
x_pct = 92.0    # [%]
h = h_f + x * h_fg                  # [kJ/kg]
h_pct = h_f + x_pct / 100 * h_fg    # [kJ/kg]
h_slip = h_f + x_pct * h_fg         # [kJ/kg]
#        ^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Mean of two temperatures ====
# from memory, common practice
T1 = 62.0       # [degC]
T2 = 41.0       # [degC]
T_m = 0.5 * (T1 + T2)   # [degC]
T_w = 0.3 * T1 + 0.7 * T2   # [degC]
T_slip = T1 + T2        # [degC]
#        ^^^^^^^ offset-misuse


# ==== Fahrenheit, Celsius, kelvin, Rankine ====
# NIST SP 811, Appendix B.8, temperature
t_F = 140.0                         # [degF]
t_C = (t_F - 32) / 1.8              # [degC]
t_C2 = 5 / 9 * (t_F - 32)           # [degC]
t_C3 = (t_F - 32) * 5.0 / 9.0       # [degC]
t_F2 = 1.8 * t_C + 32               # [degF]
T_K = (t_F + 459.67) / 1.8          # [K]
T_R = t_F + 459.67                  # [degR]
T_K2 = t_C + 273.15                 # [K]
t_slip = t_F / 1.8 - 32             # [degC]
#        ^^^^^^^^^^^^^^ scale-mismatch


# ==== Power of a compressor ====
# Cengel and Boles, 8th ed., chapter 7
m_dot = 0.42    # [kg/s]
cp = 1.005      # [kJ/(kg K)]
T1 = 293.15     # [K]
T2 = 423.15     # [K]
eta = 0.78      # [-]
P = m_dot * cp * (T2 - T1) / eta        # [kW]
P_hp = P * 1.34102                      # [hp]
P_slip = m_dot * cp * (T2 - T1) / eta   # [hp]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: hp


# ==== Van der Waals equation ====
# Atkins, Physical Chemistry, chapter on the properties of gases
def van_der_waals(T, Vm, a, b):
    """Pressure of a real gas.

    Parameters
    ----------
    T : float
        Temperature [K]
    Vm : float
        Molar volume [m^3/mol]
    a : float
        Attraction [Pa m^6/mol^2]
    b : float
        Covolume [m^3/mol]

    Returns
    -------
    p : float
        Pressure [Pa]
    """
    R = 8.314462618  # [J/(mol K)]
    return R * T / (Vm - b) - a / Vm**2


def van_der_waals_slip(T, Vm, a, b):
    """Pressure of a real gas, the volume not squared.

    Parameters
    ----------
    T : float
        Temperature [K]
    Vm : float
        Molar volume [m^3/mol]
    a : float
        Attraction [Pa m^6/mol^2]
    b : float
        Covolume [m^3/mol]

    Returns
    -------
    p : float
        Pressure [Pa]
    """
    R = 8.314462618  # [J/(mol K)]
    return R * T / (Vm - b) - a / Vm
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms
