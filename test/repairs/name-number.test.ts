/** Standard gravity 9.80665 m/s²: CGPM 1901, ISO 80000-3. Stefan-Boltzmann constant: CODATA 2022. */
import { expect, test } from 'vitest';
import { codesOf, fixed, offers } from './offers.ts';

const given = `rho = 1000.0  # [kg/m^3]
h = 3.0       # [m]
T = 300.0     # [K]
V = 2.0       # [m/s]
D = 0.1       # [m]
`;

test('a known constant gets its name, its number and its unit', () => {
  const text = `${given}p = rho*9.81*h  # [Pa]\n`;
  const [fix] = offers(text, ['name-number']);
  expect(fix?.confidence).toBe('likely');
  const after = fixed(text, fix as never);
  expect(after).toMatch(/\ng = 9\.81 {2}# \[m\/s\^2\] .*\np = rho\*g\*h {2}# \[Pa\]\n$/);
  expect(codesOf(after)).toEqual([]);
});

test('Stefan and Boltzmann too, and a name that is taken is not taken again', () => {
  const text = `${given}sigma_sb = "old"\nq = 5.67e-8*T**4  # [W/m^2]\n`;
  const [fix] = offers(text, ['name-number']);
  const after = fixed(text, fix as never);
  expect(after).toContain('sigma_sb_1 = 5.67e-8  # [W/(m^2 K^4)]');
  expect(after).toContain('q = sigma_sb_1*T**4');
  expect(codesOf(after)).toEqual([]);
});

test('an unknown number gets the unit that it would have to carry, as a choice', () => {
  const text = `${given}q = 4.71*V  # [W/m^2]\n`;
  const [fix] = offers(text, ['name-number']);
  expect(fix?.confidence).toBe('choice');
  expect(fixed(text, fix as never)).toContain('coeff = 4.71  # [Pa]\nq = coeff*V');
});

test('or the relation is declared empirical', () => {
  const text = `${given}q = 4.71*V**0.8*D**0.2  # [W/m^2]\n`;
  const fix = offers(text, ['empirical'])[0];
  const after = fixed(text, fix as never);
  expect(after).toContain('# empirical: q [W/m^2], V [m/s], D [m]\nq =');
  expect(codesOf(after)).toEqual([]);
});

test('inside a function the constant stands above its statement', () => {
  const text = 'def f(h, rho):\n    # h [m], rho [kg/m^3]\n    if h > 0:\n        p = 9.81*rho*h  # [Pa]\n        return p\n';
  const [fix] = offers(text, ['name-number']);
  expect(fixed(text, fix as never)).toMatch(/\n {8}g = 9\.81 .*\n {8}p = g\*rho\*h/);
});

test('not offered for pure numbers, for dimensionless mistakes, or where no number explains it', () => {
  for (const line of ['x = rho*h + V', 'q = 0.5*rho*V  # [Pa]', 'A = 0.25*D**2  # [m^2]']) expect(offers(given + line, ['name-number', 'empirical'])).toEqual([]);
});
