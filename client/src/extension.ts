/** The editor's side: starts the language server and keeps it running. It analyses nothing. */
import { commands, type ExtensionContext, LanguageStatusSeverity, languages, type LanguageStatusItem, window } from 'vscode';
import { CloseAction, ErrorAction, type ErrorHandler, LanguageClient, type LanguageClientOptions, type ServerOptions, State, TransportKind } from 'vscode-languageclient/node';

const name = 'Termwise';
/** Documents on disk, and those that were never saved. */
const documents = ['file', 'untitled'].flatMap((scheme) => ['python', 'nomenclature'].map((language) => ({ scheme, language })));
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
  const options: LanguageClientOptions = { documentSelector: documents, outputChannel: output, errorHandler: restarting(status), initializationFailedHandler: () => false };
  client = new LanguageClient('termwise', name, server, options);
  context.subscriptions.push(
    output, status, client,
    client.onDidChangeState(({ newState }) => show(status, newState)),
    commands.registerCommand('termwise.restartServer', () => client?.restart()),
    commands.registerCommand('termwise.showOutput', () => output.show()),
  );
  await client.start();
}

export function deactivate(): Promise<void> | undefined {
  return client?.stop();
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
