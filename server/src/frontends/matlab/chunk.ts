/** One piece of a file as a chunk: lexed, parsed, its comments gathered. */
import type { Chunk, Comment, DocText, Stmt } from '../../program/nodes.ts';
import { LineIndex } from '../../text/line-index.ts';
import { Comments } from '../tree-sitter/comments.ts';
import { isWithin } from './documentation.ts';
import { type Lexed, lex } from './lexer.ts';
import { Reader } from './reader.ts';
import { type Scopes, scopesOf } from './scopes.ts';
import { block } from './statements.ts';

/** A piece that was lexed: what it assigns is known before anything is parsed. */
export interface Draft {
  readonly text: string;
  readonly lexed: Lexed;
  readonly scopes: Scopes;
}

/** What a chunk was made from besides its text. */
export interface ChunkFacts {
  /** Names that its statements outside of functions assign. */
  readonly assigns: ReadonlySet<string>;
  /** Names followed by brackets outside of functions, and whether they were taken for variables. */
  readonly consulted: ReadonlyMap<string, boolean>;
}

export function draftOf(text: string, functionsEnd: boolean): Draft {
  const lexed = lex(text);
  return { text, lexed, scopes: scopesOf(lexed.tokens, functionsEnd) };
}

const markers = { lead: /^[%#]*(?:[{}](?=\s|$))?[>|]?[ \t]*/ };

/** Parses a draft; `variables` are those of the whole script. */
export function chunkOf(draft: Draft, file: string, start: number, variables: ReadonlySet<string>, functionsEnd: boolean): { readonly chunk: Chunk; readonly facts: ChunkFacts } {
  const { text, lexed, scopes } = draft;
  const comments = new Comments(lexed.comments, new LineIndex(text), 0, markers);
  const reader = new Reader(text, lexed.tokens, comments, functionsEnd, variables, scopes);
  const statements = block(reader, new Set());
  const problems = [...lexed.problems, ...reader.problems].sort((a, b) => a.start - b.start);
  const chunk: Chunk = { anchor: { file, start }, text, statements: [...statements].sort((a, b) => a.start - b.start), problems, comments: withoutHelp(comments.all, statements) };
  return { chunk, facts: { assigns: scopes.top, consulted: reader.consulted } };
}

/** Help texts are read as documentation and not line by line again. */
function withoutHelp(comments: readonly Comment[], statements: readonly Stmt[]): readonly Comment[] {
  const docs = docsIn(statements);
  return docs.length === 0 ? comments : comments.filter((each) => !isWithin(each, docs));
}

function docsIn(statements: readonly Stmt[]): readonly DocText[] {
  return statements.flatMap((each) => (each.kind === 'function' || each.kind === 'class' ? [...(each.doc ? [each.doc] : []), ...docsIn(each.body)] : []));
}
