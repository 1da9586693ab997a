/** The catalogue against two general libraries: UCUM, as the package @lhncbc/ucum-lhc implements it, and the units of mathjs. */
import { createRequire } from 'node:module';
import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { allUnits, measureOf, readStrict, symbolMeasure } from './catalogue-reader.ts';
import { inMathjs, inUcum, type Row } from './catalogue-library-rows.ts';

/** The part of the UCUM library that is used here; the package carries no types. */
interface Ucum {
  readonly UcumLhcUtils: { getInstance(): { convertUnitTo(from: string, value: number, to: string): { readonly status: string; readonly toVal: number | null; readonly msg: readonly string[] } } };
}

const lhc = (createRequire(import.meta.url)('@lhncbc/ucum-lhc') as Ucum).UcumLhcUtils.getInstance();

/** A coherent unit in UCUM: `kg m^-1 s^-2` is `kg.m-1.s-2`. Plane and solid angles are dimensions there. */
function coherentInUcum(ours: string): string {
  const angles: Record<string, string> = { rad: 'rad', deg: 'rad', gon: 'rad', arcmin: 'rad', arcsec: 'rad', sr: 'sr', lm: 'cd.sr', lx: 'cd.sr.m-2', fc: 'cd.sr.m-2', ph: 'cd.sr.m-2' };
  if (angles[ours]) return angles[ours];
  const exponents = readStrict(ours).dimension.exponents.map(([base, exponent]) => `${siSymbol[base]}${exponent.isOne ? '' : exponent}`);
  return exponents.join('.') || '1';
}

const siSymbol: Record<string, string> = { L: 'm', M: 'kg', T: 's', I: 'A', Θ: 'K', N: 'mol', J: 'cd' };

function check({ ours, within, why }: Row, theirs: number): void {
  const scale = readStrict(ours).scale.toNumber();
  const off = Math.abs(scale / theirs - 1);
  expect(off, `${ours}: ${scale} here, ${theirs} there`).toBeLessThan(within);
  // A reason without a difference would be a stale excuse.
  if (why) expect(off, `${ours}: ${why}`).toBeGreaterThan(1e-12);
}

describe(`UCUM (${inUcum.length} units, ${inUcum.filter(({ why }) => why).length} of them with an explained difference)`, () => {
  it.each(inUcum.map((row) => [row.ours, row.theirs, row] as const))('%s is %s', (ours, theirs, row) => {
    const answer = lhc.convertUnitTo(theirs, 1, coherentInUcum(ours));
    expect(answer.status, String(answer.msg)).toBe('succeeded');
    check(row, answer.toVal as number);
  });
});

const math = create(all ?? {});

describe(`mathjs (${inMathjs.length} units, ${inMathjs.filter(({ why }) => why).length} of them with an explained difference)`, () => {
  it.each(inMathjs.map((row) => [row.ours, row.theirs, row] as const))('%s is %s', (_, theirs, row) => {
    check(row, (math.unit(1, theirs) as unknown as { value: number }).value);
  });
});

describe('temperature scales at fixed points', () => {
  /** Kelvin of a reading on an offset scale of the catalogue. */
  function kelvin(symbol: string, reading: number): number {
    const entry = allUnits.find((unit) => unit.symbols.includes(symbol));
    const [above = 0, below = 1] = (entry?.offset?.zero ?? '0').split('/').map(Number);
    return reading * (entry ? measureOf(entry).scale.toNumber() : Number.NaN) + above / below;
  }

  it.each<[string, string, string, number]>([
    ['degC', 'Cel', 'degC', 0], ['degC', 'Cel', 'degC', 36.6], ['degC', 'Cel', 'degC', -40], ['degF', '[degF]', 'degF', 32], ['degF', '[degF]', 'degF', 212], ['degF', '[degF]', 'degF', -40],
    ['degF', '[degF]', 'degF', 0], ['degR', '[degR]', 'degR', 491.67],
  ])('%s (UCUM %s, mathjs %s) at %d', (ours, code, name, reading) => {
    const here = kelvin(ours, reading);
    expect(here).toBeCloseTo(lhc.convertUnitTo(code, reading, 'K').toVal as number, 9);
    expect(here).toBeCloseTo(math.unit(reading, name).toNumber('K'), 9);
  });

  it('knows every row by a whole symbol or a prefixed one', () => {
    const single = [...inUcum, ...inMathjs].map(({ ours }) => ours).filter((ours) => !/[ ^/]/.test(ours));
    expect(single.filter((symbol) => !symbolMeasure(symbol))).toEqual([]);
  });
});
