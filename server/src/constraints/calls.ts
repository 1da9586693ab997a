/** Calls: which function is meant, and what its signature or its body says of arguments and result. */
import type { Argument, CallExpr, Expr } from '../program/nodes.ts';
import { power, product, quotient, sum } from './arithmetic.ts';
import { giveBack } from './by-reference.ts';
import type { Context } from './context.ts';
import { evaluate } from './expressions.ts';
import { oneForm } from './form.ts';
import { callLibrary } from './library-call.ts';
import { exactLiteral } from './literal.ts';
import { Rational } from '../quantities/rational.ts';
import { callLocal, callScheme, newObject } from './user-call.ts';
import { type Callable, type Value, unknown, unknownValue } from './value.ts';

/** One argument with what is known of it. */
export interface Passed {
  readonly argument: Argument;
  readonly value: Value;
}

const powers = new Set(['pow', 'power', 'mpower', 'math.pow', 'numpy.power', 'numpy.float_power', 'scipy.special.pow', 'Math.pow', 'mathjs.pow']);
/** Arrays of zeros or of nothing fit any unit. */
const fitting = new Set(['numpy.zeros', 'numpy.zeros_like', 'numpy.empty', 'numpy.empty_like', 'list', 'numpy.isnan', 'math.isnan', 'zeros', 'cell', 'Array', 'Float64Array', 'Float32Array', 'Int32Array', 'Uint32Array', 'Int16Array', 'Uint16Array', 'Int8Array', 'Uint8Array']);
/** Questions about missing values. */
const presence = new Set(['isnan', 'isfinite', 'isinf', 'numpy.isnan', 'numpy.isfinite', 'numpy.isinf', 'math.isnan', 'isNaN', 'isFinite', 'Number.isNaN', 'Number.isFinite']);
/** Functions that stand for an operator. */
const operations: ReadonlyMap<string, (context: Context, expr: CallExpr, left: Value, right: Value) => Value> = new Map([
  ['mathjs.add', (context, expr, left, right) => sum(context, expr, left, right, '+', expr)],
  ['mathjs.subtract', (context, expr, left, right) => sum(context, expr, left, right, '-', expr)],
  ...['mathjs.multiply', 'mathjs.dotMultiply'].map((name) => [name, (_context: Context, expr: CallExpr, left: Value, right: Value): Value => product(expr, left, right)] as const),
  ...['mathjs.divide', 'mathjs.dotDivide'].map((name) => [name, (_context: Context, expr: CallExpr, left: Value, right: Value): Value => quotient(expr, left, right)] as const),
]);
const ones = new Set(['numpy.ones', 'numpy.ones_like', 'numpy.eye', 'numpy.identity', 'ones', 'eye']);

export function call(context: Context, expr: CallExpr): Value {
  const value = called(context, expr);
  return expr.results === undefined ? value : taken(expr, value, expr.results);
}

/** As many results as the caller takes: one is the first, and of several that are not told apart only the first is known. */
function taken(expr: CallExpr, value: Value, results: number): Value {
  if (results < 2) return value.items ? { ...(value.items[0] ?? unknown(expr)), expr } : value;
  return value.items ? value : { expr, form: undefined, from: value.from, items: [value, ...Array.from({ length: results - 1 }, () => unknown(expr))] };
}

function called(context: Context, expr: CallExpr): Value {
  const callee = calleeOf(context, expr.callee);
  const target = callee.value.callable;
  const asked = context.constraints.length;
  const passed = expr.args.map((argument) => ({ argument, value: evaluate(context, argument.value) }));
  // `isnan(a + b)` asks whether one of them is missing: what is added there need not be alike.
  if (target?.kind === 'library' && presence.has(target.name)) context.constraints.length = asked;
  if (!expr.byReference) return applied(context, expr, callee, target, passed);
  const result = applied(context, expr, callee, target, passed);
  giveBack(context, expr, target, passed, result);
  return unknown(expr);
}

function applied(context: Context, expr: CallExpr, callee: Callee, target: Callable | undefined, passed: readonly Passed[]): Value {
  if (!target && callee.method) return callMethod(context, expr, callee.object as Value, callee.method, passed);
  // Where an element is written like a call, a symbol with a unit of its own is no function; nor is `NaN(2, 3)` more than an array of NaN.
  if (!target) return expr.results !== undefined && (callee.value.form || callee.value.fits) && !callee.value.literal ? { ...callee.value, expr, from: [callee.value] } : unknown(expr);
  switch (target.kind) {
    case 'library':
      return special(context, expr, target.name, passed) ?? callLibrary(context, expr, target.signature, passed);
    case 'function': {
      const scheme = target.scheme();
      return scheme ? callScheme(context, expr, scheme, passed, callee.bound) : unknown(expr);
    }
    case 'class':
      return newObject(context, expr, target.info, passed);
    case 'local':
      return callLocal(context, expr, target.local, passed);
  }
}

interface Callee {
  readonly value: Value;
  /** The object and the name of a method that its class does not define. */
  readonly object?: Value;
  readonly method?: string;
  /** The first parameter is the object. */
  readonly bound: boolean;
}

function calleeOf(context: Context, callee: Expr): Callee {
  if (callee.kind !== 'member') {
    const value = evaluate(context, callee);
    const named = callee.kind === 'name' && !value.callable ? context.surroundings.global(callee.name) : undefined;
    return { value: named?.callable?.kind === 'library' ? { ...named, expr: callee } : value, bound: false };
  }
  const object = evaluate(context, callee.object);
  if (object.module || object.fields?.has(callee.name)) {
    return { value: evaluate(context, callee), bound: object.fields !== undefined };
  }
  return { value: unknown(callee), object, method: callee.name, bound: true };
}

function callMethod(context: Context, expr: CallExpr, object: Value, name: string, passed: readonly Passed[]): Value {
  const signature = context.surroundings.method(`.${name}`);
  if (!signature || (!object.form && !object.fits)) return unknown(expr);
  const self: Passed = { argument: { start: expr.callee.start, end: expr.callee.end, value: expr.callee }, value: object };
  return callLibrary(context, expr, signature, [self, ...passed]);
}

function elementOf(value: Value): Value {
  return value.element ?? (value.items ? unknownValue : value);
}

/** Functions whose meaning is no matter of units alone. */
function special(context: Context, expr: CallExpr, name: string, passed: readonly Passed[]): Value | undefined {
  const [first, second] = passed;
  if (powers.has(name) && first && second) return power(context, expr, first.value, second.value, expr);
  const operation = operations.get(name);
  if (operation && first && second && passed.length === 2) return operation(context, expr, first.value, second.value);
  if (fitting.has(name)) return { expr, form: undefined, fits: true, from: [] };
  if (name === 'zip') return { expr, form: undefined, from: [], element: { expr, form: undefined, from: [], items: passed.map(({ value }) => elementOf(value)) } };
  if (name === 'enumerate' && first) return { expr, form: undefined, from: [], element: { expr, form: undefined, from: [], items: [unknown(expr), elementOf(first.value)] } };
  if (ones.has(name)) return { expr, form: oneForm, literal: exactLiteral(Rational.one), fits: true, from: [] };
  return undefined;
}
