/**
 * The language server as a worker of a browser. It has no disk: the client sends the texts of scripts and nomenclature files
 * (`termwise/files`), and answers for grammars and signatures (`termwise/asset`).
 */
import { BrowserMessageReader, BrowserMessageWriter, createConnection, NotificationType, RequestType } from 'vscode-languageserver/browser.js';
import manifest from '../../../package.json' with { type: 'json' };
import { frontEndEntries } from '../frontends/registry.ts';
import { builtName, runtimeFile } from '../platform/grammar-files.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { Assets } from '../service/contract.ts';
import { MemoryFiles } from './memory-files.ts';
import { serve } from './server.ts';

/** A file as it is now; `text` left out where it is gone. */
interface SentFile {
  readonly uri: string;
  readonly text?: string;
}

const filesSent = new NotificationType<{ readonly files: readonly SentFile[] }>('termwise/files');
/** Base64 of a file of the installation; null where there is none. */
const assetAsked = new RequestType<{ readonly path: string }, string | null, void>('termwise/asset');
const signaturesAsked = new RequestType<{ readonly language: string }, readonly { readonly file: string; readonly text: string }[], void>('termwise/signatures');

const scope = globalThis as unknown as ConstructorParameters<typeof BrowserMessageReader>[0];
const connection = createConnection(new BrowserMessageReader(scope), new BrowserMessageWriter(scope));
const files = new MemoryFiles();

const assets: Assets = {
  runtime: () => asset(`grammars/${builtName(runtimeFile)}`),
  async grammar(language) {
    const path = frontEndEntries.find((entry) => entry.language === language)?.grammar;
    return path === undefined ? undefined : await asset(`grammars/${builtName(path)}`);
  },
  signatures: (language: LanguageId) => connection.sendRequest(signaturesAsked, { language }),
};

async function asset(path: string): Promise<Uint8Array> {
  const sent = await connection.sendRequest(assetAsked, { path });
  if (sent === null) throw new Error(`${path} is missing: this installation is incomplete`);
  return Uint8Array.from(atob(sent), (each) => each.charCodeAt(0));
}

const touched = serve(connection, { version: manifest.version, assets, files, scripts: (folders) => files.scripts(folders), pageUri: () => undefined });
connection.onNotification(filesSent, async ({ files: sent }) => {
  for (const { uri, text } of sent) files.set(uri, text);
  await touched(sent.map(({ uri }) => uri));
});
connection.listen();
