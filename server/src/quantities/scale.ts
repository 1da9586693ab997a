import { Rational } from './rational.ts';

/** A rational base under a fractional exponent between 0 and 1, as in the scale of `kPa^0.5`. */
interface Root {
  readonly base: Rational;
  readonly exponent: Rational;
}

/**
 * The positive factor that turns a number counted in a unit into the coherent SI unit.
 * Exact: a rational times a power of π, with fractional powers kept as roots. A unit that is defined by measurement
 * (dalton, electronvolt mass) carries a float beside the exact part, with its relative uncertainty.
 */
export class Scale {
  static readonly one = new Scale(Rational.one, Rational.zero, [], 1, 0);

  private constructor(
    readonly rational: Rational,
    readonly pi: Rational,
    readonly roots: readonly Root[],
    /** Measured factor; 1 for exact scales. */
    readonly measured: number,
    /** Relative standard uncertainty; 0 for exact scales. */
    readonly uncertainty: number,
  ) {}

  /** `rational · π^pi`. Throws RangeError unless the rational is positive. */
  static of(rational: Rational, pi: Rational = Rational.zero): Scale {
    if (rational.sign <= 0) throw new RangeError('a scale is positive');
    return rational.isOne && pi.isZero ? Scale.one : new Scale(rational, pi, [], 1, 0);
  }

  /** A factor known by measurement, with its relative standard uncertainty. */
  static measuredAs(value: number, uncertainty: number): Scale {
    return new Scale(Rational.one, Rational.zero, [], value, uncertainty);
  }

  static readonly pi = Scale.of(Rational.one, Rational.one);

  get isExact(): boolean {
    return this.measured === 1 && this.uncertainty === 0;
  }

  get isOne(): boolean {
    return this === Scale.one || this.equals(Scale.one);
  }

  mul(other: Scale): Scale {
    if (this === Scale.one) return other;
    if (other === Scale.one) return this;
    return normal(
      this.rational.mul(other.rational),
      this.pi.add(other.pi),
      [...this.roots, ...other.roots],
      this.measured * other.measured,
      Math.hypot(this.uncertainty, other.uncertainty),
    );
  }

  div(other: Scale): Scale {
    return other === Scale.one ? this : this.mul(other.pow(Rational.minusOne));
  }

  pow(power: Rational): Scale {
    if (power.isOne || this === Scale.one) return this;
    const whole = power.isInteger ? this.rational.pow(Number(power.num)) : Rational.one;
    const roots = this.roots.map((root) => ({ base: root.base, exponent: root.exponent.mul(power) }));
    if (!power.isInteger) roots.push({ base: this.rational, exponent: power });
    return normal(whole, this.pi.mul(power), roots, this.measured ** power.toNumber(), this.uncertainty * Math.abs(power.toNumber()));
  }

  /** Exact equality for exact scales; within three uncertainties where one is measured. */
  equals(other: Scale): boolean {
    if (this === other) return true;
    if (!this.isExact || !other.isExact) {
      const tolerance = Math.max(3 * Math.hypot(this.uncertainty, other.uncertainty), 1e-14);
      return Math.abs(this.toNumber() / other.toNumber() - 1) <= tolerance;
    }
    if (!this.pi.equals(other.pi)) return false;
    if (this.roots.length === 0 && other.roots.length === 0) return this.rational.equals(other.rational);
    return isUnity(this.div(other));
  }

  toNumber(): number {
    let value = this.rational.toNumber() * Math.PI ** this.pi.toNumber() * this.measured;
    for (const root of this.roots) value *= root.base.toNumber() ** root.exponent.toNumber();
    return value;
  }

  /** Canonical text of the scale, for keys; equal exact scales without roots have equal keys. */
  get key(): string {
    const roots = this.roots.map((root) => `${root.base}^${root.exponent}`).join('*');
    return `${this.rational}|${this.pi}|${roots}|${this.measured}`;
  }

  /** Used by the arithmetic above only. */
  static raw(rational: Rational, pi: Rational, roots: readonly Root[], measured: number, uncertainty: number): Scale {
    return new Scale(rational, pi, roots, measured, uncertainty);
  }
}

/** Folds rational roots into the rational part and like roots into one. */
function normal(rational: Rational, pi: Rational, roots: readonly Root[], measured: number, uncertainty: number): Scale {
  if (roots.length === 0) {
    return rational.isOne && pi.isZero && measured === 1 && uncertainty === 0
      ? Scale.one
      : Scale.raw(rational, pi, [], measured, uncertainty);
  }
  const merged = new Map<string, Root>();
  for (const root of roots) {
    const key = root.base.toString();
    merged.set(key, { base: root.base, exponent: (merged.get(key)?.exponent ?? Rational.zero).add(root.exponent) });
  }
  let whole = rational;
  const kept: Root[] = [];
  for (const { base, exponent } of merged.values()) {
    const floor = floorOf(exponent);
    whole = whole.mul(base.pow(floor));
    const rest = exponent.sub(Rational.of(floor));
    if (rest.isZero || base.isOne) continue;
    const exact = base.root(Number(rest.den));
    if (exact) whole = whole.mul(exact.pow(Number(rest.num)));
    else kept.push({ base, exponent: rest });
  }
  kept.sort((a, b) => a.base.compare(b.base));
  return kept.length === 0 ? normal(whole, pi, [], measured, uncertainty) : Scale.raw(whole, pi, kept, measured, uncertainty);
}

/** Whether an exact scale is 1, decided on integer powers: raise to the roots' common denominator. */
function isUnity(scale: Scale): boolean {
  if (!scale.pi.isZero) return false;
  const common = scale.roots.reduce((lcm, root) => lcm * Number(root.exponent.den), 1);
  if (common > 64) return Math.abs(scale.toNumber() - 1) < 1e-12;
  let product = scale.rational.pow(common);
  for (const root of scale.roots) product = product.mul(root.base.pow(Number(root.exponent.mul(Rational.of(common)).num)));
  return product.isOne;
}

function floorOf(value: Rational): number {
  const quotient = value.num / value.den;
  return Number(value.num < 0n && quotient * value.den !== value.num ? quotient - 1n : quotient);
}
