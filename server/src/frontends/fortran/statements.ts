/** Statements of Fortran in the common form: what is carried out, one after the other. */
import type { Comment, Expr, OutputName, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { constructs } from './constructs.ts';
import { expression } from './expressions.ts';
import { ioStatement } from './input-output.ts';
import { list, target } from './primary.ts';
import type { Reader } from './reader.ts';
import { specification } from './specification.ts';
import { closerAt } from './blocks.ts';
import type { Token } from './tokens.ts';

type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

/** The span of a simple statement with the comments beside and above it. */
export function baseOf(reader: Reader, start: number): Base {
  const span = reader.since(start);
  const trailing = reader.comments.trailing(span);
  return withAbove(reader, span, trailing && standsAlone(reader, span, trailing) ? trailing : undefined);
}

/** A block's comment is the one behind its head. */
export function headBase(reader: Reader, start: number): Base {
  const span = reader.since(start);
  return withAbove(reader, span, /[\r\n]/.test(reader.text.slice(span.start, span.end)) ? reader.comments.behind(start) : undefined);
}

function withAbove(reader: Reader, span: Span, trailing: Comment | undefined): Base {
  const above = reader.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

/** A comment behind several statements of one line belongs to none of them. */
function standsAlone(reader: Reader, span: Span, comment: Comment): boolean {
  if (comment.start < span.end) return true;
  const line = Math.max(reader.text.lastIndexOf('\n', span.start - 1), reader.text.lastIndexOf('\r', span.start - 1)) + 1;
  return /^[\s\d]*$/.test(reader.text.slice(line, span.start)) && /^[\s;]*![\s!<>+*-]*$/.test(reader.text.slice(span.end, comment.start));
}

/** Statements up to an end, or to where `stops` says. */
export function block(reader: Reader, stops: (reader: Reader) => boolean = never): readonly Stmt[] {
  const found: Stmt[] = [];
  while (!reader.done) {
    if (reader.atBreak) reader.next();
    else if (closerAt(reader) || stops(reader)) break;
    else found.push(...statement(reader));
  }
  return found;
}

function never(): boolean {
  return false;
}

/** One statement with its label; several where declarations or associations stand together. */
export function statement(reader: Reader): readonly Stmt[] {
  const before = reader.at;
  reader.label = undefined;
  const label = reader.token.kind === 'number' && /^\d+$/.test(reader.token.text) ? reader.next().text : undefined;
  const made = reader.deeper(() => unlabelled(reader), () => undefined) ?? [];
  endOfStatement(reader);
  if (reader.at === before) reader.next();
  reader.label = label ?? reader.label;
  return made;
}

function endOfStatement(reader: Reader): void {
  if (reader.done || reader.atBreak) return;
  reader.problem(`${reader.token.text} does not fit here`);
  reader.skipStatement();
}

function unlabelled(reader: Reader): readonly Stmt[] | undefined {
  const { token } = reader;
  if (token.kind !== 'name') {
    if (!reader.atBreak) reader.problem(`${token.text} does not fit here`);
    reader.skipStatement();
    return undefined;
  }
  if (isAssignment(reader)) return [assignment(reader)];
  if (reader.isOp(':', 1) && reader.peek(2)?.kind === 'name') reader.at += 2;
  return specification(reader) ?? constructs(reader) ?? ioStatement(reader) ?? action(reader);
}

/** Whether a designator with an equals sign behind it begins here: no word of Fortran is reserved. */
export function isAssignment(reader: Reader): boolean {
  let at = reader.at + 1;
  for (;;) {
    const token = reader.tokens[at];
    if (token?.kind !== 'op') return false;
    if (token.text === '(' || token.text === '[') at = reader.behindBrackets(at);
    else if (token.text === '%') at += 2;
    else return token.text === '=' || token.text === '=>';
  }
}

function assignment(reader: Reader): Stmt {
  const { start } = reader.token;
  const before = reader.problems.length;
  const left = target(reader);
  const op = reader.next();
  assigned(reader, left);
  const value = whole(reader, reader.problems.length > before);
  if (op.text === '=>' && value.kind === 'call' && value.callee.kind === 'name' && value.callee.name === 'null') return { kind: 'leave', flow: 'none', values: [], ...baseOf(reader, start) };
  return { kind: 'assign', targets: [left], value, ...baseOf(reader, start) };
}

/** The name whose value a target changes. */
export function assigned(reader: Reader, expr: Expr): void {
  if (expr.kind === 'name') reader.scope.assigned.add(expr.name);
  else if (expr.kind === 'member' || expr.kind === 'index') assigned(reader, expr.object);
  else if (expr.kind === 'call') assigned(reader, expr.callee);
}

/** A value; unknown where it could not be read to its end. */
export function whole(reader: Reader, broken = false): Expr {
  const first = reader.token.start;
  const problems = reader.problems.length;
  const value = expression(reader);
  const start = Math.min(first, value.start);
  if (!reader.done && !reader.atBreak) endOfStatement(reader);
  return broken || reader.problems.length > problems ? reader.unknown(reader.since(start)) : value;
}

/** Statements of one line that are neither declarations nor blocks. */
export function action(reader: Reader): readonly Stmt[] | undefined {
  const token = reader.next();
  const leave = (flow: 'break' | 'continue' | 'raise' | 'none'): readonly Stmt[] => {
    reader.skipStatement();
    return [{ kind: 'leave', flow, values: [], ...baseOf(reader, token.start) }];
  };
  switch (token.text) {
    case 'call':
      return [callStatement(reader, token)];
    case 'return':
      reader.skipStatement();
      return [resultStatement(reader, token)];
    case 'stop':
      return leave('raise');
    case 'error':
      return reader.isName('stop') ? leave('raise') : misplaced(reader, token);
    case 'exit':
      return leave('break');
    case 'cycle':
      return leave('continue');
    case 'continue':
    case 'goto':
    case 'assign':
    case 'pause':
    case 'allocate':
    case 'deallocate':
    case 'nullify':
    case 'sync':
    case 'event':
    case 'lock':
    case 'unlock':
    case 'fail':
    case 'form':
      return leave('none');
    case 'go':
      return reader.isName('to') ? leave('none') : misplaced(reader, token);
    default:
      return misplaced(reader, token);
  }
}

function misplaced(reader: Reader, token: Token): undefined {
  reader.problem(`${token.text} does not fit here`, token);
  reader.skipStatement();
  return undefined;
}

/** `call f(a, b)`: the variables among the arguments may come back with new values. */
function callStatement(reader: Reader, token: Token): Stmt {
  const problems = reader.problems.length;
  const first = reader.token;
  if (first.kind !== 'name') {
    reader.problem('the name of a subroutine is missing', { start: reader.position, end: reader.position });
    return { kind: 'leave', flow: 'none', values: [], ...baseOf(reader, token.start) };
  }
  reader.next();
  let callee: Expr = { kind: 'name', name: first.text, start: first.start, end: first.end };
  while (reader.isOp('%') && reader.peek()?.kind === 'name') {
    reader.next();
    const name = reader.next();
    callee = { kind: 'member', object: callee, name: name.text, nameSpan: { start: name.start, end: name.end }, ...reader.since(first.start) };
  }
  const args = reader.isOp('(') ? list(reader, ')') : [];
  for (const each of args) assigned(reader, each.value);
  const span = reader.since(first.start);
  const value: Expr = reader.problems.length > problems ? reader.unknown(span) : { kind: 'call', callee, args, byReference: true, ...span };
  return { kind: 'evaluate', value, ...baseOf(reader, token.start) };
}

/** `return`: the results as they are then; the procedure fills them in. */
function resultStatement(reader: Reader, token: Span): Stmt {
  const made: Extract<Stmt, { kind: 'return' }> & { value?: Expr } = { kind: 'return', ...baseOf(reader, token.start) };
  reader.returns.push(made);
  return made;
}

/** What a procedure gives back, named in its head. */
export function resultOf(outputs: readonly OutputName[]): Expr | undefined {
  const names = outputs.map((each): Expr => ({ kind: 'name', name: each.name, ...each.nameSpan }));
  if (names.length < 2) return names[0];
  return { kind: 'sequence', form: 'tuple', items: names, start: (names[0] as Expr).start, end: (names.at(-1) as Expr).end };
}
