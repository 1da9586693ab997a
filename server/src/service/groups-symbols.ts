/** What is known of a symbol at a place of a file: its dimension, unit, words, value or range, through the notes in force there. */
import type { Understood } from '../analyze.ts';
import type { NoteInForce } from '../constraints/value.ts';
import type { RelationSymbol } from '../groups/types.ts';
import { emptyVocabulary } from '../quantities/unit-result.ts';
import { readNomenclature } from '../notes/nomenclature/read.ts';
import type { AssignStmt, Chunk, Expr, FunctionStmt, Stmt } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { sameUnit } from '../quantities/unit.ts';
import type { Piece } from '../solver/definitions.ts';
import type { Span } from '../text/span.ts';

/** The text of another file, for the values of its nomenclature. */
export type TextOf = (file: string) => string;

/** A place in a file: a chunk, and the innermost function around it. */
export interface Where {
  readonly chunk: Chunk;
  readonly piece: Piece | undefined;
}

/** The place of a span that counts from its chunk. */
export function whereOf(understood: Understood, chunk: Chunk, span: Span): Where {
  return { chunk, piece: [...understood.solver.pieces()].findLast((piece) => piece.chunk === chunk && piece.fn.start <= span.start && span.end <= piece.fn.end) };
}

/** The chunk that holds an offset of the file. */
export function chunkAt(understood: Understood, offset: number): Chunk | undefined {
  return understood.parsed.program.chunks.find(({ anchor, text }) => anchor.start <= offset && offset <= anchor.start + text.length);
}

/**
 * Describes a symbol as it is read at a place. Notes go in the order of their precedence: the function's own, the file's, the
 * nomenclature's, then those that the file's other functions agree on, and last what follows without a note. Nothing is guessed: a
 * symbol that none of them tells of has no dimension.
 */
export function describeSymbol(understood: Understood, where: Where, name: string, textOf: TextOf): RelationSymbol {
  const held = noteOf(understood, where, name);
  if (!held) {
    const dimension = inferred(understood, where, name);
    const value = dimension?.isOne ? assignedNumber(understood, where, name) : undefined;
    return { name, dimension, ...(value === undefined ? {} : { value }) };
  }
  const { note, unit } = held;
  const other = held.anchor.file === understood.parsed.program.file ? undefined : held.anchor.file;
  const value = assignedNumber(understood, where, name) ?? (other === undefined ? undefined : declaredNumber(textOf(other), other, name));
  return {
    name, dimension: unit.dimension, unit,
    ...(note.description ? { description: note.description } : {}), ...(value === undefined ? {} : { value }), ...(note.range ? { range: note.range } : {}),
  };
}

/** The symbol that a function's result is known by: its name in the documentation, or the function's own. */
export function resultName(fn: FunctionStmt, result: NoteInForce | undefined): string {
  const target = result?.note.target;
  const named = target?.kind === 'result' ? target.name : undefined;
  return named !== undefined && !fn.params.some((param) => param.name === named) ? named : fn.name;
}

function noteOf(understood: Understood, { chunk, piece }: Where, name: string): NoteInForce | undefined {
  const { solver } = understood;
  const lookup = solver.notesIn(chunk, piece?.owner);
  const fn = piece?.fn;
  if (fn) {
    const param = fn.params.find((each) => each.name === name);
    const own = (param && lookup.parameter(fn, param)[0]) ?? statementNote(understood, [chunk], name, (statement) => within(statement, fn)) ?? resultNote(lookup.results(fn), fn, name);
    if (own) return own;
  }
  const top = statementNote(understood, understood.parsed.program.chunks, name, (statement, pieces) => !pieces.some(({ fn: inside }) => within(statement, inside)));
  return top ?? lookup.symbol(name, fn) ?? agreed(understood, name);
}

function resultNote(results: readonly NoteInForce[], fn: FunctionStmt, name: string): NoteInForce | undefined {
  return results.find((held) => held.note.target.kind === 'result' && (held.note.target.name === name || (results.length === 1 && name === fn.name)));
}

