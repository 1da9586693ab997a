/** Hints in the text: `text` with each hint in its place, as an editor shows it. */
import { describe, expect, test } from 'vitest';
import { defaultHints, type HintSettings } from '../../server/src/service/contract.ts';
import { engine } from '../harness/engine.ts';

const workspace = await engine();
await workspace.prepareValues();

function shown(text: string, settings: Partial<HintSettings> = {}, file = 'a.py'): string {
  workspace.check(file, text);
  const hints = [...workspace.hints(file, { start: 0, end: text.length }, { ...defaultHints, ...settings })].reverse();
  return hints.reduce((all, { at, text: hint }) => `${all.slice(0, at)}‹${hint}›${all.slice(at)}`, text);
}

describe('units that follow', () => {
  test.each([
    ['V = 2.0  # [m/s]\nt = 3.0  # [s]\nx = V*t\n', 'V = 2.0  # [m/s]\nt = 3.0  # [s]\nx‹[m]› = V*t\n'],
    ['def f(p, A):\n    # p [Pa], A [m^2]\n    F = p*A\n    return F\n', 'def f(p, A):\n    # p [Pa], A [m^2]\n    F‹[N]› = p*A\n    return F\n'],
    ['p = 2.0  # [kPa]\nq = p\n', 'p = 2.0  # [kPa]\nq‹[kPa]› = p\n'],
  ])('%j', (text, expected) => {
    expect(shown(text)).toBe(expected);
  });

  test.each(['V = 2.0  # [m/s]\n', 'x = unknown*2\n', 'V = 2.0  # [m/s]\nw = 3.0  # [m/s]\nr = V/w\n', 'i = 0\n'])('%j has none', (text) => {
    expect(shown(text)).toBe(text);
  });

  test('can be turned off', () => {
    const text = 'V = 2.0  # [m/s]\nt = 3.0  # [s]\nx = V*t\n';
    expect(shown(text, { inferred: false })).toBe(text);
  });

  test('are written as notes where they are clicked', () => {
    const text = 'V = 2.0  # [m/s]\nt = 3.0  # [s]\nx = V*t\n';
    workspace.check('a.py', text);
    const [hint] = workspace.hints('a.py', { start: 0, end: text.length }, defaultHints);
    expect(hint?.edits.map((edit) => edit.text)).toEqual(['  # [m]']);
  });

  test('are given for the lines asked for', () => {
    const text = 'V = 2.0  # [m/s]\nx = V*V\ny = V*V\n';
    workspace.check('a.py', text);
    expect(workspace.hints('a.py', { start: text.indexOf('y ='), end: text.length }, defaultHints)).toHaveLength(1);
  });
});

const head = 'def head(Q, n):\n    """Pump head.\n\n    Parameters\n    ----------\n    Q : float\n        flow [m^3/h]\n    n : float\n        speed [rpm]\n    """\n    return unknown(Q, n)\n\n\n';

describe('units of parameters at calls', () => {
  test('stand behind numbers', () => {
    expect(shown(`${head}h = head(12.0, n=1450)\n`)).toContain('head(12.0‹[m^3/h]›, n=1450‹[rpm]›)');
  });
  test('stand behind everything where that is wanted', () => {
    expect(shown(`${head}h = head(q, -3)\n`, { arguments: 'all' })).toContain('head(q‹[m^3/h]›, -3‹[rpm]›)');
  });
  test.each([['symbols', 'h = head(q, m)\n'], ['spread arguments', 'h = head(*q)\n'], ['unknown functions', 'h = other(12.0)\n']])('not behind %s', (_what, line) => {
    expect(shown(`${head}${line}`)).toBe(`${head}${line}`);
  });
});

describe('values of formulas', () => {
  test('one value, and a range', () => {
    const text = 'D [m] = 0.05\nV [m/s] 1 .. 2\nrho [kg/m^3] = 998\nmu [Pa s] = 1.0e-3\nA [m^2] = pi/4*D^2\nRe [1] = rho*V*D/mu\n';
    const lines = shown(text, {}, 'pipe.nomen').split('\n');
    expect(lines[4]).toBe('A [m^2] = pi/4*D^2‹= 0.001963 m^2›');
    expect(lines[5]).toBe('Re [1] = rho*V*D/mu‹= 49900 .. 99800›');
    expect(lines[0]).toBe('D [m] = 0.05');
  });
});
