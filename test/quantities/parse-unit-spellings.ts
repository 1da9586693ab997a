/**
 * Spellings as found in public code (the forms, not the lines), with what they mean in the strict notation of
 * `catalogue-reader.ts`: text | factor | unit. A word behind `describes:` is the symbol's description.
 */

/** Signs between symbols, and powers. */
export const signs = `
kg/m^3 | 1 | kg/m^3
kg/m**3 | 1 | kg/m^3
kg/m3 | 1 | kg/m^3
kg m^-3 | 1 | kg/m^3
kg m-3 | 1 | kg/m^3
kg·m⁻³ | 1 | kg/m^3
kg.m-3 | 1 | kg/m^3
kg*m^-3 | 1 | kg/m^3
kg / m³ | 1 | kg/m^3
kg/m³. | 1 | kg/m^3
W/(m K) | 1 | W/(m K)
W/(m·K) | 1 | W/(m K)
W/(m*K) | 1 | W/(m K)
W/m/K | 1 | W/(m K)
W/m-K | 1 | W/(m K)
W m-1 K-1 | 1 | W/(m K)
W.m-1.K-1 | 1 | W/(m K)
kJ/kg-K | 1000 | J/(kg K)
kJ/kg.K | 1000 | J/(kg K)
J kg-1 K-1 | 1 | J/(kg K)
W/(m²⋅K⁴) | 1 | W/(m^2 K^4)
W m−2 | 1 | W/m^2
m^0.5 | 1 | m^(1/2)
m**0.5 | 1 | m^(1/2)
m^(1/3) | 1 | m^(1/3)
m^{1/3} | 1 | m^(1/3)
m⁻⅓ | 1 | m^(-1/3)
s m-1/3 | 1 | s m^(-1/3)
s/m1/3 | 1 | s/m^(1/3)
s/m^(1/3) | 1 | s m^(-1/3)
ft^8/3 | 1 | ft^(8/3)
m2.5 mol-0.5 | 1 | m^(5/2) mol^(-1/2)
K^0.5 | 1 | K^(1/2)
ft+1 min-1 | 1 | ft/min
m^-1 | 1 | 1/m
m^ 2 | 1 | m^2
(m/s)^2 | 1 | m^2/s^2
(W/m^2)/C/(m/s) | 1 | W s/(m^3 K)
J/(kg (g/kg)^2) | 1e6 | J/kg
1/s | 1 | 1/s
/sec | 1 | 1/s
1/(m s) | 1 | 1/(m s)
m/s^2/√Hz | 1 | m s^(-3/2)
V/sqrt(Hz) | 1 | V s^(1/2)
m3/m3 | 1 | 1
g/kg | 0.001 | 1
K/(g/kg) | 1000 | K
`;

/** Symbols side by side without a sign. */
export const together = `
Wm-2 | 1 | W/m^2
Wm⁻² | 1 | W/m^2
mol m-2s-1 | 1 | mol/(m^2 s)
Wm⁻²nm⁻¹ | 1e9 | W/m^3
W/(m²nm) | 1e9 | W/m^3
Km²W⁻¹ | 1 | m^2 K/W
kgm-3 | 1 | kg/m^3
J/kgK | 1 | J/(kg K)
W/mK | 1 | W/(m K)
kg/ms | 1 | kg/(m s)
ms-1 | 1 | m/s
ms⁻² | 1 | m/s^2
m s-1 | 1 | m/s
N m | 1 | J
Nm | 1 | J
kNm | 1000 | J
Pas | 1 | Pa s
Pa*s | 1 | Pa s
kW h | 1 | kWh
N/mm2 | 1 | MPa
J/(kg K(g/kg)) | 1000 | J/(kg K)
`;

/** Slashes and what stands behind them: a product is all below, `*` goes left to right. */
export const slashes = `
kg/m^2 s | 1 | kg/(m^2 s)
kg/m^2/s | 1 | kg/(m^2 s)
kg/m*s | 1 | kg s/m
kJ/kg K | 1000 | J/(kg K)
m*K/W | 1 | m K/W
BTU/hr-ft2-F | 1 | BTU/(h ft^2 degR)
hr-ft2-F/BTU | 1 | h ft^2 degR/BTU
BTU/(hr*ft^2*F) | 1 | BTU/(h ft^2 degR)
BTU/lbm-R | 1 | BTU/(lb degR)
ft/sec-F | 1 | ft/(s degR)
`;

/** TeX, roles, HTML. */
export const markup = `
:math:\`kN/m3\` | 1000 | N/m^3
:math:\`W/m^2\` | 1 | W/m^2
$m^2.s^{-1}$ | 1 | m^2/s
kg m$^{-3}$ | 1 | kg/m^3
$\\mathrm{W\\,m^{-2}\\,K^{-1}}$ | 1 | W/(m^2 K)
$\\frac{\\text{W}}{\\text{m}^2}$ | 1 | W/m^2
\\frac{\\mathrm{kJ}}{\\mathrm{kg}\\cdot\\mathrm{K}} | 1000 | J/(kg K)
$kg \\cdot m^{-3}$ | 1 | kg/m^3
\\% | 0.01 | 1
$\\mu m$ | 1e-6 | m
$\\Omega$ | 1 | ohm
W/(m<sup>2</sup> K) | 1 | W/(m^2 K)
m s<sup>&minus;2</sup> | 1 | m/s^2
m s<sup>-2</sup> | 1 | m/s^2
W&middot;m | 1 | W m
`;

