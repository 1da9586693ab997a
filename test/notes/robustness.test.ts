import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readFile } from './helpers.ts';

const scraps = ['[m]', '(m/s)', '[', ']', '(', ')', '`', '``', ':param V: ', 'Parameters\n    ----------\n    ', 'Returns:\n        ', 'V : float\n        ', ' in ', 'degrees C', ', ', 'kg/m^3', '..', '[1]_', '\n    ', '\n', 'V', '=', 'empirical: ', 'termwise: allow ', ' depends on ', '°C [SI] or ', '[IP]', '\\left[', '√', '🙂', '\t', '0.5 .. 3', '[m/s^^2]', '"', "'"];
const text = fc.array(fc.oneof(fc.constantFrom(...scraps), fc.string({ maxLength: 6 })), { maxLength: 25 }).map((parts) => parts.join(''));

describe('any text', () => {
  test('in a comment is read without a throw, and spans stay inside', () => {
    fc.assert(fc.property(text, (words) => inside(`V = 2.0  # ${words.replace(/[\r\n]/g, ' ')}\n# ${words.replace(/[\r\n]/g, ' ')}\nD = V`)), { numRuns: 400 });
  });

  test('in documentation is read without a throw, and spans stay inside', () => {
    fc.assert(fc.property(text, (words) => inside(`def f(V, D):\n    r"""${words.replace(/"/g, "'")}"""\n    return V`)), { numRuns: 400 });
  });
});

function inside(source: string): void {
  const { chunks } = readFile(source);
  for (const { chunk, notes } of chunks) {
    for (const { span } of [...notes.notes, ...notes.problems, ...notes.directives, ...notes.unread]) {
      expect(span.start).toBeGreaterThanOrEqual(0);
      expect(span.end).toBeGreaterThanOrEqual(span.start);
      expect(span.end).toBeLessThanOrEqual(chunk.text.length);
    }
    for (const note of notes.notes) if (note.unit.scale) expect(chunk.text.slice(note.span.start, note.span.end).replace(/\s+/g, ' ')).toBe(note.unit.text);
  }
}

test('the text of a note is the text of its unit, on every form', () => {
  inside('V = 2.0  # [ m/s ] speed\nw = 3 # in kg per hour, dry\nq = 4 # W/(m K) wall\nz = 1 # (kg/s)');
});
