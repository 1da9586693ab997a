/** The language server over a connection: which message goes where. Each request has its file in requests/. */
import { type Connection, ErrorCodes, type InitializeParams, type InitializeResult, ResponseError, TextDocumentSyncKind } from 'vscode-languageserver/node.js';
import type { Host } from './host.ts';
import { fileOf } from './paths.ts';
import { codeActionKinds, codeActions } from './requests/code-actions.ts';
import { codeLenses } from './requests/code-lens.ts';
import { completion, completionTriggers } from './requests/completion.ts';
import { configurationProblems } from './requests/configuration.ts';
import { coverage, coverageRequest } from './requests/coverage.ts';
import { Diagnostics } from './requests/diagnostics.ts';
import { documentSymbols } from './requests/document-symbols.ts';
import { hover } from './requests/hover.ts';
import { inlayHints } from './requests/inlay-hints.ts';
import { foldingRanges, formatting, semanticTokens } from './requests/nomenclature.ts';
import { prepareRename, references, rename } from './requests/nomenclature-symbols.ts';
import { nomenclatureCapabilities, serveNomenclatureOnly } from './nomenclature-only.ts';
import { Notebooks } from './notebooks.ts';
import { cellActions, cellHover, followNotebooks, notebookSelector, publishCells } from './requests/notebook.ts';
import { askForSettings, settingsChanged } from './requests/settings.ts';
import { unitOrigin } from './requests/unit-origin.ts';
import { changedFiles, watchFiles } from './requests/watched-files.ts';
import { workspaceSymbols } from './requests/workspace-symbols.ts';
import { Scan } from './scan.ts';
import { Session } from './session.ts';

interface Running {
  readonly session: Session;
  readonly diagnostics: Diagnostics;
  readonly scan: Scan;
  readonly notebooks: Notebooks;
}

/** Answers a client until the connection ends. Gives what is to be told of files that changed where the client does not say so by the protocol. */
export function serve(connection: Connection, host: Host): (files: readonly string[]) => Promise<void> {
  let running: Running | undefined;
  const now = (): Running => {
    if (!running) throw new ResponseError(ErrorCodes.ServerNotInitialized, 'not initialized');
    return running;
  };

  connection.onInitialize((params: InitializeParams): InitializeResult => {
    const session = new Session(connection, host, params, configurationProblems(connection));
    const notebooks = new Notebooks(session.target.encoding);
    const programs = async (uri: string): Promise<void> => {
      const program = notebooks.of(uri);
      if (program) await publishCells(session, notebooks, program);
    };
    running = { session, diagnostics: new Diagnostics(session, programs), scan: new Scan(session), notebooks };
    return { capabilities: capabilitiesFor(session), serverInfo: { name: 'termwise-language-server', version: host.version } };
  });
  connection.onInitialized(() => begin(connection, now()));
  followDocuments(connection, now);
  followNotebooks(connection, () => ({ ...now(), fail: (error) => now().diagnostics.fail(error) }));
  answerRequests(connection, now);
  return async (files) => {
    const { session, diagnostics, scan } = now();
    const closed = files.filter((file) => !session.documents.at(file));
    await diagnostics.everything(closed);
    await scan.follow(closed);
  };
}

/** What can be asked only once the client is ready: watching, settings, folders, and the first look at the workspace. */
async function begin(connection: Connection, { session, diagnostics, scan }: Running): Promise<void> {
  try {
    await watchFiles(session);
    await serveNomenclatureOnly(session);
    if (await askForSettings(session)) await diagnostics.everything();
    if (session.capabilities.workspace?.workspaceFolders) connection.workspace.onDidChangeWorkspaceFolders(({ added, removed }) => {
      const gone = new Set(removed.map(({ uri }) => fileOf(uri)));
      session.folders = [...session.folders.filter((folder) => !gone.has(folder)), ...added.map(({ uri }) => fileOf(uri))];
      scan.start().catch((error) => diagnostics.fail(error));
    });
    await scan.start();
  } catch (error) {
    diagnostics.fail(error);
  }
}

