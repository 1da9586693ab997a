/** Help blocks: the comments directly under the head of a function or class, or else those directly above it. */
import type { Comment, DocText, Stmt } from '../../program/nodes.ts';
import type { Reader } from './reader.ts';

export interface Help {
  readonly doc?: DocText;
  /** Comments above that are no help. */
  readonly above?: readonly Comment[];
}

/**
 * The help of a definition whose head ends at `headEnd` and whose first statement begins at `first`. The text is that of the source with its
 * comment marks blanked out, so that offsets hold. A block that a blank line parts from the first one and that stands right above the first statement is that statement's.
 */
export function helpOf(reader: Reader, headEnd: number, first: number | undefined, base: Pick<Stmt, 'above' | 'end'>): Help {
  const above = base.above && base.above.length > 0 ? base.above : undefined;
  const inside = commentsUnder(reader, headEnd, first ?? base.end);
  if (inside.length > 0) return { doc: docOf(reader.text, inside), ...(above ? { above } : {}) };
  return above && above.length > 1 ? { doc: docOf(reader.text, above), above } : { ...(above ? { above } : {}) };
}

/** Whether a comment is part of some help text. */
export function isWithin(comment: Comment, docs: readonly DocText[]): boolean {
  return docs.some((doc) => doc.start <= comment.start && comment.end <= doc.end);
}

function commentsUnder(reader: Reader, headEnd: number, first: number): readonly Comment[] {
  const { text } = reader;
  const inside = reader.comments.all.filter((each) => each.start > headEnd && each.end <= first && reader.comments.isAlone(each));
  const blocks: Comment[][] = [];
  let last: Comment | undefined;
  for (const comment of inside) {
    if (!last || /\n[ \t\r]*\n/.test(text.slice(last.end, comment.start))) blocks.push([]);
    (blocks.at(-1) as Comment[]).push(comment);
    last = comment;
  }
  const touches = last !== undefined && !/\n[ \t\r]*\n/.test(text.slice(last.end, first));
  return (blocks.length > 1 && touches ? blocks.slice(0, -1) : blocks).flat();
}

function docOf(text: string, comments: readonly Comment[]): DocText {
  const first = (comments[0] as Comment).start;
  const start = Math.max(text.lastIndexOf('\n', first - 1), text.lastIndexOf('\r', first - 1)) + 1;
  const end = (comments.at(-1) as Comment).end;
  return { text: text.slice(start, end).replace(/^[ \t]*(?:[%#]+[{}!>|]?|[*]+(?=\s))/gm, (marks) => ' '.repeat(marks.length)), start, end };
}
