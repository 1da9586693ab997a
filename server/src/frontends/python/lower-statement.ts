/** Python statements in the common form. */
import type { BinaryExpr, Comment, Expr, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { docOf, withFieldDocs } from './documentation.ts';
import { importedModules, importedNames } from './lower-import.ts';
import { child, lowerArguments, lowerExpression, lowerParams } from './lower-expression.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import { matchParts } from './lower-match.ts';
import { fieldOf, partsOf, type Syntax } from '../tree-sitter/syntax.ts';

export function lowerBlock(low: Lowering, node: Syntax | undefined): readonly Stmt[] {
  return node ? lowerStatements(low, partsOf(node)) : [];
}

/** Statements of a block; what stands inside a syntax error is taken where it is whole. */
export function lowerStatements(low: Lowering, nodes: readonly Syntax[]): readonly Stmt[] {
  return nodes.flatMap((node) => {
    if (node.type === 'ERROR') return lowerStatements(low, partsOf(node).filter((part) => byType[part.type] !== undefined));
    return lowerStatement(low, node);
  });
}

/** Whether a top-level node of this type is whole: a statement, a comment, or what stands between statements. */
export function isStatement(type: string): boolean {
  return byType[type] !== undefined || besides.has(type);
}

const besides = new Set(['comment', ';', 'pass_statement', 'type_alias_statement']);

type Lower = (low: Lowering, node: Syntax, base: Base) => Stmt | readonly Stmt[] | undefined;
type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

const deepest = 200;

function lowerStatement(low: Lowering, node: Syntax): readonly Stmt[] {
  const lower = byType[node.type];
  if (!lower || low.depth > deepest) return [];
  low.depth++;
  const lowered = lower(low, node, baseOf(low, node)) ?? [];
  low.depth--;
  return 'kind' in lowered ? [lowered] : lowered;
}

function baseOf(low: Lowering, node: Syntax): Base {
  const span = spanOf(low, node);
  const trailing = compound.has(node.type) ? headComment(low, node) : low.comments.trailing(span);
  const above = low.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

const compound = new Set(['if_statement', 'for_statement', 'while_statement', 'try_statement', 'with_statement', 'match_statement', 'function_definition', 'class_definition']);

/** The comment behind a compound statement's first colon, else behind the opening of its head. */
function headComment(low: Lowering, node: Syntax): Comment | undefined {
  const colon = node.children.find((each) => each.type === ':');
  const params = fieldOf(node, 'parameters') ?? fieldOf(node, 'superclasses');
  const first = params?.parts[0] ?? colon;
  const opening = params && low.comments.behind(params.start - low.base);
  return (colon && low.comments.behind(colon.start - low.base)) ?? (opening && first && opening.end < first.start - low.base ? opening : undefined);
}

const byType: Record<string, Lower> = {
  expression_statement: expressionStatement,
  return_statement: (low, node, base) => {
    const value = partsOf(node)[0];
    return { kind: 'return', ...(value ? { value: lowerExpression(low, value) } : {}), ...base };
  },
  if_statement: (low, node, base) => {
    const arms = [{ condition: child(low, node, 'condition'), body: lowerBlock(low, fieldOf(node, 'consequence')) }];
    for (const each of node.children) if (each.type === 'elif_clause') arms.push({ condition: child(low, each, 'condition'), body: lowerBlock(low, fieldOf(each, 'consequence')) });
    return { kind: 'if', arms, otherwise: elseOf(low, node), ...base };
  },
  for_statement: (low, node, base) => ({ kind: 'loop', target: child(low, node, 'left'), iterable: child(low, node, 'right'), body: lowerBlock(low, fieldOf(node, 'body')), otherwise: elseOf(low, node), ...base }),
  while_statement: (low, node, base) => ({ kind: 'loop', condition: child(low, node, 'condition'), body: lowerBlock(low, fieldOf(node, 'body')), otherwise: elseOf(low, node), ...base }),
  try_statement: (low, node, base) => ({
    kind: 'attempt', body: lowerBlock(low, fieldOf(node, 'body')),
    handlers: node.children.filter((each) => each.type.startsWith('except')).map((each) => lowerBlock(low, blockIn(each))),
    otherwise: elseOf(low, node),
    finally: lowerBlock(low, blockIn(node.children.find((each) => each.type === 'finally_clause'))), ...base,
  }),
  with_statement: withStatement,
  match_statement: (low, node, base) => ({ ...matchParts(low, node, (block) => lowerBlock(low, block)), ...base }),
  function_definition: (low, node, base) => functionStatement(low, node, base),
  class_definition: (low, node, base) => classStatement(low, node, base),
  decorated_definition: decorated,
  import_statement: (low, node, base) => importedModules(low, node).map((each) => ({ ...each, ...base })),
  import_from_statement: importOfNames,
  future_import_statement: importOfNames,
  raise_statement: leave('raise'),
  break_statement: leave('break'),
  continue_statement: leave('continue'),
  assert_statement: leave('none'),
  delete_statement: leave('none'),
  print_statement: leave('none'),
  exec_statement: leave('none'),
  global_statement: outer,
  nonlocal_statement: outer,
};

function expressionStatement(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const inner = partsOf(node);
  const first = inner[0];
  if (!first) return undefined;
  if (first.type === 'assignment') return assignment(low, first, base);
  if (first.type === 'augmented_assignment') {
    const op = (fieldOf(first, 'operator')?.type ?? '').slice(0, -1);
    const known = ['+', '-', '*', '/', '//', '%', '**', '@'].includes(op);
    return { kind: 'assign', targets: [child(low, first, 'left')], value: first.broken ? unknownAt(spanOf(low, first)) : child(low, first, 'right'), op: known ? (op as BinaryExpr['op']) : 'bits', ...base };
  }
  if (first.type === 'yield') {
    const value = partsOf(first)[0];
    return { kind: 'return', yields: true, ...(value ? { value: lowerExpression(low, value) } : {}), ...base };
  }
  const value: Expr = inner.length === 1 ? lowerExpression(low, first) : { kind: 'sequence', form: 'tuple', items: inner.map((each) => lowerExpression(low, each)), ...spanOf(low, node) };
  return { kind: 'evaluate', value, ...base };
}

function assignment(low: Lowering, node: Syntax, base: Base): Stmt {
  const targets: Expr[] = [];
  let at: Syntax = node;
  const annotation = fieldOf(node, 'type');
  for (;;) {
    targets.push(child(low, at, 'left'));
    const right = fieldOf(at, 'right');
    if (right?.type !== 'assignment') break;
    at = right;
  }
  const value = fieldOf(at, 'right');
  const type = annotation ? { annotation: textOf(low, annotation) } : {};
  if (!value) return { kind: 'declare', target: targets[0] as Expr, ...type, ...base };
  return { kind: 'assign', targets, value: node.broken ? unknownAt(spanOf(low, value)) : lowerExpression(low, value), ...type, ...base };
}

/** In a broken statement the parser guesses where the value ends. */
function unknownAt(span: Span): Expr {
  return { kind: 'opaque', parts: [], ...span };
}

function elseOf(low: Lowering, node: Syntax): readonly Stmt[] {
  const clause = node.children.find((each) => each.type === 'else_clause');
  return lowerBlock(low, clause && fieldOf(clause, 'body'));
}

function blockIn(node: Syntax | undefined): Syntax | undefined {
  return node?.children.find((each) => each.type === 'block');
}

function withStatement(low: Lowering, node: Syntax, base: Base): Stmt {
  const items: { value: Expr; target?: Expr }[] = [];
  const visit = (each: Syntax): void => {
    if (each.type !== 'with_item') return void partsOf(each).forEach(visit);
    const value = fieldOf(each, 'value') ?? partsOf(each)[0];
    if (!value) return;
    const alias = value.type === 'as_pattern' ? partsOf(value) : [];
    const target = alias[1] && (partsOf(alias[1])[0] ?? alias[1]);
    items.push({ value: lowerExpression(low, alias[0] ?? value), ...(target ? { target: lowerExpression(low, target) } : {}) });
  };
  const clause = node.children.find((each) => each.type === 'with_clause');
  if (clause) visit(clause);
  return { kind: 'scope', items, body: lowerBlock(low, fieldOf(node, 'body')), ...base };
}

function importOfNames(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const imported = importedNames(low, node);
  return imported && { ...imported, ...base };
}

function decorated(low: Lowering, node: Syntax, outer: Base): Stmt | undefined {
  const definition = fieldOf(node, 'definition');
  if (!definition) return undefined;
  const marks = node.parts.filter((each) => each.type === 'decorator');
  const decorators = marks.flatMap((each) => each.parts.map((part) => lowerExpression(low, part)));
  const inner = baseOf(low, definition);
  const trailing = inner.trailing ?? marks.map((each) => low.comments.behind((each.parts.at(-1) ?? each).end - low.base)).find((each) => each);
  const above = [...(outer.above ?? []), ...(inner.above ?? [])];
  const base = { start: outer.start, end: outer.end, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
  return definition.type === 'class_definition' ? classStatement(low, definition, base, decorators) : functionStatement(low, definition, base, decorators);
}

function functionStatement(low: Lowering, node: Syntax, base: Base, decorators: readonly Expr[] = []): Stmt | undefined {
  const name = fieldOf(node, 'name');
  if (!name) return undefined;
  const params = fieldOf(node, 'parameters');
  const block = fieldOf(node, 'body');
  const type = fieldOf(node, 'return_type');
  const doc = docOf(low, block);
  const body = lowerBlock(low, block);
  const loose = low.comments.loose((params ?? name).end - low.base, base.end);
  return {
    kind: 'function', name: textOf(low, name), nameSpan: spanOf(low, name), params: params ? lowerParams(low, params) : [], body, decorators,
    ...(doc ? { doc } : {}), ...(type ? { annotation: textOf(low, type) } : {}), ...(loose.length > 0 ? { loose } : {}), ...base,
  };
}

function classStatement(low: Lowering, node: Syntax, base: Base, decorators: readonly Expr[] = []): Stmt | undefined {
  const name = fieldOf(node, 'name');
  if (!name) return undefined;
  const block = fieldOf(node, 'body');
  const bases = fieldOf(node, 'superclasses');
  const doc = docOf(low, block);
  return {
    kind: 'class', name: textOf(low, name), nameSpan: spanOf(low, name), bases: bases ? lowerArguments(low, bases).filter((each) => !each.name).map((each) => each.value) : [],
    body: withFieldDocs(low, block, lowerBlock(low, block)), decorators, ...(doc ? { doc } : {}), ...base,
  };
}

function leave(flow: 'break' | 'continue' | 'raise' | 'none'): Lower {
  return (low, node, base) => ({ kind: 'leave', flow, values: partsOf(node).map((each) => lowerExpression(low, each)), ...base });
}

function outer(low: Lowering, node: Syntax, base: Base): Stmt {
  return { kind: 'outer', names: partsOf(node).map((each) => textOf(low, each)), ...base };
}
