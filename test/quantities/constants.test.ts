import { describe, expect, it } from 'vitest';
import type { ConstantEntry } from '../../server/src/quantities/catalogue/entry.ts';
import { constants } from '../../server/src/quantities/constants/index.ts';
import { readFactor, readStrict } from './catalogue-reader.ts';

/** Value in coherent SI units. */
function coherent(value: string, unit: string): number {
  return readFactor(value).toNumber() * readStrict(unit).scale.toNumber();
}

/** One unit in the last printed digit, relative to the value; half of one where zeros end an integer, since those may be digits or not. */
function lastDigit(value: string): number {
  const mantissa = value.split('e')[0] as string;
  const decimals = mantissa.split('.')[1]?.length;
  const zeros = /^\d+?(0+)$/.exec(mantissa)?.[1]?.length;
  const unit = decimals !== undefined ? 10 ** -decimals : zeros ? 10 ** zeros / 2 : 1;
  return unit / Number(mantissa);
}

describe('constants', () => {
  it(`has well-formed entries: ${constants.length} constants, ${constants.flatMap((entry) => entry.metAs).length} forms`, () => {
    expect(constants.length).toBeGreaterThanOrEqual(40);
    for (const entry of constants) {
      expect(entry.source.length, entry.name).toBeGreaterThan(3);
      expect(entry.uncertainty, entry.name).toBeGreaterThanOrEqual(0);
      expect(coherent(entry.value, entry.unit), entry.name).toBeGreaterThan(0);
      // A form of one digit would stand for half of all numbers around it.
      for (const form of entry.metAs) expect(form.value.replace(/e.*|\D/g, '').replace(/^0+/, '').length, `${entry.name}: ${form.value}`).toBeGreaterThan(1);
      expect(new Set(entry.metAs.map(({ value, unit }) => `${value} ${unit}`)).size, entry.name).toBe(entry.metAs.length);
    }
    expect(new Set(constants.map((entry) => entry.name)).size).toBe(constants.length);
  });

  it.each(constants.map((entry) => [entry.name, entry] as const))('%s: every form met is the constant, rounded', (_, entry) => {
    expect(strayForms(entry)).toEqual([]);
  });
});

/**
 * Forms that are neither the value within one unit of their last digit nor within the uncertainty that the entry allows
 * (three of them; at least 5e-5, which covers older editions of CODATA and other standard compositions of air).
 */
function strayForms(entry: ConstantEntry): string[] {
  const reference = coherent(entry.value, entry.unit);
  const { dimension } = readStrict(entry.unit);
  return entry.metAs.filter(({ value, unit }) => {
    const same = readStrict(unit).dimension === dimension;
    const off = Math.abs(coherent(value, unit) / reference - 1);
    return !same || off > Math.max(lastDigit(value), 3 * entry.uncertainty, 5e-5) * 1.0001;
  }).map(({ value, unit }) => `${value} ${unit}: ${(reference / readStrict(unit).scale.toNumber()).toPrecision(8)}`);
}
