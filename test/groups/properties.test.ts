import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { repeatingSets } from '../../server/src/groups/bases.ts';
import { expressIn, rankOf } from '../../server/src/groups/matrix.ts';
import { solveGroups } from '../../server/src/groups/solve.ts';
import { systemOf } from '../../server/src/groups/system.ts';
import type { Group, Relation } from '../../server/src/groups/types.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { equivalent, faults, floatRank } from './checks.ts';
import { fluidExamples, processExamples, solidExamples } from './examples.ts';
import { relation } from './relations.ts';

const bases = ['L', 'M', 'T', 'Θ'];
const exponent = fc.constantFrom('-3', '-2', '-1', '0', '0', '0', '1', '1', '2', '1/2').map((text) => Rational.parse(text) as Rational);
const anyDimension = fc.array(exponent, { minLength: 4, maxLength: 4 }).map((powers) => Dimension.from(powers.map((power, at) => [bases[at] as string, power] as const)));
const anyRelation = fc.array(anyDimension, { minLength: 1, maxLength: 9 }).map((dimensions): Relation => ({
  dependent: 'x0',
  symbols: dimensions.map((dimension, at) => ({ name: `x${at}`, dimension })),
}));
const worked = fc.constantFrom(...[...fluidExamples, ...processExamples, ...solidExamples]).map(({ relation: source }) => relation(source));

/** Factors by which the base units change; a dimensionless product does not feel them. */
const changeOfUnits = fc.record(Object.fromEntries(['L', 'M', 'T', 'Θ', 'I', 'N'].map((base) => [base, fc.double({ min: 0.01, max: 100, noNaN: true })])));

describe('for any relation', () => {
  it('every group is dimensionless, independent, in smallest integers, with the dependent symbol in the first only', () => {
    fc.assert(
      fc.property(anyRelation, (one) => {
        expect(faults(solveGroups(one))).toEqual([]);
      }),
      { numRuns: 150 },
    );
  });

  it('groups keep their value under a change of base units', () => {
    const value = fc.array(fc.double({ min: 0.1, max: 10, noNaN: true }), { minLength: 12, maxLength: 12 });
    fc.assert(
      fc.property(fc.oneof(anyRelation, worked), value, changeOfUnits, (one, values, change) => {
        for (const { exponents } of solveGroups(one).groups) {
          let [before, after] = [0, 0];
          for (const [name, power] of exponents) {
            const at = one.symbols.findIndex((symbol) => symbol.name === name);
            const own = Math.log(values[at] as number);
            const factor = (one.symbols[at] as { dimension: Dimension }).dimension.exponents.reduce((sum, [base, p]) => sum + p.toNumber() * Math.log(change[base] as number), 0);
            before += power.toNumber() * own;
            after += power.toNumber() * (own + factor);
          }
          expect(after).toBeCloseTo(before, 6);
        }
      }),
      { numRuns: 150 },
    );
  });

  it('every listed set of repeating symbols is solved into equivalent groups, and the count is that of the list', () => {
    fc.assert(
      fc.property(anyRelation, (one) => {
        const result = solveGroups(one);
        const sets = [...repeatingSets(systemOf(one))].map((set) => set.map(({ name }) => name));
        expect(result.sets).toEqual({ count: sets.length, exact: true });
        expect(new Set(sets.map((set) => set.join(' '))).size).toBe(sets.length);
        for (const repeating of sets.slice(0, 8)) {
          const other = solveGroups(one, { repeating });
          expect(faults(other)).toEqual([]);
          expect(equivalent(other.groups.map(({ exponents }) => exponents), result.groups.map(({ exponents }) => exponents), result.columns)).toBe(true);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('a group of the result can be kept, and is', () => {
    fc.assert(
      fc.property(anyRelation, fc.nat(), (one, pick) => {
        const { groups } = solveGroups(one);
        if (groups.length === 0) return;
        const kept = (groups[pick % groups.length] as (typeof groups)[number]).exponents;
        const again = solveGroups(one, { keep: [kept] });
        expect(faults(again)).toEqual([]);
        expect(again.groups.some(({ exponents }) => [...kept].every(([name, power]) => exponents.get(name)?.equals(power)) && exponents.size === kept.size)).toBe(true);
      }),
      { numRuns: 80 },
    );
  });

  it('symbols that take no part are those without which the rank falls', () => {
    fc.assert(
      fc.property(anyRelation, (one) => {
        const dimensions = one.symbols.map(({ dimension }) => dimension as Dimension);
        const alone = one.symbols.filter((_symbol, at) => rankOf(dimensions.filter((_one, index) => index !== at)) < rankOf(dimensions));
        expect(solveGroups(one).unmatched.map(({ symbol }) => symbol)).toEqual(alone.map(({ name }) => name));
      }),
      { numRuns: 150 },
    );
  });
});

describe('the checks themselves', () => {
  const result = solveGroups(relation('P power; N rate; D length; rho density; mu viscosity'));
  const [first, second] = result.groups as [Group, Group];
  const changed = (groups: readonly Group[]) => faults({ ...result, groups });
  const bent = (group: Group, name: string, power: number): Group => ({ ...group, exponents: new Map([...group.exponents, [name, Rational.of(power)]]) });

  it.each([
    ['a wrong exponent', [first, bent(second, 'D', 1)], 'leaves'],
    ['a missing group', [first], '1 groups of 5 symbols'],
    ['one group twice', [first, first], 'depend on each other'],
    ['the dependent symbol behind', [second, first], 'first group only'],
  ] as const)('see %s', (_what, groups, expected) => {
    expect(changed(groups).join('; ')).toContain(expected);
  });

  it('tell groups of another span apart', () => {
    expect(equivalent([first.exponents], [second.exponents], result.columns)).toBe(false);
  });
});

describe('elimination', () => {
  it('has the rank that floating point finds', () => {
    fc.assert(
      fc.property(fc.array(anyDimension, { maxLength: 8 }), (dimensions) => {
        expect(rankOf(dimensions)).toBe(floatRank(dimensions.map((dimension) => bases.map((base) => dimension.exponent(base).toNumber()))));
      }),
    );
  });

  it('expresses what it can, exactly', () => {
    fc.assert(
      fc.property(fc.array(anyDimension, { minLength: 1, maxLength: 4 }), fc.array(exponent, { minLength: 4, maxLength: 4 }), (set, powers) => {
        fc.pre(rankOf(set) === set.length);
        const target = set.reduce((product, dimension, at) => product.mul(dimension.pow(powers[at] as Rational)), Dimension.one);
        expect(expressIn(target, set)?.map(String)).toEqual(powers.slice(0, set.length).map(String));
      }),
    );
  });
});
