/** Operators directly before a bracket and behind a number, which the grammar may take for calls. Source: Julia manual, Operator Precedence and Associativity. */
import { expect, test } from 'vitest';
import { valueOf } from './helpers.ts';

test.each([
  ['2*(b + c)', '(* 2 (+ b c))'],
  ['2-(b)', '(- 2 b)'],
  ['V^2/(2*g)', '(/ (** V 2) (* 2 g))'],
  ['g*d^2*(r - s)', '(* (* g (** d 2)) (- r s))'],
  ['a/2*(b)', '(* (/ a 2) b)'],
  ['a*2-(b)', '(- (* a 2) b)'],
  ['x - 2*(b)*(c) + d', '(+ (- x (* (* 2 b) c)) d)'],
  ['a^2^(b)', '(** a (** 2 b))'],
  ['1/2*(b)^2', '(* (/ 1 2) (** b 2))'],
  ['f(x)^2*(1 - e)', '(* (** (f x) 2) (- 1 e))'],
  ['2(b + c)', '(* 2 (+ b c))'],
])('%s', (text, form) => {
  expect(valueOf(text)).toBe(form);
});
