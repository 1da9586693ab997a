/** Julia expressions in the common form. */
import type { Expr, RecordEntry } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { numberValue } from './literals.ts';
import { lowerBroadcast, lowerCall, lowerIndex, lowerLambda, lowerMacro } from './lower-call.ts';
import { lowerBinary, lowerJuxtaposition, lowerUnary } from './lower-operator.ts';

const deepest = 400;

/** An expression; what cannot be expressed is unknown. */
export function lowerExpression(low: Lowering, node: Syntax): Expr {
  const span = spanOf(low, node);
  if (low.depth > deepest || node.broken) return { kind: 'opaque', parts: [], ...span };
  low.depth++;
  const expr = byType[node.type]?.(low, node, span) ?? opaque(low, node, span);
  low.depth--;
  return expr;
}

/** Unknown, its parts walked where they are expressions. */
export function opaque(low: Lowering, node: Syntax, span: Span): Expr {
  return { kind: 'opaque', parts: node.parts.filter((part) => byType[part.type] !== undefined).map((part) => lowerExpression(low, part)), ...span };
}

export type Lower = (low: Lowering, node: Syntax, span: Span) => Expr;

const nothingOf: Lower = (_low, _node, span) => ({ kind: 'opaque', parts: [], ...span });

/** Types of nodes that may stand between the bracket and its elements in `Float64[1, 2]`. */
const byType: Record<string, Lower> = {
  identifier: (low, node, span) => {
    const name = textOf(low, node);
    return name === 'nothing' || name === 'missing' ? { kind: 'nothing', ...span } : { kind: 'name', name, ...span };
  },
  integer_literal: number,
  float_literal: number,
  boolean_literal: (low, node, span) => ({ kind: 'truth', value: textOf(low, node) === 'true', ...span }),
  character_literal: (low, node, span) => ({ kind: 'text', value: textOf(low, node).slice(1, -1), ...span }),
  string_literal: string,
  prefixed_string_literal: (low, node, span) => (textOf(low, node).startsWith('raw') ? { kind: 'text', value: content(low, node), ...span } : { kind: 'opaque', parts: [], ...span }),
  command_literal: nothingOf,
  prefixed_command_literal: nothingOf,
  quote_expression: quote,
  quote_statement: nothingOf,
  interpolation_expression: nothingOf,
  operator: operatorAlone,
  parenthesized_expression: parenthesized,
  tuple_expression: tuple,
  open_tuple: tuple,
  vector_expression: (low, node, span) => {
    const parted = node.parts.length === 1 ? partedByBlanks(low, node.parts[0] as Syntax) : [];
    return parted.length > 1 ? { kind: 'sequence', form: 'matrix', items: parted, ...span } : listOf(low, node.parts, span);
  },
  matrix_expression: matrix,
  matrix_row: (low, node, span) => ({ kind: 'sequence', form: 'list', items: rowOf(low, node), ...span }),
  comprehension_expression: (low, node, span) => comprehension(low, node.parts, span) ?? { kind: 'opaque', parts: [], ...span },
  adjoint_expression: (low, node, span) => (node.parts[0] ? { kind: 'unary', op: 'transpose', operand: lowerExpression(low, node.parts[0]), ...span } : nothingOf(low, node, span)),
  field_expression: field,
  scoped_identifier: nothingOf,
  index_expression: lowerIndex,
  parametrized_type_expression: (low, node, span) => (node.parts[0] ? lowerExpression(low, node.parts[0]) : nothingOf(low, node, span)),
  curly_expression: nothingOf,
  call_expression: lowerCall,
  broadcast_call_expression: lowerBroadcast,
  macrocall_expression: lowerMacro,
  arrow_function_expression: lowerLambda,
  function_definition: nothingOf,
  unary_expression: lowerUnary,
  binary_expression: lowerBinary,
  juxtaposition_expression: lowerJuxtaposition,
  range_expression: range,
  splat_expression: opaque,
  typed_expression: first,
  where_expression: first,
  unary_typed_expression: nothingOf,
  ternary_expression: (low, node, span) => {
    const [condition, then, otherwise] = node.parts;
    if (!condition || !then || !otherwise) return opaque(low, node, span);
    return { kind: 'choose', condition: lowerExpression(low, condition), then: lowerExpression(low, then), otherwise: lowerExpression(low, otherwise), ...span };
  },
  assignment: (low, node, span) => {
    const [target, value] = [node.parts[0], node.parts.at(-1)];
    if (!target || !value || value === target) return nothingOf(low, node, span);
    return { kind: 'bind', target: lowerExpression(low, target), value: lowerExpression(low, value), ...span };
  },
  compound_assignment_expression: nothingOf,
  compound_statement: (low, node, span) => (node.parts.length === 1 ? lowerExpression(low, node.parts[0] as Syntax) : { kind: 'opaque', parts: [], ...span }),
  if_statement: chosen,
};

