import { describe, expect, test } from 'vitest';
import { notesOf, unitsOf } from './helpers.ts';

describe('comment lines that name symbols', () => {
  test.each([
    ['# V [m/s], D [m], nu [m^2/s]\nV = 1.4\nD = 0.05\nnu = 1e-6', 'file:V: m/s (above)|file:D: m (above)|file:nu: m^2/s (above)'],
    ['# V [m/s]; D [m]\n\nV = 1.4', 'file:V: m/s (above)|file:D: m (above)'],
    ['# V [m/s] and D [m]\nV = 1.4', 'file:V: m/s (above)|file:D: m (above)'],
    ['# V [m/s] mean velocity\nV = 1.4', 'file:V: m/s (above) "V mean velocity"'],
    ['# V: mean velocity [m/s]\nV = 1.4', 'file:V: m/s (above) "V: mean velocity"'],
    ['# - V [m/s] mean velocity\n# - D [m] bore\n\nimport math', 'file:V: m/s (above) "V mean velocity"|file:D: m (above) "D bore"'],
    ['# T [C] of the water\nT = 20', 'file:T: C (above) "T of the water"'],
    ['def f(x):\n    # V [m/s], D [m]\n    V = x\n    return V', 'f:V: m/s (above)|f:D: m (above)'],
    ['def f(x):\n    y = x\n    # x [m], y [s]\n    return y', 'f:x: m (above)|f:y: s (above)'],
    ['a = 1\n# x [m], y [s]\ndef f(x, y):\n    return x / y', 'f:x: m (above)|f:y: s (above)'],
    ['# mean velocity V [m/s]\nV = 1.4', 'V: m/s (above) "mean velocity V"'],
  ])('%s', (text, expected) => {
    expect(notesOf(text).join('|')).toBe(expected);
  });

  test.each([
    '# convert [m] to [mm]\nx = y * 1000', '# pressure in [Pa]\np = 2', '# see [1] for the data\nx = 1', '# x = y[3]\nx = 1', '# values [u, v]\nx = 1', '# the mean velocity [m/s] is high\nV = 2', '# V in terms of the area [m2]\nV = 3',
    '# mean velocity [m/s]\nV = 1.4', '# if a > b: c = d [m]\nx = 1',
  ])('%s is left alone', (text) => {
    expect(unitsOf(text)).toBe('none');
  });
});

describe('the comment above a field', () => {
  test.each([
    ['class Pipe:\n    # inner diameter [m]\n    D: float\n', 'D: m (above) "inner diameter"'],
    ['class Pipe:\n    # inner diameter [m]\n    D: float = 0.05\n    # [m/s] mean velocity\n    V: float = 1.0', 'D: m (above) "inner diameter"|V: m/s (above) "mean velocity"'],
    ['class Pipe:\n    D: float  # [m] bore\n    k: float  # mm, roughness', 'D: m (trailing) "bore"|k: mm (trailing) "roughness"'],
    ['class Pipe:\n    D: float\n    """Bore [m]."""\n', 'D: m (trailing) "Bore"'],
  ])('%s', (text, expected) => {
    expect(notesOf(text).join('|')).toBe(expected);
  });

  test('of another symbol says nothing of the field', () => {
    expect(unitsOf('class Pipe:\n    # V [m/s] at D\n    D: float\n')).not.toContain('D m/s');
    expect(unitsOf('class Pipe:\n    # from [m] to [mm]\n    D: float\n')).toBe('none');
  });
});
