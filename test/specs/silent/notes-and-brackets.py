# Comments and documentation that are no notes, or notes in rare forms. Nothing here may be reported; common practice throughout.

# ==== Citations and shapes ====
def correlation(x):
    """Correlation after [1]_ and the data of [2]; see also [12].

    Parameters
    ----------
    x : array_like
        Inputs [n x 3]

    Returns
    -------
    y : array_like
        Values in [0, 1]

    References
    ----------
    .. [1] Handbook, 2nd ed. (1998)
    .. [2] Report (in press)
    """
    return x / (1 + x)      # see [1], eq. (3)

# ==== Options and literals in documentation ====
def solve(method="newton", m=None, h=1, K=2.0):
    """Solves it.

    Parameters
    ----------
    method : str
        One of ['newton', 'bisect'] [optional]
    m : int
        Number of steps
    h : float
        Weight (default 1)
    K : float
        Factor (see below)
    """
    return m + h * K

# ==== Parameters whose names are units ====
def box(m, s, h, K, V, A):
    """Names only.

    m : float
    s : float
    h : float
    K : float
    V : float
    A : float
    """
    return m + s + h + K + V + A

# ==== Remarks in trailing comments ====
n = 3           # number of tubes
m = n + 1       # one more (closed) end
k = 0.4         # assumed
x = 2.0         # in total
y = x + n       # as in the first run
i = 0           # min index
w = x * n       # W is computed below
z = 1           # A, B and C are in the table

# ==== Code that was commented out ====
x = 2.0
# y = x[0] + z[1]
# if a > b: c = d / e
# return [m]
y = x + 1       # x[i] + y[i]

# ==== Ranges and lists in brackets ====
phi = 0.4       # [0 .. 1]
lat = 52.0      # [-90, 90]
v = [1, 2, 3]   # [u, v, w]
n = 4           # [0-10]
opts = []       # [a, b, c]

# ==== Two spellings of one unit ====
def speed(
    s,      # [m]
    t,      # [s]
):
    """Speed.

    Parameters
    ----------
    s : float
        Way in metres
    t : float
        Time [sec]

    Returns
    -------
    v : float
        Speed [m s^-1]
    """
    return s / t

# ==== Units in words ====
Q = 0.4         # flow in cubic metres per hour
L = 3.2         # in metres
t = 12          # in seconds
v = L / t       # in m/s
w = v + 0.1

# ==== Exponents in all spellings ====
rho1 = 998.2    # [kg/m^3]
rho2 = 998.2    # [kg/m**3]
rho3 = 998.2    # [kg/m3]
rho4 = 998.2    # [kg m^-3]
rho5 = 998.2    # [kg m-3]
rho6 = 998.2    # [kg·m⁻³]
rho7 = 998.2    # [kg.m-3]
rho8 = 998.2    # [kg/m³]
total = rho1 + rho2 + rho3 + rho4 + rho5 + rho6 + rho7 + rho8

# ==== Compound denominators in all spellings ====
k1 = 0.6        # [W/(m K)]
k2 = 0.6        # [W/m/K]
k3 = 0.6        # [W/m-K]
k4 = 0.6        # [W m-1 K-1]
k5 = 0.6        # [W/(m·K)]
k6 = 0.6        # [W/(m*K)]
k7 = 0.6        # [W/m K]
k = k1 + k2 + k3 + k4 + k5 + k6 + k7

# ==== Scaled and substance units ====
c = 0.4         # [10^-6 m]
a = 12.0        # [gC/m2/day]
b = 3.0         # [umol CO2 m-2 s-1]
x = b + 2
m = 1.2         # [10^3 kg/m^3]

# ==== Alternatives have no scale ====
def dew_point(t):
    """Dew point.

    Parameters
    ----------
    t : float
        Temperature in °F [IP] or °C [SI]

    Returns
    -------
    float
        Temperature in °F [IP] or °C [SI]
    """
    return t - 2

# ==== A range after the unit ====
N = 6.5         # [rev/s] 2 .. 12
V = 1.4         # [m/s] 0.5 .. 3 mean velocity
D = 0.085       # [m] > 0
v = 3.14159 * D * N     # [m/s]

# ==== Notes above the assignment ====
# V [m/s], D [m], nu [m^2/s]
V = 1.4
D = 0.0525
nu = 1.0e-6
Re = V * D / nu     # [-]

# ==== Dimension without a unit ====
V = 1.4         # [dim L T^-1]
t = 2.0         # [s]
s = V * t       # [m]

# ==== Same quantity by different names ====
W = 120.0       # [N m]
E = 40.0        # [J]
P = 2.0         # [kW h]
p = 3.0e5       # [N/m^2]
q = 2.0e5       # [Pa]
total = W + E
s = p + q
nu = 4.0        # [1/s]
f = 2.0         # [Hz]
w = nu + f

# ==== Doctest lines in documentation ====
def double(x):
    """Doubles.

    Parameters
    ----------
    x : float
        Length [m]

    Returns
    -------
    y : float
        Length [m]

    Examples
    --------
    >>> double(2.0)
    4.0
    >>> double([1, 2][0]) + 3
    5
    """
    return 2 * x

# ==== Allowed with a reason at the top of a file ====
# termwise: allow unlike-terms — scores of the old planning sheet are sums of everything
cost = 1200.0   # [kg]
way = 14.0      # [m]
score = cost + way
score2 = cost - 2 * way

# ==== Empirical function ====
def wind_chill(T, v):
    """Perceived temperature.

    empirical: T [degC], v [km/h]

    Parameters
    ----------
    T : float
        Temperature [degC]
    v : float
        Wind speed [km/h]
    """
    return 13.12 + 0.6215 * T - 11.37 * v**0.16 + 0.3965 * T * v**0.16

# ==== Text in another language ====
d = 52.5        # [mm] Außendurchmesser
p = 2.4         # [bar] Überdruck über 大气
längs = d * 2   # [mm]
Δp = p / 2      # [bar]
