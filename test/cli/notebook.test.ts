/** Notebooks in the terminal. Their text is of our own; the relations are common practice (from memory). */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { applyPatch } from 'diff';
import type { Log } from 'sarif';
import { afterAll, describe, expect, test } from 'vitest';
import { notebookFile } from '../frontends/notebook/helpers.ts';
import { Sandbox } from './sandbox.ts';
import { sarifProblems } from './sarif-schema.ts';

const made: Sandbox[] = [];
function sandbox(files: Readonly<Record<string, string>>): Sandbox {
  const box = new Sandbox(files);
  made.push(box);
  return box;
}
afterAll(() => {
  for (const box of made) box.remove();
});

const bench = notebookFile(['md:# Mixer\nShaft "power" of the bench.', '%matplotlib inline\np = 2.1e5    # [Pa]\nh = 3.0      # [m]', 'md:Sum', 'label = "°\\t"\ntotal = p + h', 'p_kPa = p  # [kPa]']);

interface Json {
  readonly findings: readonly { readonly file: string; readonly cell: number; readonly line: number; readonly column: number; readonly code: string; readonly message: string; readonly related: readonly Record<string, unknown>[] }[];
}
const json = (text: string): Json => JSON.parse(text) as Json;

describe('findings stand in cells', () => {
  const box = sandbox({ 'bench.ipynb': bench });

  test('as text', async () => {
    const { out, status } = await box.run('check bench.ipynb');
    expect(status).toBe(1);
    expect(out.split('\n').slice(0, 3)).toEqual(['bench.ipynb: cell 4, line 2  error  unlike-terms', '    2 | total = p + h', '      |         ^^^^^']);
    expect(out).toContain('(cell 2, line 2)');
    expect(out).toContain('  - cell 2, line 2: ');
    expect(out).toContain('bench.ipynb: cell 5, line 1  error  scale-mismatch');
  });

  test('as JSON, with the number of the cell beside the keys of the contract', async () => {
    const { findings } = json((await box.run('check bench.ipynb --format json')).out);
    expect(findings.map(({ file, cell, line, column, code }) => [file, cell, line, column, code])).toEqual([['bench.ipynb', 4, 2, 9, 'unlike-terms'], ['bench.ipynb', 5, 1, 9, 'scale-mismatch']]);
    expect(Object.keys(findings[0] ?? {})).toEqual(['file', 'cell', 'line', 'column', 'endLine', 'endColumn', 'code', 'severity', 'message', 'related']);
    expect(findings[0]?.related.map((each) => [each.file, each.cell, each.line])).toEqual([['bench.ipynb', 2, 2], ['bench.ipynb', 2, 3]]);
  });

  test('as SARIF, valid by the published schema: regions of the stored file, cells as logical locations', async () => {
    const log = JSON.parse((await box.run('check bench.ipynb --format sarif')).out) as Log;
    expect(sarifProblems(log)).toEqual([]);
    const [location] = log.runs[0]?.results?.[0]?.locations ?? [];
    const region = location?.physicalLocation?.region;
    const stored = bench.split('\n')[(region?.startLine ?? 0) - 1] ?? '';
    expect(stored.slice((region?.startColumn ?? 0) - 1, (region?.endColumn ?? 0) - 1)).toBe('p + h');
    expect(location?.logicalLocations).toEqual([{ name: 'cell 4', fullyQualifiedName: 'cell 4, line 2' }]);
  });

  test('from standard input under a name', async () => {
    const { out } = await box.run('check - --stdin-file new.ipynb --format json', {}, bench);
    expect(json(out).findings.map((each) => [each.file, each.cell])).toEqual([['new.ipynb', 4], ['new.ipynb', 5]]);
  });
});

describe('folders', () => {
  const box = sandbox({
    'a.ipynb': bench, 'other.ipynb': notebookFile(['x <- 1'], 'R'), '.ipynb_checkpoints/a-checkpoint.ipynb': bench, 'units.nomen': 'V [m/s] speed\nL [m] length\n',
    'flows.py': 'def flow(V, A):\n    """Flow.\n\n    Parameters\n    ----------\n    V : float\n        Speed [m/s]\n    A : float\n        Area [m^2]\n    """\n    return V*A\n',
    'sub/uses.ipynb': notebookFile(['from flows import flow'].concat('x = V + L')),
    'uses.ipynb': notebookFile(['from flows import flow\nd = 5.0  # [mm]', 'Q = flow(2.0, d)']),
  });

  test('are searched for notebooks; those of other languages are passed over, as are copies that Jupyter keeps', async () => {
    const { out, complaints, status } = await box.run('check . --format json');
    expect(complaints).toBe('');
    expect(status).toBe(1);
    expect(json(out).findings.map((each) => `${each.file} ${each.cell} ${each.code}`)).toEqual(['a.ipynb 4 unlike-terms', 'a.ipynb 5 scale-mismatch', 'sub/uses.ipynb 2 unlike-terms', 'uses.ipynb 2 unlike-result']);
  });

  test('a notebook that is named and cannot be read is told of', async () => {
    box.write('broken.ipynb', bench.slice(0, 300));
    const { complaints, status } = await box.run('check other.ipynb broken.ipynb');
    expect(status).toBe(2);
    expect(complaints).toBe("termwise: other.ipynb: its kernel's language, R, is not read\ntermwise: broken.ipynb: it is no notebook: its JSON cannot be read to the end\n");
  });

  test('pictures make long lines, which are no reason to refuse it', async () => {
    box.write('picture.ipynb', bench.replace('"outputs": []', `"outputs": [{"output_type": "display_data", "metadata": {}, "data": {"image/png": "${'A'.repeat(1_100_000)}"}}]`));
    const { complaints, out } = await box.run('check picture.ipynb --format json');
    expect(complaints).toBe('');
    expect(json(out).findings).toHaveLength(2);
  });
});

