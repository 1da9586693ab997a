/** Declarations of arguments and properties: `width (1,1) double {mustBePositive} = 4.0  % [m]`. */
import type { Comment, Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { expression } from './expressions.ts';
import type { Reader } from './reader.ts';
import { blockClosers } from './tokens.ts';

export interface Declaration extends Span {
  readonly name: string;
  readonly nameSpan: Span;
  readonly value?: Expr;
  /** Size, class and validators, as written. */
  readonly annotation?: string;
  readonly comment?: Comment;
}

/** The declarations of a block up to its end; the block's keyword is the next token. */
export function declarations(reader: Reader): readonly Declaration[] {
  const opener = reader.next();
  if (reader.isOp('(')) skipBrackets(reader);
  const found: Declaration[] = [];
  while (!reader.done && reader.token.kind !== 'keyword') {
    if (reader.token.kind === 'name') found.push(declaration(reader));
    else reader.next();
  }
  if (reader.token.kind === 'keyword' && blockClosers.has(reader.token.text)) reader.next();
  else reader.problem(`${opener.text} is not closed`, opener);
  return found;
}

function declaration(reader: Reader): Declaration {
  const token = reader.next();
  const dotted = reader.isOp('.') && reader.peek()?.kind === 'name';
  if (dotted) reader.at += 2;
  const behind = reader.lastEnd;
  while (!reader.done && reader.token.kind !== 'break' && reader.token.kind !== 'keyword' && !reader.isOp('=')) {
    if (reader.isOp('(') || reader.isOp('{')) skipBrackets(reader);
    else reader.next();
  }
  const annotation = reader.text.slice(behind, Math.max(behind, reader.lastEnd)).trim();
  const value = reader.takeOp('=') ? expression(reader) : undefined;
  const span = reader.since(token.start);
  const comment = reader.comments.beside(span);
  while (!reader.done && reader.token.kind !== 'break' && reader.token.kind !== 'keyword') reader.next();
  return {
    name: token.text, nameSpan: { start: token.start, end: token.end }, ...(value ? { value } : {}), ...(annotation === '' ? {} : { annotation }), ...(comment ? { comment } : {}), ...span,
  };
}

/** Passes over a bracket and what is in it. */
export function skipBrackets(reader: Reader): void {
  let depth = 0;
  do {
    const token = reader.next();
    if (token.kind !== 'op') continue;
    if (token.text === '(' || token.text === '[' || token.text === '{') depth++;
    else if (token.text === ')' || token.text === ']' || token.text === '}') depth--;
  } while (!reader.done && depth > 0 && reader.token.kind !== 'break');
}
