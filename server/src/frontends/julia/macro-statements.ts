/** Macros that stand as statements. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { fieldsOf } from './assignments.ts';
import { macroArguments, macroName } from './lower-call.ts';
import { lowerExpression } from './lower-expression.ts';
import { type Base, lowerStatement } from './lower-statement.ts';
import { passesValue } from './macros.ts';

/** What a macro hands on is the statement; of any other macro only expressions are walked, and what it assigns is unknown. */
export function macroStatement(low: Lowering, node: Syntax, base: Base, doc: Syntax | undefined): readonly Stmt[] {
  const name = macroName(low, node);
  const args = macroArguments(node);
  const last = args.at(-1);
  if (!last) return [];
  if (name === 'doc') return documented(low, args, base);
  if (name === 'unpack') return unpacked(low, last, base);
  if (name === 'assert') return [{ kind: 'leave', flow: 'none', values: args.slice(0, 1).map((each) => lowerExpression(low, each)), ...base }];
  if (passesValue(name)) return lowerStatement(low, last, doc).map((each, _at, all) => (all.length === 1 ? withComments(each, base) : each));
  const assigned = args.filter((each) => each.type === 'assignment' && each.parts[0]?.type === 'identifier');
  if (assigned.length > 0) return assigned.map((each): Stmt => ({ kind: 'assign', targets: [lowerExpression(low, each.parts[0] as Syntax)], value: { kind: 'opaque', parts: [], ...spanOf(low, each) }, ...spanOf(low, each) }));
  return [{ kind: 'evaluate', value: lowerExpression(low, node), ...base }];
}

/** `@doc "…" f`. */
function documented(low: Lowering, args: readonly Syntax[], base: Base): readonly Stmt[] {
  const [text, definition] = args;
  return text && definition ? lowerStatement(low, definition, text).map((each) => withComments(each, base)) : [];
}

function unpacked(low: Lowering, node: Syntax, base: Base): readonly Stmt[] {
  const [target, value] = [node.parts[0], node.parts.at(-1)];
  if (node.type !== 'assignment' || !target || !value || value === target) return [];
  const names = target.type === 'open_tuple' || target.type === 'tuple_expression' ? target.parts : [target];
  return fieldsOf(low, names, lowerExpression(low, value) as Expr, base);
}

/** Comments stand beside the macro, and the statement keeps its own. */
function withComments(statement: Stmt, base: Base): Stmt {
  const trailing = statement.trailing ?? (statement.kind === 'function' ? undefined : base.trailing);
  const above = [...(base.above ?? []), ...(statement.above ?? []).filter((each) => !base.above?.includes(each))];
  return { ...statement, start: base.start, end: base.end, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}
