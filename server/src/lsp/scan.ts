/**
 * What is known of the scripts of the workspace that are not open: read once in the background after the start, one file at a time, with
 * progress shown. No request waits for it; what it has not seen yet is not there yet.
 */
import type { CancellationToken, Diagnostic, WorkDoneProgressServerReporter } from 'vscode-languageserver/node.js';
import { languageOf } from '../frontends/registry.ts';
import type { SymbolGroup } from '../service/contract.ts';
import { isLeftOut } from './left-out.ts';
import { uriOf } from './paths.ts';
import type { Session } from './session.ts';
import { toDiagnostics } from './to-protocol.ts';
import { turn } from './turn.ts';

/** Files that are longer are looked at when they are opened. */
const longest = 400_000;

export interface Scanned {
  readonly text: string;
  readonly groups: readonly SymbolGroup[];
  readonly diagnostics: readonly Diagnostic[];
}

export class Scan {
  readonly files = new Map<string, Scanned>();
  private running = 0;
  private readonly shown = new Set<string>();

  constructor(private readonly session: Session) {}

  /** Reads everything again; a scan that is under way gives up. */
  async start(): Promise<void> {
    const mine = ++this.running;
    const paths = [...this.session.scriptsIn(this.session.folders)];
    const known = new Set(paths);
    for (const file of this.files.keys()) if (!known.has(file)) this.drop(file);
    const progress = await this.progress(paths.length);
    for (const [at, file] of paths.entries()) {
      await turn();
      if (mine !== this.running || progress?.token.isCancellationRequested) break;
      progress?.report(at, paths.length, file);
      await this.look(file);
    }
    progress?.done();
  }

  /** Files that changed on disk. */
  async follow(files: readonly string[]): Promise<void> {
    for (const file of files) {
      await turn();
      if (this.files.has(file) || this.session.folders.some((folder) => file.startsWith(`${folder}/`))) await this.look(file);
    }
  }

  /** An open document speaks for itself. */
  opened(file: string): void {
    this.show(file, []);
  }

  private async look(file: string): Promise<void> {
    const language = languageOf(file);
    if (!language || this.session.documents.at(file) || isLeftOut(this.session, file)) return;
    const text = this.session.source.read(file);
    if (text === undefined) return this.drop(file);
    if (text.length > longest) return;
    await this.session.alone(async () => {
      const workspace = await this.session.engineOf(file);
      await workspace.prepare(language);
      const result = workspace.check(file, text, language);
      const scanned = { text, groups: workspace.symbols(file), diagnostics: toDiagnostics(result, this.session.target) };
      this.files.set(file, scanned);
      workspace.forget(file);
      if (!this.session.documents.at(file)) this.show(file, this.session.settings.wholeWorkspace ? scanned.diagnostics : []);
    });
  }

  private drop(file: string): void {
    this.files.delete(file);
    this.show(file, []);
  }

  /** Findings of files that are not open, where they are wanted. */
  private show(file: string, diagnostics: readonly Diagnostic[]): void {
    if (diagnostics.length === 0 && !this.shown.delete(file)) return;
    if (diagnostics.length > 0) this.shown.add(file);
    void this.session.connection.sendDiagnostics({ uri: uriOf(file), diagnostics: [...diagnostics] });
  }

  private async progress(count: number): Promise<Shown | undefined> {
    const { connection, capabilities } = this.session;
    if (!capabilities.window?.workDoneProgress || count === 0) return undefined;
    try {
      const reporter = await connection.window.createWorkDoneProgress();
      return shownProgress(reporter);
    } catch {
      // A client that refuses progress still has its scripts read.
      return undefined;
    }
  }
}

interface Shown {
  readonly token: CancellationToken;
  report(at: number, of: number, file: string): void;
  done(): void;
}

function shownProgress(reporter: WorkDoneProgressServerReporter): Shown {
  let last = -1;
  reporter.begin('Reading the units of the workspace', 0, undefined, true);
  return {
    token: reporter.token,
    report(at, of, file) {
      const percent = Math.floor((100 * at) / of);
      if (percent === last) return;
      last = percent;
      reporter.report(percent, file.slice(file.lastIndexOf('/') + 1));
    },
    done: () => reporter.done(),
  };
}

