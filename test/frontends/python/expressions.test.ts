import { describe, expect, it } from 'vitest';
import { formOf } from '../../harness/python.ts';

const table = (rows: readonly (readonly [string, string])[]): void => {
  it.each(rows.map(([text, form]) => [text, form] as const))('%s', (text, form) => expect(formOf(text)).toBe(form));
};

describe('numbers', () => {
  table([
    ['64./Re', '(/ 64 Re)'],
    ['1e-3', '1/1000'],
    ['1_000.5', '2001/2'],
    ['.5', '1/2'],
    ['1E5', '100000'],
    ['0x1F', '31'],
    ['0b101', '5'],
    ['0o17', '15'],
    ['5j', '5j?'],
    ['1.5e-7', '3/20000000'],
    ['007', '7'],
  ]);
  it('are unknown where they are too long to be anything that was typed', () => expect(formOf('9'.repeat(500))).toMatch(/^9+\?$/));
  it('are unknown beyond any exponent that is written', () => expect(formOf('1e99999')).toBe('1e99999?'));
});

describe('operators', () => {
  table([
    ['a + b*c', '(+ a (* b c))'],
    ['(a + b)*c', '(* (+ a b) c)'],
    ['-x**2', '(- (** x 2))'],
    ['2**-x', '(** 2 (- x))'],
    ['a**b**c', '(** a (** b c))'],
    ['a @ b // c % d', '(% (// (@ a b) c) d)'],
    ['a | b & c', '(bits a (bits b c))'],
    ['~a << 2', '(bits (bits a) 2)'],
    ['a < b <= c', '(cmp a < b <= c)'],
    ['a not in b', '(cmp a not in b)'],
    ['a is  not None', '(cmp a is not None)'],
    ['a <> b', '(cmp a != b)'],
    ['a and b and not c or d', '(or (and a b (not c)) d)'],
    ['a \\\n in b', '(cmp a in b)'],
    ['[a, \\\n b]', '(list a b)'],
    ['a and (b and c)', '(and a (and b c))'],
    ['a if b else c if d else e', '(choose b a (choose d c e))'],
    ['(n := f(x)) + 1', '(+ (:= n (f x)) 1)'],
    ['lambda x, y=2, *a, **k: x + y', '(lambda (x, y=2, *a, **k) (+ x y))'],
    ['lambda: 0', '(lambda () 0)'],
  ]);
});

describe('access and calls', () => {
  table([
    ['a.b.c', '(. (. a b) c)'],
    ['d["p"]', '(at d "p")'],
    ["df.loc[:, 'p']", '(at (. df loc) (slice None None) "p")'],
    ['a[1:]', '(at a (slice 1 None))'],
    ['a[:n]', '(at a (slice None n))'],
    ['a[::2]', '(at a (slice None None 2))'],
    ['a[i:j:k]', '(at a (slice i j k))'],
    ['a[..., 0]', '(at a (?) 0)'],
    ['a[(i, j)]', '(at a i j)'],
    ['df[["a", "b"]]', '(at df (list "a" "b"))'],
    ['f(x, *r, k=1, **kw)', '(f x ...r k=1 ...kw)'],
    ['f(x)(y).z[0]', '(at (. ((f x) y) z) 0)'],
    ['dict(a=1)', '{"a": 1}'], ['dict(x, a=1)', '(dict x a=1)'],
    ['sum(x for x in y)', '(sum (each x for x in y))'],
    ['await z', '(? z)'],
  ]);
});

describe('collections', () => {
  table([
    ['1, 2', '(tuple 1 2)'],
    ['(1,)', '(tuple 1)'],
    ['()', '(tuple)'],
    ['[1, *b]', '(list 1 (? b))'],
    ['{1, 2}', '(set 1 2)'],
    ['{}', '{}'],
    ["{'a': 1, \"b\": x}", '{"a": 1, "b": x}'],
    ["{'a': 1, k: 2, **o}", '{"a": 1 | k 2 (? o)}'],
    ['[i*2 for i in r if i > 2 for j in q]', '(each (* i 2) for i in r for j in q if (cmp i > 2))'],
    ['{k: v for k, v in z}', '(each k: v for (tuple k v) in z)'],
    ['{k for k in z}', '(each k for k in z)'],
    ['[x async for x in y]', '(each x for x in y)'],
  ]);
});

describe('texts', () => {
  table([
    ['"a" \'b\'', '"ab"'],
    ['x = r"\\d"', '(= x "\\\\d")'],
    ['"a" + "b"', '(+ "a" "b")'],
    ['f"plain"', '"plain"'],
    ['f"{x:.2f} {y!r:>{w}} {z=}"', '(? x y w z)'],
    ['"a" f"{b}"', '(? "a" (? b))'],
    ['True, False, None', '(tuple True False None)'],
    ['...', '(?)'],
  ]);
});

describe('depth', () => {
  it('keeps what is written by hand', () => expect(formOf(`${'('.repeat(150)}x${')'.repeat(150)} + 1`)).toBe('(+ x 1)'));
  it.each(['(', '[', '-', 'not ', 'f(', 'a + ', 'lambda: ', '{1: ', 'x if y else '])('survives ten thousand of %s', (piece) => {
    expect(formOf(`x = 1\ny = ${piece.repeat(10_000)}1\nz = 2`)).toContain('(= x 1)');
  });
  it('is unknown beyond its limit, and the rest of the file is read', () => {
    const form = formOf(`y = ${'('.repeat(10_000)}x${')'.repeat(10_000)}\nz = 2`);
    expect(form).toBe('(= y (?)) / (= z 2)');
  });
  it('reads the end of a sum of a thousand terms', () => expect(formOf(`y = ${'a + '.repeat(1000)}b`)).toMatch(/^\(= y \(\+ \(\+ .*\?.* b\)\)$/));
  it('survives blocks in blocks', () => {
    const text = Array.from({ length: 600 }, (_, depth) => `${' '.repeat(depth)}if x:`).join('\n');
    expect(formOf(`a = 1\n${text}\n${' '.repeat(600)}b = 1\nc = 2`)).toContain('(= a 1)');
  });
});
