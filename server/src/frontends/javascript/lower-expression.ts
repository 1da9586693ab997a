/** JavaScript and TypeScript expressions in the common form. */
import type { Argument, BinaryExpr, CompareOp, Expr, RecordEntry } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { callback, lambda } from './callbacks.ts';
import { number, stringText } from './literals.ts';
import { bare, isFunction, nameAt, type Script, unknownAt } from './script.ts';
import { isText } from './texts.ts';

const deepest = 400;

export function lowerExpression(script: Script, node: Syntax): Expr {
  const span = spanOf(script, node);
  if (script.depth > deepest || node.broken) return unknownAt(span);
  script.depth++;
  const expr = (Object.hasOwn(byType, node.type) ? byType[node.type]?.(script, node, span) : undefined) ?? opaque(script, node, span);
  script.depth--;
  return expr;
}

/** The expression in a field, or unknown where there is none. */
export function child(script: Script, node: Syntax, field: string): Expr {
  const found = fieldOf(node, field);
  return found ? lowerExpression(script, found) : unknownAt(spanOf(script, node));
}

type Lower = (script: Script, node: Syntax, span: Span) => Expr;

const inner: Lower = (script, node, span) => (node.parts[0] ? lowerExpression(script, node.parts[0]) : unknownAt(span));

const byType: Record<string, Lower> = {
  identifier: (script, node) => nameAt(script, node),
  shorthand_property_identifier: (script, node) => nameAt(script, node),
  this: (script, node) => nameAt(script, node),
  undefined: (_script, _node, span) => ({ kind: 'nothing', ...span }),
  null: (_script, _node, span) => ({ kind: 'nothing', ...span }),
  true: (_script, _node, span) => ({ kind: 'truth', value: true, ...span }),
  false: (_script, _node, span) => ({ kind: 'truth', value: false, ...span }),
  number,
  string: (script, node, span) => ({ kind: 'text', value: stringText(script, node), ...span }),
  template_string: (script, node, span) => {
    const holes = node.parts.filter((part) => part.type === 'template_substitution').map((part) => inner(script, part, spanOf(script, part)));
    return holes.length === 0 ? { kind: 'text', value: stringText(script, node), ...span } : unknownAt(span, holes);
  },
  regex: (_script, _node, span) => unknownAt(span),
  parenthesized_expression: inner,
  as_expression: inner,
  satisfies_expression: inner,
  non_null_expression: inner,
  instantiation_expression: inner,
  type_assertion: (script, node, span) => (node.parts.at(-1) ? lowerExpression(script, node.parts.at(-1) as Syntax) : unknownAt(span)),
  binary_expression: binary,
  unary_expression: unary,
  update_expression: (script, node) => child(script, node, 'argument'),
  ternary_expression: (script, node, span) => ({ kind: 'choose', condition: child(script, node, 'condition'), then: child(script, node, 'consequence'), otherwise: child(script, node, 'alternative'), ...span }),
  call_expression: call,
  new_expression: (script, node, span) => {
    const made = fieldOf(node, 'constructor');
    const args = fieldOf(node, 'arguments');
    return made ? { kind: 'call', callee: lowerExpression(script, made), args: args ? lowerArguments(script, args) : [], ...span } : unknownAt(span);
  },
  member_expression: member,
  subscript_expression: subscript,
  array: sequence,
  array_pattern: sequence,
  object: record,
  arrow_function: (script, node, span) => lambda(script, node, span) ?? callback(script, node, span),
  function_expression: callback,
  generator_function: callback,
  class: (_script, _node, span) => unknownAt(span),
  assignment_expression: (script, node, span) => {
    const target = fieldOf(node, 'left');
    const value = child(script, node, 'right');
    return target?.type === 'identifier' || target?.type === 'member_expression' ? { kind: 'bind', target: lowerExpression(script, target), value, ...span } : unknownAt(span, [value]);
  },
  augmented_assignment_expression: (script, node, span) => {
    const target = fieldOf(node, 'left');
    if (target?.type !== 'identifier') return unknownAt(span, [child(script, node, 'right')]);
    return { kind: 'bind', target: nameAt(script, target), value: unknownAt(spanOf(script, node), [child(script, node, 'right')]), ...span };
  },
  sequence_expression: (script, node, span) => {
    const parts = node.parts.map((part) => lowerExpression(script, part));
    const last = parts.at(-1);
    if (!last) return unknownAt(span);
    // The last one is the value; the others are walked as the conditions of nothing.
    return { kind: 'choose', condition: unknownAt(span, parts.slice(0, -1)), then: last, otherwise: { kind: 'nothing', start: span.end, end: span.end }, ...span };
  },
};

