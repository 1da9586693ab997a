import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../../server/src/program/well-formed.ts';
import { parse, shown } from './helpers.ts';
import { classFile, script } from './script.ts';

const lines = (...all: string[]): string => all.join('\n');

describe('statements', () => {
  it.each<[string, string]>([
    ['x = 1;', '(= x 1)'],
    ['x = 1, y = 2', lines('(= x 1)', '(= y 2)')],
    ['a = b = 3', '(= a b 3)'],
    ['x ./= 2; x .^= 3;', lines('(/= x 2)', '(**= x 3)')],
    ['x += 2; y ^= 2;', lines('(+= x 2)', '(**= y 2)')],
    ['x = 1; x++;', lines('(= x 1)', 'x')],
    ['[a, b] = f(x);', '(= (tuple a b) (f x))'],
    ['[~, i] = max(x);', '(= (tuple (?) i) (max x))'],
    ['[a(2) s.b] = f;', '(= (tuple (at a 2) (. s b)) (f))'],
    ['[a] = f(x);', '(= a (f x))'],
    ['x(3) = [];', '(= (at x 3) (matrix))'],
    ['s.a.b(2).c = 1;', '(= (. (at (. (. s a) b) 2) c) 1)'],
    ['f(3);', '(f 3)'],
    ['if a, x = 1; end', lines('if a', '  (= x 1)')],
    ['if (a) x = 1; else x = 2; end', lines('if a', '  (= x 1)', 'else', '  (= x 2)')],
    ['if a\n x = 1;\nelseif b\n x = 2;\nendif', lines('if a', '  (= x 1)', 'elif b', '  (= x 2)')],
    ['for k = 1:3\n x = k;\nend', lines('for k in (slice 1 3)', '  (= x k)')],
    ['parfor (k = 1:n, 4)\n x = k;\nend', lines('for k in (slice 1 n)', '  (= x k)')],
    ['while x < 3, x = x + 1; endwhile', lines('while (cmp x < 3)', '  (= x (+ x 1))')],
    ['do\n x = 1;\nuntil x > 2', lines('while ', '  (= x 1)', '  (cmp x > 2)')],
    ["switch m\n case 'a'\n x = 1;\n otherwise\n x = 2;\nend", lines('match m', 'case if "a"', '  (= x 1)', 'case', '  (= x 2)')],
    ['try\n x = 1;\ncatch err\n x = 2;\nend', lines('try', '  (= x 1)', 'except', '  (= x 2)')],
    ['try, x = 1; end', lines('try', '  (= x 1)', 'except')],
    ['unwind_protect\n x = 1;\nunwind_protect_cleanup\n y = 2;\nend_unwind_protect', lines('try', '  (= x 1)', 'finally', '  (= y 2)')],
    ['global a b', '(outer a b)'],
    ['persistent n = 3;', '(outer n)'],
    ["error('bad %g', x)", '(raise "bad %g" x)'],
    ["error 'not possible'", '(raise)'],
    ['break', '(break)'],
    ['if (k = f(x)) > 0, end', 'if (cmp (:= k (f x)) > 0)'],
  ])('%s', (text, form) => expect(shown(text)).toBe(form));
});

