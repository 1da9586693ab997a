/** Precedence as the Julia manual states it: Mathematical Operations, Operator Precedence and Associativity; Numeric Literal Coefficients. */
import { describe, expect, it } from 'vitest';
import { shown, valueOf } from './helpers.ts';

describe('operators', () => {
  it.each([
    ['a + b*c^2', '(+ a (* b (** c 2)))'],
    ['a .+ b .* c .^ 2 ./ d', '(+ a (/ (* b (** c 2)) d))'],
    ['-a^2', '(- (** a 2))'],
    ['2^-1', '(** 2 (- 1))'],
    ['a^b^c', '(** a (** b c))'],
    ['2g*h', '(* (* 2 g) h)'],
    ['2(a + b)', '(* 2 (+ a b))'],
    ['2x^2', '(* 2 (** x 2))'],
    ['3x^2y', '(* 3 (** x (* 2 y)))'],
    ['1/2x', '(/ 1 (* 2 x))'],
    ['2^3x', '(** 2 (* 3 x))'],
    ['-2x', '(- (* 2 x))'],
    ['2sin(x)', '(* 2 (sin x))'],
    ['2a.b[1]', '(* 2 (at (. a b) 1))'],
    ["x'y", '(* (transpose x) y)'],
    ["A'", '(transpose A)'],
    ['√x', '(** x 1/2)'],
    ['√(2g*h)', '(** (* (* 2 g) h) 1/2)'],
    ['∛x + .√y', '(+ (** x 1/3) (** y 1/2))'],
    ['7 ÷ 2', '(// 7 2)'],
    ['a % b', '(% a b)'],
    ['1//3', '(/ 1 3)'],
    ['A \\ b', '(\\ A b)'],
    ['u ⋅ v', '(@ u v)'],
    ['a ≤ b', '(cmp a <= b)'],
    ['0 < a <= b', '(cmp 0 < a <= b)'],
    ['a .≥ b', '(cmp a >= b)'],
    ['a ≠ b', '(cmp a != b)'],
    ['a ∈ b', '(cmp a in b)'],
    ['a in b', '(cmp a in b)'],
    ['a === nothing', '(cmp a is None)'],
    ['a && b && c || !d', '(or (and a b c) (not d))'],
    ['a isa Float64', '(? a)'],
    ['x |> f', '(f x)'],
    ['a ? b : -2', '(choose a b (- 2))'],
    ['+(a, b)', '(+ a b)'],
    ['*(a, b, c)', '(? a b c)'],
    ['a & b', '(bits a b)'],
    ['x::Float64 + 1', '(+ x 1)'],
    ['x² + α₁*Δt', '(+ x² (* α₁ Δt))'],
    ['2π*r', '(* (* 2 π) r)'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('literals', () => {
  it.each([
    ['1_000', '1000'], ['1e3', '1000'], ['1f0', '1'], ['2.5f-3', '1/400'], ['.5', '1/2'], ['5.', '5'], ['1.e2', '100'], ['0x1f', '31'], ['0b101', '5'], ['0o17', '15'],
    ['true', 'True'], ['nothing', 'None'], ['"m/s"', '"m/s"'], ['"""\na\n"""', '"\\na\\n"'], [':rho', '"rho"'], ["'c'", '"c"'], ['raw"a\\b"', '"a\\\\b"'], ['u"m/s"', '(?)'], ['2im', '(* 2 im)'],
    ['"v = $(a + 1) and $b"', '(? (+ a 1) b)'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('calls, indices and collections', () => {
  it.each([
    ['f(a, b; c=1, d)', '(f a b c=1 d=d)'],
    ['f.(x, y)', '(f x y)'],
    ['f(x...)', '(f ...x)'],
    ['M.f(x)', '((. M f) x)'],
    ['x[1, :, end-1]', '(at x 1 (slice None None) (- end 1))'],
    ['x[2:end]', '(at x (slice 2 end))'],
    ['d["rho"]', '(at d "rho")'],
    ['d[:rho]', '(at d "rho")'],
    ['r[]', '(? r)'],
    ['0:0.1:10', '(slice 0 10 1/10)'],
    ['[1, 2]', '(list 1 2)'],
    ['Float64[1, 2]', '(list 1 2)'],
    ['[1 2; 3 4]', '(matrix (list 1 2) (list 3 4))'],
    ['[a -b]', '(matrix a (- b))'],
    ['[a; b]', '(matrix a b)'],
    ['(a, b)', '(tuple a b)'],
    ['(a,)', '(tuple a)'],
    ['(a = 1, b = 2)', '{"a": 1, "b": 2}'],
    ['(; a, b = 2)', '{"a": a, "b": 2}'],
    ['Dict("a" => 1, :b => 2)', '{"a": 1, "b": 2}'],
    ['[i^2 for i in 1:3 if i > 1]', '(each (** i 2) for i in (slice 1 3) if (cmp i > 1))'],
    ['sum(x*y for x in a, y in b)', '(sum (each (* x y) for x in a for y in b))'],
    ['x -> x^2', '(lambda (x) (** x 2))'],
    ['(x, y) -> x*y', '(lambda (x, y) (* x y))'],
    ['map(x) do y\n y + 1\nend', '(map (lambda (y) (+ y 1)) x)'],
    ['map(x) do y\n z = y\n z + 1\nend', '(map (?) x)'],
    ['@view x[1]', '(at x 1)'],
    ['@. sin(a) + b', '(+ (sin a) b)'],
    ['@sprintf("%g", a)', '(? "%g" a)'],
    ['SVector{3}(a, b)', '(SVector a b)'],
    ['[1 -2; 3 - 4 5]', '(matrix (list 1 (- 2)) (list (- 3 4) 5))'],
  ])('%s', (text, form) => expect(valueOf(text)).toBe(form));
});

describe('what cannot be read', () => {
  it.each(['a +* b', '(a', '[a', 'f(a', '"text', 'a b', ')', ']'])('%s spoils no other statement', (text) => {
    const lines = shown(`u = 1\n\nfunction f(x)\n    x + 1\nend\n\nv = ${text}\n`).split('\n');
    expect(lines[0]).toBe('(= u 1)');
    expect(lines.join('\n')).toContain('def f(x)');
    expect(lines.some((line) => line.startsWith('! '))).toBe(true);
  });
});
