/** Checks what the user asked for: repeating symbols, groups to keep. */
import { Dimension } from '../quantities/dimension.ts';
import type { Rational } from '../quantities/rational.ts';
import { groupWith, mayRepeat } from './bases.ts';
import { dimensionRow, Echelon, wholePowers } from './matrix.ts';
import { firstBase, type KnownSymbol, type System } from './system.ts';
import type { Exponents, GroupsProblem } from './types.ts';

/** What is wrong with a set of repeating symbols; empty for a valid one. */
export function repeatingProblems(system: System, names: readonly string[]): GroupsProblem[] {
  const usable = new Map(mayRepeat(system).map((symbol) => [symbol.name, symbol]));
  const known = new Set([...system.known.map((symbol) => symbol.name), ...system.unmatched.map(({ symbol }) => symbol)]);
  const each = names.flatMap((name): GroupsProblem[] => {
    if (!known.has(name)) return [{ kind: 'unknown-symbol', symbol: name }];
    if (usable.has(name)) return [];
    return [{ kind: name === system.dependent ? 'repeats-dependent' : 'takes-no-part', symbol: name }];
  });
  const wanted = firstBase([...usable.values()], system.bases).length;
  if (each.length > 0) return each;
  const chosen = names.map((name) => usable.get(name) as KnownSymbol);
  const among = firstDependence(chosen, system.bases);
  if (among) return [{ kind: 'not-independent', among }];
  return chosen.length === wanted ? [] : [{ kind: 'wrong-count', wanted, given: chosen.length }];
}

/** The symbols of the first group that the set forms by itself. */
function firstDependence(chosen: readonly KnownSymbol[], bases: readonly string[]): string[] | undefined {
  const span = new Echelon();
  for (const [at, symbol] of chosen.entries()) {
    if (span.add(dimensionRow(symbol.dimension, bases))) continue;
    const before = chosen.slice(0, at);
    const used = before.includes(symbol) ? undefined : groupWith(symbol, before);
    return used ? [...used.keys()] : [symbol.name];
  }
  return undefined;
}

/** Kept groups in smallest integers, direction kept, with what is wrong with them. */
export function keptGroups(system: System, kept: readonly Exponents[]): { groups: Map<string, Rational>[]; problems: GroupsProblem[] } {
  const symbols = new Map(system.known.map((symbol) => [symbol.name, symbol]));
  const columns = new Map([...symbols.keys()].map((name, at) => [name, at]));
  const span = new Echelon();
  const problems: GroupsProblem[] = [];
  const groups: Map<string, Rational>[] = [];
  let dependentSeen = false;
  for (const exponents of kept) {
    const powers = wholePowers([...exponents].filter(([, power]) => !power.isZero));
    const problem = oneProblem(powers, symbols, system.dependent, dependentSeen);
    const row = new Map([...powers].map(([name, power]) => [columns.get(name) ?? -1, power]));
    if (problem) problems.push(problem);
    else if (!span.add(row)) problems.push({ kind: 'redundant-group', group: productText(powers) });
    else groups.push(powers);
    dependentSeen ||= system.dependent !== undefined && powers.has(system.dependent);
  }
  return { groups, problems };
}

function oneProblem(powers: Exponents, symbols: ReadonlyMap<string, KnownSymbol>, dependent: string | undefined, seen: boolean): GroupsProblem | undefined {
  let left = Dimension.one;
  for (const [name, power] of powers) {
    const symbol = symbols.get(name);
    if (!symbol) return { kind: 'unknown-symbol', symbol: name };
    left = left.mul(symbol.dimension.pow(power));
  }
  if (!left.isOne) return { kind: 'not-dimensionless', group: productText(powers), left };
  return seen && dependent !== undefined && powers.has(dependent) ? { kind: 'dependent-twice', group: productText(powers) } : undefined;
}

function productText(powers: Exponents): string {
  return [...powers].map(([name, power]) => (power.isOne ? name : `${name}^${power}`)).join(' ');
}
