/** A client of the language server over standard input and output, as an editor is one. */
import { type ChildProcess, execFileSync, spawn } from 'node:child_process';
import { mkdirSync, mkdtempSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import {
  type ClientCapabilities, type CodeAction, CodeActionRequest, ConfigurationRequest, createProtocolConnection, type Diagnostic, DiagnosticRefreshRequest, DidChangeTextDocumentNotification,
  DidChangeWatchedFilesNotification, DidCloseTextDocumentNotification, DidOpenTextDocumentNotification, DocumentDiagnosticRequest,
  ExitNotification, FileChangeType, type Hover, HoverRequest, InitializedNotification, InitializeRequest, type InitializeResult, type Position, type ProtocolConnection,
  PublishDiagnosticsNotification, type PublishDiagnosticsParams, RegistrationRequest, ShowMessageNotification, ShutdownRequest, StreamMessageReader, StreamMessageWriter, type TextDocumentContentChangeEvent, WorkDoneProgress, WorkDoneProgressCreateRequest,
} from 'vscode-languageserver/node.js';

const patience = 20_000;
let built: Promise<string> | undefined;

/** The server as it is shipped, built once for each file of tests. */
function bundle(): Promise<string> {
  built ??= (async () => {
    // @ts-expect-error A tool without types.
    const { build } = await import('../../.tools/build.mjs');
    const folder = mkdtempSync(join(tmpdir(), 'termwise-server-'));
    process.on('exit', () => rmSync(folder, { recursive: true, force: true }));
    await build(folder);
    return join(folder, 'language-server.js');
  })();
  return built;
}

export interface StartOptions {
  readonly files?: Readonly<Record<string, string>>;
  readonly pull?: boolean;
  /** Shows progress of work. */
  readonly progress?: boolean;
  /** Names of the workspace's folders; its one folder where left out. */
  readonly folders?: readonly string[];
  readonly encodings?: readonly string[];
  readonly settings?: unknown;
  /** Initialization options. */
  readonly options?: unknown;
}

export class Client {
  initialized: InitializeResult | undefined;
  readonly published: PublishDiagnosticsParams[] = [];
  readonly registered: string[] = [];
  refreshes = 0;
  /** Kinds of the reports of work, in order. */
  readonly progress: string[] = [];
  readonly messages: string[] = [];
  settings: unknown = {};
  private readonly versions = new Map<string, number>();
  private waiting: (() => void)[] = [];

  private constructor(readonly folder: string, readonly process: ChildProcess, readonly connection: ProtocolConnection) {}

  static async start(options: StartOptions = {}): Promise<Client> {
    const folder = realpathSync(mkdtempSync(join(tmpdir(), 'termwise-lsp-')));
    for (const [name, text] of Object.entries(options.files ?? {})) write(join(folder, name), text);
    const child = spawn(process.execPath, [await bundle(), '--stdio'], { stdio: ['pipe', 'pipe', 'inherit'] });
    const connection = createProtocolConnection(new StreamMessageReader(child.stdout), new StreamMessageWriter(child.stdin));
    const client = new Client(folder, child, connection);
    client.settings = options.settings ?? {};
    client.listen();
    client.initialized = await connection.sendRequest(InitializeRequest.type, { processId: process.pid, rootUri: null, workspaceFolders: (options.folders ?? ['']).map((name) => ({ uri: pathToFileURL(join(folder, name)).href, name: name || 'test' })), capabilities: capabilities(options), ...(options.options === undefined ? {} : { initializationOptions: options.options }) });
    await connection.sendNotification(InitializedNotification.type, {});
    return client;
  }

  /** Takes a server that is built already instead of building one. */
  static use(serverFile: string): void {
    built = Promise.resolve(serverFile);
  }

  /** Resident memory of the server in MB. */
  memory(): number {
    const kilobytes = execFileSync('ps', ['-o', 'rss=', '-p', String(this.process.pid)], { encoding: 'utf8' });
    return Number(kilobytes.trim()) / 1024;
  }

  uri(name: string): string {
    return name.startsWith('untitled:') ? name : pathToFileURL(join(this.folder, name)).href;
  }

  async open(name: string, text: string, languageId = name.endsWith('.nomen') ? 'nomenclature' : 'python'): Promise<void> {
    this.versions.set(name, 1);
    await this.connection.sendNotification(DidOpenTextDocumentNotification.type, { textDocument: { uri: this.uri(name), languageId, version: 1, text } });
  }

  actions(name: string, start: Position, end: Position = start, only?: readonly string[]): Promise<readonly CodeAction[]> {
    const diagnostics = (this.latest(name) ?? []).filter(({ range }) => range.start.line <= end.line && range.end.line >= start.line);
    return this.connection.sendRequest(CodeActionRequest.type, { textDocument: { uri: this.uri(name) }, range: { start, end }, context: { diagnostics: [...diagnostics], ...(only ? { only: [...only] } : {}) } }) as Promise<readonly CodeAction[]>;
  }

  async change(name: string, ...contentChanges: TextDocumentContentChangeEvent[]): Promise<void> {
    const version = (this.versions.get(name) ?? 0) + 1;
    this.versions.set(name, version);
    await this.connection.sendNotification(DidChangeTextDocumentNotification.type, { textDocument: { uri: this.uri(name), version }, contentChanges });
  }

  /** Any request about a document. */
  ask<T>(method: string, name: string, params: object = {}): Promise<T> {
    return this.connection.sendRequest(method, { textDocument: { uri: this.uri(name) }, ...params });
  }

  close(name: string): Promise<void> {
    return this.connection.sendNotification(DidCloseTextDocumentNotification.type, { textDocument: { uri: this.uri(name) } });
  }

  hover(name: string, position: Position): Promise<Hover | null> {
    return this.connection.sendRequest(HoverRequest.type, { textDocument: { uri: this.uri(name) }, position });
  }

  pull(name: string, previousResultId?: string) {
    return this.connection.sendRequest(DocumentDiagnosticRequest.type, { textDocument: { uri: this.uri(name) }, ...(previousResultId === undefined ? {} : { previousResultId }) });
  }

  /** Writes a file on disk and tells of it. */
  async writeFile(name: string, text: string, type: FileChangeType = FileChangeType.Changed): Promise<void> {
    write(join(this.folder, name), text);
    await this.connection.sendNotification(DidChangeWatchedFilesNotification.type, { changes: [{ uri: this.uri(name), type }] });
  }

  /** The codes last published for a document. */
  codes(name: string): readonly string[] | undefined {
    return this.latest(name)?.map(({ code }) => String(code));
  }

  latest(name: string): readonly Diagnostic[] | undefined {
    return this.published.findLast(({ uri }) => uri === this.uri(name))?.diagnostics;
  }

  /** Waits until something holds; what holds is looked at whenever a message came. */
  async until(holds: () => boolean, what: string): Promise<void> {
    const end = Date.now() + patience;
    while (!holds()) {
      if (Date.now() > end) throw new Error(`still waiting for ${what}; last published: ${JSON.stringify(this.published.at(-1))}`);
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, 250);
        this.waiting.push(() => {
          clearTimeout(timer);
          resolve();
        });
      });
    }
  }

  untilCodes(name: string, codes: readonly string[]): Promise<void> {
    return this.until(() => JSON.stringify(this.codes(name)) === JSON.stringify(codes), `${name} to have ${codes.join(', ') || 'no findings'}, has ${this.codes(name)}`);
  }

  /** Ends the server as the protocol asks for, and gives its exit status. */
  async stop(): Promise<number | null> {
    const ended = new Promise<number | null>((resolve) => this.process.once('exit', resolve));
    await this.connection.sendRequest(ShutdownRequest.type);
    await this.connection.sendNotification(ExitNotification.type);
    const status = await ended;
    this.connection.dispose();
    rmSync(this.folder, { recursive: true, force: true });
    return status;
  }

  private listen(): void {
    const { connection } = this;
    connection.onNotification(PublishDiagnosticsNotification.type, (params) => {
      this.published.push(params);
      this.wake();
    });
    connection.onRequest(ConfigurationRequest.type, ({ items }) => items.map(() => this.settings));
    connection.onRequest(RegistrationRequest.type, ({ registrations }) => {
      this.registered.push(...registrations.map(({ method }) => method));
      this.wake();
    });
    connection.onRequest(WorkDoneProgressCreateRequest.type, ({ token }) => {
      connection.onProgress(WorkDoneProgress.type, token, (value) => {
        this.progress.push(value.kind);
        this.wake();
      });
    });
    connection.onNotification(ShowMessageNotification.type, ({ message }) => this.messages.push(message));
    connection.onRequest(DiagnosticRefreshRequest.type, () => {
      this.refreshes++;
      this.wake();
    });
    connection.listen();
  }

  private wake(): void {
    for (const each of this.waiting.splice(0)) each();
  }
}

function capabilities({ pull, encodings, progress }: StartOptions): ClientCapabilities {
  return {
    general: encodings ? { positionEncodings: [...encodings] } : {},
    workspace: {
      configuration: true, didChangeConfiguration: { dynamicRegistration: true }, didChangeWatchedFiles: { dynamicRegistration: true }, workspaceFolders: true,
      diagnostics: { refreshSupport: true },
    },
    textDocument: {
      publishDiagnostics: { relatedInformation: true, codeDescriptionSupport: true },
      hover: { contentFormat: ['markdown'] },
      codeAction: { codeActionLiteralSupport: { codeActionKind: { valueSet: [] } }, disabledSupport: true, isPreferredSupport: true },
      ...(pull ? { diagnostic: {} } : {}),
      formatting: {}, foldingRange: {}, references: {}, rename: {}, semanticTokens: { requests: { full: true }, tokenTypes: [], tokenModifiers: [], formats: [] },
    },
    ...(progress ? { window: { workDoneProgress: true } } : {}),
  };
}

function write(path: string, text: string): void {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
}
