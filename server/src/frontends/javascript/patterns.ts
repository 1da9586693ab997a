/** `{ tdb, tr: t = 20 } = x` and `[a, b] = f()` as assignments. */
import type { Expr, Stmt } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { spanOf, textOf } from '../tree-sitter/lowering.ts';
import { fieldOf, type Syntax } from '../tree-sitter/syntax.ts';
import { stringText } from './literals.ts';
import { lowerExpression } from './lower-expression.ts';
import { nameAt, type Script, unknownAt } from './script.ts';

type Base = Pick<Stmt, 'start' | 'end' | 'trailing' | 'above'>;

/** The assignments that a pattern makes of a value, which is walked once. */
export function destructured(script: Script, pattern: Syntax, value: Expr, base: Base): readonly Stmt[] {
  if (pattern.type === 'array_pattern') {
    const items = itemsOf(script, pattern);
    if (items) {
      const asTuple: Expr = value.kind === 'sequence' ? { ...value, form: 'tuple' } : value;
      return [{ kind: 'assign', targets: [{ kind: 'sequence', form: 'tuple', items, ...spanOf(script, pattern) }], value: asTuple, ...base }];
    }
  }
  if (value.kind === 'name') return takeApart(script, pattern, value, base);
  const whole: Expr = { kind: 'name', name: textOf(script, pattern), ...spanOf(script, pattern) };
  const { trailing: _trailing, above: _above, ...place } = base;
  return [{ kind: 'assign', targets: [whole], value, ...place }, ...takeApart(script, pattern, whole, base)];
}

/** The assignments that take a named value apart. */
export function takeApart(script: Script, pattern: Syntax, from: Expr, base: Base): readonly Stmt[] {
  const found: Stmt[] = [];
  if (pattern.type === 'array_pattern') {
    const items = itemsOf(script, pattern);
    if (items) found.push({ kind: 'assign', targets: [{ kind: 'sequence', form: 'tuple', items, ...spanOf(script, pattern) }], value: from, ...base });
    else for (const name of namesIn(pattern)) found.push({ kind: 'assign', targets: [nameAt(script, name)], value: unknownAt(spanOf(script, name)), start: base.start, end: base.end });
    return found;
  }
  const alone = pattern.parts.length === 1;
  for (const part of pattern.parts) found.push(...partOf(script, part, from, alone ? base : baseOf(script, part, base)));
  return found;
}

/** What stands behind a name of a pattern over several lines is its own. */
function baseOf(script: Script, part: Syntax, base: Base): Base {
  const span = spanOf(script, part);
  const lines = script.text.slice(base.start + script.base, base.end + script.base).includes('\n');
  const trailing = lines ? script.comments.beside(span) : undefined;
  return { ...span, ...(trailing ? { trailing } : {}) };
}

function partOf(script: Script, part: Syntax, from: Expr, base: Base): readonly Stmt[] {
  const fallback = part.type === 'object_assignment_pattern' ? fieldOf(part, 'right') : undefined;
  const plain = part.type === 'object_assignment_pattern' ? fieldOf(part, 'left') : part;
  if (plain && (plain.type === 'shorthand_property_identifier_pattern' || plain.type === 'shorthand_property_identifier' || plain.type === 'identifier')) {
    const target = nameAt(script, plain);
    const read = memberOf(from, textOf(script, plain), target);
    return [{ kind: 'assign', targets: [target], value: fallback ? orElse(script, read, fallback) : read, ...base }];
  }
  if (part.type === 'pair_pattern' || part.type === 'pair') return pairOf(script, part, from, base);
  return namesIn(part).map((name): Stmt => ({ kind: 'assign', targets: [nameAt(script, name)], value: unknownAt(spanOf(script, name)), start: base.start, end: base.end }));
}

function pairOf(script: Script, part: Syntax, from: Expr, base: Base): readonly Stmt[] {
  const key = fieldOf(part, 'key');
  const value = fieldOf(part, 'value');
  if (!key || !value) return [];
  const target = value.type === 'assignment_pattern' || value.type === 'assignment_expression' ? fieldOf(value, 'left') : value;
  const fallback = target === value ? undefined : fieldOf(value, 'right');
  if (!target) return [];
  const span = spanOf(script, key);
  const read = key.type === 'computed_property_name' ? unknownAt(span) : memberOf(from, key.type === 'string' ? stringText(script, key) : textOf(script, key), span);
  const taken = fallback ? orElse(script, read, fallback) : read;
  if (target.type.endsWith('_pattern') || target.type === 'object' || target.type === 'array') return destructured(script, target, taken, base);
  return [{ kind: 'assign', targets: [lowerExpression(script, target)], value: taken, ...base }];
}

function orElse(script: Script, read: Expr, fallback: Syntax): Expr {
  return { kind: 'choose', condition: unknownAt({ start: read.start, end: read.start }), then: read, otherwise: lowerExpression(script, fallback), start: read.start, end: fallback.end - script.base };
}

function memberOf(object: Expr, name: string, span: Span): Expr {
  return { kind: 'member', object: { ...object, start: span.start, end: span.start }, name, nameSpan: { start: span.start, end: span.end }, start: span.start, end: span.end };
}

/** The targets of an array pattern, place by place; undefined where places are left out, have defaults or take the rest. */
function itemsOf(script: Script, pattern: Syntax): readonly Expr[] | undefined {
  if (/^\[\s*,|,\s*,/.test(textOf(script, pattern))) return undefined;
  const plain = pattern.parts.every((part) => ['identifier', 'member_expression', 'subscript_expression'].includes(part.type));
  return plain ? pattern.parts.map((part) => lowerExpression(script, part)) : undefined;
}

function namesIn(node: Syntax): readonly Syntax[] {
  if (node.type === 'identifier' || node.type === 'shorthand_property_identifier_pattern') return [node];
  return node.parts.filter((each) => each.field !== 'key' && each.field !== 'right').flatMap(namesIn);
}
