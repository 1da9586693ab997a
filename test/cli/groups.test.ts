/** `termwise groups`, from the command line to its output. */
import { afterAll, describe, expect, test } from 'vitest';
import { Sandbox } from './sandbox.ts';

const bench = `N    [rev/s]   2 .. 12    shaft speed
D    [m]       = 0.085     impeller diameter
rho  [kg/m^3]  = 1240      density of the paint
mu   [Pa s]    = 0.38      dynamic viscosity
P    [W]                   shaft power
P depends on N, D, rho, mu
`;

const box = new Sandbox({
  'bench.nomen': bench,
  'swing.py': 't = 1.1  # [s] period\nl = 0.3  # [m] length\nm = 0.2  # [kg]\ng = 9.81  # [m/s^2]\n# t depends on l, m, g\n',
  'open.py': '# P depends on N, D, q8\n',
  'none.py': 'x = 1\n',
  'speed.py': 'def speed(d, t):\n    """Speed.\n\n    :param d: way [m]\n    :param t: time [s]\n    :return: speed [m/s]\n    """\n    return d/t\n',
});
afterAll(() => box.remove());

describe('text', () => {
  test('matrix, rank, groups with names and values, the equation', async () => {
    const { out, status } = await box.run('groups bench.nomen');
    expect(status).toBe(0);
    expect(out.split('\n')).toEqual([
      'bench.nomen:6  P depends on N, D, rho, mu',
      '',
      '           P   N  D  rho  mu',
      '  length   2   .  1   -3  -1',
      '  mass     1   .  .    1   1',
      '  time    -3  -1  .    .  -1',
      '',
      '  rank 3, repeating symbols N, D, rho',
      '',
      '  P/(rho*N^3*D^5)   power number',
      '  rho*N*D^2/mu      Reynolds number, 47.15 to 282.9',
      '',
      '  P = rho*N^3*D^5 * phi(Re)',
      '',
    ]);
  });
  test('a symbol that takes no part, with the reason', async () => {
    expect((await box.run('groups swing.py')).out).toContain('  m is in no group: mass: nothing else here has mass\n');
  });
  test('units that are missing are asked for by name', async () => {
    const { out, status } = await box.run('groups open.py');
    expect(status).toBe(1);
    expect(out).toContain('  q8 is in no group: its unit is not known\n');
    expect(out).not.toContain('phi');
  });
  test('alternatives', async () => {
    expect((await box.run('groups bench.nomen --alternatives')).out).toContain('  with D, rho, mu repeating\n  P*D*rho^2/mu^3\n');
  });
});

describe('requests', () => {
  test('repeating symbols', async () => {
    expect((await box.run('groups bench.nomen --repeating D,rho,mu')).out).toContain('repeating symbols D, rho, mu\n\n  P*D*rho^2/mu^3');
  });
  test('a group to keep', async () => {
    expect((await box.run('groups bench.nomen --keep mu/(rho*N*D**2)')).out).toContain('  mu/(rho*N*D^2)');
  });
  test.each([
    ['--repeating N,D', '3 repeating symbols are needed, 2 given'],
    ['--repeating N,D,P', 'P is what the relation is for'],
    ['--keep rho*N', 'rho N is not dimensionless'],
  ])('%s cannot be met', async (words, expected) => {
    const { out, status } = await box.run(`groups bench.nomen ${words}`);
    expect(out).toContain(expected);
    expect(status).toBe(1);
  });
});

describe('other forms', () => {
  test('JSON, with the keys of the contract first and in its order', async () => {
    const { out } = await box.run('groups bench.nomen swing.py --format json');
    const document = JSON.parse(out) as { version: number; relations: Record<string, unknown>[] };
    expect(out.startsWith('{"version":1,"relations":[{"file":"bench.nomen","line":6,"dependent":"P","symbols":[')).toBe(true);
    expect(Object.keys(document.relations[0] ?? {}).slice(0, 9)).toEqual(['file', 'line', 'dependent', 'symbols', 'rank', 'repeating', 'groups', 'unmatched', 'alternatives']);
    expect(out).toContain('{"exponents":{"N":"1","D":"2","rho":"1","mu":"-1"},"recognised":["Reynolds number"],"expression":"rho*N*D^2/mu"}');
    expect(out).toContain('"unmatched":[{"symbol":"m","reason":"mass: nothing else here has mass"}]');
    expect(document.relations.map(({ file }) => file)).toEqual(['bench.nomen', 'swing.py']);
  });
  test('LaTeX and Markdown', async () => {
    expect((await box.run('groups bench.nomen --latex')).out).toContain('\\frac{\\rho\\,N\\,D^{2}}{\\mu}');
    expect((await box.run('groups bench.nomen --markdown')).out).toContain('| Reynolds number |');
  });
  test('functions', async () => {
    expect((await box.run('groups speed.py')).complaints).toContain('no relation here');
    expect((await box.run('groups speed.py --functions')).out).toContain('speed.py:1  speed depends on d, t');
  });
});

test.each([
  ['groups', 'No file given.'],
  ['groups none.py --format yaml', 'Unknown format yaml'],
  ['groups none.py --repeat N', 'Unknown option --repeat. Did you mean --repeating?'],
  ['groups none.py --latex --markdown', 'Only one form'],
  ['groups bench.nomen --keep rho+N', 'expected a product'],
  ['groups gone.py', 'gone.py'],
])('%s is refused', async (line, words) => {
  const { status, complaints, out } = await box.run(line);
  expect(status).toBe(2);
  expect(complaints).toContain(words);
  expect(out).toBe('');
});

test('help', async () => {
  expect(await box.run('help groups')).toMatchObject(await box.run('groups --help'));
  expect(await box.run('groups --help')).toMatchObject({ status: 0, out: expect.stringContaining('--repeating') as string });
});
