# Electrical engineering. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory; the formulas are common to all textbooks of the field.

# ==== Power in a resistor ====
# Hayt and Kemmerly, Engineering Circuit Analysis, chapter 2
U = 230.0       # [V]
R = 42.0        # [ohm]
I = U / R       # [A]
P = U * I       # [W]
P_R = U**2 / R  # [W]
P_I = I**2 * R  # [W]
P_slip = U * R  # [W]
#        ^^^^^ unlike-result: W


# ==== Three-phase power ====
# Chapman, Electric Machinery Fundamentals, appendix on three-phase circuits
from math import cos, radians, sqrt


def three_phase(U, I, cosphi):
    """Active power of a three-phase load.

    Parameters
    ----------
    U : float
        Line voltage [V]
    I : float
        Line current [A]
    cosphi : float
        Power factor [-]

    Returns
    -------
    P : float
        Active power [kW]
    """
    return sqrt(3) * U * I * cosphi / 1000


def three_phase_angle(U, I, phi):
    """Active power from the phase angle.

    Parameters
    ----------
    U : float
        Line voltage [V]
    I : float
        Line current [A]
    phi : float
        Phase angle [degrees]

    Returns
    -------
    P : float
        Active power [W]
    """
    return 3**0.5 * U * I * cos(radians(phi))


def three_phase_slip(U, I, phi):
    """Active power from the phase angle, in degrees.

    Parameters
    ----------
    U : float
        Line voltage [V]
    I : float
        Line current [A]
    phi : float
        Phase angle [degrees]

    Returns
    -------
    P : float
        Active power [W]
    """
    return sqrt(3) * U * I * cos(phi)
    #                            ^^^ scale-mismatch


# ==== Charging a capacitor ====
# Hayt and Kemmerly, chapter 8
import math

U0 = 24.0       # V
R = 4700.0      # ohm
C = 220.0       # uF
t = 0.8         # s
u = U0 * (1 - math.exp(-t / (R * C * 1e-6)))    # V
tau = R * C / 1e6                               # s
u2 = U0 * (1 - math.exp(-t / tau))              # V
u_slip = U0 * (1 - math.exp(-t / (R * C)))      # V
#                           ^^^^^^^^^^^^ scale-mismatch


# ==== Impedance of a series circuit ====
# Hayt and Kemmerly, chapter 10
def impedance(R, L, C, f):
    """Magnitude of the impedance.

    Args:
        R (float): resistance [ohm]
        L (float): inductance [H]
        C (float): capacitance [F]
        f (float): frequency [Hz]

    Returns:
        float: impedance [ohm]
    """
    w = 2 * 3.141592653589793 * f
    X = w * L - 1 / (w * C)
    return (R**2 + X**2)**0.5


def impedance_slip(R, L, C, f):
    """Magnitude of the impedance, the capacitor not inverted.

    Args:
        R (float): resistance [ohm]
        L (float): inductance [H]
        C (float): capacitance [F]
        f (float): frequency [Hz]

    Returns:
        float: impedance [ohm]
    """
    X = f * L - f * C
    #   ^^^^^^^^^^^^^ unlike-terms
    return (R**2 + X**2)**0.5


# ==== Resonance ====
# Hayt and Kemmerly, chapter 16
from numpy import pi, sqrt

L = 4.7         # [mH]
C = 2.2         # [uF]
f0 = 1 / (2 * pi * sqrt(L * 1e-3 * C * 1e-6))   # [Hz]
L_H = 4.7e-3    # [H]
C_F = 2.2e-6    # [F]
w0 = 1 / sqrt(L_H * C_F)                        # [rad/s]
f_slip = 1 / (2 * pi * L_H * C_F)               # [Hz]
#        ^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Voltage drop of a cable ====
# IEC 60364-5-52, annex on voltage drop (direct current form)
rho = 0.0225    # [ohm mm^2/m]
L = 42.0        # [m]
A = 2.5         # [mm^2]
I = 11.5        # [A]
dU = 2 * rho * L * I / A        # [V]
rho_si = 2.25e-8    # [ohm m]
dU_slip = 2 * rho_si * L * I / A    # [V]
#         ^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: V


