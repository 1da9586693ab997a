/** Whether a variable is computed from its own former value: `p = p*1e4` leaves it in another unit than before. */
import type { Expr, Stmt } from '../program/nodes.ts';

/** True where a statement of the block, or of those inside it, gives `name` a value in which it stands itself. */
export function isConverted(block: readonly Stmt[], name: string): boolean {
  return block.some((statement) => converts(statement, name));
}

function converts(statement: Stmt, name: string): boolean {
  switch (statement.kind) {
    case 'assign':
      return statement.targets.some((target) => target.kind === 'name' && target.name === name) && (statement.op !== undefined || (!keeps(statement.value, name) && reads(statement.value, name)));
    case 'if':
      return statement.arms.some((arm) => isConverted(arm.body, name)) || isConverted(statement.otherwise, name);
    case 'loop':
      return isConverted(statement.body, name) || isConverted(statement.otherwise, name);
    case 'attempt':
      return [statement.body, ...statement.handlers, statement.otherwise, statement.finally].some((each) => isConverted(each, name));
    case 'match':
      return statement.cases.some((each) => isConverted(each.body, name));
    case 'scope':
      return isConverted(statement.body, name);
    default:
      return false;
  }
}

/** The same numbers in another shape: `p'`, `p(:)`, `p(ones(1, n), :)`. */
function keeps(expr: Expr, name: string): boolean {
  switch (expr.kind) {
    case 'name':
      return expr.name === name;
    case 'unary':
      return expr.op === 'transpose' && keeps(expr.operand, name);
    case 'index':
      return keeps(expr.object, name);
    default:
      return false;
  }
}

function reads(expr: Expr, name: string): boolean {
  switch (expr.kind) {
    case 'name':
      return expr.name === name;
    case 'member':
      return reads(expr.object, name);
    case 'index':
      return reads(expr.object, name) || expr.keys.some((key) => reads(key, name));
    case 'call':
      return reads(expr.callee, name) || expr.args.some((each) => reads(each.value, name));
    case 'unary':
      return reads(expr.operand, name);
    case 'binary':
      return reads(expr.left, name) || reads(expr.right, name);
    case 'compare':
    case 'logic':
      return expr.operands.some((each) => reads(each, name));
    case 'choose':
      return reads(expr.then, name) || reads(expr.otherwise, name);
    case 'sequence':
      return expr.items.some((each) => reads(each, name));
    case 'opaque':
    case 'slice':
      return expr.parts.some((each) => reads(each, name));
    default:
      return false;
  }
}
