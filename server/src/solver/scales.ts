/** Whether two numbers of one dimension are counted in the same unit, as far as literals, offsets and rotation leave it open. */
import type { Constraint } from '../constraints/problem.ts';
import type { Measure, Reading } from '../constraints/measure.ts';
import { isPending, zeroTolerance } from '../constraints/measure-algebra.ts';
import { literalNumber } from '../constraints/literal.ts';
import { matchScales, missingFactor } from '../constraints/measure-match.ts';
import type { Value } from '../constraints/value.ts';
import { Dimension } from '../quantities/dimension.ts';
import type { Elimination } from './eliminate.ts';
import type { Fault } from './fault.ts';

type Same = Extract<Constraint, { kind: 'same' }>;

const temperature = Dimension.base('Θ');
const velocity = Dimension.base('L').div(Dimension.base('T'));
const specificEnergy = velocity.mul(velocity);
const molarEnergy = specificEnergy.mul(Dimension.base('M')).div(Dimension.base('N'));
/** Units that lie closer are one to an engineer: a year of 365 days, the acre inch per hour and the cubic foot per second. */
const near = 0.01;

/** The fault of a constraint whose dimensions agree; undefined where the units agree too or are not known. */
export function scaleFault(constraint: Same, elimination: Elimination): Fault | undefined {
  const left = comparable(constraint.left, elimination);
  const right = comparable(constraint.right, elimination);
  if (!left || !right || !sameOpenTerms(constraint)) return undefined;
  const additive = constraint.reason.kind === 'sum';
  const dimension = elimination.reduce(constraint.left.form ?? constant).dimension;
  if (!additive && isPending(left) && dimension !== temperature && !isEnthalpy(dimension)) return pendingFault(constraint, constraint.left);
  const toNote = constraint.reason.kind === 'target' || constraint.reason.kind === 'result';
  const pairs = matchScales(left, right);
  if (pairs.length === 0) return dimension.isOne && toNote && countsUnit(left) ? undefined : mismatch(constraint, left, right);
  if (dimension === velocity && turnsWithoutPi(left, right)) return { kind: 'scale', constraint, ratio: 2 * Math.PI, turns: 2 * Math.PI, zeros: false };
  if (additive || pairs.some(([a, b]) => sameZero(a, b))) return undefined;
  const weight = Math.max(...left.readings.map((reading) => reading.weight));
  if (weight > 1.5 && left.readings.every((reading) => Math.abs(reading.weight) > 1.5)) return { kind: 'weight', constraint, weight };
  return { kind: 'scale', constraint, ratio: 1, turns: 1, zeros: true };
}

/** `S = 50*(v - v0)/(v50 - v0)  # [g/kg]`: a number of that size that converts nothing is itself counted in the unit. */
function countsUnit(measure: Measure): boolean {
  return measure.readings.every((reading) => reading.scale.isOne) && measure.factors.some(({ literal }) => {
    const size = Math.abs(literalNumber(literal));
    return literal.pi === 0 && size > 1 && (size >= 10 || !literal.pure) && !Number.isInteger(Math.log10(size));
  });
}

const constant = { dimension: Dimension.one, terms: [] };

/** `h = cp*t` in °C: a specific enthalpy has a zero of its own, and 0 °C is a usual one. */
function isEnthalpy(dimension: Dimension): boolean {
  return dimension === specificEnergy || dimension === molarEnergy;
}

function pendingFault(constraint: Same, value: Value): Fault {
  return { kind: 'point', constraint: { kind: 'point', anchor: constraint.anchor, span: constraint.span, value, use: 'product' } };
}

function mismatch(constraint: Same, left: Measure, right: Measure): Fault | undefined {
  const missing = missingFactor(left, right);
  if (!missing || (Math.min(Math.abs(missing.ratio - 1), Math.abs(missing.plain - 1)) < near && missing.turns === 1)) return undefined;
  return { kind: 'scale', constraint, ratio: missing.ratio, turns: missing.turns, zeros: false };
}

/** `tilt = 10` and what it multiplies: a bare number where only pure numbers fit may be meant in degrees, or in percent. */
function isBareAngle({ form }: Value, elimination: Elimination): boolean {
  if (!form) return false;
  return form.terms.some(({ unknown }) => unknown.origin === 'constant') && elimination.reduce(form).dimension.isOne;
}

/** A measure whose literal factors are settled: a constant that turned out to carry a unit leaves the scale unknown. */
function comparable(value: Value, elimination: Elimination): Measure | undefined {
  const measure = value.measure;
  if (!measure || !value.form) return undefined;
  if (isBareAngle(value, elimination)) return undefined;
  for (const term of value.form.terms) {
    if (term.unknown.origin !== 'constant') continue;
    const solved = elimination.reduce({ dimension: Dimension.one, terms: [{ unknown: term.unknown, power: term.power }] });
    if (solved.terms.length > 0 || !solved.dimension.isOne) return undefined;
  }
  return measure;
}

/** Unknown units cancel only where both sides have the same ones. */
function sameOpenTerms(constraint: Same): boolean {
  const terms = (value: Value): string => (value.form?.terms ?? [])
    .filter((term) => term.unknown.origin !== 'constant')
    .map((term) => `${term.unknown.id}^${term.power}`).join(' ');
  return terms(constraint.left) === terms(constraint.right);
}

/** `v = N*r` with N in revolutions: a length per time needs the 2π, or the π of a circumference. */
function turnsWithoutPi(left: Measure, right: Measure): boolean {
  const turning = left.cycle !== 0 && left.radian === 0 && right.cycle === 0 && right.radian === 0;
  return turning && left.factors.every((factor) => factor.literal.pi === 0);
}

/** Points agree where they hold the same number of points from the same zero; a difference is counted like its scale's points. */
function sameZero(a: Reading, b: Reading): boolean {
  if (a.nature === 'gauge' || b.nature === 'gauge') return true;
  if (a.pending || b.pending || (a.weight === 0 && b.weight === 0)) return true;
  if (a.weight === 0 || b.weight === 0) return (a.weight === 0 ? a : b).nature !== 'absolute' && (a.weight === 0 ? a : b).nature !== 'shifted';
  if (isScaledPoint(a, b)) return true;
  return Math.abs(a.weight - b.weight) < 1e-6 && Math.abs(a.zero - b.zero) < zeroTolerance;
}

/** `0.9*t_gas` in °C: an estimate in the same unit, and no conversion. */
function isScaledPoint(a: Reading, b: Reading): boolean {
  const distance = Math.abs(a.weight - b.weight);
  return distance > 1e-6 && distance < 0.4 && (a.weight === 1 || b.weight === 1) && Math.abs(a.zero / a.weight - b.zero / b.weight) < zeroTolerance;
}
