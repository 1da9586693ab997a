/** What the shipped signatures do to scripts: text in, codes out. */
import { describe, expect, test } from 'vitest';
import { engine, filesOf } from '../harness/engine.ts';

const workspace = await engine();

/** `line code` of each finding, lines counted from the text's first. */
function codesOf(lines: readonly string[], file = 'script.py', on = workspace): readonly string[] {
  const text = lines.join('\n');
  return on.check(file, text).findings.map((each) => `${text.slice(0, each.span.start).split('\n').length} ${each.code}`);
}

const head = [
  'import math', 'import numpy as np', 'import scipy.constants as sc', 'from scipy.integrate import quad, trapezoid', 'from scipy.optimize import brentq',
  'L = np.array([1.2, 1.9])  # [m]', 't = np.array([0.0, 2.5])  # [s]', 'T = np.array([20.0, 23.5])  # [degC]', 'p = 101.3  # [kPa]', 'a = 35.0  # [deg]',
];
const after = head.length + 1;

describe('right', () => {
  test.each([
    'v = np.diff(L)/np.diff(t)  # [m/s]',
    'v = np.gradient(L, t)  # [m/s]',
    'A = np.trapezoid(L, t)  # [m s]',
    'A = trapezoid(L, t)  # [m s]',
    'x = np.sqrt(L**2 + L**2)  # [m]',
    'x = np.hypot(L, L)  # [m]',
    's = np.std(T)  # [K]',
    's2 = np.var(T)  # [K^2]',
    'T_m = np.mean(T)  # [degC]',
    'dTdt = np.gradient(T, t)  # [K/s]',
    'y = np.sin(np.radians(a))  # [-]',
    'b = np.degrees(np.arctan2(L, L))  # [deg]',
    'x = np.where(L > 1.5, L, 1.5)  # [m]',
    'x = np.interp(3.0, t, L)  # [m]',
    'x = L.mean() + L.max()  # [m]',
    'd = T.std()  # [K]',
    'I, err = quad(lambda s: 2.0*s, 0.0, 1.0)',
    'V = np.prod(L)  # [m^2]',
    'w = np.power(L, 3)  # [m^3]',
    'x = np.zeros(4) + L  # [m]',
    'n, rest = divmod(L, 0.5)',
    'T_K = T + sc.zero_Celsius  # [K]',
    'G = sc.g*L  # [m^2/s^2]',
    'x = L*sc.inch  # [m]',
    'x = max(L[0], 3, key=abs)  # [m]',
  ])('%s', (line) => expect(codesOf([...head, line])).toEqual([]));
});

describe('wrong', () => {
  test.each([
    ['v = np.diff(L)/np.diff(t)  # [m s]', 'unlike-result'],
    ['A = np.trapezoid(L, t)  # [m/s]', 'unlike-result'],
    ['x = np.sqrt(L)  # [m]', 'unlike-result'],
    ['x = np.hypot(L, t)', 'unlike-terms'],
    ['x = np.maximum(L, t)', 'unlike-terms'],
    ['x = np.where(t > 1.0, L, t)', 'unlike-terms'],
    ['s = np.var(L)  # [m]', 'unlike-result'],
    ['y = np.sin(a)', 'scale-mismatch'],
    ['y = math.exp(p)', 'dimensioned-argument'],
    ['b = np.arctan2(L, L)  # [deg]', 'scale-mismatch'],
    ['x = np.interp(L, t, L)', 'unlike-terms'],
    ['x = L.mean()  # [s]', 'unlike-result'],
    ['d = T.max()  # [K]', 'scale-mismatch'],
    ['x = L.sum()  # [s]', 'unlike-result'],
    ['G = sc.g*L  # [m/s^2]', 'unlike-result'],
    ['w = np.power(L, 3)  # [m^2]', 'unlike-result'],
  ])('%s', (line, code) => expect(codesOf([...head, line])).toEqual([`${after} ${code}`]));
});

describe('a nomenclature file is checked like a script', () => {
  const symbols = ['D [m] = 0.085', 'rho [kg/m^3] = 1240', 'N [rpm] = 300', 'mu [Pa s] = 0.38'];
  const inFolder = async (lines: readonly string[]): Promise<readonly string[]> => codesOf(lines, 'work/a.nomen', await engine(filesOf({ 'work/a.nomen': lines.join('\n') })));

  test.each([
    ['Re [1] = rho*N*D^2/mu', 'none'],
    ['y [m] = D + 2*D', 'none'],
    ['y [mm] = D', 'none'],
    ['y [m] = D + mu', '5 unlike-terms'],
    ['y [m] = D^2', '5 unlike-result'],
    ['y [metrs] = D', '5 unreadable-unit'],
    ['y [m] = D mu', '5 unreadable-unit'],
    ['unit box = 3 kgg', '5 unreadable-unit'],
    ['f(x [metrs]) [s]', '5 unreadable-unit'],
    ['y [m] = sqrt(D)', '5 unlike-result'],
    ['unit tin = 12.5 kg', 'none'],
    ['f(x [tin]) [s]', '5 unreadable-unit'],
  ])('%s', async (line, expected) => {
    expect((await inFolder([...symbols, line])).join(', ') || 'none').toBe(expected);
  });

  test('a unit of the file counts in its signatures, wherever it is declared', async () => {
    expect(await inFolder(['f(x [tin]) [s]', 'unit tin = 12.5 kg'])).toEqual([]);
  });
});
