import type { Expr } from '../../program/nodes.ts';

/** An expression of the nomenclature language with every span moved by `by`. */
export function moveExpression(expr: Expr, by: number): Expr {
  const span = { start: expr.start + by, end: expr.end + by };
  switch (expr.kind) {
    case 'unary':
      return { ...expr, ...span, operand: moveExpression(expr.operand, by) };
    case 'binary':
      return { ...expr, ...span, opSpan: { start: expr.opSpan.start + by, end: expr.opSpan.end + by }, left: moveExpression(expr.left, by), right: moveExpression(expr.right, by) };
    case 'call':
      return { ...expr, ...span, callee: moveExpression(expr.callee, by), args: expr.args.map((each) => ({ ...each, start: each.start + by, end: each.end + by, value: moveExpression(each.value, by) })) };
    default:
      return { ...expr, ...span };
  }
}
