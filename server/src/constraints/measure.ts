/**
 * The scale side of a value: which unit its number is counted in, as far as literals and offsets leave that open.
 * Everything here is forward: nothing is solved for a scale.
 */
import { Dimension } from '../quantities/dimension.ts';
import type { Scale } from '../quantities/scale.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Unknown } from './form.ts';
import type { Literal } from './literal.ts';

const temperature = Dimension.base('Θ');

export interface Measure {
  /** What the number may be counted in; one entry unless offsets or conversions leave several. */
  readonly readings: readonly Reading[];
  /** Literal factors that may be conversions: the unit is the reading's divided by any product of them. */
  readonly factors: readonly Factor[];
  readonly radian: number;
  readonly cycle: number;
  /** Exponent of °C- or °F-sized degrees in compound units; -1 cancels a temperature in °C. */
  readonly degrees: number;
}

export interface Factor {
  readonly literal: Literal;
  /** The power it stands under; absent: 1. */
  readonly power?: number;
  /** For a constant without a note: it counts as a literal only if this unknown turns out dimensionless. */
  readonly unless?: Unknown;
}

/** The quantity in SI is `scale · number + zero`; `weight` counts the points in it (1 for a temperature in °C). */
export interface Reading {
  readonly scale: Scale;
  readonly weight: number;
  readonly zero: number;
  readonly nature: Nature;
  /** A point was multiplied by a quantity: right only if another point takes it away again. */
  readonly pending?: true;
}

/**
 * `absolute`: noted as an absolute temperature; `ratio`: counted from zero or a difference, nobody can tell; `difference`:
 * surely one; `shifted`: a point minus a bare number, which may be one. Points are temperatures in °C or °F; gauge pressures count from the atmosphere.
 */
export type Nature = 'absolute' | 'ratio' | 'difference' | 'shifted' | 'point' | 'gauge';

/** The measure of a number that a note gives a unit; undefined where the scale is not known. `difference`: the symbol names a difference. */
export function measureOf(unit: Unit, difference = false): Measure | undefined {
  if (!unit.scale) return undefined;
  return {
    readings: [readingOf(unit, unit.scale, difference)],
    factors: [],
    radian: unit.rotation?.radian.toNumber() ?? 0,
    cycle: unit.rotation?.cycle.toNumber() ?? 0,
    degrees: unit.degrees?.toNumber() ?? 0,
  };
}

function readingOf(unit: Unit, scale: Scale, difference: boolean): Reading {
  if (difference) return { scale, weight: 0, zero: 0, nature: 'difference' };
  if (!unit.offset) return { scale, weight: 0, zero: 0, nature: unit.dimension === temperature && !unit.degrees ? 'absolute' : 'ratio' };
  return { scale, weight: 1, zero: unit.offset.zero.toNumber(), nature: unit.offset.kind === 'gauge' ? 'gauge' : 'point' };
}
