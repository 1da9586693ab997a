import { describe, expect, it } from 'vitest';
import type { Chunk, Program, Stmt } from '../../server/src/program/nodes.ts';
import { faultsOf } from '../../server/src/program/well-formed.ts';

const text = 'x = y\n';
const statement: Stmt = { kind: 'assign', targets: [{ kind: 'name', name: 'x', start: 0, end: 1 }], value: { kind: 'name', name: 'y', start: 4, end: 5 }, start: 0, end: 5 };

function faults(change: { statement?: Stmt; chunk?: Partial<Chunk>; start?: number; second?: boolean }): readonly string[] {
  const chunk: Chunk = { anchor: { file: 'a.py', start: change.start ?? 0 }, text: 'x = y', statements: [change.statement ?? statement], problems: [], comments: [], ...change.chunk };
  const program: Program = { language: 'python', file: 'a.py', chunks: change.second ? [chunk, chunk] : [chunk] };
  return faultsOf(program, text);
}

describe('the checker of the common form', () => {
  it('is silent about a program that is well-formed', () => expect(faults({})).toEqual([]));

  it.each<[string, Parameters<typeof faults>[0], RegExp]>([
    ['a name that is not the text of its span', { statement: { ...statement, targets: [{ kind: 'name', name: 'z', start: 0, end: 1 }] } as Stmt }, /covers "x" and stands for "z"/],
    ['a part outside of its statement', { statement: { ...statement, end: 3 } as Stmt }, /value at 4-5 is not inside 0-3/],
    ['a span that runs backwards', { statement: { ...statement, start: 5, end: 4 } as Stmt }, /at 5-4/],
    ['a statement beyond its chunk', { statement: { ...statement, end: 9 } as Stmt }, /at 0-9 is not inside 0-5/],
    ['a comment that is not the text of its span', { chunk: { comments: [{ text: 'q', start: 0, end: 1 }] } }, /covers "x" and stands for "q"/],
    ['a chunk that is not where it says', { start: 1 }, /is not the text there/],
    ['chunks that overlap', { second: true }, /begins before the one above ends/],
    ['a chunk of another file', { chunk: { anchor: { file: 'b.py', start: 0 } } }, /names another file: b.py/],
  ])('finds %s', (_name, change, expected) => expect(faults(change).join('\n')).toMatch(expected));
});
