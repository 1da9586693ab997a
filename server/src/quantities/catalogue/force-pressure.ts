import type { UnitFamily } from './entry.ts';

const newton = 'kg m s^-2';
const pascal = 'kg m^-1 s^-2';
const gauge = { kind: 'gauge', zero: '101325' } as const;

/** Forces; those named after a mass take the standard acceleration of free fall, 9.80665 m/s². */
export const force: UnitFamily = {
  field: 'force',
  units: [
    { symbols: ['kgf', 'kg_f', 'kgF'], names: ['kilogram force', 'kilogram-force', 'kilograms force'], factor: '9.80665', of: newton, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['kp'], names: ['kilopond'], factor: '9.80665', of: newton, prefixes: 'none', weak: true, source: 'NIST SP 811, B.8' },
    { symbols: ['gf', 'pond'], names: ['gram force', 'gram-force', 'pond'], factor: '0.00980665', of: newton, prefixes: 'none', source: 'common practice; definition as for kgf' },
    { symbols: ['tf', 'tonnef'], names: ['tonne force', 'metric ton force'], factor: '9806.65', of: newton, prefixes: 'none', weak: true, source: 'common practice; definition as for kgf' },
    { symbols: ['lbf', 'lb_f', 'lbF'], names: ['pound force', 'pound-force', 'pounds force'], factor: '0.45359237*9.80665', of: newton, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['klbf'], names: ['thousand pound force'], factor: '453.59237*9.80665', of: newton, prefixes: 'none', source: 'common practice' },
    { symbols: ['kip', 'kips'], names: ['kip'], factor: '453.59237*9.80665', of: newton, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['ozf'], names: ['ounce force', 'ounce-force'], factor: '0.45359237/16*9.80665', of: newton, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['tonf', 'tonfUS'], names: ['ton force', 'ton-force', 'short ton force'], factor: '2000*0.45359237*9.80665', of: newton, prefixes: 'none', remark: 'short ton of 2000 lb', source: 'NIST SP 811, B.8' },
    { symbols: ['tonfUK'], names: ['long ton force'], factor: '2240*0.45359237*9.80665', of: newton, prefixes: 'none', source: 'common practice; definition as for lbf' },
    { symbols: ['pdl'], names: ['poundal'], factor: '0.45359237*0.3048', of: newton, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['dyn', 'dyne'], names: ['dyne'], factor: '1e-5', of: newton, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['plf'], names: ['pound per linear foot', 'pound force per foot'], factor: '0.45359237*9.80665/0.3048', of: 'kg s^-2', prefixes: 'none', remark: 'pounds-force per foot of length', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['klf'], names: ['kip per linear foot'], factor: '453.59237*9.80665/0.3048', of: 'kg s^-2', prefixes: 'none', source: 'common practice' },
    { symbols: ['pli'], names: ['pound per linear inch'], factor: '0.45359237*9.80665/0.0254', of: 'kg s^-2', prefixes: 'none', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['g_n', 'g0', 'gee'], names: ['standard gravity', 'standard acceleration of free fall'], factor: '9.80665', of: 'm s^-2', prefixes: 'none', weak: true, remark: 'accelerations counted in g', source: 'NIST SP 811, B.8; CGPM 1901' },
    { symbols: ['Gal'], names: ['galileo'], factor: '0.01', of: 'm s^-2', prefixes: 'small', weak: true, remark: 'acceleration in geodesy; gal is the gallon', source: 'NIST SP 811, B.8' },
  ],
};

