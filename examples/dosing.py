"""Dosing line of the paint bench: from the supply tank through a hose to the dosing nozzle."""

import math

from benchlog import read_level

P_HALL = 101.3      # [kPa] pressure in the hall
G = 9.80665         # [m/s^2]


def tank_pressure(level, density):
    """Absolute pressure at the outlet of the supply tank.

    Parameters
    ----------
    level : float
        Level of the paint over the outlet [m]
    density : float
        Density of the paint [kg/m^3]

    Returns
    -------
    p : float
        Absolute pressure [Pa]
    """
    return P_HALL + density * G * level


def mean_velocity(Q, d_i):
    """Mean velocity in the hose.

    Parameters
    ----------
    Q : float
        Volume flow [m^3/s]
    d_i : float
        Inside diameter of the hose [m]

    Returns
    -------
    w : float
        Mean velocity [m/s]
    """
    return Q / (math.pi * d_i**2 / 4)


def laminar_loss(Q, d_i, length, viscosity):
    """Pressure drop of a laminar flow (Hagen and Poiseuille).

    Parameters
    ----------
    Q : float
        Volume flow [m^3/s]
    d_i : float
        Inside diameter [m]
    length : float
        Length of the hose [m]
    viscosity : float
        Dynamic viscosity [Pa s]

    Returns
    -------
    dp : float
        Pressure drop [kPa]
    """
    return 128 * viscosity * length * Q / (math.pi * d_i**4) / 1000


def dose_time(mass, density, Q):
    """Time that the nozzle is open for one dose.

    Parameters
    ----------
    mass : float
        Mass of a dose [kg]
    density : float
        Density of the paint [kg/m^3]
    Q : float
        Volume flow [m^3/s]

    Returns
    -------
    t : float
        Time [s]
    """
    return mass / density * Q


def shear_rate(Q, d_i):
    """Shear rate at the wall of the hose.

    Parameters
    ----------
    Q : float
        Volume flow [m^3/s]
    d_i : float
        Inside diameter [m]

    Returns
    -------
    rate : float
        Shear rate [1/s]
    """
    return 32 * Q / (math.pi * d_i**3)


def main():
    level = read_level(1) / 1000        # [m]
    flow = 1.8                          # [L/min]
    bore = 12.0                         # [mm] inside diameter of the hose
    length = 3.5                        # [m]

    Q = flow / 60000                    # [m^3/s]
    w = mean_velocity(Q, bore)
    dp = laminar_loss(Q, bore / 1000, length, 0.38)
    p_end = tank_pressure(level, 1240.0) / 1000 - dp    # [kPa]
    print(f"w = {w:.2f} m/s, {p_end:.1f} kPa at the nozzle")
    print(f"dose of 250 g: {dose_time(0.25, 1240.0, Q):.1f} s")


if __name__ == "__main__":
    main()
