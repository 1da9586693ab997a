/** The editor's side: starts the language server, registers commands and the view of open units. It analyses nothing. */
import { type ExtensionContext, window } from 'vscode';
import type { LanguageClient } from 'vscode-languageclient/node';
import { registerCommands } from './commands.ts';
import { registerCoverage } from './coverage.ts';
import { createClient } from './server.ts';

const name = 'Termwise';
let client: LanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const output = window.createOutputChannel(name, { log: true });
  client = createClient(context, name, output);
  context.subscriptions.push(output, client);
  registerCommands(context, client, output);
  registerCoverage(context, client);
  await client.start();
}

export function deactivate(): Promise<void> | undefined {
  return client?.stop();
}
