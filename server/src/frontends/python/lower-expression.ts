/** Python expressions in the common form. */
import type { Argument, BinaryExpr, CompareOp, Expr, Param, RecordEntry } from '../../program/nodes.ts';
import { Rational } from '../../quantities/rational.ts';
import type { Span } from '../../text/span.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, fieldsOf, partsOf, type Syntax } from '../tree-sitter/syntax.ts';

const deepest = 400;

export function lowerExpression(low: Lowering, node: Syntax): Expr {
  const span = spanOf(low, node);
  if (low.depth > deepest || node.broken) return { kind: 'opaque', parts: [], ...span };
  low.depth++;
  const expr = byType[node.type]?.(low, node, span) ?? opaque(low, node, span);
  low.depth--;
  return expr;
}

type Lower = (low: Lowering, node: Syntax, span: Span) => Expr;

const byType: Record<string, Lower> = {
  identifier: (low, node, span) => ({ kind: 'name', name: textOf(low, node), ...span }),
  integer: number,
  float: number,
  true: (_low, _node, span) => ({ kind: 'truth', value: true, ...span }),
  false: (_low, _node, span) => ({ kind: 'truth', value: false, ...span }),
  none: (_low, _node, span) => ({ kind: 'nothing', ...span }),
  string,
  concatenated_string: (low, node, span) => {
    const parts = partsOf(node).map((part) => lowerExpression(low, part));
    const plain = parts.every((part) => part.kind === 'text');
    return plain ? { kind: 'text', value: parts.map((part) => (part.kind === 'text' ? part.value : '')).join(''), ...span } : { kind: 'opaque', parts, ...span };
  },
  parenthesized_expression: (low, node, span) => (partsOf(node)[0] ? lowerExpression(low, partsOf(node)[0] as Syntax) : { kind: 'opaque', parts: [], ...span }),
  binary_operator: binary,
  unary_operator: (low, node, span) => {
    const operator = fieldOf(node, 'operator')?.type;
    return { kind: 'unary', op: operator === '-' ? '-' : operator === '+' ? '+' : 'bits', operand: child(low, node, 'argument'), ...span };
  },
  not_operator: (low, node, span) => ({ kind: 'unary', op: 'not', operand: child(low, node, 'argument'), ...span }),
  boolean_operator: logic,
  comparison_operator: comparison,
  conditional_expression: (low, node, span) => {
    const [then, condition, otherwise] = partsOf(node);
    if (!then || !condition || !otherwise) return opaque(low, node, span);
    return { kind: 'choose', condition: lowerExpression(low, condition), then: lowerExpression(low, then), otherwise: lowerExpression(low, otherwise), ...span };
  },
  call: (low, node, span) => {
    const args = fieldOf(node, 'arguments');
    if (args && isRecordCall(low, node, args)) return recordOfArguments(low, args, span);
    return { kind: 'call', callee: child(low, node, 'function'), args: args ? lowerArguments(low, args) : [], ...span };
  },
  attribute: (low, node, span) => {
    const name = fieldOf(node, 'attribute');
    if (!name) return opaque(low, node, span);
    return { kind: 'member', object: child(low, node, 'object'), name: textOf(low, name), nameSpan: spanOf(low, name), ...span };
  },
  subscript: (low, node, span) => {
    const keys = fieldsOf(node, 'subscript').flatMap((key) => (key.type === 'tuple' ? partsOf(key) : [key]));
    return { kind: 'index', object: child(low, node, 'value'), keys: keys.map((key) => lowerExpression(low, key)), ...span };
  },
  slice,
  tuple: sequence('tuple'),
  expression_list: sequence('tuple'),
  pattern_list: sequence('tuple'),
  tuple_pattern: sequence('tuple'),
  list_pattern: sequence('tuple'),
  list: sequence('list'),
  set: sequence('set'),
  dictionary,
  list_comprehension: comprehension,
  set_comprehension: comprehension,
  generator_expression: comprehension,
  dictionary_comprehension: comprehension,
  lambda,
  lambda_within_for_in_clause: lambda,
  named_expression: (low, node, span) => ({ kind: 'bind', target: child(low, node, 'name'), value: child(low, node, 'value'), ...span }),
  as_pattern: (low, node, span) => (partsOf(node)[0] ? lowerExpression(low, partsOf(node)[0] as Syntax) : opaque(low, node, span)),
};

/** The expression in a field, or unknown where there is none. */
export function child(low: Lowering, node: Syntax, field: string): Expr {
  const found = fieldOf(node, field);
  return found ? lowerExpression(low, found) : { kind: 'opaque', parts: [], ...spanOf(low, node) };
}

function opaque(low: Lowering, node: Syntax, span: Span): Expr {
  return { kind: 'opaque', parts: partsOf(node).map((part) => lowerExpression(low, part)), ...span };
}

