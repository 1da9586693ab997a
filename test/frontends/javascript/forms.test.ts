/** Syntax and its common form. Source of the syntax: ECMA-262 (2025); TypeScript handbook. */
import { describe, expect, test } from 'vitest';
import { form } from './helpers.ts';

describe('expressions', () => {
  test.each([
    ['x = 1_000.5 + 0x10 + 1e-3 + 017', '(= x (+ (+ (+ 2001/2 16) 1/1000) 15))'],
    ['x = a ** -b % c', '(= x (% (** a (- b)) c))'],
    ['x = a | b >> 2', '(= x (bits a (bits b 2)))'],
    ['x = a?.b?.[0] ?? 5', '(= x (choose (?) (at (. a b) 0) 5))'],
    ['x = a && b && !c || d', '(= x (or (and a b (not c)) d))'],
    ['x = a === 3 ? b : -c', '(= x (choose (cmp a == 3) b (- c)))'],
    ['x = a["rho"] + a["b c"]', '(= x (+ (. a rho) (at a "b c")))'],
    ['x = { a: 1, b, "c d": 3, [k]: 4, f() { return 1; } }', '(= x {"a": 1, "b": b, "c d": 3 | (? k) 4})'],
    ['x = { ...a, b: 1 }', '(= x (? a 1))'],
    ['x = [1, -2, 3]', '(= x (list 1 (- 2) 3))'],
    ['x = [p, T]', '(= x (tuple p T))'],
    ['x = [1, , 3]', '(= x (? 1 3))'],
    ['x = new Pump(1, ...r)', '(= x (Pump 1 ...r))'],
    ['x = /[m]/.test(s)', '(= x ((. (?) test) s))'],
    ['x = (a, b)', '(= x (choose (? a) b None))'],
    ['x = xs.map((v) => 2 * v)', '(= x ((. xs map) (lambda (v) (* 2 v))))'],
    ['x = xs.map((v) => { total += v; let w = v; w = 2; })', '(= x ((. xs map) (? (:= total (?)))))'],
    ['x = await f(y)', '(= x (? (f y)))'],
    ['x = typeof y', '(= x (? y))'],
    ['x = y = z', '(= x y z)'],
    ['x = 12n', '(= x 12)'],
  ])('%s', (text, expected) => expect(form(text)).toBe(expected));
});

describe('texts are joined and not added', () => {
  test.each([
    ['x = "a" + T + p', '(= x (? (? "a" T) p))'],
    ['x = T + p + " bar"', '(= x (? (+ T p) " bar"))'],
    [`x = \`$\{T} K\` + p`, '(= x (? (? T) p))'],
    ['x = T.toFixed(1) + p', '(= x (? ((. T toFixed) 1) p))'],
    ['let s = ""; s = s + T + p', '(= s "")\n(= s (? (? s T) p))'],
    ['let s = ""; s += T;', '(= s "")\n(= s (? T))'],
    ['function f(s = "") { return s + T + p; }', 'def f(s="")\n  (return (? (? s T) p))'],
  ])('%s', (text, expected) => expect(form(text)).toBe(expected));

  test('a name that TypeScript knows as a text', () => {
    expect(form('function f(s: string, x: number) { return s + x + T; }', 'typescript')).toBe('def f(s : string, x : number)\n  (return (? (? s x) T))');
  });
});

describe('statements', () => {
  test.each([
    ['const a = 1, b = 2;', '(= a 1)\n(= b 2)'],
    ['let a, b;  // [m]', '(declare a) # [m]\n(declare b) # [m]'],
    ['let a = 1, b = 2;  // [m]', '(= a 1)\n(= b 2)'],
    ['a += 2; b++; --c; d **= 2; e <<= 1; f ||= 2', '(+= a 2)\n(+= b 1)\n(-= c 1)\n(**= d 2)\n(bits= e 1)\n(= f (? 2))'],
    ['const { tdb, tr: t = 20 } = x;', '(= tdb (. x tdb))\n(= t (choose (?) (. x tr) 20))'],
    ['const { q } = f(x);', '(= { q } (f x))\n(= q (. { q } q))'],
    ['[a, b] = [b, a]', '(= (tuple a b) (tuple b a))'],
    ['const [a, , b] = x;', '(= a (?))\n(= b (?))'],
    ['for (let i = 0; i < n; i++) y += x[i];', 'for i in (slice 0 n)\n  (+= y (at x i))'],
    ['for (t = 0; t < end; t += dt) f(t);', '(= t 0)\nwhile (cmp t < end)\n  (f t)\n  (+= t dt)'],
    ['for (const x of xs) { f(x); }', 'for x in xs\n  (f x)'],
    ['for (const k in o) f(k);', 'for k in (? o)\n  (f k)'],
    ['do { x -= 1; } while (x > 0)', 'while (cmp x > 0)\n  (-= x 1)'],
    ['if (a) b = 1; else if (c) b = 2; else b = 3;', 'if a\n  (= b 1)\nelif c\n  (= b 2)\nelse\n  (= b 3)'],
    ['switch (m) { case 1: a = 2; break; default: a = 3; }', 'match m\ncase\n  (= a 2)\n  (do)\ncase\n  (= a 3)'],
    ['try { a = 1; } catch (e) { throw e; } finally { b = 2; }', 'try\n  (= a 1)\nexcept\n  (raise e)\nfinally\n  (= b 2)'],
    ['outer: while (true) { continue outer; }', 'with \n  while True\n    (continue)'],
    ['(function () { a = 1; return 2; })();', 'with \n  (= a 1)\n  2'],
    ['function* g() { yield 2; }', 'def g()\n  (yield 2)'],
  ])('%s', (text, expected) => expect(form(text)).toBe(expected));
});

