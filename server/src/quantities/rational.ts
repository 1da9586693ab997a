/**
 * Exact rational numbers. Immutable, always reduced, denominator positive.
 * Exponents, scales and ranks are decided with these and never with floating point.
 */
export class Rational {
  static readonly zero = new Rational(0n, 1n);
  static readonly one = new Rational(1n, 1n);
  static readonly minusOne = new Rational(-1n, 1n);

  private constructor(
    readonly num: bigint,
    readonly den: bigint,
  ) {}

  /** `num/den`, reduced. Throws RangeError for a zero denominator. */
  static of(num: bigint | number, den: bigint | number = 1n): Rational {
    let n = BigInt(num);
    let d = BigInt(den);
    if (d === 1n) return Rational.whole(n);
    if (d === 0n) throw new RangeError('zero denominator');
    if (d < 0n) {
      n = -n;
      d = -d;
    }
    const g = gcd(n, d);
    return d === g ? Rational.whole(n / g) : new Rational(n / g, d / g);
  }

  /** Reads `12`, `-0.5`, `1.5e-3`, `3/4`; undefined for anything else or for more than 400 digits. */
  static parse(text: string): Rational | undefined {
    const match = /^\s*([+-]?)(\d*)(?:\.(\d*))?(?:[eEdD]([+-]?\d{1,3}))?\s*(?:\/\s*(\d+))?\s*$/.exec(text);
    if (!match || text.length > 400) return undefined;
    const [, sign, whole = '', part = '', power = '0', below = '1'] = match;
    if (whole + part === '' || /^0+$/.test(below)) return undefined;
    const shift = Number(power) - part.length;
    const digits = BigInt(whole + part) * (sign === '-' ? -1n : 1n);
    const value = shift >= 0 ? Rational.whole(digits * 10n ** BigInt(shift)) : Rational.of(digits, 10n ** BigInt(-shift));
    return below === '1' ? value : value.div(Rational.whole(BigInt(below)));
  }

  get isZero(): boolean {
    return this.num === 0n;
  }
  get isOne(): boolean {
    return this.num === 1n && this.den === 1n;
  }
  get isInteger(): boolean {
    return this.den === 1n;
  }
  get sign(): -1 | 0 | 1 {
    return this.num === 0n ? 0 : this.num < 0n ? -1 : 1;
  }

  add(other: Rational): Rational {
    if (this.den === 1n && other.den === 1n) return Rational.whole(this.num + other.num);
    return Rational.of(this.num * other.den + other.num * this.den, this.den * other.den);
  }
  sub(other: Rational): Rational {
    return this.add(other.neg());
  }
  mul(other: Rational): Rational {
    if (this.isOne) return other;
    if (other.isOne) return this;
    return Rational.of(this.num * other.num, this.den * other.den);
  }
  /** Throws RangeError when `other` is zero. */
  div(other: Rational): Rational {
    return other.isOne ? this : Rational.of(this.num * other.den, this.den * other.num);
  }
  neg(): Rational {
    return this.den === 1n ? Rational.whole(-this.num) : new Rational(-this.num, this.den);
  }
  abs(): Rational {
    return this.num < 0n ? this.neg() : this;
  }
  inv(): Rational {
    return Rational.of(this.den, this.num);
  }
  /** Integer power. Throws RangeError for zero to a negative power. */
  pow(power: number): Rational {
    if (power < 0) return this.inv().pow(-power);
    return Rational.of(this.num ** BigInt(power), this.den ** BigInt(power));
  }
  /** The exact n-th root where it is rational, for n > 0. */
  root(n: number): Rational | undefined {
    const num = integerRoot(this.num, n);
    const den = integerRoot(this.den, n);
    return num === undefined || den === undefined ? undefined : Rational.of(num, den);
  }
  compare(other: Rational): -1 | 0 | 1 {
    const left = this.num * other.den;
    const right = other.num * this.den;
    return left < right ? -1 : left > right ? 1 : 0;
  }
  equals(other: Rational): boolean {
    return this.num === other.num && this.den === other.den;
  }
  toNumber(): number {
    return bigRatio(this.num, this.den);
  }
  /** `3`, `-1/2`. */
  toString(): string {
    return this.den === 1n ? this.num.toString() : `${this.num}/${this.den}`;
  }

  private static whole(n: bigint): Rational {
    if (n < -16n || n > 16n) return new Rational(n, 1n);
    const at = Number(n) + 16;
    const known = small[at] ?? new Rational(n, 1n);
    small[at] = known;
    return known;
  }
}

const small: Rational[] = [];

export function gcd(a: bigint, b: bigint): bigint {
  let x = a < 0n ? -a : a;
  let y = b < 0n ? -b : b;
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

function integerRoot(value: bigint, n: number): bigint | undefined {
  if (value < 0n) {
    const positive = n % 2 === 1 ? integerRoot(-value, n) : undefined;
    return positive === undefined ? undefined : -positive;
  }
  if (value < 2n) return value;
  let low = 1n;
  let high = 1n << BigInt(Math.ceil(value.toString(2).length / n) + 1);
  while (low < high) {
    const middle = (low + high) >> 1n;
    if (middle ** BigInt(n) < value) low = middle + 1n;
    else high = middle;
  }
  return low ** BigInt(n) === value ? low : undefined;
}

function bigRatio(num: bigint, den: bigint): number {
  const direct = Number(num) / Number(den);
  if (Number.isFinite(direct) && direct !== 0) return direct;
  if (num === 0n) return 0;
  const shift = num.toString().length - den.toString().length - 17;
  const scaled = shift > 0 ? num / (den * 10n ** BigInt(shift)) : (num * 10n ** BigInt(-shift)) / den;
  return Number(`${scaled}e${shift}`);
}
