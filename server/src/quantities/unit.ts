import { Dimension } from './dimension.ts';
import { Rational } from './rational.ts';
import { Scale } from './scale.ts';

/**
 * How a unit counts rotation. Both are dimensionless, but a number in `rev/s` becomes one in `rad/s` only through 2π.
 * Exponents: `rad/s` has radian 1, `rpm` and `Hz` have cycle 1; `1/s` has neither and takes either.
 */
export interface Rotation {
  readonly radian: Rational;
  readonly cycle: Rational;
}

/** Zero of an offset unit, counted in the coherent SI unit: 273.15 for °C, the standard atmosphere for gauge pressure. */
export interface Offset {
  readonly kind: 'temperature' | 'gauge';
  readonly zero: Rational;
}

/** What a number of a script is counted in. Immutable plain data; operations are the free functions below. */
export interface Unit {
  readonly dimension: Dimension;
  /** Factor to the coherent SI unit; undefined where only the dimension is known (`[dim L T^-1]`, `in/hr or mm/hr`). */
  readonly scale: Scale | undefined;
  /** Set for a unit that stands alone as a point on a scale: °C, °F, psig. */
  readonly offset?: Offset;
  readonly rotation?: Rotation;
  /** Exponent of °C- or °F-sized degrees in a compound unit (`W/(m degC)`: -1), which cancels a temperature in °C. */
  readonly degrees?: Rational;
  /** Levels (dB) add to levels only. */
  readonly level?: boolean;
  /** As the author wrote it, or as `print` would. */
  readonly text: string;
}

/** A number: dimension one, scale one. */
export const pureNumber: Unit = { dimension: Dimension.one, scale: Scale.one, text: '1' };

/** Product of units. An offset does not survive a product: the factor counts as a difference there. */
export function multiply(a: Unit, b: Unit, text: string): Unit {
  return assemble(
    a.dimension.mul(b.dimension),
    a.scale && b.scale ? a.scale.mul(b.scale) : undefined,
    addRotation(a.rotation, b.rotation),
    addDegrees(degreesOf(a), degreesOf(b)),
    text,
  );
}

/** Rational power of a unit; power one keeps offset and level. */
export function raise(a: Unit, power: Rational, text: string): Unit {
  if (power.isOne) return { ...a, text };
  const rotation = a.rotation && { radian: a.rotation.radian.mul(power), cycle: a.rotation.cycle.mul(power) };
  return assemble(a.dimension.pow(power), a.scale?.pow(power), rotation, degreesOf(a)?.mul(power), text);
}

/** The same unit with another scale factor in front. */
export function scaledBy(a: Unit, factor: Scale, text: string): Unit {
  return { ...a, scale: a.scale?.mul(factor), text };
}

/** The unit of a difference of two points: °C becomes a kelvin-sized degree without a zero. */
export function differenceOf(a: Unit): Unit {
  if (!a.offset) return a;
  const { offset, ...rest } = a;
  return offset.kind === 'temperature' ? { ...rest, degrees: Rational.one } : rest;
}

/** Same dimension, scale, offset and rotation: numbers counted in either mean the same. */
export function sameUnit(a: Unit, b: Unit): boolean {
  if (a.dimension !== b.dimension || !a.scale || !b.scale || !a.scale.equals(b.scale)) return false;
  const zeros = [a.offset?.zero ?? Rational.zero, b.offset?.zero ?? Rational.zero] as const;
  return zeros[0].equals(zeros[1]) && sameRotation(a.rotation, b.rotation) && !a.level === !b.level;
}

export function sameRotation(a: Rotation | undefined, b: Rotation | undefined): boolean {
  const none = Rational.zero;
  return (a?.radian ?? none).equals(b?.radian ?? none) && (a?.cycle ?? none).equals(b?.cycle ?? none);
}

function degreesOf(a: Unit): Rational | undefined {
  return a.offset?.kind === 'temperature' ? Rational.one : a.degrees;
}

function assemble(dimension: Dimension, scale: Scale | undefined, rotation: Rotation | undefined, degrees: Rational | undefined, text: string): Unit {
  const turns = rotation && !(rotation.radian.isZero && rotation.cycle.isZero) ? { rotation } : {};
  return { dimension, scale, ...turns, ...(degrees && !degrees.isZero ? { degrees } : {}), text };
}

function addRotation(a: Rotation | undefined, b: Rotation | undefined): Rotation | undefined {
  if (!a || !b) return a ?? b;
  return { radian: a.radian.add(b.radian), cycle: a.cycle.add(b.cycle) };
}

function addDegrees(a: Rational | undefined, b: Rational | undefined): Rational | undefined {
  return a && b ? a.add(b) : (a ?? b);
}
