/** Runs inside the extension host of a real VS Code, on the desktop or in the browser; the packaged extension is installed there. */
import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import * as assert from 'node:assert/strict';
import * as vscode from 'vscode';

const patience = 60_000;
const extensionId = 'termwise.termwise';

/** A relation with one fault in its last line. */
const faulty = 'p = 2.0e5  # [Pa]\nh = 12.0  # [m]\ntotal = p + h\n';

const cases: Readonly<Record<string, () => Promise<void>>> = {
  'the extension is the packaged one and starts': async () => {
    const extension = vscode.extensions.getExtension(extensionId);
    assert.ok(extension, 'not installed');
    await extension.activate();
    assert.equal(extension.packageJSON.capabilities.untrustedWorkspaces.supported, true);
    const commands = await vscode.commands.getCommands(true);
    assert.ok(commands.includes('termwise.restartServer') && commands.includes('termwise.showOutput'));
  },

  'the examples have their findings': async () => {
    const { uri } = await open('mixer.py');
    const found = await until(() => codes(uri), (now) => now.length === 2, 'two findings in mixer.py');
    assert.deepEqual([...found].sort(), ['hidden-unit', 'scale-mismatch']);
    const [first] = vscode.languages.getDiagnostics(uri);
    assert.equal(first?.source, 'termwise');
    assert.ok((first?.relatedInformation ?? []).length > 0, 'no related places');
    const code = first?.code as { readonly target: vscode.Uri };
    assert.match(readFileSync(code.target.fsPath, 'utf8'), /^# /, 'the page of the code cannot be opened');
  },

  'hover tells unit, kind and origin': async () => {
    const document = await open('mixer.py');
    const at = document.positionAt(document.getText().indexOf('M * omega'));
    const text = await until(() => hoverAt(document.uri, at), (now) => now.includes('[N m]'), 'a hover over M');
    assert.match(text, /Declared/);
    const rho = document.positionAt(document.getText().indexOf('rho * N * D**2'));
    assert.match(await hoverAt(document.uri, rho), /bench\.nomen, line \d+/);
  },

  'a finding goes with its fault and comes back': async () => {
    const document = await open('mixer.py');
    await replace(document, 'omega = n / 60 ', 'omega = 2 * pi * n / 60 ');
    await untilCodes(document.uri, ['hidden-unit']);
    await vscode.commands.executeCommand('undo');
    await untilCodes(document.uri, ['hidden-unit', 'scale-mismatch']);
  },

  'a nomenclature file is told apart, and scripts follow it': async () => {
    const nomenclature = await open('bench.nomen');
    assert.equal(nomenclature.languageId, 'nomenclature');
    const script = await open('dosing.py', vscode.ViewColumn.Two);
    const before = await until(() => codes(script.uri), (now) => now.length > 0, 'the findings of dosing.py');
    const mixer = await open('mixer.py', vscode.ViewColumn.Two);
    await untilCodes(mixer.uri, ['hidden-unit', 'scale-mismatch']);
    await replace(nomenclature, 'D        [m]', 'D        [kg]');
    await until(() => codes(mixer.uri), (now) => now.length > 2, 'more findings in mixer.py');
    await replace(nomenclature, 'D        [kg]', 'D        [m]');
    await untilCodes(mixer.uri, ['hidden-unit', 'scale-mismatch']);
    assert.ok(before.length > 0);
  },

  'a nomenclature file saved counts too': async () => {
    const mixer = await open('mixer.py');
    const nomenclature = await open('bench.nomen', vscode.ViewColumn.Two);
    await replace(nomenclature, 'D        [m]', 'D        [kg]');
    await nomenclature.save();
    await until(() => codes(mixer.uri), (now) => now.length > 2, 'more findings in mixer.py');
    await replace(nomenclature, 'D        [kg]', 'D        [m]');
    await nomenclature.save();
    await untilCodes(mixer.uri, ['hidden-unit', 'scale-mismatch']);
  },

  'an untitled document is checked': async () => {
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: faulty });
    await vscode.window.showTextDocument(document);
    await untilCodes(document.uri, ['unlike-terms']);
  },

  'an unfinished document keeps the findings that stand': async () => {
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: `${faulty}\ndef f(a, b:\n    return a +\n` });
    await vscode.window.showTextDocument(document);
    await untilCodes(document.uri, ['unlike-terms']);
  },

  'a large document is checked': async () => {
    const content = Array.from({ length: 1000 }, (_, at) => `def f${at}(p, h):\n    """p [Pa], h [m]"""\n    q = p / 2  # [Pa]\n    return q\n\n`).join('');
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: `${content}${faulty}` });
    await vscode.window.showTextDocument(document);
    await untilCodes(document.uri, ['unlike-terms']);
  },

  'a setting silences a check and brings it back': async () => {
    const { uri } = await open('mixer.py');
    const settings = vscode.workspace.getConfiguration('termwise');
    await settings.update('severities.hidden-unit', 'off', vscode.ConfigurationTarget.Workspace);
    await untilCodes(uri, ['scale-mismatch']);
    await settings.update('severities.hidden-unit', undefined, vscode.ConfigurationTarget.Workspace);
    await untilCodes(uri, ['hidden-unit', 'scale-mismatch']);
  },

  'a fix of the light bulb settles its finding, and undo restores': async () => {
    const document = await open('dosing.py');
    const codesBefore = await until(() => codes(document.uri), (now) => now.includes('scale-mismatch'), 'a scale-mismatch in dosing.py');
    const before = document.getText();
    const found = vscode.languages.getDiagnostics(document.uri).find(({ code }) => String(typeof code === 'object' ? code.value : code) === 'scale-mismatch');
    assert.ok(found);
    const actions = await actionsAt(document.uri, found.range, vscode.CodeActionKind.QuickFix.value);
    const [first] = actions.filter(({ edit, isPreferred }) => edit && isPreferred);
    assert.ok(first?.edit, `no preferred fix among ${actions.map(({ title }) => title).join('; ')}`);
    assert.ok(await vscode.workspace.applyEdit(first.edit));
    await until(() => codes(document.uri), (now) => now.length === codesBefore.length - 1, 'one finding less');
    await vscode.commands.executeCommand('undo');
    await untilCodes(document.uri, codesBefore);
    assert.equal(document.getText(), before);
  },

  'all proven fixes are applied by command': async () => {
    const document = await open('dosing.py');
    const before = await until(() => codes(document.uri), (now) => now.includes('scale-mismatch'), 'a scale-mismatch in dosing.py');
    await vscode.commands.executeCommand('termwise.fixProven');
    await until(() => codes(document.uri), (now) => !now.includes('scale-mismatch'), 'no scale-mismatch in dosing.py');
    await vscode.commands.executeCommand('undo');
    await untilCodes(document.uri, before);
  },

  'a sentence becomes groups': async () => {
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: 'T = 2.0  # [s] period\nl = 1.0  # [m] length\ng = 9.81  # [m/s^2]\n' });
    const editor = await vscode.window.showTextDocument(document);
    await editor.edit((edit) => edit.insert(new vscode.Position(3, 0), '# T depends on l, g\n'));
    const at = new vscode.Range(3, 5, 3, 5);
    const actions = await until(() => actionsAt(document.uri, at, 'refactor.rewrite'), (now) => now.some(({ title }) => title.startsWith('Write T =')), 'the groups of a pendulum');
    const equation = actions.find(({ title }) => title.startsWith('Write T ='));
    assert.ok(equation?.edit && (await vscode.workspace.applyEdit(equation.edit)));
    assert.match(document.getText(), /# T = .*sqrt\(l\/g\)|# T = sqrt\(l\/g\)/);
  },

  'hints, outline and counts are shown': async () => {
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: 'V = 2.0  # [m/s]\nt = 3.0  # [s]\n\ndef way(v):\n    # v [m/s]\n    x = v*t\n    return x\n' });
    await vscode.window.showTextDocument(document);
    const all = new vscode.Range(0, 0, 9, 0);
    const hints = await until(async () => await vscode.commands.executeCommand<vscode.InlayHint[]>('vscode.executeInlayHintProvider', document.uri, all), (now) => now.length > 0, 'hints');
    assert.deepEqual(hints.map(({ label }) => label), ['[m]']);
    const symbols = await vscode.commands.executeCommand<vscode.DocumentSymbol[]>('vscode.executeDocumentSymbolProvider', document.uri);
    assert.ok(symbols.some(({ name, detail }) => name === 'V' && detail === '[m/s]'), JSON.stringify(symbols.map(({ name, detail }) => [name, detail])));
    const lenses = await vscode.commands.executeCommand<vscode.CodeLens[]>('vscode.executeCodeLensProvider', document.uri);
    assert.ok(lenses.some(({ command }) => command?.title === 'units known 2/2'), JSON.stringify(lenses.map(({ command }) => command?.title)));
  },

  'completion inside a note begins with the unit that follows': async () => {
    const document = await vscode.workspace.openTextDocument({ language: 'python', content: 'F = 2.0  # [N]\nA = 3.0  # [m^2]\np = F/A  # [\n' });
    await vscode.window.showTextDocument(document);
    const list = await until(async () => await vscode.commands.executeCommand<vscode.CompletionList>('vscode.executeCompletionItemProvider', document.uri, new vscode.Position(2, 12)), ({ items }) => items.some(({ label }) => label === 'kPa'), 'units');
    const sorted = [...list.items].filter(({ sortText }) => /^\d{4}$/.test(sortText ?? '')).sort((a, b) => (a.sortText ?? '').localeCompare(b.sortText ?? ''));
    assert.equal(sorted[0]?.label, 'Pa');
  },

  'a nomenclature file is aligned, and its symbol renamed in the scripts': async () => {
    const document = await open('bench.nomen');
    const edits = await vscode.commands.executeCommand<vscode.TextEdit[]>('vscode.executeFormatDocumentProvider', document.uri, { tabSize: 2, insertSpaces: true });
    assert.ok(Array.isArray(edits));
    const at = document.positionAt(document.getText().indexOf('\nNp ') + 1);
    const edit = await vscode.commands.executeCommand<vscode.WorkspaceEdit>('vscode.executeDocumentRenameProvider', document.uri, at, 'N_p');
    assert.ok(edit.entries().some(([uri]) => uri.path.endsWith('bench.nomen')));
  },

  'the unit leads to its note': async () => {
    const document = await open('mixer.py');
    const at = document.positionAt(document.getText().indexOf('rho * N * D**2'));
    const places = await vscode.commands.executeCommand<readonly (vscode.Location | vscode.LocationLink)[]>('vscode.executeTypeDefinitionProvider', document.uri, at);
    const uris = places.map((place) => ('targetUri' in place ? place.targetUri : place.uri).path);
    assert.ok(uris.some((path) => path.endsWith('bench.nomen')), uris.join());
  },

  'scripts in every other language have their findings': async () => {
    const folder = vscode.workspace.workspaceFolders?.[0];
    assert.ok(folder);
    const names = (await vscode.workspace.fs.readDirectory(folder.uri)).filter(([name, type]) => type === vscode.FileType.File && !/\.(?:py|nomen|md)$/.test(name)).map(([name]) => name);
    assert.ok(names.length > 0, 'no script in another language');
    for (const name of names) {
      const { uri } = await open(name);
      await until(() => codes(uri), (now) => now.length > 0, `a finding in ${name}`);
    }
  },

  'a notebook has its findings in its cells': async () => {
    const folder = vscode.workspace.workspaceFolders?.[0];
    assert.ok(folder);
    const file = vscode.Uri.joinPath(folder.uri, 'bench.ipynb');
    const cell = (source: string) => ({ cell_type: 'code', execution_count: null, metadata: {}, outputs: [], source });
    const notebook = { cells: [cell('p = 2.0e5  # [Pa]\nh = 12.0  # [m]'), cell('total = p + h')], metadata: { kernelspec: { name: 'python3', display_name: 'Python 3', language: 'python' }, language_info: { name: 'python' } }, nbformat: 4, nbformat_minor: 5 };
    await vscode.workspace.fs.writeFile(file, new TextEncoder().encode(JSON.stringify(notebook)));
    const document = await vscode.workspace.openNotebookDocument(file);
    await vscode.window.showNotebookDocument(document);
    const last = document.cellAt(1).document.uri;
    await until(() => codes(last), (now) => now.join() === 'unlike-terms', 'a finding in the second cell');
    assert.deepEqual(codes(document.cellAt(0).document.uri), []);
    await vscode.commands.executeCommand('workbench.action.closeActiveEditor');
    await vscode.workspace.fs.delete(file);
  },

  'the server is started again by command': async () => {
    const { uri } = await open('mixer.py');
    const before = await until(() => serverProcesses(), (now) => now.length === 1, 'one server');
    await vscode.commands.executeCommand('termwise.restartServer');
    await until(() => serverProcesses(), (now) => now.length === 1 && now[0] !== before[0], 'another server');
    await untilCodes(uri, ['hidden-unit', 'scale-mismatch']);
  },

  'a server that is killed comes back, and goes on with what is open': async () => {
    const document = await open('mixer.py');
    const [killed] = serverProcesses();
    assert.ok(killed, 'no server runs');
    process.kill(killed, 'SIGKILL');
    await until(() => serverProcesses(), (now) => now.length === 1 && now[0] !== killed, 'another server');
    await untilCodes(document.uri, ['hidden-unit', 'scale-mismatch']);
    await replace(document, 'omega = n / 60 ', 'omega = 2 * pi * n / 60 ');
    await untilCodes(document.uri, ['hidden-unit']);
    await vscode.commands.executeCommand('undo');
    await untilCodes(document.uri, ['hidden-unit', 'scale-mismatch']);
  },
};

