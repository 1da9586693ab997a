/** What an editor shows and asks besides findings, over the protocol. */
import { afterEach, describe, expect, test } from 'vitest';
import type { CodeLens, CompletionItem, DocumentSymbol, FoldingRange, InlayHint, Location, SemanticTokens, TextEdit, WorkspaceEdit, WorkspaceSymbol } from 'vscode-languageserver/node.js';
import type { CoverageAnswer } from '../../server/src/lsp/requests/coverage.ts';
import { Client, type StartOptions } from './client.ts';

let client: Client | undefined;

async function started(options: StartOptions = {}): Promise<Client> {
  client = await Client.start(options);
  return client;
}

afterEach(async () => {
  await client?.stop();
  client = undefined;
});

function place(text: string, part: string, into = 0): { line: number; character: number } {
  const before = text.slice(0, text.indexOf(part) + into).split('\n');
  return { line: before.length - 1, character: (before.at(-1) as string).length };
}

const everything = { range: { start: { line: 0, character: 0 }, end: { line: 999, character: 0 } } };
const fall = 'g = 9.81  # [m/s^2]\nt = 3.0  # [s]\n\n\ndef depth(t, v):\n    # t [s]\n    d = 0.5*g*t**2\n    return d + v\n\n\nx = depth(t, 2.0)\n';

describe('in a script', () => {
  test('units that follow are hints, and a click writes them', async () => {
    const editor = await started();
    await editor.open('fall.py', fall);
    const hints = await editor.ask<InlayHint[]>('textDocument/inlayHint', 'fall.py', everything);
    expect(hints.map(({ label, position }) => [label, position.line])).toContainEqual(['[m]', 6]);
    expect(hints.find(({ position }) => position.line === 6)?.textEdits?.map(({ newText }) => newText)).toEqual(['  # [m]']);
  });

  test('hints go where a setting says so', async () => {
    const editor = await started({ settings: { hints: { inferred: false, arguments: 'off' } } });
    await editor.open('fall.py', fall);
    await editor.untilCodes('fall.py', []);
    expect(await editor.ask('textDocument/inlayHint', 'fall.py', everything)).toEqual([]);
  });

  test('the outline has every symbol with its unit', async () => {
    const editor = await started();
    await editor.open('fall.py', fall);
    const symbols = await editor.ask<DocumentSymbol[]>('textDocument/documentSymbol', 'fall.py');
    expect(symbols.map(({ name, detail }) => `${name} ${detail}`)).toEqual(expect.arrayContaining(['g [m/s^2]', 't [s]', 'depth ']));
    expect(symbols.find(({ name }) => name === 'depth')?.children?.map(({ name, detail }) => `${name} ${detail}`)).toEqual(expect.arrayContaining(['t [s]', 'd [m]']));
  });

  test('functions tell how many units are known', async () => {
    const editor = await started();
    await editor.open('fall.py', fall);
    const lenses = await editor.ask<CodeLens[]>('textDocument/codeLens', 'fall.py');
    expect(lenses.map(({ command }) => command?.title)).toEqual(['units known 3/3']);
  });

  test('relations tell how many groups they have', async () => {
    const editor = await started();
    await editor.open('a.py', '# T [s], l [m], g [m/s^2]\n# T depends on l, g\nl = 2.0\n');
    expect((await editor.ask<CodeLens[]>('textDocument/codeLens', 'a.py')).map(({ command }) => command?.title)).toContain('1 group');
  });

  test('completion begins with the unit that follows', async () => {
    const text = 'F = 2.0  # [N]\nA = 3.0  # [m^2]\np = F/A  # [\n';
    const editor = await started();
    await editor.open('a.py', text);
    const items = await editor.ask<CompletionItem[]>('textDocument/completion', 'a.py', { position: { line: 2, character: 12 } });
    expect(items.slice(0, 2).map(({ label, preselect }) => [label, preselect])).toEqual([['Pa', true], ['kPa', undefined]]);
    expect(items.find(({ label }) => label === 'bar')?.documentation).toBe('1 bar = 100000 Pa');
  });

  test('a unit leads to the note it comes from, in another file too', async () => {
    const editor = await started({ files: { 'rig.nomen': '# rig\np [Pa]   pressure\n' } });
    const text = 'q = p\nh = 3.0  # [m]\nA = h*h\n';
    await editor.open('a.py', text);
    const [there] = await editor.ask<Location[]>('textDocument/typeDefinition', 'a.py', { position: place(text, 'p\n') });
    expect(there).toEqual({ uri: editor.uri('rig.nomen'), range: { start: { line: 1, character: 3 }, end: { line: 1, character: 5 } } });
    const [here] = await editor.ask<Location[]>('textDocument/typeDefinition', 'a.py', { position: place(text, 'h*h') });
    expect(here?.range.start).toEqual(place(text, 'm]'));
  });
});

