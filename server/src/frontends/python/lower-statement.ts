/** Python statements in the common form. */
import type { BinaryExpr, DocText, Expr, NameExpr, Stmt } from '../../program/nodes.ts';
import { type Lowering, lowerArguments, lowerExpression, lowerParams, spanOf, textOf } from './lower-expression.ts';
import { fieldOf, fieldsOf, partsOf, type Syntax } from './syntax.ts';

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

type Lower = (low: Lowering, node: Syntax, base: Base) => Stmt | undefined;
type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

function lowerStatement(low: Lowering, node: Syntax): readonly Stmt[] {
  const lower = byType[node.type];
  if (!lower || low.depth > 200) return [];
  low.depth++;
  const statement = lower(low, node, baseOf(low, node));
  low.depth--;
  return statement ? [statement] : [];
}

function baseOf(low: Lowering, node: Syntax): Base {
  const span = spanOf(low, node);
  const trailing = compound.has(node.type) ? low.comments.trailing({ start: headEnd(low, node), end: headEnd(low, node) }) : low.comments.trailing(span);
  const above = low.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

const compound = new Set(['if_statement', 'for_statement', 'while_statement', 'try_statement', 'with_statement', 'match_statement', 'function_definition', 'class_definition', 'decorated_definition']);

/** The end of a compound statement's first part: its colon. */
function headEnd(low: Lowering, node: Syntax): number {
  const inner = node.type === 'decorated_definition' ? (fieldOf(node, 'definition') ?? node) : node;
  const colon = inner.children.find((each) => each.type === ':');
  return (colon ?? inner).start - low.base;
}

const byType: Record<string, Lower> = {
  expression_statement: expressionStatement,
  return_statement: (low, node, base) => {
    const value = partsOf(node)[0];
    return { kind: 'return', ...(value ? { value: lowerExpression(low, value) } : {}), ...base };
  },
  if_statement: (low, node, base) => {
    const arms = [{ condition: need(low, node, 'condition'), body: lowerBlock(low, fieldOf(node, 'consequence')) }];
    for (const each of node.children) if (each.type === 'elif_clause') arms.push({ condition: need(low, each, 'condition'), body: lowerBlock(low, fieldOf(each, 'consequence')) });
    return { kind: 'if', arms, otherwise: elseOf(low, node), ...base };
  },
  for_statement: (low, node, base) => ({ kind: 'loop', target: need(low, node, 'left'), iterable: need(low, node, 'right'), body: lowerBlock(low, fieldOf(node, 'body')), otherwise: elseOf(low, node), ...base }),
  while_statement: (low, node, base) => ({ kind: 'loop', condition: need(low, node, 'condition'), body: lowerBlock(low, fieldOf(node, 'body')), otherwise: elseOf(low, node), ...base }),
  try_statement: (low, node, base) => ({
    kind: 'attempt', body: lowerBlock(low, fieldOf(node, 'body')),
    handlers: node.children.filter((each) => each.type.startsWith('except')).map((each) => lowerBlock(low, blockIn(each))),
    otherwise: elseOf(low, node),
    finally: lowerBlock(low, blockIn(node.children.find((each) => each.type === 'finally_clause'))), ...base,
  }),
  with_statement: withStatement,
  match_statement: matchStatement,
  function_definition: functionStatement,
  class_definition: classStatement,
  decorated_definition: (low, node, base) => {
    const definition = fieldOf(node, 'definition');
    if (!definition) return undefined;
    const decorators = node.children.filter((each) => each.type === 'decorator').flatMap((each) => partsOf(each).map((part) => lowerExpression(low, part)));
    const statement = byType[definition.type]?.(low, definition, { ...baseOf(low, definition), ...base });
    return statement?.kind === 'function' || statement?.kind === 'class' ? { ...statement, decorators } : statement;
  },
  import_statement: importStatement,
  import_from_statement: importFrom,
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
    return { kind: 'assign', targets: [need(low, first, 'left')], value: need(low, first, 'right'), op: known ? (op as BinaryExpr['op']) : 'bits', ...base };
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
    targets.push(need(low, at, 'left'));
    const right = fieldOf(at, 'right');
    if (right?.type !== 'assignment') break;
    at = right;
  }
  const value = fieldOf(at, 'right');
  const type = annotation ? { annotation: textOf(low, annotation) } : {};
  if (!value) return { kind: 'declare', target: targets[0] as Expr, ...type, ...base };
  return { kind: 'assign', targets, value: lowerExpression(low, value), ...type, ...base };
}

