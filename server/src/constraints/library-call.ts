/** Calls of functions that a signature describes. */
import type { CallExpr } from '../program/nodes.ts';
import type { Signature, SignatureParam, UnitClaim } from '../program/signature.ts';
import { Rational } from '../quantities/rational.ts';
import { agree, withoutOwnScale } from './arithmetic.ts';
import type { Passed } from './calls.ts';
import type { Context } from './context.ts';
import { constantForm, type Form, isConstant, multiplyForms, oneForm, raiseForm, substitute, unknownForm } from './form.ts';
import { exactLiteral, literalNumber, raiseLiteral } from './literal.ts';
import { type Measure, measureOf } from './measure.ts';
import { multiplyMeasures, raiseMeasure } from './measure-algebra.ts';
import { reportMisuse } from './targets.ts';
import { type Value, unknown } from './value.ts';

type UnitOnly = Extract<UnitClaim, { kind: 'unit' }>;

/** What the unit variables of one call stand for. */
interface Binding {
  readonly values: Map<string, { readonly value: Value; readonly position: number }>;
  /** Literals given for a variable that nothing else decides. */
  readonly literals: Map<string, Value[]>;
}

const logarithms = /(?:^|\.)(?:log|log10|log2|log1p|ln)$/;

export function callLibrary(context: Context, expr: CallExpr, signature: Signature, passed: readonly Passed[]): Value {
  const binding: Binding = { values: new Map(), literals: new Map() };
  const pairs = pairUp(signature, passed);
  for (const [at, { param, given }] of pairs.entries()) {
    // Where the argument comes out as a pure number, no literal in it hides a unit.
    if (given.value.misuse) reportMisuse(context, given.value, isPureClaim(param.claim) && isPlainNumber(given.value));
    if (param.claim.kind === 'unit') argument(context, signature, at, param, param.claim, given, binding);
  }
  for (const { param, given } of pairs) if (param.claim.kind === 'function') functionArgument(param.claim, given.value, binding);
  const log = logarithms.test(signature.name);
  const doubtful = pairs.some(({ param, given }) => isPureClaim(param.claim) && (mayHide(given.value) || (log && !isPlainNumber(given.value))));
  const results = signature.results.map((claim) => resultOf(context, expr, claim, binding)).map((value) => (doubtful && value.form ? { ...value, tainted: true } : value));
  const values = pairs.map((pair) => pair.given.value);
  if (results.length === 0) return unknown(expr, values);
  return results.length === 1 ? { ...(results[0] as Value), expr, from: values } : { expr, form: undefined, items: results, from: values };
}

/** A function of a pure number: exp, log, sin. */
function isPureClaim(claim: UnitClaim): boolean {
  return claim.kind === 'unit' && claim.powers.length === 0 && claim.unit.dimension.isOne;
}

/** The logarithm of anything else may be one of a number counted in some unit, which an exponential brings back. */
function isPlainNumber(value: Value): boolean {
  return value.literal !== undefined || (value.form !== undefined && isConstant(value.form) && value.form.dimension.isOne);
}

/** `exp(a + b/T)`: a sum in an exponent may hold the logarithm of a reference value, and so a unit. */
function mayHide(value: Value): boolean {
  return value.tainted === true || !value.form || (value.expr?.kind === 'binary' && (value.expr.op === '+' || value.expr.op === '-'));
}

function pairUp(signature: Signature, passed: readonly Passed[]): { param: SignatureParam; given: Passed }[] {
  const pairs: { param: SignatureParam; given: Passed }[] = [];
  let position = 0;
  for (const given of passed) {
    if (given.argument.spread) break;
    const named = given.argument.name;
    const param = named !== undefined ? signature.params.find((each) => each.name === named) : signature.params[position];
    if (named === undefined && !param?.rest) position++;
    if (param) pairs.push({ param, given });
  }
  return pairs;
}

function argument(context: Context, signature: Signature, at: number, param: SignatureParam, claim: UnitOnly, given: Passed, binding: Binding): void {
  const members = param.rest && given.value.items ? given.value.items : [given.value.items ? membersOf(given.value) : given.value];
  for (const value of members) {
    if (value.literal || value.fits) keepLiteral(binding, claim, value);
    else if (value.form) claimed(context, signature, at, param, claim, value.expr ? value : { ...value, expr: given.argument.value }, binding);
  }
}

