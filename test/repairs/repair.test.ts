/** The formulas are those of any handbook of fluid mechanics (Darcy-Weisbach, Bernoulli, Reynolds, Torricelli), written from memory. */
import { expect, test } from 'vitest';
import { becomes, codesOf, fixed, offers } from './offers.ts';

const given = `from math import sqrt, exp, pi
p = 2.0e5      # [Pa]
rho = 1000.0   # [kg/m^3]
g = 9.81       # [m/s^2]
h = 3.0        # [m]
V = 2.0        # [m/s]
D = 0.05       # [m]
mu = 1.0e-3    # [Pa s]
nu = 1.0e-6    # [m^2/s]
m = 3.0        # [kg]
`;

/** The repairs of a line, with what it becomes; and each is checked again. */
function repairsOf(line: string): readonly string[] {
  const text = given + line;
  for (const fix of offers(text, ['repair'])) expect(codesOf(fixed(text, fix))).toEqual([]);
  return becomes(text, ['repair']).map((each) => each.replace('choice: ', ''));
}

test.each([
  ['an exponent', 'q = 0.5*rho*V  # [Pa]', 'q = 0.5*rho*V**2  # [Pa]'],
  ['an exponent too many', 'q = 0.5*rho*V**3  # [Pa]', 'q = 0.5*rho*V**2  # [Pa]'],
  ['brackets of a power go', 'x = p + rho*g*(h**2)', 'x = p + rho*g*h'],
  ['a square root too many', 'v = sqrt(V)  # [m/s]', 'v = V  # [m/s]'],
  ['a factor in scope', 'x = p + rho*h', 'x = p + rho*h*g'],
  ['a factor that was left as 1', 'x = p + rho*1.0*h', 'x = p + rho*g*h'],
  ['another symbol', 'Re = V*D/mu  # [-]', 'Re = V*D/nu  # [-]'],
  ['brackets behind a slash', 'head = p/rho*g  # [m]', 'head = p/(rho*g)  # [m]'],
  ['times for over', 'x = p + rho*g/h', 'x = p + rho*g*h'],
  ['brackets around a sum', 'x = rho*g*h + D  # [Pa]', 'x = rho*g*(h + D)  # [Pa]'],
  ['brackets where a power would tear it apart', 'x = 2**h', 'x = 2**(h/D)'],
  ['an argument of exp', 'x = exp(h*2)', 'x = exp(h*2/D)'],
  ['behind an assignment', 'area = pi*D/4\nQ = V*area  # [m^3/s]', 'area = pi*D**2/4'],
  ['through a function that keeps the unit', 'x = max(1.0*h/D, 0)\ny = x*D  # [m^2]', 'x = max(h*h/D, 0)'],
  ['a symbol that stands twice', 'a = D**2\nb = a*a  # [m^2]', 'a = D'],
])('%s', (_, line, expected) => {
  expect(repairsOf(line)).toContain(expected);
});

test('the one that changes least comes first', () => {
  expect(repairsOf('q = 0.5*rho*V  # [Pa]')[0]).toBe('q = 0.5*rho*V**2  # [Pa]');
  expect(repairsOf('Re = V*D/mu  # [-]')[0]).toBe('Re = V*D/nu  # [-]');
  expect(repairsOf('x = p + rho*h')[0]).toBe('x = p + rho*h*g');
});

test('at most five, each shown with the unit it gives, none proven', () => {
  const fixes = offers(`${given}q = 0.5*rho*V  # [Pa]`, ['repair']);
  expect(fixes.length).toBeLessThanOrEqual(5);
  expect(fixes[0]?.title).toBe('Write `V**2` for `V`: gives Pa');
  expect(fixes.map((fix) => fix.confidence)).not.toContain('proven');
});

test('a parameter that is read nowhere is what was forgotten', () => {
  const text = `def force(rho, V, area, depth, width, n):
    """Drag.

    Parameters
    ----------
    rho : float
        Density [kg/m^3]
    V : float
        Speed [m/s]
    area : float
        Area [m^2]
    depth : float
        Depth [m]
    width : float
        Width [m]

    Returns
    -------
    F : float
        Force [N]
    """
    scale = width*n
    return 0.5*rho*V**2*scale + depth/depth*1.0*rho*V**2
`;
  expect(becomes(text, ['repair'])[0]).toContain('area');
});

test('where nothing in scope fits, what is lacking is said and nothing is offered', () => {
  const fixes = offers('I = 2.0  # [A]\nF = 3*I  # [N]', ['repair', 'missing']);
  expect(fixes.map((fix) => [fix.kind, fix.edits.length])).toEqual([['missing', 0]]);
  expect(fixes[0]?.title).toMatch(/^Nothing here is in /);
});

test('not offered where all is well, where units are unknown, or where only the scale differs', () => {
  for (const line of ['x = p + rho*g*h', 'x = p + unknown*h', 'x = 2*h + D', 'q = 0.5*rho*V**2/1000  # [kPa]', 'q = 0.5*rho*V**2  # [kPa]']) expect(repairsOf(line)).toEqual([]);
});

test('a symbol that is assigned later is not in scope', () => {
  const lines = repairsOf('x = p + rho*h\nlate = 9.81  # [m/s^2]');
  expect(lines.some((line) => line.includes('late'))).toBe(false);
});
