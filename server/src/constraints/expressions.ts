/** What each kind of expression says of units. One entry per node kind; anything else is unknown. */
import { Rational } from '../quantities/rational.ts';
import { pathOf } from '../program/path.ts';
import type { CompareExpr, ComprehensionExpr, Expr, LambdaExpr, RecordExpr, SequenceExpr, SliceExpr } from '../program/nodes.ts';
import { indexed, memberOf, nameOf } from './access.ts';
import { agree, alternatives, literalValue, negative, power, product, quotient, sum } from './arithmetic.ts';
import { call } from './calls.ts';
import type { Context } from './context.ts';
import { isConstant, oneForm, unknownForm } from './form.ts';
import { exactLiteral, readLiteral } from './literal.ts';
import { bind, notedValue } from './targets.ts';
import { type NoteInForce, type Value, unknown } from './value.ts';

const deepest = 300;
const fitting: Value = { expr: undefined, form: undefined, fits: true, from: [] };
const truth: Value = { expr: undefined, form: oneForm, literal: exactLiteral(Rational.one), from: [] };

/** The value of an expression; adds what must hold inside it to the context. */
export function evaluate(context: Context, expr: Expr): Value {
  if (context.depth > deepest) return unknown(expr);
  context.depth++;
  const value = dispatch(context, expr);
  context.depth--;
  context.sightings?.set(expr, value);
  return value;
}

function dispatch(context: Context, expr: Expr): Value {
  switch (expr.kind) {
    case 'number':
      return expr.value ? literalValue(expr, readLiteral(expr.value, expr.text)) : unknown(expr);
    case 'name':
      return nameOf(context, expr);
    case 'member':
      return memberOf(context, expr);
    case 'index':
      return indexed(context, expr);
    case 'call':
      return call(context, expr);
    case 'unary':
      return unary(expr.op, expr, evaluate(context, expr.operand));
    case 'binary':
      return binary(context, expr);
    case 'compare':
      return comparison(context, expr);
    case 'logic': {
      const values = expr.operands.map((operand) => evaluate(context, operand));
      const last = values.at(-1);
      return values.some((value) => value !== truth && value.form) && last ? choiceOfLogic(expr, values) : truth;
    }
    case 'choose': {
      evaluate(context, expr.condition);
      const values = [evaluate(context, expr.then), evaluate(context, expr.otherwise)];
      return alternatives(context, expr, values, () => ({ kind: 'choice', of: 'if' }));
    }
    case 'sequence':
      return sequence(context, expr);
    case 'record':
      return record(context, expr);
    case 'lambda':
      return lambda(context, expr);
    case 'comprehension':
      return comprehension(context, expr);
    case 'bind': {
      const value = evaluate(context, expr.value);
      const path = pathOf(expr.target);
      if (path) bind(context, path, expr.target, value);
      return value;
    }
    case 'nothing':
      return fitting;
    case 'truth':
      return truth;
    case 'opaque':
      for (const part of expr.parts) evaluate(context, part);
      return unknown(expr);
    case 'slice':
      return range(context, expr, false);
    case 'text':
      return unknown(expr);
  }
}

function unary(op: string, expr: Expr, operand: Value): Value {
  if (op === '-') return negative(expr, operand);
  if (op === '+' || op === 'transpose') return { ...operand, expr };
  return op === 'not' ? truth : unknown(expr);
}

function binary(context: Context, expr: Extract<Expr, { kind: 'binary' }>): Value {
  const left = settled(context, evaluate(context, expr.left));
  const right = settled(context, evaluate(context, expr.right));
  if (expr.left.kind === 'text' || expr.right.kind === 'text' || isList(left, expr.left) || isList(right, expr.right)) return listArithmetic(expr, left, right);
  switch (expr.op) {
    case '+':
    case '-':
      return sum(context, expr, left, right, expr.op, expr);
    case '*':
    case '@':
      return product(expr, left, right);
    case '/':
    case '//':
      return quotient(expr, left, right);
    case '\\':
      return quotient(expr, right, left);
    case '%':
      if (left.form && right.form && !left.literal && !right.literal) agree(context, expr, left, right, { kind: 'sum', op: '%' }, expr);
      return left.literal && right.literal ? truth : { ...left, expr, from: [left] };
    case '**':
      return power(context, expr, left, right, expr);
    default:
      return unknown(expr);
  }
}

/** A symbol that an if left in two dimensions cannot be right in arithmetic. */
function settled(context: Context, value: Value): Value {
  if (!value.split || !value.expr) return value;
  const [first, other] = value.split;
  agree(context, value.expr, { ...first, measure: undefined }, { ...other, measure: undefined }, { kind: 'choice', of: 'branches' }, value.expr);
  return { expr: value.expr, form: undefined, from: [first, other], spoilt: true };
}

function isList(value: Value, expr: Expr): boolean {
  return value.items !== undefined || (expr.kind === 'sequence' && expr.form !== 'matrix');
}

/** `[0]*n`, `(a,) + (b,)`, `"%g" % x`: no arithmetic of quantities. */
function listArithmetic(expr: Extract<Expr, { kind: 'binary' }>, left: Value, right: Value): Value {
  const list = isList(left, expr.left) ? left : right;
  if (expr.op === '*' && !list.items) return { ...list, expr };
  return unknown(expr);
}

