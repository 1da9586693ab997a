# Lines as they stand in calculations for plant and machines. Nothing here may be reported; common practice throughout.

# ==== Hours of operation in a year ====
Q_rec = 42.0        # [kW]
saving = Q_rec*6000/1000    # [MWh/a]
E_day = 310.0       # [kWh/d]
E_year = E_day*365/1000     # [MWh/a]
E_work = E_day*250          # [kWh/a]

# ==== A year of 8760 hours ====
P = 3.1             # [kW]
E = P*8760          # [kWh/a]
E_MWh = P*8.76      # [MWh/a]

# ==== Per cent of oxygen in a number ====
lam = 1.18          # [-]
x_O2 = 21*(lam - 1)/lam     # [%]

# ==== Enthalpy of moist air counts from 0 degC ====
cp_da = 1.006       # [kJ/(kg K)]
cp_w = 1.86         # [kJ/(kg K)]
h_fg0 = 2501.0      # [kJ/kg]
t = 46.0            # [degC]
w = 0.0112          # [kg/kg]
h = cp_da*t + w*(h_fg0 + cp_w*t)    # [kJ/kg]

# ==== Magnus formula: its numbers are counted in degC ====
import math

t = 21.5            # [degC]
x = 17.62*t/(243.12 + t)
p_ws = 0.6112*math.exp(x)

# ==== An estimate of a temperature in the same scale ====
t_gas = 215.0       # [degC]
t_mean = 0.9*t_gas  # [degC]
t_max = 1.05*t_gas  # [degC]

# ==== Whole numbers that are rounded conversions ====
import math

q = 36000.0         # [BTU/h]
kW = q/3412         # [kW]
P = 15.0            # [kW]
n = 1450.0          # [rpm]
M = 9550*P/n        # [N m]
hp = 20.0           # [hp]
T = 5252*hp/n       # [ft lbf]
T_in = 63025*hp/n   # [in lbf]
q_hp = hp*2545      # [BTU/h]

# ==== Acre inches per hour are cubic feet per second ====
C = 0.62            # [-]
i_rain = 3.4        # [in/h]
A = 41.0            # [acre]
Q_peak = C*i_rain*A     # [ft^3/s]
Q_exact = 1.008*C*i_rain*A  # [ft^3/s]

# ==== Acre feet of a pond ====
V_pond = 2.6        # [acre ft]
Q = 40.0            # [ft^3/s]
t_fill = V_pond*43560/Q/3600    # [h]
V_gal = V_pond*43560*7.48       # [gal]
Q_gpm = Q*448.8     # [gpm]
