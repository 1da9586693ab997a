/** The exact step from a number counted in one unit to the same quantity counted in another. */
import type { Measure } from '../constraints/measure.ts';
import { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';
import { printFactor } from '../quantities/print-unit.ts';

export interface Conversion {
  /** Multiplies the number. */
  readonly factor: Scale;
  /** Added to the number before it is multiplied, or after; one of them is zero. */
  readonly before: number;
  readonly after: number;
  /** No literal in either side leaves the factor open. */
  readonly sure: boolean;
}

const tau = Scale.of(Rational.of(2), Rational.one);

/**
 * What turns a number of measure `from` into one of measure `to`. `ratio` is the factor that the solver found missing; exact
 * scales are used where they come to it, else the ratio itself.
 */
export function conversionOf(from: Measure, to: Measure, ratio: number, turns: number): Conversion | undefined {
  const [have, want] = [from.readings[0], to.readings[0]];
  if (!have || !want) return undefined;
  const single = from.readings.length === 1 && to.readings.length === 1;
  const plain = single && from.factors.length === 0 && to.factors.length === 0;
  const turn = Math.abs(turns - 2 * Math.PI) < 1e-9 ? tau : Math.abs(turns * 2 * Math.PI - 1) < 1e-9 ? tau.pow(Rational.minusOne) : Scale.one;
  const exact = have.scale.div(want.scale).mul(turn);
  const factor = Math.abs(exact.toNumber() / ratio - 1) < 1e-9 ? exact : approximate(ratio);
  if (!factor) return undefined;
  const shift = zeroShift(have, want);
  if (shift === 0) return { factor, before: 0, after: 0, sure: plain };
  const before = round(shift / have.scale.toNumber());
  const after = round(shift / want.scale.toNumber());
  const first = String(before).length <= String(after).length;
  return { factor, before: first ? before : 0, after: first ? 0 : after, sure: plain };
}

/** In SI: the zero the number counts from less the one that is wanted, for points and absolute values of one kind. */
function zeroShift(have: Measure['readings'][number], want: Measure['readings'][number]): number {
  if (have.nature === 'gauge' || want.nature === 'gauge') return 0;
  const fits = (weight: number): boolean => Math.abs(weight) < 1e-9 || Math.abs(weight - 1) < 1e-9;
  if (!fits(have.weight) || !fits(want.weight) || (have.weight === 0) === (want.weight === 0) && have.zero === want.zero) return 0;
  return have.zero * have.weight - want.zero * want.weight;
}

/** Turns keep their π: 6.2832 is written as 2*pi. */
function approximate(ratio: number): Scale | undefined {
  for (const turn of [tau, tau.pow(Rational.minusOne)]) {
    const rest = Rational.parse((ratio / turn.toNumber()).toPrecision(10));
    if (rest && rest.sign > 0 && rest.num <= 3600n && rest.den <= 3600n) return turn.mul(Scale.of(rest));
  }
  const inverse = Rational.parse((1 / ratio).toPrecision(12));
  const value = Rational.parse(ratio.toPrecision(12));
  if (!value || value.sign <= 0) return undefined;
  return inverse?.isInteger ? Scale.of(inverse.inv()) : Scale.of(value);
}

function round(value: number): number {
  return Number(value.toPrecision(12));
}

/** `* 1000` or `/ 60`: the operator and the factor that read best. */
export function factorStep(factor: Scale): readonly ['*' | '/', string] | undefined {
  if (factor.isOne) return undefined;
  const times = printFactor(factor);
  const over = printFactor(factor.pow(Rational.minusOne));
  const better = /^\d+$/.test(over) && !/^\d+$/.test(times) && !over.includes('e');
  return better ? ['/', over] : ['*', times];
}