function need(low: Lowering, node: Syntax, field: string): Expr {
  const found = fieldOf(node, field);
  return found ? lowerExpression(low, found) : { kind: 'opaque', parts: [], ...spanOf(low, node) };
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

function matchStatement(low: Lowering, node: Syntax, base: Base): Stmt {
  const block = fieldOf(node, 'body');
  const cases = (block ? partsOf(block) : []).filter((each) => each.type === 'case_clause').map((each) => {
    const guard = fieldOf(each, 'guard');
    const bindings: NameExpr[] = [];
    for (const part of partsOf(each)) if (part.type === 'case_pattern') collectNames(low, part, bindings);
    const test = guard && partsOf(guard)[0];
    return { bindings, ...(test ? { guard: lowerExpression(low, test) } : {}), body: lowerBlock(low, fieldOf(each, 'consequence')) };
  });
  return { kind: 'match', subject: need(low, node, 'subject'), cases, ...base };
}

function collectNames(low: Lowering, node: Syntax, names: NameExpr[]): void {
  if (node.type === 'identifier') names.push({ kind: 'name', name: textOf(low, node), ...spanOf(low, node) });
  for (const part of partsOf(node)) collectNames(low, part, names);
}

function functionStatement(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const name = fieldOf(node, 'name');
  if (!name) return undefined;
  const params = fieldOf(node, 'parameters');
  const body = fieldOf(node, 'body');
  const type = fieldOf(node, 'return_type');
  const doc = docOf(low, body);
  const loose = body ? looseOf(low, body) : [];
  return {
    kind: 'function', name: textOf(low, name), nameSpan: spanOf(low, name), params: params ? lowerParams(low, params) : [],
    body: lowerBlock(low, body), decorators: [],
    ...(doc ? { doc } : {}), ...(type ? { annotation: textOf(low, type) } : {}), ...(loose.length > 0 ? { loose } : {}), ...base,
  };
}

function looseOf(low: Lowering, body: Syntax): ReturnType<Lowering['comments']['between']> {
  const last = partsOf(body).at(-1);
  return last ? low.comments.between(last.end - low.base, body.end - low.base).filter((each) => low.comments.trailing(spanOf(low, last)) !== each) : [];
}

function classStatement(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const name = fieldOf(node, 'name');
  if (!name) return undefined;
  const bases = fieldOf(node, 'superclasses');
  const body = fieldOf(node, 'body');
  const doc = docOf(low, body);
  return {
    kind: 'class', name: textOf(low, name), nameSpan: spanOf(low, name), bases: bases ? lowerArguments(low, bases).filter((each) => !each.name).map((each) => each.value) : [],
    body: withFieldDocs(low, body), decorators: [], ...(doc ? { doc } : {}), ...base,
  };
}

/** A text right behind a field is its documentation. */
function withFieldDocs(low: Lowering, body: Syntax | undefined): readonly Stmt[] {
  const statements = lowerBlock(low, body);
  return statements.map((statement, at) => {
    const next = statements[at + 1];
    const documented = (statement.kind === 'assign' || statement.kind === 'declare') && !statement.trailing;
    if (!documented || next?.kind !== 'evaluate' || next.value.kind !== 'text' || next.value.value.includes('\n')) return statement;
    const start = low.text.slice(low.base).indexOf(next.value.value, next.start);
    return { ...statement, trailing: { text: next.value.value, start, end: start + next.value.value.length } };
  });
}

/** The documentation at the head of a block. */
export function docOf(low: Lowering, block: Syntax | undefined): DocText | undefined {
  const first = block && partsOf(block)[0];
  const text = first?.type === 'expression_statement' ? partsOf(first)[0] : undefined;
  return text ? docText(low, text) : undefined;
}

export function docText(low: Lowering, node: Syntax): DocText | undefined {
  if (node.type !== 'string') return undefined;
  const open = node.children.find((each) => each.type === 'string_start');
  const close = node.children.find((each) => each.type === 'string_end');
  if (!open || !close || node.children.some((each) => each.type === 'interpolation')) return undefined;
  return { text: low.text.slice(open.end, close.start), start: open.end - low.base, end: close.start - low.base };
}

function importStatement(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const [first] = fieldsOf(node, 'name');
  if (!first) return undefined;
  if (first.type === 'aliased_import') {
    const [module, alias] = [fieldOf(first, 'name'), fieldOf(first, 'alias')];
    return module && alias ? { kind: 'import', module: textOf(low, module), level: 0, alias: textOf(low, alias), ...base } : undefined;
  }
  return { kind: 'import', module: textOf(low, first), level: 0, ...base };
}

function importFrom(low: Lowering, node: Syntax, base: Base): Stmt | undefined {
  const module = fieldOf(node, 'module_name');
  if (!module) return undefined;
  const path = textOf(low, module);
  const level = /^\.*/.exec(path)?.[0].length ?? 0;
  const star = node.children.some((each) => each.type === 'wildcard_import');
  const names = fieldsOf(node, 'name').map((each) => {
    const [name, alias] = each.type === 'aliased_import' ? [fieldOf(each, 'name'), fieldOf(each, 'alias')] : [each, each];
    return { name: name ? textOf(low, name) : '', alias: alias ? textOf(low, alias) : '' };
  });
  return { kind: 'import', module: path.slice(level).trim(), level, names: star ? [{ name: '*', alias: '*' }] : names, ...base };
}

function leave(flow: 'break' | 'continue' | 'raise' | 'none'): Lower {
  return (low, node, base) => ({ kind: 'leave', flow, values: partsOf(node).map((each) => lowerExpression(low, each)), ...base });
}

function outer(low: Lowering, node: Syntax, base: Base): Stmt {
  return { kind: 'outer', names: partsOf(node).map((each) => textOf(low, each)), ...base };
}
