import type { UnitFamily } from './entry.ts';

const insulance = 'kg^-1 s^3 K';

/** Thermal comfort, insulation and consumption. */
export const heat: UnitFamily = {
  field: 'heat and consumption',
  units: [
    { symbols: ['clo'], names: ['clo'], factor: '0.155', of: insulance, prefixes: 'none', uncertainty: 1e-4, remark: 'conventional value of ISO 7730; older tables have 0.1549 and 0.200', source: 'ISO 7730; ASHRAE 55' },
    { symbols: ['tog'], names: ['tog'], factor: '0.1', of: insulance, prefixes: 'none', source: 'NIST SP 811, B.9; BS 4745' },
    { symbols: ['met', 'MET'], names: ['metabolic equivalent'], factor: '58.15', of: 'kg s^-3', prefixes: 'none', uncertainty: 5e-4, weak: true, remark: '58.15 W/m² in ISO 7730, 58.2 in ASHRAE 55', source: 'ISO 7730; ASHRAE 55' },
    { symbols: ['R-value', 'Rvalue', 'R_US', 'Rimp'], names: ['r-value'], factor: '3600*0.3048*0.3048*5/9/1055.05585262', of: insulance, prefixes: 'none', remark: 'h ft² °F/BTU_IT, as insulation is sold in the United States', source: 'NIST SP 811, B.8' },
    { symbols: ['RSI'], names: ['metric r-value'], factor: '1', of: insulance, prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['mpg', 'MPG', 'mpgUS'], names: ['mile per gallon'], factor: '1609.344/231/0.0254/0.0254/0.0254', of: 'm^-2', prefixes: 'none', remark: 'US gallons', source: 'NIST SP 811, B.8' },
    { symbols: ['mpgUK'], names: ['mile per imperial gallon'], factor: '1609.344/0.00454609', of: 'm^-2', prefixes: 'none', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['rayl', 'Rayl'], names: ['rayl'], factor: '1', of: 'kg m^-2 s^-1', prefixes: 'all', remark: 'Pa s/m; the CGS rayl is ten of these', source: 'common practice in acoustics' },
  ],
};
