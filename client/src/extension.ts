/** The editor's side: starts the language server and keeps it running. It analyses nothing. */
import { commands, type ExtensionContext, LanguageStatusSeverity, languages, type LanguageStatusItem, Selection, Uri, window, workspace } from 'vscode';
import { CloseAction, ErrorAction, type ErrorHandler, type InitializeParams, LanguageClient, type LanguageClientOptions, type Range, type ServerOptions, State, TransportKind } from 'vscode-languageclient/node';
import { documents } from './documents.ts';

const name = 'Termwise';
/** A server that ends more often than this in the time below (in milliseconds) is not started again by itself. */
const mostRestarts = 5;
const restartTime = 3 * 60_000;

let client: LanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const output = window.createOutputChannel(name, { log: true });
  const status = languages.createLanguageStatusItem('termwise.server', documents);
  status.name = name;
  status.command = { command: 'termwise.showOutput', title: 'Output' };
  const module = context.asAbsolutePath('dist/language-server.js');
  const server: ServerOptions = { run: { module, transport: TransportKind.ipc }, debug: { module, transport: TransportKind.ipc } };
  const options: LanguageClientOptions = {
    documentSelector: [...documents], outputChannel: output, errorHandler: restarting(status), initializationFailedHandler: () => false,
    initializationOptions: { ...workspace.getConfiguration('termwise'), select: true },
  };
  client = new PushedTo('termwise', name, server, options);
  context.subscriptions.push(
    output, status, client,
    client.onDidChangeState(({ newState }) => show(status, newState)),
    commands.registerCommand('termwise.restartServer', () => client?.restart()),
    commands.registerCommand('termwise.showOutput', () => output.show()),
    commands.registerCommand('termwise.select', select),
  );
  await client.start();
}

export function deactivate(): Promise<void> | undefined {
  return client?.stop();
}

/** Findings are pushed: after a restart every open document gets its own again, whether it is in sight or not. */
class PushedTo extends LanguageClient {
  protected override fillInitializeParams(params: InitializeParams): void {
    super.fillInitializeParams(params);
    delete params.capabilities.textDocument?.diagnostic;
    delete params.capabilities.workspace?.diagnostics;
  }
}

/** Selects what a fix leaves to be filled in. */
async function select(uri: string, { start, end }: Range): Promise<void> {
  const editor = await window.showTextDocument(Uri.parse(uri));
  editor.selection = new Selection(start.line, start.character, end.line, end.character);
  editor.revealRange(editor.selection);
}

/** A server that ends is started again, unless it goes on ending. */
function restarting(status: LanguageStatusItem): ErrorHandler {
  const ends: number[] = [];
  return {
    error: () => ({ action: ErrorAction.Continue }),
    closed: () => {
      const now = Date.now();
      ends.push(now);
      if (ends.filter((each) => now - each < restartTime).length <= mostRestarts) return { action: CloseAction.Restart };
      status.severity = LanguageStatusSeverity.Error;
      return { action: CloseAction.DoNotRestart, message: 'The language server of Termwise ended several times and is not started again. The command "Termwise: Restart the Language Server" starts it.' };
    },
  };
}

function show(status: LanguageStatusItem, state: State): void {
  status.busy = state === State.Starting;
  status.severity = state === State.Stopped ? LanguageStatusSeverity.Error : LanguageStatusSeverity.Information;
  status.text = state === State.Running ? 'Units are checked' : state === State.Starting ? 'Starting' : 'Not running';
}
