import type { Chunk, Expr, ImportStmt, LanguageId, Program } from '../program/nodes.ts';

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
  /** The file that an import of `file` means, or undefined for libraries; `name` is one of its names, where that may be a file itself. */
  resolve?(file: string, statement: ImportStmt, name: string | undefined, source: FileSource): string | undefined;
  /**
   * The file that defines a name which `file` reads without an import: a MATLAB function beside it, another part of a Julia module.
   * Asked only for names that the file itself does not define; undefined where there is none.
   */
  neighbour?(file: string, name: string, source: FileSource): string | undefined;
}

/** The only way anything learns of files it was not given. Synchronous; answers from memory in an editor. */
export interface FileSource {
  /** Text of a file; undefined where there is none or it cannot be read. */
  read(file: string): string | undefined;
  /** Names (not paths) of the files in a folder; empty where there is none. */
  list(folder: string): readonly string[];
}

/** A grammar and the runtime for it, as WASM bytes; empty for a language that is parsed by code of our own. */
export interface GrammarBytes {
  readonly runtime: Uint8Array;
  readonly grammar: Uint8Array;
}

/** A line of the registry: what is known of a front end before it is loaded. */
export interface FrontEndEntry {
  readonly language: LanguageId;
  /** File endings with the dot, in small letters. */
  readonly endings: readonly string[];
  /** The grammar's file within its package; undefined for a parser of our own. */
  readonly grammar?: string;
  /** The language whose signatures it shares; undefined for its own. */
  readonly signatures?: LanguageId;
  /**
   * Set until the errors on code that nobody here wrote have been read and 19 in 20 are real: they are warnings until then, unless a
   * setting says otherwise.
   */
  readonly onTrial?: true;
  create(bytes: GrammarBytes): FrontEnd | Promise<FrontEnd>;
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
  /** Objects of the language itself, whose members need no import. */
  readonly builtIn?: readonly string[];
  /** A function does not see the variables of the script around it. */
  readonly closedFunctions?: true;
  /** A new statement that gives a constant its name, with a comment; undefined where one line cannot do that (declarations stand elsewhere). */
  define(name: string, value: string, note: string): string | undefined;
  /** Prints an expression in the host's syntax. */
  print(expr: Expr): string;
}

/** Chunks by content, so that a changed file reuses what did not change. */
export type ChunkPool = ReadonlyMap<string, readonly Chunk[]>;
