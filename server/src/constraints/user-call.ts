/** Calls of functions and classes of the workspace, and of functions defined inside the caller. */
import type { CallExpr } from '../program/nodes.ts';
import { constructorNames } from '../program/objects.ts';
import { agree } from './arithmetic.ts';
import type { Passed } from './calls.ts';
import type { Context, LocalFunction } from './context.ts';
import { type Form, isConstant, substitute, unknownForm } from './form.ts';
import type { Measure } from './measure.ts';
import { multiplyMeasures, raiseMeasure } from './measure-algebra.ts';
import type { ClassInfo, Scheme, SchemeParam, SchemeResult } from './scheme.ts';
import { notedValue, reportMisuse } from './targets.ts';
import { type Value, unknown } from './value.ts';

/** What the unknowns of a function stand for in one call. */
type Instance = Map<number, Value>;

export function callScheme(context: Context, expr: CallExpr, scheme: Scheme, passed: readonly Passed[], bound: boolean): Value {
  const instance: Instance = new Map();
  const pairs = pairUp(scheme.params, passed, bound);
  for (const { param, given } of pairs) open(param, given, instance);
  for (const { param, given } of pairs) check(context, scheme, param, given, instance);
  if (!scheme.result) return unknown(expr);
  const result = resultValue(context, expr, scheme.result, instance, pairs.map((pair) => pair.given.value));
  return pairs.some(isUnitValue) && result.form ? { ...result, tainted: true } : result;
}

/** A bare 1 for a quantity: the result is meant per unit of it, and the 1 carries that unit. */
function isUnitValue({ param, given }: { readonly param: SchemeParam; readonly given: Passed }): boolean {
  return given.value.literal?.value.isOne === true && given.value.literal.pi === 0 && param.note !== undefined && !param.note.unit.dimension.isOne;
}

/** An object: its fields are those of the class; arguments are checked against the constructor. */
export function newObject(context: Context, expr: CallExpr, info: ClassInfo, passed: readonly Passed[]): Value {
  const constructor = constructorNames.map((name) => info.method(name)).find((each) => each !== undefined);
  const named = info.statement.body.some((each) => each.kind === 'function' && each.name === info.name && each.unbound) ? info.method(info.name) : undefined;
  if (constructor) callScheme(context, expr, constructor, passed, true);
  else if (named) callScheme(context, expr, named, passed, false);
  else fieldsInOrder(context, info, passed);
  return { expr, form: undefined, fields: info.fields(), from: passed.map((each) => each.value) };
}

/** A nested function's result, its own parameters replaced by the arguments; what its body requires of them is left open. */
export function callLocal(context: Context, expr: CallExpr, local: LocalFunction, passed: readonly Passed[]): Value {
  const instance: Instance = new Map();
  local.params.forEach((param, at) => {
    const given = passed.find((each) => each.argument.name === param.name) ?? (passed[at]?.argument.name === undefined ? passed[at] : undefined);
    if (param.unknown && given && !given.value.literal && !given.value.fits) instance.set(param.unknown.id, given.value);
    const intent = local.definition.kind === 'function' ? local.definition.params[at]?.intent : undefined;
    if (param.note && intent !== 'out' && given?.value.form && !given.value.literal && !given.value.fits) {
      const noted = notedValue(param.name, param.note, context.anchor, undefined);
      const name = local.definition.kind === 'function' ? local.definition.name : 'lambda';
      agree(context, expr, given.value, noted, { kind: 'parameter', function: name, name: param.name, note: param.note }, given.argument.value);
    }
  });
  const result = local.result;
  if (result.items || result.literal) return { ...result, expr };
  return resultValue(context, expr, { form: result.form, measure: result.measure, ...(result.tainted ? { tainted: true } : {}) }, instance, [...passed.map((each) => each.value)]);
}

function pairUp(params: readonly SchemeParam[], passed: readonly Passed[], bound: boolean): { param: SchemeParam; given: Passed }[] {
  const plain = params.slice(bound ? 1 : 0);
  const pairs: { param: SchemeParam; given: Passed }[] = [];
  for (const [at, given] of passed.entries()) {
    if (given.argument.spread) break;
    const name = given.argument.name;
    const param = name === undefined ? plain[at] : plain.find((each) => each.name === name);
    if (param && (name !== undefined || param.mode === 'plain')) pairs.push({ param, given });
    else if (name === undefined) break;
  }
  return pairs;
}

function open(param: SchemeParam, given: Passed, instance: Instance): void {
  if (param.intent === 'out') return;
  const term = param.form?.terms[0];
  const alone = term && param.form?.terms.length === 1 && param.form.dimension.isOne && term.power.isOne;
  if (alone && !instance.has(term.unknown.id) && !given.value.literal && !given.value.fits) instance.set(term.unknown.id, given.value);
}

