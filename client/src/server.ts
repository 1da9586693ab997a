/** The language server's process, and what stands of it in the status bar. */
import { type ExtensionContext, l10n, languages, type LanguageStatusItem, LanguageStatusSeverity, type LogOutputChannel } from 'vscode';
import { CloseAction, ErrorAction, type ErrorHandler, type InitializeParams, LanguageClient, type LanguageClientOptions, type ServerOptions, State, TransportKind } from 'vscode-languageclient/node';
import { documents } from './documents.ts';
import { initializationOptions } from './options.ts';

/** A server that ends more often than this in the time below (in milliseconds) is not started again by itself. */
const mostRestarts = 5;
const restartTime = 3 * 60_000;

/** The client, not started yet. */
export function createClient(context: ExtensionContext, name: string, output: LogOutputChannel): LanguageClient {
  const status = languages.createLanguageStatusItem('termwise.server', [...documents]);
  status.name = name;
  status.command = { command: 'termwise.showOutput', title: l10n.t('Output') };
  const module = context.asAbsolutePath('dist/language-server.js');
  const server: ServerOptions = { run: { module, transport: TransportKind.ipc }, debug: { module, transport: TransportKind.ipc } };
  const options: LanguageClientOptions = {
    documentSelector: [...documents], outputChannel: output, errorHandler: restarting(status), initializationFailedHandler: () => false,
    initializationOptions: initializationOptions(),
  };
  const client = new PushedTo('termwise', name, server, options);
  context.subscriptions.push(status, client.onDidChangeState(({ newState }) => show(status, newState)));
  return client;
}

/** Findings are pushed: after a restart every open document gets its own again, whether it is in sight or not. */
class PushedTo extends LanguageClient {
  protected override fillInitializeParams(params: InitializeParams): void {
    super.fillInitializeParams(params);
    delete params.capabilities.textDocument?.diagnostic;
    delete params.capabilities.workspace?.diagnostics;
  }
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
      return { action: CloseAction.DoNotRestart, message: l10n.t('The language server of Termwise ended several times and is not started again. The command "Termwise: Restart the Language Server" starts it.') };
    },
  };
}

function show(status: LanguageStatusItem, state: State): void {
  status.busy = state === State.Starting;
  status.severity = state === State.Stopped ? LanguageStatusSeverity.Error : LanguageStatusSeverity.Information;
  status.text = state === State.Running ? l10n.t('Units are checked') : state === State.Starting ? l10n.t('Starting') : l10n.t('Not running');
}
