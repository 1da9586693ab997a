# Ways of writing Python that carry no fault. Nothing here may be reported; common practice throughout.

# ==== A variable used again with another unit ====
x = 3.2         # [m]
y = x * 2
x = 14.0        # [s]
z = x + 1
x = "done"

# ==== A variable converted in place ====
D = 52.5        # [mm]
D = D / 1000    # [m]
A = 3.14159 * D**2 / 4      # [m^2]
Q = 18.0        # [m^3/h]
Q /= 3600
t = 4.0         # [min]
t *= 60

# ==== Tuple of mixed units ====
state = (1.2e5, 293.15, 0.4)
p, T, x = state
point = (0.4, 21.0)
pairs = [(0.0, 1.79), (20.0, 1.0)]
for t, mu in pairs:
    print(t, mu)

# ==== Mixed results from a function ====
def sizes(D, V):
    """Area and flow.

    Parameters
    ----------
    D : float
        Diameter [m]
    V : float
        Velocity [m/s]
    """
    A = 3.14159 * D**2 / 4
    return A, A * V, D


A, Q, D = sizes(0.05, 1.4)
row = sizes(0.08, 1.4)
print(row[0], row[1])

# ==== Dictionary of mixed units ====
pump = {"Q": 42.0, "H": 18.0, "name": "P-101", "speeds": [1450, 2900]}
P = 9.81 * 998 * pump["Q"] / 3600 * pump["H"]
for key, value in pump.items():
    print(key, value)

# ==== Dictionary with notes in its entries ====
fluid = {
    "rho": 998.2,       # [kg/m^3]
    "mu": 1.0e-3,       # [Pa s]
    "T": 20.0,          # [degC]
}
nu = fluid["mu"] / fluid["rho"]     # [m^2/s]
both = fluid["rho"], fluid["T"]

# ==== Lists of mixed quantities ====
row = [1.2e5, 293.15, 0.4]
header = ["p [Pa]", "T [K]", "x [-]"]
rows = [header, row]
rows.append([1.3e5, 295.0, 0.42])

# ==== Strings and formatting ====
p = 2.4         # [bar]
T = 21.0        # [degC]
s = "p = %.2f bar at %.1f degC" % (p, T)
t = f"p = {p:.2f} bar, T = {T + 273.15:.1f} K"
u = "p = " + str(p) + " bar"
v = "{:.1f} {}".format(p, "bar")
w = "-" * 20 + "\n"

# ==== Plot labels ====
import matplotlib.pyplot as plt
import numpy as np

t = np.linspace(0, 60, 61)      # [min]
rate = 0.4                      # [K/min]
T = 21 + rate * t               # [degC]
fig, ax = plt.subplots(figsize=(8, 4))
ax.plot(t, T, "o-", label="T [degC]", lw=2)
ax.set_xlabel("t [min]")
ax.set_ylabel("T [degC]")
ax.set_xlim(0, t[-1] + 1)
plt.savefig("run.png", dpi=150)

# ==== Functions that nobody knows ====
from propertylib import viscosity, enthalpy

T = 41.0        # [degC]
p = 2.4         # [bar]
mu = viscosity(T, p)        # [Pa s]
h = enthalpy(T, p)          # [kJ/kg]
q = 0.4 * (enthalpy(T + 10, p) - h)
r = viscosity(T, p) + viscosity(T - 5, p)

# ==== Values read from a file ====
import csv

rows = []
with open("log.csv") as source:
    for record in csv.reader(source):
        t = float(record[0])        # [s]
        p = float(record[1])        # [kPa]
        rows.append((t, p))
t_end = rows[-1][0]
p_max = max(r[1] for r in rows)

# ==== Columns of a data frame ====
import pandas as pd

df = pd.read_csv("log.csv")
df["T_K"] = df["T"] + 273.15
df["Q"] = df["m"] * 4.186 * (df["T_in"] - df["T_out"])
df = df[df["Q"] > 0]
total = df["Q"].sum() / 3600

# ==== Enumerate and zip ====
L = [1.2, 0.8, 2.5]     # [m]
D = [52.5, 40.0, 25.0]  # [mm]
V = 0.0
for i, l in enumerate(L):
    V += l * (D[i] / 1000)**2
for l, d in zip(L, D):
    V += l * (d / 1000)**2
    x = i * 0.5 + 1

# ==== Appending to lists ====
T = 21.0        # [degC]
history = []
times = [0]
for k in range(5):
    T = T + 0.4
    history.append(T)
    times.append(times[-1] + 60)
last = history[-1]

# ==== Arrays like another ====
import numpy as np