/** A sequence passed where an array is meant: alike members count as one. */
function membersOf(value: Value): Value {
  const first = value.items?.[0];
  return first?.form && value.items?.every((item) => item.form === first.form) ? first : { ...value, form: undefined };
}

function keepLiteral(binding: Binding, claim: UnitOnly, value: Value): void {
  const only = claim.powers[0];
  if (claim.powers.length === 1 && only) binding.literals.set(only.variable, [...(binding.literals.get(only.variable) ?? []), value]);
}

function claimed(context: Context, signature: Signature, at: number, param: SignatureParam, claim: UnitOnly, value: Value, binding: Binding): void {
  const span = value.expr ?? signature.span;
  if (claim.powers.length === 0) return constantClaim(context, signature, at, param, claim, value);
  const only = claim.powers[0] as { variable: string; power: Rational };
  const simple = claim.powers.length === 1 && only.power.isOne && claim.unit.dimension.isOne;
  if (simple) {
    const bound = binding.values.get(only.variable);
    if (!bound) binding.values.set(only.variable, { value: withoutOwnScale(value), position: at });
    else if (value.expr) agree(context, value.expr, bound.value, value, { kind: 'alike', function: signature.name, positions: [bound.position, at] }, span);
    return;
  }
  const unbound = claim.powers.filter((each) => !binding.values.has(each.variable));
  const single = unbound[0];
  if (unbound.length === 1 && single && value.form) return bindRoot(claim, single, value, binding, at);
  if (unbound.length > 0 || !value.expr) return;
  const wanted = claimValue(context, claim, binding);
  agree(context, value.expr, value, wanted, { kind: 'argument', function: signature.name, position: at + 1, name: param.name, claim: claim.unit.text }, span);
}

/** `y [?a^2]` given m²: ?a is m. */
function bindRoot(claim: UnitOnly, open: { variable: string; power: Rational }, value: Value, binding: Binding, at: number): void {
  let form: Form = multiplyForms(value.form as Form, constantForm(claim.unit.dimension.pow(Rational.minusOne)));
  for (const each of claim.powers) {
    const bound = binding.values.get(each.variable)?.value.form;
    if (bound) form = multiplyForms(form, raiseForm(bound, each.power.neg()));
  }
  const measure = claim.powers.length === 1 ? raiseMeasure(value.measure, open.power.inv()) : undefined;
  binding.values.set(open.variable, { value: { expr: value.expr, form: raiseForm(form, open.power.inv()), measure, from: [value] }, position: at });
}

function constantClaim(context: Context, signature: Signature, at: number, param: SignatureParam, claim: UnitOnly, value: Value): void {
  if (!value.expr || !value.form) return;
  const gentle = logarithms.test(signature.name);
  const one = claim.unit.dimension.isOne;
  if (one && !(isConstant(value.form) && value.form.dimension.isOne)) {
    context.add({ kind: 'pure', anchor: context.anchor, span: value.expr, reason: { kind: 'pure-argument', function: signature.name, gentle }, value });
  }
  if (gentle || (one && !isConstant(value.form))) return;
  if (one && !value.form.dimension.isOne) return;
  const wanted: Value = { expr: undefined, form: constantForm(claim.unit.dimension), measure: measureOf(claim.unit), from: [] };
  agree(context, value.expr, value, wanted, { kind: 'argument', function: signature.name, position: at + 1, name: param.name, claim: claim.unit.text }, value.expr);
}

/** A function passed as an argument: its parameters' units and its result's take part. */
function functionArgument(claim: Extract<UnitClaim, { kind: 'function' }>, value: Value, binding: Binding): void {
  const shape = shapeOf(value);
  if (!shape) return;
  const replaced = new Map<number, Form>();
  claim.params.forEach((param, at) => {
    const variable = variableOf(param);
    const own = shape.params[at];
    if (!variable || !own?.form) return;
    const bound = binding.values.get(variable)?.value;
    const open = own.form.terms.length === 1 && own.form.dimension.isOne ? own.form.terms[0] : undefined;
    if (!bound) binding.values.set(variable, { value: own, position: at });
    else if (open && bound.form) replaced.set(open.unknown.id, raiseForm(bound.form, open.power.inv()));
  });
  const variable = variableOf(claim.results[0]);
  const form = shape.result.form && substitute(shape.result.form, (unknown) => replaced.get(unknown.id));
  if (variable && form && !shape.result.literal && !binding.values.has(variable)) {
    const measure = isConstant(shape.result.form as Form) ? shape.result.measure : undefined;
    binding.values.set(variable, { value: { expr: value.expr, form, measure, from: [shape.result] }, position: 0 });
  }
}

