/** The notes of a file, by what they are about. */
import { ownField } from '../program/objects.ts';
import type { ChunkNotes, Note } from '../notes/types.ts';
import type { ClassStmt, Chunk, FunctionStmt, Param, RecordEntry, Stmt } from '../program/nodes.ts';
import type { EmpiricalUnit, NoteLookup } from './context.ts';
import type { NoteInForce } from './value.ts';

/** The notes of one chunk; holds as long as the chunk does. */
export interface ChunkIndex {
  readonly statements: Map<Stmt, NoteInForce[]>;
  readonly params: Map<Param, NoteInForce[]>;
  readonly results: Map<FunctionStmt, NoteInForce[]>;
  readonly entries: Map<RecordEntry, NoteInForce>;
  readonly fields: Map<ClassStmt, Map<string, NoteInForce>>;
  readonly symbols: Map<FunctionStmt | undefined, Map<string, NoteInForce>>;
  readonly empirical: readonly { readonly span: { readonly start: number; readonly end: number }; readonly units: readonly EmpiricalUnit[] }[];
}

export function indexNotes(chunk: Chunk, notes: ChunkNotes): ChunkIndex {
  const index: ChunkIndex = { statements: new Map(), params: new Map(), results: new Map(), entries: new Map(), fields: new Map(), symbols: new Map(), empirical: empiricalOf(chunk, notes) };
  for (const note of notes.notes) file(index, { note, unit: note.unit, anchor: chunk.anchor });
  return index;
}

function file(index: ChunkIndex, held: NoteInForce): void {
  const target = held.note.target;
  switch (target.kind) {
    case 'statement':
      return push(index.statements, target.statement, held);
    case 'parameter':
      return push(index.params, target.param, held);
    case 'result':
      return push(index.results, target.owner, held);
    case 'entry':
      return void index.entries.set(target.entry, held);
    case 'field':
      return put(index.fields, target.owner, target.name, held);
    case 'symbol':
      return put(index.symbols, target.owner, target.name, held);
  }
}

function push<K>(map: Map<K, NoteInForce[]>, key: K, held: NoteInForce): void {
  const list = map.get(key);
  if (list) list.push(held);
  else map.set(key, [held]);
}

function put<K>(map: Map<K, Map<string, NoteInForce>>, key: K, name: string, held: NoteInForce): void {
  const names = map.get(key) ?? new Map<string, NoteInForce>();
  if (!names.has(name)) names.set(name, held);
  map.set(key, names);
}

function empiricalOf(chunk: Chunk, notes: ChunkNotes): ChunkIndex['empirical'] {
  return notes.directives.flatMap((directive) => {
    if (directive.kind !== 'empirical') return [];
    const units = directive.units.map((unit) => {
      const note: Note = { target: { kind: 'symbol', owner: undefined, name: unit.symbol }, unit: unit.unit, span: unit.span, form: 'above', hints: [] };
      return { symbol: unit.symbol, note: { note, unit: unit.unit, anchor: chunk.anchor } };
    });
    return [{ span: directive.span, units }];
  });
}

/** Lookup for one piece of a file: the chunk it stands in, the class it is a method of, and what holds for the whole file. */
export function lookupIn(index: ChunkIndex, owner: ClassStmt | undefined, wide: (name: string) => NoteInForce | undefined): NoteLookup {
  const symbolOf = (path: string, within: FunctionStmt | undefined): NoteInForce | undefined => {
    const own = within && index.symbols.get(within)?.get(path);
    return own ?? fieldOf(path) ?? wide(ownField(path) ?? path);
  };
  const fieldOf = (path: string): NoteInForce | undefined => (owner && ownField(path) !== undefined ? index.fields.get(owner)?.get(ownField(path) as string) : undefined);
  const withSymbol = (notes: readonly NoteInForce[], path: string, within: FunctionStmt | undefined): readonly NoteInForce[] => {
    const symbol = symbolOf(path, within);
    return symbol ? [...notes, symbol] : notes;
  };
  return {
    statement: (statement, path, within) => withSymbol((index.statements.get(statement) ?? none).filter((held) => pathOf(held) === path), path, within),
    parameter: (fn, param) => withSymbol(byPrecedence(index.params.get(param) ?? none), param.name, fn),
    results: (fn) => index.results.get(fn) ?? none,
    entry: (entry) => index.entries.get(entry),
    field: (cls, name) => index.fields.get(cls)?.get(name),
    symbol: symbolOf,
    empiricalFunction: (fn) => empiricalFunction(index, fn),
    empirical: (statement) => (index.empirical.length === 0 ? undefined : empiricalAt(index, statement)),
  };
}

const none: readonly NoteInForce[] = [];
const order = ['trailing', 'documentation', 'above', 'nomenclature'];

function byPrecedence(notes: readonly NoteInForce[]): readonly NoteInForce[] {
  return notes.length < 2 ? notes : [...notes].sort((a, b) => order.indexOf(a.note.form) - order.indexOf(b.note.form));
}

function pathOf(held: NoteInForce): string | undefined {
  return held.note.target.kind === 'statement' ? held.note.target.path : undefined;
}

function empiricalAt(index: ChunkIndex, statement: Stmt): readonly EmpiricalUnit[] | undefined {
  const comments = [...(statement.above ?? []), ...(statement.trailing ? [statement.trailing] : [])];
  return index.empirical.find(({ span }) => comments.some((comment) => comment.start <= span.start && span.end <= comment.end))?.units;
}

/** The units of a relation declared empirical as a whole: the note stands in the function's documentation or above it. */
function empiricalFunction(index: ChunkIndex, fn: FunctionStmt): readonly EmpiricalUnit[] | undefined {
  if (index.empirical.length === 0) return undefined;
  const doc = fn.doc;
  return empiricalAt(index, fn) ?? index.empirical.find(({ span }) => doc !== undefined && doc.start <= span.start && span.end <= doc.end)?.units;
}
