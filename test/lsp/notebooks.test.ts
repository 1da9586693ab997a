/** Notebooks over the protocol: cells sent one by one, findings in them. */
import { afterEach, describe, expect, test } from 'vitest';
import { type Hover, type MarkupContent, NotebookCellKind } from 'vscode-languageserver/node.js';
import { Client } from './client.ts';

let client: Client | undefined;

afterEach(async () => {
  await client?.stop();
  client = undefined;
});

const cells = [
  ['markdown', '# Pump test'],
  ['python', 'rho = 998.0  # [kg/m^3]\nh = 12.0  # [m]'],
  ['python', '%matplotlib inline\np = 2.0e5  # [Pa]'],
  ['python', 'total = p + rho*h'],
] as const;

async function opened(files = {}): Promise<{ readonly editor: Client; readonly uri: (index: number) => string }> {
  client = await Client.start({ files });
  const editor = client;
  const uri = (index: number): string => `vscode-notebook-cell:/w/pump.ipynb#c${index}`;
  await editor.connection.sendNotification('notebookDocument/didOpen', {
    notebookDocument: { uri: editor.uri('pump.ipynb'), notebookType: 'jupyter-notebook', version: 1, cells: cells.map(([language], index) => ({ kind: language === 'markdown' ? NotebookCellKind.Markup : NotebookCellKind.Code, document: uri(index) })) },
    cellTextDocuments: cells.map(([languageId, text], index) => ({ uri: uri(index), languageId, version: 1, text })),
  });
  return { editor, uri };
}

const codesOf = (editor: Client, uri: string): readonly unknown[] | undefined => editor.published.findLast((each) => each.uri === uri)?.diagnostics.map(({ code }) => code);

describe('a notebook', () => {
  test('has its findings in the cells, as one program', async () => {
    const { editor, uri } = await opened();
    await editor.until(() => codesOf(editor, uri(3))?.length === 1, 'the finding of the last cell');
    expect([0, 1, 2, 3].map((index) => codesOf(editor, uri(index)))).toEqual([[], [], [], ['unlike-terms']]);
    const [found] = editor.published.findLast((each) => each.uri === uri(3))?.diagnostics ?? [];
    expect(found?.range).toEqual({ start: { line: 0, character: 8 }, end: { line: 0, character: 17 } });
    expect(found?.message).toContain('cell 2');
  });

  test('follows edits, new cells and cells that go', async () => {
    const { editor, uri } = await opened();
    await editor.until(() => codesOf(editor, uri(3))?.length === 1, 'the finding of the last cell');
    const notebookDocument = { uri: editor.uri('pump.ipynb'), version: 2 };
    await editor.connection.sendNotification('notebookDocument/didChange', {
      notebookDocument, change: { cells: { textContent: [{ document: { uri: uri(3), version: 2 }, changes: [{ range: { start: { line: 0, character: 16 }, end: { line: 0, character: 16 } }, text: '9.81*' }] }] } },
    });
    await editor.until(() => codesOf(editor, uri(3))?.[0] === 'hidden-unit', 'another finding');
    const added = 'vscode-notebook-cell:/w/pump.ipynb#c9';
    await editor.connection.sendNotification('notebookDocument/didChange', {
      notebookDocument: { ...notebookDocument, version: 3 },
      change: { cells: { structure: { array: { start: 4, deleteCount: 0, cells: [{ kind: NotebookCellKind.Code, document: added }] }, didOpen: [{ uri: added, languageId: 'python', version: 1, text: 'x = p + h' }] } } },
    });
    await editor.until(() => codesOf(editor, added)?.[0] === 'unlike-terms', 'the finding of the new cell');
  });

  test('answers in the cells, and follows its nomenclature', async () => {
    const { editor, uri } = await opened();
    await editor.until(() => codesOf(editor, uri(3))?.length === 1, 'the finding of the last cell');
    const found = await editor.connection.sendRequest<Hover>('textDocument/hover', { textDocument: { uri: uri(3) }, position: { line: 0, character: 13 } });
    expect((found.contents as MarkupContent).value).toContain('[kg/m^3]');
    expect(found.range?.start).toEqual({ line: 0, character: 12 });
    const actions = await editor.connection.sendRequest<{ title: string; edit: { changes: Record<string, unknown> } }[]>('textDocument/codeAction', { textDocument: { uri: uri(3) }, range: { start: { line: 0, character: 10 }, end: { line: 0, character: 10 } }, context: { diagnostics: [] } });
    expect(actions.length).toBeGreaterThan(0);
    for (const { edit } of actions) expect(Object.keys(edit.changes).every((each) => each.startsWith('vscode-notebook-cell:'))).toBe(true);
  });

  test('that is closed takes its findings back', async () => {
    const { editor, uri } = await opened();
    await editor.until(() => codesOf(editor, uri(3))?.length === 1, 'the finding of the last cell');
    await editor.connection.sendNotification('notebookDocument/didClose', { notebookDocument: { uri: editor.uri('pump.ipynb') }, cellTextDocuments: [] });
    await editor.until(() => codesOf(editor, uri(3))?.length === 0, 'no findings');
  });
});
