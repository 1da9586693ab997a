import { constants } from './constants/index.ts';
import type { Dimension } from './dimension.ts';
import { parseFactor } from './factor.ts';
import { parseUnit } from './parse-unit.ts';

export interface KnownConstant {
  readonly name: string;
  /** In the unit in which it was met; in that of the entry, its full value. */
  readonly value: string;
  readonly unit: string;
}

/**
 * The constant that a bare number may stand for: equal within half a unit of the last digit it is usually written with, and of
 * the dimension that the formula needs.
 */
export function knownConstant(size: number, dimension: Dimension): KnownConstant | undefined {
  for (const constant of constants) {
    const forms = [{ value: constant.value, unit: constant.unit }, ...constant.metAs];
    for (const form of forms) {
      const value = sizeOf(form.value);
      if (!(Math.abs(size - value) <= tolerance(form.value))) continue;
      const unit = parseUnit(form.unit);
      if (unit.ok && unit.unit.dimension === dimension) return { name: constant.name, value: form.unit === constant.unit ? constant.value : form.value, unit: form.unit };
    }
  }
  return undefined;
}

/** The size of a constant's value, which may be a product such as `0.5/pi`. */
function sizeOf(value: string): number {
  const plain = Number(value);
  return Number.isNaN(plain) ? parseFactor(value).toNumber() : plain;
}

/** Half a unit of the last digit written. */
function tolerance(digits: string): number {
  const match = /^(\d*)\.?(\d*)(?:e([+-]?\d+))?$/i.exec(digits);
  if (!match) return 0;
  return 0.51 * 10 ** (Number(match[3] ?? 0) - (match[2] as string).length);
}
