"""Power of the paint mixer.

The symbols N, D, rho, mu, P and Np are those of bench.nomen; nothing is noted here that stands there.
"""

from math import pi

from benchlog import read_speed


def reynolds(rho, N, D, mu):
    """Reynolds number of the impeller, with the speed in revolutions per second."""
    return rho * N * D**2 / mu


def power_number(Re):
    """Power number of the anchor: laminar branch below 100, constant above.

    Parameters
    ----------
    Re : float
        Reynolds number of the impeller [-]

    Returns
    -------
    Np : float
        Power number [-]
    """
    laminar = 130.0 / Re
    return max(laminar, 1.3)


def shaft_power(rho, N, D, mu):
    """Power that the paint takes from the shaft.

    Returns
    -------
    P : float
        Shaft power [W]
    """
    Np = power_number(reynolds(rho, N, D, mu))
    return Np * rho * N**3 * D**5


def tip_speed(N, D):
    """Speed of the outermost point of the impeller.

    Returns
    -------
    v : float
        Tip speed [m/s]
    """
    return pi * D * N


def power_from_torque(M, n):
    """Power from the torque sensor and the tachometer.

    Parameters
    ----------
    M : float
        Torque [N m]
    n : float
        Shaft speed [rpm]

    Returns
    -------
    P : float
        Shaft power [W]
    """
    omega = n / 60          # [rad/s]
    return M * omega


def required_torque(rho, N, D, mu):
    """Torque that the drive has to give, with a quarter in reserve.

    Returns
    -------
    M : float
        Torque [N m]
    """
    reserve = 1.25
    P = shaft_power(rho, N, D, mu)
    return reserve * P / (2 * pi * N)


def foam_number(N, D):
    """Froude number of the impeller; foam was seen above 0.6."""
    Fr = N**2 * D / 9.81    # [-]
    return Fr


def main():
    n = read_speed(3)       # [rpm]
    N = n / 60              # [rev/s]
    D = 0.085               # [m]
    rho = 1240.0            # [kg/m^3]
    mu = 380.0 / 1000       # [Pa s]

    Re = reynolds(rho, N, D, mu)
    P = shaft_power(rho, N, D, mu)
    print(f"Re = {Re:.0f}, P = {P:.1f} W, tip {tip_speed(N, D):.2f} m/s")
    if P > 0.8 * 250.0:     # rated power of the drive in W
        print("drive near its limit")


if __name__ == "__main__":
    main()
