import { describe, expect, it } from 'vitest';
import { formOf } from '../../harness/python.ts';

const table = (rows: readonly (readonly [string, string])[]): void => {
  it.each(rows.map(([text, form]) => [text, form] as const))('%s', (text, form) => expect(formOf(text)).toBe(form));
};

describe('assignments', () => {
  table([
    ['a = b = c = 2', '(= a b c 2)'],
    ['a, *b = f()', '(= (tuple a (? b)) (f))'],
    ['(a, b), c = d', '(= (tuple (tuple a b) c) d)'],
    ['[p, q] = r', '(= (tuple p q) r)'],
    ['a[0], b.c = 1, 2', '(= (tuple (at a 0) (. b c)) (tuple 1 2))'],
    ['x += 1; y //= 2; z @= 3; v **= 2', '(+= x 1) / (//= y 2) / (@= z 3) / (**= v 2)'],
    ['w >>= 1', '(bits= w 1)'],
    ['n: float = 3.0', '(= n 3 : float)'],
    ['m: "Optional[float]"', '(declare m : "Optional[float]")'],
    ['self.a.b = 1', '(= (. (. self a) b) 1)'],
    ['df["p"] = q', '(= (at df "p") q)'],
    ['x = yield y', '(= x (? y))'],
    ['t = 1,', '(= t (tuple 1))'],
    ['x = (a\n     + b)', '(= x (+ a b))'],
    ['x = a + \\\n    b', '(= x (+ a b))'],
  ]);
});

describe('control flow', () => {
  table([
    ['if a:\n  x = 1\nelif b:\n  x = 2\nelif c: x = 3\nelse:\n  x = 4', 'if a /   (= x 1) / elif b /   (= x 2) / elif c /   (= x 3) / else /   (= x 4)'],
    ['for i, j in e(a):\n  continue\nelse:\n  b = 1', 'for (tuple i j) in (e a) /   (continue) / else /   (= b 1)'],
    ['for i in 1, 2: break', 'for i in (tuple 1 2) /   (break)'],
    ['while x < 3:\n  x += 1\nelse: pass', 'while (cmp x < 3) /   (+= x 1)'],
    ['try:\n  a = 1\nexcept (A, B) as e:\n  b = 2\nexcept C:\n  raise D from e\nelse:\n  d = 1\nfinally:\n  e = 2', 'try /   (= a 1) / except /   (= b 2) / except /   (raise D e) / else /   (= d 1) / finally /   (= e 2)'],
    ['with open(f) as g, h() as (q, r), k:\n  a = 1', 'with (open f) as g, (h) as (tuple q r), k /   (= a 1)'],
    ['with (open(f) as g, h):\n  a = 1', 'with (open f) as g, h /   (= a 1)'],
    ['match p:\n  case 1 | 2: a = 1\n  case P(x=0, y=yy) if yy > 2: b = yy\n  case [c, *rest]: pass\n  case {"k": v, **kw}: pass\n  case A.B as t: pass\n  case _: d = 1', 'match p / case /   (= a 1) / case yy if (cmp yy > 2) /   (= b yy) / case c rest / case v kw / case t / case /   (= d 1)'],
    ['match a, b:\n  case x, y: z = 1', 'match (tuple a b) / case x y /   (= z 1)'],
    ['async def f():\n  async with a as b:\n    return await c\n  async for q in w: pass', 'def f() /   with a as b /     (return (? c)) /   for q in w'],
    ['if __name__ == "__main__":\n  main()', 'if (cmp __name__ == "__main__") /   (main)'],
  ]);
});

describe('other statements', () => {
  table([
    ['import numpy as np, math, os.path', '(import numpy as np) / (import math) / (import os.path)'],
    ['from ..a.b import c as d, e', '(import ..a.b c:d e)'],
    ['from . import z', '(import . z)'],
    ['from ... import z', '(import ... z)'],
    ['from m import *', '(import m *)'],
    ['from m import (a,\n  b)', '(import m a b)'],
    ['from __future__ import division', '(import __future__ division)'],
    ['global g, h', '(outer g h)'],
    ['nonlocal n', '(outer n)'],
    ['assert x > 0, "msg"', '(do (cmp x > 0) "msg")'],
    ['del a, b[0]', '(do (tuple a (at b 0)))'],
    ['raise ValueError("x")', '(raise (ValueError "x"))'],
    ['print "x", y', '(do "x" y)'],
    ['pass', ''],
    ['type X = int', ''],
    ['x = 1\0', '(= x 1) / ! cannot be parsed'],
  ]);
});

describe('functions and classes', () => {
  table([
    ['def f(a, b: float = 1, *, c=2, d, **k) -> float:\n  return a', 'def f(a, b : float=1, !c=2, !d, **k) : float /   (return a)'],
    ['def f(a, /, b, *r, c): pass', 'def f(a, b, *r, !c)'],
    ['def f(*a: int, **k: str): pass', 'def f(*a : int, **k : str)'],
    ['def f():\n  yield\n  yield x, y\n  yield from w', 'def f() /   (yield) /   (yield (tuple x y)) /   (yield w)'],
    ['def f():\n  return 1, 2', 'def f() /   (return (tuple 1 2))'],
    ['@a(1)\n@b.c\ndef f(): return', 'def f() @(a 1) @(. b c) /   (return)'],
    ['@dataclass\nclass P(Base, metaclass=M):\n  """doc"""\n  a: float\n  b: float = 1\n  def m(self): return self.a', 'class P(Base) @dataclass /   doc "doc" /   "doc" /   (declare a : float) /   (= b 1 : float) /   def m(self) /     (return (. self a))'],
    ['class Q: x = 1', 'class Q() /   (= x 1)'],
    ['def outer():\n  def inner(q): return q\n  return inner', 'def outer() /   def inner(q) /     (return q) /   (return inner)'],
  ]);
});

describe('syntax errors', () => {
  table([
    ['x = 1 +\ny = 2', '(= x (?)) / ! cannot be parsed'],
    ['x += 1 $ 2', '(+= x (?)) / ! cannot be parsed'],
    ['x = f(a $ b)', '(= x (?)) / ! cannot be parsed'],
    ['return a b', '(return (?)) / ! cannot be parsed'],
    ['x = 1; ; y = 2', '(= x 1) / (= y 2) / ! cannot be parsed'],
    ['if a b:\n  y = 2', 'if a /   (= y 2) / ! cannot be parsed'],
  ]);
  it.each([
    ['x = 1\ndef f(:\n  y = 1\nz = 2', ['(= x 1)', '(= z 2)']],
    ['class A:\n  x = \n  def f(self):\n    return 1\nz = 2', ['(return 1)', '(= z 2)']],
    ['x = (1\ny = 2\ndef g():\n  return 1', ['def g()', '(return 1)']],
    ['x = 1 $ 2\nz = 3', ['(= z 3)']],
    ['def f():\n  x = foo(\n  y = 2\n\ndef g():\n  return 1', ['(return 1)']],
  ])('%j leaves what is whole', (text, pieces) => {
    const form = formOf(text);
    expect(form).toContain('! ');
    for (const piece of pieces) expect(form).toContain(piece);
  });
});
