/** The server over its protocol: what an editor gets for what it sends. */
import { fileURLToPath } from 'node:url';
import { readFileSync } from 'node:fs';
import { afterEach, describe, expect, test } from 'vitest';
import { DidChangeConfigurationNotification, HoverRequest, type MarkupContent } from 'vscode-languageserver/node.js';
import { Client, type StartOptions } from './client.ts';

const pump = 'rho = 998.0  # [kg/m^3] density of the water\ng = 9.81  # [m/s^2]\nh = 12.0  # [m]\np = 2.0e5  # [Pa]\ntotal = p + rho*h\n';
const mended = pump.replace('rho*h', 'rho*g*h');

let client: Client | undefined;

async function started(options?: StartOptions): Promise<Client> {
  client = await Client.start(options);
  return client;
}

afterEach(async () => {
  const running = client;
  client = undefined;
  if (running && running.process.exitCode === null) expect(await running.stop()).toBe(0);
});

function place(text: string, part: string, into = 0): { line: number; character: number } {
  const before = text.slice(0, text.indexOf(part) + into).split('\n');
  return { line: before.length - 1, character: (before.at(-1) as string).length };
}

function replacing(text: string, part: string, by: string) {
  return { range: { start: place(text, part), end: place(text, part, part.length) }, text: by };
}

describe('diagnostics that are pushed', () => {
  test('come on opening, with places, page and chain', async () => {
    const editor = await started();
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
    const [found] = editor.latest('pump.py') ?? [];
    expect(found?.range).toEqual({ start: place(pump, 'p + rho*h'), end: place(pump, 'p + rho*h', 9) });
    expect(found).toMatchObject({ severity: 1, source: 'termwise' });
    expect(found?.message).toContain('Pa');
    expect(found?.relatedInformation?.map(({ location }) => location.range.start.line)).toEqual(expect.arrayContaining([0, 2, 3]));
    expect(readFileSync(fileURLToPath(found?.codeDescription?.href ?? ''), 'utf8')).toContain('unlike-terms');
  });

  test('go with the fault and come back with it', async () => {
    const editor = await started();
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
    await editor.change('pump.py', replacing(pump, 'rho*h', 'rho*g*h'));
    await editor.untilCodes('pump.py', []);
    await editor.change('pump.py', replacing(mended, 'rho*g*h', 'rho*h'));
    await editor.untilCodes('pump.py', ['unlike-terms']);
  });

  test('are taken back on closing', async () => {
    const editor = await started();
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
    await editor.close('pump.py');
    await editor.untilCodes('pump.py', []);
  });

  test('follow a nomenclature file, on disk and in the editor', async () => {
    const script = 'total = p + rho*h\n';
    const right = 'p [Pa]\nrho [kg/m^3]\nh [m]\n';
    const editor = await started({ files: { 'plant.nomen': right, 'a/script.py': script } });
    await editor.open('a/script.py', script);
    await editor.untilCodes('a/script.py', ['unlike-terms']);
    await editor.writeFile('plant.nomen', right.replace('h [m]', 'h [m^2/s^2]'));
    await editor.untilCodes('a/script.py', []);
    await editor.open('plant.nomen', right);
    await editor.untilCodes('a/script.py', ['unlike-terms']);
    await editor.change('plant.nomen', replacing(right, 'h [m]', 'h [J/kg]'));
    await editor.untilCodes('a/script.py', []);
  });

  test('follow a module that is edited beside it', async () => {
    const module = 'def head(p):\n    """\n    p : float\n        pressure [Pa]\n    """\n    return p\n';
    const script = 'from hydraulics import head\nh = 3.0  # [m]\nx = head(h)\n';
    const editor = await started({ files: { 'hydraulics.py': module } });
    await editor.open('script.py', script);
    await editor.untilCodes('script.py', ['unlike-result']);
    await editor.open('hydraulics.py', module);
    await editor.change('hydraulics.py', replacing(module, '[Pa]', '[m]'));
    await editor.untilCodes('script.py', []);
  });

  test('of an untitled document', async () => {
    const editor = await started();
    await editor.open('untitled:Untitled-1', pump);
    await editor.untilCodes('untitled:Untitled-1', ['unlike-terms']);
  });

  test('of an unfinished one are only those that stand', async () => {
    const editor = await started();
    await editor.open('pump.py', `${pump}def f(x\n`);
    await editor.untilCodes('pump.py', ['unlike-terms']);
  });
});

describe('settings', () => {
  test('hold from the start', async () => {
    const editor = await started({ settings: { severities: { 'unlike-terms': 'information' } } });
    await editor.open('pump.py', pump);
    await editor.until(() => editor.latest('pump.py')?.[0]?.severity === 3, 'the finding as an information');
  });

  test('silence a check when they change, and bring it back', async () => {
    const editor = await started();
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
    for (const [level, codes] of [['off', []], ['error', ['unlike-terms']]] as const) {
      editor.settings = { severities: { 'unlike-terms': level } };
      await editor.connection.sendNotification(DidChangeConfigurationNotification.type, { settings: null });
      await editor.untilCodes('pump.py', codes);
    }
  });

  test.each([null, [], 'x', { severities: 7, notes: { bare: 'no' } }, { severities: { 'no-such-code': 'error', 'unlike-terms': 'loud' } }])('that make no sense change nothing: %j', async (settings) => {
    const editor = await started({ settings });
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
  });
});