/** Absolute pressures. Columns of water and mercury are the conventional ones: 1000 and 13595.1 kg/m³ under 9.80665 m/s². */
export const pressure: UnitFamily = {
  field: 'pressure',
  units: [
    { symbols: ['bar', 'bars'], names: ['bar'], factor: '100000', of: pascal, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['mb', 'mbs'], names: [], factor: '100', of: pascal, prefixes: 'none', remark: 'millibar, as meteorology writes it', source: 'common practice' },
    { symbols: ['bara', 'bar_a', 'barA'], names: ['bar absolute'], factor: '100000', of: pascal, prefixes: 'all', source: 'common practice' },
    { symbols: ['Paa', 'Pa_a'], names: ['pascal absolute'], factor: '1', of: pascal, prefixes: 'all', source: 'common practice' },
    { symbols: ['atm', 'atma'], names: ['atmosphere', 'standard atmosphere'], factor: '101325', of: pascal, prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['at_tech', 'ata'], names: ['technical atmosphere'], factor: '98066.5', of: pascal, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['at'], names: [], factor: '98066.5', of: pascal, prefixes: 'none', weak: true, remark: 'technical atmosphere, 1 kgf/cm²', source: 'NIST SP 811, B.8' },
    { symbols: ['ksc'], names: ['kilogram force per square centimetre'], factor: '98066.5', of: pascal, prefixes: 'none', remark: 'kgf/cm²', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['psi', 'Psi', 'PSI'], names: ['pound per square inch', 'pounds per square inch', 'pound-force per square inch'], factor: '0.45359237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['psia', 'Psia', 'PSIA', 'psi_a'], names: ['psi absolute', 'pound per square inch absolute', 'pounds per square inch absolute'], factor: '0.45359237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['psid', 'PSID'], names: ['psi differential'], factor: '0.45359237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', remark: 'a pressure difference', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['ksi', 'Ksi', 'KSI', 'kpsi'], names: ['kip per square inch', 'kips per square inch'], factor: '453.59237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['Msi', 'Mpsi'], names: ['million pounds per square inch'], factor: '453592.37*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', source: 'common practice' },
    { symbols: ['psf', 'PSF'], names: ['pound per square foot', 'pounds per square foot'], factor: '0.45359237*9.80665/0.3048/0.3048', of: pascal, prefixes: 'none', remark: 'pounds-force', source: 'NIST SP 811, B.8' },
    { symbols: ['ksf'], names: ['kip per square foot', 'kips per square foot'], factor: '453.59237*9.80665/0.3048/0.3048', of: pascal, prefixes: 'none', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['tsf'], names: ['ton per square foot', 'tons per square foot'], factor: '907184.74*9.80665/0.3048/0.3048/1000', of: pascal, prefixes: 'none', remark: 'short tons-force, as in soil mechanics', source: 'common practice' },
    { symbols: ['Torr', 'torr'], names: ['torr'], factor: '101325/760', of: pascal, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['mmHg', 'mmhg', 'mm Hg'], names: ['millimetre of mercury'], factor: '13595.1*9.80665/1000', of: pascal, prefixes: 'none', remark: 'conventional, 0 °C', source: 'NIST SP 811, B.8' },
    { symbols: ['cmHg', 'cm Hg'], names: ['centimetre of mercury'], factor: '13595.1*9.80665/100', of: pascal, prefixes: 'none', remark: 'conventional, 0 °C', source: 'NIST SP 811, B.8' },
    { symbols: ['mHg', 'm Hg'], names: ['metre of mercury'], factor: '13595.1*9.80665', of: pascal, prefixes: 'none', remark: 'conventional, 0 °C', source: 'NIST SP 811, B.8' },
    { symbols: ['umHg', 'µmHg', 'μmHg'], names: ['micron of mercury', 'micrometre of mercury'], factor: '13595.1*9.80665/1000000', of: pascal, prefixes: 'none', source: 'common practice; definition as for mmHg' },
    { symbols: ['inHg', 'inhg', 'in Hg', 'in. Hg', 'inHG'], names: ['inch of mercury', 'inches of mercury'], factor: '0.0254*13595.1*9.80665', of: pascal, prefixes: 'none', remark: 'conventional, 32 °F; at 60 °F 3376.85 Pa', source: 'NIST SP 811, B.8' },
    { symbols: ['inH2O', 'inH2o', 'inh2o', 'in H2O', 'in. H2O', 'inWC', 'inwc', 'inWG', 'inwg', 'iwc', 'inAq'], names: ['inch of water', 'inches of water', 'inch water gauge', 'inches water gauge', 'inches water column'], factor: '0.0254*1000*9.80665', of: pascal, prefixes: 'none', remark: 'conventional; at 60 °F 248.84 Pa', source: 'NIST SP 811, B.8' },
    { symbols: ['ftH2O', 'ft H2O', 'ftWC', 'ftwc'], names: ['foot of water', 'feet of water'], factor: '0.3048*1000*9.80665', of: pascal, prefixes: 'none', remark: 'conventional', source: 'NIST SP 811, B.8' },
    { symbols: ['mH2O', 'm H2O', 'mWC', 'mwc', 'mCE', 'mWS'], names: ['metre of water'], factor: '1000*9.80665', of: pascal, prefixes: 'none', remark: 'conventional', source: 'common practice; definition as for mmH2O' },
    { symbols: ['cmH2O', 'cm H2O', 'cmWC'], names: ['centimetre of water'], factor: '10*9.80665', of: pascal, prefixes: 'none', remark: 'conventional', source: 'NIST SP 811, B.8' },
    { symbols: ['mmH2O', 'mm H2O', 'mmWC', 'mmwc', 'mmCE', 'mmWS', 'mmAq'], names: ['millimetre of water'], factor: '9.80665', of: pascal, prefixes: 'none', remark: 'conventional', source: 'NIST SP 811, B.8' },
    { symbols: ['Ba', 'barye'], names: ['barye'], factor: '0.1', of: pascal, prefixes: 'none', weak: true, remark: 'dyn/cm²', source: 'common practice' },
  ],
};

/** Gauge pressures: points on a scale whose zero is the standard atmosphere. */
export const gaugePressure: UnitFamily = {
  field: 'gauge pressure',
  units: [
    { symbols: ['psig', 'Psig', 'PSIG', 'psi_g'], names: ['psi gauge', 'psi gage', 'pound per square inch gauge', 'pounds per square inch gauge'], factor: '0.45359237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', offset: gauge, source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['barg', 'bar_g', 'barG'], names: ['bar gauge'], factor: '100000', of: pascal, prefixes: 'all', offset: gauge, source: 'common practice' },
    { symbols: ['Pag', 'Pa_g'], names: ['pascal gauge'], factor: '1', of: pascal, prefixes: 'all', offset: gauge, source: 'common practice' },
    { symbols: ['atmg'], names: ['atmosphere gauge'], factor: '101325', of: pascal, prefixes: 'none', offset: gauge, source: 'common practice' },
    { symbols: ['ksig'], names: ['ksi gauge'], factor: '453.59237*9.80665/0.0254/0.0254', of: pascal, prefixes: 'none', offset: gauge, source: 'common practice' },
    { symbols: ['kscg'], names: ['kilogram force per square centimetre gauge'], factor: '98066.5', of: pascal, prefixes: 'none', offset: gauge, source: 'common practice' },
  ],
};
