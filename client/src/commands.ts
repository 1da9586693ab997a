/** The commands of the palette, and those that the server's answers refer to. */
import { commands, type ExtensionContext, l10n, type LogOutputChannel, Position, Selection, Uri, window, workspace } from 'vscode';
import type { BaseLanguageClient, Position as SentPosition, Range as SentRange } from 'vscode-languageclient';

export function registerCommands(context: ExtensionContext, client: BaseLanguageClient, output: LogOutputChannel): void {
  const register = (name: string, run: (...args: never[]) => unknown): void => void context.subscriptions.push(commands.registerCommand(`termwise.${name}`, run));
  register('restartServer', () => restart(client));
  register('showOutput', () => output.show());
  register('writeGroups', () => rewrite());
  register('fixProven', () => commands.executeCommand('editor.action.codeAction', { kind: 'source.fixAll.termwise', apply: 'first' }));
  register('goToUnit', () => commands.executeCommand('editor.action.goToTypeDefinition'));
  register('openExamples', () => openExamples(context));
  register('select', select);
  register('showActions', showActions);
}

/** The client for Node can do it in one step; that for browsers in two. */
async function restart(client: BaseLanguageClient): Promise<void> {
  await client.stop();
  await client.start();
}

/** Selects what a fix leaves to be filled in. */
async function select(uri: string, { start, end }: SentRange): Promise<void> {
  const editor = await window.showTextDocument(Uri.parse(uri));
  editor.selection = new Selection(start.line, start.character, end.line, end.character);
  editor.revealRange(editor.selection);
}

/** From a count above a function or a relation: what can be written there. */
async function showActions(uri: string, { line, character }: SentPosition): Promise<void> {
  const editor = await window.showTextDocument(Uri.parse(uri));
  const at = new Position(line, character);
  editor.selection = new Selection(at, at);
  await rewrite();
}

function rewrite(): Thenable<unknown> {
  return commands.executeCommand('editor.action.codeAction', { kind: 'refactor.rewrite.termwise', apply: 'never' });
}

/** The examples are copied where their reader may edit them: what an extension brings is replaced at its next version. */
async function openExamples(context: ExtensionContext): Promise<void> {
  const from = Uri.joinPath(context.extensionUri, 'examples');
  const to = Uri.joinPath(context.globalStorageUri, 'examples');
  await workspace.fs.copy(from, to, { overwrite: true });
  const choice = await window.showInformationMessage(l10n.t('The examples are a folder of their own. Open it in a new window?'), { modal: false }, l10n.t('Open'));
  if (choice !== undefined) await commands.executeCommand('vscode.openFolder', to, { forceNewWindow: true });
}