T = np.array([62.0, 41.0])      # [degC]
q = np.zeros_like(T)
e = np.empty(len(T))
for i in range(len(T)):
    q[i] = 850.0 * (T[i] - 21.0)
    e[i] = q[i] * 2.4

# ==== Filling an array step by step ====
import numpy as np

n = 50
dt = 0.1                # [s]
x = np.zeros(n)         # [m]
v = np.zeros(n)         # [m/s]
g = 9.81                # [m/s^2]
for i in range(1, n):
    v[i] = v[i - 1] - g * dt
    x[i] = x[i - 1] + v[i] * dt

# ==== Squares in a loop ====
x = [0.3, 0.5, 0.2]     # [m]
s = 0
for value in x:
    s += value**2
rms = (s / len(x))**0.5     # [m]

# ==== Powers that grow in a loop ====
x = 0.3
term = 1.0
total = 0.0
for k in range(10):
    term *= x
    total += term / (k + 1)

# ==== A product that changes its dimension in a loop ====
L = 0.3     # [m]
p = 1
for _ in range(3):
    p *= L
p = p / L

# ==== Newton's method ====
def friction(Re, rel):
    """Friction factor.

    Parameters
    ----------
    Re : float
        Reynolds number [-]
    rel : float
        Relative roughness [-]
    """
    import math

    x = 8.0
    for _ in range(20):
        F = x + 2 * math.log10(rel / 3.7 + 2.51 * x / Re)
        dF = 1 + 2 * 2.51 / Re / math.log(10) / (rel / 3.7 + 2.51 * x / Re)
        dx = F / dF
        x -= dx
        if abs(dx) < 1e-10:
            break
    return 1 / x**2

# ==== Bisection ====
def depth(V, A):
    """Depth of liquid.

    Parameters
    ----------
    V : float
        Volume [m^3]
    A : float
        Area [m^2]

    Returns
    -------
    h : float
        Depth [m]
    """
    lo, hi = 0.0, 10.0
    while hi - lo > 1e-6:
        mid = 0.5 * (lo + hi)
        if A * mid > V:
            hi = mid
        else:
            lo = mid
    return lo

# ==== Fixed point with relaxation ====
T = 60.0        # [degC]
T_env = 21.0    # [degC]
P = 45.0        # [W]
w = 0.5
for it in range(100):
    UA = 0.6        # [W/K]
    T_new = T_env + P / UA
    if abs(T_new - T) < 1e-3:
        break
    T = w * T + (1 - w) * T_new

# ==== One helper used with two units ====
def lerp(x, x0, x1, y0, y1):
    return y0 + (y1 - y0) * (x - x0) / (x1 - x0)


t = 31.0        # [degC]
mu = lerp(t, 20.0, 40.0, 1.0, 0.653)    # [mPa s]
z = 0.4         # [m]
p0 = 1.2e5      # [Pa]
p1 = 1.6e5      # [Pa]
p = lerp(z, 0.0, 1.0, p0, p1)           # [Pa]

# ==== Recursive function ====
def settle(x, n):
    if n == 0:
        return x
    return settle((x + 2 / x) / 2, n - 1)


r = settle(1.0, 6)

# ==== Lambdas and sorting ====
pipes = [(4.2, 52.5), (1.8, 40.0)]
longest = max(pipes, key=lambda pipe: pipe[0])
pipes.sort(key=lambda pipe: pipe[1])
area = lambda d: 3.14159 * d**2 / 4
A = area(0.05)      # [m^2]
B = area(52.5)      # [mm^2]

# ==== Comprehensions ====
L_mm = [420, 310, 275]              # [mm]
L = [v / 1000 for v in L_mm]        # [m]
longest = max(L)
total = sum(L)
count = len([v for v in L if v > 0.3])
squares = {k: v**2 for k, v in enumerate(L)}

# ==== Conditional factors ====
unit = "kPa"
p = 240.0
factor = {"kPa": 1000.0, "bar": 1e5, "Pa": 1.0}[unit]
p_Pa = p * factor       # [Pa]
k = 1e3 if unit == "kPa" else 1.0
p_2 = p * k             # [Pa]

# ==== Branches that convert ====
def to_pascal(p, unit):
    if unit == "bar":
        p = p * 1e5
    elif unit == "psi":
        p = p * 6894.76
    return p


p1 = to_pascal(2.4, "bar")      # [Pa]
p2 = to_pascal(240.0, "kPa")    # [Pa]

# ==== Global constants in capitals ====
G = 9.81            # [m/s^2]
RHO = 998.2         # [kg/m^3]
NU = 1.0e-6         # [m^2/s]


