/** Groups worth offering: ratios of like quantities, instances of characteristic numbers, and the shortest products. */
import type { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import { groupWith } from './bases.ts';
import { shortestProducts } from './circuits.ts';
import type { Instance } from './instances.ts';
import { likeClasses, repeatRank } from './like.ts';
import { wholePowers } from './matrix.ts';
import { firstBase, type KnownSymbol, type System } from './system.ts';

/** A product with no dimension and how readily an engineer would write it: the less, the better. */
export interface Candidate {
  readonly exponents: ReadonlyMap<string, Rational>;
  readonly cost: number;
}

/** Costs of the classes of candidates; inside a class, size decides. */
const classCost = { ratio: 0, number: 10, product: 100, found: 0, dependentRatio: 10, dependentNumber: 20 };

/** All candidates of a system; those with the dependent symbol are told by their exponents. They span every group of the system. */
export function candidatesOf(system: System, instances: readonly Instance[]): Candidate[] {
  const dependent = system.active.find((symbol) => symbol.name === system.dependent);
  const free = system.active.filter((symbol) => symbol !== dependent);
  const classes = likeClasses(free);
  const leads = [...classes.values()].map((members) => members[0] as KnownSymbol);
  return [
    ...ratios(classes),
    ...instances.map((instance) => numberCandidate(instance, dependent)),
    ...shortestProducts(leads, dependent).map((exponents) => productCandidate(exponents, dependent)),
    ...spanning(leads, dependent, system.bases).map((exponents) => productCandidate(exponents, dependent)),
  ];
}

function ratios(classes: ReadonlyMap<Dimension, readonly KnownSymbol[]>): Candidate[] {
  return [...classes.values()].flatMap(([lead, ...others]) =>
    others.map((other) => ({
      exponents: wholePowers([[other.name, Rational.one], [(lead as KnownSymbol).name, Rational.minusOne]]),
      cost: classCost.ratio,
    })),
  );
}

function numberCandidate({ form, powers, filled, evidence: told }: Instance, dependent: KnownSymbol | undefined): Candidate {
  const exponents = wholePowers([...powers]);
  const place = dependent ? filled.indexOf(dependent) : -1;
  const found = place >= 0 && form.entry.finds?.includes(form.roles[place]?.kind.name ?? '');
  const base = place < 0 ? classCost.number * form.entry.standing : found ? classCost.found + form.entry.standing : classCost.dependentNumber + 10 * form.entry.standing;
  // A form with a factor that the number does not usually have, or a dependent symbol below the line, reads less plainly.
  const power = dependent && powers.get(dependent.name);
  const awkwardness = (form.factor.isOne || power ? 0 : 5) + (power && power.sign < 0 ? 10 : 0);
  return { exponents, cost: base + (size(exponents) + awkwardness) / 10 + powerCost(exponents, dependent) - told / 100 };
}

function productCandidate(exponents: ReadonlyMap<string, Rational>, dependent: KnownSymbol | undefined): Candidate {
  const alike = dependent !== undefined && exponents.size === 2 && size(exponents) === 2 && exponents.has(dependent.name);
  return { exponents, cost: (alike ? classCost.dependentRatio : classCost.product + size(exponents)) + powerCost(exponents, dependent) };
}

/** The dependent symbol should stand to the power one. */
function powerCost(exponents: ReadonlyMap<string, Rational>, dependent: KnownSymbol | undefined): number {
  const power = dependent && exponents.get(dependent.name);
  return power ? 5 * (power.abs().toNumber() - 1) : 0;
}

/** Few symbols and small integers: a symbol more weighs like an exponent larger by four; the largest exponent counts twice. */
function size(exponents: ReadonlyMap<string, Rational>): number {
  const sizes = [...exponents.values()].map((power) => power.abs().toNumber());
  return sizes.reduce((sum, value) => sum + value, 0) + Math.max(0, ...sizes) - 1 + 4 * (sizes.length - 2);
}

/** One product per symbol outside a base, so that the candidates span whatever the searches left out. */
function spanning(leads: readonly KnownSymbol[], dependent: KnownSymbol | undefined, bases: readonly string[]): ReadonlyMap<string, Rational>[] {
  const base = firstBase([...leads].sort((a, b) => repeatRank(a) - repeatRank(b)), bases);
  const rest = [...leads.filter((symbol) => !base.includes(symbol)), ...(dependent ? [dependent] : [])];
  return rest.flatMap((symbol) => groupWith(symbol, base) ?? []);
}

