import type { Span } from '../text/span.ts';
import { rangeIn } from './ranges.ts';

/** What stands beside a unit: the words without it, and the range behind it. */
export interface Beside {
  readonly description?: string;
  readonly range?: { readonly low: number; readonly high: number };
}

const longest = 160;

/** The words around a unit, and `0.5 .. 3` or `0.5 to 3` directly behind it. */
export function besideUnit(text: string, unit: Span): Beside {
  let behind = text.slice(unit.end);
  const range = rangeIn(behind);
  if (range) behind = behind.slice(range.length);
  const words = `${text.slice(0, unit.start)} ${behind}`.replace(/\s+/g, ' ').replace(/^[\s,;:.–—-]+|[\s,;:.(–—-]+$/g, '').replace(/\s+([.,;:])(?=\s|$)/g, '$1').slice(0, longest);
  return { ...(words === '' ? {} : { description: words }), ...(range ? { range: { low: range.low, high: range.high } } : {}) };
}