function statementNote(understood: Understood, chunks: readonly Chunk[], name: string, inScope: (statement: Stmt, pieces: readonly Piece[]) => boolean): NoteInForce | undefined {
  for (const chunk of chunks) {
    const found = [...understood.solver.index(chunk).statements].flatMap(([, held]) => held).filter(({ note }) => note.target.kind === 'statement' && note.target.path === name);
    if (found.length === 0) continue;
    const pieces = [...understood.solver.pieces()].filter((piece) => piece.chunk === chunk);
    const held = found.find(({ note }) => note.target.kind === 'statement' && inScope(note.target.statement, pieces));
    if (held) return held;
  }
  return undefined;
}

/** A note of the name anywhere in the file, where all of them count in one unit. */
function agreed(understood: Understood, name: string): NoteInForce | undefined {
  const found: NoteInForce[] = [];
  for (const [chunk, { notes }] of understood.notes) {
    for (const note of notes) if (targetName(note.target) === name) found.push({ note, unit: note.unit, anchor: chunk.anchor });
  }
  const first = found[0];
  return first && found.every(({ unit }) => unit === first.unit || sameUnit(unit, first.unit)) ? first : undefined;
}

function targetName(target: NoteInForce['note']['target']): string | undefined {
  switch (target.kind) {
    case 'statement':
      return target.path;
    case 'parameter':
      return target.param.name;
    case 'result':
      return target.name;
    case 'entry':
      return undefined;
    default:
      return target.name;
  }
}

function inferred({ solver }: Understood, { piece }: Where, name: string): Dimension | undefined {
  const param = piece && solver.piece(piece)?.scheme?.params.find((each) => each.name === name);
  const form = param ? param.form : piece?.fn.params.some((each) => each.name === name) ? undefined : solver.global(name)?.form;
  return form && form.terms.length === 0 ? form.dimension : undefined;
}

/** The number that a symbol is given, where it is given one number only. */
function assignedNumber(understood: Understood, { piece }: Where, name: string): number | undefined {
  const bodies = piece ? [piece.fn.body, topLevel(understood)] : [topLevel(understood)];
  for (const body of bodies) {
    const assigned = assignmentsOf(body, name);
    if (assigned.length > 0) return assigned.length === 1 && !assigned[0]?.op ? numberOf((assigned[0] as AssignStmt).value) : undefined;
    if (piece?.fn.params.some((each) => each.name === name)) return undefined;
  }
  return undefined;
}

function topLevel(understood: Understood): readonly Stmt[] {
  return understood.parsed.program.chunks.flatMap(({ statements }) => statements);
}

/** Assignments of a name in a body and its blocks, without the functions and classes inside. */
export function assignmentsOf(body: readonly Stmt[], name: string): readonly AssignStmt[] {
  return statementsOf(body).filter((statement): statement is AssignStmt => statement.kind === 'assign' && statement.targets.some((target) => mentions(target, name)));
}

/** Every statement of a body with those of its blocks; functions and classes are not entered. */
export function statementsOf(body: readonly Stmt[]): readonly Stmt[] {
  return body.flatMap((statement): readonly Stmt[] => (statement.kind === 'function' || statement.kind === 'class' ? [statement] : [statement, ...statementsOf(blocks(statement))]));
}

function blocks(statement: Stmt): readonly Stmt[] {
  switch (statement.kind) {
    case 'if':
      return [...statement.arms.flatMap((arm) => arm.body), ...statement.otherwise];
    case 'loop':
      return [...statement.body, ...statement.otherwise];
    case 'attempt':
      return [...statement.body, ...statement.handlers.flat(), ...statement.otherwise, ...statement.finally];
    case 'scope':
      return statement.body;
    case 'match':
      return statement.cases.flatMap((each) => each.body);
    default:
      return [];
  }
}

function mentions(target: Expr, name: string): boolean {
  return target.kind === 'sequence' ? target.items.some((item) => mentions(item, name)) : pathOf(target) === name;
}

function numberOf(expr: Expr): number | undefined {
  if (expr.kind === 'number') return expr.value?.toNumber();
  return expr.kind === 'unary' && expr.op === '-' && expr.operand.kind === 'number' && expr.operand.value ? -expr.operand.value.toNumber() : undefined;
}

function declaredNumber(text: string, file: string, name: string): number | undefined {
  return readNomenclature(text, file, emptyVocabulary).symbols.get(name)?.value?.toNumber();
}

function within(inner: Span, outer: Span): boolean {
  return outer.start <= inner.start && inner.end <= outer.end;
}
