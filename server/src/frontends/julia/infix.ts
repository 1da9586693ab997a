/**
 * `2*(b + c)`: the grammar may take `*(b + c)` for a call of the operator and the number before it for a factor of that. Where this has
 * happened, the operands and operators are taken in the order of the text and grouped again as Julia does.
 * Source: Julia manual, Mathematical Operations, Operator Precedence and Associativity.
 */
import type { Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { lowerExpression } from './lower-expression.ts';
import { arithmetic, comparisons, undotted } from './operators.ts';

/** How tightly an operator binds; higher is tighter. */
const levels: ReadonlyMap<string, number> = new Map([
  ...Object.keys(comparisons).map((sign) => [sign, 1] as const),
  ...['+', '-', '−', '|', '⊻'].map((sign) => [sign, 2] as const),
  ...['*', '/', '÷', '%', '\\', '⋅', '·', '×', '&'].map((sign) => [sign, 3] as const),
  ['//', 4], ...['<<', '>>', '>>>'].map((sign) => [sign, 5] as const), ['^', 6],
]);

/** The expression grouped again; undefined where the grammar made no call of an operator in it. */
export function regrouped(low: Lowering, node: Syntax): Expr | undefined {
  if (!isInfix(low, node) || !holdsCall(low, node)) return undefined;
  const chain: Chain = { low, operands: [], signs: [] };
  flatten(chain, node);
  return climb(chain, { at: 0 }, 1);
}

interface Chain {
  readonly low: Lowering;
  readonly operands: Syntax[];
  readonly signs: Syntax[];
}

/** A number with the call of an operator behind it. */
function operatorCall(low: Lowering, node: Syntax): readonly [number: Syntax, sign: Syntax, argument: Syntax] | undefined {
  const [number, call] = node.type === 'juxtaposition_expression' && !node.broken ? node.parts : [];
  const [sign, list] = call?.type === 'call_expression' ? call.parts : [];
  const argument = list?.parts.length === 1 ? list.parts[0] : undefined;
  return number && sign?.type === 'operator' && argument && levels.has(undotted(textOf(low, sign))) ? [number, sign, argument] : undefined;
}

function isInfix(low: Lowering, node: Syntax): boolean {
  const sign = node.type === 'binary_expression' && node.parts.length === 3 ? node.parts[1] : undefined;
  return sign ? levels.has(undotted(textOf(low, sign))) : operatorCall(low, node) !== undefined;
}

function holdsCall(low: Lowering, node: Syntax): boolean {
  return operatorCall(low, node) !== undefined || (isInfix(low, node) && [node.parts[0], node.parts[2]].some((each) => each !== undefined && holdsCall(low, each)));
}

function flatten(chain: Chain, node: Syntax): void {
  const called = operatorCall(chain.low, node);
  if (called) {
    chain.operands.push(called[0], called[2]);
    chain.signs.push(called[1]);
  } else if (isInfix(chain.low, node)) {
    flatten(chain, node.parts[0] as Syntax);
    chain.signs.push(node.parts[1] as Syntax);
    flatten(chain, node.parts[2] as Syntax);
  } else chain.operands.push(node);
}

/** Precedence climbing from an operand on; `least` is the loosest operator that still belongs here. */
function climb(chain: Chain, state: { at: number }, least: number): Expr {
  let left = lowerExpression(chain.low, chain.operands[state.at] as Syntax);
  for (;;) {
    const sign = chain.signs[state.at];
    const text = sign ? undotted(textOf(chain.low, sign)) : '';
    const level = levels.get(text);
    if (!sign || level === undefined || level < least) return left;
    state.at++;
    const right = climb(chain, state, text === '^' ? level : level + 1);
    left = combined(text, spanOf(chain.low, sign), left, right);
  }
}

function combined(text: string, opSpan: Span, left: Expr, right: Expr): Expr {
  const span = { start: left.start, end: right.end };
  const compared = comparisons[text];
  if (compared) return { kind: 'compare', operands: [left, right], ops: [compared], ...span };
  const op = arithmetic[text];
  if (!op) return { kind: 'opaque', parts: [left, right], ...span };
  return { kind: 'binary', op, opSpan, left, right, ...span };
}
