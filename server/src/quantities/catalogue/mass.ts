import type { UnitFamily } from './entry.ts';

/** Masses beside the kilogram, and masses per length. The pound is the avoirdupois pound unless marked. */
export const mass: UnitFamily = {
  field: 'mass',
  units: [
    { symbols: ['t', 'tonne', 'tonnes'], names: ['tonne', 'metric ton'], factor: '1000', of: 'kg', prefixes: 'large', source: 'SI Brochure, table 8' },
    { symbols: ['kgm', 'kgs'], names: [], factor: '1', of: 'kg', prefixes: 'none', weak: true, remark: 'kilogram, written so to tell it from kgf', source: 'common practice' },
    { symbols: ['lb', 'lbm', 'lbs', 'lb_m', 'lbs.', 'lb.'], names: ['pound', 'pound mass', 'avoirdupois pound', 'pounds mass'], factor: '0.45359237', of: 'kg', prefixes: 'none', remark: 'lb is mass; force is lbf', source: 'NIST SP 811, B.8' },
    { symbols: ['klb', 'klbm'], names: ['kilopound', 'thousand pound'], factor: '453.59237', of: 'kg', prefixes: 'none', source: 'common practice' },
    { symbols: ['oz'], names: ['ounce', 'avoirdupois ounce'], factor: '0.45359237/16', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['ozt', 'oz_t'], names: ['troy ounce'], factor: '480*0.00006479891', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['lbt'], names: ['troy pound'], factor: '5760*0.00006479891', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['grain', 'grains'], names: ['grain'], factor: '0.00006479891', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['gr'], names: [], factor: '0.00006479891', of: 'kg', prefixes: 'none', weak: true, remark: 'gr is the grain; some sources write it for gram', source: 'NIST SP 811, B.8' },
    { symbols: ['dram', 'drams'], names: ['dram', 'avoirdupois dram'], factor: '0.45359237/256', of: 'kg', prefixes: 'none', source: 'NIST Handbook 44, appendix C' },
    { symbols: ['dwt'], names: ['pennyweight'], factor: '24*0.00006479891', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['ct', 'carat'], names: ['carat', 'metric carat'], factor: '0.0002', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['stone'], names: ['stone'], factor: '14*0.45359237', of: 'kg', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['cwt'], names: ['hundredweight', 'short hundredweight'], factor: '100*0.45359237', of: 'kg', prefixes: 'none', remark: 'short hundredweight, 100 lb', source: 'NIST SP 811, B.8' },
    { symbols: ['cwtUK'], names: ['long hundredweight'], factor: '112*0.45359237', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['ton', 'tons', 'tonUS', 'ton_us'], names: ['ton', 'short ton', 'us ton'], factor: '2000*0.45359237', of: 'kg', prefixes: 'none', weak: true, remark: 'short ton of 2000 lb; outside the United States ton often means tonne, in air conditioning a rate of cooling', source: 'NIST SP 811, B.8' },
    { symbols: ['tonUK', 'ton_uk'], names: ['long ton', 'imperial ton'], factor: '2240*0.45359237', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['slug', 'slugs'], names: ['slug'], factor: '0.45359237*9.80665/0.3048', of: 'kg', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['slinch', 'blob'], names: ['slinch', 'slinches'], factor: '0.45359237*9.80665/0.0254', of: 'kg', prefixes: 'none', remark: 'lbf s²/in, the mass of inch-based finite-element models', source: 'common practice' },
    { symbols: ['Da', 'dalton'], names: ['dalton'], factor: '1.66053906892e-27', of: 'kg', prefixes: 'all', uncertainty: 3.1e-10, source: 'SI Brochure, table 8; value CODATA 2022' },
    { symbols: ['u', 'amu'], names: ['atomic mass unit', 'unified atomic mass unit'], factor: '1.66053906892e-27', of: 'kg', prefixes: 'none', uncertainty: 3.1e-10, weak: true, remark: 'u is also the prefix micro in plain text', source: 'SI Brochure, table 8; value CODATA 2022' },
    { symbols: ['tex'], names: ['tex'], factor: '1e-6', of: 'kg m^-1', prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['den', 'denier'], names: ['denier'], factor: '1e-6/9', of: 'kg m^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['pcf', 'lbcf'], names: ['pound per cubic foot'], factor: '0.45359237/0.3048/0.3048/0.3048', of: 'kg m^-3', prefixes: 'none', remark: 'pounds per cubic foot; geotechnical reports also use it for a weight density', source: 'common practice' },
    { symbols: ['ppg'], names: ['pound per gallon'], factor: '0.45359237/231/0.0254/0.0254/0.0254', of: 'kg m^-3', prefixes: 'none', remark: 'pounds per US gallon, the density of drilling mud', source: 'common practice; factor NIST SP 811, B.8' },
  ],
};
