/** Units of common practice against what their names say, in units that the other tests compare with published factors: exactly. */
import { describe, expect, it } from 'vitest';
import { readFactor, readStrict } from './catalogue-reader.ts';

const table = `
in | 1 | inch
furlong | 1/8 | mi
chain | 1/80 | mi
rod | 1/320 | mi
league | 3 | mi
fathom | 2 | yd
cable | 0.1 | nmi
kft | 1000 | ft
FL | 100 | ft
kcmil | 1000 | cmil
sqm | 1 | m^2
sqkm | 1 | km^2
acre | 1/640 | mi^2
mD | 0.001 | darcy
cum | 1 | m^3
cc | 1 | mL
kgal | 1000 | gal
Mgal | 1 | acre-ft | not equal
Mgal | 1e6 | gal
galDry | 1/8 | bu
gal | 4 | qt
gal | 8 | pt
gal | 16 | cup
gal | 128 | floz
galUK | 160 | flozUK
bbl | 42 | gal
Mbbl | 1000 | bbl
MMbbl | 1e6 | bbl
ccf | 100 | cuft
Mcf | 1000 | cuft
MMcf | 1e6 | cuft
TAF | 1000 | acre-ft
acre-ft | 1 | acre ft
scf | 1 | cuft
Mscf | 1000 | scf
MMscf | 1e6 | scf
Nm3 | 1 | m^3
Sm3 | 1 | m^3
bdft | 1/12 | ft^3
cord | 128 | ft^3
sfd | 1 | cfs d
klb | 1000 | lb
gr | 1 | grain
lb | 7000 | grain
lb | 16 | oz
lb | 256 | dram
ton | 20 | cwt
tonUK | 20 | cwtUK
tonUK | 160 | stone
slug | 1 | lbf s^2/ft
slinch | 12 | slug
pcf | 1 | lb/ft^3
u | 1 | Da
fortnight | 14 | d
a | 1 | yr
y | 1 | yr
decade | 10 | yr
century | 100 | yr
yr | 12 | mo
tf | 1000 | kgf
gf | 0.001 | kgf
klbf | 1000 | lbf
kip | 1000 | lbf
tonfUK | 2240 | lbf
plf | 1 | lbf/ft
klf | 1 | kip/ft
pli | 1 | lbf/inch
mb | 1 | hPa
bara | 1 | bar
at | 1 | kgf/cm^2
ksc | 1 | kgf/cm^2
kscg | 1 | kgf/cm^2
psi | 1 | lbf/inch^2
psia | 1 | psi
psid | 1 | psi
psig | 1 | psi
ksig | 1 | ksi
barg | 1 | bar
Pag | 1 | Pa
atmg | 1 | atm
ksi | 1 | kip/inch^2
Msi | 1000 | ksi
psf | 1 | lbf/ft^2
ksf | 1 | kip/ft^2
tsf | 1 | tonf/ft^2
atm | 760 | torr
umHg | 0.001 | mmHg
inHg | 25.4 | mmHg
inH2O | 25.4 | mmH2O
ftH2O | 12 | inH2O
mH2O | 1000 | mmH2O
Ba | 1 | dyn/cm^2
Ws | 1 | J
thermie | 1 | Mcal_IT
kBTU | 1000 | BTU
MMBTU | 1e6 | BTU
therm | 1e5 | BTU
quad | 1e15 | BTU
BTU | 2326 | J lb/kg
BTU_th | 4184*5/9 | J lb/kg
E_h | 2 | Ry
toe | 10 | Gcal_IT
tce | 7 | Gcal_IT
tTNT | 1 | Gcal
ft-lbf | 1 | ft lbf
in-lbf | 1 | inch lbf
in-ozf | 1 | inch ozf
kip-ft | 1 | kip ft
kip-in | 1 | kip inch
kgf-m | 1 | kgf m
hp-h | 1 | hp h
ton-h | 1 | TR h
hp | 550 | ft lbf/s
hp | 33000 | ft lbf/min
PS | 75 | kgf m/s
bhp | 1 | hp
whp | 1 | hp
TR | 200 | BTU/min
BTUH | 1 | BTU/h
MBH | 1000 | BTU/h
var | 1 | W
Wp | 1 | W
We | 1 | W
Wth | 1 | W
Jy | 1e-26 | W/(m^2 Hz)
delta_degC | 1 | K
delta_degF | 1 | degR
degR | 5/9 | K
gps | 1 | gal/s
gph | 1 | gal/h
gpd | 1 | gal/d
MGD | 1e6 | gal/d
igpm | 1 | galUK/min
MIGD | 1e6 | galUK/d
cfh | 1 | ft^3/h
scfm | 1 | ft^3/min
scfh | 1 | ft^3/h
scfd | 1 | ft^3/d
MMscfd | 1e6 | ft^3/d
sccm | 1 | cc/min
slm | 1 | L/min
lpm | 1 | L/min
lps | 1 | L/s
lph | 1 | L/h
cmh | 1 | m^3/h
cumec | 1 | m^3/s
cms | 1 | m^3/s
MLD | 1 | ML/d
bpd | 1 | bbl/d
sverdrup | 1 | hm^3/s
perm | 1 | grain/(h ft^2 inHg)
perm_in | 1 | grain inch/(h ft^2 inHg)
mph | 1 | mi/h
kph | 1 | km/h
fps | 1 | ft/s
fpm | 1 | ft/min
ips | 1 | inch/s
mps | 1 | m/s
kn | 1 | nmi/h
cps | 1 | cP
reyn | 1 | psi s
ureyn | 1e-6 | psi s
deg | 60 | arcmin
deg | 3600 | arcsec
mas | 0.001 | arcsec
mgon | 0.001 | gon
gon | 0.9 | deg
hourangle | 15 | deg
mil_angle | 360/6400 | deg
sqdeg | 1 | deg^2
krpm | 1000 | rpm
rpm | 1 | rev/min
rps | 1 | rev/s
rph | 1 | rev/h
cpm | 1 | cycle/min
cpd | 1 | cycle/d
cph | 1 | cycle/h
rps | 1 | Hz
ACH | 1 | 1/h
G | 1 | Gs
debye | 1e-18 | statC cm
statV | 1e-7 | J/statC
abV | 1e-7 | J/abC
statF | 1 | statC/statV
abohm | 1 | abV/abA
asb | 1/pi | cd/m^2
lambert | 1e4 | asb
fL | 1/pi | cd/ft^2
fc | 1 | lm/ft^2
nt | 1 | cd/m^2
lm-h | 1 | lm h
dpt | 1 | 1/m
dpi | 1 | 1/inch
dpm | 1 | 1/min
b | 1 | barn
gmol | 1 | mol
kgmol | 1 | kmol
lbmol | 1 | mol lb/g
M | 1 | mol/L
U | 1 | µmol/min
DU | 10 | amg µm
Kibit | 1024 | bit
Mibit | 1024 | Kibit
Gibit | 1024 | Mibit
KiB | 1024 | byte
MiB | 1024 | KiB
GiB | 1024 | MiB
TiB | 1024 | GiB
PiB | 1024 | TiB
bps | 1 | bit/s
Bps | 1 | byte/s
clo | 1.55 | tog
R-value | 1 | degR h ft^2/BTU
RSI | 1 | m^2 K/W
mpgUK | 1 | mi/galUK
rayl | 1 | Pa s/m
langley | 1 | cal/cm^2
den | 1 | g/km | not equal
den | 1/9 | tex
`;

const composed = table.trim().split('\n').map((line) => line.split('|').map((cell) => cell.trim()) as [string, string, string, string?]);

describe(`units and what they are made of (${composed.length})`, () => {
  it.each(composed)('%s = %s %s %s', (unit, count, made, not) => {
    const left = readStrict(unit);
    const right = readStrict(made);
    expect(left.dimension).toBe(right.dimension);
    expect(left.scale.equals(readFactor(count).mul(right.scale))).toBe(not === undefined);
  });
});