function shapeOf(value: Value): { params: readonly Value[]; result: Value } | undefined {
  const callable = value.callable;
  const plain = { expr: value.expr, from: [] };
  if (callable?.kind === 'local') {
    const params = callable.local.params.map((param) => ({ ...plain, form: param.note ? constantForm(param.note.unit.dimension) : param.unknown && unknownForm(param.unknown) }));
    return { params, result: callable.local.result };
  }
  const scheme = callable?.kind === 'function' ? callable.scheme() : undefined;
  if (!scheme) return undefined;
  return { params: scheme.params.map((param) => ({ ...plain, form: param.form })), result: { ...plain, form: scheme.result?.form, measure: scheme.result?.measure } };
}

function variableOf(claim: UnitClaim | undefined): string | undefined {
  if (claim?.kind !== 'unit' || claim.powers.length !== 1 || !claim.unit.dimension.isOne) return undefined;
  return claim.powers[0]?.power.isOne ? claim.powers[0].variable : undefined;
}

function resultOf(context: Context, expr: CallExpr, claim: UnitClaim, binding: Binding): Value {
  if (claim.kind !== 'unit') return unknown(expr);
  return literalResult(expr, claim, binding) ?? claimValue(context, claim, binding);
}

/** `abs(-5)`, `sqrt(2)`: a literal in, a literal out. */
function literalResult(expr: CallExpr, claim: UnitOnly, binding: Binding): Value | undefined {
  const only = claim.powers[0];
  if (claim.powers.length !== 1 || !only || binding.values.has(only.variable)) return undefined;
  const given = binding.literals.get(only.variable) ?? [];
  if (given.length > 0 && given.every((value) => value.fits)) return { expr, form: undefined, fits: true, from: [] };
  const literal = given.length === 1 ? given[0]?.literal : undefined;
  if (!literal) return undefined;
  const exact = raiseLiteral(literal, only.power);
  if (exact) return { expr, form: oneForm, literal: exact, from: [] };
  const size = Rational.parse((Math.abs(literalNumber(literal)) ** only.power.toNumber()).toPrecision(15));
  return size ? { expr, form: oneForm, literal: { ...exactLiteral(size), pure: literal.pure, tolerance: literal.tolerance + 1e-12 }, from: [] } : undefined;
}

/** The value a claim describes, its variables replaced; an open variable becomes a new unknown. */
function claimValue(context: Context, claim: UnitOnly, binding: Binding): Value {
  let form: Form = constantForm(claim.unit.dimension);
  let measure: Measure | undefined = measureOf(claim.unit);
  let tainted = false;
  for (const each of claim.powers) {
    const bound = boundValue(context, each.variable, binding);
    if (!bound.form) return { expr: undefined, form: undefined, from: [bound] };
    form = multiplyForms(form, raiseForm(bound.form, each.power));
    const alone = claim.powers.length === 1 && each.power.isOne && claim.unit.dimension.isOne;
    measure = alone ? bound.measure : multiplyMeasures(measure, raiseMeasure(bound.measure, each.power));
    tainted ||= bound.tainted === true;
  }
  const result = claim.difference ? asDifference(measure) : claim.sum && hasPoints(measure) ? undefined : measure;
  return { expr: undefined, form, measure: result, from: [], ...(tainted ? { tainted } : {}) };
}

/** A sum of points counts as many points as there are members, which nobody knows. */
function hasPoints(measure: Measure | undefined): boolean {
  return measure?.readings.some((reading) => reading.weight !== 0) === true;
}

function boundValue(context: Context, variable: string, binding: Binding): Value {
  const bound = binding.values.get(variable);
  if (bound) return bound.value;
  const value: Value = { expr: undefined, form: unknownForm(context.fresh('', undefined, 'open')), from: [] };
  binding.values.set(variable, { value, position: 0 });
  return value;
}

function asDifference(measure: Measure | undefined): Measure | undefined {
  if (!measure) return undefined;
  return { ...measure, readings: measure.readings.map((reading) => ({ scale: reading.scale, weight: 0, zero: 0, nature: 'difference' as const })) };
}
