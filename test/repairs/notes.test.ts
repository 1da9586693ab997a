import { expect, test } from 'vitest';
import { becomes, codesOf, fixed, offers, offersAt } from './offers.ts';

test.each([
  ['a misspelt unit', 'V = 2.0  # [metrs/s]', 'likely: V = 2.0  # [metres/s]'],
  ['a product behind a slash', 'k = 2.0  # [W/m K]', 'likely: k = 2.0  # [W/(m K)]'],
  ['letters of the wrong case', 'k = 2.0  # [w/m/K]', 'proven: k = 2.0  # [W/m/K]'],
  ['a letter that the description decides', 'T = 2.0  # [C] air temperature', 'proven: T = 2.0  # [degC] air temperature'],
])('%s', (_, line, expected) => {
  expect(becomes(line, ['note'])).toEqual([expected]);
  expect(codesOf(fixed(line, offers(line, ['note'])[0] as never))).toEqual([]);
});

test('what cannot be read and resembles nothing is left alone', () => {
  expect(offers('V = 2.0  # [qqzzv^^2]', ['note'])).toEqual([]);
});

const twice = `def f(V, rho):
    """Pressure.

    Parameters
    ----------
    V : float
        Speed [m/s]
    rho : float
        Density [kg/m^2]
    """
    p = 0.5*rho*V**2  # [Pa]
    q = rho*9.81*V/V*p/p*1.0*2
    head = 2.0  # [m]
    g = 9.8  # [m/s^2]
    t = p + rho*g*head
    return t
`;

test('the note that explains several findings is corrected first, with the evidence', () => {
  const [first] = offers(twice);
  expect(first?.title).toBe('Correct the note on `rho` from [kg/m^2] to [kg/m^3]: 2 of 2 uses need it');
  expect(codesOf(fixed(twice, first as never)).filter((code) => code !== 'hidden-unit')).toEqual([]);
});

test('the note on the target is a choice', () => {
  const text = 'rho = 1000.0  # [kg/m^3]\nV = 2.0  # [m/s]\nflux = rho*V  # [kg/s]';
  expect(becomes(text, ['note'])).toContain('choice: flux = rho*V  # [kg/(m^2 s)]');
});

test('an inferred unit is written where the symbol is given its value', () => {
  const text = 'rho = 1000.0  # [kg/m^3]\nV = 2.0  # [m/s]\np = 0.5*rho*V**2\nq = p*V  # flux\n';
  expect(fixed(text, offersAt(text, 'p =')[0] as never)).toBe(text.replace('V**2', 'V**2  # [Pa]'));
  expect(fixed(text, offersAt(text, 'q =')[0] as never)).toBe(text.replace('# flux', '# [W/m^2] flux'));
  expect(offersAt(text, 'V =')).toEqual([]);
});

test('in the form of the documentation, and as a comment where there is none', () => {
  const numpy = 'p = 1.0  # [Pa]\ndef f(x):\n    """Sum.\n\n    Parameters\n    ----------\n    x : float\n        Static part.\n    """\n    return p + x\n';
  expect(fixed(numpy, offersAt(numpy, 'x):')[0] as never)).toContain('Static part [Pa].');
  const google = 'p = 1.0  # [Pa]\ndef f(x):\n    """Sum.\n\n    Args:\n        x (float): Static part\n    """\n    return p + x\n';
  expect(fixed(google, offersAt(google, 'x):')[0] as never)).toContain('x (float): Static part [Pa]');
  const bare = 'p = 1.0  # [Pa]\ndef f(x):\n    y = p + x\n    return y\n';
  const after = fixed(bare, offersAt(bare, 'x):')[0] as never);
  expect(after).toContain('    # x [Pa]\n    y = p + x');
  expect(offersAt(after, 'x):').filter((fix) => fix.kind === 'note')).toEqual([]);
});

test('the whole function at its name', () => {
  const text = 'p = 1.0  # [Pa]\ndef f(x, y):\n    z = p + x\n    return z + y\n';
  const all = offersAt(text, 'f(').find((fix) => fix.title.includes('2 units'));
  expect(fixed(text, all as never)).toBe('p = 1.0  # [Pa]\ndef f(x, y):\n    # x [Pa]\n    # y [Pa]\n    z = p + x\n    return z + y\n');
});

test('a unit at the end of a name is proposed and never assumed', () => {
  const text = 'p_kPa = 101.3\nT_degC = read()\nx_max = 3.0\nh_in = 2.0\nn_a = 4\n';
  expect(offersAt(text, 'p_kPa').map((fix) => [fix.confidence, fix.title])).toEqual([['choice', 'Note `p_kPa` as [kPa], which its uses need']]);
  for (const name of ['x_max', 'h_in', 'n_a']) expect(offersAt(text, name)).toEqual([]);
});
