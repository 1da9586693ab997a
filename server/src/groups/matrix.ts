/** The dimensional matrix and exact elimination over the rationals. */
import { baseDimensions, type Dimension } from '../quantities/dimension.ts';
import { gcd, Rational } from '../quantities/rational.ts';

/** A sparse row: exponents by column, zeros left out. */
export type Row = ReadonlyMap<number, Rational>;

/** Base dimensions that occur in any of the dimensions, ISO 80000-1 order first and declared ones by name. */
export function basesOf(dimensions: readonly Dimension[]): string[] {
  const found = new Set(dimensions.flatMap((dimension) => dimension.exponents.map(([base]) => base)));
  const standard = baseDimensions.filter((base) => found.delete(base));
  return [...standard, ...[...found].sort()];
}

/** Rows are base dimensions, columns the dimensions. */
export function dimensionalMatrix(dimensions: readonly Dimension[], bases: readonly string[]): Rational[][] {
  return bases.map((base) => dimensions.map((dimension) => dimension.exponent(base)));
}

/**
 * An echelon form that grows one row at a time. Adding a row of n entries to a form of rank r costs O(n r) exact
 * operations, and less for sparse rows.
 */
export class Echelon {
  /** Rows by pivot column, each 1 at its pivot. */
  private readonly rows = new Map<number, Row>();

  get rank(): number {
    return this.rows.size;
  }

  /** What is left of a row after the rows held; empty where it depends on them. */
  reduce(row: Row): Map<number, Rational> {
    const rest = new Map(row);
    // A row's entries lie at or behind its pivot, so the smallest column is settled first and never comes back.
    for (let column = firstAfter(rest, -1); column >= 0; column = firstAfter(rest, column)) {
      const pivot = this.rows.get(column);
      if (pivot) subtract(rest, pivot, rest.get(column) as Rational);
    }
    return rest;
  }

  /** Adds a row; false where it depends on the rows held. */
  add(row: Row): boolean {
    const rest = this.reduce(row);
    const pivot = firstAfter(rest, -1);
    if (pivot < 0) return false;
    const lead = rest.get(pivot) as Rational;
    this.rows.set(pivot, new Map([...rest].map(([column, value]) => [column, value.div(lead)])));
    return true;
  }

  clone(): Echelon {
    const copy = new Echelon();
    for (const [pivot, row] of this.rows) copy.rows.set(pivot, row);
    return copy;
  }
}

function firstAfter(row: Row, column: number): number {
  let first = -1;
  for (const key of row.keys()) if (key > column && (first < 0 || key < first)) first = key;
  return first;
}

function subtract(row: Map<number, Rational>, other: Row, times: Rational): void {
  for (const [column, value] of other) {
    const left = (row.get(column) ?? Rational.zero).sub(value.mul(times));
    if (left.isZero) row.delete(column);
    else row.set(column, left);
  }
}

/** The exponents of a dimension as a row over `bases`. */
export function dimensionRow(dimension: Dimension, bases: readonly string[]): Map<number, Rational> {
  return new Map(dimension.exponents.map(([base, exponent]) => [bases.indexOf(base), exponent]));
}

/** Exact rank of a set of dimensions. */
export function rankOf(dimensions: readonly Dimension[]): number {
  const bases = basesOf(dimensions);
  const echelon = new Echelon();
  for (const dimension of dimensions) echelon.add(dimensionRow(dimension, bases));
  return echelon.rank;
}

/**
 * The exponents x with `∏ set[i]^x[i] = target`, for a set of independent dimensions; undefined where there are none.
 * Gauss-Jordan elimination of the r by r+1 system: O(r² b) for b base dimensions.
 */
export function expressIn(target: Dimension, set: readonly Dimension[]): Rational[] | undefined {
  const bases = basesOf([target, ...set]);
  const table = bases.map((base) => [...set.map((dimension) => dimension.exponent(base)), target.exponent(base)]);
  const width = set.length;
  let filled = 0;
  for (let column = 0; column < width; column++) {
    const found = table.findIndex((row, at) => at >= filled && !(row[column] as Rational).isZero);
    if (found < 0) return undefined;
    [table[filled], table[found]] = [table[found] as Rational[], table[filled] as Rational[]];
    eliminate(table, filled, column);
    filled++;
  }
  if (table.slice(filled).some((row) => !(row[width] as Rational).isZero)) return undefined;
  return table.slice(0, filled).map((row) => row[width] as Rational);
}

function eliminate(table: Rational[][], at: number, column: number): void {
  const lead = table[at] as Rational[];
  const inverse = (lead[column] as Rational).inv();
  for (let k = 0; k < lead.length; k++) lead[k] = (lead[k] as Rational).mul(inverse);
  for (const [index, row] of table.entries()) {
    const factor = row[column] as Rational;
    if (index === at || factor.isZero) continue;
    for (let k = 0; k < row.length; k++) row[k] = (row[k] as Rational).sub(factor.mul(lead[k] as Rational));
  }
}

/** The multiple of a vector that has the smallest integer entries, direction kept. Zero vectors stay. */
export function primitive(values: readonly Rational[]): Rational[] {
  const lcm = values.reduce((sum, { den }) => (sum / gcd(sum, den)) * den, 1n);
  const whole = values.map((value) => value.num * (lcm / value.den));
  const common = whole.reduce((sum, value) => gcd(sum, value), 0n);
  return common === 0n ? [...values] : whole.map((value) => Rational.of(value / common));
}

/** Smallest integer exponents in the same direction. */
export function wholePowers(powers: readonly (readonly [string, Rational])[]): Map<string, Rational> {
  const whole = primitive(powers.map(([, power]) => power));
  return new Map(powers.map(([name], at) => [name, whole[at] as Rational]));
}
