import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { showLine, widthOf, wrap } from '../../server/src/cli/terminal.ts';

describe('a source line with its underline', () => {
  test.each([
    ['total = p + h', 8, 13, 40, 'total = p + h', '        ^^^^^'],
    ['\tp + h', 1, 6, 40, '    p + h', '    ^^^^^'],
    ['x\t= p', 4, 5, 40, 'x   = p', '      ^'],
    ['ρ = 温度 + p', 4, 6, 40, 'ρ = 温度 + p', '    ^^^^'],
    ['a\u0301b = p', 6, 7, 40, 'a\u0301b = p', '     ^'],
    ['"😀" + p', 7, 8, 40, '"😀" + p', '       ^'],
    ['p = 1', 5, 5, 40, 'p = 1', '     ^'],
    ['a\u001B[31mb', 0, 1, 40, 'a·[31mb', '^'],
    ['a\u202Eb', 2, 3, 40, 'a·b', '  ^'],
  ])('%j %i..%i', (source, start, end, width, text, underline) => {
    expect(showLine(source, start, end, width)).toEqual({ text, underline });
  });

  test('that is too long is cut around the part', () => {
    const source = `${'a + '.repeat(30)}WRONG${' + b'.repeat(30)}`;
    const shown = showLine(source, 120, 125, 40);
    expect(shown.text).toMatch(/^….*WRONG.*…$/);
    expect(widthOf(shown.text)).toBeLessThanOrEqual(40);
    expect(shown.text.slice(shown.underline.indexOf('^'), shown.underline.length)).toBe('WRONG');
  });

  test('always fits, and the carets stand under the part', () => {
    fc.assert(fc.property(fc.string({ minLength: 1, maxLength: 200, unit: 'binary' }), fc.nat(), fc.nat(), fc.integer({ min: 20, max: 100 }), (source, a, b, width) => {
      const [start, end] = [Math.min(a, b) % source.length, (Math.max(a, b) % source.length) + 1];
      const shown = showLine(source, start, Math.max(end, start + 1), width);
      expect(widthOf(shown.text)).toBeLessThanOrEqual(width);
      expect(shown.text).not.toMatch(/[\u0000-\u001F]/);
      expect(shown.underline).toMatch(/^ *\^* *$/);
    }));
  });
});

describe('wrapping', () => {
  test.each([
    ['one two three', 7, ['one two', 'three']],
    ['a word_that_is_too_long b', 6, ['a', 'word_that_is_too_long', 'b']],
    ['', 10, ['']],
    ['first\nsecond line', 20, ['first', 'second line']],
  ])('%j to %i', (text, width, lines) => {
    expect(wrap(text, width)).toEqual(lines);
  });

  test('keeps every word in order', () => {
    fc.assert(fc.property(fc.array(fc.stringMatching(/^[a-z]{1,12}$/)), fc.integer({ min: 1, max: 60 }), (words, width) => {
      expect(wrap(words.join(' '), width).join(' ')).toBe(words.join(' '));
    }));
  });
});
