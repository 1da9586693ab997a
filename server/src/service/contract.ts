/** What the service offers to the editor, the terminal and the tests: plain data in offsets. Only the types; see workspace.ts. */
import type { FindingCode, Severity } from '../findings/finding.ts';
import type { NoteSettings } from '../notes/types.ts';
import type { LanguageId } from '../program/nodes.ts';
import type { FileSource, TextEdit } from '../frontends/frontend.ts';
import type { Confidence, FixKind } from '../repairs/fix.ts';
import type { Span } from '../text/span.ts';
import type { SymbolUses } from './places.ts';
import type { GroupsService } from './groups-service.ts';

export type { FileSource };

/** What the engine needs from outside besides scripts: bytes and texts that ship with it. */
export interface Assets {
  /** The grammar runtime and one grammar per language, as WASM bytes. */
  runtime(): Uint8Array | Promise<Uint8Array>;
  grammar(language: LanguageId): Uint8Array | undefined | Promise<Uint8Array | undefined>;
  /** Shipped signature files of a language, in the nomenclature notation. */
  signatures(language: LanguageId): SignatureFiles | Promise<SignatureFiles>;
}

export type SignatureFiles = readonly { readonly file: string; readonly text: string }[];

export interface Settings {
  /** Severity of each code; `off` silences it. Missing: the check's default. */
  readonly severities: Readonly<Partial<Record<FindingCode, Severity | 'off'>>>;
  readonly notes: NoteSettings;
}

export interface PlacedFinding {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly span: Span;
  readonly message: string;
  readonly related: readonly { readonly file: string; readonly span: Span; readonly message: string }[];
}

export interface CheckResult {
  readonly file: string;
  readonly language: LanguageId;
  readonly text: string;
  readonly findings: readonly PlacedFinding[];
  readonly statistics: Statistics;
}

export interface Statistics {
  readonly functions: number;
  /** Notes read as units. */
  readonly notes: number;
  /** Brackets left alone or not readable, with their text. */
  readonly unread: readonly string[];
}

/** A change that would settle a finding, ready to show and to apply. */
export interface OfferedFix {
  readonly kind: FixKind;
  /** The finding it settles; undefined where it is offered for the place alone. */
  readonly finding: { readonly code: FindingCode; readonly span: Span } | undefined;
  readonly title: string;
  /** Only `proven` fixes may be applied without being asked for. */
  readonly confidence: Confidence;
  /** In offsets of the checked text; do not overlap. Empty where there is only something to say: show it as not available. */
  readonly edits: readonly TextEdit[];
  /** Part of the new text that the author has to fill in, to be selected. */
  readonly fill?: Span;
  /** How many other findings go with it. */
  readonly alsoSettles: number;
}

/** What is known of the symbol or expression at a place. */
export interface HoverInfo {
  /** The characters it is about. */
  readonly span: Span;
  readonly name: string;
  /** The unit its number is counted in, as its author wrote it or as it follows; undefined where only the dimension is known. */
  readonly unit: string | undefined;
  /** In powers of base quantities: `L·T⁻¹`. */
  readonly dimension: string;
  /** Kinds of quantity that have this dimension, by their names in ISO 80000. */
  readonly kinds: readonly string[];
  readonly origin: 'declared' | 'inferred' | 'library';
  /** The words beside the note. */
  readonly description: string | undefined;
  /** Notes that this rests on, the symbol's own first; lines from one, `file` where it is another one. */
  readonly notes: readonly { readonly symbol: string; readonly unit: string; readonly file: string | undefined; readonly line: number; readonly span: Span }[];
  /** Values it may take, in its unit; equal where it is one value. */
  readonly range: { readonly low: number; readonly high: number } | undefined;
  /** What a literal number was taken for. */
  readonly conversion?: { readonly from: string; readonly to: string };
  /** The dimensionless product around the place: `Reynolds number, 5894 to 70728`. */
  readonly group?: { readonly code: string; readonly text: string };
}

