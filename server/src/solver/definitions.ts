import type { AssignStmt, Chunk, ClassStmt, DeclareStmt, FunctionStmt, ImportStmt, Program, Stmt } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';

/** What a top-level name of a file is defined by. */
export type Definition =
  | { readonly kind: 'function'; readonly statement: FunctionStmt; readonly chunk: Chunk }
  | { readonly kind: 'class'; readonly statement: ClassStmt; readonly chunk: Chunk }
  | { readonly kind: 'import'; readonly statement: ImportStmt; readonly chunk: Chunk; readonly name: string }
  | { readonly kind: 'variable'; readonly statement: AssignStmt | DeclareStmt; readonly chunk: Chunk };

/** A function of a file, or a method. */
export interface Piece {
  readonly fn: FunctionStmt;
  readonly owner: ClassStmt | undefined;
  readonly chunk: Chunk;
}

interface ChunkDefinitions {
  readonly names: readonly (readonly [string, Definition])[];
  readonly stars: readonly ImportStmt[];
  readonly pieces: readonly Piece[];
  /** Whether its top level has anything to walk besides functions, classes and imports. */
  readonly runs: boolean;
}

const known = new WeakMap<Chunk, ChunkDefinitions>();

export function definitionsOf(chunk: Chunk): ChunkDefinitions {
  let found = known.get(chunk);
  if (!found) {
    found = collect(chunk);
    known.set(chunk, found);
  }
  return found;
}

/** All top-level names of a file; every definition of a name, in order. */
export function namesOf(program: Program): ReadonlyMap<string, readonly Definition[]> {
  const names = new Map<string, Definition[]>();
  for (const chunk of program.chunks) {
    for (const [name, definition] of definitionsOf(chunk).names) {
      const list = names.get(name);
      if (list) list.push(definition);
      else names.set(name, [definition]);
    }
  }
  return names;
}

function collect(chunk: Chunk): ChunkDefinitions {
  const names: [string, Definition][] = [];
  const stars: ImportStmt[] = [];
  const pieces: Piece[] = [];
  let runs = false;
  const visit = (statement: Stmt): void => {
    if (statement.kind === 'function') {
      names.push([statement.name, { kind: 'function', statement, chunk }]);
      pieces.push({ fn: statement, owner: undefined, chunk });
    } else if (statement.kind === 'class') {
      names.push([statement.name, { kind: 'class', statement, chunk }]);
      for (const fn of methodsOf(statement)) pieces.push({ fn, owner: statement, chunk });
    } else if (statement.kind === 'import') {
      if (statement.names?.[0]?.name === '*') stars.push(statement);
      for (const name of importedNames(statement)) names.push([name, { kind: 'import', statement, chunk, name }]);
    } else {
      runs ||= statement.kind !== 'evaluate' || statement.value.kind !== 'text';
      if (statement.kind === 'assign') for (const target of statement.targets) for (const name of targetNames(target)) names.push([name, { kind: 'variable', statement, chunk }]);
      if (statement.kind === 'declare') for (const name of targetNames(statement.target)) names.push([name, { kind: 'variable', statement, chunk }]);
      for (const block of blocksOf(statement)) block.forEach(visit);
    }
  };
  chunk.statements.forEach(visit);
  return { names, stars, pieces, runs };
}

export function methodsOf(statement: ClassStmt): readonly FunctionStmt[] {
  return statement.body.filter((each) => each.kind === 'function');
}

/** The names that an import binds: its aliases, or the first part of a dotted module. */
export function importedNames(statement: ImportStmt): readonly string[] {
  if (statement.names) return statement.names.filter((each) => each.name !== '*').map((each) => each.alias);
  return [statement.alias ?? (statement.module.split('.')[0] as string)];
}

function targetNames(target: AssignStmt['targets'][number]): readonly string[] {
  if (target.kind === 'sequence') return target.items.flatMap(targetNames);
  const path = target.kind === 'name' ? pathOf(target) : undefined;
  return path === undefined ? [] : [path];
}

function blocksOf(statement: Stmt): readonly (readonly Stmt[])[] {
  switch (statement.kind) {
    case 'if':
      return [...statement.arms.map((arm) => arm.body), statement.otherwise];
    case 'attempt':
      return [statement.body, ...statement.handlers, statement.otherwise, statement.finally];
    case 'scope':
    case 'loop':
      return [statement.body];
    default:
      return [];
  }
}
