import { describe, expect, it } from 'vitest';
import { repeatingSets } from '../../server/src/groups/bases.ts';
import { unmatchedText } from '../../server/src/groups/json.ts';
import { groupNames } from '../../server/src/groups/names.ts';
import { solveGroups } from '../../server/src/groups/solve.ts';
import { systemOf } from '../../server/src/groups/system.ts';
import type { GroupsOptions } from '../../server/src/groups/types.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { faults, product, text } from './checks.ts';
import { relation } from './relations.ts';

/** Groups as lines, with problems and lone symbols behind them. */
function solved(source: string, options: GroupsOptions = {}): string[] {
  const result = solveGroups(relation(source), options);
  expect(result.groups.length === 0 || faults(result).length === 0, faults(result).join('; ')).toBe(true);
  return [
    ...result.groups.map(({ exponents }) => text(exponents)),
    ...result.unmatched.map((one) => `${one.symbol}: ${unmatchedText(one)}`),
    ...result.problems.map((problem) => problem.kind),
  ];
}

const stirrer = 'P power; N rate shaft speed; D length; rho density; mu viscosity';

describe('degenerate relations', () => {
  it.each([
    ['one symbol alone', 'p pressure', ['p: mass: nothing else here has mass']],
    ['one dimensionless symbol alone', 'theta number', ['theta']],
    ['nothing that cancels', 'F force; a speed; L length', ['F: mass: nothing else here has mass', 'a: time: nothing else here has time', 'L: length: nothing else here has length']],
    ['no symbols at all', '', []],
    ['two like quantities', 'a length; b length', ['a b^-1']],
    ['two powers of one dimension', 'A area; b length', ['A b^-2']],
    ['a symbol listed twice', 'a length; b length; a length', ['a b^-1']],
    ['mass in a pendulum', 't time; l length; g acceleration; m mass', ['t^2 l^-1 g', 'm: mass: nothing else here has mass']],
    ['a combination that nothing makes up', 'P power; F force; L length', ['P: mass, time: the other symbols cannot make up this combination', 'F: mass, time: the other symbols cannot make up this combination', 'L: length, mass, time: the other symbols cannot make up this combination']],
    ['angles and numbers', 'eta number; theta number; a length; b length', ['eta', 'a b^-1', 'theta']],
    ['a dependent symbol without a dimension', 'eta number; V speed; c speed', ['eta', 'V^-1 c']],
  ] as const)('%s', (_what, source, expected) => {
    expect(solved(source)).toEqual(expected);
  });

  it('asks for units by name and guesses nothing', () => {
    expect(solved('P power; N rate; D length; rho ?; mu ?')).toEqual(['rho: its unit is not known', 'mu: its unit is not known']);
  });

  it('takes declared base dimensions as its own', () => {
    const result = solveGroups(relation('c [crate T^-1]; n [crate]; v speed; L length'));
    expect(result.bases).toEqual(['L', 'T', 'crate']);
    expect(result.rank).toBe(3);
    expect(result.groups.map(({ exponents }) => text(exponents))).toEqual(['c n^-1 v^-1 L']);
  });

  it('takes fractional dimensions', () => {
    expect(solved('C [L^1/2 T^-1]; V speed; R length')).toEqual(['C^2 V^-2 R']);
  });

  it('names a missing dependent symbol', () => {
    const result = solveGroups({ dependent: 'z', symbols: relation('a length; b length').symbols });
    expect(result.problems).toEqual([{ kind: 'unknown-dependent', symbol: 'z' }]);
    expect(result.groups).toEqual([]);
  });

  it('solves without a dependent symbol', () => {
    const result = solveGroups({ dependent: undefined, symbols: relation('rho density; V speed; D length; mu viscosity').symbols });
    expect(result.groups.map(groupNames)).toEqual([['Reynolds number']]);
  });
});

