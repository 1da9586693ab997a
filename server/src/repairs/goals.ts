/** What a contradiction asks of the expressions in it: by which dimension each would have to be multiplied. */
import type { Form, Unknown } from '../constraints/form.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import type { Detected } from '../findings/collect.ts';
import type { Expr } from '../program/nodes.ts';
import { Dimension } from '../quantities/dimension.ts';
import { coherentUnit } from '../quantities/print-unit.ts';
import { Rational } from '../quantities/rational.ts';
import type { Fault, Involved } from '../solver/fault.ts';
import type { Anchor } from '../text/span.ts';

export interface Goal {
  readonly anchor: Anchor;
  /** The sides of a contradiction: what multiplies the first divides the second. */
  readonly roots: readonly Root[];
  /** A side with power 1 has to be multiplied by something of this dimension. */
  readonly ratio: Dimension;
  /** How far from the place that was reported. */
  readonly distance: number;
}

export interface Root {
  readonly expr: Expr;
  readonly power: Rational;
  /** The unit it has once that is done, for the reader. */
  readonly unit: string;
}

export type Contradiction = Extract<Fault, { kind: 'dimension' | 'pure' | 'varying-power' }>;

/** The contradictions that a finding stands for. */
export function contradictionsOf(detected: Detected): readonly Contradiction[] {
  if (detected.cause.kind !== 'fault') return [];
  const { fault, alike } = detected.cause;
  return [...(fault.kind === 'note' ? fault.faults : [fault]), ...alike].filter((each): each is Contradiction => each.kind === 'dimension' || each.kind === 'pure' || each.kind === 'varying-power');
}

/** What could settle a contradiction: a change of its sides, or of the uses that decided an unknown unit in them. */
export function goalsOf(fault: Contradiction): readonly Goal[] {
  const ratio = ratioOfSides(fault);
  const unitAt = (at: number): string => (fault.kind === 'dimension' ? unitOfSide(fault, at) : '1');
  return [goalOf(fault.constraint, ratio, unitAt, 0), ...fault.involved.flatMap((each) => goalOfRow(fault, each, ratio))].filter((goal) => goal.roots.length > 0);
}

function goalOf(constraint: Constraint, ratio: Dimension, unitAt: (at: number) => string, distance: number): Goal {
  const roots = sides(constraint).flatMap(({ value, sign }, at) =>
    value.expr && !isElsewhere(constraint, at) ? [{ expr: value.expr, power: sign > 0 ? Rational.one : Rational.minusOne, unit: unitAt(at) }] : [],
  );
  return { anchor: constraint.anchor, roots, ratio, distance };
}

/** What the left side, or the only one, lacks. */
export function ratioOfSides(fault: Contradiction): Dimension {
  return fault.kind === 'dimension' ? fault.right.div(fault.left) : inverse(fault.dimension);
}

/** The exponent that makes one dimension of another; undefined where none does. */
export function exponentBetween(of: Dimension, base: Dimension): Rational | undefined {
  if (of.isOne || base.isOne || of.exponents.length !== base.exponents.length) return undefined;
  const [first] = base.exponents;
  if (!first) return undefined;
  const exponent = of.exponent(first[0]).div(first[1]);
  return base.pow(exponent) === of ? exponent : undefined;
}

function inverse(dimension: Dimension): Dimension {
  return Dimension.one.div(dimension);
}

function sides(constraint: Constraint): readonly { readonly value: Value; readonly sign: 1 | -1 }[] {
  switch (constraint.kind) {
    case 'same':
      return [{ value: constraint.left, sign: 1 }, { value: constraint.right, sign: -1 }];
    case 'pure':
      return [{ value: constraint.value, sign: 1 }];
    case 'varying-power':
      return [{ value: constraint.base, sign: 1 }];
    default:
      return [];
  }
}

const ownSides = new Set(['sum', 'comparison', 'choice', 'alike']);

/** The right side of what a note or a signature asks stands somewhere else. */
function isElsewhere(constraint: Constraint, at: number): boolean {
  return at > 0 && constraint.kind === 'same' && !ownSides.has(constraint.reason.kind);
}

function unitOfSide(fault: Extract<Contradiction, { kind: 'dimension' }>, at: number): string {
  const other = at === 0 ? fault.constraint.right : fault.constraint.left;
  const note = other.version?.note?.unit;
  const dimension = at === 0 ? fault.right : fault.left;
  return note && note.dimension === dimension && note.text !== '' ? note.text : coherentUnit(dimension);
}

/** A use that solved an unknown: changing it changes the unknown, and with it the contradiction. */
function goalOfRow(fault: Contradiction, { unknown, by }: Involved, ratio: Dimension): readonly Goal[] {
  if (by.anchor !== fault.constraint.anchor) return [];
  const here = exponentIn(fault.constraint, unknown) ?? Rational.one;
  const there = exponentIn(by, unknown);
  return there ? [goalOf(by, ratio.pow(there.div(here).neg()), () => '', 1)] : [];
}

function exponentIn(constraint: Constraint, unknown: Unknown): Rational | undefined {
  let sum = Rational.zero;
  for (const { value, sign } of sides(constraint)) {
    const power = powerIn(value.form, unknown);
    sum = sign > 0 ? sum.add(power) : sum.sub(power);
  }
  return sum.isZero ? undefined : sum;
}

function powerIn(form: Form | undefined, unknown: Unknown): Rational {
  return form?.terms.find((term) => term.unknown.id === unknown.id)?.power ?? Rational.zero;
}
