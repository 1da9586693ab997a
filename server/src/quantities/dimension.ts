import { Rational } from './rational.ts';

/** Grows with the distinct dimensions met, some hundreds in practice. */
const interned: Map<string, Dimension> = new Map();

/** The seven base dimensions of ISO 80000-1, in its order. Projects may declare more by name. */
export const baseDimensions = ['L', 'M', 'T', 'I', 'Θ', 'N', 'J'] as const;

/**
 * A dimension: exact exponents over base dimensions. Interned, so that two equal dimensions are the same object and `===`
 * compares them.
 */
export class Dimension {
  private readonly products = new Map<Dimension, Dimension>();
  private inverse: Dimension | undefined;

  private constructor(
    /** Base dimensions with exponents that are not zero, in canonical order. */
    readonly exponents: readonly (readonly [base: string, exponent: Rational])[],
    readonly key: string,
  ) {}

  static readonly one: Dimension = Dimension.from([]);

  /** The dimension with these exponents; repeated bases add up, zeros drop out. */
  static from(entries: Iterable<readonly [string, Rational]>): Dimension {
    const sum = new Map<string, Rational>();
    for (const [base, exponent] of entries) sum.set(base, (sum.get(base) ?? Rational.zero).add(exponent));
    const kept = [...sum].filter(([, exponent]) => !exponent.isZero).sort(([a], [b]) => order(a) - order(b) || (a < b ? -1 : 1));
    const key = kept.map(([base, exponent]) => `${base}:${exponent}`).join(' ');
    let found = interned.get(key);
    if (!found) {
      found = new Dimension(kept, key);
      interned.set(key, found);
    }
    return found;
  }

  static base(name: string): Dimension {
    return Dimension.from([[name, Rational.one]]);
  }

  get isOne(): boolean {
    return this.exponents.length === 0;
  }

  exponent(base: string): Rational {
    return this.exponents.find(([name]) => name === base)?.[1] ?? Rational.zero;
  }

  mul(other: Dimension): Dimension {
    if (other.isOne) return this;
    if (this.isOne) return other;
    let product = this.products.get(other);
    if (!product) {
      product = Dimension.from([...this.exponents, ...other.exponents]);
      this.products.set(other, product);
    }
    return product;
  }

  div(other: Dimension): Dimension {
    other.inverse ??= other.pow(Rational.minusOne);
    return this.mul(other.inverse);
  }

  pow(power: Rational): Dimension {
    if (power.isOne || this.isOne) return this;
    return Dimension.from(this.exponents.map(([base, exponent]) => [base, exponent.mul(power)] as const));
  }

  /** `L M T⁻²`-like text in ISO order: `M L⁻¹ T⁻²` for pressure, `1` for a number. */
  toString(): string {
    if (this.isOne) return '1';
    const printed = [...this.exponents].sort(([a], [b]) => printOrder(a) - printOrder(b));
    return printed.map(([base, exponent]) => base + (exponent.isOne ? '' : superscript(exponent))).join(' ');
  }
}



function order(base: string): number {
  const at = (baseDimensions as readonly string[]).indexOf(base);
  return at < 0 ? baseDimensions.length : at;
}

/** Mass first, as engineers write it: `M L⁻¹ T⁻²`. */
function printOrder(base: string): number {
  return base === 'M' ? -1 : order(base);
}

const raised: Record<string, string> = { '-': '⁻', '/': 'ᐟ', '0': '⁰', '1': '¹', '2': '²', '3': '³', '4': '⁴', '5': '⁵', '6': '⁶', '7': '⁷', '8': '⁸', '9': '⁹' };

/** An exponent in superscript digits: `⁻²`, `¹ᐟ²`. */
export function superscript(exponent: Rational): string {
  return [...exponent.toString()].map((c) => raised[c] ?? c).join('');
}
