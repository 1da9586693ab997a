/** From a relation to its dimensionless groups. */
import { Rational } from '../quantities/rational.ts';
import { countSets } from './bases.ts';
import { chooseGroups, groupsOfSet, repeatingOf } from './choose.ts';
import { Composer } from './composites.ts';
import { type Instance, instancesOf } from './instances.ts';
import { dimensionalMatrix } from './matrix.ts';
import { dimensionOf } from './notation.ts';
import { recognise } from './recognise.ts';
import { keptGroups, repeatingProblems } from './request.ts';
import { type KnownSymbol, type System, systemOf } from './system.ts';
import type { Group, GroupRole, GroupsOptions, GroupsProblem, GroupsResult, Recognition, Relation } from './types.ts';

/**
 * Solves a relation. Where a unit is missing nothing is guessed: the symbols without one are named and there are no groups. A request
 * that cannot be met gives `problems` and no groups. Thirty symbols take some milliseconds; cost of the parts: see bases.ts,
 * circuits.ts, instances.ts, choose.ts.
 */
export function solveGroups(relation: Relation, options: GroupsOptions = {}): GroupsResult {
  const system = systemOf(relation);
  const unknown = system.unmatched.filter(({ reason }) => reason === 'unknown-unit');
  const kept = keptGroups(system, options.keep ?? []);
  const problems = [...dependentProblem(relation), ...(options.repeating ? repeatingProblems(system, options.repeating) : []), ...kept.problems];
  const solvable = unknown.length === 0 && problems.length === 0;
  const instances = solvable ? instancesOf(system.active) : [];
  const products = solvable ? productsOf(system, options, instances, kept.groups) : [];
  const repeating = options.repeating ? chosenSymbols(system, options.repeating) : repeatingOf(system, products);
  const keptSet = new Set<unknown>(kept.groups);
  const finish = finisher(system, instances, repeating ?? []);
  return {
    relation,
    bases: system.bases,
    columns: system.known.map((symbol) => symbol.name),
    matrix: dimensionalMatrix(system.known.map((symbol) => symbol.dimension), system.bases),
    rank: system.rank,
    repeating: solvable ? (repeating ?? []).map((symbol) => symbol.name) : [],
    groups: solvable ? sorted([...products.map((product) => finish(product, keptSet.has(product))), ...pureGroups(system)], system) : [],
    unmatched: unknown.length > 0 ? unknown : system.unmatched,
    problems,
    sets: solvable ? countSets(system) : { count: 0, exact: true },
  };
}

type Product = ReadonlyMap<string, Rational>;

function productsOf(system: System, options: GroupsOptions, instances: readonly Instance[], kept: readonly Product[]): Product[] {
  const active = kept.filter((product) => [...product.keys()].some((name) => system.active.some((symbol) => symbol.name === name)));
  return options.repeating ? groupsOfSet(system, chosenSymbols(system, options.repeating), active) : chooseGroups(system, instances, active);
}

function chosenSymbols(system: System, names: readonly string[]): KnownSymbol[] {
  return system.active.filter((symbol) => names.includes(symbol.name));
}

function dependentProblem({ dependent, symbols }: Relation): GroupsProblem[] {
  if (dependent === undefined || symbols.some((symbol) => symbol.name === dependent)) return [];
  return [{ kind: 'unknown-dependent', symbol: dependent }];
}

/** Dimensionless symbols are groups of their own. */
function pureGroups(system: System): Group[] {
  return system.pure.map(({ name }) => ({
    exponents: new Map([[name, Rational.one]]),
    role: name === system.dependent ? 'dependent' : 'symbol',
    recognised: [],
    composites: [],
    order: [name],
  }));
}

/** Turns a product into a group: names it, and turns it the way it is written. */
function finisher(system: System, instances: readonly Instance[], repeating: readonly KnownSymbol[]): (product: Product, kept: boolean) => Group {
  const symbols = new Map(system.known.map((symbol) => [symbol.name, symbol]));
  const composer = new Composer(instances);
  return (product, kept) => {
    const named = recognise(product, symbols);
    const upright = kept || turnedRight(product, named, system, repeating) ? product : new Map([...product].map(([name, power]) => [name, power.neg()]));
    const recognised = upright === product ? named : recognise(upright, symbols);
    const order = writtenOrder(upright, recognised, system, repeating);
    const exponents = new Map(system.known.filter(({ name }) => upright.has(name)).map(({ name }) => [name, upright.get(name) as Rational]));
    return { exponents, role: roleOf(exponents, symbols, system), recognised, composites: composer.compose(exponents, recognised), order };
  };
}

/** The dependent symbol stands above the line; else a number as it is defined; else the symbol that does not repeat above the line. */
function turnedRight(product: Product, recognised: readonly Recognition[], system: System, repeating: readonly KnownSymbol[]): boolean {
  const dependent = system.dependent === undefined ? undefined : product.get(system.dependent);
  if (dependent) return dependent.sign > 0;
  if (recognised[0]) return recognised[0].power.sign > 0;
  const own = [...product].find(([name]) => !repeating.some((symbol) => symbol.name === name)) ?? [...product][0];
  return !own || own[1].sign > 0;
}

/** A number in the order of its definition; else the dependent or own symbol first and the others as in the relation. */
function writtenOrder(product: Product, recognised: readonly Recognition[], system: System, repeating: readonly KnownSymbol[]): string[] {
  const first = recognised[0];
  const repeats = new Set(repeating.map((symbol) => symbol.name));
  const listed = system.known.map((symbol) => symbol.name).filter((name) => product.has(name));
  const natural = [...listed.filter((name) => !repeats.has(name)), ...listed.filter((name) => repeats.has(name))];
  if (!first) return natural;
  const usual = first.kinds.map(({ symbol }) => symbol);
  return densityFirst(usual, system);
}

const density = dimensionOf('M L^-3');

/** Engineers write ρ v d/μ: density leads the numerator. */
function densityFirst(names: readonly string[], system: System): string[] {
  const isDensity = (name: string) => system.known.some((symbol) => symbol.name === name && symbol.dimension === density);
  return [...names.filter(isDensity), ...names.filter((name) => !isDensity(name))];
}

function roleOf(exponents: Product, symbols: ReadonlyMap<string, KnownSymbol>, system: System): GroupRole {
  if (system.dependent !== undefined && exponents.has(system.dependent)) return 'dependent';
  const [a, b] = [...exponents.keys()].map((name) => symbols.get(name));
  return exponents.size === 2 && a?.dimension === b?.dimension ? 'ratio' : 'product';
}

/** The dependent symbol's group, products, ratios, symbols. */
function sorted(groups: readonly Group[], system: System): Group[] {
  const rank: Record<GroupRole, number> = { dependent: 0, product: 1, ratio: 2, symbol: 3 };
  const place = new Map(system.known.map((symbol, at) => [symbol.name, at]));
  const at = (group: Group) => Math.min(...[...group.exponents.keys()].map((name) => place.get(name) ?? 0));
  return [...groups].sort((a, b) => rank[a.role] - rank[b.role] || (a.role === 'product' ? 0 : at(a) - at(b)));
}