function choiceOfLogic(expr: Expr, values: readonly Value[]): Value {
  const known = values.filter((value) => value.form && !value.fits && !value.literal);
  const first = known[0];
  const alike = first && known.every((value) => value.form === first.form);
  return alike ? { ...first, expr } : unknown(expr);
}

function comparison(context: Context, expr: CompareExpr): Value {
  const values = expr.operands.map((operand) => evaluate(context, operand));
  expr.ops.forEach((op, at) => {
    const [left, right] = [values[at], values[at + 1]];
    if (!left?.form || !right?.form || op === 'in' || op === 'not in' || op === 'is' || op === 'is not') return;
    if (isBareNumber(left) || isBareNumber(right)) return;
    agree(context, expr, left, right, { kind: 'comparison', op }, expr);
  });
  return truth;
}

/** `0:dt:t_end`. `counts`: a loop runs over it; elsewhere `0:n-1` is a list of bare numbers, counted in whatever unit it is used for. */
export function range(context: Context, expr: SliceExpr, counts: boolean): Value {
  const shared = common(expr.parts.map((part) => evaluate(context, part)));
  if (!shared?.form) return unknown(expr);
  const bare = !counts && isConstant(shared.form) && shared.form.dimension.isOne && expr.parts.some((part) => part.kind === 'number');
  return bare ? { expr, form: unknownForm(context.fresh('', expr, 'constant')), from: [] } : { ...shared, expr };
}

/** A literal, or a constant that was given one without a note: a tolerance fits whatever it is compared with. */
function isBareNumber(value: Value): boolean {
  return value.literal !== undefined || value.fits === true || value.version?.origin === 'constant';
}

function sequence(context: Context, expr: SequenceExpr): Value {
  const members = expr.form === 'matrix' ? expr.items.flatMap((row) => (row.kind === 'sequence' && row.form === 'list' ? row.items : [row])) : expr.items;
  const items = members.map((item) => evaluate(context, item));
  if (expr.form === 'tuple') return { expr, form: undefined, items, from: items };
  const merged = common(items);
  if (!merged) return items.length === 0 || items.every((item) => item.fits) ? fitting : listOfNumbers(context, expr, items);
  return { ...merged, expr };
}

/** A list of literals is like one literal: counted in whatever unit its use or its note says. */
function listOfNumbers(context: Context, expr: SequenceExpr, items: readonly Value[]): Value {
  if (!items.every((item) => item.literal || item.fits)) return unknown(expr);
  return { expr, form: unknownForm(context.fresh('', expr, 'constant')), from: [] };
}

/** The one unit that all members share; undefined where they differ or nothing is known. */
export function common(items: readonly Value[]): Value | undefined {
  const known = items.filter((item) => !item.fits && !item.literal);
  const first = known[0];
  if (!first?.form) return undefined;
  return known.every((item) => item.form === first.form && item.measure === first.measure) ? first : undefined;
}

function record(context: Context, expr: RecordExpr): Value {
  for (const other of expr.others) evaluate(context, other);
  const fields = new Map<string, Value>();
  for (const entry of expr.entries) {
    const value = evaluate(context, entry.value);
    const note = context.surroundings.notes.entry(entry);
    fields.set(entry.key, note ? checkedNote(context, entry.key, entry.value, value, note) : value);
  }
  return { expr, form: undefined, fields, from: [] };
}

function checkedNote(context: Context, path: string, expr: Expr, value: Value, note: NoteInForce): Value {
  const noted = notedValue(path, note, context.anchor, expr);
  if (value.form && !value.literal && !value.fits) agree(context, expr, value, noted, { kind: 'target', path, note }, expr);
  return noted;
}

function lambda(context: Context, expr: LambdaExpr): Value {
  const outside = context.bindings;
  context.bindings = outside.branch();
  const params = expr.params.map((param) => {
    const open = context.fresh(param.name, param.nameSpan, 'parameter');
    context.bindings.set(param.name, {
      expr: undefined, form: unknownForm(open), from: [],
      version: { path: param.name, anchor: context.anchor, span: param.nameSpan, origin: 'parameter' },
    });
    return { name: param.name, unknown: open };
  });
  const result = evaluate(context, expr.body);
  context.bindings = outside;
  return { expr, form: undefined, from: [], callable: { kind: 'local', local: { definition: expr, params, result } } };
}

function comprehension(context: Context, expr: ComprehensionExpr): Value {
  const outside = context.bindings;
  context.bindings = outside.branch();
  for (const clause of expr.clauses) {
    const iterable = evaluate(context, clause.iterable);
    bindElement(context, clause.target, iterable);
  }
  for (const condition of expr.conditions) evaluate(context, condition);
  if (expr.key) evaluate(context, expr.key);
  const element = evaluate(context, expr.element);
  context.bindings = outside;
  return expr.key ? unknown(expr) : { ...element, expr };
}

/** Binds a loop's target to a member of what it runs over. */
export function bindElement(context: Context, target: Expr, iterable: Value): void {
  const element: Value = iterable.element ?? (iterable.items ? (common(iterable.items) ?? unknown(target)) : iterable);
  if (target.kind === 'sequence') {
    for (const [at, item] of target.items.entries()) bindElement(context, item, element.items?.[at] ?? unknown(item));
    return;
  }
  const path = pathOf(target);
  if (path) bind(context, path, target, element.literal ? unknown(target) : element);
}
