/** Expressions of the common form made by hand, for what a host says in another way. */
import type { BinaryExpr, CompareOp, Expr } from '../../../server/src/program/nodes.ts';
import { Rational } from '../../../server/src/quantities/rational.ts';

const nowhere = { start: 0, end: 0 };

export function name(text: string): Expr {
  const [first = '', ...rest] = text.split('.');
  return rest.reduce<Expr>(member, { kind: 'name', name: first, ...nowhere });
}

export function member(object: Expr, own: string): Expr {
  return { kind: 'member', object, name: own, nameSpan: nowhere, ...nowhere };
}

export function call(callee: string, ...args: readonly Expr[]): Expr {
  return { kind: 'call', callee: name(callee), args: args.map((value) => ({ value, ...nowhere })), ...nowhere };
}

export function number(value: number): Expr {
  return { kind: 'number', value: Rational.of(value), text: String(value), ...nowhere };
}

export function binary(op: BinaryExpr['op'], left: Expr, right: Expr): Expr {
  return { kind: 'binary', op, opSpan: nowhere, left, right, ...nowhere };
}

export function compare(left: Expr, op: CompareOp, right: Expr): Expr {
  return { kind: 'compare', operands: [left, right], ops: [op], ...nowhere };
}

export function and(operands: readonly Expr[]): Expr {
  return operands.length === 1 ? (operands[0] as Expr) : { kind: 'logic', op: 'and', operands, ...nowhere };
}
