/** Products of as few symbols as possible: the circuits of the matroid of dimensions, by number of symbols. */
import { gcd, Rational } from '../quantities/rational.ts';
import { basesOf, primitive } from './matrix.ts';
import type { KnownSymbol } from './system.ts';

/** The most subsets that are tried; complete sizes only, so the shortest products are never missed for longer ones. */
const subsetLimit = 20_000;

/**
 * Dimensionless products in which no symbol can be left out, over symbols of different dimensions and the dependent one.
 * All subsets of 2, 3 … symbols are tried as long as a whole size stays within `subsetLimit`: with 30 distinct dimensions that
 * is every product of up to 3 symbols, with 15 every product of up to 7. One subset costs O(s² b).
 */
export function shortestProducts(leads: readonly KnownSymbol[], dependent: KnownSymbol | undefined): ReadonlyMap<string, Rational>[] {
  const symbols = dependent ? [dependent, ...leads] : leads;
  const bases = basesOf(symbols.map((symbol) => symbol.dimension));
  const columns = symbols.map((symbol) => columnOf(symbol, bases));
  const found: ReadonlyMap<string, Rational>[] = [];
  let left = subsetLimit;
  for (let count = 2; count <= Math.min(bases.length + 1, symbols.length); count++) {
    left -= binomial(symbols.length, count);
    if (left < 0) break;
    for (const subset of subsets(symbols.length, count)) {
      const product = circuit(subset.map((at) => columns[at] as Column));
      if (product) found.push(new Map(subset.map((at, k) => [(symbols[at] as KnownSymbol).name, product[k] as Rational])));
    }
  }
  return found;
}

/** Integer exponents of a dimension and the factor that made them whole. */
interface Column {
  readonly whole: readonly number[];
  readonly by: number;
}

function columnOf({ dimension }: KnownSymbol, bases: readonly string[]): Column {
  const powers = bases.map((base) => dimension.exponent(base));
  const by = powers.reduce((lcm, { den }) => (lcm / gcd(lcm, den)) * den, 1n);
  return { whole: powers.map((power) => Number(power.num * (by / power.den))), by: Number(by) };
}

/** The exponents of the only product of these columns, where it needs all of them; undefined otherwise. */
function circuit(columns: readonly Column[]): Rational[] | undefined {
  const width = columns.length;
  const table = (columns[0] as Column).whole.map((_value, row) => columns.map((column) => column.whole[row] as number));
  const pivots = reduce(table, width - 1);
  if (!pivots || table.slice(width - 1).some((row) => row[width - 1] !== 0)) return undefined;
  // Row k now reads lead · x_k + last · x_{width-1} = 0; with x_{width-1} = 1 every x_k is a fraction.
  const parts: Rational[] = [];
  for (let k = 0; k < width - 1; k++) {
    const row = table[k] as number[];
    if (row[width - 1] === 0) return undefined;
    parts.push(Rational.of(-(row[width - 1] as number) * (columns[k] as Column).by, row[k] as number));
  }
  return primitive([...parts, Rational.of((columns[width - 1] as Column).by)]);
}

/** Gauss-Jordan elimination in place on the first `count` columns; false where they depend on each other or grow inexact. */
function reduce(table: number[][], count: number): boolean {
  for (let column = 0; column < count; column++) {
    const at = table.findIndex((row, index) => index >= column && row[column] !== 0);
    if (at < 0) return false;
    [table[column], table[at]] = [table[at] as number[], table[column] as number[]];
    const lead = table[column] as number[];
    const pivot = lead[column] as number;
    for (const row of table) {
      const own = row[column] as number;
      if (row === lead || own === 0) continue;
      for (let k = 0; k < row.length; k++) {
        row[k] = (row[k] as number) * pivot - own * (lead[k] as number);
        if (!Number.isSafeInteger(row[k])) return false;
      }
    }
  }
  return true;
}

function* subsets(size: number, count: number, from = 0): Generator<number[]> {
  if (count === 0) {
    yield [];
    return;
  }
  for (let at = from; at <= size - count; at++) for (const rest of subsets(size, count - 1, at + 1)) yield [at, ...rest];
}

function binomial(n: number, k: number): number {
  let value = 1;
  for (let at = 1; at <= k; at++) value = (value * (n - k + at)) / at;
  return value;
}
