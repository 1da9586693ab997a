import type { UnitFamily } from './entry.ts';

/** Plane angles: dimensionless, counted from the radian. */
export const angle: UnitFamily = {
  field: 'angle',
  units: [
    { symbols: ['rad', 'rads', 'radian', 'radians'], names: ['radian'], factor: '1', of: '1', prefixes: 'small', rotation: 'radian', source: 'SI Brochure, table 4' },
    { symbols: ['°', 'deg', 'º', 'degs', 'degree', 'degrees'], names: ['degree', 'degree of arc', 'arc degree'], factor: 'pi/180', of: '1', prefixes: 'none', rotation: 'radian', source: 'SI Brochure, table 8' },
    { symbols: ['arcmin', '′'], names: ['arcminute', 'minute of arc', 'minutes of arc', 'arc minute'], factor: 'pi/10800', of: '1', prefixes: 'none', rotation: 'radian', source: 'SI Brochure, table 8' },
    { symbols: ['arcsec', '″', 'arcsecs'], names: ['arcsecond', 'second of arc', 'seconds of arc', 'arc second'], factor: 'pi/648000', of: '1', prefixes: 'small', rotation: 'radian', source: 'SI Brochure, table 8' },
    { symbols: ['mas'], names: ['milliarcsecond'], factor: 'pi/648000000', of: '1', prefixes: 'none', rotation: 'radian', source: 'SI Brochure, table 8, note' },
    { symbols: ['gon', 'grad', 'grads'], names: ['gon', 'gradian', 'grade'], factor: 'pi/200', of: '1', prefixes: 'none', rotation: 'radian', source: 'NIST SP 811, B.8' },
    { symbols: ['mgon'], names: ['milligon'], factor: 'pi/200000', of: '1', prefixes: 'none', rotation: 'radian', source: 'common practice in surveying' },
    { symbols: ['mil_angle', 'mil_NATO'], names: ['angular mil'], factor: 'pi/3200', of: '1', prefixes: 'none', rotation: 'radian', source: 'NIST SP 811, B.8' },
    { symbols: ['hourangle', 'hour_angle'], names: ['hour angle', 'hour of angle'], factor: 'pi/12', of: '1', prefixes: 'none', rotation: 'radian', source: 'common practice in astronomy' },
    { symbols: ['sqdeg', 'sq deg'], names: ['square degree'], factor: 'pi/180*pi/180', of: '1', prefixes: 'none', weak: true, remark: 'solid angle', source: 'IAU style manual' },
  ],
};

/** Turns and frequencies: a turn counts as one cycle, and a cycle becomes an angle only through 2π. */
export const rotation: UnitFamily = {
  field: 'rotation and frequency',
  units: [
    { symbols: ['rev', 'revs'], names: ['revolution'], factor: '1', of: '1', prefixes: 'none', rotation: 'cycle', source: 'NIST SP 811, B.8; ISO 80000-3' },
    { symbols: ['r'], names: [], factor: '1', of: '1', prefixes: 'none', rotation: 'cycle', weak: true, remark: 'r/min and r/s, as ISO 80000-3 writes revolutions', source: 'ISO 80000-3' },
    { symbols: ['turn', 'turns', 'tr'], names: ['turn'], factor: '1', of: '1', prefixes: 'none', rotation: 'cycle', source: 'ISO 80000-3' },
    { symbols: ['cycle', 'cycles', 'cyc'], names: ['cycle'], factor: '1', of: '1', prefixes: 'none', rotation: 'cycle', source: 'common practice' },
    { symbols: ['rpm', 'RPM', 'rpms'], names: ['revolution per minute'], factor: '1/60', of: 's^-1', prefixes: 'none', rotation: 'cycle', source: 'NIST SP 811, B.8' },
    { symbols: ['krpm', 'kRPM'], names: ['thousand revolutions per minute'], factor: '1000/60', of: 's^-1', prefixes: 'none', rotation: 'cycle', source: 'common practice' },
    { symbols: ['rps', 'RPS'], names: ['revolution per second'], factor: '1', of: 's^-1', prefixes: 'none', rotation: 'cycle', source: 'common practice' },
    { symbols: ['rph'], names: ['revolution per hour'], factor: '1/3600', of: 's^-1', prefixes: 'none', rotation: 'cycle', source: 'common practice' },
    { symbols: ['cpm', 'CPM'], names: ['cycle per minute'], factor: '1/60', of: 's^-1', prefixes: 'none', rotation: 'cycle', remark: 'in vibration work; in radiation work counts per minute', source: 'common practice' },
    { symbols: ['cpd'], names: ['cycle per day'], factor: '1/86400', of: 's^-1', prefixes: 'none', weak: true, rotation: 'cycle', source: 'common practice in oceanography' },
    { symbols: ['cph'], names: ['cycle per hour'], factor: '1/3600', of: 's^-1', prefixes: 'none', weak: true, rotation: 'cycle', source: 'common practice in oceanography' },
    { symbols: ['bpm'], names: ['beat per minute'], factor: '1/60', of: 's^-1', prefixes: 'none', rotation: 'cycle', source: 'common practice' },
    { symbols: ['Hz', 'hz', 'HZ'], names: ['hertz'], factor: '1', of: 's^-1', prefixes: 'all', rotation: 'cycle', source: 'SI Brochure, table 4' },
    { symbols: ['spm'], names: ['stroke per minute'], factor: '1/60', of: 's^-1', prefixes: 'none', rotation: 'cycle', weak: true, remark: 'strokes of a pump per minute', source: 'common practice' },
    { symbols: ['ACH', 'ach'], names: ['air change per hour', 'air changes per hour'], factor: '1/3600', of: 's^-1', prefixes: 'none', source: 'common practice' },
  ],
};
