/** Relations of a file, the actions on their groups, and what a product is known as: text in, text out. */
import { describe, expect, test } from 'vitest';
import { applyEdits } from '../../server/src/repairs/apply.ts';
import { groupText } from '../../server/src/service/groups-at.ts';
import { engine, filesOf } from '../harness/engine.ts';

const bench = `N    [rev/s]   2 .. 12    shaft speed
D    [m]       = 0.085     impeller diameter
rho  [kg/m^3]  = 1240      density of the paint
mu   [Pa s]    = 0.38      dynamic viscosity
P    [W]                   shaft power
`;

const files = { 'bench/bench.nomen': bench };

async function checked(text: string, file = 'bench/a.py') {
  const workspace = await engine(filesOf({ ...files, [file]: text }));
  const findings = workspace.check(file, text).findings.map(({ code }) => code);
  return { workspace, file, findings };
}

/** `P of W: N of rev/s, …`. */
async function relations(text: string, functions = false, file?: string): Promise<string[]> {
  const { workspace, file: name } = await checked(text, file);
  return workspace.groups.relations(name, { functions }).map(({ relation, line, origin }) => {
    const symbols = relation.symbols.map((each) => `${each.name} ${each.unit?.text ?? each.dimension?.toString() ?? '?'}${each.value === undefined ? '' : ` = ${each.value}`}${each.range ? ` ${each.range.low}..${each.range.high}` : ''}`);
    return `${line} ${origin}: ${symbols.join('; ')}`;
  });
}

/** The text after the action whose title begins so, at the first `at`. */
async function taken(text: string, title: string, at: string, file?: string): Promise<string | undefined> {
  const { workspace, file: name } = await checked(text, file);
  const action = workspace.groups.actions(name, text.indexOf(at)).find((each) => each.title.startsWith(title));
  return action && applyEdits(text, action.edits);
}

describe('relations', () => {
  test.each([
    ['a comment, nomenclature beside it', '# P depends on N, D, rho, mu\n', ['1 statement: P W; N rev/s 2..12; D m = 0.085; rho kg/m^3 = 1240; mu Pa s = 0.38']],
    ['the file goes before the nomenclature', 'D = 0.3  # [mm] bore\n# P depends on N, D\n', ['2 statement: P W; N rev/s 2..12; D mm = 0.3']],
    ['a symbol without a unit', '# P depends on N, D, q9\n', ['1 statement: P W; N rev/s 2..12; D m = 0.085; q9 ?']],
    ['what follows without a note', 'v = 2.0  # [m/s]\nL = 3.0  # [m]\nt = L/v\nw = 1  # [m/s]\n# w depends on L, t\n', ['5 statement: w m/s = 1; L m = 3; t T']],
    ['two values', 'L = 3.0  # [m]\nL = 4.0\n# L depends on N, D\n', ['3 statement: L m; N rev/s 2..12; D m = 0.085']],
    ['prose', '# the power depends on how fast it turns\nP = 3\n', []],
  ])('%s', async (_what, text, expected) => {
    expect(await relations(text)).toEqual(expected);
  });

  test('in documentation, with the units of the function', async () => {
    const text = 'def drag(V, L):\n    """Drag.\n\n    F depends on V, L, rho\n\n    Parameters\n    ----------\n    V : float\n        Speed [m/s]\n    L : float\n        Length [ft]\n    """\n    F = rho*V**2*L**2  # [N]\n    return F\n';
    expect(await relations(text)).toEqual(['4 statement: F N; V m/s; L ft; rho kg/m^3 = 1240']);
  });

  test('functions only where asked for, and only with every unit', async () => {
    const text = 'def speed(d, t, loud=False):\n    """Speed.\n\n    :param d: way [m]\n    :param t: time [s]\n    :return: speed [m/s]\n    """\n    return d/t\n\n\ndef other(d, x):\n    return d\n';
    expect(await relations(text)).toEqual([]);
    expect(await relations(text, true)).toEqual(['1 function: speed m/s; d m; t s']);
  });

  test('base dimensions that a nomenclature file declares', async () => {
    const text = 'unit crate\nn  [crate]    crates\nq  [crate/s]  rate\nt  [s]        time\nn depends on q, t\n';
    const { workspace } = await checked(text, 'store/store.nomen');
    const [found] = workspace.groups.relations('store/store.nomen');
    expect(found?.relation.symbols.map(({ dimension }) => dimension?.toString())).toEqual(['crate', 'T⁻¹ crate', 'T']);
  });
});

