# What engineers write with bare numbers, zeros and constants. Nothing here may be reported; common practice throughout.

# ==== Zero fits any unit ====
p = 0       # [Pa]
p += 240.0
total = 0.0
for q in [1.2, 3.4]:    # [m]
    total += q

# ==== Infinity as a first best ====
best = float("inf")
costs = [4.2, 3.1]      # [kW]
for c in costs:
    best = min(best, c)
    if c < best:
        best = c

# ==== Infinity and nan of numpy ====
import numpy as np

p_min = np.inf          # [bar]
T = np.nan              # [degC]
p = np.array([1.2, 1.6])    # [bar]
p_min = min(p_min, p[0])
T_filled = np.where(np.isnan(T), 20.0, T)

# ==== Comparison with a bare number ====
D = 0.0525      # [m]
if D < 0.1:
    small = True
elif 0.1 <= D < 0.5:
    small = False

# ==== Comparison with a tolerance that has a name ====
tol = 1e-6
dp = 12.0       # [Pa]
dp_old = 11.9   # [Pa]
if abs(dp - dp_old) < tol:
    print("done")
if abs(dp - dp_old) / dp < tol:
    print("done")

# ==== Clipping at zero ====
Q_in = 0.4      # [m^3/h]
Q_out = 0.6     # [m^3/h]
Q_net = max(Q_in - Q_out, 0)
Q_pos = max(0.0, Q_in - Q_out)

# ==== Clipping arrays at zero ====
import numpy as np

x = np.array([0.3, -0.2])   # [m]
a = np.maximum(x, 0)
b = np.where(x > 0, x, 0)
c = np.clip(x, 0, None)
d = x * (x > 0)

# ==== Guard against a division by zero ====
A = 0.02        # [m^2]
Q = 0.003       # [m^3/s]
V = Q / max(A, 1e-9)        # [m/s]
V = Q / (A + 1e-12)         # [m/s]
V = Q / A if A > 0 else 0.0     # [m/s]

# ==== Scripts without any unit ====
a = 3
b = a + 4.5
c = a**b + 2**a
d = b / c + c - a * 9.81
if d > a:
    a, b = b, a

# ==== One half in all its forms ====
m = 12.0    # [kg]
v = 1.4     # [m/s]
E1 = 1 / 2 * m * v**2       # [J]
E2 = 0.5 * m * v**2         # [J]
E3 = m * v**2 / 2.0         # [J]
E4 = .5 * m * v ** 2.0      # [J]
E5 = E1 + E2 - E3

# ==== Roots written as powers ====
A = 0.02    # [m^2]
V = 0.001   # [m^3]
s1 = A**0.5         # [m]
s2 = A**(1 / 2)     # [m]
s3 = V**(1 / 3)     # [m]
s4 = V**(1.0 / 3.0)     # [m]
total = s1 + s2 + s3 + s4

# ==== A third written with digits ====
V = 0.001   # [m^3]
s = V**0.3333       # [m]
s2 = V**0.333333    # [m]
t = s2 * 1.02

# ==== Standard gravity with and without a note ====
g = 9.81
g_n = 9.80665   # [m/s^2]
rho = 998.2     # [kg/m^3]
h = 2.0         # [m]
p = rho * g_n * h       # [Pa]
w = rho * g

# ==== Constants without a note ====
T_C = 21.0      # [degC]
ZERO = 273.15
T_K = T_C + ZERO
T_K2 = T_C + 273
g = 9.81
R = 8.314
MW = 0.029

# ==== Time step without a note ====
dt = 0.1
x = 0.0     # [m]
v = 1.4     # [m/s]
for _ in range(10):
    x += v * dt

# ==== Step size and count ====
L = 2.0     # [m]
n = 20
dx = L / n
nodes = [i * dx for i in range(n + 1)]
mid = (nodes[0] + nodes[-1]) / 2
x = L - dx / 2

# ==== Default arguments ====
def flow(A, V=1.4, factor=1.0, offset=0):
    """Flow.

    Parameters
    ----------
    A : float
        Area [m^2]
    V : float
        Velocity [m/s]
    factor : float
        Correction [-]
    offset : float
        Leakage [m^3/s]

    Returns
    -------
    Q : float
        Flow [m^3/s]
    """
    return factor * A * V - offset


Q1 = flow(0.02)
Q2 = flow(0.02, 2.0)
Q3 = flow(A=0.02, factor=0.95, offset=0.001)

# ==== None as a default ====
def density(T, rho_ref=None):
    """Density.

    Parameters
    ----------
    T : float
        Temperature [degC]
    rho_ref : float, optional
        Reference density [kg/m^3]
    """
    if rho_ref is None:
        rho_ref = 998.2
    if T is None or rho_ref == 0:
        return None
    return rho_ref * (1 - 2.1e-4 * (T - 20))

# ==== Percent in both senses ====
eta = 85        # [%]
x = 0.3         # [-]
P_in = 4.0      # [kW]
P_out = P_in * eta / 100    # [kW]
loss = 100 - eta            # [%]
rest = 1 - x
share = 100 * x

