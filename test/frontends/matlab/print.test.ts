import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BinaryExpr, CompareOp, Expr } from '../../../server/src/program/nodes.ts';
import { Rational } from '../../../server/src/quantities/rational.ts';
import { showExpr } from '../../harness/show-program.ts';
import { matlab, parse } from './helpers.ts';

const { print } = matlab.style;

/** The value of `v = text`, where `x` and `y` are variables. */
function lowered(text: string): Expr {
  const statement = parse(`x = 1;\ny = 2;\nv = ${text};`).chunks.at(-1)?.statements[0];
  if (statement?.kind !== 'assign') throw new Error(`no assignment: ${text}`);
  return statement.value;
}

describe('printing in MATLAB', () => {
  it.each([
    ['a*(b + c)', 'a*(b + c)'],
    ['((a)).*((b*c))', 'a*(b*c)'],
    ['a/(b*c)', 'a/(b*c)'],
    ['(a/b)*c', 'a/b*c'],
    ['a-(b-c)', 'a - (b - c)'],
    ['(-x)^2', '(-x)^2'],
    ['-(x.^2)', '-x^2'],
    ['x^(-2)', 'x^-2'],
    ['(a^b)^c', 'a^b^c'],
    ['a^(b^c)', 'a^(b^c)'],
    ['a^(1/2)', 'a^(1/2)'],
    ['~(a == b)', '~(a == b)'],
    ['(~a) == b', '~a == b'],
    ['(a | b) & c', '(a | b) & c'],
    ['a != b', 'a ~= b'],
    ["x(1,:)'", "x(1, :)'"],
    ['x(2:end-1)', 'x(2:end - 1)'],
    ['0:dt:10', '0:dt:10'],
    ['[a -b; c d]', '[a, -b; c, d]'],
    ["{1, 'it''s'}", "{1, 'it''s'}"],
    ['(@(t) t.^2 + 1)', '@(t) t^2 + 1'],
    ["struct('a', 1)", "struct('a', 1)"],
    ['s.a.b(3)', 's.a.b(3)'],
    ['f(varargin{:})', '[]'],
  ])('%s', (text, printed) => expect(print(lowered(text))).toBe(printed));

  it('gives text that reads as the same expression', () => {
    fc.assert(fc.property(anyExpr, (expr) => {
      const text = print(expr);
      expect(showExpr(lowered(text)), text).toBe(showExpr(expr));
    }), { numRuns: 1000 });
  });
});

const at = { start: 0, end: 0 };
const name = fc.constantFrom('a', 'b', 'rho');
const leaf: fc.Arbitrary<Expr> = fc.oneof(
  name.map((each): Expr => ({ kind: 'name', name: each, ...at })),
  fc.constantFrom('1', '2.5', '1e-3').map((text): Expr => ({ kind: 'number', text, value: Rational.parse(text), ...at })),
  fc.boolean().map((value): Expr => ({ kind: 'truth', value, ...at })),
);
const operators: readonly BinaryExpr['op'][] = ['+', '-', '*', '/', '\\', '**'];
const comparisons: readonly CompareOp[] = ['<', '<=', '>', '>=', '==', '!='];

const { expr: anyExpr } = fc.letrec<{ expr: Expr }>((tie) => {
  const two = fc.tuple(tie('expr'), tie('expr'));
  return {
    expr: fc.oneof({ maxDepth: 5, depthSize: 'small' }, leaf,
      fc.tuple(fc.constantFrom(...operators), two).map(([op, [left, right]]): Expr => ({ kind: 'binary', op, opSpan: at, left, right, ...at })),
      fc.tuple(fc.constantFrom('-' as const, '+' as const, 'not' as const, 'transpose' as const), tie('expr')).map(([op, operand]): Expr => ({ kind: 'unary', op, operand, ...at })),
      fc.tuple(fc.constantFrom(...comparisons), two).map(([op, operands]): Expr => ({ kind: 'compare', ops: [op], operands, ...at })),
      fc.tuple(fc.constantFrom('and' as const, 'or' as const), two).map(([op, operands]): Expr => ({ kind: 'logic', op, operands, ...at })),
      fc.tuple(name, fc.array(tie('expr'), { maxLength: 2 })).map(([callee, args]): Expr => ({ kind: 'call', callee: { kind: 'name', name: callee, ...at }, args: args.map((value) => ({ value, ...at })), results: 1, ...at })),
      fc.tuple(fc.constantFrom('x', 'y'), tie('expr')).map(([object, key]): Expr => ({ kind: 'index', object: { kind: 'name', name: object, ...at }, keys: [key], ...at })),
      fc.tuple(name, name).map(([object, member]): Expr => ({ kind: 'member', object: { kind: 'name', name: object, ...at }, name: member, nameSpan: at, ...at })),
      fc.array(tie('expr'), { maxLength: 3 }).map((items): Expr => ({ kind: 'sequence', form: 'matrix', items, ...at })),
      fc.tuple(tie('expr'), tie('expr'), tie('expr')).map(([start, end, step]): Expr => ({ kind: 'slice', parts: [start, end, step], ...at })),
    ),
  };
});
