/** JavaScript and TypeScript statements in the common form. */
import type { Expr, LeaveStmt, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { classStatement, shapeStatement } from './lower-class.ts';
import { declarations, expressionStatement, stepStatement } from './lower-declaration.ts';
import { child, lowerExpression } from './lower-expression.ts';
import { functionStatement } from './lower-function.ts';
import { exportStatement, importStatement } from './lower-module.ts';
import { bare, isFunction, nameAt, type Script, unknownAt } from './script.ts';
import { textNames } from './texts.ts';

export type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

/** The statements of a chunk. */
export function lowerChunk(low: Lowering, nodes: readonly Syntax[]): readonly Stmt[] {
  const script: Script = { ...low, texts: textNames(low, nodes), maker: undefined };
  return lowerStatements(script, nodes);
}

export function lowerBlock(script: Script, node: Syntax | undefined): readonly Stmt[] {
  if (!node) return [];
  return node.type === 'statement_block' || node.type === 'class_static_block' ? lowerStatements(script, node.parts) : lowerStatements(script, [node]);
}

/** Statements of a block; what stands inside a syntax error is taken where it is whole. */
export function lowerStatements(script: Script, nodes: readonly Syntax[]): readonly Stmt[] {
  return nodes.flatMap((node) => (node.type === 'ERROR' ? lowerStatements(script, node.parts.filter((part) => isLowered(part.type))) : lowerStatement(script, node)));
}

/** Whether a top-level node of this type is whole: a statement, a comment, or what stands between statements. */
export function isStatement(type: string): boolean {
  return isLowered(type) || besides.has(type);
}

export function baseOf(script: Script, node: Syntax): Base {
  const span = spanOf(script, node);
  const trailing = script.comments.trailing(span);
  const above = script.comments.above(span);
  return { ...span, ...(trailing ? { trailing } : {}), ...(above.length > 0 ? { above } : {}) };
}

/** Of a statement with a block: what stands behind its end is not its own. */
export function headBase(script: Script, node: Syntax): Base {
  const span = spanOf(script, node);
  const above = script.comments.above(span);
  return { ...span, ...(above.length > 0 ? { above } : {}) };
}

type Lower = (script: Script, node: Syntax, base: Base) => Stmt | readonly Stmt[] | undefined;

const deepest = 200;
const besides = new Set(['comment', 'html_comment', 'hash_bang_line', ';', 'empty_statement', 'debugger_statement', 'function_signature', 'ambient_declaration', 'import_alias', 'enum_declaration']);
const compound = new Set(['if_statement', 'switch_statement', 'for_statement', 'for_in_statement', 'while_statement', 'do_statement', 'try_statement', 'statement_block', 'function_declaration', 'generator_function_declaration', 'class_declaration', 'abstract_class_declaration', 'interface_declaration', 'labeled_statement', 'with_statement']);

function isLowered(type: string): boolean {
  return Object.hasOwn(byType, type);
}

function lowerStatement(script: Script, node: Syntax): readonly Stmt[] {
  const lower = isLowered(node.type) ? byType[node.type] : undefined;
  if (!lower || script.depth > deepest) return [];
  script.depth++;
  const lowered = lower(script, node, compound.has(node.type) ? headBase(script, node) : baseOf(script, node)) ?? [];
  script.depth--;
  return 'kind' in lowered ? [lowered] : lowered;
}

/** A declaration of any kind, with the comments and the place of what is around it. */
export function lowerDeclaration(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const lower = isLowered(node.type) ? byType[node.type] : undefined;
  const lowered = lower?.(script, node, base) ?? [];
  return 'kind' in lowered ? [lowered] : lowered;
}

const named: Lower = (script, node, base) => {
  const name = fieldOf(node, 'name');
  return name && functionStatement(script, node, { name: textOf(script, name), ...spanOf(script, name) }, base);
};

const block: Lower = (script, node, base) => ({ kind: 'scope', items: [], body: lowerBlock(script, node), ...base });

const byType: Record<string, Lower> = {
  expression_statement: (script, node, base) => atOnce(script, node, base) ?? namespaceIn(script, node, base) ?? expressionStatement(script, node, base),
  lexical_declaration: declarations,
  variable_declaration: declarations,
  function_declaration: named,
  generator_function_declaration: named,
  class_declaration: (script, node, base) => classStatement(script, node, base),
  abstract_class_declaration: (script, node, base) => classStatement(script, node, base),
  interface_declaration: shapeStatement,
  type_alias_declaration: shapeStatement,
  import_statement: importStatement,
  export_statement: exportStatement,
  return_statement: (script, node, base) => ({ kind: 'return', ...(node.parts[0] ? { value: lowerExpression(script, node.parts[0]) } : {}), ...base }),
  throw_statement: (script, node, base) => ({ kind: 'leave', flow: 'raise', values: node.parts.map((part) => lowerExpression(script, part)), ...base }),
  break_statement: leave('break'),
  continue_statement: leave('continue'),
  statement_block: block,
  labeled_statement: (script, node, base) => ({ kind: 'scope', items: [], body: lowerBlock(script, fieldOf(node, 'body')), ...base }),
  with_statement: (script, node, base) => ({ kind: 'evaluate', value: unknownAt(spanOf(script, node)), ...base }),
  if_statement: (script, node, base) => {
    const arms = [armOf(script, node)];
    let otherwise = elseOf(node);
    while (otherwise?.type === 'if_statement') {
      arms.push(armOf(script, otherwise));
      otherwise = elseOf(otherwise);
    }
    return { kind: 'if', arms, otherwise: lowerBlock(script, otherwise), ...base };
  },
  switch_statement: switchStatement,
  for_statement: forStatement,
  for_in_statement: forEach,
  while_statement: (script, node, base) => ({ kind: 'loop', condition: child(script, node, 'condition'), body: lowerBlock(script, fieldOf(node, 'body')), otherwise: [], ...base }),
  do_statement: (script, node, base) => ({ kind: 'loop', condition: child(script, node, 'condition'), body: lowerBlock(script, fieldOf(node, 'body')), otherwise: [], ...base }),
  try_statement: (script, node, base) => {
    const handler = fieldOf(node, 'handler');
    const last = fieldOf(node, 'finalizer');
    return { kind: 'attempt', body: lowerBlock(script, fieldOf(node, 'body')), handlers: handler ? [lowerBlock(script, fieldOf(handler, 'body'))] : [], otherwise: [], finally: lowerBlock(script, last && fieldOf(last, 'body')), ...base };
  },
};

function leave(flow: LeaveStmt['flow']): Lower {
  return (_script, _node, base) => ({ kind: 'leave', flow, values: [], ...base });
}

function armOf(script: Script, node: Syntax): { readonly condition: Expr; readonly body: readonly Stmt[] } {
  return { condition: child(script, node, 'condition'), body: lowerBlock(script, fieldOf(node, 'consequence')) };
}

function elseOf(node: Syntax): Syntax | undefined {
  const clause = fieldOf(node, 'alternative');
  return clause?.type === 'else_clause' ? clause.parts[0] : clause;
}

function switchStatement(script: Script, node: Syntax, base: Base): Stmt {
  const cases = (fieldOf(node, 'body')?.parts ?? []).filter((each) => each.type === 'switch_case' || each.type === 'switch_default').map((each) => ({
    bindings: [], body: staying(lowerStatements(script, each.parts.filter((part) => part.field !== 'value'))),
  }));
  return { kind: 'match', subject: child(script, node, 'value'), cases, ...base };
}

/** A break ends the case and not what is around: the way goes on behind the switch. */
function staying(statements: readonly Stmt[]): readonly Stmt[] {
  return statements.map((each): Stmt => {
    if (each.kind === 'leave' && each.flow === 'break') return { ...each, flow: 'none' };
    if (each.kind === 'if') return { ...each, arms: each.arms.map((arm) => ({ ...arm, body: staying(arm.body) })), otherwise: staying(each.otherwise) };
    return each.kind === 'scope' ? { ...each, body: staying(each.body) } : each;
  });
}

function forStatement(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const opening = fieldOf(node, 'initializer');
  const step = fieldOf(node, 'increment');
  const condition = fieldOf(node, 'condition');
  const body = lowerBlock(script, fieldOf(node, 'body'));
  const counted = countOf(script, opening, step);
  const test = condition && condition.type !== ';' && condition.type !== 'empty_statement' ? lowerExpression(script, condition.type === 'expression_statement' ? (condition.parts[0] ?? condition) : condition) : undefined;
  if (counted) {
    const end = test?.kind === 'compare' && test.operands[0]?.kind === 'name' && test.operands[0].name === counted.target.name ? (test.operands[1] as Expr) : unknownAt(test ?? { start: counted.first.end, end: counted.first.end }, test ? [test] : []);
    return [{ kind: 'loop', target: counted.target, iterable: { kind: 'slice', parts: [counted.first, end], start: counted.first.start, end: end.end }, body, otherwise: [], ...base }];
  }
  const start = opening ? (opening.type.endsWith('_declaration') ? declarations(script, opening, baseOf(script, opening)) : headSteps(script, opening)) : [];
  return [...start, { kind: 'loop', condition: test ?? { kind: 'truth', value: true, start: base.start, end: base.start }, body: [...body, ...(step ? headSteps(script, step) : [])], otherwise: [], ...base }];
}

/** `for (let i = 0; …; i++)` counts. */
function countOf(script: Script, opening: Syntax | undefined, step: Syntax | undefined): { readonly target: Extract<Expr, { kind: 'name' }>; readonly first: Expr } | undefined {
  const declarator = opening?.type.endsWith('_declaration') && opening.parts.length === 1 ? opening.parts[0] : undefined;
  const name = declarator && fieldOf(declarator, 'name');
  const value = declarator && fieldOf(declarator, 'value');
  const stepped = step?.type === 'update_expression' ? fieldOf(step, 'argument') : undefined;
  if (name?.type !== 'identifier' || !value || !stepped || textOf(script, stepped) !== textOf(script, name)) return undefined;
  return { target: { kind: 'name', name: textOf(script, name), ...spanOf(script, name) }, first: lowerExpression(script, value) };
}

function headSteps(script: Script, node: Syntax): readonly Stmt[] {
  const inner = node.type === 'expression_statement' ? node.parts : [node];
  return inner.flatMap((each) => (each.type === 'sequence_expression' ? headStepsOf(script, each) : stepStatement(script, each, spanOf(script, each))));
}

function headStepsOf(script: Script, node: Syntax): readonly Stmt[] {
  return node.parts.flatMap((each) => headSteps(script, each));
}

/** `for (const x of xs)`; keys of `for … in` and what is waited for are unknown. */
function forEach(script: Script, node: Syntax, base: Base): Stmt {
  const left = fieldOf(node, 'left');
  const known = fieldOf(node, 'operator')?.type === 'of' && !node.children.some((each) => each.type === 'await');
  const right = child(script, node, 'right');
  const target: Expr = left?.type === 'identifier' ? nameAt(script, left) : left ? lowerExpression(script, left) : unknownAt(base);
  return { kind: 'loop', target, iterable: known ? right : unknownAt(right, [right]), body: lowerBlock(script, fieldOf(node, 'body')), otherwise: [], ...base };
}

/** `(function () { … })()`: its statements run where they stand. */
function atOnce(script: Script, node: Syntax, base: Base): Stmt | undefined {
  let call = bare(node.parts[0]);
  while (call && (call.type === 'unary_expression' || call.type === 'await_expression')) call = bare(fieldOf(call, 'argument') ?? call.parts[0]);
  const fn = call?.type === 'call_expression' ? bare(fieldOf(call, 'function')) : undefined;
  const body = isFunction(fn) ? fieldOf(fn, 'body') : undefined;
  if (!fn || body?.type !== 'statement_block' || (fieldOf(fn, 'parameters')?.parts.length ?? 0) > 0) return undefined;
  return { kind: 'scope', items: [], body: unreturned(lowerBlock(script, body)), start: base.start, end: base.end };
}

function unreturned(statements: readonly Stmt[]): readonly Stmt[] {
  return statements.map((each): Stmt => (each.kind === 'return' && each.value ? { kind: 'evaluate', value: each.value, start: each.start, end: each.end } : each));
}

/** The statements of a TypeScript namespace. */
function namespaceIn(script: Script, node: Syntax, base: Base): Stmt | undefined {
  const inner = node.parts[0];
  if (inner?.type !== 'internal_module' && inner?.type !== 'module') return undefined;
  return { kind: 'scope', items: [], body: lowerBlock(script, fieldOf(inner, 'body')), start: base.start, end: base.end };
}
