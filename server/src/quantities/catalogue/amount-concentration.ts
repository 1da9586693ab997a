import type { UnitFamily } from './entry.ts';

/** Amounts of substance beside the mole, and concentrations. */
export const amount: UnitFamily = {
  field: 'amount of substance and concentration',
  units: [
    { symbols: ['lbmol', 'lb-mol', 'lb_mol', 'lbmole', 'lb-mole', 'lbmoles'], names: ['pound mole', 'pound-mole'], factor: '453.59237', of: 'mol', prefixes: 'none', source: 'common practice; from the pound of NIST SP 811, B.8' },
    { symbols: ['gmol', 'g-mol', 'gmole', 'g-mole'], names: ['gram mole', 'gram-mole'], factor: '1', of: 'mol', prefixes: 'none', source: 'common practice' },
    { symbols: ['kgmol', 'kg-mol', 'kgmole', 'kmole'], names: ['kilogram mole', 'kilogram-mole'], factor: '1000', of: 'mol', prefixes: 'none', source: 'common practice' },
    { symbols: ['einstein'], names: ['einstein'], factor: '1', of: 'mol', prefixes: 'small', weak: true, remark: 'a mole of photons', source: 'common practice in plant physiology' },
    { symbols: ['M'], names: ['molar'], factor: '1000', of: 'mol m^-3', prefixes: 'small', weak: true, remark: 'mol/L', source: 'NIST SP 811, section 8.6.5' },
    { symbols: ['molal'], names: ['molal'], factor: '1', of: 'mol kg^-1', prefixes: 'small', source: 'NIST SP 811, section 8.6.8' },
    { symbols: ['eq', 'Eq', 'equiv'], names: ['equivalent'], factor: '1', of: 'mol', prefixes: 'small', weak: true, remark: 'a mole of charges', source: 'common practice in water chemistry' },
    { symbols: ['osmol', 'Osm', 'osm'], names: ['osmole'], factor: '1', of: 'mol', prefixes: 'small', weak: true, source: 'common practice in medicine' },
    { symbols: ['U'], names: ['enzyme unit'], factor: '1e-6/60', of: 'mol s^-1', prefixes: 'none', weak: true, source: 'NIST SP 811, table 3 note on the katal; common practice' },
    { symbols: ['amg', 'amagat'], names: ['amagat'], factor: '101325/273.15/1.380649/6.02214076', of: 'mol m^-3', prefixes: 'none', remark: 'ideal gas at 0 °C and 101.325 kPa', source: 'common practice; from the exact constants of the SI' },
    { symbols: ['DU'], names: ['dobson unit'], factor: '101325e-5/273.15/1.380649/6.02214076', of: 'mol m^-2', prefixes: 'none', remark: 'a layer of 10 µm at 0 °C and 101.325 kPa', source: 'common practice in meteorology' },
  ],
};
