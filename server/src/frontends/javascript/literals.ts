/** Numbers and texts. */
import type { Expr } from '../../program/nodes.ts';
import { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';

/** `1_000.5`, `0x10`, `0b1`, `017`, `1e-3`; a whole number with `n` keeps its value. */
export function readNumber(text: string): Rational | undefined {
  const plain = text.replaceAll('_', '').replace(/n$/, '');
  if (/^0[xXoObB]/.test(plain)) return whole(plain);
  if (/^0[0-7]+$/.test(plain)) return whole(`0o${plain.slice(1)}`);
  return Rational.parse(plain);
}

function whole(text: string): Rational | undefined {
  try {
    return Rational.of(BigInt(text));
  } catch {
    return undefined;
  }
}

export function number(low: Lowering, node: Syntax, span: Span): Expr {
  const text = textOf(low, node);
  return { kind: 'number', value: readNumber(text), text, ...span };
}

/** What stands between the quotes, escapes and all. */
export function stringText(low: Lowering, node: Syntax): string {
  const raw = textOf(low, node);
  return raw.length >= 2 ? raw.slice(1, -1) : '';
}
