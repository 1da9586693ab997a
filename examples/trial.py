"""Evaluation of a mixing trial: energy, mixing time and the sheet for the archive."""

import numpy as np

from dosing import shear_rate
from mixer import shaft_power, tip_speed


def read_log(path):
    """Time, speed and torque of a trial.

    Returns
    -------
    t : ndarray
        Time [s]
    n : ndarray
        Shaft speed [rpm]
    torque : ndarray
        Torque [N m]
    """
    table = np.loadtxt(path, delimiter=",", skiprows=1)
    return table[:, 0], table[:, 1], table[:, 2]


def trial_energy(t, n, torque):
    """Energy given to the paint.

    Parameters
    ----------
    t : ndarray
        Time [s]
    n : ndarray
        Shaft speed [rpm]
    torque : ndarray
        Torque [N m]

    Returns
    -------
    E : float
        Energy [kJ]
    """
    power = 2 * np.pi * n / 60 * torque
    return np.trapezoid(power, t) / 1000


def specific_energy(
    E,          # [kJ] energy of the trial
    volume,     # [m^3] volume of the batch
):
    """Energy per volume of a batch.

    Parameters
    ----------
    E : float
        Energy of the trial [kJ]
    volume : float
        Volume of the batch [L]

    Returns
    -------
    e : float
        Energy per volume [kJ/m^3]
    """
    return E / volume


def mixing_time(N):
    """Time after which the batch counts as mixed: forty revolutions of the shaft.

    Returns
    -------
    t_m : float
        Mixing time [s]
    """
    revolutions = 40        # [rev]
    return revolutions / N


def temperature_rise(E, mass):
    """Rise of the paint's temperature if no heat is lost.

    Parameters
    ----------
    E : float
        Energy [kJ]
    mass : float
        Mass of the batch [kg]

    Returns
    -------
    dT : float
        Rise [K]
    """
    cp = 2.3                # [kJ/(kg K)]
    return E / (mass * cp)


def sheet(path):
    """Prints the sheet of a trial."""
    t, n, torque = read_log(path)
    E = trial_energy(t, n, torque)
    N = np.mean(n) / 60     # [rev/s]
    gap = 4.0               # [mm] between impeller and wall
    eta_end = 0.42          # [kg/(m s] viscosity at the end

    P = shaft_power(1240.0, N, 0.085, 0.38)
    v = tip_speed(N, 0.085)
    rate = v / (gap / 1000)     # [1/s]
    hose = shear_rate(3.0e-5, 0.012)
    print(f"{E:.1f} kJ, {P:.1f} W, {mixing_time(N):.1f} s")
    print(f"shear {rate:.0f} 1/s in the gap, {hose:.0f} 1/s in the hose")
    return eta_end * rate


if __name__ == "__main__":
    sheet("trial.csv")
