/**
 * Arithmetic on closed intervals of real numbers: the result holds every value that the operands can give, and for one operation
 * no more than that (R. E. Moore, Interval Analysis, 1966). `outward` rounds the ends away from each other by two units in
 * the last place, so that rounding keeps the promise. Undefined: some of the operands' values have no result.
 */
import type { Elementary, ElementaryName } from './elementary.ts';
import type { Rational } from '../../quantities/rational.ts';

export interface Interval {
  readonly low: number;
  readonly high: number;
}

export class IntervalArithmetic {
  constructor(
    readonly point: Elementary,
    private readonly outward: boolean,
  ) {}

  add(a: Interval, b: Interval): Interval | undefined {
    return this.between(this.point.add(a.low, b.low), this.point.add(a.high, b.high));
  }

  subtract(a: Interval, b: Interval): Interval | undefined {
    return this.between(this.point.subtract(a.low, b.high), this.point.subtract(a.high, b.low));
  }

  multiply(a: Interval, b: Interval): Interval | undefined {
    return this.hull(corners(a, b, this.point.multiply));
  }

  divide(a: Interval, b: Interval): Interval | undefined {
    return holds(b, 0) ? undefined : this.hull(corners(a, b, this.point.divide));
  }

  /** A constant rational power: whole powers of anything, others of what is not negative, odd roots of everything. */
  power(a: Interval, exponent: Rational): Interval | undefined {
    if (exponent.isZero) return { low: 1, high: 1 };
    if (exponent.sign < 0) {
      const below = holds(a, 0) ? undefined : this.power(a, exponent.neg());
      return below && this.divide({ low: 1, high: 1 }, below);
    }
    const oddRoot = exponent.den % 2n === 1n;
    if (a.low < 0 && !oddRoot) return undefined;
    const size = exponent.toNumber();
    const at = (x: number): number => (x < 0 ? (exponent.num % 2n === 0n ? 1 : -1) * this.point.power(-x, size) : this.point.power(x, size));
    const ends = [at(a.low), at(a.high)];
    return this.hull(a.low < 0 && a.high > 0 ? [...ends, 0] : ends);
  }

  /** `a^b` for positive `a`: monotonic in each, so the corners hold the ends. */
  exponential(a: Interval, b: Interval): Interval | undefined {
    return a.low > 0 ? this.hull(corners(a, b, this.point.power)) : undefined;
  }

  abs(a: Interval): Interval {
    const ends = [Math.abs(a.low), Math.abs(a.high)];
    return { low: holds(a, 0) ? 0 : Math.min(...ends), high: Math.max(...ends) };
  }

  extreme(which: 'min' | 'max', all: readonly Interval[]): Interval {
    const pick = which === 'min' ? Math.min : Math.max;
    return { low: pick(...all.map((each) => each.low)), high: pick(...all.map((each) => each.high)) };
  }

  /** The angle of a point of a box that stays clear of the cut along the negative x axis: no extreme lies inside. */
  atan2(y: Interval, x: Interval): Interval | undefined {
    const clear = x.low > 0 || y.low > 0 || y.high < 0 || (isPoint(x) && isPoint(y));
    return clear ? this.hull(corners(y, x, this.point.atan2)) : undefined;
  }

  function(name: ElementaryName, a: Interval): Interval | undefined {
    const [least, most] = domains[name] ?? [-Infinity, Infinity];
    if (a.low < least || a.high > most || ((name === 'ln' || name === 'lg' || name === 'lb') && a.low <= 0)) return undefined;
    const ends = [this.point.of[name](a.low), this.point.of[name](a.high)];
    if (name === 'cosh' && holds(a, 0)) return this.hull([...ends, 1]);
    if (name === 'tan' && reaches(a, Math.PI / 2, Math.PI)) return undefined;
    if (name !== 'sin' && name !== 'cos') return this.hull(ends);
    const top = name === 'sin' ? Math.PI / 2 : 0;
    if (reaches(a, top, 2 * Math.PI)) ends.push(1);
    if (reaches(a, top + Math.PI, 2 * Math.PI)) ends.push(-1);
    const waves = this.hull(ends);
    return waves && { low: Math.max(-1, waves.low), high: Math.min(1, waves.high) };
  }

  /** The least interval that holds the values; undefined where one of them is none. */
  hull(values: readonly number[]): Interval | undefined {
    return this.between(Math.min(...values), Math.max(...values));
  }

  private between(low: number, high: number): Interval | undefined {
    if (!Number.isFinite(low) || !Number.isFinite(high)) return undefined;
    return this.outward ? { low: low - step(low), high: high + step(high) } : { low, high };
  }
}

export function holds(a: Interval, value: number): boolean {
  return a.low <= value && value <= a.high;
}

export function pointAt(value: number): Interval {
  return { low: value, high: value };
}

export function isPoint(a: Interval): boolean {
  return a.low === a.high;
}

const domains: Partial<Record<ElementaryName, readonly [number, number]>> = { sqrt: [0, Infinity], asin: [-1, 1], acos: [-1, 1] };

/** Two units in the last place; nothing at zero, where sums and products of other numbers are exact. */
function step(value: number): number {
  return Math.abs(value) * 2 * Number.EPSILON;
}

function corners(a: Interval, b: Interval, at: (x: number, y: number) => number): number[] {
  return [at(a.low, b.low), at(a.low, b.high), at(a.high, b.low), at(a.high, b.high)];
}

/** Whether `first + k·period` lies in the interval for a whole k. */
function reaches(a: Interval, first: number, period: number): boolean {
  return first + Math.ceil((a.low - first) / period) * period <= a.high;
}
