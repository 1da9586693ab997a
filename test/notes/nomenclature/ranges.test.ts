import fc from 'fast-check';
import { evaluate as mathEvaluate } from 'mathjs';
import { describe, expect, test } from 'vitest';
import { evaluateFormulas } from '../../../server/src/notes/nomenclature/evaluate.ts';
import { read, valueOf } from './helpers.ts';

describe('ranges give ranges', () => {
  test.each([
    // 1240 · N · 0.085² / 0.38 = 23.5763 · N, for N = 2 .. 12
    ['N [rev/s] 2 .. 12\nD [m] = 0.085\nrho [kg/m^3] = 1240\nmu [Pa s] = 0.38\ny [1] = rho*N*D^2/mu', '47.1526 .. 282.916 1'],
    // both ends from both ranges: 2/4 .. 12/3
    ['a [m] 2 .. 12\nb [s] 3 .. 4\ny [m/s] = a/b', '0.5 .. 4 m/s'],
    ['a [m] -1 .. 2\ny [m^2] = a^2', '0 .. 4 m^2'],
    ['a [m] -1 .. 2\ny [m^3] = a^3', '-1 .. 8 m^3'],
    ['a [m] -1 .. 2\ny [m] = abs(a)', '0 .. 2 m'],
    ['a [deg] 0 .. 180\ny [1] = sin(a)', '0 .. 1 1'],
    ['a [deg] 10 .. 350\ny [1] = cos(a)', '-1 .. 0.984808 1'],
    ['a [m] 1 .. 4\ny [mm] = max(a, 3)', '3000 .. 4000 mm'],
    ['T [degC] 10 .. 30\ny [K] = T', '283.15 .. 303.15 K'],
    ['T [degC] 10 .. 30\ny [degF] = T', '50 .. 86 degF'],
    // a symbol read twice: x/(x + 1) grows with x, so 1/2 .. 3/4
    ['x [-] 1 .. 3\ny [1] = x/(x + 1)', '0.5 .. 0.75 1'],
    // x - x is nothing but 0
    ['x [-] 1 .. 3\ny [1] = x - x', '0 1'],
    // through another formula: (a + 1)·(a + 1) - a falls to its vertex at a = -1/2, outside: 1 .. 7 for a = 0 .. 2
    ['a [-] 0 .. 2\nb [1] = a + 1\ny [1] = b*b - a', '1 .. 7 1'],
    // monotonic in x although read three times
    ['x [-] 1 .. 2\ny [1] = x*exp(x) + ln(x)', '2.71828 .. 15.4713 1'],
    // the exponent has the range: 2^1 .. 2^3
    ['k [-] 1 .. 3\ny [1] = 2^k', '2 .. 8 1'],
  ])('%s', async (text, range) => {
    expect(await valueOf(text)).toBe(range);
  });

  test('the ends that are not reached are said to be bounds, and are near', async () => {
    // x·(1 - x) has its greatest value 1/4 at x = 1/2
    const result = (await evaluateFormulas(read('x [-] 0 .. 1\ny [1] = x*(1 - x)'))).get('y');
    if (result?.kind !== 'range') throw new Error('no range');
    expect(result.sharp).toBe(false);
    expect(result.low).toBeLessThanOrEqual(0);
    expect(result.low).toBeGreaterThan(-1e-9);
    expect(result.high).toBeGreaterThanOrEqual(0.25);
    expect(result.high).toBeLessThan(0.26);
  });

  test.each([
    ['x [-] -1 .. 1\ny [1] = 1/x', 'none: undefined at 1/x'],
    ['x [-] -1 .. 1\ny [1] = ln(x)', 'none: undefined at ln(x)'],
    ['x [deg] 80 .. 100\ny [1] = tan(x)', 'none: undefined at tan(x)'],
    ['x [-] -1 .. 1\nz [-] -1 .. 1\ny [1] = atan2(x, z)', 'none: undefined at atan2(x, z)'],
    ['x [m] 1 .. 2\nk [-] 1 .. 2\ny = x^k', 'none: exponent at k'],
  ])('refused: %s', async (text, reason) => {
    expect(await valueOf(text)).toBe(reason);
  });

  test('a division that is safe is found safe though the symbol is read twice', async () => {
    // x² - x + 1 has its least value 3/4 at x = 1/2
    expect(await valueOf('x [-] 0 .. 2\ny [1] = 1/(x^2 - x + 1)')).toMatch(/^0\.33333\d? \.\. 1\.3/);
  });
});

