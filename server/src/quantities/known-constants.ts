import { constants } from './constants/index.ts';
import type { Dimension } from './dimension.ts';
import { parseUnit } from './parse-unit.ts';

export interface KnownConstant {
  readonly name: string;
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
      const value = Number(form.value);
      if (!(Math.abs(size / value - 1) < tolerance(form.value))) continue;
      const unit = parseUnit(form.unit);
      if (unit.ok && unit.unit.dimension === dimension) return { name: constant.name, value: form.value, unit: form.unit };
    }
  }
  return undefined;
}

function tolerance(digits: string): number {
  const significant = digits.replace(/e.*$/i, '').replace(/[^\d]/g, '').replace(/^0+/, '').length;
  return 0.51 * 10 ** -(Math.min(significant, 6) - 1);
}
