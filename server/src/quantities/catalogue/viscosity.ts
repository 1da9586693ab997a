import type { UnitFamily } from './entry.ts';

/** Dynamic and kinematic viscosities with names of their own. */
export const viscosity: UnitFamily = {
  field: 'viscosity',
  units: [
    { symbols: ['P', 'poise'], names: ['poise'], factor: '0.1', of: 'kg m^-1 s^-1', prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['cps', 'cPs', 'cPo'], names: [], factor: '0.001', of: 'kg m^-1 s^-1', prefixes: 'none', weak: true, remark: 'centipoise, as viscometer sheets write it; also counts or cycles per second', source: 'common practice' },
    { symbols: ['St', 'stokes'], names: ['stokes', 'stoke'], factor: '1e-4', of: 'm^2 s^-1', prefixes: 'small', source: 'NIST SP 811, B.8' },
    { symbols: ['reyn', 'reyns'], names: ['reyn'], factor: '0.45359237*9.80665/0.0254/0.0254', of: 'kg m^-1 s^-1', prefixes: 'none', remark: 'lbf s/in²', source: 'common practice' },
    { symbols: ['ureyn', 'µreyn', 'μreyn'], names: ['microreyn'], factor: '1e-6*0.45359237*9.80665/0.0254/0.0254', of: 'kg m^-1 s^-1', prefixes: 'none', source: 'common practice' },
  ],
};
