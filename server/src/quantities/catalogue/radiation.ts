import type { UnitFamily } from './entry.ts';

/** Ionizing radiation beside becquerel, gray and sievert. */
export const radiation: UnitFamily = {
  field: 'ionizing radiation',
  units: [
    { symbols: ['Ci', 'curie'], names: ['curie'], factor: '3.7e10', of: 's^-1', prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['dpm'], names: ['disintegration per minute'], factor: '1/60', of: 's^-1', prefixes: 'none', source: 'common practice' },
    { symbols: ['rd', 'rad_dose'], names: ['rad of absorbed dose'], factor: '0.01', of: 'm^2 s^-2', prefixes: 'all', weak: true, remark: 'rad alone is the radian', source: 'NIST SP 811, B.8' },
    { symbols: ['rem', 'rems'], names: ['rem', 'roentgen equivalent man'], factor: '0.01', of: 'm^2 s^-2', prefixes: 'all', weak: true, source: 'NIST SP 811, B.8' },
    { symbols: ['roentgen', 'Roentgen'], names: ['roentgen', 'röntgen'], factor: '2.58e-4', of: 'A s kg^-1', prefixes: 'all', remark: 'its symbol R is the degree Rankine or the gas constant in most scripts', source: 'NIST SP 811, B.8' },
    { symbols: ['b'], names: [], factor: '1e-28', of: 'm^2', prefixes: 'none', weak: true, remark: 'barn, as nuclear data write it', source: 'NIST SP 811, B.8' },
    { symbols: ['TECU', 'TECu'], names: ['total electron content unit'], factor: '1e16', of: 'm^-2', prefixes: 'none', source: 'common practice in geodesy' },
  ],
};
