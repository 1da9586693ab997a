import { describe, expect, test } from 'vitest';
import { loadSignatures } from '../../server/src/signatures/load.ts';
import { load, printed, shippedFiles, shippedHosts } from './helpers.ts';

const files = shippedFiles('python');
const table = loadSignatures(files);

describe.each(shippedHosts)('%s', (host) => {
  test.each(shippedFiles(host).map((each) => [each.file, each.text] as const))('%s names its source and reads without a problem', (_file, text) => {
    expect(text).toMatch(/^#.*(?:\n#.*)*Sources?: .{10}/);
    expect(load(text).problems).toEqual([]);
  });

  test('no name is written twice', () => {
    const names = shippedFiles(host).flatMap(({ text }) => text.split('\n').flatMap((line) => {
      const open = /^[^#[=]*\(/.exec(line)?.[0].slice(0, -1);
      return (open ?? /^\S+(?= .*= )/.exec(line)?.[0] ?? '').split(',').map((name) => name.trim()).filter((name) => name !== '' && !name.startsWith('#'));
    }));
    expect(names.filter((name, at) => names.indexOf(name) !== at)).toEqual([]);
  });
});

test('the functions that engineering scripts call are there', () => {
  expect(table.functions.size).toBeGreaterThan(500);
  const claiming = [...table.functions.values()].filter((each) => each.results.length > 0);
  expect(claiming.length).toBeGreaterThan(350);
  expect(table.methods.size).toBeGreaterThan(40);
});

/** What each function does to units follows from what its page in the public reference says it computes; the pages are named in the files. */
describe('claims', () => {
  test.each([
    ['numpy.sqrt', '(x [?a]) [?a^1/2]'],
    ['numpy.square', '(x [?a]) [?a^2]'],
    ['numpy.sin', '(x [rad]) [1]'],
    ['numpy.arcsin', '(x [1]) [rad]'],
    ['numpy.exp', '(x [1]) [1]'],
    ['numpy.arctan2', '(x1 [?a], x2 [?a]) [rad]'],
    ['numpy.deg2rad', '(x [deg]) [rad]'],
    ['numpy.where', '(condition, x [?a], y [?a]) [?a]'],
    ['numpy.interp', '(x [?a], xp [?a], fp [?b], left [?b] =, right [?b] =, period [?a] =) [?b]'],
    ['numpy.trapezoid', '(y [?a], x [?b] =, dx [?b] =) [?a ?b]'],
    ['numpy.gradient', '(f [?a], x [?b] =, axis =) [difference ?a ?b^-1]'],
    ['numpy.std', '(a [?a], axis =) [difference ?a]'],
    ['numpy.var', '(a [?a], axis =) [difference ?a^2]'],
    ['numpy.diff', '(a [?a], n =, axis =) [difference ?a]'],
    ['numpy.sum', '(a [?a], axis =) [sum ?a]'],
    ['numpy.mean', '(a [?a], axis =) [?a]'],
    ['numpy.cross', '(a [?a], b [?b]) [?a ?b]'],
    ['numpy.linalg.solve', '(a [?a], b [?b]) [?b ?a^-1]'],
    ['numpy.power', '(x1, x2)'],
    ['numpy.add', '(x1, x2)'],
    ['math.hypot', '(coordinates [?a] ...) [?a]'],
    ['max', '(x [?a] ..., key =, default [?a] =) [?a]'],
    ['divmod', '(a [?a], b [?b]) [?a ?b^-1], [?a]'],
    ['scipy.integrate.quad', '(func ([?a] -> [?b]), a [?a], b [?a]) [?a ?b], [?a ?b]'],
    ['scipy.optimize.brentq', '(f ([?a] -> [?b]), a [?a], b [?a]) [?a]'],
    ['scipy.stats.linregress', '(x [?a], y [?b]) [difference ?a^-1 ?b], [?b], [1], [1], [difference ?a^-1 ?b]'],
    ['scipy.integrate.solve_ivp', '(func)'],
    ['cmath.polar', '(z [?a]) [?a], [rad]'],
    ['statistics.pstdev', '(data [?a], xbar [?a] =) [difference ?a]'],
  ])('%s', (name, claim) => {
    const signature = table.functions.get(name);
    const sorted = (text: string): string => text.replace(/\?b \?a\^-1/g, '?a^-1 ?b');
    expect(signature && sorted(printed(signature))).toBe(name + sorted(claim));
  });

  test('an alias says the same as the name it stands for', () => {
    const without = (name: string): string => printed(table.functions.get(name) as NonNullable<ReturnType<typeof table.functions.get>>).slice(name.length);
    for (const [alias, name] of [['numpy.absolute', 'numpy.abs'], ['numpy.trapz', 'numpy.trapezoid'], ['numpy.amax', 'numpy.max'], ['numpy.radians', 'numpy.deg2rad'], ['numpy.acos', 'numpy.arccos'], ['scipy.integrate.simps', 'scipy.integrate.simpson'], ['scipy.integrate.cumtrapz', 'scipy.integrate.cumulative_trapezoid']] as const) {
      expect(without(alias)).toBe(without(name));
    }
  });
});

/** CODATA 2022 adjustment (P. J. Mohr et al., NIST, 2024): value and SI unit as its table gives them. */
const codata: readonly (readonly [name: string, value: number, dimension: string])[] = [
  ['scipy.constants.G', 6.6743e-11, 'M⁻¹ L³ T⁻²'],
  ['scipy.constants.R', 8.314462618, 'M L² T⁻² Θ⁻¹ N⁻¹'],
  ['scipy.constants.k', 1.380649e-23, 'M L² T⁻² Θ⁻¹'],
  ['scipy.constants.N_A', 6.02214076e23, 'N⁻¹'],
  ['scipy.constants.h', 6.62607015e-34, 'M L² T⁻¹'],
  ['scipy.constants.c', 299792458, 'L T⁻¹'],
  ['scipy.constants.e', 1.602176634e-19, 'T I'],
  ['scipy.constants.sigma', 5.670374419e-8, 'M T⁻³ Θ⁻⁴'],
  ['scipy.constants.Wien', 2.897771955e-3, 'L Θ'],
  ['scipy.constants.epsilon_0', 8.8541878188e-12, 'M⁻¹ L⁻³ T⁴ I²'],
  ['scipy.constants.mu_0', 1.25663706127e-6, 'M L T⁻² I⁻²'],
  ['scipy.constants.m_e', 9.1093837139e-31, 'M'],
  ['scipy.constants.m_p', 1.67262192595e-27, 'M'],
  ['scipy.constants.m_n', 1.67492750056e-27, 'M'],
  ['scipy.constants.m_u', 1.66053906892e-27, 'M'],
  ['scipy.constants.alpha', 7.2973525643e-3, '1'],
  ['scipy.constants.Rydberg', 10973731.568157, 'L⁻¹'],
];

describe('constants', () => {
  test.each(codata)('%s', (name, value, dimension) => {
    const constant = table.constants.get(name);
    expect(Math.abs((constant?.value?.toNumber() ?? 0) / value - 1)).toBeLessThan(1e-9);
    expect(constant?.unit?.dimension.toString()).toBe(dimension);
    expect(constant?.unit?.scale?.isOne).toBe(true);
  });

  test.each([['kilo', 1000], ['micro', 1e-6], ['degree', Math.PI / 180], ['zero_Celsius', 273.15]] as const)('%s is a number', (name, value) => {
    const constant = table.constants.get(`scipy.constants.${name}`);
    expect(constant?.unit).toBeUndefined();
    expect(Math.abs((constant?.value?.toNumber() ?? 0) / value - 1)).toBeLessThan(1e-12);
  });

  test('a unit that may be a quantity or a factor is unknown', () => {
    expect(['inch', 'hour', 'atm', 'hp', 'liter'].filter((name) => table.constants.has(`scipy.constants.${name}`))).toEqual([]);
  });

  test('π is exact', () => {
    expect(['math.pi', 'numpy.pi', 'scipy.constants.pi', 'cmath.pi'].map((name) => `${table.constants.get(name)?.value} ${table.constants.get(name)?.pi}`)).toEqual(Array(4).fill('1 1'));
  });
});
