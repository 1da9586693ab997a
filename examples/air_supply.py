"""Compressed air for the pneumatic drum agitator."""

from dataclasses import dataclass

R_AIR = 287.05      # [J/(kg K)]
P_ATM = 1.013       # [bar]


@dataclass
class Receiver:
    """The air receiver of the bench."""

    volume: float           # [L]
    p: float                # [barg]
    T: float = 21.0         # [degC]


def density(p, T):
    """Density of the compressed air.

    Parameters
    ----------
    p : float
        Absolute pressure [bar]
    T : float
        Temperature [degC]

    Returns
    -------
    rho_air : float
        Density [kg/m^3]
    """
    return p * 1e5 / (R_AIR * (T + 273.15))


def stored_mass(tank):
    """Mass of the air in a receiver, in kilograms."""
    p_abs = tank.p + P_ATM              # [bar]
    m = density(p_abs, tank.T) * tank.volume / 1000     # [kg]
    return m


def free_air(Q, p, T):
    """Free air for a flow at line conditions.

    Parameters
    ----------
    Q : float
        Flow at line conditions [L/min]
    p : float
        Line pressure [barg]
    T : float
        Line temperature [degC]

    Returns
    -------
    Q_n : float
        Flow at hall conditions [L/min]
    """
    T_hall = 294.15                     # [K]
    return Q * (p + P_ATM) / P_ATM * T_hall / (T + 273.15)


def nozzle_flow(A, p, T):
    """Mass flow through a choked nozzle.

    Parameters
    ----------
    A : float
        Throat area [mm^2]
    p : float
        Absolute pressure before the nozzle [Pa]
    T : float
        Temperature before the nozzle [degC]

    Returns
    -------
    m_dot : float
        Mass flow [kg/s]
    """
    kappa = 1.4             # [-]
    factor = (kappa * (2 / (kappa + 1))**((kappa + 1) / (kappa - 1)))**0.5
    return factor * A * 1e-6 * p / (R_AIR * T)**0.5


def refill_time(tank, p_low, Q_comp):
    """Time that the compressor needs to fill the receiver again.

    Parameters
    ----------
    tank : Receiver
        The receiver
    p_low : float
        Pressure at which the compressor starts [barg]
    Q_comp : float
        Free air delivered by the compressor [L/min]

    Returns
    -------
    t : float
        Time [s]
    """
    V_free = tank.volume * (tank.p - p_low) / P_ATM     # [L]
    return V_free / Q_comp * 60


def main():
    tank = Receiver(90.0, 6.0)
    print(f"{stored_mass(tank):.2f} kg of air")
    print(f"{free_air(35.0, 6.0, 21.0):.0f} L/min free air")
    print(f"{refill_time(tank, 4.5, 120.0):.0f} s to refill")


if __name__ == "__main__":
    main()
