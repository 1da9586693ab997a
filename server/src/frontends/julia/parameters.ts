/** Parameters of functions. */
import type { Param } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { lowerExpression } from './lower-expression.ts';

/** From the list in a head, or the lone name of `x -> …`; those behind a semicolon are passed by name. */
export function lowerParams(low: Lowering, list: Syntax): readonly Param[] {
  if (list.type !== 'argument_list' && list.type !== 'tuple_expression') return [lowerParam(low, list, false, list.end)];
  let keyword = false;
  return list.children.flatMap((part) => {
    if (part.type === ';') keyword = true;
    return part.named ? [lowerParam(low, part, keyword, list.end)] : [];
  });
}

function lowerParam(low: Lowering, node: Syntax, keyword: boolean, listEnd: number): Param {
  const whole = spanOf(low, node);
  const named = node.type === 'named_argument' || node.type === 'assignment' || node.type === 'named_field';
  const value = named ? node.parts.at(-1) : undefined;
  const splat = [node, node.parts[0]].find((each) => each?.type === 'splat_expression');
  let inner = named ? (node.parts[0] ?? node) : node;
  if (inner.type === 'splat_expression') inner = inner.parts[0] ?? inner;
  while (inner.type === 'macrocall_expression' || inner.type === 'parenthesized_expression' || inner.type === 'macro_argument_list') {
    const next = inner.parts.at(-1);
    if (!next) break;
    inner = next;
  }
  const type = inner.type === 'typed_expression' ? inner.parts[1] : undefined;
  if (type) inner = inner.parts[0] ?? inner;
  const beside = low.comments.beside(whole);
  const comment = beside && beside.end <= listEnd - low.base ? beside : undefined;
  return {
    name: textOf(low, inner), nameSpan: spanOf(low, inner), mode: splat ? (keyword ? 'rest-named' : 'rest') : keyword ? 'keyword' : 'plain',
    ...(value ? { default: lowerExpression(low, value) } : {}), ...(type ? { annotation: typeName(low, type) } : {}), ...(comment ? { comment } : {}), ...whole,
  };
}

/** A type without its parameters. */
export function typeName(low: Lowering, type: Syntax): string {
  const head = type.type === 'parametrized_type_expression' ? (type.parts[0] ?? type) : type;
  const text = textOf(low, head);
  return head === type ? text : /^(?:Union|Tuple|NamedTuple|Vararg|Type)$/.test(text) ? textOf(low, type) : text;
}
