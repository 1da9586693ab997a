import { describe, expect, it } from 'vitest';
import { readStrict } from './catalogue-reader.ts';
import { nistFactors, nistSurveyFactors, nistTurns } from './nist-sp811.ts';

/** Factor from one unit to the other by the catalogue. */
function factor(unit: string, si: string): number {
  const from = readStrict(unit);
  const to = readStrict(si);
  expect(from.dimension.toString(), `${unit} and ${si}`).toBe(to.dimension.toString());
  return from.scale.div(to.scale).toNumber();
}

/** Half a unit in the last printed digit, `1.055056E+03`. */
function halfDigit(printed: string): number {
  const [mantissa = '', power = '0'] = printed.split('E');
  return 0.5 * 10 ** (Number(power) - (mantissa.split('.')[1]?.length ?? 0));
}

describe(`factors of NIST SP 811, B.8 (${nistFactors.length} rows)`, () => {
  it('has at least 150 rows, none twice', () => {
    expect(nistFactors.length).toBeGreaterThanOrEqual(150);
    expect(new Set(nistFactors.map(({ unit, si }) => `${unit}|${si}`)).size).toBe(nistFactors.length);
  });

  it.each(nistFactors.map((row) => [row.unit, row.si, row.printed, row.exact] as const))('%s to %s is %s', (unit, si, printed, exact) => {
    const tolerance = exact ? 1e-14 * Number(printed) : halfDigit(printed);
    expect(Math.abs(factor(unit, si) - Number(printed))).toBeLessThanOrEqual(tolerance * (1 + 1e-9));
  });

  it.each(nistSurveyFactors.map((row) => [row.unit, row.printed, row] as const))('%s is %s in survey feet', (unit, printed, { si, power }) => {
    const survey = 1200 / 3937 / 0.3048;
    expect(Math.abs(factor(unit, si) * survey ** power - Number(printed))).toBeLessThanOrEqual(halfDigit(printed));
  });

  it.each(nistTurns.map((row) => [row.unit, row.si, row.printed] as const))('%s to %s is %s by 2π', (unit, si, printed) => {
    expect(Math.abs(factor(unit, si) * 2 * Math.PI - Number(printed))).toBeLessThanOrEqual(halfDigit(printed));
  });
});
