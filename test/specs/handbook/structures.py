# Structures and strength of materials. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory. A dimensionally right formula is no proof of safety: local codes and licensed practice decide.

# ==== Bending stress ====
# Gere and Timoshenko, Mechanics of Materials, chapter 5
M = 18.5        # [kN m]
I = 8.36e6      # [mm^4]
y = 80.0        # [mm]
sigma = M * 1e6 * y / I     # [MPa]
sigma_slip = M * y / I      # [MPa]
#            ^^^^^^^^^ scale-mismatch: MPa


# ==== Second moment of area of a rectangle ====
# Gere and Timoshenko, appendix on plane areas
def second_moment(b, h):
    """Second moment of area.

    Parameters
    ----------
    b : float
        Width [mm]
    h : float
        Height [mm]

    Returns
    -------
    I : float
        Second moment of area [mm^4]
    """
    return b * h**3 / 12


def second_moment_slip(b, h):
    """Second moment of area, or rather not.

    Parameters
    ----------
    b : float
        Width [mm]
    h : float
        Height [mm]

    Returns
    -------
    I : float
        Second moment of area [mm^4]
    """
    return b * h**2 / 12
    #      ^^^^^^^^^^^^^ unlike-result


# ==== Deflection of a cantilever ====
# Gere and Timoshenko, appendix on deflections
F = 1200.0      # N
L = 1.8         # m
E = 2.1e11      # Pa
I = 8.36e-6     # m^4
w = F * L**3 / (3 * E * I)          # m
w_mm = F * L**3 / (3 * E * I) * 1000    # mm
w_slip = F * L**2 / (3 * E * I)     # m
#        ^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Deflection under a line load ====
# Gere and Timoshenko, appendix on deflections
q = 5.2         # [kN/m]
L = 4.0         # [m]
E = 210.0       # [GPa]
I = 836.0       # [cm^4]
w = 5 * q * 1e3 * L**4 / (384 * E * 1e9 * I * 1e-8)     # [m]
w_slip = 5 * q * L**4 / (384 * E * I)                   # [m]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Buckling after Euler ====
# Gere and Timoshenko, chapter 11
import numpy as np


def euler_load(E, I, L, K=1.0):
    """Critical load of a strut.

    Args:
        E (float): modulus of elasticity [N/mm^2]
        I (float): second moment of area [mm^4]
        L (float): length [mm]
        K (float): length factor [-]

    Returns:
        float: critical load [N]
    """
    return np.pi**2 * E * I / (K * L)**2


def euler_load_slip(E, I, L, K=1.0):
    """Critical load, the length not squared.

    Args:
        E (float): modulus of elasticity [N/mm^2]
        I (float): second moment of area [mm^4]
        L (float): length [mm]
        K (float): length factor [-]

    Returns:
        float: critical load [N]
    """
    return np.pi**2 * E * I / (K * L)
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


F_cr = euler_load(2.1e5, 8.36e6, 3200.0) / 1000     # [kN]
L_m = 3.2   # [m]
F_call = euler_load(2.1e5, 8.36e6, L_m)
#                                  ^^^ scale-mismatch


# ==== Slenderness ====
# Gere and Timoshenko, chapter 11
from math import sqrt

I = 8.36e6      # [mm^4]
A = 2850.0      # [mm^2]
L = 3200.0      # [mm]
i = sqrt(I / A)     # [mm]
lam = L / i         # [-]
lam_slip = L / (I / A)  # [-]
#          ^^^^^^^^^^^ unlike-result


# ==== Thermal expansion ====
# Gere and Timoshenko, chapter 2
alpha = 1.2e-5  # [1/K]
L = 24.0        # [m]
T1 = 5.0        # [degC]
T2 = 38.0       # [degC]
dL = alpha * L * (T2 - T1)              # [m]
L_hot = L * (1 + alpha * (T2 - T1))     # [m]
L_slip = L + alpha * (T2 - T1)          # [m]
#        ^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Hoop stress of a thin vessel ====
# Gere and Timoshenko, chapter 8
p = 16.0        # [bar]
D = 600.0       # [mm]
t = 6.0         # [mm]
sigma = p * 0.1 * D / (2 * t)       # [MPa]
sigma_2 = p / 10 * D / (2 * t)      # [N/mm^2]
sigma_slip = p * D / (2 * t)        # [MPa]
#            ^^^^^^^^^^^^^^^ scale-mismatch


