/** What stands between operators: literals, names with what is applied to them, brackets, constructors. */
import type { Argument, Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { expression } from './expressions.ts';
import { numberOf, textOf } from './literals.ts';
import type { Reader } from './reader.ts';
import type { Token } from './tokens.ts';

export function primary(reader: Reader): Expr {
  const { token } = reader;
  switch (token.kind) {
    case 'number':
      reader.next();
      return { kind: 'number', value: numberOf(token.text), text: token.text, start: token.start, end: token.end };
    case 'text':
      reader.next();
      // `z'FF'` is a number in bits.
      if (/^[boxz]['"]/i.test(token.text)) return reader.unknown(token);
      return reader.isOp('(') ? designator(reader, textExpr(token), token.start) : textExpr(token);
    case 'name':
      reader.next();
      return designator(reader, { kind: 'name', name: token.text, start: token.start, end: token.end }, token.start);
    case 'op':
      return marked(reader, token) ?? missing(reader);
    default:
      return missing(reader);
  }
}

/** The target of an assignment: brackets behind its name hold subscripts, whatever the name is. */
export function target(reader: Reader): Expr {
  const made = primary(reader);
  return made.kind === 'call' ? { kind: 'index', object: made.callee, keys: made.args.map((each) => each.value), start: made.start, end: made.end } : made;
}

function textExpr(token: Token): Expr {
  return { kind: 'text', value: textOf(token.text), start: token.start, end: token.end };
}

function missing(reader: Reader): Expr {
  const at = { start: reader.position, end: reader.position };
  reader.problem('an operand is missing', at);
  return reader.unknown(at);
}

/** A name with its components and what stands in brackets behind them. */
function designator(reader: Reader, first: Expr, start: number): Expr {
  let expr = first;
  for (;;) {
    if (reader.isOp('(')) expr = applied(reader, expr, start);
    else if (reader.isOp('%') && reader.peek()?.kind === 'name') {
      reader.next();
      const token = reader.next();
      expr = { kind: 'member', object: expr, name: token.text, nameSpan: { start: token.start, end: token.end }, ...reader.since(start) };
    } else if (reader.isOp('%')) {
      reader.next();
      reader.problem('a component is missing');
      return reader.unknown(reader.since(start), [expr]);
    } else if (reader.isOp('[')) {
      // An image of a coarray has the unit of its own.
      reader.skipBrackets();
    } else return expr;
  }
}

/** `f(x)`: an element of what is declared with dimensions here, else a call, which may turn out to be an element. */
function applied(reader: Reader, callee: Expr, start: number): Expr {
  const args = list(reader, ')');
  const span = reader.since(start);
  // `atan(y, x)` is the angle of two lengths, and no function of a pure number.
  if (callee.kind === 'name' && callee.name === 'atan' && args.length === 2) return reader.unknown(span, args.map((each) => each.value));
  if (callee.kind === 'name' && !reader.scope.arrays.has(callee.name) && !args.some(isSection)) return { kind: 'call', callee, args, results: 1, ...span };
  return { kind: 'index', object: callee, keys: args.map((each) => each.value), ...span };
}

function isSection({ value }: Argument): boolean {
  return value.kind === 'slice';
}

/** What stands in brackets, which open at the next token. */
export function list(reader: Reader, close: string): readonly Argument[] {
  reader.next();
  const args: Argument[] = [];
  while (!reader.done && !reader.atBreak && !reader.isOp(close)) {
    const before = reader.at;
    args.push(argument(reader));
    if (!reader.takeOp(',') && !reader.isOp(close)) {
      reader.problem(`${close} is missing`);
      while (!reader.done && !reader.atBreak && !reader.isOp(',') && !reader.isOp(close)) reader.at++;
      reader.takeOp(',');
    }
    if (reader.at === before) reader.at++;
  }
  if (!reader.takeOp(close)) reader.problem(`${close} is missing`);
  return args;
}

function argument(reader: Reader): Argument {
  const { start } = reader.token;
  if (reader.token.kind === 'name' && reader.isOp('=', 1)) {
    const name = reader.next().text;
    reader.next();
    const value = subscript(reader);
    return { name, value, ...reader.since(start) };
  }
  // `*100`: where an alternate return goes on.
  if (reader.isOp('*')) {
    reader.next();
    if (reader.token.kind === 'number') reader.next();
    const span = reader.since(start);
    return { value: reader.unknown(span), ...span };
  }
  const value = subscript(reader);
  return { value, start: Math.min(start, value.start), end: Math.max(reader.lastEnd, value.end) };
}

/** An expression, or a section `first:last:step`. */
function subscript(reader: Reader): Expr {
  const { start } = reader.token;
  const first = reader.isOp(':') || reader.isOp('::') ? nothingAt(start) : expression(reader);
  if (!reader.isOp(':') && !reader.isOp('::')) return first;
  const doubled = reader.next().text === '::';
  const bound = (): Expr => (reader.isOp(',') || reader.isOp(')') || reader.isOp(':') || reader.atBreak ? nothingAt(reader.lastEnd) : expression(reader));
  const last = doubled ? nothingAt(reader.lastEnd) : bound();
  const step = doubled || reader.takeOp(':') ? bound() : undefined;
  return { kind: 'slice', parts: [first, last, ...(step ? [step] : [])], ...reader.since(start) };
}

function nothingAt(offset: number): Expr {
  return { kind: 'nothing', start: offset, end: offset };
}

function marked(reader: Reader, token: Token): Expr | undefined {
  switch (token.text) {
    case '(':
      return parenthesized(reader);
    case '(/':
      return constructor(reader, '/)');
    case '[':
      return constructor(reader, ']');
    case '.true.':
    case '.false.':
      reader.next();
      return { kind: 'truth', value: token.text === '.true.', start: token.start, end: token.end };
    default:
      return undefined;
  }
}

/** Brackets leave no trace; with a comma in them they hold a complex number, or a list that is written out by a loop. */
function parenthesized(reader: Reader): Expr {
  const { start } = reader.next();
  const parts = [expression(reader)];
  while (reader.takeOp(',')) parts.push(loopPart(reader));
  if (!reader.takeOp(')')) {
    reader.problem(') is missing');
    while (!reader.done && !reader.atBreak && !reader.isOp(')') && !reader.isOp(',')) reader.at++;
    reader.takeOp(')');
  }
  return parts.length === 1 ? (parts[0] as Expr) : reader.unknown(reader.since(start), parts);
}

/** `i = 1` of a loop in brackets. */
function loopPart(reader: Reader): Expr {
  if (reader.token.kind === 'name' && reader.isOp('=', 1)) reader.at += 2;
  return expression(reader);
}

/** `(/ a, b /)` and `[real :: a, b]`. */
function constructor(reader: Reader, close: string): Expr {
  const { start } = reader.next();
  const typed = typedEnd(reader, close);
  if (typed !== undefined) reader.at = typed;
  const items: Expr[] = [];
  while (!reader.done && !reader.atBreak && !reader.isOp(close)) {
    const before = reader.at;
    items.push(expression(reader));
    if (!reader.takeOp(',') && !reader.isOp(close)) break;
    if (reader.at === before) reader.at++;
  }
  if (!reader.takeOp(close)) reader.problem(`${close} is missing`);
  const span: Span = reader.since(start);
  return { kind: 'sequence', form: 'list', items, ...span };
}

/** The index behind the `::` of a type at the head of a constructor. */
function typedEnd(reader: Reader, close: string): number | undefined {
  if (reader.token.kind !== 'name') return undefined;
  for (let at = reader.at; at < reader.tokens.length; at++) {
    const token = reader.tokens[at] as Token;
    if (token.kind === 'break' || token.text === ',' || token.text === close) return undefined;
    if (token.text === '(') at = reader.behindBrackets(at) - 1;
    else if (token.kind === 'op' && token.text === '::') return at + 1;
  }
  return undefined;
}
