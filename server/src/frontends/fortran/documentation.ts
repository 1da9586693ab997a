/** Help texts: the comments directly under the head of a procedure, or else those above it. */
import type { Comment, DocText, Stmt } from '../../program/nodes.ts';
import type { Reader } from './reader.ts';

export interface Help {
  readonly doc?: DocText;
  readonly above?: readonly Comment[];
}

/**
 * The help of a procedure whose head ends at `headEnd` and whose first statement begins at `first`. The text is that of the source with
 * its comment marks blanked out, so that offsets hold.
 */
export function helpOf(reader: Reader, headEnd: number, first: number, base: Pick<Stmt, 'above' | 'start'>): Help {
  const above = base.above && base.above.length > 0 ? base.above : undefined;
  const inside = reader.comments.all.filter((each) => each.start > headEnd && each.end <= first && reader.comments.isAlone(each));
  if (saysSomething(inside)) return { doc: docOf(reader.text, inside), ...(above ? { above } : {}) };
  const before = commentsAbove(reader, base.start);
  return { ...(saysSomething(before) ? { doc: docOf(reader.text, before) } : {}), ...(above ? { above } : {}) };
}

function saysSomething(comments: readonly Comment[]): boolean {
  return comments.some((each) => /[A-Za-z]{2}/.test(each.text));
}

/** The block of comments above an offset; one blank line may part it from the head, and a rule of dashes ends it. */
function commentsAbove(reader: Reader, start: number): readonly Comment[] {
  const before = reader.comments.all.filter((each) => each.end <= start && reader.comments.isAlone(each));
  const found: Comment[] = [];
  let edge = start;
  for (let at = before.length - 1; at >= 0; at--) {
    const comment = before[at] as Comment;
    const between = reader.text.slice(comment.end, edge);
    const blank = (between.match(/\n/g)?.length ?? 0) > 1;
    if (/[^\s!<>*+&cCdD-]/.test(between) || (blank && (found.length > 0 || /\n[ \t]*\n[ \t]*\n/.test(between)))) break;
    if (isRule(comment.text) && found.length > 0) break;
    if (!isRule(comment.text)) found.push(comment);
    edge = comment.start;
  }
  return found.reverse();
}

function isRule(text: string): boolean {
  return /^[\s=*#!~_+-]*$/.test(text) && text.trim().length > 3;
}

function docOf(text: string, comments: readonly Comment[]): DocText {
  const first = (comments[0] as Comment).start;
  const start = Math.max(text.lastIndexOf('\n', first - 1), text.lastIndexOf('\r', first - 1)) + 1;
  const end = (comments.at(-1) as Comment).end;
  const raw = text.slice(start, end);
  return { text: raw.replace(/^(?:[ \t]*![!<>+*]*|[cC*dD](?![A-Za-z(])!?)/gm, (marks) => ' '.repeat(marks.length)), start, end };
}
