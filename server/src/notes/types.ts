/** Unit notes: what the author wrote about which symbol is counted in which unit. */
import type { AssignStmt, ClassStmt, DeclareStmt, FunctionStmt, LoopStmt, Param, RecordEntry, ScopeStmt } from '../program/nodes.ts';
import type { UnitHint, UnitUnread } from '../quantities/unit-result.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Span } from '../text/span.ts';

export interface Note {
  readonly target: NoteTarget;
  readonly unit: Unit;
  /** The unit's own characters, relative to the chunk. */
  readonly span: Span;
  readonly form: NoteForm;
  /** The words beside the unit, without it. */
  readonly description?: string;
  readonly range?: { readonly low: number; readonly high: number };
  readonly hints: readonly UnitHint[];
}

/** Precedence follows semantics §3: trailing, documentation, above, nomenclature. */
export type NoteForm = 'trailing' | 'documentation' | 'above' | 'nomenclature';

export type NoteTarget =
  /** The symbol that the statement assigns or declares: `x`, `self.rho`, `df["p"]`; `path` as `pathOf` prints it. */
  | { readonly kind: 'statement'; readonly statement: AssignStmt | DeclareStmt | LoopStmt | ScopeStmt; readonly path: string }
  | { readonly kind: 'entry'; readonly entry: RecordEntry }
  | { readonly kind: 'parameter'; readonly owner: FunctionStmt; readonly param: Param }
  /** `position` for one of several returned values. */
  | { readonly kind: 'result'; readonly owner: FunctionStmt; readonly position?: number; readonly name?: string }
  | { readonly kind: 'field'; readonly owner: ClassStmt; readonly name: string }
  /** A symbol named by a comment; `owner` undefined: the whole file. */
  | { readonly kind: 'symbol'; readonly owner: FunctionStmt | undefined; readonly name: string };

/** A bracket that clearly tries to be a unit and fails. */
export interface NoteProblem {
  readonly span: Span;
  readonly text: string;
  readonly fault: UnitUnread;
}

/** `termwise: allow <code> — reason`, `empirical: …`, `y depends on …`. */
export type Directive =
  | { readonly kind: 'allow'; readonly code: string; readonly reason: string; readonly span: Span; readonly wholeFile: boolean }
  | { readonly kind: 'empirical'; readonly units: readonly { readonly symbol: string; readonly unit: Unit; readonly span: Span }[]; readonly span: Span }
  | { readonly kind: 'depends'; readonly dependent: string; readonly on: readonly string[]; readonly span: Span }
  | { readonly kind: 'malformed'; readonly problem: string; readonly span: Span };

/** All notes of one chunk. Depends on the chunk's text, the vocabulary and the settings only, and is cached by them. */
export interface ChunkNotes {
  readonly notes: readonly Note[];
  readonly problems: readonly NoteProblem[];
  readonly directives: readonly Directive[];
  /** Brackets read as units, and brackets left alone because they are no units: for statistics. */
  readonly read: number;
  readonly unread: readonly { readonly text: string; readonly span: Span }[];
}

export interface NoteSettings {
  /** `(m/s)` counts as a note where it reads as a unit beyond doubt. */
  readonly parentheses: boolean;
  /** A comment that is wholly a unit, `# kg/m^3`, counts. */
  readonly bare: boolean;
}

export const defaultNoteSettings: NoteSettings = { parentheses: true, bare: true };
