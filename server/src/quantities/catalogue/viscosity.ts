import type { UnitFamily } from './entry.ts';

/** Dynamic and kinematic viscosities with names of their own. */
export const viscosity: UnitFamily = {
  field: 'viscosity',
  units: [
    { symbols: ['P'], names: [], factor: '0.1', of: 'kg m^-1 s^-1', prefixes: 'small', weak: true, remark: 'P alone is a pressure, a power or a load in most scripts', source: 'NIST SP 811, B.8' },
    { symbols: ['cP'], names: [], factor: '0.001', of: 'kg m^-1 s^-1', prefixes: 'none', remark: 'centipoise, mPa s', source: 'NIST SP 811, B.8' },
    { symbols: ['poise'], names: ['poise'], factor: '0.1', of: 'kg m^-1 s^-1', prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['cps', 'cPs', 'cPo'], names: [], factor: '0.001', of: 'kg m^-1 s^-1', prefixes: 'none', weak: true, remark: 'centipoise, as viscometer sheets write it; also counts or cycles per second', source: 'common practice' },
    { symbols: ['St'], names: [], factor: '1e-4', of: 'm^2 s^-1', prefixes: 'small', weak: true, remark: 'St is also the Strouhal and the Stanton number', source: 'NIST SP 811, B.8' },
    { symbols: ['cSt'], names: [], factor: '1e-6', of: 'm^2 s^-1', prefixes: 'none', remark: 'centistokes, mm²/s', source: 'NIST SP 811, B.8' },
    { symbols: ['stokes'], names: ['stokes'], factor: '1e-4', of: 'm^2 s^-1', prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['reyn', 'reyns'], names: ['reyn'], factor: '0.45359237*9.80665/0.0254/0.0254', of: 'kg m^-1 s^-1', prefixes: 'none', remark: 'lbf s/in²', source: 'common practice' },
    { symbols: ['ureyn', 'µreyn', 'μreyn'], names: ['microreyn'], factor: '1e-6*0.45359237*9.80665/0.0254/0.0254', of: 'kg m^-1 s^-1', prefixes: 'none', source: 'common practice' },
  ],
};
