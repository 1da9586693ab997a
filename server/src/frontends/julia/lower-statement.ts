/** Julia statements in the common form. */
import type { Comment, Expr, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { assignment, augmented, isHead } from './assignments.ts';
import { docText, isDocumentation } from './documentation.ts';
import { functionStatement, shortFunction } from './functions.ts';
import { importsOf } from './lower-import.ts';
import { lowerExpression } from './lower-expression.ts';
import { macroStatement } from './macro-statements.ts';
import { structStatement } from './structs.ts';

export type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

const deepest = 150;

/** Statements of a block; a text above a definition is its documentation, and what stands inside a syntax error is taken where it is whole. */
export function lowerStatements(low: Lowering, nodes: readonly Syntax[]): readonly Stmt[] {
  return nodes.flatMap((node, at) => {
    if (node.type === 'ERROR') return lowerStatements(low, node.parts.filter((part) => definitions.has(part.type)));
    if (isDocumentation(node.type) && nodes[at + 1] && docText(low, node)) return [];
    return lowerStatement(low, node, documentationOf(low, nodes, at));
  });
}

/** Whether a top-level node of this type is whole: every expression is a statement. */
export function isStatement(type: string): boolean {
  return type !== 'ERROR' && !/^(?:end|function|struct|mutable|module|baremodule|if|elseif|else|for|while|let|begin|try|catch|finally|do|macro|type_head|signature|named_field|quote|abstract|type|[()[\]{}=]|elseif_clause|else_clause|for_binding|catch_clause)$/.test(type);
}

/** The text directly above a statement. */
function documentationOf(low: Lowering, nodes: readonly Syntax[], at: number): Syntax | undefined {
  const above = nodes[at - 1];
  const node = nodes[at];
  if (!above || !node || !isDocumentation(above.type)) return undefined;
  return /\n[^\S\n]*\n/.test(low.text.slice(above.end, node.start)) ? undefined : above;
}

/** One statement. `doc`: the text above it. */
export function lowerStatement(low: Lowering, node: Syntax, doc?: Syntax): readonly Stmt[] {
  if (low.depth > deepest) return [];
  low.depth++;
  const lowered = lowerKnown(low, node, doc);
  low.depth--;
  return lowered;
}

function lowerKnown(low: Lowering, node: Syntax, doc: Syntax | undefined): readonly Stmt[] {
  const base = baseOf(low, node);
  switch (node.type) {
    case 'assignment':
      return isHead(node) ? [shortFunction(low, node, base, doc)] : assignment(low, node, base, doc);
    case 'compound_assignment_expression':
      return augmented(low, node, base);
    case 'function_definition':
      return functionStatement(low, node, base, doc);
    case 'struct_definition':
      return [structStatement(low, node, base, doc)];
    case 'macrocall_expression':
      return macroStatement(low, node, base, doc);
    case 'module_definition':
      return lowerStatements(low, node.parts.slice(1));
    case 'const_statement':
    case 'local_statement':
      return node.parts[0] && ['assignment', 'compound_assignment_expression'].includes(node.parts[0].type) ? rebased(lowerStatement(low, node.parts[0], doc), base) : [];
    case 'global_statement':
      return global(low, node, base);
    case 'compound_statement':
      return lowerStatements(low, node.parts);
    case 'let_statement':
      return lowerStatements(low, node.parts.map((part) => (part.type === 'let_binding' ? { ...part, type: 'assignment' } : part)).filter((part) => part.type !== 'identifier' || part === node.parts.at(-1)));
    case 'if_statement':
      return [ifStatement(low, node, base, (nodes) => lowerStatements(low, nodes))];
    case 'for_statement':
    case 'while_statement':
      return [loop(low, node, base)];
    case 'try_statement':
      return [attempt(low, node, base, (nodes) => lowerStatements(low, nodes))];
    case 'return_statement':
      return returned(low, node, base);
    case 'break_statement':
      return [{ kind: 'leave', flow: 'break', values: [], ...base }];
    case 'continue_statement':
      return [{ kind: 'leave', flow: 'continue', values: [], ...base }];
    case 'import_statement':
    case 'using_statement':
      return importsOf(low, node).map((each) => ({ ...each, ...base }));
    case 'typed_expression':
      return node.parts[0]?.type === 'identifier' ? [{ kind: 'declare', target: lowerExpression(low, node.parts[0]), ...base }] : [{ kind: 'evaluate', value: lowerExpression(low, node), ...base }];
    case 'call_expression':
      return thrown(low, node, base) ?? guarded(low, node, base);
    default:
      return ignored.has(node.type) ? [] : guarded(low, node, base);
  }
}

const definitions = new Set(['assignment', 'function_definition', 'struct_definition', 'const_statement', 'module_definition', 'using_statement', 'import_statement', 'macrocall_expression', 'if_statement', 'for_statement', 'while_statement', 'compound_assignment_expression', 'return_statement']);

const ignored = new Set(['abstract_definition', 'primitive_definition', 'macro_definition', 'export_statement', 'public_statement', 'quote_statement', ';', 'type_head', 'signature', 'line_comment', 'block_comment']);

/** `n < 0 && return 0`, `ok || error(…)`: what follows a condition is reached or not; its value is walked. */
function guarded(low: Lowering, node: Syntax, base: Base): readonly Stmt[] {
  const [left, sign, right] = node.parts;
  const op = sign && node.type === 'binary_expression' ? textOf(low, sign) : '';
  if ((op === '&&' || op === '||') && left && right && /^(?:return_statement|assignment|compound_assignment_expression|break_statement|continue_statement|parenthesized_expression|call_expression)$/.test(right.type)) {
    const inner = right.type === 'parenthesized_expression' ? right.parts : [right];
    const body = lowerStatements(low, inner).map((each) => withoutComments(each));
    const condition = lowerExpression(low, left);
    const asked: Expr = op === '&&' ? condition : { kind: 'unary', op: 'not', operand: condition, start: condition.start, end: condition.end };
    return [{ kind: 'if', arms: [{ condition: asked, body }], otherwise: [], ...base }];
  }
  return [{ kind: 'evaluate', value: lowerExpression(low, node), ...base }];
}

function withoutComments(statement: Stmt): Stmt {
  const { trailing: _trailing, above: _above, ...rest } = statement;
  return rest as Stmt;
}

/** Span and comments of a statement; of one with a body, the comment behind its head. */
export function baseOf(low: Lowering, node: Syntax): Base {
  const span = spanOf(low, node);
  const trailing = blocks.has(node.type) ? headComment(low, node) : low.comments.trailing(span);
  const above = low.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

const blocks = new Set(['function_definition', 'struct_definition', 'if_statement', 'for_statement', 'while_statement', 'try_statement', 'let_statement', 'compound_statement', 'module_definition']);

function headComment(low: Lowering, node: Syntax): Comment | undefined {
  const head = node.parts[0];
  const comment = head && low.comments.behind((node.type === 'compound_statement' || node.type === 'try_statement' ? node.start : head.end) - low.base);
  return comment && comment.end <= node.end - low.base ? comment : undefined;
}

function rebased(statements: readonly Stmt[], base: Base): readonly Stmt[] {
  return statements.length === 1 ? [{ ...(statements[0] as Stmt), ...base }] : statements;
}

function global(low: Lowering, node: Syntax, base: Base): readonly Stmt[] {
  const [inner] = node.parts;
  if (!inner) return [];
  const target = inner.type === 'assignment' || inner.type === 'compound_assignment_expression' ? inner.parts[0] : inner;
  const names = (target?.type === 'open_tuple' ? target.parts : target ? [target] : []).filter((each) => each.type === 'identifier').map((each) => textOf(low, each));
  const outer: Stmt = { kind: 'outer', names, start: base.start, end: base.start };
  return target === inner ? [{ ...outer, end: base.end }] : [outer, ...rebased(lowerStatement(low, inner), base)];
}

/** `blockOf` says what the statements of a branch become. */
export function ifStatement(low: Lowering, node: Syntax, base: Base, blockOf: (nodes: readonly Syntax[]) => readonly Stmt[]): Stmt {
  const clauses = node.parts.filter((part) => part.type === 'elseif_clause');
  const otherwise = node.parts.find((part) => part.type === 'else_clause');
  const arms = [node, ...clauses].map((each) => {
    const condition = fieldOf(each, 'condition');
    return {
      condition: condition ? lowerExpression(low, condition) : ({ kind: 'opaque', parts: [], start: each.start - low.base, end: each.start - low.base } as Expr),
      body: blockOf(each.parts.filter((part) => part !== condition && part.type !== 'elseif_clause' && part.type !== 'else_clause')),
    };
  });
  return { kind: 'if', arms, otherwise: otherwise ? blockOf(otherwise.parts) : [], ...base };
}

/** `for i in a, j in b` is a loop in a loop. */
function loop(low: Lowering, node: Syntax, base: Base): Stmt {
  if (node.type === 'while_statement') {
    const condition = fieldOf(node, 'condition');
    return { kind: 'loop', ...(condition ? { condition: lowerExpression(low, condition) } : {}), body: lowerStatements(low, node.parts.filter((part) => part !== condition)), otherwise: [], ...base };
  }
  const bindings = node.parts.filter((part) => part.type === 'for_binding');
  let body = lowerStatements(low, node.parts.filter((part) => part.type !== 'for_binding'));
  for (const [at, binding] of [...bindings.entries()].reverse()) {
    const [target, iterable] = [binding.parts[0], binding.parts.at(-1)];
    const heads = target && iterable && target !== iterable ? { target: lowerExpression(low, target), iterable: lowerExpression(low, iterable) } : {};
    body = [{ kind: 'loop', ...heads, body, otherwise: [], ...(at === 0 ? base : { start: binding.start - low.base, end: base.end }) }];
  }
  return body[0] ?? { kind: 'loop', body, otherwise: [], ...base };
}

/** `blockOf` says what the statements of the parts become. */
export function attempt(low: Lowering, node: Syntax, base: Base, blockOf: (nodes: readonly Syntax[]) => readonly Stmt[]): Stmt {
  const clause = (type: string): Syntax | undefined => node.parts.find((part) => part.type === type);
  const [handler, otherwise, last] = [clause('catch_clause'), clause('else_clause'), clause('finally_clause')];
  const caught = handler?.parts[0];
  const named = handler && caught?.type === 'identifier' && !low.text.slice(handler.start, caught.start).includes('\n');
  return {
    kind: 'attempt', body: blockOf(node.parts.filter((part) => !part.type.endsWith('_clause'))),
    handlers: handler ? [blockOf(named ? handler.parts.slice(1) : handler.parts)] : [],
    otherwise: otherwise ? blockOf(otherwise.parts) : [], finally: last ? lowerStatements(low, last.parts) : [], ...base,
  };
}

function returned(low: Lowering, node: Syntax, base: Base): readonly Stmt[] {
  const [value] = node.parts;
  return [{ kind: 'return', ...(value ? { value: lowerExpression(low, value) } : {}), ...base }];
}

/** `error("…")` and `throw(…)` leave. */
function thrown(low: Lowering, node: Syntax, base: Base): readonly Stmt[] | undefined {
  const callee = node.parts[0];
  const name = callee?.type === 'identifier' ? textOf(low, callee) : '';
  return name === 'error' || name === 'throw' || name === 'rethrow' ? [{ kind: 'leave', flow: 'raise', values: [lowerExpression(low, node)], ...base }] : undefined;
}