/** Names, plurals, square and cubic. */
export const words = `
metres | 1 | m
meters | 1 | m
Meters | 1 | m
seconds | 1 | s
kilopascal | 1000 | Pa
kilopascals | 1000 | Pa
millimetres | 0.001 | m
litres | 1 | L
liters per minute | 1 | L/min
gallons/minute | 1 | gal/min
radians per second | 1 | rad/s
kilograms per cubic metre | 1 | kg/m^3
kg per m3 | 1 | kg/m^3
watts per square meter | 1 | W/m^2
square feet | 1 | ft^2
cubic inches | 1 | in^3
metres squared | 1 | m^2
meters per second squared | 1 | m/s^2
meters/second | 1 | m/s
per second | 1 | 1/s
newton metres | 1 | J
kilowatt-hours | 1 | kWh
joules per kilogram kelvin | 1 | J/(kg K)
pounds per square inch | 1 | psi
inches of water | 1 | inH2O
cubic feet per second | 1 | ft^3/s
in. w.g. | 1 | inH2O
mm of mercury | 1 | mmHg
per mil | 0.001 | 1
nautical miles | 1 | nmi
parts per million | 1e-6 | 1
percent | 0.01 | 1
feet | 1 | ft
inches | 1 | in
`;

/** Symbols of practice. */
export const practice = `
° | 1 | deg
deg | 1 | deg
degrees | 1 | deg
degrees_north | 1 | deg
% | 0.01 | 1
ppm | 1e-6 | 1
psi | 1 | psi
psia | 1 | psi
PSI | 1 | psi
bar(a) | 1 | bar
kPa abs | 1000 | Pa
gpm | 1 | gal/min
cfm | 1 | ft^3/min
cfs | 1 | ft^3/s
inH2O | 1 | inH2O
in H2O | 1 | inH2O
mmHg | 1 | mmHg
mm Hg | 1 | mmHg
lbf | 1 | lbf
lb | 1 | lb
ft-lbf | 1 | ft lbf
ft·lbf | 1 | ft lbf
ft lbf | 1 | ft lbf
lb-ft^2 | 1 | lb ft^2
rpm | 1 | rpm
rev/min | 1 | rpm
l/s | 1 | L/s
MPa√m | 1e6 | Pa m^(1/2)
kWh/(m2 a) | 1 | kWh/(m^2 yr)
#/cm3 | 1e6 | 1/m^3
kWh | 3.6e6 | J
cP | 0.001 | Pa s
cSt | 1e-6 | m^2/s
in. | 1 | in
clo | 0.155 | m^2 K/W
min | 60 | s
Pa | 1 | Pa
cd | 1 | cd
ft | 1 | ft
nmi | 1 | nmi
dyn | 1 | dyn
µm | 1e-6 | m
μm | 1e-6 | m
um | 1e-6 | m
MMBtu/hr | 1e6 | BTU/h
M^2 | 1 | m^2
Mg ha-1 | 0.1 | kg/m^2
L/100km | 1e-8 | m^2
atm-cm | 1 | atm cm
%/K | 0.01 | 1/K
`;

/** Wrong letters' case. */
export const letterCase = `
w/m2 | 1 | W/m^2
w/m/K | 1 | W/(m K)
Kg/s | 1 | kg/s
J/Kg | 1 | J/kg
KPa | 1000 | Pa
Kg | 1 | kg
KW/m2 | 1000 | W/m^2
`;

/** A factor of the size. */
export const scaled = `
10^-6 m | 1e-6 | m
10⁻⁶ m² s⁻¹ | 1e-6 | m^2/s
10**3 kg/m**3 | 1000 | kg/m^3
1e-6 m | 1e-6 | m
1000 kg/m^3 | 1000 | kg/m^3
per 10^5 Pa | 1e-5 | 1/Pa
kg/100 kg | 0.01 | 1
`;

/** A substance beside the unit is a label. */
export const labels = `
gC/m2/s | 0.001 | kg/(m^2 s)
g C m-2 | 0.001 | kg/m^2
umol CO2/m2/s | 1e-6 | mol/(m^2 s)
µmol(photons) m⁻² s⁻¹ | 1e-6 | mol/(m^2 s)
kg N ha-1 | 1e-4 | kg/m^2
kg water/kg air | 1 | 1
kg/kg dry air | 1 | 1
kg_H₂O kg_Air⁻¹ | 1 | 1
J/kg of dry air | 1 | J/kg
mg NO3/L | 0.001 | kg/m^3
kgCO2/kWh | 1 | kg/kWh
m3(gas)/h | 1 | m^3/h
`;

/** C, F, R by context and description: text | factor | unit | describes. */
export const letters = `
W/m2/C | 1 | W/(m^2 K)
J/kg/C | 1 | J/(kg K)
W/m-C | 1 | W/(m K)
kJ/kg C | 1000 | J/(kg K)
1/C | 1 | 1/K
A/C | 1 | A/K
%/C | 0.01 | 1/K
m2 C/W | 1 | m^2 K/W
C/W | 1 | K/W
C | 1 | C
C/m | 1 | C/m
N/C | 1 | N/C
N m^2/C^2 | 1 | N m^2/C^2
F | 1 | F
F/m | 1 | F/m
C/m | 1 | K/m | T_gradient of the soil
BTU/hr-F | 1 | BTU/(h degR)
`;
