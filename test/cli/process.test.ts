/** The built command as a process: start, pipes, the shipped assets. */
import { spawn, spawnSync } from 'node:child_process';
import { chmodSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { faulty, Sandbox } from './sandbox.ts';

const root = join(import.meta.dirname, '../..');
const dist = mkdtempSync(join(tmpdir(), 'termwise-dist-'));
const command = join(dist, 'termwise.js');
const box = new Sandbox({ 'faulty.py': faulty, ...Object.fromEntries(Array.from({ length: 300 }, (_, at) => [`many/f${at}.py`, faulty])) });

beforeAll(() => {
  const { status, stderr } = spawnSync(process.execPath, [join(root, '.tools/build.mjs'), dist], { encoding: 'utf8' });
  if (status !== 0) throw new Error(stderr);
});
afterAll(() => {
  box.remove();
  rmSync(dist, { recursive: true, force: true });
});

function termwise(args: readonly string[], input = ''): { status: number | null; stdout: string; stderr: string } {
  return spawnSync(process.execPath, [command, ...args], { cwd: box.folder, encoding: 'utf8', input, env: { ...process.env, COLUMNS: '72' } });
}

test('tells its version', () => {
  const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')) as { version: string };
  expect(termwise(['--version'])).toMatchObject({ status: 0, stdout: `termwise ${version}\n`, stderr: '' });
});

test('checks with the grammars and signatures that lie beside it', () => {
  const { status, stdout, stderr } = termwise(['check', 'faulty.py']);
  expect({ status, stderr }).toEqual({ status: 1, stderr: '' });
  expect(stdout).toContain('faulty.py:3:9  error  unlike-terms');
  const logarithm = termwise(['check', '-', '--language', 'python', '--format', 'json'], 'import math\nt = 3.0  # [s]\nx = math.exp(t)\n');
  expect(JSON.parse(logarithm.stdout)).toMatchObject({ findings: [{ code: 'dimensioned-argument' }] });
});

test('explains a code', () => {
  expect(termwise(['help', 'scale-mismatch'])).toMatchObject({ status: 0, stdout: readFileSync(join(root, 'server/src/findings/checks/scale-mismatch.md'), 'utf8') });
});

test('bad usage goes to standard error with status 2', () => {
  expect(termwise(['check', '--formt', 'json'])).toEqual(expect.objectContaining({ status: 2, stdout: '', stderr: 'termwise: Unknown option --formt. Did you mean --format?\nSee termwise --help.\n' }));
  expect(termwise([])).toMatchObject({ status: 2, stdout: '' });
});

test('folders and files without permission are named, the rest is checked', () => {
  const shut = ['shut', 'shut.py'].map((name) => join(box.folder, 'mixed', name));
  box.write('mixed/shut/in.py', faulty);
  box.write('mixed/shut.py', faulty);
  box.write('mixed/open.py', faulty);
  for (const path of [dist, box.folder]) chmodSync(path, 0o755);
  for (const path of shut) chmodSync(path, 0);
  // The administrator may read everything, so that somebody else has to run it.
  const nobody = process.getuid?.() === 0 ? { uid: 65534, gid: 65534 } : {};
  const { status, stdout, stderr } = spawnSync(process.execPath, [command, 'check', 'mixed', '--format', 'json'], { cwd: box.folder, encoding: 'utf8', ...nobody });
  for (const path of shut) chmodSync(path, 0o755);
  expect(stderr.split('\n')).toEqual(['termwise: mixed/shut: no permission to read it', 'termwise: mixed/shut.py: no permission to read it', '']);
  expect(status).toBe(2);
  expect(JSON.parse(stdout)).toMatchObject({ summary: { files: 1, findings: { 'unlike-terms': 1 } } });
});

describe('ends quietly', () => {
  test('when its reader goes away', async () => {
    const child = spawn(process.execPath, [command, 'check', 'many', '--format', 'text'], { cwd: box.folder });
    let complaints = '';
    child.stderr.on('data', (data: Buffer) => {
      complaints += data.toString();
    });
    child.stdout.once('data', () => child.stdout.destroy());
    const status = await new Promise((done) => child.on('exit', done));
    expect(complaints).toBe('');
    expect([0, 1]).toContain(status);
  });

  test('when it is interrupted', async () => {
    const child = spawn(process.execPath, [command, 'check', '-', '--language', 'python'], { cwd: box.folder });
    let complaints = '';
    child.stderr.on('data', (data: Buffer) => {
      complaints += data.toString();
    });
    setTimeout(() => child.kill('SIGINT'), 300);
    await new Promise((done) => child.on('exit', done));
    expect(complaints).toBe('');
  });
});