describe('command syntax', () => {
  it.each(['hold on', 'format long', 'clear x y', 'close all;', "disp 'a; b'", 'pkg load statistics', 'print -dpng plot.png', 'warning off MATLAB:x % quiet', 'cd ..', '!ls *.m', 'load data.mat'])('%s', (text) => expect(shown(text).replace(/ #.*$/, '')).toBe('(do)'));
  it.each([
    ['a + b', '(+ a b)'], ['a +b', '(do)'], ['a = b', '(= a b)'], ['a == b', '(cmp a == b)'], ['a (1) = 2', '(= (at a 1) 2)'], ['a', 'a'], ["a'", '(transpose a)'], ['a += 1', '(+= a 1)'], ['a +=1', '(+= a 1)'],
    ['x ...\n = 1', '(= x 1)'],
  ])('%s', (text, form) => expect(shown(text)).toBe(form));
});

describe('functions', () => {
  it.each<[string, string]>([
    ['function f\nx = 1;', lines('def f()', '  (= x 1)')],
    ['function y = f(x)\ny = x;', lines('def f(x)', '  (= y x)', '  (return y)')],
    ['function [a, b] = f(x, ~, varargin)\na = x(1);\nif x > 2, return, end\nb = varargin{1};\nend', lines('def f(x, ~, *varargin)', '  (= a (at x 1))', '  if (cmp x > 2)', '    (return (tuple a b))', '  (= b (at varargin 1))', '  (return (tuple a b))')],
    ['function y = f(x)\ny = g(x);\nfunction z = g(x)\nz = x;', lines('def f(x)', '  (= y (g x))', '  (return y)', 'def g(x)', '  (= z x)', '  (return z)')],
    ['function y = f(x)\ny = g(2);\n  function z = g(a)\n  z = a*x(1);\n  end\nend', lines('def f(x)', '  (= y (g 2))', '  def g(a)', '    (= z (* a (at x 1)))', '    (return z)', '  (return y)')],
    ['function y = f(x = 3)\ny = x;\nendfunction', lines('def f(x=3)', '  (= y x)', '  (return y)')],
    ['function y = f(x), y = x; end', lines('def f(x)', '  (= y x)', '  (return y)')],
    ['function y = f(x)\narguments\n x (1,1) double = 2 % [m]\nend\ny = x;\nend', lines('def f(x : (1,1) double=2 # [m])', '  (= y x)', '  (return y)')],
  ])('%s', (text, form) => expect(shown(text)).toBe(form));

  it('a name that only another function assigns is a function here', () => {
    expect(shown('function y = f(x)\ny = q(x);\nfunction y = g(x)\nq = 1; y = q(x);')).toContain('(= y (q x))\n  (return y)\ndef g(x)\n  (= q 1)\n  (= y (at q x))');
  });

  it('what a script assigns below is a variable above', () => expect(shown('y = q(1);\nq = [1 2];')).toBe('(= y (at q 1))\n(= q (matrix 1 2))'));

  it.each<[string, string]>([
    ['function y = f(x)\n% F  the first line\n%  x  width [m]\n\n% inside\ny = x;\nend', '"  F  the first line\\n   x  width [m]"'],
    ['% F  above\n%  x  width [m]\nfunction y = f(x)\ny = x;\nend', '"  F  above\\n   x  width [m]"'],
    ['function y = f(x)\n\n%  x  width [m]\n\n%  y  depth [m]\n\ny = x;\nend', '"   x  width [m]\\n\\n   y  depth [m]"'],
    ['function y = f(x)\n%{\n  x  width [m]\n%}\ny = x;\nend', '"  x  width [m]"'],
  ])('help: %s', (text, doc) => expect(shown(text)).toContain(`doc ${doc}`));
});

describe('classes', () => {
  it('have fields and methods', () => {
    expect(shown(classFile)).toBe(lines(
      'class Tank(handle)', '  doc "    TANK  a tank"', '  (= width 4 : (1,1) double) # [m] clear width', '  (declare depth) # [m]',
      '  def Tank(width)', '    (= (. obj width) width)', '    (return obj)',
      '  def area(obj, depth)', '    (= A (* (. obj width) depth))', '    (return A)',
      '  def double_area(obj)', '    (= p (* 2 ((. obj area) (. obj depth))))', '    (return p)',
      '  def ratio(a, b)', '    (= r (/ a b))', '    (return r)',
    ));
  });
});

describe('a script', () => {
  it('has no problems and is well formed', () => {
    const program = parse(script);
    expect(program.chunks.flatMap((chunk) => chunk.problems)).toEqual([]);
    expect(faultsOf(program, script)).toEqual([]);
    expect(faultsOf(parse(classFile), classFile)).toEqual([]);
  });

  it('has a chunk for each statement, with the comments above', () => {
    expect(parse('% a\n\n% b\nx = 1; % c\nif x\n\n y = 2;\nend\n% d\nfunction f\n % e\nend\n\n% g').chunks.map((chunk) => chunk.text)).toEqual(['% a', '% b\nx = 1; % c', 'if x\n\n y = 2;\nend', '% d\nfunction f\n % e\nend', '% g']);
  });

  it('a comment behind two statements belongs to neither', () => expect(shown('a = 1; b = 2; % [m]')).toBe('(= a 1)\n(= b 2)'));
});
