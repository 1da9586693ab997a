/** The language server over a connection: which message goes where. Each request has its file in requests/. */
import { type Connection, ErrorCodes, type InitializeParams, type InitializeResult, ResponseError, TextDocumentSyncKind } from 'vscode-languageserver/node.js';
import type { Assets } from '../service/contract.ts';
import { fileOf } from './paths.ts';
import { Diagnostics } from './requests/diagnostics.ts';
import { codeActionKinds, codeActions } from './requests/code-actions.ts';
import { completion, completionTriggers } from './requests/completion.ts';
import { configurationProblems } from './requests/configuration.ts';
import { codeLenses } from './requests/code-lens.ts';
import { documentSymbols } from './requests/document-symbols.ts';
import { hover } from './requests/hover.ts';
import { inlayHints } from './requests/inlay-hints.ts';
import { askForSettings, settingsChanged } from './requests/settings.ts';
import { changedFiles, watchFiles } from './requests/watched-files.ts';
import { Session } from './session.ts';

/** Answers a client until the connection ends. */
export function serve(connection: Connection, assets: Assets, version: string): void {
  let running: { readonly session: Session; readonly diagnostics: Diagnostics } | undefined;
  const now = () => {
    if (!running) throw new ResponseError(ErrorCodes.ServerNotInitialized, 'not initialized');
    return running;
  };

  connection.onInitialize((params: InitializeParams): InitializeResult => {
    const session = new Session(connection, assets, params, configurationProblems(connection));
    running = { session, diagnostics: new Diagnostics(session) };
    return { capabilities: capabilitiesFor(session), serverInfo: { name: 'termwise-language-server', version } };
  });

  connection.onInitialized(async () => {
    const { session, diagnostics } = now();
    try {
      await watchFiles(session);
      if (await askForSettings(session)) await diagnostics.everything();
      if (session.capabilities.workspace?.workspaceFolders) connection.workspace.onDidChangeWorkspaceFolders(({ added, removed }) => {
        const gone = new Set(removed.map(({ uri }) => fileOf(uri)));
        session.folders = [...session.folders.filter((folder) => !gone.has(folder)), ...added.map(({ uri }) => fileOf(uri))];
      });
    } catch (error) {
      diagnostics.fail(error);
    }
  });

  connection.onDidOpenTextDocument(({ textDocument }) => {
    const { session, diagnostics } = now();
    diagnostics.changedIn(session.documents.open(textDocument));
  });

  connection.onDidChangeTextDocument(({ textDocument: { uri, version: edited }, contentChanges }) => {
    const { session, diagnostics } = now();
    const document = session.documents.change(uri, edited, contentChanges, session.target.encoding);
    if (document) diagnostics.changedIn(document);
  });

  connection.onDidCloseTextDocument(async ({ textDocument }) => {
    const { session, diagnostics } = now();
    const document = session.documents.close(textDocument.uri);
    if (!document) return;
    diagnostics.closed(document);
    await session.forget(document);
  });

  connection.onDidChangeConfiguration(async (params) => {
    const { session, diagnostics } = now();
    if (await settingsChanged(session, params)) await diagnostics.everything();
  });

  connection.onDidChangeWatchedFiles(async (params) => {
    const { session, diagnostics } = now();
    const files = changedFiles(session, params);
    if (files.length > 0) await diagnostics.everything(files);
  });

  connection.onHover((params, token) => hover(now().session, params, token));
  connection.onCompletion((params, token) => completion(now().session, params, token));
  connection.onDocumentSymbol((params, token) => documentSymbols(now().session, params, token));
  connection.onCodeLens((params, token) => codeLenses(now().session, params, token));
  connection.languages.inlayHint.on((params, token) => inlayHints(now().session, params, token));
  connection.onCodeAction((params, token) => codeActions(now().session, params, token));
  connection.languages.diagnostics.on((params, token) => now().diagnostics.pull(params, token));
}

function capabilitiesFor(session: Session): InitializeResult['capabilities'] {
  return {
    positionEncoding: session.target.encoding,
    textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
    hoverProvider: true,
    inlayHintProvider: true,
    completionProvider: { triggerCharacters: [...completionTriggers] },
    documentSymbolProvider: true,
    codeLensProvider: {},
    codeActionProvider: { codeActionKinds: [...codeActionKinds] },
    workspace: { workspaceFolders: { supported: true, changeNotifications: true } },
    ...(session.pulls ? { diagnosticProvider: { identifier: 'termwise', interFileDependencies: true, workspaceDiagnostics: false } } : {}),
  };
}
