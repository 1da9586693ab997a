import { chmodSync, readFileSync, readdirSync, statSync, symlinkSync, lstatSync } from 'node:fs';
import { join } from 'node:path';
import { applyPatch } from 'diff';
import { afterEach, expect, test } from 'vitest';
import { replaceFile } from '../../server/src/cli/write-file.ts';
import { together } from '../../server/src/service/fix-all.ts';
import type { OfferedFix } from '../../server/src/service/contract.ts';
import { Sandbox } from './sandbox.ts';

const boxes: Sandbox[] = [];
afterEach(() => {
  for (const box of boxes.splice(0)) box.remove();
});

function sandbox(files: Readonly<Record<string, string | Uint8Array>>): Sandbox {
  const box = new Sandbox(files);
  boxes.push(box);
  return box;
}

const wrong = `p_in = 2.0     # [kPa]
p_out = 150.0  # [Pa]
dp = p_in - p_out   # [Pa]
T = 21.0       # [degC]
TK = T         # [K]
x = p_out + T
`;
const right = `p_in = 2.0     # [kPa]
p_out = 150.0  # [Pa]
dp = p_in*1000 - p_out   # [Pa]
T = 21.0       # [degC]
TK = T + 273.15         # [K]
x = p_out + T
`;

test('writes what is proven, shows what is left', async () => {
  const box = sandbox({ 'a.py': wrong });
  const { status, out, complaints } = await box.run('check a.py --fix');
  expect(readFileSync(join(box.folder, 'a.py'), 'utf8')).toBe(right);
  expect(complaints).toContain('2 findings fixed in a.py: scale-mismatch 2');
  expect(out).toContain('unlike-terms');
  expect(out).not.toContain('scale-mismatch');
  expect(status).toBe(1);
  expect(readdirSync(box.folder)).toEqual(['a.py']);
});

test('a dry run prints a diff that can be applied, and writes nothing', async () => {
  const box = sandbox({ 'sub/a.py': wrong, 'b.py': 'x = 1\n' });
  const { out } = await box.run('check . --fix --dry-run');
  expect(readFileSync(join(box.folder, 'sub/a.py'), 'utf8')).toBe(wrong);
  expect(out.split('\n').slice(0, 2)).toEqual(['--- a/sub/a.py', '+++ b/sub/a.py']);
  expect(applyPatch(wrong, out)).toBe(right);
});

test.each([
  ['CRLF', Buffer.from(wrong.replaceAll('\n', '\r\n')), Buffer.from(right.replaceAll('\n', '\r\n'))],
  ['UTF-8 with a mark', Buffer.from(`\uFEFF${wrong}`), Buffer.from(`\uFEFF${right}`)],
  ['UTF-16', Buffer.from(`\uFEFF${wrong}`, 'utf16le'), Buffer.from(`\uFEFF${right}`, 'utf16le')],
  ['latin-1', Buffer.from(`# coding: latin-1\n# gr\u00F6\u00DFe\n${wrong}`, 'latin1'), Buffer.from(`# coding: latin-1\n# gr\u00F6\u00DFe\n${right}`, 'latin1')],
  ['no line end at the end', Buffer.from(wrong.trimEnd()), Buffer.from(right.trimEnd())],
])('keeps %s', async (_, before, after) => {
  const box = sandbox({ 'a.py': before });
  await box.run('check a.py --fix');
  expect(Buffer.from(readFileSync(join(box.folder, 'a.py'))).equals(after)).toBe(true);
});

test('keeps permissions and follows links', async () => {
  const box = sandbox({ 'a.py': wrong });
  chmodSync(join(box.folder, 'a.py'), 0o750);
  symlinkSync(join(box.folder, 'a.py'), join(box.folder, 'link.py'));
  await box.run('check link.py --fix');
  expect(lstatSync(join(box.folder, 'link.py')).isSymbolicLink()).toBe(true);
  expect(statSync(join(box.folder, 'a.py')).mode & 0o777).toBe(0o750);
  expect(readFileSync(join(box.folder, 'a.py'), 'utf8')).toBe(right);
});

test('a file that changed meanwhile is not written, and nothing is left behind', () => {
  const box = sandbox({ 'a.py': 'a = 2\n' });
  const path = join(box.folder, 'a.py');
  const result = replaceFile(path, Buffer.from('a = 1\n'), 'a = 1\n', 'a = 3\n');
  expect(result).toEqual({ ok: false, problem: 'it was not written: it changed while it was checked' });
  expect(readFileSync(path, 'utf8')).toBe('a = 2\n');
  expect(readdirSync(box.folder)).toEqual(['a.py']);
});

test('a file whose encoding lacks a character is not written', () => {
  const box = sandbox({ 'a.py': Buffer.from('# coding: latin-1\n# \u00FC\n', 'latin1') });
  const path = join(box.folder, 'a.py');
  const before = readFileSync(path);
  expect(replaceFile(path, before, '# coding: latin-1\n# \u00FC\n', '# coding: latin-1\n# \u2014\n').ok).toBe(false);
  expect(readFileSync(path).equals(before)).toBe(true);
});

test('a file without anything to fix is not touched', async () => {
  const box = sandbox({ 'a.py': right });
  const before = statSync(join(box.folder, 'a.py')).ino;
  await box.run('check a.py --fix');
  expect(statSync(join(box.folder, 'a.py')).ino).toBe(before);
});

test.each([
  ['check a.py --dry-run', '--fix --dry-run'],
  ['check - --fix --language python', 'standard input'],
  ['check a.py --fix --dry-run --format json', 'json'],
])('%s is a misuse', async (line, words) => {
  const { status, complaints } = await sandbox({ 'a.py': wrong }).run(line);
  expect(status).toBe(2);
  expect(complaints).toContain(words);
});

test('of several fixes for one finding one is taken, and none that touches another', () => {
  const fix = (start: number, finding: number): OfferedFix => ({ kind: 'convert', title: '', confidence: 'proven', edits: [{ start, end: start + 2, text: 'x' }], alsoSettles: 0, finding: { code: 'scale-mismatch', span: { start: finding, end: finding + 1 } } });
  const fixes = [fix(0, 0), fix(20, 0), fix(1, 5), fix(10, 9)];
  expect(together(fixes)).toEqual([fixes[0], fixes[3]]);
});
