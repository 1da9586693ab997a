/** Functions that stand as values. */
import type { Expr } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { lowerExpression } from './lower-expression.ts';
import { plainParams } from './parameters.ts';
import { nameAt, type Script, unknownAt } from './script.ts';

/** `(x) => 2*x` with plain parameters; undefined for what has a block, patterns, or gives a promise. */
export function lambda(script: Script, node: Syntax, span: Span): Expr | undefined {
  const body = fieldOf(node, 'body');
  const params = plainParams(script, node);
  if (!body || body.type === 'statement_block' || !params || node.children.some((each) => each.type === 'async')) return undefined;
  return { kind: 'lambda', params, body: lowerExpression(script, body), ...span };
}

/** When it runs, and how often, is not known: the names around it that it gives a value hold anything afterwards. */
export function callback(script: Script, node: Syntax, span: Span): Expr {
  const given = new Map<string, Syntax>();
  const own = new Set<string>();
  collect(script, node, given, own, 0);
  const parts = [...given].filter(([name]) => !own.has(name)).map(([, target]): Expr => {
    const at = nameAt(script, target);
    return { kind: 'bind', target: at, value: unknownAt(at), start: at.start, end: at.end };
  });
  return unknownAt(span, parts);
}

const declarations = new Set(['variable_declarator', 'required_parameter', 'optional_parameter']);

function collect(script: Script, node: Syntax, given: Map<string, Syntax>, own: Set<string>, depth: number): void {
  if (depth > 400) return;
  const target = fieldOf(node, 'left') ?? fieldOf(node, 'name') ?? fieldOf(node, 'pattern') ?? fieldOf(node, 'argument');
  if (target?.type === 'identifier') {
    const name = textOf(script, target);
    if (declarations.has(node.type)) own.add(name);
    else if (node.type.endsWith('assignment_expression')) given.set(name, target);
  }
  for (const child of node.parts) collect(script, child, given, own, depth + 1);
}
