/**
 * What must hold of any script: a half-written one is read without a throw, and findings do not depend on which base unit stands
 * for which base quantity.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { LineIndex } from '../../server/src/text/line-index.ts';
import { engine } from '../harness/engine.ts';

const workspace = await engine();
const folder = join(import.meta.dirname, '../../examples');
const scripts = readdirSync(folder).filter((name) => name.endsWith('.py')).map((name) => [name, readFileSync(join(folder, name), 'utf8')] as const);

test.each(scripts)('every beginning of %s is read', (name, text) => {
  const step = Math.max(1, Math.floor(text.length / 60));
  for (let end = 0; end < text.length; end += step) {
    const { findings } = workspace.check(`examples/${name}`, text.slice(0, end));
    expect(findings.every((each) => each.span.start <= each.span.end && each.span.end <= end)).toBe(true);
  }
});

const symbols = ['a', 'b', 'c', 'd'] as const;
const bases = ['m', 'kg', 's', 'A'] as const;
const exponents = fc.tuple(...bases.map(() => fc.integer({ min: -2, max: 2 })));
const term = fc.tuple(fc.constantFrom(...symbols), fc.constantFrom('*', '/'), fc.constantFrom(...symbols), fc.constantFrom('', '**2')).map(([x, op, y, power]) => `${x}${op}${y}${power}`);
const expression = fc.tuple(term, fc.constantFrom('+', '-', '*', '/'), term).map(([x, op, y]) => `${x} ${op} ${y}`);
const program = fc.record({ units: fc.tuple(...symbols.map(() => exponents)), lines: fc.array(fc.tuple(expression, fc.option(exponents)), { minLength: 1, maxLength: 4 }) });

type Exponents = readonly number[];

/** The exponents as a unit in which each base is written by the unit at its place. */
function unit(powers: Exponents, names: readonly string[]): string {
  const text = powers.flatMap((power, at) => (power === 0 ? [] : [`${names[at]}^${power}`])).join(' ');
  return text === '' ? '1' : text;
}

/** Codes and lines of the errors of a program written in the given base units. */
function errors({ units, lines }: { units: readonly Exponents[]; lines: readonly (readonly [string, Exponents | null])[] }, names: readonly string[]): readonly string[] {
  const head = symbols.map((name, at) => `${name} = f()  # [${unit(units[at] as Exponents, names)}]`);
  const body = lines.map(([text, powers], at) => `y${at} = ${text}${powers ? `  # [${unit(powers, names)}]` : ''}`);
  const text = [...head, ...body, ''].join('\n');
  const index = new LineIndex(text);
  return workspace.check('program.py', text).findings.filter((each) => each.severity === 'error').map((each) => `${index.lineAt(each.span.start)} ${each.code}`);
}

test('base units may change their places', () => {
  let found = 0;
  fc.assert(fc.property(program, fc.shuffledSubarray([...bases], { minLength: bases.length }), (written, order) => {
    const before = errors(written, bases);
    found += before.length;
    expect(errors(written, order)).toEqual(before);
  }), { numRuns: 150 });
  expect(found).toBeGreaterThan(50);
});

test('a program in grams and centimetres is as right as one in kilograms and metres', () => {
  fc.assert(fc.property(program, (written) => {
    expect(errors(written, ['cm', 'g', 's', 'A'])).toEqual(errors(written, bases));
  }), { numRuns: 150 });
});
