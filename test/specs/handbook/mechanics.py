# Mechanics and machines. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited by chapter from memory; the formulas are common to all textbooks of the field.

# ==== Kinetic energy ====
# Halliday, Resnick, Walker, Fundamentals of Physics, 10th ed., chapter 7
m = 1450.0      # kg
v_kmh = 90.0    # km/h
v = v_kmh / 3.6     # m/s
E = 0.5 * m * v**2              # J
E_kJ = m * v**2 / 2 / 1000      # kJ
E_slip = 0.5 * m * v            # J
#        ^^^^^^^^^^^ unlike-result: J


# ==== Shaft power from torque and speed ====
# Shigley, Mechanical Engineering Design, chapter 3
from math import pi


def shaft_power(M, n):
    """Power of a shaft.

    Parameters
    ----------
    M : float
        Torque [N m]
    n : float
        Speed [rpm]

    Returns
    -------
    P : float
        Power [W]
    """
    return 2 * pi * n / 60 * M


def shaft_power_kw(M, n):
    """Power of a shaft in kilowatts, the works' formula.

    Parameters
    ----------
    M : float
        Torque [N m]
    n : float
        Speed [rpm]

    Returns
    -------
    P : float
        Power [kW]
    """
    return M * n / 9549.3


def shaft_power_slip(M, n):
    """Power of a shaft with the speed as it stands.

    Parameters
    ----------
    M : float
        Torque [N m]
    n : float
        Speed [rpm]

    Returns
    -------
    P : float
        Power [W]
    """
    return M * n
    #      ^^^^^ scale-mismatch


# ==== Angular speed ====
# ISO 80000-3; from memory, common practice
import math

n = 1450        # [rpm]
omega = 2 * math.pi * n / 60    # [rad/s]
omega2 = n * math.pi / 30       # [rad/s]
f = n / 60                      # [Hz]
n_back = omega * 60 / (2 * math.pi)     # [rpm]
n_9549 = omega * 9.5493         # [rpm]
omega_slip = n / 60             # [rad/s]
#            ^^^^^^ scale-mismatch: rad/s


# ==== Centrifugal force ====
# Halliday, Resnick, Walker, 10th ed., chapter 6
m = 0.35        # [kg]
r = 0.12        # [m]
omega = 151.8   # [rad/s]
v = omega * r   # [m/s]
F = m * omega**2 * r    # [N]
F_v = m * v**2 / r      # [N]
F_slip = m * v**2 * r   # [N]
#        ^^^^^^^^^^^^ unlike-result


# ==== Tip speed of an impeller ====
# from memory, common practice
from math import pi

D = 0.085       # [m]
N = 6.5         # [rev/s]
n = 390         # [rpm]
v_tip = pi * D * N          # [m/s]
v_rpm = pi * D * n / 60     # [m/s]
v_slip = D / 2 * N          # [m/s]
#        ^^^^^^^^^ scale-mismatch


# ==== Natural frequency of a mass on a spring ====
# Den Hartog, Mechanical Vibrations, chapter 2
from math import pi, sqrt

k = 2.4e4       # [N/m]
m = 12.0        # [kg]
f = sqrt(k / m) / (2 * pi)      # [Hz]
omega = sqrt(k / m)             # [rad/s]
k_mm = 24.0     # [N/mm]
f_mm = sqrt(k_mm * 1000 / m) / (2 * pi)     # [Hz]
f_slip = sqrt(m / k) / (2 * pi) # [Hz]
#        ^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Natural frequency, stiffness per millimetre ====
# Den Hartog, Mechanical Vibrations, chapter 2
from math import sqrt

k = 24.0        # [N/mm]
m = 12.0        # [kg]
omega = sqrt(k / m)     # [rad/s]
#       ^^^^^^^^^^^ scale-mismatch


# ==== Pendulum ====
# Halliday, Resnick, Walker, 10th ed., chapter 15
import math

L = 0.994       # [m]
g = 9.81        # [m/s^2]
T = 2 * math.pi * math.sqrt(L / g)          # [s]
T_slip = 2 * math.pi * math.sqrt(g / L)     # [s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Throw ====
# Halliday, Resnick, Walker, 10th ed., chapter 4
import math

v = 14.0        # [m/s]
theta = 38.0    # [deg]
g = 9.81        # [m/s^2]
x = v**2 * math.sin(2 * math.radians(theta)) / g        # [m]
x2 = v**2 * math.sin(2 * theta * math.pi / 180) / g     # [m]
y = v**2 * math.sin(math.radians(theta))**2 / (2 * g)   # [m]
x_slip = v**2 * math.sin(2 * theta) / g                 # [m]
#                        ^^^^^^^^^ scale-mismatch