function followDocuments(connection: Connection, now: () => Running): void {
  connection.onDidOpenTextDocument(({ textDocument }) => {
    const { session, diagnostics, scan } = now();
    const document = session.documents.open(textDocument);
    scan.opened(document.file);
    diagnostics.changedIn(document);
  });

  connection.onDidChangeTextDocument(({ textDocument: { uri, version: edited }, contentChanges }) => {
    const { session, diagnostics } = now();
    const document = session.documents.change(uri, edited, contentChanges, session.target.encoding);
    if (document) diagnostics.changedIn(document);
  });

  connection.onDidCloseTextDocument(async ({ textDocument }) => {
    const { session, diagnostics, scan } = now();
    const document = session.documents.close(textDocument.uri);
    if (!document) return;
    diagnostics.closed(document);
    await session.forget(document);
    await scan.follow([document.file]);
  });

  connection.onDidChangeConfiguration(async (params) => {
    const { session, diagnostics, scan } = now();
    if (!(await settingsChanged(session, params))) return;
    await diagnostics.everything();
    await scan.start();
  });

  connection.onDidChangeWatchedFiles(async (params) => {
    const { session, diagnostics, scan } = now();
    const files = changedFiles(session, params);
    if (files.length === 0) return;
    await diagnostics.everything(files);
    await scan.follow(files);
  });
}

function answerRequests(connection: Connection, now: () => Running): void {
  connection.onHover((params, token) => {
    const { session, notebooks } = now();
    const program = notebooks.of(params.textDocument.uri);
    return program ? cellHover(session, notebooks, program, params, token) : hover(session, params, token);
  });
  connection.onCompletion((params, token) => completion(now().session, params, token));
  connection.onTypeDefinition((params, token) => unitOrigin(now().session, params, token));
  connection.onReferences((params, token) => references(now().session, params, token));
  connection.onPrepareRename((params, token) => prepareRename(now().session, params, token));
  connection.onRenameRequest((params, token) => rename(now().session, params, token));
  connection.onDocumentSymbol((params, token) => documentSymbols(now().session, params, token));
  connection.onWorkspaceSymbol((params, token) => workspaceSymbols(now().session, now().scan, params, token));
  connection.onCodeLens((params, token) => codeLenses(now().session, params, token));
  connection.onCodeAction((params, token) => {
    const { session, notebooks } = now();
    const program = notebooks.of(params.textDocument.uri);
    return program ? cellActions(session, notebooks, program, params, token) : codeActions(session, params, token);
  });
  connection.onFoldingRanges((params, token) => foldingRanges(now().session, params, token));
  connection.onDocumentFormatting((params, token) => formatting(now().session, params, token));
  connection.languages.semanticTokens.on((params, token) => semanticTokens(now().session, params, token));
  connection.languages.inlayHint.on((params, token) => inlayHints(now().session, params, token));
  connection.languages.diagnostics.on((params, token) => now().diagnostics.pull(params, token));
  connection.onRequest(coverageRequest, (params, token) => coverage(now().session, now().scan, params ?? {}, token));
}

function capabilitiesFor(session: Session): InitializeResult['capabilities'] {
  return {
    positionEncoding: session.target.encoding,
    textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
    notebookDocumentSync: { notebookSelector },
    hoverProvider: true,
    inlayHintProvider: true,
    completionProvider: { triggerCharacters: [...completionTriggers] },
    typeDefinitionProvider: true,
    documentSymbolProvider: true,
    workspaceSymbolProvider: true,
    codeLensProvider: {},
    codeActionProvider: { codeActionKinds: [...codeActionKinds] },
    ...nomenclatureCapabilities(session),
    workspace: { workspaceFolders: { supported: true, changeNotifications: true } },
    ...(session.pulls ? { diagnosticProvider: { identifier: 'termwise', interFileDependencies: true, workspaceDiagnostics: false } } : {}),
  };
}