function first(low: Lowering, node: Syntax, span: Span): Expr {
  return node.parts[0] ? lowerExpression(low, node.parts[0]) : { kind: 'opaque', parts: [], ...span };
}

function number(low: Lowering, node: Syntax, span: Span): Expr {
  const text = textOf(low, node);
  return { kind: 'number', value: numberValue(text), text, ...span };
}

function string(low: Lowering, node: Syntax, span: Span): Expr {
  const holes = node.parts.filter((part) => part.type === 'string_interpolation');
  if (holes.length > 0) return { kind: 'opaque', parts: holes.flatMap((hole) => hole.parts.map((part) => lowerExpression(low, part))), ...span };
  return { kind: 'text', value: content(low, node), ...span };
}

/** What stands between the quotes, escapes and all. */
function content(low: Lowering, node: Syntax): string {
  const parts = node.parts.filter((part) => part.type !== 'identifier');
  const [from, to] = [parts[0], parts.at(-1)];
  return from && to ? low.text.slice(from.start, to.end) : '';
}

/** `:rho` is a key; other quoted code is not read. */
function quote(low: Lowering, node: Syntax, span: Span): Expr {
  const inner = node.parts[0];
  return inner?.type === 'identifier' && inner.start === node.start + 1 ? { kind: 'text', value: textOf(low, inner), ...span } : { kind: 'opaque', parts: [], ...span };
}

/** A lone colon takes a whole dimension; operators are functions otherwise. */
function operatorAlone(low: Lowering, node: Syntax, span: Span): Expr {
  if (textOf(low, node) !== ':') return { kind: 'opaque', parts: [], ...span };
  return { kind: 'slice', parts: [nothingAt(span.start), nothingAt(span.end)], ...span };
}

function nothingAt(offset: number): Expr {
  return { kind: 'nothing', start: offset, end: offset };
}

/** `(a)`, `(a; b)` with the value of the last, and generators. */
function parenthesized(low: Lowering, node: Syntax, span: Span): Expr {
  const generator = comprehension(low, node.parts, span);
  if (generator) return generator;
  const only = node.parts.length === 1 ? node.parts[0] : undefined;
  return only ? lowerExpression(low, only) : opaque(low, node, span);
}

/** A tuple, or a record where its fields have names: `(a = 1, b = 2)`, `(; a, b)`. */
function tuple(low: Lowering, node: Syntax, span: Span): Expr {
  const generator = comprehension(low, node.parts, span);
  if (generator) return generator;
  const named = node.parts.some((part) => part.type === 'named_field') || node.children[0]?.type === ';';
  if (!named) return { ...listOf(low, node.parts, span), form: 'tuple' } as Expr;
  const entries = node.parts.flatMap((part) => entryOf(low, part) ?? []);
  const others = node.parts.filter((part) => !entryOf(low, part)).map((part) => lowerExpression(low, part));
  return { kind: 'record', entries, others, ...span };
}

function entryOf(low: Lowering, part: Syntax): RecordEntry | undefined {
  const key = part.type === 'named_field' ? part.parts[0] : part.type === 'identifier' ? part : undefined;
  const value = part.type === 'named_field' ? part.parts[1] : part;
  if (!key || !value || part.broken) return undefined;
  const comment = low.comments.beside(spanOf(low, part));
  return { key: textOf(low, key), keySpan: spanOf(low, key), value: lowerExpression(low, value), ...(comment ? { comment } : {}), ...spanOf(low, part) };
}

