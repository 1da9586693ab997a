/** One client's session: its documents, its settings, and the engine that answers for them. */
import type { ClientCapabilities, Connection, InitializeParams } from 'vscode-languageserver/node.js';
import { pageFile } from '../platform/pages.ts';
import type { Assets, CheckResult, FileSource, Settings, Workspace } from '../service/contract.ts';
import { createWorkspace } from '../service/workspace.ts';
import type { FindingCode } from '../findings/finding.ts';
import { Documents, type OpenDocument } from './documents.ts';
import { overlay } from './overlay.ts';
import { fileOf, uriOf } from './paths.ts';
import { agreeOn } from './positions.ts';
import { defaultSettings, readSettings } from './settings.ts';
import type { Target } from './to-protocol.ts';

export class Session {
  readonly documents = new Documents();
  readonly source: FileSource & { forget(): void } = overlay(this.documents);
  readonly capabilities: ClientCapabilities;
  readonly target: Target;
  /** Folders of the workspace, as paths. */
  folders: readonly string[];
  private settings: Settings;
  private engine: Promise<Workspace>;
  /** Grows whenever results of an unchanged text may have changed. */
  private epoch = 0;
  private readonly checked = new Map<string, { readonly document: OpenDocument; readonly epoch: number; readonly result: CheckResult }>();

  constructor(readonly connection: Connection, private readonly assets: Assets, params: InitializeParams) {
    const { capabilities, initializationOptions, workspaceFolders, rootUri } = params;
    this.capabilities = capabilities;
    this.folders = (workspaceFolders ?? (rootUri ? [{ uri: rootUri }] : [])).map(({ uri }) => fileOf(uri));
    this.target = targetOf(capabilities, (file) => this.source.read(file) ?? '');
    this.settings = initializationOptions === undefined ? defaultSettings : readSettings(initializationOptions);
    this.engine = this.start();
    // Answered where it is used: a request that waits for the engine tells of it.
    this.engine.catch(() => undefined);
  }

  /** Whether the client asks for diagnostics itself. */
  get pulls(): boolean {
    return this.capabilities.textDocument?.diagnostic !== undefined;
  }

  get workspace(): Promise<Workspace> {
    return this.engine;
  }

  /** The findings of a document as it is now; made once for each of its texts. */
  async check(document: OpenDocument): Promise<CheckResult> {
    for (;;) {
      const workspace = await this.engine;
      if (document.language) await workspace.prepare(document.language);
      const known = this.checked.get(document.uri);
      if (known?.document === document && known.epoch === this.epoch) return known.result;
      const result = workspace.check(document.file, document.text, document.language);
      this.checked.set(document.uri, { document, epoch: this.epoch, result });
      if (workspace === (await this.engine)) return result;
    }
  }

  /** A file changed, on disk or in the editor: what rests on it is to be checked again. */
  async touch(files: readonly string[]): Promise<void> {
    const workspace = await this.engine;
    this.source.forget();
    for (const file of files) workspace.invalidate(file);
    this.epoch++;
  }

  async forget(document: OpenDocument): Promise<void> {
    this.checked.delete(document.uri);
    (await this.engine).forget(document.file);
  }

  /** Whether anything changed. Settings hold for everything that is kept, so the engine starts afresh. */
  configure(sent: unknown): boolean {
    const settings = readSettings(sent);
    if (JSON.stringify(settings) === JSON.stringify(this.settings)) return false;
    this.settings = settings;
    this.epoch++;
    this.engine = this.start();
    this.engine.catch(() => undefined);
    return true;
  }

  private start(): Promise<Workspace> {
    return createWorkspace(this.assets, this.source, this.settings);
  }
}

function targetOf(capabilities: ClientCapabilities, textOf: (file: string) => string): Target {
  const { textDocument, general } = capabilities;
  const related = textDocument?.publishDiagnostics?.relatedInformation ?? false;
  const described = textDocument?.publishDiagnostics?.codeDescriptionSupport ?? false;
  return {
    encoding: agreeOn(general?.positionEncodings),
    textOf,
    relatedInformation: related,
    pageUri: described ? (code) => uriOf(pageFile(code as FindingCode).replaceAll('\\', '/')) : undefined,
    markdown: textDocument?.hover?.contentFormat?.includes('markdown') ?? false,
  };
}