/** The contract of `@vscode/test-electron`: rejects where a case failed. */
export async function run(): Promise<void> {
  const failed: string[] = [];
  for (const [name, test] of Object.entries(cases)) {
    const start = Date.now();
    try {
      await test();
      console.log(`ok: ${name} (${Date.now() - start} ms)`);
    } catch (error) {
      failed.push(name);
      console.log(`FAILED: ${name}: ${error instanceof Error ? error.message : String(error)}`);
    }
  }
  console.log(`${Object.keys(cases).length - failed.length} passed, ${failed.length} failed in the editor`);
  if (failed.length > 0) throw new Error(`failed: ${failed.join('; ')}`);
}

async function open(name: string, column = vscode.ViewColumn.One): Promise<vscode.TextDocument> {
  const folder = vscode.workspace.workspaceFolders?.[0];
  assert.ok(folder, 'no folder is open');
  const document = await vscode.workspace.openTextDocument(vscode.Uri.joinPath(folder.uri, name));
  await vscode.window.showTextDocument(document, column);
  return document;
}

async function replace(document: vscode.TextDocument, part: string, by: string): Promise<void> {
  const at = document.getText().indexOf(part);
  assert.ok(at >= 0, `"${part}" is not in ${document.fileName}`);
  const edit = new vscode.WorkspaceEdit();
  edit.replace(document.uri, new vscode.Range(document.positionAt(at), document.positionAt(at + part.length)), by);
  assert.ok(await vscode.workspace.applyEdit(edit));
}