describe('in a nomenclature file', () => {
  const rig = '# rig\nN [1/s] 2 .. 12 speed\nD   [m] = 0.085\nv [m/s] = pi*N*D\n';

  test('formulas have their values', async () => {
    const editor = await started();
    await editor.open('rig.nomen', rig);
    const hints = await editor.ask<InlayHint[]>('textDocument/inlayHint', 'rig.nomen', everything);
    expect(hints.map(({ label }) => label)).toEqual(['= 0.5341 .. 3.204 m/s']);
  });

  test('columns are aligned, parts fold, words have colours', async () => {
    const editor = await started();
    await editor.open('rig.nomen', rig);
    const edits = await editor.ask<TextEdit[]>('textDocument/formatting', 'rig.nomen', { options: { tabSize: 2, insertSpaces: true } });
    expect(edits[0]?.newText).toBe('N  [1/s]  2 .. 12  speed');
    expect(await editor.ask<FoldingRange[]>('textDocument/foldingRange', 'rig.nomen')).toEqual([{ startLine: 0, endLine: 3 }]);
    expect((await editor.ask<SemanticTokens>('textDocument/semanticTokens/full', 'rig.nomen')).data.length).toBeGreaterThan(40);
  });

  test('scripts are neither formatted nor folded here', async () => {
    const editor = await started();
    await editor.open('fall.py', fall);
    expect(await editor.ask('textDocument/formatting', 'fall.py', { options: { tabSize: 2, insertSpaces: true } })).toEqual([]);
    expect(await editor.ask('textDocument/foldingRange', 'fall.py')).toEqual([]);
  });

  const uses = 'v_tip = 3.14*N*D\n';
  const other = 'name = "D"\n';

  test('a symbol is found in the scripts that use it', async () => {
    const editor = await started({ files: { 'rig.nomen': rig, 'tip.py': uses, 'sub/other.py': other } });
    await editor.open('rig.nomen', rig);
    const found = await editor.ask<Location[]>('textDocument/references', 'rig.nomen', { position: place(rig, 'D   '), context: { includeDeclaration: true } });
    expect(found.map(({ uri, range }) => `${uri.split('/').at(-1)}:${range.start.line}:${range.start.character}`)).toEqual(['rig.nomen:2:0', 'rig.nomen:3:15', 'tip.py:0:15']);
  });

  test('renaming reaches only what is shown to be the symbol, and names what it leaves', async () => {
    const editor = await started({ files: { 'rig.nomen': rig, 'tip.py': uses, 'mixed.py': 'a = 2*D\nb = f(D=3)\n', 'sub/other.py': other } });
    await editor.open('rig.nomen', rig);
    const edit = await editor.ask<WorkspaceEdit>('textDocument/rename', 'rig.nomen', { position: place(rig, 'D   '), newName: 'd_imp' });
    expect(Object.entries(edit.changes ?? {}).map(([uri, changes]) => `${uri.split('/').at(-1)} ${changes.length}`)).toEqual(['rig.nomen 2', 'tip.py 1']);
    expect(editor.messages).toEqual([expect.stringContaining('mixed.py')]);
    await expect(editor.ask('textDocument/rename', 'rig.nomen', { position: place(rig, 'D   '), newName: '2d' })).rejects.toThrow('no name');
  });

  test('a word that is no symbol cannot be renamed', async () => {
    const editor = await started();
    await editor.open('rig.nomen', rig);
    expect(await editor.ask('textDocument/prepareRename', 'rig.nomen', { position: place(rig, 'speed') })).toBeNull();
  });
});

