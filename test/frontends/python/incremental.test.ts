import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Parsed, TextEdit } from '../../../server/src/frontends/frontend.ts';
import type { Chunk } from '../../../server/src/program/nodes.ts';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { parsePython, python } from '../../harness/python.ts';
import { showProgram } from '../../harness/show-program.ts';
import { script } from './script.ts';

const file = 'script.py';
const fragments = ['\n', ' ', '    ', '#', '"', '"""', "'", '(', ')', '[', '{', ':', '=', ',', 'é', '𝒳', '\r', '\0', '\\', '+ 1', 'x = 2\n', '# [m]\n', 'def f(a):\n    return a\n', 'if x:\n', 'else:\n', '@', '$'];
const anyEdit = fc.record({ at: fc.double({ min: 0, max: 1, noNaN: true }), length: fc.nat(40), text: fc.oneof(fc.constantFrom(...fragments), fc.constant(''), fc.string({ maxLength: 6 })) });
type AnyEdit = typeof anyEdit extends fc.Arbitrary<infer T> ? T : never;

function placed(text: string, edit: AnyEdit): TextEdit {
  const start = Math.floor(edit.at * text.length);
  return { start, end: Math.min(text.length, start + edit.length), text: edit.text };
}

function edited(text: string, edit: TextEdit): string {
  return text.slice(0, edit.start) + edit.text + text.slice(edit.end);
}

/** The number of chunks that came back as the same objects. */
function reused(before: readonly Chunk[], after: Parsed): number {
  const old = new Set(before);
  return after.program.chunks.filter((chunk) => old.has(chunk)).length;
}

describe('parsing on from a previous version', () => {
  it('gives what a fresh parse gives, and a well-formed program, for any edits', () => {
    fc.assert(fc.property(fc.array(fc.tuple(anyEdit, fc.boolean()), { minLength: 1, maxLength: 6 }), (edits) => {
      let parsed = python.parse(script, file);
      let text = script;
      for (const [any, told] of edits) {
        const edit = placed(text, any);
        text = edited(text, edit);
        parsed = python.parse(text, file, parsed, told ? [edit] : undefined);
        expect(faultsOf(parsed.program, text)).toEqual([]);
        const fresh = parsePython(text);
        if (clean(fresh.chunks) && clean(parsed.program.chunks)) expect(showProgram(parsed.program, true)).toBe(showProgram(fresh, true));
        expect(faultsOf(fresh, text)).toEqual([]);
      }
      parsed.release();
    }), { numRuns: 150 });
  });

  it('gives what a fresh parse gives once an error is mended, for any edit', () => {
    fc.assert(fc.property(anyEdit, anyEdit, (one, two) => {
      const first = placed(script, one);
      const second = placed(edited(script, first), two);
      const broken = python.parse(edited(script, first), file, python.parse(script, file), [first]);
      const worse = python.parse(edited(broken.text, second), file, broken, [second]);
      const mended = python.parse(script, file, worse);
      expect(showProgram(mended.program, true)).toBe(showProgram(parsePython(script), true));
      mended.release();
    }), { numRuns: 150 });
  });

  it('takes several edits in one go', () => {
    const edits: TextEdit[] = [{ start: 0, end: 0, text: 'é = 1\n' }, { start: 0, end: 1, text: 'ab' }, { start: script.length + 7, end: script.length + 7, text: 'z = 3\n' }];
    const text = edits.reduce(edited, script);
    const parsed = python.parse(text, file, python.parse(script, file), edits);
    expect(showProgram(parsed.program, true)).toBe(showProgram(parsePython(text), true));
  });

  it('does not trust edits that are not those', () => {
    const text = script.replace('g = 9.81', 'gravity = 9.81');
    const parsed = python.parse(text, file, python.parse(script, file), [{ start: 3, end: 99_999, text: '' }]);
    expect(showProgram(parsed.program, true)).toBe(showProgram(parsePython(text), true));
  });

  it('may start twice from one version, and after its release', () => {
    const previous = python.parse(script, file);
    const one = python.parse(`${script}z = 1\n`, file, previous);
    const two = python.parse(`${script}z = 2\n`, file, previous);
    previous.release();
    one.release();
    one.release();
    expect(showProgram(two.program, true)).toBe(showProgram(parsePython(`${script}z = 2\n`), true));
  });
});