# ==== Energy and cost ====
# from memory, common practice
P = 3.2         # [kW]
t = 5400.0      # [s]
E = P * t / 3600        # [kWh]
E_MJ = P * t / 1000     # [MJ]
t_h = t / 3600          # [h]
E2 = P * t_h            # [kWh]
E_slip = P * t          # [kWh]
#        ^^^^^ scale-mismatch: kWh


# ==== Battery runtime ====
# from memory, common practice
Q = 12.0        # [Ah]
I = 0.85        # [A]
dod = 80        # [%] usable part
t = Q * dod / 100 / I       # [h]
t_min = Q / I * 60          # [min]
t_slip = Q / I              # [s]
#        ^^^^^ scale-mismatch


# ==== Synchronous speed ====
# Chapman, Electric Machinery Fundamentals, chapter 3: 120 is 60 seconds times two poles per pair
f = 50.0        # [Hz]
p = 4           # number of poles
n = 120 * f / p     # [rpm]
n_s = f / (p / 2)   # [rev/s]
n_slip = f / (p / 2)    # [rpm]
#        ^^^^^^^^^^^ scale-mismatch: rpm


# ==== Slip of an induction motor ====
# Chapman, chapter 6
n_s = 1500      # [rpm]
n = 1450        # [rpm]
s = (n_s - n) / n_s             # [-]
s_pct = (n_s - n) / n_s * 100   # [%]
s_slip = (n_s - n)              # [-]
#         ^^^^^^^ unlike-result


# ==== Skin depth ====
# Jackson, Classical Electrodynamics, chapter 5; mu0 from CODATA 2022
import numpy as np

rho = 1.72e-8           # [ohm m]
mu0 = 1.25663706127e-6  # [H/m]
f = 50.0                # [Hz]
delta = np.sqrt(rho / (np.pi * f * mu0))        # [m]
delta_mm = 1e3 * np.sqrt(rho / (np.pi * f * mu0))   # [mm]
delta_slip = np.sqrt(rho / (np.pi * f))         # [m]
#            ^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Energy of coil and capacitor ====
# Hayt and Kemmerly, chapter 7
L = 0.12        # [H]
I = 2.4         # [A]
C = 220e-6      # [F]
U = 48.0        # [V]
E = L * I**2 / 2 + C * U**2 / 2         # [J]
E_slip = L * I**2 / 2 + C * U / 2       # [J]
#        ^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Level of a power ratio ====
# IEC 60027-3, logarithmic quantities
from math import log10

P1 = 12.0       # [mW]
P2 = 0.4        # [mW]
U1 = 2.4        # [V]
U2 = 0.6        # [V]
L_P = 10 * log10(P2 / P1)       # [dB]
L_U = 20 * log10(U2 / U1)       # [dB]
L_sum = L_P + L_U               # [dB]
L_slip = 10 * log10(P1 - P2)    # [dB]
#                   ^^^^^^^ dimensioned-argument


# ==== Charge and current ====
# SI Brochure, 9th ed., table 4
I = 4.0         # [mA]
t = 2.5         # [s]
Q = I / 1000 * t    # [C]
Q_mC = I * t        # [mC]
Q_slip = I / t      # [C]
#        ^^^^^ unlike-result


# ==== Wavelength ====
# CODATA 2022, speed of light
c = 299792458   # [m/s]
f = 2.4         # [GHz]
lam = c / (f * 1e9)         # [m]
lam_mm = c / f / 1e6        # [mm]
lam_slip = c / f            # [m]
#          ^^^^^ scale-mismatch


# ==== Force between conductors ====
# Jackson, Classical Electrodynamics, chapter 5
from math import pi

mu0 = 1.25663706127e-6  # [N/A^2]
I1 = 120.0      # [A]
I2 = 120.0      # [A]
L = 2.0         # [m]
d = 0.05        # [m]
F = mu0 * I1 * I2 * L / (2 * pi * d)    # [N]
F_slip = mu0 * I1 * I2 / (2 * pi * d)   # [N]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result
