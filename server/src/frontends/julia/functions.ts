/** Functions in the common form: both forms of definition, with the value of the last statement as the result. */
import type { Expr, FunctionStmt, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { tail } from './assignments.ts';
import { docText } from './documentation.ts';
import { lowerExpression } from './lower-expression.ts';
import { type Base, baseOf, lowerStatements } from './lower-statement.ts';
import { lowerParams, typeName } from './parameters.ts';

interface Head {
  readonly name: Syntax;
  readonly params: Syntax | undefined;
  readonly type: Syntax | undefined;
}

/** `function f(x) … end`; a function without a method is no statement. */
export function functionStatement(low: Lowering, node: Syntax, base: Base, doc: Syntax | undefined): readonly Stmt[] {
  const [signature, ...body] = node.parts;
  const head = signature && headOf(signature.parts[0]);
  if (!head) return [];
  const statements = bodyOf(low, body);
  return [definition(low, head, statements, base, doc, head.params?.end ?? signature.end)];
}

/** `f(x) = …`; the comment behind it is that of its result. */
export function shortFunction(low: Lowering, node: Syntax, base: Base, doc: Syntax | undefined): Stmt {
  const value = node.parts.at(-1) as Syntax;
  const head = headOf(node.parts[0]) as Head;
  const { trailing, ...rest } = base;
  const body = value.type === 'compound_statement' || value.type === 'if_statement' || value.type === 'let_statement' ? bodyOf(low, [value]) : result(low, value, trailing ? { trailing } : {});
  return definition(low, head, body, rest, doc, head.params?.end ?? node.start);
}

function definition(low: Lowering, head: Head, body: readonly Stmt[], base: Base, doc: Syntax | undefined, from: number): FunctionStmt {
  const text = doc && docText(low, doc);
  const loose = low.comments.loose(from - low.base, base.end);
  return {
    kind: 'function', name: textOf(low, head.name), nameSpan: spanOf(low, head.name), params: head.params ? lowerParams(low, head.params) : [], body, decorators: [],
    ...(text ? { doc: text } : {}), ...(head.type ? { annotation: typeName(low, head.type) } : {}), ...(loose.length > 0 ? { loose } : {}), ...base,
  };
}

function headOf(node: Syntax | undefined): Head | undefined {
  let at = node;
  let type: Syntax | undefined;
  while (at?.type === 'where_expression' || at?.type === 'typed_expression') {
    if (at.type === 'typed_expression') type = at.parts[1];
    at = at.parts[0];
  }
  if (at?.type !== 'call_expression') return undefined;
  const [callee, params] = at.parts;
  if (!callee || params?.type !== 'argument_list') return undefined;
  const name = callee.type === 'parametrized_type_expression' ? callee.parts[0] : callee;
  return name && { name, params, type };
}

/** Statements whose last value is the result. */
function bodyOf(low: Lowering, nodes: readonly Syntax[]): readonly Stmt[] {
  const body = tail(low, nodes, (node) => result(low, node, baseOf(low, node)));
  const last = body.at(-1);
  const resulting = last && valueOf(last);
  return resulting ? [...body, { kind: 'return', value: resulting, start: resulting.start, end: resulting.end }] : body;
}

function result(low: Lowering, node: Syntax, base: Partial<Base>): readonly Stmt[] {
  const value = lowerExpression(low, node);
  return value.kind === 'nothing' ? lowerStatements(low, [node]) : [{ kind: 'return', value, ...base, ...spanOf(low, node) }];
}

/** An assignment at the end of a function is its result; one to anything but a name gives an unknown one. */
function valueOf(last: Stmt): Expr | undefined {
  if (last.kind !== 'assign') return undefined;
  const at = { start: last.end, end: last.end };
  const target = last.targets[0];
  return target?.kind === 'name' ? { ...target } : { kind: 'opaque', parts: [], ...at };
}
