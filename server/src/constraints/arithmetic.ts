/** Sums, products, quotients and powers: what each says of the units around it. */
import { Dimension } from '../quantities/dimension.ts';
import { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';
import type { Expr } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';
import type { Context } from './context.ts';
import { divideForms, isConstant, multiplyForms, oneForm, raiseForm, sameForm } from './form.ts';
import { addLiterals, exactLiteral, invertLiteral, type Literal, literalNumber, multiplyLiterals, negateLiteral, raiseLiteral, simpleExponent } from './literal.ts';
import type { Measure } from './measure.ts';
import { addMeasures, divideMeasures, isGauge, isPoint, multiplyMeasures, raiseMeasure, scaleMeasure, shiftMeasure } from './measure-algebra.ts';
import { matchScales } from './measure-match.ts';
import type { Reason } from './problem.ts';
import { type Misuse, type Value, unknown } from './value.ts';

const temperature = Dimension.base('Θ');
const minusOne = exactLiteral(Rational.minusOne);

/** `left + right` or `left - right`. */
export function sum(context: Context, expr: Expr, left: Value, right: Value, op: '+' | '-', opSpan: Span): Value {
  const sign = op === '+' ? 1 : -1;
  if (left.literal && right.literal) {
    const folded = addLiterals(left.literal, op === '+' ? right.literal : negateLiteral(right.literal));
    return folded ? literalValue(expr, folded) : { ...literalValue(expr, approximateSum(left.literal, right.literal, sign)), from: [] };
  }
  if (left.fits || right.fits) return left.fits ? { ...right, expr } : { ...left, expr };
  if (left.literal || right.literal) return withBareTerm(context, expr, left, right, sign);
  if (!left.form || !right.form) return halfKnown(expr, left, right);
  if (isConstantOf(left) || isConstantOf(right)) return besideConstant(expr, left, right, sign);
  agree(context, expr, left, right, { kind: 'sum', op }, opSpan);
  return sumValue(expr, left, right, sign);
}

/** A constant that was given a bare number: in a sum it is read in its neighbour's unit, like the number itself. */
function isConstantOf(value: Value): boolean {
  return value.version?.origin === 'constant';
}

function besideConstant(expr: Expr, left: Value, right: Value, sign: 1 | -1): Value {
  const value = isConstantOf(left) ? right : left;
  return { expr, form: value.form, measure: sumMeasure(left, right, sign), from: [value], ...taint(value), ...(value.misuse ? { misuse: value.misuse } : {}) };
}

/** Terms that must be alike and give one of their kind: the choices of a conditional, the arguments of max. Open ones drop out. */
export function alternatives(context: Context, expr: Expr, values: readonly Value[], reason: (at: number) => Reason): Value {
  const known = values.filter((value) => value.form && !value.fits && !value.literal);
  const first = known[0];
  if (!first) return values.every((value) => value.fits) && values.length > 0 ? { ...(values[0] as Value), expr } : unknown(expr, values);
  for (const other of known.slice(1)) agree(context, expr, first, other, reason(values.indexOf(other)), expr);
  const steady = known.every((value) => value.form && first.form && sameForm(value.form, first.form));
  if (!steady && known.every((value) => value.form && isConstant(value.form))) return { expr, form: undefined, from: known, spoilt: true };
  const measure = known.every((value) => value.measure && first.measure && sameMeasure(value.measure, first.measure)) ? first.measure : undefined;
  return { expr, form: first.form, measure, from: known, ...(known.every((value) => value.tainted) ? { tainted: true } : {}) };
}

/** Requires two values to be counted alike, unless that is plain to see. */
export function agree(context: Context, _expr: Expr, left: Value, right: Value, reason: Reason, span: Span): void {
  if (!left.form || !right.form) return;
  const alike = left.form === right.form && isConstant(left.form);
  if (alike && (!left.measure || !right.measure || sameMeasure(left.measure, right.measure))) return;
  context.add({ kind: 'same', anchor: context.anchor, span, reason, left: withoutOwnScale(left), right: withoutOwnScale(right) });
}

/** A constant without a note is counted in whatever unit its neighbour is, even where that is a mere per cent. */
export function withoutOwnScale(value: Value): Value {
  return value.version?.origin === 'constant' && value.measure ? { ...value, measure: undefined } : value;
}

/** Measures that need no comparison: one reading each, of the same scale, without factors or points. */
export function sameMeasure(a: Measure, b: Measure): boolean {
  if (a === b) return true;
  const [left, right] = [a.readings[0], b.readings[0]];
  if (!left || !right || a.readings.length > 1 || b.readings.length > 1 || a.factors.length > 0 || b.factors.length > 0) return false;
  return left.scale === right.scale && left.weight === 0 && right.weight === 0 && a.radian === b.radian && a.cycle === b.cycle;
}

export function product(expr: Expr, left: Value, right: Value): Value {
  if (left.literal && right.literal) return literalValue(expr, multiplyLiterals(left.literal, right.literal));
  if ((left.fits && !left.literal?.value.isOne) || (right.fits && !right.literal?.value.isOne)) return { expr, form: undefined, fits: true, from: [] };
  if (left.literal) return scaled(expr, right, left.literal);
  if (right.literal) return scaled(expr, left, right.literal);
  if (!left.form || !right.form) return correlated(expr, left, right) ?? unknown(expr, [left, right]);
  const open = hasOpenUnit(left) || hasOpenUnit(right);
  const misuse = open ? undefined : (left.misuse ?? right.misuse ?? (isPoint(left.measure) && isPoint(right.measure) ? misused(expr, 'product', left) : undefined));
  const measure = open && (hasPoint(left) || hasPoint(right)) ? undefined : multiplyMeasures(left.measure, right.measure);
  return productValue(expr, left, right, multiplyForms(left.form, right.form), measure, misuse);
}

/**
 * A power of something unknown. An exponent such as 0.8 or 0.14 belongs to a correlation, where it is put on characteristic
 * numbers (common practice): the result is a pure number, with the doubt of every literal there.
 */
function unknownPower(expr: Expr, base: Value, exponent: Rational): Value {
  if (base.spoilt || base.fits || exponent.isInteger) return unknown(expr, [base]);
  const simple = exponent.den === 2n || exponent.den === 3n || exponent.den === 4n;
  return simple ? { expr, form: undefined, from: [base], fractional: true } : { expr, form: oneForm, from: [base], tainted: true };
}

/** `Re**0.8*Pr**(1/3)`: beside one characteristic number the other is one too. */
function correlated(expr: Expr, left: Value, right: Value): Value | undefined {
  const [known, other] = left.form ? [left, right] : [right, left];
  if (!other.fractional || !known.tainted || !known.form?.dimension.isOne || !isConstant(known.form)) return undefined;
  return { expr, form: oneForm, from: [left, right], tainted: true };
}

/** A factor whose unit is open may carry whatever makes a temperature in °C right: a coefficient of a correlation. */
function hasOpenUnit(value: Value): boolean {
  return value.form !== undefined && !isConstant(value.form);
}

function hasPoint(value: Value): boolean {
  return value.misuse !== undefined || isPoint(value.measure);
}

export function quotient(expr: Expr, left: Value, right: Value): Value {
  const inverse = right.literal && invertLiteral(right.literal);
  if (right.literal && !inverse) return unknown(expr);
  if (left.literal && inverse) return literalValue(expr, multiplyLiterals(left.literal, inverse));
  if (left.fits || right.fits) return { expr, form: undefined, fits: true, from: [] };
  if (inverse) return scaled(expr, left, inverse);
  if (!right.form || (!left.form && !left.literal)) return unknown(expr, [left, right]);
  const misuse = left.misuse ?? right.misuse ?? (isPoint(right.measure) ? misused(expr, 'quotient', right) : undefined);
  const below = misuse ? undefined : right.measure;
  if (left.literal) {
    const measure = scaleMeasure(raiseMeasure(below, Rational.minusOne), left.literal);
    const value = { expr, form: raiseForm(right.form, Rational.minusOne), measure, from: [right], ...kept(right, misuse) };
    return left.literal.pure && !right.tainted ? value : { ...value, tainted: true };
  }
  return productValue(expr, left, right, divideForms(left.form as typeof oneForm, right.form), divideMeasures(left.measure, below), misuse);
}

/** `base ** exponent`. */
export function power(context: Context, expr: Expr, base: Value, exponent: Value, span: Span): Value {
  const constant = exponent.literal ?? constantOf(exponent);
  if (!exponent.literal) pureExponent(context, isPerTenKelvin(exponent) ? { ...exponent, tainted: true } : exponent);
  if (base.literal && constant) return literalPower(expr, base.literal, constant);
  if (base.fits) return { expr, form: undefined, fits: true, from: [] };
  if (base.literal) return { expr, form: oneForm, from: [exponent], ...(base.literal.pure && exponent.form && !exponent.tainted && exponent.expr?.kind !== 'binary' ? {} : { tainted: true }) };
  if (!base.form) return constant && constant.pi === 0 ? unknownPower(expr, base, simpleExponent(constant)) : unknown(expr, [base]);
  if (constant && constant.pi === 0) return constantPower(expr, base, simpleExponent(constant));
  if (isConstant(base.form) && base.form.dimension.isOne) return { expr, form: oneForm, from: [base, exponent], ...taint(base) };
  context.add({ kind: 'varying-power', anchor: context.anchor, span, base, exponent });
  return unknown(expr, [base]);
}

/** `Q10^((T - T_ref)/10)`, the temperature coefficient of a rate: its ten is ten kelvins (van 't Hoff's rule; common practice). */
function isPerTenKelvin({ expr, form }: Value): boolean {
  if (expr?.kind !== 'binary' || (expr.op !== '*' && expr.op !== '/') || !form || !isConstant(form) || form.dimension !== temperature) return false;
  return [expr.left, expr.right].some((part) => part.kind === 'number' && part.value !== undefined && part.value.compare(expr.op === '/' ? ten : tenth) === 0);
}

const ten = Rational.of(10);
const tenth = Rational.of(1, 10);

/** A root or another constant power that a library function stands for. */
export function constantPower(expr: Expr, base: Value, exponent: Rational): Value {
  if (!base.form) return unknownPower(expr, base, exponent);
  if (exponent.isZero) return { expr, form: oneForm, from: [base] };
  const point = !exponent.isOne && isPoint(base.measure);
  const misuse = base.misuse ?? (point ? misused(expr, 'power', base) : undefined);
  const measure = misuse ? undefined : raiseMeasure(base.measure, exponent);
  return { expr, form: raiseForm(base.form, exponent), measure, from: [base], ...kept(base, misuse), ...taint(base) };
}

export function negative(expr: Expr, operand: Value): Value {
  if (operand.literal) return literalValue(expr, negateLiteral(operand.literal));
  if (operand.fits || !operand.form) return { ...operand, expr };
  return { ...scaled(expr, operand, minusOne), expr };
}

export function literalValue(expr: Expr | undefined, literal: Literal): Value {
  return literal.value.isZero ? { expr, form: oneForm, literal, fits: true, from: [] } : { expr, form: oneForm, literal, from: [] };
}

/** The number of a constant without a note, `n = 0.25`: what it counts in an exponent. */
export function constantOf(value: Value): Literal | undefined {
  return value.version?.assigned?.literal;
}

function scaled(expr: Expr, value: Value, literal: Literal): Value {
  if (!value.form) return unknown(expr, [value]);
  const numbered = value.numbered || literal.pi !== 0 || !literal.value.abs().isOne;
  const result: Value = { expr, form: value.form, measure: scaleMeasure(value.measure, literal), from: [value], ...kept(value, value.misuse), ...(numbered ? { numbered } : {}) };
  return literal.pure && !value.tainted ? result : { ...result, tainted: true };
}

function productValue(expr: Expr, left: Value, right: Value, form: Value['form'], measure: Measure | undefined, misuse: Misuse | undefined): Value {
  const gauge = left.gaugeFactor === true || right.gaugeFactor === true || isGauge(left.measure) || isGauge(right.measure);
  const hot = left.temperatureFactor === true || right.temperatureFactor === true || isTemperature(left) || isTemperature(right);
  const found = misuse ?? (gauge && hot ? misused(expr, 'gas law', isGauge(left.measure) || left.gaugeFactor ? left : right) : undefined);
  return {
    expr, form, measure: found ? undefined : measure, from: [left, right],
    ...(found ? { misuse: found } : {}),
    ...(left.numbered || right.numbered ? { numbered: true } : {}),
    ...(gauge ? { gaugeFactor: true } : {}), ...(hot ? { temperatureFactor: true } : {}),
    ...(left.tainted || right.tainted ? { tainted: true } : {}),
  };
}

function isTemperature(value: Value): boolean {
  return value.form !== undefined && value.form.dimension === temperature && isConstant(value.form) && !isPoint(value.measure);
}

function kept(value: Value, misuse: Misuse | undefined): Partial<Value> {
  if (!misuse && !value.gaugeFactor && !value.temperatureFactor) return none;
  return {
    ...(misuse ? { misuse } : {}),
    ...(value.gaugeFactor ? { gaugeFactor: true } : {}),
    ...(value.temperatureFactor ? { temperatureFactor: true } : {}),
  };
}

const none: Partial<Value> = {};
const oneMeasure: Measure = { readings: [{ scale: Scale.one, weight: 0, zero: 0, nature: 'ratio' }], factors: [], radian: 0, cycle: 0, degrees: 0 };

function taint(value: Value): Partial<Value> {
  return value.tainted ? { tainted: true } : none;
}

function misused(expr: Expr, use: Misuse['use'], value: Value): Misuse {
  return { span: expr, use, value };
}

function withBareTerm(context: Context, expr: Expr, left: Value, right: Value, sign: 1 | -1): Value {
  const literal = (left.literal ?? right.literal) as Literal;
  const value = left.literal ? right : left;
  const bare = left.literal ? left : right;
  if (!value.form) return unknown(expr, [value]);
  if (bare.expr && value.form.dimension !== temperature && !(isConstant(value.form) && value.form.dimension.isOne)) {
    context.add({ kind: 'bare', anchor: context.anchor, span: bare.expr, literal, text: '', beside: value });
  }
  const own = isConstant(value.form) && value.form.dimension.isOne ? pureMeasure(value.measure) : value.measure;
  const base = left.literal && sign === -1 ? scaleMeasure(own, minusOne) : own;
  const measure = left.literal ? shiftMeasure(base, literal, 1) : shiftMeasure(base, literal, sign);
  return { expr, form: value.form, measure, from: [value], ...taint(value), ...(value.misuse ? { misuse: value.misuse } : {}) };
}

/** Beside a bare number, degrees and per cent are plain numbers only if they were converted; else the number may hide a unit. */
function pureMeasure(measure: Measure | undefined): Measure | undefined {
  const pairs = measure ? matchScales(measure, oneMeasure) : [];
  return pairs.length > 0 ? oneMeasure : undefined;
}

function halfKnown(expr: Expr, left: Value, right: Value): Value {
  const known = left.form ? left : right;
  if (!known.form) return unknown(expr, [left, right]);
  // What is unknown may be a correlation: whatever rests on this sum is in doubt.
  return { expr, form: known.form, from: [known], tainted: true };
}

function sumValue(expr: Expr, left: Value, right: Value, sign: 1 | -1): Value {
  if (!left.form || !right.form) return unknown(expr);
  if (isConstant(left.form) && isConstant(right.form) && left.form !== right.form) return { expr, form: undefined, from: [left, right], spoilt: true };
  const lead = isConstant(left.form) && !(left.tainted && !right.tainted) ? left : isConstant(right.form) ? right : left.tainted ? right : left;
  const measure = sumMeasure(left, right, sign);
  const misuse = left.misuse ?? right.misuse;
  return {
    expr, form: lead.form, measure, from: [left, right], ...(left.numbered || right.numbered ? { numbered: true } : {}),
    ...(left.tainted && right.tainted || ((left.tainted || right.tainted) && lead.form?.dimension.isOne) ? { tainted: true } : {}), ...(misuse ? { misuse } : {}),
  };
}

function sumMeasure(left: Value, right: Value, sign: 1 | -1): Measure | undefined {
  if (right.version?.origin === 'constant') return shiftMeasure(left.measure, right.version.assigned?.literal ?? minusOne, sign);
  if (left.version?.origin === 'constant') return right.measure;
  return left.form && right.form && sameForm(left.form, right.form) ? addMeasures(left.measure, right.measure, sign) : undefined;
}

function pureExponent(context: Context, exponent: Value): void {
  if (!exponent.form || exponent.fits || (isConstant(exponent.form) && exponent.form.dimension.isOne) || !exponent.expr) return;
  context.add({ kind: 'pure', anchor: context.anchor, span: exponent.expr, reason: { kind: 'exponent' }, value: exponent });
}

function literalPower(expr: Expr, base: Literal, exponent: Literal): Value {
  const exact = exponent.pi === 0 ? raiseLiteral(base, exponent.value) : undefined;
  if (exact) return literalValue(expr, exact);
  const size = literalNumber(base) ** literalNumber(exponent);
  const value = Number.isFinite(size) && size !== 0 ? Rational.parse(size.toPrecision(15)) : undefined;
  return value ? literalValue(expr, { value, pi: 0, pure: base.pure, tolerance: base.tolerance + 1e-12 }) : unknown(expr);
}

function approximateSum(a: Literal, b: Literal, sign: 1 | -1): Literal {
  const value = Rational.parse((literalNumber(a) + sign * literalNumber(b)).toPrecision(15)) ?? Rational.one;
  return { value, pi: 0, pure: false, tolerance: 1e-12 };
}
