/** Which symbols of a relation can be in a group at all, and why the others cannot. */
import type { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import { basesOf, dimensionRow, Echelon, expressIn } from './matrix.ts';
import type { Relation, RelationSymbol, Unmatched } from './types.ts';

export interface KnownSymbol extends RelationSymbol {
  readonly dimension: Dimension;
}

/** A relation sorted out. Every non-trivial dimensionless product uses `active` and `pure` symbols only. */
export interface System {
  readonly dependent: string | undefined;
  readonly known: readonly KnownSymbol[];
  readonly bases: readonly string[];
  /** Rank of all known symbols. */
  readonly rank: number;
  /** Symbols that are in at least one group together with others. */
  readonly active: readonly KnownSymbol[];
  /** Symbols without a dimension. */
  readonly pure: readonly KnownSymbol[];
  readonly unmatched: readonly Unmatched[];
}

/** Sorts the symbols of a relation: O(n r²) for n symbols of rank r. A repeated name counts once, as first given. */
export function systemOf(relation: Relation): System {
  const symbols = relation.symbols.filter(({ name }, at) => relation.symbols.findIndex((other) => other.name === name) === at);
  const known = symbols.filter((symbol): symbol is KnownSymbol => symbol.dimension !== undefined);
  const unknown = symbols.filter((symbol) => symbol.dimension === undefined);
  const bases = basesOf(known.map((symbol) => symbol.dimension));
  const dimensioned = known.filter((symbol) => !symbol.dimension.isOne);
  const base = firstBase(dimensioned, bases);
  const used = usedInGroups(dimensioned, base);
  const lone = dimensioned.filter((symbol) => !used.has(symbol));
  return {
    dependent: relation.dependent,
    known,
    bases,
    rank: base.length,
    active: dimensioned.filter((symbol) => used.has(symbol)),
    pure: known.filter((symbol) => symbol.dimension.isOne),
    unmatched: [...unknown.map(({ name }) => ({ symbol: name, reason: 'unknown-unit' }) as const), ...reasons(lone, dimensioned)],
  };
}

/** The first independent symbols in the order given: a base of the matroid of dimensions. */
export function firstBase(symbols: readonly KnownSymbol[], bases: readonly string[]): KnownSymbol[] {
  const echelon = new Echelon();
  return symbols.filter((symbol) => echelon.add(dimensionRow(symbol.dimension, bases)));
}

/** A symbol is in some group exactly when it is outside one base, or some symbol outside the base needs it. */
function usedInGroups(symbols: readonly KnownSymbol[], base: readonly KnownSymbol[]): Set<KnownSymbol> {
  const inBase = new Set(base);
  const used = new Set<KnownSymbol>();
  const dimensions = base.map((symbol) => symbol.dimension);
  const seen = new Set<Dimension>();
  for (const symbol of symbols) {
    if (inBase.has(symbol)) continue;
    used.add(symbol);
    if (seen.has(symbol.dimension)) continue;
    seen.add(symbol.dimension);
    const powers = expressIn(symbol.dimension, dimensions) ?? [];
    for (const [at, power] of powers.entries()) if (!power.isZero) used.add(base[at] as KnownSymbol);
  }
  return used;
}

/** Names one base dimension per lone symbol where there is one; a symbol explained drops out of the way of the next. */
function reasons(lone: readonly KnownSymbol[], all: readonly KnownSymbol[]): Unmatched[] {
  const found: Unmatched[] = [];
  let rest = [...all];
  let waiting = [...lone];
  for (let symbol = waiting.find((one) => loneBase(one, rest)); symbol; symbol = waiting.find((one) => loneBase(one, rest))) {
    const done = symbol;
    found.push({ symbol: done.name, reason: 'lone-dimension', base: loneBase(done, rest) as string });
    rest = rest.filter((one) => one !== done);
    waiting = waiting.filter((one) => one !== done);
  }
  for (const symbol of waiting) found.push({ symbol: symbol.name, reason: 'lone-combination', bases: loneCombination(symbol, rest) });
  const order = new Map(lone.map((symbol, at) => [symbol.name, at]));
  return found.sort((a, b) => (order.get(a.symbol) ?? 0) - (order.get(b.symbol) ?? 0));
}

function loneBase(symbol: KnownSymbol, all: readonly KnownSymbol[]): string | undefined {
  // Mass first: in mechanics it is the one that most often nothing else has.
  const bases = symbol.dimension.exponents.map(([base]) => base).sort((a, b) => Number(b === 'M') - Number(a === 'M'));
  return bases.find((base) => all.every((other) => other === symbol || other.dimension.exponent(base).isZero));
}

/** The fewest base dimensions whose exponents in the symbol cannot be made from the others'; all of them beyond ten bases. */
function loneCombination(symbol: KnownSymbol, all: readonly KnownSymbol[]): string[] {
  const others = all.filter((other) => other !== symbol);
  const bases = basesOf(all.map((other) => other.dimension));
  if (bases.length > 10) return symbol.dimension.exponents.map(([base]) => base);
  const subsets = Array.from({ length: 2 ** bases.length }, (_, bits) => bases.filter((_base, at) => (bits >> at) & 1));
  subsets.sort((a, b) => a.length - b.length);
  return subsets.find((subset) => !spannedOver(subset, symbol, others)) ?? [];
}

function spannedOver(bases: readonly string[], symbol: KnownSymbol, others: readonly KnownSymbol[]): boolean {
  const echelon = new Echelon();
  for (const other of others) echelon.add(restricted(other, bases));
  return echelon.reduce(restricted(symbol, bases)).size === 0;
}

function restricted(symbol: KnownSymbol, bases: readonly string[]): Map<number, Rational> {
  const entries = bases.map((base, at) => [at, symbol.dimension.exponent(base)] as const);
  return new Map(entries.filter(([, exponent]) => !exponent.equals(Rational.zero)));
}