describe('diagnostics that are pulled', () => {
  test('are not pushed, and not sent twice', async () => {
    const editor = await started({ pull: true });
    await editor.open('pump.py', pump);
    const first = await editor.pull('pump.py');
    expect(first.kind === 'full' && first.items.map(({ code }) => code)).toEqual(['unlike-terms']);
    expect((await editor.pull('pump.py', first.resultId)).kind).toBe('unchanged');
    await editor.change('pump.py', replacing(pump, 'rho*h', 'rho*g*h'));
    const second = await editor.pull('pump.py', first.resultId);
    expect(second.kind === 'full' && second.items).toEqual([]);
    expect(editor.published).toEqual([]);
  });

  test('are asked for again when a nomenclature file changes', async () => {
    const editor = await started({ pull: true, files: { 'plant.nomen': 'p [Pa]\nh [m]\n' } });
    await editor.open('script.py', 'x = p + h\n');
    expect(await editor.pull('script.py')).toMatchObject({ items: [{ code: 'unlike-terms' }] });
    await editor.until(() => editor.registered.includes('workspace/didChangeWatchedFiles'), 'the watch on files');
    await editor.writeFile('plant.nomen', 'p [Pa]\nh [Pa]\n');
    await editor.until(() => editor.refreshes > 0, 'a refresh');
    expect(await editor.pull('script.py')).toMatchObject({ items: [] });
  });

  test('of a document that is not open are none', async () => {
    const editor = await started({ pull: true });
    expect(await editor.pull('nowhere.py')).toEqual({ kind: 'full', items: [] });
  });
});

describe('hover', () => {
  const text = async (editor: Client, source: string, part: string, into = 0): Promise<string | undefined> => {
    await editor.open('a.py', source);
    const found = await editor.hover('a.py', place(source, part, into));
    return (found?.contents as MarkupContent | undefined)?.value;
  };

  test.each([
    ['a noted symbol', 'rho = 998', 0, ['`rho`', '[kg/m^3]', 'density of the water', 'Declared', 'line 1']],
    ['a product', '*h', 0, ['`rho*h`', '[kg/m^2]', 'Inferred from', '`rho` [kg/m^3], line 1', '`h` [m], line 3']],
    ['a unit note', 'kg/m^3', 1, ['`kg/m^3`', 'M L⁻³: density']],
  ])('over %s', async (_what, part, into, words) => {
    const found = await text(await started(), pump, part, into);
    for (const word of words) expect(found).toContain(word);
  });

  test.each([['a bare number', '998.0'], ['an unknown name', 'unknown'], ['a blank line', '\n\n']])('says nothing over %s', async (_what, part) => {
    expect(await text(await started(), `${pump}y = unknown\n\n`, part, 1)).toBeUndefined();
  });

  test('covers the symbol, in the encoding agreed on', async () => {
    const source = 'π𝑥 = "𝑥𝑥"; v = 2.0  # [m/s]\n';
    for (const [encoding, column] of [['utf-8', 21], ['utf-16', 14], ['utf-32', 11]] as const) {
      const editor = await started({ encodings: ['x-unknown', encoding] });
      expect(editor.initialized?.capabilities.positionEncoding).toBe(encoding);
      await editor.open('a.py', source);
      const found = await editor.hover('a.py', { line: 0, character: column });
      expect(found?.range).toEqual({ start: { line: 0, character: column }, end: { line: 0, character: column + 1 } });
      await editor.stop();
    }
  });
});

describe('what goes wrong', () => {
  test('a request for a document that is not open is answered with nothing', async () => {
    expect(await (await started()).hover('nowhere.py', { line: 3, character: 9 })).toBeNull();
  });

  test('a position beyond the text is clipped', async () => {
    const editor = await started();
    await editor.open('a.py', pump);
    expect(await editor.hover('a.py', { line: 999, character: 999 })).toBeNull();
  });

  test('parameters that make no sense are refused, and the server goes on', async () => {
    const editor = await started();
    await expect(editor.connection.sendRequest('textDocument/hover', { nothing: true })).rejects.toThrow();
    await expect(editor.connection.sendRequest('textDocument/noSuchThing', {})).rejects.toThrow();
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
  });

  test('a change of a document that is not open is left', async () => {
    const editor = await started();
    await editor.change('nowhere.py', { text: pump });
    await editor.open('pump.py', pump);
    await editor.untilCodes('pump.py', ['unlike-terms']);
    expect(editor.latest('nowhere.py')).toBeUndefined();
  });

  test('a cancelled request ends as cancelled', async () => {
    const editor = await started();
    await editor.open('pump.py', pump.repeat(300));
    const { CancellationTokenSource } = await import('vscode-languageserver/node.js');
    const source = new CancellationTokenSource();
    const answer = editor.connection.sendRequest(HoverRequest.type, { textDocument: { uri: editor.uri('pump.py') }, position: { line: 0, character: 0 } }, source.token);
    source.cancel();
    await expect(answer).rejects.toMatchObject({ code: -32800 });
  });
});
