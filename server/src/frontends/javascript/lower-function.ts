/** Functions, however they are written. */
import type { Comment, Expr, FunctionStmt, Param, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { describedBy } from './documentation.ts';
import { lowerExpression } from './lower-expression.ts';
import { type Base, lowerBlock } from './lower-statement.ts';
import { lowerParameters } from './parameters.ts';
import { bare, isFunction, type Script } from './script.ts';

export interface FunctionName extends Span {
  readonly name: string;
}

export interface FunctionTraits {
  /** The object comes first. */
  readonly takesThis?: boolean;
  readonly unbound?: true;
  readonly decorators?: readonly Expr[];
}

/** A function under a name; `fn` holds its parameters and body, whatever kind of node it is. */
export function functionStatement(script: Script, fn: Syntax, named: FunctionName, base: Base, traits: FunctionTraits = {}): FunctionStmt {
  const { params, opening } = lowerParameters(script, fn);
  const body = fieldOf(fn, 'body');
  const type = fieldOf(fn, 'return_type');
  const outer = script.maker;
  script.maker = traits.takesThis ? undefined : body?.type === 'statement_block' ? ownFunctions(script, body) : outer;
  const statements = bodyOf(script, body);
  script.maker = outer;
  const loose: readonly Comment[] = body ? script.comments.loose(body.start - script.base, body.end - script.base) : [];
  const { above, doc } = describedBy(script, base.above ?? []);
  const self: Param = { name: 'this', nameSpan: { start: named.end, end: named.end }, mode: 'plain', start: named.end, end: named.end };
  return {
    kind: 'function', name: named.name, nameSpan: { start: named.start, end: named.end }, params: traits.takesThis ? [self, ...params] : params,
    body: [...opening, ...statements], decorators: traits.decorators ?? [],
    ...(doc ? { doc } : {}), ...(type ? { annotation: textOf(script, type).replace(/^:\s*/, '') } : {}), ...(loose.length > 0 ? { loose } : {}), ...(traits.unbound ? { unbound: true } : {}),
    start: base.start, end: base.end, ...(base.trailing ? { trailing: base.trailing } : {}), ...(above.length > 0 ? { above } : {}),
  };
}

function bodyOf(script: Script, body: Syntax | undefined): readonly Stmt[] {
  if (!body) return [];
  if (body.type === 'statement_block') return lowerBlock(script, body);
  const value = lowerExpression(script, body);
  const trailing = script.comments.beside(spanOf(script, body));
  return [{ kind: 'return', value, ...spanOf(script, body), ...(trailing ? { trailing } : {}) }];
}

/** The names of functions that a function gives to `this`. */
function ownFunctions(script: Script, block: Syntax): ReadonlySet<string> | undefined {
  const names = new Set<string>();
  for (const statement of block.parts) {
    const assigned = statement.type === 'expression_statement' ? statement.parts[0] : undefined;
    const target = assigned?.type === 'assignment_expression' ? fieldOf(assigned, 'left') : undefined;
    const property = target?.type === 'member_expression' && fieldOf(target, 'object')?.type === 'this' ? fieldOf(target, 'property') : undefined;
    if (property && assigned && isFunction(bare(fieldOf(assigned, 'right')))) names.add(textOf(script, property));
  }
  return names.size > 0 ? names : script.maker;
}
