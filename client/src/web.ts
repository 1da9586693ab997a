/**
 * The editor's side in a browser: the server is a worker without a disk. Scripts and nomenclature files of the workspace are sent to it, and
 * what it needs of the installation is handed on.
 */
import { type ExtensionContext, Uri, window, workspace } from 'vscode';
import type { InitializeParams } from 'vscode-languageclient';
import { LanguageClient } from 'vscode-languageclient/browser';
import { registerCommands } from './commands.ts';
import { registerCoverage } from './coverage.ts';
import { languageIds } from './documents.ts';
import { initializationOptions } from './options.ts';

const files = '**/*.{py,pyw,nomen,m,f90,f95,f03,f08,f,for,ftn,jl,js,mjs,ts}';
/** Files beyond these are not sent: what they say is unknown. */
const mostFiles = 1000;
const longest = 400_000;

/** The browser's own; its types and those of Node do not go together. */
declare const Worker: new (address: string) => ConstructorParameters<typeof LanguageClient>[3] & { terminate(): void };

let client: LanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const output = window.createOutputChannel('Termwise', { log: true });
  // By its text and not by its address: an extension that lies on another machine has none that a worker may be made from.
  const program = await workspace.fs.readFile(Uri.joinPath(context.extensionUri, 'dist/web-server.js'));
  const worker = new Worker(URL.createObjectURL(new Blob([program], { type: 'text/javascript' })));
  client = new PushedTo('termwise', 'Termwise', {
    documentSelector: [...languageIds.map((language) => ({ language })), { pattern: '**/*.{f90,f95,f03,f08,f,for,ftn,m,jl}' }],
    outputChannel: output, initializationOptions: initializationOptions(),
  }, worker);
  context.subscriptions.push(output, client, { dispose: () => worker.terminate() });
  answerForInstallation(client, context.extensionUri);
  registerCommands(context, client, output);
  registerCoverage(context, client);
  await client.start();
  await sendFiles(context, client);
}

export function deactivate(): Promise<void> | undefined {
  return client?.stop();
}

class PushedTo extends LanguageClient {
  protected override fillInitializeParams(params: InitializeParams): void {
    super.fillInitializeParams(params);
    delete params.capabilities.textDocument?.diagnostic;
    delete params.capabilities.workspace?.diagnostics;
  }
}

/** Grammars and signatures, read where the extension lies. */
function answerForInstallation(to: LanguageClient, extension: Uri): void {
  const dist = Uri.joinPath(extension, 'dist');
  to.onRequest('termwise/asset', async ({ path }: { readonly path: string }) => {
    const bytes = await workspace.fs.readFile(Uri.joinPath(dist, path));
    let text = '';
    // Pieces: an argument list has a limit.
    for (let at = 0; at < bytes.length; at += 0x8000) text += String.fromCharCode(...bytes.subarray(at, at + 0x8000));
    return btoa(text);
  });
  to.onRequest('termwise/signatures', async ({ language }: { readonly language: string }) => {
    const folder = Uri.joinPath(dist, 'signatures');
    const listed = new TextDecoder().decode(await workspace.fs.readFile(Uri.joinPath(folder, 'list.json')));
    const names = (JSON.parse(listed) as Record<string, readonly string[]>)[language] ?? [];
    return Promise.all(names.map(async (name) => ({ file: `${language}/${name}`, text: new TextDecoder().decode(await workspace.fs.readFile(Uri.joinPath(folder, language, name))) })));
  });
}

/** The files that scripts rest on, and those that change. */
async function sendFiles(context: ExtensionContext, to: LanguageClient): Promise<void> {
  const send = async (uris: readonly Uri[]): Promise<void> => {
    const sent = await Promise.all(uris.map(async (uri) => ({ uri: to.code2ProtocolConverter.asUri(uri), ...(await textOf(uri)) })));
    await to.sendNotification('termwise/files', { files: sent });
  };
  for (const pattern of [files, '**/termwise.json']) {
    const watcher = workspace.createFileSystemWatcher(pattern);
    context.subscriptions.push(watcher, watcher.onDidChange((uri) => send([uri])), watcher.onDidCreate((uri) => send([uri])), watcher.onDidDelete((uri) => send([uri])));
    await send(await workspace.findFiles(pattern, '**/node_modules/**', mostFiles));
  }
}

async function textOf(uri: Uri): Promise<{ readonly text?: string }> {
  try {
    const bytes = await workspace.fs.readFile(uri);
    return bytes.length > longest ? {} : { text: new TextDecoder().decode(bytes) };
  } catch {
    // Deleted meanwhile.
    return {};
  }
}
