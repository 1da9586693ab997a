/** Notes in the comment behind a statement, a parameter or an entry. */
import { pathOf } from '../program/path.ts';
import type { AssignStmt, Chunk, Comment, DeclareStmt, Expr, FunctionStmt, LoopStmt, Param, RecordEntry, ReturnStmt, ScopeStmt } from '../program/nodes.ts';
import type { ReadOptions } from '../quantities/unit-result.ts';
import { bareUnit } from './bare-unit.ts';
import type { Collector } from './collector.ts';
import { choose, type Found, type Looked } from './find-unit.ts';
import { isCode } from './not-units.ts';
import { partOf, type Piece } from './piece.ts';
import type { NoteTarget } from './types.ts';
import { unitInWords } from './unit-words.ts';

/** The note behind an assignment, a declaration, a loop's or a `with` statement's head; one per target where there are as many. */
export function trailingNotes(out: Collector, chunk: Chunk, statement: AssignStmt | DeclareStmt | LoopStmt | ScopeStmt, owner?: FunctionStmt): void {
  const comment = statement.trailing;
  if (!comment || (statement.kind !== 'loop' && statement.kind !== 'scope' && !belongs(chunk, statement, comment))) return;
  const groups = targetsOf(statement);
  const positions = Math.max(...groups.map((group) => group.length), 0);
  const piece = noteText(comment);
  const named = groups[0]?.find((path) => path !== undefined);
  if (positions === 0 || named === undefined || piece.text === '' || isCode(piece.text)) return;
  const options = out.options(named, piece.text);
  const looked = out.look(piece, 'comment', options, true);
  const note = (path: string, found: Found, alone: boolean): void => {
    for (const target of declaredTargets(statement, path, owner)) (alone ? noteAlone : noteWhole)(out, target, piece, found);
  };
  if (positions === 1) {
    const found = unitOf(out, piece, looked, valueOf(statement), options, named);
    if (found) for (const [path] of groups) if (path !== undefined) note(path, found, false);
    return;
  }
  const each = looked.brackets.length > 0 ? looked.brackets : looked.parentheses;
  if (each.length === positions) for (const group of groups) group.forEach((path, at) => path !== undefined && group.length === positions && note(path, each[at] as Found, true));
  else if (statement.kind === 'declare' && each.length < 2) {
    const found = unitOf(out, piece, looked, undefined, options, named);
    for (const path of groups[0] ?? []) if (found && path !== undefined) note(path, found, false);
  } else out.leave(piece, each);
}

/** What a note on a statement is about: the symbol it assigns; the parameter or the result that it declares. */
export function declaredTargets(statement: AssignStmt | DeclareStmt | LoopStmt | ScopeStmt, path: string, owner: FunctionStmt | undefined): readonly NoteTarget[] {
  const own: NoteTarget = { kind: 'statement', statement, path };
  if (statement.kind !== 'declare' || !owner) return [own];
  const param = owner.params.find((each) => each.name === path);
  const outputs = owner.outputs ?? [];
  const position = outputs.findIndex((each) => each.name === path);
  const result: readonly NoteTarget[] = position < 0 ? [] : [{ kind: 'result', owner, ...(outputs.length > 1 ? { position } : {}), name: path }];
  return [param ? { kind: 'parameter', owner, param } : own, ...result];
}

export function paramNote(out: Collector, chunk: Chunk, owner: FunctionStmt, param: Param): void {
  const { comment } = param;
  if (!comment || owner.params.some((each) => each !== param && each.comment?.start === comment.start) || !standsBehind(chunk, owner.start, param.end, comment)) return;
  const piece = noteText(comment);
  if (isCode(piece.text)) return;
  const options = out.options(param.name, piece.text);
  const found = unitOf(out, piece, out.look(piece, 'comment', options, true), param.default, options, param.name);
  if (found) out.note({ kind: 'parameter', owner, param }, piece, found, 'trailing');
}

/** The notes behind the entries of a record, one entry to a line. */
export function entryNotes(out: Collector, chunk: Chunk, record: { readonly start: number; readonly entries: readonly RecordEntry[] }): void {
  for (const entry of record.entries) {
    const { comment } = entry;
    if (!comment || record.entries.some((each) => each !== entry && each.comment?.start === comment.start) || !standsBehind(chunk, record.start, entry.end, comment)) continue;
    const piece = noteText(comment);
    if (isCode(piece.text)) continue;
    const options = out.options(entry.key, piece.text);
    const found = unitOf(out, piece, out.look(piece, 'comment', options, true), entry.value, options, entry.key);
    if (found) out.note({ kind: 'entry', entry }, piece, found, 'trailing');
  }
}

/** `return rho * V  # [kg/(m^2 s)]`: brackets behind a returned value. */
export function returnNotes(out: Collector, owner: FunctionStmt, statement: ReturnStmt): void {
  const { trailing: comment, value } = statement;
  if (!comment || !value) return;
  const piece = noteText(comment);
  if (!piece.text.includes('[') || isCode(piece.text)) return;
  const { brackets } = out.look(piece, 'comment', out.options(owner.name, piece.text), true);
  const positions = value.kind === 'sequence' && value.form === 'tuple' ? value.items.length : 1;
  if (positions === 1) {
    const found = choose(piece.text, brackets);
    if (found) out.note({ kind: 'result', owner }, piece, found, 'trailing');
  } else if (brackets.length === positions) brackets.forEach((found, position) => noteAlone(out, { kind: 'result', owner, position }, piece, found));
  else out.leave(piece, brackets);
}

