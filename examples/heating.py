"""Heating jacket of the mixing vessel."""

import math

from benchlog import read_temperature

# U [W/(m^2 K)], A_wall [m^2], cp [J/(kg K)]
U = 180.0
A_wall = 0.72
cp = 2300.0


def log_mean(dT_1, dT_2):
    """Logarithmic mean of two temperature differences.

    Parameters
    ----------
    dT_1 : float
        Difference at the inlet [K]
    dT_2 : float
        Difference at the outlet [K]

    Returns
    -------
    dT_m : float
        Mean difference [K]
    """
    if abs(dT_1 - dT_2) < 0.01:
        return dT_1
    return (dT_1 - dT_2) / math.log(dT_1 / dT_2)


def jacket_heat(T_w, T_p):
    """Heat flow from the jacket water into the paint.

    Parameters
    ----------
    T_w : float
        Temperature of the water [degC]
    T_p : float
        Temperature of the paint [degC]

    Returns
    -------
    Q : float
        Heat flow [W]
    """
    return U * A_wall * (T_w - T_p)


def net_heat(T_w, T_p, T_room):
    """Heat flow into the paint less the loss of the lid.

    Parameters
    ----------
    T_w : float
        Temperature of the water [degC]
    T_p : float
        Temperature of the paint [degC]
    T_room : float
        Temperature of the hall [degC]

    Returns
    -------
    Q : float
        Heat flow [W]
    """
    h_lid = 8.0             # [W/(m^2 K)]
    loss = h_lid * (T_p - T_room)
    return jacket_heat(T_w, T_p) - loss


def warm_up(T_start, T_w, mass, t_end):
    """Temperature of the paint after a time, by steps of ten seconds.

    Parameters
    ----------
    T_start : float
        Temperature at the start [degC]
    T_w : float
        Temperature of the jacket water [degC]
    mass : float
        Mass of the paint [kg]
    t_end : float
        Time [s]

    Returns
    -------
    T : float
        Temperature [degC]
    """
    T = T_start
    t = 0
    dt = 10.0               # [s]
    while t < t_end:
        T += jacket_heat(T_w, T) / (mass * cp) * dt
        t += dt
    return T


def settled_share(t, k_s):
    """Share of the pigment that has settled in a vessel that stands still.

    Parameters
    ----------
    t : float
        Time of standing [min]
    k_s : float
        Settling rate [1/min]

    Returns
    -------
    x : float
        Share [-]
    """
    return 1 - math.exp(-t / k_s)


def main():
    T_w = read_temperature(5)           # [degC]
    T_p = read_temperature(6)           # [degC]
    mass = 60.0 / 1000 * 1240           # [kg]
    T_20 = warm_up(T_p, T_w, mass, 20 * 60)
    print(f"{jacket_heat(T_w, T_p):.0f} W, {T_20:.1f} degC after 20 min")


if __name__ == "__main__":
    main()