function number(low: Lowering, node: Syntax, span: Span): Expr {
  const text = textOf(low, node);
  let value = numbers.get(text);
  if (value === undefined && !numbers.has(text)) {
    value = readNumber(text);
    if (numbers.size > 5000) numbers.clear();
    numbers.set(text, value);
  }
  return { kind: 'number', value, text, ...span };
}

const numbers = new Map<string, Rational | undefined>();

function readNumber(text: string): Rational | undefined {
  const plain = text.replaceAll('_', '');
  if (/^0[xXoObB]/.test(plain)) {
    try {
      return Rational.of(BigInt(plain));
    } catch {
      return undefined;
    }
  }
  return /[jJlL]$/.test(plain) ? undefined : Rational.parse(plain);
}

function string(low: Lowering, node: Syntax, span: Span): Expr {
  const holes: Expr[] = [];
  fillHoles(low, node, holes);
  if (node.parts.some((part) => part.type === 'interpolation')) return { kind: 'opaque', parts: holes, ...span };
  const content = node.parts.filter((part) => part.type === 'string_content');
  return { kind: 'text', value: content.map((part) => textOf(low, part)).join(''), ...span };
}

/** The expressions in a formatted string, and those in their formats. */
function fillHoles(low: Lowering, node: Syntax, holes: Expr[]): void {
  for (const part of node.parts) {
    if (part.type === 'format_expression' || part.type === 'interpolation') for (const each of fieldsOf(part, 'expression')) holes.push(lowerExpression(low, each));
    if (part.type === 'interpolation' || part.type === 'format_specifier') fillHoles(low, part, holes);
  }
}

const operators: Record<string, BinaryExpr['op']> = { '+': '+', '-': '-', '*': '*', '/': '/', '//': '//', '%': '%', '**': '**', '@': '@' };

function binary(low: Lowering, node: Syntax, span: Span): Expr {
  const operator = fieldOf(node, 'operator');
  const opSpan = operator ? spanOf(low, operator) : span;
  return { kind: 'binary', op: operators[operator?.type ?? ''] ?? 'bits', opSpan, left: child(low, node, 'left'), right: child(low, node, 'right'), ...span };
}

/** `a and b and c` is one expression of three operands; the parser nests them to the left. */
function logic(low: Lowering, node: Syntax, span: Span): Expr {
  const op = operatorOf(node) === 'or' ? 'or' : 'and';
  const nodes: Syntax[] = [];
  let at: Syntax | undefined = node;
  while (at?.type === 'boolean_operator' && operatorOf(at) === op) {
    const right = fieldOf(at, 'right');
    if (right) nodes.push(right);
    at = fieldOf(at, 'left');
  }
  if (at) nodes.push(at);
  return { kind: 'logic', op, operands: nodes.reverse().map((each) => lowerExpression(low, each)), ...span };
}

function operatorOf(node: Syntax): string | undefined {
  return fieldOf(node, 'operator')?.type;
}

function comparison(low: Lowering, node: Syntax, span: Span): Expr {
  const operands = node.parts.map((each) => lowerExpression(low, each));
  const ops = node.children.filter((each) => !each.named).map((each) => (each.type === '<>' ? '!=' : each.type) as CompareOp);
  return operands.length === ops.length + 1 ? { kind: 'compare', operands, ops, ...span } : { kind: 'opaque', parts: operands, ...span };
}

/** Start, end and step by position: what is left out is nothing, without extent. */
function slice(low: Lowering, node: Syntax, span: Span): Expr {
  const parts: Expr[] = [];
  let missing = true;
  for (const each of node.children) {
    if (each.type !== ':') parts.push(lowerExpression(low, each));
    else if (missing) parts.push(nothingAt(each.start - low.base));
    missing = each.type === ':';
  }
  if (missing) parts.push(nothingAt(span.end));
  return { kind: 'slice', parts, ...span };
}

function nothingAt(offset: number): Expr {
  return { kind: 'nothing', start: offset, end: offset };
}

function lambda(low: Lowering, node: Syntax, span: Span): Expr {
  const params = fieldOf(node, 'parameters');
  return { kind: 'lambda', params: params ? lowerParams(low, params) : [], body: child(low, node, 'body'), ...span };
}

function sequence(form: 'tuple' | 'list' | 'set'): Lower {
  return (low, node, span) => {
    const parts = partsOf(node);
    const comments = low.text.slice(node.start, node.end).includes('\n') ? parts.map((part) => low.comments.beside(spanOf(low, part))) : [];
    const items = parts.map((part) => lowerExpression(low, part));
    return { kind: 'sequence', form, items, ...(comments.some((each) => each) ? { comments } : {}), ...span };
  };
}

