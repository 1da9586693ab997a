/** An old project takes the checks up: known findings, and only what changed. */
import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterEach, describe, expect, test } from 'vitest';
import { Sandbox } from './sandbox.ts';

const old = 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\nx = p + h\n';
const sound = 'p = 2.0e5  # [Pa]\nq = p\n';
let box: Sandbox | undefined;

function sandbox(files: Readonly<Record<string, string>>): Sandbox {
  box = new Sandbox(files);
  return box;
}

afterEach(() => {
  box?.remove();
  box = undefined;
});

describe('known findings', () => {
  test('are written down, and left out from then on', async () => {
    const folder = sandbox({ 'a.py': old });
    expect((await folder.run('check .')).status).toBe(1);
    expect(await folder.run('check . --write-baseline known.json')).toMatchObject({ status: 0, complaints: expect.stringContaining('known.json') });
    expect(JSON.parse(readFileSync(join(folder.folder, 'known.json'), 'utf8'))).toEqual({ version: 1, known: [{ file: 'a.py', code: 'unlike-terms', line: 'x = p + h', count: 1 }] });
    const again = await folder.run('check . --baseline known.json');
    expect(again).toMatchObject({ status: 0, complaints: 'termwise: 1 known finding left out\n' });
    expect(again.out).not.toContain('unlike-terms');
  });

  test('stay known where their line moves, and count as often as they were written down', async () => {
    const folder = sandbox({ 'a.py': old });
    await folder.run('check . --write-baseline known.json');
    folder.write('a.py', `# a line more\n\n${old}`);
    expect((await folder.run('check . --baseline known.json')).status).toBe(0);
    folder.write('a.py', `${old}x = p + h\n`);
    const { status, out } = await folder.run('check . --baseline known.json --format json');
    expect(status).toBe(1);
    expect(JSON.parse(out).findings).toHaveLength(1);
    expect(JSON.parse(out).summary.findings).toEqual({ 'unlike-terms': 1 });
  });

  test('a new fault fails the run', async () => {
    const folder = sandbox({ 'a.py': old });
    await folder.run('check . --write-baseline known.json');
    folder.write('a.py', `${old}m = 1.0  # [kg]\nt = 2.0  # [s]\ny = m + t\n`);
    const { status, out } = await folder.run('check . --baseline known.json');
    expect(status).toBe(1);
    expect(out).toContain('y = m + t');
    expect(out).not.toContain('x = p + h');
  });

  test.each([
    ['nothing of that name', 'check . --baseline none.json', 'none.json: no such file or folder'],
    ['no JSON', 'check . --baseline a.py', 'a.py: it is not JSON'],
    ['another file', 'check . --baseline other.json', 'other.json: it is no list of known findings'],
    ['both at once', 'check . --baseline a --write-baseline b', 'say one of them'],
  ])('refused: %s', async (_what, line, words) => {
    const folder = sandbox({ 'a.py': sound, 'other.json': '{"version":2}' });
    expect(await folder.run(line)).toMatchObject({ status: 2, complaints: expect.stringContaining(words) });
  });
});

describe('only what changed', () => {
  const git = (folder: Sandbox, ...args: readonly string[]): void => void execFileSync('git', ['-C', folder.folder, '-c', 'user.name=t', '-c', 'user.email=t@t.example', ...args], { stdio: 'ignore' });

  test('since the last commit, with files that are new', async () => {
    const folder = sandbox({ 'a.py': old, 'b.py': sound });
    git(folder, 'init', '-q');
    git(folder, 'add', '.');
    git(folder, 'commit', '-qm', 'first');
    expect(await folder.run('check . --changed --format json')).toMatchObject({ status: 0 });
    folder.write('b.py', old);
    folder.write('c.py', old);
    const { status, out } = await folder.run('check . --changed --format json');
    expect(status).toBe(1);
    expect(JSON.parse(out).findings.map(({ file }: { file: string }) => file)).toEqual(['b.py', 'c.py']);
    expect(await folder.run('check . --since nowhere')).toMatchObject({ status: 2, complaints: expect.stringContaining('since nowhere') });
  });

  test('outside of a repository is told', async () => {
    expect(await sandbox({ 'a.py': old }).run('check . --changed')).toMatchObject({ status: 2, complaints: expect.stringContaining('not a git repository') });
  });
});

test('known units are counted on request', async () => {
  const folder = sandbox({ 'a.py': sound, 'b.py': 'def f(a, b):\n    return a*b\n' });
  const { out } = await folder.run('check . --stats --format json');
  expect(JSON.parse(out).summary.units).toEqual({ known: 2, all: 4 });
  expect((await folder.run('check . --stats')).out).toContain('2 of 4 (50 %)');
  expect(JSON.parse((await folder.run('check . --format json')).out).summary.units).toBeUndefined();
});
