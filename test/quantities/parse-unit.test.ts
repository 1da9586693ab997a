import { describe, expect, it } from 'vitest';
import { coherentUnit, printFactor } from '../../server/src/quantities/print-unit.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import type { Rational } from '../../server/src/quantities/rational.ts';
import type { ReadOptions } from '../../server/src/quantities/unit-result.ts';
import type { Unit } from '../../server/src/quantities/unit.ts';
import { readFactor, readStrict } from './catalogue-reader.ts';
import * as spellings from './parse-unit-spellings.ts';

function unitOf(text: string, options: ReadOptions = {}): Unit {
  const result = parseUnit(text, options);
  if (!result.ok) throw new Error(`unread: '${text}', ${JSON.stringify(result.reason)}`);
  return result.unit;
}

const rowsOf = (table: string): string[][] => table.trim().split('\n').map((line) => line.split(' | '));

/** `factor coherent unit`, with what else the unit carries. */
function told(unit: Unit): string {
  const rotation = unit.rotation ? ` (${[['rad', unit.rotation.radian], ['rev', unit.rotation.cycle]].flatMap(([name, power]) => ((power as Rational).isZero ? [] : [`${name}^${power}`])).join(' ')})` : '';
  return `${unit.scale ? printFactor(unit.scale) : '?'} ${coherentUnit(unit.dimension)}${rotation}${unit.offset ? ` from ${unit.offset.zero}` : ''}${unit.degrees ? ` degrees^${unit.degrees}` : ''}${unit.level ? ' level' : ''}`;
}

describe('spellings mean what they mean in strict notation, exactly', () => {
  for (const [name, table] of Object.entries(spellings)) {
    it.each(rowsOf(table))(`${name}: %s`, (text, factor, strict, description) => {
      const unit = unitOf(text as string, description === undefined ? {} : { describes: description });
      const wanted = readStrict(strict as string);
      expect(unit.dimension.key).toBe(wanted.dimension.key);
      const scale = wanted.scale.mul(readFactor(factor as string));
      expect(unit.scale?.equals(scale), `${unit.scale && printFactor(unit.scale)} is not ${printFactor(scale)}`).toBe(true);
    });
  }
});

describe('numbers without a unit', () => {
  it.each(['-', '--', '1', '', ' ', 'dimensionless', 'Dimensionless', 'unitless', 'fraction', 'ratio', 'none', 'no units', 'non-dimensional'])('%j', (text) => {
    expect(told(unitOf(text))).toBe('1 1');
  });
});

describe('points on a scale', () => {
  it.each([
    ['°C', '1 K from 5463/20'], ['degC', '1 K from 5463/20'], ['deg C', '1 K from 5463/20'], ['oC', '1 K from 5463/20'], ['degrees C', '1 K from 5463/20'], ['deg. C', '1 K from 5463/20'], ['Celsius', '1 K from 5463/20'], ['degree Celsius', '1 K from 5463/20'], ['Celsius degree', '1 K from 5463/20'], ['$^\\circ$C', '1 K from 5463/20'], ['$^{\\circ}C$', '1 K from 5463/20'], ['degrees Celcius', '1 K from 5463/20'],
    ['degF', '5/9 K from 45967/180'], ['°F', '5/9 K from 45967/180'], ['degreeF', '5/9 K from 45967/180'], ['deg F', '5/9 K from 45967/180'], ['Fahrenheit', '5/9 K from 45967/180'], ['K', '1 K'], ['degR', '5/9 K'], ['°R', '5/9 K'],
    ['kPa(g)', '1000 Pa from 101325'], ['barg', '100000 Pa from 101325'], ['psig', '8896443230521/1290320000 Pa from 101325'], ['bar gauge', '100000 Pa from 101325'],
  ])('%s is %s (SI Brochure, table 4; NIST SP 811, B.8)', (text, wanted) => {
    expect(told(unitOf(text)).replace('6894.75729317', '8896443230521/1290320000')).toBe(wanted);
  });

  it.each([['W/(m degC)', '1 W/(m K) degrees^-1'], ['J/(kg °C)', '1 J/(kg K) degrees^-1'], ['°C/m', '1 K/m degrees^1'], ['degC^2', '1 K^2 degrees^2'], ['10^-3 degC', '0.001 K degrees^1']])('%s counts degrees and has no zero', (text, wanted) => {
    expect(told(unitOf(text))).toBe(wanted);
  });

  it.each([['T', '1 K from 5463/20'], ['t_in', '1 K from 5463/20'], ['air temperature', '1 K from 5463/20'], ['self.Tamb', '1 K from 5463/20'], ['x temp. of the room', '1 K from 5463/20'], ['charge', '1 C'], ['q', '1 C'], ['', '1 C']])('C of %j is %s', (describes, wanted) => {
    expect(told(unitOf('C', { describes }))).toBe(wanted);
  });

  it('reads R as a degree where a temperature is described, and not at all elsewhere', () => {
    expect(told(unitOf('R', { describes: 'T_steam' }))).toBe('5/9 K');
    expect(parseUnit('R').ok).toBe(false);
  });
});

