import type { UnitFamily } from './entry.ts';

const current = 'A';
const charge = 'A s';
const voltage = 'kg m^2 s^-3 A^-1';
const resistance = 'kg m^2 s^-3 A^-2';
const conductance = 'kg^-1 m^-2 s^3 A^2';
const capacitance = 'kg^-1 m^-2 s^4 A^2';
const inductance = 'kg m^2 s^-2 A^-2';
const flux = 'kg m^2 s^-2 A^-1';

/** Electric and magnetic units outside the SI, and the volts and amperes that carry a mark. CGS factors follow from c = 299792458 m/s. */
export const electric: UnitFamily = {
  field: 'electricity and magnetism',
  units: [
    { symbols: ['Ah', 'Ahr'], names: ['ampere hour', 'ampere-hour', 'amp hour', 'amp-hour'], factor: '3600', of: charge, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['Vdc', 'VDC', 'V_dc', 'Vac', 'VAC', 'V_ac', 'Vrms', 'V_rms', 'Vpp', 'Vpk'], names: ['volt direct current', 'volt alternating current'], factor: '1', of: voltage, prefixes: 'all', remark: 'the mark tells how the voltage is counted', source: 'common practice' },
    { symbols: ['Adc', 'A_dc', 'Aac', 'A_ac', 'Arms', 'A_rms', 'Apk'], names: ['ampere direct current', 'ampere alternating current'], factor: '1', of: current, prefixes: 'all', remark: 'the mark tells how the current is counted', source: 'common practice' },
    { symbols: ['A_turn', 'A-turn', 'At'], names: ['ampere turn', 'ampere-turn'], factor: '1', of: current, prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['mho', 'Mho', '℧'], names: ['mho'], factor: '1', of: conductance, prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['Gs', 'gauss', 'Gauss'], names: ['gauss'], factor: '1e-4', of: 'kg s^-2 A^-1', prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['G'], names: [], factor: '1e-4', of: 'kg s^-2 A^-1', prefixes: 'all', weak: true, remark: 'gauss; G also names a constant, a shear modulus, an irradiance', source: 'NIST SP 811, B.8' },
    { symbols: ['gamma_T', 'gamma_mag'], names: ['magnetic gamma'], factor: '1e-9', of: 'kg s^-2 A^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['Mx'], names: [], factor: '1e-8', of: flux, prefixes: 'all', weak: true, remark: 'maxwell; also a moment', source: 'NIST SP 811, B.8' },
    { symbols: ['maxwell'], names: ['maxwell'], factor: '1e-8', of: flux, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['unit_pole'], names: ['unit pole'], factor: '4*pi*1e-8', of: flux, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['Oe', 'oersted'], names: ['oersted'], factor: '1000/4/pi', of: 'A m^-1', prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['Gi', 'gilbert'], names: ['gilbert'], factor: '10/4/pi', of: current, prefixes: 'none', weak: true, source: 'NIST SP 811, B.8' },
    { symbols: ['abA'], names: ['abampere'], factor: '10', of: current, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abC'], names: ['abcoulomb'], factor: '10', of: charge, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abV'], names: ['abvolt'], factor: '1e-8', of: voltage, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abohm', 'abΩ'], names: ['abohm'], factor: '1e-9', of: resistance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abmho', 'abS'], names: ['abmho', 'absiemens'], factor: '1e9', of: conductance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abF'], names: ['abfarad'], factor: '1e9', of: capacitance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['abH'], names: ['abhenry', 'abhenries'], factor: '1e-9', of: inductance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statA'], names: ['statampere'], factor: '0.1/299792458', of: current, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statC', 'esu'], names: ['statcoulomb', 'franklin'], factor: '0.1/299792458', of: charge, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statV'], names: ['statvolt'], factor: '299.792458', of: voltage, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statohm'], names: ['statohm'], factor: '299792458*299792458/100000', of: resistance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statmho'], names: ['statmho'], factor: '100000/299792458/299792458', of: conductance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statF'], names: ['statfarad'], factor: '100000/299792458/299792458', of: capacitance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['statH'], names: ['stathenry', 'stathenries'], factor: '299792458*299792458/100000', of: inductance, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['faraday'], names: ['faraday'], factor: '1.602176634e-19*6.02214076e23', of: charge, prefixes: 'none', weak: true, remark: 'charge of one mole of electrons', source: 'NIST SP 811, B.8; exact since the SI of 2019' },
    { symbols: ['debye', 'Debye'], names: ['debye'], factor: '1e-21/299792458', of: 'A s m', prefixes: 'none', source: 'NIST SP 811, B.8' },
  ],
};
