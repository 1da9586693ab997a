/** The elimination against linear algebra of its own kind: consistency by rank, solutions by substitution. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newUnknown } from '../../server/src/constraints/context.ts';
import { type Form, multiplyForms, raiseForm, unknownForm } from '../../server/src/constraints/form.ts';
import type { Constraint } from '../../server/src/constraints/problem.ts';
import { Dimension } from '../../server/src/quantities/dimension.ts';
import { Rational } from '../../server/src/quantities/rational.ts';
import { Elimination } from '../../server/src/solver/eliminate.ts';

const because = {} as Constraint;
const size = 4;
/** One equation: powers of the unknowns, and the powers of L and T that their product must have. */
type Row = readonly [powers: readonly number[], length: number, time: number];
const rows = fc.array(fc.tuple(fc.array(fc.integer({ min: -2, max: 2 }), { minLength: size, maxLength: size }), fc.integer({ min: -3, max: 3 }), fc.integer({ min: -3, max: 3 })), { minLength: 1, maxLength: 7 });

function sides([powers, length, time]: Row, unknowns: readonly Form[]): readonly [Form, Form] {
  const one: Form = { dimension: Dimension.one, terms: [] };
  const left = unknowns.reduce((form, unknown, at) => multiplyForms(form, raiseForm(unknown, Rational.of(powers[at] ?? 0))), one);
  return [left, { dimension: Dimension.from([['L', Rational.of(length)], ['T', Rational.of(time)]]), terms: [] }];
}

function run(equations: readonly Row[]) {
  const unknowns = Array.from({ length: size }, (_, at) => unknownForm(newUnknown(`x${at}`, undefined, 'parameter')));
  const elimination = new Elimination();
  const outcomes = equations.map((row) => {
    const [left, right] = sides(row, unknowns);
    return elimination.equate(left, right, because, false).kind;
  });
  return { unknowns, elimination, outcomes };
}

/** Rank over the rationals by fraction-free elimination of integers. */
function rank(matrix: readonly (readonly number[])[]): number {
  const work = matrix.map((row) => row.map((entry) => BigInt(entry)));
  let found = 0;
  for (let column = 0; column < (work[0]?.length ?? 0); column++) {
    const at = work.findIndex((row, index) => index >= found && row[column] !== 0n);
    if (at < 0) continue;
    [work[found], work[at]] = [work[at] as bigint[], work[found] as bigint[]];
    const pivot = work[found] as bigint[];
    for (let below = found + 1; below < work.length; below++) {
      const row = work[below] as bigint[];
      const factor = row[column] as bigint;
      work[below] = row.map((entry, index) => entry * (pivot[column] as bigint) - (pivot[index] as bigint) * factor);
    }
    found++;
  }
  return found;
}

describe('elimination over unknown dimensions', () => {
  it('contradicts exactly where the augmented rank exceeds the rank (Rouché–Capelli)', () => {
    fc.assert(fc.property(rows, (equations) => {
      const plain = equations.map(([powers]) => powers);
      const consistent = rank(plain) === rank(equations.map(([powers, length]) => [...powers, length])) && rank(plain) === rank(equations.map(([powers, , time]) => [...powers, time]));
      expect(run(equations).outcomes.includes('contradicts')).toBe(!consistent);
    }));
  });

  it('solves as many unknowns as the rank, and every accepted equation holds afterwards', () => {
    fc.assert(fc.property(rows, (equations) => {
      const { unknowns, elimination, outcomes } = run(equations);
      const accepted = equations.filter((_, at) => outcomes[at] !== 'contradicts');
      expect(outcomes.filter((kind) => kind === 'solved').length).toBe(rank(accepted.map(([powers]) => powers)));
      for (const row of accepted) {
        const [left, right] = sides(row, unknowns);
        const reduced = elimination.reduce(left);
        expect(reduced.terms.length).toBe(0);
        expect(reduced.dimension.key).toBe(right.dimension.key);
      }
    }));
  });

  it('finds the same verdict in any order', () => {
    fc.assert(fc.property(rows, fc.integer(), (equations, seed) => {
      const turned = [...equations].sort((a, b) => ((a[1] * 31 + a[2] * 17 + seed) % 7) - ((b[1] * 31 + b[2] * 17 + seed) % 7));
      expect(run(turned).outcomes.includes('contradicts')).toBe(run(equations).outcomes.includes('contradicts'));
    }));
  });
});
