import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BinaryExpr, CompareOp, Expr } from '../../../server/src/program/nodes.ts';
import { Rational } from '../../../server/src/quantities/rational.ts';
import { parsePython, python } from '../../harness/python.ts';
import { showExpr } from '../../harness/show-program.ts';

const { print } = python.style;

/** The value of `v = text`. */
function lowered(text: string): Expr {
  const [statement] = parsePython(`v = ${text}`).chunks[0]?.statements ?? [];
  if (statement?.kind !== 'assign') throw new Error(`no assignment: ${text}`);
  return statement.value;
}

describe('printing in Python', () => {
  it.each([
    ['a*(b + c)', 'a*(b + c)'],
    ['((a))*((b*c))', 'a*(b*c)'],
    ['a/(b*c)', 'a/(b*c)'],
    ['(a/b)*c', 'a/b*c'],
    ['a-(b-c)', 'a - (b - c)'],
    ['(a-b)-c', 'a - b - c'],
    ['(-x)**2', '(-x)**2'],
    ['-(x**2)', '-x**2'],
    ['x**(-2)', 'x**-2'],
    ['(a**b)**c', '(a**b)**c'],
    ['a**(b**c)', 'a**b**c'],
    ['a**(1/2)', 'a**(1/2)'],
    ['not (a == b)', 'not a == b'],
    ['(not a) == b', '(not a) == b'],
    ['(a or b) and c', '(a or b) and c'],
    ['a or (b and c)', 'a or b and c'],
    ['(a and b) and c', '(a and b) and c'],
    ['(a if b else c)*d', '(a if b else c)*d'],
    ['(lambda x, *, k=2: x)(1)', '(lambda x, *, k=2: x)(1)'],
    ['(1).real', '(1).real'],
    ['f( a,k = 1 )[ :, 1:n:2 ].T', 'f(a, k=1)[:, 1:n:2].T'],
    ['a[:n] + a[n:]', 'a[:n] + a[n:]'],
    ['(1,) + ()', '(1,) + ()'],
    ['{"a": 1}', '{"a": 1}'],
    ["'say \"x\"'", "'say \"x\"'"],
    ['"""it\'s "so" """', '"""it\'s "so" """'],
    ["'''it's \"so\"'''", '\'\'\'it\'s "so"\'\'\''],
    ['[i for i in r if i > 0]', '[i for i in r if i > 0]'],
    ['{k: v for k, v in z}', '{k: v for (k, v) in z}'],
    ['f(*a)', '...'],
    ['a | b', '...'],
  ])('%s', (text, printed) => expect(print(lowered(text))).toBe(printed));

  it('gives text that reads as the same expression', () => {
    fc.assert(fc.property(anyExpr, (expr) => {
      const text = print(expr);
      expect(showExpr(lowered(text)), text).toBe(showExpr(expr));
    }), { numRuns: 1000 });
  });

  it('has no parentheses that could be left out', () => {
    fc.assert(fc.property(anyExpr, (expr) => {
      const text = print(expr);
      for (let open = text.indexOf('('); open >= 0; open = text.indexOf('(', open + 1)) {
        const close = closing(text, open);
        const inside = text.slice(open + 1, close);
        const isCall = /[\w\])]/.test(text[open - 1] ?? ' ');
        // A space before the dot of `1 .real` would do as well; the grammar reads bare lambdas and conditions where Python does not.
        if (isCall || inside.includes(',') || /^[\d.e-]+$|lambda| if /.test(inside)) continue;
        const bare = `${text.slice(0, open)} ${text.slice(open + 1, close)} ${text.slice(close + 1)}`;
        const program = parsePython(`v = ${bare}`);
        const [statement] = program.chunks[0]?.statements ?? [];
        const same = program.chunks[0]?.problems.length === 0 && statement?.kind === 'assign' && showExpr(statement.value) === showExpr(expr);
        expect(same, `${text} / ${bare}`).toBe(false);
      }
    }), { numRuns: 300 });
  });
});

function closing(text: string, open: number): number {
  let depth = 0;
  for (let at = open; at < text.length; at++) {
    if (text[at] === '(') depth++;
    if (text[at] === ')' && --depth === 0) return at;
  }
  return text.length;
}

const at = { start: 0, end: 0 };
const name = fc.constantFrom('x', 'y', 'rho');
const leaf: fc.Arbitrary<Expr> = fc.oneof(
  name.map((each): Expr => ({ kind: 'name', name: each, ...at })),
  fc.constantFrom('1', '2.5', '1e-3').map((text): Expr => ({ kind: 'number', text, value: Rational.parse(text), ...at })),
  fc.boolean().map((value): Expr => ({ kind: 'truth', value, ...at })),
);
const operators: readonly BinaryExpr['op'][] = ['+', '-', '*', '/', '//', '%', '**', '@'];
const comparisons: readonly CompareOp[] = ['<', '<=', '==', '!=', 'in', 'not in', 'is', 'is not'];

const { expr: anyExpr } = fc.letrec<{ expr: Expr }>((tie) => {
  const two = fc.tuple(tie('expr'), tie('expr'));
  return {
    expr: fc.oneof({ maxDepth: 5, depthSize: 'small' }, leaf,
      fc.tuple(fc.constantFrom(...operators), two).map(([op, [left, right]]): Expr => ({ kind: 'binary', op, opSpan: at, left, right, ...at })),
      fc.tuple(fc.constantFrom('-' as const, '+' as const, 'not' as const), tie('expr')).map(([op, operand]): Expr => ({ kind: 'unary', op, operand, ...at })),
      fc.tuple(fc.constantFrom(...comparisons), two).map(([op, operands]): Expr => ({ kind: 'compare', ops: [op], operands, ...at })),
      fc.tuple(fc.constantFrom('and' as const, 'or' as const), two).map(([op, operands]): Expr => ({ kind: 'logic', op, operands, ...at })),
      fc.tuple(tie('expr'), two).map(([condition, [then, otherwise]]): Expr => ({ kind: 'choose', condition, then, otherwise, ...at })),
      fc.tuple(tie('expr'), fc.array(tie('expr'), { maxLength: 2 })).map(([callee, args]): Expr => ({ kind: 'call', callee, args: args.map((value) => ({ value, ...at })), ...at })),
      fc.tuple(tie('expr'), name).map(([object, member]): Expr => ({ kind: 'member', object, name: member, nameSpan: at, ...at })),
      fc.tuple(tie('expr'), tie('expr')).map(([object, key]): Expr => ({ kind: 'index', object, keys: [key], ...at })),
      tie('expr').map((body): Expr => ({ kind: 'lambda', params: [], body, ...at })),
    ),
  };
});
