import { describe, expect, test } from 'vitest';
import { printedAgain } from './helpers.ts';

describe('what is printed has the form that it was printed from', () => {
  test.each([
    ['a*(b+c)', 'a*(b + c)'],
    ['a/(b*c)', 'a/(b*c)'],
    ['(a**b)**c', '(a**b)**c'],
    ['a**(b**c)', 'a**b**c'],
    ['(-a)**2', '(-a)**2'],
    ['-(a**2)', '-(a**2)'],
    ['a - (b - c)', 'a - (b - c)'],
    ['a - -b', 'a - -b'],
    ['a < b && c !== d || !e', 'a < b && c !== d || !e'],
    ['(a || b) && c', '(a || b) && c'],
    ['a > 0 ? b : (c ? d : e)', 'a > 0 ? b : c ? d : e'],
    ['Math.sqrt(a.b[1].c)', 'Math.sqrt(a.b[1].c)'],
    ['[1, 2.50, 1e-3]', '[1, 2.50, 1e-3]'],
    ['{ a: 1, "b c": [p, q] }', "{ a: 1, 'b c': [p, q] }"],
    ['f((v, w = 2) => v * w)', 'f((v, w = 2) => v*w)'],
    ['f((a, b) => ({ a: b }))', 'f((a, b) => ({ a: b }))'],
    ["\"it's\"", "\"it's\""],
  ])('%s', (text, expected) => {
    const { printed, before, after } = printedAgain(text);
    expect(printed).toBe(expected);
    expect(after).toBe(before);
  });
});
