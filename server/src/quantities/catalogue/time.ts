import type { UnitFamily } from './entry.ts';

/** Times beside the second. */
export const time: UnitFamily = {
  field: 'time',
  units: [
    { symbols: ['min', 'mins'], names: ['minute'], factor: '60', of: 's', prefixes: 'none', remark: 'min may also stand for minimum', source: 'SI Brochure, table 8' },
    { symbols: ['h', 'hr', 'hrs', 'hour', 'hours'], names: ['hour'], factor: '3600', of: 's', prefixes: 'none', source: 'SI Brochure, table 8; hr: common practice' },
    { symbols: ['d', 'day', 'days'], names: ['day'], factor: '86400', of: 's', prefixes: 'none', source: 'SI Brochure, table 8' },
    { symbols: ['wk', 'week', 'weeks'], names: ['week'], factor: '604800', of: 's', prefixes: 'none', source: 'NIST SP 811, B.8; common practice' },
    { symbols: ['fortnight'], names: ['fortnight'], factor: '1209600', of: 's', prefixes: 'none', source: 'common practice' },
    { symbols: ['mo', 'month', 'months'], names: ['month'], factor: '365.25*86400/12', of: 's', prefixes: 'none', weak: true, remark: 'a twelfth of the Julian year; calendar months differ', source: 'common practice' },
    { symbols: ['yr', 'yrs', 'year', 'years'], names: ['year', 'julian year'], factor: '365.25*86400', of: 's', prefixes: 'large', remark: 'Julian year of 365.25 d; some scripts count 365 d', source: 'IAU style manual; common practice' },
    { symbols: ['a'], names: ['annum'], factor: '365.25*86400', of: 's', prefixes: 'none', weak: true, remark: 'Julian year of 365.25 d', source: 'ISO 80000-3 annex; IAU style manual' },
    { symbols: ['y'], names: [], factor: '365.25*86400', of: 's', prefixes: 'none', weak: true, remark: 'Julian year of 365.25 d', source: 'common practice' },
    { symbols: ['yr365'], names: ['common year'], factor: '365*86400', of: 's', prefixes: 'none', source: 'NIST SP 811, B.8, year (365 days)' },
    { symbols: ['decade'], names: ['decade'], factor: '3652.5*86400', of: 's', prefixes: 'none', weak: true, remark: 'ten years; also a factor of ten in frequency', source: 'common practice' },
    { symbols: ['century'], names: ['century', 'centuries', 'julian century'], factor: '36525*86400', of: 's', prefixes: 'none', source: 'IAU style manual' },
    { symbols: ['yr_sidereal'], names: ['sidereal year'], factor: '31558150', of: 's', prefixes: 'none', uncertainty: 1e-7, source: 'NIST SP 811, B.8' },
    { symbols: ['yr_tropical'], names: ['tropical year'], factor: '31556930', of: 's', prefixes: 'none', uncertainty: 1e-7, source: 'NIST SP 811, B.8' },
    { symbols: ['d_sidereal'], names: ['sidereal day'], factor: '86164.09', of: 's', prefixes: 'none', uncertainty: 1e-7, source: 'NIST SP 811, B.8' },
    { symbols: ['shake'], names: ['shake'], factor: '1e-8', of: 's', prefixes: 'none', weak: true, source: 'NIST SP 811, B.8' },
  ],
};
