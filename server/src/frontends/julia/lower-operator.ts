/** Operators, juxtaposition and powers in the common form. */
import type { CompareOp, Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { regrouped } from './infix.ts';
import { lowerExpression, opaque } from './lower-expression.ts';
import { arithmetic, comparisons, root, rootPower, undotted } from './operators.ts';

export function lowerUnary(low: Lowering, node: Syntax, span: Span): Expr {
  const [sign, operand] = node.parts;
  if (!sign || !operand) return opaque(low, node, span);
  const text = undotted(textOf(low, sign));
  const exponent = rootPower(textOf(low, sign), spanOf(low, sign));
  if (exponent) return root(exponent, lowerExpression(low, operand), span);
  if (text === '-' || text === '+') return { kind: 'unary', op: text, operand: lowerExpression(low, operand), ...span };
  if (text === '!' || text === '¬') return { kind: 'unary', op: 'not', operand: lowerExpression(low, operand), ...span };
  if (text === '~') return { kind: 'unary', op: 'bits', operand: lowerExpression(low, operand), ...span };
  return { kind: 'opaque', parts: [], ...span };
}

export function lowerBinary(low: Lowering, node: Syntax, span: Span): Expr {
  const again = regrouped(low, node);
  if (again) return again;
  const [left, sign, right] = node.parts;
  if (!left || !sign || !right) return opaque(low, node, span);
  const text = undotted(textOf(low, sign));
  if (text === '^') return powers(low, node, span);
  if (text === '&&' || text === '||') return logic(low, node, span, text);
  if (comparisons[text]) return comparison(low, node, span);
  if (text === '|>') return { kind: 'call', callee: lowerExpression(low, right), args: [{ value: lowerExpression(low, left), ...spanOf(low, left) }], ...span };
  if (text === '=>') return { kind: 'sequence', form: 'tuple', items: [lowerExpression(low, left), lowerExpression(low, right)], ...span };
  if (text === 'isa' || text === '<:' || text === '>:') return { kind: 'opaque', parts: [lowerExpression(low, left)], ...span };
  const op = arithmetic[text];
  if (!op) return { kind: 'opaque', parts: [lowerExpression(low, left), lowerExpression(low, right)], ...span };
  return { kind: 'binary', op, opSpan: spanOf(low, sign), left: lowerExpression(low, left), right: lowerExpression(low, right), ...span };
}

/** `2g`, `2(a + b)`: a product; a text behind a number is an argument of its own. */
export function lowerJuxtaposition(low: Lowering, node: Syntax, span: Span): Expr {
  const [left, right] = node.parts;
  if (!left || !right) return opaque(low, node, span);
  const again = regrouped(low, node);
  if (again) return again;
  if (right.type.endsWith('string_literal')) return right.type === 'string_literal' ? lowerExpression(low, left) : { kind: 'opaque', parts: [], ...span };
  return product(low, left, lowerExpression(low, right), span);
}

function product(low: Lowering, left: Syntax, right: Expr, span: Span): Expr {
  const at = Math.max(left.end - low.base, Math.min(right.start, span.end));
  return { kind: 'binary', op: '*', opSpan: { start: at, end: at }, left: lowerExpression(low, left), right, ...span };
}

/** Powers go from right to left, and a number before a symbol stays outside: `2x^2` is `2*(x^2)`; the grammar nests them to the left. */
function powers(low: Lowering, node: Syntax, span: Span): Expr {
  const operands: Syntax[] = [];
  const signs: Syntax[] = [];
  let at: Syntax | undefined = node;
  while (at?.type === 'binary_expression' && isPower(low, at)) {
    operands.push(at.parts[2] as Syntax);
    signs.push(at.parts[1] as Syntax);
    at = at.parts[0];
  }
  if (!at || operands.length > 100) return { kind: 'opaque', parts: [], ...span };
  operands.push(at);
  return raised(low, operands.reverse(), signs.reverse(), 0, span.end);
}

function isPower(low: Lowering, node: Syntax): boolean {
  const sign = node.parts[1];
  return node.parts.length === 3 && sign !== undefined && undotted(textOf(low, sign)) === '^';
}

function raised(low: Lowering, operands: readonly Syntax[], signs: readonly Syntax[], at: number, end: number): Expr {
  const base = operands[at] as Syntax;
  const sign = signs[at];
  if (!sign) return lowerExpression(low, base);
  const exponent = raised(low, operands, signs, at + 1, end);
  const [factor, symbol] = base.type === 'juxtaposition_expression' && !base.broken ? base.parts : [];
  const raise = (each: Syntax): Expr => ({ kind: 'binary', op: '**', opSpan: spanOf(low, sign), left: lowerExpression(low, each), right: exponent, start: each.start - low.base, end });
  return factor && symbol ? product(low, factor, raise(symbol), { start: base.start - low.base, end }) : raise(base);
}

/** `a && b && c` is one expression of three operands, on whichever side the grammar nests it. */
function logic(low: Lowering, node: Syntax, span: Span, sign: string): Expr {
  const operands: Expr[] = [];
  let depth = 0;
  const visit = (each: Syntax): void => {
    const [left, op, right] = each.parts;
    if (depth < 200 && each.type === 'binary_expression' && left && right && op && !each.broken && undotted(textOf(low, op)) === sign) {
      depth++;
      visit(left);
      visit(right);
    } else operands.push(lowerExpression(low, each));
  };
  visit(node);
  return { kind: 'logic', op: sign === '&&' ? 'and' : 'or', operands, ...span };
}

/** `a < b <= c`: the grammar nests chains to the left. */
function comparison(low: Lowering, node: Syntax, span: Span): Expr {
  const operands: Syntax[] = [];
  const ops: CompareOp[] = [];
  let at: Syntax | undefined = node;
  for (;;) {
    const parts: readonly Syntax[] = at?.parts ?? [];
    const [left, sign, right] = parts;
    const op: CompareOp | undefined = at?.type === 'binary_expression' && sign ? comparisons[undotted(textOf(low, sign))] : undefined;
    if (!op || !left || !right) break;
    operands.push(right);
    ops.push(op);
    at = left;
  }
  if (at) operands.push(at);
  return { kind: 'compare', operands: operands.reverse().map((each) => lowerExpression(low, each)), ops: ops.reverse(), ...span };
}
