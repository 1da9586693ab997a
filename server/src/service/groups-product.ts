/** Expressions read as products of symbols. */
import type { Exponents } from '../groups/types.ts';
import type { Expr } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import { Rational } from '../quantities/rational.ts';

/**
 * The exponents of an expression that multiplies symbols and nothing else; undefined for sums, calls, and products with a number in
 * them. `1/x` and constant powers count, square roots too. Two expressions with equal exponents are equal up to the order of factors.
 */
export function productOf(expr: Expr): Exponents | undefined {
  const powers = new Map<string, Rational>();
  if (!collect(expr, Rational.one, powers)) return undefined;
  return new Map([...powers].filter(([, power]) => !power.isZero));
}

/** Equal exponents for equal names. */
export function sameProduct(a: Exponents, b: Exponents): boolean {
  return a.size === b.size && [...a].every(([name, power]) => b.get(name)?.equals(power) === true);
}

function collect(expr: Expr, power: Rational, powers: Map<string, Rational>): boolean {
  switch (expr.kind) {
    case 'name':
    case 'member':
      return addSymbol(pathOf(expr), power, powers);
    case 'number':
      return expr.value?.isOne === true;
    case 'unary':
      return expr.op === '+' && collect(expr.operand, power, powers);
    case 'binary':
      return collectBinary(expr, power, powers);
    case 'call':
      return isRoot(expr) && collect((expr.args[0] as (typeof expr.args)[number]).value, power.mul(Rational.of(1, 2)), powers);
    default:
      return false;
  }
}

function collectBinary(expr: Extract<Expr, { kind: 'binary' }>, power: Rational, powers: Map<string, Rational>): boolean {
  if (expr.op === '*' || expr.op === '/') return collect(expr.left, power, powers) && collect(expr.right, expr.op === '*' ? power : power.neg(), powers);
  const exponent = expr.op === '**' ? constantOf(expr.right) : undefined;
  return exponent !== undefined && collect(expr.left, power.mul(exponent), powers);
}

function addSymbol(path: string | undefined, power: Rational, powers: Map<string, Rational>): boolean {
  if (path === undefined) return false;
  powers.set(path, (powers.get(path) ?? Rational.zero).add(power));
  return true;
}

function isRoot({ callee, args }: Extract<Expr, { kind: 'call' }>): boolean {
  return args.length === 1 && /(?:^|\.)sqrt$/.test(pathOf(callee) ?? '');
}

function constantOf(expr: Expr): Rational | undefined {
  if (expr.kind === 'number') return expr.value;
  if (expr.kind === 'unary' && expr.op === '-') return constantOf(expr.operand)?.neg();
  if (expr.kind !== 'binary' || expr.op !== '/') return undefined;
  const [above, below] = [constantOf(expr.left), constantOf(expr.right)];
  return above && below && !below.isZero ? above.div(below) : undefined;
}
