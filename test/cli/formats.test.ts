import type { Log } from 'sarif';
import { afterAll, describe, expect, test } from 'vitest';
import { findingCodes } from '../../server/src/findings/finding.ts';
import { faulty, plain, Sandbox, sound } from './sandbox.ts';
import { sarifProblems } from './sarif-schema.ts';

const box = new Sandbox({ 'faulty.py': faulty, 'sub dir/größe.py': faulty, 'sound.py': sound, 'plain.py': plain, 'binary.py': new Uint8Array([35, 0, 10]), 'crlf.py': faulty.replaceAll('\n', '\r\n') });
afterAll(() => box.remove());

describe('json', () => {
  test('has the keys of the contract, in its order', async () => {
    const { out } = await box.run('check faulty.py sound.py --format json');
    const log = JSON.parse(out) as { findings: Record<string, unknown>[]; summary: Record<string, unknown> };
    expect(Object.keys(log)).toEqual(['version', 'findings', 'summary']);
    expect(Object.keys(log.summary)).toEqual(['files', 'functions', 'notes', 'findings', 'seconds']);
    for (const finding of log.findings) {
      expect(Object.keys(finding)).toEqual(['file', 'line', 'column', 'endLine', 'endColumn', 'code', 'severity', 'message', 'related']);
      for (const related of finding.related as object[]) expect(Object.keys(related)).toEqual(['file', 'line', 'column', 'message']);
    }
    expect(log.summary).toMatchObject({ files: 2, functions: 0, findings: { 'unlike-terms': 1, 'unreadable-unit': 1, 'bare-addend': 1 } });
    expect(out).toMatch(/^\{"version":1,"findings":\[\n/);
  });

  test('counts lines and columns from one, the end behind the last character', async () => {
    const { out } = await box.run('check faulty.py --format json');
    const [first] = (JSON.parse(out) as { findings: Record<string, unknown>[] }).findings;
    expect(first).toMatchObject({ file: 'faulty.py', line: 3, column: 9, endLine: 3, endColumn: 14, code: 'unlike-terms', severity: 'error' });
    expect((first?.related as { line: number; column: number }[] | undefined)?.map((each) => [each.line, each.column])).toEqual([[1, 17], [2, 17]]);
  });

  test('gives the same places with carriage returns', async () => {
    const places = async (file: string): Promise<unknown> => (JSON.parse((await box.run(`check ${file} --format json`)).out) as { findings: { line: number; column: number }[] }).findings.map((each) => [each.line, each.column]);
    expect(await places('crlf.py')).toEqual(await places('faulty.py'));
  });

  test('is whole without findings and with unreadable files', async () => {
    expect(JSON.parse((await box.run('check sound.py --format json')).out)).toMatchObject({ version: 1, findings: [], summary: { files: 1, findings: {} } });
    expect(JSON.parse((await box.run('check nowhere.py --format json')).out)).toMatchObject({ findings: [], summary: { files: 0 } });
  });
});

describe('sarif', () => {
  const read = async (line: string): Promise<Log> => JSON.parse((await box.run(`${line} --format sarif`)).out) as Log;

  test.each(['check .', 'check sound.py', 'check nowhere.py binary.py faulty.py', 'check - --language python'])('%s is valid by the published schema', async (line) => {
    expect(sarifProblems(await read(line))).toEqual([]);
  });

  test('the schema refuses what is no SARIF', async () => {
    const log = await read('check faulty.py');
    expect(sarifProblems({ ...log, version: '2.2' })).not.toEqual([]);
    expect(sarifProblems({ ...log, runs: [{ ...log.runs[0], columnKind: 'bytes' }] })).not.toEqual([]);
  });

  test('has rules, regions, levels, related places and relative addresses', async () => {
    const [run] = (await read('check faulty.py')).runs;
    expect(run?.tool.driver.rules?.map((rule) => rule.id)).toEqual([...findingCodes]);
    expect(run?.columnKind).toBe('utf16CodeUnits');
    const [first, , hint] = run?.results ?? [];
    expect(first).toMatchObject({ ruleId: 'unlike-terms', ruleIndex: 0, level: 'error' });
    expect(first?.locations?.[0]?.physicalLocation).toEqual({ artifactLocation: { uri: 'faulty.py', uriBaseId: 'WORKINGFOLDER' }, region: { startLine: 3, startColumn: 9, endLine: 3, endColumn: 14 } });
    expect(first?.relatedLocations).toHaveLength(2);
    expect(hint?.level).toBe('note');
    expect(run?.originalUriBaseIds?.WORKINGFOLDER?.uri).toMatch(/^file:\/\/\/.*\/$/);
  });

  test('addresses are percent-encoded', async () => {
    const uris = (await read('check .')).runs[0]?.results?.map((each) => each.locations?.[0]?.physicalLocation?.artifactLocation?.uri);
    expect(uris).toContain('sub%20dir/gr%C3%B6%C3%9Fe.py');
  });

  test('tells of files that could not be read', async () => {
    const [run] = (await read('check binary.py faulty.py')).runs;
    expect(run?.invocations?.[0]).toMatchObject({ executionSuccessful: false, toolExecutionNotifications: [{ level: 'error', message: { text: 'binary.py: it is a binary file' } }] });
    expect(run?.results?.length).toBeGreaterThan(0);
  });
});

describe('text', () => {
  test('shows place, severity, code, the line underlined, and the places that explain it', async () => {
    const { out } = await box.run('check faulty.py');
    const lines = out.split('\n');
    expect(lines.slice(0, 3)).toEqual(['faulty.py:3:9  error  unlike-terms', '    3 | total = p + h', '      |         ^^^^^']);
    expect(out).toMatch(/ {2}- line 1: [^\n]*Pa[^\n]*\n {4}1 \| p = 2\.1e5 {4}# \[Pa\]\n {2}- line 2/);
    expect(out).toContain('1 error, 1 warning in 1 file.\n1 hint not shown; --hints shows it.\n');
  });

  test('shows hints where they are asked for', async () => {
    const { out } = await box.run('check faulty.py --hints');
    expect(out).toContain('faulty.py:5:11  hint  bare-addend');
    expect(out).toContain('1 error, 1 warning, 1 hint in 1 file.\n');
  });

  test.each([40, 60, 100])('fits into %i columns', async (width) => {
    const { out } = await box.run('check . --hints', { width });
    const long = out.split('\n').filter((line) => line.length > width && !/^\S.*:\d+:\d+ {2}/.test(line));
    expect(long).toEqual([]);
  });

  test('says so where there was nothing to check', async () => {
    expect((await box.run('check sound.py')).out).toBe('Nothing found in 1 file.\n');
    expect((await box.run('check plain.py')).out).toContain('No unit note was found');
    expect((await box.run('check nowhere.py')).out).toBe('No file was checked.\n');
    const empty = new Sandbox();
    const { status, out } = await empty.run('check .', { width: 400 });
    expect(status).toBe(0);
    expect(out).toMatch(/^No file was checked\. Folders are searched for \*\.py, .*\*\.nomen.*, \*\.ipynb\.\n$/);
    empty.remove();
  });

  test('has colours on a terminal that takes them, unless they are not wanted', async () => {
    expect((await box.run('check faulty.py', { color: true })).out).toContain('\u001B[1;31m');
    expect((await box.run('check faulty.py --no-color', { color: true })).out).not.toContain('\u001B');
    expect((await box.run('check faulty.py')).out).not.toContain('\u001B');
  });

  test('adds figures', async () => {
    const { out } = await box.run('check faulty.py sound.py --stats');
    const figures = Object.fromEntries(out.slice(out.indexOf('\nfiles')).trim().split('\n').map((line) => line.split(/ {2,}/)));
    expect(figures).toMatchObject({ files: '2', functions: '0', 'notes read': '5', 'unlike-terms': '1', 'bare-addend': '1' });
    const machine = await box.run('check faulty.py --stats --format json');
    expect(machine.complaints).toContain('notes read');
    expect(JSON.parse(machine.out)).toBeDefined();
  });
});