/** Its parts are walked where they are expressions. */
function opaque(script: Script, node: Syntax, span: Span): Expr {
  return unknownAt(span, node.type.includes('type') ? [] : node.parts.filter((part) => part.type !== 'statement_block').map((part) => lowerExpression(script, part)));
}

const arithmetic: Readonly<Record<string, BinaryExpr['op']>> = { '+': '+', '-': '-', '*': '*', '/': '/', '%': '%', '**': '**', '&': 'bits', '|': 'bits', '^': 'bits', '<<': 'bits', '>>': 'bits', '>>>': 'bits' };
const comparisons: Readonly<Record<string, CompareOp>> = { '<': '<', '<=': '<=', '>': '>', '>=': '>=', '==': '==', '===': '==', '!=': '!=', '!==': '!=' };

/** The operator of the common form for arithmetic written with `text`; undefined for others. */
export function operatorOf(text: string): BinaryExpr['op'] | undefined {
  return arithmetic[text];
}

function binary(script: Script, node: Syntax, span: Span): Expr {
  const operator = fieldOf(node, 'operator');
  const type = operator?.type ?? '';
  if (type === '&&' || type === '||') return logic(script, node, span, type);
  const [left, right] = [child(script, node, 'left'), child(script, node, 'right')];
  if (type === '??') return { kind: 'choose', condition: unknownAt({ start: span.start, end: span.start }), then: left, otherwise: right, ...span };
  const compared = comparisons[type];
  if (compared) return holdsText(script, node) ? unknownAt(span, [left, right]) : { kind: 'compare', operands: [left, right], ops: [compared], ...span };
  const op = arithmetic[type];
  if (!op || !operator || (op === '+' && holdsText(script, node))) return unknownAt(span, [left, right]);
  return { kind: 'binary', op, opSpan: spanOf(script, operator), left, right, ...span };
}

function holdsText(script: Script, node: Syntax): boolean {
  return isText(script, fieldOf(node, 'left'), script.texts) || isText(script, fieldOf(node, 'right'), script.texts);
}

/** `a && b && c` is one expression of three operands; the parser nests them to the left. */
function logic(script: Script, node: Syntax, span: Span, op: '&&' | '||'): Expr {
  const nodes: Syntax[] = [];
  let at: Syntax | undefined = node;
  while (at?.type === 'binary_expression' && fieldOf(at, 'operator')?.type === op) {
    const right = fieldOf(at, 'right');
    if (right) nodes.push(right);
    at = fieldOf(at, 'left');
  }
  if (at) nodes.push(at);
  return { kind: 'logic', op: op === '||' ? 'or' : 'and', operands: nodes.reverse().map((each) => lowerExpression(script, each)), ...span };
}

function unary(script: Script, node: Syntax, span: Span): Expr {
  const operator = fieldOf(node, 'operator')?.type;
  const operand = child(script, node, 'argument');
  switch (operator) {
    case '-':
    case '+':
      return { kind: 'unary', op: operator, operand, ...span };
    case '!':
      return { kind: 'unary', op: 'not', operand, ...span };
    case '~':
      return { kind: 'unary', op: 'bits', operand, ...span };
    default:
      return unknownAt(span, [operand]);
  }
}

function call(script: Script, node: Syntax, span: Span): Expr {
  const callee = fieldOf(node, 'function');
  const args = fieldOf(node, 'arguments');
  if (!callee || args?.type !== 'arguments' || isFunction(bare(callee))) return opaque(script, node, span);
  const own = callee.type === 'member_expression' && fieldOf(callee, 'object')?.type === 'this' ? fieldOf(callee, 'property') : undefined;
  const target = own && script.maker?.has(textOf(script, own)) ? nameAt(script, own) : lowerExpression(script, callee);
  return { kind: 'call', callee: target, args: lowerArguments(script, args), ...span };
}

