import { describe, expect, test } from 'vitest';
import { engine } from '../harness/engine.ts';

const workspace = await engine();

/** The first labels offered at `|`. */
function offered(marked: string, file = 'a.py'): readonly string[] {
  const at = marked.indexOf('|');
  workspace.check(file, marked.replace('|', ''));
  return workspace.completions(file, at).map(({ label }) => label);
}

describe('inside a note', () => {
  test.each([
    ['the unit that follows comes first, then its kind', 'V = 2.0  # [m/s]\nt = 3.0  # [s]\nx = V*t  # [|\n', ['m', 'mm', 'cm']],
    ['also where the bracket is closed', 'F = 2.0  # [N]\nA = 3.0  # [m^2]\np = F/A  # [|]\n', ['Pa', 'kPa', 'MPa']],
    ['in documentation', 'def f(V, t):\n    """\n    V : float\n        speed [m/s]\n    t : float\n        [|\n    """\n    x = 3.0  # [m]\n    return x + V*t\n', ['s', 'min', 'h']],
  ])('%s', (_what, marked, first) => {
    expect(offered(marked).slice(0, first.length)).toEqual(first);
  });

  test('without anything known: what the file uses, then the usual', () => {
    const labels = offered('V = 2.0  # [furlong]\nW = 2.0  # [kPa]\nU = 1.0  # [kPa]\nx = unknown()  # [|\n');
    expect(labels[0]).toBe('kPa');
    expect(labels).toContain('degC');
    expect(new Set(labels).size).toBe(labels.length);
  });

  test('what is offered says what it is', () => {
    workspace.check('a.py', 'x = f()  # [\n');
    const found = workspace.completions('a.py', 12).find(({ label }) => label === 'psi');
    expect(found).toMatchObject({ detail: expect.stringContaining('pressure'), documentation: '1 psi = 6894.757 Pa' });
  });

  test('replaces what stands in the bracket', () => {
    const text = 'p = f()  # [kP] static\n';
    workspace.check('a.py', text);
    const [choice] = workspace.completions('a.py', text.indexOf(']'));
    expect(text.slice(choice?.replaces.start, choice?.replaces.end)).toBe('kP');
  });
});

test.each(['x = a[|\n', 'x = 1  # see [1] and |\n', 'x = "[|"\n', 'x = 1|\n'])('%j is no note', (marked) => {
  expect(offered(marked)).toEqual([]);
});

describe('in a nomenclature file', () => {
  const head = 'N [1/s] 2 .. 12   speed\nD [m] = 0.085\nP [W]\n';
  test.each([
    ['symbols of a relation', `${head}P depends on |\n`, ['N', 'D']],
    ['symbols of a formula', `${head}v [m/s] = |\n`, ['N', 'D', 'P']],
    ['after an operator', `${head}v [m/s] = pi*N*|\n`, ['N', 'D', 'P']],
    ['the relation itself', `${head}P |\n`, ['depends on']],
  ])('%s', (_what, marked, labels) => {
    expect(offered(marked, 'a.nomen')).toEqual(labels);
  });
  test('units with the symbols of the folder', () => {
    expect(offered('unit crate = 18.5 kg\nm [|\n', 'a.nomen')).toContain('kg');
  });
});
