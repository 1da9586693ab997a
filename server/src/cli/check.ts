/** `termwise check`: walks the paths, checks one file after the other, and shows what was found. */
import { readFileSync, realpathSync, writeFileSync } from 'node:fs';
import { dirname, resolve } from 'node:path';
import { isServed } from '../frontends/registry.ts';
import { defaultNoteSettings } from '../notes/types.ts';
import { decode } from '../platform/decode.ts';
import { diskFiles } from '../platform/disk.ts';
import type { FileSource, Settings, Workspace } from '../service/contract.ts';
import type { CheckOptions } from './arguments.ts';
import { Baseline, written } from './baseline.ts';
import { changedSince } from '../platform/changed.ts';
import { Configurations } from '../service/configurations.ts';
import { type Configuration, type ConfigurationProblem, readConfiguration } from '../service/configuration.ts';
import { cellRegions } from './cells.ts';
import { type Document, openDocument } from './document.ts';
import { jsonFormat } from './formats/json.ts';
import { sarifFormat } from './formats/sarif.ts';
import { statisticsText, textFormat } from './formats/text.ts';
import { readStream, readText } from './input.ts';
import { languageNames } from './languages.ts';
import { displayName, folderUri, slashed } from './names.ts';
import { progressLine } from './progress.ts';
import { type Format, type Reported, reportedOf } from './report.ts';
import { Tally } from './tally.ts';
import { walk, whyUnreadable } from '../platform/walk.ts';

/** What the command needs of its surroundings. */
export interface Surroundings {
  readonly workingFolder: string;
  readonly version: string;
  /** Writes to standard output; false once nobody reads it any more. */
  readonly out: (text: string) => boolean;
  readonly complain: (text: string) => void;
  /** Set where standard error is a terminal. */
  readonly progress: ((text: string) => void) | undefined;
  /** Columns of the terminal. */
  readonly width: number;
  /** Standard output is a terminal that may be coloured. */
  readonly color: boolean;
  readonly input: AsyncIterable<Uint8Array>;
  readonly createWorkspace: (source: FileSource, settings: Settings) => Promise<Workspace>;
}

/** Runs the command; the answer is its exit status. */
export async function check(options: CheckOptions, around: Surroundings): Promise<0 | 1 | 2> {
  const only = options.config === undefined ? undefined : givenConfiguration(resolve(around.workingFolder, options.config), options.config);
  if (only && 'problem' in only) {
    around.complain(`termwise: ${only.problem}\n`);
    return 2;
  }
  const run = new Run(options, around, only?.configuration);
  for (const problem of only?.problems ?? []) run.configurationProblem(resolve(around.workingFolder, options.config ?? ''), problem);
  return run.all();
}

type GivenConfiguration = { readonly configuration: Configuration; readonly problems: readonly ConfigurationProblem[] } | { readonly problem: string };

function givenConfiguration(path: string, name: string): GivenConfiguration {
  try {
    return readConfiguration(readFileSync(path, 'utf8').replace(/^\uFEFF/, ''), path);
  } catch (error) {
    return { problem: `${name}: ${whyUnreadable(error)}` };
  }
}

class Run {
  private readonly start = performance.now();
  private readonly tally = new Tally();
  private readonly format: Format;
  private readonly progress;
  private readonly configurations: Configurations;
  private readonly source: FileSource = diskFiles();
  private readonly workspaces = new Map<Configuration, Workspace>();
  private failed = false;
  private baseline: Baseline | undefined;
  /** What is to be written down as known. */
  private readonly found: Reported[] = [];

  constructor(private readonly options: CheckOptions, private readonly around: Surroundings, only: Configuration | undefined) {
    this.format = formatOf(options, around);
    this.progress = progressLine(around.progress, around.width, () => performance.now());
    this.configurations = new Configurations(this.source, (file, problems) => {
      for (const problem of problems) this.configurationProblem(file, problem);
    }, only);
  }

