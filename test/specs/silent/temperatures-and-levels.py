# Points on scales, gauge pressures and levels. Nothing here may be reported; common practice throughout.

# ==== Differences of temperatures in Celsius ====
T1 = 62.0       # [degC]
T2 = 41.0       # [degC]
dT = T1 - T2
ratio = (T1 - 21.0) / (T2 - 21.0)
q = 850.0 * dT
T3 = T2 + 0.3 * (T1 - T2)   # [degC]

# ==== Kelvins and Celsius differ by the same amount ====
T_a = 21.0      # [degC]
dT = 5.0        # [K]
T_b = T_a + dT          # [degC]
rise = T_b - T_a        # [K]
slope = 0.4             # [K/min]
t = 10.0                # [min]
T_c = T_a + slope * t   # [degC]

# ==== Interpolating between two temperatures ====
x1, x2 = 0.0, 1.2       # [m]
x = 0.4                 # [m]
T1 = 62.0               # [degC]
T2 = 41.0               # [degC]
T = T1 + (T2 - T1) * (x - x1) / (x2 - x1)       # [degC]
T_mix = (2 * T1 + 3 * T2) / 5                   # [degC]

# ==== Mixing of two streams ====
m1 = 0.4        # [kg/s]
m2 = 0.6        # [kg/s]
T1 = 62.0       # [degC]
T2 = 15.0       # [degC]
T = (m1 * T1 + m2 * T2) / (m1 + m2)     # [degC]

# ==== Mean of a list of temperatures ====
import numpy as np

T = np.array([18.0, 21.5, 24.0])    # [degC]
T_mean = np.mean(T)                 # [degC]
T_mean2 = sum(T) / len(T)           # [degC]
T_mean3 = T.mean()                  # [degC]
spread = T.max() - T.min()
T_weighted = np.average(T, weights=[1, 2, 1])   # [degC]

# ==== Celsius turned into kelvins in place ====
T = 41.0            # [degC]
T = T + 273.15      # [K]
R = 287.05          # [J/(kg K)]
p = 1.0e5           # [Pa]
rho = p / (R * T)   # [kg/m^3]

# ==== Augmented conversion ====
def rate(T):
    """Rate.

    Parameters
    ----------
    T : float
        Temperature [degC]
    """
    Tk = T
    Tk += 273.15
    return 1.0 / Tk

# ==== Fahrenheit in all arrangements ====
F = 212.0                   # [degF]
C1 = (F - 32) * 5 / 9       # [degC]
C2 = (F - 32) / 1.8         # [degC]
C3 = 5.0 / 9.0 * (F - 32.0)     # [degC]
F2 = 32 + C1 * 9 / 5        # [degF]
F3 = C1 * 1.8 + 32          # [degF]
K = (F + 459.67) * 5 / 9    # [K]
R = F + 459.67              # [degR]
R2 = K * 1.8                # [degR]
dF = F - F2
dC = dF / 1.8               # [K]

# ==== Ratio of absolute temperatures ====
T1 = 21.0       # [degC]
T2 = 60.0       # [degC]
p1 = 1.2        # [bar]
p2 = p1 * (T2 + 273.15) / (T1 + 273.15)     # [bar]

# ==== Polynomial in a temperature in Celsius without notes on the coefficients ====
T = 31.0        # [degC]
c0 = 4.2174
c1 = -3.6e-3
c2 = 1.0e-4
cp = c0 + c1 * T + c2 * T**2

# ==== Comparison of temperatures ====
T = 31.0            # [degC]
T_max = 60.0        # [degC]
T_set = 55          # [degC]
if T > T_max or T < -10:
    T = T_set
elif T_set - 2 < T < T_set + 2:
    T = T_max

# ==== Conductance per degree Celsius ====
U = 0.24            # [W/(m^2 degC)]
A = 18.0            # [m^2]
Ti = 21.0           # [degC]
Ta = -4.0           # [degC]
Q = U * A * (Ti - Ta)   # [W]
alpha = 1.2e-5      # [1/degC]
L = 24.0            # [m]
dL = alpha * L * (Ti - Ta)      # [m]

# ==== Product with a reference point of zero Celsius ====
cp = 4.186          # [kJ/(kg degC)]
m = 12.0            # [kg]
T = 62.0            # [degC]
H = m * cp * T      # [kJ] enthalpy from 0 degC

# ==== Gauge plus atmosphere ====
p_g = 6.0           # [barg]
p_atm = 1.01325     # [bar]
p_abs = p_g + p_atm     # [bara]
p2_g = p_abs * 2 - p_atm
R = 287.05          # [J/(kg K)]
T = 293.15          # [K]
rho = p_abs * 1e5 / (R * T)     # [kg/m^3]

# ==== Gauge pressures among themselves ====
p1 = 60.0           # [psig]
p2 = 42.0           # [psig]
dp = p1 - p2
A = 3.2             # [in^2]
F = p1 * A          # [lbf]
if p1 > 80:
    dp = 0
ratio = (p1 + 14.7) / (p2 + 14.7)

# ==== Gauge pressure under a column ====
p_g = 2.4e5         # [Pag]
rho = 998.2         # [kg/m^3]
g = 9.81            # [m/s^2]
h = p_g / (rho * g)     # [m]
depth = 2.0         # [m]
p_b = p_g + rho * g * depth

# ==== Levels ====
import math

L1 = 62.0           # [dB]
L2 = 58.0           # [dB]
gain = L1 - L2      # [dB]
G = L1 + 3.0        # [dB]
r = 10**(gain / 10)
L_sum = 10 * math.log10(10**(L1 / 10) + 10**(L2 / 10))      # [dB]

# ==== Logarithm with an explicit reference ====
import math

p = 0.02            # [Pa]
p0 = 20e-6          # [Pa]
Lp = 20 * math.log10(p / p0)        # [dB]
pH = -math.log10(3.2e-8)

# ==== Difference of logarithms ====
import numpy as np

x1 = np.log(2.4)
x2 = np.log(0.6)
slope = (x1 - x2) / 1.8
half_life = np.log(2) / slope

# ==== Boltzmann factors ====
import numpy as np

E = 6.2e4           # [J/mol]
R = 8.314           # [J/(mol K)]
T = 320.0           # [K]
k = 1.0e7 * np.exp(-E / (R * T))
k2 = 1.0e7 * np.exp(-E / R / T)
k3 = 1.0e7 * np.exp(-E / R * (1 / T - 1 / 298.15))
