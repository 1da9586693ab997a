import { Rational } from '../quantities/rational.ts';

/** A number known from literals alone: `value · π^pi`, folded exactly. */
export interface Literal {
  readonly value: Rational;
  readonly pi: number;
  /** Small integers, simple fractions, π and their roots carry no hidden unit. */
  readonly pure: boolean;
  /** Half a unit of the last digit written, relative; 0 where the number is meant exactly. */
  readonly tolerance: number;
}

const largestPure = Rational.of(16);
const cache = new Map<string, Literal>();

/** The literal that a number's text stands for. */
export function readLiteral(value: Rational, text: string): Literal {
  const known = cache.get(text);
  if (known) return known;
  const tolerance = toleranceOf(value, text);
  const literal = roundedPi(value, tolerance) ?? { value, pi: 0, pure: isPure(value) && !isMeasured(value), tolerance };
  if (cache.size > 5000) cache.clear();
  cache.set(text, literal);
  return literal;
}

export function exactLiteral(value: Rational, pi = 0): Literal {
  return { value, pi, pure: isPure(value), tolerance: 0 };
}

export function multiplyLiterals(a: Literal, b: Literal): Literal {
  return { value: a.value.mul(b.value), pi: a.pi + b.pi, pure: a.pure && b.pure, tolerance: a.tolerance + b.tolerance };
}

export function invertLiteral(a: Literal): Literal | undefined {
  return a.value.isZero ? undefined : { value: a.value.inv(), pi: -a.pi, pure: a.pure, tolerance: a.tolerance };
}

export function negateLiteral(a: Literal): Literal {
  return { ...a, value: a.value.neg() };
}

/** Sum of literals, where no π is left over that cannot be added exactly. */
export function addLiterals(a: Literal, b: Literal): Literal | undefined {
  if (a.pi !== b.pi) return undefined;
  const value = a.value.add(b.value);
  return { value, pi: a.pi, pure: a.pure && b.pure && isPure(value), tolerance: Math.max(a.tolerance, b.tolerance) };
}

/** A power with a rational exponent, where it is exact and not unwieldy; a root that is not rational gives undefined. */
export function raiseLiteral(a: Literal, power: Rational): Literal | undefined {
  const whole = Number(power.num);
  const root = Number(power.den);
  if (Math.abs(whole) > 64 || root > 12 || (a.value.isZero && whole < 0) || (a.pi * whole) % root !== 0) return undefined;
  const base = root === 1 ? a.value : a.value.root(root);
  if (!base || base.num.toString().length + base.den.toString().length > 60) return undefined;
  return { value: base.pow(whole), pi: (a.pi * whole) / root, pure: a.pure, tolerance: a.tolerance * Math.abs(power.toNumber()) };
}

/** The floating-point value, for display and tolerant comparison. */
export function literalNumber(a: Literal): number {
  return a.pi === 0 ? a.value.toNumber() : a.value.toNumber() * Math.PI ** a.pi;
}

/** What of π engineers write in digits: π itself, 2π, π/2, π/4, π/180 and 180/π. */
const piParts: readonly (readonly [number, Rational, number])[] = [
  [Math.PI, Rational.one, 1], [2 * Math.PI, Rational.of(2), 1], [Math.PI / 2, Rational.of(1, 2), 1], [Math.PI / 4, Rational.of(1, 4), 1],
  [Math.PI / 180, Rational.of(1, 180), 1], [180 / Math.PI, Rational.of(180), -1],
];

/** `3.1416`, `0.7854`, `57.2958`: π in at least three digits, right within half a unit of the last. */
function roundedPi(value: Rational, tolerance: number): Literal | undefined {
  if (tolerance === 0 || tolerance > 0.002) return undefined;
  const size = value.toNumber();
  const part = piParts.find(([exact]) => Math.abs(size / exact - 1) <= tolerance);
  return part && { value: part[1], pi: part[2], pure: true, tolerance };
}

/** An exponent such as 0.333 or 0.6667 means a third or two; three digits at least. */
export function simpleExponent(literal: Literal): Rational {
  if (literal.tolerance === 0 || literal.tolerance > 0.002) return literal.value;
  const size = literal.value.toNumber();
  for (const below of [3, 6, 9]) {
    const above = Math.round(size * below);
    if (above !== 0 && above % below !== 0 && Math.abs(size / (above / below) - 1) <= literal.tolerance) return Rational.of(above, below);
  }
  return literal.value;
}

function isPure(value: Rational): boolean {
  const size = value.abs();
  if (size.den === 1n) return size.compare(largestPure) <= 0;
  return size.den <= 16n && size.num <= 64n;
}

/** A decimal such as 10.2 or 6.5 is no fraction that anybody means: it was measured, or looked up. 3.6 converts. */
function isMeasured(value: Rational): boolean {
  return value.den !== 1n && (value.num > 16n || value.compare(largestFraction) > 0) && !value.equals(kilo);
}

const largestFraction = Rational.of(5, 2);

const kilo = Rational.of(18, 5);

/** Short numbers such as 0.001, 3.6 and 1000 are meant exactly; 32.2, 0.3048 and 3412 may be rounded. */
function toleranceOf(value: Rational, text: string): number {
  const mantissa = /^[\d_]*\.?[\d_]*/.exec(text)?.[0].replaceAll('_', '') ?? '';
  const digits = mantissa.replace('.', '').replace(/^0+/, '');
  const significant = digits.replace(/0+$/, '');
  if (value.isZero) return 0;
  if (!/\.\d/.test(mantissa)) return significant.length < 3 ? 0 : 0.5 / Number(significant);
  return significant.length < 2 ? 0 : 0.5 / Number(digits);
}
