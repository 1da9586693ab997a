/** Diagnostics: pulled where the client can, else pushed. */
import { type CancellationToken, type Diagnostic, type DocumentDiagnosticParams, type DocumentDiagnosticReport, DocumentDiagnosticReportKind, LSPErrorCodes, ResponseError } from 'vscode-languageserver/node.js';
import { configurationName } from '../../service/configuration.ts';
import type { OpenDocument } from '../documents.ts';
import type { Session } from '../session.ts';
import { toDiagnostics } from '../to-protocol.ts';
import { turn } from '../turn.ts';
import { isLeftOut } from '../left-out.ts';

/** Other documents follow a change after this pause in typing, in milliseconds. */
const pause = 200;

export class Diagnostics {
  private readonly sent = new Map<string, { readonly id: string; readonly text: string; readonly version: number }>();
  private readonly waiting = new Set<string>();
  private readonly changed = new Set<string>();
  private timer: NodeJS.Timeout | undefined;
  /** Names of results are unlike those of an earlier server: a client may still ask with one of them. */
  private readonly era = `${Date.now().toString(36)}.${Math.random().toString(36).slice(2)}`;
  private count = 0;

  /** `programs`: tells the cells of a notebook again. */
  constructor(private readonly session: Session, private readonly programs: (uri: string) => Promise<void>) {}

  /** A document was opened or edited. Edits that come together are checked once. */
  changedIn(document: OpenDocument): void {
    this.followLater(document.file);
    if (this.session.pulls || this.waiting.has(document.uri)) return;
    this.waiting.add(document.uri);
    void turn().then(() => {
      this.waiting.delete(document.uri);
      return this.push(document.uri);
    }).catch((error) => this.fail(error));
  }

  closed(document: OpenDocument): void {
    this.sent.delete(document.uri);
    this.followLater(document.file);
    if (!this.session.pulls) void this.session.connection.sendDiagnostics({ uri: document.uri, diagnostics: [] });
  }

  async pull({ textDocument, previousResultId }: DocumentDiagnosticParams, token: CancellationToken): Promise<DocumentDiagnosticReport> {
    await turn(token);
    const document = this.session.documents.get(textDocument.uri);
    if (!document) return { kind: DocumentDiagnosticReportKind.Full, items: [] };
    const items = await this.of(document, token);
    await turn(token);
    const { id } = this.remember(document, items);
    return id === previousResultId ? { kind: DocumentDiagnosticReportKind.Unchanged, resultId: id } : { kind: DocumentDiagnosticReportKind.Full, resultId: id, items };
  }

  /** Files changed on disk or settings changed: every open document is looked at again. */
  async everything(files: readonly string[] = []): Promise<void> {
    await this.session.touch(files);
    if (this.session.pulls) {
      for (const { uri, isProgram } of this.session.documents.all()) if (isProgram) await this.programs(uri);
      if (this.session.capabilities.workspace?.diagnostics?.refreshSupport) await this.session.connection.languages.diagnostics.refresh();
      return;
    }
    for (const { uri } of this.session.documents.all()) {
      await turn();
      await this.push(uri);
    }
  }

  fail(error: unknown): void {
    this.session.connection.console.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
  }

  private followLater(file: string): void {
    this.changed.add(file);
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.follow().catch((error) => this.fail(error)), pause);
  }

  /** What other documents say may rest on what changed. Nothing is to be done where there are none. */
  private async follow(): Promise<void> {
    const files = [...this.changed];
    this.changed.clear();
    const others = this.session.documents.all().filter(({ file }) => files.length > 1 || file !== files[0]);
    if (others.length > 0 || files.some((file) => file.endsWith('.nomen') || file.endsWith(configurationName))) await this.everything(files);
  }

  private async push(uri: string): Promise<void> {
    const document = this.session.documents.get(uri);
    if (!document) return;
    if (document.isProgram) return this.programs(uri);
    const diagnostics = await this.of(document).catch(givenUp);
    if (!diagnostics || this.session.documents.get(uri) !== document) return;
    const before = this.sent.get(uri);
    const now = this.remember(document, diagnostics);
    if (before?.id === now.id && before.version === now.version) return;
    await this.session.connection.sendDiagnostics({ uri, version: document.version, diagnostics });
  }

  private async of(document: OpenDocument, token?: CancellationToken): Promise<Diagnostic[]> {
    if (isLeftOut(this.session, document.file)) return [];
    return toDiagnostics(await this.session.check(document, token), this.session.target);
  }

  /** Equal diagnostics keep their name, so that a client that has them is spared them. */
  private remember({ uri, version }: OpenDocument, diagnostics: readonly Diagnostic[]): { readonly id: string; readonly version: number } {
    const text = JSON.stringify(diagnostics);
    const before = this.sent.get(uri);
    const now = { id: before?.text === text ? before.id : `${this.era}.${++this.count}`, text, version };
    this.sent.set(uri, now);
    return now;
  }
}

/** A text that changed while it was checked is checked again because of that change. */
function givenUp(error: unknown): undefined {
  if (error instanceof ResponseError && error.code === LSPErrorCodes.ContentModified) return undefined;
  throw error;
}