/** Elements of a list with the comments beside them. */
export function listOf(low: Lowering, parts: readonly Syntax[], span: Span): Expr {
  const lines = low.text.slice(low.base + span.start, low.base + span.end).includes('\n');
  const comments = lines ? parts.map((part) => low.comments.beside(spanOf(low, part))) : [];
  return { kind: 'sequence', form: 'list', items: parts.map((part) => lowerExpression(low, part)), ...(comments.some((each) => each) ? { comments } : {}), ...span };
}

/** Rows of entries; a single row, or a single column, is the entries. */
function matrix(low: Lowering, node: Syntax, span: Span): Expr {
  const rows = node.parts.map((row) => rowOf(low, row));
  if (rows.length === 1) return { kind: 'sequence', form: 'matrix', items: rows[0] as readonly Expr[], ...span };
  if (rows.some((row) => row.length > 1)) return { ...listOf(low, node.parts, span), form: 'matrix' } as Expr;
  return { ...listOf(low, node.parts.flatMap((row) => row.parts), span), form: 'matrix' } as Expr;
}

function rowOf(low: Lowering, row: Syntax): readonly Expr[] {
  return row.parts.flatMap((part) => partedByBlanks(low, part));
}

/** In brackets `a -b` is two entries; the grammar takes it for a difference. */
function partedByBlanks(low: Lowering, node: Syntax): readonly Expr[] {
  const [left, sign, right] = node.parts;
  const op = sign && textOf(low, sign);
  const parted = node.type === 'binary_expression' && left && right && sign && (op === '-' || op === '+') && /\s/.test(low.text[sign.start - 1] ?? '') && !/\s/.test(low.text[sign.end] ?? '');
  if (!parted || node.broken) return [lowerExpression(low, node)];
  return [...partedByBlanks(low, left), { kind: 'unary', op, operand: lowerExpression(low, right), start: sign.start - low.base, end: node.end - low.base }];
}

/** An element with the clauses behind it; undefined without any. */
export function comprehension(low: Lowering, parts: readonly Syntax[], span: Span): Expr | undefined {
  const [element] = parts;
  const loops = parts.filter((part) => part.type === 'for_clause').flatMap((part) => part.parts);
  if (!element || loops.length === 0) return undefined;
  const clauses = loops.flatMap((binding) => {
    const [target, iterable] = [binding.parts[0], binding.parts.at(-1)];
    return target && iterable && target !== iterable ? [{ target: lowerExpression(low, target), iterable: lowerExpression(low, iterable) }] : [];
  });
  const conditions = parts.filter((part) => part.type === 'if_clause').flatMap((part) => part.parts.map((each) => lowerExpression(low, each)));
  return { kind: 'comprehension', element: lowerExpression(low, element), clauses, conditions, ...span };
}

function field(low: Lowering, node: Syntax, span: Span): Expr {
  const [object, name] = node.parts;
  if (!object || name?.type !== 'identifier') return opaque(low, node, span);
  return { kind: 'member', object: lowerExpression(low, object), name: textOf(low, name), nameSpan: spanOf(low, name), ...span };
}

/** Start, end and step by position; Julia writes the step in the middle. */
function range(low: Lowering, node: Syntax, span: Span): Expr {
  const [left, end] = node.parts;
  if (!left || !end) return opaque(low, node, span);
  const stepped = left.type === 'range_expression' && left.parts.length === 2 ? left.parts : undefined;
  const parts = stepped ? [stepped[0] as Syntax, end, stepped[1] as Syntax] : [left, end];
  return { kind: 'slice', parts: parts.map((part) => lowerExpression(low, part)), ...span };
}

/** `if a b else c end` as a value, where each branch is one expression. */
function chosen(low: Lowering, node: Syntax, span: Span): Expr {
  const [condition, then, clause, ...more] = node.parts;
  const otherwise = clause?.type === 'else_clause' && clause.parts.length === 1 ? clause.parts[0] : undefined;
  if (!condition || !then || !otherwise || more.length > 0) return { kind: 'opaque', parts: [], ...span };
  return { kind: 'choose', condition: lowerExpression(low, condition), then: lowerExpression(low, then), otherwise: lowerExpression(low, otherwise), ...span };
}