describe('repeating symbols', () => {
  it('are reported', () => {
    expect(solveGroups(relation(stirrer)).repeating).toEqual(['N', 'D', 'rho']);
  });

  it.each([
    [['N', 'D', 'rho'], ['P N^-3 D^-5 rho^-1', 'N D^2 rho mu^-1']],
    [['N', 'D', 'mu'], ['P N^-2 D^-3 mu^-1', 'N D^2 rho mu^-1']],
    [['rho', 'D', 'mu'], ['P D rho^2 mu^-3', 'N D^2 rho mu^-1']],
    [['N', 'D'], ['wrong-count']],
    [['N', 'D', 'P'], ['repeats-dependent']],
    [['N', 'D', 'x'], ['unknown-symbol']],
    [['N', 'D', 'rho', 'mu'], ['not-independent']],
    [['N', 'N', 'rho'], ['not-independent']],
  ])('use %s', (repeating, expected) => {
    expect(solved(stirrer, { repeating })).toEqual(expected);
  });

  it('refuse a symbol that takes no part', () => {
    expect(solved('t time; l length; g acceleration; m mass', { repeating: ['m', 'l', 'g'] })).toContain('takes-no-part');
  });

  // Chosen by hand: every three of N, D, rho, mu with one of rho and mu, and N with D or both of rho and mu.
  it('are listed once each, and as many as are counted', () => {
    const listed = [...repeatingSets(systemOf(relation(stirrer)))].map((set) => set.map(({ name }) => name).join(' '));
    expect(listed).toEqual(['N D rho', 'N D mu', 'N rho mu', 'D rho mu']);
    expect(solveGroups(relation(stirrer)).sets).toEqual({ count: 4, exact: true });
  });

  it('give each listed set its own valid groups', () => {
    const source = relation('dp pressure pressure drop; V speed; D length; L length; e length roughness; rho density; mu viscosity; sigma tension');
    for (const set of repeatingSets(systemOf(source))) {
      const result = solveGroups(source, { repeating: set.map(({ name }) => name) });
      expect(faults(result)).toEqual([]);
      expect(result.repeating).toEqual(set.map(({ name }) => name));
    }
  });
});

describe('kept groups', () => {
  it.each([
    ['another length in the Reynolds number', 'F force; V speed; D length; L length; rho density; mu viscosity', ['rho V L / mu'], ['F V^-2 D^-2 rho^-1', 'V L rho mu^-1', 'D^-1 L']],
    ['another group of the dependent symbol', 'F force; V speed; D length; rho density; mu viscosity', ['F / mu V D'], ['F V^-1 D^-1 mu^-1', 'V D rho mu^-1']],
    ['a multiple in smallest integers', stirrer, ['rho^2 N^2 D^4 / mu^2'], ['P N^-3 D^-5 rho^-1', 'N D^2 rho mu^-1']],
    ['what is not dimensionless', stirrer, ['rho N / mu'], ['not-dimensionless']],
    ['the dependent symbol twice', stirrer, ['P / rho N^3 D^5', 'P / mu N^2 D^3'], ['dependent-twice']],
    ['the same group twice', stirrer, ['rho N D^2 / mu', 'mu / rho N D^2'], ['redundant-group']],
    ['an unknown symbol', stirrer, ['x'], ['unknown-symbol']],
  ])('%s', (_what, source, keep, expected) => {
    expect(new Set(solved(source, { keep: keep.map(product) }))).toEqual(new Set(expected));
  });
});

describe('many symbols', () => {
  const bases = ['L', 'M', 'T', 'Θ'];
  /** A fixed sequence of dimensions with exponents from -2 to 2. */
  const symbols = (count: number) => {
    let state = 1;
    const next = () => {
      state = (state * 48271) % 2147483647;
      return state % 5;
    };
    return Array.from({ length: count }, (_, at) => ({ name: `x${at}`, dimension: Dimension.from(bases.map((base) => [base, Rational.of(next() - 2)] as const)) }));
  };

  it.each([30, 300])('%i symbols give all their groups', (count) => {
    const result = solveGroups({ dependent: 'x0', symbols: symbols(count) });
    expect(result.rank).toBe(4);
    expect(result.groups).toHaveLength(count - 4);
    expect(result.groups.filter(({ exponents }) => exponents.has('x0'))).toHaveLength(1);
  });

  it('lists sets without listing all of them', () => {
    const first = repeatingSets(systemOf({ dependent: 'x0', symbols: symbols(300) })).next();
    expect(first.done).toBe(false);
  });

  it('counts sets of like quantities as products of their numbers', () => {
    const lengths = Array.from({ length: 40 }, (_, at) => ({ name: `l${at}`, dimension: Dimension.base('L') }));
    const times = Array.from({ length: 50 }, (_, at) => ({ name: `t${at}`, dimension: Dimension.base('T') }));
    expect(solveGroups({ dependent: undefined, symbols: [...lengths, ...times] }).sets).toEqual({ count: 2000, exact: true });
  });
});
