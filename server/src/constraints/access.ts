/** Reading symbols: names, attributes, subscripts. */
import { pathOf } from '../program/path.ts';
import type { Expr, IndexExpr, MemberExpr, NameExpr } from '../program/nodes.ts';
import { call } from './calls.ts';
import type { Context } from './context.ts';
import { evaluate } from './expressions.ts';
import { isConstant } from './form.ts';
import { notedValue } from './targets.ts';
import { type Value, unknown } from './value.ts';

/** Attributes that keep the unit of their array. */
const sameUnitAttributes = new Set(['T', 'values', 'real', 'flat', 'iloc', 'loc', 'iat', 'at', 'magnitude', 'A']);

export function nameOf(context: Context, expr: NameExpr): Value {
  const bound = context.bindings.get(expr.name);
  if (bound) return withExpr(bound, expr);
  const symbol = context.surroundings.notes.symbol(expr.name, context.owner);
  const outside = context.surroundings.global(expr.name);
  // `gamma` and `beta` of a nomenclature are those symbols, and not the built-in functions of that name.
  const isBuiltIn = outside?.callable?.kind === 'library';
  if (outside && (!symbol || outside.version?.note || (outside.callable && !isBuiltIn) || outside.module)) return withExpr(outside, expr);
  if (!symbol) return unknown(expr);
  const noted = notedValue(expr.name, symbol, context.anchor, undefined);
  context.bindings.set(expr.name, noted);
  return withExpr(noted, expr);
}

export function memberOf(context: Context, expr: MemberExpr): Value {
  const path = pathOf(expr);
  const bound = path === undefined ? undefined : context.bindings.get(path);
  if (bound) return withExpr(bound, expr);
  const object = evaluate(context, expr.object);
  if (object.module) return memberOfModule(context, object, expr);
  const field = object.fields?.get(expr.name) ?? (object.callable?.kind === 'class' ? object.callable.info.fields().get(expr.name) : undefined);
  if (field) return withExpr(field, expr);
  if (path !== undefined) {
    const symbol = context.surroundings.notes.symbol(path, context.owner);
    if (symbol) return withExpr(notedValue(path, symbol, context.anchor, undefined), expr);
  }
  if (sameUnitAttributes.has(expr.name) && object.form) return withExpr(object, expr);
  return unknown(expr);
}

export function indexed(context: Context, expr: IndexExpr): Value {
  if (holdsFunction(context, expr.object)) return call(context, { kind: 'call', callee: expr.object, args: expr.keys.map((value) => ({ value, start: value.start, end: value.end })), results: 1, start: expr.start, end: expr.end });
  const path = pathOf(expr);
  const key = expr.keys.length === 1 ? expr.keys[0] : undefined;
  for (const each of expr.keys) if (each.kind !== 'text') evaluate(context, each);
  if (key?.kind === 'text' && path !== undefined) {
    const bound = context.bindings.get(path);
    if (bound) return withExpr(bound, expr);
    const object = evaluate(context, expr.object);
    const field = object.fields?.get(key.value);
    if (field) return withExpr(field, expr);
    const symbol = context.surroundings.notes.symbol(path, context.owner) ?? context.surroundings.notes.symbol(key.value, context.owner);
    if (symbol) return withExpr(notedValue(path, symbol, context.anchor, undefined), expr);
    return unknown(expr);
  }
  const object = evaluate(context, expr.object);
  if (object.items) return itemOf(object.items, expr, key);
  if (object.fields || object.callable || object.element) return unknown(expr);
  return isFixed(expr) && object.form && !isConstant(object.form) ? unknown(expr) : withExpr({ ...object, from: [object] }, expr);
}

/** `f(2)` of a variable that holds a function, where an element is written like a call. */
function holdsFunction(context: Context, object: Expr): boolean {
  const kind = object.kind === 'name' || object.kind === 'member' ? evaluate(context, object).callable?.kind : undefined;
  return kind === 'local' || kind === 'function';
}

/** `y[0]` of an array without a note: a state vector's places have units of their own. */
function isFixed(expr: IndexExpr): boolean {
  return expr.keys.some((key) => key.kind === 'number' || key.kind === 'slice' || key.kind === 'unary');
}

function itemOf(items: readonly Value[], expr: IndexExpr, key: Expr | undefined): Value {
  const negative = key?.kind === 'unary' && key.op === '-' && key.operand.kind === 'number' ? key.operand.value : undefined;
  const at = key?.kind === 'number' && key.value ? key.value.toNumber() : negative ? items.length - negative.toNumber() : undefined;
  if (at !== undefined) return items[at] ? withExpr(items[at], expr) : unknown(expr);
  const first = items[0];
  return first?.form && items.every((item) => item.form === first.form && item.measure === first.measure) ? withExpr(first, expr) : unknown(expr);
}

function memberOfModule(context: Context, object: Value, expr: MemberExpr): Value {
  const module = object.module;
  if (!module) return unknown(expr);
  const found = module.member ? module.member(expr.name) : context.surroundings.library(`${module.name}.${expr.name}`);
  return found ? withExpr(found, expr) : unknown(expr);
}

/** The same value, read at this expression. A literal constant of a library stays a literal. */
function withExpr(value: Value, expr: Expr): Value {
  return { ...value, expr };
}
