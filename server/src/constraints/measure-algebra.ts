import { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';
import { invertLiteral, type Literal, literalNumber } from './literal.ts';
import type { Factor, Measure, Nature, Reading } from './measure.ts';
import { matchScales } from './measure-match.ts';

const mostReadings = 8;
const mostFactors = 10;
/** Zeros of the temperature scales in kelvin: absolute, °F and °C. */
const knownZeros = [0, 459.67 / 1.8, 273.15];
/** Engineers write 273 and 460. */
export const zeroTolerance = 0.7;

/** Product of two measures; undefined where either is unknown. A point in a product stays pending until another takes it away. */
export function multiplyMeasures(a: Measure | undefined, b: Measure | undefined): Measure | undefined {
  if (!a || !b) return undefined;
  const readings: Reading[] = [];
  for (const left of a.readings) for (const right of b.readings) readings.push(productReading(left, right, a.degrees, b.degrees));
  return assemble(readings, [...a.factors, ...b.factors], a.radian + b.radian, a.cycle + b.cycle, a.degrees + b.degrees);
}

/** Rational power of a measure without points in it. */
export function raiseMeasure(a: Measure | undefined, power: Rational): Measure | undefined {
  if (!a || power.isOne) return a;
  const size = power.toNumber();
  const factors = a.factors.map((factor) => ({ ...factor, power: (factor.power ?? 1) * size }));
  const readings = a.readings.map((reading) => ({ scale: reading.scale.pow(power), weight: 0, zero: 0, nature: reading.nature === 'shifted' ? reading.nature : 'ratio' as const }));
  return assemble(readings, factors, a.radian * size, a.cycle * size, a.degrees * size);
}

export function divideMeasures(a: Measure | undefined, b: Measure | undefined): Measure | undefined {
  return multiplyMeasures(a, raiseMeasure(b, Rational.minusOne));
}

/** A literal factor may be a conversion or not; both stay open. Points are expanded at once, since a factor changes their weight. */
export function scaleMeasure(a: Measure | undefined, literal: Literal): Measure | undefined {
  if (!a || literal.value.isZero) return undefined;
  const one = literal.pi === 0 && literal.value.abs().isOne;
  if (!a.readings.some((reading) => reading.weight !== 0 || reading.zero !== 0)) {
    return one ? a : assemble(a.readings, [...a.factors, { literal: positive(literal) }], a.radian, a.cycle, a.degrees);
  }
  const size = literalNumber(literal);
  const readings = a.readings.flatMap((reading) => (one ? [weighted(reading, size)] : [weighted(reading, size), converted(reading, literal)]));
  return { ...a, readings: readings.slice(0, 2 * mostReadings) };
}

/** Sum (`sign` 1) or difference (-1): the readings in which both sides agree; undefined where none does. */
export function addMeasures(a: Measure | undefined, b: Measure | undefined, sign: 1 | -1): Measure | undefined {
  if (!a || !b) return undefined;
  const shared = sharedFactors(a, b);
  if (shared.length > 0) {
    const sum = addMeasures({ ...a, factors: without(a.factors, shared) }, { ...b, factors: without(b.factors, shared) }, sign);
    if (sum) return { ...sum, factors: [...sum.factors, ...shared] };
  }
  const readings = matchScales(a, b).map(([left, right]) => sumReading(left, right, sign));
  if (readings.length === 0) return undefined;
  const [turns, degrees] = [a.radian === 0 && a.cycle === 0 ? b : a, a.degrees === 0 ? b.degrees : a.degrees];
  const gauge = readings.filter((reading) => reading.nature === 'gauge' && reading.weight === 1);
  const absolute = gauge.map((reading) => ({ ...reading, weight: 0, zero: 0, nature: 'ratio' as const }));
  const sums = sign === 1 && gauge.length > 0 && b.readings.concat(a.readings).some((r) => r.weight === 0) ? [...readings, ...absolute] : readings;
  return assemble(sums, [], turns.radian, turns.cycle, degrees);
}

/** Literals that multiply both terms: `x*0.3937` and `y*0.3937` convert alike, and their sum may still be converted by them. */
function sharedFactors(a: Measure, b: Measure): readonly Factor[] {
  return a.factors.filter((factor) => b.factors.some((other) => sameFactor(factor, other)));
}

function without(factors: readonly Factor[], shared: readonly Factor[]): readonly Factor[] {
  return factors.filter((factor) => !shared.some((other) => sameFactor(factor, other)));
}

function sameFactor(a: Factor, b: Factor): boolean {
  return (a.power ?? 1) === (b.power ?? 1) && a.literal.pi === b.literal.pi && a.literal.value.equals(b.literal.value);
}

/** A literal added to a temperature or a gauge pressure: a difference, a point, or a change of zero. */
export function shiftMeasure(a: Measure | undefined, literal: Literal, sign: 1 | -1): Measure | undefined {
  if (!a) return undefined;
  const size = sign * literalNumber(literal);
  const readings = a.readings.flatMap((reading) => shifted(reading, size));
  const [only, ...others] = a.factors;
  if (only && others.length === 0 && (only.power ?? 1) === 1) {
    // `1.8*t - 459.67` of a temperature in K: what multiplied it has converted it.
    const points = a.readings.filter((reading) => reading.nature === 'absolute').flatMap((reading) => shifted(converted(reading, only.literal), size).filter((each) => each.nature === 'point'));
    if (points.length > 0) return { ...a, factors: [], readings: [...points, ...readings].slice(0, mostReadings) };
  }
  return { ...a, readings: readings.slice(0, mostReadings) };
}

/** Whether every reading is a temperature counted from a zero of its own. */
export function isPoint(a: Measure | undefined): boolean {
  return a?.readings.every((reading) => reading.nature === 'point' && reading.weight !== 0) === true;
}

export function isGauge(a: Measure | undefined): boolean {
  return a?.readings.every((reading) => reading.nature === 'gauge' && reading.weight !== 0) === true;
}

/** Whether a point's weight still hangs in a product, in every reading. */
export function isPending(a: Measure | undefined): boolean {
  return a?.readings.every((reading) => reading.pending === true && reading.weight !== 0) === true;
}

function productReading(a: Reading, b: Reading, degreesA: number, degreesB: number): Reading {
  const scale = a.scale.mul(b.scale);
  const plain: Reading = { scale, weight: 0, zero: 0, nature: 'ratio' };
  const point = a.weight !== 0 ? a : b.weight !== 0 ? b : undefined;
  if (!point || point.nature === 'gauge') return plain;
  // `t/(243.12 + t)`: a number counted in degrees stands beside the temperature, so the formula is one for that scale.
  if ((point === a ? b : a).nature === 'shifted') return plain;
  const other = point === a ? degreesB : degreesA;
  return other < 0 && !point.pending ? plain : { scale, weight: point.weight, zero: 0, nature: 'point', pending: true };
}

function sumReading(a: Reading, b: Reading, sign: 1 | -1): Reading {
  const weight = tidy(a.weight + sign * b.weight);
  const pending = (a.pending || b.pending) && weight !== 0;
  return { scale: a.scale, weight, zero: weight === 0 ? 0 : a.zero + sign * b.zero, nature: sumNature(a, b, weight, sign), ...(pending ? { pending } : {}) };
}

function sumNature(a: Reading, b: Reading, weight: number, sign: 1 | -1): Nature {
  if (weight !== 0) return a.weight !== 0 ? a.nature : b.nature;
  if (a.weight !== 0 || b.weight !== 0) return 'difference';
  if (a.nature === 'absolute' && b.nature === 'absolute') return sign === 1 ? 'ratio' : 'difference';
  if (a.nature === 'difference' && b.nature === 'difference') return 'difference';
  return a.nature === 'absolute' ? 'absolute' : 'ratio';
}

function shifted(reading: Reading, size: number): Reading[] {
  if (reading.pending || (reading.weight === 0 && reading.nature !== 'absolute' && reading.nature !== 'point')) return [reading];
  const scale = reading.scale.toNumber();
  const results: Reading[] = [reading];
  const zero = reading.zero - scale * size;
  if (reading.nature === 'gauge') {
    if (Math.abs(zero) < 0.03 * Math.abs(reading.zero)) results.push({ scale: reading.scale, weight: 0, zero: 0, nature: 'ratio' });
    return results;
  }
  const known = knownZeros.find((candidate) => Math.abs(candidate - zero) < zeroTolerance);
  if (known === 0) results.push({ scale: reading.scale, weight: 0, zero: 0, nature: 'absolute' });
  else if (known !== undefined) results.push({ scale: reading.scale, weight: 1, zero: known, nature: 'point' });
  // `T - 40` and `40 - T`: the number may be a point of the same scale.
  // 273.15 is the distance of two zeros, and no temperature to count from.
  const zeros = knownZeros.some((each) => each > 0 && Math.abs(Math.abs(scale * size) - each) < 0.2);
  if (!zeros && (Math.abs(reading.weight) === 1 || reading.nature === 'absolute')) results.push({ scale: reading.scale, weight: 0, zero: 0, nature: 'shifted' });
  return results;
}

function weighted(reading: Reading, size: number): Reading {
  return { ...reading, weight: tidy(reading.weight * size), zero: reading.zero * size };
}

function converted(reading: Reading, literal: Literal): Reading {
  const inverse = invertLiteral(positive(literal)) as Literal;
  return { ...reading, scale: reading.scale.mul(scaleOf(inverse)) };
}

function scaleOf(literal: Literal): Scale {
  return Scale.of(literal.value, Rational.of(literal.pi));
}

function positive(literal: Literal): Literal {
  return literal.value.sign < 0 ? { ...literal, value: literal.value.neg() } : literal;
}

function tidy(weight: number): number {
  return Math.abs(weight) < 1e-9 ? 0 : Math.abs(weight - Math.round(weight)) < 1e-9 ? Math.round(weight) : weight;
}

function assemble(readings: readonly Reading[], factors: readonly Factor[], radian: number, cycle: number, degrees: number): Measure | undefined {
  if (readings.length > 4 * mostReadings || factors.length > mostFactors) return undefined;
  return { readings: readings.length > mostReadings ? readings.slice(0, mostReadings) : readings, factors, radian, cycle, degrees };
}
