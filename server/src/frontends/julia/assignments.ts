/** Assignments in the common form. */
import type { AssignStmt, BinaryExpr, Expr, Stmt } from '../../program/nodes.ts';
import { type Lowering, spanOf, textOf } from '../tree-sitter/lowering.ts';
import type { Syntax } from '../tree-sitter/syntax.ts';
import { docText, fieldDoc } from './documentation.ts';
import { lowerExpression } from './lower-expression.ts';
import { attempt, type Base, baseOf, ifStatement, lowerStatements } from './lower-statement.ts';
import { arithmetic } from './operators.ts';
import { typeName } from './parameters.ts';

/** Whether an assignment defines a function: `f(x) = …`, `f(x)::T where T = …`. */
export function isHead(node: Syntax): boolean {
  let left = node.parts[0];
  while (left?.type === 'where_expression' || left?.type === 'typed_expression') left = left.parts[0];
  return left?.type === 'call_expression' && node.parts.length > 2;
}

/** `a = b = value`, with what stands in its value; a text above counts as a comment. */
export function assignment(low: Lowering, node: Syntax, base: Base, doc: Syntax | undefined): readonly Stmt[] {
  const targets: Syntax[] = [];
  let at: Syntax = node;
  for (;;) {
    const [target, value] = [at.parts[0], at.parts.at(-1)];
    if (!target || !value || target === value || targets.length > 50) return [];
    targets.push(target);
    if (value.type !== 'assignment' || isHead(value)) break;
    at = value;
  }
  const value = at.parts.at(-1) as Syntax;
  const above = doc && docText(low, doc);
  const comment = above && fieldDoc(above);
  const own: Base = comment ? { ...base, above: [...(base.above ?? []), comment] } : base;
  if (targets.length === 1 && value.type === 'if_statement' && !node.broken) return branched(low, targets[0] as Syntax, value, own);
  const lowered = value.broken ? unknownAt(low, value) : lowerExpression(low, value);
  if (targets.length > 1 && !targets.some(isRecordTarget)) return [{ kind: 'assign', targets: targets.map((target) => targetOf(low, target)), value: lowered, ...own }];
  return targets.flatMap((target) => destructured(low, target, lowered, own));
}

/** `(; a, b)`. */
function isRecordTarget(target: Syntax): boolean {
  return target.type === 'tuple_expression' && target.children[0]?.type === ';';
}

/** One target and its value. */
function destructured(low: Lowering, target: Syntax, value: Expr, base: Base): readonly Stmt[] {
  if (isRecordTarget(target)) return fieldsOf(low, target.parts, value, base);
  return [assign(low, target, value, base)];
}

function assign(low: Lowering, target: Syntax, value: Expr, base: Base): AssignStmt {
  const type = target.type === 'typed_expression' ? target.parts[1] : undefined;
  return { kind: 'assign', targets: [targetOf(low, target)], value, ...(type ? { annotation: typeName(low, type) } : {}), ...base };
}

function targetOf(low: Lowering, target: Syntax): Expr {
  const inner = target.type === 'typed_expression' ? (target.parts[0] ?? target) : target;
  const lowered = lowerExpression(low, inner);
  return lowered.kind === 'sequence' ? { ...lowered, form: 'tuple' } : lowered;
}

/** `(; a, b) = s` and `@unpack a, b = s`: each name takes the field of its name; what is no fixed object gives unknown values. */
export function fieldsOf(low: Lowering, names: readonly Syntax[], value: Expr, base: Base): readonly Stmt[] {
  const fixed = value.kind === 'name' || value.kind === 'member';
  return names.filter((each) => each.type === 'identifier').map((each, at): Stmt => {
    const name = textOf(low, each);
    const span = spanOf(low, each);
    // The field has the name of the variable, and its place.
    const field: Expr = fixed ? { kind: 'member', object: value, name, nameSpan: span, start: Math.min(span.start, value.start), end: Math.max(span.end, value.end) } : { kind: 'opaque', parts: [], ...span };
    const comments = at === 0 || !base.above ? base : { start: base.start, end: base.end };
    return { kind: 'assign', targets: [{ kind: 'name', name, ...span }], value: field, ...comments, start: span.start, end: Math.max(span.end, value.end) };
  });
}

