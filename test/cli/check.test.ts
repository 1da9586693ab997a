import { mkdirSync, symlinkSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { faulty, plain, Sandbox, sound } from './sandbox.ts';

const made: Sandbox[] = [];
function sandbox(files: Readonly<Record<string, string | Uint8Array>>): Sandbox {
  const box = new Sandbox(files);
  made.push(box);
  return box;
}
afterAll(() => {
  for (const box of made) box.remove();
});

interface Json {
  readonly version: number;
  readonly findings: readonly Record<string, unknown>[];
  readonly summary: { readonly files: number; readonly functions: number; readonly notes: number; readonly findings: Record<string, number>; readonly seconds: number };
}
const json = (text: string): Json => JSON.parse(text) as Json;
const files = (text: string): readonly unknown[] => [...new Set(json(text).findings.map((each) => each.file))];

describe('exit status', () => {
  const box = sandbox({ 'faulty.py': faulty, 'sound.py': sound, 'plain.py': plain, 'warned.py': 'eta = 0.1    # [metrs/s]\n' });
  test.each([
    ['check sound.py', 0],
    ['check plain.py', 0],
    ['check warned.py', 0],
    ['check faulty.py', 1],
    ['check sound.py faulty.py', 1],
    ['check faulty.py --severity unlike-terms=warning', 0],
    ['check warned.py --severity unreadable-unit=error', 1],
    ['check sound.py nowhere.py', 2],
    ['check faulty.py nowhere.py', 2],
    ['check', 2],
    ['check sound.py --format yaml', 2],
    ['--version', 0],
    ['help check', 0],
  ])('%s', async (line, status) => {
    expect((await box.run(line)).status).toBe(status);
  });

  test('what can be read is checked all the same', async () => {
    const { out, complaints } = await box.run('check nowhere.py faulty.py --format json');
    expect(complaints).toBe('termwise: nowhere.py: no such file or folder\n');
    expect(files(out)).toEqual(['faulty.py']);
  });
});

describe('severity', () => {
  const box = sandbox({ 'faulty.py': faulty });
  test('off silences, and levels are shown as set', async () => {
    const { out } = await box.run('check faulty.py --format json --severity unlike-terms=off --severity unreadable-unit=information');
    expect(json(out).findings.map((each) => `${String(each.code)} ${String(each.severity)}`)).toEqual(['unreadable-unit information', 'bare-addend hint']);
  });
});

describe('standard input', () => {
  const box = sandbox({ 'lib/units.nomen': 'p [Pa] pressure\nh [m] height\n' });
  test('with a language', async () => {
    const { out, status } = await box.run('check - --language python --format json', {}, faulty);
    expect(status).toBe(1);
    expect(files(out)).toEqual(['<stdin>']);
  });
  test('a name gives the language and the folder', async () => {
    const { out } = await box.run('check - --stdin-file lib/new.py --format json', {}, 'def f(p, h):\n    return p + h\n');
    expect(json(out).findings.map((each) => [each.file, each.line, each.code])).toEqual([['lib/new.py', 2, 'unlike-terms']]);
  });
  test('needs a language', async () => {
    const { complaints, status } = await box.run('check -', {}, faulty);
    expect(status).toBe(2);
    expect(complaints).toContain('--language');
  });
  test('that is binary', async () => {
    const { complaints, status } = await box.run('check - --language python', {}, new Uint8Array([1, 0, 2]));
    expect(status).toBe(2);
    expect(complaints).toBe('termwise: <stdin>: it is a binary file\n');
  });
});

describe('folders', () => {
  const box = sandbox({
    'a.py': faulty, 'notes.txt': faulty, 'sub/b.py': faulty, 'sub/deep/c.pyw': faulty, 'sub/deep/d.nomen': 'x [m^^2] area\n',
    '.hidden/e.py': faulty, 'node_modules/f.py': faulty, 'sub/__pycache__/g.py': faulty, 'env/pyvenv.cfg': '', 'env/h.py': faulty, 'venv/i.py': faulty,
    '.gitignore': 'build/\n*_gen.py\n/only_here.py\n', 'build/j.py': faulty, 'sub/k_gen.py': faulty, 'only_here.py': faulty, 'sub/only_here.py': faulty,
    'sub/.gitignore': '!k_gen.py\nl.py\n', 'sub/l.py': faulty, 'sub/deep/m_gen.py': faulty,
  });
  mkdirSync(join(box.folder, '.git'));

  test('are searched without what ignore files, tools and names leave out', async () => {
    const { out } = await box.run('check . --format json');
    expect(files(out)).toEqual(['a.py', 'sub/b.py', 'sub/deep/c.pyw', 'sub/deep/d.nomen', 'sub/k_gen.py', 'sub/only_here.py']);
  });
  test('below the ignore file that holds for them', async () => {
    const { out } = await box.run('check sub/deep --format json');
    expect(files(out)).toEqual(['sub/deep/c.pyw', 'sub/deep/d.nomen']);
  });
  test('a file that is named is checked', async () => {
    const { out } = await box.run('check build/j.py .hidden/e.py sub --format json');
    expect(files(out).slice(0, 2)).toEqual(['build/j.py', '.hidden/e.py']);
  });
  test('a file with another ending needs a language', async () => {
    expect(await box.run('check notes.txt')).toMatchObject({ status: 2, complaints: expect.stringContaining('--language') as string });
    expect(await box.run('check notes.txt --language python')).toMatchObject({ status: 1 });
  });
  test('named twice or within another are checked once', async () => {
    const { out } = await box.run('check sub/b.py . sub ./sub/b.py --format json');
    expect(json(out).summary.files).toBe(6);
  });
  test('files outside the working folder are named in full', async () => {
    const other = sandbox({ 'z.py': faulty });
    const { out } = await box.run(`check ${other.folder} --format json`);
    expect(files(out)).toEqual([`${other.folder}/z.py`]);
  });
});

describe('links', () => {
  test('in a circle end', async () => {
    const box = sandbox({ 'a/one.py': faulty });
    symlinkSync('..', join(box.folder, 'a/up'));
    symlinkSync('loop', join(box.folder, 'a/loop'));
    symlinkSync('nowhere.py', join(box.folder, 'a/broken.py'));
    const { out, status } = await box.run('check . --format json');
    expect(files(out)).toEqual(['a/one.py']);
    expect(status).toBe(1);
    expect((await box.run('check a/loop')).complaints).toContain('its links lead in a circle');
  });
  test('to another folder are followed, once', async () => {
    const shared = sandbox({ 'lib/two.py': faulty });
    const box = sandbox({ 'one.py': sound });
    symlinkSync(join(shared.folder, 'lib'), join(box.folder, 'lib'));
    symlinkSync(join(shared.folder, 'lib'), join(box.folder, 'same'));
    symlinkSync(box.folder, join(shared.folder, 'lib', 'back'));
    expect(files((await box.run('check . --format json')).out)).toEqual(['lib/two.py']);
  });
});

describe('configuration', () => {
  const box = sandbox({
    'termwise.json': '{\n  // ours\n  "severities": { "unlike-terms": "warning" },\n  "exclude": ["old/", "*_copy.py"],\n}\n',
    'a.py': faulty, 'a_copy.py': faulty, 'old/b.py': faulty, 'strict/termwise.json': '{ "severities": { "unreadable-unit": "error" }, "notes": { "parentheses": false } }', 'strict/c.py': faulty,
    'bad/termwise.json': '{ "severity": {},\n  "severities": { "unlike-terms": "fatal", "hidden-unit": "off" } }', 'bad/d.py': faulty,
  });
  test('the nearest holds for each file', async () => {
    const { out, status } = await box.run('check a.py old strict . --format json');
    expect(status).toBe(2);
    const found = json(out).findings.filter((each) => each.severity !== 'hint').map((each) => `${String(each.file)} ${String(each.code)} ${String(each.severity)}`);
    expect(found).toEqual([
      'a.py unlike-terms warning', 'a.py unreadable-unit warning', 'strict/c.py unlike-terms error', 'strict/c.py unreadable-unit error',
      'bad/d.py unlike-terms error', 'bad/d.py unreadable-unit warning',
    ]);
  });
  test('its problems have a place', async () => {
    const { complaints } = await box.run('check bad');
    expect(complaints.split('\n')).toEqual([
      'termwise: bad/termwise.json:1:3: unknown key "severity". Did you mean severities?',
      'termwise: bad/termwise.json:2:35: "fatal" is no severity; it is one of error, warning, information, hint, off.',
      '',
    ]);
  });
  test('the command line goes before it', async () => {
    expect((await box.run('check a.py --severity unlike-terms=error')).status).toBe(1);
  });
  test('one may be named', async () => {
    expect((await box.run('check a.py --config strict/termwise.json')).status).toBe(1);
    expect(await box.run('check a.py --config none.json')).toMatchObject({ status: 2, complaints: 'termwise: none.json: no such file or folder\n' });
  });
});

test('a fault of the engine names the file and leaves the rest to be checked', async () => {
  const box = sandbox({ 'a.py': sound, 'b.py': sound });
  const forgotten: string[] = [];
  const { status, complaints, out } = await box.run('check . --format json', {
    createWorkspace: async () => ({
      check: (file, text, language) => {
        if (file.endsWith('a.py')) throw new Error('no such unit');
        return { file, text, language: language ?? 'python', findings: [], statistics: { functions: 3, notes: 2, unread: [] } };
      },
      prepare: async () => {},
      prepareValues: async () => {},
      symbols: () => [], hints: () => [], completions: () => [], uses: () => ({ uses: [], proven: false }),
      steps: () => { throw new Error('not asked for'); },
      forget: (file) => forgotten.push(file),
      fixes: () => [], hover: () => undefined, groups: { relations: () => [], actions: () => [], at: () => undefined },
      invalidate: () => {},
    }),
  });
  expect(status).toBe(2);
  expect(complaints).toContain('a.py: it could not be checked because of a fault in termwise');
  expect(json(out).summary).toMatchObject({ files: 1, functions: 3, notes: 2 });
  expect(forgotten.map((file) => file.slice(-4))).toEqual(['a.py', 'b.py']);
});

test('stops when nobody reads the output any more', async () => {
  const box = sandbox(Object.fromEntries(Array.from({ length: 5 }, (_, at) => [`f${at}.py`, faulty])));
  let written = 0;
  await box.run('check .', { out: () => ++written < 2 });
  expect(written).toBe(3);
});

test('progress is shown on a terminal only, and taken away before other output', async () => {
  const box = sandbox({ 'a.py': faulty });
  let shown = '';
  await box.run('check a.py', { progress: (text) => (shown += text) });
  expect(shown).toBe('');
});
