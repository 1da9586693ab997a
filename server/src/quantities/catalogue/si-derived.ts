import type { UnitFamily } from './entry.ts';

/** SI derived units with special names that belong to no other family of this catalogue. */
export const siDerived: UnitFamily = {
  field: 'SI derived units with special names',
  units: [
    { symbols: ['N'], names: ['newton'], factor: '1', of: 'kg m s^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['Pa'], names: ['pascal'], factor: '1', of: 'kg m^-1 s^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['J'], names: ['joule'], factor: '1', of: 'kg m^2 s^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['W'], names: ['watt'], factor: '1', of: 'kg m^2 s^-3', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['C'], names: ['coulomb'], factor: '1', of: 'A s', prefixes: 'all', remark: 'C beside a temperature means degree Celsius', source: 'SI Brochure, table 4' },
    { symbols: ['V'], names: ['volt'], factor: '1', of: 'kg m^2 s^-3 A^-1', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['F'], names: ['farad'], factor: '1', of: 'kg^-1 m^-2 s^4 A^2', prefixes: 'all', remark: 'F beside a temperature means degree Fahrenheit', source: 'SI Brochure, table 4' },
    { symbols: ['Ω', '\u2126', 'ohm', 'Ohm'], names: ['ohm'], factor: '1', of: 'kg m^2 s^-3 A^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['S'], names: ['siemens'], factor: '1', of: 'kg^-1 m^-2 s^3 A^2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['Wb'], names: ['weber'], factor: '1', of: 'kg m^2 s^-2 A^-1', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['T'], names: ['tesla'], factor: '1', of: 'kg s^-2 A^-1', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['H'], names: ['henry', 'henries'], factor: '1', of: 'kg m^2 s^-2 A^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['lm'], names: ['lumen'], factor: '1', of: 'cd', prefixes: 'all', remark: 'cd sr', source: 'SI Brochure, table 4' },
    { symbols: ['lx'], names: ['lux'], factor: '1', of: 'cd m^-2', prefixes: 'all', remark: 'lm/m²', source: 'SI Brochure, table 4' },
    { symbols: ['Bq'], names: ['becquerel'], factor: '1', of: 's^-1', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['Gy'], names: ['gray'], factor: '1', of: 'm^2 s^-2', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['Sv'], names: ['sievert'], factor: '1', of: 'm^2 s^-2', prefixes: 'all', remark: 'the sverdrup of oceanography is read by its name only', source: 'SI Brochure, table 4' },
    { symbols: ['kat'], names: ['katal'], factor: '1', of: 'mol s^-1', prefixes: 'all', source: 'SI Brochure, table 4' },
    { symbols: ['sr'], names: ['steradian'], factor: '1', of: '1', prefixes: 'small', source: 'SI Brochure, table 4' },
  ],
};
