/** A part of a formula with its units: what the arithmetic on plain numbers needs to know before it may go on. */
import { Dimension } from '../../quantities/dimension.ts';
import { Rational } from '../../quantities/rational.ts';
import { type Rotation, sameRotation, sameUnit, type Unit } from '../../quantities/unit.ts';
import type { Span } from '../../text/span.ts';
import type { Node } from './formula-node.ts';
import { refuse } from './no-value.ts';

export interface Term {
  readonly node: Node;
  readonly dimension: Dimension;
  readonly rotation: Rotation;
  /** π multiplies it: a turn may have become 2π radians. */
  readonly pi: boolean;
  /** The unit that a bare number beside it is read in; undefined where it is no plain symbol or sum of such. */
  readonly unit: Unit | undefined;
  /** Set for a number made of literals only. */
  readonly literal: Rational | undefined;
  /** Points on a temperature scale of their own zero, gauge pressures, absolute temperatures: how many of each it holds. */
  readonly points: number;
  readonly gauges: number;
  readonly absolutes: number;
  /** A gauge pressure and another one: the other may be the atmosphere's, or a difference. */
  readonly gaugeOpen: boolean;
  /** Two points cancelled in it. */
  readonly difference: boolean;
}

const still: Rotation = { radian: Rational.zero, cycle: Rational.zero };
const temperature = Dimension.base('Θ');
/** Zeros in kelvins with how far a script's number may be off: engineers write 273 and 460. */
const zeroTolerance = 0.7;

export function termOf(node: Node, dimension: Dimension, rotation: Rotation = still): Term {
  return { node, dimension, rotation, pi: false, unit: undefined, literal: undefined, points: 0, gauges: 0, absolutes: 0, gaugeOpen: false, difference: false };
}

/** π itself. */
export function piTerm(): Term {
  return { ...termOf({ kind: 'number', value: Math.PI }, Dimension.one), pi: true };
}

export function literalTerm(value: Rational): Term {
  return { ...termOf({ kind: 'number', value: value.toNumber() }, Dimension.one), literal: value };
}

/** A symbol, counted in its coherent SI unit; a temperature from absolute zero, a gauge pressure from the atmosphere. */
export function symbolTerm(name: string, unit: Unit): Term {
  const point = unit.offset?.kind === 'temperature' ? 1 : 0;
  const absolute = !unit.offset && unit.dimension === temperature && !unit.degrees ? 1 : 0;
  return { ...termOf({ kind: 'variable', name }, unit.dimension, unit.rotation ?? still), unit, points: point, gauges: unit.offset?.kind === 'gauge' ? 1 : 0, absolutes: absolute };
}

export function sum(a: Term, b: Term, sign: 1 | -1, span: Span): Term {
  if (a.literal && b.literal) return literalTerm(sign === 1 ? a.literal.add(b.literal) : a.literal.sub(b.literal));
  if (b.literal && isCounted(a)) return shifted(a, b.literal, sign, span);
  if (a.literal && isCounted(b)) return sign === 1 ? shifted(b, a.literal, 1, span) : sum(inUnitOf(b, a.literal, span), b, -1, span);
  if (a.dimension !== b.dimension) return refuse({ kind: 'unlike', span });
  const temperatures = pointsOf(a, b, sign);
  return {
    node: { kind: 'sum', left: a.node, right: b.node, sign },
    dimension: a.dimension,
    rotation: sameRotation(a.rotation, still) ? b.rotation : a.rotation,
    pi: a.pi || b.pi,
    unit: a.unit && b.unit && sameUnit(a.unit, b.unit) ? a.unit : undefined,
    literal: undefined,
    ...temperatures,
    ...gaugesOf(a, b, sign),
  };
}

/** Two points that cancel leave a difference; two absolute temperatures may be one and a difference, so nothing is concluded. */
function pointsOf(a: Term, b: Term, sign: 1 | -1): Pick<Term, 'points' | 'absolutes' | 'difference'> {
  const [points, absolutes] = [tidy(a.points + sign * b.points), tidy(a.absolutes + sign * b.absolutes)];
  const cancelled = (a.points !== 0 || b.points !== 0) && points + absolutes === 0;
  return cancelled ? { points: 0, absolutes: 0, difference: true } : { points, absolutes, difference: a.difference || b.difference };
}

/** A gauge pressure and another kind of pressure: the sum may count from either zero. */
function gaugesOf(a: Term, b: Term, sign: 1 | -1): Pick<Term, 'gauges' | 'gaugeOpen'> {
  if (a.gauges !== 0 && b.gauges !== 0) return { gauges: tidy(a.gauges + sign * b.gauges), gaugeOpen: false };
  return { gauges: 0, gaugeOpen: a.gauges + sign * b.gauges === 1 || a.gaugeOpen || b.gaugeOpen };
}

/** Whether a bare number beside it is read in its unit: dimensioned terms, and angles in degrees. */
export function isCounted(a: Term): boolean {
  return !a.dimension.isOne || (a.unit?.rotation !== undefined && !a.unit.rotation.radian.isZero);
}

