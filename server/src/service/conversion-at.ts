/** Which conversion a literal number was taken for. */
import { literalNumber } from '../constraints/literal.ts';
import type { Measure } from '../constraints/measure.ts';
import { matchScales } from '../constraints/measure-match.ts';
import type { Constraint } from '../constraints/problem.ts';
import type { NumberExpr } from '../program/nodes.ts';
import type { Dimension } from '../quantities/dimension.ts';
import { printUnit } from '../quantities/print-unit.ts';
import { dimensionOf } from '../repairs/scene.ts';
import type { Sightings } from '../solver/pieces.ts';

type Same = Extract<Constraint, { kind: 'same' }>;

/** The two units that the number lies between, where a comparison needed it as their factor; undefined for every other number. */
export function conversionOf(expr: NumberExpr, sightings: Sightings): { readonly from: string; readonly to: string } | undefined {
  const size = expr.value?.toNumber();
  if (size === undefined || size <= 0 || size === 1) return undefined;
  for (const constraint of sightings.constraints) {
    if (constraint.kind !== 'same') continue;
    const found = between(constraint, expr, size, sightings);
    if (found) return found;
  }
  return undefined;
}

function between({ left, right }: Same, expr: NumberExpr, size: number, sightings: Sightings): { readonly from: string; readonly to: string } | undefined {
  const [side, other] = covers(left.expr, expr) ? [left, right] : covers(right.expr, expr) ? [right, left] : [];
  if (!side?.measure || !other?.measure || !converts(side.measure, size)) return undefined;
  const [a, b] = [side.measure.readings[0], other.measure.readings[0]];
  if (!a || !b || a.scale.equals(b.scale) || matchScales(side.measure, other.measure).length === 0) return undefined;
  const dimension = dimensionOf(side, sightings) ?? dimensionOf(other, sightings);
  return dimension && { from: named(dimension, side.measure), to: named(dimension, other.measure) };
}

function covers(outer: { readonly start: number; readonly end: number } | undefined, inner: NumberExpr): boolean {
  return outer !== undefined && outer.start <= inner.start && inner.end <= outer.end;
}

function converts({ factors }: Measure, size: number): boolean {
  return factors.some(({ literal, power }) => {
    const own = literalNumber(literal) ** (power ?? 1);
    return Math.abs(own / size - 1) < 1e-12 || Math.abs(own * size - 1) < 1e-12;
  });
}

function named(dimension: Dimension, { readings: [reading] }: Measure): string {
  return reading ? printUnit({ dimension, scale: reading.scale, text: '' }) : '';
}
