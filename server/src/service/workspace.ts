/** The facade over one set of files: keeps what is parsed and solved, and answers checks. */
import { detect, detectInSteps, type Engine, say, type Understood, understand } from '../analyze.ts';
import type { Detected } from '../findings/collect.ts';
import type { FrontEnd, TextEdit } from '../frontends/frontend.ts';
import { frontEndEntries } from '../frontends/registry.ts';
import type { Elementary } from '../notes/nomenclature/elementary.ts';
import { nomenclatureNotes } from '../notes/nomenclature/chunk-notes.ts';
import { readChunkNotes } from '../notes/read-chunk.ts';
import type { ChunkNotes } from '../notes/types.ts';
import { ignoresCase } from '../program/name-case.ts';
import type { Chunk, LanguageId } from '../program/nodes.ts';
import { loadSignatures } from '../signatures/load.ts';
import type { FileSolver } from '../solver/file-solver.ts';
import { inSmallLetters, type Library, libraryOf, type SignatureTable } from '../solver/library.ts';
import type { Solved } from '../solver/pieces.ts';
import { absolute, type Span } from '../text/span.ts';
import type { Assets, CheckResult, CompletionChoice, FileSource, HintSettings, HoverInfo, OfferedFix, PlacedFinding, Settings, SymbolGroup, TextHint, Workspace } from './contract.ts';
import { symbolGroups } from './file-symbols.ts';
import { hintsIn } from './hints.ts';
import { fixesOf, type Look } from './fixes.ts';
import { type Trial, tryInChunk } from './trial.ts';
import { NomenclatureFolders, type Reach } from './folder-nomenclature.ts';
import { type GroupsService, groupsService } from './groups-service.ts';
import { completionsAt } from './completion.ts';
import { type FormulaValues, formulaValues } from './formula-values.ts';
import { hoverAt } from './hover.ts';
import { withGroup } from './hover-group.ts';
import { type SymbolUses, usesOf } from './places.ts';
import { voiceOver } from './voice-over.ts';

/** Imported files that are kept understood from one check to the next. Never dropped during a check: modules import each other in circles. */
const mostImports = 60;
/** More than this many are not followed: what lies beyond is unknown. */
const mostAtOnce = 150;

/** A workspace with the front ends of some languages; `prepare` adds others. Rejects where the installation is incomplete. */
export async function createWorkspace(assets: Assets, source: FileSource, settings: Settings, languages: readonly LanguageId[] = ['python', 'nomenclature']): Promise<Workspace> {
  const files = new Files(assets, source, settings);
  await files.prepare(...languages);
  return files;
}

interface Kept {
  readonly understood: Understood;
  readonly reach: string;
}

class Files implements Workspace {
  readonly groups: GroupsService;
  private readonly open = new Map<string, Kept>();
  private readonly imports = new Map<string, Understood | undefined>();
  private readonly folders: NomenclatureFolders;
  private readonly tables = new Map<LanguageId, SignatureTable>();
  private readonly libraries = new Map<string, Library>();
  private notes = new WeakMap<Chunk, { readonly reach: string; readonly notes: ChunkNotes }>();
  private cache = new WeakMap<object, Solved>();
  private elementary: Elementary | undefined;

  private readonly frontEnds: FrontEnd[] = [];
  private readonly loading = new Map<LanguageId, Promise<void>>();

  constructor(private readonly assets: Assets, private readonly source: FileSource, private readonly settings: Settings) {
    this.folders = new NomenclatureFolders(source);
    this.groups = groupsService((file) => this.heldOf(file), (file) => this.textOf(file));
  }

  async prepare(...languages: readonly LanguageId[]): Promise<void> {
    await Promise.all(languages.map((language) => {
      const loading = this.loading.get(language) ?? this.load(language);
      this.loading.set(language, loading);
      return loading;
    }));
  }

  async prepareValues(): Promise<void> {
    this.elementary ??= (await import('../notes/nomenclature/elementary.ts')).elementary;
  }

  check(file: string, text: string, language?: LanguageId, lineName?: (offset: number) => string): CheckResult {
    const steps = this.steps(file, text, language, lineName);
    for (;;) {
      const step = steps.next();
      if (step.done) return step.value;
    }
  }