describe('rotation and levels', () => {
  it.each([['rad/s', '1 1/s (rad^1)'], ['rpm', '1/60 1/s (rev^1)'], ['rev/min', '1/60 1/s (rev^1)'], ['Hz', '1 1/s (rev^1)'], ['1/s', '1 1/s'], ['deg', 'pi/180 1 (rad^1)'], ['°/s', 'pi/180 1/s (rad^1)'], ['rad/rev', '1 1 (rad^1 rev^-1)'], ['dB', '1 1 level'], ['dB(A)', '1 1 level']])('%s', (text, wanted) => {
    expect(told(unitOf(text))).toBe(wanted);
  });
});

describe('dimension known, scale not', () => {
  it.each([
    ['dim L T^-1', '? m/s'], ['dim M L^-1 T^-2', '? Pa'], ['dim M/(L T^2)', '? Pa'], ['dim Θ', '? K'], ['dim Theta', '? K'], ['dim L⁻¹', '? 1/m'], ['dim 1', '? 1'],
    ['°F or °C', '? K'], ['in/hr or mm/hr', '? m/s'], ['°F [IP] or °C [SI]', '? K'], ['ft [IP] or m [SI]', '? m'], ['ft³ lb⁻¹ [IP] or in m³ kg⁻¹ [SI]', '? m^3/kg'],
    ['mm/step', '? m/s'], ['mm/time step', '? m/s'], ['kg/m2/timestep', '? kg/(m^2 s)'], ['mm/dt', '? m/s'], ['rad/s/LSB', '? 1/s (rad^1)'], ['degree-days', '? s K'],
  ])('%s', (text, wanted) => {
    expect(told(unitOf(text))).toBe(wanted);
  });

  it('keeps the scale of alternatives that are one unit', () => {
    expect(told(unitOf('m/s or m s-1'))).toBe('1 m/s');
  });
});

describe('the words around a unit', () => {
  it('keeps the author’s text, without a preposition', () => {
    expect(unitOf('  kg/m3 ').text).toBe('kg/m3');
    expect(unitOf('in metres').text).toBe('metres');
    expect(told(unitOf('in lbf'))).toBe(told(unitOf('in·lbf')));
  });

  it('is not pointed at by prefixes that SI does not allow', () => {
    expect(['kmin', 'mft', 'khp', 'mmin', 'mpsi'].filter((text) => parseUnit(text).ok)).toEqual([]);
  });
});

describe('a project’s own units', () => {
  const crate: Unit = { ...unitOf('kg'), scale: unitOf('g').scale, text: 'crate' };
  const vocabulary = { units: new Map([['crate', crate], ['m', crate], ['EUR', crate]]), fingerprint: 'crates' };

  it('win over the catalogue, take plurals and stand in products', () => {
    expect(told(unitOf('crates/day', { vocabulary }))).toBe(`${printFactor(unitOf('g/day').scale as never)} kg/s`);
    expect(told(unitOf('m', { vocabulary }))).toBe('0.001 kg');
    expect(told(unitOf('EUR/kg', { vocabulary }))).toBe('0.001 1');
    expect(parseUnit('crates/day').ok).toBe(false);
    expect(told(unitOf('m'))).toBe('1 m');
  });
});
