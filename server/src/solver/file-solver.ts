/** Solves the functions of one file on demand, each once, with what they read of the file around them. */
import { Context, type NoteLookup, type Surroundings } from '../constraints/context.ts';
import { type ChunkIndex, lookupIn } from '../constraints/note-index.ts';
import type { ClassInfo, Scheme } from '../constraints/scheme.ts';
import type { NoteInForce, Value } from '../constraints/value.ts';
import { evaluate } from '../constraints/expressions.ts';
import { bind, notedValue } from '../constraints/targets.ts';
import type { Chunk, ClassStmt, FunctionStmt, ImportStmt, Program } from '../program/nodes.ts';
import { classInfo } from './classes.ts';
import { type Definition, definitionsOf, namesOf, type Piece } from './definitions.ts';
import { fingerprintOf } from './fingerprint.ts';
import type { Library } from './library.ts';
import { type Sightings, sightingsOf, type Solved, solvePiece, solveTopLevel, topSightings } from './pieces.ts';

/** What a file's solver needs from outside. */
export interface FileInputs {
  readonly program: Program;
  readonly indexOf: (chunk: Chunk) => ChunkIndex;
  readonly library: Library;
  /** A symbol of the nomenclature files in reach. */
  readonly nomenclature: (name: string) => NoteInForce | undefined;
  /** Another file of the workspace, for an import of this one; undefined for libraries. */
  readonly importFile: (statement: ImportStmt, name?: string) => FileSolver | undefined;
  /** The file that defines a name which this one reads without an import. */
  readonly neighbour: (name: string) => FileSolver | undefined;
  /** Results of earlier versions, by function; checked by what they read. */
  readonly cache: WeakMap<object, Solved>;
}

export class FileSolver {
  private readonly names: ReadonlyMap<string, readonly Definition[]>;
  private readonly symbols = new Map<string, NoteInForce>();
  private readonly globals = new Map<string, Value | undefined>();
  private readonly fingerprints = new Map<string, string>();
  private readonly solved = new Map<object, Solved>();
  private readonly classes = new Map<ClassStmt, ClassInfo>();
  private readonly active = new Set<object>();

  constructor(readonly inputs: FileInputs) {
    this.names = namesOf(inputs.program);
    for (const chunk of inputs.program.chunks) {
      for (const [name, note] of inputs.indexOf(chunk).symbols.get(undefined) ?? []) if (!this.symbols.has(name)) this.symbols.set(name, note);
    }
  }

  /** Every function and method of the file, in order. */
  *pieces(): Generator<Piece> {
    for (const chunk of this.inputs.program.chunks) yield* definitionsOf(chunk).pieces;
  }

  /** The solved form of a function; undefined while it is being solved (recursion). */
  piece(piece: Piece): Solved | undefined {
    return this.once(piece.fn, (reads) => {
      const owner = piece.owner && this.classOf(piece.owner, piece.chunk);
      return solvePiece(piece, owner, this.surroundings(piece.chunk, piece.owner, reads));
    });
  }

  /** The file's top level, as one body. */
  topLevel(): Solved | undefined {
    const chunks = this.inputs.program.chunks;
    const running = chunks.filter((chunk) => definitionsOf(chunk).runs);
    const first = running[0];
    if (!first) return undefined;
    return this.once(first, (reads) => solveTopLevel(running, (chunk) => this.surroundings(chunk, undefined, reads)), running);
  }

  /** What is known at every expression of a function, or of the top level; computed at each call. */
  sightings(piece: Piece | undefined): Sightings {
    const around = (chunk: Chunk): Surroundings => this.surroundings(chunk, piece?.owner, new Set());
    if (piece) return sightingsOf(piece, piece.owner && this.classOf(piece.owner, piece.chunk), around(piece.chunk));
    return topSightings(this.inputs.program.chunks.filter((chunk) => definitionsOf(chunk).runs), around);
  }

  scheme(fn: FunctionStmt, owner: ClassStmt | undefined, chunk: Chunk): Scheme | undefined {
    return this.piece({ fn, owner, chunk })?.scheme;
  }

