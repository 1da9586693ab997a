/** SI Brochure, 9th edition: tables 4, 5, 6 (derived units in base units) and 8 (units accepted beside the SI). Figures from memory. */
import { describe, expect, it } from 'vitest';
import { readCoherent, readStrict } from './catalogue-reader.ts';

describe('derived units of the SI are coherent', () => {
  it.each([
    // Table 4: special names.
    ['rad', '1'], ['sr', '1'], ['Hz', 's^-1'], ['N', 'kg m s^-2'], ['Pa', 'kg m^-1 s^-2'], ['J', 'kg m^2 s^-2'], ['W', 'kg m^2 s^-3'], ['C', 'A s'],
    ['V', 'kg m^2 s^-3 A^-1'], ['F', 'kg^-1 m^-2 s^4 A^2'], ['Ω', 'kg m^2 s^-3 A^-2'], ['S', 'kg^-1 m^-2 s^3 A^2'], ['Wb', 'kg m^2 s^-2 A^-1'],
    ['T', 'kg s^-2 A^-1'], ['H', 'kg m^2 s^-2 A^-2'], ['lm', 'cd'], ['lx', 'cd m^-2'], ['Bq', 's^-1'], ['Gy', 'm^2 s^-2'], ['Sv', 'm^2 s^-2'], ['kat', 'mol s^-1'],
    // Table 4 gives the same units by other units.
    ['N/m^2', 'kg m^-1 s^-2'], ['N m', 'kg m^2 s^-2'], ['J/s', 'kg m^2 s^-3'], ['W/A', 'kg m^2 s^-3 A^-1'], ['C/V', 'kg^-1 m^-2 s^4 A^2'], ['V/A', 'kg m^2 s^-3 A^-2'],
    ['A/V', 'kg^-1 m^-2 s^3 A^2'], ['V s', 'kg m^2 s^-2 A^-1'], ['Wb/m^2', 'kg s^-2 A^-1'], ['Wb/A', 'kg m^2 s^-2 A^-2'], ['cd sr', 'cd'], ['lm/m^2', 'cd m^-2'], ['J/kg', 'm^2 s^-2'],
    // Table 5: expressed in base units.
    ['m^2', 'm^2'], ['m/s', 'm s^-1'], ['kg/m^3', 'kg m^-3'], ['mol/m^3', 'mol m^-3'], ['cd/m^2', 'cd m^-2'], ['A/m', 'm^-1 A'],
    // Table 6: with special names in them.
    ['Pa s', 'kg m^-1 s^-1'], ['N/m', 'kg s^-2'], ['rad/s', 's^-1'], ['W/m^2', 'kg s^-3'], ['J/K', 'kg m^2 s^-2 K^-1'], ['J/(K kg)', 'm^2 s^-2 K^-1'],
    ['W/(m K)', 'kg m s^-3 K^-1'], ['J/m^3', 'kg m^-1 s^-2'], ['V/m', 'kg m s^-3 A^-1'], ['C/m^3', 'A s m^-3'], ['F/m', 'kg^-1 m^-3 s^4 A^2'], ['H/m', 'kg m s^-2 A^-2'],
    ['J/mol', 'kg m^2 s^-2 mol^-1'], ['J/(K mol)', 'kg m^2 s^-2 mol^-1 K^-1'], ['C/kg', 'A s kg^-1'], ['Gy/s', 'm^2 s^-3'], ['W/sr', 'kg m^2 s^-3'], ['W/(sr m^2)', 'kg s^-3'], ['kat/m^3', 'mol s^-1 m^-3'],
  ])('%s = %s', (unit, base) => {
    const measure = readStrict(unit);
    expect(measure.dimension).toBe(readCoherent(base));
    expect(measure.scale.isOne).toBe(true);
  });
});

describe('units accepted for use with the SI (table 8)', () => {
  it.each([
    ['min', 's', 60], ['h', 's', 3600], ['d', 's', 86400], ['au', 'm', 149597870700], ['deg', 'rad', Math.PI / 180], ['arcmin', 'rad', Math.PI / 10800], ['arcsec', 'rad', Math.PI / 648000],
    ['ha', 'm^2', 1e4], ['L', 'm^3', 1e-3], ['l', 'm^3', 1e-3], ['t', 'kg', 1e3], ['eV', 'J', 1.602176634e-19], ['Da', 'kg', 1.66053906892e-27],
  ])('%s in %s', (unit, si, value) => {
    const from = readStrict(unit);
    expect(from.dimension).toBe(readStrict(si).dimension);
    expect(Math.abs(from.scale.toNumber() / value - 1)).toBeLessThan(1e-14);
  });
});