function check(context: Context, scheme: Scheme, param: SchemeParam, given: Passed, instance: Instance): void {
  const value = given.value;
  // What an argument held that comes back with a new value says nothing, unless its unit is noted.
  if (param.intent === 'out' || (param.intent === 'inout' && !value.version?.note)) return;
  if (value.misuse) reportMisuse(context, value);
  if (value.split && param.note) return settle(context, value.split, given);
  if (!value.form || value.literal || value.fits) return;
  const passed = { ...value, expr: given.argument.value };
  if (param.note) {
    const noted = notedValue(param.name, param.note, context.anchor, undefined);
    return agree(context, given.argument.value, passed, noted, { kind: 'parameter', function: scheme.name, name: param.name, note: param.note }, given.argument.value);
  }
  if (!param.form || !param.unknown || value.form === param.form) return;
  if (!isConstant(param.form)) return checkAlike(context, scheme, param, given, instance);
  if (param.form.dimension.isOne) return;
  const required: Value = { expr: undefined, form: param.form, from: [] };
  agree(context, given.argument.value, passed, required, { kind: 'inferred-parameter', function: scheme.name, name: param.name }, given.argument.value);
}

/** A symbol that an if left in two dimensions cannot be right as an argument with a unit. */
function settle(context: Context, [first, other]: readonly [Value, Value], given: Passed): void {
  agree(context, given.argument.value, { ...first, measure: undefined }, { ...other, measure: undefined }, { kind: 'choice', of: 'branches' }, given.argument.value);
}

/** A parameter that the body ties to another: `a + b` inside asks for like arguments. Scales are left alone, the body may convert. */
function checkAlike(context: Context, scheme: Scheme, param: SchemeParam, given: Passed, instance: Instance): void {
  const form = param.form as Form;
  const [term] = form.terms;
  const other = term && instance.get(term.unknown.id);
  if (!term || !other?.form || other === given.value || form.terms.some((each) => !instance.get(each.unknown.id)?.form)) return;
  const first = scheme.params.findIndex((each) => each.unknown === term.unknown);
  const at = scheme.params.indexOf(param);
  const alike = form.terms.length === 1 && term.power.isOne && form.dimension.isOne && first >= 0;
  const passed: Value = { ...given.value, expr: given.argument.value, measure: undefined };
  const reason = { kind: 'alike', function: scheme.name, positions: [first, at] } as const;
  if (alike) agree(context, given.argument.value, { ...other, measure: undefined }, passed, reason, given.argument.value);
}

function resultValue(context: Context, expr: CallExpr, result: SchemeResult, instance: Instance, from: readonly Value[]): Value {
  if (result.items) return { expr, form: undefined, items: result.items.map((item) => resultValue(context, expr, item, instance, from)), from };
  if (result.fields) return { expr, form: undefined, fields: result.fields, from };
  if (result.note) return { ...notedValue(expr.callee.kind === 'name' ? expr.callee.name : 'result', result.note, context.anchor, undefined), expr };
  if (!result.form) return unknown(expr, from);
  return { expr, form: instantiate(context, result.form, instance), measure: instantiatedMeasure(result.form, result.measure, instance), from, ...(result.tainted ? { tainted: true } : {}) };
}

function instantiate(context: Context, form: Form, instance: Instance): Form | undefined {
  if (isConstant(form)) return form;
  if (form.terms.some((term) => instance.has(term.unknown.id) && !instance.get(term.unknown.id)?.form)) return undefined;
  return substitute(form, (unknown) => {
    const value = instance.get(unknown.id) ?? { expr: undefined, form: unknownForm(context.fresh(unknown.name, undefined, 'open')), from: [] };
    instance.set(unknown.id, value);
    return value.form;
  });
}

function instantiatedMeasure(form: Form, measure: Measure | undefined, instance: Instance): Measure | undefined {
  let result = measure;
  for (const term of form.terms) result = multiplyMeasures(result, raiseMeasure(instance.get(term.unknown.id)?.measure, term.power));
  return result;
}

function fieldsInOrder(context: Context, info: ClassInfo, passed: readonly Passed[]): void {
  const fields = [...info.fields()];
  for (const [at, given] of passed.entries()) {
    const named = given.argument.name;
    const entry = named === undefined ? fields[at] : fields.find(([name]) => name === named);
    const [name, field] = entry ?? [];
    const note = field?.version?.note;
    if (!name || !field || !note || !given.value.form || given.value.literal || given.value.fits) continue;
    agree(context, given.argument.value, { ...given.value, expr: given.argument.value }, field, { kind: 'parameter', function: info.name, name, note }, given.argument.value);
  }
}
