/** One piece of a file as a chunk: lexed, parsed, its comments gathered. */
import type { Chunk, Comment, DocText, Stmt } from '../../program/nodes.ts';
import { LineIndex } from '../../text/line-index.ts';
import { Comments } from '../tree-sitter/comments.ts';
import { closerAt, unitWords } from './blocks.ts';
import { lex } from './lexer.ts';
import { procedure, procedureWord } from './procedures.ts';
import { Reader } from './reader.ts';
import { isAssignment, statement } from './statements.ts';
import type { SourceForm } from './tokens.ts';

const markers: Readonly<Record<SourceForm, { readonly lead: RegExp }>> = { free: { lead: /^!+[<>+*]*[ \t]*/ }, fixed: { lead: /^(?:[cC*dD](?:!?)|!+)[<>+*]*[ \t]*/ } };

/** Parses a piece: the units it opens or closes leave no trace, what stands in them is the chunk's. */
export function chunkOf(text: string, file: string, start: number, form: SourceForm): Chunk {
  const lexed = lex(text, form);
  const comments = new Comments(lexed.comments, new LineIndex(text), 0, markers[form]);
  const reader = new Reader(text, lexed.tokens, comments);
  const statements = [...units(reader)].sort((a, b) => a.start - b.start);
  const problems = [...lexed.problems, ...reader.problems].sort((a, b) => a.start - b.start);
  return { anchor: { file, start }, text, statements, problems, comments: withoutHelp(comments.all, statements) };
}

function units(reader: Reader): readonly Stmt[] {
  const found: Stmt[] = [];
  while (!reader.done) {
    if (reader.atBreak) {
      reader.next();
      continue;
    }
    const word = isAssignment(reader) ? undefined : procedureWord(reader);
    const closer = closerAt(reader);
    if (word !== undefined) found.push(...hoisted(procedure(reader, word)));
    else if (closer) {
      if (!unitWords.has(closer.word)) reader.problem('there is nothing to close here');
      reader.skipStatement();
    } else if (opensUnit(reader)) reader.skipStatement();
    else found.push(...statement(reader));
  }
  return found;
}

/** A procedure, and before it the whole modules that it uses: their names are looked for at the top of a file. */
function hoisted(fn: Extract<Stmt, { kind: 'function' }>): readonly Stmt[] {
  const whole = fn.body.filter((each) => each.kind === 'import' && each.names?.[0]?.name === '*');
  return [fn, ...whole];
}

/** `module fluids`, `program bench`, `contains`. */
function opensUnit(reader: Reader): boolean {
  const next = reader.peek();
  switch (reader.token.text) {
    case 'contains':
      return !next || next.kind === 'break';
    case 'module':
    case 'program':
      return next?.kind === 'name' && (!reader.peek(2) || reader.peek(2)?.kind === 'break');
    case 'submodule':
      return next?.text === '(';
    case 'block':
    case 'blockdata':
      return reader.token.text === 'blockdata' || next?.text === 'data';
    default:
      return false;
  }
}

/** Help texts are read as documentation and not line by line again. */
function withoutHelp(comments: readonly Comment[], statements: readonly Stmt[]): readonly Comment[] {
  const docs = docsIn(statements);
  return docs.length === 0 ? comments : comments.filter((each) => !docs.some((doc) => doc.start <= each.start && each.end <= doc.end));
}

function docsIn(statements: readonly Stmt[]): readonly DocText[] {
  return statements.flatMap((each) => (each.kind === 'function' ? [...(each.doc ? [each.doc] : []), ...docsIn(each.body)] : []));
}