# ==== Inclined plane with friction ====
# Halliday, Resnick, Walker, 10th ed., chapter 6
import numpy as np

m = 80.0        # [kg]
g = 9.81        # [m/s^2]
mu = 0.22       # [-]
a = np.deg2rad(12.0)    # [rad]
F = m * g * (np.sin(a) + mu * np.cos(a))    # [N]
F_slip = m * (np.sin(a) + mu * np.cos(a))   # [N]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result: N


# ==== Energy of a flywheel ====
# Shigley, Mechanical Engineering Design, chapter on flywheels
from math import pi

J = 1.8         # [kg m^2]
n = 1450        # [rpm]
omega = 2 * pi * n / 60         # [rad/s]
E = 0.5 * J * omega**2          # [J]
E_slip = 0.5 * J * n**2         # [J]
#        ^^^^^^^^^^^^^^ scale-mismatch


# ==== Moment of inertia of a disc ====
# Halliday, Resnick, Walker, 10th ed., chapter 10
m = 22.0        # [kg]
D = 320.0       # [mm]
J = m * (D / 1000)**2 / 8   # [kg m^2]
J_slip = m * D**2 / 8       # [kg m^2]
#        ^^^^^^^^^^^^ scale-mismatch


# ==== Stopping distance ====
# from memory, common practice
v = 50.0        # [km/h]
t_r = 1.0       # [s]
mu = 0.7        # [-]
g = 9.81        # [m/s^2]
vm = v / 3.6    # [m/s]
s = vm * t_r + vm**2 / (2 * mu * g)     # [m]
s_slip = v * t_r + vm**2 / (2 * mu * g) # [m]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Uniform acceleration ====
# Halliday, Resnick, Walker, 10th ed., chapter 2
def position(x0, v0, a, t):
    """Position under constant acceleration.

    :param x0: position at the start [m]
    :param v0: velocity at the start [m/s]
    :param a: acceleration [m/s^2]
    :param t: time [s]
    """
    return x0 + v0 * t + 0.5 * a * t**2


def position_slip(x0, v0, a, t):
    """Position, the time not squared.

    :param x0: position at the start [m]
    :param v0: velocity at the start [m/s]
    :param a: acceleration [m/s^2]
    :param t: time [s]
    """
    return x0 + v0 * t + 0.5 * a * t
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms


# ==== Rocket equation ====
# from memory, common practice
from math import log

Isp = 285.0     # [s]
g0 = 9.80665    # [m/s^2]
m0 = 1450.0     # [kg]
m1 = 610.0      # [kg]
dv = Isp * g0 * log(m0 / m1)    # [m/s]
dv_slip = Isp * log(m0 / m1)    # [m/s]
#         ^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Tightening torque ====
# Shigley, Mechanical Engineering Design, chapter 8
K = 0.2         # [-]
F = 18500.0     # [N]
d = 12.0        # [mm]
M = K * F * d / 1000    # [N m]
M_slip = K * F * d      # [N m]
#        ^^^^^^^^^ scale-mismatch


# ==== Belt tension after Euler and Eytelwein ====
# Shigley, Mechanical Engineering Design, chapter 17
import math

mu = 0.3        # [-]
wrap = 165.0    # [deg]
T2 = 240.0      # [N]
T1 = T2 * math.exp(mu * math.radians(wrap))     # [N]
T1_slip = T2 * math.exp(mu * wrap)              # [N]
#                       ^^^^^^^^^ scale-mismatch


# ==== Bearing life ====
# ISO 281, basic rating life; in hours at n revolutions per minute
C = 35.1        # [kN]
P = 4.2         # [kN]
n = 1450        # [rpm]
L10 = (C / P)**3                    # [-] million revolutions
L10h = L10 * 1e6 / (60 * n)         # [h]
P_N = 4200.0    # [N]
L10_slip = (C / P_N)**3             # [-]
#          ^^^^^^^^^^^^ scale-mismatch


# ==== Orbital period ====
# Halliday, Resnick, Walker, 10th ed., chapter 13; G from CODATA 2022
from math import pi, sqrt

G = 6.6743e-11      # [m^3 kg^-1 s^-2]
M = 5.972e24        # [kg]
a = 7.0e6           # [m]
T = 2 * pi * sqrt(a**3 / (G * M))       # [s]
T_slip = 2 * pi * sqrt(a**2 / (G * M))  # [s]
#        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result
