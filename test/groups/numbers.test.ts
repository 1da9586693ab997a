import { describe, expect, it } from 'vitest';
import { forms } from '../../server/src/groups/forms.ts';
import { factorOf } from '../../server/src/groups/notation.ts';
import { numberFamilies } from '../../server/src/groups/numbers/index.ts';
import { quantityKinds } from '../../server/src/groups/quantity-kinds.ts';
import { leftover } from './checks.ts';

const all = numberFamilies.flatMap((family) => family.numbers);

describe('characteristic numbers', () => {
  it('are at least 120, each with names, a symbol, an expression and a source', () => {
    expect(all.length).toBeGreaterThanOrEqual(120);
    for (const entry of all) for (const text of [...entry.names, entry.symbol, entry.expression, entry.source]) expect(text.trim()).not.toBe('');
    expect(new Set(all.map((entry) => entry.names[0])).size).toBe(all.length);
  });

  it.each(forms.map((form) => [form.entry.names[0], form] as const))('%s leaves no unit in mathjs', (_name, form) => {
    const powers = new Map(form.roles.map(({ exponent }, at) => [String(at), exponent]));
    expect(leftover(powers, new Map(form.roles.map(({ kind }, at) => [String(at), kind.dimension])))).toBe('');
    expect(form.roles.some(({ exponent }) => exponent.isZero)).toBe(false);
  });

  it('say what they find in kinds of quantity that they hold', () => {
    for (const entry of all) {
      for (const kind of entry.finds ?? []) {
        expect(quantityKinds.has(kind), `${entry.names[0]}: ${kind}`).toBe(true);
        expect(entry.forms.some((form) => form.includes(kind)), `${entry.names[0]}: ${kind}`).toBe(true);
      }
    }
  });

  // ISO 80000-11:2019 (from memory): numbers of its six clauses that scripts are likely to hold.
  it.each([
    'Reynolds', 'Euler', 'Froude', 'Grashof', 'Weber', 'Mach', 'Knudsen', 'Strouhal', 'Bejan', 'Lagrange', 'Bingham', 'Hedström', 'Bodenstein', 'Rossby', 'Ekman', 'Dean', 'Taylor', 'Galilei', 'Womersley', 'Fourier', 'Péclet',
    'Rayleigh', 'Nusselt', 'Biot', 'Stanton', 'Stefan', 'Brinkman', 'Eckert', 'Graetz', 'Archimedes', 'Bond', 'Morton', 'Marangoni', 'capillary', 'Prandtl', 'Schmidt', 'Lewis', 'Ohnesorge', 'Cauchy', 'Hooke', 'Weissenberg', 'Deborah', 'Hartmann',
    'Cowling', 'Stuart', 'Chandrasekhar', 'Roberts', 'Lundquist', 'Alfvén', 'Sommerfeld', 'Richardson', 'Hagen', 'Poiseuille', 'Laplace', 'Darcy', 'Fanning', 'Naze', 'Ampère',
  ])('hold the %s number', (name) => {
    expect(all.some((entry) => entry.names.some((one) => one.includes(name)))).toBe(true);
  });
});

describe('factors', () => {
  it.each([
    ['1/18', 1 / 18],
    ['4/pi', 4 / Math.PI],
    ['1/64*pi^2', 1 / (64 * Math.PI ** 2)],
    ['2^-1/2', Math.SQRT1_2],
    ['2*pi', 2 * Math.PI],
  ])('%s', (text, value) => {
    expect(factorOf(text).toNumber()).toBeCloseTo(value, 12);
  });
});
