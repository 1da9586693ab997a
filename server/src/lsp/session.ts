/** One client's session: its documents, its settings, and the engines that answer for them. */
import { type CancellationToken, type ClientCapabilities, type Connection, type InitializeParams, LSPErrorCodes, ResponseError } from 'vscode-languageserver/node.js';
import type { FindingCode } from '../program/codes.ts';
import { Configurations } from '../service/configurations.ts';
import type { ConfigurationProblem } from '../service/configuration.ts';
import type { CheckResult, FileSource, Workspace } from '../service/contract.ts';
import { createWorkspace } from '../service/workspace.ts';
import { parent } from '../text/paths.ts';
import { Documents, type OpenDocument } from './documents.ts';
import type { Host } from './host.ts';
import { overlay } from './overlay.ts';
import { fileOf } from './paths.ts';
import { agreeOn } from './positions.ts';
import { defaultSettings, readSettings, type SessionSettings, settingsWith } from './settings.ts';
import type { Target } from './to-protocol.ts';
import { turn } from './turn.ts';

/** A check goes on for so long, in milliseconds, before messages that came meanwhile are read. */
const slice = 8;

export class Session {
  readonly documents = new Documents();
  readonly source: FileSource & { forget(): void };
  readonly capabilities: ClientCapabilities;
  readonly target: Target;
  readonly configurations: Configurations;
  /** Folders of the workspace, as paths. */
  folders: readonly string[];
  settings: SessionSettings;
  /** What the client can do beyond the protocol; it says so in its initialization options. */
  readonly client: { readonly select: boolean };
  /** One engine for each set of settings: a folder may have a `termwise.json` of its own. */
  private readonly engines = new Map<string, Promise<Workspace>>();
  /** Grows whenever results of an unchanged text may have changed. */
  private epoch = 0;
  private readonly checked = new Map<string, { readonly document: OpenDocument; readonly epoch: number; readonly result: CheckResult }>();
  /** Ends when the engines are free: checks with pauses in them must not meet. */
  private busy: Promise<unknown> = Promise.resolve();

  constructor(readonly connection: Connection, private readonly host: Host, params: InitializeParams, tellProblems: (file: string, problems: readonly ConfigurationProblem[]) => void) {
    const { capabilities, initializationOptions, workspaceFolders, rootUri } = params;
    this.source = overlay(this.documents, host.files);
    this.capabilities = capabilities;
    this.folders = (workspaceFolders ?? (rootUri ? [{ uri: rootUri }] : [])).map(({ uri }) => fileOf(uri));
    this.target = targetOf(capabilities, host, (file) => this.source.read(file) ?? '');
    this.settings = initializationOptions === undefined ? defaultSettings : readSettings(initializationOptions);
    this.client = { select: typeof initializationOptions === 'object' && initializationOptions !== null && (initializationOptions as Record<string, unknown>).select === true };
    this.configurations = new Configurations(this.source, tellProblems);
  }

  /** Whether the client asks for diagnostics itself. */
  get pulls(): boolean {
    return this.capabilities.textDocument?.diagnostic !== undefined;
  }

  /** The engine for a file, with the settings of its folder. */
  engineOf(file: string): Promise<Workspace> {
    const settings = settingsWith(this.settings, this.configurations.at(parent(file)));
    const key = JSON.stringify(settings);
    let engine = this.engines.get(key);
    if (!engine) {
      engine = createWorkspace(this.host.assets, this.source, settings, ['nomenclature']);
      this.engines.set(key, engine);
    }
    return engine;
  }

  /** The scripts below folders. */
  scriptsIn(folders: readonly string[]): Iterable<string> {
    return this.host.scripts(folders, (folder) => this.configurations.at(folder));
  }

  /** The findings of a document as it is now; made once for each of its texts. Rejects as cancelled where it changes meanwhile. */
  async check(document: OpenDocument, token?: CancellationToken, lineName?: (offset: number) => string): Promise<CheckResult> {
    return this.alone(() => this.checkNow(document, token, lineName));
  }

