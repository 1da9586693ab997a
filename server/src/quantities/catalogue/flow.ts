import type { UnitFamily } from './entry.ts';

const rate = 'm^3 s^-1';

/** Volume flows and speeds. Gallons are US gallons unless marked. */
export const flow: UnitFamily = {
  field: 'flow',
  units: [
    { symbols: ['gpm', 'GPM', 'usgpm', 'USGPM'], names: ['gallon per minute'], factor: '231*0.0254*0.0254*0.0254/60', of: rate, prefixes: 'none', remark: 'US gallons', source: 'NIST SP 811, B.8' },
    { symbols: ['gph', 'GPH'], names: ['gallon per hour'], factor: '231*0.0254*0.0254*0.0254/3600', of: rate, prefixes: 'none', remark: 'US gallons', source: 'common practice' },
    { symbols: ['gpd', 'GPD'], names: ['gallon per day'], factor: '231*0.0254*0.0254*0.0254/86400', of: rate, prefixes: 'none', remark: 'US gallons', source: 'NIST SP 811, B.8' },
    { symbols: ['gps', 'GPS'], names: ['gallon per second'], factor: '231*0.0254*0.0254*0.0254', of: rate, prefixes: 'none', weak: true, remark: 'US gallons', source: 'common practice' },
    { symbols: ['MGD', 'mgd', 'Mgd'], names: ['million gallon per day', 'million gallons per day'], factor: '231000000*0.0254*0.0254*0.0254/86400', of: rate, prefixes: 'none', remark: 'US gallons', source: 'common practice' },
    { symbols: ['igpm', 'IGPM', 'gpmUK'], names: ['imperial gallon per minute'], factor: '0.00454609/60', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['MIGD', 'migd'], names: ['million imperial gallons per day'], factor: '4546.09/86400', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['cfm', 'CFM', 'acfm', 'ACFM'], names: ['cubic foot per minute', 'cubic feet per minute'], factor: '0.3048*0.3048*0.3048/60', of: rate, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['cfs', 'CFS', 'cusec', 'cusecs'], names: ['cubic foot per second', 'cubic feet per second'], factor: '0.3048*0.3048*0.3048', of: rate, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['cfh', 'CFH'], names: ['cubic foot per hour', 'cubic feet per hour'], factor: '0.3048*0.3048*0.3048/3600', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['scfm', 'SCFM'], names: ['standard cubic foot per minute', 'standard cubic feet per minute'], factor: '0.3048*0.3048*0.3048/60', of: rate, prefixes: 'none', remark: 'volume at standard conditions, which differ between houses', source: 'common practice' },
    { symbols: ['scfh', 'SCFH'], names: ['standard cubic feet per hour'], factor: '0.3048*0.3048*0.3048/3600', of: rate, prefixes: 'none', remark: 'volume at standard conditions, which differ between houses', source: 'common practice' },
    { symbols: ['scfd', 'SCFD'], names: ['standard cubic feet per day'], factor: '0.3048*0.3048*0.3048/86400', of: rate, prefixes: 'none', remark: 'volume at standard conditions, which differ between houses', source: 'common practice' },
    { symbols: ['MMscfd', 'MMSCFD', 'MMcfd', 'MMCFD'], names: ['million standard cubic feet per day'], factor: '1000000*0.3048*0.3048*0.3048/86400', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['sccm', 'SCCM'], names: ['standard cubic centimetre per minute'], factor: '1e-6/60', of: rate, prefixes: 'none', remark: 'volume at 0 °C and 101.325 kPa', source: 'common practice' },
    { symbols: ['slm', 'slpm', 'SLPM'], names: ['standard litre per minute'], factor: '0.001/60', of: rate, prefixes: 'none', remark: 'volume at 0 °C and 101.325 kPa', source: 'common practice' },
    { symbols: ['lpm', 'LPM', 'Lpm'], names: ['litre per minute'], factor: '0.001/60', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['lps', 'LPS', 'Lps'], names: ['litre per second'], factor: '0.001', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['lph', 'LPH', 'Lph'], names: ['litre per hour'], factor: '0.001/3600', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['cmh', 'CMH'], names: ['cubic metre per hour'], factor: '1/3600', of: rate, prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['CMS'], names: [], factor: '1', of: rate, prefixes: 'none', weak: true, remark: 'cubic metres per second, as hydrology writes it', source: 'common practice' },
    { symbols: ['cumec', 'cumecs'], names: ['cubic metre per second'], factor: '1', of: rate, prefixes: 'none', source: 'common practice' },
    { symbols: ['cms'], names: [], factor: '1', of: rate, prefixes: 'none', weak: true, remark: 'cubic metres per second, as hydrology writes it', source: 'common practice' },
    { symbols: ['MLD', 'MLd', 'mld'], names: ['megalitre per day', 'million litres per day'], factor: '1000/86400', of: rate, prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['bpd', 'BPD', 'BOPD', 'bopd'], names: ['barrel per day'], factor: '42*231*0.0254*0.0254*0.0254/86400', of: rate, prefixes: 'none', remark: 'oil barrels', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['sverdrup', 'Sverdrup'], names: ['sverdrup'], factor: '1000000', of: rate, prefixes: 'none', remark: 'its symbol Sv is the sievert of the SI', source: 'common practice in oceanography' },
    { symbols: ['perm', 'permUS', 'US_perm'], names: ['perm', 'us perm'], factor: '0.00006479891/3600/0.3048/0.3048/0.0254/13595.1/9.80665', of: 's m^-1', prefixes: 'none', weak: true, remark: 'vapour permeance, grain/(h ft² inHg) at 0 °C', source: 'NIST SP 811, B.8' },
    { symbols: ['perm-in', 'perm_in'], names: ['perm inch'], factor: '0.00006479891/3600/0.3048/0.3048/13595.1/9.80665', of: 's', prefixes: 'none', remark: 'vapour permeability, grain/(h ft inHg) per inch, at 0 °C', source: 'NIST SP 811, B.8' },
  ],
};

export const speed: UnitFamily = {
  field: 'speed',
  units: [
    { symbols: ['mph', 'MPH'], names: ['mile per hour'], factor: '1609.344/3600', of: 'm s^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['kph', 'KPH', 'kmh', 'kmph'], names: ['kilometre per hour'], factor: '1000/3600', of: 'm s^-1', prefixes: 'none', source: 'common practice' },
    { symbols: ['fps', 'ftps'], names: ['foot per second', 'feet per second'], factor: '0.3048', of: 'm s^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['fpm', 'FPM'], names: ['foot per minute', 'feet per minute'], factor: '0.3048/60', of: 'm s^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['ips'], names: ['inch per second', 'inches per second'], factor: '0.0254', of: 'm s^-1', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['mps'], names: ['metre per second'], factor: '1', of: 'm s^-1', prefixes: 'none', weak: true, source: 'common practice' },
    { symbols: ['kt'], names: [], factor: '1852/3600', of: 'm s^-1', prefixes: 'none', weak: true, remark: 'the knot here, not the kilotonne; also a stress concentration', source: 'NIST SP 811, B.8' },
    { symbols: ['kn', 'knot', 'kts', 'knots'], names: ['knot'], factor: '1852/3600', of: 'm s^-1', prefixes: 'none', remark: 'kt is the knot here and not the kilotonne', source: 'NIST SP 811, B.8' },
  ],
};
