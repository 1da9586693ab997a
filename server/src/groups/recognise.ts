/** Recognition of dimensionless products as characteristic numbers, by kinds of quantity, up to power and factor. */
import { Rational } from '../quantities/rational.ts';
import { evidence } from './evidence.ts';
import { type Form, formsLike } from './forms.ts';
import { primitive } from './matrix.ts';
import type { KnownSymbol } from './system.ts';
import type { Exponents, Recognition } from './types.ts';

/** A factor of a product: a symbol, or several of one dimension that stand together for one kind (width times height for an area). */
interface Factor {
  readonly symbols: readonly KnownSymbol[];
  readonly exponent: Rational;
}

/**
 * Every characteristic number that a product can be: where words or, failing them, letters favour some, only those. The cost is one
 * look-up by dimensions and exponents, then the ways to give symbols of one dimension to kinds of that dimension.
 */
export function recognise(exponents: Exponents, symbols: ReadonlyMap<string, KnownSymbol>): readonly Recognition[] {
  const factors: Factor[] = [];
  for (const [name, exponent] of exponents) {
    const symbol = symbols.get(name);
    if (!symbol || symbol.dimension.isOne) return [];
    factors.push({ symbols: [symbol], exponent });
  }
  const direct = matches(factors);
  return strongest(direct.length > 0 ? direct : matches(merged(factors)));
}

function matches(factors: readonly Factor[]): Match[] {
  if (factors.length === 0) return [];
  const parts = factors.map(({ symbols, exponent }) => ({ dimensionKey: (symbols[0] as KnownSymbol).dimension.key, exponent }));
  return formsLike(parts).flatMap((form) => {
    const found = [1, -1].map((sign) => matchForm(form, factors, sign)).filter((one) => one !== undefined);
    return found.length > 0 ? [found.reduce((best, one) => (one.evidence > best.evidence ? one : best))] : [];
  });
}

/**
 * One recognition per number, those with the most evidence only: plain ones first, the best known before the others. A power of a
 * number stands beside a plain one only where it is as well known (Hartmann squared beside Chandrasekhar).
 */
function strongest(found: readonly Match[]): Recognition[] {
  const best = Math.max(...found.map((one) => one.evidence));
  const kept = new Map<string, Match>();
  const likely = found.filter((one) => one.evidence === best).sort((a, b) => plainness(a) - plainness(b) || a.standing - b.standing);
  const known = likely[0]?.standing ?? 0;
  for (const one of likely) {
    if (plainness(one) > plainness(likely[0] as Match) && one.standing > known) continue;
    if (!kept.has(one.number)) kept.set(one.number, one);
  }
  return [...kept.values()].map(({ standing: _standing, ...recognition }) => recognition);
}

type Match = Recognition & { readonly standing: number };

function plainness({ power }: Recognition): number {
  return power.abs().isOne ? 0 : 1;
}

function matchForm(form: Form, factors: readonly Factor[], sign: number): Match | undefined {
  const power = powerBetween(form, factors, sign);
  const assigned = assign(form, factors, power);
  if (!assigned) return undefined;
  const { entry, field, factor } = form;
  return {
    number: entry.names[0] as string,
    otherNames: entry.names.slice(1),
    symbol: entry.symbol,
    field,
    power,
    coefficient: factor.pow(power.neg()),
    kinds: assigned.kinds,
    expression: entry.expression,
    source: entry.source,
    evidence: assigned.evidence,
    standing: entry.standing,
  };
}

/** The power p in `product = number^p`, from the size of the exponents and a sign. */
function powerBetween(form: Form, factors: readonly Factor[], sign: number): Rational {
  const size = (values: readonly Rational[]) => {
    const whole = primitive(values);
    const at = values.findIndex((value) => !value.isZero);
    return (values[at] as Rational).div(whole[at] as Rational).abs();
  };
  const own = size(factors.map(({ exponent }) => exponent));
  return own.div(size(form.roles.map(({ exponent }) => exponent))).mul(Rational.of(sign));
}

interface Assigned {
  readonly kinds: readonly { symbol: string; kind: string }[];
  readonly evidence: number;
}

/** The best way to give every role of a form one factor with its dimension and exponent. */
function assign(form: Form, factors: readonly Factor[], power: Rational): Assigned | undefined {
  const step = (at: number, used: ReadonlySet<Factor>): Assigned | undefined => {
    const role = form.roles[at];
    if (!role) return { kinds: [], evidence: 0 };
    const wanted = role.exponent.mul(power);
    let best: Assigned | undefined;
    for (const factor of factors) {
      if (used.has(factor) || !factor.exponent.equals(wanted)) continue;
      const fit = fitOf(factor, role.kind);
      const rest = fit === undefined ? undefined : step(at + 1, new Set([...used, factor]));
      if (fit === undefined || !rest || (best && rest.evidence + fit <= best.evidence)) continue;
      const own = factor.symbols.map(({ name }) => ({ symbol: name, kind: role.kind.name }));
      best = { kinds: [...own, ...rest.kinds], evidence: rest.evidence + fit };
    }
    return best;
  };
  return factors.length === form.roles.length ? step(0, new Set()) : undefined;
}

function fitOf(factor: Factor, kind: Form['roles'][number]['kind']): number | undefined {
  const fits = factor.symbols.map((symbol) => evidence(symbol, kind));
  return fits.includes(undefined) ? undefined : Math.min(...(fits as number[]));
}

/** Factors of one dimension on one side of the fraction line, taken together. */
function merged(factors: readonly Factor[]): Factor[] {
  const found = new Map<string, Factor>();
  for (const { symbols, exponent } of factors) {
    const key = `${(symbols[0] as KnownSymbol).dimension.key}|${exponent.sign}`;
    const same = found.get(key);
    found.set(key, same ? { symbols: [...same.symbols, ...symbols], exponent: same.exponent.add(exponent) } : { symbols, exponent });
  }
  return found.size < factors.length ? [...found.values()] : [];
}