/** `y = if c a else b end`: each branch gives `y` its last value. */
function branched(low: Lowering, target: Syntax, value: Syntax, base: Base): readonly Stmt[] {
  const sink = (node: Syntax): readonly Stmt[] => [assign(low, target, lowerExpression(low, node), baseOf(low, node))];
  return [ifStatement(low, value, { start: value.start - low.base, end: base.end }, (nodes) => tail(low, nodes, sink))];
}

/** The statements of a block whose last value is handed to `sink`. */
export function tail(low: Lowering, nodes: readonly Syntax[], sink: (node: Syntax) => readonly Stmt[]): readonly Stmt[] {
  const last = nodes.at(-1);
  if (!last) return [];
  const before = nodes.slice(0, -1);
  const deeper = (inner: readonly Syntax[]): readonly Stmt[] => tail(low, inner, sink);
  if (last.broken && last.type === 'ERROR') return lowerStatements(low, nodes);
  switch (last.type) {
    case 'if_statement':
      return [...lowerStatements(low, before), ifStatement(low, last, baseOf(low, last), deeper)];
    case 'try_statement':
      return [...lowerStatements(low, before), attempt(low, last, baseOf(low, last), deeper)];
    case 'compound_statement':
      return [...lowerStatements(low, before), ...deeper(last.parts)];
    case 'let_statement':
    case 'return_statement':
    case 'for_statement':
    case 'while_statement':
    case 'function_definition':
    case 'struct_definition':
    case 'macrocall_expression':
    case 'const_statement':
    case 'local_statement':
    case 'global_statement':
    case 'compound_assignment_expression':
    case 'break_statement':
    case 'continue_statement':
      return lowerStatements(low, nodes);
    default:
      return last.type === 'assignment' || isGuard(low, last) || isThrow(low, last) ? lowerStatements(low, nodes) : [...lowerStatements(low, before), ...sink(last)];
  }
}

function isGuard(low: Lowering, node: Syntax): boolean {
  const sign = node.type === 'binary_expression' ? node.parts[1] : undefined;
  return sign !== undefined && /^(?:&&|\|\|)$/.test(textOf(low, sign)) && /^(?:return_statement|assignment|compound_assignment_expression)$/.test(node.parts[2]?.type ?? '');
}

function isThrow(low: Lowering, node: Syntax): boolean {
  const callee = node.type === 'call_expression' ? node.parts[0] : undefined;
  return callee !== undefined && /^(?:error|throw|rethrow)$/.test(textOf(low, callee));
}

/** `a += b`; `a .= b` fills the elements of `a`. */
export function augmented(low: Lowering, node: Syntax, base: Base): readonly Stmt[] {
  const [target, sign, value] = node.parts;
  if (!target || !sign || !value) return [];
  const lowered = node.broken ? unknownAt(low, value) : lowerExpression(low, value);
  const text = textOf(low, sign).replace(/^\./, '').slice(0, -1);
  if (text === '' && textOf(low, sign) === '.=') return [{ kind: 'assign', targets: [elements(targetOf(low, target))], value: lowered, ...base }];
  if (textOf(low, sign) === ':=' || textOf(low, sign) === '~') return [{ kind: 'evaluate', value: { kind: 'opaque', parts: [lowered], ...spanOf(low, node) }, ...base }];
  const op: BinaryExpr['op'] = arithmetic[text] ?? 'bits';
  return [{ kind: 'assign', targets: [targetOf(low, target)], value: lowered, op, ...base }];
}

/** All elements of an array. */
function elements(target: Expr): Expr {
  if (target.kind === 'index') return target;
  const at = { start: target.end, end: target.end };
  return { kind: 'index', object: target, keys: [{ kind: 'slice', parts: [{ kind: 'nothing', ...at }, { kind: 'nothing', ...at }], ...at }], start: target.start, end: target.end };
}

function unknownAt(low: Lowering, node: Syntax): Expr {
  return { kind: 'opaque', parts: [], ...spanOf(low, node) };
}
