import { describe, expect, test } from 'vitest';
import { directivesOf, notesOf, readFile } from './helpers.ts';

describe('allow', () => {
  test.each([
    ['x = a + b  # termwise: allow unlike-terms — scores of an old sheet', 'allow unlike-terms: scores of an old sheet'],
    ['y = 1\n# termwise: allow unlike-terms - scores of an old sheet\nx = a + b', 'allow unlike-terms: scores of an old sheet'],
    ['x = a + b  # termwise: allow unlike-terms: scores', 'allow unlike-terms: scores'],
    ['x = a + b  # termwise: allow unlike-terms -- scores', 'allow unlike-terms: scores'],
    ['x = a + b  # [m] sum. termwise: allow unlike-terms — scores', 'allow unlike-terms: scores'],
    ['x = a + b  # termwise: allow unlike-terms, scale-mismatch — scores', 'allow unlike-terms: scores|allow scale-mismatch: scores'],
    ['# termwise: allow hidden-unit — published correlation\nx = 1', 'allow hidden-unit (file): published correlation'],
    ['# Cost sheet\n# termwise: allow hidden-unit — published correlation\n\nx = 1', 'allow hidden-unit (file): published correlation'],
    ['"""Cost sheet.\n\ntermwise: allow hidden-unit — published correlation\n"""\nx = 1', 'allow hidden-unit (file): published correlation'],
    ['x = 1  # termwise: allow hidden-unit — published correlation', 'allow hidden-unit: published correlation'],
    ['def f(x):\n    """F.\n\n    termwise: allow hidden-unit — published\n    """\n    return x', 'allow hidden-unit: published'],
  ])('%s', (text, expected) => {
    expect(directivesOf(text).join('|')).toBe(expected);
  });

  test.each(['x = 1  # termwise: allow unlike-terms', 'x = 1  # termwise: allow unlike-terms —', 'x = 1  # termwise: allow unlike-terms without any dash', 'x = 1  # termwise: allow unlike-words — no such code', 'x = 1  # termwise: allow', 'x = 1  # termwise: ignore everything'])('%s cannot be followed', (text) => {
    expect(directivesOf(text)).toHaveLength(1);
    expect(directivesOf(text)[0]).toMatch(/^malformed: /);
  });

  test.each(['x = 1  # we allow unlike-terms here', '# termwise comparison of the sums: done below\nx = 1', 's = "termwise: allow unlike-terms — x"'])('%s is no directive', (text) => {
    expect(directivesOf(text)).toEqual([]);
  });

  test('a directive that moves down with its lines no longer opens the file', () => {
    const { chunks } = readFile('# termwise: allow hidden-unit — published\nx = 1\n');
    const directive = chunks[0]?.notes.directives[0];
    expect(directive?.kind === 'allow' && directive.wholeFile).toBe(true);
    if (chunks[0]) chunks[0].chunk.anchor.start = 40;
    expect(directive?.kind === 'allow' && directive.wholeFile).toBe(false);
  });
});

describe('empirical', () => {
  test.each([
    ['# empirical: P [mmHg], T [degC]\nT = 3', 'empirical P mmHg, T degC'],
    ['q = a * P**0.3  # empirical: P [mmHg], q [W/m2]', 'empirical P mmHg, q W/m2'],
    ['def f(T):\n    """Chill.\n\n    empirical: T [C], v [km/h]\n    """\n    return T', 'empirical T C, v km/h'],
    ['# empirical: P [mmhgg]\nT = 3', 'malformed: `mmhgg` is not a unit known here.'],
  ])('%s', (text, expected) => {
    expect(directivesOf(text).join('|')).toBe(expected);
  });

  test.each(['# empirical: fitted to the data of the bench\nT = 3', '# an empirical relation for T [degC]\nx = 1'])('%s is prose', (text) => {
    expect(directivesOf(text)).toEqual([]);
  });

  test('its units are no notes of the statement', () => {
    expect(notesOf('q = a * P**0.3  # empirical: P [mmHg]')).toEqual([]);
    expect(notesOf('q = a * P**0.3  # [W] empirical: P [mmHg]')).toEqual(['q: W (trailing)']);
  });
});

describe('depends on', () => {
  test.each([
    ['# P depends on N, D, rho, mu\nimport math', 'P <- N, D, rho, mu'],
    ['def f(N, D):\n    # P depends on N and D\n    P = N * D\n    return P', 'P <- N, D'],
    ['def f(N, D):\n    """Power.\n\n    P depends on N, D, rho\n    """\n    return N * D', 'P <- N, D, rho'],
    ['x = 2\ny = x  # y depends on x', 'y <- x'],
  ])('%s', (text, expected) => {
    expect(directivesOf(text).join('|')).toBe(expected);
  });

  test.each(['# viscosity depends on temperature\nmu = 2', '# The result depends on the mesh, the step\nx = 1', '# it depends on what you mean\nx = 1', '# efficiency depends on speed and load\nx = 1'])('%s is prose', (text) => {
    expect(directivesOf(text)).toEqual([]);
  });
});
