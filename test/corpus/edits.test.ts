/** The seeded edits are what the corpus run says they are, and are counted as they should be. */
import { describe, expect, test } from 'vitest';
import { engine } from '../harness/engine.ts';
import { loadFrontEnd } from '../harness/front-ends.ts';
import { restored, restoredLine } from './repairs.ts';
import { readCorpusArguments } from './arguments.ts';
import { seedEdits } from './edits.ts';
import { tryEdits } from './try-edits.ts';

const frontEnd = await loadFrontEnd('python');

function documented(body: string, params = 'V, D, n'): string {
  return `def f(${params}):\n    '''Something.\n\n    Parameters\n    ----------\n    V : float\n        Velocity [m/s]\n    D : float\n        Diameter [m]\n    n : int\n        Count [-]\n\n    Returns\n    -------\n    q : float\n        Velocity head times something [m^2/s]\n    '''\n${body}`;
}

/** The edited line of each edit. */
function edited(text: string): readonly string[] {
  return seedEdits(frontEnd, 'f.py', text).map(({ kind, span, replacement }) => {
    const after = text.slice(0, span.start) + replacement + text.slice(span.end);
    return `${kind}: ${after.slice(after.lastIndexOf('\n', span.start) + 1).split('\n', 1)[0]?.trim()}`;
  });
}

describe('one use of a documented parameter with a dimension', () => {
  test.each<[string, string, readonly string[]]>([
    ['in a product', documented('    return 2*V\n'), ['squared: return 2*(V**2)', 'dropped: return 2*1.0']],
    ['under a power', documented('    return n*V**2\n'), ['squared: return n*(V**2)**2', 'dropped: return n*1.0**2']],
    ['in a sum only squared', documented('    return V + 1\n'), ['squared: return (V**2) + 1']],
    ['not in an exponent', documented('    return 2**V\n'), []],
    ['not as an argument', documented('    return g(V)\n'), []],
    ['not after it has been assigned again', documented('    V = h(V)\n    return 2*V\n'), []],
    ['not where it is dimensionless', documented('    return 2*n\n'), []],
    ['not without notes', 'def f(V):\n    return 2*V\n', []],
  ])('%s', (_what, text, lines) => {
    expect(edited(text)).toEqual(lines);
  });

  test('is the same every time', () => {
    const text = documented('    a = V*D/n\n    b = a*V + D*V*V\n    return b\n');
    expect(edited(text)).toEqual(edited(text));
    expect(edited(text)).toHaveLength(2);
  });
});

describe('counting', async () => {
  const workspace = await engine();
  const count = (text: string): readonly object[] => tryEdits(workspace, { file: 'f.py', text, language: 'python' }, seedEdits(frontEnd, 'f.py', text)).map(({ reported, placed, elsewhere, line }) => ({ reported, placed, elsewhere, line }));

  test('an edit that contradicts the documented result', () => {
    const line = documented('').split('\n').length;
    expect(count(documented('    return V*D/n\n'))).toEqual([{ reported: true, placed: true, elsewhere: false, line }, { reported: true, placed: true, elsewhere: false, line }]);
  });

  test('an edit that nothing speaks against', () => {
    expect(count(documented('    x = 2*V\n    return unknown(x)\n')).map((each) => (each as { reported: boolean }).reported)).toEqual([false, false]);
  });

  test('a finding that was there before does not count', () => {
    const text = documented('    bad = V + D\n    x = 2*V\n    return unknown(x)\n');
    expect(workspace.check('f.py', text).findings.length).toBeGreaterThan(0);
    const dropped = tryEdits(workspace, { file: 'f.py', text, language: 'python' }, seedEdits(frontEnd, 'f.py', text)).find((each) => each.edit.kind === 'dropped');
    expect(dropped).toMatchObject({ reported: false, placed: false });
  });
});

test('arguments', () => {
  expect(readCorpusArguments(['ht', '--seed-edits', '--list', 'all'])).toEqual({ folder: 'ht', language: undefined, seedEdits: true, missed: false, repairs: false, list: ['all'], unread: 40 });
  expect(readCorpusArguments([])).toContain('usage');
  expect(readCorpusArguments(['a', '--language', 'latin'])).toContain('python');
  expect(readCorpusArguments(['a', '--nonsense'])).toContain('usage');
});

test('a repair that brings the text back is counted with its rank', async () => {
  const workspace = await engine();
  const original = 'rho = 1000.0  # [kg/m^3]\nV = 2.0  # [m/s]\np = 0.5*rho*V**2  # [Pa]\n';
  const edited = original.replace('V**2', 'V');
  const { findings } = workspace.check('/a.py', edited);
  expect(restored(workspace, '/a.py', edited, original, findings)).toMatchObject({ offered: true, rank: 1 });
  expect(restored(workspace, '/a.py', edited, `${original}# another`, findings)).toMatchObject({ offered: true, rank: undefined });
  expect(restoredLine([{ offered: true, rank: 1, time: 2 }, { offered: true, rank: undefined, time: 4 }])).toContain('in 1 (50.0 %)');
});
