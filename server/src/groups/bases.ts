/** Sets of repeating symbols: bases of the matroid of dimensions, listed lazily and counted without listing. */
import type { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import { dimensionRow, Echelon, expressIn, primitive } from './matrix.ts';
import { firstBase, type KnownSymbol, type System } from './system.ts';
import type { SetCount } from './types.ts';

/** Symbols that may repeat: the active ones without the dependent symbol, which belongs to the first group only. */
export function mayRepeat(system: System): KnownSymbol[] {
  return system.active.filter((symbol) => symbol.name !== system.dependent);
}

/**
 * Every valid set of repeating symbols, in the order of the relation, one at a time. A branch is entered only where the
 * symbols still to come can complete it, so the work between two sets is bounded: O(n² r b).
 */
export function* repeatingSets(system: System): Generator<readonly KnownSymbol[]> {
  const symbols = mayRepeat(system);
  const rows = symbols.map((symbol) => dimensionRow(symbol.dimension, system.bases));
  const rank = firstBase(symbols, system.bases).length;
  yield* extend(0, [], new Echelon());

  function* extend(from: number, chosen: readonly KnownSymbol[], span: Echelon): Generator<readonly KnownSymbol[]> {
    if (chosen.length === rank) {
      if (rank > 0) yield chosen;
      return;
    }
    for (let at = from; at < symbols.length && completes(span, at); at++) {
      const wider = span.clone();
      if (wider.add(rows[at] as Map<number, Rational>)) yield* extend(at + 1, [...chosen, symbols[at] as KnownSymbol], wider);
    }
  }

  function completes(span: Echelon, from: number): boolean {
    const wider = span.clone();
    for (let at = from; at < rows.length && wider.rank < rank; at++) wider.add(rows[at] as Map<number, Rational>);
    return wider.rank === rank;
  }
}

/** The most steps from one subspace to a wider one that `countSets` takes before it settles for a lower bound. */
const stepLimit = 25_000;

/**
 * How many sets `repeatingSets` would list. Symbols are taken class by class (parallel dimensions span the same line), and for
 * every subspace that independent classes span the number of ways to span it is kept: O(classes · subspaces · r²), which does not
 * depend on the number of sets. After `limit` steps, each O(r²), the rest is left out, and the count is a lower bound.
 */
export function countSets(system: System, limit: number = stepLimit): SetCount {
  const symbols = mayRepeat(system);
  const base = firstBase(symbols, system.bases).map((symbol) => symbol.dimension);
  if (base.length === 0) return { count: 0, exact: true };
  let states = new Map<string, { rows: readonly Vector[]; count: number }>([['', { rows: [], count: 1 }]]);
  let exact = true;
  let steps = 0;
  for (const { direction, size } of lines(symbols, base)) {
    if (steps > limit) break;
    const next = new Map(states);
    for (const { rows, count } of states.values()) {
      if (rows.length === base.length) continue;
      if (++steps > limit) {
        exact = false;
        break;
      }
      const wider = widen(rows, direction);
      if (wider === 'too large') exact = false;
      if (!wider || wider === 'too large') continue;
      const key = wider.map((row) => row.join(',')).join(';');
      next.set(key, { rows: wider, count: (next.get(key)?.count ?? 0) + count * size });
    }
    states = next;
  }
  const count = [...states.values()].reduce((sum, { rows, count }) => sum + (rows.length === base.length ? count : 0), 0);
  return { count, exact: exact && Number.isSafeInteger(count) };
}

type Vector = readonly number[];

/** Directions of the dimensions in coordinates over `base`, and how many symbols share each. */
function lines(symbols: readonly KnownSymbol[], base: readonly Dimension[]): { direction: Vector; size: number }[] {
  const found = new Map<string, { direction: Vector; size: number }>();
  const directions = new Map<Dimension, Vector>();
  for (const { dimension } of symbols) {
    const direction = directions.get(dimension) ?? directed(primitive(expressIn(dimension, base) as Rational[]).map((value) => value.toNumber()));
    directions.set(dimension, direction);
    const line = found.get(direction.join(',')) ?? { direction, size: 0 };
    line.size++;
    found.set(direction.join(','), line);
  }
  return [...found.values()];
}

/**
 * The reduced echelon form, in primitive integers, of rows and one more; undefined where it depends on them.
 * `too large`: integers beyond exact floating point, which only absurd exponents reach.
 */
function widen(rows: readonly Vector[], vector: Vector): Vector[] | 'too large' | undefined {
  const rest = rows.reduce((left, row) => cancel(left, row, pivotOf(row)), vector);
  const pivot = pivotOf(rest);
  if (pivot < 0) return undefined;
  const added = directed(rest);
  const wider = [...rows.map((row) => directed(cancel(row, added, pivot))), added];
  if (wider.some((row) => !row.every(Number.isSafeInteger))) return 'too large';
  return wider.sort((a, b) => pivotOf(a) - pivotOf(b));
}

function cancel(vector: Vector, by: Vector, pivot: number): Vector {
  const own = vector[pivot] as number;
  if (own === 0) return vector;
  const lead = by[pivot] as number;
  const left = vector.map((value, at) => value * lead - own * (by[at] as number));
  return left.every(Number.isSafeInteger) ? left : left.map(() => Number.NaN);
}

function directed(vector: Vector): Vector {
  const common = vector.reduce((sum, value) => divisor(sum, Math.abs(value)), 0);
  const lead = vector.find((value) => value !== 0) ?? 1;
  const by = lead < 0 ? -common : common;
  return by === 1 || by === 0 ? vector : vector.map((value) => value / by || 0);
}

function divisor(a: number, b: number): number {
  return b === 0 || Number.isNaN(b) ? a : divisor(b, a % b);
}

function pivotOf(vector: Vector): number {
  return vector.findIndex((value) => value !== 0);
}

/** Exponents of the group that one symbol forms with a repeating set: smallest integers, the symbol's own positive. */
export function groupWith(symbol: KnownSymbol, repeating: readonly KnownSymbol[]): Map<string, Rational> | undefined {
  const powers = expressIn(symbol.dimension, repeating.map((one) => one.dimension));
  if (!powers) return undefined;
  const whole = primitive([Rational.one, ...powers.map((power) => power.neg())]);
  const names = [symbol.name, ...repeating.map((one) => one.name)];
  return new Map(names.map((name, at) => [name, whole[at] as Rational] as const).filter(([, power]) => !power.isZero));
}
