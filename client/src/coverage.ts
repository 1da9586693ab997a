/** How many units of the document in front are known, and a view of the symbols that have none, most used first. */
import { commands, EventEmitter, type ExtensionContext, l10n, Range, Selection, StatusBarAlignment, type TextEditor, ThemeIcon, type TreeDataProvider, TreeItem, Uri, window, workspace } from 'vscode';
import { type BaseLanguageClient, State } from 'vscode-languageclient';
import type { CoverageAnswer, FileCoverage } from '../../server/src/lsp/requests/coverage.ts';

/** After the last change, in milliseconds: counting must not hurry anybody. */
const pause = 600;

type OpenSymbol = FileCoverage['open'][number];

export function registerCoverage(context: ExtensionContext, client: BaseLanguageClient): void {
  const symbols = new OpenSymbols();
  const view = window.createTreeView('termwise.openUnits', { treeDataProvider: symbols });
  const bar = window.createStatusBarItem('termwise.coverage', StatusBarAlignment.Right, 90);
  bar.name = l10n.t('Known units');
  bar.command = 'termwise.openUnits.focus';
  let timer: NodeJS.Timeout | undefined;
  const count = async (): Promise<void> => {
    const editor = window.activeTextEditor;
    const found = editor && client.state === State.Running ? await ask(client, editor) : undefined;
    symbols.show(found);
    if (!found || found.all === 0) {
      bar.hide();
      view.message = '';
      return;
    }
    bar.text = l10n.t('Units {0}/{1}', found.known, found.all);
    bar.tooltip = l10n.t('{0} of {1} symbols have a known unit. Choose this to see the others.', found.known, found.all);
    view.message = found.open.length === 0 ? l10n.t('Every symbol of this file has a known unit.') : l10n.t('{0} of {1} units are known.', found.known, found.all);
    bar.show();
  };
  const later = (): void => {
    clearTimeout(timer);
    timer = setTimeout(() => void count(), pause);
  };
  context.subscriptions.push(
    view, bar, { dispose: () => clearTimeout(timer) },
    window.onDidChangeActiveTextEditor(later),
    workspace.onDidChangeTextDocument(({ document }) => document === window.activeTextEditor?.document && later()),
    client.onDidChangeState(later),
    commands.registerCommand('termwise.reveal', reveal),
    commands.registerCommand('termwise.copyCoverage', () => copyAll(client)),
  );
}

async function ask(client: BaseLanguageClient, { document }: TextEditor): Promise<FileCoverage | undefined> {
  try {
    const answer = await client.sendRequest<CoverageAnswer>('termwise/coverage', { textDocument: { uri: client.code2ProtocolConverter.asUri(document.uri) } });
    return answer.files[0];
  } catch {
    // The document changed, or the server is on its way down: the next change asks again.
    return undefined;
  }
}

/** The counts of the whole workspace, as other tools can read them. */
async function copyAll(client: BaseLanguageClient): Promise<void> {
  const { files } = await client.sendRequest<CoverageAnswer>('termwise/coverage', {});
  const known = files.reduce((sum, file) => sum + file.known, 0);
  const all = files.reduce((sum, file) => sum + file.all, 0);
  const { env } = await import('vscode');
  await env.clipboard.writeText(JSON.stringify({ version: 1, known, all, files: files.map(({ uri, known: own, all: total }) => ({ uri, known: own, all: total })) }, undefined, 2));
  void window.showInformationMessage(l10n.t('{0} of {1} units are known in {2} files. The counts are on the clipboard.', known, all, files.length));
}

async function reveal(uri: string, { start, end }: OpenSymbol['range']): Promise<void> {
  const editor = await window.showTextDocument(Uri.parse(uri));
  editor.selection = new Selection(start.line, start.character, end.line, end.character);
  editor.revealRange(new Range(editor.selection.start, editor.selection.end));
}

class OpenSymbols implements TreeDataProvider<OpenSymbol> {
  private readonly changed = new EventEmitter<undefined>();
  readonly onDidChangeTreeData = this.changed.event;
  private file: FileCoverage | undefined;

  show(file: FileCoverage | undefined): void {
    this.file = file;
    this.changed.fire(undefined);
  }

  getChildren(): OpenSymbol[] {
    return [...(this.file?.open ?? [])];
  }

  getTreeItem({ name, owner, uses, range }: OpenSymbol): TreeItem {
    const item = new TreeItem(name);
    const often = uses === 1 ? l10n.t('used once') : l10n.t('used {0} times', uses);
    item.description = owner === undefined ? often : l10n.t('in {0}, {1}', owner, often);
    item.iconPath = new ThemeIcon('symbol-variable');
    item.command = { command: 'termwise.reveal', title: l10n.t('Show'), arguments: [this.file?.uri, range] };
    return item;
  }
}
