/** What stands between operators: literals, names with what is applied to them, brackets, anonymous functions. */
import type { Argument, Comment, Expr, Param, RecordEntry } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { expression } from './expressions.ts';
import { numberOf, textOf } from './literals.ts';
import type { Reader } from './reader.ts';
import type { Token } from './tokens.ts';

/** A primary expression with the subscripts, fields and calls behind it. */
export function postfix(reader: Reader): Expr {
  const first = reader.token.start;
  let expr = primary(reader);
  const start = Math.min(first, expr.start);
  for (;;) {
    if (reader.isOp('(')) expr = applied(reader, expr, start);
    else if (reader.isOp('{')) {
      const keys = list(reader, '}').map((each) => each.value);
      expr = { kind: 'index', object: expr, keys, ...reader.since(start) };
    } else if (reader.isOp('.')) expr = member(reader, expr, start);
    else return expr;
  }
}

function primary(reader: Reader): Expr {
  const token = reader.token;
  switch (token.kind) {
    case 'number':
      reader.next();
      return { kind: 'number', value: numberOf(token.text), text: token.text, start: token.start, end: token.end };
    case 'text':
      reader.next();
      return { kind: 'text', value: textOf(token.text), start: token.start, end: token.end };
    case 'name':
      reader.next();
      if (token.text === 'true' || token.text === 'false') return { kind: 'truth', value: token.text === 'true', start: token.start, end: token.end };
      return nameOf(token);
    case 'op':
      return bracketed(reader, token) ?? missing(reader);
    default:
      return missing(reader);
  }
}

function nameOf(token: Token): Expr {
  return { kind: 'name', name: token.text, start: token.start, end: token.end };
}

function missing(reader: Reader): Expr {
  const at = { start: reader.position, end: reader.position };
  reader.problem('an operand is missing', at);
  return reader.unknown(at);
}

function bracketed(reader: Reader, token: Token): Expr | undefined {
  switch (token.text) {
    case '(':
      return parenthesized(reader);
    case '[':
    case '{':
      return matrix(reader, token);
    case '@':
      return handle(reader);
    case ':':
      reader.next();
      return { kind: 'slice', parts: [nothingAt(token.start), nothingAt(token.end)], start: token.start, end: token.end };
    case '?':
      reader.next();
      while (reader.token.kind === 'name' || reader.isOp('.')) reader.next();
      return reader.unknown(reader.since(token.start));
    default:
      return undefined;
  }
}

function nothingAt(offset: number): Expr {
  return { kind: 'nothing', start: offset, end: offset };
}

/** Brackets leave no trace; an assignment in them (Octave) binds. */
function parenthesized(reader: Reader): Expr {
  const { start } = reader.next();
  const inner = expression(reader);
  if (reader.takeOp('=')) {
    const value = expression(reader);
    close(reader, ')');
    return { kind: 'bind', target: inner, value, ...reader.since(start) };
  }
  close(reader, ')');
  return inner;
}

function close(reader: Reader, mark: string): void {
  if (reader.takeOp(mark)) return;
  reader.problem(`${mark} is missing`);
  while (!reader.done && reader.token.kind !== 'break' && reader.token.kind !== 'keyword' && !reader.isOp(mark)) reader.next();
  reader.takeOp(mark);
}

/** `f(x)`: the call of a function, or the element of what the scope assigns. */
function applied(reader: Reader, callee: Expr, start: number): Expr {
  const open = reader.at;
  const args = list(reader, ')');
  const span = reader.since(start);
  const target = functionIn(reader, callee);
  if (!target) return { kind: 'index', object: callee, keys: args.map((each) => each.value), ...span };
  if (target.kind === 'name' && target.name === 'struct' && reader.tokens[open]?.kind === 'op') return structure(reader, args, span) ?? { kind: 'call', callee: target, args, results: 1, ...span };
  return { kind: 'call', callee: target, args, results: 1, ...span };
}

/** The callee where it is no variable: a name, a method of the class around, or `pkg.f` as one dotted name. */
function functionIn(reader: Reader, callee: Expr): Expr | undefined {
  if (callee.kind === 'name') return reader.isVariable(callee.name) ? undefined : callee;
  if (callee.kind !== 'member') return undefined;
  const root = rootOf(callee);
  if (!root) return undefined;
  if (reader.isVariable(root)) return callee.object.kind === 'name' && reader.methods.has(callee.name) ? callee : undefined;
  const name = reader.text.slice(callee.start, callee.end);
  return /^[\w.]+$/.test(name) ? { kind: 'name', name, start: callee.start, end: callee.end } : undefined;
}

function rootOf(expr: Expr): string | undefined {
  return expr.kind === 'name' ? expr.name : expr.kind === 'member' ? rootOf(expr.object) : undefined;
}

/** `struct('rho', 998, 'mu', 1e-3)` is a record; undefined where a field's name is not written out. */
function structure(reader: Reader, args: readonly Argument[], span: Span): Expr | undefined {
  const entries: RecordEntry[] = [];
  const lines = reader.text.slice(span.start, span.end).includes('\n');
  for (let at = 0; at + 1 < args.length; at += 2) {
    const [key, value] = [args[at] as Argument, args[at + 1] as Argument];
    if (key.value.kind !== 'text' || value.spread) return undefined;
    const comment = lines ? reader.comments.beside(value) : undefined;
    entries.push({ key: key.value.value, keySpan: { start: key.start, end: key.end }, value: value.value, start: key.start, end: value.end, ...(comment ? { comment } : {}) });
  }
  return args.length % 2 === 0 ? { kind: 'record', entries, others: [], ...span } : undefined;
}

