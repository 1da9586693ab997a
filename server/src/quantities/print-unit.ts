/** Units as a person writes them: `W/(m K)`, `kPa`, `m^2/s`. ASCII throughout, and readable again. */
import type { Dimension } from './dimension.ts';
import { parseBaseProduct } from './factor.ts';
import { parseUnit } from './parse-unit.ts';
import { coherentSpellings, familiarSpellings } from './print-table.ts';
import { printFactor } from './print-factor.ts';
import type { Rational } from './rational.ts';
import type { Scale } from './scale.ts';
import { sameRotation, type Unit } from './unit.ts';

export { printFactor } from './print-factor.ts';

const bases: Readonly<Record<string, string>> = { L: 'm', M: 'kg', T: 's', I: 'A', Θ: 'K', N: 'mol', J: 'cd' };
const baseOrder = ['M', 'L', 'T', 'I', 'Θ', 'N', 'J'];
/** Prefixes that engineers choose: powers of a thousand, and those of length in between are in the table. */
const prefixes: readonly string[] = ['k', 'M', 'G', 'T', 'm', 'u', 'n', 'p', 'c', 'h'];

let named: Map<Dimension, string> | undefined;
let familiar: Map<Dimension, { readonly text: string; readonly unit: Unit }[]> | undefined;
const printed = new Map<Dimension, string>();

/** The coherent SI unit of a dimension: a named one where engineers use it, else a product of base units; `1` for a number. */
export function coherentUnit(dimension: Dimension): string {
  let text = printed.get(dimension);
  if (text === undefined) {
    named ??= new Map(coherentSpellings.map(([product, name]) => [parseBaseProduct(product), name]));
    text = named.get(dimension) ?? baseProduct(dimension);
    printed.set(dimension, text);
  }
  return text;
}

/** A unit as its author wrote it, else by the closest name there is, else as the coherent unit with a factor in front. */
export function printUnit(unit: Unit): string {
  if (unit.text !== '') return unit.text;
  const known = familiarText(unit);
  if (known !== undefined) return known;
  const coherent = coherentUnit(unit.dimension);
  if (!unit.scale || unit.scale.isOne) return coherent;
  const prefixed = prefixedText(coherent, unit.scale, unit.dimension);
  if (prefixed !== undefined) return prefixed;
  return coherent === '1' ? printFactor(unit.scale) : `${printFactor(unit.scale)} ${coherent}`;
}

/** A spelling of the table that means the same: scale, zero, rotation. */
function familiarText(unit: Unit): string | undefined {
  const { scale } = unit;
  if (!scale || (scale.isOne && !unit.rotation && !unit.level && !unit.offset)) return undefined;
  familiar ??= readTable();
  return familiar.get(unit.dimension)?.find((each) => matches(each.unit, unit, scale))?.text;
}

function matches(known: Unit, unit: Unit, scale: Scale): boolean {
  return known.scale?.equals(scale) === true && sameRotation(known.rotation, unit.rotation) && sameZero(known, unit) && !known.level === !unit.level;
}

function sameZero(a: Unit, b: Unit): boolean {
  return a.offset && b.offset ? a.offset.kind === b.offset.kind && a.offset.zero.equals(b.offset.zero) : !a.offset && !b.offset;
}

function readTable(): Map<Dimension, { readonly text: string; readonly unit: Unit }[]> {
  const map = new Map<Dimension, { readonly text: string; readonly unit: Unit }[]>();
  for (const text of familiarSpellings) {
    const read = parseUnit(text);
    if (!read.ok) continue;
    const list = map.get(read.unit.dimension);
    if (list) list.push({ text, unit: read.unit });
    else map.set(read.unit.dimension, [{ text, unit: read.unit }]);
  }
  return map;
}

/** `kW/(m K)`, `mm^2`: the coherent unit with a prefix on its first symbol. */
function prefixedText(coherent: string, scale: Scale, dimension: Dimension): string | undefined {
  if (coherent.startsWith('1')) return undefined;
  const stems = coherent.startsWith('kg') ? [coherent.slice(1), ...prefixes.map((prefix) => prefix + coherent.slice(1))] : prefixes.map((prefix) => prefix + coherent);
  return stems.find((text) => {
    const read = parseUnit(text);
    return read.ok && read.unit.dimension === dimension && read.unit.scale?.equals(scale) === true && read.hints.length === 0;
  });
}

function baseProduct(dimension: Dimension): string {
  const rank = (base: string): number => (baseOrder.includes(base) ? baseOrder.indexOf(base) : baseOrder.length);
  const entries = [...dimension.exponents].sort(([a], [b]) => rank(a) - rank(b));
  const above = entries.filter(([, exponent]) => exponent.sign > 0).map(part);
  const below = entries.filter(([, exponent]) => exponent.sign < 0).map(([base, exponent]) => part([base, exponent.neg()]));
  const top = above.length > 0 ? above.join(' ') : '1';
  if (below.length === 0) return top;
  return `${top}/${below.length > 1 ? `(${below.join(' ')})` : below[0]}`;
}

function part([base, exponent]: readonly [string, Rational]): string {
  const symbol = bases[base] ?? base;
  return exponent.isOne ? symbol : exponent.isInteger ? `${symbol}^${exponent}` : `${symbol}^(${exponent})`;
}