  *steps(file: string, text: string, language?: LanguageId, lineName?: (offset: number) => string): Generator<void, CheckResult> {
    const frontEnd = this.frontEndOf(file, language);
    if (!frontEnd) return { file, language: language ?? 'python', text, findings: [], statistics: { functions: 0, notes: 0, unread: [] } };
    if (this.imports.size > mostImports) this.imports.clear();
    const understood = this.understand(file, text, frontEnd);
    const detected = this.severe(yield* detectInSteps(understood), frontEnd);
    const voice = voiceOver(file, (name) => (name === file ? text : this.textOf(name)), lineName);
    const findings = say(detected, voice).map((finding): PlacedFinding => ({
      code: finding.code,
      severity: finding.severity,
      span: absolute(finding.place),
      message: finding.message,
      related: finding.related.map((each) => ({ file: each.place.anchor.file, span: absolute(each.place), message: each.message })),
    }));
    return { file, language: frontEnd.language, text, findings, statistics: statisticsOf(understood) };
  }

  fixes(file: string, span?: Span): readonly OfferedFix[] {
    const kept = this.open.get(file);
    const language = kept?.understood.parsed.program.language;
    const frontEnd = this.frontEnds.find((each) => each.language === language);
    if (!kept || !frontEnd) return [];
    const { understood } = kept;
    const look = (text: string): Look => {
      const again = this.understand(file, text, frontEnd);
      return { understood: again, detected: this.severe(detect(again), frontEnd) };
    };
    const reach = this.folders.reachOf(file);
    const trial = (edits: readonly TextEdit[]): Trial | undefined => {
      const found = tryInChunk(understood, edits, frontEnd, (chunk) => this.notesOf(chunk, frontEnd, reach));
      return found && { ...found, before: this.severe(found.before, frontEnd), after: this.severe(found.after, frontEnd) };
    };
    return fixesOf({ understood, detected: this.severe(detect(understood), frontEnd) }, frontEnd.style, span, trial, look);
  }

  hover(file: string, offset: number): HoverInfo | undefined {
    const kept = this.open.get(file);
    const frontEnd = this.frontEnds.find((each) => each.language === kept?.understood.parsed.program.language);
    const textOf = (name: string): string => this.textOf(name);
    return kept && frontEnd && withGroup(hoverAt(kept.understood, frontEnd.style, offset, textOf), kept.understood, offset, textOf);
  }

  symbols(file: string): readonly SymbolGroup[] {
    const held = this.heldOf(file);
    return held ? [...symbolGroups(held.understood)] : [];
  }

  hints(file: string, span: Span, settings: HintSettings): readonly TextHint[] {
    const held = this.heldOf(file);
    return held ? hintsIn(held.understood, held.style, span, settings, this.valuesOf(held.understood)) : [];
  }

  uses(file: string, name: string, declaredIn: string): SymbolUses {
    const held = this.heldOf(file);
    return held ? usesOf(held.understood, name, declaredIn) : { uses: [], proven: false };
  }

  completions(file: string, offset: number): readonly CompletionChoice[] {
    const held = this.heldOf(file);
    return held ? completionsAt(held.understood, offset, this.folders.reachOf(file).vocabulary) : [];
  }

  forget(file: string): void {
    this.open.get(file)?.understood.parsed.release();
    this.open.delete(file);
  }

  invalidate(file: string): void {
    if (file.endsWith('.nomen')) this.folders.forget();
    this.imports.get(file)?.parsed.release();
    this.imports.clear();
    this.libraries.clear();
  }

  private async load(language: LanguageId): Promise<void> {
    const entry = frontEndEntries.find((each) => each.language === language);
    if (!entry) return;
    const [signatures, grammar] = await Promise.all([this.assets.signatures(entry.signatures ?? language), this.assets.grammar(language)]);
    this.tables.set(language, loadSignatures(signatures));
    const runtime = grammar ? await this.assets.runtime() : new Uint8Array();
    this.frontEnds.push(await entry.create({ runtime, grammar: grammar ?? new Uint8Array() }));
  }

  /** Undefined for a script, and where the arithmetic is not loaded. */
  private valuesOf({ parsed: { program, text } }: Understood): FormulaValues | undefined {
    if (program.language !== 'nomenclature') return undefined;
    return this.elementary ? formulaValues(text, program.file, this.folders.reachOf(program.file).vocabulary, this.elementary) : new Map();
  }

