/** What is known at a place: the group of a product, the conversion that a number stands for. */
import { describe, expect, test } from 'vitest';
import { hoverText } from '../../server/src/lsp/hover-text.ts';
import { engine } from '../harness/engine.ts';

const workspace = await engine();

/** The hover over the first character of the part that `|` precedes. */
function hover(marked: string, file = 'a.py'): string | undefined {
  const at = marked.indexOf('|');
  const text = marked.replace('|', '');
  workspace.check(file, text);
  const info = workspace.hover(file, at);
  return info && hoverText(info, false);
}

const pipe = 'rho = 998.0  # [kg/m^3]\nV = 2.0  # [m/s]\nD = 0.05  # [m]\nmu = 1.0e-3  # [Pa s]\n';

describe('a dimensionless product', () => {
  test('has its name and its value', () => {
    expect(hover(`${pipe}Re = rho*V*D|/mu\n`)).toContain('Reynolds number, 99800');
  });
  test('is told of from inside', () => {
    expect(hover(`${pipe}Re = rho*|V*D/mu\n`)).toContain('In rho*V*D/mu: Reynolds number');
  });
  test('is not told of where a unit is missing', () => {
    expect(hover(`${pipe}Re = rho*|V*L/mu\n`)).not.toContain('In rho');
  });
});

describe('a number that converts', () => {
  test.each([
    ['p = 200.0  # [kPa]\nq = p*|1000  # [Pa]\n', '1000: taken as the conversion from kPa to Pa.'],
    ['t = 3.0  # [h]\ns = |3600*t  # [s]\n', '3600: taken as the conversion from h to s.'],
    ['d = 50.0  # [mm]\nD = d/|1000  # [m]\n', '1000: taken as the conversion from mm to m.'],
  ])('%j', (marked, words) => {
    expect(hover(marked)).toBe(words);
  });
  test.each(['m = 3.0  # [kg]\nE = |0.5*m  # [kg]\n', 'x = |1000\n', 'd = 50.0  # [mm]\ny = d*|1000\n'])('%j stays silent', (marked) => {
    expect(hover(marked)).toBeUndefined();
  });
});