  async all(): Promise<0 | 1 | 2> {
    const { since } = this.options;
    const changed = since === undefined ? undefined : changedSince(since, this.around.workingFolder);
    const problem = typeof changed === 'string' ? `what changed since ${since} is not known: ${changed}` : this.readBaseline();
    if (problem !== undefined || typeof changed === 'string') {
      this.complain(problem ?? '');
      return 2;
    }
    const isDiff = this.options.fix === 'show';
    let reading = this.around.out(isDiff ? '' : this.format.begin());
    for (const path of this.options.paths) {
      if (path === '-') reading &&= await this.standardInput();
    }
    const paths = this.options.paths.filter((path) => path !== '-').map((path) => resolve(this.around.workingFolder, path));
    for (const walked of walk(paths, (folder) => this.configurations.at(folder))) {
      if (!reading) break;
      if (walked.kind === 'unreadable') this.unreadable(walked.path, walked.problem);
      else if (!changed || changed.has(realpathSync(walked.path))) reading = await this.file(walked.path, walked.named);
    }
    const summary = this.tally.summary((performance.now() - this.start) / 1000);
    this.progress.clear();
    if (!isDiff) this.around.out(this.format.end(summary));
    if (this.options.stats && this.options.format !== 'text') this.around.complain(statisticsText(summary));
    if (this.baseline && this.baseline.known > 0) this.complain(`${this.baseline.known} known ${this.baseline.known === 1 ? 'finding' : 'findings'} left out`);
    const kept = this.options.writeBaseline !== undefined && this.writeBaseline(this.options.writeBaseline);
    return this.failed ? 2 : summary.bySeverity.error > 0 && !kept ? 1 : 0;
  }

  /** What is wrong with the file of known findings; undefined where there is none, or nothing. */
  private readBaseline(): string | undefined {
    const { baseline } = this.options;
    if (baseline === undefined) return undefined;
    const read = readText(resolve(this.around.workingFolder, baseline));
    const known = read.ok ? Baseline.read(read.text) : read.problem;
    if (typeof known === 'string') return `${baseline}: ${known}`;
    this.baseline = known;
    return undefined;
  }

  private writeBaseline(file: string): boolean {
    try {
      writeFileSync(resolve(this.around.workingFolder, file), written(this.found));
      this.complain(`${file}: the findings are written down as known; --baseline ${file} leaves them out`);
      return true;
    } catch (error) {
      this.unreadable(file, `it could not be written (${whyUnreadable(error)})`);
      return false;
    }
  }

  configurationProblem(file: string, { line, column, message }: ConfigurationProblem): void {
    this.complain(`${this.nameOf(file)}:${line}:${column}: ${message}`);
    this.failed = true;
  }

  private async file(path: string, named: boolean): Promise<boolean> {
    this.progress.step(this.tally.files, this.nameOf(path));
    const language = named ? this.options.language : undefined;
    const read = language || isServed(path) ? readText(path) : { ok: true as const, text: '' };
    const opened = read.ok ? openDocument(path, read.text, language) : { ...read, otherLanguage: false };
    if (!read.ok || !opened.ok) {
      if (!opened.ok && (named || !opened.otherLanguage)) this.unreadable(path, opened.problem);
      return true;
    }
    const fixed = this.options.fix ? await this.fixed(path, read.text, opened.document) : read.text;
    if (this.options.fix === 'show') return this.shown(path, read.text, fixed);
    const again = fixed === read.text ? opened : openDocument(path, fixed, language);
    return again.ok ? this.checkDocument(slashed(path), again.document) : true;
  }

  /** The text after its proven fixes, written or only shown; the text as it is where that fails. */
  private async fixed(path: string, text: string, document: Document): Promise<string> {
    const { fixDocument, fixedSentence } = await import('./fix.ts');
    const { replaceFile } = await import('./write-file.ts');
    const workspace = await this.workspaceFor(dirname(slashed(path)));
    try {
      const bytes = readFileSync(path);
      const decoded = decode(bytes, document.notebook !== undefined);
      if (!decoded.ok || decoded.text !== text) throw new Error('it changed while it was read');
      await workspace.prepare(document.language);
      const repaired = fixDocument(workspace, slashed(path), document);
      if (repaired.text === text) return text;
      const written = this.options.fix === 'show' ? { ok: true as const } : replaceFile(path, bytes, text, repaired.text);
      if (written.ok) this.complain(fixedSentence(this.nameOf(path), repaired, this.options.fix === 'show' ? 'to be fixed' : 'fixed'));
      else this.unreadable(path, written.problem);
      return written.ok ? repaired.text : text;
    } catch (error) {
      this.unreadable(path, `it could not be fixed (${error instanceof Error ? error.message : String(error)})`);
      return text;
    } finally {
      workspace.forget(slashed(path));
    }
  }