/** A bare number added to a term: in the term's unit, or a change of zero. */
function shifted(a: Term, literal: Rational, sign: 1 | -1, span: Span): Term {
  const size = scaleOf(a, span) * literal.toNumber() * sign;
  const moved = (by: number): Node => ({ kind: 'sum', left: a.node, right: { kind: 'number', value: by }, sign: 1 });
  const zero = a.unit?.offset?.kind === 'temperature' ? a.unit.offset.zero.toNumber() : undefined;
  if (a.points === 1 && zero !== undefined && Math.abs(size - zero) < zeroTolerance) return { ...a, node: moved(size - zero), points: 0, absolutes: 1, unit: undefined };
  if (a.absolutes === 1 && a.points === 0) {
    const known = a.unit && knownZero(a.unit, -size);
    if (known !== undefined) return { ...a, node: moved(known + size), points: 1, absolutes: 0, unit: undefined };
  }
  return { ...a, node: moved(size) };
}

/** `T - 273.15` in kelvins, `T - 459.67` in degrees Rankine: the zero that is taken away, in kelvins. */
function knownZero(unit: Unit, size: number): number | undefined {
  const zero = unit.scale?.isOne ? 273.15 : 459.67 / 1.8;
  return Math.abs(size - zero) < zeroTolerance ? zero : undefined;
}

/** A bare number beside a term, counted in its unit and from its zero. */
export function inUnitOf(b: Term, literal: Rational, span: Span): Term {
  return { ...termOf({ kind: 'number', value: scaleOf(b, span) * literal.toNumber() + (b.points === 1 ? (b.unit?.offset?.zero.toNumber() ?? 0) : 0) }, b.dimension), points: b.points, gauges: b.gauges };
}

function scaleOf(a: Term, span: Span): number {
  return a.unit?.scale?.toNumber() ?? refuse({ kind: 'unlike', span });
}

export function product(a: Term, b: Term, span: Span): Term {
  if (a.literal && b.literal) return literalTerm(a.literal.mul(b.literal));
  const node: Node = { kind: 'product', left: a.node, right: b.node };
  if (a.literal || b.literal) return weighted(a.literal ? b : a, (a.literal ?? b.literal) as Rational, node);
  return { ...termOf(node, countable(a, span).dimension.mul(countable(b, span).dimension), rotationProduct(a.rotation, b.rotation)), pi: a.pi || b.pi };
}

export function quotient(a: Term, b: Term, span: Span): Term {
  if (b.literal?.isZero) return refuse({ kind: 'undefined', span });
  if (a.literal && b.literal) return literalTerm(a.literal.div(b.literal));
  const node: Node = { kind: 'quotient', left: a.node, right: b.node, span };
  if (b.literal) return weighted(a, b.literal.inv(), node);
  const below = power(b, Rational.minusOne, span);
  return { ...termOf(node, countable(a, span).dimension.mul(below.dimension), rotationProduct(a.rotation, below.rotation)), pi: a.pi || b.pi };
}

export function power(a: Term, exponent: Rational, span: Span): Term {
  if (a.literal && exponent.isInteger && isSmall(a.literal, exponent)) {
    return a.literal.isZero && exponent.sign < 0 ? refuse({ kind: 'undefined', span }) : literalTerm(a.literal.pow(Number(exponent.num)));
  }
  if (exponent.isOne) return a;
  const rotation = { radian: a.rotation.radian.mul(exponent), cycle: a.rotation.cycle.mul(exponent) };
  return { ...termOf({ kind: 'power', base: a.node, exponent, span }, countable(a, span).dimension.pow(exponent), rotation), pi: a.pi };
}

/** Whether the exact power stays short. */
function isSmall(base: Rational, exponent: Rational): boolean {
  return exponent.abs().toNumber() * (base.num.toString(16).length + base.den.toString(16).length) <= 1000;
}

export function negative(a: Term): Term {
  if (a.literal) return literalTerm(a.literal.neg());
  return weighted(a, Rational.minusOne, { kind: 'product', left: { kind: 'number', value: -1 }, right: a.node });
}

/** A literal factor leaves the unit to nobody, and changes how many points are held. */
function weighted(a: Term, by: Rational, node: Node): Term {
  const size = by.toNumber();
  return { ...a, node, unit: undefined, literal: undefined, points: tidy(a.points * size), gauges: tidy(a.gauges * size), absolutes: tidy(a.absolutes * size) };
}

/** A factor must count from zero. */
export function countable(a: Term, span: Span): Term {
  return a.points === 0 ? a : refuse({ kind: 'offset', span });
}

function rotationProduct(a: Rotation, b: Rotation): Rotation {
  return { radian: a.radian.add(b.radian), cycle: a.cycle.add(b.cycle) };
}

function tidy(count: number): number {
  return Math.abs(count - Math.round(count)) < 1e-9 ? Math.round(count) : count;
}
