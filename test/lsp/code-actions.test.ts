/** Code actions over the protocol: asked for, applied as an editor would, and the findings that are left. */
import { afterEach, describe, expect, test } from 'vitest';
import type { CodeAction, TextEdit } from 'vscode-languageserver/node.js';
import { offsetOf } from '../../server/src/lsp/positions.ts';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { Client } from './client.ts';

let client: Client | undefined;

async function started(options = {}): Promise<Client> {
  client = await Client.start(options);
  return client;
}

afterEach(async () => {
  await client?.stop();
  client = undefined;
});

function place(text: string, part: string): { line: number; character: number } {
  const before = text.slice(0, text.indexOf(part)).split('\n');
  return { line: before.length - 1, character: (before.at(-1) as string).length };
}

/** The text after an action's edits. */
function applied(text: string, action: CodeAction | undefined): string {
  const lines = new LineIndex(text);
  const changes: TextEdit[] = Object.values(action?.edit?.changes ?? {}).flat();
  const edits = changes.map(({ range, newText }) => ({ start: offsetOf(lines, range.start, 'utf-16'), end: offsetOf(lines, range.end, 'utf-16'), newText }));
  return edits.sort((a, b) => b.start - a.start).reduce((all, { start, end, newText }) => all.slice(0, start) + newText + all.slice(end), text);
}

const tank = 'p_kPa = 250.0  # [kPa]\np = p_kPa  # [Pa]\nrho = 998.0  # [kg/m^3]\nV = 2.0  # [m/s]\nq = 0.5*rho*V  # [Pa]\n';

describe('fixes of a finding', () => {
  test('a conversion is preferred, carries its finding, and settles it', async () => {
    const editor = await started();
    await editor.open('tank.py', tank);
    await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
    const [first] = await editor.actions('tank.py', place(tank, 'p_kPa  # [Pa]'));
    expect(first).toMatchObject({ kind: 'quickfix', isPreferred: true });
    expect(first?.diagnostics?.map(({ code }) => code)).toEqual(['scale-mismatch']);
    const after = applied(tank, first);
    expect(after.split('\n')[1]).toBe('p = p_kPa*1000  # [Pa]');
    await editor.change('tank.py', { text: after });
    await editor.untilCodes('tank.py', ['unlike-result']);
  });

  test('a repair brings the missing square back', async () => {
    const editor = await started();
    await editor.open('tank.py', tank);
    await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
    const actions = await editor.actions('tank.py', place(tank, '0.5*rho*V'));
    expect(applied(tank, actions[0])).toContain('q = 0.5*rho*V**2');
    expect(actions.length).toBeGreaterThan(1);
  });

  test('silencing asks for its reason where the editor can select it', async () => {
    const editor = await started({ options: { select: true } });
    await editor.open('tank.py', tank);
    await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
    const allow = (await editor.actions('tank.py', place(tank, '0.5*rho*V'))).find(({ command }) => command !== undefined);
    const after = applied(tank, allow).split('\n');
    const [uri, range] = allow?.command?.arguments ?? [];
    expect(uri).toBe(editor.uri('tank.py'));
    const written = after[range.start.line]?.slice(range.start.character, range.end.character);
    expect(written).toBe('state the reason');
  });

  test('an editor that cannot select is not asked to', async () => {
    const editor = await started();
    await editor.open('tank.py', tank);
    await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
    expect((await editor.actions('tank.py', place(tank, '0.5*rho*V'))).filter(({ command }) => command)).toEqual([]);
  });

  test('a line without a finding offers no repair', async () => {
    const editor = await started();
    await editor.open('tank.py', tank);
    await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
    expect(await editor.actions('tank.py', place(tank, 'V = 2.0'), undefined, ['quickfix'])).toEqual([]);
  });
});

test('on save only what a finding proves is changed', async () => {
  const editor = await started();
  await editor.open('tank.py', tank);
  await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
  const all = await editor.actions('tank.py', { line: 0, character: 0 }, { line: 5, character: 0 }, ['source.fixAll']);
  expect(all).toHaveLength(1);
  expect(all[0]).toMatchObject({ kind: 'source.fixAll.termwise' });
  expect(applied(tank, all[0])).toBe(tank.replace('p = p_kPa ', 'p = p_kPa*1000 '));
  // Asking changed nothing: the document still has what it had.
  await editor.change('tank.py', { text: `${tank}\n` });
  await editor.untilCodes('tank.py', ['scale-mismatch', 'unlike-result']);
});

describe('groups of a relation', () => {
  const mixer = '# P [W], N [1/s], D [m], rho [kg/m^3], mu [Pa s]\n# P depends on N, D, rho, mu\nN = 4.0\nD = 0.085\nrho = 1240.0\nmu = 0.38\n';

  test('are written as words, as definitions, and as an equation', async () => {
    const editor = await started();
    await editor.open('mixer.py', mixer);
    await editor.untilCodes('mixer.py', []);
    const actions = await editor.actions('mixer.py', place(mixer, 'P depends'));
    expect(actions.every(({ kind }) => kind?.startsWith('refactor.rewrite'))).toBe(true);
    expect(applied(mixer, actions.find(({ title }) => title.startsWith('Define')))).toMatch(/Re = rho\*N\*D\*\*2\/mu {2}# \[1\] Reynolds number/);
    expect(applied(mixer, actions.find(({ title }) => title.includes('phi(Re)')))).toContain('# P = rho*N**3*D**5 * phi(Re)');
  });

  test('a unit that is missing is asked for by name', async () => {
    const editor = await started();
    const open = mixer.replace(', mu [Pa s]', '');
    await editor.open('mixer.py', open);
    await editor.untilCodes('mixer.py', []);
    const asked = (await editor.actions('mixer.py', place(open, 'P depends'))).filter(({ disabled }) => disabled);
    expect(asked.map(({ disabled }) => disabled?.reason)).toEqual(['Dimensionless groups need the unit of mu']);
  });
});
