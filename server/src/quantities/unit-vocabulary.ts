/** English words and letters that look like units: data for deciding what a text may be. Source: common practice, as met in public code. */

/** Never units, though the prefixes would make one of them. */
export const never: ReadonlySet<string> = new Set(['as', 'As', 'AS', 'am', 'Am', 'AM', 'PM', 'pm', 'at', 'At', 'is', 'to', 'has', 'das', 'had', 'All', 'all', 'TM', 'mas', 'MAS', 'Es', 'Ts', 'fs', 'Em', 'num', 'NUM', 'pH', 'damp', 'camp', 'ramp', 'tamp', 'dimensionless', 'unitless', 'nondimensional', 'adimensional', 'ubar', 'hbar', 'abar', 'fbar', 'pbar', 'ybar', 'zbar', 'rbar', 'qbar', 'Rbar', 'Ebar', 'Pbar', 'Tbar', 'Gbar', 'Qbar', 'Ybar', 'Zbar', 'nbar']);

/** Units of three letters and more whose name or symbol is also an everyday word or a common name in scripts: alone they leave doubt. */
export const everyday: ReadonlySet<string> = new Set([
  'min', 'mins', 'bar', 'bars', 'day', 'foot', 'second', 'minute', 'hour', 'week', 'month', 'year', 'degree', 'meter', 'metre', 'chain', 'rod', 'rods', 'hand', 'hands', 'barn', 'barns', 'mole', 'moles', 'stone', 'stones', 'slug', 'slugs', 'cord', 'cup', 'cups', 'gram', 'bit', 'bits', 'byte', 'bytes', 'met',
  'turn', 'turns', 'cycle', 'cycles', 'grad', 'grads', 'grade', 'mil', 'mils', 'knot', 'count', 'counts', 'cts', 'each', 'piece', 'pieces', 'rev', 'revs', 'inch', 'gal', 'gals', 'cal', 'ton', 'tons', 'tonne', 'pound', 'pounds', 'ounce', 'ounces', 'mile', 'yard', 'yards', 'acre', 'league', 'leagues', 'cable', 'cables', 'decade', 'decades', 'century', 'centuries',
  'fraction', 'fractions', 'frac', 'ratio', 'ratios', 'number', 'numbers', 'num', 'strain', 'strains', 'particle', 'particles', 'molecule', 'molecules', 'person', 'persons', 'people', 'cap', 'capita', 'occupant', 'occupants', 'pixel', 'pixels', 'pix', 'den', 'therm', 'therms', 'quad', 'gill', 'peck', 'pond', 'grain', 'grains', 'dram', 'drams', 'dozen', 'shake', 'mach', 'Mach',
  'sone', 'phon', 'gray', 'henry', 'volt', 'watt', 'newton', 'pascal', 'joule', 'pica', 'perm', 'rem', 'tex', 'oct', 'octave', 'octaves', 'dec', 'clo', 'tog', 'bel', 'cps', 'cms', 'fps', 'FPS', 'ips', 'mps', 'cpm', 'CPM', 'cpd', 'spm', 'bpm', 'MET', 'Cal', 'einstein', 'faraday', 'hartree', 'bps', 'dpi', 'DPI', 'cyc', 'ACH', 'thou', 'fathom', 'furlong', 'molal', 'molar', 'mas', 'GPS', 'gps', 'RSI',
  'dot', 'amp', 'amps', 'lambert', 'phot', 'nit', 'nits', 'octet', 'shannon', 'maxwell', 'gilbert', 'curie', 'equivalent', 'equivalents', 'CMS', 'MLD', 'TAF', 'ips', 'var', 'tce', 'toe', 'bushel', 'bushels', 'quart', 'quarts', 'pint', 'pints', 'barrel', 'barrels', 'hourangle', 'grams', 'plf', 'pli', 'psu', 'ear', 'ppt',
]);

/** Symbols of two letters that are neither words nor usual names. */
export const distinct: ReadonlySet<string> = new Set([
  'kg', 'mg', 'ug', 'mm', 'cm', 'km', 'um', 'ms', 'Pa', 'Hz', 'kW', 'mW', 'MW', 'GW', 'kJ', 'MJ', 'GJ', 'kV', 'mV', 'MV', 'kN', 'MN', 'mA', 'kA', 'uA', 'dB', 'ft', 'hr', 'lb', 'ml', 'mL', 'eV', 'kK', 'mK', 'mT', 'Wh', 'Ah', 'VA', 'yd', 'cP', 'nF', 'uF', 'pF', 'mH', 'uH', 'Gs', 'Mt', 'oC', 'oF', 'in.',
]);

/** Weak letters that alone are names of variables rather than units. */
export const letters: ReadonlySet<string> = new Set(['y', 'b', 'r', 'u', 'U', 'G', 'B', 'at', 'u', 'nt', 'ph', 'sb', 'rd', 'gr', 'eq', 'Eq', 'den', 'dec', 'bp', 'ea', 'cap', 'fc', 'ct', 'Mx', 'FL', 'Ba', 'We', 'Wt', 'perm', 'hand', 'chain', 'rod', 'cord', 'shake', 'num', 'tex', 'quad', 'equiv', 'decade', 'league', 'cable', 'person', 'persons', 'people', 'particle', 'CV', 'TR', 'RT', 'At', 'a0', 'g0', 'var', 'Var', 'VAR', 'kp', 'tf']);

/** Products and quotients of single letters that are units far more often than names. */
export const usualLetters: ReadonlySet<string> = new Set([
  'N m', 'A s', 'V A', 'W s', 'W h', 'J s', 'N s', 'V s', 'A h', 'A m', 'K s', 'K m', 'm K', 's K', 'W m', 'C m', 'T m', 'g m', 'm s', 'V m', 'J m', 'J h', 'm A', 's A', 'N K', 's V', 'h A', 'h W',
  'm/s', 'm/h', 'm/d', 'V/m', 'V/s', 'V/K', 'J/K', 'J/s', 'J/m', 'J/g', 'J/h', 'J/L', 'W/K', 'W/m', 'W/A', 'W/h', 'W/s', 'W/L', 'W/C', 'N/m', 'N/C', 'N/s', 'N/A', 'K/W', 'K/m', 'K/s', 'K/h', 'K/V', 'A/m', 'A/W', 'A/K', 'A/s', 'A/C', 'V/C', 'L/s', 'L/h', 'L/d', 'l/s', 'l/h', 'l/d', 'g/s', 'g/h', 'g/d', 'g/L', 'g/m', 'g/g', 'm/m', 's/m', 'S/m', 'F/m', 'H/m', 'C/m', 'C/W', 'C/s', 'm/K', 'm/V', 'm/N', 'T/m', 'M/s', 't/h', 't/d', 't/a', 'm/a', 'C/h', 'F/h', 's/s', 'h/d', 'h/a',
]);
