/** Notes in comments: behind a statement, a parameter or an entry, and above. */
import { pathOf } from '../program/path.ts';
import type { AssignStmt, Comment, DeclareStmt, Expr, FunctionStmt, LoopStmt, Param, RecordEntry, Stmt } from '../program/nodes.ts';
import type { ReadOptions, Vocabulary } from '../quantities/unit-result.ts';
import { bareUnit, lookForUnits, type UnitFound, unitInWords } from './candidates.ts';
import type { Collector } from './collector.ts';
import { rangeIn } from './ranges.ts';
import type { Note, NoteTarget } from './types.ts';

/** The note behind an assignment or declaration; one per target where there are as many. */
export function trailingNotes(out: Collector, statement: AssignStmt | DeclareStmt | LoopStmt, vocabulary: Vocabulary): void {
  const comment = statement.trailing;
  if (!comment || isCode(comment.text)) return;
  const paths = pathsOf(statement);
  if (paths.length === 0) return;
  const units = unitsInComment(out, comment, { vocabulary, describes: `${paths[0]} ${comment.text}` });
  if (paths.length === 1) {
    const unit = units[0];
    if (unit) out.note(noteOf({ kind: 'statement', statement, path: paths[0] as string }, comment, unit, 'trailing'));
  } else if (units.length === paths.length) {
    units.forEach((unit, at) => out.note(noteOf({ kind: 'statement', statement, path: paths[at] as string }, comment, unit, 'trailing')));
  }
}

export function paramNote(out: Collector, owner: FunctionStmt, param: Param, vocabulary: Vocabulary): void {
  if (!param.comment || isCode(param.comment.text)) return;
  const shared = owner.params.filter((each) => each.comment?.start === param.comment?.start).length > 1;
  const unit = shared ? undefined : unitsInComment(out, param.comment, { vocabulary, describes: `${param.name} ${param.comment.text}` })[0];
  if (unit) out.note(noteOf({ kind: 'parameter', owner, param }, param.comment, unit, 'trailing'));
}

export function entryNote(out: Collector, entry: RecordEntry, vocabulary: Vocabulary): void {
  if (!entry.comment) return;
  const unit = unitsInComment(out, entry.comment, { vocabulary, describes: `${entry.key} ${entry.comment.text}` })[0];
  if (unit) out.note(noteOf({ kind: 'entry', entry }, entry.comment, unit, 'trailing'));
}

const listed = /(?:^|[,;]\s*|\band\s+)([A-Za-z_][\w.]*)\s*(?:\[([^\][]*)\])/g;
const described = /^([A-Za-z_][\w.]*)\s*(?:[:=–]|\s-)\s*(?:[^[\]]*)\[([^\][]*)\]\s*[\w\s,.]*$/;

/** `V [m/s], D [m]` in a comment: notes on the symbols it names, for the function or the file around it. */
export function symbolNotes(out: Collector, comment: Comment, owner: FunctionStmt | undefined, vocabulary: Vocabulary): void {
  const { text } = comment;
  if (!text.includes('[') || isCode(text)) return;
  const items = [...text.matchAll(listed)];
  const single = items.length === 0 ? described.exec(text) : null;
  if (!startsWithItem(text) && !single) return;
  for (const item of single ? [single] : items) {
    const name = item[1] as string;
    const inside = item[2] as string;
    const found = lookForUnits(` [${inside}]`, out.settings, { vocabulary, describes: `${name} ${text}` }).found[0];
    if (!found || (inside.trim() === '' && items.length < 2)) continue;
    const start = comment.start + (item.index ?? 0) + item[0].lastIndexOf('[') + 1;
    const span = { start, end: start + inside.length };
    out.note({ target: { kind: 'symbol', owner, name }, unit: found.result.unit, span, form: 'above', hints: found.result.hints, ...descriptionOf(text, items.length) });
  }
}

function startsWithItem(text: string): boolean {
  return /^[A-Za-z_][\w.]*\s+\[[^\][]*\]/.test(text);
}

function descriptionOf(text: string, items: number): { description?: string } {
  const rest = text.replace(/^[A-Za-z_][\w.]*\s+\[[^\][]*\]\s*/, '').trim();
  return items === 1 && rest !== '' ? { description: rest } : {};
}

/** A comment above a field of a class that carries one bracket and names no other symbol. */
export function fieldAboveNote(out: Collector, statement: Stmt, vocabulary: Vocabulary): void {
  if ((statement.kind !== 'declare' && statement.kind !== 'assign') || statement.trailing) return;
  const comment = statement.above?.at(-1);
  const path = pathsOf(statement)[0];
  if (!comment || path === undefined || isCode(comment.text) || startsWithItem(comment.text)) return;
  const found = lookForUnits(comment.text, out.settings, { vocabulary, describes: `${path} ${comment.text}` }).found;
  const unit = found[0];
  if (unit && found.length === 1) out.note(noteOf({ kind: 'statement', statement, path }, comment, unit, 'above'));
}

function unitsInComment(out: Collector, comment: Comment, options: ReadOptions): readonly UnitFound[] {
  const looked = lookForUnits(comment.text, out.settings, options);
  out.unread(looked.unread.map((each) => ({ text: each.text, span: moved(each.span, comment.start) })));
  for (const problem of looked.problems) out.problem({ text: problem.text, fault: problem.fault, span: moved(problem.span, comment.start) });
  const brackets = looked.found.filter((each) => each.by === 'bracket');
  if (brackets.length > 0) return brackets;
  if (looked.problems.length > 0) return [];
  const bare = out.settings.bare ? bareUnit(comment.text, options) : undefined;
  if (bare) return [bare];
  const round = looked.found.filter((each) => each.by === 'parenthesis');
  if (round.length > 0) return round.slice(0, 1);
  const words = unitInWords(comment.text, options);
  return words ? [words] : [];
}

function noteOf(target: NoteTarget, comment: Comment, found: UnitFound, form: Note['form']): Note {
  const behind = comment.text.slice(found.outer.end);
  const range = rangeIn(behind);
  const rest = `${comment.text.slice(0, found.outer.start)} ${range ? behind.slice(range.length) : behind}`.replace(/\s+/g, ' ').replace(/^[\s,;:-]+|[\s,;:-]+$/g, '');
  return {
    target, unit: found.result.unit, span: moved(found.span, comment.start), form, hints: found.result.hints,
    ...(rest === '' ? {} : { description: rest }), ...(range ? { range: { low: range.low, high: range.high } } : {}),
  };
}

function moved(span: { start: number; end: number }, by: number): { start: number; end: number } {
  return { start: span.start + by, end: span.end + by };
}

/** Commented-out code is no note: an assignment, a call statement, a subscript that is assigned. */
export function isCode(text: string): boolean {
  return /^\s*[\w.[\]"']+\s*(?:[-+*/]?=)(?!=)\s*\S/.test(text) || /^\s*(?:return|if|for|while|print|import|from|def|elif|else|plt|assert)\b.*[(:=[]/.test(text);
}

function pathsOf(statement: AssignStmt | DeclareStmt | LoopStmt): readonly string[] {
  const targets: readonly (Expr | undefined)[] = statement.kind === 'assign' ? statement.targets : [statement.target];
  const first = targets[0];
  if (!first) return [];
  const flat = first.kind === 'sequence' ? first.items.map(pathOf) : [pathOf(first)];
  return flat.every((path) => path !== undefined) ? (flat as string[]) : [];
}
