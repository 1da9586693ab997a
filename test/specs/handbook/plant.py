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