function member(reader: Reader, object: Expr, start: number): Expr {
  reader.next();
  const token = reader.token;
  if (token.kind === 'name') {
    reader.next();
    return { kind: 'member', object, name: token.text, nameSpan: { start: token.start, end: token.end }, ...reader.since(start) };
  }
  if (!reader.isOp('(')) {
    reader.problem('the name of a field is missing');
    return reader.unknown(reader.since(start), [object]);
  }
  reader.next();
  const key = expression(reader);
  close(reader, ')');
  const span = reader.since(start);
  if (key.kind === 'text' && /^[A-Za-z]\w*$/.test(key.value)) return { kind: 'member', object, name: key.value, nameSpan: { start: key.start + 1, end: key.end - 1 }, ...span };
  return reader.unknown(span, [object, key]);
}

/** The arguments between brackets; the opening one is the next token. */
function list(reader: Reader, mark: ')' | '}'): readonly Argument[] {
  reader.next();
  const args: Argument[] = [];
  while (!reader.done && !reader.isOp(mark)) {
    if (reader.takeOp(';')) continue;
    args.push(argument(reader));
    if (!reader.takeOp(',') && !reader.isOp(';')) break;
  }
  close(reader, mark);
  return args;
}

function argument(reader: Reader): Argument {
  const token = reader.token;
  const behind = reader.peek();
  if (token.kind === 'op' && (token.text === '~' || token.text === '!') && (behind?.text === ',' || behind?.text === ')')) {
    reader.next();
    return { value: reader.unknown(token), start: token.start, end: token.end };
  }
  if (token.kind === 'name' && behind?.kind === 'op' && behind.text === '=') {
    reader.next();
    reader.next();
    return { name: token.text, value: expression(reader), ...reader.since(token.start) };
  }
  const value = expression(reader);
  const spreads = value.kind === 'index' && reader.text[value.end - 1] === '}' && value.keys[0]?.kind === 'slice';
  return { value, ...(spreads ? { spread: true } : {}), ...reader.since(token.start) };
}

/** `[a, b; c, d]` and `{…}`: one row holds its entries, several are lists of theirs. A cell's members are of any kind. */
function matrix(reader: Reader, open: Token): Expr {
  const mark = open.text === '[' ? ']' : '}';
  reader.next();
  const rows: Expr[][] = [[]];
  while (!reader.done && !reader.isOp(mark)) {
    if (reader.takeOp(',')) continue;
    if (reader.takeOp(';')) {
      rows.push([]);
      continue;
    }
    const before = reader.at;
    (rows.at(-1) as Expr[]).push(entry(reader));
    if (reader.at === before || reader.token.kind === 'break') break;
  }
  close(reader, mark);
  const span = reader.since(open.start);
  const form = mark === ']' ? 'matrix' : 'set';
  const filled = rows.filter((row) => row.length > 0);
  if (filled.length < 2) return { kind: 'sequence', form, items: filled[0] ?? [], ...commentsOf(reader, filled[0] ?? [], span), ...span };
  const lists = filled.map((items): Expr => ({ kind: 'sequence', form: 'list', items, start: (items[0] as Expr).start, end: (items.at(-1) as Expr).end }));
  return { kind: 'sequence', form, items: lists, ...commentsOf(reader, lists, span), ...span };
}

function entry(reader: Reader): Expr {
  const token = reader.token;
  const behind = reader.peek()?.text;
  if (token.kind === 'op' && (token.text === '~' || token.text === '!') && (behind === ',' || behind === ']')) {
    reader.next();
    return reader.unknown(token);
  }
  return expression(reader);
}

function commentsOf(reader: Reader, items: readonly Expr[], span: Span): { readonly comments?: readonly (Comment | undefined)[] } {
  if (!reader.text.slice(span.start, span.end).includes('\n')) return {};
  const comments = items.map((item) => reader.comments.beside(item));
  return comments.some((each) => each) ? { comments } : {};
}

/** `@sin`, `@(x) x.^2`. */
function handle(reader: Reader): Expr {
  const { start } = reader.next();
  if (reader.isOp('(')) return lambda(reader, start);
  const first = reader.token;
  if (first.kind !== 'name') {
    reader.problem('a function is missing behind @');
    return reader.unknown(reader.since(start));
  }
  reader.next();
  while (reader.isOp('.') && reader.peek()?.kind === 'name') reader.at += 2;
  return { kind: 'name', name: reader.text.slice(first.start, reader.lastEnd), start: first.start, end: reader.lastEnd };
}

function lambda(reader: Reader, start: number): Expr {
  reader.next();
  const params: Param[] = [];
  while (!reader.done && !reader.isOp(')') && reader.token.kind !== 'break') {
    const token = reader.next();
    if (token.kind !== 'name') continue;
    const span = { start: token.start, end: token.end };
    params.push({ name: token.text, nameSpan: span, mode: token.text === 'varargin' ? 'rest' : 'plain', ...span });
  }
  close(reader, ')');
  const outside = reader.params.length;
  reader.params.push(...params.map((each) => each.name));
  const body = expression(reader);
  reader.params.length = outside;
  return { kind: 'lambda', params, body, ...reader.since(start) };
}
