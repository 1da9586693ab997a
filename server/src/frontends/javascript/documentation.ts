/** JSDoc: a comment that opens with two stars, above what it describes, its stars blanked out so that offsets hold. */
import type { Comment, DocText, Stmt } from '../../program/nodes.ts';
import { isBlock } from '../tree-sitter/comments.ts';
import type { Script } from './script.ts';

export interface Described {
  readonly above: readonly Comment[];
  readonly doc: DocText | undefined;
}

/** Takes the documentation, or comment lines that stand for one, out of the comments above a function or class. */
export function describedBy(script: Script, above: readonly Comment[]): Described {
  const last = above.at(-1);
  if (!last) return { above, doc: undefined };
  if (isBlock(script.text, script.base, last)) return { above: above.slice(0, -1), doc: docText(last) };
  return { above, doc: undefined };
}

/** The text of a comment with the stars that begin its lines as blanks. */
export function docText(comment: Comment): DocText {
  return { text: comment.text.replace(/^([ \t]*)\*(?!\*)/gm, '$1 ').replace(/\r/g, ' '), start: comment.start, end: comment.end };
}

/** A documentation above a variable or a field is read as the comment behind it, where it says something in one line. */
export function withDescription(script: Script, statement: Stmt): Stmt {
  const last = statement.above?.at(-1);
  if (!last || statement.trailing || !isBlock(script.text, script.base, last)) return statement;
  const said = sentenceOf(docText(last));
  const { above, ...rest } = statement;
  const others = above?.slice(0, -1) ?? [];
  return { ...rest, ...(others.length > 0 ? { above: others } : {}), ...(said ? { trailing: said } : {}) };
}

/** The only line of text, or what `@type` says behind its type; undefined where there is more to read. */
function sentenceOf(doc: DocText): Comment | undefined {
  const lines = [...doc.text.matchAll(/[^\n]+/g)].map((match) => ({ text: match[0], at: match.index })).filter(({ text }) => text.trim() !== '');
  const typed = lines.find(({ text }) => /^\s*@type\b/.test(text));
  const plain = lines.filter(({ text }) => !/^\s*@/.test(text));
  const only = plain.length === 1 ? plain[0] : undefined;
  const line = only ?? (plain.length === 0 ? typed : undefined);
  if (!line) return undefined;
  const skip = /^\s*(?:@type\s*(?:\{[^{}]*\})?\s*)?/.exec(line.text)?.[0].length ?? 0;
  const text = line.text.slice(skip).trimEnd();
  const start = doc.start + line.at + skip;
  return text === '' ? undefined : { text, start, end: start + text.length };
}
