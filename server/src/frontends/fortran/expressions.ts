/** Expressions of Fortran in the common form; precedence after the standard (ISO/IEC 1539-1, table of operators in 10.1). */
import type { BinaryExpr, CompareOp, Expr } from '../../program/nodes.ts';
import { isInteger } from './literals.ts';
import { primary } from './primary.ts';
import type { Reader } from './reader.ts';

type Operator =
  | { readonly level: number; readonly kind: 'binary'; readonly op: BinaryExpr['op'] }
  | { readonly level: number; readonly kind: 'compare'; readonly op: CompareOp }
  | { readonly level: number; readonly kind: 'logic'; readonly op: 'and' | 'or' }
  | { readonly level: number; readonly kind: 'opaque' };

const level = { defined: 1, equivalence: 2, or: 3, and: 4, not: 5, relation: 6, concatenation: 7, sum: 8, product: 9 } as const;

const operators: Readonly<Record<string, Operator>> = {
  '.eqv.': { level: level.equivalence, kind: 'compare', op: '==' },
  '.neqv.': { level: level.equivalence, kind: 'compare', op: '!=' },
  '.or.': { level: level.or, kind: 'logic', op: 'or' },
  '.and.': { level: level.and, kind: 'logic', op: 'and' },
  ...Object.fromEntries((['<', '<=', '>', '>=', '=='] as const).map((op) => [op, { level: level.relation, kind: 'compare', op }])),
  '/=': { level: level.relation, kind: 'compare', op: '!=' },
  '//': { level: level.concatenation, kind: 'opaque' },
  '+': { level: level.sum, kind: 'binary', op: '+' },
  '-': { level: level.sum, kind: 'binary', op: '-' },
  '*': { level: level.product, kind: 'binary', op: '*' },
  '/': { level: level.product, kind: 'binary', op: '/' },
};

/** The expression that begins at the next token; unknown, with a problem recorded, where none does. */
export function expression(reader: Reader): Expr {
  return reader.deeper(() => binary(reader, level.defined), () => tooDeep(reader));
}

function tooDeep(reader: Reader): Expr {
  const { start } = reader.token;
  reader.problem('nested too deeply');
  reader.skipStatement();
  return reader.unknown(reader.since(start));
}

/** Between dots: an operator of the program's own. */
function isDefined(text: string): boolean {
  return /^\.[a-z]+\.$/.test(text) && !Object.hasOwn(operators, text) && text !== '.not.' && text !== '.true.' && text !== '.false.';
}

function operatorAt(reader: Reader): Operator | undefined {
  const { token } = reader;
  if (token.kind !== 'op') return undefined;
  if (Object.hasOwn(operators, token.text)) return operators[token.text];
  return isDefined(token.text) ? { level: level.defined, kind: 'opaque' } : undefined;
}

function binary(reader: Reader, least: number): Expr {
  const first = reader.token.start;
  let left = unary(reader, least);
  const start = Math.min(first, left.start);
  let made: Expr | undefined;
  for (;;) {
    const operator = operatorAt(reader);
    if (!operator || operator.level < least) return left;
    const token = reader.next();
    const right = binary(reader, operator.level + 1);
    const span = reader.since(start);
    if (operator.kind === 'compare') left = { kind: 'compare', operands: [left, right], ops: [operator.op], ...span };
    else if (operator.kind === 'logic') left = { kind: 'logic', op: operator.op, operands: left === made && left.kind === 'logic' && left.op === operator.op ? [...left.operands, right] : [left, right], ...span };
    else if (operator.kind === 'opaque') left = { kind: 'opaque', parts: [left, right], ...span };
    else left = { kind: 'binary', op: operator.op === '/' ? quotient(left, right) : operator.op, opSpan: { start: token.start, end: token.end }, left, right, ...span };
    made = left;
  }
}

/** The quotient of two integers is cut off: `1/3` is 0. */
function quotient(left: Expr, right: Expr): '/' | '//' {
  return left.kind === 'number' && right.kind === 'number' && isInteger(left.text) && isInteger(right.text) ? '//' : '/';
}

/** A sign stands before the first term of a sum and covers its products: `-a*b` is `-(a*b)`. */
function unary(reader: Reader, least: number): Expr {
  const { token } = reader;
  if (token.kind !== 'op') return power(reader);
  if (token.text === '-' || token.text === '+') {
    reader.next();
    const operand = reader.deeper(() => binary(reader, Math.max(level.product, least)), () => tooDeep(reader));
    return { kind: 'unary', op: token.text, operand, ...reader.since(token.start) };
  }
  if (token.text === '.not.') {
    reader.next();
    const operand = reader.deeper(() => binary(reader, level.relation), () => tooDeep(reader));
    return { kind: 'unary', op: 'not', operand, ...reader.since(token.start) };
  }
  if (isDefined(token.text)) {
    reader.next();
    const operand = reader.deeper(() => power(reader), () => tooDeep(reader));
    return reader.unknown(reader.since(token.start), [operand]);
  }
  return power(reader);
}

/** Powers go from the right: `a**b**c` is `a**(b**c)`. */
function power(reader: Reader): Expr {
  const first = reader.token.start;
  const base = primary(reader);
  const start = Math.min(first, base.start);
  if (!reader.isOp('**')) return base;
  const token = reader.next();
  const right = reader.deeper(() => exponent(reader), () => tooDeep(reader));
  return { kind: 'binary', op: '**', opSpan: { start: token.start, end: token.end }, left: base, right, ...reader.since(start) };
}

/** `a**-2` is taken by most compilers. */
function exponent(reader: Reader): Expr {
  const { token } = reader;
  if (token.kind !== 'op' || (token.text !== '-' && token.text !== '+')) return power(reader);
  reader.next();
  return { kind: 'unary', op: token.text, operand: power(reader), ...reader.since(token.start) };
}
