# Pumps, valves and oil hydraulics. Each section is a text of its own: the right form, then the slip that is usual with it.
# Sources are cited from memory; where none is named, the formula is common practice.

# ==== Pump power ====
# Karassik et al., Pump Handbook, 4th ed., chapter 2
def pump_power(Q, H, rho, eta):
    """Shaft power of a pump.

    Parameters
    ----------
    Q : float
        Flow [m^3/h]
    H : float
        Head [m]
    rho : float
        Density [kg/m^3]
    eta : float
        Efficiency [-]

    Returns
    -------
    P : float
        Shaft power [kW]
    """
    g = 9.81  # [m/s^2]
    return rho * g * Q * H / (3.6e6 * eta)


def pump_power_slip(Q, H, rho, eta):
    """Shaft power with the hours forgotten.

    Parameters
    ----------
    Q : float
        Flow [m^3/h]
    H : float
        Head [m]
    rho : float
        Density [kg/m^3]
    eta : float
        Efficiency [-]

    Returns
    -------
    P : float
        Shaft power [kW]
    """
    g = 9.81  # [m/s^2]
    return rho * g * Q * H / (1000 * eta)
    #      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch: kW


# ==== Water horsepower ====
# common practice in gallons and feet: 3960 holds the specific weight of water
Q = 55.0        # [gpm]
H = 60.0        # [ft]
gamma = 62.4    # [lbf/ft^3] specific weight of water
P = gamma * H * Q * 231 / 1728 / 33000      # [hp]
P_short = Q * H / 3960                      # [hp]
#         ^^^^^^^^^^^^ hidden-unit: 3960


# ==== Net positive suction head ====
# Karassik et al., Pump Handbook, 4th ed., chapter 2
p_atm = 101.3   # [kPa]
p_v = 2.34      # [kPa] vapour pressure
rho = 998.2     # [kg/m^3]
g = 9.81        # [m/s^2]
z = 2.5         # [m]
h_f = 0.8       # [m]

npsh = (p_atm - p_v) * 1000 / (rho * g) + z - h_f   # [m]
npsh_slip = (p_atm - p_v) / (rho * g) + z - h_f     # [m]
#           ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Affinity laws ====
# Karassik et al., Pump Handbook, 4th ed., chapter 2
N1 = 1450       # [rpm]
N2 = 1160       # [rpm]
Q1 = 42.0       # [m^3/h]
H1 = 18.0       # [m]
P1 = 3.2        # [kW]

Q2 = Q1 * N2 / N1           # [m^3/h]
H2 = H1 * (N2 / N1)**2      # [m]
P2 = P1 * (N2 / N1)**3      # [kW]
H_slip = H1 * N2**2 / N1    # [m]
#        ^^^^^^^^^^^^^^^ unlike-result


# ==== Specific speed in plant units ====
# Karassik et al., Pump Handbook, 4th ed., chapter 2; the number of the metric form is not dimensionless
import math

n = 1450        # [rpm]
Q = 0.0117      # [m^3/s]
H = 18.0        # [m]
g = 9.81        # [m/s^2]

omega_s = 2 * math.pi * n / 60 * math.sqrt(Q) / (g * H)**0.75       # [-]
ns_slip = n * math.sqrt(Q) / H**0.75                                # [-]
#         ^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Force of a cylinder ====
# common practice of oil hydraulics: bar and square millimetres give a tenth of a newton
p = 160.0       # [bar]
A = 1963.0      # [mm^2]
F = p * A / 10          # [N]
F_kN = p * A * 1e-4     # [kN]
F_slip = p * A          # [N]
#        ^^^^^ scale-mismatch: N


# ==== Piston speed ====
# common practice of oil hydraulics
Q = 24.0            # [L/min]
A = 19.63           # [cm^2]
v = Q / (6 * A)     # [m/s]
v_min = Q / A       # [dm^3/(min cm^2)]
v_slip = Q / A      # [m/s]
#        ^^^^^ scale-mismatch: m/s


# ==== Flow of a displacement pump ====
# common practice of oil hydraulics
Vg = 16.0       # [cm^3] displacement per revolution
n = 1450        # [rpm]
eta = 0.93      # [-]
Q = Vg * n * eta / 1000     # [L/min]
Q_si = Vg * 1e-6 * n / 60 * eta     # [m^3/s]
Q_slip = Vg * n * eta       # [L/min]
#        ^^^^^^^^^^^^ scale-mismatch: L/min


# ==== Power from bar and litres per minute ====
# common practice of oil hydraulics: the factor 600
p = 160.0       # bar
Q = 24.0        # L/min
eta = 0.88      # -
P = p * Q / (600 * eta)     # kW
P_slip = p * Q / (60 * eta) # kW
#        ^^^^^^^^^^^^^^^^^^ scale-mismatch: kW


# ==== Torque of a hydraulic motor ====
# common practice of oil hydraulics: 20 pi holds the tenth of bar·cm³ and the revolution
from math import pi

dp = 160.0      # [bar]
Vg = 80.0       # [cm^3]
M = dp * Vg / (20 * pi)     # [N m]
M_si = dp * 1e5 * Vg * 1e-6 / (2 * pi)   # [N m]
M_slip = dp * Vg / (2 * pi) # [N m]
#        ^^^^^^^^^^^^^^^^^^ scale-mismatch


# ==== Pressure of a column in metres of water ====
# from memory, common practice
p = 2.4         # [bar]
rho = 998.2     # [kg/m^3]
g = 9.81        # [m/s^2]
h = p * 1e5 / (rho * g)     # [m]
h_slip = p / (rho * g)      # [m]
#        ^^^^^^^^^^^^^ scale-mismatch


# ==== Valve flow coefficient ====
# IEC 60534-2-1, flow of liquids: Kv is the flow in m³/h at 1 bar and relative density 1
def valve_flow(Kv, dp, G):
    """Flow through a control valve.

    Parameters
    ----------
    Kv : float
        Flow coefficient [m^3/h]
    dp : float
        Pressure drop [bar]
    G : float
        Relative density [-]
    """
    # empirical: Q [m^3/h], Kv [m^3/h], dp [bar], G [-]
    Q = Kv * (dp / G)**0.5
    return Q


def valve_flow_checked(Kv, dp, G):
    """The same with the reference drop written down.

    Parameters
    ----------
    Kv : float
        Flow coefficient [m^3/h]
    dp : float
        Pressure drop [bar]
    G : float
        Relative density [-]

    Returns
    -------
    Q : float
        Flow [m^3/h]
    """
    dp_ref = 1.0  # [bar]
    return Kv * (dp / dp_ref / G)**0.5


def valve_flow_slip(Kv, dp, G):
    """The root of a pressure left in the flow.

    Parameters
    ----------
    Kv : float
        Flow coefficient [m^3/h]
    dp : float
        Pressure drop [bar]
    G : float
        Relative density [-]

    Returns
    -------
    Q : float
        Flow [m^3/h]
    """
    return Kv * (dp / G)**0.5
    #      ^^^^^^^^^^^^^^^^^^ unlike-result


# ==== Accumulator, gas side ====
# from memory, common practice: Boyle's law counts absolute pressures
p0 = 90.0       # [barg] precharge
p1 = 160.0      # [barg]
V0 = 10.0       # [L]
p_atm = 1.013   # [bar]
V1 = V0 * (p0 + p_atm) / (p1 + p_atm)   # [L]
V1_m3 = V1 / 1000   # [m^3]
V_used = V0 - V1
V_slip = V0 - V1_m3
#        ^^^^^^^^^^ scale-mismatch: m^3
