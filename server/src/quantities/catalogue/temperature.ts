import type { UnitFamily } from './entry.ts';

/** Temperature scales and their degrees as differences. The kelvin stands with the base units. */
export const temperature: UnitFamily = {
  field: 'temperature',
  units: [
    { symbols: ['°C', 'degC', '℃', 'oC', 'ºC', 'deg_C', 'deg C', 'DegC', 'Celsius', 'celsius'], names: ['degree celsius', 'degrees celsius', 'celsius degree', 'degree c', 'degrees c', 'celsius', 'centigrade', 'degree centigrade', 'degrees centigrade'], factor: '1', of: 'K', prefixes: 'none', offset: { kind: 'temperature', zero: '273.15' }, source: 'SI Brochure, table 4' },
    { symbols: ['°F', 'degF', '℉', 'oF', 'ºF', 'deg_F', 'deg F', 'DegF', 'Fahrenheit', 'fahrenheit'], names: ['degree fahrenheit', 'degrees fahrenheit', 'fahrenheit degree', 'degree f', 'degrees f', 'fahrenheit'], factor: '5/9', of: 'K', prefixes: 'none', offset: { kind: 'temperature', zero: '45967/180' }, remark: 'zero at 459.67 °R', source: 'NIST SP 811, B.8' },
    { symbols: ['°R', 'degR', 'ºR', 'deg_R', 'deg R', 'DegR', 'Rankine', 'rankine', '°Ra'], names: ['degree rankine', 'degrees rankine', 'rankine'], factor: '5/9', of: 'K', prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['°Re', 'degRe', '°Ré'], names: ['degree reaumur', 'degree réaumur'], factor: '5/4', of: 'K', prefixes: 'none', offset: { kind: 'temperature', zero: '273.15' }, source: 'common practice' },
    { symbols: ['delta_degC', 'Δ°C', 'ΔdegC', 'deltadegC'], names: ['celsius difference', 'degree celsius difference'], factor: '1', of: 'K', prefixes: 'none', remark: 'a difference, not a point on the scale', source: 'NIST SP 811, B.8' },
    { symbols: ['delta_degF', 'Δ°F', 'ΔdegF', 'deltadegF'], names: ['fahrenheit difference', 'degree fahrenheit difference'], factor: '5/9', of: 'K', prefixes: 'none', remark: 'a difference, not a point on the scale', source: 'NIST SP 811, B.8' },
    { symbols: ['ΔK', 'delta_K', 'deltaK'], names: ['kelvin difference'], factor: '1', of: 'K', prefixes: 'none', weak: true, remark: 'a difference of temperatures', source: 'SI Brochure, section 2.3' },
  ],
};
