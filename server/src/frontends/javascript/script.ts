/** What lowering a script carries along, besides the tree. */
import type { Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';

export interface Script extends Lowering {
  /** Names of the chunk that hold texts: `+` joins what stands beside them. */
  readonly texts: ReadonlySet<string>;
  /** Inside a function that gives its functions to `this`: there `this.f(x)` calls a function of its own. */
  maker: ReadonlySet<string> | undefined;
}

/** Nothing is known of it. */
export function unknownAt(span: Span, parts: readonly Expr[] = []): Expr {
  return { kind: 'opaque', parts, start: span.start, end: span.end };
}

export function nameAt(script: Lowering, node: Syntax): Expr {
  return { kind: 'name', name: textOf(script, node), ...spanOf(script, node) };
}

type FunctionSyntax = Syntax & { readonly type: 'arrow_function' | 'function_expression' | 'generator_function' | 'function' };

const functionTypes: ReadonlySet<string> = new Set<FunctionSyntax['type']>(['arrow_function', 'function_expression', 'generator_function', 'function']);

/** Whether an expression is a function. */
export function isFunction(node: Syntax | undefined): node is FunctionSyntax {
  return node !== undefined && functionTypes.has(node.type);
}

const wrappers = new Set(['parenthesized_expression', 'as_expression', 'satisfies_expression', 'non_null_expression', 'type_assertion', 'instantiation_expression']);

/** The expression within parentheses and claims of a type. */
export function bare(node: Syntax | undefined): Syntax | undefined {
  let at = node;
  while (at && wrappers.has(at.type)) at = at.type === 'type_assertion' ? at.parts.at(-1) : at.parts[0];
  return at;
}