  classOf(statement: ClassStmt, chunk: Chunk): ClassInfo {
    let info = this.classes.get(statement);
    if (!info) {
      info = classInfo(statement, chunk, this);
      this.classes.set(statement, info);
    }
    return info;
  }

  /** What a top-level name stands for; evaluated when first asked. */
  global(name: string): Value | undefined {
    if (this.globals.has(name)) return this.globals.get(name);
    this.globals.set(name, undefined);
    const value = this.define(name) ?? this.starred(name) ?? this.inputs.neighbour(name)?.own(name.slice(name.lastIndexOf('.') + 1)) ?? this.inputs.library.find(name);
    this.globals.set(name, value);
    return value;
  }

  /** What the file itself defines under a name. */
  own(name: string): Value | undefined {
    return this.names.has(name) ? this.global(name) : undefined;
  }

  /** The names that the file's top level assigns. */
  variables(): readonly string[] {
    return [...this.names].flatMap(([name, definitions]) => (definitions.some((each) => each.kind === 'variable') ? [name] : []));
  }

  notesIn(chunk: Chunk, owner: ClassStmt | undefined): NoteLookup {
    return lookupIn(this.inputs.indexOf(chunk), owner, (name) => this.symbols.get(name) ?? this.inputs.nomenclature(name));
  }

  index(chunk: Chunk): ChunkIndex {
    return this.inputs.indexOf(chunk);
  }

  private once(key: object, make: (reads: Set<string>) => Solved, parts?: readonly object[]): Solved | undefined {
    const known = this.solved.get(key);
    if (known) return known;
    if (this.active.has(key)) return undefined;
    this.active.add(key);
    const cached = this.inputs.cache.get(key);
    const valid = cached && this.stillHolds(cached, parts);
    const reads = new Set<string>();
    const solved = valid ? cached : { ...make(reads), reads: this.recorded(reads), parts };
    this.active.delete(key);
    this.solved.set(key, solved);
    this.inputs.cache.set(key, solved);
    return solved;
  }

  private stillHolds(cached: Solved, parts: readonly object[] | undefined): boolean {
    if (parts && (cached.parts?.length !== parts.length || !parts.every((part, at) => part === cached.parts?.[at]))) return false;
    for (const [name, fingerprint] of cached.reads ?? []) if (this.fingerprint(name) !== fingerprint) return false;
    return true;
  }

  private recorded(reads: ReadonlySet<string>): ReadonlyMap<string, string> {
    return new Map([...reads].map((name) => [name, this.fingerprint(name)]));
  }

  /** Of a global name, or of a nomenclature or file-wide symbol (`~name`). */
  private fingerprint(name: string): string {
    let found = this.fingerprints.get(name);
    if (found === undefined) {
      this.fingerprints.set(name, '~');
      const note = name.startsWith('~') ? (this.symbols.get(name.slice(1)) ?? this.inputs.nomenclature(name.slice(1))) : undefined;
      found = name.startsWith('~') ? fingerprintOf(note && notedValue(name, note, note.anchor, undefined)) : fingerprintOf(this.global(name));
      this.fingerprints.set(name, found);
    }
    return found;
  }

  private surroundings(chunk: Chunk, owner: ClassStmt | undefined, reads: Set<string>): Surroundings {
    const wide = (name: string): NoteInForce | undefined => {
      reads.add(`~${name}`);
      return this.symbols.get(name) ?? this.inputs.nomenclature(name);
    };
    return {
      global: (name) => {
        reads.add(name);
        return this.global(name);
      },
      library: (name) => this.inputs.library.find(name),
      method: (name) => this.inputs.library.method(name),
      imported: (statement) => this.imported(statement),
      notes: lookupIn(this.inputs.indexOf(chunk), owner, wide),
    };
  }

  private define(name: string): Value | undefined {
    const definitions = this.names.get(name);
    const last = definitions?.at(-1);
    if (!definitions || !last) return undefined;
    if (this.inputs.program.language === 'julia' && !this.agree(name, definitions)) return { expr: undefined, form: undefined, from: [] };
    switch (last.kind) {
      case 'function':
        return { expr: undefined, form: undefined, from: [], callable: { kind: 'function', name, scheme: () => this.scheme(last.statement, undefined, last.chunk) } };
      case 'class':
        return { expr: undefined, form: undefined, from: [], callable: { kind: 'class', info: this.classOf(last.statement, last.chunk) } };
      case 'import':
        return this.imported(last.statement).get(name);
      case 'variable':
        return this.variable(name, definitions);
    }
  }

