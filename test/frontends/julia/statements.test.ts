import { describe, expect, it } from 'vitest';
import { shown } from './helpers.ts';

const forms: readonly (readonly [string, string])[] = [
  ['x = y = 3  # [m]', '(= x y 3) # [m]'],
  ['a, b = f(x)', '(= (tuple a b) (f x))'],
  ['(; a, b) = s', '(= a (. s a))\n(= b (. s b))'],
  ['@unpack a, b = p.s', '(= a (. (. p s) a))\n(= b (. (. p s) b))'],
  ['@unpack a = f(x)', '(= a (?))'],
  ['const g = 9.81  # [m/s^2]', '(= g 981/100) # [m/s^2]'],
  ['x::Float64 = 3', '(= x 3 : Float64)'],
  ['local x', ''],
  ['x += 2', '(+= x 2)'],
  ['x .= y .+ 1', '(= (at x (slice None None)) (+ y 1))'],
  ['x .*= 2', '(*= x 2)'],
  ['f(x, y=1; z::Float64=2.0, kw...) = x', 'def f(x, y=1, !z : Float64=2, **kw)\n  (return x)'],
  ['f(x)::Float64 = 2x  # [m]', 'def f(x) : Float64\n  (return (* 2 x)) # [m]'],
  ['function f(x::Motor{T}, ys...) where {T}\n  y = 2x\n  y + 1  # [m]\nend', 'def f(x : Motor, *ys)\n  (= y (* 2 x))\n  (return (+ y 1)) # [m]'],
  ['function f(x)\n  y = 2x\nend', 'def f(x)\n  (= y (* 2 x))\n  (return y)'],
  ['function f!(m)\n  m.x = 2\n  return nothing\nend', 'def f!(m)\n  (= (. m x) 2)\n  (return None)'],
  ['function f(x)\n  if x > 0\n    x\n  else\n    -x\n  end\nend', 'def f(x)\n  if (cmp x > 0)\n    (return x)\n  else\n    (return (- x))'],
  ['function f end', ''],
  ['Base.show(io, x) = 3', 'def Base.show(io, x)\n  (return 3)'],
  ['@inline f(x) = x', 'def f(x)\n  (return x)'],
  ['y = if a > 1\n  2\nelse\n  z = 3\n  z\nend', 'if (cmp a > 1)\n  (= y 2)\nelse\n  (= z 3)\n  (= y z)'],
  ['if a b elseif c d else e end', 'if a\n  b\nelif c\n  d\nelse\n  e'],
  ['for i in 1:n, j = a\n  s += i\nend', 'for i in (slice 1 n)\n  for j in a\n    (+= s i)'],
  ['@threads for i in eachindex(x)\n  x[i] = 3\nend', 'for i in (eachindex x)\n  (= (at x i) 3)'],
  ['while a < 3\n  a += 1\n  break\nend', 'while (cmp a < 3)\n  (+= a 1)\n  (break)'],
  ['let a = 1, b = 2\n  c = a\nend', '(= a 1)\n(= b 2)\n(= c a)'],
  ['begin\n  a = 1\nend', '(= a 1)'],
  ['try\n  a\ncatch e\n  b\nfinally\n  c\nend', 'try\n  a\nexcept\n  b\nfinally\n  c'],
  ['n < 0 && return 0', 'if (cmp n < 0)\n  (return 0)'],
  ['n < 0 || (n = 0)', 'if (not (cmp n < 0))\n  (= n 0)'],
  ['throw(DomainError(x))', '(raise (throw (DomainError x)))'],
  ['@assert a > 0 "must be positive"', '(do (cmp a > 0))'],
  ['@show x', 'x'],
  ['@variables x = 3', '(= x (?))'],
  ['using .Sub: a, b as c', '(import .Sub a b:c)'],
  ['using Statistics, ..Tools', '(import Statistics *)\n(import ..Tools *)'],
  ['import A.B', '(import A.B)'],
  ['module M\nx = 1\nend', '(= x 1)'],
  ['abstract type A end', ''],
  ['global k = 3', '(outer k)\n(= k 3)'],
  ['"mean speed"\nf(x) = x', 'def f(x)\n  doc "mean speed"\n  (return x)'],
  ['"""\n    f(x)\n"""\nfunction f(x)\nend', 'def f(x)\n  doc "\\n    f(x)\\n"'],
  ['@doc raw"""T""" f(x) = x', 'def f(x)\n  doc "T"\n  (return x)'],
  ['x = a\n-b', '(= x a)\n(- b)'],
  ['#= a\n b =#\nx = 1', '# a\n b\n(= x 1)'],
];

describe('statements', () => {
  it.each(forms)('%s', (text, form) => expect(shown(text)).toBe(form));
});

describe('structures', () => {
  it('have fields with the comments and texts above them', () => {
    expect(shown('"A pump."\nBase.@kwdef mutable struct Pump{T} <: Machine\n    # head [m]\n    h::T\n    "flow [m^3/s]"\n    Q::Float64 = 0.1\n    const n::Int  # [rpm]\n    η\n    Pump(h) = new(h, 0.2)\nend')).toBe([
      'class Pump()', '  doc "A pump."', '  # head [m]', '  (declare h : T)', '  # flow [m^3/s]', '  (= Q 1/10 : Float64)', '  (declare n : Int) # [rpm]', '  (declare η)', '  def Pump(h)', '    (return (new h 1/5))',
    ].join('\n'));
  });

  it('are described by macros', () => {
    expect(shown('@with_kw struct S\n    @metadata a::Float64 u"m"\n    b = 2\nend')).toBe('class S()\n  (declare a : Float64)\n  (= b 2)');
  });
});
