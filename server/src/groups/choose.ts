/**
 * The choice of groups. Candidates are taken from the cheapest up as long as they are independent: for vectors this greedy choice has
 * the least total cost of all bases that the candidates offer (Rado 1957; Edmonds 1971), and it costs one elimination per candidate.
 */
import type { Rational } from '../quantities/rational.ts';
import { groupWith } from './bases.ts';
import { type Candidate, candidatesOf } from './candidates.ts';
import type { Instance } from './instances.ts';
import { repeatRank, scaleRank } from './like.ts';
import { Echelon } from './matrix.ts';
import type { KnownSymbol, System } from './system.ts';

type Product = ReadonlyMap<string, Rational>;

/** The default groups around those that are kept: the dependent symbol's first. */
export function chooseGroups(system: System, instances: readonly Instance[], kept: readonly Product[]): Product[] {
  return greedy(system, kept, candidatesOf(system, instances));
}

/** The groups of a valid set of repeating symbols, around those that are kept. */
export function groupsOfSet(system: System, repeating: readonly KnownSymbol[], kept: readonly Product[]): Product[] {
  const rest = system.active.filter((symbol) => !repeating.includes(symbol));
  return greedy(system, kept, rest.flatMap((symbol) => groupWith(symbol, repeating) ?? []).map((exponents) => ({ exponents, cost: 0 })));
}

function greedy(system: System, kept: readonly Product[], candidates: readonly Candidate[]): Product[] {
  const { dependent, active } = system;
  const wanted = active.length - rankOfActive(system);
  const columns = new Map(system.known.map((symbol, at) => [symbol.name, at]));
  const span = new Echelon();
  const chosen: Product[] = [];
  const take = (exponents: Product) => {
    if (span.add(new Map([...exponents].map(([name, power]) => [columns.get(name) as number, power])))) chosen.push(exponents);
  };
  const holds = (exponents: Product) => dependent !== undefined && exponents.has(dependent);
  const sorted = candidates.map((one, at) => ({ ...one, at })).sort((a, b) => a.cost - b.cost || a.at - b.at);
  const keptDependent = kept.some(holds);
  for (const exponents of kept) take(exponents);
  const others = wanted - (active.some((symbol) => symbol.name === dependent) ? 1 : 0) + (keptDependent ? 1 : 0);
  for (const { exponents } of sorted) if (chosen.length < others && !holds(exponents)) take(exponents);
  for (const { exponents } of sorted) if (chosen.length < wanted && holds(exponents)) take(exponents);
  return [...chosen.filter(holds), ...chosen.filter((exponents) => !holds(exponents))];
}

/** Symbols that take no part are independent of all others, so the active ones have the rest of the rank. */
function rankOfActive(system: System): number {
  return system.rank - (system.known.length - system.active.length - system.pure.length);
}

/**
 * Symbols that could have been let repeat to get these groups: every group then has one other symbol, which is in no other group.
 * Undefined where some group has no symbol of its own.
 */
export function repeatingOf(system: System, groups: readonly Product[]): readonly KnownSymbol[] | undefined {
  const own: KnownSymbol[] = [];
  for (const group of groups) {
    const alone = system.active.filter(({ name }) => group.has(name) && groups.every((other) => other === group || !other.has(name)));
    const dependent = alone.find(({ name }) => name === system.dependent);
    const best = dependent ?? alone.sort((a, b) => repeatRank(b) - repeatRank(a) || scaleRank(b) - scaleRank(a))[0];
    if (!best) return undefined;
    own.push(best);
  }
  return system.active.filter((symbol) => !own.includes(symbol));
}