const script = `N = 6.0  # [rev/s]
D = 0.085  # [m]
rho = 1240.0  # [kg/m^3]
mu = 0.38  # [Pa s]
# P depends on N, D, rho, mu
print(N)
`;

describe('actions', () => {
  test('the groups as a comment', async () => {
    expect(await taken(script, 'Write the dimensionless groups', 'P depends')).toBe(script.replace('rho, mu\n', 'rho, mu\n# Ne = P/(rho*N**3*D**5)   power number\n# Re = rho*N*D**2/mu   Reynolds number\n'));
  });

  test('definitions behind the last symbol, without a group that cannot be computed', async () => {
    const text = await taken(script, 'Define', 'P depends');
    expect(text).toBe(script.replace('[Pa s]\n', '[Pa s]\nRe = rho*N*D**2/mu  # [1] Reynolds number\n'));
    expect((await checked(text as string)).findings).toEqual([]);
  });

  test('definitions in coherent units', async () => {
    const text = await taken(script.replace('D = 0.085  # [m]', 'D = 85.0  # [mm]').replace('rho = 1240.0  # [kg/m^3]', 'rho = 1.24  # [g/cm^3]'), 'Define', 'P depends');
    expect(text).toContain('\nRe = rho*N*D**2/mu/1000  # [1] Reynolds number\n');
    expect((await checked(text as string)).findings).toEqual([]);
  });

  test('definitions in a function', async () => {
    const text = 'def power(N, D, rho, mu):\n    """Power.\n\n    P depends on N, D, rho, mu\n    """\n    return 3.0\n';
    expect(await taken(text, 'Define', 'P depends')).toBe(text.replace('    return', '    Re = rho*N*D**2/mu  # [1] Reynolds number\n    return'));
    expect(await taken(text, 'Write the dim', 'P depends')).toContain('rho, mu\n    Ne = P/(rho*N**3*D**5)   power number\n    Re = rho*N*D**2/mu   Reynolds number\n    """');
  });

  test('definitions in a nomenclature file, once', async () => {
    const text = `${bench}P depends on N, D, rho, mu\n`;
    const once = await taken(text, 'Define', 'P depends', 'bench/bench.nomen');
    expect(once).toBe(`${text}Ne [1] = P/(rho*N^3*D^5)   power number\nRe [1] = rho*N*D^2/mu   Reynolds number\n`);
    expect((await checked(once as string, 'bench/bench.nomen')).findings).toEqual([]);
    expect(await taken(once as string, 'Define', 'P depends', 'bench/bench.nomen')).toBeUndefined();
  });

  test('the equation with an unknown function', async () => {
    expect(await taken(script, 'Write P =', 'P depends')).toContain('rho, mu\n# P = rho*N**3*D**5 * phi(Re)\n');
  });

  test('another set of repeating symbols', async () => {
    expect(await taken(script, 'Write the groups with D, rho, mu', 'P depends')).toContain('# Pi_1 = P*D*rho**2/mu**3');
  });

  test('are not there without symbols in the scope, units, or a relation', async () => {
    expect(await taken('# P depends on N, D, rho, mu\n', 'Define', 'P depends')).toBeUndefined();
    const { workspace } = await checked('# P depends on N, q8, q9\nx = 1\n');
    expect(workspace.groups.actions('bench/a.py', 3)).toEqual([{ kind: 'missing-units', title: 'Dimensionless groups need the unit of q8, q9', edits: [] }]);
    expect(workspace.groups.actions('bench/a.py', 27)).toEqual([]);
  });

  test('line ends are kept', async () => {
    expect(await taken(script.replaceAll('\n', '\r\n'), 'Write P =', 'P depends')).toContain('rho, mu\r\n# P = rho*N**3*D**5 * phi(Re)\r\n');
  });
});

