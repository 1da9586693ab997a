import type { PrefixEntry } from './entry.ts';

/** The 24 SI prefixes (SI Brochure, 9th ed. with the 2022 additions, table 7), largest first. */
export const prefixes: readonly PrefixEntry[] = [
  { symbols: ['Q'], name: 'quetta', power: 30 },
  { symbols: ['R'], name: 'ronna', power: 27 },
  { symbols: ['Y'], name: 'yotta', power: 24 },
  { symbols: ['Z'], name: 'zetta', power: 21 },
  { symbols: ['E'], name: 'exa', power: 18 },
  { symbols: ['P'], name: 'peta', power: 15 },
  { symbols: ['T'], name: 'tera', power: 12 },
  { symbols: ['G'], name: 'giga', power: 9 },
  { symbols: ['M'], name: 'mega', power: 6 },
  { symbols: ['k'], name: 'kilo', power: 3 },
  { symbols: ['h'], name: 'hecto', power: 2 },
  { symbols: ['da'], name: 'deca', power: 1 },
  { symbols: ['d'], name: 'deci', power: -1 },
  { symbols: ['c'], name: 'centi', power: -2 },
  { symbols: ['m'], name: 'milli', power: -3 },
  // Micro sign U+00B5, Greek mu U+03BC, and the letter u of plain-ASCII sources (ISO 2955 practice).
  { symbols: ['\u00b5', '\u03bc', 'u'], name: 'micro', power: -6 },
  { symbols: ['n'], name: 'nano', power: -9 },
  { symbols: ['p'], name: 'pico', power: -12 },
  { symbols: ['f'], name: 'femto', power: -15 },
  { symbols: ['a'], name: 'atto', power: -18 },
  { symbols: ['z'], name: 'zepto', power: -21 },
  { symbols: ['y'], name: 'yocto', power: -24 },
  { symbols: ['r'], name: 'ronto', power: -27 },
  { symbols: ['q'], name: 'quecto', power: -30 },
];
