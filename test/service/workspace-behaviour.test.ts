/** The facade: files that import each other, permissions, reuse between versions of a text. */
import fc from 'fast-check';
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { CheckResult, Settings } from '../../server/src/service/contract.ts';
import { defaultSettings, engine, filesOf } from '../harness/engine.ts';

const codes = (result: CheckResult): readonly string[] => result.findings.filter((each) => each.severity !== 'hint').map((each) => each.code);
const picture = (result: CheckResult): string => JSON.stringify(result.findings);

async function check(texts: Record<string, string>, file: string, settings: Settings = defaultSettings): Promise<readonly string[]> {
  return codes((await engine(filesOf(texts), settings)).check(file, texts[file] as string));
}

const wrong = 'L = 2.0  # [m]\nt = 3.0  # [s]\nx = L + t\n';

describe('permissions', () => {
  it.each([
    ['on the line', 'L = 2.0  # [m]\nt = 3.0  # [s]\nx = L + t  # termwise: allow unlike-terms — a plot wants it so\n', []],
    ['on the line above', 'L = 2.0  # [m]\nt = 3.0  # [s]\n# termwise: allow unlike-terms — a check of ours\nx = L + t\n', []],
    ['for the whole file', `# termwise: allow unlike-terms — generated\n${wrong}`, []],
    ['of another code', 'L = 2.0  # [m]\nt = 3.0  # [s]\nx = L + t  # termwise: allow scale-mismatch — no\n', ['unlike-terms']],
    ['without a reason', 'L = 2.0  # [m]\nt = 3.0  # [s]\nx = L + t  # termwise: allow unlike-terms\n', ['unlike-terms', 'unreadable-unit']],
  ])('%s', async (_name, text, expected) => {
    expect([...(await check({ 'w/a.py': text }, 'w/a.py'))].sort()).toEqual(expected);
  });

  it('follows the severities of the settings', async () => {
    expect(await check({ 'w/a.py': wrong }, 'w/a.py', { ...defaultSettings, severities: { 'unlike-terms': 'off' } })).toEqual([]);
  });
});

describe('imports', () => {
  const flow = 'def speed(Q, A):\n    """Mean speed.\n\n    Parameters\n    ----------\n    Q : float\n        Flow [m^3/s]\n    A : float\n        Area [m^2]\n\n    Returns\n    -------\n    float\n        [m/s]\n    """\n    return Q / A\n';
  const use = (head: string, call: string): string => `${head}\nh = 2.0  # [m]\nA = 0.1  # [m^2]\nv = ${call}(h, A)\n`;
  it.each([
    ['a module beside', { 'w/flow.py': flow, 'w/a.py': use('import flow', 'flow.speed') }],
    ['under another name', { 'w/flow.py': flow, 'w/a.py': use('from flow import speed as s', 's') }],
    ['all names', { 'w/flow.py': flow, 'w/a.py': use('from flow import *', 'speed') }],
    ['a package', { 'w/p/__init__.py': '', 'w/p/flow.py': flow, 'w/a.py': use('from p.flow import speed', 'speed') }],
    ['relative', { 'w/p/__init__.py': '', 'w/p/flow.py': flow, 'w/p/a.py': use('from .flow import speed', 'speed') }],
    ['in a circle', { 'w/flow.py': `import a\n${flow}`, 'w/a.py': use('import flow', 'flow.speed') }],
  ])('%s', async (_name, texts) => {
    const file = 'w/p/a.py' in texts ? 'w/p/a.py' : 'w/a.py';
    expect(await check(texts as unknown as Record<string, string>, file)).toEqual(['unlike-result']);
  });

  it('reads a nomenclature file again when told that it changed', async () => {
    const texts: Record<string, string> = { 'w/n.nomen': 'L [m]\nt [s]\n', 'w/a.py': 'x = L + t\n' };
    const workspace = await engine(filesOf(texts));
    expect(codes(workspace.check('w/a.py', texts['w/a.py'] as string))).toEqual(['unlike-terms']);
    texts['w/n.nomen'] = 'L [m]\nt [m]\n';
    workspace.invalidate('w/n.nomen');
    expect(codes(workspace.check('w/a.py', texts['w/a.py'] as string))).toEqual([]);
  });
});

describe('edits', () => {
  const examples = readdirSync('examples').filter((name) => name.endsWith('.py')).map((name) => readFileSync(`examples/${name}`, 'utf8'));
  const edits = fc.array(fc.tuple(fc.nat(), fc.nat(12), fc.constantFrom('', ' ', '\n', '# [m]', '*2', '**2', '/1000', 'x = 1  # [s]\n', '(', '"""')), { minLength: 1, maxLength: 5 });

  it.each(examples.map((text, at) => [at, text] as const))('example %i: after edits the findings are those of a fresh check', async (_at, text) => {
    const kept = await engine();
    await fc.assert(fc.asyncProperty(edits, async (steps) => {
      let now = text;
      kept.check('w/a.py', now);
      for (const [place, removed, put] of steps) {
        const at = place % (now.length + 1);
        now = now.slice(0, at) + put + now.slice(at + removed);
        kept.check('w/a.py', now);
      }
      const fresh = await engine();
      expect(picture(kept.check('w/a.py', now))).toBe(picture(fresh.check('w/a.py', now)));
    }), { numRuns: 12 });
  });
});
