/** A unit expression as a flat product: what the reader makes, before it becomes one unit. */
import type { Rational } from './rational.ts';
import type { UnitHint } from './unit-result.ts';
import { multiply, pureNumber, raise, scaledBy, type Unit } from './unit.ts';

/** One symbol or number of the product with its power; offsets are those of the plain text. */
export interface Factor {
  readonly unit: Unit;
  /** As it is spelled without doubt: `degC` for a `C` that is a degree. */
  readonly text: string;
  readonly power: Rational;
  readonly start: number;
  readonly end: number;
  /** How surely these characters are a unit. */
  readonly sure: Sureness;
  /** A letter that context decides on: C, F or R. */
  readonly open?: 'C' | 'F' | 'R' | undefined;
  /** Below a slash. */
  readonly below: boolean;
  readonly hint?: UnitHint['kind'] | undefined;
}

/** `number`: a factor in front; `word`: also an English word; `weak`: read only where nothing else fits. */
export type Sureness = 'sure' | 'word' | 'weak' | 'number';

/** The product as one unit. A single factor keeps its offset and level. */
export function productOf(factors: readonly Factor[], text: string): Unit {
  const units = factors.filter((factor) => factor.sure !== 'number');
  const numbers = factors.filter((factor) => factor.sure === 'number');
  let unit: Unit | undefined;
  for (const factor of units) {
    const next = raise(factor.unit, factor.power, text);
    unit = unit ? multiply(unit, next, text) : next;
  }
  let product = unit ?? { ...pureNumber, text };
  for (const factor of numbers) {
    const scale = factor.unit.scale?.pow(factor.power);
    if (scale) product = scaledBy(withoutZero(product), scale, text);
  }
  return product;
}

/** A number in front of a point on a scale makes it a difference. */
function withoutZero(unit: Unit): Unit {
  return unit.offset ? multiply(unit, pureNumber, unit.text) : unit;
}

/** The product spelled without doubt: `kg/(m^2 s)`. */
export function spelledOut(factors: readonly Factor[]): string {
  const above = factors.filter((factor) => factor.power.sign > 0).map((factor) => powered(factor.text, factor.power));
  const below = factors.filter((factor) => factor.power.sign < 0).map((factor) => powered(factor.text, factor.power.neg()));
  const top = above.join(' ') || '1';
  if (below.length === 0) return top;
  return below.length > 1 ? `${top}/(${below.join(' ')})` : `${top}/${below[0]}`;
}

function powered(text: string, power: Rational): string {
  if (power.isOne) return text;
  const base = /^[^\s/*^()]+$/.test(text) ? text : `(${text})`;
  return power.isInteger ? `${base}^${power}` : `${base}^(${power})`;
}

export function invert(factors: readonly Factor[]): readonly Factor[] {
  return factors.map((factor) => ({ ...factor, power: factor.power.neg() }));
}

export function raiseAll(factors: readonly Factor[], power: Rational): readonly Factor[] {
  return power.isOne ? factors : factors.map((factor) => ({ ...factor, power: factor.power.mul(power) }));
}
