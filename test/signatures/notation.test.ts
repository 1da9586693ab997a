import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { load, printed, problemsOf } from './helpers.ts';

const all = (text: string): readonly string[] => {
  const { functions, methods } = load(text);
  return [...functions.values(), ...methods.values()].map(printed);
};

describe('signatures', () => {
  test.each([
    ['pump_head(Q [m^3/h], N [rpm]) [m]', 'pump_head(Q [m^3/h], N [rpm]) [m]'],
    ['trapezoid(y [?a], x [?b]) [?a ?b]', 'trapezoid(y [?a], x [?b]) [?a ?b]'],
    ['root(x [?a]) [?a^(1/2)]', 'root(x [?a]) [?a^1/2]'],
    ['f(x [?a^2 m]) [?a^-1]', 'f(x [?a^2 m]) [?a^-1]'],
    ['f(x [?a], y [?b]) [?a/?b]', 'f(x [?a], y [?b]) [?a ?b^-1]'],
    ['f(x [?a/s]) [?a*?a]', 'f(x [?a 1/s]) [?a^2]'],
    ['f(x) []', 'f(x) []'],
    ['f()', 'f()'],
    ['f(x [m] ...) [m]', 'f(x [m] ...) [m]'],
    ['f(x [m], y [?a] = 0, z = none) [m]', 'f(x [m], y [?a] =, z =) [m]'],
    ['quad(f(x [?a]) [?b], a [?a]) [?a ?b], [?a ?b]', 'quad(f ([?a] -> [?b]), a [?a]) [?a ?b], [?a ?b]'],
    ['f(g(x, y [s]) [m], [K], z [A]) [1]', 'f(g (any, [s] -> [m], [K]), z [A]) [1]'],
    ['.std(self [?a], axis) [difference ?a]', '.std(self [?a], axis) [difference ?a]'],
    ['total(x [?a]) [sum ?a]', 'total(x [?a]) [sum ?a]'],
    ['f(x [m], y) [s], [], [K]', 'f(x [m], y) [s], [], [K]'],
    ['f(Q [m^3/h]) [m]   # the comment', 'f(Q [m^3/h]) [m]'],
  ])('%s', (text, expected) => {
    expect(all(text)).toEqual([expected]);
    expect(problemsOf(text)).toEqual([]);
  });

  test('names before one parenthesis share it', () => {
    expect(all('lib.sin, lib.cos(x [rad]) [1]')).toEqual(['lib.sin(x [rad]) [1]', 'lib.cos(x [rad]) [1]']);
  });

  test('a slash and a power of a unit keep their exact scale', () => {
    const claim = load('f(x [?a]) [?a km^-2]').functions.get('f')?.results[0];
    expect(claim?.kind === 'unit' && claim.unit.scale?.key).toBe('1/1000000|0||1');
  });

  test('what follows is a description, and names have places', () => {
    const text = '\n  pump_head, fan_head(Q [L/s]) [m]  from the maker\n';
    const signatures = [...load(text).functions.values()];
    expect(signatures.map(({ span }) => text.slice(span.start, span.end))).toEqual(['pump_head', 'fan_head']);
    expect(signatures[0]?.description).toBe('from the maker');
  });
});

describe('refusals', () => {
  test.each([
    ['f(x [m', 'bracket-not-closed: (x [m'],
    ['f(x [m) [s]', 'bracket-not-closed: [m'],
    ['f(x [metrs], y [kgg]) [s]', 'unknown-unit: metrs|unknown-unit: kgg'],
    ['f(x [?a^b]) [?a]', 'bad-power: ?a^b'],
    ['f(x [?a^1/2]) [s]', 'unknown-unit: 2'],
    ['f(x [?a]) [m/s ?a]', 'slash-before-two: /'],
    ['f(x) [difference]', 'empty-claim: difference'],
    ['f(2x [m]) [m]', 'not-a-parameter: 2x [m]'],
    ['f(x [m] y) [m]', 'not-a-parameter: x [m] y'],
    ['f(x [m], x [s]) [m]', 'repeated-parameter: x'],
    ['f(x [m] ..., y [s]) [m]', 'parameter-behind-rest: y'],
    ['f(x [m], *, z = none) [m]', 'not-a-parameter: *'],
    ['words that say nothing', 'not-a-line: words that say nothing'],
    ['lib.c [metrs] = 3', 'unknown-unit: metrs'],
  ])('%s', (text, problems) => {
    expect(problemsOf(text)).toEqual(problems.split('|'));
  });

  test('a malformed parameter claims nothing and keeps its position', () => {
    expect(all('f(2x [m], y [s]) [K]')).toEqual(['f( =, y [s]) [K]']);
  });

  test('an unknown unit offers the nearest spelling, as everywhere', () => {
    expect(load('f(x [metrs]) [s]').problems[0]?.message).toMatch(/`metrs` is not a unit known here\.( `met(re|er)s?` is\.| `m` is\.)?/);
  });
});

describe('constants', () => {
  test.each([
    ['lib.g [m/s^2] = 9.80665', 'm/s^2 196133/20000 0'],
    ['lib.pi = pi', '- 1 1'],
    ['lib.tau = 2*pi', '- 2 1'],
    ['lib.c = -1.5e-3', '- -3/2000 0'],
    ['lib.inf = inf', '- - 0'],
  ])('%s', (text, expected) => {
    const constant = [...load(text).constants.values()][0];
    expect(`${constant?.unit?.text ?? '-'} ${constant?.value ?? '-'} ${constant?.pi}`).toBe(expected);
  });
});

test('never throws, and every span lies in the text', () => {
  const piece = fc.constantFrom('f', 'x', '(', ')', '[', ']', '?a', '^', '1/2', 'm', ',', ' ', '=', '...', '*', '.', '\n', 'difference ', '-', '/');
  fc.assert(fc.property(fc.array(piece, { maxLength: 40 }).map((pieces) => pieces.join('')), (text) => {
    for (const { span } of load(text).problems) expect(span.start >= 0 && span.start <= span.end && span.end <= text.length).toBe(true);
  }), { numRuns: 500 });
});
