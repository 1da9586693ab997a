import { unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { RelationSymbol } from '../../server/src/groups/types.ts';
import { groupValue } from '../../server/src/groups/value.ts';
import { parseUnit } from '../../server/src/quantities/parse-unit.ts';
import { product } from './checks.ts';

/** `D = 85 mm`, `N = 2..12 rev/s`. */
function symbols(...lines: string[]): RelationSymbol[] {
  return lines.map((line) => {
    const [, name, low, high, text] = /^(\S+) = (-?[\d.]+?)(?:\.\.(-?[\d.]+))? (.+)$/.exec(line) as RegExpExecArray;
    const read = parseUnit(text as string);
    if (!read.ok) throw new Error(line);
    const numbers = high === undefined ? { value: Number(low) } : { range: { low: Number(low), high: Number(high) } };
    return { name: name as string, dimension: read.unit.dimension, unit: read.unit, ...numbers };
  });
}

const Re = product('rho V D / mu');

describe('the value of a group', () => {
  it('is what mathjs finds, in any units', () => {
    const found = groupValue(Re, symbols('rho = 62.4 lb/ft^3', 'V = 3.2 ft/s', 'D = 85 mm', 'mu = 0.38 Pa s'));
    const parts = unit('62.4 lb/ft^3').toNumber('kg/m^3') * unit('3.2 ft/s').toNumber('m/s') * unit('85 mm').toNumber('m');
    expect(found?.low).toBeCloseTo(parts / 0.38, 6);
    expect(found?.high).toBe(found?.low);
  });

  it('is a range where a symbol has one', () => {
    const found = groupValue(Re, symbols('rho = 1000 kg/m^3', 'V = 1..3 m/s', 'D = 0.1 m', 'mu = 0.001..0.002 Pa s'));
    expect(found?.low).toBeCloseTo(50_000, 6);
    expect(found?.high).toBeCloseTo(300_000, 6);
  });

  it.each([
    ['a missing value', ['rho = 1000 kg/m^3', 'V = 1 m/s', 'D = 0.1 m']],
    ['a range through zero', ['rho = 1000 kg/m^3', 'V = -1..3 m/s', 'D = 0.1 m', 'mu = 0.001 Pa s']],
    ['division by zero', ['rho = 1000 kg/m^3', 'V = 1 m/s', 'D = 0.1 m', 'mu = 0 Pa s']],
  ])('is unknown for %s', (_what, lines) => {
    expect(groupValue(Re, symbols(...lines))).toBeUndefined();
  });

  it('is unknown for a point on a temperature scale', () => {
    expect(groupValue(product('T / T0'), symbols('T = 20 degC', 'T0 = 300 K'))).toBeUndefined();
  });
});