export function lowerArguments(script: Script, node: Syntax): readonly Argument[] {
  return node.parts.map((part): Argument => {
    const span = spanOf(script, part);
    if (part.type !== 'spread_element') return { value: lowerExpression(script, part), ...span };
    return { value: part.parts[0] ? lowerExpression(script, part.parts[0]) : unknownAt(span), spread: true, ...span };
  });
}

function member(script: Script, node: Syntax, span: Span): Expr {
  const property = fieldOf(node, 'property');
  if (!property) return opaque(script, node, span);
  return { kind: 'member', object: child(script, node, 'object'), name: textOf(script, property), nameSpan: spanOf(script, property), ...span };
}

/** `a["x"]` is `a.x`. */
function subscript(script: Script, node: Syntax, span: Span): Expr {
  const object = child(script, node, 'object');
  const index = fieldOf(node, 'index');
  const key = index ? lowerExpression(script, index) : unknownAt(span);
  if (key.kind === 'text' && index && /^[\p{L}_$][\p{L}\p{N}_$]*$/u.test(key.value)) return { kind: 'member', object, name: key.value, nameSpan: { start: key.start + 1, end: key.end - 1 }, ...span };
  return { kind: 'index', object, keys: [key], ...span };
}

/** Rows of numbers are lists; what holds anything else may hold unlike things, place by place. */
function sequence(script: Script, node: Syntax, span: Span): Expr {
  const { parts } = node;
  const holes = /^\[\s*,|,\s*,/.test(textOf(script, node).replace(/\/\*[\s\S]*?\*\/|\/\/[^\n]*/g, ''));
  const items = parts.map((part) => lowerExpression(script, part));
  if (holes || parts.some((part) => part.type === 'spread_element')) return unknownAt(span, items);
  const comments = textOf(script, node).includes('\n') ? parts.map((part) => script.comments.beside(spanOf(script, part))) : [];
  const form = items.every(isPlain) ? 'list' : 'tuple';
  return { kind: 'sequence', form, items, ...(comments.some((each) => each) ? { comments } : {}), ...span };
}

function isPlain(item: Expr): boolean {
  return item.kind === 'number' || item.kind === 'text' || item.kind === 'truth' || item.kind === 'nothing' || (item.kind === 'unary' && isPlain(item.operand)) || (item.kind === 'sequence' && item.items.every(isPlain));
}

function record(script: Script, node: Syntax, span: Span): Expr {
  const entries: RecordEntry[] = [];
  const others: Expr[] = [];
  for (const part of node.parts) {
    const entry = entryOf(script, part);
    if (entry) entries.push(entry);
    else if (part.type === 'pair' || part.type === 'spread_element') others.push(...part.parts.filter((each) => each.field !== 'key' || each.type === 'computed_property_name').map((each) => lowerExpression(script, each)));
  }
  // What is spread in may come under any of the names.
  if (node.parts.some((part) => part.type === 'spread_element')) return unknownAt(span, [...others, ...entries.map((entry) => entry.value)]);
  return { kind: 'record', entries, others, ...span };
}

function entryOf(script: Script, part: Syntax): RecordEntry | undefined {
  const span = spanOf(script, part);
  const comment = script.comments.beside(span);
  const rest = { ...(comment ? { comment } : {}), ...span };
  if (part.type === 'shorthand_property_identifier') return { key: textOf(script, part), keySpan: span, value: nameAt(script, part), ...rest };
  const key = part.type === 'pair' ? fieldOf(part, 'key') : undefined;
  const value = fieldOf(part, 'value');
  if (!key || !value || key.type === 'computed_property_name') return undefined;
  const text = key.type === 'string' ? stringText(script, key) : textOf(script, key);
  return { key: text, keySpan: spanOf(script, key), value: lowerExpression(script, value), ...rest };
}
