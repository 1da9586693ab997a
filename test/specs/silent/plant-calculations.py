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

# ==== Swept volume with many numbers ====
n_cyl = 4
bore = 60.0         # [mm]
stroke = 48.0       # [mm]
n = 1450.0          # [1/min]
V_dot = n_cyl*3.14159/4*(bore/1000)**2*stroke/1000*n/60     # [m^3/s]

# ==== Horsepower of a fan and of a pump ====
CFM = 8400.0        # [cfm]
SP = 3.2            # [inH2O]
eta = 0.62
BHP = CFM*SP/(6356*eta)     # [hp]
kW = BHP*0.7457             # [kW]
Q = 350.0           # [gpm]
dp = 48.0           # [psi]
HP = Q*dp/(1714*eta)        # [hp]
gamma = 62.4        # [lbf/ft^3]
h = 46.0            # [ft]
P = gamma*Q/448.83*h/eta/550    # [hp]

# ==== Pound mass and pound force ====
g_c = 32.174        # [lbm ft/(lbf s^2)]
g = 32.2            # [ft/s^2]
m_dot = 10.5        # [lbm/s]
V = 8.0             # [ft/s]
rho = 0.075         # [lbm/ft^3]
F = m_dot*V/g_c             # [lbf]
F_lit = m_dot*V/32.174      # [lbf]
VP = rho*V**2/(2*g_c)       # [lbf/ft^2]
VP_psi = VP/144             # [psi]
m = 12.0            # [lbm]
W = m*g/g_c         # [lbf]
z = 30.0            # [ft]
p = 62.4*z*g/g_c/144
p_bottom = 14.7*144         # [lbf/ft^2]

# ==== Ideal gas in US units ====
p = 14.7            # [psia]
R = 53.35           # [ft lbf/(lbm degR)]
T = 540.0           # [degR]
rho = p*144/(R*T)           # [lbm/ft^3]
T_F = 80.0          # [degF]
rho_F = p*144/(R*(T_F + 459.67))    # [lbm/ft^3]
rho_460 = p*144/(R*(T_F + 460))     # [lbm/ft^3]
q = 8400.0          # [ft^3/min]
m = q*rho*60                # [lbm/h]
c_p = 0.24          # [BTU/(lbm degF)]
Q = m*c_p*(T_F - 55.0)      # [BTU/h]
tons = Q/12000              # [ton_refrigeration]
W_fan = 778.17*Q/3600       # [ft lbf/s]
hp = W_fan/550              # [hp]

# ==== Velocity in a pipe in US units ====
import math

Q = 350.0           # [gpm]
d = 6.065           # [in]
A = math.pi/4*(d/12)**2     # [ft^2]
V = Q/448.83/A              # [ft/s]
V_gal = Q*0.002228/A        # [ft/s]
Re = 124.0*V*d/12/1.1
f = 0.019           # [-]
L = 240.0           # [ft]
g = 32.174          # [ft/s^2]
h_f = f*L/(d/12)*V**2/(2*g)     # [ft]
dp = 62.4*h_f/144
V_tank = 5000.0     # [gal]
t_fill = V_tank/Q   # [min]

# ==== Beam and bolt in kips and inches ====
P = 11.5            # [kip]
L = 14.0            # [ft]
w = 0.045           # [kip/ft]
E = 29000.0         # [ksi]
I = 307.0           # [in^4]
S = 51.5            # [in^3]
M = P*L/4 + w*L**2/8        # [kip ft]
f_b = M*12/S                # [ksi]
f_psi = f_b*1000            # [psi]
delta = P*(L*12)**3/(48*E*I)    # [in]
delta_w = 5*w/12*(L*12)**4/(384*E*I)    # [in]
limit = L*12/360            # [in]
ok = delta <= limit
