import { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';
import { type Literal, literalNumber } from './literal.ts';
import type { Factor, Measure, Reading } from './measure.ts';

const close = 1e-9;
/** Units that lie so close are one, and one number that converts may be a little off: 8.76 for a thousand hours of a year, 6356 for the inches of warm water that make a horsepower. */
const alone = 2.5e-3;
/** Keeps the search to some thousand products. */
const mostPerSide = 6;
const tau = 2 * Math.PI;

/** Pairs of readings, one of each side, in which both numbers are counted in the same scale; literal factors may convert. */
export function matchScales(a: Measure, b: Measure): readonly (readonly [Reading, Reading])[] {
  const pairs: [Reading, Reading][] = [];
  const turns = turnFactors(a, b);
  for (const left of a.readings) {
    for (const right of b.readings) {
      if (turns[0] === 1 && left.scale === right.scale) pairs.push([left, right]);
      else pairs.push(...convertedPairs(a, left, b, right, turns));
    }
  }
  return pairs.slice(0, 16);
}

/** The factor between two single readings, `left = factor · right`, for the message about a missing conversion; with the turns it needs. */
export function missingFactor(a: Measure, b: Measure): { readonly ratio: number; readonly plain: number; readonly turns: number } | undefined {
  const [left, right] = [a.readings[0], b.readings[0]];
  if (!left || !right) return undefined;
  const turns = turnFactors(a, b)[0] as number;
  const ratio = (left.scale.toNumber() * turns) / right.scale.toNumber();
  return { ratio: simplest(ratio, turns, products(converting(a), converting(b))), plain: ratio, turns };
}

/** The literals that may have been meant to convert: a 2 or a 1/4 is none. */
function converting(measure: Measure): readonly Factor[] {
  return measure.factors.filter((factor) => !isPlain(factor));
}

/** What is still missing once the conversions that are there have been taken for such: 2π alone, or the number that is shortest to write. */
function simplest(ratio: number, turns: number, made: readonly Product[]): number {
  const plain = made.map((product) => ratio / product.size).find((each) => Math.abs(each / turns - 1) < close && turns !== 1);
  if (plain !== undefined) return plain;
  let best = { size: ratio, digits: digitsOf(ratio, close) };
  for (const product of made) {
    const size = ratio / product.size;
    const digits = digitsOf(size, product.tolerance + close);
    const nearer = digits === best.digits && digits < 20 && Math.abs(Math.log(size)) < Math.abs(Math.log(best.size)) - close;
    if (digits < best.digits || nearer) best = { size: rounded(size, product.tolerance + close), digits };
  }
  return best.size;
}

/** How many digits a factor or its reciprocal needs within a tolerance; powers of ten need none. */
function digitsOf(size: number, tolerance: number): number {
  return Math.min(shortest(size, tolerance), shortest(1 / size, tolerance));
}

function shortest(size: number, tolerance: number): number {
  if (!(size >= 1) || size > 1e9) return 20;
  for (let digits = 1; digits < 8; digits++) {
    const plain = Number(size.toPrecision(digits));
    if (Math.abs(plain / size - 1) <= tolerance) return Number.isInteger(Math.log10(plain)) ? 0 : digits + (Number.isInteger(plain) ? 0 : 1);
  }
  return 20;
}

/** The short number that a factor comes to within the tolerance of rounded conversions beside it. */
function rounded(size: number, tolerance: number): number {
  const up = size >= 1 ? size : 1 / size;
  for (let digits = 1; digits < 8; digits++) {
    const plain = Number(up.toPrecision(digits));
    if (Math.abs(plain / up - 1) <= tolerance) return size >= 1 ? plain : 1 / plain;
  }
  return size;
}

/**
 * Factors that rotation puts between the numbers of two sides: 1 where both count alike or one counts neither; 2π per
 * exponent between revolutions and radians.
 */
function turnFactors(a: Measure, b: Measure): readonly number[] {
  if (a.radian === b.radian && a.cycle === b.cycle) return [1];
  const plainA = a.radian === 0 && a.cycle === 0;
  const plainB = b.radian === 0 && b.cycle === 0;
  const factor = tau ** (a.cycle - b.cycle);
  if (plainA || plainB) return factor === 1 ? [1] : [1, factor];
  return a.radian + a.cycle === b.radian + b.cycle ? [factor] : [1, factor];
}

function convertedPairs(a: Measure, left: Reading, b: Measure, right: Reading, turns: readonly number[]): [Reading, Reading][] {
  if (turns[0] === 1 && left.scale.equals(right.scale)) return [[left, right]];
  const ratio = left.scale.toNumber() / right.scale.toNumber();
  const slack = close + 3 * (left.scale.uncertainty + right.scale.uncertainty);
  for (const product of products(a.factors, b.factors)) {
    for (const turn of turns) {
      if (Math.abs((ratio * turn) / product.size - 1) > Math.max(slack + product.tolerance, product.numbers < 2 ? alone : 0)) continue;
      const scale = commonScale(left, right, product, turn);
      return [[{ ...left, scale }, { ...right, scale }]];
    }
  }
  return [];
}

/** The scale that both numbers are counted in once their conversions are taken out: the one that needs no rounding. */
function commonScale(left: Reading, right: Reading, product: Product, turn: number): Scale {
  if (product.right === 1) return right.scale;
  if (product.left === 1 && turn === 1) return left.scale;
  const value = Rational.parse(product.right.toPrecision(15));
  return value && value.sign > 0 ? right.scale.div(Scale.of(value)) : right.scale;
}

interface Product {
  /** What the left factors chosen come to, over what the right ones come to. */
  readonly size: number;
  readonly left: number;
  readonly right: number;
  readonly tolerance: number;
  /** How many literals it is made of. */
  readonly numbers: number;
}

/** Products of every choice of conversions among the literal factors; the empty choice first. */
function products(left: readonly Factor[], right: readonly Factor[]): readonly Product[] {
  let found: Product[] = [{ size: 1, left: 1, right: 1, tolerance: 0, numbers: 0 }];
  const extend = (factor: Factor, side: 'left' | 'right'): void => {
    const before = found;
    for (const plain of partsOf(factor.literal)) {
      const part = plain ** (factor.power ?? 1);
      const more = before.map((each) => {
        const [l, r] = side === 'left' ? [each.left * part, each.right] : [each.left, each.right * part];
        return { size: l / r, left: l, right: r, tolerance: each.tolerance + factor.literal.tolerance * Math.abs(factor.power ?? 1), numbers: each.numbers + 1 };
      });
      found = found.concat(more);
    }
  };
  for (const factor of likeliest(left)) extend(factor, 'left');
  for (const factor of likeliest(right)) extend(factor, 'right');
  return found;
}

/** Where there are too many, small pure numbers are the last to convert. */
function likeliest(factors: readonly Factor[]): readonly Factor[] {
  if (factors.length <= mostPerSide) return factors;
  return [...factors].sort((a, b) => Number(isPlain(a)) - Number(isPlain(b))).slice(0, mostPerSide);
}

function isPlain({ literal }: Factor): boolean {
  return literal.pure && !literal.value.abs().equals(ten) && !literal.value.abs().inv().equals(ten);
}

const ten = Rational.of(10);

const parts = new WeakMap<Literal, readonly number[]>();
/** A day and a year in hours, a year in days, of which only part is worked. */
const duties: readonly (readonly [least: number, most: number, whole: number])[] = [[2, 23, 24], [150, 366, 365.25], [1000, 8784, 8766]];

/** `P*6000` in kWh/a: the number counts hours in a year. */
function dutyOf(plain: number): readonly number[] {
  if (!Number.isInteger(plain)) return [];
  return duties.flatMap(([least, most, whole]) => (plain >= least && plain <= most ? [whole] : []));
}

/** Conversions that engineers fold into one number with a pure one: 120 is 2 times 60, 20 is 2 times 10. */
const foldable = [10, 100, 1000, 1e4, 1e5, 1e6, 60, 3600, 86400];

/** The conversions a literal may stand for: itself, or a familiar one that leaves a pure number. */
function partsOf(literal: Literal): readonly number[] {
  let found = parts.get(literal);
  if (!found) {
    const size = literalNumber(literal);
    const plain = literal.value.toNumber();
    const inner = literal.pure ? [] : foldable.flatMap((each) => [each, 1 / each]).filter((each) => literal.value.num !== 0n && isSmall(plain / each) && Math.abs(size / each - 1) > close);
    found = [size, ...inner, ...(literal.pi === 0 ? dutyOf(plain) : [])];
    parts.set(literal, found);
  }
  return found;
}

function isSmall(value: number): boolean {
  const size = Math.abs(value);
  const whole = size >= 1 ? size : 1 / size;
  return whole > 1 && whole <= 12 && whole !== 10 && Math.abs(whole - Math.round(whole)) < close;
}
