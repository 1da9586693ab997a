import type { ConstantEntry } from '../catalogue/entry.ts';

/** Rounded forms of a constant counted in one unit: `met('J/(mol K)', '8.314', '8.31')`. */
export function met(unit: string, ...values: readonly string[]): ConstantEntry['metAs'] {
  return values.map((value) => ({ value, unit }));
}
