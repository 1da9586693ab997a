import { literalNumber } from './literal.ts';
import type { Factor, Measure, Reading } from './measure.ts';

const close = 1e-9;
/** Keeps the search to 2^12 products. */
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
export function missingFactor(a: Measure, b: Measure): { readonly ratio: number; readonly turns: number } | undefined {
  const [left, right] = [a.readings[0], b.readings[0]];
  if (!left || !right) return undefined;
  const turns = turnFactors(a, b)[0] as number;
  return { ratio: (left.scale.toNumber() * turns) / right.scale.toNumber(), turns };
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
  const products = subsets(a.factors, b.factors);
  for (const product of products) {
    for (const turn of turns) {
      if (Math.abs((ratio * turn) / product.size - 1) <= slack + product.tolerance) return [[{ ...left, scale: right.scale }, right]];
    }
  }
  return [];
}

interface Product {
  readonly size: number;
  readonly tolerance: number;
}

/** Products of every subset of the literal factors, those of the right side inverted; the empty product first. */
function subsets(left: readonly Factor[], right: readonly Factor[]): readonly Product[] {
  let products: Product[] = [{ size: 1, tolerance: 0 }];
  const extend = (factor: Factor, power: 1 | -1): void => {
    const size = literalNumber(factor.literal) ** power;
    products = products.concat(products.map((p) => ({ size: p.size * size, tolerance: p.tolerance + factor.literal.tolerance })));
  };
  for (const factor of left.slice(0, mostPerSide)) extend(factor, 1);
  for (const factor of right.slice(0, mostPerSide)) extend(factor, -1);
  return products;
}
