import type { UnitFamily } from './entry.ts';

/** The SI base units, and the gram, which carries the prefixes of mass. */
export const siBase: UnitFamily = {
  field: 'SI base units',
  units: [
    { symbols: ['m'], names: ['metre'], factor: '1', of: 'm', prefixes: 'all', source: 'SI Brochure, table 2' },
    { symbols: ['g'], names: ['gram', 'gramme'], factor: '0.001', of: 'kg', prefixes: 'all', remark: 'kg is the base unit; prefixes go with the gram', source: 'SI Brochure, table 2 and section 3' },
    { symbols: ['s', 'sec', 'secs'], names: ['second'], factor: '1', of: 's', prefixes: 'all', source: 'SI Brochure, table 2; sec: common practice' },
    { symbols: ['A', 'amp', 'amps'], names: ['ampere'], factor: '1', of: 'A', prefixes: 'all', source: 'SI Brochure, table 2; amp: common practice' },
    { symbols: ['K', '\u212a', 'degK', '°K'], names: ['kelvin', 'degree kelvin', 'degrees kelvin', 'degree k', 'degrees k'], factor: '1', of: 'K', prefixes: 'all', remark: 'degK and °K are spellings from before 1967', source: 'SI Brochure, table 2' },
    { symbols: ['mol'], names: ['mole'], factor: '1', of: 'mol', prefixes: 'all', source: 'SI Brochure, table 2' },
    { symbols: ['cd'], names: ['candela'], factor: '1', of: 'cd', prefixes: 'all', source: 'SI Brochure, table 2' },
  ],
};
