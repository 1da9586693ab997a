/** The places in an expression whose dimension multiplies into the whole, with the power that each has there. */
import type { Expr } from '../program/nodes.ts';
import { pathOf } from '../program/path.ts';
import { Rational } from '../quantities/rational.ts';
import type { Dimension } from '../quantities/dimension.ts';
import type { Sightings } from '../solver/pieces.ts';
import type { Anchor } from '../text/span.ts';
import { exponentBetween, type Goal } from './goals.ts';
import { dimensionOf } from './scene.ts';

export interface Position {
  readonly anchor: Anchor;
  readonly expr: Expr;
  /** Undefined where it is not known. */
  readonly dimension: Dimension | undefined;
  /** What this part alone would have to be multiplied by. */
  readonly ratio: Dimension;
  /** The expression around it. */
  readonly parent: Expr | undefined;
  /** Whether it is a whole side, or all that was assigned to a symbol. */
  readonly isRoot: boolean;
  /** Assignments between here and the contradiction, and whether it was reported elsewhere. */
  readonly distance: number;
  /** The unit that the side it stands in then has; empty behind an assignment. */
  readonly unit: string;
}

const deepest = 40;

/** Every position of a goal's sides, through the symbols without notes that it was computed from. */
export function positionsOf(goal: Goal, sightings: Sightings): readonly Position[] {
  const found: Position[] = [];
  const seen = new Set<Expr>();
  // A symbol that stands twice in a product changes it twice: the powers of its places add up before its definition is looked at.
  const behind = new Map<Expr, { power: Rational; readonly distance: number; readonly anchor: Anchor }>();
  let { anchor } = goal;
  let unit = '';
  for (const root of goal.roots) {
    ({ unit } = root);
    visit(root.expr, root.power, undefined, goal.distance, true, 0);
  }
  unit = '';
  for (let round = 0; round < deepest && behind.size > 0; round++) {
    const [definition, next] = [...behind][0] as [Expr, { power: Rational; distance: number; anchor: Anchor }];
    behind.delete(definition);
    anchor = next.anchor;
    visit(definition, next.power, undefined, next.distance, true, 0);
  }
  return found;

  function visit(expr: Expr, power: Rational, parent: Expr | undefined, distance: number, isRoot: boolean, depth: number): void {
    if (depth > deepest || power.isZero || seen.has(expr)) return;
    seen.add(expr);
    const dimension = dimensionOf(sightings.values.get(expr), sightings);
    found.push({ anchor, expr, dimension, ratio: goal.ratio.pow(power.inv()), parent, isRoot, distance, unit });
    const into = (inner: Expr, by: Rational): void => visit(inner, power.mul(by), expr, distance, false, depth + 1);
    switch (expr.kind) {
      case 'unary':
        return into(expr.operand, Rational.one);
      case 'binary':
        return visitBinary(expr, into);
      case 'call':
        return visitCall(expr, dimension, into);
      case 'name':
      case 'index': {
        const version = sightings.values.get(expr)?.version;
        const assigned = version?.anchor.file === anchor.file && version.origin === 'assigned' && !version.note ? version.assigned?.expr : undefined;
        if (!assigned || !version || !sightings.values.has(assigned)) return;
        const known = behind.get(assigned);
        if (known) known.power = known.power.add(power);
        else behind.set(assigned, { power, distance: distance + 1, anchor: version.anchor });
        return;
      }
      default:
    }
  }

  function visitBinary(expr: Extract<Expr, { kind: 'binary' }>, into: (inner: Expr, by: Rational) => void): void {
    switch (expr.op) {
      case '*':
      case '@':
        into(expr.left, Rational.one);
        return into(expr.right, Rational.one);
      case '/':
      case '//':
        into(expr.left, Rational.one);
        return into(expr.right, Rational.minusOne);
      case '**': {
        const exponent = literalExponent(expr.right, sightings);
        return exponent && into(expr.left, exponent);
      }
      case '+':
      case '-':
        // One term decides only where the other is open.
        if (isOpen(expr.right)) return into(expr.left, Rational.one);
        return isOpen(expr.left) ? into(expr.right, Rational.one) : undefined;
      default:
    }
  }

  function visitCall(expr: Extract<Expr, { kind: 'call' }>, dimension: Dimension | undefined, into: (inner: Expr, by: Rational) => void): void {
    if (!dimension) return;
    for (const { value } of expr.args) {
      const inner = dimensionOf(sightings.values.get(value), sightings);
      const exponent = inner && (inner.isOne && dimension.isOne && keepsUnit(expr.callee) ? Rational.one : exponentBetween(dimension, inner));
      if (exponent && expr.args.every((other) => other.value === value || isOpen(other.value))) into(value, exponent);
    }
  }

  function isOpen(expr: Expr): boolean {
    const value = sightings.values.get(expr);
    return !value?.form || value.literal !== undefined || value.fits === true || value.version?.origin === 'constant';
  }
}

/** Functions that give a value in the unit of their argument, for where a pure number hides which do. */
function keepsUnit(callee: Expr): boolean {
  return /(?:^|\.)(?:max|min|maximum|minimum|fmax|fmin|abs|fabs|absolute|sum|mean|average|median|where|clip|array|asarray|float|round)$/.test(pathOf(callee) ?? '');
}

/** The constant number of an exponent. */
export function literalExponent(expr: Expr, sightings: Sightings): Rational | undefined {
  const value = sightings.values.get(expr);
  const literal = value?.literal ?? value?.version?.assigned?.literal;
  return literal && literal.pi === 0 ? literal.value : undefined;
}
