/** Sentences for units that slip: a missing factor, a zero that differs, a point where a difference is meant. */
import type { Reason } from '../constraints/problem.ts';
import type { Value } from '../constraints/value.ts';
import { Dimension } from '../quantities/dimension.ts';
import type { Fault } from '../solver/fault.ts';
import { bracket, capital, short } from './dimension-words.ts';
import { factorWords } from './factor-words.ts';
import { chainOf, sideWords } from './sides.ts';
import { nameOf, unitOf, type Voice, type Words } from './voice.ts';

type ScaleFault = Extract<Fault, { kind: 'scale' }>;

export function scaleWords(voice: Voice, fault: ScaleFault): Words {
  const { constraint } = fault;
  const dimension = constraint.right.form?.dimension ?? Dimension.one;
  const [a, b] = [unitOf(constraint.left, dimension), unitOf(constraint.right, dimension)];
  const left = nameOf(voice, constraint.anchor, constraint.left);
  const advice = fault.zeros ? zeroAdvice(left, constraint.left, constraint.right, a, b) : `Multiply ${left} by ${factorWords(fault.ratio)}${fault.turns !== 1 ? ' (a revolution is 2π radians)' : ''}${correctable(constraint.reason)}.`;
  const sides = capital(sideWords(voice, constraint.anchor, constraint.left, dimension));
  return { message: `${openingOf(constraint.reason, a, b, turnsOf(fault))} ${sides}. ${advice}`, related: chainOf(voice, constraint, []) };
}

/** A conversion that does not fit leaves both sides with one unit's name. */
function inUnit(a: string, b: string): string {
  return a === b ? 'otherwise' : `in ${a}`;
}

/** Rotation that is counted otherwise than the other side counts it. */
function turnsOf(fault: ScaleFault): string | undefined {
  if (fault.turns === 1) return undefined;
  return (fault.constraint.left.measure?.cycle ?? 0) !== 0 ? 'counts revolutions' : 'counts radians';
}

function openingOf(reason: Reason, a: string, b: string, turns: string | undefined): string {
  switch (reason.kind) {
    case 'sum':
      return `The terms are counted in different units: ${a} and ${b}.`;
    case 'comparison':
      return `This comparison sets ${a} against ${b}.`;
    case 'choice':
      return `The two choices are counted in different units: ${a} and ${b}.`;
    case 'alike':
      return `\`${short(reason.function)}\` needs its arguments ${reason.positions[0] + 1} and ${reason.positions[1] + 1} in one unit; here they are ${a} and ${b}.`;
    case 'target':
      if (turns) return `\`${reason.path}\` is noted ${bracket(reason.note.unit.text)}, but this value ${turns}.`;
      return `\`${reason.path}\` is noted ${bracket(reason.note.unit.text)}, but this value is counted ${inUnit(a, b)}.`;
    case 'result':
      if (turns) return `\`${reason.function}\` is noted to return ${bracket(reason.note.unit.text)}, but this value ${turns}.`;
      return `\`${reason.function}\` is noted to return ${bracket(reason.note.unit.text)}, but this value is counted ${inUnit(a, b)}.`;
    case 'parameter':
      if (turns) return `\`${reason.function}\` takes \`${reason.name}\` in ${bracket(reason.note.unit.text)}, but this argument ${turns}.`;
      return `\`${reason.function}\` takes \`${reason.name}\` in ${bracket(reason.note.unit.text)}, but this argument is counted ${inUnit(a, b)}.`;
    case 'argument':
      return `\`${short(reason.function)}\` takes ${reason.claim === 'rad' ? 'radians' : b}, but this is counted in ${a}.`;
    case 'conversion-edge':
      return `This empirical relation counts \`${reason.path}\` in ${bracket(reason.note.unit.text)}, but here it is counted in ${a}.`;
    default:
      return `Different units stand where one is needed: ${a} and ${b}.`;
  }
}

function correctable(reason: Reason): string {
  return reason.kind === 'target' || reason.kind === 'result' ? ', or correct the note if the code is right' : '';
}

function zeroAdvice(left: string, from: Value, to: Value, a: string, b: string): string {
  const [have, want] = [from.measure?.readings[0], to.measure?.readings[0]];
  if (!have || !want) return `${left} counts from another zero.`;
  const shift = (have.zero - want.zero) / want.scale.toNumber();
  if (Math.abs(shift) < 1e-9) return `${capital(a)} and ${b} do not count the same number of points.`;
  return `${left} counts from another zero: ${shift > 0 ? 'add' : 'subtract'} ${Number(Math.abs(shift).toPrecision(7))} to get ${b}.`;
}

export function weightWords(voice: Voice, fault: Extract<Fault, { kind: 'weight' }>): Words {
  const { constraint, weight } = fault;
  const text = nameOf(voice, constraint.anchor, constraint.left);
  return {
    message: `${text} adds ${Number(weight.toPrecision(3))} temperatures that count from a zero of their own; the sum depends on where that zero is. Take a difference, divide by their number for a mean, or convert to an absolute temperature first.`,
    related: chainOf(voice, constraint, []),
  };
}

export function pointWords(voice: Voice, fault: Extract<Fault, { kind: 'point' }>): Words {
  const { constraint } = fault;
  const { value, anchor } = constraint;
  const name = nameOf(voice, anchor, value);
  const unit = unitOf(value, value.form?.dimension ?? Dimension.one);
  const related = chainOf(voice, constraint, []);
  if (constraint.use === 'gas law') {
    return { message: `${name} is a gauge pressure (${unit}) in a gas law, which needs the absolute pressure. Add the atmospheric pressure first.`, related };
  }
  const where = constraint.use === 'product' ? 'multiplied with another quantity' : constraint.use === 'quotient' ? 'divided by or dividing another quantity' : 'raised to a power';
  const advice = unit.includes('F') ? 'add 459.67 for °R' : 'add 273.15 for K';
  return { message: `${name} is a temperature in ${unit} and is ${where}; the result depends on where that scale has its zero. Use an absolute temperature (${advice}) or a temperature difference.`, related };
}
