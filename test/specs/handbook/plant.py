# Plant and machines: slips that are usual in their calculations. Formulas are common to the books of each field.

# ==== Energy in a year ====
P = 42.0            # [kW]
E = P*6000          # [MWh/a]
#   ^^^^^^ scale-mismatch: 0.001

# ==== Heat flow of a temperature in degC ====
m = 2.4             # [kg/s]
cp = 2010.0         # [J/(kg K)]
t = 78.0            # [degC]
Q = m*cp*t          # [W]
#   ^^^^^^ offset-misuse

# ==== Gas from burner power: the number is a calorific value ====
Q_burner = 420.0    # [kW]
gas = Q_burner/10.2 # [m^3/h]
#     ^^^^^^^^^^^^^ hidden-unit: `10.2`

# ==== Heat loss with a coefficient in digits ====
A = 46.0            # [m^2]
t_wall = 68.0       # [degC]
t_room = 24.0       # [degC]
Q = 6.2*A*(t_wall - t_room)/1000    # [kW]
#   ^^^^^^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: `6.2` carried

# ==== A temperature far from its estimate ====
t_C = 20.0          # [degC]
t_F = 1.8*t_C       # [degF]
#     ^^^^^^^ scale-mismatch

# ==== Air and water side of a coil in US units ====
CFM = 8400.0        # [cfm]
T_in = 80.0         # [degF]
T_out = 55.0        # [degF]
h_in = 31.6         # [BTU/lb]
h_out = 22.8        # [BTU/lb]
w_in = 0.0112       # [lb/lb]
w_out = 0.0086      # [lb/lb]
q_s = 1.08*CFM*(T_in - T_out)   # [BTU/h]
#     ^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: `1.08` carried BTU min/(h ft^3 degF)
q_t = 4.5*CFM*(h_in - h_out)    # [BTU/h]
#     ^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: `4.5` carried lb min/(h ft^3)
q_l = 4840*CFM*(w_in - w_out)   # [BTU/h]
#     ^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: latent heat factor of standard air
gpm = q_t/(500*(54.0 - 44.0))   # [gpm]
# <-- hidden-unit

# ==== Velocity pressure of air in US units ====
V = 480.0           # [ft/min]
VP = (V/4005)**2    # [inH2O]
#    ^^^^^^^^^^^ hidden-unit: `4005` carried ft/(min inH2O^0.5)

# ==== Head and pressure of water in US units ====
TDH = 46.0          # [ft]
dp = 0.433*TDH      # [psi]
#    ^^^^^^^^^ hidden-unit: `0.433` carried psi/ft
h = dp/2.31         # [ft]
#   ^^^^^^^ hidden-unit
h_right = dp*2.31   # [ft]
#         ^^^^^^^ hidden-unit: `2.31` carried ft/psi

# ==== Manning in US units ====
A = 34.0            # [ft^2]
R = 1.9             # [ft]
n = 0.028           # [-]
S = 0.0035          # [ft/ft]
Q = 1.486/n*A*R**(2/3)*S**0.5   # [ft^3/s]
#   ^^^^^^^^^^^^^^^^^^^^^^^^^ hidden-unit: `1.486` carried ft^(1/3)/s

# ==== Density of air in digits ====
Q = 2.4             # [m^3/s]
c_p = 1006.0        # [J/(kg K)]
dT = 14.0           # [K]
P = 1.2*Q*c_p*dT    # [W]
#   ^^^^^^^^^^^^ hidden-unit: density of standard air

# ==== Arrhenius with a temperature in degC ====
# Levenspiel, Chemical Reaction Engineering, chapter 2
import math

k0 = 3.4e6          # [1/s]
Ea = 58.0           # [kJ/mol]
R = 8.314           # [J/(mol K)]
T = 64.0            # [degC]
k = k0*math.exp(-Ea*1000/(R*(T + 273.15)))  # [1/s]
k_slip = k0*math.exp(-Ea*1000/(R*T))        # [1/s]
#                    ^^^^^^^^^^^^^^ offset-misuse: 273.15

# ==== A coefficient of heat loss in digits, with a fraction ====
A = 5.1             # [m^2]
T = 64.0            # [degC]
T_a = 20.0          # [degC]
loss = 6.5*A*(T - T_a)      # [W]
#      ^^^^^^^^^^^^^^^ hidden-unit: `6.5` carried
