import type { UnitFamily } from './entry.ts';

/** Light outside the SI names, and the power of lenses. */
export const photometry: UnitFamily = {
  field: 'photometry and optics',
  units: [
    { symbols: ['fc'], names: [], factor: '1/0.3048/0.3048', of: 'cd m^-2', prefixes: 'none', weak: true, remark: 'the footcandle; also a frequency and a strength of concrete', source: 'NIST SP 811, B.8' },
    { symbols: ['ftc', 'ft-c', 'footcandle', 'footcandles'], names: ['footcandle', 'foot candle', 'foot-candle'], factor: '1/0.3048/0.3048', of: 'cd m^-2', prefixes: 'none', remark: 'lm/ft²', source: 'NIST SP 811, B.8' },
    { symbols: ['fL', 'ftL', 'ft-L'], names: ['footlambert', 'foot lambert', 'foot-lambert'], factor: '1/pi/0.3048/0.3048', of: 'cd m^-2', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['Lb_lum', 'lambert'], names: ['lambert'], factor: '10000/pi', of: 'cd m^-2', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['asb', 'apostilb'], names: ['apostilb'], factor: '1/pi', of: 'cd m^-2', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['sb', 'stilb'], names: ['stilb'], factor: '10000', of: 'cd m^-2', prefixes: 'none', weak: true, source: 'NIST SP 811, B.8' },
    { symbols: ['ph', 'phot'], names: ['phot'], factor: '10000', of: 'cd m^-2', prefixes: 'none', weak: true, source: 'NIST SP 811, B.8' },
    { symbols: ['nt', 'nit', 'nits'], names: ['nit'], factor: '1', of: 'cd m^-2', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['cp_light', 'candlepower'], names: ['candlepower', 'candle power'], factor: '1', of: 'cd', prefixes: 'none', source: 'common practice' },
    { symbols: ['lm-h', 'lmh'], names: ['lumen hour'], factor: '3600', of: 'cd s', prefixes: 'all', source: 'ISO 80000-7' },
    { symbols: ['dpt', 'dioptre', 'diopter'], names: ['dioptre'], factor: '1', of: 'm^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['kayser'], names: ['kayser'], factor: '100', of: 'm^-1', prefixes: 'none', remark: 'cm⁻¹', source: 'NIST SP 811, B.8' },
    { symbols: ['dpi', 'DPI', 'ppi', 'lpi', 'tpi'], names: ['dot per inch', 'dots per inch', 'pixels per inch', 'lines per inch', 'threads per inch'], factor: '1/0.0254', of: 'm^-1', prefixes: 'none', source: 'common practice' },
  ],
};