# ==== Equivalent stress after von Mises ====
# Gere and Timoshenko, chapter 7
def von_mises(sx, sy, txy):
    # sx [MPa], sy [MPa], txy [MPa]
    return (sx**2 - sx * sy + sy**2 + 3 * txy**2)**0.5


def von_mises_slip(sx, sy, txy):
    # sx [MPa], sy [MPa], txy [MPa]
    return (sx**2 - sx * sy + sy**2 + 3 * txy)**0.5
    #       ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Combination of actions ====
# EN 1990, fundamental combination (partial factors 1.35 and 1.5)
G = 4.2         # [kN/m^2] permanent
Q = 2.5         # [kN/m^2] variable
b = 1.8         # [m] width that the joist carries
E_d = 1.35 * G + 1.5 * Q        # [kN/m^2]
q_d = (1.35 * G + 1.5 * Q) * b  # [kN/m]
q_slip = 1.35 * G * b + 1.5 * Q
#        ^^^^^^^^^^^^^^^^^^^^^^ hidden-unit


# ==== Moment of a simple beam ====
# Gere and Timoshenko, chapter 4
q = 5.2     # kN/m
L = 4.0     # m
F = 12.0    # kN
M = q * L**2 / 8 + F * L / 4    # kN m
V = q * L / 2 + F / 2           # kN
M_slip = q * L**2 / 8 + F / 4   # kN m
#        ^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Earth pressure at rest ====
# Terzaghi and Peck, Soil Mechanics in Engineering Practice; K0 after Jaky
import math

phi = 32.0      # [deg]
gamma = 18.5    # [kN/m^3]
z = 3.0         # [m]
K0 = 1 - math.sin(math.radians(phi))    # [-]
e0 = K0 * gamma * z             # [kPa]
E0 = 0.5 * K0 * gamma * z**2    # [kN/m]
K0_slip = 1 - math.sin(phi)     # [-]
#                      ^^^ scale-mismatch


# ==== Torsion of a round shaft ====
# Gere and Timoshenko, chapter 3
from math import pi

T = 850.0       # [N m]
d = 40.0        # [mm]
L = 0.9         # [m]
G = 81.0        # [GPa]
tau = 16 * T * 1000 / (pi * d**3)       # [MPa]
Ip = pi * (d / 1000)**4 / 32            # [m^4]
phi = T * L / (G * 1e9 * Ip)            # [rad]
phi_deg = phi * 180 / pi                # [deg]
tau_slip = 16 * T / (pi * d**3)         # [MPa]
#          ^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Stress and strain ====
# Gere and Timoshenko, chapter 1
F = 42.0        # [kN]
A = 314.0       # [mm^2]
E = 210000.0    # [N/mm^2]
sigma = F * 1000 / A        # [N/mm^2]
eps = sigma / E             # [-]
eps_u = sigma / E * 1e6     # [microstrain]
sigma_slip = F / A          # [N/mm^2]
#            ^^^^^ scale-mismatch


# ==== Wind pressure ====
# EN 1991-1-4, basic velocity pressure; density 1.25 kg/m³
rho = 1.25      # [kg/m^3]
v_b = 25.0      # [m/s]
q_b = 0.5 * rho * v_b**2            # [N/m^2]
q_kN = 0.5 * rho * v_b**2 / 1000    # [kN/m^2]
q_short = v_b**2 / 1600             # [kN/m^2]
#         ^^^^^^^^^^^^^ hidden-unit: 1600
q_slip = 0.5 * rho * v_b            # [N/m^2]
#        ^^^^^^^^^^^^^^^ unlike-result