  private async shown(path: string, before: string, after: string): Promise<boolean> {
    const { unifiedDiff } = await import('./fix.ts');
    this.progress.clear();
    return this.around.out(unifiedDiff(this.nameOf(path), before, after));
  }

  private async standardInput(): Promise<boolean> {
    const { stdinFile, language } = this.options;
    if (!language && !(stdinFile !== undefined && isServed(stdinFile))) {
      this.complain(`standard input: its language is not known; --language says which it is (${languageNames.join(', ')})`);
      this.failed = true;
      return true;
    }
    const file = slashed(resolve(this.around.workingFolder, stdinFile ?? inputName));
    const read = await readStream(this.around.input);
    if (!read.ok) {
      this.unreadable(file, read.problem);
      return true;
    }
    const opened = openDocument(file, read.text, language);
    if (opened.ok) return this.checkDocument(file, opened.document);
    this.unreadable(file, opened.problem);
    return true;
  }

  private async checkDocument(file: string, { text, language, notebook }: Document): Promise<boolean> {
    const workspace = await this.workspaceFor(dirname(file));
    let findings: readonly Reported[];
    try {
      await workspace.prepare(language);
      const result = workspace.check(file, text, language, notebook?.program.lineName);
      const all = reportedOf(result, { textOf: (other) => this.source.read(other), nameOf: (other) => this.nameOf(other), inCells: notebook && cellRegions(notebook) });
      if (this.options.writeBaseline !== undefined) this.found.push(...all);
      findings = all.filter((each) => !this.baseline?.knows(each));
      this.tally.count({ ...result, findings: result.findings.filter((_, at) => findings.includes(all[at] as Reported)) });
      if (this.options.stats) this.tally.countUnits(workspace.symbols(file));
    } catch (error) {
      this.unreadable(file, `it could not be checked because of a fault in termwise (${error instanceof Error ? (error.stack ?? error.message) : String(error)})`);
      return true;
    } finally {
      workspace.forget(file);
    }
    if (findings.length === 0) return true;
    this.progress.clear();
    return this.around.out(this.format.file(findings));
  }

  private async workspaceFor(folder: string): Promise<Workspace> {
    const configuration = this.configurations.at(folder);
    let workspace = this.workspaces.get(configuration);
    if (!workspace) {
      const severities = { ...configuration.severities, ...this.options.severities };
      workspace = await this.around.createWorkspace(this.source, { severities, notes: { ...defaultNoteSettings, ...configuration.notes } });
      this.workspaces.set(configuration, workspace);
    }
    return workspace;
  }

  private unreadable(path: string, problem: string): void {
    const name = this.nameOf(path);
    this.tally.countUnreadable(name, problem.split('\n', 1)[0] as string);
    this.complain(`${name}: ${problem}`);
    this.failed = true;
  }

  private complain(sentence: string): void {
    this.progress.clear();
    this.around.complain(`termwise: ${sentence}\n`);
  }

  private nameOf(file: string): string {
    return this.options.stdinFile === undefined && file === slashed(resolve(this.around.workingFolder, inputName)) ? inputName : displayName(file, this.around.workingFolder);
  }
}

/** What standard input is called; no file of a folder has this name. */
const inputName = '<stdin>';

function formatOf(options: CheckOptions, around: Surroundings): Format {
  if (options.format === 'json') return jsonFormat();
  if (options.format === 'sarif') return sarifFormat(around.version, folderUri(around.workingFolder));
  return textFormat({ color: options.color && around.color, width: around.width, hints: options.hints, stats: options.stats });
}
