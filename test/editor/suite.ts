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