describe('fixes', () => {
  const cells = ['md:Say "what"\tin °', '%matplotlib inline\np_in = 2.0     # [kPa]', '%%time\nname = "a\\\\b"\np_out = 150.0  # [Pa]\ndp = p_in - p_out   # [Pa]', 'T = 21.0       # [degC]\nTK = T         # [K]'];
  const right = cells.map((cell) => cell.replace('p_in - p_out', 'p_in*1000 - p_out').replace('TK = T ', 'TK = T + 273.15 '));

  test.each([
    ['as Jupyter writes it', (text: string) => text],
    ['on one line', (text: string) => JSON.stringify(JSON.parse(text))],
    ['with carriage returns', (text: string) => text.replaceAll('\n', '\r\n')],
    ['escaped beyond ASCII', (text: string) => text.replaceAll('°', '\\u00b0')],
  ])('go into the strings of the file, which stays as it is everywhere else: %s', async (_form, form) => {
    const box = sandbox({ 'a.ipynb': form(notebookFile(cells)) });
    const { complaints, status } = await box.run('check a.ipynb --fix');
    expect(complaints).toContain('2 findings fixed in a.ipynb: scale-mismatch 2');
    expect(readFileSync(join(box.folder, 'a.ipynb'), 'utf8')).toBe(form(notebookFile(right)));
    expect(status).toBe(0);
  });

  test('a dry run prints a diff of the file as it is stored', async () => {
    const box = sandbox({ 'a.ipynb': notebookFile(cells) });
    const { out } = await box.run('check a.ipynb --fix --dry-run');
    expect(readFileSync(join(box.folder, 'a.ipynb'), 'utf8')).toBe(notebookFile(cells));
    expect(applyPatch(notebookFile(cells), out)).toBe(notebookFile(right));
  });
});

describe('groups', () => {
  // Dimensional analysis of a stirred tank: power number over Reynolds number; common practice, from memory.
  const mixer = notebookFile(['md:# Power', '# P depends on N, D, rho, mu\nN = 4.0  # [rev/s]\nD = 0.085  # [m]\nrho = 1240.0  # [kg/m^3]', 'mu = 0.38  # [Pa s]\nP = 40.0  # [W]']);
  const box = sandbox({ 'mixer.ipynb': mixer });

  test('of a relation in a cell', async () => {
    const { out, status } = await box.run('groups mixer.ipynb');
    expect(status).toBe(0);
    expect(out).toMatch(/^mixer\.ipynb: cell 2, line 1 {2}P depends on N, D, rho, mu\n/);
    expect(out).toContain('Reynolds');
    expect(JSON.parse((await box.run('groups mixer.ipynb --format json')).out)).toMatchObject({ relations: [{ file: 'mixer.ipynb', cell: 2, line: 1, rank: 3 }] });
  });

  test('of a relation in a text cell', async () => {
    box.write('told.ipynb', mixer.replace('# Power', 'Power\\n\\n  P depends on N, D, rho, mu.\\nP depends on luck').replace('# P depends on N, D, rho, mu\\n', ''));
    expect(JSON.parse((await box.run('groups told.ipynb --format json')).out)).toMatchObject({ relations: [{ cell: 1, line: 3, rank: 3, symbols: [{ name: 'P' }, { name: 'N' }, { name: 'D' }, { name: 'rho' }, { name: 'mu' }] }] });
  });
});

test('Octave kernels: script and functions over several cells', async () => {
  const cells = ['%plot inline\nfunction h = head(p, rho)\n%   p = pressure [Pa]\n%   rho = density [kg/m^3]\n    g = 9.81;  % [m/s^2]\n    h = p/(rho*g);  % [m]\nend', 'p = 2.1;   % [bar]', 'h = head(p, 998.2);\nt = 4;  % [s]\nx = t + p;'];
  const box = sandbox({ 'pump.ipynb': notebookFile(cells, 'octave') });
  const { findings } = json((await box.run('check pump.ipynb --format json')).out);
  expect(findings.map(({ cell, line, code }) => [cell, line, code])).toEqual([[3, 1, 'scale-mismatch'], [3, 3, 'unlike-terms']]);
});
