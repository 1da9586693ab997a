/** The value is compared by mathjs on random numbers. Head loss after Darcy and Weisbach, and Reynolds and Froude numbers: ISO 80000-11, from memory. */
import fc from 'fast-check';
import { evaluate } from 'mathjs';
import { expect, test } from 'vitest';
import { codesOf, fixed, offersAt } from './offers.ts';

const given = `f = 0.02      # [-]
L = 100.0     # [m]
D = 0.05      # [m]
V = 2.0       # [m/s]
g = 9.81      # [m/s^2]
rho = 1000.0  # [kg/m^3]
mu = 1.0e-3   # [Pa s]
k = 0.6       # [W/(m K)]
`;
const names = ['f', 'L', 'D', 'V', 'g', 'rho', 'mu', 'k'];

function regrouped(code: string): string | undefined {
  const text = `${given}y = ${code}\n`;
  const at = offersAt(text, code).find((fix) => fix.kind === 'regroup');
  if (!at) return undefined;
  const after = fixed(text, at);
  expect(codesOf(after)).toEqual(codesOf(text));
  return after.slice(given.length + 4).trimEnd();
}

test.each([
  ['f*L*V**2/(2*g*D)', 'f*(L/D)*V**2/(2*g)'],
  ['f * L * V**2 / (2 * g * D)', 'f * (L / D) * V**2 / (2 * g)'],
  ['0.023*k*rho*V*D/mu/L', '0.023*k*rho*V*(D/L)/mu'],
  ['V*rho*V*D/mu', '(V*rho*D/mu)*V'],
  ['2*V**2/(g*D)*L', '2*V**2*(L/D)/g'],
  ['k*(L - D)/D*V', 'k*((L - D)/D)*V'],
])('%s', (before, after) => {
  expect(regrouped(before)).toBe(after);
});

test('the value stays what it was', () => {
  const factor = fc.constantFrom('f', 'L', 'D', 'V', 'g', 'rho', 'mu', 'k', 'V**2', '2', '(L - D)', 'D**3');
  fc.assert(
    fc.property(fc.array(fc.tuple(fc.constantFrom('*', '/'), factor), { minLength: 3, maxLength: 8 }), fc.array(fc.double({ min: 0.5, max: 3, noNaN: true }), { minLength: 8, maxLength: 8 }), (parts, numbers) => {
      const code = `f${parts.map(([op, text]) => op + text).join('')}`;
      const after = regrouped(code);
      if (after === undefined) return;
      const scope = Object.fromEntries(names.map((name, at) => [name, (numbers[at] as number) + at / 7]));
      const [a, b] = [code, after].map((each) => evaluate(each.replaceAll('**', '^'), { ...scope }) as number);
      expect(Math.abs((a as number) - (b as number))).toBeLessThanOrEqual(1e-9 * Math.abs(a as number));
    }),
    { numRuns: 60 },
  );
});

test.each(['f*L', 'rho*V*D/mu', 'f*(L/D)*V**2/(2*g)', 'unknown*L*V/D', 'L//D*V*f', 'L + D'])('%s is left as it is', (code) => {
  expect(regrouped(code)).toBeUndefined();
});