/** The symbols of one function, or of the file's top level. */
export interface SymbolGroup {
  /** The function's name; undefined for the top level. */
  readonly owner: string | undefined;
  /** Its name and its whole, in the file; of the top level, the file. */
  readonly nameSpan: Span;
  readonly span: Span;
  readonly symbols: readonly SymbolInfo[];
}

export interface SymbolInfo {
  readonly name: string;
  readonly kind: 'parameter' | 'variable';
  readonly span: Span;
  readonly origin: 'declared' | 'inferred' | 'unknown';
  /** Empty for a pure number; undefined where it is not known, or only its dimension. */
  readonly unit: string | undefined;
  /** In powers of base quantities; undefined where it is not known. */
  readonly dimension: string | undefined;
  readonly description: string | undefined;
  readonly uses: number;
}

export interface HintSettings {
  /** The unit that follows, behind a symbol without a note. */
  readonly inferred: boolean;
  /** The unit that a parameter has, at calls: for numbers, for everything, or never. */
  readonly arguments: 'numbers' | 'all' | 'off';
  /** The value of a formula of a nomenclature file. */
  readonly values: boolean;
}

export const defaultHints: HintSettings = { inferred: true, arguments: 'numbers', values: true };

/** A text that may be written at a place. */
export interface CompletionChoice {
  readonly label: string;
  /** What it takes the place of. */
  readonly replaces: Span;
  /** The unit that follows there, one of the kind that is needed, one that the file uses, any other. */
  readonly rank: 'inferred' | 'kind' | 'used' | 'other';
  readonly kind: 'unit' | 'symbol' | 'phrase';
  readonly detail: string;
  readonly documentation: string | undefined;
}

/** A few characters shown in the text that are not in it. */
export interface TextHint {
  readonly at: number;
  readonly text: string;
  readonly kind: 'inferred' | 'argument' | 'value';
  readonly tip: string | undefined;
  /** Writes it as a note. */
  readonly edits: readonly TextEdit[];
}

/** The facade that terminal, editor and tests use: `createWorkspace(assets, source, settings)` in workspace.ts. */
export interface Workspace {
  /** Loads the front end of each language, where that is not done yet. A file in another language gives no findings. */
  prepare(...languages: readonly LanguageId[]): Promise<void>;
  /** Loads what evaluates the formulas of nomenclature files; until then they have no values. */
  prepareValues(): Promise<void>;
  /**
   * Checks a text as the content of `file`; the language follows the file's ending unless given. `lineName`: what messages call the line
   * of an offset, where the text's own numbers mean nothing (a notebook's cells). Never throws for any text.
   */
  check(file: string, text: string, language?: LanguageId, lineName?: (offset: number) => string): CheckResult;
  /** The same check with pauses in it, during which no other method may be called; what is given up half-way leaves nothing wrong behind. */
  steps(file: string, text: string, language?: LanguageId, lineName?: (offset: number) => string): Generator<void, CheckResult>;
  /**
   * The fixes for the findings that a span touches, and for what stands there, best first; without a span for the whole file.
   * For a file that was checked last with the text it has now; empty for any other. Each was checked: applied, its finding is gone and none is new.
   */
  fixes(file: string, span?: Span): readonly OfferedFix[];
  /** What stands at an offset; for a file that was checked last with the text it has now, undefined where nothing is known. */
  hover(file: string, offset: number): HoverInfo | undefined;
  /** Relations between quantities, and their dimensionless groups. */
  readonly groups: GroupsService;
  /** The symbols of a file that take part in arithmetic, function by function; for a file that was checked last with the text it has now. */
  symbols(file: string): readonly SymbolGroup[];
  /** What to show in the text between two offsets beside what its author wrote. */
  hints(file: string, span: Span, settings: HintSettings): readonly TextHint[];
  /** The uses in a file of a symbol that a nomenclature file declares; for a file that was checked last with the text it has now. */
  uses(file: string, name: string, declaredIn: string): SymbolUses;
  /** What may be written at an offset: inside a note, or in a nomenclature file. */
  completions(file: string, offset: number): readonly CompletionChoice[];
  /** Frees what is kept for a file. */
  forget(file: string): void;
  /** Tells that a file changed on disk (an import or a nomenclature file). */
  invalidate(file: string): void;
}
