/** Structures in the common form: classes whose fields are declared. */
import type { ClassStmt, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { docText, fieldDoc, isDocumentation } from './documentation.ts';
import { lowerExpression } from './lower-expression.ts';
import { type Base, baseOf, lowerStatement } from './lower-statement.ts';
import { typeName } from './parameters.ts';

/** `struct Name{T} <: Above … end`. */
export function structStatement(low: Lowering, node: Syntax, base: Base, doc: Syntax | undefined): ClassStmt {
  const head = node.parts.find((part) => part.type === 'type_head');
  const name = nameOf(head) ?? node;
  const text = doc && docText(low, doc);
  const fields = node.parts.filter((part) => part !== head);
  const body = fields.flatMap((part, at) => member(low, part, fields[at - 1], textOf(low, name)));
  return { kind: 'class', name: textOf(low, name), nameSpan: spanOf(low, name), bases: [], body, decorators: [], ...(text ? { doc: text } : {}), ...base };
}

function nameOf(head: Syntax | undefined): Syntax | undefined {
  let at = head?.parts[0];
  while (at && at.type !== 'identifier') at = at.parts[0];
  return at;
}

/** A field, or a constructor; `above`: what stands before it, which may be its documentation. */
function member(low: Lowering, node: Syntax, above: Syntax | undefined, owner: string): readonly Stmt[] {
  const doc = above && isDocumentation(above.type) ? above : undefined;
  if (node.broken || isDocumentation(node.type)) return [];
  const inner = node.type === 'const_statement' ? (node.parts[0] ?? node) : node;
  const macro = inner.type === 'macrocall_expression' ? fieldOfMacro(inner) : undefined;
  if (inner.type === 'identifier' || inner.type === 'typed_expression') return [declared(low, inner, withDoc(low, baseOf(low, node), doc))];
  if (macro) return [declared(low, macro, withDoc(low, baseOf(low, node), doc))];
  const lowered = lowerStatement(low, inner, doc);
  return lowered.flatMap((each): Stmt[] => {
    if (each.kind === 'function') return each.name === owner ? [{ ...each, unbound: true }] : [];
    return each.kind === 'assign' ? [each] : [];
  });
}

/** `@metadata name::T value …`, `@field name::T`: the name that a macro describes. */
function fieldOfMacro(node: Syntax): Syntax | undefined {
  const list = node.parts.find((part) => part.type === 'macro_argument_list');
  const first = list?.parts[0];
  return first?.type === 'identifier' || first?.type === 'typed_expression' ? first : undefined;
}

function withDoc(low: Lowering, base: Base, doc: Syntax | undefined): Base {
  const text = doc && docText(low, doc);
  const comment = text && fieldDoc(text);
  return comment ? { ...base, above: [...(base.above ?? []), comment] } : base;
}

function declared(low: Lowering, node: Syntax, base: Base): Stmt {
  const [target, type] = node.type === 'typed_expression' ? node.parts : [node];
  return { kind: 'declare', target: lowerExpression(low, target ?? node), ...(type ? { annotation: typeName(low, type) } : {}), ...base };
}