function codes(uri: vscode.Uri): readonly string[] {
  return vscode.languages.getDiagnostics(uri).filter(({ source }) => source === 'termwise').map(({ code }) => String(typeof code === 'object' ? code.value : code)).sort();
}

async function hoverAt(uri: vscode.Uri, at: vscode.Position): Promise<string> {
  const hovers = await vscode.commands.executeCommand<vscode.Hover[]>('vscode.executeHoverProvider', uri, at);
  return hovers.flatMap(({ contents }) => contents.map((each) => (typeof each === 'string' ? each : each.value))).join('\n');
}

async function actionsAt(uri: vscode.Uri, range: vscode.Range, kind: string): Promise<readonly vscode.CodeAction[]> {
  const found = await vscode.commands.executeCommand<(vscode.CodeAction | vscode.Command)[]>('vscode.executeCodeActionProvider', uri, range, kind);
  return found.filter((each): each is vscode.CodeAction => typeof each.command !== 'string');
}

/** The language servers that this extension host started, by process. */
function serverProcesses(): readonly number[] {
  const listed = execFileSync('ps', ['-A', '-o', 'pid=,ppid=,args='], { encoding: 'utf8', maxBuffer: 1 << 24 });
  return listed.split('\n').flatMap((line) => {
    const [pid, parent] = line.trim().split(/\s+/, 2).map(Number);
    return parent === process.pid && line.includes('language-server.js') && !line.includes('<defunct>') ? [pid as number] : [];
  });
}

function untilCodes(uri: vscode.Uri, wanted: readonly string[]): Promise<unknown> {
  return until(() => codes(uri), (now) => now.join() === [...wanted].sort().join(), `${wanted.join(', ')} in ${uri.path}`);
}

async function until<T>(look: () => T | Promise<T>, holds: (now: T) => boolean, what: string): Promise<T> {
  const end = Date.now() + patience;
  for (;;) {
    const now = await look();
    if (holds(now)) return now;
    if (Date.now() > end) throw new Error(`still waiting for ${what}; now: ${JSON.stringify(now)}`);
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}