  private heldOf(file: string): { readonly understood: Understood; readonly style: FrontEnd['style'] } | undefined {
    const kept = this.open.get(file);
    const frontEnd = this.frontEnds.find((each) => each.language === kept?.understood.parsed.program.language);
    return kept && frontEnd && { understood: kept.understood, style: frontEnd.style };
  }

  private understand(file: string, text: string, frontEnd: FrontEnd): Understood {
    const reach = this.folders.reachOf(file);
    const previous = this.open.get(file);
    const understood = understand(text, file, this.engineFor(file, frontEnd, reach), previous?.understood.parsed);
    this.open.set(file, { understood, reach: reach.fingerprint });
    return understood;
  }

  private engineFor(file: string, frontEnd: FrontEnd, reach: Reach): Engine {
    return {
      frontEnd,
      readNotes: (chunk) => this.notesOf(chunk, frontEnd, reach),
      library: this.libraryFor(frontEnd.language, reach),
      nomenclature: (name) => reach.symbol(name, ignoresCase(frontEnd.language)),
      importFile: (statement, name) => this.imported(frontEnd.resolve?.(file, statement, name, this.source), frontEnd),
      neighbour: (name) => this.imported(frontEnd.neighbour?.(file, name, this.source), frontEnd),
      cache: this.cache,
    };
  }

  private notesOf(chunk: Chunk, frontEnd: FrontEnd, reach: Reach): ChunkNotes {
    const known = this.notes.get(chunk);
    if (known?.reach === reach.fingerprint) return known.notes;
    const notes = frontEnd.language === 'nomenclature' ? nomenclatureNotes(chunk, reach.vocabulary) : readChunkNotes(chunk, this.settings.notes, reach.vocabulary, frontEnd.language);
    this.notes.set(chunk, { reach: reach.fingerprint, notes });
    return notes;
  }

  private libraryFor(language: LanguageId, reach: Reach): Library {
    const key = `${language}|${reach.fingerprint}`;
    let library = this.libraries.get(key);
    if (!library) {
      const shipped = this.tables.get(language);
      const own = ignoresCase(language) ? reach.signatures.map(inSmallLetters) : reach.signatures;
      library = libraryOf(...own, ...(shipped ? [shipped] : []));
      this.libraries.set(key, library);
    }
    return library;
  }

  private imported(file: string | undefined, from: FrontEnd): FileSolver | undefined {
    if (file === undefined) return undefined;
    const open = this.open.get(file);
    if (open) return open.understood.solver;
    if (this.imports.has(file)) return this.imports.get(file)?.solver;
    if (this.imports.size >= mostAtOnce) return undefined;
    this.imports.set(file, undefined);
    const text = this.source.read(file);
    const frontEnd = reads(from, file) ? from : this.frontEndOf(file, undefined);
    const understood = text === undefined || !frontEnd ? undefined : understand(text, file, this.engineFor(file, frontEnd, this.folders.reachOf(file)));
    understood?.parsed.release();
    this.imports.set(file, understood);
    return understood?.solver;
  }

  private textOf(file: string): string {
    return this.open.get(file)?.understood.parsed.text ?? this.imports.get(file)?.parsed.text ?? this.source.read(file) ?? '';
  }

  private frontEndOf(file: string, language: LanguageId | undefined): FrontEnd | undefined {
    if (language) return this.frontEnds.find((each) => each.language === language);
    return this.frontEnds.find((each) => reads(each, file));
  }

  private severe(detected: readonly Detected[], { language }: FrontEnd): readonly Detected[] {
    const onTrial = frontEndEntries.some((each) => each.language === language && each.onTrial);
    return detected.flatMap((each) => {
      const severity = this.settings.severities[each.code] ?? (onTrial && each.severity === 'error' ? 'warning' : each.severity);
      return severity === 'off' ? [] : [{ ...each, severity }];
    });
  }
}

/** Whether a file has one of a language's endings. */
function reads({ endings }: FrontEnd, file: string): boolean {
  const lower = file.toLowerCase();
  return endings.some((ending) => lower.endsWith(ending));
}

function statisticsOf(understood: Understood): CheckResult['statistics'] {
  const unread: string[] = [];
  let notes = 0;
  for (const read of understood.notes.values()) {
    notes += read.notes.length;
    for (const each of read.unread) unread.push(each.text);
  }
  return { functions: [...understood.solver.pieces()].length, notes, unread };
}
