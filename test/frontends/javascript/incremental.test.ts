import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Parsed } from '../../../server/src/frontends/frontend.ts';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { showProgram } from '../../harness/show-program.ts';
import { javascript, typescript } from './helpers.ts';
import { script } from './script.ts';

const file = 'script.js';
const fragments = ['\n', ' ', '//', '/*', '*/', '/** [m] */', '"', "'", '`', '(', ')', '[', ']', '{', '}', ':', '=', ',', ';', '...', '\r', '\0', '.', '@', '=>', 'function f(', 'class A {', 'export ', 'import ', 'x = 2;\n', '// [m]\n', 'é', '𝒳', '!', '?', '<T>', 'async ', '${'];
const anyEdit = fc.record({ at: fc.double({ min: 0, max: 1, noNaN: true }), length: fc.nat(40), text: fc.oneof(fc.constantFrom(...fragments), fc.constant(''), fc.string({ maxLength: 6 })) });

describe('parsing on from a previous version', () => {
  it('gives well-formed programs for any edits', () => {
    fc.assert(fc.property(fc.array(anyEdit, { minLength: 1, maxLength: 5 }), (edits) => {
      let parsed = javascript.parse(script, file);
      for (const { at, length, text } of edits) {
        const start = Math.floor(at * parsed.text.length);
        const edited = parsed.text.slice(0, start) + text + parsed.text.slice(start + length);
        parsed = javascript.parse(edited, file, parsed);
        expect(faultsOf(parsed.program, edited)).toEqual([]);
      }
      parsed.release();
    }), { numRuns: 60 });
  });
});

describe('chunks', () => {
  it.each<[string, (text: string) => string]>([
    ['a changed line', (text) => text.replace('const y = 1', 'const y = 3')],
    ['a line in a function', (text) => text.replace('18 * mu', '17 * mu')],
    ['a line in its documentation', (text) => text.replace('grain size', 'size')],
    ['a line at the end', (text) => `${text}const last = 1;\n`],
  ])('only what changed is lowered again: %s', (_name, change) => {
    const previous = javascript.parse(script, file);
    const old = new Set(previous.program.chunks);
    const after = javascript.parse(change(script), file, previous);
    expect(after.program.chunks.filter((chunk) => !old.has(chunk))).toHaveLength(1);
    expect(showProgram(after.program, true)).toBe(showProgram(javascript.parse(change(script), file).program, true));
  });
});

describe('any text', () => {
  it.each([['JavaScript', javascript], ['TypeScript', typescript]])('every beginning of a script parses to a well-formed program: %s', (_name, host) => {
    let previous: Parsed | undefined;
    for (let length = 0; length <= script.length; length++) {
      const text = script.slice(0, length);
      previous = host.parse(text, file, previous);
      expect(faultsOf(previous.program, text)).toEqual([]);
    }
    expect(previous?.program.chunks.flatMap((chunk) => chunk.problems)).toEqual([]);
  });

  it('never throws', () => {
    fc.assert(fc.property(fc.string({ maxLength: 80 }), (text) => {
      expect(faultsOf(javascript.parse(text, file).program, text)).toEqual([]);
    }), { numRuns: 150 });
  });
});
