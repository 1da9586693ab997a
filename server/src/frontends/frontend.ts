import type { Chunk, Expr, LanguageId, Program } from '../program/nodes.ts';

/** A host language: everything that knows its syntax sits behind this. Stateless; the parse to continue from comes back in. */
export interface FrontEnd {
  readonly language: LanguageId;
  /** File endings with the dot. */
  readonly endings: readonly string[];
  /**
   * Parses a text. `previous` makes it incremental: unchanged chunks are the same objects, with their anchors moved.
   * `edits` are the changes since `previous`, in the order they were made; without them the texts are compared.
   * Never throws for any text.
   */
  parse(text: string, file: string, previous?: Parsed, edits?: readonly TextEdit[]): Parsed;
  /** How the language writes things, for fixes and write-backs. */
  readonly style: HostStyle;
}

export interface Parsed {
  readonly text: string;
  readonly program: Program;
  /** The front end's own syntax tree; opaque to everyone else. `release` frees it. */
  readonly tree: unknown;
  release(): void;
}

/** Replaces [start, end) of the text before the edit. */
export interface TextEdit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

export interface HostStyle {
  readonly comment: string;
  readonly power: string;
  readonly pi: string;
  /** Dotted names of library functions between angles and of π, the usual one first: used where the script imports them. */
  readonly toRadians: readonly string[];
  readonly toDegrees: readonly string[];
  readonly piNames: readonly string[];
  /** Prints an expression in the host's syntax. */
  print(expr: Expr): string;
}

/** Chunks by content, so that a changed file reuses what did not change. */
export type ChunkPool = ReadonlyMap<string, readonly Chunk[]>;
