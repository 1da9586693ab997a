/** Expressions of MATLAB and Octave in the common form; precedence after the operator tables of both manuals. */
import type { BinaryExpr, CompareOp, Expr } from '../../program/nodes.ts';
import { postfix } from './primary.ts';
import type { Reader } from './reader.ts';

type Operator =
  | { readonly level: number; readonly kind: 'binary'; readonly op: BinaryExpr['op'] }
  | { readonly level: number; readonly kind: 'compare'; readonly op: CompareOp }
  | { readonly level: number; readonly kind: 'logic'; readonly op: 'and' | 'or' }
  | { readonly level: number; readonly kind: 'range' };

const sum = 7;
const product = 8;

const operators: Readonly<Record<string, Operator>> = {
  '||': { level: 1, kind: 'logic', op: 'or' },
  '&&': { level: 2, kind: 'logic', op: 'and' },
  '|': { level: 3, kind: 'logic', op: 'or' },
  '&': { level: 4, kind: 'logic', op: 'and' },
  ...Object.fromEntries((['<', '<=', '>', '>=', '=='] as const).map((op) => [op, { level: 5, kind: 'compare', op }])),
  '~=': { level: 5, kind: 'compare', op: '!=' },
  '!=': { level: 5, kind: 'compare', op: '!=' },
  ':': { level: 6, kind: 'range' },
  '+': { level: sum, kind: 'binary', op: '+' },
  '-': { level: sum, kind: 'binary', op: '-' },
  '*': { level: product, kind: 'binary', op: '*' },
  '.*': { level: product, kind: 'binary', op: '*' },
  '/': { level: product, kind: 'binary', op: '/' },
  './': { level: product, kind: 'binary', op: '/' },
  '\\': { level: product, kind: 'binary', op: '\\' },
  '.\\': { level: product, kind: 'binary', op: '\\' },
};

const powers = new Set(['^', '.^', '**', '.**']);
const signs: Readonly<Record<string, '-' | '+' | 'not'>> = { '-': '-', '+': '+', '~': 'not', '!': 'not', '++': '+', '--': '+' };

/** The expression that begins at the next token; unknown, with a problem recorded, where none does. */
export function expression(reader: Reader): Expr {
  return reader.deeper(() => binary(reader, 1), () => tooDeep(reader));
}

function tooDeep(reader: Reader): Expr {
  const { start } = reader.token;
  reader.problem('nested too deeply');
  reader.skipStatement();
  return reader.unknown(reader.since(start));
}

function binary(reader: Reader, least: number): Expr {
  const first = reader.token.start;
  let left = unary(reader);
  const start = Math.min(first, left.start);
  let made: Expr | undefined;
  for (;;) {
    const token = reader.token;
    const operator = token.kind === 'op' && Object.hasOwn(operators, token.text) ? operators[token.text] : undefined;
    if (!operator || operator.level < least || (operator.kind === 'range' && endsRange(reader))) return left;
    reader.next();
    if (operator.kind === 'range') left = range(reader, start, left);
    else {
      const right = binary(reader, operator.level + 1);
      const span = reader.since(start);
      if (operator.kind === 'compare') left = { kind: 'compare', operands: [left, right], ops: [operator.op], ...span };
      else if (operator.kind === 'logic') left = { kind: 'logic', op: operator.op, operands: left === made && left.kind === 'logic' && left.op === operator.op ? [...left.operands, right] : [left, right], ...span };
      else left = { kind: 'binary', op: operator.op, opSpan: { start: token.end - 1, end: token.end }, left, right, ...span };
    }
    made = left;
  }
}

/** A colon with nothing behind it belongs to no range: `x(:)`, `case 1:`. */
function endsRange(reader: Reader): boolean {
  const behind = reader.peek();
  return !behind || behind.kind === 'break' || (behind.kind === 'op' && (behind.text === ')' || behind.text === ',' || behind.text === '}'));
}

/** `a:b` and `a:step:b`; a slice keeps start, end, step. */
function range(reader: Reader, start: number, first: Expr): Expr {
  const second = binary(reader, sum);
  if (!reader.isOp(':') || endsRange(reader)) return { kind: 'slice', parts: [first, second], ...reader.since(start) };
  reader.next();
  const third = binary(reader, sum);
  return { kind: 'slice', parts: [first, third, second], ...reader.since(start) };
}

function unary(reader: Reader): Expr {
  const token = reader.token;
  const sign = token.kind === 'op' && Object.hasOwn(signs, token.text) ? signs[token.text] : undefined;
  if (!sign) return power(reader);
  reader.next();
  const operand = reader.deeper(() => unary(reader), () => tooDeep(reader));
  return token.text === '++' || token.text === '--' ? operand : { kind: 'unary', op: sign, operand, ...reader.since(token.start) };
}

/** Powers go from the left, and a transpose behind one is that of the whole: `a^b'` is `(a^b)'`. */
function power(reader: Reader): Expr {
  const first = reader.token.start;
  let left = postfix(reader);
  const start = Math.min(first, left.start);
  for (;;) {
    const token = reader.token;
    if (token.kind !== 'op') return left;
    if (token.text === "'" || token.text === ".'") {
      reader.next();
      left = { kind: 'unary', op: 'transpose', operand: left, ...reader.since(start) };
    } else if (powers.has(token.text)) {
      reader.next();
      const right = exponent(reader);
      left = { kind: 'binary', op: '**', opSpan: { start: token.text.startsWith('.') ? token.start + 1 : token.start, end: token.end }, left, right, ...reader.since(start) };
    } else return left;
  }
}

/** An exponent: `2^-1` takes its sign along, and no further power. */
function exponent(reader: Reader): Expr {
  const token = reader.token;
  const sign = token.kind === 'op' && Object.hasOwn(signs, token.text) ? signs[token.text] : undefined;
  if (!sign) return postfix(reader);
  reader.next();
  return { kind: 'unary', op: sign, operand: reader.deeper(() => exponent(reader), () => tooDeep(reader)), ...reader.since(token.start) };
}
