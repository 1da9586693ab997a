import type { ClassStmt, FunctionStmt, ImportStmt, LambdaExpr, Param, RecordEntry, Stmt } from '../program/nodes.ts';
import type { Signature } from '../program/signature.ts';
import type { Anchor, Span } from '../text/span.ts';
import { Bindings } from './bindings.ts';
import { type Form, type Unknown, unknownForm } from './form.ts';
import type { Constraint } from './problem.ts';
import type { NoteInForce, Value } from './value.ts';

/** What the generator asks of the world around the piece of program it reads. Every answer may change what it generates. */
export interface Surroundings {
  /** A name of the file's top level: a variable, function, class or import. */
  global(name: string): Value | undefined;
  /** A library function or constant by its dotted name. */
  library(name: string): Value | undefined;
  method(name: string): Signature | undefined;
  /** The names that an import inside a function brings in. */
  imported(statement: ImportStmt): ReadonlyMap<string, Value>;
  readonly notes: NoteLookup;
}

/** The notes in force for a place, strongest first. */
export interface NoteLookup {
  statement(statement: Stmt, path: string, within: FunctionStmt | undefined): readonly NoteInForce[];
  parameter(owner: FunctionStmt, param: Param): readonly NoteInForce[];
  results(owner: FunctionStmt): readonly NoteInForce[];
  entry(entry: RecordEntry): NoteInForce | undefined;
  field(owner: ClassStmt, name: string): NoteInForce | undefined;
  /** A symbol named by a comment or by the nomenclature, wherever it is used. */
  symbol(path: string, within: FunctionStmt | undefined): NoteInForce | undefined;
  empirical(statement: Stmt): readonly EmpiricalUnit[] | undefined;
  /** The units of a function that is declared an empirical relation as a whole. */
  empiricalFunction(fn: FunctionStmt): readonly EmpiricalUnit[] | undefined;
}

export interface EmpiricalUnit {
  readonly symbol: string;
  readonly note: NoteInForce;
}

/** A function defined inside another: its body is read once, in place, with its parameters open. */
export interface LocalFunction {
  readonly definition: FunctionStmt | LambdaExpr;
  readonly params: readonly { readonly name: string; readonly unknown: Unknown | undefined; readonly note?: NoteInForce }[];
  readonly result: Value;
}

let unknowns = 0;

/** The state of one generation: a function's body, or a file's top level. */
export class Context {
  readonly constraints: Constraint[] = [];
  bindings = new Bindings();
  /** Notes of declarations: they hold for every value that their symbols take. */
  declared: ReadonlyMap<string, NoteInForce> = new Map();
  /** Names that assignments reach outside for. */
  readonly outer = new Set<string>();
  returns: Value[] = [];
  /** What augmented products multiplied or divided by. */
  readonly corrections = new Map<Stmt, Value>();
  depth = 0;
  /** Set while a value is only looked at again (loops), so that nothing is reported twice. */
  readonly sightings: Map<Span, Value> | undefined;

  constructor(
    public anchor: Anchor,
    public surroundings: Surroundings,
    /** The function whose body this is; undefined for the top level. */
    public owner: FunctionStmt | undefined,
    sightings?: Map<Span, Value>,
  ) {
    this.sightings = sightings;
  }

  /** The note of a symbol's declaration from here on; undefined where it has none. */
  declare(path: string, note: NoteInForce | undefined): void {
    if (!note && !this.declared.has(path)) return;
    const declared = new Map(this.declared);
    if (note) declared.set(path, note);
    else declared.delete(path);
    this.declared = declared;
  }

  add(constraint: Constraint): void {
    this.constraints.push(constraint);
  }

  fresh(name: string, span: Span | undefined, origin: Unknown['origin']): Unknown {
    return newUnknown(name, span, origin);
  }

  freshForm(name: string, span: Span | undefined, origin: Unknown['origin']): Form {
    return unknownForm(newUnknown(name, span, origin));
  }
}

export function newUnknown(name: string, span: Span | undefined, origin: Unknown['origin']): Unknown {
  return { id: ++unknowns, name, span, origin };
}
