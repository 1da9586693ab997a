/** Units that the catalogue shares with UCUM and with mathjs: ours, theirs, and where they differ by how much at most and why. */
export interface Row { readonly ours: string; readonly theirs: string; readonly within: number; readonly why: string }

function rows(table: string): Row[] {
  return table.trim().split('\n').map((line) => {
    const [ours = '', theirs = '', within = '1e-12', why = ''] = line.split('|').map((cell) => cell.trim());
    return { ours, theirs, within: Number(within), why };
  });
}

/** Codes of UCUM, as the package @lhncbc/ucum-lhc reads them. */
export const inUcum = rows(`
m | m
s | s
g | g
A | A
K | K
mol | mol
cd | cd
rad | rad
N | N
Pa | Pa
J | J
W | W
C | C
V | V
F | F
Ω | Ohm
S | S
Wb | Wb
T | T
H | H
lm | lm
lx | lx
Bq | Bq
Gy | Gy
Sv | Sv
kat | kat
sr | sr
Hz | Hz
L | L
min | min
h | h
d | d
wk | wk
yr | a
mo | mo
yr_tropical | a_t | 1e-6 | SP 811 gives seven digits
t | t
bar | bar
Da | u | 1e-6 | UCUM keeps CODATA 1986
eV | eV | 1e-6 | UCUM keeps CODATA 1986
au | AU | 1e-10 | UCUM keeps the value before IAU 2012
pc | pc | 1e-6 | UCUM gives seven digits
ly | [ly]
g_n | [g]
Torr | Torr | 3e-6 | UCUM rounds to 133.322 Pa
atm | atm
at | att
gf | gf
kgf | kgf
kayser | Ky
Gal | Gal
dyn | dyn
erg | erg
P | P
cP | cP
St | St
cSt | cSt
abA | Bi
Mx | Mx
Gs | G
Oe | Oe
Gi | Gb
sb | sb
lambert | Lmb
Ci | Ci
roentgen | R
rd | RAD
rem | REM
deg | deg
gon | gon
arcmin | '
arcsec | ''
inch | [in_i]
ft | [ft_i]
yd | [yd_i]
mi | [mi_i]
fathom | [fth_i]
nmi | [nmi_i]
kn | [kn_i]
in^2 | [sin_i]
sqft | [sft_i]
sqyd | [syd_i]
cuin | [cin_i]
cuft | [cft_i]
cuyd | [cyd_i]
bdft | [bf_i]
cord | [cr_i]
mil | [mil_i]
cmil | [cml_i]
hand | [hd_i]
ftUS | [ft_us]
miUS | [mi_us]
acre | [acr_us] | 5e-6 | UCUM counts survey feet
gal | [gal_us]
bbl | [bbl_us]
qt | [qt_us]
pt | [pt_us]
gill | [gil_us]
floz | [foz_us]
bu | [bu_us]
peck | [pk_us]
tbsp | [tbs_us]
tsp | [tsp_us]
cup | [cup_us]
galUK | [gal_br]
qtUK | [qt_br]
ptUK | [pt_br]
flozUK | [foz_br]
grain | [gr]
lb | [lb_av]
lbf | [lbf_av]
oz | [oz_av]
dram | [dr_av]
cwt | [scwt_av]
cwtUK | [lcwt_av]
ton | [ston_av]
tonUK | [lton_av]
stone | [stone_av]
dwt | [pwt_tr]
ozt | [oz_tr]
lbt | [lb_tr]
pica | [pca]
degR | [degR]
cal15 | cal_[15]
cal_IT | cal_IT
cal | cal_th
kcal | kcal
Cal | [Cal]
BTU | [Btu_IT]
BTU_th | [Btu_th] | 3e-7 | UCUM rounds to 1054.35 J
hp | [HP]
tex | tex
den | [den]
mH2O | m[H2O]
cmH2O | cm[H2O]
mmH2O | mm[H2O]
inH2O | [in_i'H2O]
mHg | m[Hg] | 3e-6 | UCUM rounds to 133.322 kPa
mmHg | mm[Hg] | 3e-6 | UCUM rounds to 133.322 Pa
inHg | [in_i'Hg] | 3e-6 | UCUM rounds to 133.322 kPa a metre
osmol | osm
U | U
stere | st
Å | Ao
barn | b
mho | mho
psi | [psi]
ct | [car_m]
bit | bit
byte | By
% | %
permil | [ppth]
ppm | [ppm]
ppb | [ppb]
pptv | [pptr]
MWh | MW.h
gpm | [gal_us]/min
cfm | [cft_i]/min
ksi | k[psi]
mph | [mi_i]/h
rpm | /min
Ah | A.h
VA | V.A
lbmol | mol.[lb_av]/g
psf | [lbf_av]/[sft_i]
pdl | [lb_av].[ft_i]/s2
slug | [lbf_av].s2/[ft_i]
reyn | [lbf_av].s/[sin_i]
TR | 12000.[Btu_IT]/h
therm | 100000.[Btu_IT]
bpd | [bbl_us]/d
MGD | 1000000.[gal_us]/d
acre-ft | 43560.[cft_i]
fc | lm/[sft_i]
mpg | [mi_i]/[gal_us]
langley | cal_th/cm2
ppg | [lb_av]/[gal_us]
molal | mol/kg
M | mol/L
`);

/** Unit names of mathjs. */
export const inMathjs = rows(`
m | m
s | s
kg | kg
A | A
K | K
mol | mol
cd | cd
inch | inch
ft | foot
yd | yard
mi | mile
mil | mil
Å | angstrom
sqin | sqin
sqft | sqft
sqyd | sqyd
sqmi | sqmi
acre | acre | 5e-6 | mathjs rounds to 4046.86 m²
ha | hectare
L | litre
cuin | cuin
cuft | cuft
cuyd | cuyd
tsp | teaspoon | 2e-2 | mathjs has the metric teaspoon of 5 mL
tbsp | tablespoon | 2e-2 | mathjs has the metric tablespoon of 15 mL
floz | fluidounce
gill | gill
cc | cc
cup | cup
pt | pint
qt | quart
gal | gallon
bbl | oilbarrel
t | tonne
ton | ton
lb | lbm
grain | grain
dram | dram
oz | ounce
cwt | hundredweight
stone | stone
min | minute
h | hour
d | day
wk | week
mo | month
yr | year
decade | decade
century | century
rad | rad
deg | deg
gon | grad
arcsec | arcsec
arcmin | arcmin
degR | degR
Hz | Hz
N | N
dyn | dyn
lbf | lbf
kip | kip | 1e-8 | mathjs rounds to 4448.2216 N
kgf | kgf
J | J
erg | erg
Wh | Wh
BTU | BTU
eV | eV | 1e-7 | mathjs keeps CODATA 2010
W | W
hp | hp | 1e-10 | mathjs rounds to 745.6998715386 W
VA | VA
Pa | Pa
psi | psi | 1e-10 | mathjs rounds to 6894.75729276459 Pa
atm | atm
bar | bar
torr | torr | 3e-6 | mathjs rounds to 133.322 Pa
mmHg | mmHg | 3e-6 | mathjs rounds to 133.322 Pa
mmH2O | mmH2O
cmH2O | cmH2O
C | coulomb
Ah | Ah
F | farad
V | volt
Ω | ohm
H | henry
S | siemens
Wb | weber
T | tesla
bit | bit
byte | byte
`);
