/** Operators of Julia, by their text without the dot of broadcasting. Source: Julia manual, Mathematical Operations and Elementary Functions. */
import type { BinaryExpr, CompareOp, Expr, NumberExpr } from '../../program/nodes.ts';
import { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';

export const arithmetic: Readonly<Record<string, BinaryExpr['op']>> = {
  '+': '+', '-': '-', '−': '-', '*': '*', '/': '/', '//': '/', '÷': '//', '%': '%', '^': '**', '\\': '\\', '⋅': '@', '·': '@', '×': '@',
  '&': 'bits', '|': 'bits', '⊻': 'bits', '<<': 'bits', '>>': 'bits', '>>>': 'bits',
};

export const comparisons: Readonly<Record<string, CompareOp>> = {
  '<': '<', '<=': '<=', '≤': '<=', '>': '>', '>=': '>=', '≥': '>=', '==': '==', '≈': '==', '!=': '!=', '≠': '!=', '≉': '!=',
  '===': 'is', '≡': 'is', '!==': 'is not', '≢': 'is not', in: 'in', '∈': 'in', '∉': 'not in',
};

/** Roots written as signs, with the power they stand for. */
const roots: Readonly<Record<string, Rational>> = { '√': Rational.of(1n, 2n), '∛': Rational.of(1n, 3n), '∜': Rational.of(1n, 4n) };

/** Without the dot of broadcasting: `.+` is `+`. */
export function undotted(text: string): string {
  return text.length > 1 && text.startsWith('.') ? text.slice(1) : text;
}

/** The power that a root sign stands for; its text is the sign. */
export function rootPower(text: string, span: Span): NumberExpr | undefined {
  const value = roots[undotted(text)];
  return value && { kind: 'number', value, text, ...span };
}

/** A root of an operand: a power whose exponent is the sign. */
export function root(exponent: NumberExpr, operand: Expr, span: Span): Expr {
  return { kind: 'binary', op: '**', opSpan: { start: exponent.start, end: exponent.end }, left: operand, right: exponent, ...span };
}
