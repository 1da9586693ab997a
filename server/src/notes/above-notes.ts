/** Notes in comments that stand on lines of their own: `# V [m/s], D [m]`, and the comment above a field. */
import { pathOf } from '../program/path.ts';
import type { AssignStmt, Comment, DeclareStmt, FunctionStmt } from '../program/nodes.ts';
import { declaredTargets, noteText } from './comment-notes.ts';
import type { Collector } from './collector.ts';
import { choose, type Found, lookForUnits } from './find-unit.ts';
import { isCode } from './not-units.ts';
import type { Piece } from './piece.ts';

/** A symbol named in a line, with its unit. */
export interface NamedUnit {
  readonly name: string;
  readonly found: Found;
}

/** Notes on the symbols that a comment names, for the function or the file around it. `occurs`: the name is used in the code there. */
export function symbolNotes(out: Collector, comment: Comment, owner: FunctionStmt | undefined, company: boolean, occurs: (name: string) => boolean): void {
  const piece = noteText(comment);
  if (!piece.text.includes('[') || isCode(piece.text)) return;
  const named = unitsByName(out, piece);
  for (const { name, found } of named) {
    if (named.length > 1 || company || occurs(name)) out.note({ kind: 'symbol', owner, name }, named.length > 1 ? alone(piece, found) : piece, named.length > 1 ? moved(found) : found, 'above');
    else out.leave(piece, [found]);
  }
}

/** True for a line that lists symbols with their units, or describes one. */
export function namesSymbols(out: Collector, comment: Comment): boolean {
  return comment.text.includes('[') && !isCode(comment.text) && unitsByName(out, noteText(comment)).length > 0;
}

const name = "[\\p{L}_][\\p{L}\\p{N}_]*(?:\\.[\\p{L}_][\\p{L}\\p{N}_]*)*(?:\\[['\"]\\w+['\"]\\])?";
const listItem = new RegExp(`(?:^|[,;]\\s*|,?\\s+and\\s+|\\s{2,}|\\t)(${name})\\s+$`, 'u');
const firstItem = new RegExp(`^(?:[-*•]\\s+)?(${name})\\s+$`, 'u');
const describedItem = new RegExp(`^(?:[-*•]\\s+)?(${name})\\s*(?::|=|\\s[-–—])\\s*[\\p{L}(]`, 'u');

/** `V [m/s], D [m]`; `V [m/s] mean velocity`; `V: mean velocity [m/s]`. Empty where the line is anything else. */
function unitsByName(out: Collector, piece: Piece): readonly NamedUnit[] {
  const { text } = piece;
  const around = { place: 'comment', language: out.language, citations: false } as const;
  const { brackets } = lookForUnits(piece, around, false, out.options(firstWord(text), text));
  if (brackets.length === 0) return [];
  const head = firstItem.exec(text.slice(0, brackets[0]?.outer.start));
  if (head) {
    const items: NamedUnit[] = [{ name: head[1] as string, found: brackets[0] as Found }];
    for (let at = 1; at < brackets.length; at++) {
      const between = text.slice(brackets[at - 1]?.outer.end, brackets[at]?.outer.start);
      const next = listItem.exec(between);
      if (!next) return [];
      if (next.index > 0 && !/^[\s\p{L}\p{N}().,-]*$/u.test(between.slice(0, next.index))) return [];
      items.push({ name: next[1] as string, found: brackets[at] as Found });
    }
    return items.length > 1 || describes(text.slice(brackets[0]?.outer.end)) ? reread(out, text, items) : [];
  }
  const described = describedItem.exec(text);
  const found = described ? choose(text, brackets) : undefined;
  return described && found && brackets.length === 1 ? reread(out, text, [{ name: described[1] as string, found }]) : [];
}

/** Nothing, a range, or words without verbs of a sentence behind the unit. */
function describes(behind: string): boolean {
  return !/^\s*(?:is|are|was|to|into|and|or|per|at|if|when|from)\b/i.test(behind) && !/^\s*[=+*/<>]/.test(behind);
}

/** The symbol decides between °C and coulomb, so each unit is read beside its own name. */
function reread(out: Collector, text: string, items: readonly NamedUnit[]): readonly NamedUnit[] {
  return items.map(({ name: symbol, found }) => {
    const start = found.outer.start;
    const inner = { text: text.slice(0, found.outer.end), start: 0 };
    const words = items.length > 1 ? '' : text;
    const again = lookForUnits(inner, { place: 'comment', language: out.language, citations: false }, false, out.options(symbol, words)).brackets.find((each) => each.outer.start === start);
    return { name: symbol, found: again ?? found };
  });
}

function firstWord(text: string): string {
  return /^\S+/.exec(text)?.[0] ?? '';
}

/** In a list, the words beside one symbol say nothing of another. */
function alone(piece: Piece, found: Found): Piece {
  return { text: piece.text.slice(found.outer.start, found.outer.end), start: piece.start + found.outer.start };
}

function moved(found: Found): Found {
  const by = found.outer.start;
  return { ...found, span: { start: found.span.start - by, end: found.span.end - by }, outer: { start: 0, end: found.outer.end - by } };
}

/** The comment directly above a field: one bracket that names no other symbol is the field's unit. */
export function fieldAboveNote(out: Collector, statement: AssignStmt | DeclareStmt, owner?: FunctionStmt): boolean {
  const target = statement.kind === 'assign' ? statement.targets[0] : statement.target;
  const path = target && pathOf(target);
  const comment = statement.above?.at(-1);
  if (path === undefined || !comment || statement.trailing) return false;
  const piece = noteText(comment);
  if (!piece.text.includes('[') || isCode(piece.text)) return false;
  const first = (firstItem.exec(piece.text.slice(0, Math.max(piece.text.indexOf('['), 0))) ?? describedItem.exec(piece.text))?.[1];
  if (first !== undefined && out.name(first) !== path && isShort(first)) return false;
  const looked = out.look(piece, 'comment', out.options(path, piece.text), true);
  const found = looked.brackets.length === 1 ? looked.brackets[0] : undefined;
  if (found) for (const each of declaredTargets(statement, path, owner)) out.note(each, piece, found, 'above');
  return found !== undefined;
}

/** `D [m]` names a symbol; `diameter [m]` may be the description. */
function isShort(word: string): boolean {
  return word.length <= 3 || /[_\d.]/.test(word);
}

/** `# mean velocity V [m/s]` above `V = …`: the symbol stands directly before the bracket. */
export function namedAboveNote(out: Collector, statement: AssignStmt): boolean {
  const target = statement.targets.length === 1 ? statement.targets[0] : undefined;
  const path = target && pathOf(target);
  const comment = statement.above?.at(-1);
  if (path === undefined || !comment || statement.trailing || !comment.text.includes('[')) return false;
  const piece = noteText(comment);
  if (isCode(piece.text) || unitsByName(out, piece).length > 0) return false;
  const around = { place: 'comment', language: out.language, citations: false } as const;
  const { brackets } = lookForUnits(piece, around, false, out.options(path, piece.text));
  const found = brackets.length === 1 ? brackets[0] : undefined;
  if (!found || !piece.text.slice(0, found.outer.start).trimEnd().split(/\s+/).at(-1)?.endsWith(path)) return false;
  out.note({ kind: 'statement', statement, path }, piece, found, 'above');
  return true;
}