  /** Where methods of one name are chosen by the types of their arguments, several are known only where all do the same. */
  private agree(name: string, definitions: readonly Definition[]): boolean {
    const callable = definitions.some((each) => each.kind === 'function' || each.kind === 'class');
    if (!callable) return true;
    if (this.inputs.neighbour(name)?.names.has(name)) return false;
    const [first, ...others] = definitions.map((each) => (each.kind === 'function' ? this.scheme(each.statement, undefined, each.chunk)?.fingerprint : undefined));
    return others.length === 0 || (first !== undefined && others.every((each) => each === first));
  }

  /** A top-level variable: its note, or the value of its only assignment. */
  private variable(name: string, definitions: readonly Definition[]): Value | undefined {
    for (const definition of definitions) {
      if (definition.kind !== 'variable') continue;
      const note = this.notesIn(definition.chunk, undefined).statement(definition.statement, name, undefined)[0];
      if (note) return notedValue(name, note, definition.chunk.anchor, definition.statement);
    }
    const only = definitions[0];
    if (definitions.length !== 1 || only?.kind !== 'variable' || only.statement.kind !== 'assign' || only.statement.op) return undefined;
    const target = only.statement.targets.find((each) => each.kind === 'name' && each.name === name);
    if (!target) return undefined;
    const context = new Context(only.chunk.anchor, this.surroundings(only.chunk, undefined, new Set()), undefined);
    bind(context, name, target, evaluate(context, only.statement.value));
    return context.bindings.get(name);
  }

  private starred(name: string): Value | undefined {
    for (const chunk of this.inputs.program.chunks) {
      for (const star of definitionsOf(chunk).stars) {
        const file = this.isLibrary(star) ? undefined : this.inputs.importFile(star);
        const found = file ? file.global(name) : this.inputs.library.find(`${star.module}.${name}`);
        if (found) return found;
      }
    }
    return undefined;
  }

  private imported(statement: ImportStmt): ReadonlyMap<string, Value> {
    const names = new Map<string, Value>();
    if (statement.names) {
      for (const { name, alias } of statement.names) {
        const value = name === '*' ? undefined : this.importedName(statement, name);
        if (value) names.set(alias, value);
      }
      return names;
    }
    const file = this.isLibrary(statement) ? undefined : this.inputs.importFile(statement);
    const bound = statement.alias ?? (statement.module.split('.')[0] as string);
    const library = this.inputs.library.find(statement.alias ? statement.module : bound);
    if (file && (statement.alias || !statement.module.includes('.'))) names.set(bound, moduleValue(statement.module, file));
    else if (library) names.set(bound, library);
    return names;
  }

  /** A library with signatures is taken from them, wherever its sources lie. */
  private isLibrary(statement: ImportStmt): boolean {
    return statement.level === 0 && this.inputs.library.find(statement.module.split('.')[0] as string)?.module !== undefined;
  }

  private importedName(statement: ImportStmt, name: string): Value | undefined {
    if (this.isLibrary(statement)) return this.inputs.library.find(`${statement.module}.${name}`);
    const submodule = this.inputs.importFile(statement, name);
    if (submodule) return moduleValue(name, submodule);
    const file = this.inputs.importFile(statement);
    if (file) return file.global(name);
    return this.inputs.library.find(`${statement.module}.${name}`) ?? commonConstant(statement.module, name, this.inputs.library);
  }
}

/** Modules named `constants` of packages that are not at hand use the names and SI values of SciPy's (common practice). */
function commonConstant(module: string, name: string, library: Library): Value | undefined {
  return /(?:^|\.)constants$/.test(module) ? library.find(`scipy.constants.${name}`) : undefined;
}

function moduleValue(name: string, file: FileSolver): Value {
  return { expr: undefined, form: undefined, from: [], module: { name, member: (member) => file.global(member) } };
}