describe('functions and classes', () => {
  test.each([
    ['export const area = (d) => d ** 2;', 'def area(d)\n  (return (** d 2))'],
    ['const f = function (a = 1, ...r) { return a; };', 'def f(a=1, *r)\n  (return a)'],
    ['const f = ({ a, b: { c } }, [d]) => a;', 'def f({ a, b: { c } }, [d])\n  (= a (. { a, b: { c } } a))\n  (= { c } (. { a, b: { c } } b))\n  (= c (. { c } c))\n  (= (tuple d) [d])\n  (return a)'],
    ['class A extends B { static k = 1; d = 2; #e = 3; f = () => this.d; static g(x) { return x; } get h() { return 1; } }',
      'class A(B)\n  (= k 1)\n  (= d 2)\n  (= #e 3)\n  def f(this)\n    (return (. this d))\n  def g(x)\n    (return x)\n  def h(this) @property\n    (return 1)'],
    ['function Maker() { this.f = function (x) { return x; }; this.g = function (y) { return this.f(y); }; }', 'def Maker()\n  def f(x)\n    (return x)\n  def g(y)\n    (return (f y))'],
    ['exports.f = (x) => x; exports.g = 3;', 'def f(x)\n  (return x)\n(= g 3)'],
  ])('%s', (text, expected) => expect(form(text)).toBe(expected));

  test.each([
    ['interface Pump { D: number;  // [m]\n  readonly N?: number; f(): void }', 'class Pump()\n  (declare D : number) # [m]\n  (declare N : number)'],
    ['type P = { a: number };', 'class P()\n  (declare a : number)'],
    ['const x = <number>y! as any satisfies number;', '(= x y)'],
    ['class A<T> { private readonly d: number = 2; constructor(readonly b: number) {} abstract f(): T; }', 'class A()\n  (= d 2 : number)\n  def constructor(this, b : number)\n    (= (. this b) b)'],
    ['function f(a: number): number;\nfunction f(a?: any) { return a; }', 'def f(a : any=(?))\n  (return a)'],
    ['enum E { A, B = 2 }\ndeclare const z: number;\nlet u: number;', '(declare u : number)'],
    ['namespace N { export const k = 2; }', 'with \n  (= k 2)'],
  ])('%s', (text, expected) => expect(form(text, 'typescript')).toBe(expected));
});

describe('modules', () => {
  test.each([
    ["import a, { b, c as d } from './x.js';", '(import ../x.js default:a)\n(import ../x.js b c:d)'],
    ["import * as n from 'mathjs';", '(import mathjs as n)'],
    ["const { a, b: c } = require('./x');", '(import ../x a b:c)'],
    ["const x = require('./x'), y = require('./y').z;", '(import ../x as x)\n(import ../y z:y)'],
    ["export { a as b }; export { c } from './c'; export * from './d'; export * as e from './e';", '(= b a)\n(import ../c c)\n(import ../d *)\n(import ../e as e)'],
    ['export default function f() { return 1; }', 'def f()\n  (return 1)\n(= default f)'],
    ['export default (x) => x;', 'def default(x)\n  (return x)'],
    ['export default 3;', '(= default 3)'],
    ['module.exports = { f, g: h, k: 2 };', '(= g h)\n(= k 2)'],
    ['module.exports = f;', '(= default f)'],
  ])('%s', (text, expected) => expect(form(text)).toBe(expected));
});
