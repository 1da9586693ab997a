/** Naming of one dimensionless product that stands in a script. */
import { Composer } from './composites.ts';
import { instancesOf } from './instances.ts';
import { wholePowers } from './matrix.ts';
import { recognise } from './recognise.ts';
import type { KnownSymbol } from './system.ts';
import type { CompositePart, Exponents, Recognition, RelationSymbol } from './types.ts';
import { Rational } from '../quantities/rational.ts';

/** What a product of symbols is known as. */
export interface ProductName {
  readonly recognised: readonly Recognition[];
  readonly composites: readonly (readonly CompositePart[])[];
}

/**
 * Names a product with any rational exponents; undefined where it is not dimensionless or a symbol's unit is not known. Powers are
 * those of the product as it stands: `V/sqrt(g*L)` is the Froude number itself.
 */
export function recogniseProduct(exponents: Exponents, symbols: readonly RelationSymbol[]): ProductName | undefined {
  const known = new Map(symbols.filter((symbol): symbol is KnownSymbol => symbol.dimension !== undefined).map((symbol) => [symbol.name, symbol]));
  const used = [...exponents].filter(([, power]) => !power.isZero);
  const parts = used.map(([name]) => known.get(name)).filter((symbol) => symbol !== undefined);
  if (parts.length < used.length || !isDimensionless(used, known)) return undefined;
  const whole = wholePowers(used);
  const recognised = recognise(new Map(used), known);
  return { recognised, composites: new Composer(instancesOf([...known.values()])).compose(recognised.length > 0 ? new Map(used) : whole, recognised) };
}

function isDimensionless(powers: readonly (readonly [string, Rational])[], known: ReadonlyMap<string, KnownSymbol>): boolean {
  const bases = new Map<string, Rational>();
  for (const [name, power] of powers) {
    for (const [base, exponent] of known.get(name)?.dimension.exponents ?? []) bases.set(base, (bases.get(base) ?? Rational.zero).add(exponent.mul(power)));
  }
  return [...bases.values()].every((sum) => sum.isZero);
}