describe('a product by its name', () => {
  const named = 'def f(N, D, rho, mu):\n    Re = rho*N*D**2/mu\n    return 3.0*(D*D*rho*N/mu)**0.5\n';
  test('with its factors in another order', async () => {
    expect(await taken(named, 'Replace', 'D*D*rho')).toBe(named.replace('(D*D*rho*N/mu)', '(Re)'));
  });
  test.each([
    ['changed meanwhile', named.replace('    return', '    D = 2*D\n    return')],
    ['of another product', named.replace('Re = rho*N*D**2/mu', 'Re = rho*N*D/mu')],
    ['with a number in it', named.replace('Re = rho', 'Re = 2*rho')],
    ['defined behind it', 'def f(N, D, rho, mu):\n    x = D*D*rho*N/mu\n    Re = rho*N*D**2/mu\n    return Re\n'],
  ])('not %s', async (_what, text) => {
    expect(await taken(text, 'Replace', 'D*D*rho')).toBeUndefined();
  });
});

describe('what stands at a place', () => {
  test.each([
    ['Re = rho*N*D**2/mu\n', 'N*D', 'Reynolds number, 47.15 to 282.9'],
    ['x = 3 + mu/(rho*N*D**2)\n', 'N*D', 'reciprocal of Reynolds number, 0.003535 to 0.02121'],
    ['x = rho*N*D/mu\n', 'N*D', undefined],
    ['x = N + D\n', 'D', undefined],
  ])('%s', async (text, at, expected) => {
    const { workspace, file } = await checked(text);
    const found = workspace.groups.at(file, text.indexOf(at));
    expect(found && groupText(found)).toBe(expected);
  });
});

describe('selected statements and equations', () => {
  /** The text after the action on the part between two bars. */
  async function onSelection(marked: string, title: string): Promise<string | undefined> {
    const [before = '', inside = '', after = ''] = marked.split('|');
    const text = before + inside + after;
    const { workspace, file } = await checked(text);
    const action = workspace.groups.actions(file, before.length, { start: before.length, end: before.length + inside.length }).find((each) => each.title.startsWith(title));
    return action && applyEdits(text, action.edits);
  }

  const pendulum = 'from math import pi, sqrt\nl = 1.0  # [m]\ng = 9.81  # [m/s^2]\n';

  test('an equation: its target depends on what it reads, without functions and pi', async () => {
    expect(await onSelection(`${pendulum}T = 2*pi*|sq|rt(l/g)  # [s]\n`, 'Write T =')).toBe(`${pendulum}# T = sqrt(l/g) * C\nT = 2*pi*sqrt(l/g)  # [s]\n`);
  });

  test('several statements: the last target depends on what none of them gives', async () => {
    const text = `|a = N*D\nb = rho*a*D/mu\nP = b*rho*N**3*D**5|  # [W]\n`;
    expect(await onSelection(text, 'Write P =')).toContain('# P = rho*N**3*D**5 * phi(Re)\na = N*D\n');
  });

  test('a unit that is missing is asked for', async () => {
    const { workspace, file } = await checked(`${pendulum}T = l*g*q9\n`);
    const at = `${pendulum}T = l`.length;
    expect(workspace.groups.actions(file, at, { start: at, end: at }).map(({ kind }) => kind)).toEqual(['missing-units']);
  });

  test.each([['two symbols', 'x = 2*l\n'], ['no assignment', 'print(l, g)\n'], ['nothing asked for', undefined]])('nothing is offered: %s', async (_what, line) => {
    const text = `${pendulum}${line ?? 'T = sqrt(l/g)  # [s]\n'}`;
    const { workspace, file } = await checked(text);
    const at = pendulum.length + 5;
    expect(workspace.groups.actions(file, at, line === undefined ? undefined : { start: at, end: at })).toEqual([]);
  });
});
