/**
 * NIST SP 811 (2008), Appendix B.8, "Factors for units listed alphabetically": the unit, the SI unit, and the factor with the
 * digits that are printed there. Figures from memory. `*` marks the factors printed as exact. Columns of mercury and water are
 * the conventional ones; units in survey feet stand apart below. Left out: BTU_IT per minute in watts, where the factor remembered,
 * 1.758427E+01, is not the quotient of the two exact definitions (1.758426E+01).
 */
const table = `
abA | A | 1.0E+01 *
abC | A s | 1.0E+01 *
abF | F | 1.0E+09 *
abH | H | 1.0E-09 *
abmho | S | 1.0E+09 *
abohm | Ω | 1.0E-09 *
abV | V | 1.0E-08 *
g_n | m/s^2 | 9.80665E+00 *
Ah | A s | 3.6E+03 *
Å | m | 1.0E-10 *
au | m | 1.495979E+11
atm | Pa | 1.01325E+05 *
at | Pa | 9.80665E+04 *
bar | Pa | 1.0E+05 *
barn | m^2 | 1.0E-28 *
bbl | m^3 | 1.589873E-01
bbl | L | 1.589873E+02
BTU | J | 1.055056E+03
BTU_th | J | 1.054350E+03
BTU ft/(h ft^2 degF) | W/(m K) | 1.730735E+00
BTU_th ft/(h ft^2 degF) | W/(m K) | 1.729577E+00
BTU in/(h ft^2 degF) | W/(m K) | 1.442279E-01
BTU_th in/(h ft^2 degF) | W/(m K) | 1.441314E-01
BTU in/(s ft^2 degF) | W/(m K) | 5.192204E+02
BTU_th in/(s ft^2 degF) | W/(m K) | 5.188732E+02
BTU/ft^3 | J/m^3 | 3.725895E+04
BTU_th/ft^3 | J/m^3 | 3.723403E+04
BTU/degF | J/K | 1.899101E+03
BTU_th/degF | J/K | 1.897830E+03
BTU/degR | J/K | 1.899101E+03
BTU/h | W | 2.930711E-01
BTU_th/h | W | 2.928751E-01
BTU/(h ft^2 degF) | W/(m^2 K) | 5.678263E+00
BTU_th/(h ft^2 degF) | W/(m^2 K) | 5.674466E+00
BTU_th/min | W | 1.757250E+01
BTU/lb | J/kg | 2.326E+03 *
BTU_th/lb | J/kg | 2.324444E+03
BTU/(lb degF) | J/(kg K) | 4.1868E+03 *
BTU/(lb degR) | J/(kg K) | 4.1868E+03 *
BTU_th/(lb degF) | J/(kg K) | 4.184E+03 *
BTU/s | W | 1.055056E+03
BTU_th/s | W | 1.054350E+03
BTU/(s ft^2 degF) | W/(m^2 K) | 2.044175E+04
BTU_th/(s ft^2 degF) | W/(m^2 K) | 2.042808E+04
BTU/ft^2 | J/m^2 | 1.135653E+04
BTU_th/ft^2 | J/m^2 | 1.134893E+04
BTU/(ft^2 h) | W/m^2 | 3.154591E+00
BTU_th/(ft^2 h) | W/m^2 | 3.152481E+00
BTU_th/(ft^2 min) | W/m^2 | 1.891489E+02
BTU/(ft^2 s) | W/m^2 | 1.135653E+04
BTU_th/(in^2 s) | W/m^2 | 1.634246E+06
bu | m^3 | 3.523907E-02
cal_IT | J | 4.1868E+00 *
cal_th | J | 4.184E+00 *
cal15 | J | 4.18580E+00
cal_th/(cm s K) | W/(m K) | 4.184E+02 *
cal_IT/g | J/kg | 4.1868E+03 *
cal_th/g | J/kg | 4.184E+03 *
cal_IT/(g K) | J/(kg K) | 4.1868E+03 *
cal_th/min | W | 6.973333E-02
cal_th/s | W | 4.184E+00 *
cal_th/cm^2 | J/m^2 | 4.184E+04 *
cal_th/(cm^2 min) | W/m^2 | 6.973333E+02
cal_th/(cm^2 s) | W/m^2 | 4.184E+04 *
kcal_th/min | W | 6.973333E+01
ct | kg | 2.0E-04 *
cmHg | Pa | 1.333224E+03
cmH2O | Pa | 9.80665E+01
cP | Pa s | 1.0E-03 *
cSt | m^2/s | 1.0E-06 *
cmil | m^2 | 5.067075E-10
cmil | mm^2 | 5.067075E-04
clo | m^2 K/W | 1.55E-01
cord | m^3 | 3.624556E+00
ft^3 | m^3 | 2.831685E-02
cfm | m^3/s | 4.719474E-04
cfm | L/s | 4.719474E-01
cfs | m^3/s | 2.831685E-02
in^3 | m^3 | 1.638706E-05
in^3/min | m^3/s | 2.731177E-07
mi^3 | m^3 | 4.168182E+09
yd^3 | m^3 | 7.645549E-01
yd^3/min | m^3/s | 1.274258E-02
cup | m^3 | 2.365882E-04
Ci | Bq | 3.7E+10 *
darcy | m^2 | 9.869233E-13
d | s | 8.64E+04 *
d_sidereal | s | 8.616409E+04
debye | A s m | 3.335641E-30
deg | rad | 1.745329E-02
degF | K | 5.555556E-01
degF h/BTU | K/W | 1.895634E+00
degF h/BTU_th | K/W | 1.896903E+00
degF h ft^2/BTU | m^2 K/W | 1.761102E-01
degF h ft^2/BTU_th | m^2 K/W | 1.762280E-01
degF h ft^2/(BTU in) | m K/W | 6.933472E+00
degF h ft^2/(BTU_th in) | m K/W | 6.938112E+00
degF s/BTU | K/W | 5.265651E-04
degF s/BTU_th | K/W | 5.269175E-04
den | kg/m | 1.111111E-07
dyn | N | 1.0E-05 *
dyn cm | N m | 1.0E-07 *
dyn/cm^2 | Pa | 1.0E-01 *
erg | J | 1.0E-07 *
erg/(cm^2 s) | W/m^2 | 1.0E-03 *
ft | m | 3.048E-01 *
ftUS | m | 3.048006E-01
fc | lx | 1.076391E+01
fL | cd/m^2 | 3.426259E+00
ftH2O | Pa | 2.989067E+03
ft/h | m/s | 8.466667E-05
ft/min | m/s | 5.08E-03 *
ft pdl | J | 4.214011E-02
ft lbf | J | 1.355818E+00
ft lbf/h | W | 3.766161E-04
ft lbf/min | W | 2.259697E-02
ft^4 | m^4 | 8.630975E-03
statC | A s | 3.335641E-10
Gal | m/s^2 | 1.0E-02 *
galUK | m^3 | 4.54609E-03 *
galUK/d | m^3/s | 5.261678E-08
galUK/min | m^3/s | 7.576817E-05
gal | m^3 | 3.785412E-03
gal | L | 3.785412E+00
gal/d | m^3/s | 4.381264E-08
gal/(hp h) | m^3/J | 1.410089E-09
gpm | m^3/s | 6.309020E-05
gpm | L/s | 6.309020E-02
gamma_T | T | 1.0E-09 *
Gs | T | 1.0E-04 *
Gi | A | 7.957747E-01
gill | m^3 | 1.182941E-04
gon | rad | 1.570796E-02
grain | kg | 6.479891E-05 *
grain/gal | kg/m^3 | 1.711806E-02
gf/cm^2 | Pa | 9.80665E+01 *
ha | m^2 | 1.0E+04 *
hp | W | 7.456999E+02
hpS | W | 9.80950E+03
hpE | W | 7.46E+02 *
PS | W | 7.354988E+02
h | s | 3.6E+03 *
cwtUK | kg | 5.080235E+01
cwt | kg | 4.535924E+01
inch | m | 2.54E-02 *
inHg | Pa | 3.386389E+03
inHg | kPa | 3.386389E+00
inH2O | Pa | 2.490889E+02
in^4 | m^4 | 4.162314E-07
kayser | 1/m | 1.0E+02 *
kcal_IT | J | 4.1868E+03 *
kgf | N | 9.80665E+00 *
kgf/cm^2 | Pa | 9.80665E+04 *
kgf/mm^2 | Pa | 9.80665E+06 *
kgf s^2/m | kg | 9.80665E+00 *
km/h | m/s | 2.777778E-01
kp | N | 9.80665E+00 *
kWh | J | 3.6E+06 *
kip | N | 4.448222E+03
ksi | Pa | 6.894757E+06
kn | m/s | 5.144444E-01
lambert | cd/m^2 | 3.183099E+03
langley | J/m^2 | 4.184E+04 *
ly | m | 9.46073E+15
Mx | Wb | 1.0E-08 *
mho | S | 1.0E+00 *
uin | m | 2.54E-08 *
micron | m | 1.0E-06 *
mil | m | 2.54E-05 *
mil_angle | rad | 9.817477E-04
mi | m | 1.609344E+03 *
miUS | m | 1.609347E+03
nmi | m | 1.852E+03 *
mpg | m/m^3 | 4.251437E+05
mpg | km/L | 4.251437E-01
mph | m/s | 4.4704E-01 *
mph | km/h | 1.609344E+00 *
mi/min | m/s | 2.68224E+01 *
mbar | Pa | 1.0E+02 *
mmHg | Pa | 1.333224E+02
mmH2O | Pa | 9.80665E+00
arcmin | rad | 2.908882E-04
Oe | A/m | 7.957747E+01
Ω cmil/ft | Ω m | 1.662426E-09
oz | kg | 2.834952E-02
ozt | kg | 3.110348E-02
flozUK | m^3 | 2.841306E-05
floz | m^3 | 2.957353E-05
ozf | N | 2.780139E-01
ozf in | N m | 7.061552E-03
oz/in^3 | kg/m^3 | 1.729994E+03
oz/galUK | kg/m^3 | 6.236023E+00
oz/gal | kg/m^3 | 7.489152E+00
oz/ft^2 | kg/m^2 | 3.051517E-01
oz/in^2 | kg/m^2 | 4.394185E+01
oz/yd^2 | kg/m^2 | 3.390575E-02
pc | m | 3.085678E+16
peck | m^3 | 8.809768E-03
dwt | kg | 1.555174E-03
perm | kg/(Pa s m^2) | 5.72135E-11
perm_in | kg/(Pa s m) | 1.45322E-12
ph | lx | 1.0E+04 *
pica | m | 4.233333E-03
pt | m^3 | 4.731765E-04
poise | Pa s | 1.0E-01 *
lb | kg | 4.535924E-01
lbt | kg | 3.732417E-01
pdl | N | 1.382550E-01
pdl/ft^2 | Pa | 1.488164E+00
pdl s/ft^2 | Pa s | 1.488164E+00
lb ft^2 | kg m^2 | 4.214011E-02
lb in^2 | kg m^2 | 2.926397E-04
lbf | N | 4.448222E+00
lbf ft/in | N m/m | 5.337866E+01
lbf in | N m | 1.129848E-01
lbf/ft | N/m | 1.459390E+01
psf | Pa | 4.788026E+01
lbf/in | N/m | 1.751268E+02
psi | Pa | 6.894757E+03
lbf/lb | N/kg | 9.80665E+00 *
lbf s/ft^2 | Pa s | 4.788026E+01
reyn | Pa s | 6.894757E+03
lb/ft^3 | kg/m^3 | 1.601846E+01
lb/in^3 | kg/m^3 | 2.767990E+04
lb/yd^3 | kg/m^3 | 5.932764E-01
lb/ft | kg/m | 1.488164E+00
lb/(ft h) | Pa s | 4.133789E-04
lb/(ft s) | Pa s | 1.488164E+00
lb/galUK | kg/m^3 | 9.977637E+01
ppg | kg/m^3 | 1.198264E+02
lb/(hp h) | kg/J | 1.689659E-07
lb/h | kg/s | 1.259979E-04
lb/in | kg/m | 1.785797E+01
lb/min | kg/s | 7.559873E-03
lb/ft^2 | kg/m^2 | 4.882428E+00
lb/in^2 | kg/m^2 | 7.030696E+02
lb/yd | kg/m | 4.960546E-01
quad | J | 1.055056E+18
qt | m^3 | 9.463529E-04
rd | Gy | 1.0E-02 *
rem | Sv | 1.0E-02 *
roentgen | A s/kg | 2.58E-04 *
arcsec | rad | 4.848137E-06
shake | s | 1.0E-08 *
slug | kg | 1.459390E+01
slug/ft^3 | kg/m^3 | 5.153788E+02
slug/(ft s) | Pa s | 4.788026E+01
ft^2 | m^2 | 9.290304E-02 *
ft^2/h | m^2/s | 2.58064E-05 *
in^2 | m^2 | 6.4516E-04 *
mi^2 | m^2 | 2.589988E+06
yd^2 | m^2 | 8.361274E-01
statA | A | 3.335641E-10
statF | F | 1.112650E-12
statH | H | 8.987552E+11
statmho | S | 1.112650E-12
statohm | Ω | 8.987552E+11
statV | V | 2.997925E+02
stilb | cd/m^2 | 1.0E+04 *
stokes | m^2/s | 1.0E-04 *
tbsp | m^3 | 1.478676E-05
tsp | m^3 | 4.928922E-06
tex | kg/m | 1.0E-06 *
therm | J | 1.05506E+08
therm_US | J | 1.054804E+08
tonUK | kg | 1.016047E+03
tonUK/yd^3 | kg/m^3 | 1.328939E+03
tonne | kg | 1.0E+03 *
TR | W | 3.516853E+03
tTNT | J | 4.184E+09 *
ton | kg | 9.071847E+02
ton/yd^3 | kg/m^3 | 1.186553E+03
ton/h | kg/s | 2.519958E-01
tonf | N | 8.896443E+03
torr | Pa | 1.333224E+02
unit_pole | Wb | 1.256637E-07
Wh | J | 3.6E+03 *
W/cm^2 | W/m^2 | 1.0E+04 *
W/in^2 | W/m^2 | 1.550003E+03
yd | m | 9.144E-01 *
yr365 | s | 3.1536E+07 *
yr_sidereal | s | 3.155815E+07
yr_tropical | s | 3.155693E+07
`;
/** Rows of the table: unit, SI unit, printed factor, and whether it is printed as exact. */
export const nistFactors = table.trim().split('\n').map((line) => {
  const [unit = '', si = '', printed = ''] = line.split('|').map((cell) => cell.trim());
  return { unit, si, printed: printed.replace(' *', ''), exact: printed.endsWith('*') };
});
/** SP 811 counts these in survey feet; the catalogue counts them in international feet, which is 2e-6 (length) to 6e-6 (volume) less. */
export const nistSurveyFactors = [
  { unit: 'acre', si: 'm^2', printed: '4.046873E+03', power: 2 },
  { unit: 'acre-ft', si: 'm^3', printed: '1.233489E+03', power: 3 },
  { unit: 'chain', si: 'm', printed: '2.011684E+01', power: 1 },
  { unit: 'rod', si: 'm', printed: '5.029210E+00', power: 1 },
  { unit: 'fathom', si: 'm', printed: '1.828804E+00', power: 1 },
] as const;
/** SP 811, B.8: a revolution in radians; in the catalogue a revolution is a cycle, which becomes an angle by 2π only. */
export const nistTurns = [
  { unit: 'rev', si: 'rad', printed: '6.283185E+00' },
  { unit: 'rpm', si: 'rad/s', printed: '1.047198E-01' },
] as const;