/** Formulas that have a value for positive numbers; `x`, `y` and `z` are read up to a few times. */
const formulas = fc.letrec<{ node: string }>((tie) => ({
  node: fc.oneof(
    { maxDepth: 4, depthSize: 'medium' },
    fc.constantFrom('x', 'y', 'z', '2', '0.5', '3'),
    fc.tuple(tie('node'), fc.constantFrom('+', '-', '*'), tie('node')).map(([a, op, b]) => `(${a} ${op} ${b})`),
    fc.tuple(tie('node'), tie('node')).map(([a, b]) => `${a}/(1 + abs(${b}))`),
    tie('node').map((a) => `sqrt(abs(${a}))`),
    tie('node').map((a) => `atan(${a})`),
    tie('node').map((a) => `exp(-abs(${a}))`),
    tie('node').map((a) => `sin(${a})`),
    tie('node').map((a) => `cos(${a})`),
    tie('node').map((a) => `tanh(${a})`),
    tie('node').map((a) => `log(1 + abs(${a}))`),
    fc.tuple(tie('node'), fc.constantFrom('2', '3', '-2')).map(([a, p]) => `(1 + abs(${a}))^${p}`),
    fc.tuple(tie('node'), tie('node')).map(([a, b]) => `max(${a}, ${b})`),
    fc.tuple(tie('node'), tie('node')).map(([a, b]) => `atan2(${a}, 1 + abs(${b}))`),
  ),
})).node;

const mixed = fc.tuple(formulas, formulas).map(([a, b]) => `(${a})*x - (${b})/(1 + abs(z*y))`);

const range = fc.tuple(fc.integer({ min: -3000, max: 3000 }), fc.integer({ min: 0, max: 2000 })).map(([low, width]) => [low / 1000, (low + width) / 1000] as const);

test('every value inside the ranges lies inside the resulting range', async () => {
  let bounded = 0;
  await fc.assert(fc.asyncProperty(mixed, range, range, range, fc.array(fc.tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true })), { minLength: 8, maxLength: 8 }), async (formula, x, y, z, shares) => {
    const text = `x [-] ${x[0]} .. ${x[1]}\ny [-] ${y[0]} .. ${y[1]}\nz [-] ${z[0]} .. ${z[1]}\nresult [1] = 1*(${formula})`;
    const result = (await evaluateFormulas(read(text))).get('result');
    if (!result || result.kind === 'none') throw new Error(`no range: ${result?.reason.kind}`);
    const [low, high] = result.kind === 'value' ? [result.value, result.value] : [result.low, result.high];
    if (result.kind === 'range') bounded++;
    for (const [a, b, c] of shares) {
      const at = ([from, to]: readonly [number, number], share: number): number => Math.min(to, from + share * (to - from));
      const value = mathEvaluate(formula, { x: at(x, a), y: at(y, b), z: at(z, c) }) as number;
      const rounding = result.kind === 'value' ? 1e-12 * Math.max(1, Math.abs(value)) : 0;
      expect(value).toBeGreaterThanOrEqual(low - rounding);
      expect(value).toBeLessThanOrEqual(high + rounding);
    }
  }), { numRuns: 200, seed: 7 });
  expect(bounded).toBeGreaterThan(100);
});

test.each([
  ['x/(x + y)', true], ['x*y - y', true], ['(x + y)^2/x', true], ['x*exp(-y)*sqrt(x)', true], ['sin(x)*x', true], ['hypot(x, y)/y', true], ['max(x, y) - x', true], ['x*(1 - x)*y', false], ['max(x, 1)*(2 - x)', false],
] as const)('%s: ends said to be reached are reached', async (formula, sharp) => {
  const [x, y] = [[0.5, 1.4], [2, 3]] as const;
  const result = (await evaluateFormulas(read(`x [-] ${x[0]} .. ${x[1]}\ny [-] ${y[0]} .. ${y[1]}\nresult [1] = ${formula}`))).get('result');
  if (result?.kind !== 'range') throw new Error('no range');
  const values: number[] = [];
  for (let i = 0; i <= 60; i++) for (let j = 0; j <= 60; j++) values.push(mathEvaluate(formula, { x: x[0] + (i / 60) * (x[1] - x[0]), y: y[0] + (j / 60) * (y[1] - y[0]) }) as number);
  const [least, most] = [Math.min(...values), Math.max(...values)];
  expect(result.sharp).toBe(sharp);
  if (result.sharp) {
    expect(result.low).toBeCloseTo(least, 10);
    expect(result.high).toBeCloseTo(most, 10);
  } else expect(result.high - result.low).toBeLessThan(1.2 * (most - least) + 1e-9);
});
