import type { UnitFamily } from './entry.ts';

/** Sizes of the sun and the earth, and charts at sea. */
export const navigation: UnitFamily = {
  field: 'navigation and astronomy',
  units: [
    { symbols: ['cable', 'cbl'], names: ['cable length', 'cable'], factor: '185.2', of: 'm', prefixes: 'none', weak: true, remark: 'a tenth of the nautical mile', source: 'common practice' },
    { symbols: ['kft', 'kilofeet'], names: ['thousand foot', 'thousand feet', 'kilofoot'], factor: '304.8', of: 'm', prefixes: 'none', source: 'common practice' },
    { symbols: ['FL'], names: ['flight level'], factor: '30.48', of: 'm', prefixes: 'none', weak: true, remark: 'pressure altitude in hundreds of feet', source: 'ICAO Annex 2; common practice' },
    { symbols: ['M_sun', 'Msun', 'M☉'], names: ['solar mass', 'solar masses'], factor: '1.98841e30', of: 'kg', prefixes: 'none', weak: true, uncertainty: 4e-5, source: 'IAU 2015 resolution B3 with the constant of gravitation of CODATA' },
    { symbols: ['R_sun', 'Rsun', 'R☉'], names: ['solar radius', 'nominal solar radius'], factor: '6.957e8', of: 'm', prefixes: 'none', weak: true, source: 'IAU 2015 resolution B3' },
    { symbols: ['R_earth', 'Rearth', 'R⊕'], names: ['earth radius', 'nominal equatorial earth radius'], factor: '6378100', of: 'm', prefixes: 'none', weak: true, source: 'IAU 2015 resolution B3' },
    { symbols: ['M_earth', 'Mearth', 'M⊕'], names: ['earth mass', 'earth masses'], factor: '5.9722e24', of: 'kg', prefixes: 'none', weak: true, uncertainty: 1e-4, source: 'IAU 2015 resolution B3 with the constant of gravitation of CODATA' },
    { symbols: ['sfd', 'cfs-day', 'cfsd'], names: ['second foot day', 'second-foot day'], factor: '86400*0.3048*0.3048*0.3048', of: 'm^3', prefixes: 'none', remark: 'a flow of 1 cfs for a day', source: 'common practice in hydrology' },
  ],
};
