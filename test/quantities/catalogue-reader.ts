/** A second, strict reading of catalogue entries for the tests of the data, so that they do not lean on the unit parser. */
import { catalogue, prefixes } from '../../server/src/quantities/catalogue/index.ts';
import type { PrefixEntry, UnitEntry } from '../../server/src/quantities/catalogue/entry.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { Scale } from '../../server/src/quantities/scale.ts';

export interface Measure {
  readonly dimension: Dimension;
  readonly scale: Scale;
}

export const allUnits: readonly UnitEntry[] = catalogue.flatMap((family) => family.units);

const bySymbol = new Map(allUnits.flatMap((entry) => entry.symbols.map((symbol) => [symbol, entry] as const)));

const bases: Record<string, string> = { m: 'L', kg: 'M', s: 'T', A: 'I', K: 'Θ', mol: 'N', cd: 'J' };

/** Prefixes that an entry allows. */
export function prefixesOf(entry: UnitEntry): readonly PrefixEntry[] {
  if (entry.prefixes === 'none') return [];
  return prefixes.filter(({ power }) => entry.prefixes === 'all' || (entry.prefixes === 'large' ? power > 0 : power < 0));
}

/** A product or quotient of decimal numbers and pi; throws on anything else. */
export function readFactor(text: string): Scale {
  let scale = Scale.one;
  let divide = false;
  for (const part of text.split(/([*/])/)) {
    if (part === '*' || part === '/') divide = part === '/';
    else {
      const value = part === 'pi' ? Scale.pi : scaleOfNumber(part);
      scale = divide ? scale.div(value) : scale.mul(value);
    }
  }
  return scale;
}

function scaleOfNumber(text: string): Scale {
  const value = /^\d+(\.\d+)?(e-?\d+)?$/.test(text) ? Rational.parse(text) : undefined;
  if (!value) throw new Error(`no number: '${text}'`);
  return Scale.of(value);
}

/** The dimension of a coherent unit, `kg m^-1 s^-2` or `1`; throws on anything but base units. */
export function readCoherent(of: string): Dimension {
  if (of === '1') return Dimension.one;
  return of.split(' ').reduce((product, part) => {
    const match = /^([A-Za-z]+)(?:\^(-?\d+))?$/.exec(part);
    const base = match && bases[match[1] as string];
    if (!base) throw new Error(`no base unit: '${part}' in '${of}'`);
    return product.mul(Dimension.base(base).pow(Rational.of(Number(match[2] ?? 1))));
  }, Dimension.one);
}

export function measureOf(entry: UnitEntry): Measure {
  const exact = readFactor(entry.factor);
  const scale = entry.uncertainty ? Scale.measuredAs(exact.toNumber(), entry.uncertainty) : exact;
  return { dimension: readCoherent(entry.of), scale };
}

/** One symbol, with or without an allowed prefix; a whole symbol wins. */
export function symbolMeasure(text: string): Measure | undefined {
  const whole = bySymbol.get(text);
  if (whole) return measureOf(whole);
  for (const prefix of prefixes) {
    for (const symbol of prefix.symbols) {
      const entry = text.startsWith(symbol) ? bySymbol.get(text.slice(symbol.length)) : undefined;
      if (!entry || !prefixesOf(entry).includes(prefix)) continue;
      const { dimension, scale } = measureOf(entry);
      return { dimension, scale: scale.mul(Scale.of(Rational.of(10).pow(prefix.power))) };
    }
  }
  return undefined;
}

/** `a b^2/(c d)` and nothing looser: spaces multiply, at most one slash, what is below it stands in brackets if it is a product. */
export function readStrict(text: string): Measure {
  const [above = '', below, ...more] = text.split(/\/(?![^(]*\d\))/);
  if (more.length > 0 || (below?.includes(' ') && !/^\(.*\)$/.test(below))) throw new Error(`not strict: '${text}'`);
  const over = product(above);
  if (below === undefined) return over;
  const under = product(below.replace(/^\((.*)\)$/, '$1'));
  return { dimension: over.dimension.div(under.dimension), scale: over.scale.div(under.scale) };
}

function product(text: string): Measure {
  return text.split(' ').reduce<Measure>((sum, part) => {
    const next = power(part);
    return { dimension: sum.dimension.mul(next.dimension), scale: sum.scale.mul(next.scale) };
  }, { dimension: Dimension.one, scale: Scale.one });
}

function power(text: string): Measure {
  if (text === '1') return { dimension: Dimension.one, scale: Scale.one };
  const [symbol = '', raised = '1'] = text.split('^');
  const measure = symbolMeasure(symbol);
  const exponent = Rational.parse(raised.replace(/^\((.*)\)$/, '$1'));
  if (!measure || !exponent) throw new Error(`unknown: '${text}'`);
  return { dimension: measure.dimension.pow(exponent), scale: measure.scale.pow(exponent) };
}