# ==== Parts per million and fractions ====
c = 420         # [ppm]
y = c * 1e-6    # [-]
y_pct = c / 1e4     # [%]
z = c + 30

# ==== Numbers in other notations ====
p = 1_013_25        # [Pa]
n = 0x1F
k = 1e3
E = 2.1E+11         # [Pa]
C = 2.2e-6          # [F]
z = 3 + 4j

# ==== Conversion factors as literals ====
p_kPa = 240.0       # [kPa]
p = p_kPa * 1000    # [Pa]
p2 = p_kPa * 1e3    # [Pa]
p3 = p_kPa * 10**3  # [Pa]
p_bar = p / 1e5     # [bar]
p_mbar = p * 0.01   # [mbar]
L_mm = 420          # [mm]
L = L_mm / 1000.    # [m]
L_in = L_mm / 25.4  # [in]
L_ft = L / 0.3048   # [ft]
m_lb = 12.0         # [lb]
m = m_lb * 0.4536   # [kg]
A_mm2 = 314.0       # [mm^2]
A = A_mm2 * 1e-6    # [m^2]
V_L = 2.4           # [L]
V = V_L / 1000      # [m^3]
t_min = 4.0         # [min]
t = t_min * 60      # [s]
t_h = t / 3600      # [h]
d = t_h / 24        # [d]

# ==== Named conversion factors with notes ====
MM_PER_M = 1000     # [mm/m]
PA_PER_BAR = 1e5    # [Pa/bar]
S_PER_H = 3600      # [s/h]
L = 1.2             # [m]
L_mm = L * MM_PER_M     # [mm]
p = 2.4             # [bar]
p_Pa = p * PA_PER_BAR   # [Pa]
Q = 18.0            # [m^3/h]
Q_s = Q / S_PER_H   # [m^3/s]

# ==== Named conversion factors without notes ====
IN2M = 0.0254
PSI = 6894.76
BTU = 1055.06
L_in = 42.0         # [in]
L = L_in * IN2M     # [m]
p_psi = 60.0        # [psi]
p = p_psi * PSI     # [Pa]
Q_btu = 12000       # [BTU/h]
Q = Q_btu * BTU / 3600  # [W]

# ==== Several conversions in one line ====
Q_gpm = 55.0                            # [gpm]
Q = Q_gpm * 3.785 / 60000               # [m^3/s]
q = 1.2                                 # [L/(min m^2)]
q_si = q / 1000 / 60                    # [m/s]
rho = 62.4                              # [lb/ft^3]
rho_si = rho * 0.4536 / 0.3048**3       # [kg/m^3]

# ==== A pure factor that looks like a conversion ====
q = 3.2     # [kW]
n = 1000
total = n * q           # [kW]
worst = 1.2 * q + 0.1 * q
big = 1000 * q
sum_all = big + q

# ==== Rounding and integers ====
L = 4.37            # [m]
step = 0.6          # [m]
n = int(L / step) + 1
n2 = round(L / step)
rest = L - (n - 1) * step
rest2 = L % step
k = L // step
L_r = round(L, 2) + step

# ==== Safety and correction factors ====
sigma = 140.0       # [MPa]
f_y = 235.0         # [MPa]
gamma_M = 1.1
sf = 1.5
util = sigma * sf / (f_y / gamma_M)     # [-]
margin = f_y / gamma_M - 1.35 * sigma

# ==== Ratios of like quantities ====
import math

p1 = 101.3      # [kPa]
p2 = 340.0      # [kPa]
V1 = 2.4        # [L]
r = p2 / p1
V2 = V1 / r**0.7
y = math.log(p2 / p1) / math.log(V1 / V2)
n = math.log10(p2 / p1) + 2

# ==== Angles without a note ====
import math

a = 0.4
h = 2.0             # [m]
x = h * math.tan(a)     # [m]
b = math.pi / 6
y = h * math.sin(b) + h * math.cos(a + b)

# ==== Angles converted ====
import math

a = 32.0            # [deg]
b = math.radians(a)     # [rad]
c = math.degrees(b)     # [deg]
d = a * math.pi / 180   # [rad]
e = b * 180 / math.pi   # [deg]
s = math.sin(b) + math.cos(d)
h = math.degrees(math.atan2(3.0, 4.0))  # [deg]
wrapped = a % 360
phase = 360 * 0.25 + a

# ==== An angle as a ratio of lengths ====
arc = 0.12      # [m]
r = 0.4         # [m]
phi = arc / r   # [rad]
s = r * phi     # [m]
small = 1 - phi**2 / 2


# ==== An angle without a note, in degrees, turned and doubled ====
# from memory, common practice
def cosd(angle):
    """Cosine of an angle.

    Parameters
    ----------
    angle : float
        [degrees]
    """
    return unknown(angle)


tilt = 10
a = cosd(tilt)
b = cosd(-tilt)
c = cosd(2*tilt)
d = cosd(90 - tilt)
