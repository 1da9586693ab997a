import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TextEdit } from '../../../server/src/frontends/frontend.ts';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { showProgram } from '../../harness/show-program.ts';
import { julia, parse } from './helpers.ts';
import { script } from './script.ts';

const file = 'script.jl';
const flat = script.replace('module Tank\n', '').replace(/end\n$/, '');
const fragments = ['\n', ' ', '#', '#=', '=#', '"', '"""', "'", '(', ')', '[', '{', ':', '::', '=', ' = 3', ',', '√', '𝒳', '\r', '\0', '\\', '$', '@', ';', 'end\n', 'const ', 'function f(a)\n  a\nend\n', 'if x\n', 'else\n', 'struct S\n', '"doc"\n', '2(', 'for i in'];

describe('any text', () => {
  it('parses without a syntax problem', () => expect(parse(script).chunks.flatMap((chunk) => chunk.problems)).toEqual([]));

  it('every prefix gives a well-formed program', () => {
    for (let end = 0; end <= script.length; end++) expect(faultsOf(parse(script.slice(0, end)), script.slice(0, end))).toEqual([]);
  });

  it('whatever is typed gives a well-formed program', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.constantFrom(...fragments), fc.string({ maxLength: 8 })), { maxLength: 14 }), (parts) => {
      const text = parts.join('');
      expect(faultsOf(parse(text), text)).toEqual([]);
    }), { numRuns: 300 });
  });
});

describe('parsing on from a previous version', () => {
  it('keeps the chunks that did not change', () => {
    const before = julia.parse(flat, file);
    const old = new Set(before.program.chunks);
    const after = julia.parse(flat.replace('4.0', '5.0'), file, before);
    expect(after.program.chunks.filter((chunk) => !old.has(chunk))).toHaveLength(1);
    after.release();
  });

  it('gives what a fresh parse gives, for any edits', () => {
    const anyEdit = fc.record({ at: fc.double({ min: 0, max: 1, noNaN: true }), length: fc.nat(30), text: fc.oneof(fc.constantFrom(...fragments), fc.constant('')) });
    fc.assert(fc.property(fc.array(fc.tuple(anyEdit, fc.boolean()), { minLength: 1, maxLength: 5 }), (edits) => {
      let parsed = julia.parse(flat, file);
      let text = flat;
      for (const [{ at, length, text: insert }, told] of edits) {
        const start = Math.floor(at * text.length);
        const edit: TextEdit = { start, end: Math.min(text.length, start + length), text: insert };
        text = text.slice(0, edit.start) + edit.text + text.slice(edit.end);
        parsed = julia.parse(text, file, parsed, told ? [edit] : undefined);
        expect(faultsOf(parsed.program, text)).toEqual([]);
        const fresh = julia.parse(text, file);
        if ([...fresh.program.chunks, ...parsed.program.chunks].every((chunk) => chunk.problems.length === 0)) expect(showProgram(parsed.program, true)).toBe(showProgram(fresh.program, true));
        fresh.release();
      }
      parsed.release();
    }), { numRuns: 100 });
  });
});
