import type { UnitFamily } from './entry.ts';

/** Information: dimensionless in the SI, counted in bits. */
export const information: UnitFamily = {
  field: 'information',
  units: [
    { symbols: ['bit', 'bits'], names: ['bit', 'shannon'], factor: '1', of: '1', prefixes: 'large', source: 'IEC 80000-13' },
    { symbols: ['B', 'byte', 'bytes'], names: ['byte', 'octet'], factor: '8', of: '1', prefixes: 'large', remark: 'kB is 1000 bytes, KiB 1024', source: 'IEC 80000-13' },
    { symbols: ['Kibit'], names: ['kibibit'], factor: '1024', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['Mibit'], names: ['mebibit'], factor: '1048576', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['Gibit'], names: ['gibibit'], factor: '1073741824', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['KiB'], names: ['kibibyte'], factor: '8*1024', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['MiB'], names: ['mebibyte'], factor: '8*1048576', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['GiB'], names: ['gibibyte'], factor: '8*1073741824', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['TiB'], names: ['tebibyte'], factor: '8*1024*1073741824', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['PiB'], names: ['pebibyte'], factor: '8*1048576*1073741824', of: '1', prefixes: 'none', source: 'IEC 80000-13' },
    { symbols: ['bps'], names: ['bit per second'], factor: '1', of: 's^-1', prefixes: 'large', source: 'common practice; IEC 80000-13' },
    { symbols: ['Bps'], names: ['byte per second'], factor: '8', of: 's^-1', prefixes: 'large', source: 'common practice; IEC 80000-13' },
    { symbols: ['Bd', 'baud'], names: ['baud'], factor: '1', of: 's^-1', prefixes: 'large', source: 'IEC 80000-13' },
    { symbols: ['Sps', 'sps'], names: ['sample per second'], factor: '1', of: 's^-1', prefixes: 'large', source: 'common practice' },
    { symbols: ['fps_video', 'FPS'], names: ['frame per second'], factor: '1', of: 's^-1', prefixes: 'none', weak: true, remark: 'fps in small letters is feet per second', source: 'common practice' },
  ],
};

/**
 * Levels are logarithms of ratios. A number of decibels has no factor to a coherent unit (a mark such as dBm even names a
 * reference), so every level counts as a number of its own and adds to levels only.
 */
export const levels: UnitFamily = {
  field: 'levels',
  units: [
    { symbols: ['dB'], names: ['decibel'], factor: '1', of: '1', prefixes: 'none', level: true, source: 'SI Brochure, table 8' },
    { symbols: ['dBA', 'dB(A)', 'dBa'], names: ['a-weighted decibel'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'A-weighted sound level', source: 'IEC 61672-1; common practice for the symbol' },
    { symbols: ['dBC', 'dB(C)'], names: ['c-weighted decibel'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'C-weighted sound level', source: 'IEC 61672-1; common practice for the symbol' },
    { symbols: ['dBm', 'dBmW'], names: ['decibel milliwatt'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'reference 1 mW', source: 'ITU-R V.574' },
    { symbols: ['dBW'], names: ['decibel watt'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'reference 1 W', source: 'ITU-R V.574' },
    { symbols: ['dBV', 'dBu', 'dBµV', 'dBμV', 'dBuV'], names: ['decibel volt'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'reference 1 V, 0.775 V or 1 µV', source: 'ITU-R V.574' },
    { symbols: ['dBi', 'dBd', 'dBic'], names: ['decibel isotropic'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'antenna gain', source: 'ITU-R V.574' },
    { symbols: ['dBc', 'dBFS', 'dBr'], names: ['decibel carrier', 'decibel full scale'], factor: '1', of: '1', prefixes: 'none', level: true, source: 'common practice' },
    { symbols: ['dBZ'], names: ['decibel reflectivity'], factor: '1', of: '1', prefixes: 'none', level: true, remark: 'radar reflectivity, reference 1 mm⁶/m³', source: 'common practice in meteorology' },
    { symbols: ['dBsm', 'dBHz', 'dBK'], names: ['decibel square metre'], factor: '1', of: '1', prefixes: 'none', level: true, source: 'common practice' },
    { symbols: ['Np', 'neper'], names: ['neper'], factor: '1', of: '1', prefixes: 'small', level: true, source: 'SI Brochure, table 8' },
    { symbols: ['bel'], names: ['bel'], factor: '1', of: '1', prefixes: 'none', weak: true, level: true, source: 'SI Brochure, table 8' },
    { symbols: ['phon'], names: ['phon'], factor: '1', of: '1', prefixes: 'none', level: true, source: 'ISO 226' },
    { symbols: ['oct', 'octave'], names: ['octave'], factor: '1', of: '1', prefixes: 'none', weak: true, remark: 'a doubling of frequency, as in dB/octave', source: 'ISO 80000-8' },
    { symbols: ['dec'], names: [], factor: '1', of: '1', prefixes: 'none', weak: true, remark: 'a tenfold frequency, as in dB/dec', source: 'ISO 80000-8' },
  ],
};
