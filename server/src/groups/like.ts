/** Which of several like quantities sets the scale, and which quantities are let repeat. */
import type { Dimension } from '../quantities/dimension.ts';
import { evidence, kindsSaid } from './evidence.ts';
import { kindsOfDimension, quantityKinds } from './quantity-kinds.ts';
import type { KnownSymbol } from './system.ts';

/** Symbols by dimension; in each class the one that sets the scale comes first. */
export function likeClasses(symbols: readonly KnownSymbol[]): Map<Dimension, KnownSymbol[]> {
  const classes = new Map<Dimension, KnownSymbol[]>();
  for (const symbol of symbols) classes.set(symbol.dimension, [...(classes.get(symbol.dimension) ?? []), symbol]);
  for (const members of classes.values()) members.sort((a, b) => scaleRank(a) - scaleRank(b));
  return classes;
}

/** Low for what engineers measure others by: a diameter rather than a roughness, a flow speed rather than that of sound. */
export function scaleRank(symbol: KnownSymbol): number {
  const kinds = kindsOfDimension(symbol.dimension);
  const special = kindsSaid(symbol).some((kind) => kind.takes === 'told') ? 100 : 0;
  const fits = kinds.map((kind) => evidence(symbol, kind) ?? -1);
  const best = Math.max(0, ...fits);
  const place = best > 0 ? fits.indexOf(best) : kinds.length;
  const diameter = /diameter|characteristic|free.?stream/i.test(symbol.description ?? '') || /^[dD]$/.test(symbol.name) ? 0.5 : 0;
  return special + place - diameter;
}

/** What engineers let repeat: a length, a speed or rotation, a density, before material properties. */
export function repeatRank({ dimension }: KnownSymbol): number {
  const at = repeatOrder.indexOf(dimension.key);
  return at < 0 ? repeatOrder.length : at;
}

const repeatOrder = ['length', 'velocity', 'rotational frequency', 'density', 'temperature', 'mass', 'acceleration of gravity'].map(
  (name) => quantityKinds.get(name)?.dimension.key,
);