function dictionary(low: Lowering, node: Syntax, span: Span): Expr {
  const entries: RecordEntry[] = [];
  const others: Expr[] = [];
  for (const part of partsOf(node)) {
    const key = fieldOf(part, 'key');
    const value = fieldOf(part, 'value');
    const lowered = key && lowerExpression(low, key);
    if (part.type !== 'pair' || !value || !key || lowered?.kind !== 'text') {
      for (const each of part.type === 'pair' ? partsOf(part) : [part]) others.push(lowerExpression(low, each));
      continue;
    }
    const comment = low.comments.beside(spanOf(low, part));
    entries.push({ key: lowered.value, keySpan: spanOf(low, key), value: lowerExpression(low, value), ...(comment ? { comment } : {}), ...spanOf(low, part) });
  }
  return { kind: 'record', entries, others, ...span };
}

/** `dict(rho=998.2, cp=4180.0)` is the record with these entries. */
function isRecordCall(low: Lowering, node: Syntax, args: Syntax): boolean {
  const callee = fieldOf(node, 'function');
  const parts = partsOf(args);
  return callee !== undefined && /^(?:dict|(?:types\.)?SimpleNamespace)$/.test(textOf(low, callee)) && parts.length > 0 && parts.every((part) => part.type === 'keyword_argument');
}

function recordOfArguments(low: Lowering, args: Syntax, span: Span): Expr {
  const entries = partsOf(args).flatMap((part): readonly RecordEntry[] => {
    const [name, value] = [fieldOf(part, 'name'), fieldOf(part, 'value')];
    if (!name || !value) return [];
    const comment = low.comments.beside(spanOf(low, part));
    return [{ key: textOf(low, name), keySpan: spanOf(low, name), value: lowerExpression(low, value), ...(comment ? { comment } : {}), ...spanOf(low, part) }];
  });
  return { kind: 'record', entries, others: [], ...span };
}

function comprehension(low: Lowering, node: Syntax, span: Span): Expr {
  const body = fieldOf(node, 'body');
  const pair = body?.type === 'pair' ? body : undefined;
  const clauses = node.children.filter((each) => each.type === 'for_in_clause').map((each) => ({ target: child(low, each, 'left'), iterable: child(low, each, 'right') }));
  const conditions = node.children.filter((each) => each.type === 'if_clause').flatMap((each) => partsOf(each).map((part) => lowerExpression(low, part)));
  const element = pair ? child(low, pair, 'value') : body ? lowerExpression(low, body) : ({ kind: 'opaque', parts: [], ...span } as const);
  return { kind: 'comprehension', element, ...(pair ? { key: child(low, pair, 'key') } : {}), clauses, conditions, ...span };
}

export function lowerArguments(low: Lowering, node: Syntax): readonly Argument[] {
  if (node.type === 'generator_expression') return [{ value: lowerExpression(low, node), ...spanOf(low, node) }];
  return partsOf(node).map((part): Argument => {
    const span = spanOf(low, part);
    if (part.type === 'keyword_argument') {
      const name = fieldOf(part, 'name');
      return { ...(name ? { name: textOf(low, name) } : {}), value: child(low, part, 'value'), ...span };
    }
    if (part.type === 'list_splat' || part.type === 'dictionary_splat') {
      const inner = partsOf(part)[0];
      return { value: inner ? lowerExpression(low, inner) : { kind: 'opaque', parts: [], ...span }, spread: true, ...span };
    }
    return { value: lowerExpression(low, part), ...span };
  });
}

export function lowerParams(low: Lowering, node: Syntax): readonly Param[] {
  const params: Param[] = [];
  let keyword = false;
  for (const part of partsOf(node)) {
    if (part.type === 'keyword_separator') keyword = true;
    const param = lowerParam(low, part, keyword);
    if (!param) continue;
    params.push(param);
    if (param.mode === 'rest') keyword = true;
  }
  return params;
}

function lowerParam(low: Lowering, node: Syntax, keyword: boolean): Param | undefined {
  const named = fieldOf(node, 'name') ?? (node.type === 'identifier' ? node : partsOf(node).find((part) => part.type === 'identifier' || part.type.endsWith('splat_pattern')));
  if (!named || node.type.endsWith('separator')) return undefined;
  const splat = [node, named].find((each) => each.type.endsWith('splat_pattern'));
  const inner = named.type === 'identifier' ? named : partsOf(named).find((part) => part.type === 'identifier');
  if (!inner) return undefined;
  const mode = splat ? (splat.type === 'list_splat_pattern' ? 'rest' : 'rest-named') : keyword ? 'keyword' : 'plain';
  const value = fieldOf(node, 'value');
  const type = fieldOf(node, 'type');
  const comment = low.comments.beside(spanOf(low, node));
  return {
    name: textOf(low, inner), nameSpan: spanOf(low, inner), mode,
    ...(value ? { default: lowerExpression(low, value) } : {}),
    ...(type ? { annotation: textOf(low, type) } : {}),
    ...(comment ? { comment } : {}),
    ...spanOf(low, node),
  };
}
