import { describe, expect, it } from 'vitest';
import { groupNames } from '../../server/src/groups/names.ts';
import { solveGroups } from '../../server/src/groups/solve.ts';
import { equivalent, faults, product } from './checks.ts';
import { type Example, fluidExamples, processExamples, solidExamples } from './examples.ts';
import { relation } from './relations.ts';

describe.each([
  ['fluid mechanics', fluidExamples],
  ['process engineering', processExamples],
  ['solid mechanics, vibration, circuits', solidExamples],
] as const)('worked examples: %s', (_field, examples) => {
  it.each(examples.map((example) => [example.source, example] as const))('%s', (_source, example: Example) => {
    const result = solveGroups(relation(example.relation));
    const published = example.groups.map(product);
    expect(faults(result)).toEqual([]);
    expect(result.rank).toBe(example.rank);
    expect(result.unmatched.map(({ symbol }) => symbol)).toEqual(example.unmatched ?? []);
    expect(result.groups).toHaveLength(example.groups.length);
    expect(equivalent(result.groups.map(({ exponents }) => exponents), published, result.columns)).toBe(true);
    const names = result.groups.flatMap(groupNames).map((name) => name.replace(/^[\d./*^()pi]+ (of|times) /, ''));
    for (const name of example.named ?? []) expect(names).toContain(name);
  });
});