  /** Runs something while nothing else uses the engines, on a document that was checked as it is now; undefined where it changed meanwhile. */
  async ask<T>(uri: string, token: CancellationToken, question: (document: OpenDocument, workspace: Workspace, result: CheckResult) => T): Promise<T | undefined> {
    await turn(token);
    const document = this.documents.get(uri);
    if (!document?.language) return undefined;
    return this.alone(async () => {
      const result = await this.checkNow(document, token);
      const workspace = await this.engineOf(document.file);
      await turn(token);
      return this.documents.get(uri) === document ? question(document, workspace, result) : undefined;
    });
  }

  /** Runs something while nothing else uses the engines. */
  async alone<T>(work: () => Promise<T>): Promise<T> {
    const before = this.busy;
    const mine = before.catch(() => undefined).then(work);
    this.busy = mine.catch(() => undefined);
    return mine;
  }

  /** A file changed, on disk or in the editor: what rests on it is to be checked again. */
  async touch(files: readonly string[]): Promise<void> {
    await this.alone(async () => {
      this.source.forget();
      this.configurations.forget();
      for (const engine of this.engines.values()) for (const file of files) (await engine).invalidate(file);
      this.epoch++;
    });
  }

  async forget(document: OpenDocument): Promise<void> {
    this.checked.delete(document.uri);
    await this.alone(async () => {
      for (const engine of this.engines.values()) (await engine).forget(document.file);
    });
  }

  /** What was found last in a document; undefined where that was another text. */
  known(document: OpenDocument): CheckResult | undefined {
    const known = this.checked.get(document.uri);
    return known?.document === document && known.epoch === this.epoch ? known.result : undefined;
  }

  /** Makes what is known of a document void: an engine holds another text of it. */
  void(document: OpenDocument): void {
    this.checked.delete(document.uri);
  }

  /** Whether anything changed. Settings hold for everything that is kept, so the engines start afresh. */
  configure(sent: unknown): boolean {
    const settings = readSettings(sent);
    if (JSON.stringify(settings) === JSON.stringify(this.settings)) return false;
    this.settings = settings;
    this.epoch++;
    this.engines.clear();
    return true;
  }

  private async checkNow(document: OpenDocument, token?: CancellationToken, lineName?: (offset: number) => string): Promise<CheckResult> {
    for (;;) {
      const { epoch } = this;
      const workspace = await this.engineOf(document.file);
      const { language } = document;
      if (!language) return { file: document.file, language: 'python', text: document.text, findings: [], statistics: { functions: 0, notes: 0, unread: [] } };
      await workspace.prepare(language);
      if (language === 'nomenclature') await workspace.prepareValues();
      const known = this.known(document);
      if (known) return known;
      const result = await this.inSlices(document, workspace.steps(document.file, document.text, language, lineName), token);
      if (epoch !== this.epoch) continue;
      this.checked.set(document.uri, { document, epoch, result });
      return result;
    }
  }

  private async inSlices(document: OpenDocument, steps: Generator<void, CheckResult>, token: CancellationToken | undefined): Promise<CheckResult> {
    for (;;) {
      const start = performance.now();
      do {
        const step = steps.next();
        if (step.done) return step.value;
      } while (performance.now() - start < slice);
      await turn(token);
      if (this.documents.get(document.uri) !== document) throw new ResponseError(LSPErrorCodes.ContentModified, 'the document changed');
    }
  }
}

function targetOf(capabilities: ClientCapabilities, host: Host, textOf: (file: string) => string): Target {
  const { textDocument, general } = capabilities;
  const related = textDocument?.publishDiagnostics?.relatedInformation ?? false;
  const described = textDocument?.publishDiagnostics?.codeDescriptionSupport ?? false;
  return {
    encoding: agreeOn(general?.positionEncodings),
    textOf,
    relatedInformation: related,
    pageUri: described ? (code) => host.pageUri(code as FindingCode) : undefined,
    markdown: textDocument?.hover?.contentFormat?.includes('markdown') ?? false,
  };
}