describe('chunks', () => {
  it.each<[string, (text: string) => string, number]>([
    ['a changed line', (text) => text.replace('g = 9.81 ', 'g = 9.80 '), 1],
    ['a line in a function', (text) => text.replace('v *= 1.0', 'v *= 2.0'), 1],
    ['a changed comment', (text) => text.replace('mean flow', 'peak flow'), 1],
    ['a line at the top', (text) => text.replace('import math', 'import os\nimport math'), 1],
    ['a line at the end', (text) => `${text}z = 1\n`, 1],
    ['blank lines between statements', (text) => text.replaceAll('\n\n\n', '\n\n\n\n').replace('\nimport', '\n\nimport'), 0],
    ['a removed line', (text) => text.replace('import math\n', ''), 0],
    ['one of two equal lines removed', (text) => text.replace('print(', 'x = 1\nprint('), 1],
    ['an import above the documentation', (text) => `import os\n\n${text}`, 2],
    ['a comment block above the documentation', (text) => `# free for all\n\n${text}`, 1],
    ['the module documentation removed', (text) => text.replace(/"""S[\s\S]*?"""\n/, ''), 1],
  ])('lowers only what changed: %s', (_name, change, lowered) => {
    const previous = python.parse(script, file);
    const { chunks } = previous.program;
    const after = python.parse(change(script), file, previous);
    expect(after.program.chunks.length - reused(chunks, after)).toBe(lowered);
    expect(showProgram(after.program, true)).toBe(showProgram(parsePython(change(script)), true));
  });

  it('keep their order where the same line stands twice', () => {
    const previous = python.parse('x = 1\ny = 2\nx = 1\n', file);
    const [first, , third] = previous.program.chunks;
    const after = python.parse('x = 1\nz = 2\nx = 1\n', file, previous);
    expect(after.program.chunks[0]).toBe(first);
    expect(after.program.chunks[2]).toBe(third);
  });

  it('move with the text', () => {
    const previous = python.parse('x = 1\ny = 2', file);
    const after = python.parse('# new\n\n\nx = 1\ny = 2', file, previous);
    expect(after.program.chunks.map((chunk) => chunk.anchor.start)).toEqual([0, 8, 14]);
  });

  it('are one per statement, with the comments directly above', () => {
    const texts = parsePython('# a\n\n# b\n# c\nx = 1  # d\ny = 2; z = 3\n# e\n\nif x:\n  y = 1\n\n  z = 2\nelse:\n  y = 2\n# f').chunks.map((chunk) => chunk.text);
    expect(texts).toEqual(['# a', '# b\n# c\nx = 1  # d', 'y = 2; z = 3', '# e', 'if x:\n  y = 1\n\n  z = 2\nelse:\n  y = 2', '# f']);
  });
});

describe('any text', () => {
  it('every beginning of a script parses to a well-formed program', () => {
    let previous: Parsed | undefined;
    for (let length = 0; length <= script.length; length++) {
      const text = script.slice(0, length);
      previous = python.parse(text, file, previous);
      expect(faultsOf(previous.program, text)).toEqual([]);
    }
    previous?.release();
  });

  it('random characters never throw', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.constantFrom(...fragments), fc.string({ unit: 'binary', maxLength: 8 })), { maxLength: 40 }), (parts) => {
      const text = parts.join('');
      expect(faultsOf(parsePython(text), text)).toEqual([]);
    }), { numRuns: 300 });
  });

  it.each(['', '\n', '\0', '\uFEFFx = 1', '\uFEFF', '\ud800', 'x = "\udfff"', '\r\r\r', '\t', 'x = 1\ry = 2'])('%j', (text) => expect(faultsOf(parsePython(text), text)).toEqual([]));

  it('a lone return ends a line', () => expect(parsePython('x = 1\ry = 2  # [m]\rz = 3').chunks.map((chunk) => chunk.text)).toEqual(['x = 1', 'y = 2  # [m]', 'z = 3']));
});

function clean(chunks: readonly Chunk[]): boolean {
  return chunks.every((chunk) => chunk.problems.length === 0);
}