def hydrostatic(h):
    """Pressure at a depth.

    Parameters
    ----------
    h : float
        Depth [m]

    Returns
    -------
    p : float
        Pressure [Pa]
    """
    return RHO * G * h

# ==== Classes without notes ====
class Tank:
    def __init__(self, D, H):
        self.D = D
        self.H = H
        self.level = 0

    def volume(self):
        return 3.14159 * self.D**2 / 4 * self.level

    def fill(self, V):
        self.level += V / (3.14159 * self.D**2 / 4)
        self.level = min(self.level, self.H)

# ==== Properties and inheritance ====
class Part:
    def __init__(self, m):
        self.m = m      # [kg]

    @property
    def weight(self):
        return self.m * 9.81


class Bolt(Part):
    def __init__(self, m, d):
        super().__init__(m)
        self.d = d      # [mm]

    @property
    def area(self):
        return 3.14159 * self.d**2 / 4


b = Bolt(0.12, 12)
total = b.m + 0.02

# ==== Type hints and decorators ====
from functools import lru_cache
from typing import Optional


@lru_cache(maxsize=None)
def table(T: float, n: int = 3) -> Optional[float]:
    if n <= 0:
        return None
    return 1.0 + 0.02 * T / n

# ==== Try, with, match ====
def parse(text, default=1.0):
    try:
        value = float(text)
    except ValueError:
        value = default
    finally:
        pass
    match value:
        case 0:
            return None
        case x if x > 10:
            return x / 10
        case _:
            return value

# ==== Boolean masks and indices ====
import numpy as np

p = np.array([1.2, 1.6, 2.1])       # [bar]
high = p[p > 1.5]
i = np.argmax(p)
j = np.argsort(p)[::-1]
p[p < 1.3] = 1.3
n_high = np.sum(p > 1.5)
share = n_high / len(p)
first = p[0] + p[-1] / 2

# ==== Matrices ====
import numpy as np

A = np.array([[2.0, 1.0], [1.0, 3.0]])
b = np.array([1.0, 2.0])
x = np.linalg.solve(A, b)
r = A @ x - b
norm = np.linalg.norm(r)
M = np.eye(2) + 0.1 * A

# ==== Random numbers and statistics ====
import numpy as np

rng = np.random.default_rng(3)
L = 4.2 + rng.normal(0, 0.01, 100)      # [m]
m = np.mean(L)
s = np.std(L)
z = (L - m) / s
ok = np.all(np.abs(L - m) < 3 * s)
u = s / np.sqrt(len(L))
limit = m + 2 * s

# ==== Fits ====
import numpy as np

x = np.array([0.0, 1.0, 2.0])   # [m]
y = np.array([1.2, 1.9, 3.1])   # [N]
a, b = np.polyfit(x, y, 1)
fit = np.polyval([a, b], x)
rest = y - (a * x + b)

# ==== Differential equations ====
import numpy as np
from scipy.integrate import solve_ivp


def rhs(t, y):
    x, v = y
    return [v, -2.0 * x - 0.1 * v]


sol = solve_ivp(rhs, (0, 10), [1.0, 0.0], max_step=0.01)
x_end = sol.y[0][-1]

# ==== Time from the clock ====
import time

start = time.time()
elapsed = time.time() - start
rate = 100 / max(elapsed, 1e-9)
print(f"{rate:.0f} per second")

# ==== A record made by a call ====
# common practice
import math

par = dict(
    rho=998.2,      # [kg/m^3]
    d=40.0,         # [mm]
    dp=240.0,       # [Pa]
    name="tank",
)


def outflow(C):
    """Flow [kg/s] of the tank."""
    A = math.pi/4*(par["d"]/1000)**2        # [m^2]
    return C*A*math.sqrt(2*par["dp"]*par["rho"])

# ==== Objects by the annotation of a parameter and of a field ====
# common practice
from dataclasses import dataclass
from typing import Optional


@dataclass
class Motor:
    power: float        # [kW]
    speed: float        # [rpm]

    def torque(self) -> float:
        """Torque at the shaft for full load [N m]."""
        return 9550*self.power/self.speed


@dataclass
class Drive:
    motor: Motor
    spare: Optional["Motor"]
    ratio: float        # [-]

    def output(self) -> float:
        """Torque at the output shaft [kN m]."""
        return self.motor.torque()*self.ratio/1000


def losses(drive: Drive, eta: float) -> float:
    """Heat to be taken away.

    :param eta: efficiency [-]
    :return: heat flow [W]
    """
    return (1 - eta)*drive.motor.power*1000
