import type { UnitFamily } from './entry.ts';

/** Ratios and counts: dimension one. */
export const ratios: UnitFamily = {
  field: 'ratios and counts',
  units: [
    { symbols: ['%', 'pct', 'percent', 'Percent', 'per cent', '％'], names: ['percent', 'per cent', 'percentage', 'percentage point'], factor: '0.01', of: '1', prefixes: 'none', source: 'SI Brochure, section 5.4.7' },
    { symbols: ['%RH', 'RH%', '%rh', '% RH'], names: ['percent relative humidity'], factor: '0.01', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['wt%', 'wt.%', '%wt', 'mass%', 'w%'], names: ['weight percent', 'mass percent'], factor: '0.01', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['vol%', 'vol.%', '%vol', 'v%'], names: ['volume percent'], factor: '0.01', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['mol%', 'mol.%', '%mol', 'at%', 'at.%'], names: ['mole percent', 'atomic percent'], factor: '0.01', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['‰', 'permil', 'permille', 'ppth'], names: ['per mille', 'permille', 'permil', 'per mil', 'parts per thousand', 'part per thousand'], factor: '0.001', of: '1', prefixes: 'none', source: 'ISO 80000-1' },
    { symbols: ['ppt'], names: [], factor: '0.001', of: '1', prefixes: 'none', weak: true, remark: 'parts per thousand, as salinity is written; in trace gases parts per trillion, for which write pptv', source: 'common practice; NIST SP 811, section 7.10.3, advises against it' },
    { symbols: ['ppm', 'PPM', 'ppmv', 'ppmV', 'ppmw', 'ppmm'], names: ['part per million', 'parts per million'], factor: '1e-6', of: '1', prefixes: 'none', source: 'SI Brochure, section 5.4.7' },
    { symbols: ['ppb', 'PPB', 'ppbv', 'ppbV', 'ppbw'], names: ['part per billion', 'parts per billion'], factor: '1e-9', of: '1', prefixes: 'none', source: 'NIST SP 811, section 7.10.3' },
    { symbols: ['pptv', 'pptV', 'pptr'], names: ['part per trillion', 'parts per trillion'], factor: '1e-12', of: '1', prefixes: 'none', source: 'NIST SP 811, section 7.10.3' },
    { symbols: ['bp'], names: ['basis point'], factor: '1e-4', of: '1', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['fraction', 'frac', 'ratio', 'number', 'num'], names: ['fraction', 'ratio', 'number', 'dimensionless', 'unitless', 'nondimensional', 'non-dimensional', 'adimensional', 'decimal fraction'], factor: '1', of: '1', prefixes: 'none', source: 'SI Brochure, section 5.4.7; common practice for the words' },
    { symbols: ['psu', 'PSU', 'PSS-78'], names: ['practical salinity unit', 'practical salinity'], factor: '1', of: '1', prefixes: 'none', remark: 'a number on the Practical Salinity Scale, not g/kg', source: 'PSS-78, UNESCO technical papers in marine science 44' },
    { symbols: ['°Bx', 'Brix', 'degBrix', '°Brix'], names: ['degree brix', 'degrees brix', 'brix'], factor: '0.01', of: '1', prefixes: 'none', remark: 'mass fraction of sucrose', source: 'common practice in food engineering' },
    { symbols: ['Mach', 'mach'], names: ['mach'], factor: '1', of: '1', prefixes: 'none', source: 'ISO 80000-11' },
    { symbols: ['dozen'], names: ['dozen'], factor: '12', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['count', 'counts', 'cts'], names: ['count'], factor: '1', of: '1', prefixes: 'none', source: 'NIST SP 811, section 7.5; common practice' },
    { symbols: ['pcs', 'pc.', 'ea'], names: ['piece', 'each'], factor: '1', of: '1', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['px', 'pixel', 'pixels', 'pix'], names: ['pixel'], factor: '1', of: '1', prefixes: 'none', source: 'common practice' },
    { symbols: ['person', 'persons', 'people', 'capita', 'cap', 'pers'], names: ['person', 'people', 'capita', 'occupant'], factor: '1', of: '1', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['molecule', 'molecules', 'molec'], names: ['molecule'], factor: '1', of: '1', prefixes: 'none', source: 'SI Brochure, section 5.4.7' },
    { symbols: ['particle', 'particles', '#'], names: ['particle'], factor: '1', of: '1', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['sone'], names: ['sone'], factor: '1', of: '1', prefixes: 'none', source: 'ISO 532' },
    { symbols: ['strain', 'ε'], names: ['strain'], factor: '1', of: '1', prefixes: 'none', weak: true, source: 'common practice in experimental mechanics' },
    { symbols: ['microstrain', 'ustrain', 'µε', 'με', 'µstrain', 'μstrain'], names: ['microstrain'], factor: '1e-6', of: '1', prefixes: 'none', source: 'common practice in experimental mechanics' },
  ],
};
