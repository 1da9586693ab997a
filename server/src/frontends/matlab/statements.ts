/** Statements of MATLAB and Octave in the common form. */
import type { BinaryExpr, Comment, Expr, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { classStatement } from './classes.ts';
import { expression } from './expressions.ts';
import { functionStatement, resultStatement } from './functions.ts';
import { postfix } from './primary.ts';
import type { Reader } from './reader.ts';
import { blockClosers, type Token } from './tokens.ts';

/** Statements up to one of these keywords, which is not taken, or to the end. */
export function block(reader: Reader, stops: ReadonlySet<string>): readonly Stmt[] {
  const found: Stmt[] = [];
  while (!reader.done) {
    const token = reader.token;
    if (token.kind === 'break') reader.next();
    else if (token.kind === 'keyword' && stops.has(token.text)) return found;
    else {
      const before = reader.at;
      const made = reader.deeper(() => statement(reader), () => undefined);
      if (made) found.push(made);
      if (reader.at === before) reader.next();
    }
  }
  return found;
}

/** A block with the keyword that closes it. */
export function closedBlock(reader: Reader, opener: Token, stops: ReadonlySet<string> = closers): readonly Stmt[] {
  const body = block(reader, stops);
  close(reader, opener);
  return body;
}

function close(reader: Reader, opener: Token): void {
  if (reader.token.kind === 'keyword' && blockClosers.has(reader.token.text)) reader.next();
  else reader.problem(`${opener.text} is not closed`, opener);
}

const closers = blockClosers;

function statement(reader: Reader): Stmt | undefined {
  const token = reader.token;
  if (token.kind === 'keyword') return compound(reader, token);
  const made = token.kind === 'command' ? command(reader) : simple(reader, token);
  endOfStatement(reader, token);
  return made;
}

function endOfStatement(reader: Reader, first: Token): void {
  const { token } = reader;
  if (reader.done || token.kind === 'break' || token.kind === 'keyword') return;
  reader.problem(`${token.text} does not fit here`, token);
  reader.skipStatement();
  if (reader.tokens[reader.at] === first) reader.next();
}

type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

/** The span of a simple statement with the comments beside and above it. */
export function baseOf(reader: Reader, start: number): Base {
  const span = reader.since(start);
  const trailing = reader.comments.trailing(span);
  return withAbove(reader, span, trailing && standsAlone(reader.text, span, trailing) ? trailing : undefined);
}

/** A compound statement's comment is the one behind its head. */
export function headBase(reader: Reader, start: number): Base {
  const span = reader.since(start);
  const line = /[\r\n]/.test(reader.text.slice(span.start, span.end));
  return withAbove(reader, span, line ? reader.comments.behind(start) : undefined);
}

function withAbove(reader: Reader, span: Span, trailing: Comment | undefined): Base {
  const above = reader.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

/** A comment behind several statements of one line belongs to none of them. */
function standsAlone(text: string, span: Span, comment: Comment): boolean {
  if (comment.start < span.end) return true;
  const line = Math.max(text.lastIndexOf('\n', span.start - 1), text.lastIndexOf('\r', span.start - 1)) + 1;
  return text.slice(line, span.start).trim() === '' && /^[\s;,]*(?:\.\.\.)?[\s%#]*$/.test(text.slice(span.end, comment.start));
}

function command(reader: Reader): Stmt {
  const token = reader.next();
  const flow = raising.has(/^\w+/.exec(token.text)?.[0] ?? '') ? 'raise' : 'none';
  return { kind: 'leave', flow, values: [], ...baseOf(reader, token.start) };
}

const augmented: Readonly<Record<string, BinaryExpr['op']>> = { '+=': '+', '-=': '-', '*=': '*', '/=': '/', '^=': '**', '.*=': '*', './=': '/', '.^=': '**' };

function simple(reader: Reader, first: Token): Stmt | undefined {
  if (first.kind === 'op' && first.text === '[' && assignsTo(reader)) return severalTargets(reader, first);
  const problems = reader.problems.length;
  const target = expression(reader);
  const start = Math.min(first.start, target.start);
  const mark = reader.token.kind === 'op' ? reader.token.text : '';
  if (mark === '=') return assignment(reader, start, target);
  const op = Object.hasOwn(augmented, mark) ? augmented[mark] : undefined;
  if (op || mark === '|=' || mark === '&=') {
    reader.next();
    const value = whole(reader);
    return { kind: 'assign', targets: [target], value, op: op ?? 'bits', ...baseOf(reader, start) };
  }
  if (mark === '++' || mark === '--') reader.next();
  if (reader.problems.length > problems) reader.skipStatement();
  const raised = raises(target);
  const value = reader.problems.length > problems ? reader.unknown(reader.since(start)) : target;
  return raised ? { kind: 'leave', flow: 'raise', values: raised, ...baseOf(reader, start) } : { kind: 'evaluate', value, ...baseOf(reader, start) };
}

/** `a = b = value`. */
function assignment(reader: Reader, start: number, target: Expr): Stmt {
  const targets = [target];
  reader.next();
  let value = whole(reader);
  while (reader.isOp('=')) {
    targets.push(value);
    reader.next();
    value = whole(reader);
  }
  return { kind: 'assign', targets, value, ...baseOf(reader, start) };
}

/** A value; unknown where it could not be read to its end. */
function whole(reader: Reader): Expr {
  const first = reader.token.start;
  const problems = reader.problems.length;
  const value = expression(reader);
  const start = Math.min(first, value.start);
  const { token } = reader;
  const ends = reader.done || token.kind === 'break' || token.kind === 'keyword' || reader.isOp('=');
  if (!ends) {
    reader.problem(`${token.text} does not fit here`, token);
    reader.skipStatement();
  }
  return reader.problems.length > problems ? reader.unknown(reader.since(start)) : value;
}

/** Whether the bracket that opens here is followed by an equals sign behind its partner. */
function assignsTo(reader: Reader): boolean {
  let depth = 0;
  for (let at = reader.at; at < reader.tokens.length; at++) {
    const token = reader.tokens[at] as Token;
    if (token.kind === 'break') return false;
    if (token.kind !== 'op') continue;
    if (token.text === '[' || token.text === '(' || token.text === '{') depth++;
    if ((token.text === ']' || token.text === ')' || token.text === '}') && --depth === 0) return token.text === ']' && reader.tokens[at + 1]?.kind === 'op' && reader.tokens[at + 1]?.text === '=';
  }
  return false;
}

/** `[a, ~] = f(x)`: the call gives as many results as there are targets. */
function severalTargets(reader: Reader, first: Token): Stmt {
  reader.next();
  const items: Expr[] = [];
  while (!reader.done && !reader.isOp(']') && reader.token.kind !== 'break') {
    if (reader.takeOp(',') || reader.takeOp(';')) continue;
    const token = reader.token;
    if (token.text === '~' || token.text === '!') {
      reader.next();
      items.push(reader.unknown(token));
    } else {
      const before = reader.at;
      items.push(postfix(reader));
      if (reader.at === before) reader.next();
    }
  }
  reader.takeOp(']');
  const span = reader.since(first.start);
  if (!reader.takeOp('=')) reader.problem('= is missing');
  const value = whole(reader);
  const only = items.length === 1 ? items[0] : undefined;
  const target: Expr = only ?? { kind: 'sequence', form: 'tuple', items, ...span };
  const taken = value.kind === 'call' && !only ? { ...value, results: items.length } : only ? value : value.kind === 'name' ? asCall(value, items.length) : value;
  return { kind: 'assign', targets: [target], value: taken, ...baseOf(reader, first.start) };
}

/** `[a, b] = f`: a function without arguments. */
function asCall(callee: Expr, results: number): Expr {
  return { kind: 'call', callee, args: [], results, start: callee.start, end: callee.end };
}

const raising = new Set(['error', 'rethrow', 'throw', 'print_usage', 'exit', 'quit']);

/** The arguments of a call that does not come back. */
function raises(expr: Expr): readonly Expr[] | undefined {
  return expr.kind === 'call' && expr.callee.kind === 'name' && raising.has(expr.callee.name) ? expr.args.map((each) => each.value) : undefined;
}

const stopsOf = {
  arms: new Set(['elseif', 'else', ...blockClosers]),
  cases: new Set(['case', 'otherwise', ...blockClosers]),
  attempt: new Set(['catch', ...blockClosers]),
  cleanup: new Set(['unwind_protect_cleanup', ...blockClosers]),
} as const;

function compound(reader: Reader, token: Token): Stmt | undefined {
  switch (token.text) {
    case 'if':
      return ifStatement(reader, token);
    case 'for':
    case 'parfor':
      return forStatement(reader, token);
    case 'while':
      return whileStatement(reader, token);
    case 'do':
      return doStatement(reader, token);
    case 'switch':
      return switchStatement(reader, token);
    case 'try':
      return tryStatement(reader, token);
    case 'unwind_protect':
      return protectedStatement(reader, token);
    case 'function':
      return functionStatement(reader);
    case 'classdef':
      return classStatement(reader);
    case 'global':
    case 'persistent':
      return outer(reader, token);
    case 'return':
      reader.next();
      return resultStatement(reader, token);
    case 'break':
    case 'continue':
      reader.next();
      return { kind: 'leave', flow: token.text, values: [], ...baseOf(reader, token.start) };
    case 'spmd': {
      reader.next();
      const body = closedBlock(reader, token);
      return { kind: 'scope', items: [], body, ...headBase(reader, token.start) };
    }
    default:
      reader.problem(`${token.text} without its beginning`, token);
      reader.next();
      return undefined;
  }
}

function ifStatement(reader: Reader, opener: Token): Stmt {
  const arms: { condition: Expr; body: readonly Stmt[] }[] = [];
  let otherwise: readonly Stmt[] = [];
  while (reader.isKeyword('if') || reader.isKeyword('elseif')) {
    if (arms.length > 0 && reader.isKeyword('if')) break;
    reader.next();
    const condition = expression(reader);
    arms.push({ condition, body: block(reader, stopsOf.arms) });
  }
  while (reader.isKeyword('else') || reader.isKeyword('elseif')) {
    reader.next();
    otherwise = [...otherwise, ...block(reader, stopsOf.arms)];
  }
  close(reader, opener);
  return { kind: 'if', arms, otherwise, ...headBase(reader, opener.start) };
}

function forStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const bracket = reader.takeOp('(');
  const target = postfix(reader);
  if (!reader.takeOp('=')) reader.problem('= is missing');
  const iterable = expression(reader);
  if (bracket) {
    if (reader.takeOp(',')) expression(reader);
    if (!reader.takeOp(')')) reader.problem(') is missing');
  }
  const body = closedBlock(reader, opener);
  return { kind: 'loop', target, iterable, body, otherwise: [], ...headBase(reader, opener.start) };
}

function whileStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const condition = expression(reader);
  const body = closedBlock(reader, opener);
  return { kind: 'loop', condition, body, otherwise: [], ...headBase(reader, opener.start) };
}

/** `do … until condition`: the condition is read behind the body. */
function doStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const body = block(reader, closers);
  const until = reader.token;
  close(reader, opener);
  if (until.text !== 'until') return { kind: 'loop', body, otherwise: [], ...headBase(reader, opener.start) };
  const condition = expression(reader);
  const last: Stmt = { kind: 'evaluate', value: condition, start: condition.start, end: condition.end };
  return { kind: 'loop', body: [...body, last], otherwise: [], ...headBase(reader, opener.start) };
}

function switchStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const subject = expression(reader);
  const cases: { bindings: []; guard?: Expr; body: readonly Stmt[] }[] = [];
  block(reader, stopsOf.cases);
  while (reader.isKeyword('case') || reader.isKeyword('otherwise')) {
    const keyword = reader.next();
    const guard = keyword.text === 'case' ? expression(reader) : undefined;
    cases.push({ bindings: [], ...(guard ? { guard } : {}), body: block(reader, stopsOf.cases) });
  }
  close(reader, opener);
  return { kind: 'match', subject, cases, ...headBase(reader, opener.start) };
}

function tryStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const body = block(reader, stopsOf.attempt);
  const handlers: (readonly Stmt[])[] = [];
  if (reader.isKeyword('catch')) {
    reader.next();
    if (reader.token.kind === 'name' && reader.peek()?.kind === 'break') reader.next();
    handlers.push(block(reader, closers));
  } else handlers.push([]);
  close(reader, opener);
  return { kind: 'attempt', body, handlers, otherwise: [], finally: [], ...headBase(reader, opener.start) };
}

function protectedStatement(reader: Reader, opener: Token): Stmt {
  reader.next();
  const body = block(reader, stopsOf.cleanup);
  const cleanup = reader.isKeyword('unwind_protect_cleanup');
  if (cleanup) reader.next();
  const last = cleanup ? block(reader, closers) : [];
  close(reader, opener);
  return { kind: 'attempt', body, handlers: [], otherwise: [], finally: last, ...headBase(reader, opener.start) };
}

/** `global a b`, with a value in Octave. */
function outer(reader: Reader, token: Token): Stmt {
  reader.next();
  const names: string[] = [];
  while (!reader.done && reader.token.kind !== 'break' && reader.token.kind !== 'keyword') {
    const next = reader.next();
    if (next.kind === 'name') names.push(next.text);
    if (next.text === '=' && next.kind === 'op') expression(reader);
  }
  return { kind: 'outer', names, ...baseOf(reader, token.start) };
}
