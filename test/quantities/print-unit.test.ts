import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { parseFactor } from '../../server/src/quantities/factor.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { coherentSpellings, familiarSpellings } from '../../server/src/quantities/print-table.ts';
import { coherentUnit, printFactor, printUnit } from '../../server/src/quantities/print-unit.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { multiply, raise, sameUnit, type Unit } from '../../server/src/quantities/unit.ts';
import { readCoherent } from './catalogue-reader.ts';
import { dimensions, symbols } from './arbitrary.ts';

function unitOf(text: string): Unit {
  const result = parseUnit(text);
  if (!result.ok) throw new Error(`unread: '${text}'`);
  return result.unit;
}

describe('the coherent unit of a dimension, as engineers spell it (SI Brochure, tables 4 to 6)', () => {
  it.each([
    ['1', '1'], ['m', 'm'], ['kg m^-1 s^-2', 'Pa'], ['kg m s^-3 K^-1', 'W/(m K)'], ['kg m^-1 s^-1', 'Pa s'], ['m^2 s^-1', 'm^2/s'], ['m^2 s^-2 K^-1', 'J/(kg K)'], ['kg m^2 s^-2', 'J'], ['kg m^2 s^-3', 'W'], ['kg m s^-2', 'N'], ['s^-1', '1/s'],
    ['kg m^-3', 'kg/m^3'], ['m^3 s^-1', 'm^3/s'], ['kg^-1 m^-2 s^3 K', 'K/W'], ['A s', 'C'], ['kg m^3 s^-3 A^-2', 'ohm m'], ['mol m^-3', 'mol/m^3'], ['kg m^-2 s^-1', 'kg/(m^2 s)'], ['kg s^-2', 'N/m'], ['m s', 'm s'], ['s K', 's K'],
  ])('%s: %s', (product, spelling) => {
    expect(coherentUnit(readCoherent(product))).toBe(spelling);
  });

  it('is read again as that dimension with scale one', () => {
    for (const [, spelling] of coherentSpellings) {
      const unit = unitOf(spelling);
      expect(coherentUnit(unit.dimension), spelling).toBe(spelling);
      expect(unit.scale?.isOne, spelling).toBe(true);
      expect(unit.offset, spelling).toBeUndefined();
    }
    fc.assert(fc.property(dimensions, (dimension) => {
      const text = coherentUnit(dimension);
      expect(text).toMatch(/^[\x20-\x7e]+$/);
      expect(unitOf(text).dimension === dimension, text).toBe(true);
      expect(unitOf(text).scale?.isOne).toBe(true);
    }));
  });

  it('names a project’s own base dimension as it is', () => {
    expect(coherentUnit(Dimension.base('item').div(Dimension.base('T')))).toBe('item/s');
  });
});

describe('printing a unit', () => {
  it('keeps the author’s text', () => {
    expect(printUnit(unitOf('kN/m²'))).toBe('kN/m²');
  });

  it.each([
    ['kN*m', 'kJ'], ['1000 Pa', 'kPa'], ['kg/cm/s^2', '100 Pa'], ['0.001 m', 'mm'], ['kJ/s', 'kW'], ['g/cm3', 'g/cm^3'], ['lbf/in^2', 'psi'], ['rev/min', 'rpm'], ['°C', 'degC'], ['degF', 'degF'], ['deg', 'deg'], ['rad/s', 'rad/s'], ['N/mm2', 'MPa'], ['kWh', 'kWh'], ['ft·lbf', 'ft lbf'],
    ['mm²/s', 'mm^2/s'], ['kg/m3', 'kg/m^3'], ['g/s/m2', 'g/(m^2 s)'], ['W/cm/K', 'W/(cm K)'], ['ug/m3', 'ug/m^3'], ['BTU/h/ft2/°R', 'BTU/(h ft^2 degF)'], ['psig', 'psig'], ['%', '%'], ['uW', 'uW'], ['furlong', '201.168 m'],
  ])('%s without its text is %s', (text, wanted) => {
    expect(printUnit({ ...unitOf(text), text: '' }).replace('hPa', '100 Pa')).toBe(wanted);
  });

  it('reads every familiar spelling back as itself', () => {
    expect(new Set(familiarSpellings).size).toBe(familiarSpellings.length);
    for (const spelling of familiarSpellings) {
      const unit = unitOf(spelling);
      const printed = printUnit({ ...unit, text: '' });
      expect(sameUnit(unitOf(printed), unit), `${spelling} came back as ${printed}`).toBe(true);
    }
  });

  it('gives a text that reads as the same unit, unless a factor stands in front', () => {
    fc.assert(fc.property(symbols, symbols, fc.integer({ min: -3, max: 3 }).filter((power) => power !== 0), (a, b, power) => {
      const unit = { ...multiply(unitOf(a), raise(unitOf(b), Rational.of(power), ''), ''), text: '' };
      const printed = printUnit(unit);
      const factor = /^(\d[\d./e-]*) (?=\S)/.exec(printed);
      const read = unitOf(factor ? printed.slice(factor[0].length) : printed === printFactor(unit.scale as never) ? '1' : printed);
      expect(read.dimension === unit.dimension, printed).toBe(true);
      if (!factor && read.scale && printed !== printFactor(unit.scale as never)) expect(unit.scale?.equals(read.scale)).toBe(true);
    }), { numRuns: 300 });
  });
});

describe('factors', () => {
  it.each([
    ['1', '1'], ['1000', '1000'], ['0.3048', '0.3048'], ['pi/180', 'pi/180'], ['2*pi/60', '2*pi/60'], ['2*pi', '2*pi'], ['pi', 'pi'], ['5/9', '5/9'], ['1/3600', '1/3600'], ['1e-6', '1e-6'], ['0.000125', '1.25e-4'], ['1e9', '1000000000'], ['6.02214076e23', '6.02214076e23'],
    ['9.80665', '9.80665'], ['0.45359237*9.80665/0.0254/0.0254', '6894.75729317'], ['60/2/pi', '60/(2*pi)'], ['180/pi', '180/pi'], ['pi*pi', '9.86960440109'], ['1/12', '1/12'], ['1/2/pi', '1/(2*pi)'],
  ])('%s is printed %s', (factor, wanted) => {
    expect(printFactor(parseFactor(factor))).toBe(wanted);
  });

  it('are within twelve digits of the scale', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 1_000_000 }), fc.integer({ min: 1, max: 1_000_000 }), fc.integer({ min: -1, max: 1 }), (num, den, pi) => {
      const scale = parseFactor(`${num}/${den}${pi === 1 ? '*pi' : pi === -1 ? '/pi' : ''}`);
      const printed = printFactor(scale).replace('(2*pi)', '2/pi');
      expect(Math.abs(parseFactor(printed).toNumber() / scale.toNumber() - 1)).toBeLessThan(1e-11);
    }));
  });

  it('refuses what is no product of numbers', () => {
    for (const text of ['1+2', 'x', '2**3', '(2)']) expect(() => parseFactor(text)).toThrow(SyntaxError);
  });
});
