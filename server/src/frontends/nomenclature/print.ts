import type { BinaryExpr, Expr } from '../../program/nodes.ts';

const ranks: Partial<Record<BinaryExpr['op'], number>> = { '+': 1, '-': 1, '*': 2, '@': 2, '/': 2, '**': 4 };
const signRank = 3;
const atomRank = 5;

/** Prints an expression as a formula; what the language has no notation for becomes `?`. */
export function printFormula(expr: Expr): string {
  return printed(expr).text;
}

function printed(expr: Expr): { readonly text: string; readonly rank: number } {
  switch (expr.kind) {
    case 'number':
      return { text: expr.text, rank: atomRank };
    case 'name':
      return { text: expr.name, rank: atomRank };
    case 'member':
      return { text: `${inside(expr.object, atomRank)}.${expr.name}`, rank: atomRank };
    case 'call':
      return { text: `${inside(expr.callee, atomRank)}(${expr.args.map((each) => printFormula(each.value)).join(', ')})`, rank: atomRank };
    case 'unary':
      return expr.op === '-' || expr.op === '+' ? { text: expr.op + inside(expr.operand, signRank), rank: signRank } : { text: '?', rank: atomRank };
    case 'binary':
      return binary(expr);
    default:
      return { text: '?', rank: atomRank };
  }
}

function binary(expr: BinaryExpr): { readonly text: string; readonly rank: number } {
  const rank = ranks[expr.op];
  if (rank === undefined) return { text: '?', rank: atomRank };
  if (expr.op === '**') return { text: `${inside(expr.left, atomRank)}^${inside(expr.right, signRank)}`, rank };
  const sign = expr.op === '@' ? '*' : expr.op;
  const [left, right] = [inside(expr.left, rank), inside(expr.right, rank + 1)];
  return { text: rank === 1 ? `${left} ${sign} ${right}` : `${left}${sign}${right}`, rank };
}

/** Text with brackets where the surroundings bind at least as tight. */
function inside(expr: Expr, least: number): string {
  const { text, rank } = printed(expr);
  return rank < least ? `(${text})` : text;
}
