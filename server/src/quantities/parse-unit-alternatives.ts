/** `°F or °C`, `in/hr or mm/hr`, `ft [IP] or m [SI]`: one quantity in several units. */
import type { ReadOptions, UnitRead, UnitResult } from './unit-result.ts';
import { sameUnit } from './unit.ts';

/** The dimension that all alternatives share; the scale stays unknown unless they are one unit. Undefined where it is none of this kind. */
export function readAlternatives(text: string, options: ReadOptions, parse: (text: string, options: ReadOptions) => UnitResult): UnitRead | undefined {
  if (!/\sor\s|\|/.test(text)) return undefined;
  const parts = text.split(/\s+or\s+(?:in\s+)?|\s*\|\s*/).map((part) => part.replace(/\s*[[(]\s*(?:IP|SI|US|USC|imperial|metric)\s*[\])]\s*$/i, '').trim());
  if (parts.length < 2 || parts.length > 3 || parts.some((part) => part === '' || /^[-\d]/.test(part))) return undefined;
  const units = parts.map((part) => parse(part, options));
  const first = units[0];
  if (!first?.ok) return undefined;
  const rest = units.slice(1).flatMap((each) => (each.ok ? [each] : []));
  if (rest.length < units.length - 1 || rest.some((each) => each.unit.dimension !== first.unit.dimension)) return undefined;
  const beyondDoubt = first.beyondDoubt || rest.some((each) => each.beyondDoubt);
  if (rest.every((each) => sameUnit(each.unit, first.unit))) return { ...first, hints: [], beyondDoubt, unit: { ...first.unit, text } };
  return { ok: true, unit: { dimension: first.unit.dimension, scale: undefined, text }, hints: [], beyondDoubt };
}
