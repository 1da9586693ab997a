/** `const`, `let` and `var`, and assignments that stand as statements. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import { Rational } from '../../quantities/rational.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { describedBy, withDescription } from './documentation.ts';
import { child, lowerExpression, operatorOf } from './lower-expression.ts';
import { classStatement } from './lower-class.ts';
import { functionStatement } from './lower-function.ts';
import { type Base, baseOf } from './lower-statement.ts';
import { exported, required } from './lower-module.ts';
import { destructured } from './patterns.ts';
import { bare, isFunction, nameAt, type Script, unknownAt } from './script.ts';
import { isText } from './texts.ts';

/** One statement for each declarator, or several where it takes a value apart. */
export function declarations(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const declarators = node.parts.filter((each) => each.type === 'variable_declarator');
  return declarators.flatMap((each, at) => declarator(script, each, declarators.length === 1 ? base : ownBase(script, each, base, at, declarators)));
}

/** Of several declarators on a line the comment behind them speaks of all only where none has a value. */
function ownBase(script: Script, node: Syntax, whole: Base, at: number, all: readonly Syntax[]): Base {
  const own = baseOf(script, node);
  const line = (each: Syntax): string => script.text.slice(each.end, (own.trailing?.start ?? 0) + script.base);
  const behind = own.trailing ? all.filter((each) => !line(each).includes('\n') && each.end <= (own.trailing?.start ?? 0) + script.base && sameLine(script, each, node)) : [];
  const shared = behind.length > 1 && behind.some((each) => fieldOf(each, 'value'));
  const { trailing, above: _above, ...place } = own;
  const above = at === 0 ? whole.above : own.above;
  return { ...place, ...(trailing && !shared ? { trailing } : {}), ...(above && above.length > 0 ? { above } : {}) };
}

function sameLine(script: Script, a: Syntax, b: Syntax): boolean {
  return !script.text.slice(Math.min(a.end, b.end), Math.max(a.end, b.end)).includes('\n');
}

function declarator(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const name = fieldOf(node, 'name');
  const value = fieldOf(node, 'value');
  if (!name) return [];
  const inner = bare(value);
  if (name.type.endsWith('_pattern')) return required(script, name, inner, base) ?? (value ? destructured(script, name, node.broken ? unknownAt(base) : lowerExpression(script, value), base) : []);
  if (isFunction(inner) && !inner.broken) return [functionStatement(script, inner, { name: textOf(script, name), ...spanOf(script, name) }, base)];
  if (inner?.type === 'class') return [classStatement(script, inner, base, name) ?? []].flat();
  const imported = required(script, name, inner, base);
  if (imported) return imported;
  const type = fieldOf(node, 'type');
  const rest = { ...(type ? { annotation: textOf(script, type).replace(/^:\s*/, '') } : {}), ...base };
  const target = nameAt(script, name);
  if (!value) return [withDescription(script, { kind: 'declare', target, ...rest })];
  return [withDescription(script, { kind: 'assign', targets: [target], value: node.broken ? unknownAt(spanOf(script, value)) : lowerExpression(script, value), ...rest })];
}

/** An expression that stands as a statement. */
export function expressionStatement(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const first = node.parts[0];
  if (!first) return [];
  return steps(first).flatMap((each, at, all) => stepStatement(script, each, all.length === 1 ? base : { ...baseOf(script, each), ...(at === 0 && base.above ? { above: base.above } : {}) }));
}

/** `a = 1, b = 2` are two statements. */
function steps(node: Syntax): readonly Syntax[] {
  return node.type === 'sequence_expression' ? node.parts.flatMap(steps) : [node];
}

/** One step of a statement, or of the head of a loop. */
export function stepStatement(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  switch (node.type) {
    case 'assignment_expression':
      return assignment(script, node, base);
    case 'augmented_assignment_expression':
      return [augmented(script, node, base)];
    case 'update_expression': {
      const span = spanOf(script, node);
      const op = textOf(script, node).includes('--') ? '-' : '+';
      return [{ kind: 'assign', targets: [child(script, node, 'argument')], value: { kind: 'number', value: Rational.one, text: '1', start: span.end, end: span.end }, op, ...base }];
    }
    case 'yield_expression':
      return [{ kind: 'return', yields: true, ...(node.parts[0] ? { value: lowerExpression(script, node.parts[0]) } : {}), ...base }];
    default:
      return [{ kind: 'evaluate', value: lowerExpression(script, node), ...base }];
  }
}

function assignment(script: Script, node: Syntax, base: Base): readonly Stmt[] {
  const targets: Syntax[] = [];
  let at: Syntax | undefined = node;
  while (at?.type === 'assignment_expression') {
    const left = fieldOf(at, 'left');
    if (left) targets.push(left);
    at = fieldOf(at, 'right');
  }
  const [first] = targets;
  const value = bare(at);
  if (!first || !at) return [];
  const given = exported(script, targets, value, base);
  if (given) return given;
  if (isFunction(value) && !value.broken) return methodOf(script, targets, value, base);
  const lowered = node.broken ? unknownAt(spanOf(script, at)) : lowerExpression(script, at);
  const pattern = bare(first);
  if (pattern && (pattern.type.endsWith('_pattern') || pattern.type === 'object' || pattern.type === 'array')) return destructured(script, pattern, lowered, base);
  return [withDescription(script, { kind: 'assign', targets: targets.map((each) => lowerExpression(script, each)), value: lowered, ...base })];
}

/** `this.f = function (x) { … }`, `F.prototype.f = …`: a function of that name where `this` is what a function makes. */
function methodOf(script: Script, targets: readonly Syntax[], fn: Syntax, base: Base): readonly Stmt[] {
  const target = targets.length === 1 ? targets[0] : undefined;
  const name = target?.type === 'identifier' ? target : target?.type === 'member_expression' ? fieldOf(target, 'property') : undefined;
  const own = target?.type === 'member_expression' && fieldOf(target, 'object')?.type === 'this' && name && script.maker?.has(textOf(script, name));
  if (name && (own || target?.type === 'identifier')) return [functionStatement(script, fn, { name: textOf(script, name), ...spanOf(script, name) }, base)];
  const value = lowerExpression(script, fn);
  return [{ kind: 'assign', targets: targets.map((each) => lowerExpression(script, each)), value, ...base, above: describedBy(script, base.above ?? []).above }];
}

function augmented(script: Script, node: Syntax, base: Base): Stmt {
  const operator = (fieldOf(node, 'operator')?.type ?? '').slice(0, -1);
  const left = fieldOf(node, 'left');
  const target: Expr = child(script, node, 'left');
  const text = operator === '+' && (isText(script, left, script.texts) || isText(script, fieldOf(node, 'right'), script.texts));
  const value = node.broken ? unknownAt(spanOf(script, node)) : child(script, node, 'right');
  const op = operatorOf(operator);
  if (text || !op) return { kind: 'assign', targets: [target], value: unknownAt(value, [value]), ...base };
  return { kind: 'assign', targets: [target], value, op, ...base };
}
