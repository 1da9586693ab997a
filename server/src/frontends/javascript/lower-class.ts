/** Classes, and what TypeScript says of the shape of objects. */
import type { ClassStmt, Expr, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { describedBy, withDescription } from './documentation.ts';
import { lowerExpression } from './lower-expression.ts';
import { functionStatement } from './lower-function.ts';
import { type Base, baseOf, headBase, lowerBlock } from './lower-statement.ts';
import { bare, isFunction, type Script } from './script.ts';

/** A class under its own name, or under the name that it is given. */
export function classStatement(script: Script, node: Syntax, base: Base, named?: Syntax): ClassStmt | undefined {
  const name = named ?? fieldOf(node, 'name');
  if (!name) return undefined;
  const { above, doc } = describedBy(script, base.above ?? []);
  const outer = script.maker;
  script.maker = undefined;
  const body = (fieldOf(node, 'body')?.parts ?? []).flatMap((part) => memberStatements(script, part));
  script.maker = outer;
  return {
    kind: 'class', name: textOf(script, name), nameSpan: spanOf(script, name), bases: basesOf(script, node), body, decorators: [], ...(doc ? { doc } : {}),
    start: base.start, end: base.end, ...(base.trailing ? { trailing: base.trailing } : {}), ...(above.length > 0 ? { above } : {}),
  };
}

function basesOf(script: Script, node: Syntax): readonly Expr[] {
  const heritage = node.parts.find((each) => each.type === 'class_heritage');
  const clause = heritage?.parts.find((each) => each.type === 'extends_clause') ?? heritage;
  const base = clause?.parts[0];
  return base && base.type !== 'implements_clause' ? [lowerExpression(script, base)] : [];
}

function memberStatements(script: Script, node: Syntax): readonly Stmt[] {
  switch (node.type) {
    case 'method_definition':
      return [method(script, node)];
    case 'field_definition':
    case 'public_field_definition':
      return fieldStatement(script, node);
    case 'class_static_block':
      return lowerBlock(script, fieldOf(node, 'body')).filter((each) => each.kind === 'assign');
    default:
      return [];
  }
}

function method(script: Script, node: Syntax): Stmt {
  const name = fieldOf(node, 'name') ?? node;
  const has = (token: string): boolean => node.children.some((each) => each.type === token);
  const place = { start: node.start - script.base, end: node.start - script.base };
  const text = textOf(script, name);
  const decorators: readonly Expr[] = has('get') ? [{ kind: 'name', name: 'property', ...place }] : [];
  // A setter shares its name with the getter or the field, which is what a reader of the value means.
  const named = { name: has('set') ? `set ${text}` : text, ...spanOf(script, name) };
  return functionStatement(script, node, named, headBase(script, node), has('static') ? { unbound: true } : { takesThis: true, decorators });
}

function fieldStatement(script: Script, node: Syntax): readonly Stmt[] {
  const name = fieldOf(node, 'property') ?? fieldOf(node, 'name');
  if (!name || name.type === 'computed_property_name') return [];
  const value = fieldOf(node, 'value');
  const inner = bare(value);
  const span = spanOf(script, name);
  const base = baseOf(script, node);
  const isStatic = node.children.some((each) => each.type === 'static');
  if (isFunction(inner)) return [functionStatement(script, inner, { name: textOf(script, name), ...span }, base, isStatic ? { unbound: true } : { takesThis: true })];
  return [withDescription(script, declared(script, textOf(script, name), span, base, fieldOf(node, 'type'), value))];
}

/** Fields of an interface, or of a type that is an object. */
export function shapeStatement(script: Script, node: Syntax, base: Base): ClassStmt | undefined {
  const name = fieldOf(node, 'name');
  const body = node.type === 'interface_declaration' ? fieldOf(node, 'body') : fieldOf(node, 'value');
  if (!name || (body?.type !== 'interface_body' && body?.type !== 'object_type')) return undefined;
  const { above, doc } = describedBy(script, base.above ?? []);
  const fields = body.parts.filter((part) => part.type === 'property_signature').flatMap((part): readonly Stmt[] => {
    const field = fieldOf(part, 'name');
    return field ? [withDescription(script, declared(script, textOf(script, field), spanOf(script, field), baseOf(script, part), fieldOf(part, 'type'), undefined))] : [];
  });
  return {
    kind: 'class', name: textOf(script, name), nameSpan: spanOf(script, name), bases: [], body: fields, decorators: [], ...(doc ? { doc } : {}),
    start: base.start, end: base.end, ...(above.length > 0 ? { above } : {}),
  };
}

function declared(script: Script, name: string, span: Span, base: Base, type: Syntax | undefined, value: Syntax | undefined): Stmt {
  const target: Expr = { kind: 'name', name, start: span.start, end: span.end };
  const annotation = type ? { annotation: textOf(script, type).replace(/^:\s*/, '') } : {};
  return value ? { kind: 'assign', targets: [target], value: lowerExpression(script, value), ...annotation, ...base } : { kind: 'declare', target, ...annotation, ...base };
}