describe('the workspace', () => {
  test('is read in the background with progress, and its symbols are found', async () => {
    const editor = await started({ progress: true, files: { 'a.py': 'p_in = 2.0e5  # [Pa]\n', 'b.py': 'q = unknown\n' } });
    await editor.until(() => editor.progress.includes('end'), 'the end of the scan');
    expect(editor.progress[0]).toBe('begin');
    const found = await editor.connection.sendRequest<WorkspaceSymbol[]>('workspace/symbol', { query: 'p_' });
    expect(found.map(({ name }) => name)).toEqual(['p_in [Pa]']);
  });

  test('shows findings of scripts that are not open where that is wanted, and takes them back', async () => {
    const faulty = 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\nx = p + h\n';
    const editor = await started({ files: { 'a.py': faulty }, settings: { wholeWorkspace: true } });
    await editor.untilCodes('a.py', ['unlike-terms']);
    await editor.writeFile('a.py', faulty.replace('p + h', 'p'));
    await editor.untilCodes('a.py', []);
  });

  test('several folders, each with its own nomenclature and settings', async () => {
    const script = 'x = p + h\n';
    const editor = await started({
      folders: ['one', 'two'],
      files: { 'one/a.nomen': 'p [Pa]\nh [m]\n', 'two/a.nomen': 'p [m]\nh [m]\n', 'one/s.py': script, 'two/s.py': script, 'one/quiet/termwise.json': '{ "severities": { "unlike-terms": "off" } }', 'one/quiet/s.py': script },
    });
    for (const name of ['one/s.py', 'two/s.py', 'one/quiet/s.py']) await editor.open(name, script);
    await editor.untilCodes('one/s.py', ['unlike-terms']);
    await editor.untilCodes('two/s.py', []);
    await editor.untilCodes('one/quiet/s.py', []);
  });

  test('a configuration is followed, and its problems are shown in it', async () => {
    const faulty = 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\nx = p + h\n';
    const editor = await started();
    await editor.open('old/a.py', faulty);
    await editor.untilCodes('old/a.py', ['unlike-terms']);
    await editor.writeFile('termwise.json', '{ "exclude": ["old/"], "colour": 3 }');
    await editor.untilCodes('old/a.py', []);
    await editor.until(() => (editor.latest('termwise.json')?.length ?? 0) > 0, 'the unknown key');
    expect(editor.latest('termwise.json')?.[0]?.message).toContain('unknown key "colour"');
    await editor.writeFile('termwise.json', '{}');
    await editor.untilCodes('old/a.py', ['unlike-terms']);
    expect(editor.latest('termwise.json')).toEqual([]);
  });

  test('coverage lists what has no unit, most used first', async () => {
    const editor = await started({ files: { 'b.py': 'def f(a, b):\n    return a*a*b\n' } });
    const text = 'def f(p, k):\n    # p [Pa]\n    q = p*k + p*k*k\n    return q\n';
    await editor.open('a.py', text);
    const own = await editor.ask<CoverageAnswer>('termwise/coverage', 'a.py');
    expect(own.files[0]).toMatchObject({ uri: editor.uri('a.py'), all: 3 });
    expect(own.files[0]?.known).toBeGreaterThan(0);
    const counts = own.files[0]?.open.map(({ uses }) => uses) ?? [];
    expect([...counts].sort((x, y) => y - x)).toEqual(counts);
    await editor.until(() => true, 'nothing');
    let all = await editor.connection.sendRequest<CoverageAnswer>('termwise/coverage', {});
    for (let tries = 0; tries < 50 && all.files.length < 2; tries++) {
      await new Promise((resolve) => setTimeout(resolve, 50));
      all = await editor.connection.sendRequest<CoverageAnswer>('termwise/coverage', {});
    }
    expect(all.files.map(({ uri }) => uri.split('/').at(-1)).sort()).toEqual(['a.py', 'b.py']);
  });
});
