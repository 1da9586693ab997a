/** What people have open while they type, and what lies about in folders: an answer, never a crash. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { engine } from '../harness/engine.ts';

const workspace = await engine();
const examples = join(import.meta.dirname, '../../examples');
const scripts = readdirSync(examples).filter((name) => name.endsWith('.py') || name.endsWith('.nomen')).map((name) => [name, readFileSync(join(examples, name), 'utf8')] as const);

/** Every span of a result lies in its text. */
function expectWhole(file: string, text: string): void {
  const { findings } = workspace.check(file, text);
  for (const { span, message, related } of findings) {
    expect(span.start).toBeGreaterThanOrEqual(0);
    expect(span.end).toBeGreaterThanOrEqual(span.start);
    expect(span.end).toBeLessThanOrEqual(text.length);
    expect(message).not.toMatch(/undefined|NaN|\[object/);
    for (const each of related) if (each.file === file) expect(each.span.end).toBeLessThanOrEqual(text.length);
  }
}

describe('unfinished code: every prefix', () => {
  test.each(scripts)('%s', (name, text) => {
    for (let end = 0; end <= text.length; end += name.endsWith('.nomen') ? 1 : 3) expectWhole(name, text.slice(0, end));
  }, 120_000);
});

test('a character lost or added anywhere', () => {
  fc.assert(fc.property(fc.constantFrom(...scripts), fc.nat(), fc.constantFrom('', '(', '"', "'''", '[', '\\', '\t', '#', ':', '\0', '\uD800', '²', '\r'), ([name, text], at, added) => {
    const place = at % text.length;
    expectWhole(name, text.slice(0, place) + added + text.slice(place + 1));
  }), { numRuns: 300 });
}, 120_000);

test.each<[string, string]>([
  ['nothing', ''],
  ['blanks', ' \t\n\r\n\f'],
  ['a mark of byte order', '\uFEFFx = 1  # [m]\n'],
  ['zero characters', 'x = 1 \0 # [m]\0\n'],
  ['brackets without end', `x = ${'('.repeat(3000)}`],
  ['a deep expression', `x = ${'('.repeat(2000)}1${')'.repeat(2000)}  # [m]\n`],
  ['a long sum', `x = 1.0  # [m]\ny = ${Array.from({ length: 4000 }, () => 'x').join(' + ')}\n`],
  ['a long power', `x = 1.0  # [m]\ny = ${Array.from({ length: 1000 }, () => 'x').join('**')}\n`],
  ['deep blocks', Array.from({ length: 100 }, (_, at) => `${' '.repeat(at)}if x:\n`).join('')],
  ['huge exponents', 'x = 1.0  # [m]\ny = x**1e308 + x**-1e308 + x**(10**400)\n'],
  ['a huge exponent in a unit', 'x = 1.0  # [m^999999999999999999999]\ny = x*x\nz = 2.0 # [1e999 m]\n'],
  ['lone surrogates', 'x = "\uD800" # [\uDC00m]\n'],
])('%s', (_what, text) => {
  expectWhole('bad.py', text);
  expectWhole('bad.nomen', text);
});

test('the same findings with every kind of line end and with tabs', () => {
  const text = 'def f(p, h):\n    # p [Pa], h [m]\n    s = p + h\n    return s\n';
  const lines = (source: string): readonly unknown[] => workspace.check('ends.py', source).findings.map((each) => [each.code, source.slice(each.span.start, each.span.end)]);
  expect(lines(text)).toHaveLength(1);
  for (const other of [text.replaceAll('\n', '\r\n'), text.replaceAll('    ', '\t')]) expect(lines(other)).toEqual(lines(text));
});
