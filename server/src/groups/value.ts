/** What a group comes to where the values of its symbols are known. */
import type { Exponents, RelationSymbol } from './types.ts';

/** `low` equals `high` where every symbol has one value. */
export interface GroupValue {
  readonly low: number;
  readonly high: number;
}

/**
 * The value or range of a product in coherent SI units. Undefined where a symbol has neither value nor range, or its unit has no known
 * scale or is a point on a scale (a number in °C says nothing in a product). Ranges that reach zero or below give none either, since a
 * product is monotonic in positive quantities only.
 */
export function groupValue(exponents: Exponents, symbols: readonly RelationSymbol[]): GroupValue | undefined {
  let [low, high] = [1, 1];
  for (const [name, power] of exponents) {
    const symbol = symbols.find((one) => one.name === name);
    const bounds = symbol && boundsOf(symbol);
    if (!bounds || (bounds.low !== bounds.high && bounds.low <= 0)) return undefined;
    const ends = [bounds.low ** power.toNumber(), bounds.high ** power.toNumber()];
    [low, high] = bounds.low === bounds.high ? [low * (ends[0] as number), high * (ends[0] as number)] : [low * Math.min(...ends), high * Math.max(...ends)];
  }
  return Number.isFinite(low) && Number.isFinite(high) ? { low: Math.min(low, high), high: Math.max(low, high) } : undefined;
}

function boundsOf({ value, range, unit, dimension }: RelationSymbol): GroupValue | undefined {
  const given = value !== undefined ? { low: value, high: value } : range;
  const scale = unit ? unit.scale?.toNumber() : dimension?.isOne ? 1 : undefined;
  if (!given || scale === undefined || unit?.offset) return undefined;
  return { low: given.low * scale, high: given.high * scale };
}
