import { describe, expect, it } from 'vitest';
import { shown, valueOf } from './helpers.ts';

describe('expressions', () => {
  it.each([
    ['a + b*c^2', '(+ a (* b (** c 2)))'],
    ['a.*b./c.^2', '(/ (* a b) (** c 2))'],
    ['A\\b', '(\\ A b)'],
    ['-a^2', '(- (** a 2))'],
    ['2^-1', '(** 2 (- 1))'],
    ['a^b^c', '(** (** a b) c)'],
    ['-2*a', '(* (- 2) a)'],
    ['a - (b - c)', '(- a (- b c))'],
    ['~a == b', '(cmp (not a) == b)'],
    ['!a != b', '(cmp (not a) != b)'],
    ['a ~= b && c | d', '(and (cmp a != b) (or c d))'],
    ['a || b && c', '(or a (and b c))'],
    ['a || b || c', '(or a b c)'],
    ['a < b', '(cmp a < b)'],
    ["a'", '(transpose a)'],
    ["a.'*b'", '(* (transpose a) (transpose b))'],
    ["a^b'", '(transpose (** a b))'],
    ["x(1)'", '(transpose (at x 1))'],
    ["a' + 'text'", '(+ (transpose a) "text")'],
    ["'it''s'", '"it\'s"'],
    ['"say ""x"" \\" y"', '"say \\"x\\" \\\\\\" y"'],
    ['1:3', '(slice 1 3)'],
    ['0:dt:t_end', '(slice 0 t_end dt)'],
    ['a+1:b', '(slice (+ a 1) b)'],
    ['true & false', '(and True False)'],
    ['1e3 + 1.5d-3 + .5 + 5.', '(+ (+ (+ 1000 3/2000) 1/2) 5)'],
    ['0x1F + 0b101', '(+ 31 5)'],
    ['1./x', '(/ 1 x)'],
    ["[1.']", '(matrix (transpose 1))'],
    ['2i', '2i?'],
    ['1 + ...\n 2', '(+ 1 2)'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('blanks in matrices', () => {
  it.each([
    ['[a -b]', '(matrix a (- b))'],
    ['[a - b]', '(matrix (- a b))'],
    ['[a -b + c]', '(matrix a (+ (- b) c))'],
    ['[a-b]', '(matrix (- a b))'],
    ['[a , -b]', '(matrix a (- b))'],
    ["[a' b']", '(matrix (transpose a) (transpose b))'],
    ["[a 'b' c]", '(matrix a "b" c)'],
    ["[a, 'b']", '(matrix a "b")'],
    ["[a']", '(matrix (transpose a))'],
    ["['m' 'n']", '(matrix "m" "n")'],
    ['[f(1) -x]', '(matrix (f 1) (- x))'],
    ['[f (1)]', '(matrix f 1)'],
    ['[x(1, 2) 3]', '(matrix (at x 1 2) 3)'],
    ['[(a - b) c]', '(matrix (- a b) c)'],
    ['[a == b, ~c]', '(matrix (cmp a == b) (not c))'],
    ['[1 2; 3 4]', '(matrix (list 1 2) (list 3 4))'],
    ['[1 2\n 3 4]', '(matrix (list 1 2) (list 3 4))'],
    ['[1, 2, ...\n 3]', '(matrix 1 2 3)'],
    ['[1 2 % first\n\n 3 4]', '(matrix (list 1 2){# first} (list 3 4)) # first'],
    ['[]', '(matrix)'],
    ['{1, \'a\', @(x) x + 1}', '(set 1 "a" (lambda (x) (+ x 1)))'],
    ['{@sin @cos}', '(set sin cos)'],
    ['{}', '(set)'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('brackets behind a name', () => {
  it.each([
    ['x(3)', '(at x 3)'],
    ['f(3)', '(f 3)'],
    ['x(end)', '(at x end)'],
    ['x(end-1, :)', '(at x (- end 1) (slice None None))'],
    ['x(:)', '(at x (slice None None))'],
    ['x(2:end)', '(at x (slice 2 end))'],
    ['c{2}', '(at c 2)'],
    ['c{2}(3)', '(at (at c 2) 3)'],
    ['f(c{:})', '(f ...(at c (slice None None)))'],
    ['s.a.b', '(. (. s a) b)'],
    ['s.a(2).b', '(. (at (. s a) 2) b)'],
    ['s.(n)', '(? s n)'],
    ["s.('rho')", '(. s rho)'],
    ['s.end', '(. s end)'],
    ['pkg.flow(2)', '(pkg.flow 2)'],
    ['f(a, [], 2)', '(f a (matrix) 2)'],
    ['f(~, a)', '(f (?) a)'],
    ['f(x, Method="linear")', '(f x Method="linear")'],
    ['@(t, y) [y(2); -x*y(1)]', '(lambda (t, y) (matrix (list (at y 2)) (list (* (- x) (at y 1)))))'],
    ['@pkg.flow', 'pkg.flow'],
    ["struct('rho', 998, 'mu', 1e-3)", '{"rho": 998, "mu": 1/1000}'],
    ["struct('n', 1, names{:})", '(struct "n" 1 ...(at names (slice None None)))'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('what cannot be read', () => {
  it.each([
    ['a +', '(= v (?))\n! an operand is missing'],
    ['f(a', '(= v (?))\n! ( is not closed\n! ) is missing'],
    ['(a]', '(= v (?))'],
    ['a b', '(= v (?))\n! b does not fit here'],
    ["'text", '(= v "text")\n! \' is not closed'],
    ['@', '(= v (?))\n! a function is missing behind @'],
    ['s.', '(= v (?))\n! the name of a field is missing'],
  ])('%s is unknown and no other statement suffers', (text, form) => {
    const lines = shownBetween(text);
    expect(lines[0]).toBe('(= u 1)');
    expect(lines.slice(1, -1).join('\n')).toContain(form.split('\n')[0]);
    for (const problem of form.split('\n').slice(1)) expect(lines).toContain(problem);
    expect(lines.at(-1)).toBe('(= w 2)');
  });
});

function shownBetween(text: string): readonly string[] {
  return shown(`u = 1;\nv = ${text}\nw = 2;`).split('\n');
}
