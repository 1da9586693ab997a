/** The numbers that may hide a unit in a contradiction, and which unit that would be. */
import { literalNumber, readLiteral, simpleExponent } from '../constraints/literal.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import type { Expr } from '../program/nodes.ts';
import { Dimension } from '../quantities/dimension.ts';
import { knownConstant } from '../quantities/known-constants.ts';
import { Rational } from '../quantities/rational.ts';
import type { Fault, Involved } from './fault.ts';
import { sidesOf } from './root-cause.ts';

export interface HiddenNumber {
  readonly text: string;
  /** Not a number for a constant that is known by name only. */
  readonly size: number;
  /** The power it stands under in its side. */
  readonly power: Rational;
  readonly side: 'left' | 'right' | 'value';
}

type Contradiction = Extract<Fault, { kind: 'dimension' | 'pure' | 'varying-power' }>;

/** The impure literals that multiply either side, and the constants without notes that were solved on the way. */
export function hiddenNumbers(constraint: Constraint, involved: readonly Involved[]): readonly HiddenNumber[] {
  const found: HiddenNumber[] = [];
  const [first, second] = sidesOf(constraint);
  const same = constraint.kind === 'same';
  collect(first, same ? 'left' : 'value', found);
  if (same) collect(second, 'right', found);
  for (const each of involved) {
    if (each.unknown.origin === 'constant' && each.unknown.name !== '') found.push({ text: each.unknown.name, size: Number.NaN, power: Rational.one, side: 'left' });
  }
  if (found.length === 0) found.push(...constantsIn(constraint));
  const telling = found.filter((each) => !conversions.has(each.size));
  return (telling.length > 0 ? telling : found).sort((a, b) => Number(Number.isNaN(a.size)) - Number(Number.isNaN(b.size)));
}

/** Numbers that engineers convert with; where another number stands beside them, that one is the suspect. */
const conversions = new Set([10, 100, 1000, 1e4, 1e5, 1e6, 60, 3600, 24, 86400, 0.1, 0.01, 1e-3, 1e-4, 1e-5, 1e-6]);

/** The dimension that the first hidden number would have to carry. */
export function neededDimension(fault: Contradiction, found: readonly HiddenNumber[]): Dimension | undefined {
  const first = found[0];
  if (!first) return fault.kind === 'dimension' ? fault.right.div(fault.left) : undefined;
  const raw = fault.kind === 'dimension' ? (first.side === 'right' ? fault.left.div(fault.right) : fault.right.div(fault.left)) : inverse(fault.dimension);
  return raw.pow(first.power.inv());
}

/** Whether a plain number in a side is a constant of exactly the dimension that is missing: `1.2*Q*c*dT` with the density of air. */
export function hidesConstant(constraint: Constraint, left: Dimension, right: Dimension): boolean {
  return plainNumbers(constraint).some((each) => isMissing(each, left, right));
}

function constantsIn(constraint: Constraint): readonly HiddenNumber[] {
  const [left, right] = sidesOf(constraint).map((side) => side.form?.dimension);
  return left && right && constraint.kind === 'same' ? plainNumbers(constraint).filter((each) => isMissing(each, left, right)) : [];
}

function isMissing(number: HiddenNumber, left: Dimension, right: Dimension): boolean {
  const raw = number.side === 'right' ? left.div(right) : right.div(left);
  return knownConstant(number.size, raw.pow(number.power.inv())) !== undefined;
}

/** The numbers with a decimal point that multiply a side as it is written, whether or not they look like constants. */
function plainNumbers(constraint: Constraint): readonly HiddenNumber[] {
  const found: HiddenNumber[] = [];
  if (constraint.kind !== 'same') return found;
  for (const [value, side] of [[constraint.left, 'left'], [constraint.right, 'right']] as const) if (value.expr) collectFrom(value.expr, Rational.one, side, found, isDecimal);
  return found;
}

function isDecimal(value: Rational): boolean {
  return value.den !== 1n;
}

function inverse(dimension: Dimension): Dimension {
  return Dimension.one.div(dimension);
}

/** Through the symbols without notes that a value was computed from. */
function collect(value: Value | undefined, side: HiddenNumber['side'], found: HiddenNumber[], depth = 0): void {
  if (!value || depth > 12 || found.length > 4) return;
  const before = found.length;
  if (value.tainted && value.expr) collectFrom(value.expr, Rational.one, side, found);
  if (found.length > before) return;
  collect(value.version?.note ? undefined : value.version?.assigned, side, found, depth + 1);
  for (const part of value.from) if (part.tainted) collect(part, side, found, depth + 1);
}

function collectFrom(expr: Expr, power: Rational, side: HiddenNumber['side'], found: HiddenNumber[], counts?: (value: Rational) => boolean): void {
  if (expr.kind === 'number' && expr.value) {
    const literal = readLiteral(expr.value, expr.text);
    if (counts ? counts(expr.value) : !literal.pure) found.push({ text: expr.text, size: literalNumber(literal), power, side });
  } else if (expr.kind === 'unary') collectFrom(expr.operand, power, side, found, counts);
  else if (expr.kind === 'binary' && (expr.op === '*' || expr.op === '/' || expr.op === '//')) {
    collectFrom(expr.left, power, side, found, counts);
    collectFrom(expr.right, expr.op === '*' ? power : power.neg(), side, found, counts);
  } else if (expr.kind === 'binary' && expr.op === '**') collectFrom(expr.left, power.mul(exponentOf(expr.right)), side, found, counts);
  else if (!counts && expr.kind === 'binary' && (expr.op === '+' || expr.op === '-')) collectFrom(expr.left, power, side, found);
}

function exponentOf(expr: Expr): Rational {
  if (expr.kind === 'unary' && expr.op === '-') return exponentOf(expr.operand).neg();
  const exponent = expr.kind === 'number' && expr.value ? simpleExponent(readLiteral(expr.value, expr.text)) : Rational.one;
  return exponent.isZero ? Rational.one : exponent;
}