function noteWhole(out: Collector, target: NoteTarget, piece: Piece, found: Found): void {
  out.note(target, piece, found, 'trailing');
}

/** One of several notes in a comment: the words beside it are not its own. */
function noteAlone(out: Collector, target: NoteTarget, piece: Piece, found: Found): void {
  const { start, end } = found.outer;
  const moved = { start: found.span.start - start, end: found.span.end - start };
  out.note(target, partOf(piece, start, end), { ...found, span: moved, outer: { start: 0, end: end - start } }, 'trailing');
}

/** The text of a comment without a directive at its end. */
export function noteText(comment: Comment): Piece {
  const at = comment.text.search(/\btermwise:|\bempirical:/i);
  return at < 0 ? comment : partOf({ text: comment.text, start: comment.start }, 0, at);
}

/** The one unit of a comment: brackets, then the whole text or its head, then parentheses, then words. */
function unitOf(out: Collector, piece: Piece, looked: Looked, value: Expr | undefined, options: ReadOptions, symbol: string): Found | undefined {
  if (looked.brackets.length > 0) {
    const chosen = choose(piece.text, looked.brackets);
    if (!chosen) out.leave(piece, looked.brackets);
    return chosen;
  }
  if (looked.problems.length > 0 || (value && holdsNoNumber(value))) return undefined;
  const bare = out.settings.bare && value?.kind !== 'record' ? bareUnit(piece, value !== undefined && (isNumber(value) || (piece.text.trim() === 'in' && value.kind === 'binary')), out.names.occurs, options) : undefined;
  return bare ?? looked.parentheses[0] ?? (namesUnit.test(symbol) ? undefined : unitInWords(piece, out.settings.bare, out.names.occurs, options));
}

/** `unit = 1e-3  # all lengths in mm`: the words are about what is counted in that unit, and the number converts. */
const namesUnit = /(?:^|[._])units?$/i;

function valueOf(statement: AssignStmt | DeclareStmt | LoopStmt | ScopeStmt): Expr | undefined {
  return statement.kind === 'assign' ? statement.value : undefined;
}

function holdsNoNumber(value: Expr): boolean {
  return value.kind === 'text' || value.kind === 'truth' || value.kind === 'lambda' || value.kind === 'compare' || value.kind === 'logic';
}

/** A literal, its negative, or a product or list of literals. */
function isNumber(value: Expr): boolean {
  if (value.kind === 'number') return true;
  if (value.kind === 'unary') return isNumber(value.operand);
  if (value.kind === 'binary') return isNumber(value.left) && isNumber(value.right);
  return value.kind === 'sequence' && value.items.length > 0 && value.items.every(isNumber);
}

/** Paths by target and position: `a = b = …` has two targets of one position, `a, b = …` one of two. */
function targetsOf(statement: AssignStmt | DeclareStmt | LoopStmt | ScopeStmt): readonly (readonly (string | undefined)[])[] {
  const targets = statement.kind === 'assign' ? statement.targets : statement.kind === 'scope' ? statement.items.flatMap((item) => item.target ?? []) : statement.target ? [statement.target] : [];
  if (statement.kind === 'scope' && targets.length > 1) return [];
  return targets.map((target) => (target.kind === 'sequence' ? target.items.map(pathOf) : [pathOf(target)]));
}

/** Whether the comment is about the whole statement, and not about one of the parts that its lines hold. */
function belongs(chunk: Chunk, statement: AssignStmt | DeclareStmt, comment: Comment): boolean {
  const inside = chunk.text.slice(statement.start, statement.end);
  if (!inside.includes('\n')) return true;
  if (comment.start < statement.end) return /[([{\\=+*/,-]\s*(?:\.\.\.\s*)?[#%]*\s*$/.test(lineBefore(chunk, comment)) && opensOnly(chunk, statement, comment);
  const value = statement.kind === 'assign' ? statement.value : undefined;
  const several = value?.kind === 'record' || value?.kind === 'sequence' || chunk.comments.some((each) => each.start > statement.start && each.end < statement.end && each.text.includes('['));
  return !several || /^\s*[)\]}]+/.test(lineBefore(chunk, comment));
}

/** `x = (  # [m]`: the first line ends with the bracket that opens the value. */
function opensOnly(chunk: Chunk, statement: AssignStmt | DeclareStmt, comment: Comment): boolean {
  return /=\s*[\w.]*[([{]?\s*(?:\\|\.\.\.)?\s*[#%]*\s*$/.test(chunk.text.slice(statement.start, comment.start));
}

function lineBefore(chunk: Chunk, comment: Comment): string {
  return chunk.text.slice(chunk.text.lastIndexOf('\n', comment.start) + 1, comment.start);
}

/** Only punctuation stands between a part and its comment, and the part has a line of its own if anything closes there. */
function standsBehind(chunk: Chunk, ownerStart: number, end: number, comment: Comment): boolean {
  const between = chunk.text.slice(end, comment.start);
  if (/^\s*[,;]?\s*(?:\.\.\.\s*)?(?:#+:?|%+|!+<?|\/\/+[!<]*|\/\*+[!<]*)\s*$/.test(between)) return true;
  return /^[\s,)\]}:;]*(?:->[^#]*:)?\s*(?:\.\.\.\s*)?(?:#+:?|%+)\s*$/.test(between) && chunk.text.slice(ownerStart, end).includes('\n');
}
